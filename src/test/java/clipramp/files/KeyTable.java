package clipramp.files;

import java.util.List;

/** The table of every key, as the README shows it. */
public final class KeyTable {
    private KeyTable() {}

    /** Markdown: key, what stands there, unit, range, default, who needs it, meaning. */
    public static String markdown() {
        StringBuilder table = new StringBuilder();
        table.append("| key | takes | range | default | needed by | meaning |\n");
        table.append("|---|---|---|---|---|---|\n");
        for (Key key : KeyCatalogue.standard().all()) {
            List<String> cells = List.of(
                    "`" + key.path() + "`",
                    key.kind().inWords(),
                    range(key),
                    key.standardInWords(),
                    key.neededBy(),
                    key.meaning());
            table.append("| ")
                    .append(String.join(
                            " | ", cells.stream().map(KeyTable::cell).toList()))
                    .append(" |\n");
        }
        return table.toString();
    }

    private static String range(Key key) {
        String range = key.range();
        return range.equals(key.kind().inWords()) ? "" : range;
    }

    private static String cell(String text) {
        return text.replace("|", "\\|");
    }
}
