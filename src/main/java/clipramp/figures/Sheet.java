package clipramp.figures;

import java.awt.Font;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A schematic under construction, in modules of a grid; y runs downwards. */
final class Sheet {
    /** Height of the lettering, in modules. */
    static final double TEXT = 0.95;

    private static final double LEADING = 1.2 * TEXT;
    private static final double DOT = 0.2;
    private static final double PROBE = 0.3;

    /** A stroke or a fill. {@code key} is the part's that it belongs to, or empty. */
    record Ink(Shape shape, boolean filled, Net net, String key) {}

    /** A line of lettering whose baseline begins at x, y. */
    record Label(String text, double x, double y, boolean bold, Net net, String key) {
        Font font() {
            return bold ? Lettering.bold(TEXT) : Lettering.regular(TEXT);
        }

        Rectangle2D box() {
            return Lettering.box(text, font(), x, y);
        }
    }

    /** How a label hangs on its anchor. */
    enum Hang {
        RIGHT_OF,
        LEFT_OF,
        CENTRED
    }

    private final List<Ink> inks = new ArrayList<>();
    private final List<Label> labels = new ArrayList<>();
    private final Map<String, Rectangle2D> boxes = new LinkedHashMap<>();

    List<Ink> inks() {
        return inks;
    }

    List<Label> labels() {
        return labels;
    }

    /** Bounds of each part's symbols and labels, by key, in the order of drawing. */
    Map<String, Rectangle2D> boxes() {
        return boxes;
    }

    /** A wire through corners x, y, x, y... */
    void wire(Net net, double... corners) {
        inks.add(new Ink(polyline(corners), false, net, ""));
    }

    static Path2D polyline(double... corners) {
        Path2D.Double path = new Path2D.Double();
        path.moveTo(corners[0], corners[1]);
        for (int i = 2; i < corners.length; i += 2) {
            path.lineTo(corners[i], corners[i + 1]);
        }
        return path;
    }

    /** A joint of wires. */
    void joint(Net net, double x, double y) {
        inks.add(new Ink(new Ellipse2D.Double(x - DOT, y - DOT, 2 * DOT, 2 * DOT), true, net, ""));
    }

    void symbol(String key, Shape shape, boolean filled) {
        symbol(key, shape, filled, Net.SYMBOL);
    }

    void symbol(String key, Shape shape, boolean filled, Net net) {
        inks.add(new Ink(shape, filled, net, key));
        grow(key, shape.getBounds2D());
    }

    /** A terminal or test point: an open ring. */
    void ring(Net net, String key, double x, double y) {
        inks.add(new Ink(new Ellipse2D.Double(x - PROBE, y - PROBE, 2 * PROBE, 2 * PROBE), false, net, key));
    }

    /** Lines of lettering; the first is the part's name, in bold. */
    void label(String key, Net net, Hang hang, double x, double firstBaseline, List<String> lines) {
        double y = firstBaseline;
        boolean bold = true;
        for (String line : lines) {
            double width = Lettering.width(line, bold ? Lettering.bold(TEXT) : Lettering.regular(TEXT));
            double left = x
                    - switch (hang) {
                        case RIGHT_OF -> 0;
                        case LEFT_OF -> width;
                        case CENTRED -> width / 2;
                    };
            Label label = new Label(line, left, y, bold, net, key);
            labels.add(label);
            if (!key.isEmpty()) {
                grow(key, label.box());
            }
            y += LEADING;
            bold = false;
        }
    }

    /** The same, centred on a height. */
    void beside(String key, Hang hang, double x, double middle, List<String> lines) {
        double capital = 0.73 * TEXT;
        double first = middle - (lines.size() - 1) * LEADING / 2 + capital / 2;
        label(key, Net.SYMBOL, hang, x, first, lines);
    }

    /** The same, centred over a place: the last line's baseline is at y. */
    void above(String key, double x, double y, List<String> lines) {
        label(key, Net.SYMBOL, Hang.CENTRED, x, y - (lines.size() - 1) * LEADING, lines);
    }

    /** A line in the regular face, from x on. */
    void plain(Net net, double x, double baseline, String text) {
        labels.add(new Label(text, x, baseline, false, net, ""));
    }

    void note(Net net, Hang hang, double x, double baseline, String text) {
        label("", net, hang, x, baseline, List.of(text));
    }

    private void grow(String key, Rectangle2D bounds) {
        boxes.merge(key, bounds, Rectangle2D::createUnion);
    }
}
