package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.Tolerance;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Presets for a ramp whose units stray farther than what is wanted allows. How far is measured on the exact engine: the
 * R_E that the fastest and the slowest unit need for the firing angles of the nominal one. A trimmer in series with the
 * fixed resistor must reach from one to the other at the highest setting, one across the pot at the lowest.
 */
final class Trimming {
    /** What cermet presets are made to (common practice). */
    private static final Tolerance TRACK_TOLERANCE = new Tolerance(0.1, 0.1);

    private static final double TRACK_WATTS = 0.5;

    /** The nominal highest setting stays this far under what the worst line and temperature allow. */
    private static final double HIGH_RESERVE = 0.98;

    private static final double HIGH_WINDOW = 0.9;

    /** Share of the way from the least R_E of the lowest setting to the collapse that the nominal one takes. */
    private static final double LOW_SHARE = 0.08;

    /** The same for units that drift more than the nominal one. */
    private static final double CAREFUL_SHARE = 0.3;

    private static final double LEAST_FIXED = 47;

    private final SizingRequest request;
    private final Design design;
    private final Reach reach;
    private final double highFast;
    private final double highSlow;
    private final double lowFast;
    private final double lowSlow;

    private Trimming(SizingRequest request, Design design, Reach reach) {
        this.request = request;
        this.design = design;
        this.reach = reach;
        Design fast = CornerUnits.fastestDevice(design);
        Design slow = CornerUnits.slowestDevice(design);
        double high = design.ramp().rampOhms(Timing.highPosition(design));
        double low = design.ramp().rampOhms(Timing.lowPosition(design));
        highFast = Reach.share(design, fast, high);
        highSlow = Reach.share(design, slow, high);
        lowFast = Reach.share(design, fast, low);
        lowSlow = Reach.share(design, slow, low);
    }

    /**
     * The design with trimmers, the simpler first: one, then two; of as many, the one with the straighter knob. Empty where
     * they may not be chosen or no preset that is sold reaches far enough.
     */
    static List<Design> of(SizingRequest request, Design design, Reach reach) {
        boolean may = request.isOpen(OpenPart.FIXED)
                && request.isOpen(OpenPart.TRIM_HIGH)
                && design.ramp().pot().isPresent()
                && design.ramp().trimmers().isNone();
        if (!may || !(reach.lowestFrom() < reach.collapse()) || !(reach.highestTo() < reach.lowestFrom())) {
            return List.of();
        }
        Trimming trimming = new Trimming(request, design, reach);
        List<Design> all = new ArrayList<>();
        trimming.high().ifPresent(high -> {
            KnobOrder order = new KnobOrder(request, high, reach);
            if (request.isOpen(OpenPart.TRACK)) {
                all.addAll(order.best(trimming.alone(high)));
            }
            if (request.isOpen(OpenPart.TRACK)
                    && request.isOpen(OpenPart.TRIM_LOW)
                    && request.isOpen(OpenPart.ACROSS)) {
                all.addAll(order.best(trimming.low(high, LOW_SHARE)));
                all.addAll(order.best(trimming.low(high, CAREFUL_SHARE)));
            }
        });
        return all;
    }

    /** The least preset, and the fixed resistor that goes with it best, for the highest setting. */
    private Optional<Design> high() {
        double most = reach.highestTo() * HIGH_RESERVE;
        double least = Math.max(
                Math.max(reach.highestFrom(), most * HIGH_WINDOW), Math.max(reach.clip(), reach.valley()) / highSlow);
        Design best = null;
        double farthest = Double.POSITIVE_INFINITY;
        for (double trimmer : Stock.trimmers(LEAST_FIXED, 2 * most)) {
            for (double ohms = request.series().atLeast(LEAST_FIXED);
                    ohms < most;
                    ohms = request.series().nextUp(ohms)) {
                Part fixed = design.ramp().fixed().withValue(ohms);
                double nominal = ohms + trimmer / 2;
                boolean reaches = fixed.highest() <= nominal * highSlow
                        && fixed.lowest() + trimmer * (1 - TRACK_TOLERANCE.minus()) >= nominal * highFast;
                double away = Math.abs(Math.log(nominal / most));
                if (reaches && nominal <= most && nominal >= least && away < farthest) {
                    farthest = away;
                    best = Edit.trimHigh(Edit.fixed(design, fixed), Optional.of(preset(trimmer)));
                }
            }
            if (best != null) {
                return Optional.of(best);
            }
        }
        return Optional.empty();
    }

