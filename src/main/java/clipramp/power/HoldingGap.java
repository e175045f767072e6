package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.LineWave;
import clipramp.engine.LoadCurrent;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** How long, around the line's zero, a conducting path's current stays under the thyristor's holding current. */
public final class HoldingGap {
    private static final double ACCURACY_RAD = 1e-12;
    private static final int TRIALS = 200;

    private HoldingGap() {}

    /**
     * The shorter of the two gaps of a period.
     *
     * @param design stage and load
     * @param condition line
     * @param holdingAmps I_H, A
     * @return s; half a period where the load never takes the holding current
     */
    public static double seconds(Design design, Condition condition, double holdingAmps) {
        LoadCurrent load = new LoadCurrent(design, condition);
        LineWave line = new LineWave(design.line(), condition);
        double atPositive = gapRad(load, line.positiveStartRad(), holdingAmps);
        double atNegative = gapRad(load, line.negativeStartRad(), holdingAmps);
        return Math.min(atPositive, atNegative) / condition.omega();
    }

    private static double gapRad(LoadCurrent load, double zeroRad, double holdingAmps) {
        return reachRad(load, zeroRad, holdingAmps, -1) + reachRad(load, zeroRad, holdingAmps, 1);
    }

    /** Angle from a zero, in one direction, at which the current reaches the holding current. */
    private static double reachRad(LoadCurrent load, double zeroRad, double holdingAmps, int direction) {
        double step = 0.01;
        double from = 0;
        while (from < Math.PI / 2) {
            double to = from + step;
            if (load.ampsAt(zeroRad + direction * to) >= holdingAmps) {
                return new BrentSolver(ACCURACY_RAD)
                        .solve(TRIALS, rad -> load.ampsAt(zeroRad + direction * rad) - holdingAmps, from, to);
            }
            from = to;
        }
        return Math.PI / 2;
    }
}
