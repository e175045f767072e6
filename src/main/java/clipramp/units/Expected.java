package clipramp.units;

/**
 * What a place takes: a unit, a plausible window, and whether tolerances and ratings may follow.
 *
 * @param unit the unit
 * @param low least plausible value, as {@link Quantity#value} counts; NEGATIVE_INFINITY for none
 * @param high greatest plausible value, counted alike; POSITIVE_INFINITY for none
 * @param tolerance whether a tolerance may follow
 * @param ratings whether ratings in W and V may follow
 * @param bare whether angles and temperatures may come without unit, as degrees and °C (options only)
 */
public record Expected(Unit unit, double low, double high, boolean tolerance, boolean ratings, boolean bare) {

    /** Any value of a unit. */
    public static Expected any(Unit unit) {
        return new Expected(unit, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, false, false, false);
    }

    /** A value within a plausible window, ends included, counted as {@link Quantity#value} is. */
    public static Expected within(Unit unit, double low, double high) {
        return new Expected(unit, low, high, false, false, false);
    }

    /** A resistor or capacitor within a plausible window in ohms or farads: tolerance and ratings may follow. */
    public static Expected part(Unit unit, double low, double high) {
        return new Expected(unit, low, high, true, true, false);
    }

    /** The same, where a tolerance may follow. */
    public Expected withTolerance() {
        return new Expected(unit, low, high, true, ratings, bare);
    }

    /** The same, where 90 means degrees and 25 means °C. */
    public Expected allowingBare() {
        return new Expected(unit, low, high, tolerance, ratings, true);
    }

    /** The window in words: "100 Ω..1 MΩ", or "a resistance, such as 10 kΩ" where there is no window. */
    public String inWords() {
        boolean from = low > Double.NEGATIVE_INFINITY;
        boolean to = high < Double.POSITIVE_INFINITY;
        if (from && to) {
            return QuantityText.format(low, unit) + ".." + QuantityText.format(high, unit);
        }
        if (from) {
            return QuantityText.format(low, unit) + " or more";
        }
        return to ? QuantityText.format(high, unit) + " or less" : unit.noun() + ", such as " + unit.example();
    }

    boolean admits(double value) {
        return value >= low && value <= high;
    }
}
