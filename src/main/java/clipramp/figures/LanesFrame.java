package clipramp.figures;

import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.Optional;

/**
 * Where the lanes lie on a surface, for pointing at them.
 *
 * @param left x at which the shown angles begin
 * @param right x at which they end
 * @param top y of the first lane's top
 * @param bottom y of the last lane's bottom
 * @param laneTops y of each lane's top, in the order of {@link Lane}
 * @param laneBottoms y of each lane's bottom
 * @param fromRad first angle shown, rad
 * @param toRad last angle shown, rad
 */
public record LanesFrame(
        double left,
        double right,
        double top,
        double bottom,
        double[] laneTops,
        double[] laneBottoms,
        double fromRad,
        double toRad) {
    private static final int LANES = Lane.values().length;

    /** Room for the numbers of the upright axes, in units of a screen at 100 %. */
    private static final double TICK_ROOM = 46;

    /** Where a figure puts its lanes when drawn at a size: each as high as its weight asks, under a line for its head. */
    static LanesFrame of(LanesFigure figure, double width, double height, Style style) {
        double unit = style.gap();
        double top = 6 * unit;
        double bottom = Math.max(top + LANES, height - 9 * unit);
        double head = 5 * unit;
        double plots = Math.max(LANES, bottom - top - LANES * head);
        double weights = Arrays.stream(Lane.values()).mapToDouble(Lane::weight).sum();
        double[] tops = new double[LANES];
        double[] bottoms = new double[LANES];
        double y = top;
        for (Lane lane : Lane.values()) {
            tops[lane.ordinal()] = y + head;
            y += head + plots * lane.weight() / weights;
            bottoms[lane.ordinal()] = y;
        }
        double left = TICK_ROOM * style.zoom();
        double right = Math.max(left + 1, width - 4 * unit);
        return new LanesFrame(left, right, tops[0], y, tops, bottoms, figure.fromRad(), figure.toRad());
    }

    /** x of an angle in rad. */
    public double xOf(double angleRad) {
        return left + (angleRad - fromRad) / (toRad - fromRad) * (right - left);
    }

    /** Angle in rad at an x, kept within what is shown. */
    public double radAt(double x) {
        double share = Math.min(1, Math.max(0, (x - left) / (right - left)));
        return fromRad + share * (toRad - fromRad);
    }

    /** The lane at a y, if there is one. */
    public Optional<Lane> laneAt(double y) {
        return Arrays.stream(Lane.values())
                .filter(lane -> y >= laneTops[lane.ordinal()] && y <= laneBottoms[lane.ordinal()])
                .findFirst();
    }

    /** Rectangle of a lane's plot. */
    Rectangle2D plot(Lane lane) {
        double laneTop = laneTops[lane.ordinal()];
        return new Rectangle2D.Double(left, laneTop, right - left, laneBottoms[lane.ordinal()] - laneTop);
    }
}
