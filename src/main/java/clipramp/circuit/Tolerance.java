package clipramp.circuit;

/**
 * How far a part's value may lie from what is printed on it.
 *
 * @param minus largest shortfall as a fraction of the value, 0..1 (0.1 for -10 %)
 * @param plus largest excess as a fraction of the value, 0 or more
 */
public record Tolerance(double minus, double plus) {
    /** The value is exactly what is printed. */
    public static final Tolerance NONE = new Tolerance(0, 0);

    /** @throws IllegalArgumentException outside the stated ranges */
    public Tolerance {
        Require.fraction("tolerance below", minus);
        Require.notNegative("tolerance above", plus);
    }

    /** Whether the value lies off neither way. */
    public boolean isNone() {
        return minus == 0 && plus == 0;
    }
}
