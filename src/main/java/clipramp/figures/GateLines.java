package clipramp.figures;

import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.util.OptionalDouble;
import org.jfree.chart.axis.ValueAxis;

/** The device's limits on the plane of a gate figure with their names, each at the first place that is free. */
final class GateLines {
    private final GateFigure figure;
    private final Plot plot;
    private final Style style;
    private final Rectangle2D area;
    private final double line;

    GateLines(GateFigure figure, Plot plot, Style style) {
        this.figure = figure;
        this.plot = plot;
        this.style = style;
        this.area = plot.area();
        this.line = 1.3 * style.small().getSize2D();
    }

    /** All lines before any lettering, which keeps clear of them. */
    void rule() {
        GateLimits limits = figure.device().gate().limits();
        limits.peakWatts().ifPresent(this::rulePower);
        limits.meanWatts().ifPresent(this::rulePower);
        limits.amps()
                .ifPresent(
                        amps -> plot.limit(style.limit(), plot.x(amps), area.getMinY(), plot.x(amps), area.getMaxY()));
        limits.volts().ifPresent(this::ruleVoltage);
        figure.device().gate().nonTrigger().ifPresent(limit -> ruleVoltage(limit.volts()));
    }

    private void ruleVoltage(double volts) {
        plot.limit(style.limit(), area.getMinX(), plot.y(volts), area.getMaxX(), plot.y(volts));
    }

    private void rulePower(double watts) {
        double[] ends = ends(watts);
        if (ends[0] < ends[1]) {
            plot.limit(
                    style.dashed(), plot.x(ends[0]), plot.y(watts / ends[0]), plot.x(ends[1]), plot.y(watts / ends[1]));
        }
    }

    /** Least and greatest current at which a power lies on the plot. */
    private double[] ends(double watts) {
        ValueAxis across = plot.plot().getDomainAxis();
        ValueAxis up = plot.plot().getRangeAxis();
        return new double[] {
            Math.max(across.getLowerBound(), watts / up.getUpperBound()),
            Math.min(across.getUpperBound(), watts / up.getLowerBound())
        };
    }

    void letter() {
        GateLimits limits = figure.device().gate().limits();
        limits.amps().ifPresent(this::current);
        limits.volts().ifPresent(v -> voltage(v, "V_GM ", -0.3));
        figure.device().gate().nonTrigger().ifPresent(v -> voltage(v.volts(), "V_GD ", -0.3));
        asked(style.palette().ink());
        int peak = figure.peak();
        if (peak >= 0) {
            reached(figure.gateAmps()[peak], figure.gateVolts()[peak]);
        }
        limits.peakWatts()
                .ifPresent(w -> power(w, "P_GM " + GateFigure.watts(w) + lasting(limits.peakWattsForSeconds())));
        limits.meanWatts().ifPresent(w -> power(w, "P_G(AV) " + GateFigure.watts(w)));
    }

    /** How far the pulse goes. */
    private void reached(double amps, double volts) {
        double x = plot.x(amps) + 2.5 * style.gap();
        double y = plot.y(volts);
        String text = GateFigure.amps(amps) + ", " + GateFigure.volts(volts);
        double wide = Lettering.width(text, style.smallBold()) + 5 * style.gap();
        plot.letter(
                text,
                style.smallBold(),
                style.palette().pulse(),
                x,
                y + line,
                x,
                y - line / 2,
                x - wide,
                y - line / 2,
                x - wide,
                y - 2 * line,
                x,
                y + 2 * line);
    }

    private String lasting(OptionalDouble seconds) {
        return seconds.isPresent() ? " up to " + QuantityText.format(seconds.getAsDouble(), Unit.SECOND, 3) : "";
    }

    private void asked(Color ink) {
        double amps = figure.demand().ampsAt(figure.coldest());
        double volts = figure.demand().voltsAt(figure.coldest());
        double driven = figure.design().gate().overdrive() * amps;
        double r = 3.6 * style.zoom();
        double x = plot.x(driven);
        double y = plot.y(volts);
        plot.pen().fill(ink, Sheet.polyline(x, y - r, x + r, y, x, y + r, x - r, y));
        String text = QuantityText.number(figure.design().gate().overdrive(), 3) + " × I_GT";
        plot.letter(
                text,
                style.small(),
                ink,
                x + 2 * style.gap(),
                y + line,
                x + 2 * style.gap(),
                y - line / 2,
                x + 2 * style.gap(),
                y + 2 * line);
        String box = "may not trigger under " + GateFigure.amps(amps) + ", " + GateFigure.volts(volts) + " at "
                + QuantityText.format(figure.coldest(), Unit.CELSIUS);
        double left = area.getMinX() + 1.5 * style.gap();
        plot.letter(box, style.small(), ink, left, y - line / 3, left, y + line, left, y + 2 * line);
    }

    private void current(double amps) {
        double x = plot.x(amps);
        String text = "I_GM " + GateFigure.amps(amps);
        double left = x - Lettering.width(text, style.small()) - style.gap();
        plot.letter(
                text,
                style.small(),
                style.palette().ink(),
                left,
                area.getMaxY() - line,
                left,
                area.getMaxY() - 3 * line,
                left,
                area.getMinY() + line);
    }

    private void voltage(double volts, String name, double up) {
        double y = plot.y(volts);
        double left = area.getMinX() + 1.5 * style.gap();
        plot.letter(
                name + GateFigure.volts(volts),
                style.small(),
                style.palette().ink(),
                left,
                y + up * line,
                left,
                y + line);
    }

    private void power(double watts, String text) {
        double from = ends(watts)[0];
        double to = ends(watts)[1];
        if (from >= to) {
            return;
        }
        double wide = Lettering.width(text, style.small());
        int steps = 17;
        double[] places = new double[4 * steps];
        for (int i = 0; i < steps; i++) {
            double amps = from * Math.pow(to / from, 0.06 + 0.88 * i / (steps - 1.0));
            places[4 * i] = plot.x(amps) + 2 * style.gap();
            places[4 * i + 1] = plot.y(watts / amps);
            places[4 * i + 2] = plot.x(amps) - wide - 2 * style.gap();
            places[4 * i + 3] = plot.y(watts / amps) + line / 2;
        }
        plot.letter(text, style.small(), style.palette().ink(), places);
    }
}
