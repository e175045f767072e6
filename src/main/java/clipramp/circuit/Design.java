package clipramp.circuit;

import java.util.Map;

/**
 * A whole design: one line-synchronised firing circuit with its thyristor and load.
 *
 * @param title what it is called
 * @param notes free text
 * @param document title block
 * @param line the line
 * @param stage thyristor, bridge and load
 * @param stageDiodes the stage's bridge diodes
 * @param load the load
 * @param clip the clipped supply
 * @param ramp the ramp
 * @param trigger trigger device and base resistors
 * @param gate gate drive
 * @param thyristor thyristor and its sink
 * @param surroundings ambient temperatures
 * @param wanted what the knob is to reach
 * @param resistorDerating share of its rating that a resistor may use, 0..1
 * @param designators the drawing's own names by key, such as ramp.capacitor to C3
 */
public record Design(
        String title,
        String notes,
        Document document,
        Line line,
        Stage stage,
        StageDiodes stageDiodes,
        Load load,
        ClipSupply clip,
        Ramp ramp,
        Trigger trigger,
        GateDrive gate,
        Thyristor thyristor,
        Surroundings surroundings,
        Wanted wanted,
        double resistorDerating,
        Map<String, String> designators) {
    public Design {
        Require.fraction("resistor derating", resistorDerating);
        designators = Map.copyOf(designators);
    }

    /** Nominal line at 25 °C. */
    public Condition nominalCondition() {
        return new Condition(line.volts(), line.hertz(), 25);
    }
}
