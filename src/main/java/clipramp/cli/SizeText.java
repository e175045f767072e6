package clipramp.cli;

import clipramp.circuit.Pot;
import clipramp.cli.TextTable.Align;
import clipramp.files.DesignText;
import clipramp.files.LoadedDesign;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.sizing.Compensation;
import clipramp.sizing.Compensation.Choice;
import clipramp.sizing.KnobShape;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.sizing.SizingWords;
import clipramp.sizing.UnitSetting;
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
        settings();
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
        out.strongLine(SizingWords.headline(answer), SizingWords.clause(answer));
        SizingWords.extremes(answer).ifPresent(words -> out.lines(Paragraph.wrap(words, "  ")));
        out.line("  " + SizingWords.figures(answer));
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
            out.lines(Paragraph.wrap(r.part().key() + ": " + SizingWords.reason(r), "  ", "    "));
        }
    }

    private void settings() {
        List<UnitSetting> settings = UnitSetting.of(answer.design());
        if (settings.isEmpty()) {
            return;
        }
        out.line("");
        out.line("Every unit is set once, at nominal line voltage and near 25 °C, with a meter that reads true rms");
        settings.forEach(s -> out.lines(Paragraph.wrap(SizingWords.setting(s), "  ", "    ")));
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
        out.lines(Paragraph.wrap(SizingWords.shape(shape), "  "));
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
            out.lines(Paragraph.wrap(SizingWords.conflict(c), "  ", "    "));
        }
    }
}
