package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.firing.Dissipation;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

/** The trigger device against its absolute ratings (DEVELOPERS.md, Margins). */
final class TriggerMargins {
    private final Bench bench;
    private final Design design;

    TriggerMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
    }

    List<Margin> all() {
        return design.trigger() instanceof Trigger.UnijunctionTrigger trigger
                ? unijunction(trigger.device().limits())
                : programmable(((Trigger.ProgrammableTrigger) design.trigger())
                        .device()
                        .limits());
    }

    private List<Margin> unijunction(Unijunction.Limits limits) {
        List<Margin> margins = new ArrayList<>();
        margins.add(rated(
                MarginKind.INTERBASE_VOLTAGE,
                limits.interbaseVolts(),
                "interbase",
                Dissipation::interbaseVolts,
                Say::volts));
        margins.add(rated(
                MarginKind.EMITTER_PEAK_CURRENT,
                limits.emitterPeakAmps(),
                "emitter-peak",
                Dissipation::emitterPeakAmps,
                Say::amps));
        margins.add(rated(
                MarginKind.EMITTER_RMS_CURRENT,
                limits.emitterRmsAmps(),
                "emitter-rms",
                Dissipation::emitterRmsAmps,
                Say::amps));
        margins.add(rated(
                MarginKind.EMITTER_REVERSE_VOLTAGE,
                limits.emitterReverseVolts(),
                "emitter-reverse",
                Dissipation::emitterReverseVolts,
                Say::volts));
        margins.add(capacitor(limits));
        margins.add(power(limits.watts(), limits.deratingWattsPerKelvin()));
        return margins;
    }

    private List<Margin> programmable(ProgrammableUnijunction.Limits limits) {
        List<Margin> margins = new ArrayList<>();
        margins.add(rated(
                MarginKind.EMITTER_PEAK_CURRENT, limits.peakAmps(), "peak", Dissipation::emitterPeakAmps, Say::amps));
        margins.add(rated(
                MarginKind.EMITTER_RMS_CURRENT, limits.meanAmps(), "mean", Dissipation::emitterRmsAmps, Say::amps));
        margins.add(rated(
                MarginKind.EMITTER_REVERSE_VOLTAGE,
                limits.anodeVolts(),
                "anode",
                Dissipation::emitterReverseVolts,
                Say::volts));
        margins.add(discharge(limits.dischargeJoules()));
        margins.add(power(limits.watts(), limits.deratingWattsPerKelvin()));
        return margins;
    }

    /** Both ends of the knob are looked at. */
    private Margin rated(
            MarginKind kind,
            OptionalDouble limit,
            String key,
            ToDoubleFunction<Dissipation> figure,
            DoubleFunction<String> say) {
        return Ceiling.over(
                kind, bench.conditions(), limit, unstated(key), at -> bench.hardest(at.condition(), figure), say);
    }

    private static String unstated(String key) {
        return "the profile states no trigger.device.limits." + key;
    }

    private Margin capacitor(Unijunction.Limits limits) {
        MarginKind kind = MarginKind.EMITTER_CAPACITOR;
        if (limits.capacitorFarads().isEmpty()) {
            return Ceiling.unjudged(kind, unstated("capacitor"));
        }
        double limit = limits.capacitorFarads().getAsDouble();
        double farads = design.ramp().capacitor().value();
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double volts = bench.hardest(at.condition(), Dissipation::capacitorVolts);
            double rated = limits.capacitorVolts().orElse(Double.POSITIVE_INFINITY);
            // Above its voltage the sheet allows no capacitor at all.
            double allowed = volts <= rated ? limit : 0;
            findings.add(new Finding(
                    at.words(),
                    allowed,
                    farads,
                    kind.sense(),
                    Say.farads(farads) + " charged to " + Say.volts(volts) + " against " + Say.farads(limit)
                            + (Double.isInfinite(rated) ? "" : " at up to " + Say.volts(rated))));
        }
        return Finding.worst(kind, findings);
    }

    /** A programmable device may be given a stated energy: as the capacitor that holds it at the ramp's peak. */
    private Margin discharge(OptionalDouble joules) {
        MarginKind kind = MarginKind.EMITTER_CAPACITOR;
        if (joules.isEmpty()) {
            return Ceiling.unjudged(kind, unstated("discharge-energy"));
        }
        double farads = design.ramp().capacitor().value();
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double volts = bench.hardest(at.condition(), Dissipation::capacitorVolts);
            double energy = farads * volts * volts / 2;
            findings.add(new Finding(
                    at.words(),
                    2 * joules.getAsDouble() / (volts * volts),
                    farads,
                    kind.sense(),
                    Say.farads(farads) + " at " + Say.volts(volts) + " holds " + Say.joules(energy) + "; allowed "
                            + Say.joules(joules.getAsDouble())));
        }
        return Finding.worst(kind, findings);
    }

    private Margin power(OptionalDouble watts, OptionalDouble derating) {
        MarginKind kind = MarginKind.TRIGGER_POWER;
        if (watts.isEmpty()) {
            return Ceiling.unjudged(kind, unstated("power"));
        }
        if (derating.isEmpty()) {
            return Ceiling.unjudged(kind, unstated("derating"));
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double warmth = Math.max(0, at.condition().celsius() - Condition.SHEET_CELSIUS);
            double allowed = watts.getAsDouble() - derating.getAsDouble() * warmth;
            double there = bench.hardest(at.condition(), Dissipation::deviceWatts);
            findings.add(new Finding(
                    at.words(),
                    allowed,
                    there,
                    kind.sense(),
                    Say.watts(there) + " against " + Say.watts(watts.getAsDouble()) + " - "
                            + Say.watts(derating.getAsDouble()) + "/K x " + Say.kelvin(warmth) + " = "
                            + Say.watts(allowed)));
        }
        return Finding.worst(kind, findings);
    }
}
