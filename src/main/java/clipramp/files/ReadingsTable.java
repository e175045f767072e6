package clipramp.files;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Bench readings as they stand in a table, before anything is made of them: heads and fields as written.
 *
 * @param heads one a column
 * @param rows fields under them; kept with as many in every row as there are heads
 */
public record ReadingsTable(List<String> heads, List<List<String>> rows) {
    /** Fills short rows up and cuts long ones. */
    public ReadingsTable {
        heads = List.copyOf(heads);
        int width = heads.size();
        rows = rows.stream().map(row -> filled(row, width)).toList();
    }

    private static List<String> filled(List<String> row, int width) {
        List<String> all = new ArrayList<>(row.subList(0, Math.min(width, row.size())));
        while (all.size() < width) {
            all.add("");
        }
        return List.copyOf(all);
    }

    /**
     * Takes a file of comma-separated values apart; remarks and empty lines are left out.
     *
     * @throws InvalidInputException where a quote is never closed, or nothing stands there
     */
    public static ReadingsTable of(Source source) {
        Findings findings = new Findings();
        List<List<String>> all = CsvRows.of(source, findings).stream()
                .map(row -> row.stream().map(CsvRows.Field::text).toList())
                .toList();
        if (all.isEmpty() && !findings.hasProblems()) {
            findings.problem(Place.of(source.name(), 1, 1), "", "nothing stands here. The first line holds the heads.");
        }
        findings.throwIfAny();
        return new ReadingsTable(all.get(0), all.subList(1, all.size()));
    }

    /** The table as comma-separated values (RFC 4180), the heads on line 1, row n on line n + 2 from 0. */
    public String csv() {
        StringBuilder text = new StringBuilder(line(heads));
        rows.forEach(row -> text.append(line(row)));
        return text.toString();
    }

    private static String line(List<String> fields) {
        return fields.stream().map(ReadingsTable::quoted).collect(Collectors.joining(",")) + "\n";
    }

    private static String quoted(String field) {
        boolean plain =
                field.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r') && !field.startsWith("#");
        return plain ? field : '"' + field.replace("\"", "\"\"") + '"';
    }
}
