package clipramp.figures;

import clipramp.circuit.Wanted.Goal;
import clipramp.power.OperatingPoint;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;

/**
 * What is wanted at one end of the knob: a bar that the curve must stay under or over, with an arrow to the side that is
 * good.
 *
 * @param goal what is wanted, and where
 * @param value the bound that counts at this end, in the goal's measure
 * @param lowest whether the curve must stay under it
 * @param points the curve, for goals in another measure than power
 */
record GoalMark(Goal goal, double value, boolean lowest, List<OperatingPoint> points) {
    /** Half the bar's length, in units of a screen at 100 %. */
    private static final double REACH = 14;

    private static final double ARROW = 9;
    private static final double ARROW_HEAD = 3.2;

    static GoalMark lowest(Goal goal, List<OperatingPoint> points) {
        return new GoalMark(goal, goal.to(), true, points);
    }

    static GoalMark highest(Goal goal, List<OperatingPoint> points) {
        return new GoalMark(goal, goal.from(), false, points);
    }

    void draw(Plot plot, Style style) {
        fraction().ifPresent(fraction -> bar(plot, style, plot.y(100 * fraction)));
        letter(plot, style);
    }

    private void bar(Plot plot, Style style, double y) {
        Rectangle2D area = plot.area();
        double x = plot.x(100 * goal.position());
        double from = Math.max(area.getMinX(), x - REACH * style.zoom());
        double to = Math.min(area.getMaxX(), x + REACH * style.zoom());
        double middle = (from + to) / 2;
        double way = (lowest ? 1 : -1) * ARROW * style.zoom();
        double head = ARROW_HEAD * style.zoom();
        Palette palette = style.palette();
        plot.pen().stroke(palette.ink(), style.solid(2), new Line2D.Double(from, y, to, y));
        plot.pen().stroke(palette.ink(), style.solid(1), new Line2D.Double(middle, y, middle, y + way * 0.7));
        Path2D arrow = new Path2D.Double();
        arrow.moveTo(middle, y + way);
        arrow.lineTo(middle - head, y + way * 0.45);
        arrow.lineTo(middle + head, y + way * 0.45);
        arrow.closePath();
        plot.pen().fill(palette.ink(), arrow);
    }

    /** In a corner of the plot, where the curve leaves most room: first left above, then right below. */
    private void letter(Plot plot, Style style) {
        String text = "wanted: at " + (lowest ? "most " : "least ") + inItsMeasure() + " at knob "
                + QuantityText.format(goal.position(), Unit.FRACTION, 3);
        Rectangle2D area = plot.area();
        double wide = Lettering.width(text, style.small());
        double line = 1.5 * style.small().getSize2D();
        double left = area.getMinX() + 2 * style.gap();
        double right = area.getMaxX() - 2 * style.gap() - wide;
        double above = area.getMinY() + line;
        double below = area.getMaxY() - line / 2;
        double[] leftAbove = {left, above, left, above + line};
        double[] rightBelow = {right, below - line, right, below};
        double[] rightAbove = {right, above, right, above + line};
        double[] leftBelow = {left, below - line, left, below};
        double[] places = Stream.of(leftAbove, rightBelow, rightAbove, leftBelow)
                .flatMapToDouble(Arrays::stream)
                .toArray();
        plot.letter(text, style.small(), style.palette().ink(), places);
    }

    private String inItsMeasure() {
        Unit unit = switch (goal.measure()) {
            case FRACTION -> Unit.FRACTION;
            case WATTS -> Unit.WATT;
            case VOLTS -> Unit.VOLT;
            case ANGLE -> Unit.ANGLE;
        };
        return QuantityText.format(value, unit, 3);
    }

    /** Where a goal lies on the power scale; read off the curve where it is in another measure, empty if out of its reach. */
    private OptionalDouble fraction() {
        return switch (goal.measure()) {
            case FRACTION -> OptionalDouble.of(Math.min(1, value));
            case WATTS -> readOff(point -> point.load().watts());
            case VOLTS -> readOff(point -> point.load().rmsVolts());
            case ANGLE -> readOff(point -> point.solution().shown().firingRad().orElse(Math.PI));
        };
    }

    private OptionalDouble readOff(ToDoubleFunction<OperatingPoint> measure) {
        for (int i = 1; i < points.size(); i++) {
            double a = measure.applyAsDouble(points.get(i - 1));
            double b = measure.applyAsDouble(points.get(i));
            if (a != b && (value - a) * (value - b) <= 0) {
                double share = (value - a) / (b - a);
                double from = points.get(i - 1).load().fraction();
                return OptionalDouble.of(from + share * (points.get(i).load().fraction() - from));
            }
        }
        return OptionalDouble.empty();
    }
}
