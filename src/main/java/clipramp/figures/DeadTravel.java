package clipramp.figures;

import clipramp.power.OperatingPoint;
import java.util.List;

/**
 * How much of the knob's rotation does nothing at either end: the power stays within half a percent of full power of
 * what it is at that end.
 *
 * @param low share of the rotation from the anticlockwise end, 0..1
 * @param high share of the rotation from the clockwise end, 0..1
 */
record DeadTravel(double low, double high) {
    /** Share of full power under which a change counts as none. */
    private static final double UNNOTICED = 0.005;
    /** A stretch shorter than this is an end stop, not a fault. */
    private static final double SHORTEST = 0.02;

    /** From solved positions in rising order; none for a fixed ramp. */
    static DeadTravel of(List<OperatingPoint> points) {
        if (points.size() < 2) {
            return new DeadTravel(0, 0);
        }
        int last = points.size() - 1;
        double low = stretch(points, 0, 1);
        double high = stretch(points, last, -1);
        return new DeadTravel(low < SHORTEST ? 0 : low, high < SHORTEST || low >= 1 ? 0 : high);
    }

    private static double stretch(List<OperatingPoint> points, int end, int step) {
        double atEnd = points.get(end).load().fraction();
        double from = points.get(end).position().orElse(0);
        double reached = 0;
        for (int i = end + step; i >= 0 && i < points.size(); i += step) {
            if (Math.abs(points.get(i).load().fraction() - atEnd) > UNNOTICED) {
                return reached;
            }
            reached = Math.abs(points.get(i).position().orElse(0) - from);
        }
        return reached;
    }
}
