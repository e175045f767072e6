package clipramp.figures;

import clipramp.firing.Waveforms;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the lanes show: one half cycle, or one period of the line for a half-wave stage.
 *
 * @param waves sampled firing circuit, two samples or more
 * @param loadRad line angles of the load's samples, rad, never falling
 * @param loadVolts voltage across the load at those angles, V
 * @param firingRad angle at which the thyristor is turned on, rad; empty when it stays off
 * @param hertz line frequency, Hz
 */
public record Lanes(Waveforms waves, double[] loadRad, double[] loadVolts, OptionalDouble firingRad, double hertz) {
    /**
     * Refuses lanes that no line can be drawn through.
     *
     * @throws IllegalArgumentException for fewer than two samples of anything, or a frequency that is not above 0
     */
    public Lanes {
        if (waves.angleRad().length < 2 || loadRad.length < 2 || loadRad.length != loadVolts.length) {
            throw new IllegalArgumentException("lanes need two samples or more of everything");
        }
        if (!(hertz > 0)) {
            throw new IllegalArgumentException("line frequency must be above 0, is " + hertz);
        }
    }

    /** Angle that the lanes span from 0: half a period or a whole one, rad. */
    double spanRad() {
        double last = waves.angleRad()[waves.angleRad().length - 1];
        return last > 1.5 * Math.PI ? 2 * Math.PI : Math.PI;
    }

    double[] angles(Lane lane) {
        return lane == Lane.LOAD ? loadRad : waves.angleRad();
    }

    /** A lane's samples, SI. */
    double[] values(Lane lane) {
        return switch (lane) {
            case LINE -> waves.lineVolts();
            case SUPPLY -> waves.supplyVolts();
            case RAMP -> waves.rampVolts();
            case PULSE -> waves.gateAmps();
            case LOAD -> loadVolts;
        };
    }

    /** A lane's value at an angle, SI, straight between samples; NaN outside them. */
    double valueAt(Lane lane, double angleRad) {
        return between(angles(lane), values(lane), angleRad);
    }

    /** The peak point at an angle, V. */
    double peakPointAt(double angleRad) {
        return between(waves.angleRad(), waves.peakPointVolts(), angleRad);
    }

    /**
     * The top of a gate pulse.
     *
     * @param angleRad where the gate current of the firing pulse is largest, rad
     * @param amps how large it is, A
     */
    public record PulsePeak(double angleRad, double amps) {}

    /** The peak of the gate pulse that begins at the firing angle; empty where nothing fires or no gate current flows. */
    Optional<PulsePeak> firingPulse() {
        if (firingRad.isEmpty()) {
            return Optional.empty();
        }
        double[] amps = waves.gateAmps();
        int peak = -1;
        for (int i = 0; i < amps.length; i++) {
            boolean begun = waves.angleRad()[i] >= firingRad.getAsDouble() - 1e-9;
            boolean over = peak >= 0 && amps[i] <= 0;
            if (over) {
                break;
            }
            if (begun && amps[i] > 0 && (peak < 0 || amps[i] > amps[peak])) {
                peak = i;
            }
        }
        return peak < 0 ? Optional.empty() : Optional.of(new PulsePeak(waves.angleRad()[peak], amps[peak]));
    }

    private static double between(double[] x, double[] y, double at) {
        int upper = 1;
        while (upper < x.length - 1 && x[upper] < at) {
            upper++;
        }
        double width = x[upper] - x[upper - 1];
        if (at < x[0] - 1e-9 || at > x[x.length - 1] + 1e-9) {
            return Double.NaN;
        }
        return width <= 0 ? y[upper] : y[upper - 1] + (y[upper] - y[upper - 1]) * (at - x[upper - 1]) / width;
    }
}
