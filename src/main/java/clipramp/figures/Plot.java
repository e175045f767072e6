package clipramp.figures;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.text.FieldPosition;
import java.text.NumberFormat;
import java.text.ParsePosition;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.DoubleFunction;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** A plain plot in the figures' own look: hairlines, one family, labels beside the lines instead of a legend. */
final class Plot {
    /** Room over, under and at the right of the curves, in units of a screen at 100 %. */
    private static final double OVER = 28;

    private static final double UNDER = 44;
    private static final double RIGHT = 16;

    private final Style style;
    private final Pen pen;
    private final Graphics2D g;
    private final XYPlot plot;
    private final XYSeriesCollection series = new XYSeriesCollection();
    private final XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer();
    private final List<Rectangle2D> taken = new ArrayList<>();
    private final List<double[][]> curves = new ArrayList<>();
    private final List<Line2D> limits = new ArrayList<>();
    private final List<Runnable> afterwards = new ArrayList<>();
    private Rectangle2D area = new Rectangle2D.Double();

    Plot(Graphics2D g, Style style, ValueAxis across, ValueAxis up) {
        this.style = style;
        this.g = g;
        this.pen = new Pen(g, style);
        for (ValueAxis axis : List.of(across, up)) {
            axis.setTickLabelFont(style.small());
            axis.setTickLabelPaint(style.palette().quiet());
            axis.setAxisLinePaint(style.palette().axis());
            axis.setAxisLineStroke(style.hairline());
            axis.setTickMarkPaint(style.palette().axis());
            axis.setTickMarkStroke(style.hairline());
            axis.setTickMarkOutsideLength((float) style.gap());
        }
        plot = new XYPlot(series, across, up, renderer);
        plot.setBackgroundPaint(null);
        plot.setOutlineVisible(false);
        plot.setDomainGridlinePaint(style.palette().hairline());
        plot.setRangeGridlinePaint(style.palette().hairline());
        plot.setDomainGridlineStroke(style.hairline());
        plot.setRangeGridlineStroke(style.hairline());
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setInsets(RectangleInsets.ZERO_INSETS);
    }

    XYPlot plot() {
        return plot;
    }

    XYLineAndShapeRenderer renderer() {
        return renderer;
    }

    Pen pen() {
        return pen;
    }

    /** A curve, with a marker at every point where one is given. */
    void curve(double[] x, double[] y, Color colour, Stroke stroke, Shape markerOrEmpty) {
        int index = series.getSeriesCount();
        curves.add(new double[][] {x, y});
        XYSeries curve = new XYSeries(index, false, true);
        for (int i = 0; i < x.length; i++) {
            curve.add(x[i], y[i]);
        }
        series.addSeries(curve);
        boolean marked = !markerOrEmpty.getBounds2D().isEmpty();
        renderer.setSeriesPaint(index, colour);
        renderer.setSeriesStroke(index, stroke);
        renderer.setSeriesLinesVisible(index, true);
        renderer.setSeriesShapesVisible(index, marked);
        renderer.setSeriesShapesFilled(index, true);
        renderer.setSeriesShape(index, markerOrEmpty);
    }

    static Shape noMarker() {
        return new Rectangle2D.Double();
    }

    /**
     * Says that the curves are to lie in the middle of a figure, and lays its ground.
     *
     * @param left room for the marks of the left axis, in units of a screen at 100 %
     */
    void placeWithin(double width, double height, double left) {
        double zoom = style.zoom();
        place(new Rectangle2D.Double(
                left * zoom,
                OVER * zoom,
                Math.max(1, width - (RIGHT + left) * zoom),
                Math.max(1, height - (UNDER + OVER) * zoom)));
        pen.fill(style.palette().ground(), new Rectangle2D.Double(0, 0, width, height));
    }

    /** Says where the curves are to lie, so that something can be laid under them. */
    void place(Rectangle2D wanted) {
        area = wanted;
        AxisSpace across = new AxisSpace();
        across.setBottom(5 * style.gap());
        AxisSpace up = new AxisSpace();
        up.setLeft(wanted.getMinX());
        plot.setFixedDomainAxisSpace(across);
        plot.setFixedRangeAxisSpace(up);
    }

