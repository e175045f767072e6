package clipramp.spread;

import clipramp.engine.UnitValues;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * What matters at one knob position: single swings, and shares of the variance of power by exchanging one factor between
 * two lots of units. First order after Saltelli and others (2010), mean of f_B (f_AB - f_A); total after Jansen (1999),
 * half the mean of (f_A - f_AB)²; both over the variance.
 */
final class VarianceShares {
    /** A second, independent lot is drawn with this added to the seed. */
    private static final long OTHER_LOT = 0x5bd1e995;

    private final Lot lot;
    private final double share;
    private final int units;

    /**
     * @param trackShare where the knob stands, as a share of the track
     * @param units units to each lot
     */
    VarianceShares(Lot lot, double trackShare, int units) {
        this.lot = lot;
        this.share = trackShare;
        this.units = units;
    }

    List<Influence> all() {
        double[] first = fractions(-1, 0);
        double[] other = fractions(-1, OTHER_LOT);
        double mean = (mean(first) + mean(other)) / 2;
        double variance = IntStream.range(0, units)
                        .mapToDouble(i -> square(first[i] - mean) + square(other[i] - mean))
                        .sum()
                / (2 * units);
        List<Influence> influences = new ArrayList<>();
        for (int k = 0; k < lot.factors().size(); k++) {
            influences.add(influence(k, first, other, mean, variance));
        }
        influences.sort(Comparator.comparingDouble(Influence::total).reversed());
        return List.copyOf(influences);
    }

    private Influence influence(int k, double[] first, double[] other, double mean, double variance) {
        double[] mixed = fractions(k, 0);
        double alone = 0;
        double any = 0;
        for (int i = 0; i < units; i++) {
            // Less the mean: it adds nothing but noise.
            alone += (other[i] - mean) * (mixed[i] - first[i]);
            any += square(first[i] - mixed[i]) / 2;
        }
        double scale = variance > 0 ? 1 / (units * variance) : 0;
        Factor factor = lot.factors().get(k);
        UnitOutcome low = single(factor, factor.low());
        UnitOutcome high = single(factor, factor.high());
        return new Influence(
                factor.path(),
                factor.name(),
                low.latestRad(),
                high.latestRad(),
                low.fraction,
                high.fraction,
                Math.max(0, Math.min(1, alone * scale)),
                Math.max(0, Math.min(1, any * scale)));
    }

    private UnitOutcome single(Factor factor, double value) {
        UnitValues unit = lot.blank();
        factor.slot().set(unit, value);
        UnitOutcome outcome = new UnitOutcome();
        UnitSolver solver = lot.solver();
        solver.prepare(unit);
        solver.solve(unit, share, outcome);
        return outcome;
    }

    /** Shares of full power of the lot, one factor taken from the other lot if its index is not negative. */
    private double[] fractions(int exchanged, long lotOffset) {
        double[] fractions = new double[units];
        int chunk = 64;
        IntStream.range(0, (units + chunk - 1) / chunk).parallel().forEach(c -> {
            UnitSolver solver = lot.solver();
            UnitValues unit = lot.blank();
            UnitOutcome outcome = new UnitOutcome();
            for (int i = c * chunk; i < Math.min(units, (c + 1) * chunk); i++) {
                for (int k = 0; k < lot.factors().size(); k++) {
                    Factor factor = lot.factors().get(k);
                    long seed = lot.seed() + (k == exchanged ? OTHER_LOT : lotOffset);
                    factor.slot().set(unit, factor.value(Chance.of(seed, i, k), lot.law()));
                }
                solver.prepare(unit);
                solver.solve(unit, share, outcome);
                fractions[i] = outcome.fraction;
            }
        });
        return fractions;
    }

    private static double mean(double[] values) {
        return IntStream.range(0, values.length)
                .mapToDouble(i -> values[i])
                .average()
                .orElse(0);
    }

    private static double square(double x) {
        return x * x;
    }
}
