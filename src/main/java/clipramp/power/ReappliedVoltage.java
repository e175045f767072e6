package clipramp.power;

import clipramp.circuit.Load;
import clipramp.circuit.Snubber;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/**
 * How voltage comes back over a thyristor when an inductive load's current has died: the line's voltage of that instant
 * steps onto load resistance, load inductance, snubber resistor and snubber capacitor in series.
 *
 * <p>L i'' + (R + R_s) i' + i/C = 0 with i(0) = 0, i'(0) = V/L; the thyristor sees V - R i - L i', and its rate of rise is
 * R_s i' + i/C. The line is held for the microseconds that this takes. Without a snubber the stray capacitance of device
 * and wiring alone limits it: 100 pF, common practice (DEVELOPERS.md, Commutation, snubber, inrush). Largest values are
 * looked for at instants so near to each other that they come out right to a thousandth.
 *
 * @param stepVolts line voltage at extinction, V
 * @param voltsPerSecond largest rate of rise, V/s
 * @param peakVolts largest voltage, V
 * @param snubbed whether there is a snubber
 */
public record ReappliedVoltage(double stepVolts, double voltsPerSecond, double peakVolts, boolean snubbed) {
    /** Stray capacitance of device and wiring together, F: common practice. */
    public static final double STRAY_FARADS = 100e-12;

    private static final int SAMPLES = 600;

    /**
     * The voltage that comes back after one extinction.
     *
     * @param load the load
     * @param snubber resistor and capacitor, if there are any
     * @param stepVolts line voltage at the extinction, V, 0 or more
     */
    public static ReappliedVoltage of(Load.Inductive load, Optional<Snubber> snubber, double stepVolts) {
        double dampingOhms = snubber.map(Snubber::resistanceOhms).orElse(0.0);
        double farads = snubber.map(Snubber::capacitanceFarads).orElse(STRAY_FARADS);
        double henries = load.inductanceHenries();
        double ohms = load.resistanceOhms() + dampingOhms;
        Series series = new Series(stepVolts, ohms / (2 * henries), 1 / (henries * farads), henries);
        // Long enough for a quarter swing and for a slow charge through the resistance.
        double slow = Math.max(Math.sqrt(henries * farads), ohms * farads);
        double longest = 8 * slow;
        double quickest = Math.min(Math.sqrt(henries * farads), 2 * henries / ohms) / 1000;
        double rise = largest(t -> dampingOhms * series.slope(t) + series.amps(t) / farads, quickest, longest);
        double peak = largest(
                t -> stepVolts - load.resistanceOhms() * series.amps(t) - henries * series.slope(t), quickest, longest);
        return new ReappliedVoltage(stepVolts, rise, Math.max(peak, stepVolts), snubber.isPresent());
    }

    /** Largest value on instants spaced by equal ratios, 0 included; between them it changes by under a thousandth. */
    private static double largest(DoubleUnaryOperator function, double quickest, double longest) {
        double best = function.applyAsDouble(0);
        double ratio = Math.pow(longest / quickest, 1.0 / SAMPLES);
        double t = quickest;
        for (int i = 0; i <= SAMPLES; i++) {
            best = Math.max(best, function.applyAsDouble(t));
            t *= ratio;
        }
        return best;
    }

    /** Current of the series circuit after the step. */
    private record Series(double volts, double damping, double squareRate, double henries) {
        /** e^(-a t) times sin(w t)/w, sinh(b t)/b or t. */
        private double shape(double t) {
            double gap = squareRate - damping * damping;
            if (gap > 0) {
                double w = Math.sqrt(gap);
                return Math.exp(-damping * t) * Math.sin(w * t) / w;
            }
            double b = Math.sqrt(-gap);
            return b * t < 1e-6
                    ? Math.exp(-damping * t) * t
                    : (Math.exp((b - damping) * t) - Math.exp(-(b + damping) * t)) / (2 * b);
        }

        private double swing(double t) {
            double gap = squareRate - damping * damping;
            if (gap > 0) {
                return Math.exp(-damping * t) * Math.cos(Math.sqrt(gap) * t);
            }
            double b = Math.sqrt(-gap);
            return (Math.exp((b - damping) * t) + Math.exp(-(b + damping) * t)) / 2;
        }

        double amps(double t) {
            return volts / henries * shape(t);
        }

        double slope(double t) {
            return volts / henries * (swing(t) - damping * shape(t));
        }
    }
}
