package clipramp.spread;

import clipramp.margins.MarginKind;
import clipramp.units.QuantityText;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** A spread in sentences and rows, as command line, window and record show them. */
public final class SpreadWords {
    private static final int MOST_ROWS = 8;
    private static final double WORTH_TELLING = 0.0005;
    /** Tells one unit in ten million from none. */
    private static final int MOST_DECIMALS = 5;

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
        all.add(laws(spread.options().law()));
        return all;
    }

    /** How everything that differs is drawn, with parts by the given law. */
    public static String laws(DrawLaw parts) {
        return "Parts lie " + parts.words()
                + "; data-sheet figures triangular through minimum, typical and maximum, or uniform where no typical value is"
                + " given; line voltage, frequency (1 % either way, EN 50160) and temperature uniform. Every factor is drawn by"
                + " itself.";
    }

    private static String share(String what, Yield yield) {
        return String.format(
                Locale.ROOT,
                "%s of the units %s; with 95 %% confidence %s to %s.",
                ofUnits(yield.share()),
                what,
                ofUnits(yield.low()),
                ofUnits(yield.high()));
    }

    private static String failure(Map.Entry<String, Double> worst) {
        String margin = MarginKind.byId(worst.getKey()).map(MarginKind::title).orElse(worst.getKey());
        return "Failed most often: " + margin + ", by " + ofUnits(worst.getValue()) + " of the judged units.";
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
            parts.add(ofUnits(share) + " " + words);
        }
    }

    /**
     * What matters at mid-knob, most first.
     *
     * @return rows of name, share of the variance alone, share with all that it has a part in, and power from its lower to its
     *     upper limit; eight at most
     */
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

    /**
     * What would help, most first.
     *
     * @return rows of change, yield with it and gain; as many and in the same order as {@link #helping}
     */
    public static List<List<String>> remedies(SpreadResult spread) {
        return helping(spread).stream().map(SpreadWords::remedy).toList();
    }

    /** Remedies that win one unit in two thousand or more, most first, eight at most. */
    public static List<Remedy> helping(SpreadResult spread) {
        return spread.remedies().stream()
                .filter(r -> r.gain() >= WORTH_TELLING)
                .limit(MOST_ROWS)
                .toList();
    }

    private static List<String> remedy(Remedy remedy) {
        return List.of(remedy.change(), ofUnits(remedy.yield().share()), "+" + percent(remedy.gain()));
    }

    /**
     * How far a run is.
     *
     * @param done units that are drawn, fewer than all
     * @param of units in all
     * @param seconds time since the run began, s, above 0
     */
    public static String progress(int done, int of, double seconds) {
        double rate = done / seconds;
        return String.format(
                Locale.ROOT,
                "%d of %d units, %.0f a second, %.0f s left",
                done,
                of,
                rate,
                Math.ceil((of - done) / rate));
    }

    /**
     * A share of units in percent: with one decimal, or as many as it takes that a few never read as none, nor all but a few
     * as all.
     *
     * @param share 0..1
     */
    public static String ofUnits(double share) {
        return unitsInPercent(share) + " %";
    }

    /**
     * The same for a column that carries its unit in the head.
     *
     * @param share 0..1
     */
    public static String unitsInPercent(double share) {
        int decimals = 1;
        while (decimals < MOST_DECIMALS && readsAsNoneOrAll(share, decimals)) {
            decimals++;
        }
        return QuantityText.fixed(100 * share, decimals);
    }

    private static boolean readsAsNoneOrAll(double share, int decimals) {
        String text = QuantityText.fixed(100 * share, decimals);
        return (share > 0 && text.equals(QuantityText.fixed(0, decimals)))
                || (share < 1 && text.equals(QuantityText.fixed(100, decimals)));
    }

    /** Percent with one decimal. */
    public static String percent(double share) {
        return QuantityText.fixed(100 * share, 1) + " %";
    }
}
