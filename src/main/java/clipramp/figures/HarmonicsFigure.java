package clipramp.figures;

import clipramp.margins.LineCheck;
import clipramp.margins.LineCheck.Order;
import clipramp.margins.LineCheck.Setting;
import clipramp.power.LineCurrent;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jfree.chart.axis.NumberAxis;

/**
 * Every order of the line current, 1 to 40, beside the class A limits of IEC 61000-3-2: filled bars at one setting,
 * outlines up to the largest of any setting, a stroke a limit. The scale is logarithmic, because what binds is often a
 * hundredth of the fundamental.
 *
 * @param check the line current beside its table
 * @param standing the setting whose bars are filled; the one that uses most of the table where none is
 */
public record HarmonicsFigure(LineCheck check, Optional<Setting> standing) implements Figure {
    private static final int DIGITS = 3;
    /** Where bars begin: more than a decade under the smallest limit. */
    private static final double LEAST_AMPS = 0.001;

    private static final double HEADROOM = 1.6;
    private static final double BAR = 0.72;
    /** Share of the width that the last line of the legend may take. */
    private static final double MOST_LEGEND = 0.6;

    /** With the bars of the setting that uses most of the table. */
    public HarmonicsFigure(LineCheck check) {
        this(check, Optional.empty());
    }

    private Setting filled() {
        return standing.orElseGet(check::worstSetting);
    }

    @Override
    public String title() {
        return "Line current by order";
    }

    @Override
    public String sentence() {
        Order binding = check.binding();
        if (binding.used() == 0) {
            return "No line current flows at any setting, so no order comes near its limit.";
        }
        Setting worst = check.worstSetting();
        LineCurrent current = worst.current();
        return "Where it uses most of the class A table" + at(worst.position()) + " the line current is "
                + amps(current.rmsAmps()) + " rms with a distortion of "
                + Numerals.significant(100 * current.distortion(), DIGITS) + " % and a power factor of "
                + Numerals.significant(current.powerFactor(), DIGITS) + "; order " + binding.order() + " binds first, "
                + amps(binding.amps()) + " beside a limit of " + amps(binding.limitAmps()) + at(binding.position())
                + "; such a load would reach that at " + QuantityText.format(check.bindsAtWatts(), Unit.WATT, 4)
                + " of full power.";
    }

    private static String at(OptionalDouble position) {
        return position.isPresent() ? " (knob " + Numerals.plain(100 * position.getAsDouble()) + " %)" : "";
    }

    private static String amps(double value) {
        return QuantityText.format(value, Unit.AMPERE, DIGITS);
    }

