package clipramp.faults;

import clipramp.units.QuantityText;
import clipramp.units.Unit;

/** Figures in this room's sentences. */
final class Said {
    private static final int DIGITS = 3;

    /** Below this no instrument at a live circuit tells a voltage from none, V. */
    private static final double LEAST_VOLTS = 1e-4;

    private Said() {}

    static String ohms(double value) {
        return QuantityText.format(value, Unit.OHM, DIGITS);
    }

    static String volts(double value) {
        return Math.abs(value) < LEAST_VOLTS ? "0 V" : QuantityText.format(value, Unit.VOLT, DIGITS);
    }

    static String amps(double value) {
        return QuantityText.format(value, Unit.AMPERE, DIGITS);
    }
}
