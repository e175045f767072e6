package clipramp.power;

import java.util.List;

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
 * @param powerFactor watts over line rms volts times rms amperes; NaN with no current
 * @param conductionRad angle per half cycle for which current flows (mean of both halves), rad
 * @param thyristorMeanAmps mean current of one thyristor, A
 * @param thyristorRmsAmps rms current of one thyristor, A
 * @param thyristorWatts on-state loss of one thyristor, W
 * @param halfWatts mean power of each half cycle that differs, in the order of the solution's halves, W
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
        List<Double> halfWatts) {
    public LoadResult {
        halfWatts = List.copyOf(halfWatts);
    }
}
