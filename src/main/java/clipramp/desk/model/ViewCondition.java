package clipramp.desk.model;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.OptionalDouble;

/** The condition that lanes, knob and margins are shown at. */
public enum ViewCondition {
    /** Lanes and knob nominal, every margin at its worst. */
    WORST("worst case"),
    /** Nominal line, 25 °C. */
    NOMINAL("nominal"),
    /** The lowest line that the design must work at. */
    LOW_LINE("low line"),
    /** The highest. */
    HIGH_LINE("high line"),
    /** The coldest ambient. */
    COLD("cold"),
    /** The hottest. */
    HOT("hot");

    private static final double ROOM_CELSIUS = 25;

    private final String word;

    ViewCondition(String word) {
        this.word = word;
    }

    /** What it is called. */
    public String word() {
        return word;
    }

    /** What lanes and knob are solved at. */
    Condition solvedAt(Design design) {
        return new Condition(
                pinnedLineVolts(design).orElse(design.line().volts()),
                design.line().hertz(),
                pinnedCelsius(design).orElse(ROOM_CELSIUS));
    }

    /** The only line voltage that margins are judged at, V; empty for low, nominal and high. */
    OptionalDouble pinnedLineVolts(Design design) {
        return switch (this) {
            case NOMINAL -> OptionalDouble.of(design.line().volts());
            case LOW_LINE -> OptionalDouble.of(design.line().lowVolts());
            case HIGH_LINE -> OptionalDouble.of(design.line().highVolts());
            case WORST, COLD, HOT -> OptionalDouble.empty();
        };
    }

    /** The only temperature that margins are judged at, °C; empty for coldest, 25 °C and hottest. */
    OptionalDouble pinnedCelsius(Design design) {
        return switch (this) {
            case NOMINAL -> OptionalDouble.of(ROOM_CELSIUS);
            case COLD -> OptionalDouble.of(design.surroundings().coldestCelsius());
            case HOT -> OptionalDouble.of(design.surroundings().hottestCelsius());
            case WORST, LOW_LINE, HIGH_LINE -> OptionalDouble.empty();
        };
    }

    /** What holds for which figures, in words. */
    public String explained(Design design) {
        Condition at = solvedAt(design);
        String solved =
                QuantityText.format(at.lineVolts(), Unit.VOLT) + ", " + QuantityText.format(at.celsius(), Unit.CELSIUS);
        return switch (this) {
            case WORST -> "Lanes and knob at " + solved + "; every margin where line and temperature make it worst";
            case NOMINAL -> "Everything at " + solved + ", margins too";
            case LOW_LINE, HIGH_LINE ->
                "Lanes and knob at " + solved + "; margins on this line, at their worst temperature";
            case COLD, HOT -> "Lanes and knob at " + solved + "; margins at this temperature, on their worst line";
        };
    }
}
