package clipramp.faults;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.power.CurrentSpan;
import clipramp.power.LoadPeriod;

/** Turns waveforms into what instruments show. */
final class Meters {
    private static final int STEPS_PER_HALF = 720;

    private Meters() {}

    /**
     * A voltage sampled over whole cycles of it.
     *
     * @param seconds instants, s, never falling
     * @param volts values, V; straight lines between two of them
     */
    static Reading of(double[] seconds, double[] volts) {
        double area = 0;
        double square = 0;
        double peak = 0;
        for (int i = 0; i < volts.length; i++) {
            if (i > 0) {
                double width = seconds[i] - seconds[i - 1];
                double a = volts[i - 1];
                double b = volts[i];
                area += width * (a + b) / 2;
                square += width * (a * a + a * b + b * b) / 3;
            }
            peak = Math.abs(volts[i]) > Math.abs(peak) ? volts[i] : peak;
        }
        double length = seconds[seconds.length - 1] - seconds[0];
        return reading(area / length, square / length, peak);
    }

    private static Reading reading(double mean, double meanSquare, double peak) {
        return new Reading(mean, Math.sqrt(Math.max(0, meanSquare - mean * mean)), peak);
    }

    /**
     * Anode against cathode: the line less what load and bridge diodes take. Behind a bridge it is never negative.
     *
     * @param period the load's current
     * @param oneHalf whether a bridge lets positive half cycles through only
     */
    static Reading acrossThyristor(Design design, Condition condition, LoadPeriod period, boolean oneHalf) {
        boolean rectified = design.stage() == Stage.BRIDGE_DC || design.stage() == Stage.BRIDGE_AC;
        int steps = STEPS_PER_HALF * period.halfCycles();
        double sum = 0;
        double square = 0;
        double peak = 0;
        for (int i = 0; i < steps; i++) {
            double rad = (i + 0.5) * Math.PI / STEPS_PER_HALF;
            double line = design.line().voltsAt(condition.lineVolts(), rad);
            double volts = line - loadVolts(period, rad);
            if (rectified) {
                double drops =
                        design.stage().bridgeDiodes() * design.stageDiodes().dropVolts();
                double forward = oneHalf ? volts : Math.signum(line) * volts;
                volts = Math.max(0, forward - drops);
            }
            sum += volts;
            square += volts * volts;
            peak = Math.abs(volts) > Math.abs(peak) ? volts : peak;
        }
        return reading(sum / steps, square / steps, peak);
    }

    private static double loadVolts(LoadPeriod period, double rad) {
        for (CurrentSpan span : period.spans()) {
            if (span.throughThyristor() && rad >= span.fromRad() && rad < span.toRad()) {
                return span.direction() * span.loadVolts().applyAsDouble(rad);
            }
        }
        return 0;
    }
}
