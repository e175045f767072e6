package clipramp.figures;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.TriggerDemand;
import clipramp.firing.Waveforms;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.ValueAxis;

/**
 * The gate's plane of current and voltage on two logarithmic scales: what a device may need, what none may exceed, and the
 * path of this drive's pulse. A power is a straight line here.
 *
 * @param design the design, for the device's limits and the coldest junction
 * @param gateAmps gate current along the pulse, A
 * @param gateVolts gate-cathode voltage at the same instants, V
 */
public record GateFigure(Design design, double[] gateAmps, double[] gateVolts) implements Figure {
    private static final double LEAST_VOLTS = 0.05;

    public GateFigure {
        if (gateAmps.length != gateVolts.length) {
            throw new IllegalArgumentException("a path needs as many voltages as currents");
        }
    }

    /**
     * The path of one pulse.
     *
     * @param waves sampled half cycle
     * @param fromSeconds when the pulse begins, s on the waveforms' clock
     * @param toSeconds when it ends, s
     */
    public static GateFigure ofPulse(Design design, Waveforms waves, double fromSeconds, double toSeconds) {
        int[] within = IntStream.range(0, waves.seconds().length)
                .filter(i -> waves.seconds()[i] >= fromSeconds && waves.seconds()[i] <= toSeconds)
                .toArray();
        return new GateFigure(
                design,
                IntStream.of(within).mapToDouble(i -> waves.gateAmps()[i]).toArray(),
                IntStream.of(within).mapToDouble(i -> waves.gateVolts()[i]).toArray());
    }

    private ThyristorDevice device() {
        return design.thyristor().device();
    }

    private double coldest() {
        return design.surroundings().coldestCelsius();
    }

    /** What the least willing device of the coldest junction asks; the worse quadrant of a triac. */
    private TriggerDemand demand() {
        GateDrive.Polarity polarity = design.gate().polarity();
        return ThyristorDevice.quadrantsOf(polarity).stream()
                .filter(device().gate().quadrants()::containsKey)
                .map(quadrant -> device().gate().quadrants().get(quadrant))
                .max(Comparator.comparingDouble(one -> one.ampsAt(coldest())))
                .orElse(device().gate().trigger());
    }

    /** Index of the largest current on the path; -1 with no current at all. */
    private int peak() {
        int peak = -1;
        for (int i = 0; i < gateAmps.length; i++) {
            if (gateAmps[i] > 0 && (peak < 0 || gateAmps[i] > gateAmps[peak])) {
                peak = i;
            }
        }
        return peak;
    }

    @Override
    public String title() {
        return "Gate voltage against gate current";
    }

    @Override
    public String sentence() {
        int peak = peak();
        String path = peak < 0
                ? "No gate current flows"
                : "The pulse reaches " + amps(gateAmps[peak]) + " at " + volts(gateVolts[peak]);
        return path + "; the least willing device at " + QuantityText.format(coldest(), Unit.CELSIUS) + " asks for "
                + amps(demand().ampsAt(coldest())) + " at " + volts(demand().voltsAt(coldest())) + ".";
    }

    private static String amps(double value) {
        return QuantityText.format(value, Unit.AMPERE, 3);
    }

    private static String volts(double value) {
        return QuantityText.number(value, 3) + " V";
    }

    private static String watts(double value) {
        return QuantityText.number(value, 3) + " W";
    }

