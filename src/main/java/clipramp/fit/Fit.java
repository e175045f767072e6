package clipramp.fit;

import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.fit.Fitted.Knowledge;
import clipramp.runs.Watch;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.distribution.ChiSquaredDistribution;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * From what was read on a bench to what the unit's parts really are.
 *
 * <p>Weighted least squares on the exact engine, every reading in its instrument's accuracy, every value of the unit on a
 * logarithmic scale with a weak prior from the design: normal, its standard deviation half of what lies between the part's
 * or the sheet's limits (a part bought within them lies within one deviation). A value that the readings do not move so
 * stays at the drawing's, with the drawing's uncertainty, and is reported as not told. Settings and line voltages that
 * were read may be off by their own accuracy. Intervals are 95 %, from the linearised covariance.
 */
public final class Fit {
    /** Pairs at least so strongly correlated are told only together. */
    private static final double TOGETHER = 0.8;

    /** Scatter that good readings show less often than this widens the intervals. */
    private static final double UNLIKELY = 0.01;

    /** Information over the prior's that counts as telling a direction: half its deviation is left. */
    private static final double TELLING = 3;

    private Fit() {}

    /**
     * The unit that explains the readings best (DEVELOPERS.md, From readings to parts).
     *
     * @param design a sound design
     * @param readings what was read of one unit built to it
     * @param watch told of fits made and one more, for nobody knows how many there will be; may cancel
     * @throws UnsettledFitException where no values can be found
     * @throws CancellationException where the watch cancelled
     * @throws IllegalArgumentException for an average-reading meter across an inductive load, which is not computed
     */
    public static FitResult run(Design design, Readings readings, Watch watch) {
        if (design.load() instanceof Load.Inductive && readings.has(Meter.LOAD_AVERAGE_READING)) {
            throw new IllegalArgumentException("an average-reading meter across an inductive load is not computed");
        }
        BenchProblem problem = new BenchProblem(design, readings);
        Strangers search = new Strangers(problem, watch);
        Estimate estimate = search.settled();
        int freedom = search.freedom(estimate);
        double squares = estimate.squares();
        double chance = chance(squares, freedom);
        double widened = chance < UNLIKELY ? Math.max(1, Math.sqrt(squares / freedom)) : 1;
        int active = problem.active().length;
        double[] information = information(estimate, active);
        return new FitResult(
                readings,
                values(problem, estimate, widened),
                untouched(problem),
                together(problem, estimate),
                residuals(problem, estimate),
                new Quality(
                        readings.count(),
                        used(problem, estimate),
                        squares,
                        freedom,
                        chance,
                        widened,
                        (int) Arrays.stream(information)
                                .filter(i -> i >= TELLING)
                                .count(),
                        active,
                        condition(information)));
    }

    private static int used(BenchProblem problem, Estimate estimate) {
        int used = 0;
        for (int i = 0; i < problem.readingCount(); i++) {
            used += estimate.used()[i] ? 1 : 0;
        }
        return used;
    }

    /** How often good readings scatter more than that, 0..1. */
    static double chance(double squares, int freedom) {
        return freedom < 1 ? 1 : 1 - new ChiSquaredDistribution(null, freedom).cumulativeProbability(squares);
    }

    private static List<Fitted> values(BenchProblem problem, Estimate estimate, double widened) {
        List<Fitted> values = new ArrayList<>();
        double[] z = problem.wide(estimate.point());
        double[] kept = new double[z.length];
        Arrays.fill(kept, 1);
        int[] active = problem.active();
        for (int c = 0; c < active.length; c++) {
            kept[active[c]] = Math.sqrt(estimate.covariance().getEntry(c, c));
        }
        for (int k = 0; k < z.length; k++) {
            values.add(fitted(problem.unknowns().get(k), z[k], Math.min(1, kept[k] * widened)));
        }
        return values;
    }

    /**
     * @param z where the unknown was found, prior standard deviations
     * @param left how much of its prior deviation is left, 0..1
     */
    private static Fitted fitted(Unknown unknown, double z, double left) {
        double reach = Accuracy.SIGMAS * left;
        double from = unknown.at(z - reach);
        double to = unknown.at(z + reach);
        Knowledge knowledge = Knowledge.of(left);
        return new Fitted(
                unknown.path(),
                unknown.name(),
                unknown.unit(),
                unknown.nominal(),
                unknown.low(),
                unknown.high(),
                unknown.assumed(),
                unknown.at(z),
                from,
                to,
                left,
                knowledge,
                Fitted.within(unknown.low(), unknown.high(), from, to, knowledge));
    }

