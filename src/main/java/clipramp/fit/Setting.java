package clipramp.fit;

/**
 * What the knob or the bench resistor stood at.
 *
 * @param kind knob position, whole R_E, or nothing to set
 * @param value position 0..1, or ohms; ignored for a fixed ramp
 * @param accuracy how far it may be off: share of the whole travel, or as for a reading
 * @param column what stood over it, for naming it
 */
public record Setting(Kind kind, double value, Accuracy accuracy, String column) {
    /** One percent of the travel: what a dial can be read to, common practice. */
    public static final Accuracy USUAL_KNOB = Accuracy.amount(0.01);

    /** What was set. */
    public enum Kind {
        /** The knob, by its position. */
        KNOB,
        /** A bench resistor in place of the whole R_E. */
        RAMP_OHMS,
        /** Nothing: the ramp is fixed. */
        FIXED
    }

    /**
     * Refuses what cannot be set.
     *
     * @throws IllegalArgumentException for a knob position outside 0..1 or an R_E that is not above zero and finite
     */
    public Setting {
        if (kind == Kind.KNOB && !(value >= 0 && value <= 1)) {
            throw new IllegalArgumentException("a knob position lies in 0..1, is " + value);
        }
        if (kind == Kind.RAMP_OHMS && !(value > 0 && value < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("R_E is above zero, is " + value);
        }
    }

    /** A design without a knob. */
    public static Setting fixed() {
        return new Setting(Kind.FIXED, 0, USUAL_KNOB, "");
    }
}