    /** A plain track that every unit can live with once its high end is set. */
    private List<Design> alone(Design high) {
        Part track = high.ramp().pot().orElseThrow().track();
        return Stock.tracks(reach.lowestFrom() / 4, reach.collapse()).stream()
                .map(track::withValue)
                .filter(t -> isHeldByTrackAlone(high.ramp(), t))
                .min(Comparator.comparingDouble(Part::value))
                .map(t -> List.of(Edit.track(high, t)))
                .orElse(List.of());
    }

    private boolean isHeldByTrackAlone(Ramp high, Part track) {
        double nominal = high.seriesOhms();
        double least = nominal * highFast + track.lowest();
        double most = nominal * highSlow + track.highest();
        return least >= reach.lowestFrom() * lowFast
                && most <= Math.min(reach.collapse(), reach.lowestTo()) * lowSlow
                && nominal + track.value() <= Math.min(reach.collapse(), reach.lowestTo());
    }

    /** Tracks that serve for the lowest setting, each with the resistor and preset across it that suit it best. */
    private List<Design> low(Design high, double share) {
        double series = high.ramp().seriesOhms();
        double most = Math.min(reach.collapse(), reach.lowestTo());
        double target = reach.lowestFrom() * Math.pow(most / reach.lowestFrom(), share);
        Pot pot = high.ramp().pot().orElseThrow();
        List<Design> all = new ArrayList<>();
        for (double track : Stock.tracks(target - series, 8 * target)) {
            Part trackPart = pot.track().withValue(track);
            Design best = null;
            double farthest = Double.POSITIVE_INFINITY;
            for (double trimmer : Stock.trimmers(track / 20, 20 * track)) {
                // The track in parallel with R comes to the target less the fixed part.
                double across = 1 / (1 / (target - series) - 1 / track);
                double stop = across - trimmer / 2;
                for (double ohms : around(stop)) {
                    Part shunt = Start.resistor(request, ohms);
                    double nominal = series + parallel(track, ohms + trimmer / 2);
                    double away = Math.abs(Math.log(nominal / target));
                    if (nominal > reach.lowestFrom()
                            && nominal < most
                            && away < farthest
                            && reaches(series, nominal, trackPart, shunt, trimmer)) {
                        farthest = away;
                        best = Edit.trimLow(
                                Edit.track(high, trackPart), Optional.of(shunt), Optional.of(preset(trimmer)));
                    }
                }
            }
            if (best != null) {
                all.add(best);
            }
        }
        return all;
    }

    private List<Double> around(double ohms) {
        if (!(ohms > LEAST_FIXED)) {
            return List.of();
        }
        double near = request.series().nearest(ohms);
        return List.of(near, request.series().nextUp(near), request.series().step(near, -1));
    }

    private boolean reaches(double series, double nominal, Part track, Part shunt, double trimmer) {
        double slow = nominal * lowSlow - series * highSlow;
        double fast = nominal * lowFast - series * highFast;
        return parallel(track.highest(), shunt.highest()) <= slow
                && parallel(track.lowest(), shunt.lowest() + trimmer * (1 - TRACK_TOLERANCE.minus())) >= fast;
    }

    private static double parallel(double a, double b) {
        return a * b / (a + b);
    }

    private static Part preset(double ohms) {
        return new Part(ohms, TRACK_TOLERANCE, OptionalDouble.of(TRACK_WATTS), OptionalDouble.empty());
    }
}
