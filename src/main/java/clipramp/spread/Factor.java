package clipramp.spread;

import clipramp.engine.UnitValues;

/**
 * One thing that differs from unit to unit, or from day to day.
 *
 * @param path design key, such as ramp.capacitor
 * @param name what people call it
 * @param kind part, device or surroundings
 * @param low least value, SI
 * @param nominal value of the nominal unit, SI
 * @param high greatest value, SI
 * @param law how it lies between them
 * @param slot where it goes
 */
public record Factor(String path, String name, Kind kind, double low, double nominal, double high, Law law, Slot slot) {
    /** Where a factor comes from, and so what could be done about it. */
    public enum Kind {
        /** A bought part with a tolerance: a tighter one can be bought. */
        PART,
        /** A device figure between the limits of its sheet: devices can be selected. */
        DEVICE,
        /** Line and temperature: they are as they are. */
        SURROUNDINGS
    }

    /** How a factor's values lie between its limits. */
    public enum Law {
        /** By the {@link DrawLaw} that was chosen for parts. */
        CHOSEN,
        /** Uniform between the limits. */
        UNIFORM,
        /** Triangular through minimum, typical and maximum. */
        THREE_POINT
    }

    /** Puts a value into a unit. */
    @FunctionalInterface
    public interface Slot {
        /**
         * Puts a value where it belongs.
         *
         * @param unit the unit, changed
         * @param value SI
         */
        void set(UnitValues unit, double value);
    }

    /**
     * A drawn value.
     *
     * @param chance uniform, 0..1
     * @param chosen the law for parts
     */
    double value(double chance, DrawLaw chosen) {
        return switch (law) {
            case CHOSEN -> {
                double place = chosen.place(chance);
                yield nominal + place * (place < 0 ? nominal - low : high - nominal);
            }
            case UNIFORM -> low + chance * (high - low);
            case THREE_POINT -> DrawLaw.threePoint(low, nominal, high, chance);
        };
    }

    /** The same factor between other limits. */
    Factor between(double newLow, double newHigh) {
        double middle = Math.min(newHigh, Math.max(newLow, nominal));
        return new Factor(path, name, kind, newLow, middle, newHigh, law, slot);
    }
}
