package clipramp.spread;

import clipramp.spread.PositionSpread.Extremes;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * Greatest and least of something over every unit that the limits allow, by a search on the exact engine.
 *
 * <p>It starts from the corner that the single deviations point at and from the most extreme sample, and moves one factor
 * after the other to its lower limit, its upper limit or its nominal value for as long as that helps: no direction is
 * taken as monotone unseen. The samples themselves are candidates, so that the answer encloses them.
 */
final class Extremity {
    private static final int MOST_SWEEPS = 4;

    private final Lot lot;
    private final ToDoubleFunction<double[]> objective;

    /**
     * @param lot whose factors are moved
     * @param objective of a value for each of them
     */
    Extremity(Lot lot, ToDoubleFunction<double[]> objective) {
        this.lot = lot;
        this.objective = objective;
    }

    /**
     * @param leastUnit number of the sample with the least value
     * @param leastSample its value
     * @param greatestUnit number of the sample with the greatest value
     * @param greatestSample its value
     */
    Extremes search(long leastUnit, double leastSample, long greatestUnit, double greatestSample) {
        List<Factor> factors = lot.factors();
        double[] nominal = factors.stream().mapToDouble(Factor::nominal).toArray();
        double middle = at(nominal);
        double[] upwards = nominal.clone();
        double[] downwards = nominal.clone();
        double up = 0;
        double down = 0;
        for (int k = 0; k < factors.size(); k++) {
            Factor factor = factors.get(k);
            double[] moved = nominal.clone();
            moved[k] = factor.low();
            double low = at(moved) - middle;
            moved[k] = factor.high();
            double high = at(moved) - middle;
            upwards[k] = low > high ? factor.low() : factor.high();
            downwards[k] = low > high ? factor.high() : factor.low();
            up += square(Math.max(0, Math.max(low, high)));
            down += square(Math.min(0, Math.min(low, high)));
        }
        double greatest = Math.max(climb(upwards, 1), climb(sample(greatestUnit), 1));
        double least = -Math.max(climb(downwards, -1), climb(sample(leastUnit), -1));
        return new Extremes(
                middle,
                Math.min(least, leastSample),
                Math.max(greatest, greatestSample),
                middle - Math.sqrt(down),
                middle + Math.sqrt(up));
    }

    private double climb(double[] start, int sign) {
        double[] values = start.clone();
        double best = sign * at(values);
        boolean better = true;
        for (int sweep = 0; sweep < MOST_SWEEPS && better; sweep++) {
            better = false;
            for (int k = 0; k < values.length; k++) {
                Factor factor = lot.factors().get(k);
                double kept = values[k];
                for (double tried : new double[] {factor.low(), factor.nominal(), factor.high()}) {
                    if (tried == kept) {
                        continue;
                    }
                    values[k] = tried;
                    double there = sign * at(values);
                    if (there > best) {
                        best = there;
                        kept = tried;
                        better = true;
                    }
                }
                values[k] = kept;
            }
        }
        return best;
    }

    private double[] sample(long number) {
        double[] values = new double[lot.factors().size()];
        for (int k = 0; k < values.length; k++) {
            values[k] = lot.factors().get(k).value(Chance.of(lot.seed(), number, k), lot.law());
        }
        return values;
    }

    private double at(double[] values) {
        return objective.applyAsDouble(values);
    }

    private static double square(double x) {
        return x * x;
    }
}
