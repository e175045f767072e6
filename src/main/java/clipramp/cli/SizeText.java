package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.margins.Margin;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.units.Unit;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** What size found, for reading. */
final class SizeText {
    private final Output out;
    private final LoadedDesign loaded;
    private final PartialDesign partial;
    private final SizingAnswer answer;

    SizeText(Output out, LoadedDesign loaded, PartialDesign partial, SizingAnswer answer) {
        this.out = out;
        this.loaded = loaded;
        this.partial = partial;
        this.answer = answer;
    }

    void print(List<Reason> reasons, DesignText text, @Nullable String written) {
        CheckText.heading(out, loaded, answer.check().condition());
        partial.notes().forEach(note -> out.lines(Paragraph.wrap(note, "  ")));
        out.line("");
        outcome();
        out.line("");
        parts(reasons);
        conflicts();
        out.line("");
        if (written == null) {
            out.line("The design file (--out=FILE writes it)");
            out.line("");
            out.exactly(text.text());
        } else {
            out.line("Written: " + written);
            out.line("Next: clipramp check " + written);
        }
    }

    private void outcome() {
        switch (answer.outcome()) {
            case WORST_CASE ->
                out.strongLine(
                        "Holds in the worst case",
                        ": no margin fails, neither with nominal parts nor for the fastest and the slowest unit.");
            case NOMINAL -> {
                out.strongLine("Holds with nominal parts", ": no margin fails at any line and temperature.");
                out.lines(Paragraph.wrap(
                        "For the fastest or the slowest unit that the tolerances allow these fail: " + names()
                                + ". About " + Shown.amount(answer.yield(), Unit.FRACTION)
                                + " of all units reach everything that is wanted without selection or trimming.",
                        "  "));
            }
            case NOTHING -> out.strongLine("Nothing holds", "; this is the nearest that was found.");
        }
        out.line("  " + Shown.amount(answer.watts(), Unit.WATT) + " in the firing circuit, "
                + Shown.amount(answer.deadTravel(), Unit.FRACTION) + " of the rotation lies past what is wanted, "
                + answer.candidates() + (answer.candidates() == 1 ? " design" : " designs") + " judged.");
    }

    private String names() {
        return String.join(
                ", ", answer.cornerFailures().stream().map(Margin::name).toList());
    }

    private void parts(List<Reason> reasons) {
        TextTable table =
                new TextTable(out.spelling(), "  ").column(Align.LEFT, "Chosen").column(Align.LEFT, "");
        reasons.forEach(r -> table.row(
                r.part().key(), SizedText.value(r.part(), answer.design()).orElse(Shown.NONE)));
        out.lines(table.lines());
        out.line("");
        out.line("Why");
        for (Reason r : reasons) {
            out.lines(Paragraph.wrap(
                    r.part().key() + ": " + r.relation() + "." + neighbour("Up", r.up()) + neighbour("Down", r.down()),
                    "  ",
                    "    "));
        }
    }

    private static String neighbour(String which, String effect) {
        return effect.isEmpty() ? "" : " " + which + ", " + effect + ".";
    }

    private void conflicts() {
        if (answer.conflicts().isEmpty()) {
            return;
        }
        out.line("");
        out.line("What cannot be met");
        for (Conflict c : answer.conflicts()) {
            String with = c.with().isEmpty()
                    ? " No design that was tried meets it."
                    : " Where it is met, this fails: " + String.join(", ", c.with()) + ".";
            out.lines(Paragraph.wrap(c.margin().name() + ":" + with + " " + c.nearest(), "  ", "    "));
        }
    }
}
