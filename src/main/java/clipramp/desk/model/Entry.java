package clipramp.desk.model;

import clipramp.files.Key;
import clipramp.files.KeyCatalogue;
import clipramp.units.LenientEntry;
import clipramp.units.Quantity;
import clipramp.units.QuantityText;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.Optional;

/**
 * A value as typed into the strip, before the design is read with it.
 *
 * @param text the text to write: a decimal comma has become a dot
 * @param understood what it was understood as, such as "4.7 kΩ"; empty where the key takes no quantity
 * @param refusal why it is not taken; empty where it is
 */
public record Entry(String text, String understood, String refusal) {
    /** Reads what was typed at a key. */
    public static Entry read(String key, String typed) {
        String plain = typed.strip();
        Optional<Key> known = KeyCatalogue.standard().find(key);
        if (known.isEmpty() || plain.isEmpty() || plain.equals("none") || !takesQuantity(known.get())) {
            return new Entry(plain.isEmpty() ? "none" : plain, "", "");
        }
        try {
            LenientEntry entry = LenientEntry.read(plain, known.get().expected());
            return new Entry(entry.text(), inWords(entry.quantity()), "");
        } catch (RefusedQuantityException e) {
            return new Entry(plain, "", e.refusal().message());
        }
    }

    private static boolean takesQuantity(Key key) {
        return key.kind() == Key.Kind.PART || key.kind() == Key.Kind.QUANTITY;
    }

    private static String inWords(Quantity quantity) {
        String value = QuantityText.format(quantity.value(), quantity.unit());
        return quantity.hasTolerance()
                ? value + " −" + QuantityText.format(quantity.minus(), Unit.FRACTION) + " +"
                        + QuantityText.format(quantity.plus(), Unit.FRACTION)
                : value;
    }
}
