package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.ClippedSupply;
import clipramp.engine.Network;
import clipramp.engine.NetworkOfDesign;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.power.ActingPulses;
import clipramp.power.LoadPower;
import java.util.ArrayList;
import java.util.List;

/** Whether the ramp does its work between the clip's beginning and the supply's collapse. */
final class RampMargins {
    /** Share of full power that an end pulse may leak where no lowest power is wanted: a rule of ours. */
    private static final double LEAK_SHARE = 0.01;

    private final Bench bench;
    private final Design design;
    private final Condition usual;

    RampMargins(Bench bench, Condition usual) {
        this.bench = bench;
        this.design = bench.design();
        this.usual = usual;
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        margins.add(beforeCollapse());
        margins.add(clipBeforeFiring());
        margins.add(peakPointCurrent());
        margins.add(latchedOn());
        margins.add(endPulse());
        if (design.clip().lagRad() != 0) {
            margins.add(fullPowerPulse());
        }
        margins.add(silent());
        return margins;
    }

    private Margin beforeCollapse() {
        MarginKind kind = MarginKind.RAMP_BEFORE_COLLAPSE;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            Solution solution = bench.solution(at.condition(), bench.mostOhms());
            HalfCycle half = solution.shown();
            double reached = half.pulses().stream()
                    .mapToDouble(p -> ActingPulses.madeRad(design, solution, p))
                    .min()
                    .orElse(Math.PI);
            String what = half.pulses().isEmpty()
                    ? "the ramp never reaches the peak point (taken as 180°)"
                    : "the ramp reaches the peak point at " + Say.angle(reached);
            findings.add(new Finding(
                    at.words(),
                    Math.toDegrees(collapseRad(half)),
                    Math.toDegrees(reached),
                    kind.sense(),
                    "R_E = " + Say.ohms(bench.mostOhms()) + ": " + what + "; the supply stays clipped until "
                            + Say.angle(collapseRad(half))));
        }
        return Finding.worst(kind, findings);
    }

    /** Angle of the supply's collapse, from the load's zero that goes with the supply's half cycle, rad. */
    private static double collapseRad(HalfCycle half) {
        return inOwnHalf(half, half.collapseRad());
    }

    /** A single diode on a winding turned over feeds the negative half: its angles stand a half period later. */
    private static double inOwnHalf(HalfCycle half, double rad) {
        return !half.positive() && rad > Math.PI ? rad - Math.PI : rad;
    }

    private Margin clipBeforeFiring() {
        MarginKind kind = MarginKind.CLIP_BEFORE_FIRING;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            Solution solution = bench.solution(at.condition(), bench.leastOhms());
            HalfCycle half = solution.shown();
            if (half.pulses().isEmpty()) {
                findings.add(Finding.missing(kind, at.words(), "there is no pulse at the smallest R_E"));
                continue;
            }
            double fires = ActingPulses.madeRad(
                    design, solution, Bench.firstPulse(half).orElseThrow());
            double clips = inOwnHalf(half, half.clipFromRad().orElse(Math.PI));
            findings.add(new Finding(
                    at.words(),
                    Math.toDegrees(fires),
                    Math.toDegrees(clips),
                    kind.sense(),
                    "R_E = " + Say.ohms(bench.leastOhms()) + ": first pulse at " + Say.angle(fires) + "; "
                            + (half.clipFromRad().isPresent()
                                    ? "the zener conducts from " + Say.angle(clips)
                                    : "the zener never conducts (taken as 180°)")));
        }
        return Finding.worst(kind, findings);
    }

    private Margin peakPointCurrent() {
        MarginKind kind = MarginKind.PEAK_POINT_CURRENT;
        List<Finding> findings = new ArrayList<>();
        double ohms = bench.mostOhms();
        for (JudgedCondition at : bench.conditions()) {
            double needed =
                    NetworkOfDesign.of(SheetLimits.highestPeakCurrent(design), at.condition(), ohms).peakCurrentAmps;
            Network network = NetworkOfDesign.of(design, at.condition(), ohms);
            double supply = ClippedSupply.crestVolts(design, at.condition(), network);
            double peak = network.peakShare() * supply + network.emitterDropVolts;
            double fed = (supply - peak) / ohms;
            findings.add(new Finding(
                    at.words(),
                    needed,
                    fed,
                    kind.sense(),
                    "(" + Say.volts(supply) + " - " + Say.volts(peak) + ")/" + Say.ohms(ohms) + " = " + Say.amps(fed)
                            + " against I_P " + Say.amps(needed) + "; " + seldom(at.condition(), network, needed)));
        }
        return Finding.worst(kind, findings);
    }

    /** Below which capacitor this margin can bind at all: a larger one needs less R_E for the whole half cycle. */
    private static String seldom(Condition condition, Network network, double peakAmps) {
        double supply = network.zenerKneeVolts;
        double peak = network.peakShare() * supply + network.emitterDropVolts;
        double mostOhms = (supply - peak) / peakAmps;
        double farads = condition.halfCycleSeconds() / (mostOhms * Math.log(supply / (supply - peak)));
        return farads > 0 && Double.isFinite(farads)
                ? "with more than " + Say.farads(farads) + " the half cycle is over before R_E gets so large"
                : "the peak point lies above the supply";
    }

    private Margin latchedOn() {
        MarginKind kind = MarginKind.LATCHED_ON;
        List<Finding> findings = new ArrayList<>();
        double ohms = bench.leastOhms();
        for (JudgedCondition at : bench.conditions()) {
            Network network = NetworkOfDesign.of(design, at.condition(), ohms);
            Network least = NetworkOfDesign.of(SheetLimits.lowestValleyCurrent(design), at.condition(), ohms);
            double supply = ClippedSupply.crestVolts(design, at.condition(), network);
            double valleyAmps = least.valleySiemens * supply;
            double valleyVolts = SheetLimits.valleyVolts(design, supply);
            double fed = (supply - valleyVolts) / ohms;
            boolean latched =
                    bench.solution(at.condition(), ohms).halves().stream().anyMatch(HalfCycle::latchedOn);
            findings.add(new Finding(
                    at.words(),
                    valleyAmps,
                    fed,
                    kind.sense(),
                    "(" + Say.volts(supply) + " - " + Say.volts(valleyVolts) + ")/" + Say.ohms(ohms) + " = "
                            + Say.amps(fed) + " against I_V " + Say.amps(valleyAmps) + " at " + Say.volts(supply)
                            + (latched ? "; the nominal device does stay on" : "")));
        }
        return Finding.worst(kind, findings);
    }

    private Margin endPulse() {
        MarginKind kind = MarginKind.END_PULSE;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double allowed = WantedMargins.lowestWatts(bench, at)
                    .orElse(LEAK_SHARE * LoadPower.fullWatts(design, at.condition()));
            findings.add(leak(at, bench.mostOhms(), allowed));
            if (at.condition().equals(usual)) {
                for (double ohms : bench.settings()) {
                    findings.add(leak(at, ohms, allowed));
                }
            }
        }
        return Finding.worst(kind, findings);
    }

    private Finding leak(JudgedCondition at, double ohms, double allowed) {
        MarginKind kind = MarginKind.END_PULSE;
        Solution solution = bench.solution(at.condition(), ohms);
        Pulse end = solution.halves().stream()
                .flatMap(half -> half.endPulse().stream())
                .findFirst()
                .orElse(null);
        if (end == null) {
            return new Finding(
                    at.words(), allowed, 0, kind.sense(), "R_E = " + Say.ohms(ohms) + ": no end pulse fires the load");
        }
        double leaked = bench.load(at.condition(), ohms).watts();
        return new Finding(
                at.words(),
                allowed,
                leaked,
                kind.sense(),
                "R_E = " + Say.ohms(ohms) + ": end pulse at " + Say.angle(end.startRad()) + ", "
                        + (end.latches() ? "leaks " + Say.watts(leaked) : "does not latch the thyristor")
                        + "; allowed " + Say.watts(allowed));
    }

    private Margin fullPowerPulse() {
        MarginKind kind = MarginKind.FULL_POWER_PULSE;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            List<Double> settings = at.condition().equals(usual) ? bench.settings() : List.of(bench.mostOhms());
            long spills = settings.stream()
                    .filter(ohms -> ActingPulses.spillOver(design, bench.solution(at.condition(), ohms)))
                    .count();
            findings.add(new Finding(
                    at.words(),
                    0,
                    spills,
                    kind.sense(),
                    spills + " of " + settings.size() + " settings fire the next half cycle at once; the winding lags "
                            + Say.angle(design.clip().lagRad())));
        }
        return Finding.worst(kind, findings);
    }

    private Margin silent() {
        MarginKind kind = MarginKind.SILENT;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            Solution solution = bench.solution(at.condition(), bench.leastOhms());
            boolean fires =
                    bench.load(at.condition(), bench.leastOhms()).firedRad().isPresent();
            findings.add(new Finding(
                    at.words(),
                    0,
                    fires ? 0 : 1,
                    kind.sense(),
                    "R_E = " + Say.ohms(bench.leastOhms()) + ": "
                            + (fires
                                    ? "fires"
                                    : solution.shown().pulses().isEmpty()
                                            ? "no pulse"
                                            : "pulses, but none turns the thyristor on and latches it")));
        }
        return Finding.worst(kind, findings);
    }
}
