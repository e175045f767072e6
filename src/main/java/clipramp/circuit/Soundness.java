package clipramp.circuit;

import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.GateDrive.Polarity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Which combinations of stage, firing supply, coupling and load can work at all, and the electrical reason where one
 * cannot.
 */
public final class Soundness {
    private Soundness() {}

    /**
     * Why a combination cannot work.
     *
     * @param key the key to change, such as gate.coupling
     * @param value what stands there, such as direct
     * @param circumstance what it does not go with, such as "with stage triac"
     * @param why the electrical reason, a sentence without its full stop
     * @param remedy what to use instead, a sentence
     */
    public record Reason(String key, String value, String circumstance, String why, String remedy) {
        /** {@code gate.coupling direct with stage triac: the firing common would jump ... Use transformer ...}. */
        public String sentence() {
            return key + " " + value + " " + circumstance + ": " + why + ". " + remedy;
        }
    }

    /** Why the firing supply is not there when the stage needs it; empty where it is. */
    public static List<Reason> ofSupply(Stage stage, ClipSupply clip) {
        List<Reason> reasons = new ArrayList<>();
        String with = "with stage " + stage.word();
        if (clip.tap() == Tap.THYRISTOR && stage == Stage.HALF_WAVE) {
            reasons.add(new Reason(
                    "clip.tap",
                    clip.tap().word(),
                    with,
                    "the supply would stay off after the pulse for the whole rest of the half cycle and its common already"
                            + " is a line wire, so nothing is gained over the line itself",
                    "Use line."));
        }
        if (stage.isFullWave() && clip.rectifier() == Rectifier.DIODE) {
            reasons.add(new Reason(
                    "clip.rectifier",
                    clip.rectifier().word(),
                    with,
                    "a single diode feeds the firing circuit in every second half cycle only, so one half of the load's"
                            + " current would be missing",
                    "Use bridge."));
        }
        boolean fromLine = clip.tap() == Tap.LINE && !clip.isIsolated();
        if (stage == Stage.HALF_WAVE && fromLine && clip.rectifier() == Rectifier.BRIDGE) {
            reasons.add(jumpingCommon(with));
        }
        return reasons;
    }

    private static Reason jumpingCommon(String with) {
        return new Reason(
                "clip.rectifier",
                Rectifier.BRIDGE.word(),
                with,
                "the common of a line bridge jumps between the two line wires, while the SCR's cathode stays on one,"
                        + " and every second pulse would come under reverse anode voltage",
                "Use diode, or clip.winding.");
    }

    /** Why the pulse does not reach the gate, or something else does; empty for a sound coupling. */
    public static List<Reason> ofCoupling(Stage stage, ClipSupply clip, GateDrive gate) {
        List<Reason> reasons = new ArrayList<>();
        String with = "with stage " + stage.word();
        boolean direct = gate.coupling() == Coupling.DIRECT;
        if (direct && stage == Stage.INVERSE_PARALLEL) {
            reasons.add(new Reason(
                    "gate.coupling",
                    "direct",
                    with,
                    "the two cathodes stand on different sides of the pair, and one firing common cannot be both",
                    "Use transformer with secondaries: 2."));
        } else if (direct && !clip.isIsolated() && jumps(stage, clip)) {
            reasons.add(new Reason(
                    "gate.coupling",
                    "direct",
                    stage == Stage.BRIDGE_AC ? with + " and clip.tap line" : with,
                    "the firing common would jump between the line wires",
                    stage == Stage.BRIDGE_AC
                            ? "Use transformer, clip.winding, or clip.tap thyristor."
                            : "Use transformer, or clip.winding."));
        }
        reasons.addAll(ofSecondaries(stage, gate, with));
        reasons.addAll(ofPolarity(stage, gate, with));
        return reasons;
    }

    // Only a bridge that is the stage's own has its negative on the thyristor's cathode.
    private static boolean jumps(Stage stage, ClipSupply clip) {
        return switch (stage) {
            case TRIAC -> true;
            case BRIDGE_AC -> clip.tap() == Tap.LINE;
            default -> false;
        };
    }

