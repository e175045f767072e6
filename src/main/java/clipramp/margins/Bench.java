package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.firing.Study;
import clipramp.firing.TransformerDuty;
import clipramp.gate.TriggerNeed;
import clipramp.gate.WeakestPulse;
import clipramp.power.LoadPeriod;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;

/** A design on the bench: everything that the margins ask of it, solved once. Lives for one run of the judge. */
final class Bench {
    private static final int KNOB_STEPS = 10;

    private record Setting(Condition condition, double rampOhms) {}

    private final Design design;
    private final List<JudgedCondition> conditions;
    private final Condition usual;
    private final Map<Setting, Solution> solutions = new HashMap<>();
    private final Map<Setting, Study> studies = new HashMap<>();
    private final Map<Setting, Solution> heldSolutions = new HashMap<>();
    private final Map<Setting, LoadResult> loads = new HashMap<>();
    private final Map<Setting, LoadPeriod> periods = new HashMap<>();
    private final Map<Double, Design> heldDesigns = new HashMap<>();
    private final double leastOhms;
    private final double mostOhms;

    Bench(Design design, OptionalDouble pinnedVolts, OptionalDouble pinnedCelsius) {
        this.design = design;
        this.conditions = JudgedCondition.of(design, pinnedVolts, pinnedCelsius);
        this.usual = new Condition(
                pinnedVolts.orElse(design.line().volts()),
                design.line().hertz(),
                pinnedCelsius.orElse(Condition.SHEET_CELSIUS));
        double atStart = design.ramp().rampOhms(0);
        double atEnd = design.ramp().rampOhms(1);
        this.leastOhms = Math.min(atStart, atEnd);
        this.mostOhms = Math.max(atStart, atEnd);
    }

    Design design() {
        return design;
    }

    /** Nominal line at 25 °C, or what was pinned. */
    Condition usual() {
        return usual;
    }

    List<JudgedCondition> conditions() {
        return conditions;
    }

    /** The judged conditions at their lowest temperature. */
    List<JudgedCondition> coldest() {
        return at(temperatures().min().orElseThrow());
    }

    /** The judged conditions at their highest temperature. */
    List<JudgedCondition> hottest() {
        return at(temperatures().max().orElseThrow());
    }

    private DoubleStream temperatures() {
        return conditions.stream().mapToDouble(at -> at.condition().celsius());
    }

    private List<JudgedCondition> at(double celsius) {
        return conditions.stream()
                .filter(at -> at.condition().celsius() == celsius)
                .toList();
    }

    /** Smallest R_E of the knob's travel, ohm: the high-power end. */
    double leastOhms() {
        return leastOhms;
    }

    /** Largest R_E of the knob's travel, ohm: the low-power end. */
    double mostOhms() {
        return mostOhms;
    }

    /** The periodic state, solved once. The ends of the knob are asked for everything, so they are studied at once. */
    Solution solution(Condition condition, double rampOhms) {
        if (rampOhms == leastOhms || rampOhms == mostOhms) {
            return study(condition, rampOhms).solution();
        }
        return solutions.computeIfAbsent(
                new Setting(condition, rampOhms), s -> Firing.solve(design, s.condition(), s.rampOhms()));
    }

    private Study study(Condition condition, double rampOhms) {
        return studies.computeIfAbsent(
                new Setting(condition, rampOhms), s -> Firing.study(design, s.condition(), s.rampOhms()));
    }

    LoadResult load(Condition condition, double rampOhms) {
        return loads.computeIfAbsent(
                new Setting(condition, rampOhms),
                s -> LoadPower.of(design, s.condition(), solution(s.condition(), s.rampOhms())));
    }

    /**
     * The load at its highest setting. Where the nominal thyristor is not turned on there, another one of its type may
     * be: then every half cycle counts as fired by the first pulse.
     */
    LoadResult highestLoad(JudgedCondition at) {
        LoadResult load = load(at.condition(), leastOhms);
        Optional<Pulse> first = firstPulse(solution(at.condition(), leastOhms).shown());
        return load.firedRad().isPresent() || first.isEmpty()
                ? load
                : LoadPower.atFiringAngle(design, at.condition(), first.get().startRad());
    }