    private static List<String> untouched(BenchProblem problem) {
        List<Integer> active = Arrays.stream(problem.active()).boxed().toList();
        List<String> paths = new ArrayList<>();
        for (int k = 0; k < problem.unknowns().size(); k++) {
            if (!active.contains(k)) {
                paths.add(problem.unknowns().get(k).path());
            }
        }
        return paths;
    }

    private static List<Together> together(BenchProblem problem, Estimate estimate) {
        int[] active = problem.active();
        RealMatrix covariance = estimate.covariance();
        List<Together> pairs = new ArrayList<>();
        for (int a = 0; a < active.length; a++) {
            for (int b = a + 1; b < active.length; b++) {
                double correlation =
                        covariance.getEntry(a, b) / Math.sqrt(covariance.getEntry(a, a) * covariance.getEntry(b, b));
                if (Math.abs(correlation) >= TOGETHER) {
                    pairs.add(new Together(
                            problem.unknowns().get(active[a]).path(),
                            problem.unknowns().get(active[b]).path(),
                            correlation));
                }
            }
        }
        pairs.sort(Comparator.comparingDouble((Together pair) -> -Math.abs(pair.correlation())));
        return pairs;
    }

    /** What the readings add to the prior, along its principal directions: eigenvalues of inverse covariance less one. */
    private static double[] information(Estimate estimate, int count) {
        if (count == 0) {
            return new double[0];
        }
        RealMatrix unit = estimate.covariance().getSubMatrix(0, count - 1, 0, count - 1);
        RealMatrix even = unit.add(unit.transpose()).scalarMultiply(0.5);
        double[] left = new EigenDecomposition(even).getRealEigenvalues();
        return Arrays.stream(left).map(l -> 1 / l - 1).toArray();
    }

    private static OptionalDouble condition(double[] information) {
        double most = Arrays.stream(information).max().orElse(0);
        double least = Arrays.stream(information).min().orElse(0);
        return least > most * 1e-12 && least > 1e-6
                ? OptionalDouble.of(Math.sqrt(most / least))
                : OptionalDouble.empty();
    }

    private static List<Residual> residuals(BenchProblem problem, Estimate estimate) {
        List<Residual> residuals = new ArrayList<>();
        for (int i = 0; i < problem.observed().size(); i++) {
            residuals.add(residual(problem, estimate, i));
        }
        return residuals;
    }

    private static Residual residual(BenchProblem problem, Estimate estimate, int i) {
        Oddity oddity = new Oddity(estimate.residual()[i], estimate.standardised(i), estimate.used()[i]);
        BenchLine line = problem.line(i);
        if (i < problem.readingCount()) {
            return oddity.of(line, problem.reading(i), problem.deviation(i));
        }
        return problem.observed().get(i).reading() == Observed.SETTING
                ? oddity.of(line, line.setting())
                : oddity.of(line, line.lineVolts().orElseThrow());
    }

    /**
     * How odd one of the things observed is beside the fitted unit.
     *
     * @param off how far it lies from what the unit would show, in its own deviations
     * @param standardised the same, by the deviation that instruments and fit leave it, however far the others scatter
     * @param belongs whether it was used
     */
    private record Oddity(double off, double standardised, boolean belongs) {
        Residual of(BenchLine line, Reading reading, double deviation) {
            Meter meter = reading.meter();
            return told(line, reading.column(), meter.words(), meter.unit(), reading.value(), deviation);
        }

        Residual of(BenchLine line, Setting setting) {
            boolean knob = setting.kind() == Setting.Kind.KNOB;
            return told(
                    line,
                    setting.column(),
                    knob ? "knob position" : "ramp resistance",
                    knob ? Unit.FRACTION : Unit.OHM,
                    setting.value(),
                    setting.accuracy().deviation(setting.value()));
        }

        Residual of(BenchLine line, BenchLine.LineVolts volts) {
            double deviation = volts.accuracy().deviation(volts.volts());
            return told(line, volts.column(), "line voltage", Unit.VOLT, volts.volts(), deviation);
        }

        private Residual told(BenchLine line, String column, String what, Unit unit, double value, double deviation) {
            return new Residual(line.line(), column, what, unit, value, value - off * deviation, standardised, belongs);
        }
    }
}
