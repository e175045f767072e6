package clipramp.power;

import java.util.function.DoubleUnaryOperator;

/**
 * A stretch of the load's current without a break.
 *
 * @param fromRad line angle at which it begins, from the positive-going zero that begins the first period, rad
 * @param toRad line angle at which it ends, on the same count, rad
 * @param direction sign of the line's current, +1 or -1; 0 on a freewheeling path, which the line does not feel
 * @param memoryRad time constant of the loop as an angle, rad; 0 where the current follows the line at once
 * @param amps magnitude of the load's current at a line angle of the stretch, A
 * @param loadVolts voltage across the load there, in the direction of its current, V
 */
public record CurrentSpan(
        double fromRad,
        double toRad,
        int direction,
        double memoryRad,
        DoubleUnaryOperator amps,
        DoubleUnaryOperator loadVolts) {

    /** Whether the current passes a thyristor and the line, not a freewheeling diode. */
    public boolean throughThyristor() {
        return direction != 0;
    }

    /** The part of it between two angles; both must lie within. */
    CurrentSpan between(double newFromRad, double newToRad) {
        return new CurrentSpan(newFromRad, newToRad, direction, memoryRad, amps, loadVolts);
    }
}
