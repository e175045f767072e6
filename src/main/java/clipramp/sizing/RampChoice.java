package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.units.PreferredSeries;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Fixed resistor and pot track for a capacitor that is given: every pair that is sold, best first. */
final class RampChoice {
    private static final double LEAST_FIXED = 47;

    /** Farther from the wanted resistances than this, nothing needs to be looked at. */
    private static final double FAR = 4;

    /** As {@link Grade} counts them. */
    private static final double YIELD_STEPS = 20;

    private static final double TRAVEL_STEPS = 30;

    private record Ranked(Design design, Timing timing, int values) {}

    private RampChoice() {}

    /** Designs with every open ramp resistor chosen, best first, at most so many; the design itself where none is open, or nothing that
     * is sold comes near. */
    static List<Design> best(SizingRequest request, Design design, Reach reach, int most) {
        List<Ranked> ranked = all(request, design, reach).stream()
                .map(d -> new Ranked(d, Timing.of(d, reach), DistinctValues.of(d)))
                .toList();
        if (ranked.isEmpty()) {
            return List.of(design);
        }
        return ranked.stream()
                .sorted(Comparator.comparingDouble((Ranked r) -> r.timing().lack())
                        .thenComparingLong(
                                r -> -Math.round(YIELD_STEPS * r.timing().yield()))
                        .thenComparingLong(
                                r -> Math.round(TRAVEL_STEPS * r.timing().deadTravel()))
                        .thenComparingInt(Ranked::values)
                        .thenComparingDouble(r -> -r.design().ramp().fixed().value()))
                .limit(most)
                .map(Ranked::design)
                .toList();
    }

    /** Every pair of sold values near what is wanted. */
    static List<Design> all(SizingRequest request, Design design, Reach reach) {
        return withFixed(request, design, reach).stream()
                .flatMap(fixed -> withTrack(request, fixed, reach).stream())
                .toList();
    }

    private static List<Design> withFixed(SizingRequest request, Design design, Reach reach) {
        if (!request.isOpen(OpenPart.FIXED)) {
            return List.of(design);
        }
        Part part = design.ramp().fixed();
        boolean knob = design.ramp().pot().isPresent();
        double most = Math.min(1e7, Math.max(LEAST_FIXED, (knob ? reach.highestTo() : reach.lowestFrom()) * FAR));
        double least = Math.max(LEAST_FIXED, Math.min(most, reach.highestTo()) / FAR);
        List<Design> all = new ArrayList<>();
        PreferredSeries series = request.series();
        for (double ohms = series.atLeast(least); ohms <= most; ohms = series.nextUp(ohms)) {
            all.add(Edit.fixed(design, part.withValue(ohms)));
        }
        return all;
    }

    private static List<Design> withTrack(SizingRequest request, Design design, Reach reach) {
        if (!request.isOpen(OpenPart.TRACK) || design.ramp().pot().isEmpty()) {
            return List.of(design);
        }
        Part part = design.ramp().pot().orElseThrow().track();
        return Stock.tracks(reach.lowestFrom() / FAR, Math.max(reach.lowestFrom(), reach.highestTo()) * FAR).stream()
                .map(ohms -> Edit.track(design, part.withValue(ohms)))
                .toList();
    }
}
