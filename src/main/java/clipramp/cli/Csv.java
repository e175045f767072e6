package clipramp.cli;

import java.util.List;

/**
 * Comma-separated values as RFC 4180 has them: lines end in CR LF; a field with a comma, a quote or a line end is quoted
 * and its quotes are doubled. Numbers are written with a dot and in full, whatever the country; a missing one is an
 * empty field.
 */
final class Csv {
    private final StringBuilder text = new StringBuilder();

    /** One record of words, such as the header. */
    Csv words(List<String> fields) {
        for (int i = 0; i < fields.size(); i++) {
            text.append(i == 0 ? "" : ",").append(quoted(fields.get(i)));
        }
        text.append("\r\n");
        return this;
    }

    /** A number's field; empty for one that is not finite. */
    static String number(double value) {
        if (!Double.isFinite(value)) {
            return "";
        }
        return value == Math.rint(value) && Math.abs(value) < 1e15
                ? Long.toString((long) value)
                : Double.toString(value);
    }

    String text() {
        return text.toString();
    }

    private static String quoted(String field) {
        boolean plain = field.chars().noneMatch(c -> c == ',' || c == '"' || c == '\r' || c == '\n');
        return plain ? field : '"' + field.replace("\"", "\"\"") + '"';
    }
}
