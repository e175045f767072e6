package clipramp.cli;

import clipramp.circuit.Pot;
import clipramp.cli.TextTable.Align;
import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.margins.Margin;
import clipramp.sizing.Compensation;
import clipramp.sizing.Compensation.Choice;
import clipramp.sizing.KnobShape;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/** What size found, for reading. */
final class SizeText {
    private final Output out;
    private final LoadedDesign loaded;
    private final PartialDesign partial;
    private final SizedResult result;
    private final SizingAnswer answer;

    SizeText(Output out, LoadedDesign loaded, PartialDesign partial, SizedResult result) {
        this.out = out;
        this.loaded = loaded;
        this.partial = partial;
        this.result = result;
        this.answer = result.answer();
    }

    void print(DesignText text, @Nullable String written) {
        CheckText.heading(out, loaded, answer.check().condition());
        partial.notes().forEach(note -> out.lines(Paragraph.wrap(note, "  ")));
        out.line("");
        outcome();
        out.line("");
        parts(result.reasons());
        result.shape().ifPresent(this::shape);
        result.compensation().ifPresent(this::compensation);
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

    private void shape(KnobShape shape) {
        Pot pot = answer.design().ramp().pot().orElse(null);
        out.line("");
        out.line("Knob, " + shape.what().name().toLowerCase(Locale.ROOT) + " against rotation");
        if (pot != null) {
            out.lines(Paragraph.wrap(
                    "Pot: " + pot.law().word()
                            + pot.shunt()
                                    .map(p -> ", " + Shown.amount(p.value(), Unit.OHM) + " across it")
                                    .orElse("") + ".",
                    "  "));
        }
        out.lines(Paragraph.wrap(
                "Farthest from a straight line " + Shown.amount(shape.largestDeparture(), Unit.FRACTION)
                        + " of full; nothing moves over " + Shown.amount(shape.deadLow(), Unit.FRACTION)
                        + " of the rotation at the low end and " + Shown.amount(shape.deadHigh(), Unit.FRACTION)
                        + " at the high end; the steepest degree of " + Shown.fixed(KnobShape.ROTATION_DEGREES, 0)
                        + " makes " + Shown.amount(shape.steepestPerDegree(), Unit.FRACTION) + ".",
                "  "));
    }

    private void compensation(Compensation compensation) {
        out.line("");
        out.line("Base two against temperature, " + Shown.amount(coldest(), Unit.CELSIUS) + " to "
                + Shown.amount(hottest(), Unit.CELSIUS) + ", at mid-knob");
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "rule")
                .column(Align.RIGHT, "resistor")
                .column(Align.DECIMAL, "angle moves, °");
        List<Choice> choices = new ArrayList<>(List.of(compensation.flattest()));
        choices.addAll(compensation.rules());
        choices.forEach(c ->
                table.row(c.rule(), Shown.amount(c.ohms(), Unit.OHM), Shown.fixed(Math.toDegrees(c.driftRad()), 3)));
        out.lines(table.lines());
    }

    private double coldest() {
        return answer.design().surroundings().coldestCelsius();
    }

    private double hottest() {
        return answer.design().surroundings().hottestCelsius();
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
