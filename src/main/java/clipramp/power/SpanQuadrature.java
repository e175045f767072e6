package clipramp.power;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Integrals over stretches of current: Gauss-Legendre panels of 24 points, over each of which the fastest sinusoid turns
 * by 16 radians at most (the rule is exact to rounding there), shorter where an exponential still moves.
 */
final class SpanQuadrature {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(24);
    private static final double MOST_TURN_RAD = 16;

    /** Panel edges in time constants of the loop; beyond the last the exponential is gone. */
    private static final double[] EDGES = {2, 5, 10, 20, 40};

    private SpanQuadrature() {}

    /** What sums up an integral. */
    interface Visitor {
        /** One node of the rule: its line angle, rad, and its weight, rad, that the value there is multiplied by. */
        void node(double rad, double weightRad);
    }

    /**
     * Visits the nodes of a stretch.
     *
     * @param span the stretch
     * @param highestOrder order of the line of the fastest sinusoid in the integrand
     */
    static void visit(CurrentSpan span, int highestOrder, Visitor visitor) {
        double longest = MOST_TURN_RAD / highestOrder;
        double start = span.fromRad();
        for (double edge : EDGES) {
            double next = span.fromRad() + edge * span.memoryRad();
            if (next > start && next < span.toRad()) {
                panels(start, next, longest, visitor);
                start = next;
            }
        }
        panels(start, span.toRad(), longest, visitor);
    }

    /**
     * Visits the nodes between two angles.
     *
     * @param fromRad line angle, rad
     * @param toRad line angle, rad; at or before {@code fromRad} nothing is visited
     * @param highestOrder order of the line of the fastest sinusoid in the integrand
     */
    static void visit(double fromRad, double toRad, int highestOrder, Visitor visitor) {
        panels(fromRad, toRad, MOST_TURN_RAD / highestOrder, visitor);
    }

    /**
     * Integral over angle of the squared current of a stretch, A² rad.
     *
     * @param lineOrder highest order of the line
     */
    static double squareAmpRad(CurrentSpan span, int lineOrder) {
        double[] sum = {0};
        visit(span, productOrder(lineOrder), (rad, weight) -> {
            double amps = span.amps().applyAsDouble(rad);
            sum[0] += weight * amps * amps;
        });
        return sum[0];
    }

    /** Order that integrands of two currents or voltages are integrated for: products turn twice as fast as either. */
    static int productOrder(int lineOrder) {
        return 2 * lineOrder + 2;
    }

    private static void panels(double from, double to, double longest, Visitor visitor) {
        if (!(to > from)) {
            return;
        }
        int count = Math.max(1, (int) Math.ceil((to - from) / longest));
        double half = (to - from) / count / 2;
        for (int panel = 0; panel < count; panel++) {
            double middle = from + (2 * panel + 1) * half;
            for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
                visitor.node(middle + half * RULE.getPoint(i), half * RULE.getWeight(i));
            }
        }
    }
}
