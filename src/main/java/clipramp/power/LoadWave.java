package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.List;

/**
 * Voltage across the load over one half cycle, or over one period for a half-wave stage: what the line leaves while
 * current flows, the diode's drop while it freewheels, 0 otherwise. An inductive load's current of the half cycle before
 * may still flow as it begins. The arrays are not copied, and nobody writes into them.
 *
 * @param rad angles of the line, rad, from 0, never falling; two samples where the voltage jumps
 * @param volts voltage across the load at those angles, V; on the dc side of a bridge positive but for a freewheeling
 *     diode's drop
 */
@SuppressWarnings("ArrayRecordComponent") // shown, never compared
public record LoadWave(double[] rad, double[] volts) {
    /** Samples of one conducting half cycle: a hundredth of it is under the width of a screen's pixel. */
    private static final int SAMPLES = 180;

    /**
     * The wave of a solution.
     *
     * @param design stage, load and thyristor
     * @param condition line voltage
     * @param solution the firing circuit's periodic state there
     */
    public static LoadWave of(Design design, Condition condition, Solution solution) {
        boolean whole = design.stage() == Stage.HALF_WAVE || solution.spansPeriods();
        double start = whole ? 0 : shownHalf(solution) * Math.PI;
        double end = start + (whole ? 2 : 1) * Math.PI;
        List<double[]> samples = new ArrayList<>();
        samples.add(new double[] {0, 0});
        for (CurrentSpan span : LoadPower.period(design, condition, solution).spans()) {
            double from = Math.max(start, span.fromRad());
            double to = Math.min(end, span.toRad());
            if (from < to) {
                double sign = design.stage() == Stage.BRIDGE_DC ? 1 : span.direction() < 0 ? -1 : 1;
                sample(span.between(from, to), start, sign, samples);
            }
        }
        samples.add(new double[] {end - start, 0});
        return new LoadWave(column(samples, 0), column(samples, 1));
    }

    /** The first half cycle in which the line is positive. */
    private static int shownHalf(Solution solution) {
        List<ActingPulses.Slot> slots = ActingPulses.slots(solution);
        for (int half = 0; half < slots.size(); half++) {
            if (slots.get(half).positive()) {
                return half;
            }
        }
        return 0;
    }

    private static void sample(CurrentSpan span, double start, double sign, List<double[]> samples) {
        double length = span.toRad() - span.fromRad();
        samples.add(new double[] {span.fromRad() - start, 0});
        for (int i = 0; i <= SAMPLES; i++) {
            double rad = span.fromRad() + length * i / SAMPLES;
            samples.add(new double[] {rad - start, sign * span.loadVolts().applyAsDouble(rad)});
        }
        samples.add(new double[] {span.toRad() - start, 0});
    }

    private static double[] column(List<double[]> samples, int column) {
        return samples.stream().mapToDouble(sample -> sample[column]).toArray();
    }
}
