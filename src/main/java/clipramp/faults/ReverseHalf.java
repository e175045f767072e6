package clipramp.faults;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.LineWave;
import clipramp.engine.Network;
import clipramp.firing.Dissipation;
import clipramp.firing.Waveforms;

/**
 * The half cycle that a shorted rectifier diode lets through backwards: the dropper carries it, the zener conducts
 * forwards. The engine knows what that leaves of the ramp; this is what the parts bear and the meters read meanwhile
 * (DEVELOPERS.md, Single faults). Only for a supply that works over whole periods.
 */
final class ReverseHalf {
    /** Forward voltage of a conducting zener, V (common practice). */
    static final double ZENER_VOLTS = 0.7;

    private static final int STEPS = 720;

    private ReverseHalf() {}

    /** Whether a network is fed so. */
    static boolean isIn(Network network) {
        return network.reverseVolts > 0;
    }

    /** Dropper and zener with their second half cycle. */
    static Dissipation borne(Design design, Condition condition, Network network, Dissipation forward) {
        LineWave line = new LineWave(design.line(), condition);
        double ratio = design.clip().windingRatio();
        double square = 0;
        double mean = 0;
        double peak = 0;
        for (int i = 0; i < 2 * STEPS; i++) {
            double volts = -ratio * line.voltsAt((i + 0.5) * Math.PI / STEPS) - network.reverseVolts;
            if (volts > 0) {
                square += volts * volts / (2 * STEPS);
                mean += volts / (2 * STEPS);
                peak = Math.max(peak, volts);
            }
        }
        return forward.withMore(square / network.dropperOhms, peak, mean / network.dropperOhms * network.reverseVolts);
    }

    /** V_S at the samples, V to common: backwards in the second half of every period. */
    static double[] supplyVolts(Waveforms waves, Network network) {
        double[] volts = waves.supplyVolts().clone();
        double begins = middle(waves);
        for (int i = 0; i < volts.length; i++) {
            volts[i] = waves.seconds()[i] > begins ? -network.reverseVolts : volts[i];
        }
        return volts;
    }

    /** V_C at the samples, V to common. */
    static double[] rampVolts(Waveforms waves, Network network) {
        double[] volts = waves.rampVolts().clone();
        double begins = middle(waves);
        double from = 0;
        for (int i = 0; i < volts.length; i++) {
            double since = waves.seconds()[i] - begins;
            if (since > 0) {
                volts[i] = network.rampUnderReverse(from, since);
            } else {
                from = volts[i];
            }
        }
        return volts;
    }

    private static double middle(Waveforms waves) {
        double first = waves.seconds()[0];
        return first + (waves.seconds()[waves.seconds().length - 1] - first) / 2;
    }
}
