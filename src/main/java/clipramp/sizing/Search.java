package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.runs.Watch;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * One search: candidates are judged once each, and a design moves to a better neighbour for as long as there is one. The
 * parts that failing margins name are moved first; the ramp's resistors follow every move by {@link RampChoice}. It ends
 * after a fixed number of candidates, so that the same request gives the same design on any machine.
 */
final class Search {
    private static final int MOST_CANDIDATES = 90;
    private static final int RAMPS = 3;
    private static final int CAPACITOR_STEPS = 3;

    /** A candidate that was judged. */
    record Judged(Design design, Check check, Reach reach, Timing timing, Grade grade) {}

    /** Designs of one grade: first the largest fixed resistor, as {@link RampChoice} has them, then the smallest capacitor. */
    static final Comparator<Judged> ORDER = Comparator.comparing(Judged::grade)
            .thenComparingDouble(j -> -j.design().ramp().fixed().value())
            .thenComparingDouble(j -> j.design().ramp().capacitor().value())
            .thenComparingDouble(
                    j -> j.design().ramp().rampOhms(0) + j.design().ramp().rampOhms(1));

    private final SizingRequest request;
    private final Watch watch;
    private final Map<Design, Judged> judged = new LinkedHashMap<>();

    /**
     * @param request what is open
     * @param watch told after every candidate that was judged, of the most that there will be
     */
    Search(SizingRequest request, Watch watch) {
        this.request = request;
        this.watch = watch;
    }

    /** Every candidate that was judged, in the order in which they were. */
    List<Judged> all() {
        return List.copyOf(judged.values());
    }

    /** Ramp and ratings chosen for everything else as it stands, then judged. */
    Judged settled(Design design) {
        Reach reach = Reach.of(design);
        return judge(RampChoice.best(request, design, reach, 1).get(0), reach);
    }

    /**
     * The same, but judged only where it can be better than another: what timing, heat and number of values come to is
     * known before the judge is asked, and no margin makes it better.
     */
    private Optional<Judged> settledIfBetter(Design design, Judged than) {
        Reach reach = Reach.of(design);
        return judgeIfBetter(RampChoice.best(request, design, reach, 1).get(0), reach, than);
    }

    private Optional<Judged> judgeIfBetter(Design design, Reach reach, Judged than) {
        if (Grade.atBest(design, Timing.of(design, reach)).compareTo(than.grade()) >= 0) {
            return Optional.empty();
        }
        Judged there = judge(design, reach);
        return there.grade().compareTo(than.grade()) < 0 ? Optional.of(there) : Optional.empty();
    }

    /** A design judged as it stands but for its ratings. */
    Judged judge(Design design, Reach reach) {
        watch.step("the search", judged.size(), MOST_CANDIDATES);
        Design rated = Ratings.fit(request, design);
        return judged.computeIfAbsent(rated, d -> {
            Check check = Judge.check(d, OptionalDouble.empty(), OptionalDouble.empty());
            Timing timing = Timing.of(d, reach);
            return new Judged(d, check, reach, timing, Grade.of(check, timing));
        });
    }

    /** The best that the usual start leads to. */
    Judged first() {
        return polished(climb(Start.of(request)));
    }

    /** Where that leads to nothing: one with a gate of another class may do better. */
    Judged betterThan(Judged first) {
        Judged best = first;
        for (Design other : Start.others(request)) {
            Judged there = polished(climb(other));
            best = ORDER.compare(there, best) < 0 ? there : best;
        }
        return best;
    }

    /** The best design that can be reached from a start. */
    Judged climb(Design start) {
        Judged best = settled(start);
        boolean better = true;
        int most = judged.size() + MOST_CANDIDATES;
        while (better && judged.size() < most) {
            better = false;
            for (OpenPart part : order(best)) {
                Optional<Judged> found = improve(best, part, most);
                if (found.isPresent()) {
                    best = found.get();
                    better = true;
                    break;
                }
            }
        }
        return best;
    }

    private Optional<Judged> improve(Judged from, OpenPart part, int most) {
        for (Design neighbour : Moves.of(request, from.design(), part)) {
            if (judged.size() >= most) {
                return Optional.empty();
            }
            Optional<Judged> there = settledIfBetter(neighbour, from);
            if (there.isPresent()) {
                return there;
            }
        }
        return Optional.empty();
    }

    /** Capacitors around the design's own, each with the ramps that suit it best: the best of them all. */
    Judged polished(Judged from) {
        Judged best = from;
        for (Design design : capacitors(from.design())) {
            Reach reach = Reach.of(design);
            for (Design ramp : RampChoice.best(request, design, reach, RAMPS)) {
                if (Grade.atBest(ramp, Timing.of(ramp, reach)).compareTo(best.grade()) <= 0) {
                    Judged there = judge(ramp, reach);
                    best = ORDER.compare(there, best) < 0 ? there : best;
                }
            }
        }
        return best;
    }

    /** The design, and with its capacitor some values up and down where that is open, nearest first. */
    List<Design> capacitors(Design design) {
        List<Design> all = new ArrayList<>(List.of(design));
        if (request.isOpen(OpenPart.CAPACITOR)) {
            Design up = design;
            Design down = design;
            for (int step = 0; step < CAPACITOR_STEPS; step++) {
                up = Moves.next(request, up, OpenPart.CAPACITOR, 1).orElseThrow();
                down = Moves.next(request, down, OpenPart.CAPACITOR, -1).orElseThrow();
                all.add(up);
                all.add(down);
            }
        }
        return all;
    }

    /** Parts that failing margins name come first, then those of tight ones; with nothing failing every part counts. */
    private List<OpenPart> order(Judged at) {
        Set<OpenPart> order = new LinkedHashSet<>();
        boolean fails = false;
        for (Margin margin : at.check().margins()) {
            if (margin.verdict() == Verdict.FAILS || margin.verdict() == Verdict.TIGHT) {
                margin.parts().forEach(key -> named(key).ifPresent(order::add));
                fails |= margin.verdict() == Verdict.FAILS;
            }
        }
        if (!fails || order.isEmpty()) {
            order.addAll(request.open());
        }
        order.removeIf(part -> !request.isOpen(part) || part == OpenPart.FIXED || part == OpenPart.TRACK);
        return List.copyOf(order);
    }

    private static Optional<OpenPart> named(String key) {
        for (OpenPart part : OpenPart.values()) {
            if (key.equals(part.key()) || key.startsWith(part.key() + ".")) {
                return Optional.of(part);
            }
        }
        return Optional.empty();
    }
}
