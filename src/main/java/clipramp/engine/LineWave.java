package clipramp.engine;

import clipramp.circuit.Condition;
import clipramp.circuit.Line;
import clipramp.circuit.RefusedCircuit;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The line voltage of one condition: v = sum over k of amplitude_k sin(k theta + phase_k), theta counted from the
 * positive-going zero of the fundamental (DEVELOPERS.md, Line and source). Orders count from 1, the fundamental.
 */
public final class LineWave {
    /** Samples a period and order: finer than any two zeros that a band-limited wave can hide from a designer. */
    private static final int SAMPLES_PER_ORDER = 64;

    private static final double ZERO_ACCURACY_RAD = 1e-15;

    private final int[] orders;
    private final double[] amplitudes;
    private final double[] phases;
    private final double omega;
    private final double positiveStartRad;
    private final double negativeStartRad;

    /**
     * A line at a condition; its own zeros are found to 1e-15 rad.
     *
     * @param line harmonics
     * @param condition rms volts of the fundamental and hertz
     * @throws RefusedCircuit if the wave has more than two zeros a period
     */
    public LineWave(Line line, Condition condition) {
        int count = 1 + line.harmonics().size();
        orders = new int[count];
        amplitudes = new double[count];
        phases = new double[count];
        double peak = Math.sqrt(2) * condition.lineVolts();
        orders[0] = 1;
        amplitudes[0] = peak;
        for (int i = 1; i < count; i++) {
            Line.Harmonic harmonic = line.harmonics().get(i - 1);
            orders[i] = harmonic.order();
            amplitudes[i] = peak * harmonic.share();
            phases[i] = harmonic.phaseRad();
        }
        omega = condition.omega();
        if (count == 1) {
            positiveStartRad = 0;
            negativeStartRad = Math.PI;
        } else {
            double[] zeros = zeros();
            positiveStartRad = zeros[0];
            negativeStartRad = zeros[1];
        }
    }

    /** Line voltage, V, at an angle in rad from the fundamental's positive-going zero. */
    public double voltsAt(double angleRad) {
        double sum = 0;
        for (int i = 0; i < orders.length; i++) {
            sum += amplitudes[i] * Math.sin(orders[i] * angleRad + phases[i]);
        }
        return sum;
    }

    /** Angle of the wave's own positive-going zero, near 0, rad. */
    public double positiveStartRad() {
        return positiveStartRad;
    }

    /** Angle of the wave's own negative-going zero, near pi, rad. */
    public double negativeStartRad() {
        return negativeStartRad;
    }

    /** Angular frequency of the fundamental, rad/s. */
    public double omega() {
        return omega;
    }

    /** Whether there are no harmonics, so that the wave's zeros are the fundamental's. */
    public boolean isPureSine() {
        return orders.length == 1;
    }

    /** Whether the negative half mirrors the positive one: no even orders. */
    public boolean isHalfWaveSymmetric() {
        for (int i = 0; i < orders.length; i++) {
            if (orders[i] % 2 == 0 && amplitudes[i] != 0) {
                return false;
            }
        }
        return true;
    }

    /** Number of sinusoids, the fundamental first. */
    int count() {
        return orders.length;
    }

    int order(int index) {
        return orders[index];
    }

    double amplitude(int index) {
        return amplitudes[index];
    }

    double phase(int index) {
        return phases[index];
    }

    /** No slope of the wave exceeds this, V/rad. */
    private double steepest() {
        double sum = 0;
        for (int i = 0; i < orders.length; i++) {
            sum += orders[i] * Math.abs(amplitudes[i]);
        }
        return sum;
    }

    private double[] zeros() {
        double finest = 2 * Math.PI / (SAMPLES_PER_ORDER * highestOrder());
        double steepest = steepest();
        double rising = Double.NaN;
        double falling = Double.NaN;
        int crossings = 0;
        // Half a radian before the fundamental's zero: both wanted zeros then come in order.
        double from = -0.5;
        double last = from + 2 * Math.PI;
        double before = voltsAt(from);
        while (from < last) {
            // No zero lies nearer than the steepest slope could reach it.
            double to = Math.min(last, from + Math.max(finest, Math.abs(before) / steepest));
            double after = voltsAt(to);
            if ((before < 0) != (after < 0)) {
                crossings++;
                double zero = new BrentSolver(ZERO_ACCURACY_RAD).solve(200, this::voltsAt, from, to);
                if (before < 0) {
                    rising = zero;
                } else {
                    falling = zero;
                }
            }
            from = to;
            before = after;
        }
        refuseUnlessTwo(crossings);
        return new double[] {rising, falling};
    }

    private static void refuseUnlessTwo(int crossings) {
        if (crossings != 2) {
            throw new RefusedCircuit(
                    "line.harmonics",
                    "the line voltage has " + crossings + " zeros a period; a synchronised circuit is computed for two."
                            + " Make the harmonics smaller.");
        }
    }

    private int highestOrder() {
        int highest = 1;
        for (int order : orders) {
            highest = Math.max(highest, order);
        }
        return highest;
    }
}
