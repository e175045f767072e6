package clipramp.desk.model;

import clipramp.files.ReadingsFile;
import clipramp.files.ReadingsTable;
import clipramp.files.Source;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** The table of bench readings that is being typed: which columns there are, how accurate each is, and the cells. */
public final class BenchSheet {
    private static final Pattern HEAD = Pattern.compile("(.*?)\\s*(?:±|\\+-)\\s*(.+)");
    private static final int ROWS_AT_FIRST = 6;

    /** What is usually read first. */
    private static final List<String> USUAL =
            List.of("knob (%)", "line voltage (V)", "firing angle (deg)", "load voltage (V true-rms)");

    /** Of a fixed ramp there is nothing to set. */
    private static final List<String> USUAL_FIXED =
            List.of("line voltage (V)", "firing angle (deg)", "load voltage (V true-rms)");

    /** One column. */
    public static final class Column {
        private final String head;
        private String accuracy = "";
        private boolean shown;

        private Column(String head) {
            this.head = head;
        }

        /** What stands over it, with its unit, without its accuracy. */
        public String head() {
            return head;
        }

        /** As typed; empty for the usual one. */
        public String accuracy() {
            return accuracy;
        }

        /** Takes an accuracy as typed, such as 1 or 2 %; one decimal comma becomes a dot. */
        public void setAccuracy(String typed) {
            accuracy = tidied(typed);
        }

        /** Whether it is to be seen. */
        public boolean isShown() {
            return shown;
        }

        /** Shows it or hides it; what stands in it stays. */
        public void setShown(boolean wanted) {
            shown = wanted;
        }

        /** The head as a file has it. */
        public String written() {
            return accuracy.isEmpty() ? head : head + " ±" + accuracy;
        }
    }

    private final List<Column> columns = new ArrayList<>();
    private final List<Map<String, String>> rows = new ArrayList<>();

    /**
     * @param hasKnob whether there is a knob to set
     */
    public BenchSheet(boolean hasKnob) {
        clear();
        columns.forEach(column -> column.setShown((hasKnob ? USUAL : USUAL_FIXED).contains(column.head())));
        grow(ROWS_AT_FIRST);
    }

    private void clear() {
        columns.clear();
        rows.clear();
        ReadingsFile.heads().forEach(head -> columns.add(new Column(head)));
    }

    /** Every column that there may be. */
    public List<Column> columns() {
        return List.copyOf(columns);
    }

    /** Those that are to be seen, in their order. */
    public List<Column> shown() {
        return columns.stream().filter(Column::isShown).toList();
    }

    /** Rows there are, empty ones included. */
    public int rowCount() {
        return rows.size();
    }

    /** Makes it at least so many rows long. */
    public void grow(int count) {
        while (rows.size() < count) {
            rows.add(new HashMap<>());
        }
    }

    /** What stands in a cell; empty where nothing does. Rows count from 0. */
    public String cell(int row, Column column) {
        return rows.get(row).getOrDefault(column.head(), "");
    }

    /** Puts what was typed into a cell; one decimal comma becomes a dot. */
    public void set(int row, Column column, String typed) {
        grow(row + 1);
        rows.get(row).put(column.head(), tidied(typed));
    }

    /** Whether a row holds nothing at all. */
    boolean isEmpty(int row) {
        return rows.get(row).values().stream().allMatch(String::isBlank);
    }

    /** A number with a decimal comma as one with a dot; what could be a thousand as well stays, to be asked back. */
    static String tidied(String typed) {
        String plain = typed.strip();
        boolean clear = plain.matches("[+-]?\\d+,\\d+( ?%)?") && !plain.matches("[+-]?\\d{1,3},\\d{3}");
        return clear ? plain.replace(',', '.') : plain;
    }

    /** What is shown, as a file would have it: row n stands on line n + 2, from 0. */
    public ReadingsTable table() {
        List<Column> seen = shown();
        return new ReadingsTable(
                seen.stream().map(Column::written).toList(),
                rows.stream()
                        .map(row -> seen.stream()
                                .map(column -> row.getOrDefault(column.head(), ""))
                                .toList())
                        .toList());
    }

    /** Takes a whole table in place of what stands here. */
    public void load(ReadingsTable table) {
        clear();
        List<Column> into = new ArrayList<>();
        for (String head : table.heads()) {
            into.add(column(head));
        }
        for (List<String> row : table.rows()) {
            Map<String, String> cells = new HashMap<>();
            for (int c = 0; c < into.size(); c++) {
                cells.put(into.get(c).head(), tidied(row.get(c)));
            }
            rows.add(cells);
        }
        grow(rows.size() + 1);
    }

    private Column column(String written) {
        Matcher match = HEAD.matcher(written.strip());
        String head = match.matches() ? match.group(1) : written.strip();
        Column column = known(head).orElseGet(() -> {
            Column made = new Column(head);
            columns.add(made);
            return made;
        });
        column.setShown(!head.isEmpty());
        column.setAccuracy(match.matches() ? match.group(2) : "");
        return column;
    }

    private Optional<Column> known(String head) {
        return columns.stream().filter(c -> c.head().equalsIgnoreCase(head)).findFirst();
    }

    /**
     * Takes what was copied from a spreadsheet or a file: with its heads a whole table, else cells from a place on.
     *
     * @param row where the keyboard stands
     * @param at column there
     * @param text several lines, or cells parted by tabs, semicolons or commas
     */
    public void paste(int row, Column at, String text) {
        String part = text.contains("\t") ? "\t" : text.contains(";") ? ";" : ",";
        List<List<String>> cells = text.lines()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .map(line -> List.of(line.split(part, -1)))
                .toList();
        if (cells.isEmpty()) {
            return;
        }
        if (cells.get(0).stream().anyMatch(cell -> cell.contains("("))) {
            String csv = part.equals(",") ? text : asCsv(cells);
            load(ReadingsTable.of(new Source("what was pasted", csv)));
            return;
        }
        List<Column> seen = shown();
        int first = Math.max(0, seen.indexOf(at));
        for (int r = 0; r < cells.size(); r++) {
            for (int c = 0; c < cells.get(r).size() && first + c < seen.size(); c++) {
                set(row + r, seen.get(first + c), cells.get(r).get(c));
            }
        }
        grow(row + cells.size() + 1);
    }

    private static String asCsv(List<List<String>> cells) {
        return new ReadingsTable(
                        cells.get(0).stream().map(String::strip).toList(),
                        cells.subList(1, cells.size()).stream()
                                .map(row -> row.stream().map(BenchSheet::tidied).collect(Collectors.toList()))
                                .toList())
                .csv();
    }
}
