package clipramp.desk.model;

import clipramp.figures.NumberTable;
import java.util.List;
import java.util.stream.Collectors;

/** A figure's numbers as text for files and for the clipboard. */
public final class TableText {
    private TableText() {}

    /** Comma-separated values (RFC 4180): quoted where needed, lines ended by CR LF, a plain minus. */
    public static String csv(NumberTable table) {
        StringBuilder out = new StringBuilder();
        line(out, table.heads());
        table.rows().forEach(row -> line(out, row));
        return out.toString();
    }

    private static void line(StringBuilder out, List<String> cells) {
        out.append(cells.stream().map(TableText::cell).collect(Collectors.joining(",")))
                .append("\r\n");
    }

    private static String cell(String text) {
        String plain = plain(text);
        return plain.contains(",") || plain.contains("\"") || plain.contains("\n")
                ? '"' + plain.replace("\"", "\"\"") + '"'
                : plain;
    }

    /** Tab-separated, as spreadsheets take it from the clipboard. */
    public static String tabbed(NumberTable table) {
        StringBuilder out = new StringBuilder(String.join("\t", table.heads())).append('\n');
        table.rows()
                .forEach(row -> out.append(row.stream().map(TableText::plain).collect(Collectors.joining("\t")))
                        .append('\n'));
        return out.toString();
    }

    private static String plain(String text) {
        return text.equals("–") ? "" : text.replace('−', '-').replace('\t', ' ');
    }
}
