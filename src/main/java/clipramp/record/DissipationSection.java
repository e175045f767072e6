package clipramp.record;

import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.Part;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.firing.Dissipation;
import clipramp.power.LoadResult;
import clipramp.power.OperatingPoint;
import clipramp.power.Thermal;
import clipramp.units.Unit;
import java.util.Comparator;
import java.util.Map;
import java.util.OptionalDouble;

/** What the parts bear at mid-knob, and the thyristor at the highest setting, beside their ratings. */
final class DissipationSection {
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
        firingCircuit(content.check().dissipation());
        content.check().knob().stream()
                .max(Comparator.comparingDouble(point -> point.load().thyristorWatts()))
                .ifPresent(this::thyristor);
        paper.add(grid.table());
    }

    private void firingCircuit(Dissipation bears) {
        Part dropper = design.clip().dropper();
        row("clip.dropper", "mean power", bears.dropperWatts(), dropper.ratedWatts(), Unit.WATT);
        row("clip.dropper", "peak voltage", bears.dropperPeakVolts(), dropper.ratedVolts(), Unit.VOLT);
        row(
                "clip.zener",
                "mean power",
                bears.zenerWatts(),
                design.clip().zener().ratedWatts(),
                Unit.WATT);
        row(
                "ramp.capacitor",
                "peak voltage",
                bears.capacitorVolts(),
                design.ramp().capacitor().ratedVolts(),
                Unit.VOLT);
        row(
                "ramp.fixed",
                "mean power of the whole R_E",
                bears.rampWatts(),
                design.ramp().fixed().ratedWatts(),
                Unit.WATT);
        trigger(bears);
        row(
                "trigger.base-one",
                "mean power",
                bears.baseOneWatts(),
                design.trigger().baseOne().ratedWatts(),
                Unit.WATT);
        row(
                "gate.series",
                "mean power",
                bears.gateSeriesWatts(),
                design.gate().series().ratedWatts(),
                Unit.WATT);
        design.gate()
                .shunt()
                .ifPresent(shunt ->
                        row("gate.shunt", "mean power", bears.gateShuntWatts(), shunt.ratedWatts(), Unit.WATT));
    }

    private void trigger(Dissipation bears) {
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger) {
            Unijunction.Limits limits = trigger.device().limits();
            row("trigger.device", "mean power, rating at 25 °C", bears.deviceWatts(), limits.watts(), Unit.WATT);
            row("trigger.device", "emitter current, rms", bears.emitterRmsAmps(), limits.emitterRmsAmps(), Unit.AMPERE);
            row(
                    "trigger.device",
                    "emitter current, peak",
                    bears.emitterPeakAmps(),
                    limits.emitterPeakAmps(),
                    Unit.AMPERE);
            row(
                    "trigger.device",
                    "emitter reverse voltage",
                    bears.emitterReverseVolts(),
                    limits.emitterReverseVolts(),
                    Unit.VOLT);
            row("trigger.device", "interbase voltage", bears.interbaseVolts(), limits.interbaseVolts(), Unit.VOLT);
            row(
                    "trigger.base-two",
                    "mean power",
                    bears.baseTwoWatts(),
                    trigger.baseTwo().ratedWatts(),
                    Unit.WATT);
        } else if (design.trigger() instanceof Trigger.ProgrammableTrigger trigger) {
            var limits = trigger.device().limits();
            row("trigger.device", "mean power, rating at 25 °C", bears.deviceWatts(), limits.watts(), Unit.WATT);
            row("trigger.device", "anode current, peak", bears.emitterPeakAmps(), limits.peakAmps(), Unit.AMPERE);
            row(
                    "trigger.upper",
                    "mean power",
                    bears.baseTwoWatts(),
                    trigger.upper().ratedWatts(),
                    Unit.WATT);
            row(
                    "trigger.lower",
                    "mean power",
                    bears.lowerWatts(),
                    trigger.lower().ratedWatts(),
                    Unit.WATT);
        }
    }

    private void thyristor(OperatingPoint point) {
        LoadResult load = point.load();
        ThyristorDevice.Limits limits = design.thyristor().device().limits();
        String at = point.position().isPresent() ? " at knob " + Shown.quantity(point.position(), Unit.FRACTION) : "";
        row("thyristor.device", "mean current" + at, load.thyristorMeanAmps(), limits.meanAmps(), Unit.AMPERE);
        row("thyristor.device", "rms current" + at, load.thyristorRmsAmps(), limits.rmsAmps(), Unit.AMPERE);
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
