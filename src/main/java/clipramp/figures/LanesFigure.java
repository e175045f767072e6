package clipramp.figures;

import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One half cycle as five lanes over a shared angle axis, with the firing instant as one heavy line through all of them.
 *
 * @param lanes what is shown
 * @param fromRad first angle shown, rad
 * @param toRad last angle shown, rad
 * @param crosshairRad angle whose values are lettered beside the lanes, rad, if wanted
 * @param band angles between which the firing instant falls over a spread, if wanted
 */
public record LanesFigure(Lanes lanes, double fromRad, double toRad, OptionalDouble crosshairRad, Optional<Band> band)
        implements Figure {
    /**
     * Between which angles the units of a spread fire.
     *
     * @param fromRad earliest, rad
     * @param toRad latest, rad, not below {@code fromRad}
     */
    public record Band(double fromRad, double toRad) {}

    private static final double TABLE_STEP_DEGREES = 15;
    /** Far shorter than anything in the circuit: to read either side of a jump. */
    private static final double INSTANT_RAD = 1e-7;

    /**
     * Refuses a view of nothing.
     *
     * @throws IllegalArgumentException where the first angle is not below the last
     */
    public LanesFigure {
        if (!(fromRad < toRad)) {
            throw new IllegalArgumentException("shown angles run from low to high, not " + fromRad + ".." + toRad);
        }
    }

    /** The whole half cycle (or period), without crosshair and band. */
    public LanesFigure(Lanes lanes) {
        this(lanes, 0, lanes.spanRad(), OptionalDouble.empty(), Optional.empty());
    }

    /** A closer look, from one angle to another, rad. */
    public LanesFigure withView(double from, double to) {
        return new LanesFigure(lanes, from, to, crosshairRad, band);
    }

    /** The same with the values at an angle, rad, lettered beside the lanes; without them where it is empty. */
    public LanesFigure withCrosshair(OptionalDouble angleRad) {
        return new LanesFigure(lanes, fromRad, toRad, angleRad, band);
    }

    /** The same with a spread's band, or without one. */
    public LanesFigure withBand(Optional<Band> wanted) {
        return new LanesFigure(lanes, fromRad, toRad, crosshairRad, wanted);
    }

    @Override
    public String title() {
        return lanes.spanRad() > Math.PI ? "One period of the line" : "One half cycle of the line";
    }

    @Override
    public String sentence() {
        double[] supply = lanes.values(Lane.SUPPLY);
        double clipped = Arrays.stream(supply).max().orElse(0);
        String fires = lanes.firingRad().isPresent()
                ? "the thyristor is turned on at "
                        + Numerals.fixed(Math.toDegrees(lanes.firingRad().getAsDouble()), 1) + "°"
                : "no pulse turns the thyristor on";
        String pulse = lanes.firingPulse()
                .map(peak -> ", and its gate pulse peaks at " + Numerals.significant(1000 * peak.amps(), 3) + " mA")
                .orElse("");
        return title() + ": the supply reaches " + Numerals.significant(clipped, 3) + " V, " + fires + pulse + ".";
    }

    @Override
    public NumberTable numbers() {
        List<List<String>> rows = new ArrayList<>();
        double firing = lanes.firingRad().orElse(Double.POSITIVE_INFINITY);
        boolean fired = false;
        for (double degrees : Ticks.between(
                0,
                Math.toDegrees(lanes.spanRad()),
                lanes.spanRad() > Math.PI ? 2 * TABLE_STEP_DEGREES : TABLE_STEP_DEGREES)) {
            double rad = Math.toRadians(degrees);
            if (!fired && rad >= firing) {
                rows.add(row(firing - INSTANT_RAD, "before firing"));
                rows.add(row(firing + INSTANT_RAD, "after firing"));
                fired = true;
            }
            rows.add(row(rad, ""));
        }
        return new NumberTable(
                List.of(
                        "angle °",
                        "line V",
                        "clipped supply V",
                        "ramp V",
                        "peak point V",
                        "gate mA",
                        "load V",
                        "instant"),
                rows);
    }

    private List<String> row(double angleRad, String instant) {
        return List.of(
                Numerals.cell(Math.toDegrees(angleRad), 1),
                Numerals.cell(lanes.valueAt(Lane.LINE, angleRad), 1),
                Numerals.cell(lanes.valueAt(Lane.SUPPLY, angleRad), 2),
                Numerals.cell(lanes.valueAt(Lane.RAMP, angleRad), 2),
                Numerals.cell(lanes.peakPointAt(angleRad), 2),
                Numerals.cell(lanes.valueAt(Lane.PULSE, angleRad) * 1000, 1),
                Numerals.cell(lanes.valueAt(Lane.LOAD, angleRad), 1),
                instant);
    }

    @Override
    public double proportion() {
        return 1.5;
    }

    /** Where the lanes lie when drawn at a size in user units. */
    public LanesFrame frame(double width, double height, Style style) {
        return LanesFrame.of(this, width, height, style);
    }

    @Override
    public void draw(Graphics2D g, double width, double height, Style style) {
        new LanesPainter(this, g, width, height, style).paint();
    }
}
