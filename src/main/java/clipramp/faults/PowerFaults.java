package clipramp.faults;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.Winding;
import clipramp.engine.Network;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;

/** Faults of thyristor, rectifiers and load. */
final class PowerFaults {
    private final Design design;
    private final Map<String, String> names;
    private final List<Fault> faults = new ArrayList<>();

    private PowerFaults(Design design, Map<String, String> names) {
        this.design = design;
        this.names = names;
    }

    /** All of them, in the order of the signal; designators come by key. */
    static List<Fault> of(Design design, Map<String, String> names) {
        PowerFaults all = new PowerFaults(design, names);
        all.thyristor();
        all.stageDiodes();
        all.rectifier();
        all.load();
        return all.faults;
    }

    private Fault fault(String id, String part, How how, String what, Consumer<Network> change) {
        return Fault.of(id, part, how, what.replace("@", names.getOrDefault(part, part)), change);
    }

    private boolean fedAcrossThyristor() {
        return design.clip().tap() == Tap.THYRISTOR;
    }

    /** What a supply across the thyristor gets once there is no voltage there any more. */
    private Consumer<Network> unfed() {
        return fedAcrossThyristor() ? n -> n.dropperOhms = FiringFaults.OPEN_OHMS : n -> {};
    }

    private static void neverTriggers(Network network) {
        network.triggerAmps = FiringFaults.NEVER_AMPS;
    }

    private void thyristor() {
        String key = "thyristor.device";
        boolean pair = design.stage() == Stage.INVERSE_PARALLEL;
        Fault shorted = fault(
                        "thyristor-shorted",
                        key,
                        How.SHORTED,
                        pair ? "one of @ shorted" : "thyristor @ shorted",
                        unfed())
                .along(LoadPath.THYRISTOR_SHORTED);
        faults.add(
                design.stage() == Stage.HALF_WAVE
                        ? shorted.saying("The load gets both half cycles: more than this stage ever gives.")
                        : shorted);
        boolean bothWays = pair || design.thyristor().device().kind() == Kind.TRIAC;
        if (bothWays) {
            faults.add(fault(
                            "thyristor-half-dead",
                            key,
                            How.HALF_DEAD,
                            pair ? "one of @ dead" : "triac @ dead in one direction",
                            n -> {})
                    .along(LoadPath.ONE_HALF));
        }
        if (!pair) {
            faults.add(fault("thyristor-dead", key, How.DEAD, "thyristor @ dead (open)", PowerFaults::neverTriggers));
        }
    }

    private void stageDiodes() {
        if (design.stage().bridgeDiodes() == 0) {
            return;
        }
        Fault open = fault("stage-diode-open", "stage-diodes", How.OPEN, "one diode of @ open", n -> {})
                .along(LoadPath.ONE_HALF);
        faults.add(
                design.isSuppliedByStageBridge()
                        ? open.wired(design -> suppliedInOneHalf(design, Rectifier.BRIDGE.diodesInPath()))
                        : open);
        faults.add(
                design.stage() == Stage.BRIDGE_DC
                        ? lineShort("stage-diode-shorted", "stage-diodes")
                        : pastTheThyristor("stage-diode-shorted", "stage-diodes", "one diode of @ shorted")
                                .saying("The load is in series, so nothing is shorted: through the bad diode and its"
                                        + " neighbour every second half cycle reaches the load whole, past the"
                                        + " thyristor (computed with the thyristor's drop)."));
    }

    /** A short beside the thyristor that carries one polarity of the load's current. */
    private Fault pastTheThyristor(String id, String part, String what) {
        Fault shorted = fault(id, part, How.SHORTED, what, n -> {}).along(LoadPath.OTHER_HALF_FREE);
        boolean fed = design.isSuppliedByStageBridge() || fedAcrossThyristor();
        return fed ? shorted.wired(design -> suppliedInOneHalf(design, Rectifier.BRIDGE.diodesInPath())) : shorted;
    }

