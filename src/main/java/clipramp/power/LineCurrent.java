package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.LineWave;
import java.util.ArrayList;
import java.util.List;

/**
 * What the load's current is for the line: its Fourier series to the 40th order, exactly as integrals over the stretches
 * of current, exact to rounding (DEVELOPERS.md, Line current). The firing supply's own few milliamperes are left out.
 *
 * @param fundamentalAmps rms of the fundamental, A
 * @param harmonics orders 2 to 40
 * @param dcAmps direct part, A, signed
 * @param rmsAmps rms of the whole current, A
 * @param lineWatts power that the line gives, the stage's losses with it, W
 * @param distortion total harmonic distortion: rms of everything but fundamental and direct part, of every order, over
 *     the fundamental; NaN with no current
 * @param displacementFactor cosine of the angle between the fundamentals of voltage and current; NaN with no current
 * @param powerFactor true power factor, watts over rms volts times rms amperes; NaN with no current
 */
public record LineCurrent(
        double fundamentalAmps,
        List<Harmonic> harmonics,
        double dcAmps,
        double rmsAmps,
        double lineWatts,
        double distortion,
        double displacementFactor,
        double powerFactor) {
    /** Highest order that is told: where the standards' tables end. */
    public static final int HIGHEST_ORDER = 40;

    /**
     * One harmonic, sqrt(2) amps sin(order theta + phase).
     *
     * @param order 2 to 40
     * @param amps rms, A
     * @param phaseRad phase at the positive-going zero of the line's fundamental, in the harmonic's own angle, rad
     */
    public record Harmonic(int order, double amps, double phaseRad) {}

    /** Below this a direct part is what rounding leaves of two equal half cycles, A. */
    private static final double ROUNDING_AMPS = 1e-9;

    /** Keeps a copy of the harmonics. */
    public LineCurrent {
        harmonics = List.copyOf(harmonics);
    }

    /** The direct part as it is told, A, signed: 0 where only rounding is left of it. */
    public double toldDcAmps() {
        return Math.abs(dcAmps) < ROUNDING_AMPS ? 0 : dcAmps;
    }

    /**
     * The line current of a load's current.
     *
     * @param design whose line it is
     * @param condition line voltage
     * @param period the load's current over whole periods
     */
    public static LineCurrent of(Design design, Condition condition, LoadPeriod period) {
        return new Sums(new LineWave(design.line(), condition), period)
                .current(condition.lineVolts() * design.line().rmsFactor(), SpanTotals.highestOrder(design.line()));
    }

    /** Rms of one order, 1 to {@link #HIGHEST_ORDER}, A. */
    public double ampsOf(int order) {
        return order == 1 ? fundamentalAmps : harmonics.get(order - 2).amps();
    }

    /** One order, 1 to {@link #HIGHEST_ORDER}, as a share of the fundamental; NaN with no current. */
    public double shareOf(int order) {
        return fundamentalAmps > 0 ? ampsOf(order) / fundamentalAmps : Double.NaN;
    }

    /** Fourier sums over the stretches that pass the line. */
    private static final class Sums {
        private final LineWave line;
        private final LoadPeriod period;
        private final double[] sines = new double[HIGHEST_ORDER + 1];
        private final double[] cosines = new double[HIGHEST_ORDER + 1];
        private double square;
        private double power;

        Sums(LineWave line, LoadPeriod period) {
            this.line = line;
            this.period = period;
        }

        LineCurrent current(double lineRmsVolts, int lineOrder) {
            for (CurrentSpan span : period.spans()) {
                if (span.throughThyristor()) {
                    SpanQuadrature.visit(span, HIGHEST_ORDER + 2 * lineOrder, (rad, weight) -> add(span, rad, weight));
                }
            }
            double span = period.spanRad();
            List<Harmonic> harmonics = new ArrayList<>();
            for (int order = 2; order <= HIGHEST_ORDER; order++) {
                harmonics.add(new Harmonic(order, rms(order), Math.atan2(cosines[order], sines[order])));
            }
            double rms = Math.sqrt(square / span);
            double dc = cosines[0] / span;
            double fundamental = rms(1);
            double watts = power / span;
            boolean flows = fundamental > 0;
            double distorting = Math.max(0, rms * rms - dc * dc - fundamental * fundamental);
            return new LineCurrent(
                    fundamental,
                    harmonics,
                    dc,
                    rms,
                    watts,
                    flows ? Math.sqrt(distorting) / fundamental : Double.NaN,
                    flows ? sines[1] / Math.hypot(sines[1], cosines[1]) : Double.NaN,
                    flows ? watts / (lineRmsVolts * rms) : Double.NaN);
        }

        private double rms(int order) {
            return Math.sqrt(2) * Math.hypot(sines[order], cosines[order]) / period.spanRad();
        }

        private void add(CurrentSpan span, double rad, double weight) {
            double amps = span.direction() * span.amps().applyAsDouble(rad);
            double weighted = weight * amps;
            square += weighted * amps;
            power += weighted * line.voltsAt(rad);
            cosines[0] += weighted;
            // sin and cos of the next multiple from those of the last: turned on by one angle.
            double sin = Math.sin(rad);
            double cos = Math.cos(rad);
            double s = 0;
            double c = 1;
            for (int order = 1; order <= HIGHEST_ORDER; order++) {
                double next = s * cos + c * sin;
                c = c * cos - s * sin;
                s = next;
                sines[order] += weighted * s;
                cosines[order] += weighted * c;
            }
        }
    }
}
