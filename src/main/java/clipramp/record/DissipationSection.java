package clipramp.record;

import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.ThyristorDevice;
import clipramp.faults.Burden;
import clipramp.faults.Ratings;
import clipramp.power.LoadResult;
import clipramp.power.OperatingPoint;
import clipramp.power.Thermal;
import clipramp.units.Unit;
import java.util.Comparator;
import java.util.Map;
import java.util.OptionalDouble;

/** What the parts bear at mid-knob, and the thyristor at the highest setting, beside their ratings. */
final class DissipationSection {
    private static final double MID_KNOB = 0.5;

    private final Paper paper;
    private final RecordContent content;
    private final Design design;
    private final Map<String, String> names;
    private final Grid grid;

    DissipationSection(Paper paper, RecordContent content) {
        this.paper = paper;
        this.content = content;
        this.design = content.check().design();
        this.names = Designators.of(design);
        this.grid = new Grid(paper.faces(), new float[] {0.9f, 3, 1.5f, 1.5f, 1.3f}, 2, 3, 4);
    }

    void write() {
        paper.section("Dissipation and ratings");
        paper.text("Nominal line and parts, ramp resistor at mid-knob; the margins judge the same ratings at the worst"
                + " condition, resistors at no more than " + Shown.quantity(design.resistorDerating(), Unit.FRACTION)
                + " of theirs.");
        grid.heads("name", "bears", "computed", "rating", "share");
        OptionalDouble middle = design.ramp().pot().isPresent() ? OptionalDouble.of(MID_KNOB) : OptionalDouble.empty();
        Ratings.ofFiringCircuit(
                        design,
                        content.check().condition(),
                        content.check().dissipation(),
                        1,
                        middle,
                        design.ramp().rampOhms(MID_KNOB))
                .forEach(burden -> row(burden, ""));
        content.check().knob().stream()
                .max(Comparator.comparingDouble(point -> point.load().thyristorWatts()))
                .ifPresent(this::thyristor);
        paper.add(grid.table());
    }

    private void thyristor(OperatingPoint point) {
        LoadResult load = point.load();
        ThyristorDevice.Limits limits = design.thyristor().device().limits();
        String at = point.position().isPresent() ? " at knob " + Shown.quantity(point.position(), Unit.FRACTION) : "";
        Ratings.ofThyristor(design, load).forEach(burden -> row(burden, at));
        row("thyristor.device", "on-state loss" + at, load.thyristorWatts(), OptionalDouble.empty(), Unit.WATT);
        double hottest = design.surroundings().hottestCelsius();
        OptionalDouble junction = Thermal.junctionCelsius(design.thyristor(), load.thyristorWatts(), hottest);
        row(
                "thyristor.device",
                "junction at " + Shown.quantity(hottest, Unit.CELSIUS) + " ambient" + at,
                junction.orElse(Double.NaN),
                limits.junctionCelsius(),
                Unit.CELSIUS);
    }

    private void row(Burden burden, String at) {
        OptionalDouble rating =
                Double.isNaN(burden.rating()) ? OptionalDouble.empty() : OptionalDouble.of(burden.rating());
        row(burden.part(), burden.what() + at, burden.borne(), rating, burden.unit());
    }

    private void row(String key, String what, double bears, OptionalDouble rating, Unit unit) {
        boolean comparable = rating.isPresent() && !Double.isNaN(bears) && unit != Unit.CELSIUS;
        grid.row(
                names.getOrDefault(key, key),
                what,
                Shown.quantity(bears, unit),
                rating.isPresent() ? Shown.quantity(rating, unit) : "not stated",
                comparable ? Shown.share(bears / rating.getAsDouble()) : Shown.NOTHING);
    }
}
