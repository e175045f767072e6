package clipramp.spread;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What the units do at one knob position.
 *
 * @param position knob position 0..1; empty for a fixed ramp
 * @param firingRad firing angles at the percentages of {@link SpreadResult#PERCENTAGES}, rad; a thyristor that stays off
 *     counts as fired at the half cycle's end
 * @param watts load power at the same percentages, W
 * @param fraction the same as a share of full power at the unit's own line voltage
 * @param stalls share of units whose ramp stalls, 0..1
 * @param latchedOn share whose trigger device stays on, 0..1
 * @param endPulse share fired by the supply's collapse only, 0..1
 * @param misfires share whose thyristor stays off, 0..1
 * @param hunts share that hunts, 0..1
 * @param worstFiring earliest and latest firing of any unit, rad, with root-sum-square limits for comparison
 * @param worstFraction least and greatest share of full power of any unit, likewise
 */
public record PositionSpread(
        OptionalDouble position,
        List<Double> firingRad,
        List<Double> watts,
        List<Double> fraction,
        double stalls,
        double latchedOn,
        double endPulse,
        double misfires,
        double hunts,
        Extremes worstFiring,
        Extremes worstFraction) {
    /**
     * A worst case by a search on the engine beside the root-sum-square figure that is commonly quoted.
     *
     * @param nominal value of the nominal unit
     * @param least least value that the search found, never above any sample's
     * @param greatest greatest value that the search found, never under any sample's
     * @param rssLeast nominal less the root-sum-square of the single deviations downwards
     * @param rssGreatest nominal plus that of the deviations upwards
     */
    public record Extremes(double nominal, double least, double greatest, double rssLeast, double rssGreatest) {}
}
