package clipramp.figures;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.TriggerDemand;
import clipramp.firing.Waveforms;
import clipramp.gate.GatePower;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import org.jfree.chart.axis.LogAxis;

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

    /**
     * Refuses a path of unequal halves.
     *
     * @throws IllegalArgumentException where there are not as many voltages as currents
     */
    public GateFigure {
        if (gateAmps.length != gateVolts.length) {
            throw new IllegalArgumentException("a path needs as many voltages as currents");
        }
    }

    /**
     * The path of one pulse.
     *
     * @param design for the device's limits and the coldest junction
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

    ThyristorDevice device() {
        return design.thyristor().device();
    }

    double coldest() {
        return design.surroundings().coldestCelsius();
    }

    /** What the least willing device of the coldest junction asks; the worse quadrant of a triac. */
    TriggerDemand demand() {
        GateDrive.Polarity polarity = design.gate().polarity();
        return ThyristorDevice.quadrantsOf(polarity).stream()
                .filter(device().gate().quadrants()::containsKey)
                .map(quadrant -> device().gate().quadrants().get(quadrant))
                .max(Comparator.comparingDouble(one -> one.ampsAt(coldest())))
                .orElse(device().gate().trigger());
    }

    /** Index of the largest current on the path; -1 with no current at all. */
    int peak() {
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

    static String amps(double value) {
        return QuantityText.format(value, Unit.AMPERE, 3);
    }

    static String volts(double value) {
        return QuantityText.number(value, 3) + " V";
    }

    static String watts(double value) {
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
        limits.peakWatts().ifPresent(w -> {
            rows.add(List.of("P_GM", watts(w), Numerals.NOTHING));
            rows.add(typicalAt(w));
        });
        limits.meanWatts().ifPresent(w -> rows.add(List.of("P_G(AV)", watts(w), Numerals.NOTHING)));
        return new NumberTable(List.of("what", "current or power", "voltage"), rows);
    }

    /** Where the typical gate itself takes a power: what a series resistor would have to hold its current to. */
    private List<String> typicalAt(double watts) {
        double knee = device().gate().kneeVolts();
        double slope = device().gate().slopeOhms();
        double amps = GatePower.ampsAtPower(knee, slope, watts).orElseThrow();
        return List.of("P_GM in the typical gate", amps(amps), volts(knee + slope * amps));
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
        GateLines lines = new GateLines(this, plot, style);
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
}
