package clipramp.units;

import java.util.List;

/**
 * A band {@code 2 %..5 %}, or one value as a band without width.
 *
 * @param low low end
 * @param high high end, in the same unit and not under it
 */
public record Band(Quantity low, Quantity high) {

    /** @throws IllegalArgumentException where the units differ or the ends are out of order */
    public Band {
        if (low.unit() != high.unit() || low.value() > high.value()) {
            throw new IllegalArgumentException("a band runs from low to high in one unit, not " + low + ".." + high);
        }
    }

    /**
     * The band that a text means.
     *
     * @param text one value, or two joined by two dots, each with its unit
     * @param choices what the place takes, at least one
     * @throws RefusedQuantityException where an end is refused, the units differ or the ends are out of order
     */
    public static Band read(String text, List<Expected> choices) {
        int dots = text.indexOf("..");
        if (dots < 0) {
            Quantity only = QuantityReader.readOneOf(text, choices);
            return new Band(only, only);
        }
        String from = text.substring(0, dots).strip();
        String to = text.substring(dots + 2).strip();
        Quantity low = QuantityReader.readOneOf(from, choices);
        Quantity high = QuantityReader.readOneOf(to, choices);
        if (low.unit() != high.unit()) {
            throw refused(text, "both ends of a band in one unit", "");
        }
        if (low.value() > high.value()) {
            throw refused(text, "a band from low to high", to + ".." + from + "?");
        }
        return new Band(low, high);
    }

    private static RefusedQuantityException refused(String text, String expected, String suggestion) {
        return new RefusedQuantityException(new Refusal(text.strip(), "", expected, suggestion));
    }
}
