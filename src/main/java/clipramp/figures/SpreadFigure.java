package clipramp.figures;

import clipramp.spread.PositionSpread;
import clipramp.spread.SpreadResult;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Stroke;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Power of many units against the knob: half of them, nine tenths and all but two percent as nested bands, the middle
 * unit as a curve, and the worst case as broken lines outside.
 *
 * @param spread what the units do; of a fixed ramp the bands are as wide as the plot
 */
public record SpreadFigure(SpreadResult spread) implements Figure {
    private static final int MIDDLE = SpreadResult.PERCENTAGES.size() / 2;
    private static final double[] TINTS = {0.14, 0.26, 0.42};
    private static final String[] MEANINGS = {"98 % of the units", "90 %", "half", "middle unit", "worst case"};

    /**
     * Refuses a spread that shows nothing.
     *
     * @throws IllegalArgumentException where no unit was drawn
     */
    public SpreadFigure {
        if (spread.positions().isEmpty()) {
            throw new IllegalArgumentException("a spread of no unit cannot be drawn");
        }
    }

    @Override
    public String title() {
        return "Power of " + spread.units() + " units against the knob";
    }

    @Override
    public String sentence() {
        PositionSpread middle = spread.positions().get(spread.positions().size() / 2);
        String where = spread.positions().size() == 1 ? "The load gets" : "At mid-knob the load gets";
        return where + " between " + percent(middle.fraction().get(0)) + " and "
                + percent(middle.fraction().get(middle.fraction().size() - 1))
                + " of full power from all but 2 % of the units, half of them between "
                + percent(middle.fraction().get(MIDDLE - 1)) + " and "
                + percent(middle.fraction().get(MIDDLE + 1)) + ".";
    }

    private static String percent(double fraction) {
        return Numerals.fixed(100 * fraction, 1) + " %";
    }

    @Override
    public NumberTable numbers() {
        List<String> heads = new ArrayList<>(List.of("knob %"));
        SpreadResult.PERCENTAGES.forEach(
                p -> heads.add(String.format(Locale.ROOT, "full power %% at %.0f %% of units", p)));
        heads.addAll(List.of("least %", "greatest %", "stays off %"));
        return new NumberTable(
                heads, spread.positions().stream().map(SpreadFigure::row).toList());
    }

    private static List<String> row(PositionSpread at) {
        List<String> cells = new ArrayList<>();
        cells.add(at.position().isPresent() ? Numerals.cell(100 * at.position().getAsDouble(), 0) : Numerals.NOTHING);
        at.fraction().forEach(f -> cells.add(Numerals.cell(100 * f, 1)));
        cells.add(Numerals.cell(100 * at.worstFraction().least(), 1));
        cells.add(Numerals.cell(100 * at.worstFraction().greatest(), 1));
        cells.add(Numerals.cell(100 * at.misfires(), 2));
        return cells;
    }

    @Override
    public double proportion() {
        return 1.9;
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        Palette palette = style.palette();
        Plot plot = new Plot(g, style, PercentAxis.of(width, style), PercentAxis.of(height * 0.8, style));
        plot.curve(positions(), fractions(MIDDLE), palette.load(), style.trace(), Plot.noMarker());
        plot.curve(positions(), worst(false), palette.load(), style.dotted(), Plot.noMarker());
        plot.curve(positions(), worst(true), palette.load(), style.dotted(), Plot.noMarker());
        plot.placeWithin(width, height, 44);
        for (int i = 0; i < TINTS.length; i++) {
            band(
                    plot,
                    fractions(i),
                    fractions(2 * MIDDLE - i),
                    Palette.mixed(palette.ground(), palette.load(), TINTS[i]));
        }
        plot.draw();
        plot.axisNames("share of full power, %", "knob, % of its rotation clockwise", height);
        legend(plot, style);
    }

    private double[] positions() {
        return spread.positions().size() == 1
                ? new double[] {0, 100}
                : spread.positions().stream()
                        .mapToDouble(p -> 100 * p.position().orElse(0))
                        .toArray();
    }

    private double[] fractions(int percentage) {
        return column(spread.positions().stream()
                .mapToDouble(p -> 100 * p.fraction().get(percentage))
                .toArray());
    }

    private double[] worst(boolean greatest) {
        return column(spread.positions().stream()
                .mapToDouble(p -> 100
                        * (greatest
                                ? p.worstFraction().greatest()
                                : p.worstFraction().least()))
                .toArray());
    }

    private static double[] column(double[] values) {
        return values.length == 1 ? new double[] {values[0], values[0]} : values;
    }

    private void band(Plot plot, double[] low, double[] high, Color tint) {
        plot.pen().fill(tint, outline(plot, low, high));
    }

    private Path2D outline(Plot plot, double[] low, double[] high) {
        double[] x = positions();
        Path2D area = new Path2D.Double();
        area.moveTo(plot.x(x[0]), plot.y(high[0]));
        for (int i = 1; i < x.length; i++) {
            area.lineTo(plot.x(x[i]), plot.y(high[i]));
        }
        for (int i = x.length - 1; i >= 0; i--) {
            area.lineTo(plot.x(x[i]), plot.y(low[i]));
        }
        area.closePath();
        return area;
    }

    /** What the tints and lines mean, in the first corner that the bands leave free. */
    private void legend(Plot plot, Style style) {
        double line = 1.5 * style.small().getSize2D();
        double swatch = 16 * style.zoom();
        double wide = swatch + style.gap() + Lettering.width(MEANINGS[0], style.small());
        Rectangle2D corner = corner(plot, wide + 4 * style.gap(), (MEANINGS.length + 0.6) * line);
        double x = corner.getMinX() + 2 * style.gap();
        double y = corner.getMinY() + line;
        Palette palette = style.palette();
        for (int i = 0; i < MEANINGS.length; i++) {
            double middle = y - 0.35 * style.small().getSize2D();
            if (i < TINTS.length) {
                plot.pen()
                        .fill(
                                Palette.mixed(palette.ground(), palette.load(), TINTS[i]),
                                new Rectangle2D.Double(x, middle - 0.3 * line, swatch, 0.6 * line));
            } else {
                Stroke stroke = i == TINTS.length ? style.trace() : style.dotted();
                plot.pen().line(palette.load(), stroke, x, middle, x + swatch, middle);
            }
            plot.pen().left(MEANINGS[i], style.small(), palette.ink(), x + swatch + style.gap(), y);
            y += line;
        }
    }

    private Rectangle2D corner(Plot plot, double wide, double high) {
        Rectangle2D area = plot.area();
        double right = area.getMaxX() - wide;
        double bottom = area.getMaxY() - high;
        List<Rectangle2D> corners = List.of(
                new Rectangle2D.Double(right, bottom, wide, high),
                new Rectangle2D.Double(area.getMinX(), area.getMinY(), wide, high),
                new Rectangle2D.Double(area.getMinX(), bottom, wide, high),
                new Rectangle2D.Double(right, area.getMinY(), wide, high));
        return corners.stream().filter(c -> isFree(plot, c)).findFirst().orElse(corners.get(0));
    }

    private boolean isFree(Plot plot, Rectangle2D corner) {
        Path2D band = outline(plot, fractions(0), fractions(2 * MIDDLE));
        return !band.intersects(corner);
    }
}
