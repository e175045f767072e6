package clipramp.figures;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;

/** Draws {@link LanesFigure}. */
final class LanesPainter {
    private final LanesFigure figure;
    private final Lanes lanes;
    private final Graphics2D g;
    private final double width;
    private final double height;
    private final Style style;
    private final Palette palette;
    private final LanesFrame frame;
    private final Pen pen;

    LanesPainter(LanesFigure figure, Graphics2D g, double width, double height, Style style) {
        this.figure = figure;
        this.lanes = figure.lanes();
        this.g = g;
        this.width = width;
        this.height = height;
        this.style = style;
        this.palette = style.palette();
        this.frame = LanesFrame.of(figure, width, height, style);
        this.pen = new Pen(g, style);
    }

    void paint() {
        pen.fill(palette.ground(), new Rectangle2D.Double(0, 0, width, height));
        figure.band().ifPresent(this::paintBand);
        paintAngleAxis();
        // Under the traces: the pulse that fires lies exactly on this line and must not vanish behind it.
        lanes.firingRad().ifPresent(this::paintFiring);
        for (Lane lane : Lane.values()) {
            paintLane(lane);
        }
        figure.crosshairRad().ifPresent(this::paintCrosshair);
        for (Lane lane : Lane.values()) {
            paintHead(lane);
        }
        paintFiringLabel();
    }

    private void paintBand(LanesFigure.Band band) {
        double from = frame.xOf(Math.max(figure.fromRad(), band.fromRad()));
        double to = frame.xOf(Math.min(figure.toRad(), band.toRad()));
        if (to > from) {
            Rectangle2D area = new Rectangle2D.Double(from, frame.top(), to - from, frame.bottom() - frame.top());
            pen.fill(palette.wash(), area);
            pen.line(palette.axis(), style.dotted(), from, frame.top(), from, frame.bottom());
            pen.line(palette.axis(), style.dotted(), to, frame.top(), to, frame.bottom());
        }
    }

    private void paintAngleAxis() {
        double from = Math.toDegrees(figure.fromRad());
        double to = Math.toDegrees(figure.toRad());
        int most = (int) Math.max(1, (frame.right() - frame.left()) / (44 * style.zoom()));
        double step = Ticks.angleStep(to - from, most);
        int decimals = (int) Math.max(0, Math.ceil(-Math.log10(step) - 1e-9));
        double baseline = frame.bottom() + 4 * style.gap();
        for (double degrees : Ticks.between(from, to, step)) {
            double x = frame.xOf(Math.toRadians(degrees));
            for (Lane lane : Lane.values()) {
                Rectangle2D plot = frame.plot(lane);
                pen.line(palette.hairline(), style.hairline(), x, plot.getMinY(), x, plot.getMaxY());
            }
            pen.line(palette.axis(), style.hairline(), x, frame.bottom(), x, frame.bottom() + style.gap());
            pen.centred(Numerals.fixed(degrees, decimals) + "°", style.small(), palette.quiet(), x, baseline);
        }
        pen.right("angle of the line", style.small(), palette.quiet(), frame.right(), baseline + 3.5 * style.gap());
    }

    private void paintMarks(Scale scale) {
        for (double mark : scale.marks()) {
            double y = scale.y(mark);
            pen.line(palette.hairline(), style.hairline(), frame.left(), y, frame.right(), y);
            pen.right(
                    Numerals.plain(mark),
                    style.small(),
                    palette.quiet(),
                    frame.left() - 1.5 * style.gap(),
                    y + 0.36 * style.small().getSize2D());
        }
    }