    @Override
    public NumberTable numbers() {
        GateLimits limits = device().gate().limits();
        List<List<String>> rows = new ArrayList<>();
        int peak = peak();
        rows.add(List.of(
                "pulse, peak current",
                peak < 0 ? Numerals.NOTHING : amps(gateAmps[peak]),
                peak < 0 ? Numerals.NOTHING : volts(gateVolts[peak])));
        rows.add(List.of(
                "I_GT and V_GT, coldest", amps(demand().ampsAt(coldest())), volts(demand().voltsAt(coldest()))));
        rows.add(List.of(
                "overdrive × I_GT",
                amps(design.gate().overdrive() * demand().ampsAt(coldest())),
                volts(demand().voltsAt(coldest()))));
        device().gate().nonTrigger().ifPresent(v -> rows.add(List.of("V_GD", Numerals.NOTHING, volts(v.volts()))));
        limits.amps().ifPresent(a -> rows.add(List.of("I_GM", amps(a), Numerals.NOTHING)));
        limits.volts().ifPresent(v -> rows.add(List.of("V_GM", Numerals.NOTHING, volts(v))));
        limits.peakWatts().ifPresent(w -> rows.add(List.of("P_GM", watts(w), Numerals.NOTHING)));
        limits.meanWatts().ifPresent(w -> rows.add(List.of("P_G(AV)", watts(w), Numerals.NOTHING)));
        return new NumberTable(List.of("what", "current or power", "voltage"), rows);
    }

    @Override
    public double proportion() {
        return 1.5;
    }

    private static LogAxis axis(double from, double to, DoubleFunction<String> text) {
        LogAxis axis = new LogAxis();
        axis.setRange(from, to);
        axis.setNumberFormatOverride(Plot.format(text));
        axis.setTickUnit(Plot.ticks(1, text));
        axis.setMinorTickMarksVisible(true);
        axis.setMinorTickCount(9);
        return axis;
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        GateLimits limits = device().gate().limits();
        double askedAmps = demand().ampsAt(coldest());
        int peak = peak();
        double mostAmps = Math.max(
                limits.amps().orElse(0),
                Math.max(4 * askedAmps * design.gate().overdrive(), peak < 0 ? 0 : 2 * gateAmps[peak]));
        double mostVolts = Math.max(
                limits.volts().orElse(0),
                Math.max(3 * demand().voltsAt(coldest()), peak < 0 ? 0 : 2 * gateVolts[peak]));
        double leastAmps = askedAmps / 30;
        Plot plot = new Plot(
                g,
                style,
                axis(leastAmps, 3 * mostAmps, GateFigure::amps),
                axis(LEAST_VOLTS, 3.5 * mostVolts, GateFigure::volts));
        path(plot, style, leastAmps);
        plot.pen().fill(style.palette().ground(), new Rectangle2D.Double(0, 0, width, height));
        double left = 56 * style.zoom();
        double top = 28 * style.zoom();
        plot.place(new Rectangle2D.Double(
                left,
                top,
                Math.max(1, width - left - 20 * style.zoom()),
                Math.max(1, height - top - 44 * style.zoom())));
        box(plot, style);
        plot.draw();
        plot.axisNames("gate-cathode voltage", "gate current", height);
        Limits lines = new Limits(plot, style);
        lines.rule();
        lines.letter();
    }

