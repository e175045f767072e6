package clipramp.cli;

import clipramp.files.Example;
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

    static String examples() {
        StringBuilder table = new StringBuilder("| example | what there is to see |\n|---|---|\n");
        for (Example example : Example.all()) {
            row(table, "[" + example.id() + "](examples/" + example.id() + ".yaml)", example.about());
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