    private void paintLane(Lane lane) {
        Rectangle2D plot = frame.plot(lane);
        Scale scale = scale(lane, plot);
        paintMarks(scale);
        pen.line(palette.axis(), style.hairline(), frame.left(), scale.y(0), frame.right(), scale.y(0));
        Shape before = g.getClip();
        if (isCloser()) {
            g.clip(new Rectangle2D.Double(
                    plot.getX(), plot.getY() - style.gap(), plot.getWidth(), plot.getHeight() + 2 * style.gap()));
        }
        if (lane == Lane.LOAD) {
            fillUnder(lane, scale);
        }
        if (lane == Lane.RAMP) {
            trace(lanes.waves().angleRad(), lanes.waves().peakPointVolts(), scale, style.dashed(), palette.ramp());
        }
        trace(lanes.angles(lane), scaled(lane), scale, style.trace(), colour(lane));
        if (lane == Lane.PULSE) {
            markPulse(scale);
        }
        if (isCloser()) {
            g.setClip(before);
        }
    }

    /** Whether samples lie outside what is shown. A clip is dear on a screen: the whole half cycle needs none. */
    private boolean isCloser() {
        return figure.fromRad() > 0 || figure.toRad() < lanes.spanRad();
    }

    private void markPulse(Scale scale) {
        lanes.firingPulse().ifPresent(peak -> {
            double r = 2.6 * style.zoom();
            double x = frame.xOf(peak.angleRad());
            double y = scale.y(peak.amps() * Lane.PULSE.toUnit());
            pen.fill(palette.pulse(), new Rectangle2D.Double(x - r, y - r, 2 * r, 2 * r));
        });
    }

    private double[] scaled(Lane lane) {
        double toUnit = lane.toUnit();
        return toUnit == 1
                ? lanes.values(lane)
                : Arrays.stream(lanes.values(lane)).map(v -> v * toUnit).toArray();
    }

    private void trace(double[] x, double[] y, Scale scale, Stroke stroke, Color colour) {
        pen.stroke(colour, stroke, Trace.of(x, y, frame::xOf, scale::y, figure.fromRad(), figure.toRad()));
    }

    /** What the load gets, as an area: readable without colour. */
    private void fillUnder(Lane lane, Scale scale) {
        double[] x = lanes.angles(lane);
        Path2D area = Trace.of(x, lanes.values(lane), frame::xOf, scale::y, x[0], x[x.length - 1]);
        area.lineTo(frame.xOf(x[x.length - 1]), scale.y(0));
        area.lineTo(frame.xOf(x[0]), scale.y(0));
        area.closePath();
        pen.fill(Palette.mixed(palette.ground(), palette.load(), 0.18), area);
    }

    private Color colour(Lane lane) {
        return switch (lane) {
            case LINE -> palette.line();
            case SUPPLY -> palette.supply();
            case RAMP -> palette.ramp();
            case PULSE -> palette.pulse();
            case LOAD -> palette.load();
        };
    }

    private void paintFiring(double firingRad) {
        if (firingRad >= figure.fromRad() && firingRad <= figure.toRad()) {
            double x = frame.xOf(firingRad);
            pen.stroke(
                    palette.ink(),
                    style.heavy(),
                    new Line2D.Double(x, frame.top() - 5 * style.gap(), x, frame.bottom() + style.gap()));
        }
    }

    private void paintCrosshair(double angleRad) {
        double x = frame.xOf(angleRad);
        pen.line(palette.axis(), style.solid(0.8), x, frame.top() - 4 * style.gap(), x, frame.bottom());
    }

    private void paintHead(Lane lane) {
        Font bold = style.smallBold();
        double baseline = frame.laneTops()[lane.ordinal()] - 1.6 * style.gap();
        double x = frame.left();
        x = pen.backed(lane.title(), bold, colour(lane), x, baseline);
        x = pen.backed("  " + lane.unit(), style.small(), palette.quiet(), x, baseline);
        if (lane == Lane.RAMP) {
            x += 4 * style.gap();
            double y = baseline - 0.3 * bold.getSize2D();
            pen.fill(
                    palette.ground(),
                    new Rectangle2D.Double(x, y - 6 * style.zoom(), 26 * style.zoom(), 12 * style.zoom()));
            pen.line(palette.ramp(), style.dashed(), x, y, x + 26 * style.zoom(), y);
            x = pen.backed(" peak point", style.small(), palette.ramp(), x + 26 * style.zoom(), baseline);
        }
        if (lane == Lane.PULSE && scaleMax(lane) <= 0) {
            x = pen.backed("   no gate current", style.small(), palette.quiet(), x, baseline);
        }
        figure.crosshairRad().ifPresent(rad -> paintReading(lane, rad, baseline));
    }

