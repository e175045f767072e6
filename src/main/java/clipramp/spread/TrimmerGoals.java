package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Ramp;
import clipramp.circuit.Wanted.Goal;
import clipramp.engine.UnitValues;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Where the trimmers of every unit of a design are to bring it, and how those units were set that have been already. One
 * for all threads: a setting follows from the unit alone, so it does not matter who found it.
 */
final class TrimmerGoals {
    /** Settings that are kept; one more is found anew whenever it is asked for. */
    private static final int MOST_KEPT = 50_000;

    /** By how much R_E is raised, as a share, to see how the nominal unit's firing angle follows. */
    private static final double NUDGE = 0.01;

    /**
     * A setting of the knob, as the nominal unit has it.
     *
     * @param trackShare share of the pot's track in use
     * @param rampOhms R_E
     * @param firingRad where it fires
     * @param follow how the logarithm of that angle moves with the logarithm of R_E; about 1
     */
    record Mark(double trackShare, double rampOhms, double firingRad, double follow) {}

    /**
     * What a unit's trimmers are set to.
     *
     * @param highOhms in series with the fixed resistor
     * @param lowOhms across the pot
     */
    record Setting(double highOhms, double lowOhms) {}

    private final UnitValues nominal;
    private final double delayPerOhm;
    private final double highReach;
    private final double lowReach;
    private final Mark highest;
    private final Mark lowest;
    private final Map<Figures, Setting> known = new ConcurrentHashMap<>();

    private TrimmerGoals(Design design, UnitSolver solver) {
        Ramp ramp = design.ramp();
        nominal = UnitValues.nominal(design);
        nominal.celsius = Math.min(
                design.surroundings().hottestCelsius(),
                Math.max(design.surroundings().coldestCelsius(), nominal.celsius));
        delayPerOhm = solver.delayPerOhm(nominal);
        highReach = reach(ramp.trimmers().high());
        lowReach = reach(ramp.trimmers().low());
        double least = ramp.rampOhms(0) <= ramp.rampOhms(1) ? 0 : 1;
        highest = mark(solver, ramp, design.wanted().highest(), least);
        lowest = mark(solver, ramp, design.wanted().lowest(), 1 - least);
    }

    /** Empty for a design without trimmers. */
    static Optional<TrimmerGoals> of(Design design) {
        return design.ramp().trimmers().isNone()
                ? Optional.empty()
                : Optional.of(new TrimmerGoals(design, new UnitSolver(design, Optional.empty())));
    }

    private static double reach(Optional<Part> trimmer) {
        return trimmer.map(Part::lowest).orElse(0.0);
    }

    private Mark mark(UnitSolver solver, Ramp ramp, Optional<Goal> goal, double otherwise) {
        double share = WantedTest.share(ramp, goal.map(Goal::position).orElse(otherwise));
        double ohms = nominal.rampOhms(share);
        double rad = solver.latestRad(nominal, ohms);
        double nudged = solver.latestRad(nominal, ohms * (1 + NUDGE));
        double follow = Math.log(nudged / rad) / Math.log1p(NUDGE);
        return new Mark(share, ohms, rad, TrimmerSetting.isLikely(follow) ? follow : 1);
    }

    /** Puts a unit at the line and the temperature that it is set at, its trimmers as the nominal unit has them. */
    void bench(UnitValues unit) {
        unit.lineVolts = nominal.lineVolts;
        unit.lineHertz = nominal.lineHertz;
        unit.celsius = nominal.celsius;
        unit.highTrimOhms = nominal.highTrimOhms;
        unit.lowTrimOhms = nominal.lowTrimOhms;
    }

    /** Ideal delay of the nominal unit, s for each ohm of R_E. */
    double delayPerOhm() {
        return delayPerOhm;
    }

    /** How far the trimmer in series with the fixed resistor reaches at least, ohm; 0 for none. */
    double highReach() {
        return highReach;
    }

    /** How far the trimmer across the pot reaches at least, ohm; 0 for none. */
    double lowReach() {
        return lowReach;
    }

    Mark highest() {
        return highest;
    }

    Mark lowest() {
        return lowest;
    }

    /** How a unit with these figures was set; empty if it has not been, or that is no longer kept. */
    Optional<Setting> known(Figures unit) {
        return Optional.ofNullable(known.get(unit));
    }

    void keep(Figures unit, Setting setting) {
        if (known.size() < MOST_KEPT) {
            known.put(unit, setting);
        }
    }
}
