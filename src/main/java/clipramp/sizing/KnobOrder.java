package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.PotLaw;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Which of several ramps that may all hold has the better knob: the least dead travel, then power nearest to a straight
 * line over the rotation, then a linear law. Tapers are tried where the law is open. Figures count as coarsely as they matter.
 */
final class KnobOrder {
    /** Another law must bring two per cent of full power. */
    private static final double DEPARTURE_STEPS = 50;

    /** If neither of so many holds, the others, whose ends are the same, hardly will. */
    private static final int MOST = 2;

    private static final double WIDER = 2;

    private record Ranked(Design design, long deadTravel, long departure, int tapered, double steepest) {}

    private final SizingRequest request;
    private final Design design;
    private final Reach reach;

    private @Nullable PowerCurve curve;

    /**
     * @param request whether the law is open
     * @param design everything but the ramp's resistances, which may be anything
     * @param reach its reach
     */
    KnobOrder(SizingRequest request, Design design, Reach reach) {
        this.request = request;
        this.design = design;
        this.reach = reach;
    }

    /** The best of the ramps with the best of the laws, best first; empty for none. */
    List<Design> best(List<Design> ramps) {
        List<Ranked> ranked = new ArrayList<>();
        for (Design ramp : ramps) {
            for (PotLaw law : laws(ramp)) {
                ranked.add(ranked(Edit.law(ramp, law)));
            }
        }
        return ranked.stream()
                .sorted(Comparator.comparingLong(Ranked::deadTravel)
                        .thenComparingLong(Ranked::departure)
                        .thenComparingInt(Ranked::tapered)
                        .thenComparingDouble(Ranked::steepest))
                .limit(MOST)
                .map(Ranked::design)
                .toList();
    }

    private List<PotLaw> laws(Design ramp) {
        return request.isOpen(OpenPart.LAW)
                ? KnobShaping.LAWS
                : List.of(ramp.ramp().pot().orElseThrow().law());
    }

    private Ranked ranked(Design ramp) {
        if (curve == null) {
            curve = new PowerCurve(design, KnobShape.What.POWER, reach.highestTo() / WIDER, reach.lowestFrom() * WIDER);
        }
        KnobShape shape = KnobShape.of(ramp, KnobShape.What.POWER, curve);
        return new Ranked(
                ramp,
                Grade.deadTravel(Timing.of(ramp, reach)),
                Math.round(DEPARTURE_STEPS * shape.largestDeparture()),
                ramp.ramp().pot().orElseThrow().law() instanceof PotLaw.Linear ? 0 : 1,
                shape.steepestPerDegree());
    }
}
