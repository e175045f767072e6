package clipramp.sizing;

import clipramp.gate.GatePower;
import java.util.Arrays;

/** The textbook's sizing of a gate drive: closed forms, each as good as its straight gate characteristic. */
public final class GateRelations {
    private GateRelations() {}

    /**
     * @param amps gate current, A
     * @param volts gate voltage, V
     */
    public record GatePoint(double amps, double volts) {}

    /**
     * Where a load line E - R i crosses the curve v i = P: the point of smaller current first (Bimbhra 4.4).
     *
     * @param sourceVolts E, V
     * @param ohms R, ohm
     * @param watts P, W, at most E²/(4 R)
     * @throws IllegalArgumentException where the load line stays under the curve
     */
    public static GatePoint[] onPowerCurve(double sourceVolts, double ohms, double watts) {
        double[] amps = GatePower.currentsAtPower(sourceVolts, ohms, watts);
        if (amps.length == 0) {
            throw new IllegalArgumentException("a source of " + sourceVolts + " V behind " + ohms
                    + " ohm never gives more than " + sourceVolts * sourceVolts / (4 * ohms) + " W, not " + watts);
        }
        return Arrays.stream(amps)
                .mapToObj(i -> new GatePoint(i, sourceVolts - ohms * i))
                .toArray(GatePoint[]::new);
    }

    /**
     * The gate current at which a straight gate v = knee + slope i takes a power (Bimbhra 4.5).
     *
     * @param kneeVolts V
     * @param slopeOhms ohm
     * @param watts W
     */
    public static GatePoint atPower(double kneeVolts, double slopeOhms, double watts) {
        double amps = GatePower.ampsAtPower(kneeVolts, slopeOhms, watts);
        return new GatePoint(amps, kneeVolts + slopeOhms * amps);
    }

    /** Series resistor that brings a source down to a gate's point, (E - v)/i, ohm. */
    public static double seriesOhms(double sourceVolts, GatePoint point) {
        return (sourceVolts - point.volts()) / point.amps();
    }

    /**
     * Pulses a second at which rectangular pulses of one power come to a mean power, P_mean/(P_peak t), 1/s.
     *
     * @param meanWatts P_G(AV), W
     * @param peakWatts P_GM, W
     * @param pulseSeconds t, s
     */
    public static double mostPulsesPerSecond(double meanWatts, double peakWatts, double pulseSeconds) {
        return meanWatts / (peakWatts * pulseSeconds);
    }

    /**
     * How long a pulse must last until an inductive load's current has reached the latching current: -L/R ln(1 - I_L
     * R/E), and L I_L/E without resistance (Bimbhra 4.6).
     *
     * @param volts E, V
     * @param ohms R, ohm, 0 or more
     * @param henries L, H
     * @param latchingAmps I_L, A, under E/R
     * @return s; infinite where the current never gets there
     */
    public static double pulseSeconds(double volts, double ohms, double henries, double latchingAmps) {
        if (ohms == 0) {
            return henries * latchingAmps / volts;
        }
        double share = latchingAmps * ohms / volts;
        return share < 1 ? -henries / ohms * Math.log1p(-share) : Double.POSITIVE_INFINITY;
    }
}
