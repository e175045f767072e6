package clipramp.engine;

/**
 * The first time at which a linear form of a piece rises to zero, never a later one.
 *
 * <p>From a point where the form is negative with value f, slope f' and a bound M of its second derivative over all
 * that follows, the form cannot reach zero before the first root of f + f' h + M h²/2. Stepping to that root again and
 * again approaches the first crossing from below, by ever better steps: near it M no longer matters and the steps are
 * Newton's.
 */
final class FirstCrossing {
    /** Rounding of a form whose terms are of size one; larger values at the start are a crossing. */
    private static final double ROUNDING = 1e-11;

    private static final int MOST_STEPS = 1000;

    private FirstCrossing() {}

    /**
     * @param piece the piece; it is left looked at the returned time, or somewhere before the limit
     * @param form what must rise to zero
     * @param from start of the search, s
     * @param limit end of the search, s
     * @return time in s, or POSITIVE_INFINITY for none before the limit
     */
    static double after(Piece piece, Affine form, double from, double limit) {
        lookAt(piece, from);
        double time = from;
        double value = piece.value(form);
        double rounding = ROUNDING * piece.magnitude(form);
        if (value >= -rounding) {
            if (value > rounding || rises(piece, form)) {
                return time;
            }
            value = 0;
        }
        for (int step = 0; step < MOST_STEPS; step++) {
            double slope = piece.slope(form);
            double bend = piece.bendBound(form);
            double ahead = firstRoot(value, slope, bend);
            double next = time + ahead;
            if (!(next < limit)) {
                return Double.POSITIVE_INFINITY;
            }
            if (next == time) {
                return time;
            }
            time = next;
            piece.look(time);
            value = piece.value(form);
            if (value >= 0) {
                return time;
            }
        }
        throw new ArithmeticException("no end to the search for a crossing from " + from + " s");
    }

    private static void lookAt(Piece piece, double seconds) {
        if (seconds == piece.startSeconds()) {
            piece.lookAtStart();
        } else {
            piece.look(seconds);
        }
    }

    /** Whether a form that stands at zero may rise at once; one that stays at zero (nothing charged, no supply) does not. */
    private static boolean rises(Piece piece, Affine form) {
        double slope = piece.slope(form);
        return slope > 0 || (slope == 0 && piece.bendBound(form) > 0);
    }

    /** First positive root of value + slope h + bend h²/2, value at or under 0; POSITIVE_INFINITY for none. */
    private static double firstRoot(double value, double slope, double bend) {
        double discriminant = slope * slope - 2 * bend * value;
        double root = Math.sqrt(discriminant);
        if (slope > 0) {
            return -2 * value / (slope + root);
        }
        return bend == 0 ? Double.POSITIVE_INFINITY : (root - slope) / bend;
    }
}
