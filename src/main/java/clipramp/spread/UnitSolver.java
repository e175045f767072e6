package clipramp.spread;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.Network;
import clipramp.engine.UnitValues;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.power.SwiftPoint;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * Solves one drawn unit at one knob position: by the swift path where the design suits it and it is sure of itself, else by
 * the reference path. Not for two threads at once.
 */
final class UnitSolver {
    /** A peak point beyond this share of the supply makes no ramp to reckon with. */
    private static final double HIGHEST_PEAK = 0.98;

    private final Design design;
    private final Network network = new Network();
    private final @Nullable SwiftPoint swift;
    private final @Nullable TrimmerSetting setting;

    UnitSolver(Design design) {
        this(design, TrimmerGoals.of(design));
    }

    /**
     * @param design whose units are solved
     * @param goals of that design, shared by all who solve its units
     */
    UnitSolver(Design design, Optional<TrimmerGoals> goals) {
        this.design = design;
        swift = SwiftPoint.suits(design) ? new SwiftPoint(design) : null;
        setting = goals.isEmpty() ? null : new TrimmerSetting(goals.get(), this);
    }

    /** Sets the trimmers of a drawn unit, at nominal line and temperature, as its maker would; without any nothing moves. */
    void prepare(UnitValues unit) {
        if (setting != null) {
            setting.set(unit);
        }
    }

    /**
     * @param unit the drawn unit
     * @param trackShare share of the pot's track in use, 0..1
     * @param into filled with what it does
     */
    void solve(UnitValues unit, double trackShare, UnitOutcome into) {
        solveAt(unit, unit.rampOhms(trackShare), into);
    }

    /** Firing angle at a whole R_E in ohms, rad; a thyristor that stays off counts as fired at the half cycle's end. */
    double latestRad(UnitValues unit, double rampOhms) {
        double rad = swift != null && swift.solve(unit, rampOhms)
                ? swift.firingRad()
                : referred(unit, rampOhms).shown().firingRad().orElse(Double.NaN);
        return Double.isNaN(rad) ? Math.PI : rad;
    }

    /** What the first relations make of a unit's delay, C_E ln(1/(1 - V_P/V_S)), s for each ohm of R_E. */
    double delayPerOhm(UnitValues unit) {
        unit.fill(network, unit.rampOhms(1));
        double peak = network.peakShare() + network.emitterDropVolts / network.zenerKneeVolts;
        return -network.capacitorFarads * Math.log1p(-Math.min(HIGHEST_PEAK, peak));
    }

    private void solveAt(UnitValues unit, double rampOhms, UnitOutcome into) {
        if (swift != null && swift.solve(unit, rampOhms)) {
            into.firingRad = swift.firingRad();
            into.state = swift.state();
            into.watts = swift.watts();
            into.fraction = swift.fraction();
        } else {
            solveByReference(unit, rampOhms, into);
        }
    }

    private void solveByReference(UnitValues unit, double rampOhms, UnitOutcome into) {
        Solution solution = referred(unit, rampOhms);
        LoadResult load = LoadPower.of(design, solution.condition(), solution);
        into.firingRad = solution.shown().firingRad().orElse(Double.NaN);
        into.state = solution.state();
        into.watts = load.watts();
        into.fraction = load.fraction();
    }

    private Solution referred(UnitValues unit, double rampOhms) {
        unit.fill(network, rampOhms);
        return Firing.solve(design, new Condition(unit.lineVolts, unit.lineHertz, unit.celsius), network);
    }
}
