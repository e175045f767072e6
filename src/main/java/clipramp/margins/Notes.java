package clipramp.margins;

import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.gate.TriggerNeed;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** What a reader of a check should know beside its margins: the model's assumptions, with their size here. */
final class Notes {
    /** Share of the dropping resistor from which a load in series with it is told. */
    private static final double NOTICEABLE_LOAD_SHARE = 0.01;

    /** Emitter leakage whose effect is told; any other moves the ramp in proportion, A. */
    private static final double LEAKAGE_AMPS = 0.1e-6;

    private final Bench bench;
    private final Design design;
    private final Condition usual;
    private final List<Note> notes = new ArrayList<>();

    Notes(Bench bench, Condition usual) {
        this.bench = bench;
        this.design = bench.design();
        this.usual = usual;
    }

    List<Note> all() {
        add("nominal-parts", "Nominal parts; tolerances are not included, see spread.");
        load();
        selfHeating();
        leakage();
        triggerData();
        gateEnergy();
        latchedOn();
        stage();
        notes.addAll(new LoadNotes(bench, usual).all());
        return List.copyOf(notes);
    }

    private void add(String id, String text) {
        notes.add(new Note(id, text));
    }

    private void load() {
        double share = design.load().resistanceOhms() / design.clip().dropper().value();
        if (design.clip().tap() == Tap.THYRISTOR && share > NOTICEABLE_LOAD_SHARE) {
            add(
                    "load-in-series",
                    "The load's " + Say.ohms(design.load().resistanceOhms())
                            + " in series with the dropping resistor is left out; it is " + Say.share(share)
                            + " of it, and the clip comes later by about as much.");
        }
    }

    private void selfHeating() {
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger) {
            Unijunction.Limits limits = trigger.device().limits();
            heating(limits.deratingWattsPerKelvin());
        } else if (design.trigger() instanceof Trigger.ProgrammableTrigger trigger) {
            heating(trigger.device().limits().deratingWattsPerKelvin());
        }
    }

    private void heating(OptionalDouble derating) {
        double watts = bench.dissipation(usual, bench.leastOhms()).deviceWatts();
        if (derating.isPresent() && derating.getAsDouble() > 0) {
            add(
                    "self-heating",
                    "Self-heating of the trigger device is left out: " + Say.watts(watts) + " at "
                            + Say.watts(derating.getAsDouble()) + "/K would warm it by "
                            + Say.kelvin(watts / derating.getAsDouble()) + ".");
        }
    }

    private void leakage() {
        double volts = LEAKAGE_AMPS * bench.mostOhms();
        double peak = bench.solution(usual, bench.mostOhms()).shown().pulses().stream()
                .mapToDouble(Pulse::peakPointVolts)
                .findFirst()
                .orElse(Double.NaN);
        add(
                "emitter-leakage",
                "Emitter leakage is left out: every " + Say.amps(LEAKAGE_AMPS) + " of it would move the ramp by up to "
                        + Say.volts(volts) + " at the largest R_E"
                        + (Double.isNaN(peak) ? "." : ", against a peak point of " + Say.volts(peak) + "."));
    }

    private void triggerData() {
        double coldest = bench.coldest().get(0).condition().celsius();
        if (TriggerNeed.of(design, coldest).extended()) {
            add(
                    "trigger-data-extended",
                    "I_GT and V_GT at " + Say.celsius(coldest)
                            + " lie outside the sheet's points and are extended from them (from a single point: I_GT"
                            + " doubles and V_GT gains 1 V from 25 °C to -40 °C, common practice).");
        }
        ThyristorDevice device = design.thyristor().device();
        if (Stream.of(device.latching(), device.holding())
                .flatMap(Optional::stream)
                .anyMatch(curve -> curve.isExtendedAt(coldest))) {
            add(
                    "latching-data-extended",
                    "Latching and holding current at " + Say.celsius(coldest)
                            + " lie outside the sheet's points and are extended from them (a single point doubles from"
                            + " 25 °C to -40 °C, common practice).");
        }
        typicalDrive();
        if (design.gate().coupling() == Coupling.TRANSFORMER) {
            add(
                    "leakage-inductance",
                    "The pulse transformer's leakage inductance is left out: the computed gate peak is optimistic.");
        }
    }

    private void typicalDrive() {
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger
                && trigger.device()
                        .baseOnePulse()
                        .filter(pulse -> pulse.minVolts().isPresent())
                        .isEmpty()) {
            add(
                    "typical-drive",
                    "The profile states no smallest base-one pulse: the drive margins are those of a typical trigger"
                            + " device, not of the weakest.");
        }
    }

    private void gateEnergy() {
        Solution solution = bench.solution(usual, bench.midOhms());
        TriggerNeed need = TriggerNeed.of(design, usual.celsius());
        OptionalDouble turnOn = design.thyristor().device().gate().turnOnSeconds();
        solution.shown().shownPulse().ifPresent(pulse -> {
            if (turnOn.isPresent()) {
                double asked = need.volts() * need.amps() * turnOn.getAsDouble();
                add(
                        "gate-energy",
                        "The pulse at mid-knob gives the gate " + Say.joules(pulse.gateJoules())
                                + "; V_GT x I_GT x t_gt is " + Say.joules(asked) + " (information, no demand).");
            }
        });
    }

    private void latchedOn() {
        boolean latched =
                bench.solution(usual, bench.leastOhms()).halves().stream().anyMatch(HalfCycle::latchedOn);
        if (latched) {
            add(
                    "latched-on",
                    "At the smallest R_E the trigger device stays on after its first pulse. The supply's collapse"
                            + " frees it, so that pulse still fires every half cycle; what is lost are the repeated"
                            + " pulses, and "
                            + Say.watts(
                                    bench.dissipation(usual, bench.leastOhms()).deviceWatts())
                            + " heat the device.");
        }
    }

    private void stage() {
        if (design.stage() == Stage.HALF_WAVE) {
            add("half-wave-dc", "A half-wave stage draws dc from the line by its nature; the load gets at most half.");
            if (design.clip().rectifier() == Rectifier.BRIDGE) {
                add(
                        "reverse-anode-drive",
                        "The gate is also driven while the anode is negative; that raises the thyristor's reverse"
                                + " current and its heat. A single diode in the supply avoids it.");
            }
        }
    }
}
