package clipramp.power;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/** The largest current of a stretch: the best of evenly spaced samples, bettered between its neighbours. */
final class SpanPeak {
    private static final int TRIALS = 200;

    private SpanPeak() {}

    /** That current, A; samples lie a fifth of a radian of the line's highest order apart. */
    static double of(CurrentSpan span, int highestOrder) {
        double length = span.toRad() - span.fromRad();
        int samples = Math.max(8, (int) Math.ceil(length * highestOrder / 0.2));
        double step = length / samples;
        double best = 0;
        int at = 0;
        for (int i = 0; i <= samples; i++) {
            double amps = span.amps().applyAsDouble(span.fromRad() + i * step);
            if (amps > best) {
                best = amps;
                at = i;
            }
        }
        double from = span.fromRad() + Math.max(0, at - 1) * step;
        double to = span.fromRad() + Math.min(samples, at + 1) * step;
        return from < to ? Math.max(best, bettered(span, from, to)) : best;
    }

    private static double bettered(CurrentSpan span, double from, double to) {
        return new BrentOptimizer(1e-10, 1e-12)
                .optimize(
                        new UnivariateObjectiveFunction(span.amps()::applyAsDouble),
                        GoalType.MAXIMIZE,
                        new SearchInterval(from, to),
                        new MaxEval(TRIALS))
                .getValue();
    }
}
