package clipramp.margins;

import clipramp.units.QuantityText;
import clipramp.units.Unit;

/** Quantities in formulas and notes, with as many digits as a reader can use. */
final class Say {
    private static final int DIGITS = 4;

    private Say() {}

    static String volts(double value) {
        return QuantityText.format(value, Unit.VOLT, DIGITS);
    }

    static String amps(double value) {
        return QuantityText.format(value, Unit.AMPERE, DIGITS);
    }

    static String ohms(double value) {
        return QuantityText.format(value, Unit.OHM, DIGITS);
    }

    static String watts(double value) {
        return QuantityText.format(value, Unit.WATT, DIGITS);
    }

    static String seconds(double value) {
        return QuantityText.format(value, Unit.SECOND, DIGITS);
    }

    static String farads(double value) {
        return QuantityText.format(value, Unit.FARAD, DIGITS);
    }

    static String coulombs(double value) {
        return QuantityText.format(value, Unit.COULOMB, DIGITS);
    }

    static String joules(double value) {
        return QuantityText.format(value, Unit.JOULE, DIGITS);
    }

    static String kelvin(double value) {
        return QuantityText.format(value, Unit.KELVIN, DIGITS);
    }

    static String celsius(double value) {
        return QuantityText.format(value, Unit.CELSIUS, DIGITS);
    }

    static String thermal(double value) {
        return QuantityText.format(value, Unit.KELVIN_PER_WATT, DIGITS);
    }

    static String share(double value) {
        return QuantityText.format(value, Unit.FRACTION, DIGITS);
    }

    static String angle(double rad) {
        return QuantityText.format(rad, Unit.ANGLE, DIGITS);
    }

    static String voltSeconds(double value) {
        return QuantityText.format(value, Unit.VOLT_SECOND, DIGITS);
    }

    static String henries(double value) {
        return QuantityText.format(value, Unit.HENRY, DIGITS);
    }

    static String hertz(double value) {
        return QuantityText.format(value, Unit.HERTZ, DIGITS);
    }

    static String rate(double voltsPerSecond) {
        return QuantityText.format(voltsPerSecond / 1e6, Unit.NUMBER, DIGITS) + " V/µs";
    }

    static String ampsSquaredSeconds(double value) {
        return QuantityText.format(value, Unit.AMPERE_SQUARED_SECOND, DIGITS);
    }

    static String number(double value) {
        return QuantityText.number(value, DIGITS);
    }
}
