package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.cli.TextTable.Align;
import clipramp.files.LoadedDesign;
import clipramp.fit.FitResult;
import clipramp.fit.Fitted;
import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Fitted.Within;
import clipramp.fit.Quality;
import clipramp.fit.Residual;
import clipramp.fit.Together;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** A fit for people: what is told, what is not, what does not belong, and how well it all fits. */
final class FitText {
    private static final int FIGURES = 4;
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
                + count(result.readings().count(), "reading") + " on "
                + count(result.readings().lines().size(), "line") + ".");
        out.line(Caution.LINE);
        out.line("");
        String title = loaded.design().title();
        out.strongLine(title.isEmpty() ? "Untitled design" : title, "  (" + loaded.name() + ")");
        loaded.overrides().forEach(override -> out.line("  with " + override));
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

    private static String count(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }

    private void strangers() {
        if (result.strangers().isEmpty()) {
            out.line("Every reading belongs.");
        } else {
            out.strongLine("Do not belong", " (left out of the fit; read them again)");
            for (Residual stranger : result.strangers()) {
                out.lines(Paragraph.wrap(
                        "line " + stranger.line() + ", " + stranger.column() + ": read "
                                + amount(stranger.read(), stranger.unit()) + "; the others say "
                                + amount(stranger.shown(), stranger.unit()) + ", "
                                + Shown.fixed(Math.abs(stranger.deviations()), 1) + " standard deviations off.",
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
                amount(value.nominal(), value.unit()),
                amount(value.value(), value.unit()),
                amount(value.from(), value.unit()) + " .. " + amount(value.to(), value.unit()),
                signedPercent(value.difference()),
                verdict(value)));
        out.lines(table.lines());
        out.line("");
    }

    private static String verdict(Fitted value) {
        String word = value.within().word();
        return value.limitsAssumed() && value.within() != Within.UNKNOWN ? word + " (ours)" : word;
    }

    static String amount(double value, Unit unit) {
        return QuantityText.format(value, unit, FIGURES);
    }

    static String signedPercent(double share) {
        String text = Shown.fixed(100 * share, 1);
        return (text.startsWith("-") || text.equals("0.0") ? "" : "+") + text + " %";
    }

    private void untold() {
        String untold = result.values().stream()
                .filter(value -> value.knowledge() == Knowledge.NOT_TOLD)
                .map(Fitted::name)
                .collect(Collectors.joining(", "));
        if (!untold.isEmpty()) {
            out.lines(Paragraph.wrap(
                    "The readings cannot tell: " + untold + ". These keep the design's values and limits.", "", "  "));
            out.line("");
        }
    }

    private void together() {
        if (result.together().isEmpty()) {
            return;
        }
        out.line("Told only together (correlation)");
        result.together().stream().limit(MOST_TOGETHER).forEach(pair -> out.line("  " + sentence(result, pair)));
        out.line("");
    }

    static String sentence(FitResult result, Together pair) {
        String first = result.value(pair.first()).map(Fitted::name).orElse(pair.first());
        String second = result.value(pair.second()).map(Fitted::name).orElse(pair.second());
        return first + " and " + second + ", " + Shown.fixed(pair.correlation(), 2) + ": "
                + (pair.correlation() < 0 ? "more of one with less of the other" : "more of both")
                + " reads nearly alike";
    }

    private void quality() {
        Quality quality = result.quality();
        String condition = quality.condition().isPresent()
                ? "; the best told is "
                        + QuantityText.number(quality.condition().getAsDouble(), 2)
                        + " times better told than the worst"
                : "; some combination is not told at all";
        out.lines(Paragraph.wrap(
                "The readings tell " + count(quality.directions(), "independent combination") + " of "
                        + count(quality.unknowns(), "value") + condition + ".",
                "",
                "  "));
        String scatter = quality.widened() > 1
                ? "They scatter " + Shown.fixed(quality.widened(), 1)
                        + " times as far as the instruments' accuracies explain; the intervals are widened by that."
                : "They scatter no more than the instruments' accuracies explain.";
        out.lines(Paragraph.wrap(scatter, "", "  "));
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
                        amount(residual.read(), residual.unit()),
                        amount(residual.shown(), residual.unit()),
                        Shown.fixed(residual.deviations(), 1) + (residual.belongs() ? "" : " out"));
            }
        }
        out.lines(table.lines());
        out.line("");
    }

    private boolean isReading(Residual residual) {
        return result.residuals().indexOf(residual) < result.readings().count();
    }

    /** How the fit was made, and what was assumed. */
    static List<String> notes(FitResult result) {
        List<String> notes = new ArrayList<>();
        notes.add(
                "Accuracies hold for 19 readings in 20; where a head says none, the usual ones: firing angle 1°, delay"
                        + " 1 % + 20 µs, load true rms 1 % + 0.2 V, average-reading 1.5 % + 0.2 V, power 2 % + 0.5 W, base one"
                        + " 3 % + 50 mV, supply and peak point 2 %, ohmmeter 0.5 % + 1 Ω, line 1 %, knob 1 % of its travel.");
        notes.add(
                "Before any reading, every value is taken as its design's with one standard deviation to its tolerance or"
                        + " data-sheet limit (a weak prior): what no reading moves stays there. Told means that half or less of that"
                        + " uncertainty is left.");
        String ours = result.values().stream()
                .filter(Fitted::limitsAssumed)
                .map(value -> value.name() + " " + amount(value.low(), value.unit()) + " .. "
                        + amount(value.high(), value.unit()))
                .collect(Collectors.joining("; "));
        if (!ours.isEmpty()) {
            notes.add("Limits of ours, because the design states none: " + ours + ".");
        }
        if (result.value(FitResult.LINE_PATH).isPresent()) {
            notes.add("The line voltage was not read on every line; there it is fitted as one value for the day.");
        }
        return notes;
    }

    /** The condition that stands in a machine's answer. */
    static Condition condition(LoadedDesign loaded, FitResult result) {
        Condition nominal = loaded.design().nominalCondition();
        return new Condition(
                nominal.lineVolts(), nominal.lineHertz(), result.readings().celsius());
    }
}
