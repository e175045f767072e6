package clipramp.fit;

import java.util.Arrays;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.exception.TooManyIterationsException;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresFactory;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresOptimizer.Optimum;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.fitting.leastsquares.ParameterValidator;
import org.apache.commons.math3.fitting.leastsquares.ValueAndJacobianFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.util.Pair;

/**
 * Least squares with what was known beforehand as further observations (a ridge), by Levenberg and Marquardt's method.
 * The prior is what keeps a value that no reading moves at the drawing's.
 */
final class Estimator {
    /** Weight that stands for none where dropping a row would leave a column empty. */
    private static final double NEXT_TO_NONE = 1e-3;

    /** Corner of Cauchy's loss: 95 % as good as squares where nothing is wrong (Holland and Welsch 1977, from memory). */
    private static final double CAUCHY = 2.385;

    private static final double COST_TOLERANCE = 1e-5;
    private static final double POINT_TOLERANCE = 1e-3;
    /** The robust pass only sorts. */
    private static final double ROUGHLY = 1e-3;

    private static final int MOST_EVALUATIONS = 150;
    private static final int MOST_ITERATIONS = 40;

    private final BenchProblem problem;

    Estimator(BenchProblem problem) {
        this.problem = problem;
    }

    /**
     * Squares, but for readings that are set aside.
     *
     * @param used which of the observed count
     * @param start where to begin
     */
    Estimate squares(boolean[] used, double[] start) {
        return estimate(used, optimum(used, start, false));
    }

    /**
     * Loss that grows with the logarithm of a large residual: a pass that a gross error moves little. It has more than one
     * minimum, so it begins at each of several points and keeps the lowest.
     */
    double[] robust(double[]... starts) {
        boolean[] all = new boolean[problem.observed().size()];
        Arrays.fill(all, true);
        Function loss = new Function(all, true);
        double[] best = starts[0];
        double lowest = Double.POSITIVE_INFINITY;
        for (double[] start : starts) {
            double[] found = optimum(all, start, true);
            double here = loss.computeValue(found).getNorm();
            if (here < lowest) {
                best = found;
                lowest = here;
            }
        }
        return best;
    }

    private double[] optimum(boolean[] used, double[] start, boolean robust) {
        if (start.length == 0) {
            return start;
        }
        int rows = problem.observed().size() + problem.active().length;
        ParameterValidator within = point -> new ArrayRealVector(problem.within(point.toArray()), false);
        LevenbergMarquardtOptimizer optimizer = new LevenbergMarquardtOptimizer()
                .withCostRelativeTolerance(robust ? ROUGHLY : COST_TOLERANCE)
                .withParameterRelativeTolerance(robust ? ROUGHLY : POINT_TOLERANCE);
        try {
            Optimum optimum = optimizer.optimize(LeastSquaresFactory.create(
                    new Function(used, robust),
                    new ArrayRealVector(rows),
                    new ArrayRealVector(start),
                    null,
                    null,
                    MOST_EVALUATIONS,
                    MOST_ITERATIONS,
                    true,
                    within));
            return within.validate(optimum.getPoint()).toArray();
        } catch (TooManyIterationsException | TooManyEvaluationsException stuck) {
            throw new UnsettledFitException(stuck);
        }
    }

    private Estimate estimate(boolean[] used, double[] point) {
        RealMatrix jacobian = problem.jacobian(point);
        double[] shown = problem.value(point);
        double[] residual = new double[shown.length];
        RealMatrix normal = new Array2DRowRealMatrix(point.length, point.length);
        for (int i = 0; i < shown.length; i++) {
            residual[i] = problem.target(i) - shown[i];
            double weight = weight(used, i);
            RealVector row = jacobian.getRowVector(i).mapMultiply(weight);
            normal = normal.add(row.outerProduct(row));
        }
        double prior = 0;
        for (int c = 0; c < problem.active().length; c++) {
            normal.addToEntry(c, c, 1);
            prior += point[c] * point[c];
        }
        RealMatrix covariance = point.length == 0
                ? normal
                : new CholeskyDecomposition(normal, 1e-8, 1e-14).getSolver().getInverse();
        return new Estimate(point, covariance, jacobian, residual, used.clone(), prior);
    }

    private double weight(boolean[] used, int i) {
        if (used[i]) {
            return 1;
        }
        return i < problem.readingCount() ? 0 : NEXT_TO_NONE;
    }

    /** Everything that is to become zero. */
    private final class Function implements ValueAndJacobianFunction {
        private final boolean[] used;
        private final boolean robust;

        Function(boolean[] used, boolean robust) {
            this.used = used;
            this.robust = robust;
        }

        @Override
        public Pair<RealVector, RealMatrix> value(RealVector point) {
            double[] at = point.toArray();
            return new Pair<>(computeValue(at), computeJacobian(at));
        }

        @Override
        public RealVector computeValue(double[] point) {
            double[] shown = problem.value(point);
            double[] all = new double[shown.length + problem.active().length];
            for (int i = 0; i < shown.length; i++) {
                double off = (shown[i] - problem.target(i)) * weight(used, i);
                all[i] = isBent(i) ? bent(off) : off;
            }
            System.arraycopy(point, 0, all, shown.length, problem.active().length);
            return new ArrayRealVector(all, false);
        }

        @Override
        public RealMatrix computeJacobian(double[] point) {
            double[] shown = problem.value(point);
            RealMatrix part = problem.roughJacobian(point, shown);
            int rows = part.getRowDimension();
            RealMatrix all = MatrixUtils.createRealMatrix(rows + problem.active().length, point.length);
            for (int i = 0; i < rows; i++) {
                double slope = isBent(i) ? bentSlope(shown[i] - problem.target(i)) : 1;
                all.setRowVector(i, part.getRowVector(i).mapMultiply(weight(used, i) * slope));
            }
            for (int c = 0; c < problem.active().length; c++) {
                all.setEntry(rows + c, c, 1);
            }
            return all;
        }

        private boolean isBent(int i) {
            return robust && i < problem.readingCount();
        }
    }

    /** Square root of Cauchy's loss, with the residual's sign: its square is c² ln(1 + (r/c)²). */
    private static double bent(double residual) {
        double share = residual / CAUCHY;
        return Math.copySign(CAUCHY * Math.sqrt(Math.log1p(share * share)), residual);
    }

    private static double bentSlope(double residual) {
        double share = residual / CAUCHY;
        double square = share * share;
        return square < 1e-12 ? 1 : Math.abs(share) / Math.sqrt(Math.log1p(square)) / (1 + square);
    }
}
