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
}
