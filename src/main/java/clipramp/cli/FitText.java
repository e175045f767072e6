package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.cli.TextTable.Align;
import clipramp.files.LoadedDesign;
import clipramp.fit.FitResult;
import clipramp.fit.FitWords;
import clipramp.fit.Fitted;
import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Residual;
import java.util.List;

/** A fit for people: what is told, what is not, what does not belong, and how well it all fits. */
final class FitText {
    private static final int MOST_TOGETHER = 5;

    private final Output out;
    private final LoadedDesign loaded;
    private final FitResult result;
    private final List<String> notes;

    FitText(Output out, LoadedDesign loaded, FitResult result, List<String> notes) {
        this.out = out;
        this.loaded = loaded;
        this.result = result;
        this.notes = notes;
    }

    void print() {
        out.line("One unit, from " + result.readings().name() + ": "
                + FitWords.count(result.readings().count(), "reading") + " on "
                + FitWords.count(result.readings().lines().size(), "line") + ".");
        CheckText.title(out, loaded);
        out.line("  at " + Shown.fixed(result.readings().celsius(), 0) + " °C");
        out.line("");
        strangers();
        table("Told by the readings", Knowledge.TOLD);
        table("Narrowed, not told", Knowledge.NARROWED);
        untold();
        together();
        quality();
        residuals();
        notes.forEach(note -> out.lines(Paragraph.wrap(note, "  ", "    ")));
    }

    private void strangers() {
        if (result.strangers().isEmpty()) {
            out.line(FitWords.noStrangers(result));
        } else {
            out.strongLine("Do not belong", " (left out of the fit; read them again)");
            for (Residual stranger : result.strangers()) {
                out.lines(Paragraph.wrap(
                        "line " + stranger.line() + ", " + stranger.column() + ": " + FitWords.stranger(stranger),
                        "  ",
                        "    "));
            }
        }
        out.line("");
    }

    private void table(String head, Knowledge knowledge) {
        List<Fitted> values = result.values().stream()
                .filter(value -> value.knowledge() == knowledge)
                .toList();
        if (knowledge == Knowledge.TOLD && !result.isTelling()) {
            out.line("The readings tell none of the unit's values.");
            out.line("");
        }
        if (values.isEmpty()) {
            return;
        }
        out.line(head);
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "")
                .column(Align.LEFT, "design")
                .column(Align.LEFT, "as built")
                .column(Align.LEFT, "95 % interval")
                .column(Align.RIGHT, "difference")
                .column(Align.LEFT, "tolerance");
        values.forEach(value -> table.row(
                value.name(),
                FitWords.amount(value.nominal(), value.unit()),
                FitWords.amount(value.value(), value.unit()),
                FitWords.amount(value.from(), value.unit()) + " .. " + FitWords.amount(value.to(), value.unit()),
                FitWords.signedPercent(value.difference()),
                FitWords.verdict(value)));
        out.lines(table.lines());
        out.line("");
    }

    private void untold() {
        FitWords.untold(result).ifPresent(words -> {
            out.lines(Paragraph.wrap(words, "", "  "));
            out.line("");
        });
    }

    private void together() {
        if (result.together().isEmpty()) {
            return;
        }
        out.line("Told only together (correlation)");
        result.together().stream()
                .limit(MOST_TOGETHER)
                .forEach(pair -> out.line("  " + FitWords.together(result, pair)));
        out.line("");
    }

    private void quality() {
        FitWords.quality(result).forEach(words -> out.lines(Paragraph.wrap(words, "", "  ")));
        out.line("");
    }

    private void residuals() {
        out.line("Reading by reading");
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.RIGHT, "line")
                .column(Align.LEFT, "what")
                .column(Align.LEFT, "read")
                .column(Align.LEFT, "this unit")
                .column(Align.DECIMAL, "deviations");
        for (Residual residual : result.residuals()) {
            if (isReading(residual)) {
                table.row(
                        Integer.toString(residual.line()),
                        residual.what(),
                        FitWords.amount(residual.read(), residual.unit()),
                        FitWords.amount(residual.shown(), residual.unit()),
                        FitWords.deviations(residual));
            }
        }
        out.lines(table.lines());
        out.line("");
    }

    private boolean isReading(Residual residual) {
        return result.residuals().indexOf(residual) < result.readings().count();
    }

    /** The condition that stands in a machine's answer. */
    static Condition condition(LoadedDesign loaded, FitResult result) {
        Condition nominal = loaded.design().nominalCondition();
        return new Condition(
                nominal.lineVolts(), nominal.lineHertz(), result.readings().celsius());
    }
}
