package clipramp.figures;

import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/**
 * Graphical symbols after IEC 60617, drawn by this program, in modules of the grid. Two-ended symbols are drawn along an
 * axis from one lead to the other.
 */
final class Symbols {
    /** Half a resistor's width, and its body's length. */
    private static final double HALF = 0.5;

    static final double BODY = 2.6;
    private static final double DIODE = 0.75;

    private final Sheet sheet;

    Symbols(Sheet sheet) {
        this.sheet = sheet;
    }

    /** From x1, y1 to x2, y2 along one axis: leads, and the body between them drawn pointing right at the origin. */
    private void place(String key, Net net, double x1, double y1, double x2, double y2, double half, Part part) {
        double length = Math.hypot(x2 - x1, y2 - y1);
        AffineTransform at = AffineTransform.getTranslateInstance((x1 + x2) / 2, (y1 + y2) / 2);
        at.rotate(Math.atan2(y2 - y1, x2 - x1));
        Path2D leads = Sheet.polyline(-length / 2, 0, -half, 0);
        leads.append(Sheet.polyline(half, 0, length / 2, 0), false);
        sheet.inks().add(new Sheet.Ink(at.createTransformedShape(leads), false, net, ""));
        part.draw((shape, filled) -> sheet.symbol(key, at.createTransformedShape(shape), filled));
    }

    private interface Part {
        void draw(Mark mark);
    }

    private interface Mark {
        void add(Shape shape, boolean filled);
    }

    void resistor(String key, Net net, double x1, double y1, double x2, double y2) {
        place(key, net, x1, y1, x2, y2, BODY / 2, mark -> mark.add(body(), false));
    }

    private static Shape body() {
        return new Rectangle2D.Double(-BODY / 2, -HALF, BODY, 2 * HALF);
    }

    /** A resistor with an arrow across it: adjustable by the knob. */
    void adjustable(String key, Net net, double x1, double y1, double x2, double y2) {
        place(key, net, x1, y1, x2, y2, BODY / 2, mark -> {
            mark.add(body(), false);
            mark.add(Sheet.polyline(1.5, 1.2, -1.35, -1.05), false);
            mark.add(arrowhead(-1.7, -1.33, -0.815, -0.65), true);
        });
    }

    /** A resistor with a barred line across it: set once (IEC 60617, pre-set adjustability). */
    void preset(String key, Net net, double x1, double y1, double x2, double y2) {
        place(key, net, x1, y1, x2, y2, BODY / 2, mark -> {
            mark.add(body(), false);
            mark.add(Sheet.polyline(1.4, 0.85, -1.4, -0.85), false);
            mark.add(Sheet.polyline(-1.634, -0.465, -1.166, -1.235), false);
        });
    }

    /** A filled arrowhead whose tip is at x, y, seen from a point behind it. */
    private static Shape arrowhead(double x, double y, double fromX, double fromY) {
        double length = Math.hypot(x - fromX, y - fromY);
        double ux = (x - fromX) / length;
        double uy = (y - fromY) / length;
        double back = 0.75;
        double side = 0.26;
        Path2D head = Sheet.polyline(
                x,
                y,
                x - back * ux - side * uy,
                y - back * uy + side * ux,
                x - back * ux + side * uy,
                y - back * uy - side * ux);
        head.closePath();
        return head;
    }

    void capacitor(String key, Net net, double x1, double y1, double x2, double y2) {
        place(key, net, x1, y1, x2, y2, 0.25, mark -> {
            mark.add(Sheet.polyline(-0.25, -1.1, -0.25, 1.1), false);
            mark.add(Sheet.polyline(0.25, -1.1, 0.25, 1.1), false);
        });
    }

    /** Anode first. */
    void diode(String key, Net net, double x1, double y1, double x2, double y2) {
        place(key, net, x1, y1, x2, y2, DIODE, mark -> {
            mark.add(triangle(DIODE), false);
            mark.add(Sheet.polyline(DIODE, -DIODE, DIODE, DIODE), false);
        });
    }

    /** Anode first. */
    void zener(String key, Net net, double x1, double y1, double x2, double y2) {
        place(key, net, x1, y1, x2, y2, DIODE, mark -> {
            mark.add(triangle(DIODE), false);
            mark.add(Sheet.polyline(DIODE - 0.4, -DIODE, DIODE, -DIODE, DIODE, DIODE), false);
        });
    }

    private static Path2D triangle(double size) {
        Path2D triangle = Sheet.polyline(-size, -size, size, 0, -size, size);
        triangle.closePath();
        return triangle;
    }

    void lamp(String key, Net net, double x1, double y1, double x2, double y2) {
        double r = 1.2;
        double d = r * Math.sqrt(0.5);
        place(key, net, x1, y1, x2, y2, r, mark -> {
            mark.add(new Ellipse2D.Double(-r, -r, 2 * r, 2 * r), false);
            mark.add(Sheet.polyline(-d, -d, d, d), false);
            mark.add(Sheet.polyline(-d, d, d, -d), false);
        });
    }

