package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.HalfCycle;
import clipramp.firing.Solution;
import clipramp.gate.GatePower;
import clipramp.gate.StandingVoltage;
import clipramp.margins.Check.PulseSummary;
import clipramp.power.OperatingPoint;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Solves a design and judges it (DEVELOPERS.md, Margins). */
public final class Judge {
    private static final double MID_KNOB = 0.5;

    private Judge() {}

    /**
     * Every margin at the worst of the judged conditions, with knob table, pulse, heat and line current of the usual one.
     *
     * @param design the design
     * @param pinnedLineVolts judge at this rms of the fundamental only, V, above 0; empty for low, nominal and high
     * @param pinnedCelsius judge at this temperature only, °C; empty for coldest, 25 °C and hottest
     * @throws clipramp.circuit.RefusedCircuit as {@link clipramp.firing.Firing}
     */
    public static Check check(Design design, OptionalDouble pinnedLineVolts, OptionalDouble pinnedCelsius) {
        Bench bench = new Bench(design, pinnedLineVolts, pinnedCelsius);
        Condition condition = bench.usual();
        List<Margin> margins = margins(bench, condition);
        Solution middle = bench.solution(condition, bench.midOhms());
        return new Check(
                design,
                condition,
                knob(bench, condition),
                summary(bench, condition, middle),
                bench.dissipation(condition, bench.midOhms()),
                middle.shown().clipFromRad(),
                margins,
                margins.get(0).verdict(),
                new Notes(bench, condition).all(),
                Optional.of(LineCheck.of(bench, condition)),
                Optional.of(HeatCheck.of(bench)));
    }

    private static List<Margin> margins(Bench bench, Condition condition) {
        List<Margin> margins = new ArrayList<>(WantedMargins.of(bench));
        margins.addAll(new RampMargins(bench, condition).all());
        margins.addAll(new BalanceMargins(bench, condition).all());
        margins.add(new AngleDrift(bench, condition).margin());
        margins.addAll(new InductiveMargins(bench).all());
        margins.addAll(new GateMargins(bench).all());
        margins.addAll(new GateCeilings(bench).all());
        margins.addAll(new TransformerMargins(bench).all());
        margins.addAll(new ThyristorMargins(bench).all());
        margins.addAll(new TriggerMargins(bench).all());
        margins.addAll(new PartMargins(bench).all());
        margins.sort(Comparator.comparing(Margin::verdict).reversed().thenComparingDouble(Judge::closeness));
        return margins;
    }

    /** How close to its limit a margin is: ratio over the ratio that it holds from; smaller is worse. */
    private static double closeness(Margin margin) {
        double absent = margin.verdict() == Verdict.FAILS ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        return margin.ratio().isPresent() ? margin.ratio().getAsDouble() / margin.holdsFrom() : absent;
    }

    private static List<OperatingPoint> knob(Bench bench, Condition condition) {
        List<OperatingPoint> rows = new ArrayList<>();
        List<Double> settings = bench.settings();
        for (int step = 0; step < settings.size(); step++) {
            double ohms = settings.get(step);
            rows.add(new OperatingPoint(
                    bench.positionOf(step), bench.solution(condition, ohms), bench.load(condition, ohms)));
        }
        return rows;
    }

    private static Optional<PulseSummary> summary(Bench bench, Condition condition, Solution middle) {
        HalfCycle half = middle.shown();
        OptionalDouble atKnob =
                bench.design().ramp().pot().isPresent() ? OptionalDouble.of(MID_KNOB) : OptionalDouble.empty();
        return half.shownPulse()
                .map(pulse -> new PulseSummary(
                        atKnob,
                        pulse,
                        GatePower.meanWatts(middle),
                        StandingVoltage.of(bench.design(), condition).volts()));
    }
}
