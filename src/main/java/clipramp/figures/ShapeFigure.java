package clipramp.figures;

import clipramp.sizing.KnobShape;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Stroke;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;

/**
 * Two knobs, one over the other: power or light against the rotation before and after, and the straight line between the
 * new one's ends.
 *
 * @param before the knob as it stands
 * @param after the knob as it is proposed, of the same measure
 */
public record ShapeFigure(KnobShape before, KnobShape after) implements Figure {

    /** One row of numbers for so many solved positions. */
    private static final int ROW_EVERY = 9;

    /**
     * Refuses what cannot be compared.
     *
     * @throws IllegalArgumentException where one shows power and the other light, or they are solved at different positions
     */
    public ShapeFigure {
        if (before.what() != after.what()
                || before.values().size() != after.values().size()) {
            throw new IllegalArgumentException("two knobs of different measures cannot be compared");
        }
    }

    private String measure() {
        return after.what() == KnobShape.What.LIGHT ? "light" : "power";
    }

    @Override
    public String title() {
        String what = measure();
        return what.substring(0, 1).toUpperCase(Locale.ROOT) + what.substring(1)
                + " against the knob, before and after";
    }

    @Override
    public String sentence() {
        return "Farthest from a straight line: before " + percent(before.largestDeparture()) + " of full, after "
                + percent(after.largestDeparture()) + ".";
    }

    private static String percent(double share) {
        return Numerals.fixed(100 * share, 1) + " %";
    }

    @Override
    public NumberTable numbers() {
        int last = after.values().size() - 1;
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i <= last; i += ROW_EVERY) {
            rows.add(List.of(
                    Numerals.cell(100.0 * i / last, 1),
                    Numerals.cell(100 * before.values().get(i), 1),
                    Numerals.cell(100 * after.values().get(i), 1)));
        }
        return new NumberTable(List.of("knob %", "full " + measure() + " before %", "after %"), rows);
    }

    @Override
    public double proportion() {
        return 1.9;
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        Palette palette = style.palette();
        Plot plot = new Plot(g, style, PercentAxis.of(width, style), PercentAxis.of(height * 0.8, style));
        // One path a curve: drawn piece by piece, a dash would begin anew on every piece.
        plot.renderer().setDrawSeriesLineAsPath(true);
        double first = 100 * after.values().get(0);
        double last = 100 * after.values().get(after.values().size() - 1);
        plot.curve(
                new double[] {0, 100}, new double[] {first, last}, palette.axis(), style.hairline(), Plot.noMarker());
        plot.curve(positions(), shares(before), palette.quiet(), style.dashed(), Plot.noMarker());
        plot.curve(positions(), shares(after), palette.load(), style.trace(), Plot.noMarker());
        plot.placeWithin(width, height, 44);
        plot.draw();
        plot.axisNames("share of full " + measure() + ", %", "knob, % of its rotation clockwise", height);
        legend(plot, style, last >= first);
    }

    private double[] positions() {
        int last = after.values().size() - 1;
        return IntStream.rangeClosed(0, last).mapToDouble(i -> 100.0 * i / last).toArray();
    }

    private static double[] shares(KnobShape shape) {
        return shape.values().stream().mapToDouble(v -> 100 * v).toArray();
    }

    /** In the corner over a rising curve, or over a falling one. */
    private static void legend(Plot plot, Style style, boolean rises) {
        Palette palette = style.palette();
        List<String> words = List.of("after", "before", "straight");
        List<Color> colours = List.of(palette.load(), palette.quiet(), palette.axis());
        List<Stroke> strokes = List.of(style.trace(), style.dashed(), style.hairline());
        double line = 1.5 * style.small().getSize2D();
        double swatch = 20 * style.zoom();
        double wide = swatch + style.gap() + Lettering.width("straight", style.small());
        double x = rises ? plot.area().getMinX() + 3 * style.gap() : plot.area().getMaxX() - 3 * style.gap() - wide;
        double y = plot.area().getMinY() + line + style.gap();
        for (int i = 0; i < words.size(); i++) {
            double middle = y - 0.35 * style.small().getSize2D();
            plot.pen().line(colours.get(i), strokes.get(i), x, middle, x + swatch, middle);
            plot.pen().left(words.get(i), style.small(), palette.ink(), x + swatch + style.gap(), y);
            y += line;
        }
    }
}
