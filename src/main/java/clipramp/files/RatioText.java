package clipramp.files;

import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;

/** Reads a ratio: 2, or 2:1. */
final class RatioText {
    private static final Expected SIDE = Expected.within(Unit.NUMBER, 1e-3, 1e6);

    private RatioText() {}

    /**
     * @throws RefusedQuantityException where a side is no number or the ratio lies outside its window
     */
    static double read(String text, Expected expected) {
        int colon = text.indexOf(':');
        if (colon < 0) {
            return QuantityReader.read(text, expected).value();
        }
        double over = QuantityReader.read(text.substring(0, colon), SIDE).value();
        double under = QuantityReader.read(text.substring(colon + 1), SIDE).value();
        return QuantityReader.read(Double.toString(over / under), expected).value();
    }
}
