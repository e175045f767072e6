package clipramp.fit;

/**
 * How far a reading may be off, 19 times in 20: relative x |reading| + absolute.
 *
 * @param relative share of the reading, 0 or more
 * @param absolute in the reading's SI unit, 0 or more
 */
public record Accuracy(double relative, double absolute) {
    /** Standard deviations to either side that hold 95 % of a normal distribution. */
    static final double SIGMAS = 1.959963984540054;

    /**
     * Refuses an accuracy that no instrument has.
     *
     * @throws IllegalArgumentException for a negative or infinite one, and for one of nothing at all
     */
    public Accuracy {
        if (!(relative >= 0 && absolute >= 0 && relative + absolute > 0)
                || Double.isInfinite(relative)
                || Double.isInfinite(absolute)) {
            throw new IllegalArgumentException("an accuracy is above zero and finite: " + relative + ", " + absolute);
        }
    }

    /** A share of the reading, above 0. */
    public static Accuracy share(double relative) {
        return new Accuracy(relative, 0);
    }

    /** An amount in the reading's SI unit, above 0. */
    public static Accuracy amount(double absolute) {
        return new Accuracy(0, absolute);
    }

    /** Standard deviation at a value, both in its SI unit. */
    double deviation(double value) {
        return (relative * Math.abs(value) + absolute) / SIGMAS;
    }
}
