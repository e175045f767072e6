package clipramp.figures;

import java.util.ArrayList;
import java.util.List;

/** Where an axis is marked: round values only, and never closer than there is room for. */
final class Ticks {
    private static final double[] ANGLE_STEPS = {45, 30, 15, 10, 5, 2, 1};
    private static final double FINEST_OF_A_HALF_CYCLE = 15;

    private Ticks() {}

    /**
     * Steps for an angle axis in degrees: 45, 30, 15, 10, 5, 2, 1, and decimally on below.
     *
     * @param spanDegrees what the axis spans, above 0
     * @param most how many steps there is room for, 1 or more
     */
    static double angleStep(double spanDegrees, int most) {
        double step = 90;
        for (double finer : ANGLE_STEPS) {
            boolean tooFine = finer < FINEST_OF_A_HALF_CYCLE && spanDegrees > 90;
            if (spanDegrees / finer > most || tooFine) {
                return step;
            }
            step = finer;
        }
        return Math.min(1, step(spanDegrees, most));
    }

    /** The smallest of 1, 2, 5 times a power of ten that divides a span into at most so many steps. */
    static double step(double span, int most) {
        double decade = Math.pow(10, Math.floor(Math.log10(span / most)));
        for (double factor : new double[] {1, 2, 5}) {
            if (span / (factor * decade) <= most * (1 + 1e-9)) {
                return factor * decade;
            }
        }
        return 10 * decade;
    }

    /** Multiples of a step from {@code from} to {@code to}, both included. */
    static List<Double> between(double from, double to, double step) {
        List<Double> marks = new ArrayList<>();
        long first = (long) Math.ceil(from / step - 1e-9);
        long last = (long) Math.floor(to / step + 1e-9);
        for (long k = first; k <= last; k++) {
            marks.add(k * step);
        }
        return marks;
    }
}
