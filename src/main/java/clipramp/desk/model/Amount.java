package clipramp.desk.model;

import clipramp.units.QuantityText;
import clipramp.units.Unit;

/** An amount with its unit symbol, as rows show it. */
final class Amount {
    private static final int DIGITS = 3;

    private Amount() {}

    /**
     * Three significant digits and an engineering prefix.
     *
     * @param value in SI units; angles in degrees where the symbol is a degree sign
     * @param symbol SI unit symbol, empty for a plain number
     */
    static String text(double value, String symbol) {
        if (Double.isNaN(value)) {
            return "–";
        }
        if (symbol.equals("°") || symbol.equals("deg")) {
            return QuantityText.number(value, DIGITS) + "°";
        }
        for (Unit unit : Unit.values()) {
            if (unit.symbol().equals(symbol)) {
                return QuantityText.format(value, unit, DIGITS);
            }
        }
        return (QuantityText.number(value, DIGITS) + " " + symbol).strip();
    }
}
