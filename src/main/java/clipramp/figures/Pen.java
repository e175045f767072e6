package clipramp.figures;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/** The few strokes that every figure is made of. */
final class Pen {
    private final Graphics2D g;
    private final Style style;

    Pen(Graphics2D g, Style style) {
        this.g = g;
        this.style = style;
    }

    void fill(Color colour, Shape shape) {
        g.setColor(colour);
        g.fill(shape);
    }

    void stroke(Color colour, Stroke stroke, Shape shape) {
        g.setColor(colour);
        g.setStroke(stroke);
        g.draw(shape);
    }

    void line(Color colour, Stroke stroke, double x1, double y1, double x2, double y2) {
        stroke(colour, stroke, new Line2D.Double(x1, y1, x2, y2));
    }

    /** Text from x on; answers where it ends. */
    double left(String text, Font font, Color colour, double x, double baseline) {
        g.setColor(colour);
        g.setFont(font);
        g.drawString(text, (float) x, (float) baseline);
        return x + Lettering.width(text, font);
    }

    void right(String text, Font font, Color colour, double x, double baseline) {
        left(text, font, colour, x - Lettering.width(text, font), baseline);
    }

    void centred(String text, Font font, Color colour, double x, double baseline) {
        left(text, font, colour, x - Lettering.width(text, font) / 2, baseline);
    }

    /** Text on a patch of ground, so that lines behind it do not run through it; answers where it ends. */
    double backed(String text, Font font, Color colour, double x, double baseline) {
        Rectangle2D box = Lettering.box(text, font, x, baseline);
        fill(style.palette().ground(), box);
        return left(text, font, colour, x, baseline);
    }
}
