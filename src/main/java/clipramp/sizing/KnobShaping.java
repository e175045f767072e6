package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.runs.Watch;
import clipramp.units.PreferredSeries;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;

/**
 * Pot law, fixed resistor, track, end resistor and a resistor across, chosen so that power or light against rotation is
 * as straight as it can be. Only what still reaches the wanted settings counts; of equals the one with fewer parts.
 */
public final class KnobShaping {
    /** Tapers that pots are sold with: linear, and logarithmic ones either way (common practice). */
    static final List<PotLaw> LAWS = List.of(
            new PotLaw.Linear(),
            new PotLaw.Logarithmic(0.1),
            new PotLaw.Logarithmic(0.15),
            new PotLaw.Logarithmic(0.2),
            new PotLaw.ReverseLogarithmic(0.1),
            new PotLaw.ReverseLogarithmic(0.15),
            new PotLaw.ReverseLogarithmic(0.2));

    private static final double LEAST_SHUNT = 0.3;
    private static final double MOST_SHUNT = 20;
    private static final double END_SHARE = 0.05;
    private static final double TENTH_PER_CENT = 1000;

    /** A part more must bring the knob half a per cent of full nearer to a straight line. */
    private static final double DEPARTURE_STEPS = 200;

    private static final int TOLD_EVERY = 100;
    private static final double WIDER = 6;
    private static final double SAME_LACK = 1e-9;

    /**
     * @param shape a candidate and how straight its knob is
     * @param lack how far it misses what is wanted, as {@link Timing} counts it
     * @param parts how many parts it takes more than the plainest
     */
    private record Shaped(KnobShape shape, double lack, int parts) {}

    private KnobShaping() {}

    /**
     * The straightest knob.
     *
     * @param request what is open: law and shunt are always chosen, the fixed resistor and the track where they are open
     * @param design the design as sized
     * @param what power or light
     * @return the shape with its design; the design's own where it has no pot
     */
    public static KnobShape straightest(SizingRequest request, Design design, KnobShape.What what) {
        return straightest(request, design, what, Watch.NONE);
    }

    /**
     * The same, watched.
     *
     * @param request what is open: law and shunt are always chosen, the fixed resistor and the track where they are open
     * @param design the design as sized
     * @param what power or light
     * @param watch told of knobs worked out, of all that there are; may end it
     * @return the shape with its design; the design's own where it has no pot
     * @throws CancellationException where the watch cancelled
     */
    public static KnobShape straightest(SizingRequest request, Design design, KnobShape.What what, Watch watch) {
        if (design.ramp().pot().isEmpty()) {
            return KnobShape.of(design, what);
        }
        Reach reach = Reach.of(design);
        PowerCurve curve =
                new PowerCurve(design, what, reach.highestTo() / WIDER, Math.max(reach.lowestFrom(), 1) * WIDER);
        List<Design> candidates = candidates(request, design, reach);
        List<Shaped> shapes = new ArrayList<>();
        for (Design candidate : candidates) {
            if (shapes.size() % TOLD_EVERY == 0) {
                watch.step("the shaping", shapes.size(), candidates.size());
            }
            shapes.add(
                    new Shaped(KnobShape.of(candidate, what, curve), Timing.lack(candidate, reach), parts(candidate)));
        }
        Optional<Shaped> best = shapes.stream()
                .min(Comparator.comparingLong(
                                (Shaped s) -> Math.round(TENTH_PER_CENT * Math.max(0, s.lack() - SAME_LACK)))
                        .thenComparingLong(
                                s -> Math.round(DEPARTURE_STEPS * s.shape().largestDeparture()))
                        .thenComparingInt(Shaped::parts)
                        .thenComparingDouble(s -> s.shape().steepestPerDegree()));
        return KnobShape.of(Ratings.fit(request, best.orElseThrow().shape().design()), what);
    }

    private static int parts(Design design) {
        Pot pot = design.ramp().pot().orElseThrow();
        return (pot.shunt().isPresent() ? 1 : 0) + (pot.endOhms() > 0 ? 1 : 0);
    }

    private static List<Design> candidates(SizingRequest request, Design design, Reach reach) {
        List<Design> all = new ArrayList<>();
        for (Design sized : RampChoice.all(request, design, reach)) {
            Pot pot = sized.ramp().pot().orElseThrow();
            for (PotLaw law : LAWS) {
                all.add(Edit.law(sized, law));
                for (double end : List.of(
                        pot.endOhms(),
                        PreferredSeries.E12.nearest(END_SHARE * pot.track().value()))) {
                    for (Part shunt : shunts(request, pot)) {
                        all.add(Edit.pot(sized, new Pot(pot.track(), end, law, pot.sense(), Optional.of(shunt))));
                    }
                }
            }
        }
        return all;
    }

    private static List<Part> shunts(SizingRequest request, Pot pot) {
        PreferredSeries series =
                request.series().perDecade() > PreferredSeries.E12.perDecade() ? PreferredSeries.E12 : request.series();
        List<Part> shunts = new ArrayList<>();
        double track = pot.track().value();
        for (double ohms = series.atLeast(LEAST_SHUNT * track);
                ohms <= MOST_SHUNT * track;
                ohms = series.nextUp(ohms)) {
            shunts.add(Start.resistor(request, ohms));
        }
        return shunts;
    }
}
