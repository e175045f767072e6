package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import clipramp.firing.Study;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.power.Thermal;
import clipramp.units.PreferredSeries;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** Ratings that follow from the values: watts and volts of the open parts, and the sink, at the high line. */
final class Ratings {
    /** Beyond what the margins hold from, so that a value a step away keeps its rating. */
    private static final double RESERVE = 1.05;

    private static final double CEILING_RESERVE = 1.25;

    /** Case to air of a small plastic or metal can standing free, K/W (common practice). */
    private static final double BARE_SMALL = 125;

    private static final double BARE_LARGE = 60;
    private static final double SMALL_AMPS = 1;
    private static final double LEAST_TRACK_WATTS = 0.5;

    private final SizingRequest request;
    private final List<Study> studies;
    private Design design;

    private Ratings(SizingRequest request, Design design) {
        this.request = request;
        this.design = design;
        Condition high = new Condition(
                design.line().highVolts(),
                design.line().hertz(),
                design.surroundings().hottestCelsius());
        studies = List.of(
                Firing.study(design, high, design.ramp().rampOhms(0)),
                Firing.study(design, high, design.ramp().rampOhms(1)));
    }

    /** The design with every open part's rating chosen. */
    static Design fit(SizingRequest request, Design design) {
        Ratings ratings = new Ratings(request, design);
        ratings.supply();
        ratings.bases();
        ratings.ramp();
        ratings.sink();
        return ratings.design;
    }

    private double most(ToDoubleFunction<Dissipation> figure) {
        return studies.stream()
                .mapToDouble(s -> figure.applyAsDouble(s.dissipation()))
                .max()
                .orElse(0);
    }

    private Part rated(Part part, double watts) {
        return new Part(
                part.value(),
                part.tolerance(),
                OptionalDouble.of(Stock.ratedWatts(watts * RESERVE, design.resistorDerating())),
                part.ratedVolts());
    }

    private void supply() {
        if (request.isOpen(OpenPart.DROPPER)) {
            Part part = rated(design.clip().dropper(), most(Dissipation::dropperWatts));
            double volts = Stock.resistorVolts(CEILING_RESERVE * most(Dissipation::dropperPeakVolts));
            design = Edit.dropper(
                    design, new Part(part.value(), part.tolerance(), part.ratedWatts(), OptionalDouble.of(volts)));
        }
    }

    private void bases() {
        if (request.isOpen(OpenPart.BASE_ONE)) {
            design = Edit.baseOne(design, rated(design.trigger().baseOne(), most(Dissipation::baseOneWatts)));
        }
        if (request.isOpen(OpenPart.BASE_TWO) && design.trigger() instanceof UnijunctionTrigger u) {
            design = Edit.baseTwo(design, rated(u.baseTwo(), most(Dissipation::baseTwoWatts)));
        }
    }

    private void ramp() {
        if (request.isOpen(OpenPart.CAPACITOR)) {
            Part part = design.ramp().capacitor();
            double volts = Stock.capacitorVolts(CEILING_RESERVE * most(Dissipation::capacitorVolts));
            design = Edit.capacitor(
                    design, new Part(part.value(), part.tolerance(), part.ratedWatts(), OptionalDouble.of(volts)));
        }
        double squareAmps = studies.stream()
                .mapToDouble(s -> s.dissipation().rampWatts() / s.solution().rampOhms())
                .max()
                .orElse(0);
        if (request.isOpen(OpenPart.FIXED)) {
            Part part = design.ramp().fixed();
            design = Edit.fixed(design, rated(part, squareAmps * part.value()));
        }
        if (request.isOpen(OpenPart.TRACK) && design.ramp().pot().isPresent()) {
            Part track = design.ramp().pot().orElseThrow().track();
            double watts = Math.max(
                    LEAST_TRACK_WATTS,
                    Stock.ratedWatts(squareAmps * track.value() * RESERVE, design.resistorDerating()));
            design = Edit.track(
                    design, new Part(track.value(), track.tolerance(), OptionalDouble.of(watts), track.ratedVolts()));
        }
    }

    private void sink() {
        ThyristorDevice device = design.thyristor().device();
        OptionalDouble inside = device.junctionToCaseKelvinPerWatt();
        OptionalDouble limit = device.limits().junctionCelsius();
        if (!request.isOpen(OpenPart.SINK) || inside.isEmpty() || limit.isEmpty()) {
            return;
        }
        double bare = device.limits().rmsAmps().orElse(BARE_LARGE) < SMALL_AMPS ? BARE_SMALL : BARE_LARGE;
        double watts = Math.max(
                LoadPower.atFiringAngle(design, studies.get(0).solution().condition(), 0)
                        .thyristorWatts(),
                studies.stream().mapToDouble(this::thyristorWatts).max().orElse(0));
        double most = watts > 0
                ? Thermal.largestCaseToAmbient(
                        limit.getAsDouble(),
                        design.surroundings().hottestCelsius(),
                        watts * CEILING_RESERVE,
                        inside.getAsDouble())
                : bare;
        double chosen = most >= bare ? bare : PreferredSeries.E12.atMost(Math.max(0.1, most));
        design = Edit.sink(design, OptionalDouble.of(chosen));
    }

    private double thyristorWatts(Study study) {
        LoadResult load = LoadPower.of(design, study.solution().condition(), study.solution());
        return load.thyristorWatts();
    }
}
