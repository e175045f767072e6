package clipramp.circuit;

/**
 * Resistor and capacitor in series across the thyristor (or the pair, or the triac): limits how fast voltage comes back
 * when an inductive load's current dies.
 *
 * @param resistanceOhms resistor, ohm, above 0
 * @param capacitanceFarads capacitor, F, above 0
 */
public record Snubber(double resistanceOhms, double capacitanceFarads) {
    /** @throws IllegalArgumentException outside the stated ranges */
    public Snubber {
        Require.positive("snubber resistance", resistanceOhms);
        Require.positive("snubber capacitance", capacitanceFarads);
    }
}
