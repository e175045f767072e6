package clipramp.sizing;

import clipramp.files.DesignText.Reading;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.margins.Judge;
import clipramp.margins.Verdict;
import clipramp.runs.Watch;
import clipramp.sizing.Search.Judged;
import clipramp.sizing.SizingAnswer.Outcome;
import clipramp.spread.DrawLaw;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.units.PreferredSeries;
import java.io.PrintStream;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/**
 * Studies too long for the suite: {@code requests N} sizes N drawn requests and checks every answer anew, {@code grids N}
 * compares the search with every design of N small grids. Times are processor time of the one thread.
 */
final class SizingStudy {
    private static final PrintStream OUT = new PrintStream(System.out, true, StandardCharsets.UTF_8);

    private SizingStudy() {}

    public static void main(String[] arguments) {
        int count = Integer.parseInt(arguments[1]);
        if (arguments[0].equals("grids")) {
            grids(count);
        } else {
            requests(count, arguments.length > 2 ? Integer.parseInt(arguments[2]) : 0);
        }
    }

    private static double seconds() {
        return ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime() * 1e-9;
    }

    private static void requests(int count, int spreads) {
        List<Double> times = new ArrayList<>();
        int[] outcomes = new int[Outcome.values().length];
        int rechecked = 0;
        double yield = 0;
        for (int seed = 1; seed <= count; seed++) {
            PartialDesign partial = Requests.read(Requests.text(seed));
            double from = seconds();
            SizingAnswer answer = Sizing.propose(partial.request(Requests.LIBRARY, PreferredSeries.E24));
            times.add(seconds() - from);
            outcomes[answer.outcome().ordinal()]++;
            Reading reading = SizedText.of(partial, answer.design()).read(Requests.LIBRARY);
            boolean holds = reading instanceof Reading.Good good
                    && Judge.check(good.loaded().design(), OptionalDouble.empty(), OptionalDouble.empty())
                                    .verdict()
                            != Verdict.FAILS;
            rechecked += holds == answer.holds() ? 1 : 0;
            if (answer.outcome() == Outcome.NOMINAL) {
                OUT.println("  " + seed + " nominal only, "
                        + Requests.text(seed).lines().skip(2).limit(2).collect(Collectors.joining(" ")) + " "
                        + answer.design()
                                .ramp()
                                .trimmers()
                                .high()
                                .map(t -> t.value())
                                .orElse(0.0) + " "
                        + answer.design()
                                .ramp()
                                .trimmers()
                                .low()
                                .map(t -> t.value())
                                .orElse(0.0) + ": "
                        + answer.cornerFailures().stream()
                                .map(m -> m.id() + " "
                                        + String.format(
                                                Locale.ROOT, "%.2f", m.ratio().orElse(Double.NaN)))
                                .collect(Collectors.joining(", ")));
            }
            if (seed <= spreads) {
                double there = Spread.run(answer.design(), new SpreadOptions(200, 1, DrawLaw.NORMAL, 0), Watch.NONE)
                        .wanted()
                        .orElseThrow()
                        .share();
                yield += there;
                OUT.printf(Locale.ROOT, "  yield by spread %.2f, estimated %.2f%n", there, answer.yield());
            }
            if (!answer.holds()) {
                OUT.println("  " + seed + " "
                        + Requests.text(seed).lines().skip(2).limit(2).collect(Collectors.joining(" ")) + " fails: "
                        + answer.conflicts().stream()
                                .map(c -> c.margin().id() + " "
                                        + String.format(
                                                Locale.ROOT,
                                                "%.2f",
                                                c.margin().ratio().orElse(Double.NaN)))
                                .collect(Collectors.joining(", "))
                        + " of " + answer.candidates() + "; "
                        + answer.conflicts().get(0).nearest());
            }
        }
        times.sort(null);
        OUT.printf(
                Locale.ROOT,
                "%d requests: worst case %d, nominal %d, nothing %d; verdict found again %d; median %.2f s, longest %.2f s;"
                        + " mean yield of %d by spread %.3f%n",
                count,
                outcomes[0],
                outcomes[1],
                outcomes[2],
                rechecked,
                times.get(times.size() / 2),
                times.get(times.size() - 1),
                spreads,
                yield / Math.max(1, spreads));
    }

    private static void grids(int count) {
        int same = 0;
        int alike = 0;
        for (int seed = 1; seed <= count; seed++) {
            SizingRequest request = Requests.ramp(seed);
            Judged all = Exhaustive.best(request);
            Judged found = Exhaustive.searched(request);
            same += all.design().equals(found.design()) ? 1 : 0;
            alike += all.grade().equals(found.grade()) ? 1 : 0;
            if (!all.grade().equals(found.grade())) {
                OUT.println("  " + seed + " exhaustive " + all.grade() + " "
                        + all.design().ramp() + " searched " + found.grade() + " "
                        + found.design().ramp());
            }
        }
        OUT.printf(Locale.ROOT, "%d grids: same design %d, as good a one %d%n", count, same, alike);
    }
}
