package clipramp.engine;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Integrals over a piece: Gauss-Legendre panels, short where the exponential still moves and never longer than a fraction
 * of the source's fastest period. Relative accuracy 1e-10 for products of two node quantities.
 */
public final class PieceQuadrature {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(10);

    /** Panel edges in time constants of the piece; beyond the last the exponential is gone. */
    private static final double[] EDGES = {1, 2, 3, 5, 8, 13, 21, 40};

    /** Longest panel as an angle of the fastest sinusoid, rad. */
    private static final double LONGEST_RAD = 0.25;

    private PieceQuadrature() {}

    /** What sums up an integral. */
    public interface Visitor {
        /**
         * One node of the rule.
         *
         * @param piece the piece, looked at the node
         * @param weightSeconds the node's weight, s: the integral is the sum of weight times value
         */
        void node(Piece piece, double weightSeconds);
    }

    /**
     * Visits the nodes of a piece between two times, in rising time.
     *
     * @param piece the piece; it is left looked at the last node
     * @param from in the piece, s since the line zero
     * @param to in the piece, s since the line zero; at or before {@code from} nothing is visited
     * @param visitor shown every node
     */
    public static void visit(Piece piece, double from, double to, Visitor visitor) {
        double rate = piece.ratePerSecond();
        double longest = piece.fastestRate() == 0 ? to - from : LONGEST_RAD / piece.fastestRate();
        double start = from;
        for (double edge : EDGES) {
            double next = piece.startSeconds() + edge / rate;
            if (rate > 0 && next > start && next < to) {
                panels(piece, start, next, longest, visitor);
                start = next;
            }
        }
        panels(piece, start, to, longest, visitor);
    }

    private static void panels(Piece piece, double from, double to, double longest, Visitor visitor) {
        if (!(to > from)) {
            return;
        }
        int count = Math.max(1, (int) Math.ceil((to - from) / longest));
        double half = (to - from) / count / 2;
        for (int panel = 0; panel < count; panel++) {
            double middle = from + (2 * panel + 1) * half;
            for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
                piece.look(middle + half * RULE.getPoint(i));
                visitor.node(piece, half * RULE.getWeight(i));
            }
        }
    }
}
