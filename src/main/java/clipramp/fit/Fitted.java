package clipramp.fit;

import clipramp.units.Unit;

/**
 * One value of the unit, as the readings have it.
 *
 * @param path design key, such as ramp.capacitor
 * @param name what people call it
 * @param unit its unit
 * @param nominal the design's value, SI
 * @param low least value that the design allows, SI
 * @param high greatest value that the design allows, SI
 * @param limitsAssumed whether these limits are ours because the design states none
 * @param value as built, SI
 * @param from lower end of its 95 % interval, SI
 * @param to upper end of its 95 % interval, SI
 * @param kept share of what was not known beforehand that is still not known: standard deviation after over before, 0..1
 * @param knowledge the same in a word
 * @param within how it lies to the design's limits
 */
public record Fitted(
        String path,
        String name,
        Unit unit,
        double nominal,
        double low,
        double high,
        boolean limitsAssumed,
        double value,
        double from,
        double to,
        double kept,
        Knowledge knowledge,
        Within within) {
    /** What readings know of a value. */
    public enum Knowledge {
        /** Half or less of the drawing's uncertainty is left. */
        TOLD("told"),
        /** Some of it is taken away. */
        NARROWED("narrowed"),
        /** Next to nothing is: the value is the drawing's and its limits. */
        NOT_TOLD("not told");

        private static final double HALF = 0.5;
        private static final double NEARLY_ALL = 0.95;

        private final String word;

        Knowledge(String word) {
            this.word = word;
        }

        /** The words that stand for it in an answer. */
        public String word() {
            return word;
        }

        /** By the share of its standard deviation that is left, 0..1. */
        static Knowledge of(double kept) {
            if (kept <= HALF) {
                return TOLD;
            }
            return kept <= NEARLY_ALL ? NARROWED : NOT_TOLD;
        }
    }

    /** How the interval lies to the limits. */
    public enum Within {
        /** All of it is allowed. */
        INSIDE("within tolerance"),
        /** Some of it is allowed. */
        PERHAPS("at its limit"),
        /** None of it is allowed. */
        OUTSIDE("outside tolerance"),
        /** The readings do not tell the value. */
        UNKNOWN("cannot be told");

        private final String word;

        Within(String word) {
            this.word = word;
        }

        /** The words that stand for it in an answer. */
        public String word() {
            return word;
        }
    }

    /** As built less drawn, as a share of drawn. */
    public double difference() {
        return value / nominal - 1;
    }

    static Within within(double low, double high, double from, double to, Knowledge knowledge) {
        if (to < low || from > high) {
            return Within.OUTSIDE;
        }
        if (knowledge != Knowledge.TOLD) {
            return Within.UNKNOWN;
        }
        return from >= low && to <= high ? Within.INSIDE : Within.PERHAPS;
    }
}
