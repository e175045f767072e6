package clipramp.cli;

import java.util.ArrayList;
import java.util.List;

/**
 * Columns for reading: two spaces apart, words to the left, figures on their decimal sign.
 */
final class TextTable {
    /** How a column's cells line up. */
    enum Align {
        LEFT,
        RIGHT,
        /** On the decimal dot; words in such a column end where whole numbers end. */
        DECIMAL
    }

    private record Column(List<String> head, Align align) {}

    private static final String GAP = "  ";

    private final Spelling spelling;
    private final String indent;
    private final List<Column> columns = new ArrayList<>();
    private final List<List<String>> rows = new ArrayList<>();

    TextTable(Spelling spelling, String indent) {
        this.spelling = spelling;
        this.indent = indent;
    }

    /** Adds a column; every column has the same number of head lines, empty ones included. */
    TextTable column(Align align, String... head) {
        List<String> spelled = new ArrayList<>();
        for (String line : head) {
            spelled.add(spelling.of(line));
        }
        columns.add(new Column(spelled, align));
        return this;
    }

    TextTable row(String... cells) {
        return row(List.of(cells));
    }

    TextTable row(List<String> cells) {
        if (cells.size() != columns.size()) {
            throw new IllegalArgumentException(cells.size() + " cells for " + columns.size() + " columns");
        }
        rows.add(cells.stream().map(spelling::of).toList());
        return this;
    }

    /** Head lines and rows; no line ends in a space. */
    List<String> lines() {
        List<List<String>> laidOut = new ArrayList<>();
        for (int c = 0; c < columns.size(); c++) {
            laidOut.add(layOut(c));
        }
        int heads = columns.isEmpty() ? 0 : columns.get(0).head().size();
        List<String> lines = new ArrayList<>();
        for (int line = 0; line < heads + rows.size(); line++) {
            StringBuilder text = new StringBuilder(indent);
            for (int c = 0; c < columns.size(); c++) {
                text.append(c == 0 ? "" : GAP).append(laidOut.get(c).get(line));
            }
            String joined = text.toString().stripTrailing();
            if (!joined.isEmpty() || line >= heads) {
                lines.add(joined);
            }
        }
        return lines;
    }

    /** Every cell of one column, heads first, all padded to one width. */
    private List<String> layOut(int index) {
        Column column = columns.get(index);
        List<String> cells = rows.stream().map(row -> row.get(index)).toList();
        List<String> aligned = column.align() == Align.DECIMAL ? alignDots(cells) : cells;
        int width = 0;
        for (String cell : aligned) {
            width = Math.max(width, length(cell));
        }
        for (String head : column.head()) {
            width = Math.max(width, length(head));
        }
        List<String> all = new ArrayList<>();
        for (String head : column.head()) {
            all.add(pad(head, width, column.align()));
        }
        for (String cell : aligned) {
            all.add(pad(cell, width, column.align()));
        }
        return all;
    }

    private static List<String> alignDots(List<String> cells) {
        int after = cells.stream().mapToInt(TextTable::lengthFromDot).max().orElse(0);
        return cells.stream()
                .map(cell -> cell + " ".repeat(after - lengthFromDot(cell)))
                .toList();
    }

    private static int lengthFromDot(String cell) {
        boolean figure = !cell.isEmpty() && Character.isDigit(cell.charAt(cell.length() - 1));
        int dot = cell.indexOf('.');
        return figure && dot >= 0 ? cell.length() - dot : 0;
    }

    private static String pad(String cell, int width, Align align) {
        String space = " ".repeat(width - length(cell));
        return align == Align.LEFT ? cell + space : space + cell;
    }

    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }
}
