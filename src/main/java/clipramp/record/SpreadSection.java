package clipramp.record;

import clipramp.figures.SpreadFigure;
import clipramp.spread.PositionSpread;
import clipramp.spread.SpreadResult;
import clipramp.spread.SpreadWords;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;

/** A page on what many units do: yield, bands over the knob, worst case, what matters and what would help. */
final class SpreadSection {
    private SpreadSection() {}

    static void write(Paper paper, SpreadResult spread) {
        paper.newPage();
        paper.section("Spread: " + spread.units() + " units");
        SpreadFigure figure = new SpreadFigure(spread);
        paper.text(figure.sentence());
        SpreadWords.sentences(spread).forEach(paper::small);
        paper.figure(figure, paper.width() / 2.3f);
        bands(paper, spread);
        table(
                paper,
                "What matters at mid-knob: share of the variance of power, alone and in all",
                new float[] {3, 1, 1, 2},
                List.of("", "alone", "in all", "power from one limit to the other"),
                SpreadWords.influences(spread));
        table(
                paper,
                "What would help",
                new float[] {5, 1, 1},
                List.of("", "yield", "gain"),
                SpreadWords.remedies(spread));
        paper.quiet("Seed " + spread.options().seed() + ", law "
                + spread.options().law().word()
                + ": the same seed draws the same units. Worst case: a search over every limit on the exact engine, the"
                + " units drawn included.");
    }

    private static void bands(Paper paper, SpreadResult spread) {
        List<String> heads = new ArrayList<>(List.of("knob", "α 1 %", "α 50 %", "α 99 %"));
        SpreadResult.PERCENTAGES.forEach(p -> heads.add(String.format(Locale.ROOT, "P %.0f %%", p)));
        heads.addAll(List.of("least", "greatest"));
        float[] widths = new float[heads.size()];
        Arrays.fill(widths, 1);
        Grid grid =
                new Grid(paper.faces(), widths, IntStream.range(0, heads.size()).toArray());
        grid.heads(heads.toArray(String[]::new));
        for (PositionSpread at : spread.positions()) {
            List<String> cells = new ArrayList<>();
            cells.add(at.position().isPresent() ? percent(at.position().getAsDouble(), 0) : Shown.NOTHING);
            for (int i : new int[] {0, 3, 6}) {
                cells.add(String.format(
                        Locale.ROOT, "%.1f°", Math.toDegrees(at.firingRad().get(i))));
            }
            at.fraction().forEach(f -> cells.add(percent(f, 1)));
            cells.add(percent(at.worstFraction().least(), 1));
            cells.add(percent(at.worstFraction().greatest(), 1));
            grid.row(paper.faces().small(), cells);
        }
        paper.add(grid.table());
        paper.quiet("Firing angle α and share of full power P that so many percent of the units stay under; least and"
                + " greatest power of any unit within the limits.");
    }

    private static String percent(double share, int decimals) {
        return String.format(Locale.ROOT, "%." + decimals + "f %%", 100 * share);
    }

    private static void table(Paper paper, String title, float[] widths, List<String> heads, List<List<String>> rows) {
        if (rows.isEmpty()) {
            return;
        }
        paper.heading(title);
        Grid grid =
                new Grid(paper.faces(), widths, IntStream.range(1, heads.size()).toArray());
        grid.heads(heads.toArray(String[]::new));
        rows.forEach(row -> grid.row(paper.faces().small(), row));
        paper.add(grid.table());
    }
}
