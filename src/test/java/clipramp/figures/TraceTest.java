package clipramp.figures;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.PathIterator;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class TraceTest {
    private static List<Line2D> segments(Path2D path) {
        List<Line2D> segments = new ArrayList<>();
        double[] at = new double[6];
        double x = 0;
        double y = 0;
        for (PathIterator i = path.getPathIterator(null); !i.isDone(); i.next()) {
            if (i.currentSegment(at) == PathIterator.SEG_LINETO) {
                segments.add(new Line2D.Double(x, y, at[0], at[1]));
            }
            x = at[0];
            y = at[1];
        }
        return segments;
    }

    private static double farthest(double[] x, double[] y, List<Line2D> segments) {
        double farthest = 0;
        for (int i = 0; i < x.length; i++) {
            double nearest = Double.POSITIVE_INFINITY;
            for (Line2D segment : segments) {
                nearest = Math.min(nearest, segment.ptSegDist(x[i], y[i]));
            }
            farthest = Math.max(farthest, nearest);
        }
        return farthest;
    }

    /** Straight stretches, jumps at one instant, and spikes: whatever is left out lies within a twentieth of a unit. */
    @Test
    void noSampleLiesVisiblyOffThePath() {
        for (long seed = 1; seed <= 20; seed++) {
            Random random = new Random(seed);
            int n = 400;
            double[] x = new double[n];
            double[] y = new double[n];
            for (int i = 1; i < n; i++) {
                boolean jump = random.nextInt(20) == 0;
                x[i] = x[i - 1] + (jump ? 0 : random.nextDouble());
                y[i] = jump ? 300 * random.nextDouble() : y[i - 1] + Math.sin(0.02 * x[i]);
            }
            List<Line2D> segments = segments(Trace.of(x, y, v -> v, v -> v, 0, 1e9));
            assertThat(farthest(x, y, segments)).as("seed " + seed).isLessThan(0.05);
        }
    }

    @Test
    void aSmoothCurveNeedsFewPoints() {
        int n = 2000;
        double[] x = new double[n];
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = 800.0 * i / n;
            y[i] = 100 * Math.sin(Math.PI * i / n);
        }
        assertThat(segments(Trace.of(x, y, v -> v, v -> v, 0, 800))).hasSizeLessThan(120);
    }
}
