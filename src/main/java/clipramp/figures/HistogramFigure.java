package clipramp.figures;

import clipramp.spread.Histogram;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.NumberAxis;

/**
 * How many units get how much power at one knob position.
 *
 * @param histogram the counts, of a run that may still go on
 */
public record HistogramFigure(Histogram histogram) implements Figure {
    private static final double HEADROOM = 1.08;

    @Override
    public String title() {
        return "Units by their power at knob " + Numerals.plain(100 * histogram.position()) + " %";
    }

    @Override
    public String sentence() {
        List<Integer> counts = histogram.counts();
        int fullest = counts.indexOf(histogram.most());
        return "Of " + histogram.units() + " units drawn, most (" + counts.get(fullest) + ") get between "
                + Numerals.plain(edge(fullest)) + " % and " + Numerals.plain(edge(fullest + 1)) + " % of full power.";
    }

    private static double edge(int bin) {
        return 100.0 * bin / Histogram.BINS;
    }

    @Override
    public NumberTable numbers() {
        List<Integer> counts = histogram.counts();
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < counts.size(); i++) {
            rows.add(List.of(Numerals.plain(edge(i)), Numerals.plain(edge(i + 1)), Integer.toString(counts.get(i))));
        }
        return new NumberTable(List.of("from % of full power", "to %", "units"), rows);
    }

    @Override
    public double proportion() {
        return 2.2;
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        Palette palette = style.palette();
        double top = Math.max(1, histogram.most()) * HEADROOM;
        NumberAxis across = new NumberAxis();
        across.setRange(0, 100);
        across.setTickUnit(Plot.ticks(width / style.zoom() > 260 ? 10 : 25, Numerals::plain));
        NumberAxis up = new NumberAxis();
        up.setRange(0, top);
        up.setTickUnit(Plot.ticks(Math.max(1, Ticks.step(top, 4)), Numerals::plain));
        Plot plot = new Plot(g, style, across, up);
        plot.placeWithin(width, height, 52);
        plot.draw();
        List<Integer> counts = histogram.counts();
        for (int i = 0; i < counts.size(); i++) {
            double from = plot.x(edge(i));
            double to = plot.x(edge(i + 1));
            double high = plot.y(counts.get(i));
            plot.pen()
                    .fill(
                            palette.load(),
                            new Rectangle2D.Double(
                                    from,
                                    high,
                                    Math.max(0.5, to - from - style.zoom()),
                                    plot.area().getMaxY() - high));
        }
        plot.axisNames("units of " + histogram.units(), "share of full power, %", height);
    }
}
