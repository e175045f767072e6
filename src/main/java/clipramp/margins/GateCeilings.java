package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.NonTrigger;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.gate.GatePower;
import clipramp.gate.StandingVoltage;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

/** What the thyristor's gate bears: between pulses, in them, and on the whole (DEVELOPERS.md, Margins). */
final class GateCeilings {
    private final Bench bench;
    private final Design design;
    private final ThyristorDevice device;
    private final GateLimits limits;

    GateCeilings(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
        this.device = design.thyristor().device();
        this.limits = device.gate().limits();
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        margins.add(standing());
        margins.add(ceiling(
                MarginKind.GATE_CURRENT_LIMIT, limits.amps(), Pulse::peakGateAmps, "gate.limits.current", Say::amps));
        margins.add(ceiling(
                MarginKind.GATE_VOLTAGE_LIMIT,
                limits.volts(),
                Pulse::peakGateVolts,
                "gate.limits.voltage",
                Say::volts));
        margins.add(peakPower());
        margins.add(meanPower());
        return margins;
    }

    private Margin standing() {
        MarginKind kind = MarginKind.GATE_STANDING_VOLTAGE;
        if (device.gate().nonTrigger().isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states no thyristor.device.gate.non-trigger");
        }
        NonTrigger none = device.gate().nonTrigger().get();
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.hottest()) {
            StandingVoltage standing = StandingVoltage.of(design, at.condition());
            String how = standing.volts() == 0
                    ? "no base bar current reaches the gate"
                    : Say.volts(standing.supplyVolts()) + " x " + Say.ohms(standing.baseOneOhms())
                            + "/(R2 + " + Say.ohms(standing.interbaseOhms()) + " + R1p), then R_G and R_GK: "
                            + Say.volts(standing.volts());
            findings.add(new Finding(
                    at.words(),
                    none.volts(),
                    standing.volts(),
                    kind.sense(),
                    how + "; V_GD " + Say.volts(none.volts()) + " at a junction of " + Say.celsius(none.celsius())));
        }
        return Finding.worst(kind, findings);
    }

    /** Every pulse of the typical circuit at both ends of the knob, all conditions. */
    private List<Solution> typical(JudgedCondition at) {
        return List.of(
                bench.solution(at.condition(), bench.leastOhms()), bench.solution(at.condition(), bench.mostOhms()));
    }

    private Margin ceiling(
            MarginKind kind,
            OptionalDouble limit,
            ToDoubleFunction<Pulse> peak,
            String key,
            DoubleFunction<String> say) {
        if (limit.isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states no thyristor.device." + key);
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double highest = typical(at).stream()
                    .flatMap(solution -> Bench.pulses(solution).stream())
                    .mapToDouble(peak)
                    .max()
                    .orElse(0);
            findings.add(new Finding(
                    at.words(),
                    limit.getAsDouble(),
                    highest,
                    kind.sense(),
                    "typical gate gets " + say.apply(highest) + "; limit " + say.apply(limit.getAsDouble())));
        }
        return Finding.worst(kind, findings);
    }

    private Margin peakPower() {
        MarginKind kind = MarginKind.GATE_POWER_LIMIT;
        if (limits.peakWatts().isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states no thyristor.device.gate.limits.peak-power");
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            for (Solution solution : typical(at)) {
                for (Pulse pulse : Bench.pulses(solution)) {
                    findings.add(peakPower(at, pulse));
                }
            }
            findings.add(new Finding(at.words(), limits.peakWatts().getAsDouble(), 0, kind.sense(), "no pulse"));
        }
        return Finding.worst(kind, findings);
    }

    private Finding peakPower(JudgedCondition at, Pulse pulse) {
        double width = GatePower.equivalentSeconds(pulse);
        double allowed = GatePower.allowedPeakWatts(limits, width).orElseThrow();
        double rated = limits.peakWatts().getAsDouble();
        String duration = limits.peakWattsForSeconds().isPresent()
                ? " for " + Say.seconds(limits.peakWattsForSeconds().getAsDouble())
                : " (the sheet states no pulse length)";
        return new Finding(
                at.words(),
                allowed,
                pulse.peakGateWatts(),
                MarginKind.GATE_POWER_LIMIT.sense(),
                Say.joules(pulse.gateJoules()) + " at a peak of " + Say.watts(pulse.peakGateWatts()) + " = "
                        + Say.seconds(width) + " wide; P_GM " + Say.watts(rated) + duration
                        + (allowed < rated ? ", so " + Say.watts(allowed) + " for this pulse" : ""));
    }

    private Margin meanPower() {
        MarginKind kind = MarginKind.GATE_MEAN_POWER;
        if (limits.meanWatts().isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states no thyristor.device.gate.limits.mean-power");
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            Solution solution = bench.solution(at.condition(), bench.leastOhms());
            double mean = GatePower.meanWatts(solution);
            double limit = limits.meanWatts().getAsDouble();
            findings.add(new Finding(
                    at.words(),
                    limit,
                    mean,
                    kind.sense(),
                    solution.shown().pulses().size() + " pulses a half cycle at R_E = " + Say.ohms(bench.leastOhms())
                            + ": " + Say.watts(mean) + "; P_G(AV) " + Say.watts(limit)));
        }
        return Finding.worst(kind, findings);
    }
}
