package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.margins.MarginKind;
import clipramp.margins.Verdict;
import java.util.ArrayList;
import java.util.List;

/** What a margin means, in words. */
final class MarginText {
    private MarginText() {}

    static List<String> explained(MarginKind kind, Spelling spelling) {
        List<String> lines = new ArrayList<>();
        lines.add(kind.id() + ": " + kind.title());
        lines.addAll(Paragraph.wrap(kind.meaning(), "  "));
        lines.add("");
        lines.addAll(Paragraph.wrap(kind.formula(), "  formula   ", "            "));
        lines.addAll(Paragraph.wrap(kind.source(), "  source    ", "            "));
        lines.addAll(Paragraph.wrap(kind.remedy(), "  to do     ", "            "));
        TextTable table = new TextTable(spelling, "  ").column(Align.LEFT, "").column(Align.LEFT, "");
        table.row("unit    ", kind.unit().isEmpty() ? "none" : kind.unit());
        table.row("holds", "from a ratio of " + Shown.fixed(kind.holdsFrom(), 1) + ", fails under 1" + atWorst(kind));
        table.row("moved by", String.join(", ", kind.parts()));
        lines.addAll(table.lines());
        return lines;
    }

    private static String atWorst(MarginKind kind) {
        return kind.gravest() == Verdict.FAILS
                ? ""
                : "; at worst " + kind.gravest().word();
    }

    static void write(Json json, MarginKind kind) {
        json.put("id", kind.id())
                .put("name", kind.title())
                .put("meaning", kind.meaning())
                .put("formula", kind.formula())
                .put("source", kind.source())
                .put("remedy", kind.remedy())
                .put("unit", kind.unit())
                .put("sense", kind.sense().word())
                .put("holdsFrom", kind.holdsFrom())
                .put("gravest", kind.gravest().word())
                .putWords("parts", kind.parts());
    }
}