    /**
     * Where an inductive load is looked at: at every setting of the knob in the usual condition, at both ends elsewhere.
     * Other loads are worst at the knob's high-power end.
     */
    List<Double> settingsThatMatter(Condition condition) {
        if (!(design.load() instanceof Load.Inductive)) {
            return List.of(leastOhms);
        }
        return condition.equals(usual) ? settings() : List.of(leastOhms, mostOhms);
    }

    /** The load's current itself. */
    LoadPeriod period(Condition condition, double rampOhms) {
        return periods.computeIfAbsent(
                new Setting(condition, rampOhms),
                s -> LoadPower.period(design, s.condition(), solution(s.condition(), s.rampOhms())));
    }

    Dissipation dissipation(Condition condition, double rampOhms) {
        return study(condition, rampOhms).dissipation();
    }

    /** What the pulse transformer bears; only for a design that has one. */
    TransformerDuty transformerDuty(Condition condition, double rampOhms) {
        return study(condition, rampOhms).transformerDuty().orElseThrow();
    }

    /** The weakest trigger device driving a gate held at V_GT of the condition's temperature. */
    Solution held(Condition condition, double rampOhms) {
        return heldSolutions.computeIfAbsent(
                new Setting(condition, rampOhms),
                s -> Firing.solve(heldDesign(s.condition().celsius()), s.condition(), s.rampOhms()));
    }

    private Design heldDesign(double celsius) {
        return heldDesigns.computeIfAbsent(
                celsius,
                c -> WeakestPulse.intoGateHeldAt(
                        design, TriggerNeed.of(design, c).volts()));
    }

    /** The largest value of a figure at both ends of the knob. */
    double hardest(Condition condition, ToDoubleFunction<Dissipation> figure) {
        return Math.max(
                figure.applyAsDouble(dissipation(condition, leastOhms)),
                figure.applyAsDouble(dissipation(condition, mostOhms)));
    }

    /** R_E at mid-knob, ohm. */
    double midOhms() {
        return design.ramp().rampOhms(0.5);
    }

    /** The first pulse of every half cycle that has one and that the stage lets through. */
    List<Pulse> firstPulses(Solution solution) {
        return solution.halves().stream()
                .filter(half -> design.stage().isFullWave() || half.positive())
                .flatMap(half -> firstPulse(half).stream())
                .toList();
    }

    /**
     * The pulse that the ramp makes first. With a lagging winding that is not the first to act in the load's half cycle:
     * late pulses of the half cycle before come ahead of it.
     */
    static Optional<Pulse> firstPulse(HalfCycle half) {
        return half.pulses().stream().min(Comparator.comparingDouble(Pulse::startSeconds));
    }

    /** Every pulse of a solution. */
    static List<Pulse> pulses(Solution solution) {
        return solution.halves().stream().flatMap(h -> h.pulses().stream()).toList();
    }

    /**
     * The largest R_E in ohms, of eleven knob settings, whose first pulse comes before the supply's collapse: the latest
     * firing that is meant as one.
     */
    OptionalDouble latestOhms(Condition condition) {
        return settings().stream()
                .sorted(Comparator.reverseOrder())
                .filter(ohms -> properlyFired(solution(condition, ohms)))
                .mapToDouble(Double::doubleValue)
                .findFirst();
    }

    private static boolean properlyFired(Solution solution) {
        Optional<Pulse> first = firstPulse(solution.shown());
        return first.isPresent() && !first.get().endPulse();
    }

    /** Knob position of one of the {@link #settings}, 0..1; empty for a fixed ramp. */
    OptionalDouble positionOf(int setting) {
        return design.ramp().pot().isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of((double) setting / KNOB_STEPS);
    }

    /** R_E at eleven evenly spaced knob positions, ohm; one for a fixed ramp. */
    List<Double> settings() {
        if (design.ramp().pot().isEmpty()) {
            return List.of(leastOhms);
        }
        List<Double> settings = new ArrayList<>();
        for (int step = 0; step <= KNOB_STEPS; step++) {
            settings.add(design.ramp().rampOhms((double) step / KNOB_STEPS));
        }
        return settings;
    }
}
