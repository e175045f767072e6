package clipramp.faults;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Pot;
import clipramp.circuit.Stage;
import clipramp.circuit.Trigger;
import clipramp.engine.Network;
import clipramp.firing.Pulse;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;

/** Faults of the parts that make the pulse: supply, ramp, trigger device, gate drive. */
final class FiringFaults {
    /** An open part: so large that no instrument would tell, and the engine's sums still carry it, ohm. */
    static final double OPEN_OHMS = 1e9;

    /** A shorted part: a solder joint, ohm. */
    static final double SHORT_OHMS = 0.01;

    /** A shorted ramp capacitor holds its 0 V: one too large to charge in any number of half cycles, F. */
    private static final double HOLDING_FARADS = 1e9;

    /** A voltage that no part of this circuit reaches, V. */
    private static final double NEVER_VOLTS = 1e7;

    /** A current that no part of this circuit reaches, A. */
    static final double NEVER_AMPS = 1e6;

    private static final double DRIFTED_UP = 2;
    private static final double DRIFTED_DOWN = 0.5;

    /** An open capacitor's emitter follows the supply at once; this is soon enough for any instrument, s. */
    private static final double AT_ONCE_SECONDS = 1e-4;

    /** Knee of a shorted zener: none, but for a millivolt that keeps its start apart from the supply's, V. */
    private static final double SHORT_VOLTS = 1e-3;

    private final Design design;
    private final Map<String, String> names;
    private final List<Fault> faults = new ArrayList<>();

    private FiringFaults(Design design, Map<String, String> names) {
        this.design = design;
        this.names = names;
    }

    /**
     * All of them, in the order of the signal.
     *
     * @param design the design
     * @param names designators by key
     * @param midOhms R_E at mid-knob, ohm
     * @param healthy the healthy circuit's pulse there, if there is one
     */
    static List<Fault> of(Design design, Map<String, String> names, double midOhms, Optional<Pulse> healthy) {
        FiringFaults all = new FiringFaults(design, names);
        all.supply();
        all.ramp();
        all.capacitor(leakThatSilences(midOhms, healthy));
        all.trigger();
        all.gate();
        return all.faults;
    }

    /** Notes a fault; @ in its words stands for the part's designator. */
    private void add(String id, String part, How how, String what, Consumer<Network> change) {
        String words = what.replace("@", names.getOrDefault(part, part));
        faults.add(Fault.of(id, part, how, words, network -> {
            change.accept(network);
            network.derive();
        }));
    }

    private void say(String remark) {
        reviseLast(fault -> fault.saying(remark));
    }

    private void reviseLast(UnaryOperator<Fault> change) {
        faults.add(change.apply(faults.remove(faults.size() - 1)));
    }

    private void supply() {
        if (design.clip().winding().isPresent()) {
            add("winding-open", "clip.winding", How.OPEN, "winding @ open", n -> n.dropperOhms = OPEN_OHMS);
        }
        add("dropper-open", "clip.dropper", How.OPEN, "dropper @ open", n -> n.dropperOhms = OPEN_OHMS);
        add("dropper-shorted", "clip.dropper", How.SHORTED, "dropper @ shorted", n -> n.dropperOhms = SHORT_OHMS);
        say("The readings are those of the first instant, before anything burns."
                + (design.clip().isIsolated() ? "" : " A zener that then burns to a short puts it across the line."));
        add(
                "dropper-drifted",
                "clip.dropper",
                How.DRIFTED,
                "dropper @ drifted to twice its value",
                n -> n.dropperOhms *= DRIFTED_UP);
        add("zener-open", "clip.zener", How.OPEN, "zener @ open", n -> n.zenerKneeVolts = NEVER_VOLTS);
        add("zener-shorted", "clip.zener", How.SHORTED, "zener @ shorted", n -> {
            n.zenerKneeVolts = SHORT_VOLTS;
            n.zenerSlopeOhms = SHORT_OHMS;
            // A device without supply does nothing; said so, the engine need not follow it through the last millivolt.
            n.emitterDropVolts = NEVER_VOLTS;
        });
    }

    private void ramp() {
        double fixed = design.ramp().fixed().value();
        add("ramp-fixed-open", "ramp.fixed", How.OPEN, "fixed ramp resistor @ open", n -> n.rampOhms = OPEN_OHMS);
        if (fixed > 0) {
            add(
                    "ramp-fixed-shorted",
                    "ramp.fixed",
                    How.SHORTED,
                    "fixed ramp resistor @ shorted",
                    n -> n.rampOhms = Math.max(SHORT_OHMS, n.rampOhms - fixed));
        }
        design.ramp().trimmers().high().ifPresent(t -> trimmer("trim-high-open", "ramp.trim-high", OPEN_OHMS));
        design.ramp().pot().ifPresent(pot -> pot(pot, design.ramp().seriesOhms()));
    }

    private void trimmer(String id, String key, double rampOhms) {
        add(id, key, How.OPEN, "trimmer @ open", n -> n.rampOhms = rampOhms);
    }

