package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.engine.InductiveCurrent;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** How long a gate pulse must last for the current through an inductance to reach the latching current. */
public final class PulseLength {
    private static final double STEP_RAD = 0.01;
    private static final double ROOT_RAD = 1e-13;
    private static final int TRIALS = 200;

    private PulseLength() {}

    /**
     * Time from firing, with no current flowing before, until the load's current reaches a value.
     *
     * @param design stage and load, nominal
     * @param condition line voltage
     * @param firingRad line angle of firing, from the fundamental's positive-going zero, rad
     * @param amps the current to reach, A, above 0
     * @return s; 0 for a resistor that has it at once; empty where it never gets there in this half cycle
     */
    public static OptionalDouble secondsToReach(Design design, Condition condition, double firingRad, double amps) {
        if (!(design.load() instanceof Load.Inductive load)) {
            ResistorCurrent path = new ResistorCurrent(design, condition);
            return path.spanFiredAt(true, firingRad, 0).stream()
                            .anyMatch(span -> span.amps().applyAsDouble(firingRad) >= amps)
                    ? OptionalDouble.of(0)
                    : OptionalDouble.empty();
        }
        LoadLoop loop = LoadLoop.of(design, condition, load);
        if (loop.drivingVolts(firingRad) <= 0) {
            return OptionalDouble.empty();
        }
        InductiveCurrent current = loop.throughThyristor(firingRad, loop.directionAt(firingRad), 0);
        double end = Math.min(current.extinctionRad(firingRad + 2 * Math.PI), firingRad + 2 * Math.PI);
        double rad = reachesRad(current, firingRad, end, amps);
        return rad < end ? OptionalDouble.of((rad - firingRad) / condition.omega()) : OptionalDouble.empty();
    }

    /** First angle at which a current reaches a value, rad; POSITIVE_INFINITY for none before the end. */
    static double reachesRad(InductiveCurrent current, double from, double end, double amps) {
        double below = from;
        while (below < end) {
            double above = Math.min(end, below + STEP_RAD);
            if (current.ampsAt(above) >= amps) {
                return new BrentSolver(ROOT_RAD).solve(TRIALS, at -> current.ampsAt(at) - amps, below, above);
            }
            below = above;
        }
        return Double.POSITIVE_INFINITY;
    }

    /**
     * phi = atan(w L/R), R everything resistive in the load's loop: the load's angle, under which a thyristor has nothing to
     * control, rad; 0 for a resistor.
     */
    public static double loadAngleRad(Design design, Condition condition) {
        if (!(design.load() instanceof Load.Inductive load)) {
            return 0;
        }
        LoadLoop loop = LoadLoop.of(design, condition, load);
        return Math.atan2(condition.omega() * loop.henries(), loop.loadOhms() + loop.dropOhms());
    }
}
