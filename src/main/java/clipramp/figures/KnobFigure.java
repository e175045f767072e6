package clipramp.figures;

import clipramp.circuit.Wanted;
import clipramp.power.OperatingPoint;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Power against the knob's rotation, with what is wanted at both ends and the travel that does nothing.
 *
 * @param points solved positions, from 0 to 1; a single one for a fixed ramp
 * @param wanted what the knob is to reach
 * @param position where the knob stands, 0..1, if it is to be marked
 * @param band lowest and highest power over a spread, if wanted
 */
public record KnobFigure(List<OperatingPoint> points, Wanted wanted, OptionalDouble position, Optional<Band> band)
        implements Figure {
    /**
     * Between which powers the units of a spread lie.
     *
     * @param positions knob positions, 0..1
     * @param lowFractions lowest share of full power at each
     * @param highFractions highest share of full power at each
     */
    public record Band(double[] positions, double[] lowFractions, double[] highFractions) {}

    private static final double SWATCH = 10;
    private static final int MOST_MARKED = 21;

    /**
     * Refuses a curve without a point.
     *
     * @throws IllegalArgumentException without a position
     */
    public KnobFigure {
        points = List.copyOf(points);
        if (points.isEmpty()) {
            throw new IllegalArgumentException("a knob curve needs at least one position");
        }
    }

    /** The bare curve, without a mark for the knob and without a band. */
    public KnobFigure(List<OperatingPoint> points, Wanted wanted) {
        this(points, wanted, OptionalDouble.empty(), Optional.empty());
    }

    /** The same with the knob at a position, 0..1; without a mark where it is empty. */
    public KnobFigure withPosition(OptionalDouble wantedPosition) {
        return new KnobFigure(points, wanted, wantedPosition, band);
    }

    /** The same with a spread's band, or without one. */
    public KnobFigure withBand(Optional<Band> wantedBand) {
        return new KnobFigure(points, wanted, position, wantedBand);
    }

    @Override
    public String title() {
        return "Power against the knob";
    }

    @Override
    public String sentence() {
        OperatingPoint first = points.get(0);
        OperatingPoint last = points.get(points.size() - 1);
        if (points.size() == 1) {
            return "The ramp is fixed: the load gets " + watts(first) + ", " + percent(first) + " of full power.";
        }
        return "Fully anticlockwise the load gets " + watts(first) + " (" + percent(first)
                + " of full power), fully clockwise " + watts(last) + " (" + percent(last) + ").";
    }

    private static String watts(OperatingPoint point) {
        return QuantityText.format(point.load().watts(), Unit.WATT, 3);
    }

    private static String percent(OperatingPoint point) {
        return Numerals.fixed(percentOfFull(point), 1) + " %";
    }

    @Override
    public NumberTable numbers() {
        return new NumberTable(
                List.of("knob %", "R_E kΩ", "firing angle °", "load V", "load W", "full power %", "state"),
                points.stream().map(KnobFigure::row).toList());
    }

    private static List<String> row(OperatingPoint point) {
        OptionalDouble firing = point.solution().shown().firingRad();
        return List.of(
                point.position().isPresent()
                        ? Numerals.cell(100 * point.position().getAsDouble(), 0)
                        : Numerals.NOTHING,
                QuantityText.number(point.rampOhms() / 1000, 4),
                firing.isPresent() ? Numerals.cell(Math.toDegrees(firing.getAsDouble()), 1) : Numerals.NOTHING,
                Numerals.cell(point.load().rmsVolts(), 1),
                Numerals.significant(point.load().watts(), 4),
                Numerals.cell(percentOfFull(point), 1),
                point.solution().state().word());
    }

    @Override
    public double proportion() {
        return 1.9;
    }

    /** Knob position 0..1 under an x of the drawn figure; empty where x lies beside the plot. */
    public OptionalDouble positionAt(double x, double width, double height, Style style) {
        Rectangle2D area = plotArea(width, height, style);
        double share = (x - area.getMinX()) / area.getWidth();
        double percent = PercentAxis.LEAST + share * (PercentAxis.MOST - PercentAxis.LEAST);
        return percent < PercentAxis.LEAST || percent > PercentAxis.MOST
                ? OptionalDouble.empty()
                : OptionalDouble.of(Math.min(1, Math.max(0, percent / 100)));
    }

    /** Where the plot lies when drawn at a size: rotation across, power up, each −2..102 %. */
    Rectangle2D plotArea(double width, double height, Style style) {
        double left = 44 * style.zoom();
        double right = Math.max(left + 1, width - 16 * style.zoom());
        double top = 28 * style.zoom();
        double bottom = Math.max(top + 1, height - 44 * style.zoom());
        return new Rectangle2D.Double(left, top, right - left, bottom - top);
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        Palette palette = style.palette();
        Plot plot = new Plot(g, style, PercentAxis.of(width, style), PercentAxis.of(height * 0.8, style));
        curve(plot, style);
        Rectangle2D area = plotArea(width, height, style);
        plot.place(area);
        Pen pen = plot.pen();
        pen.fill(palette.ground(), new Rectangle2D.Double(0, 0, width, height));
        deadTravel(plot, style);
        band.ifPresent(b -> paintBand(plot, b, style));
        plot.draw();
        plot.axisNames("share of full power, %", "knob, % of its rotation clockwise", height);
        position.ifPresent(at -> pen.stroke(
                palette.ink(),
                style.heavy(),
                new Line2D.Double(plot.x(100 * at), area.getMinY(), plot.x(100 * at), area.getMaxY())));
        wanted.lowest().ifPresent(goal -> GoalMark.lowest(goal, points).draw(plot, style));
        wanted.highest().ifPresent(goal -> GoalMark.highest(goal, points).draw(plot, style));
        if (points.size() == 1) {
            plot.letter(
                    "fixed ramp: " + watts(points.get(0)),
                    style.smallBold(),
                    palette.load(),
                    plot.x(52),
                    plot.y(percentOfFull(points.get(0))) - 8);
        }
    }

    private void curve(Plot plot, Style style) {
        double r = 2.4 * style.zoom();
        boolean marked = points.size() <= MOST_MARKED;
        plot.curve(
                points.stream()
                        .mapToDouble(point -> 100 * point.position().orElse(0.5))
                        .toArray(),
                points.stream().mapToDouble(KnobFigure::percentOfFull).toArray(),
                style.palette().load(),
                style.trace(),
                marked ? new Ellipse2D.Double(-r, -r, 2 * r, 2 * r) : Plot.noMarker());
    }

    private static double percentOfFull(OperatingPoint point) {
        return 100 * point.load().fraction();
    }

    private void deadTravel(Plot plot, Style style) {
        DeadTravel dead = DeadTravel.of(points);
        hatch(plot, style, 0, dead.low());
        hatch(plot, style, 1 - dead.high(), 1);
    }

    /** Slanted hairlines over a stretch of the knob's travel. */
    private static void hatch(Plot plot, Style style, double from, double to) {
        if (to - from < 1e-9) {
            return;
        }
        Rectangle2D area = plot.area();
        double left = plot.x(100 * from);
        double right = plot.x(100 * to);
        Pen pen = plot.pen();
        pen.fill(style.palette().wash(), new Rectangle2D.Double(left, area.getMinY(), right - left, area.getHeight()));
        double pitch = SWATCH * style.zoom();
        for (double s = left - area.getHeight(); s < right; s += pitch) {
            double x1 = Math.max(left, s);
            double x2 = Math.min(right, s + area.getHeight());
            if (x2 > x1) {
                pen.line(
                        style.palette().hairline(),
                        style.hairline(),
                        x1,
                        area.getMaxY() - (x1 - s),
                        x2,
                        area.getMaxY() - (x2 - s));
            }
        }
        String text = "dead travel " + Numerals.significant(100 * (to - from), 2) + " %";
        double middle = (left + right) / 2 - Lettering.width(text, style.small()) / 2;
        double x = Math.min(
                Math.max(middle, area.getMinX() + style.gap()),
                area.getMaxX() - style.gap() - Lettering.width(text, style.small()));
        plot.later(text, x, from == 0 ? area.getMinY() + 4 * style.gap() : area.getMaxY() - 2 * style.gap());
    }

    private static void paintBand(Plot plot, Band band, Style style) {
        int n = band.positions().length;
        Path2D area = new Path2D.Double();
        for (int i = 0; i < n; i++) {
            double x = plot.x(100 * band.positions()[i]);
            double y = plot.y(100 * band.highFractions()[i]);
            if (i == 0) {
                area.moveTo(x, y);
            } else {
                area.lineTo(x, y);
            }
        }
        for (int i = n - 1; i >= 0; i--) {
            area.lineTo(plot.x(100 * band.positions()[i]), plot.y(100 * band.lowFractions()[i]));
        }
        area.closePath();
        plot.pen().fill(Palette.mixed(style.palette().ground(), style.palette().load(), 0.18), area);
    }
}