    /** Four half-turns; they bulge to the right of the direction of travel, or to the left. */
    void coil(String key, Net net, double x1, double y1, double x2, double y2, boolean bulgesLeft) {
        double r = 0.42;
        place(key, net, x1, y1, x2, y2, 4 * r, mark -> {
            Path2D turns = new Path2D.Double();
            for (int i = 0; i < 4; i++) {
                double left = -4 * r + 2 * r * i;
                double extent = bulgesLeft ? -180 : 180;
                turns.append(new Arc2D.Double(left, -r, 2 * r, 2 * r, 180, extent, Arc2D.OPEN), i > 0);
            }
            mark.add(turns, false);
        });
    }

    /** A thyristor, anode first; its gate leaves beside the cathode, at the right hand of the current or the left. */
    void thyristor(String key, Net net, double x1, double y1, double x2, double y2, boolean gateAtRightHand) {
        double side = gateAtRightHand ? 1 : -1;
        place(key, net, x1, y1, x2, y2, DIODE, mark -> {
            mark.add(triangle(DIODE), false);
            mark.add(Sheet.polyline(DIODE, -DIODE, DIODE, DIODE), false);
            mark.add(Sheet.polyline(DIODE, side * 0.3, 1.75, side * 1.5), false);
        });
    }

    /** A triac, main terminal two first; its gate leaves beside main terminal one, as seen towards it. */
    void triac(String key, Net net, double x1, double y1, double x2, double y2, boolean gateAtRightHand) {
        double side = gateAtRightHand ? 1 : -1;
        double w = 0.8;
        place(key, net, x1, y1, x2, y2, DIODE, mark -> {
            Path2D up = Sheet.polyline(-DIODE, -2 * w, -DIODE, 0, DIODE, -w);
            up.closePath();
            Path2D down = Sheet.polyline(DIODE, 2 * w, DIODE, 0, -DIODE, w);
            down.closePath();
            mark.add(up, false);
            mark.add(down, false);
            mark.add(Sheet.polyline(-DIODE, -2 * w, -DIODE, 2 * w), false);
            mark.add(Sheet.polyline(DIODE, -2 * w, DIODE, 2 * w), false);
            mark.add(Sheet.polyline(DIODE, side * 0.4, 1.75, side * 1.5), false);
        });
    }

    /**
     * A unijunction transistor with n-type base: emitter lead from the left at y, base two above and base one below at
     * {@code x + 1}, each two modules away.
     */
    void unijunction(String key, double x, double y) {
        sheet.symbol(key, Sheet.polyline(x, y - 1.1, x, y + 1.1), false);
        sheet.symbol(key, Sheet.polyline(x, y - 0.7, x + 1, y - 0.7, x + 1, y - 2), false);
        sheet.symbol(key, Sheet.polyline(x, y + 0.7, x + 1, y + 0.7, x + 1, y + 2), false);
        sheet.symbol(key, Sheet.polyline(x - 2, y - 0.75, x - 1.15, y - 0.75, x - 0.35, y - 0.15), false);
        sheet.symbol(key, arrowhead(x - 0.05, y + 0.075, x - 1.15, y - 0.75), true);
        sheet.symbol(key, new Ellipse2D.Double(x - 1.55, y - 1.9, 3.8, 3.8), false);
    }

    /** A programmable unijunction transistor, anode above, cathode below; its gate leaves to the right at {@code y - 0.5}. */
    void programmable(String key, Net anode, Net cathode, double x, double top, double y, double bottom) {
        sheet.wire(anode, x, top, x, y - DIODE);
        sheet.wire(cathode, x, y + DIODE, x, bottom);
        AffineTransform at = AffineTransform.getTranslateInstance(x, y);
        at.rotate(Math.PI / 2);
        sheet.symbol(key, at.createTransformedShape(triangle(DIODE)), false);
        sheet.symbol(key, Sheet.polyline(x - DIODE, y + DIODE, x + DIODE, y + DIODE), false);
        sheet.symbol(key, Sheet.polyline(x + 0.45, y - 0.2, x + 1.5, y - 0.2), false);
        sheet.symbol(key, new Ellipse2D.Double(x - 1.7, y - 1.7, 3.4, 3.4), false);
    }

    /** An iron core between two windings. */
    void core(String key, double x, double y1, double y2) {
        sheet.symbol(key, Sheet.polyline(x - 0.17, y1, x - 0.17, y2), false);
        sheet.symbol(key, Sheet.polyline(x + 0.17, y1, x + 0.17, y2), false);
    }

    /** The mark of a winding's end that goes positive together with another marked one. */
    void phase(String key, double x, double y) {
        sheet.symbol(key, new Ellipse2D.Double(x - 0.16, y - 0.16, 0.32, 0.32), true);
    }

    /** Four diodes on two legs; the ac wires arrive at the given heights, the second crossing the first leg. */
    void bridge(String key, Net net, double left, double right, double top, double bottom, double acOne, double acTwo) {
        for (double x : new double[] {left, right}) {
            diode(key, net, x, acOne, x, top);
            diode(key, net, x, bottom, x, acTwo);
            sheet.wire(net, x, acOne, x, acTwo);
        }
        sheet.wire(net, left, top, right, top);
        sheet.wire(net, left, bottom, right, bottom);
        sheet.joint(net, left, acOne);
        sheet.joint(net, right, acTwo);
        sheet.joint(net, right, top);
        sheet.joint(net, right, bottom);
    }
}
