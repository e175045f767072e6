package clipramp.circuit;

import java.util.List;

/**
 * The alternating line. v(t) = sqrt(2) V [sin wt + sum of share_k sin(k wt + phase_k)].
 *
 * @param volts rms of the fundamental, V
 * @param hertz frequency, Hz
 * @param lowVolts lowest rms that the design must work at, V
 * @param highVolts highest rms that the design must work at, V
 * @param harmonics shares of the fundamental, may be empty
 */
public record Line(double volts, double hertz, double lowVolts, double highVolts, List<Harmonic> harmonics) {
    /**
     * @param order 2 or more
     * @param share amplitude as a fraction of the fundamental, 0..1
     * @param phaseRad phase at the fundamental's positive-going zero, in the harmonic's own angle
     */
    public record Harmonic(int order, double share, double phaseRad) {
        public Harmonic {
            if (order < 2 || order > 100) {
                throw new IllegalArgumentException("harmonic order must lie in 2..100, is " + order);
            }
            Require.fraction("harmonic share", share);
            Require.finite("harmonic phase", phaseRad);
        }
    }

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

    /** Largest magnitude of the line voltage, V, for an rms of the fundamental in V; to 1e-6 of it with harmonics. */
    public double crestVolts(double fundamentalVolts) {
        if (harmonics.isEmpty()) {
            return Math.sqrt(2) * fundamentalVolts;
        }
        int highest = harmonics.stream().mapToInt(Harmonic::order).max().orElse(1);
        int samples = 2000 * highest;
        double crest = 0;
        for (int i = 0; i < samples; i++) {
            crest = Math.max(crest, Math.abs(voltsAt(fundamentalVolts, 2 * Math.PI * i / samples)));
        }
        return crest;
    }
}
