package clipramp.spread;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.stat.descriptive.SummaryStatistics;
import org.junit.jupiter.api.Test;

/** Drawn numbers against the closed forms of their laws. */
class DrawingTest {
    private static final int DRAWS = 200_000;
    private static final long SEED = 4711;
    /** Standard errors that a sample's moment may lie off; one in 15 000 does by chance, and the seed is fixed. */
    private static final double ERRORS = 4;

    private static SummaryStatistics drawn(int factor, DoubleUnaryOperator of) {
        SummaryStatistics statistics = new SummaryStatistics();
        IntStream.range(0, DRAWS)
                .mapToDouble(i -> of.applyAsDouble(Chance.of(SEED, i, factor)))
                .forEach(statistics::addValue);
        return statistics;
    }

    /** Mean within so many standard errors; variance within a few percent, which 200 000 draws give for mild laws. */
    private static void hasMoments(SummaryStatistics sample, double mean, double variance) {
        assertThat(sample.getMean()).isCloseTo(mean, within(ERRORS * Math.sqrt(variance / DRAWS)));
        assertThat(sample.getVariance()).isCloseTo(variance, within(0.02 * variance));
    }

    /**
     * delay = R C ln(1/(1 - eta)) with eta uniform in a..b. With u = 1 - eta: the integral of -ln u is u - u ln u, that of
     * (ln u)² is u (ln u)² - 2 u ln u + 2 u.
     */
    @Test
    void delaysOfAUniformStandoffRatioHaveTheMomentsOfTheIntegral() {
        double a = 0.56;
        double b = 0.75;
        double first = (integralOfLog(1 - a) - integralOfLog(1 - b)) / (b - a);
        double second = (integralOfLogSquared(1 - a) - integralOfLogSquared(1 - b)) / (b - a);
        hasMoments(drawn(3, chance -> Math.log(1 / (1 - (a + chance * (b - a))))), first, second - first * first);
    }

    private static double integralOfLog(double u) {
        return u - u * Math.log(u);
    }

    private static double integralOfLogSquared(double u) {
        double log = Math.log(u);
        return u * log * log - 2 * u * log + 2 * u;
    }

    /** A normal cut at c standard deviations has the variance 1 - 2 c phi(c)/(2 Phi(c) - 1); here c = 3, in units of c. */
    @Test
    void normalPartsHaveTheMomentsOfACutNormal() {
        NormalDistribution normal = new NormalDistribution(null, 0, 1);
        double kept = 2 * normal.cumulativeProbability(3) - 1;
        hasMoments(drawn(1, DrawLaw.NORMAL::place), 0, (1 - 6 * normal.density(3) / kept) / 9);
    }

    @Test
    void normalPartsLieWhereTheNormalQuantileSays() {
        NormalDistribution normal = new NormalDistribution(null, 0, 1);
        double cut = normal.cumulativeProbability(-3);
        for (double chance = 0.0005; chance < 1; chance += 0.001) {
            double exact = normal.inverseCumulativeProbability(cut + (1 - 2 * cut) * chance) / 3;
            assertThat(DrawLaw.NORMAL.place(chance)).isCloseTo(exact, within(1e-4));
        }
    }

    @Test
    void uniformAndTriangularPartsHaveTheirMoments() {
        hasMoments(drawn(2, DrawLaw.UNIFORM::place), 0, 1.0 / 3);
        hasMoments(drawn(4, DrawLaw.TRIANGULAR::place), 0, 1.0 / 6);
    }

    /** Triangular law: mean (a + b + c)/3, variance (a² + b² + c² - ab - ac - bc)/18. */
    @Test
    void dataSheetFiguresHaveTheMomentsOfTheTriangle() {
        double a = 4;
        double c = 6;
        double b = 18;
        hasMoments(
                drawn(5, chance -> DrawLaw.threePoint(a, c, b, chance)),
                (a + b + c) / 3,
                (a * a + b * b + c * c - a * b - a * c - b * c) / 18);
    }

    @Test
    void drawsOfNeighbouringUnitsAndFactorsHaveNothingInCommon() {
        double perUnit = correlation(0, 1, 0);
        double perFactor = correlation(0, 0, 1);
        assertThat(Math.abs(perUnit)).isLessThan(ERRORS / Math.sqrt(DRAWS));
        assertThat(Math.abs(perFactor)).isLessThan(ERRORS / Math.sqrt(DRAWS));
    }

    private static double correlation(int factor, int unitsOn, int factorsOn) {
        return 12
                * IntStream.range(0, DRAWS)
                        .mapToDouble(i -> (Chance.of(SEED, i, factor) - 0.5)
                                * (Chance.of(SEED, i + unitsOn, factor + factorsOn) - 0.5))
                        .average()
                        .orElseThrow();
    }

    /** Clopper and Pearson's interval is never short: at 95 %, fewer than 93 of 100 is a fault; told over 2000. */
    @Test
    void intervalsOfTheYieldCoverTheTruth() {
        int repetitions = 2000;
        for (double truth : new double[] {0.5, 0.9, 0.99}) {
            long covered = IntStream.range(0, repetitions)
                    .filter(repetition -> {
                        int held = (int) IntStream.range(0, 200)
                                .filter(i -> Chance.of(SEED + repetition, i, 9) < truth)
                                .count();
                        Yield yield = Yield.of(held, 200);
                        return yield.low() <= truth && truth <= yield.high();
                    })
                    .count();
            assertThat((double) covered / repetitions)
                    .as("share covered at a true yield of " + truth)
                    .isGreaterThanOrEqualTo(0.93);
        }
    }
}
