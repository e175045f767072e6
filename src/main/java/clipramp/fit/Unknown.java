package clipramp.fit;

import clipramp.units.Unit;

/**
 * A value of the unit that readings may tell.
 *
 * @param path design key, such as ramp.capacitor
 * @param name what people call it
 * @param unit its unit
 * @param low least value that the design allows, SI
 * @param nominal the design's value, SI, above zero
 * @param high greatest value that the design allows, SI
 * @param assumed whether the limits are ours because the design states none
 * @param farthest how far it may be looked for, in prior standard deviations: a wrong part may sit anywhere, a device
 *     figure that is far outside its sheet has stopped being one
 * @param slot where it goes
 */
record Unknown(
        String path,
        String name,
        Unit unit,
        double low,
        double nominal,
        double high,
        boolean assumed,
        double farthest,
        Slot slot) {
    /** For parts: the wrong one was fitted. */
    static final double WRONG_PART = 8;

    /** For figures of devices and the pot's law. */
    static final double ODD_DEVICE = 2.5;

    /** Puts a value into a unit. */
    @FunctionalInterface
    interface Slot {
        /** Puts a value, SI, where it belongs. */
        void set(TriedUnit unit, double value);
    }

    Unknown {
        if (!(low < high && nominal > 0)) {
            throw new IllegalArgumentException(path + ": limits " + low + ".." + high + ", nominal " + nominal);
        }
    }

    /** Prior standard deviation as a share of nominal: half of what lies between the limits. */
    double priorShare() {
        return (high - low) / 2 / nominal;
    }

    /**
     * The value so many prior standard deviations from nominal, on a logarithmic scale, which keeps it above zero.
     *
     * @param z prior standard deviations
     */
    double at(double z) {
        return nominal * Math.exp(z * priorShare());
    }
}
