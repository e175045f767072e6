package clipramp.spread;

import org.apache.commons.math3.distribution.BetaDistribution;

/**
 * How many units hold, with the interval that the true share lies in.
 *
 * @param held units that hold
 * @param of units asked
 * @param low lower end of the two-sided 95 % interval of Clopper and Pearson (1934), 0..1
 * @param high its upper end, 0..1
 */
public record Yield(int held, int of, double low, double high) {
    private static final double TAIL = 0.025;

    static Yield of(int held, int of) {
        double low = held == 0 ? 0 : quantile(held, of - held + 1, TAIL);
        double high = held == of ? 1 : quantile(held + 1, of - held, 1 - TAIL);
        return new Yield(held, of, low, high);
    }

    /** The share that held, 0..1; NaN where none was asked. */
    public double share() {
        return of == 0 ? Double.NaN : (double) held / of;
    }

    private static double quantile(double alpha, double beta, double chance) {
        return new BetaDistribution(null, alpha, beta).inverseCumulativeProbability(chance);
    }
}
