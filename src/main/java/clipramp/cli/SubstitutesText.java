package clipramp.cli;

import clipramp.cli.Substitutes.Substitute;
import clipramp.cli.TextTable.Align;
import clipramp.files.LoadedDesign;
import clipramp.margins.Margin;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What could stand in a design's place, for people and for machines. */
final class SubstitutesText {
    private SubstitutesText() {}

    static void print(Output out, LoadedDesign loaded, List<Substitute> found) {
        CheckText.heading(out, loaded, loaded.design().nominalCondition());
        out.line("");
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.LEFT, "in place of")
                .column(Align.LEFT, "device")
                .column(Align.LEFT, "verdict")
                .column(Align.LEFT, "the margin that decides")
                .column(Align.DECIMAL, "ratio")
                .column(Align.LEFT, "worst at");
        for (Substitute s : found) {
            table.row(
                    s.key(),
                    s.id() + (s.original() ? " (its own)" : s.changes().isEmpty() ? "" : " (other kind)"),
                    s.check().map(c -> c.verdict().word()).orElse("not usable"),
                    s.deciding().map(Margin::name).orElse(s.refusal()),
                    s.deciding().map(SubstitutesText::ratio).orElse(""),
                    s.deciding().map(Margin::condition).orElse(""));
        }
        out.lines(table.lines());
        out.line("");
        changes(out, found);
        out.lines(Paragraph.wrap(
                "Each device is put there alone, everything else unchanged but for what is listed. Pinout, package and"
                        + " mounting are not compared.",
                ""));
    }

    /** What a trigger device of the other kind wants around it, as it can be tried with check. */
    private static void changes(Output out, List<Substitute> found) {
        List<Substitute> changed =
                found.stream().filter(s -> !s.changes().isEmpty()).toList();
        if (changed.isEmpty()) {
            return;
        }
        out.line("The other kind of trigger device, and what changes with it");
        for (Substitute s : changed) {
            out.lines(Paragraph.wrap(s.id() + ": " + String.join("; ", s.changes()), "  ", "    "));
        }
        out.line("");
    }

    private static String ratio(Margin margin) {
        return Shown.fixed(margin.ratio().orElse(Double.NaN), 2);
    }

    static String json(LoadedDesign loaded, List<Substitute> found, boolean ascii) {
        return new Answer("parts", Optional.of(loaded), Optional.empty(), List.of())
                .json(
                        ascii,
                        json -> json.putObjects("substitutes", found, (o, s) -> {
                            o.put("path", s.key())
                                    .put("id", s.id())
                                    .put("original", s.original())
                                    .put(
                                            "verdict",
                                            s.check()
                                                    .map(c -> c.verdict().word())
                                                    .orElse(null))
                                    .put("refusal", s.refusal())
                                    .putWords("changes", s.changes());
                            o.put("decidingMargin", s.deciding().map(Margin::id).orElse(null))
                                    .put(
                                            "ratio",
                                            s.deciding().map(Margin::ratio).orElse(OptionalDouble.empty()))
                                    .put(
                                            "condition",
                                            s.deciding().map(Margin::condition).orElse(null));
                        }));
    }
}
