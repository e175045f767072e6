package clipramp.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/** Quantities as text: engineering prefixes, the digits that they deserve, a dot, no grouping. */
public final class QuantityText {
    private static final int USUAL_DIGITS = 4;
    private static final int DOUBLE_DIGITS = 17;

    private QuantityText() {}

    /** Four significant digits, without trailing zeros: "4.7 kΩ", "19.95 V", "15.48°", "5 %". */
    public static String format(double value, Unit unit) {
        return format(value, unit, USUAL_DIGITS);
    }

    /**
     * A value with its unit behind the prefix that leaves one to three digits before the dot; "unknown" for NaN, "∞" for
     * an infinite one.
     *
     * @param value in the SI unit (radians, °C, 0..1)
     * @param unit its unit
     * @param digits significant digits at most, 1 or more; trailing zeros are left out
     */
    public static String format(double value, Unit unit, int digits) {
        if (Double.isNaN(value)) {
            return "unknown";
        }
        if (Double.isInfinite(value)) {
            return value > 0 ? "∞" : "-∞";
        }
        double shown = unit == Unit.ANGLE ? Math.toDegrees(value) : value;
        return withUnit(new BigDecimal(shown).round(new MathContext(digits, RoundingMode.HALF_UP)), unit);
    }

    /** The shortest text that reads back as exactly this value, for files; finite values only. */
    public static String exact(double value, Unit unit) {
        if (unit != Unit.ANGLE) {
            return withUnit(new BigDecimal(Double.toString(value)), unit);
        }
        for (int digits = 1; digits <= DOUBLE_DIGITS; digits++) {
            BigDecimal degrees = new BigDecimal(Math.toDegrees(value)).round(new MathContext(digits));
            if (Math.toRadians(degrees.doubleValue()) == value) {
                return plain(degrees) + " deg";
            }
        }
        return Double.toString(value) + " rad";
    }

    /** A value as {@link #format(double, Unit, int)} has it, without a unit, for columns that carry theirs in the head. */
    public static String number(double value, int digits) {
        return format(value, Unit.NUMBER, digits);
    }

    /** A value with a fixed number of decimals, so that a column lines up; what rounds to nothing has no sign. */
    public static String fixed(double value, int decimals) {
        String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
        return text.matches("-0(\\.0*)?") ? text.substring(1) : text;
    }

    private static String withUnit(BigDecimal value, Unit unit) {
        return switch (unit) {
            case NUMBER -> plain(value);
            case ANGLE -> plain(value) + "°";
            case FRACTION, PER_KELVIN -> plain(value.scaleByPowerOfTen(2)) + " " + unit.symbol();
            default -> unit.isPrefixed() ? prefixed(value, unit) : plain(value) + " " + unit.symbol();
        };
    }

    private static String prefixed(BigDecimal value, Unit unit) {
        if (value.signum() == 0) {
            return "0 " + unit.symbol();
        }
        int leading = value.precision() - value.scale() - 1;
        Prefix prefix = Prefix.engineering(leading);
        return plain(value.scaleByPowerOfTen(-prefix.exponent())) + " " + prefix.symbol() + unit.symbol();
    }

    /** Plain digits while they stay readable, an exponent beyond. */
    private static String plain(BigDecimal value) {
        if (value.signum() == 0) {
            return "0";
        }
        BigDecimal stripped = value.stripTrailingZeros();
        int leading = stripped.precision() - stripped.scale() - 1;
        if (leading > 14 || leading < -7) {
            return stripped.unscaledValue() + "e" + -stripped.scale();
        }
        return stripped.toPlainString();
    }

    /**
     * What a refused value would have meant, in the plain unit where that can be read: 10 mohm is "0.010 Ω".
     *
     * @param value in the SI unit
     * @param unit its unit
     */
    static String meaning(BigDecimal value, Unit unit) {
        int leading = value.precision() - value.scale() - 1;
        if (!unit.isPrefixed() || value.signum() == 0 || leading < -3 || leading > 5) {
            return withUnit(value.round(new MathContext(USUAL_DIGITS)), unit);
        }
        BigDecimal shown = value.stripTrailingZeros();
        int scale = Math.max(shown.scale(), leading < 0 ? 1 - leading : 0);
        return shown.setScale(scale, RoundingMode.UNNECESSARY).toPlainString() + " " + unit.symbol();
    }
}