    @Override
    public NumberTable numbers() {
        LineCurrent current = filled().current();
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of(
                "1",
                Numerals.cell(1e3 * current.fundamentalAmps(), 2),
                Numerals.cell(1e3 * largestFundamental(), 2),
                Numerals.NOTHING,
                Numerals.NOTHING));
        for (Order order : check.orders()) {
            rows.add(List.of(
                    Integer.toString(order.order()),
                    Numerals.cell(1e3 * current.ampsOf(order.order()), 2),
                    Numerals.cell(1e3 * order.amps(), 2),
                    Numerals.cell(1e3 * order.limitAmps(), 1),
                    Numerals.cell(100 * order.used(), 1)));
        }
        return new NumberTable(
                List.of("order", "mA" + at(filled().position()), "largest mA", "class A mA", "used %"), rows);
    }

    private double largestFundamental() {
        return check.settings().stream()
                .mapToDouble(setting -> setting.current().fundamentalAmps())
                .max()
                .orElse(0);
    }

    @Override
    public double proportion() {
        return 1.9;
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        NumberAxis across = new NumberAxis();
        across.setRange(0, LineCurrent.HIGHEST_ORDER + 1);
        across.setTickUnit(Plot.ticks(width / style.zoom() > 320 ? 5 : 10, Numerals::plain));
        NumberAxis up = new NumberAxis();
        up.setRange(Math.log10(LEAST_AMPS), Math.log10(HEADROOM * most()));
        up.setTickUnit(Plot.ticks(1, decade -> amps(Math.pow(10, decade))));
        Plot plot = new Plot(g, style, across, up);
        plot.placeWithin(width, height, 52);
        plot.draw();
        bars(plot, style);
        plot.axisNames("A rms", "order of the line's frequency", height);
        legend(plot, style);
    }

    private double most() {
        double limits =
                check.orders().stream().mapToDouble(Order::limitAmps).max().orElse(1);
        return Math.max(limits, largestFundamental());
    }

    private void bars(Plot plot, Style style) {
        LineCurrent current = filled().current();
        bar(plot, style, 1, current.fundamentalAmps(), largestFundamental(), Double.POSITIVE_INFINITY);
        for (Order order : check.orders()) {
            bar(plot, style, order.order(), current.ampsOf(order.order()), order.amps(), order.limitAmps());
        }
    }

    /** What lies over the limit is inked, so that it shows without colour too. */
    private static void bar(Plot plot, Style style, int order, double amps, double largest, double limit) {
        Pen pen = plot.pen();
        Palette palette = style.palette();
        if (largest > LEAST_AMPS) {
            pen.stroke(palette.load(), style.solid(0.8), between(plot, order, LEAST_AMPS, largest));
        }
        if (amps > LEAST_AMPS) {
            pen.fill(palette.load(), between(plot, order, LEAST_AMPS, amps));
        }
        if (largest > limit) {
            pen.fill(palette.ink(), between(plot, order, limit, largest));
        }
        if (limit < Double.POSITIVE_INFINITY) {
            double y = plot.y(Math.log10(limit));
            pen.line(palette.ink(), style.solid(2), plot.x(order - 0.5), y, plot.x(order + 0.5), y);
        }
    }

    private static Rectangle2D between(Plot plot, int order, double low, double high) {
        double left = plot.x(order - BAR / 2);
        double top = plot.y(Math.log10(high));
        return new Rectangle2D.Double(
                left, top, plot.x(order + BAR / 2) - left, plot.y(Math.log10(Math.max(low, LEAST_AMPS))) - top);
    }

    /** In the corner over the high orders, which limits and currents leave free. */
    private void legend(Plot plot, Style style) {
        List<String> texts = new ArrayList<>(List.of(
                (standing.isPresent() ? "as it stands" : "at the worst setting") + at(filled().position()),
                "largest of any setting",
                "class A limit (guidance)"));
        if (check.binding().used() > 1) {
            texts.add("over the limit");
        }
        double line = 1.5 * style.small().getSize2D();
        double swatch = 16 * style.zoom();
        double wide = texts.stream()
                .mapToDouble(text -> Lettering.width(text, style.small()))
                .max()
                .orElse(0);
        double x = plot.area().getMaxX() - wide - swatch - 3 * style.gap();
        double y = plot.area().getMinY() + line;
        for (int i = 0; i < texts.size(); i++) {
            swatch(plot.pen(), style, i, new Rectangle2D.Double(x, y - 0.62 * line, swatch, 0.6 * line));
            plot.pen().left(texts.get(i), style.small(), style.palette().ink(), x + swatch + style.gap(), y);
            y += line;
        }
        binding(plot, style, y);
    }

    private void binding(Plot plot, Style style, double y) {
        Order binding = check.binding();
        String first = binding.used() == 0
                ? "no current flows"
                : "order " + binding.order() + " binds first: " + Numerals.significant(100 * binding.used(), DIGITS)
                        + " % of its limit";
        // On a narrow figure it would lie over the bars; the sentence says it too.
        if (Lettering.width(first, style.smallBold())
                < MOST_LEGEND * plot.area().getWidth()) {
            double right = plot.area().getMaxX() - 2 * style.gap();
            plot.pen().right(first, style.smallBold(), style.palette().ink(), right, y);
        }
    }

    private static void swatch(Pen pen, Style style, int which, Rectangle2D place) {
        Palette palette = style.palette();
        switch (which) {
            case 0 -> pen.fill(palette.load(), place);
            case 1 -> pen.stroke(palette.load(), style.solid(0.8), place);
            case 2 ->
                pen.line(
                        palette.ink(),
                        style.solid(2),
                        place.getMinX(),
                        place.getCenterY(),
                        place.getMaxX(),
                        place.getCenterY());
            default -> pen.fill(palette.ink(), place);
        }
    }
}
