package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.margins.Margin;
import clipramp.margins.MarginKind;
import clipramp.margins.Verdict;
import clipramp.runs.Watch;
import clipramp.sizing.Search.Judged;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.sizing.SizingAnswer.Outcome;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** From what is wanted to preferred values (DEVELOPERS.md, Sizing). */
public final class Sizing {
    private static final int FIGURES = 3;

    /** How often the nearest setting is taken back where nothing holds with it. */
    private static final int MOST_TRIALS = 3;

    /** Worse outcomes come later; of equal ones those whose verdict is worse. */
    private static final Comparator<SizingAnswer> BY_VERDICT = Comparator.comparing(SizingAnswer::outcome)
            .thenComparing(answer -> answer.check().verdict());

    private Sizing() {}

    /**
     * Chooses every open part: starts from published relations, then searches preferred values on the exact engine. No
     * clock and no chance: the same request gives the same design.
     *
     * @param request what is wanted, decided and open
     * @throws RefusedCircuit where the decided parts are unsound
     */
    public static SizingAnswer propose(SizingRequest request) {
        return propose(request, Watch.NONE);
    }

    /**
     * The same, watched.
     *
     * @param request what is wanted, decided and open
     * @param watch told of candidates judged, of the most that there will be; may end the search
     * @throws RefusedCircuit where the decided parts are unsound
     * @throws CancellationException where the watch cancelled
     */
    public static SizingAnswer propose(SizingRequest request, Watch watch) {
        SizingAnswer found = searched(request, watch);
        boolean best = found.outcome() == Outcome.WORST_CASE && found.check().verdict() == Verdict.HOLDS;
        return best
                ? found
                : standing(request)
                        .filter(s -> BY_VERDICT.compare(s, found) < 0)
                        .orElse(found);
    }

    /** What stands at the open parts, as it stands: the search starts elsewhere, and may end with less. */
    private static Optional<SizingAnswer> standing(SizingRequest request) {
        try {
            return Optional.of(judge(request, request.design()));
        } catch (RefusedCircuit unsound) {
            return Optional.empty();
        }
    }

    private static SizingAnswer searched(SizingRequest request, Watch watch) {
        Search search = new Search(request, watch);
        Judged first = search.first();
        Optional<NearestSetting> nearest = failing(first).stream().anyMatch(m -> m.kind() == MarginKind.WANTED_HIGHEST)
                ? NearestSetting.of(first.design(), first.reach())
                : Optional.empty();
        if (nearest.isPresent()) {
            return nearer(request, nearest.get(), watch);
        }
        Judged best = first.grade().holds() ? first : search.betterThan(first);
        return answer(trimmed(request, search, best), search.all(), Optional.empty());
    }

    /** The design for the nearest setting that can be had, judged by what was wanted. */
    private static SizingAnswer nearer(SizingRequest request, NearestSetting nearest, Watch watch) {
        Wanted wanted = request.design().wanted();
        NearestSetting asked = nearest;
        Search search = new Search(easier(request, asked), watch);
        Judged best = search.first();
        int candidates = search.all().size();
        for (int trial = 1; trial < MOST_TRIALS && !best.grade().holds(); trial++) {
            asked = asked.less();
            search = new Search(easier(request, asked), watch);
            best = search.first();
            candidates += search.all().size();
        }
        Kept kept = trimmed(easier(request, asked), search, best);
        Search again = new Search(request, Watch.NONE);
        Judged judged = again.judge(
                kept.judged().design().withWanted(wanted), kept.judged().reach());
        return answer(new Kept(judged, List.of()), again.all(), Optional.of(said(wanted, asked, kept)), candidates);
    }

    private static SizingRequest easier(SizingRequest request, NearestSetting nearest) {
        return new SizingRequest(
                request.design().withWanted(nearest.wanted()), request.open(), request.stock(), request.series());
    }

    private static String said(Wanted wanted, NearestSetting nearest, Kept kept) {
        double from = wanted.highest().orElseThrow().from();
        Goal goal = nearest.wanted().highest().orElseThrow();
        String holds = !kept.judged().grade().holds()
                ? "; the design shown comes nearest to that"
                : kept.corners().isEmpty()
                        ? "; the design shown holds with that, in the worst case too"
                        : "; the design shown holds with that, with nominal parts";
        return "The nearest that can be met: " + NearestSetting.text(goal.measure(), goal.from()) + " in place of "
                + NearestSetting.text(goal.measure(), from) + " at "
                + QuantityText.format(goal.position(), Unit.FRACTION, FIGURES) + holds + ". " + nearest.why();
    }

