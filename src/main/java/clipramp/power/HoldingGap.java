package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.engine.InductiveCurrent;
import clipramp.engine.LineWave;
import clipramp.engine.LoadCurrent;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * How long a thyristor is let recover: the time for which its current stays under the holding current, or for which it is
 * reverse biased, before forward voltage comes back (DEVELOPERS.md, Commutation, snubber, inrush).
 */
public final class HoldingGap {
    private static final double ACCURACY_RAD = 1e-12;
    private static final int TRIALS = 200;
    private static final double STEP_RAD = 0.002;

    /** So much after the angle at which the line begins to drive a path there is no doubt which way, rad. */
    private static final double AFTER_RAD = 1e-6;

    private HoldingGap() {}

    /**
     * The shortest gap of a period.
     *
     * <p>A bridge never reverses its thyristor: what counts is how long the current stays under I_H around the line's
     * zero (dc side) or around its own (ac side). On the dc side a freewheeling diode takes the load's current; the
     * thyristor, were it still on, would take it back when |v| > V_T0 + n V_F - V_FW again, slopes added. Elsewhere the
     * line reverses the thyristor from the current's end to its next zero.
     *
     * @param design stage and load
     * @param condition line
     * @param period the load's current there
     * @param holdingAmps I_H, A
     * @return s; half a period where the load never takes the holding current; 0 where the thyristor never lets go
     */
    public static double seconds(Design design, Condition condition, LoadPeriod period, double holdingAmps) {
        LineWave line = new LineWave(design.line(), condition);
        double rad;
        if (!period.letsGo()) {
            rad = 0;
        } else if (design.stage() == Stage.BRIDGE_DC || design.stage() == Stage.BRIDGE_AC) {
            rad = design.load() instanceof Load.Inductive inductive
                    ? bridgedRad(design, condition, LoadLoop.of(design, condition, inductive), period, holdingAmps)
                    : aroundZerosRad(line, new LoadCurrent(design, condition)::ampsAt, holdingAmps);
        } else {
            rad = reversedRad(line, period);
        }
        return rad / condition.omega();
    }

    private static double aroundZerosRad(LineWave line, DoubleUnaryOperator amps, double holdingAmps) {
        return Math.min(
                aroundRad(amps, line.positiveStartRad(), holdingAmps),
                aroundRad(amps, line.negativeStartRad(), holdingAmps));
    }

    private static double aroundRad(DoubleUnaryOperator amps, double zeroRad, double holdingAmps) {
        return reachRad(rad -> amps.applyAsDouble(zeroRad - rad), holdingAmps)
                + reachRad(rad -> amps.applyAsDouble(zeroRad + rad), holdingAmps);
    }

    /** Angle from a zero, in one direction, at which the current reaches the holding current. */
    private static double reachRad(DoubleUnaryOperator away, double holdingAmps) {
        double from = 0;
        if (away.applyAsDouble(0) >= holdingAmps) {
            return 0;
        }
        while (from < Math.PI / 2) {
            double to = from + STEP_RAD;
            if (away.applyAsDouble(to) >= holdingAmps) {
                return new BrentSolver(ACCURACY_RAD)
                        .solve(TRIALS, rad -> away.applyAsDouble(rad) - holdingAmps, from, to);
            }
            from = to;
        }
        return Math.PI / 2;
    }

    private static double bridgedRad(
            Design design, Condition condition, LoadLoop loop, LoadPeriod period, double holdingAmps) {
        return design.stage() == Stage.BRIDGE_AC
                ? alternatingRad(loop, period, holdingAmps)
                : freewheeledRad(new LineWave(design.line(), condition), loop, period, holdingAmps);
    }

