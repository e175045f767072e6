package clipramp.circuit;

import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;

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
    /** @throws IllegalArgumentException where the derating lies outside 0..1 */
    public Design {
        Require.fraction("resistor derating", resistorDerating);
        designators = Map.copyOf(designators);
    }

    /** Nominal line at 25 °C. */
    public Condition nominalCondition() {
        return new Condition(line.volts(), line.hertz(), Condition.SHEET_CELSIUS);
    }

    /** Whether the stage's own bridge feeds the firing supply too, so that there is no other rectifier. */
    public boolean isSuppliedByStageBridge() {
        boolean acrossIt =
                stage == Stage.BRIDGE_DC || (stage == Stage.BRIDGE_AC && clip.tap() == ClipSupply.Tap.THYRISTOR);
        return acrossIt && !clip.isIsolated() && clip.rectifier() == ClipSupply.Rectifier.BRIDGE;
    }

    /** The same design on another line. */
    public Design withLine(Line newLine) {
        return revised(design -> design.line = newLine);
    }

    /** The same design with another stage. */
    public Design withStage(Stage newStage) {
        return revised(design -> design.stage = newStage);
    }

    /** The same design with other bridge diodes. */
    public Design withStageDiodes(StageDiodes newStageDiodes) {
        return revised(design -> design.stageDiodes = newStageDiodes);
    }

    /** The same design with another load. */
    public Design withLoad(Load newLoad) {
        return revised(design -> design.load = newLoad);
    }

    /** The same design with another clipped supply. */
    public Design withClip(ClipSupply newClip) {
        return revised(design -> design.clip = newClip);
    }

    /** The same design with another ramp. */
    public Design withRamp(Ramp newRamp) {
        return revised(design -> design.ramp = newRamp);
    }

    /** The same design with another trigger. */
    public Design withTrigger(Trigger newTrigger) {
        return revised(design -> design.trigger = newTrigger);
    }

    /** The same design with another gate drive. */
    public Design withGate(GateDrive newGate) {
        return revised(design -> design.gate = newGate);
    }

    /** The same design with another thyristor. */
    public Design withThyristor(Thyristor newThyristor) {
        return revised(design -> design.thyristor = newThyristor);
    }

    /** The same design with another snubber, or none. */
    public Design withSnubber(Optional<Snubber> newSnubber) {
        return revised(design -> design.snubber = newSnubber);
    }

    /** The same design in other surroundings. */
    public Design withSurroundings(Surroundings newSurroundings) {
        return revised(design -> design.surroundings = newSurroundings);
    }

    /** The same design with other wishes. */
    public Design withWanted(Wanted newWanted) {
        return revised(design -> design.wanted = newWanted);
    }

    /** The same design with another derating of its resistors. */
    public Design withResistorDerating(double newResistorDerating) {
        return revised(design -> design.resistorDerating = newResistorDerating);
    }

    private Design revised(Consumer<Revision> change) {
        Revision revision = new Revision(this);
        change.accept(revision);
        return revision.design();
    }

    /** A design's values while one of them is being changed, so that no wither has to name all the others. */
    private static final class Revision {
        private String title;
        private String notes;
        private Document document;
        private Line line;
        private Stage stage;
        private StageDiodes stageDiodes;
        private Load load;
        private ClipSupply clip;
        private Ramp ramp;
        private Trigger trigger;
        private GateDrive gate;
        private Thyristor thyristor;
        private Optional<Snubber> snubber;
        private Surroundings surroundings;
        private Wanted wanted;
        private double resistorDerating;
        private Map<String, String> designators;

        Revision(Design design) {
            title = design.title;
            notes = design.notes;
            document = design.document;
            line = design.line;
            stage = design.stage;
            stageDiodes = design.stageDiodes;
            load = design.load;
            clip = design.clip;
            ramp = design.ramp;
            trigger = design.trigger;
            gate = design.gate;
            thyristor = design.thyristor;
            snubber = design.snubber;
            surroundings = design.surroundings;
            wanted = design.wanted;
            resistorDerating = design.resistorDerating;
            designators = design.designators;
        }

        Design design() {
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
                    resistorDerating,
                    designators);
        }
    }
}
