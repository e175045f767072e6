package clipramp.spread;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.engine.Network;
import clipramp.engine.UnitValues;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.power.SwiftPoint;
import org.jspecify.annotations.Nullable;

/**
 * Solves one drawn unit at one knob position: by the swift path where the design suits it and it is sure of itself, else by
 * the reference path. Not for two threads at once.
 */
final class UnitSolver {
    private final Design design;
    private final Network network = new Network();
    private final @Nullable SwiftPoint swift;
    private final @Nullable TrimmerSetting setting;

    UnitSolver(Design design) {
        this.design = design;
        swift = SwiftPoint.suits(design) ? new SwiftPoint(design) : null;
        setting = design.ramp().trimmers().isNone() ? null : new TrimmerSetting(design, this);
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

    /** The same for a whole R_E in ohms. */
    void solveAt(UnitValues unit, double rampOhms, UnitOutcome into) {
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
        unit.fill(network, rampOhms);
        Condition condition = new Condition(unit.lineVolts, unit.lineHertz, unit.celsius);
        Solution solution = Firing.solve(design, condition, network);
        LoadResult load = LoadPower.of(design, condition, solution);
        into.firingRad = solution.shown().firingRad().orElse(Double.NaN);
        into.state = solution.state();
        into.watts = load.watts();
        into.fraction = load.fraction();
    }

    /** Whether the load can get both half cycles. */
    boolean isFullWave() {
        return design.stage() != Stage.HALF_WAVE;
    }
}