    private void paintReading(Lane lane, double angleRad, double baseline) {
        String value = Numerals.significant(lanes.valueAt(lane, angleRad) * lane.toUnit(), 3) + " " + lane.unit();
        String text = lane == Lane.RAMP
                ? value + " of " + Numerals.significant(lanes.peakPointAt(angleRad), 3) + " V"
                : value;
        double x = frame.right() - Lettering.width(text, style.smallBold());
        pen.backed(text, style.smallBold(), colour(lane), x, baseline);
        if (lane == Lane.LINE) {
            String at = instant("", angleRad);
            pen.right(at, style.smallBold(), palette.ink(), frame.right(), baseline - 4.5 * style.gap());
        }
    }

    private String instant(String word, double angleRad) {
        double milliseconds = angleRad / (2 * Math.PI * lanes.hertz()) * 1000;
        return word + Numerals.fixed(Math.toDegrees(angleRad), 1) + "°, " + Numerals.fixed(milliseconds, 3) + " ms";
    }

    private void paintFiringLabel() {
        OptionalDouble firing = lanes.firingRad();
        double baseline = frame.top() - 6.1 * style.gap();
        if (firing.isEmpty()) {
            pen.left("no pulse turns the thyristor on", style.textBold(), palette.ink(), frame.left(), baseline);
            return;
        }
        double rad = firing.getAsDouble();
        if (rad < figure.fromRad() || rad > figure.toRad()) {
            return;
        }
        String text = instant("α = ", rad);
        double half = Lettering.width(text, style.textBold()) / 2;
        double room = figure.crosshairRad().isPresent() ? 110 * style.zoom() : 0;
        double x = Math.min(Math.max(frame.xOf(rad), frame.left() + half), frame.right() - half - room);
        pen.centred(text, style.textBold(), palette.ink(), x, baseline);
    }

    private double scaleMax(Lane lane) {
        return Arrays.stream(lanes.values(lane)).max().orElse(0);
    }

    private Scale scale(Lane lane, Rectangle2D plot) {
        double low = Math.min(0, Arrays.stream(lanes.values(lane)).min().orElse(0));
        double high = Math.max(0, scaleMax(lane));
        if (lane == Lane.RAMP) {
            high = Math.max(
                    high, Arrays.stream(lanes.waves().peakPointVolts()).max().orElse(0));
        }
        if (lane == Lane.LOAD) {
            // The line's own scale, so that what is missing of it can be seen.
            low = Math.min(
                    low,
                    Math.min(0, Arrays.stream(lanes.waves().lineVolts()).min().orElse(0)));
            high = Math.max(high, scaleMax(Lane.LINE));
        }
        low *= lane.toUnit();
        high = high <= low ? 1 : high * lane.toUnit();
        return new Scale(low, high, plot, (int) Math.max(1, Math.min(4, plot.getHeight() / (18 * style.zoom()))));
    }

    /** A lane's ordinate. */
    private record Scale(double low, double high, Rectangle2D plot, int most) {
        /** Steps that no ordinate needs; what is no number would look for its marks for ever. */
        private static final int MOST_STEPS = 100;

        double y(double value) {
            return plot.getMaxY() - (value - low) / (high - low) * plot.getHeight();
        }

        /** As many as there is room for, but never the zero alone. */
        List<Double> marks() {
            int steps = most;
            List<Double> marks = Ticks.between(low, high, Ticks.step(high - low, steps));
            while (marks.size() < 2 && steps < MOST_STEPS) {
                steps++;
                marks = Ticks.between(low, high, Ticks.step(high - low, steps));
            }
            return marks;
        }
    }
}
