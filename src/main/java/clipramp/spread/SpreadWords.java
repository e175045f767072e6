package clipramp.spread;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** A spread in sentences and rows, as window and record show them. */
public final class SpreadWords {
    private static final int MOST_ROWS = 8;
    private static final double WORTH_TELLING = 0.0005;

    private SpreadWords() {}

    /** What came of it, a sentence each, the yield first. */
    public static List<String> sentences(SpreadResult spread) {
        List<String> all = new ArrayList<>();
        if (!spread.isComplete()) {
            all.add("Cancelled after " + spread.units() + " of "
                    + spread.options().samples() + " units; this is of those.");
        }
        spread.wanted().ifPresent(y -> all.add(share("reach what is wanted at the knob's ends", y)));
        spread.margins().ifPresent(y -> all.add(share("fail no margin (judged on " + y.of() + " of the units)", y)));
        spread.failures().entrySet().stream().findFirst().ifPresent(worst -> all.add(failure(worst)));
        states(spread, all);
        if (!spread.sentence().isEmpty()) {
            all.add(spread.sentence());
        }
        all.add("Parts lie " + spread.options().law().words()
                + "; data-sheet figures triangular through minimum, typical and"
                + " maximum, or uniform where no typical value is given; line voltage, frequency and temperature uniform."
                + " Every figure is drawn by itself.");
        return all;
    }

    private static String share(String what, Yield yield) {
        return String.format(
                Locale.ROOT,
                "%s of the units %s; with 95 %% confidence %s to %s.",
                percent(yield.share()),
                what,
                percent(yield.low()),
                percent(yield.high()));
    }

    private static String failure(Map.Entry<String, Double> worst) {
        return "Failed most often: " + worst.getKey().replace('-', ' ') + ", by " + percent(worst.getValue())
                + " of the judged units.";
    }

    private static void states(SpreadResult spread, List<String> all) {
        for (PositionSpread at : List.of(
                spread.positions().get(0),
                spread.positions().get(spread.positions().size() - 1))) {
            List<String> parts = new ArrayList<>();
            state(parts, at.stalls(), "stall");
            state(parts, at.latchedOn(), "have a trigger that stays on");
            state(parts, at.misfires(), "do not fire");
            state(parts, at.hunts(), "hunt");
            if (!parts.isEmpty()) {
                String where = at.position().isPresent()
                        ? "At knob " + percent(at.position().getAsDouble()) + ", "
                        : "";
                all.add(where + String.join(", ", parts) + ".");
            }
            if (spread.positions().size() == 1) {
                return;
            }
        }
    }

    private static void state(List<String> parts, double share, String words) {
        if (share >= WORTH_TELLING) {
            parts.add(percent(share) + " " + words);
        }
    }

    /** What matters at mid-knob, most first: name, share of the variance alone and in all, swing. */
    public static List<List<String>> influences(SpreadResult spread) {
        return spread.influences().stream()
                .limit(MOST_ROWS)
                .map(SpreadWords::influence)
                .toList();
    }

    private static List<String> influence(Influence influence) {
        return List.of(
                influence.name(),
                percent(influence.firstOrder()),
                percent(influence.total()),
                percent(influence.fractionLow()) + " to " + percent(influence.fractionHigh()));
    }

    /** What would help, most first: change, yield with it, gain. */
    public static List<List<String>> remedies(SpreadResult spread) {
        return helping(spread).stream().map(SpreadWords::remedy).toList();
    }

    /** The remedies of those rows. */
    public static List<Remedy> helping(SpreadResult spread) {
        return spread.remedies().stream()
                .filter(r -> r.gain() >= WORTH_TELLING)
                .limit(MOST_ROWS)
                .toList();
    }

    private static List<String> remedy(Remedy remedy) {
        return List.of(remedy.change(), percent(remedy.yield().share()), "+" + percent(remedy.gain()));
    }

    /** A share with one decimal. */
    public static String percent(double share) {
        return String.format(Locale.ROOT, "%.1f %%", 100 * share);
    }
}
