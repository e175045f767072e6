package clipramp.cli;

import clipramp.margins.MarginKind;
import java.util.ArrayList;
import java.util.List;

/** What a margin means, in words. */
final class MarginText {
    private MarginText() {}

    static List<String> explained(MarginKind kind) {
        List<String> lines = new ArrayList<>();
        lines.add(kind.id() + ": " + kind.title());
        lines.addAll(Paragraph.wrap(kind.meaning(), "  "));
        return lines;
    }

    static void write(Json json, MarginKind kind) {
        json.put("id", kind.id()).put("name", kind.title()).put("meaning", kind.meaning());
    }
}
