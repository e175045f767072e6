package clipramp.power;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What the load and the thyristor get over whole periods of the line.
 *
 * @param watts mean power in the load, W
 * @param fraction power as a share of the same load with the thyristor always on: full line voltage, no drops; of
 *     full-wave full power for half-wave stages too, 0..1
 * @param rmsVolts rms voltage across the load, V
 * @param rmsAmps rms load current, A
 * @param meanAmps mean of the load current's magnitude, A
 * @param peakAmps largest load current, A
 * @param dcAmps dc part of the line's current, A (signed)
 * @param formFactor rms over mean of magnitude; NaN with no current
 * @param crestFactor peak over rms; NaN with no current
 * @param powerFactor load watts over line rms volts times the line's rms amperes (a freewheeling current does not pass
 *     the line); NaN with no current
 * @param conductionRad angle per half cycle for which load current flows (mean of both halves), rad
 * @param thyristorMeanAmps mean current of one thyristor, A
 * @param thyristorRmsAmps rms current of one thyristor, A
 * @param thyristorWatts on-state loss of one thyristor, W
 * @param halfWatts mean power of each half cycle that differs, in the order of the solution's halves, W
 * @param firedRad angle at which current first begins in the thyristor, from the zero of its half cycle, rad; empty with
 *     no current. Later than the first pulse's where that came while current still flowed
 * @param extinctionRad angle at which that current ends, from the same zero, rad; empty with no current, or where it
 *     never ends
 * @param missedHalves half cycles, of {@code halfCycles}, whose pulses all came while the current of the half cycle
 *     before still flowed: the thyristor for that polarity stays off
 * @param halfCycles half cycles after which everything repeats
 * @param letsGo whether the thyristor turns off in every half cycle
 * @param lightShare light of a filament as a share of its light at rated voltage; empty for other loads
 */
public record LoadResult(
        double watts,
        double fraction,
        double rmsVolts,
        double rmsAmps,
        double meanAmps,
        double peakAmps,
        double dcAmps,
        double formFactor,
        double crestFactor,
        double powerFactor,
        double conductionRad,
        double thyristorMeanAmps,
        double thyristorRmsAmps,
        double thyristorWatts,
        List<Double> halfWatts,
        OptionalDouble firedRad,
        OptionalDouble extinctionRad,
        int missedHalves,
        int halfCycles,
        boolean letsGo,
        OptionalDouble lightShare) {
    /** Keeps a copy of the list. */
    public LoadResult {
        halfWatts = List.copyOf(halfWatts);
    }

    /** The same with a filament's light. */
    LoadResult withLight(double newFraction, double newLightShare) {
        return new LoadResult(
                watts,
                newFraction,
                rmsVolts,
                rmsAmps,
                meanAmps,
                peakAmps,
                dcAmps,
                formFactor,
                crestFactor,
                powerFactor,
                conductionRad,
                thyristorMeanAmps,
                thyristorRmsAmps,
                thyristorWatts,
                halfWatts,
                firedRad,
                extinctionRad,
                missedHalves,
                halfCycles,
                letsGo,
                OptionalDouble.of(newLightShare));
    }
}
