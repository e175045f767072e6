package clipramp.circuit;

import java.util.Map;
import java.util.Optional;

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
 * @param snubber resistor and capacitor across the thyristor, if there are any
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
        Optional<Snubber> snubber,
        Surroundings surroundings,
        Wanted wanted,
        double resistorDerating,
        Map<String, String> designators) {
    public Design {
        Require.fraction("resistor derating", resistorDerating);
        designators = Map.copyOf(designators);
    }

    /** A design without a snubber. */
    public Design(
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
        this(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                Optional.empty(),
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** Nominal line at 25 °C. */
    public Condition nominalCondition() {
        return new Condition(line.volts(), line.hertz(), 25);
    }

    /** Whether the stage's own bridge feeds the firing supply too, so that there is no other rectifier. */
    public boolean isSuppliedByStageBridge() {
        boolean acrossIt =
                stage == Stage.BRIDGE_DC || (stage == Stage.BRIDGE_AC && clip.tap() == ClipSupply.Tap.THYRISTOR);
        return acrossIt && !clip.isIsolated() && clip.rectifier() == ClipSupply.Rectifier.BRIDGE;
    }

    /** The same design on another line. */
    public Design withLine(Line newLine) {
        return new Design(
                title,
                notes,
                document,
                newLine,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another stage. */
    public Design withStage(Stage newStage) {
        return new Design(
                title,
                notes,
                document,
                line,
                newStage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with other bridge diodes. */
    public Design withStageDiodes(StageDiodes newStageDiodes) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                newStageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another load. */
    public Design withLoad(Load newLoad) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                newLoad,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another clipped supply. */
    public Design withClip(ClipSupply newClip) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                newClip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another ramp. */
    public Design withRamp(Ramp newRamp) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                newRamp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another trigger. */
    public Design withTrigger(Trigger newTrigger) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                newTrigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another gate drive. */
    public Design withGate(GateDrive newGate) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                newGate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another thyristor. */
    public Design withThyristor(Thyristor newThyristor) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                newThyristor,
                snubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with another snubber, or none. */
    public Design withSnubber(Optional<Snubber> newSnubber) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                newSnubber,
                surroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design in other surroundings. */
    public Design withSurroundings(Surroundings newSurroundings) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                newSurroundings,
                wanted,
                resistorDerating,
                designators);
    }

    /** The same design with other wishes. */
    public Design withWanted(Wanted newWanted) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                newWanted,
                resistorDerating,
                designators);
    }

    /** The same design with another derating of its resistors. */
    public Design withResistorDerating(double newResistorDerating) {
        return new Design(
                title,
                notes,
                document,
                line,
                stage,
                stageDiodes,
                load,
                clip,
                ramp,
                trigger,
                gate,
                thyristor,
                snubber,
                surroundings,
                wanted,
                newResistorDerating,
                designators);
    }
}