    /** A shorted diode of a bridge across the line lets its neighbour short the line in every second half cycle. */
    private Fault lineShort(String id, String part) {
        return fault(id, part, How.SHORTED, "one diode of @ shorted", n -> n.dropperOhms = FiringFaults.OPEN_OHMS)
                .along(LoadPath.LINE_SHORTED);
    }

    private void rectifier() {
        ClipSupply clip = design.clip();
        if (design.isSuppliedByStageBridge()) {
            return;
        }
        if (clip.rectifier() == Rectifier.DIODE) {
            singleRectifier("clip.rectifier");
        } else {
            supplyBridge("clip.rectifier", clip);
        }
    }

    private void singleRectifier(String key) {
        faults.add(fault(
                "rectifier-open", key, How.OPEN, "rectifier @ open", n -> n.dropperOhms = FiringFaults.OPEN_OHMS));
        faults.add(fault(
                        "rectifier-shorted",
                        key,
                        How.SHORTED,
                        "rectifier @ shorted",
                        n -> n.reverseVolts = ReverseHalf.ZENER_VOLTS)
                .saying("The dropper carries the other half cycle too, and the zener conducts it forwards: the supply"
                        + " then stands at " + Said.volts(-ReverseHalf.ZENER_VOLTS)
                        + " (common practice), and the ramp begins from below zero."));
    }

    private void supplyBridge(String key, ClipSupply clip) {
        faults.add(fault("rectifier-open", key, How.OPEN, "one diode of the supply's bridge @ open", n -> {})
                .wired(design -> suppliedInOneHalf(design, Rectifier.BRIDGE.diodesInPath())));
        String shorted = "one diode of the supply's bridge @ shorted";
        if (clip.isIsolated()) {
            faults.add(fault("rectifier-shorted", key, How.SHORTED, shorted, n -> {})
                    .along(LoadPath.WINDING_SHORTED)
                    .wired(design -> suppliedInOneHalf(design, 1))
                    .saying(
                            "The winding is shorted in every second half cycle, and its own resistance alone limits that:"
                                    + " it burns, or its fuse opens; then it reads as with the winding open."));
        } else if (clip.tap() == Tap.LINE) {
            faults.add(lineShort("rectifier-shorted", key));
        } else {
            faults.add(pastTheThyristor("rectifier-shorted", key, shorted)
                    .saying(
                            "Through the bad diode and its neighbour every second half cycle reaches the load whole, past"
                                    + " the thyristor: that diode carries the load's current and burns next."));
        }
    }

    private void load() {
        Consumer<Network> unfed = unfed();
        faults.add(fault("load-open", "load", How.OPEN, "load @ open", n -> {
                    unfed.accept(n);
                    neverTriggers(n);
                })
                .along(LoadPath.LOAD_OPEN));
        faults.add(fault("load-shorted", "load", How.SHORTED, "load @ shorted", n -> {})
                .along(LoadPath.LOAD_SHORTED)
                .wired(design -> design.withLoad(new Load.Resistor(FiringFaults.SHORT_OHMS))));
    }

    /**
     * The supply behind a bridge that has lost a diode: one half cycle, through two diodes or, past a shorted one, through
     * one. Where the load takes the positive half only, it is that half that is lost; otherwise positive is only a name.
     */
    private static Design suppliedInOneHalf(Design design, int diodesInPath) {
        ClipSupply clip = design.clip();
        boolean loseFed = design.stage() == Stage.HALF_WAVE;
        Optional<Winding> winding = clip.winding()
                .map(w -> new Winding(w.primaryVolts(), w.secondaryVolts(), loseFed != w.opposite(), w.lagRad()));
        return design.withClip(new ClipSupply(
                clip.tap(),
                Rectifier.DIODE,
                diodesInPath * clip.diodeDropVolts(),
                clip.dropper(),
                clip.zener(),
                winding));
    }
}
