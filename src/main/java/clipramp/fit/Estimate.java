package clipramp.fit;

import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;

/**
 * Where the squares are least.
 *
 * @param point what is fitted, in prior deviations
 * @param covariance of it
 * @param jacobian of everything observed, in deviations, whether used or not
 * @param residual observed less shown, in deviations, whether used or not
 * @param used which of them count
 * @param prior squares that the drawing contributes
 */
record Estimate(
        double[] point, RealMatrix covariance, RealMatrix jacobian, double[] residual, boolean[] used, double prior) {
    /** A residual that keeps less than this share of its reading's variance cannot be tested. */
    private static final double LEAST_CONTROL = 1e-3;

    /** Sum of squares of everything that counts. */
    double squares() {
        double sum = prior;
        for (int i = 0; i < residual.length; i++) {
            sum += used[i] ? residual[i] * residual[i] : 0;
        }
        return sum;
    }

    /**
     * A residual in its own standard deviation (Baarda's w, from memory): 1 - h for one that took part in the fit, 1 + h
     * for one that is predicted by the others.
     *
     * @return 0 where the reading alone decides what is fitted, so that nothing can be said against it
     */
    double standardised(int i) {
        if (residual.length == 0 || point.length == 0) {
            return residual[i];
        }
        RealVector row = jacobian.getRowVector(i);
        double lever = row.dotProduct(covariance.operate(row));
        double variance = used[i] ? 1 - lever : 1 + lever;
        return variance < LEAST_CONTROL ? 0 : residual[i] / Math.sqrt(variance);
    }

    /**
     * The same against the scatter of all others (deleted, externally studentised residual); never against less than the
     * instruments' own.
     *
     * @param freedom degrees of freedom of this fit
     */
    double studentised(int i, int freedom) {
        double w = standardised(i);
        int others = used[i] ? freedom - 1 : freedom;
        if (others < 1) {
            return w;
        }
        double rest = Math.max(0, used[i] ? squares() - w * w : squares());
        return w / Math.max(1, Math.sqrt(rest / others));
    }
}
