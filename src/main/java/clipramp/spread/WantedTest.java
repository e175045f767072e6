package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.circuit.Ramp;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.engine.UnitValues;
import java.util.Optional;

/** Whether a unit reaches what is wanted at the knob's ends. */
final class WantedTest {
    private final Optional<Goal> lowest;
    private final Optional<Goal> highest;
    private final double loadOhms;
    private final Ramp ramp;
    private final UnitOutcome outcome = new UnitOutcome();

    WantedTest(Design design) {
        lowest = design.wanted().lowest();
        highest = design.wanted().highest();
        loadOhms = design.load().resistanceOhms();
        ramp = design.ramp();
    }

    boolean isAsked() {
        return lowest.isPresent() || highest.isPresent();
    }

    boolean holds(UnitSolver solver, UnitValues unit) {
        return lowest.map(goal -> meets(goal, solver, unit, true)).orElse(true)
                && highest.map(goal -> meets(goal, solver, unit, false)).orElse(true);
    }

    private boolean meets(Goal goal, UnitSolver solver, UnitValues unit, boolean lowestSetting) {
        solver.solve(unit, share(ramp, goal.position()), outcome);
        double there = measured(goal.measure());
        // An angle runs against the power: the lowest setting is wanted at or over it.
        boolean atMost = lowestSetting != (goal.measure() == Measure.ANGLE);
        if (goal.isBand()) {
            return there >= goal.from() && there <= goal.to();
        }
        return atMost ? there <= goal.to() : there >= goal.from();
    }

    private double measured(Measure measure) {
        return switch (measure) {
            case FRACTION -> outcome.fraction;
            case WATTS -> outcome.watts;
            case VOLTS -> Math.sqrt(outcome.watts * loadOhms);
            case ANGLE -> outcome.latestRad();
        };
    }

    /** Share of the track at a knob position; 0 for a fixed ramp. */
    static double share(Ramp ramp, double position) {
        return ramp.pot().map(pot -> pot.trackShare(position)).orElse(0.0);
    }
}
