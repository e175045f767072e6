package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.gate.TriggerNeed;
import clipramp.power.LoadResult;
import clipramp.power.PulseLength;
import clipramp.power.SnubberDuty;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What to know about the load, its snubber and the gate's shunt beside the margins. */
final class LoadNotes {
    /** Share of the trigger current from which a gate shunt's own current is told. */
    private static final double NOTICEABLE_SHUNT = 0.1;

    private final Bench bench;
    private final Design design;
    private final Condition usual;
    private final List<Note> notes = new ArrayList<>();

    LoadNotes(Bench bench, Condition usual) {
        this.bench = bench;
        this.design = bench.design();
        this.usual = usual;
    }

    List<Note> all() {
        if (design.load() instanceof Load.Filament filament) {
            filament(filament);
        }
        if (design.load() instanceof Load.Inductive inductive) {
            inductive(inductive);
        } else {
            turnOnRate();
        }
        snubber();
        gateShunt();
        return List.copyOf(notes);
    }

    private void add(String id, String text) {
        notes.add(new Note(id, text));
    }

    private void filament(Load.Filament filament) {
        LoadResult brightest = bench.load(usual, bench.leastOhms());
        LoadResult dimmest = bench.load(usual, bench.mostOhms());
        add(
                "filament",
                "The lamp's power goes as V^" + Say.number(filament.exponent())
                        + ", its light about as V^3.4 (handbook):"
                        + " from " + Say.share(dimmest.lightShare().orElse(0)) + " to "
                        + Say.share(brightest.lightShare().orElse(0))
                        + " of its light at rated voltage over the knob's travel. Latching is judged at its rated, hot"
                        + " resistance; a dimmed filament has less and takes more.");
    }

    private void inductive(Load.Inductive load) {
        double phi = PulseLength.loadAngleRad(design, usual);
        add(
                "inductive",
                "The load's angle is phi = atan(wL/R) = " + Say.angle(phi) + ", its time constant "
                        + Say.seconds(load.inductanceHenries() / load.resistanceOhms())
                        + ". Resistance and inductance are taken as fixed: a motor's change with speed, a core's with its"
                        + " current, and a core that gets direct current saturates.");
        if (load.freewheel().isPresent()) {
            add(
                    "freewheel",
                    "The freewheeling diode takes the current over at once when it offers the load the higher voltage; no"
                            + " line inductance is taken into account.");
        }
        if (design.snubber().isEmpty()) {
            add(
                    "no-snubber",
                    "Without a snubber only stray capacitance, taken as 100 pF (common practice), slows the voltage that"
                            + " comes back as the current dies.");
        }
    }

    /** What would limit di/dt is not in the design; so say what has to be there. */
    private void turnOnRate() {
        design.thyristor().device().limits().ampsPerSecond().ifPresent(limit -> {
            double crest = design.line().crestVolts(design.line().highVolts());
            add(
                    "turn-on-rate",
                    "Only the line's and the wiring's inductance limit di/dt as the thyristor turns on; at the crest of the"
                            + " high line " + Say.henries(crest / limit) + " of it keep the sheet's "
                            + Say.number(limit / 1e6) + " A/µs.");
        });
    }

    private void snubber() {
        design.snubber().ifPresent(snubber -> {
            Condition high = new Condition(design.line().highVolts(), usual.lineHertz(), usual.celsius());
            SnubberDuty duty = SnubberDuty.worst(design, snubber, high);
            add(
                    "snubber",
                    "The snubber leaks " + Say.amps(duty.leakageAmps()) + " past a thyristor that is off ("
                            + Say.watts(duty.leakageWatts()) + " in the load), warms its resistor by up to "
                            + Say.watts(duty.resistorWatts()) + ", and discharges with up to "
                            + Say.amps(duty.dischargeAmps())
                            + " into the thyristor as it fires (high line, at the crest)."
                            + " Its capacitor stands across the line: take an X class (IEC 60384-14).");
        });
    }

    private void gateShunt() {
        TriggerNeed need =
                TriggerNeed.of(design, bench.coldest().get(0).condition().celsius());
        Optional<Part> shunt = design.gate().shunt();
        shunt.ifPresent(part -> {
            double amps = need.volts() / part.value();
            if (amps > NOTICEABLE_SHUNT * need.amps()) {
                add(
                        "gate-shunt-share",
                        "At V_GT " + Say.volts(need.volts()) + " of the coldest junction the gate shunt of "
                                + Say.ohms(part.value()) + " takes " + Say.amps(amps) + ", "
                                + Say.number(amps / need.amps())
                                + " times I_GT: the drive supplies both, and the margins count it so.");
            }
        });
    }
}
