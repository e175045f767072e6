package clipramp.figures;

import java.awt.geom.Rectangle2D;

/**
 * Where a part lies in a drawing, for pointing at it.
 *
 * @param key design key, such as ramp.capacitor
 * @param designator its name in the drawing
 * @param box its symbol and label, in user units of the surface
 */
public record PartBox(String key, String designator, Rectangle2D box) {
    /** Whether a point, in user units of the surface, lies in it. */
    public boolean contains(double x, double y) {
        return box.contains(x, y);
    }
}
