package clipramp.circuit;

import java.util.List;

/**
 * The alternating line. v(t) = sqrt(2) V [sin wt + sum of share_k sin(k wt + phase_k)].
 *
 * @param volts rms of the fundamental, V, above 0
 * @param hertz frequency, Hz, above 0
 * @param lowVolts lowest rms of the fundamental that the design must work at, V, at most {@code volts}
 * @param highVolts highest rms of the fundamental that the design must work at, V, at least {@code volts}
 * @param harmonics in any order, may be empty
 */
public record Line(double volts, double hertz, double lowVolts, double highVolts, List<Harmonic> harmonics) {
    /**
     * One harmonic of the line's voltage.
     *
     * @param order 2..100
     * @param share amplitude as a fraction of the fundamental's, 0..1
     * @param phaseRad phase at the fundamental's positive-going zero, in the harmonic's own angle, rad
     */
    public record Harmonic(int order, double share, double phaseRad) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Harmonic {
            if (order < 2 || order > 100) {
                throw new IllegalArgumentException("harmonic order must lie in 2..100, is " + order);
            }
            Require.fraction("harmonic share", share);
            Require.finite("harmonic phase", phaseRad);
        }
    }

    /** Samples to a period of the highest order: the largest one lies a thousandth under the crest at most. */
    private static final int SAMPLES_PER_ORDER = 72;

    private static final double NEAR_CREST = 0.99;

    /** Shrinks two steps to a part in 1e7: a crest is flat, and its height right to 1e-12. */
    private static final int THIRDS = 40;

    /**
     * @throws IllegalArgumentException where a voltage or the frequency is not above zero, or the voltages are out of order
     */
    public Line {
        Require.positive("line voltage", volts);
        Require.positive("line frequency", hertz);
        Require.positive("low line voltage", lowVolts);
        Require.positive("high line voltage", highVolts);
        if (lowVolts > volts || highVolts < volts) {
            throw new IllegalArgumentException(
                    "line voltages out of order: low " + lowVolts + ", nominal " + volts + ", high " + highVolts);
        }
        harmonics = List.copyOf(harmonics);
    }

    /**
     * The line's voltage at an angle.
     *
     * @param fundamentalVolts rms of the fundamental, V
     * @param thetaRad angle from the positive-going zero of the fundamental, rad
     * @return V
     */
    public double voltsAt(double fundamentalVolts, double thetaRad) {
        double sum = Math.sin(thetaRad);
        for (Harmonic harmonic : harmonics) {
            sum += harmonic.share() * Math.sin(harmonic.order() * thetaRad + harmonic.phaseRad());
        }
        return Math.sqrt(2) * fundamentalVolts * sum;
    }

    /** True rms of the line over the rms of its fundamental: sqrt(1 + sum of shares squared). */
    public double rmsFactor() {
        return Math.sqrt(
                1 + harmonics.stream().mapToDouble(h -> h.share() * h.share()).sum());
    }

    /** Largest magnitude of the line voltage, V, for an rms of the fundamental in V; to 1e-9 of it with harmonics. */
    public double crestVolts(double fundamentalVolts) {
        if (harmonics.isEmpty()) {
            return Math.sqrt(2) * fundamentalVolts;
        }
        int highest = harmonics.stream().mapToInt(Harmonic::order).max().orElse(1);
        double[] sampled = new double[SAMPLES_PER_ORDER * highest];
        double best = 0;
        for (int i = 0; i < sampled.length; i++) {
            sampled[i] = Math.abs(voltsAt(fundamentalVolts, 2 * Math.PI * i / sampled.length));
            best = Math.max(best, sampled[i]);
        }
        double crest = best;
        for (int i = 0; i < sampled.length; i++) {
            double before = sampled[(i + sampled.length - 1) % sampled.length];
            double after = sampled[(i + 1) % sampled.length];
            if (sampled[i] >= NEAR_CREST * best && sampled[i] >= before && sampled[i] >= after) {
                crest = Math.max(crest, crestNear(fundamentalVolts, i, 2 * Math.PI / sampled.length));
            }
        }
        return crest;
    }

    /** Largest magnitude within a step of a sample, by thirds: a crest between two steps is the only one there. */
    private double crestNear(double fundamentalVolts, int sample, double stepRad) {
        double low = (sample - 1) * stepRad;
        double high = (sample + 1) * stepRad;
        for (int i = 0; i < THIRDS; i++) {
            double third = (high - low) / 3;
            double left = Math.abs(voltsAt(fundamentalVolts, low + third));
            double right = Math.abs(voltsAt(fundamentalVolts, high - third));
            if (left < right) {
                low += third;
            } else {
                high -= third;
            }
        }
        return Math.abs(voltsAt(fundamentalVolts, (low + high) / 2));
    }
}
