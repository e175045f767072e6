package clipramp.figures;

import java.awt.Shape;
import java.awt.geom.FlatteningPathIterator;
import java.awt.geom.Line2D;
import java.awt.geom.PathIterator;
import java.awt.geom.Rectangle2D;

/** Whether an outline passes through a rectangle. */
final class Outlines {
    private Outlines() {}

    static boolean cross(Shape shape, Rectangle2D box) {
        double[] at = new double[6];
        double startX = 0;
        double startY = 0;
        double x = 0;
        double y = 0;
        for (PathIterator i = new FlatteningPathIterator(shape.getPathIterator(null), 0.02); !i.isDone(); i.next()) {
            int kind = i.currentSegment(at);
            if (kind == PathIterator.SEG_MOVETO) {
                startX = at[0];
                startY = at[1];
            } else {
                double toX = kind == PathIterator.SEG_CLOSE ? startX : at[0];
                double toY = kind == PathIterator.SEG_CLOSE ? startY : at[1];
                if (new Line2D.Double(x, y, toX, toY).intersects(box)) {
                    return true;
                }
                at[0] = toX;
                at[1] = toY;
            }
            x = at[0];
            y = at[1];
        }
        return false;
    }
}
