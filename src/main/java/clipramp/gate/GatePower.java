package clipramp.gate;

import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.OptionalDouble;

/** Gate power against its ratings (DEVELOPERS.md, Margins). */
public final class GatePower {
    private GatePower() {}

    /** Mean gate power: the energy of all pulses of a solution over its time, W. */
    public static double meanWatts(Solution solution) {
        double joules = 0;
        double seconds = 0;
        for (HalfCycle half : solution.halves()) {
            joules += half.pulses().stream().mapToDouble(Pulse::gateJoules).sum();
            seconds += half.seconds();
        }
        return joules / seconds;
    }

    /** Width of the rectangle that has a pulse's gate energy and peak power, s; 0 without power. */
    public static double equivalentSeconds(Pulse pulse) {
        return pulse.peakGateWatts() > 0 ? pulse.gateJoules() / pulse.peakGateWatts() : 0;
    }

    /**
     * The peak gate power that a pulse of a width may have: P_GM up to the length it holds for, beyond it the power of
     * equal energy, never less than the mean rating.
     *
     * @param limits gate ratings
     * @param widthSeconds equivalent width of the pulse, s
     * @return W; empty where P_GM is not stated
     */
    public static OptionalDouble allowedPeakWatts(GateLimits limits, double widthSeconds) {
        if (limits.peakWatts().isEmpty()) {
            return OptionalDouble.empty();
        }
        double peak = limits.peakWatts().getAsDouble();
        double length = limits.peakWattsForSeconds().orElse(Double.POSITIVE_INFINITY);
        if (widthSeconds <= length) {
            return OptionalDouble.of(peak);
        }
        return OptionalDouble.of(Math.min(
                peak, Math.max(peak * length / widthSeconds, limits.meanWatts().orElse(0))));
    }

    /**
     * Where a straight load line gives a gate a power: i with (E - R i) i = P. A gate between the two currents may be
     * given more than P.
     *
     * @param openVolts E, open-circuit voltage of the drive, V, above 0
     * @param ohms R, its resistance, ohm, above 0
     * @param watts P, gate power, W, 0 or more
     * @return smaller and larger current, A; empty where the drive never gives as much
     */
    public static double[] currentsAtPower(double openVolts, double ohms, double watts) {
        double discriminant = openVolts * openVolts - 4 * ohms * watts;
        if (discriminant < 0) {
            return new double[0];
        }
        double larger = (openVolts + Math.sqrt(discriminant)) / (2 * ohms);
        return new double[] {watts / (ohms * larger), larger};
    }

    /**
     * Current at which a gate v = knee + slope i takes a power: what a series resistor must hold it to; the root of
     * slope i² + knee i = P.
     *
     * @param kneeVolts V, 0 or more
     * @param slopeOhms ohm, 0 or more
     * @param watts gate power, W, above 0
     * @return A
     */
    public static double ampsAtPower(double kneeVolts, double slopeOhms, double watts) {
        return 2 * watts / (kneeVolts + Math.sqrt(kneeVolts * kneeVolts + 4 * slopeOhms * watts));
    }
}
