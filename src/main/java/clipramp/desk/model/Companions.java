package clipramp.desk.model;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.Trigger;
import clipramp.files.DesignText;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * What must change together: another stage asks for another rectifier or coupling (DEVELOPERS.md, The circuit laws; the table of
 * sound combinations), another coupling for a transformer or none. One choice, one step back.
 */
final class Companions {
    /** A small one-to-one pulse transformer, typical of the class, for a design that had none. */
    private static final String TRANSFORMER =
            "{ratio: 1, secondaries: %s, magnetising: 2 mH, primary-resistance: 0.5 ohm, secondary-resistance: 0.5 ohm}";

    /** A low divider: a programmable unijunction's valley current falls with the divider's resistance. */
    private static final String DIVIDER_UPPER = "1 kΩ ±1 % 0.25 W";

    private static final String DIVIDER_LOWER = "1.5 kΩ ±1 % 0.25 W";
    private static final String BASE_TWO = "470 Ω ±5 % 0.25 W";

    /**
     * One key that changes.
     *
     * @param key design key
     * @param value what is to stand there; empty to take the key out
     */
    record Change(String key, String value) {}

    private Companions() {}

    /**
     * The design's text with the choice itself and what goes with it.
     *
     * @param sheet the design as it stands
     * @param key design key that is chosen for
     * @param word the choice
     * @param programmable whether the choice is a programmable unijunction transistor
     */
    static DesignText chosen(Sheet sheet, String key, String word, boolean programmable) {
        DesignText text = sheet.text();
        for (Change change : of(key, word, sheet.design(), programmable)) {
            text = change.value().isEmpty() ? text.without(change.key()) : text.withValue(change.key(), change.value());
        }
        return text;
    }

    private static List<Change> of(String key, String word, Design design, boolean programmable) {
        List<Change> changes = new ArrayList<>();
        changes.add(new Change(key, Extra.at(key).map(f -> f.written(word)).orElse(word)));
        if (key.equals("load.kind")) {
            LoadCompanions.kind(word, design, changes);
        } else if (key.equals("stage")) {
            stage(word, design, changes);
        } else if (key.equals("gate.coupling")) {
            boolean transformer = word.equals(GateDrive.Coupling.TRANSFORMER.word());
            changes.add(new Change("gate.transformer", transformer ? transformer(1) : ""));
        } else if (key.equals("clip.winding") && !word.equals("none")) {
            changes.add(new Change("clip.tap", ClipSupply.Tap.LINE.word()));
        } else if (key.equals("trigger.device")) {
            trigger(design, programmable, changes);
        }
        return changes;
    }

    private static void trigger(Design design, boolean programmable, List<Change> changes) {
        boolean was = design.trigger() instanceof Trigger.ProgrammableTrigger;
        if (programmable && !was) {
            changes.add(new Change("trigger.base-two", ""));
            changes.add(new Change("trigger.upper", DIVIDER_UPPER));
            changes.add(new Change("trigger.lower", DIVIDER_LOWER));
        } else if (!programmable && was) {
            changes.add(new Change("trigger.upper", ""));
            changes.add(new Change("trigger.lower", ""));
            changes.add(new Change("trigger.base-two", BASE_TWO));
        }
    }

    private static void stage(String word, Design design, List<Change> changes) {
        boolean isolated = design.clip().isIsolated();
        boolean half = word.equals(Stage.HALF_WAVE.word());
        boolean acrossThyristor = word.equals(Stage.BRIDGE_AC.word()) && !isolated;
        changes.add(new Change(
                "clip.rectifier",
                (half && !isolated ? ClipSupply.Rectifier.DIODE : ClipSupply.Rectifier.BRIDGE).word()));
        changes.add(new Change("clip.tap", (acrossThyristor ? ClipSupply.Tap.THYRISTOR : ClipSupply.Tap.LINE).word()));
        boolean twin = word.equals(Stage.INVERSE_PARALLEL.word());
        boolean transformer = twin || (word.equals(Stage.TRIAC.word()) && !isolated);
        if (transformer) {
            changes.add(new Change("gate.coupling", GateDrive.Coupling.TRANSFORMER.word()));
            changes.add(new Change("gate.transformer", transformer(twin ? 2 : 1)));
        } else if (design.gate().transformer().isPresent()) {
            changes.add(new Change("gate.transformer", transformer(1)));
        }
        if (design.load() instanceof Load.Inductive) {
            Arrays.stream(Stage.values())
                    .filter(stage -> stage.word().equals(word))
                    .forEach(stage -> LoadCompanions.inductive(stage, design, changes));
        }
        boolean wasTriac = design.stage() == Stage.TRIAC;
        if (word.equals(Stage.TRIAC.word()) != wasTriac) {
            changes.add(new Change("thyristor.device", wasTriac ? "2n6404" : "2n6344"));
        }
    }

    private static String transformer(int secondaries) {
        return TRANSFORMER.replace("%s", Integer.toString(secondaries));
    }
}
