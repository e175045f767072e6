package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.engine.UnitValues;
import clipramp.firing.FiringState;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.power.SwiftPoint;
import clipramp.runs.Watch;
import clipramp.spread.PositionSpread.Extremes;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.function.Consumer;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.apache.commons.math3.stat.descriptive.rank.Percentile;

/**
 * Tolerances, temperature and line drawn together: many units of a design, each solved by the engine at every knob
 * position (DEVELOPERS.md, Many units at once).
 */
public final class Spread {
    private static final int KNOB_STEPS = 10;
    private static final double MID_KNOB = 0.5;

    /** Units to each of the lots that shares and remedies are worked out on, and fewer where the swift path is not open. */
    private static final int LOT_UNITS = 4000;

    private static final int SLOW_LOT_UNITS = 500;

    private Spread() {}

    /**
     * What many units of a design do. The same design and options give the same answer, however many cores draw it.
     *
     * @param design a sound design that can be solved
     * @param options how many units, which seed, which law
     * @param watch told of units drawn; may cancel: then the finished part is told
     */
    public static SpreadResult run(Design design, SpreadOptions options, Watch watch) {
        return run(design, options, watch, midKnob -> {});
    }

    /**
     * The same, with something to look at while it goes on.
     *
     * @param design a sound design that can be solved
     * @param options how many units, which seed, which law
     * @param watch told of units drawn; may cancel: then the finished part is told
     * @param drawn told after the watch how the units drawn so far lie at mid-knob
     */
    public static SpreadResult run(Design design, SpreadOptions options, Watch watch, Consumer<Histogram> drawn) {
        Lot lot = new Lot(design, Factors.of(design), options.law(), options.seed());
        double[] positions = positions(design);
        double[] shares = Arrays.stream(positions)
                .map(p -> WantedTest.share(design.ramp(), p))
                .toArray();
        Sampling sampling = new Sampling(lot, shares, options.samples());
        sampling.run(watch, drawn);
        boolean more = !watch.isCancelled();
        List<PositionSpread> spreads = IntStream.range(0, sampling.done() > 0 ? positions.length : 0)
                .parallel()
                .mapToObj(p -> position(
                        lot,
                        sampling,
                        p,
                        positions.length == 1 ? OptionalDouble.empty() : OptionalDouble.of(positions[p]),
                        shares[p]))
                .toList();
        boolean wanted = new WantedTest(design).isAsked();
        // Setting two trimmers costs four to six solutions.
        boolean fast = SwiftPoint.suits(design) && design.ramp().trimmers().isNone();
        int lotUnits = Math.min(fast ? LOT_UNITS : SLOW_LOT_UNITS, options.samples());
        double middle = WantedTest.share(design.ramp(), MID_KNOB);
        Judged judged =
                more ? judged(lot, Math.min(options.judged(), sampling.done()), watch) : new Judged(0, 0, Map.of());
        return new SpreadResult(
                options,
                sampling.done(),
                lot.factors(),
                spreads,
                wanted ? Optional.of(Yield.of(sampling.holding(), sampling.done())) : Optional.empty(),
                judged.of() == 0 ? Optional.empty() : Optional.of(Yield.of(judged.held(), judged.of())),
                judged.failures(),
                more ? new VarianceShares(lot, middle, lotUnits).all() : List.of(),
                more && wanted ? new Remedies(lot, lotUnits).all() : List.of());
    }

    private static double[] positions(Design design) {
        return design.ramp().pot().isPresent()
                ? IntStream.rangeClosed(0, KNOB_STEPS)
                        .mapToDouble(i -> (double) i / KNOB_STEPS)
                        .toArray()
                : new double[] {0};
    }

    private static PositionSpread position(
            Lot lot, Sampling sampling, int p, OptionalDouble position, double trackShare) {
        CornerOutcomes corners = new CornerOutcomes(lot, trackShare);
        return new PositionSpread(
                position,
                percentiles(sampling.firingRad[p], sampling.done()),
                percentiles(sampling.watts[p], sampling.done()),
                percentiles(sampling.fraction[p], sampling.done()),
                sampling.share(p, FiringState.STALLS),
                sampling.share(p, FiringState.LATCHED_ON),
                sampling.share(p, FiringState.END_PULSE),
                sampling.misfires(p),
                sampling.share(p, FiringState.HUNTS),
                extremes(lot, sampling.firingRad[p], sampling.done(), corners::latestRad),
                extremes(lot, sampling.fraction[p], sampling.done(), corners::fraction));
    }

    private static Extremes extremes(Lot lot, double[] samples, int done, ToDoubleFunction<double[]> objective) {
        int least = 0;
        int greatest = 0;
        for (int i = 1; i < done; i++) {
            least = samples[i] < samples[least] ? i : least;
            greatest = samples[i] > samples[greatest] ? i : greatest;
        }
        return new Extremity(lot, objective).search(least, samples[least], greatest, samples[greatest]);
    }

    private static List<Double> percentiles(double[] values, int done) {
        Percentile percentile = new Percentile();
        percentile.setData(values, 0, done);
        return SpreadResult.PERCENTAGES.stream().map(percentile::evaluate).toList();
    }

    /**
     * @param held units that fail no margin
     * @param of units judged
     * @param failures share of them that fails a margin, by its id
     */
    private record Judged(int held, int of, Map<String, Double> failures) {}

    /** Puts some of the units before the judge, each at its own line and temperature. */
    private static Judged judged(Lot lot, int units, Watch watch) {
        List<List<String>> failed = IntStream.range(0, units)
                .parallel()
                .mapToObj(number -> watch.isCancelled() ? List.<String>of() : failing(lot, number))
                .toList();
        if (watch.isCancelled()) {
            return new Judged(0, 0, Map.of());
        }
        Map<String, Integer> counts = new TreeMap<>();
        failed.forEach(ids -> ids.forEach(id -> counts.merge(id, 1, Integer::sum)));
        Map<String, Double> shares = new LinkedHashMap<>();
        counts.entrySet().stream()
                .sorted(Map.Entry.<String, Integer>comparingByValue(Comparator.reverseOrder()))
                .forEach(entry -> shares.put(entry.getKey(), (double) entry.getValue() / units));
        int held = (int) failed.stream().filter(List::isEmpty).count();
        return new Judged(held, units, shares);
    }

    /** Margins that one unit of a lot fails, by their ids. */
    private static List<String> failing(Lot lot, int number) {
        UnitValues unit = lot.blank();
        lot.draw(number, unit);
        lot.solver().prepare(unit);
        Check check = Judge.check(
                DrawnDesign.of(lot.design(), unit), OptionalDouble.of(unit.lineVolts), OptionalDouble.of(unit.celsius));
        return check.margins().stream()
                .filter(margin -> margin.verdict() == Verdict.FAILS)
                .map(Margin::id)
                .distinct()
                .toList();
    }
}
