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
     * The current at which a straight line v = V + r i meets the curve v i = P of one power: the smaller root of r i² + V i =
     * P. A gate is such a line, with r its slope; a drive's load line is one too, with r the drive's resistance taken off, and
     * meets the curve again at P/(|r| i).
     *
     * @param volts V, where the line begins, V, above 0
     * @param slopeOhms r, ohm; under 0 for a load line
     * @param watts P, W, above 0
     * @return A; empty where a load line stays under the curve
     */
    public static OptionalDouble ampsAtPower(double volts, double slopeOhms, double watts) {
        double discriminant = volts * volts + 4 * slopeOhms * watts;
        return discriminant < 0
                ? OptionalDouble.empty()
                : OptionalDouble.of(2 * watts / (volts + Math.sqrt(discriminant)));
    }
}