    private static List<Reason> ofSecondaries(Stage stage, GateDrive gate, String with) {
        if (gate.transformer().isEmpty()) {
            return List.of();
        }
        int secondaries = gate.transformer().get().secondaries();
        boolean two = stage == Stage.INVERSE_PARALLEL;
        if (two == (secondaries == 2)) {
            return List.of();
        }
        return List.of(new Reason(
                "gate.transformer.secondaries",
                String.valueOf(secondaries),
                with,
                two
                        ? "two gates at different potentials need a secondary each"
                        : "there is one gate, and it needs one secondary",
                two ? "Use 2." : "Use 1."));
    }

    private static List<Reason> ofPolarity(Stage stage, GateDrive gate, String with) {
        if (gate.polarity() == Polarity.POSITIVE) {
            return List.of();
        }
        if (stage != Stage.TRIAC) {
            return List.of(new Reason(
                    "gate.polarity",
                    "negative",
                    with,
                    "an SCR is turned on by a positive gate pulse only",
                    "Use positive."));
        }
        return gate.coupling() == Coupling.DIRECT
                ? List.of(new Reason(
                        "gate.polarity",
                        "negative",
                        "with gate.coupling direct",
                        "the pulse at base one is positive, and only a transformer can turn it over",
                        "Use positive, or coupling transformer."))
                : List.of();
    }

    /**
     * Why the stage cannot let go of the load's current; empty where it can.
     *
     * @param stage the stage
     * @param load the load
     * @param snubber across the thyristor, if there is one
     * @param device the thyristor, where it could be read; its turn-off time counts as known where it could not
     */
    public static List<Reason> ofLoad(
            Stage stage, Load load, Optional<Snubber> snubber, Optional<ThyristorDevice> device) {
        if (!(load instanceof Load.Inductive inductive)) {
            return List.of();
        }
        String with = "with stage " + stage.word();
        boolean freewheel = inductive.freewheel().isPresent();
        if (stage == Stage.BRIDGE_DC && !freewheel) {
            return List.of(new Reason(
                    "load.kind",
                    "inductive",
                    with,
                    "without a freewheeling diode across the load its current goes on through the bridge and the SCR never"
                            + " turns off",
                    "Give load.freewheel, such as {drop: 0.9 V}."));
        }
        boolean turnOffKnown = device.map(d -> d.turnOffSeconds().isPresent()).orElse(true);
        if (stage == Stage.BRIDGE_AC && (snubber.isEmpty() || !turnOffKnown)) {
            return List.of(turnOffUnjudged(with, snubber.isPresent(), turnOffKnown));
        }
        if (freewheel && stage.isFullWave() && stage != Stage.BRIDGE_DC) {
            return List.of(new Reason(
                    "load.freewheel",
                    "given",
                    with,
                    "a diode across an alternating load shorts every second half cycle",
                    "Use load.freewheel: none."));
        }
        return List.of();
    }

    private static Reason turnOffUnjudged(String with, boolean snubbed, boolean turnOffKnown) {
        String lacking = snubbed
                ? "its profile states no turn-off time"
                : turnOffKnown ? "there is no snubber" : "there is neither a snubber nor a stated turn-off time";
        return new Reason(
                "load.kind",
                "inductive",
                with,
                "when the current reaches zero the bridge puts forward voltage on the SCR at once; whether it has turned"
                        + " off by then cannot be judged, for " + lacking,
                "Use stage inverse-parallel or triac, or bridge-dc with load.freewheel; or give snubber, such as"
                        + " {resistance: 100 ohm, capacitance: 100 nF}, and an SCR whose turn-off is known.");
    }

    /** Why the device is not one that the stage is built of; empty where it is. */
    public static List<Reason> ofDevice(Stage stage, ThyristorDevice.Kind kind) {
        boolean triac = kind == ThyristorDevice.Kind.TRIAC;
        if (triac == (stage == Stage.TRIAC)) {
            return List.of();
        }
        return List.of(new Reason(
                "thyristor.device",
                kind.word(),
                "with stage " + stage.word(),
                triac
                        ? "this stage is built of SCRs"
                        : "an SCR conducts one way, and this stage is one device that conducts both",
                triac ? "Use an SCR, or stage triac." : "Use a triac, or stage inverse-parallel."));
    }
}
