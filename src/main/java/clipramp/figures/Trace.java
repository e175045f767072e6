package clipramp.figures;

import java.awt.geom.Path2D;
import java.util.function.DoubleUnaryOperator;

/**
 * A sampled curve as a path. Samples that lie on a straight line, to within less than can be seen, are left out: a
 * picture file stays small and a screen fast. Jumps and spikes keep every corner.
 */
final class Trace {
    /** How far a left-out sample may lie off the path, in user units. */
    private static final double UNSEEN = 0.04;

    private final Path2D.Double path = new Path2D.Double();
    private boolean empty = true;
    private double anchorX;
    private double anchorY;
    private double heldX;
    private double heldY;
    private boolean holds;
    private double leastSlope;
    private double mostSlope;

    private Trace() {}

    /**
     * @param x sampled abscissae, never falling
     * @param y as many ordinates
     * @param toX abscissa to user units
     * @param toY ordinate to user units
     * @param from first abscissa shown; the sample before it is kept
     * @param to last abscissa shown; the sample after it is kept
     */
    static Path2D of(double[] x, double[] y, DoubleUnaryOperator toX, DoubleUnaryOperator toY, double from, double to) {
        Trace trace = new Trace();
        for (int i = 0; i < x.length; i++) {
            boolean before = i + 1 < x.length && x[i + 1] < from;
            boolean after = i > 0 && x[i - 1] > to;
            if (!before && !after) {
                trace.add(toX.applyAsDouble(x[i]), toY.applyAsDouble(y[i]));
            }
        }
        trace.release();
        return trace.path;
    }

    private void add(double x, double y) {
        if (empty) {
            path.moveTo(x, y);
            empty = false;
            anchor(x, y);
            return;
        }
        if (holds && !fits(x, y)) {
            release();
        }
        double run = x - anchorX;
        if (run > 0) {
            leastSlope = Math.max(leastSlope, (y - UNSEEN - anchorY) / run);
            mostSlope = Math.min(mostSlope, (y + UNSEEN - anchorY) / run);
        }
        heldX = x;
        heldY = y;
        holds = true;
    }

    /** Whether the straight line from the anchor to a sample passes all held samples closely enough. */
    private boolean fits(double x, double y) {
        double slope = (y - anchorY) / (x - anchorX);
        return x > heldX && heldX > anchorX && slope >= leastSlope && slope <= mostSlope;
    }

    /** The last held sample becomes a corner. */
    private void release() {
        if (holds) {
            path.lineTo(heldX, heldY);
            anchor(heldX, heldY);
        }
    }

    private void anchor(double x, double y) {
        anchorX = x;
        anchorY = y;
        holds = false;
        leastSlope = Double.NEGATIVE_INFINITY;
        mostSlope = Double.POSITIVE_INFINITY;
    }
}
