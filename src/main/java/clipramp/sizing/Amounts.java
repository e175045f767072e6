package clipramp.sizing;

import clipramp.units.QuantityText;
import clipramp.units.Unit;

/** Figures of margins in words. */
final class Amounts {
    private static final int FIGURES = 3;

    private Amounts() {}

    /** A value with the unit symbol that a margin carries; a bare number where that is empty. */
    static String of(double value, String symbol) {
        for (Unit unit : Unit.values()) {
            if (!symbol.isEmpty() && unit.symbol().equals(symbol) && unit != Unit.ANGLE) {
                return QuantityText.format(value, unit, FIGURES);
            }
        }
        return symbol.equals("deg") ? QuantityText.number(value, FIGURES) + "°" : QuantityText.number(value, FIGURES);
    }
}
