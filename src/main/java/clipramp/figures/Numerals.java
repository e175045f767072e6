package clipramp.figures;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers as they stand in figures: plain decimals with the digits that they deserve. */
final class Numerals {
    /** Stands in a table where there is no number. */
    static final String NOTHING = "none";

    private Numerals() {}

    /** As short as it goes, never with an exponent: 0.5, 180, 12.25. */
    static String plain(double value) {
        return trimmed(BigDecimal.valueOf(value).round(new MathContext(9, RoundingMode.HALF_UP)));
    }

    /** Rounded to significant digits and without trailing noise: 0.0123, 72.4, 1200. */
    static String significant(double value, int digits) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            return "–";
        }
        return BigDecimal.valueOf(value)
                .round(new MathContext(digits, RoundingMode.HALF_UP))
                .toPlainString();
    }

    /** With a fixed number of decimals, so that a column aligns on the decimal sign. */
    static String fixed(double value, int decimals) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            return "–";
        }
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
        return (rounded.signum() == 0 ? rounded.abs() : rounded).toPlainString().replace("-", "−");
    }

    /** The same for a table that another program may read: a plain hyphen, and a word where there is nothing. */
    static String cell(double value, int decimals) {
        return Double.isNaN(value) ? NOTHING : fixed(value, decimals).replace("−", "-");
    }

    private static String trimmed(BigDecimal value) {
        BigDecimal shortest = value.signum() == 0 ? BigDecimal.ZERO : value.stripTrailingZeros();
        return shortest.toPlainString().replace("-", "−");
    }
}