    /** Where units stray too far, the first with trimmers that holds for every one; else what there was. */
    private static Kept trimmed(SizingRequest request, Search search, Judged plain) {
        Kept best = Kept.of(plain);
        if (!plain.grade().holds() || best.corners().isEmpty()) {
            return best;
        }
        for (Design from : search.capacitors(plain.design())) {
            Reach reach = Reach.of(from);
            for (Design design : Trimming.of(request, from, reach)) {
                Judged there = search.judge(design, reach);
                Kept kept = there.grade().holds() ? Kept.of(there) : best;
                if (kept.corners().size() < best.corners().size()) {
                    best = kept;
                }
                if (best.corners().isEmpty()) {
                    return best;
                }
            }
        }
        return best;
    }

    /**
     * @param judged a design
     * @param corners margins that fail for its fastest or slowest unit; empty too where nominal parts fail already
     */
    private record Kept(Judged judged, List<Margin> corners) {
        static Kept of(Judged judged) {
            return new Kept(judged, judged.grade().holds() ? CornerUnits.failures(judged.design()) : List.of());
        }
    }

    /**
     * A design as it stands, put in the words of an answer; only the ratings of open parts are chosen.
     *
     * @param request what is open, and what it is chosen from
     * @param design the design to judge
     * @throws RefusedCircuit where it is unsound
     */
    public static SizingAnswer judge(SizingRequest request, Design design) {
        Search search = new Search(request, Watch.NONE);
        return answer(Kept.of(search.judge(design, Reach.of(design))), search.all(), Optional.empty());
    }

    /**
     * Chooses every open part, the base-two resistor so that the firing angle is flattest against temperature (see
     * {@link Compensation}). Where that resistor is not open, as {@link #propose(SizingRequest)}.
     *
     * @param request what is wanted, decided and open
     * @throws RefusedCircuit where the decided parts are unsound
     */
    public static SizingAnswer proposeCompensated(SizingRequest request) {
        SizingAnswer first = propose(request);
        Optional<Compensation> found =
                request.isOpen(OpenPart.BASE_TWO) ? Compensation.of(first.design()) : Optional.empty();
        if (found.isEmpty()) {
            return first;
        }
        Part part = Start.resistor(request, found.get().flattest().ohms());
        return propose(request.decided(Edit.baseTwo(first.design(), part), OpenPart.BASE_TWO));
    }

    private static SizingAnswer answer(Kept kept, List<Judged> all, Optional<String> nearest) {
        return answer(kept, all, nearest, all.size());
    }

    private static SizingAnswer answer(Kept kept, List<Judged> all, Optional<String> nearest, int candidates) {
        Judged best = kept.judged();
        List<Margin> corners = kept.corners();
        Outcome outcome =
                !best.grade().holds() ? Outcome.NOTHING : corners.isEmpty() ? Outcome.WORST_CASE : Outcome.NOMINAL;
        return new SizingAnswer(
                best.design(),
                best.check(),
                outcome,
                corners,
                outcome == Outcome.WORST_CASE ? 1 : best.timing().yield(),
                best.timing().deadTravel(),
                Grade.watts(best.check().dissipation()),
                conflicts(best, all, nearest),
                candidates);
    }

    private static List<Conflict> conflicts(Judged best, List<Judged> all, Optional<String> nearest) {
        List<Conflict> conflicts = new ArrayList<>();
        for (Margin margin : failing(best)) {
            List<String> with = all.stream()
                    .filter(j -> failing(j).stream().noneMatch(m -> m.kind() == margin.kind()))
                    .min(Comparator.comparing(Judged::grade))
                    .map(j -> failing(j).stream().map(Margin::name).toList())
                    .orElse(List.of());
            boolean highest = margin.kind() == MarginKind.WANTED_HIGHEST;
            String said = highest ? nearest.orElseGet(() -> nearest(margin)) : nearest(margin);
            conflicts.add(new Conflict(margin, with, said));
        }
        return conflicts;
    }

    private static List<Margin> failing(Judged judged) {
        return judged.check().margins().stream()
                .filter(m -> m.verdict() == Verdict.FAILS)
                .toList();
    }

    private static String nearest(Margin margin) {
        return switch (margin.kind()) {
            case FULL_POWER_PULSE, SILENT, GATE_POLARITY, MISSED_HALF_CYCLES ->
                "It is met or it is not, with nothing between; here it is not (" + margin.condition() + ").";
            default ->
                "The nearest that can be met: " + Amounts.of(margin.offered(), margin.unit()) + " in place of "
                        + Amounts.of(margin.demand(), margin.unit()) + " (" + margin.condition() + ").";
        };
    }
}