    private void pot(Pot pot, double fixed) {
        double shunt = design.ramp().acrossOhms();
        add(
                "wiper-open",
                "ramp.pot.track",
                How.OPEN,
                "wiper of @ open",
                n -> n.rampOhms = Math.min(OPEN_OHMS, fixed + shunt));
        add(
                "wiper-open-tied",
                "ramp.pot.track",
                How.OPEN,
                "wiper of @ open, free end of its track tied to it",
                n -> n.rampOhms = fixed + Pot.ohms(1, pot.endOhms(), pot.track().value(), shunt));
        if (pot.shunt().isPresent()) {
            add("pot-shunt-open", "ramp.pot.shunt", How.OPEN, "resistor @ across the pot open", n -> {
                double used = n.rampOhms - fixed;
                n.rampOhms = fixed + (used < shunt ? 1 / (1 / used - 1 / shunt) : OPEN_OHMS);
            });
        }
    }

    /** A leak that holds the ramp of mid-knob just under its peak point, ohm: R_E V_P/(V_S - V_P). */
    private static OptionalDouble leakThatSilences(double midOhms, Optional<Pulse> healthy) {
        return healthy.stream()
                .filter(pulse -> pulse.supplyVolts() > pulse.peakPointVolts())
                .mapToDouble(pulse -> midOhms * pulse.peakPointVolts() / (pulse.supplyVolts() - pulse.peakPointVolts()))
                .findFirst();
    }

    private void capacitor(OptionalDouble leak) {
        String key = "ramp.capacitor";
        add("capacitor-open", key, How.OPEN, "ramp capacitor @ open", n -> {
            n.capacitorFarads = AT_ONCE_SECONDS / n.rampOhms;
            n.peakCurrentAmps = NEVER_AMPS;
        });
        say("Without a charge behind it the trigger device comes to rest on its falling branch, at its peak point or"
                + " below: TP2 is the most that it can be.");
        add("capacitor-shorted", key, How.SHORTED, "ramp capacitor @ shorted", n -> n.capacitorFarads = HOLDING_FARADS);
        leak.ifPresent(ohms -> {
            add(
                    "capacitor-leaky",
                    key,
                    How.LEAKY,
                    "ramp capacitor @ leaks, " + Said.ohms(ohms),
                    network -> Leak.across(network, ohms / (network.rampOhms + ohms)));
            reviseLast(fault -> fault.leaking(ohms));
            say("That leak just holds the ramp of mid-knob under its peak point; a smaller resistance silences more of"
                    + " the travel. The energy of the pulses that remain is not computed.");
        });
        add(
                "capacitor-drifted",
                key,
                How.DRIFTED,
                "ramp capacitor @ lost half its value",
                n -> n.capacitorFarads *= DRIFTED_DOWN);
    }

    private void trigger() {
        boolean programmable = design.trigger() instanceof Trigger.ProgrammableTrigger;
        add(
                "trigger-dead",
                "trigger.device",
                How.DEAD,
                (programmable ? "programmable unijunction @ dead (anode open)" : "unijunction @ dead (emitter open)"),
                n -> n.emitterDropVolts = NEVER_VOLTS);
        triggerResistors(programmable);
    }

    private void triggerResistors(boolean programmable) {
        if (programmable) {
            add("upper-open", "trigger.upper", How.OPEN, "upper divider resistor @ open", n -> n.upperOhms = OPEN_OHMS);
            add("lower-open", "trigger.lower", How.OPEN, "lower divider resistor @ open", n -> n.lowerOhms = OPEN_OHMS);
        } else {
            add(
                    "base-two-open",
                    "trigger.base-two",
                    How.OPEN,
                    "base-two resistor @ open",
                    n -> n.baseTwoOhms = OPEN_OHMS);
            add(
                    "base-two-shorted",
                    "trigger.base-two",
                    How.SHORTED,
                    "base-two resistor @ shorted",
                    n -> n.baseTwoOhms = SHORT_OHMS);
        }
        add("base-one-open", "trigger.base-one", How.OPEN, "base-one resistor @ open", n -> n.baseOneOhms = OPEN_OHMS);
        add(
                "base-one-shorted",
                "trigger.base-one",
                How.SHORTED,
                "base-one resistor @ shorted",
                n -> n.baseOneOhms = SHORT_OHMS);
    }

    private void gate() {
        GateDrive gate = design.gate();
        gate.transformer()
                .ifPresent(t -> add(
                        "primary-open",
                        "gate.transformer",
                        How.OPEN,
                        "primary of @ open",
                        n -> n.gateSeriesOhms = OPEN_OHMS));
        boolean pair = design.stage() == Stage.INVERSE_PARALLEL;
        gateLeadOpen(pair);
        gate.shunt()
                .ifPresent(shunt -> add(
                        "gate-shunt-open",
                        "gate.shunt",
                        How.OPEN,
                        "gate-cathode resistor @ open",
                        n -> n.gateShuntSiemens = 0));
        if (!pair) {
            add(
                    "gate-shorted",
                    "thyristor.device",
                    How.SHORTED,
                    "gate of @ shorted to its cathode",
                    n -> n.gateShuntSiemens = 1 / SHORT_OHMS);
        }
    }

    private void gateLeadOpen(boolean pair) {
        if (pair) {
            add("gate-open", "gate.series", How.OPEN, "one gate lead (@) open", n -> {});
            reviseLast(fault -> fault.along(LoadPath.ONE_HALF));
            say("TP4 is the other thyristor's gate.");
        } else {
            add("gate-open", "gate.series", How.OPEN, "gate lead (@) open", n -> n.gateSeriesOhms = OPEN_OHMS);
        }
    }
}
