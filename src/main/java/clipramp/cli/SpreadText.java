package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.files.LoadedDesign;
import clipramp.margins.MarginKind;
import clipramp.margins.Note;
import clipramp.spread.Influence;
import clipramp.spread.PositionSpread;
import clipramp.spread.Remedy;
import clipramp.spread.SpreadResult;
import clipramp.spread.SpreadWords;
import clipramp.spread.Yield;
import java.util.List;

/** A spread for people: yield first, then the bands, the worst case, what matters and what would help. */
final class SpreadText {
    /** Factors and remedies that are told; the rest matters less than the last of these. */
    private static final int TOLD = 8;

    private static final int LOW = 1;
    private static final int MIDDLE = 3;
    private static final int HIGH = 5;

    private final Output out;
    private final LoadedDesign loaded;
    private final SpreadResult result;
    private final List<Note> notes;

    SpreadText(Output out, LoadedDesign loaded, SpreadResult result, List<Note> notes) {
        this.out = out;
        this.loaded = loaded;
        this.result = result;
        this.notes = notes;
    }

    void print() {
        out.line("Drawn units, every tolerance included.");
        CheckText.title(out, loaded);
        out.line("");
        out.strongLine(
                "Yield",
                "  of " + result.units() + " drawn units, seed "
                        + result.options().seed());
        result.wanted().ifPresent(y -> out.line("  reach what is wanted   " + words(y)));
        result.margins().ifPresent(y -> out.line("  fail no margin         " + words(y)));
        result.failures().forEach((id, share) -> out.line("    " + SpreadWords.ofUnits(share) + " fail " + title(id)));
        bands();
        worstCase();
        influences();
        remedies();
        notes.forEach(note -> {
            out.line("");
            out.lines(Paragraph.wrap(note.text(), ""));
        });
    }

    private static String title(String id) {
        return MarginKind.byId(id).map(MarginKind::title).orElse(id);
    }

    private static String words(Yield yield) {
        return SpreadWords.ofUnits(yield.share()) + "  (" + yield.held() + " of " + yield.of() + "; 95 % interval "
                + SpreadWords.ofUnits(yield.low()) + " to " + SpreadWords.ofUnits(yield.high()) + ")";
    }

    private void bands() {
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.DECIMAL, "knob", "%")
                .column(Align.DECIMAL, "fires", "5 %")
                .column(Align.DECIMAL, "deg", "50 %")
                .column(Align.DECIMAL, "", "95 %")
                .column(Align.DECIMAL, "power", "5 %")
                .column(Align.DECIMAL, "% of full", "50 %")
                .column(Align.DECIMAL, "", "95 %")
                .column(Align.RIGHT, "stall", "%")
                .column(Align.RIGHT, "latch on", "%")
                .column(Align.RIGHT, "end pulse", "%")
                .column(Align.RIGHT, "stay off", "%");
        for (PositionSpread p : result.positions()) {
            table.row(
                    KnobText.position(p.position()),
                    degrees(p.firingRad().get(LOW)),
                    degrees(p.firingRad().get(MIDDLE)),
                    degrees(p.firingRad().get(HIGH)),
                    share(p.fraction().get(LOW)),
                    share(p.fraction().get(MIDDLE)),
                    share(p.fraction().get(HIGH)),
                    SpreadWords.unitsInPercent(p.stalls()),
                    SpreadWords.unitsInPercent(p.latchedOn()),
                    SpreadWords.unitsInPercent(p.endPulse()),
                    SpreadWords.unitsInPercent(p.misfires()));
        }
        out.line("");
        out.strongLine("By knob position", "  (so many of a hundred units lie under each figure)");
        out.lines(table.lines());
    }

    private void worstCase() {
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.DECIMAL, "knob", "%")
                .column(Align.DECIMAL, "earliest", "deg")
                .column(Align.DECIMAL, "nominal", "deg")
                .column(Align.DECIMAL, "latest", "deg")
                .column(Align.DECIMAL, "root-sum-square", "deg")
                .column(Align.DECIMAL, "least", "% of full")
                .column(Align.DECIMAL, "nominal", "% of full")
                .column(Align.DECIMAL, "most", "% of full");
        for (PositionSpread p : result.positions()) {
            var fires = p.worstFiring();
            var power = p.worstFraction();
            table.row(
                    KnobText.position(p.position()),
                    degrees(fires.least()),
                    degrees(fires.nominal()),
                    degrees(fires.greatest()),
                    degrees(fires.rssLeast()) + " to " + degrees(fires.rssGreatest()),
                    share(power.least()),
                    share(power.nominal()),
                    share(power.greatest()));
        }
        out.line("");
        out.strongLine("Worst case", "  (180 deg: stays off)");
        out.lines(table.lines());
    }

    private void influences() {
        if (result.influences().isEmpty()) {
            return;
        }
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "", "")
                .column(Align.DECIMAL, "alone", "% of variance")
                .column(Align.DECIMAL, "with others", "% of variance")
                .column(Align.DECIMAL, "power at its low end", "% of full")
                .column(Align.DECIMAL, "at its high end", "% of full");
        for (Influence i : result.influences()
                .subList(0, Math.min(TOLD, result.influences().size()))) {
            table.row(
                    i.name(), share(i.firstOrder()), share(i.total()), share(i.fractionLow()), share(i.fractionHigh()));
        }
        out.line("");
        out.strongLine("What matters", "  " + result.sentence());
        out.lines(table.lines());
    }

    private void remedies() {
        List<Remedy> helping =
                result.remedies().stream().filter(r -> r.gain() > 0).limit(TOLD).toList();
        if (helping.isEmpty()) {
            return;
        }
        out.line("");
        out.strongLine("What would help", "  (yield against what is wanted, one change at a time)");
        helping.forEach(r -> out.line("  " + SpreadWords.ofUnits(r.yield().share()) + "  (+"
                + SpreadWords.percent(r.gain()) + ")  " + r.change()));
    }

    private static String degrees(double rad) {
        return Shown.fixed(Math.toDegrees(rad), 1);
    }

    private static String share(double fraction) {
        return Shown.fixed(100 * fraction, 1);
    }
}
