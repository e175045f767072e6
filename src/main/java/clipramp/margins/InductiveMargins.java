package clipramp.margins;

import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.engine.LineWave;
import clipramp.firing.Pulse;
import clipramp.power.LoadResult;
import clipramp.power.PulseLength;
import clipramp.power.ReappliedVoltage;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What an inductance asks: pulses that find no old current, and voltage that comes back slowly enough. */
final class InductiveMargins {
    private final Bench bench;
    private final Design design;
    private final ThyristorDevice device;

    InductiveMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
        this.device = design.thyristor().device();
    }

    List<Margin> all() {
        if (!(design.load() instanceof Load.Inductive)) {
            return List.of();
        }
        List<Margin> margins = new ArrayList<>();
        if (alternates(design.stage())) {
            margins.add(controlRange());
            margins.add(missed());
            margins.add(
                    device.kind() == Kind.TRIAC
                            ? rate(
                                    MarginKind.COMMUTATING_DVDT,
                                    device.commutating().stream()
                                            .mapToDouble(c -> c.voltsPerSecond())
                                            .findFirst(),
                                    "commutating.dv-dt")
                            : rate(MarginKind.OFF_STATE_DVDT, device.limits().voltsPerSecond(), "limits.dv-dt"));
        }
        return margins;
    }

    /** Whether the load's own current is an alternating one. */
    private static boolean alternates(Stage stage) {
        return stage.isFullWave() && stage != Stage.BRIDGE_DC;
    }

    private Margin controlRange() {
        MarginKind kind = MarginKind.CONTROL_RANGE;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            double phi = PulseLength.loadAngleRad(design, at.condition());
            Optional<Pulse> first = Bench.firstPulse(
                    bench.solution(at.condition(), bench.leastOhms()).shown());
            if (first.isEmpty()) {
                findings.add(Finding.missing(kind, at.words(), "there is no pulse at the smallest R_E"));
                continue;
            }
            double fires = first.get().startRad();
            findings.add(new Finding(
                    at.words(),
                    Math.toDegrees(phi),
                    Math.toDegrees(fires),
                    kind.sense(),
                    "R_E = " + Say.ohms(bench.leastOhms()) + ": first pulse at " + Say.angle(fires)
                            + "; the load controls from phi = atan(wL/R) = " + Say.angle(phi) + " to 180°"));
        }
        return Finding.worst(kind, findings);
    }

    private Margin missed() {
        MarginKind kind = MarginKind.MISSED_HALF_CYCLES;
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            for (double ohms : bench.settingsThatMatter(at.condition())) {
                LoadResult load = bench.load(at.condition(), ohms);
                findings.add(new Finding(at.words(), 0, load.missedHalves(), kind.sense(), missedText(at, ohms, load)));
            }
        }
        return Finding.worst(kind, findings);
    }

    private String missedText(JudgedCondition at, double ohms, LoadResult load) {
        List<Pulse> pulses = bench.solution(at.condition(), ohms).shown().pulses();
        String setting = "R_E = " + Say.ohms(ohms) + ": ";
        if (load.firedRad().isEmpty()) {
            return setting + "no pulse turns the thyristor on and latches it";
        }
        if (load.missedHalves() == 0) {
            return setting + "every half cycle is fired"
                    + (pulses.size() > 1 ? " (" + pulses.size() + " pulses in each)" : "");
        }
        String old = load.extinctionRad().isPresent()
                ? " flows until " + Say.angle(load.extinctionRad().getAsDouble() - Math.PI) + " of the next half cycle"
                : " never dies";
        String spent = pulses.size() == 1
                ? "the pulse at " + Say.angle(pulses.get(0).startRad()) + ", "
                        + Say.seconds(pulses.get(0).aboveTriggerSeconds()) + " long, is spent by then"
                : "all " + pulses.size() + " pulses are spent by then";
        return setting + "the current of one half cycle" + old + "; " + spent + ": " + load.missedHalves() + " of "
                + load.halfCycles() + " half cycles missed, dc " + Say.amps(Math.abs(load.dcAmps()));
    }

    private Margin rate(MarginKind kind, OptionalDouble limit, String key) {
        if (limit.isEmpty()) {
            return Ceiling.unjudged(kind, "the profile states no thyristor.device." + key);
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            findings.add(new Finding(
                    at.words(), limit.getAsDouble(), 0, kind.sense(), "no current dies before the other way begins"));
            for (ReappliedVoltage back : reapplied(bench, at)) {
                findings.add(new Finding(
                        at.words(),
                        limit.getAsDouble(),
                        back.voltsPerSecond(),
                        kind.sense(),
                        "the current dies with the line at " + Say.volts(back.stepVolts())
                                + ", which comes back at up to "
                                + Say.rate(back.voltsPerSecond()) + " and reaches " + Say.volts(back.peakVolts())
                                + (back.snubbed()
                                        ? " behind the snubber"
                                        : " with no snubber and 100 pF of stray capacitance (common practice)")
                                + "; limit " + Say.rate(limit.getAsDouble())));
            }
        }
        return Finding.worst(kind, findings);
    }

    /** What comes back over the thyristor at every extinction of every setting; nothing for other loads and stages. */
    static List<ReappliedVoltage> reapplied(Bench bench, JudgedCondition at) {
        Design design = bench.design();
        List<ReappliedVoltage> back = new ArrayList<>();
        if (design.load() instanceof Load.Inductive inductive && alternates(design.stage())) {
            LineWave line = new LineWave(design.line(), at.condition());
            for (double ohms : bench.settingsThatMatter(at.condition())) {
                double step = bench.period(at.condition(), ohms).extinctionsRad().stream()
                        .mapToDouble(rad -> Math.abs(line.voltsAt(rad)))
                        .max()
                        .orElse(0);
                if (step > 0) {
                    back.add(ReappliedVoltage.of(inductive, design.snubber(), step));
                }
            }
        }
        return back;
    }
}
