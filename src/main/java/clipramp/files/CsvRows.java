package clipramp.files;

import java.util.ArrayList;
import java.util.List;

/**
 * Comma-separated values as RFC 4180 has them: a field in quotes may hold commas, line ends and doubled quotes. Beyond it,
 * a record that begins with # is a remark, empty lines are passed over, and a bare line feed ends a record too.
 */
final class CsvRows {
    /**
     * @param text what stands in it, without its quotes
     * @param line from 1
     * @param column of its first sign, from 1, in code points
     */
    record Field(String text, int line, int column) {}

    private final String file;
    private final int[] signs;
    private final Findings findings;
    private int at;
    private int line = 1;
    private int column = 1;

    private CsvRows(Source source, Findings findings) {
        file = source.name();
        signs = source.text().codePoints().toArray();
        this.findings = findings;
    }

    /** Every record with at least one field that is not empty. */
    static List<List<Field>> of(Source source, Findings findings) {
        return new CsvRows(source, findings).all();
    }

    private List<List<Field>> all() {
        List<List<Field>> rows = new ArrayList<>();
        while (at < signs.length) {
            if (signs[at] == '#') {
                remark();
                continue;
            }
            List<Field> row = new ArrayList<>();
            do {
                row.add(field());
            } while (tookComma());
            if (row.stream().anyMatch(field -> !field.text().isBlank())) {
                rows.add(row);
            }
        }
        return rows;
    }

    private void remark() {
        while (at < signs.length && signs[at] != '\n') {
            step();
        }
        if (at < signs.length) {
            step();
        }
    }

    /** Steps over what ends a field; whether the record goes on behind it. */
    private boolean tookComma() {
        if (at >= signs.length) {
            return false;
        }
        boolean comma = signs[at] == ',';
        if (signs[at] == '\r' && at + 1 < signs.length && signs[at + 1] == '\n') {
            step();
        }
        step();
        return comma;
    }

    private Field field() {
        int startLine = line;
        int startColumn = column;
        StringBuilder text = new StringBuilder();
        if (at < signs.length && signs[at] == '"') {
            step();
            quoted(text, startLine, startColumn);
        }
        while (at < signs.length && signs[at] != ',' && signs[at] != '\n' && signs[at] != '\r') {
            text.appendCodePoint(signs[at]);
            step();
        }
        return new Field(text.toString().strip(), startLine, startColumn);
    }

    private void quoted(StringBuilder text, int startLine, int startColumn) {
        while (at < signs.length) {
            if (signs[at] == '"') {
                step();
                if (at >= signs.length || signs[at] != '"') {
                    return;
                }
            }
            text.appendCodePoint(signs[at]);
            step();
        }
        findings.problem(
                Place.of(file, startLine, startColumn), "", "a quote is opened here and never closed. Close it.");
    }

    private void step() {
        if (signs[at] == '\n') {
            line++;
            column = 1;
        } else {
            column++;
        }
        at++;
    }
}
