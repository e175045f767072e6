package clipramp.desk.model;

import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/**
 * A margin as a row shows it.
 *
 * @param id the margin's id, by which a row stays open while figures change
 * @param name what is judged
 * @param asked what is asked, with its side
 * @param offered what there is
 * @param ratio ratio with two decimals
 * @param barShare length of the bar, 0..1 of its track
 * @param limitShare where on the track the limit stands
 * @param verdict the verdict
 * @param condition where it is worst
 * @param meaning what is asked, and why
 * @param formula formula with the numbers in
 * @param source where demand and formula come from
 * @param remedy what to change
 * @param parts design keys that move it
 */
public record MarginRow(
        String id,
        String name,
        String asked,
        String offered,
        String ratio,
        double barShare,
        double limitShare,
        Verdict verdict,
        String condition,
        String meaning,
        String formula,
        String source,
        String remedy,
        List<String> parts) {
    /** The ratio at the right end of the bar's track; 0 stands at its left end. */
    public static final double TRACK = 2;

    private static final double MOST_SHOWN = 100;

    /** A margin in words. */
    public static MarginRow of(Margin margin) {
        double ratio = margin.ratio().orElse(Double.NaN);
        String side = margin.sense() == Margin.Sense.AT_LEAST ? "≥ " : "≤ ";
        return new MarginRow(
                margin.id(),
                margin.name(),
                Double.isNaN(margin.demand()) ? "–" : side + Amount.text(margin.demand(), margin.unit()),
                Amount.text(margin.offered(), margin.unit()),
                ratioText(ratio),
                Double.isNaN(ratio) ? 0 : Math.min(1, Math.max(0, ratio / TRACK)),
                margin.holdsFrom() / TRACK,
                margin.verdict(),
                margin.condition(),
                margin.kind().meaning(),
                margin.formula(),
                margin.source(),
                margin.remedy(),
                margin.parts());
    }

    /** All margins, in the judge's order. */
    public static List<MarginRow> all(List<Margin> margins) {
        return margins.stream().map(MarginRow::of).toList();
    }

    private static String ratioText(double ratio) {
        if (Double.isNaN(ratio)) {
            return "–";
        }
        return ratio >= MOST_SHOWN ? "> 99" : String.format(Locale.ROOT, "%.2f", ratio);
    }

    /** The verdict's shape, for eyes that read no colour. */
    public static String shape(Verdict verdict) {
        return switch (verdict) {
            case HOLDS -> "●";
            case TIGHT -> "◐";
            case FAILS -> "✕";
            case NOT_JUDGED -> "○";
        };
    }

    /** The verdict's word as people read it. */
    public static String word(Verdict verdict) {
        return verdict.word().replace('-', ' ');
    }

    /** The whole row as a sentence. */
    public String sentence() {
        return name + " " + word(verdict) + ": asked " + asked + ", there is " + offered + ", ratio " + ratio
                + (condition.isEmpty() ? "" : ", worst at " + condition);
    }

    /** How many margins there are of each verdict, worst first: "2 fail, 1 tight, 14 hold". */
    public static String summary(List<MarginRow> rows) {
        return List.of(Verdict.FAILS, Verdict.TIGHT, Verdict.NOT_JUDGED, Verdict.HOLDS).stream()
                .filter(verdict -> count(rows, verdict) > 0)
                .map(verdict -> count(rows, verdict) + " " + plural(verdict, count(rows, verdict)))
                .collect(Collectors.joining(" · "));
    }

    private static long count(List<MarginRow> rows, Verdict verdict) {
        return rows.stream().filter(row -> row.verdict() == verdict).count();
    }

    private static String plural(Verdict verdict, long count) {
        return switch (verdict) {
            case FAILS -> count == 1 ? "fails" : "fail";
            case TIGHT -> "tight";
            case NOT_JUDGED -> "not judged";
            case HOLDS -> count == 1 ? "holds" : "hold";
        };
    }
}
