package clipramp.cli;

import clipramp.margins.MarginKind;

/** The README's tables, made of what the program itself knows. */
final class ReadmeTables {
    private ReadmeTables() {}

    static String margins() {
        StringBuilder table = new StringBuilder("| margin | name | what is asked |\n|---|---|---|\n");
        for (MarginKind kind : MarginKind.values()) {
            row(table, "`" + kind.id() + "`", kind.title(), kind.meaning());
        }
        return table.toString();
    }

    private static void row(StringBuilder table, String... cells) {
        for (String cell : cells) {
            table.append("| ").append(cell.replace("|", "\\|")).append(' ');
        }
        table.append("|\n");
    }
}