    /** The load's current at the line's zeros, were the thyristor still on, taken over from the diode by the slopes. */
    private static double freewheeledRad(LineWave line, LoadLoop loop, LoadPeriod period, double holdingAmps) {
        double least = Double.POSITIVE_INFINITY;
        for (double zero : new double[] {line.positiveStartRad(), line.negativeStartRad()}) {
            double carried = freewheelingAmps(period, zero);
            if (carried <= holdingAmps) {
                least = Math.min(least, grownRad(loop, zero, carried, holdingAmps));
                continue;
            }
            double slope = loop.freewheel().map(d -> d.slopeOhms()).orElse(0.0);
            double volts = loop.freewheel().map(d -> d.dropVolts()).orElse(0.0);
            double needed = loop.dropVolts() + loop.dropOhms() * holdingAmps - volts - slope * (carried - holdingAmps);
            least = Math.min(
                    least,
                    needed <= 0 ? 0 : aroundRad(rad -> Math.abs(loop.line().voltsAt(rad)) / needed, zero, 1));
        }
        return least;
    }

    private static double freewheelingAmps(LoadPeriod period, double zeroRad) {
        double turn = 2 * Math.PI;
        double at = zeroRad <= 0 ? zeroRad + turn : zeroRad;
        OptionalDouble amps = period.spans().stream()
                .filter(span -> !span.throughThyristor() && span.fromRad() <= at + 1e-9 && at <= span.toRad() + 1e-9)
                .mapToDouble(span -> span.amps().applyAsDouble(at))
                .findFirst();
        return Math.max(0, amps.orElse(0));
    }

    /** Around every end of current on the ac side of a bridge, which turns the load's current over at once. */
    private static double alternatingRad(LoadLoop loop, LoadPeriod period, double holdingAmps) {
        double least = Math.PI;
        for (CurrentSpan span : period.spans()) {
            double end = span.toRad();
            if (span.amps().applyAsDouble(end) > holdingAmps / 2 || span.toRad() - span.fromRad() < STEP_RAD) {
                continue;
            }
            double before =
                    reachRad(rad -> span.amps().applyAsDouble(Math.max(span.fromRad(), end - rad)), holdingAmps);
            least = Math.min(least, before + grownRad(loop, end, 0, holdingAmps));
        }
        return least;
    }

    /** From an angle until a current that the line drives again has reached the holding current, a quarter turn at most. */
    private static double grownRad(LoadLoop loop, double fromRad, double amps, double holdingAmps) {
        double latest = fromRad + Math.PI / 2;
        double start = drivenFromRad(loop, fromRad, latest);
        InductiveCurrent grown = loop.throughThyristor(start, loop.directionAt(start), amps);
        return Math.min(PulseLength.reachesRad(grown, start, latest, holdingAmps), latest) - fromRad;
    }

    /** An angle at once if the line exceeds the drops there, else just after it first does. */
    private static double drivenFromRad(LoadLoop loop, double fromRad, double latestRad) {
        double from = fromRad;
        while (loop.drivingVolts(from) <= 0 && from < latestRad) {
            double to = from + STEP_RAD;
            if (loop.drivingVolts(to) > 0) {
                return new BrentSolver(ACCURACY_RAD).solve(TRIALS, loop::drivingVolts, from, to) + AFTER_RAD;
            }
            from = to;
        }
        return from;
    }

    /** From the end of a current to the line's next zero: until then the line reverses the thyristor. */
    private static double reversedRad(LineWave line, LoadPeriod period) {
        double least = Math.PI;
        double[] zeros = {line.positiveStartRad(), line.negativeStartRad()};
        for (CurrentSpan span : period.spans()) {
            if (!span.throughThyristor() || span.toRad() >= period.spanRad()) {
                continue;
            }
            // The direction that it carried is forward again from the zero that begins that half cycle.
            double forwardFrom = span.direction() > 0 ? zeros[0] : zeros[1];
            double gap = Math.IEEEremainder(forwardFrom - span.toRad(), 2 * Math.PI);
            least = Math.min(least, gap <= 0 ? gap + 2 * Math.PI : gap);
        }
        return least;
    }
}
