package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Part;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.ThyristorDevice.NonTrigger;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.gate.GatePower;
import clipramp.gate.LatchingNeed;
import clipramp.gate.StandingVoltage;
import clipramp.gate.TriggerNeed;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.ToDoubleFunction;

/** What the thyristor asks of the pulse, and what its gate bears (model.md section 7). */
final class GateMargins {
    private final Bench bench;
    private final Design design;
    private final ThyristorDevice device;
    private final GateLimits limits;

    GateMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
        this.device = design.thyristor().device();
        this.limits = device.gate().limits();
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        margins.add(polarity());
        margins.add(drive(MarginKind.GATE_PEAK_CURRENT));
        margins.add(drive(MarginKind.GATE_TIME));
        margins.add(drive(MarginKind.GATE_CHARGE));
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
        margins.add(latching(MarginKind.LATCHING_EARLIEST));
        margins.add(latching(MarginKind.LATCHING_LATEST));
        return margins;
    }

    private Margin polarity() {
        MarginKind kind = MarginKind.GATE_POLARITY;
        TriggerNeed need = TriggerNeed.of(design, 25);
        String pulse = design.gate().polarity().word() + " pulse";
        Finding finding;
        if (device.kind() == Kind.SCR) {
            boolean wrong = design.gate().polarity() == Polarity.NEGATIVE;
            finding = new Finding(
                    "any condition",
                    0,
                    wrong ? 1 : 0,
                    kind.sense(),
                    pulse + " into an SCR, which needs a positive one");
        } else {
            finding = new Finding(
                    "any condition",
                    0,
                    need.missing().size(),
                    kind.sense(),
                    pulse + ": quadrants " + words(need.used())
                            + (need.missing().isEmpty()
                                    ? ", both specified"
                                    : "; not specified: " + words(need.missing())));
        }
        return Finding.worst(kind, List.of(finding));
    }

    private static String words(List<Quadrant> quadrants) {
        return String.join(" and ", quadrants.stream().map(Quadrant::word).toList());
    }

    /** R_E that the pulse is judged at: the earliest firing, and the latest that is meant as one. */
    private Set<Double> judgedOhms(JudgedCondition at) {
        Set<Double> ohms = new LinkedHashSet<>(List.of(bench.leastOhms()));
        bench.latestOhms(at.condition()).ifPresent(ohms::add);
        return ohms;
    }

    /** A demand on the drive, at the coldest junction, on the weakest trigger device, into a gate held at V_GT. */
    private Margin drive(MarginKind kind) {
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.coldest()) {
            TriggerNeed need = TriggerNeed.of(design, at.condition().celsius());
            for (double ohms : judgedOhms(at)) {
                List<Pulse> pulses = bench.firstPulses(bench.held(at.condition(), ohms));
                if (pulses.isEmpty()) {
                    findings.add(noPulse(kind, at, need, ohms));
                }
                for (Pulse pulse : pulses) {
                    findings.add(driven(kind, at, need, pulse));
                }
            }
        }
        return Finding.worst(kind, findings);
    }

    private Finding noPulse(MarginKind kind, JudgedCondition at, TriggerNeed need, double ohms) {
        return new Finding(at.words(), demanded(kind, need), 0, kind.sense(), "no pulse at R_E = " + Say.ohms(ohms));
    }

    private double demanded(MarginKind kind, TriggerNeed need) {
        return switch (kind) {
            case GATE_PEAK_CURRENT -> design.gate().overdrive() * need.amps();
            case GATE_TIME -> device.gate().turnOnSeconds().orElse(Double.NaN);
            default -> need.amps() * design.gate().chargeSeconds();
        };
    }

    private Finding driven(MarginKind kind, JudgedCondition at, TriggerNeed need, Pulse pulse) {
        double demand = demanded(kind, need);
        String at25 =
                "at " + Say.celsius(need.celsius()) + (need.extended() ? " (extended beyond the sheet's points)" : "");
        String held = "gate held at V_GT " + Say.volts(need.volts()) + " " + at25 + shuntText(need.volts());
        return switch (kind) {
            case GATE_PEAK_CURRENT ->
                new Finding(
                        at.words(),
                        demand,
                        pulse.peakGateAmps(),
                        kind.sense(),
                        Say.number(design.gate().overdrive()) + " x " + Say.amps(need.amps()) + " = " + Say.amps(demand)
                                + " wanted; " + held + " gets " + Say.amps(pulse.peakGateAmps()));
            case GATE_TIME ->
                Double.isNaN(demand)
                        ? Finding.missing(kind, "any condition", "the profile states no thyristor.device.gate.turn-on")
                        : new Finding(
                                at.words(),
                                demand,
                                pulse.aboveTriggerSeconds(),
                                kind.sense(),
                                held + ": i_G >= I_GT " + Say.amps(need.amps()) + " for "
                                        + Say.seconds(pulse.aboveTriggerSeconds()) + ", t_gt " + Say.seconds(demand));
            default ->
                new Finding(
                        at.words(),
                        demand,
                        pulse.gateCoulombs(),
                        kind.sense(),
                        Say.amps(need.amps()) + " x "
                                + Say.seconds(design.gate().chargeSeconds()) + " = "
                                + Say.coulombs(demand) + " wanted; " + held + " gets "
                                + Say.coulombs(pulse.gateCoulombs()));
        };
    }

    /** The sheet's I_GT is the gate's alone: what R_GK takes at V_GT is not offered to it. */
    private String shuntText(double gateVolts) {
        return design.gate()
                .shunt()
                .map(Part::value)
                .map(ohms -> " (R_GK takes " + Say.amps(gateVolts / ohms) + " besides)")
                .orElse("");
    }

    private Margin standing() {
        MarginKind kind = MarginKind.GATE_STANDING_VOLTAGE;
        if (device.gate().nonTrigger().isEmpty()) {
            return Finding.worst(
                    kind,
                    List.of(Finding.missing(
                            kind, "any condition", "the profile states no thyristor.device.gate.non-trigger")));
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
            java.util.function.DoubleFunction<String> say) {
        if (limit.isEmpty()) {
            return Finding.worst(
                    kind,
                    List.of(Finding.missing(kind, "any condition", "the profile states no thyristor.device." + key)));
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double highest = typical(at).stream()
                    .flatMap(s -> Bench.pulses(s).stream())
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
            return Finding.worst(
                    kind,
                    List.of(Finding.missing(
                            kind, "any condition", "the profile states no thyristor.device.gate.limits.peak-power")));
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
            return Finding.worst(
                    kind,
                    List.of(Finding.missing(
                            kind, "any condition", "the profile states no thyristor.device.gate.limits.mean-power")));
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

    private Margin latching(MarginKind kind) {
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            OptionalDouble needed =
                    LatchingNeed.latchingAmps(design, at.condition().celsius());
            if (needed.isEmpty()) {
                findings.add(Finding.missing(kind, "any condition", "the profile states no thyristor.device.latching"));
                continue;
            }
            OptionalDouble ohms = kind == MarginKind.LATCHING_EARLIEST
                    ? OptionalDouble.of(bench.leastOhms())
                    : bench.latestOhms(at.condition());
            if (ohms.isEmpty()) {
                findings.add(Finding.missing(kind, at.words(), "no setting fires before the supply's collapse"));
                continue;
            }
            for (Pulse pulse : bench.firstPulses(bench.solution(at.condition(), ohms.getAsDouble()))) {
                findings.add(latched(kind, at, needed.getAsDouble(), pulse));
            }
        }
        return findings.isEmpty()
                ? Finding.worst(kind, List.of(Finding.missing(kind, "any condition", "there is no pulse")))
                : Finding.worst(kind, findings);
    }

    private Finding latched(MarginKind kind, JudgedCondition at, double needed, Pulse pulse) {
        double bleed = LatchingNeed.bleedAmps(design);
        return new Finding(
                at.words(),
                needed,
                pulse.anodeAmps(),
                kind.sense(),
                "pulse at " + Say.angle(pulse.startRad()) + ": " + Say.amps(pulse.anodeAmps())
                        + " as the gate current falls under I_GT; I_L " + Say.amps(needed - bleed)
                        + (bleed > 0 ? " + " + Say.amps(bleed) + " that the gate circuit bleeds away" : ""));
    }
}
