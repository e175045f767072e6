package clipramp.cli;

import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;

/** Figures as people read them; what there is no figure for is a dash. */
final class Shown {
    static final String NONE = "–";

    private static final int FIGURES = 3;
    private static final List<String> LARGE_PREFIXES = List.of("", "k", "M", "G");
    /** Units whose value inside is not the figure that stands before their symbol. */
    private static final Set<Unit> SCALED = EnumSet.of(Unit.ANGLE, Unit.FRACTION, Unit.PER_KELVIN);

    private Shown() {}

    /** A fixed number of decimals, so that a column lines up. */
    static String fixed(double value, int decimals) {
        return Double.isFinite(value) ? QuantityText.fixed(value, decimals) : NONE;
    }

    /** Radians as degrees with one decimal, without the sign. */
    static String degrees(OptionalDouble rad) {
        return fixed(Math.toDegrees(rad.orElse(Double.NaN)), 1);
    }

    /** Three figures and the prefix that fits, such as 147 mA; a dash where there is no figure. */
    static String amount(double value, Unit unit) {
        return Double.isFinite(value) ? QuantityText.format(value, unit, FIGURES) : NONE;
    }

    /** The same where the unit is a symbol, such as A; one that the program does not know keeps plain figures. */
    static String amount(double value, String symbol) {
        for (Unit unit : Unit.values()) {
            if (unit.symbol().equals(symbol) && !SCALED.contains(unit)) {
                return amount(value, unit);
            }
        }
        return Double.isFinite(value) ? QuantityText.number(value, FIGURES) + " " + symbol : NONE;
    }

    /** Such as kΩ: the unit in which the largest of a column's values lies between 1 and 1000. */
    static Scale scaleFor(double largest, Unit unit) {
        int thousands = largest > 0 ? (int) Math.floor(Math.log10(largest) / 3 + 1e-12) : 0;
        int power = Math.max(0, Math.min(LARGE_PREFIXES.size() - 1, thousands));
        double divisor = Math.pow(1000, power);
        int whole = largest > 0 ? (int) Math.floor(Math.log10(largest / divisor)) + 1 : 1;
        int decimals = Math.min(3, Math.max(1, FIGURES + 1 - whole));
        return new Scale(divisor, LARGE_PREFIXES.get(power) + unit.symbol(), decimals);
    }

    /**
     * @param divisor what a value is divided by
     * @param unit the unit with its prefix
     * @param decimals how many decimals the column carries
     */
    record Scale(double divisor, String unit, int decimals) {
        String of(double value) {
            return fixed(value / divisor, decimals);
        }
    }
}
