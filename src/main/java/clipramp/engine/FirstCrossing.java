package clipramp.engine;

/**
 * The first time at which a linear form of a piece rises to zero, never a later one.
 *
 * <p>From a point where the form is negative it cannot reach zero before a parabola that lies over it does ({@link Outlook}).
 * Stepping so far again and again approaches the first crossing from below, each step of third order: from two to three looks
 * find it.
 */
final class FirstCrossing {
    /** Rounding of a form whose terms are of size one; larger values at the start are a crossing. */
    private static final double ROUNDING = 1e-11;

    /** A step of no more than this share of the time moves nothing but rounding. */
    private static final double NO_STEP = 1e-15;

    private static final int MOST_STEPS = 1000;

    private FirstCrossing() {}

    /**
     * When a form first rises to zero, to rounding.
     *
     * @param piece the piece; it is left looked at somewhere before the limit
     * @param form what must rise to zero
     * @param from start of the search, s since the line zero
     * @param limit end of the search, s since the line zero
     * @return s since the line zero; {@code from} itself where the form is past zero there; POSITIVE_INFINITY for none
     *     before the limit
     * @throws ArithmeticException where the steps come to no end
     */
    static double after(Piece piece, Affine form, double from, double limit) {
        lookAt(piece, from);
        Outlook outlook = piece.outlook(form);
        double time = from;
        double value = outlook.value();
        double rounding = ROUNDING * piece.magnitude(form);
        if (value >= -rounding) {
            if (value > rounding || outlook.rises()) {
                return time;
            }
            value = 0;
        }
        for (int step = 0; step < MOST_STEPS; step++) {
            double ahead = outlook.surelyNegative(value, limit - time);
            double next = time + ahead;
            if (!(next < limit)) {
                return Double.POSITIVE_INFINITY;
            }
            if (ahead <= NO_STEP * next || outlook.arrives(ahead, NO_STEP * next)) {
                return next;
            }
            time = next;
            piece.look(time);
            value = outlook.value();
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
}