    private void path(Plot plot, Style style, double leastAmps) {
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < gateAmps.length; i++) {
            if (gateAmps[i] >= leastAmps && gateVolts[i] >= LEAST_VOLTS) {
                order.add(i);
            }
        }
        // The junction's law is single-valued: in the order of the current the path does not run to and fro.
        order.sort(Comparator.comparingDouble(i -> gateAmps[i]));
        double[] x = order.stream().mapToDouble(i -> gateAmps[i]).toArray();
        double[] y = order.stream().mapToDouble(i -> gateVolts[i]).toArray();
        plot.curve(x, y, style.palette().pulse(), style.solid(2.2), Plot.noMarker());
        int peak = peak();
        if (peak >= 0) {
            double r = 3.4 * style.zoom();
            plot.curve(
                    new double[] {gateAmps[peak]},
                    new double[] {gateVolts[peak]},
                    style.palette().pulse(),
                    style.solid(1),
                    new Rectangle2D.Double(-r, -r, 2 * r, 2 * r));
        }
    }

    /** Below and left of I_GT and V_GT some devices do not trigger. */
    private void box(Plot plot, Style style) {
        double x = plot.x(demand().ampsAt(coldest()));
        double y = plot.y(demand().voltsAt(coldest()));
        Rectangle2D area = plot.area();
        Rectangle2D box = new Rectangle2D.Double(area.getMinX(), y, x - area.getMinX(), area.getMaxY() - y);
        plot.pen().fill(style.palette().wash(), box);
        plot.pen().stroke(style.palette().ink(), style.solid(1.2), box);
    }

    /** The device's limits with their names, each at the first place that is free. */
    private final class Limits {
        private final Plot plot;
        private final Style style;
        private final Rectangle2D area;
        private final double line;

        Limits(Plot plot, Style style) {
            this.plot = plot;
            this.style = style;
            this.area = plot.area();
            this.line = 1.3 * style.small().getSize2D();
        }

        /** All lines before any lettering, which keeps clear of them. */
        void rule() {
            GateLimits limits = device().gate().limits();
            limits.peakWatts().ifPresent(this::rulePower);
            limits.meanWatts().ifPresent(this::rulePower);
            limits.amps()
                    .ifPresent(amps ->
                            plot.limit(style.limit(), plot.x(amps), area.getMinY(), plot.x(amps), area.getMaxY()));
            limits.volts().ifPresent(this::ruleVoltage);
            device().gate().nonTrigger().ifPresent(limit -> ruleVoltage(limit.volts()));
        }

        private void ruleVoltage(double volts) {
            plot.limit(style.limit(), area.getMinX(), plot.y(volts), area.getMaxX(), plot.y(volts));
        }

        private void rulePower(double watts) {
            double[] ends = ends(watts);
            if (ends[0] < ends[1]) {
                plot.limit(
                        style.dashed(),
                        plot.x(ends[0]),
                        plot.y(watts / ends[0]),
                        plot.x(ends[1]),
                        plot.y(watts / ends[1]));
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
            Palette palette = style.palette();
            GateLimits limits = device().gate().limits();
            limits.amps().ifPresent(this::current);
            limits.volts().ifPresent(v -> voltage(v, "V_GM ", -0.3));
            device().gate().nonTrigger().ifPresent(v -> voltage(v.volts(), "V_GD ", -0.3));
            asked(palette.ink());
            int peak = peak();
            if (peak >= 0) {
                double x = plot.x(gateAmps[peak]) + 2.5 * style.gap();
                double y = plot.y(gateVolts[peak]);
                String text = amps(gateAmps[peak]) + ", " + volts(gateVolts[peak]);
                double wide = Lettering.width(text, style.smallBold()) + 5 * style.gap();
                plot.letter(
                        text,
                        style.smallBold(),
                        palette.pulse(),
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
            limits.peakWatts().ifPresent(w -> power(w, "P_GM " + watts(w) + lasting(limits.peakWattsForSeconds())));
            limits.meanWatts().ifPresent(w -> power(w, "P_G(AV) " + watts(w)));
        }

        private String lasting(OptionalDouble seconds) {
            return seconds.isPresent() ? " up to " + QuantityText.format(seconds.getAsDouble(), Unit.SECOND, 3) : "";
        }

        private void asked(Color ink) {
            double amps = demand().ampsAt(coldest());
            double volts = demand().voltsAt(coldest());
            double driven = design.gate().overdrive() * amps;
            double r = 3.6 * style.zoom();
            double x = plot.x(driven);
            double y = plot.y(volts);
            plot.pen().fill(ink, Sheet.polyline(x, y - r, x + r, y, x, y + r, x - r, y));
            String text = QuantityText.number(design.gate().overdrive(), 3) + " × I_GT";
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
            String box = "may not trigger under " + amps(amps) + ", " + volts(volts) + " at "
                    + QuantityText.format(coldest(), Unit.CELSIUS);
            double left = area.getMinX() + 1.5 * style.gap();
            plot.letter(box, style.small(), ink, left, y - line / 3, left, y + line, left, y + 2 * line);
        }

        private void current(double amps) {
            double x = plot.x(amps);
            String text = "I_GM " + amps(amps);
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
            plot.letter(name + volts(volts), style.small(), style.palette().ink(), left, y + up * line, left, y + line);
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
}