    /** Draws axes and curves at their place, and then what was to be lettered over them. */
    void draw() {
        double below = 5 * style.gap();
        Rectangle2D bounds = new Rectangle2D.Double(0, area.getMinY(), area.getMaxX(), area.getHeight() + below);
        Shape clip = g.getClip();
        plot.draw(g, bounds, null, null, null);
        g.setClip(clip);
        g.setStroke(new BasicStroke());
        for (Runnable text : afterwards) {
            text.run();
        }
    }

    /** Letters a text once the curves are drawn, in quiet ink. */
    void later(String text, double x, double baseline) {
        afterwards.add(() -> letter(text, style.small(), style.palette().quiet(), x, baseline));
    }

    Rectangle2D area() {
        return area;
    }

    double x(double value) {
        return plot.getDomainAxis().valueToJava2D(value, area, RectangleEdge.BOTTOM);
    }

    double y(double value) {
        return plot.getRangeAxis().valueToJava2D(value, area, RectangleEdge.LEFT);
    }

    /** Above the left axis and under the right end of the lower one: what they measure. */
    void axisNames(String up, String across, double height) {
        pen.left(up, style.small(), style.palette().quiet(), 2 * style.gap(), area.getMinY() - 2.5 * style.gap());
        pen.right(across, style.small(), style.palette().quiet(), area.getMaxX(), height - 1.5 * style.gap());
    }

    /** Letters a text at the first of some places where it lies on the plot and on no other text. */
    void letter(String text, Font font, Color colour, double... places) {
        for (int i = 0; i + 1 < places.length; i += 2) {
            Rectangle2D box = Lettering.box(text, font, places[i], places[i + 1]);
            Rectangle2D wide = new Rectangle2D.Double(
                    box.getX() - style.gap() / 2, box.getY(), box.getWidth() + style.gap(), box.getHeight());
            boolean free = taken.stream().noneMatch(wide::intersects) && area.contains(wide) && !crossesACurve(wide);
            if (free || i + 3 >= places.length) {
                taken.add(wide);
                pen.backed(text, font, colour, places[i], places[i + 1]);
                return;
            }
        }
    }

    private boolean crossesACurve(Rectangle2D box) {
        for (double[][] curve : curves) {
            for (int i = 1; i < curve[0].length; i++) {
                if (new Line2D.Double(x(curve[0][i - 1]), y(curve[1][i - 1]), x(curve[0][i]), y(curve[1][i]))
                        .intersects(box)) {
                    return true;
                }
            }
        }
        return limits.stream().anyMatch(line -> line.intersects(box));
    }

    /** A straight line that no lettering may lie on, in user units. */
    void limit(Stroke stroke, double x1, double y1, double x2, double y2) {
        limits.add(new Line2D.Double(x1, y1, x2, y2));
        pen.line(style.palette().ink(), stroke, x1, y1, x2, y2);
    }

    /** Ticks a step apart, lettered by a function of their value. */
    static NumberTickUnit ticks(double step, DoubleFunction<String> text) {
        return new NumberTickUnit(step, format(text));
    }

    static NumberFormat format(DoubleFunction<String> text) {
        return new Lettered(text);
    }

    /** A number format that only writes. */
    private static final class Lettered extends DecimalFormat {
        private static final long serialVersionUID = 1;
        private final transient DoubleFunction<String> text;

        Lettered(DoubleFunction<String> text) {
            super("0", DecimalFormatSymbols.getInstance(Locale.ROOT));
            this.text = text;
        }

        @Override
        public StringBuffer format(double number, StringBuffer to, FieldPosition position) {
            return to.append(text.apply(number));
        }

        @Override
        public Number parse(String source, ParsePosition position) {
            throw new UnsupportedOperationException("figures are not read back");
        }

        @Override
        public boolean equals(Object other) {
            return this == other;
        }

        @Override
        public int hashCode() {
            return System.identityHashCode(this);
        }
    }
}
