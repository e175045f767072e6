package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice.OnState;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A load's current summed over the half cycles after which it repeats, and what follows from the sums. A freewheeling
 * current passes the load but neither line nor thyristor, hence the sums for each polarity beside those of the load.
 *
 * @param chargeAmpRad integral of the load current's magnitude, A rad
 * @param squareAmpRad integral of its square, A² rad
 * @param peakAmps its largest value, A
 * @param forward the line's current in its positive direction
 * @param backward the same in the negative direction
 */
record CurrentSums(double chargeAmpRad, double squareAmpRad, double peakAmps, Polarity forward, Polarity backward) {
    /**
     * Sums over one direction of the line's current.
     *
     * @param chargeAmpRad integral of the line current's magnitude in one direction, A rad
     * @param squareAmpRad integral of its square, A² rad
     */
    record Polarity(double chargeAmpRad, double squareAmpRad) {}

    /** A current that passes line, thyristor and load alike. */
    static CurrentSums ofLine(Polarity forward, Polarity backward, double peakAmps) {
        return new CurrentSums(
                forward.chargeAmpRad + backward.chargeAmpRad,
                forward.squareAmpRad + backward.squareAmpRad,
                peakAmps,
                forward,
                backward);
    }

    /**
     * What follows from the sums.
     *
     * @param design stage, load and thyristor
     * @param condition line voltage
     * @param period when the current begins and ends; how long it takes to repeat
     * @param rmsVolts rms voltage across the load, V
     * @param conductionRad mean conduction angle of a half cycle, rad
     * @param halfWatts mean power of each half cycle that differs, W
     */
    LoadResult result(
            Design design,
            Condition condition,
            LoadPeriod period,
            double rmsVolts,
            double conductionRad,
            List<Double> halfWatts) {
        double span = period.spanRad();
        double watts = squareAmpRad / span * design.load().resistanceOhms();
        double rms = Math.sqrt(squareAmpRad / span);
        double mean = chargeAmpRad / span;
        Polarity busier = ofBusierThyristor(design.stage());
        double thyristorMean = busier.chargeAmpRad / span;
        double thyristorRms = Math.sqrt(busier.squareAmpRad / span);
        OnState onState = design.thyristor().device().onState();
        return new LoadResult(
                watts,
                watts / FullPower.watts(design, condition),
                rmsVolts,
                rms,
                mean,
                peakAmps,
                (forward.chargeAmpRad - backward.chargeAmpRad) / span,
                rms > 0 ? rms / mean : Double.NaN,
                rms > 0 ? peakAmps / rms : Double.NaN,
                powerFactor(watts, condition.lineVolts() * design.line().rmsFactor(), span),
                conductionRad,
                thyristorMean,
                thyristorRms,
                onState.thresholdVolts() * thyristorMean + onState.slopeOhms() * thyristorRms * thyristorRms,
                halfWatts,
                period.firedRad(),
                period.extinctionRad(),
                period.missedHalves(),
                period.halfCycles(),
                period.letsGo(),
                OptionalDouble.empty());
    }

    private double powerFactor(double watts, double lineVolts, double spanRad) {
        double lineAmps = Math.sqrt((forward.squareAmpRad + backward.squareAmpRad) / spanRad);
        return lineAmps > 0 ? watts / (lineVolts * lineAmps) : Double.NaN;
    }

    /** One thyristor carries everything, but for two in inverse parallel. */
    private Polarity ofBusierThyristor(Stage stage) {
        if (stage == Stage.INVERSE_PARALLEL) {
            return forward.squareAmpRad >= backward.squareAmpRad ? forward : backward;
        }
        return new Polarity(forward.chargeAmpRad + backward.chargeAmpRad, forward.squareAmpRad + backward.squareAmpRad);
    }

    /**
     * Mean power of each half cycle that differs, W.
     *
     * @param squareAmpRad integral of the squared current over all half cycles of each sort, A² rad
     * @param counts how many there are of each
     */
    static List<Double> halfWatts(double[] squareAmpRad, int[] counts, double ohms) {
        List<Double> watts = new ArrayList<>();
        for (int half = 0; half < counts.length; half++) {
            watts.add(counts[half] == 0 ? 0 : squareAmpRad[half] / (counts[half] * Math.PI) * ohms);
        }
        return watts;
    }
}
