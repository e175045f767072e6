package clipramp.fit;

import clipramp.runs.Watch;
import java.util.Arrays;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * Finds what does not belong. Where plain least squares leave a doubt, a robust pass sets suspects aside; least squares
 * over the rest take back, one by one, those that they predict well, and put out, one by one, whatever stands farthest off
 * (data snooping after Baarda, from memory), each time with a new fit.
 */
final class Strangers {
    /** Chance that good readings, all together, lose one of them. */
    private static final double FALSE_ALARM = 0.01;

    /** No more than this share of the readings is set aside: beyond it, the drawing is wrong and not the reading. */
    private static final double MOST_SHARE = 0.25;

    /** Scatter that is seen less often than this may hide several that mask each other. */
    private static final double DOUBTFUL = 0.05;

    /** Of two that stand as far off within this share, the reading is named rather than its setting. */
    private static final double ALIKE = 0.05;

    private final BenchProblem problem;
    private final Estimator estimator;
    private final Watch watch;
    private final double critical;
    private final int most;
    private final boolean[] takenBack;
    private int steps;

    Strangers(BenchProblem problem, Watch watch) {
        this.problem = problem;
        this.watch = watch;
        estimator = new Estimator(problem);
        int tests = problem.observed().size();
        critical = new NormalDistribution(null, 0, 1).inverseCumulativeProbability(1 - FALSE_ALARM / 2 / tests);
        most = (int) (MOST_SHARE * problem.readingCount());
        takenBack = new boolean[tests];
    }

    /** The fit over all that belongs. */
    Estimate settled() {
        boolean[] used = new boolean[problem.observed().size()];
        Arrays.fill(used, true);
        Estimate estimate = squares(used, new double[problem.dimension()]);
        if (farthest(estimate, freedom(estimate)) >= 0
                || Fit.chance(estimate.squares(), freedom(estimate)) < DOUBTFUL) {
            tick();
            // From the squares' minimum on, the many draw more strongly than the few; from the drawing on, whoever is
            // near.
            double[] start = estimator.robust(estimate.point(), new double[problem.dimension()]);
            used = withoutSuspects(start);
            estimate = squares(used, start);
        }
        while (true) {
            int change = next(estimate);
            if (change < 0) {
                return estimate;
            }
            used[change] = !used[change];
            takenBack[change] |= used[change];
            estimate = squares(used, estimate.point());
        }
    }

    private Estimate squares(boolean[] used, double[] start) {
        tick();
        return estimator.squares(used, start);
    }

    private void tick() {
        watch.step("the fit", steps, ++steps + 1);
    }

    /** The farthest readings of the robust pass, no more than may be set aside. */
    private boolean[] withoutSuspects(double[] point) {
        boolean[] used = new boolean[problem.observed().size()];
        Arrays.fill(used, true);
        double[] shown = problem.value(point);
        for (int n = 0; n < most; n++) {
            int farthest = -1;
            double off = critical;
            for (int i = 0; i < problem.readingCount(); i++) {
                double here = Math.abs(problem.target(i) - shown[i]);
                if (used[i] && here > off) {
                    farthest = i;
                    off = here;
                }
            }
            if (farthest < 0) {
                break;
            }
            used[farthest] = false;
        }
        return used;
    }

    /** Number of what is to be taken back or put out next; -1 for nothing. */
    private int next(Estimate estimate) {
        int freedom = freedom(estimate);
        int best = -1;
        double nearest = critical;
        int out = 0;
        for (int i = 0; i < takenBack.length; i++) {
            out += estimate.used()[i] ? 0 : 1;
            double off = Math.abs(estimate.studentised(i, freedom));
            if (!estimate.used()[i] && !takenBack[i] && off <= nearest) {
                best = i;
                nearest = off;
            }
        }
        if (best >= 0) {
            return best;
        }
        return out < most ? farthest(estimate, freedom) : -1;
    }

    private int farthest(Estimate estimate, int freedom) {
        int farthest = -1;
        double most = critical;
        for (int i = 0; i < takenBack.length; i++) {
            if (!estimate.used()[i]) {
                continue;
            }
            double off = Math.abs(estimate.studentised(i, freedom));
            // Readings come first, so what comes later must stand out clearly.
            double needed = farthest >= 0 && !problem.observed().get(i).isReading() ? most * (1 + ALIKE) : most;
            if (off > needed) {
                farthest = i;
                most = off;
            }
        }
        return farthest;
    }

    /** Everything that counts, less what settings and line voltages take; the unknowns have their own priors. */
    int freedom(Estimate estimate) {
        int counted = 0;
        for (boolean used : estimate.used()) {
            counted += used ? 1 : 0;
        }
        return counted - (problem.observed().size() - problem.readingCount());
    }
}
