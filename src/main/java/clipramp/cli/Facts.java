package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;

/** Figures behind their names, two a line. */
final class Facts {
    private static final int COLUMNS = 4;

    private final Spelling spelling;
    private final List<String> cells = new ArrayList<>();

    Facts(Spelling spelling) {
        this.spelling = spelling;
    }

    Facts fact(String name, String figure) {
        cells.add(name);
        cells.add(figure);
        return this;
    }

    /** @param value in SI units */
    Facts amount(String name, double value, Unit unit) {
        return fact(name, Shown.amount(value, unit));
    }

    List<String> lines() {
        TextTable table = new TextTable(spelling, "  ");
        for (int column = 0; column < COLUMNS; column++) {
            table.column(Align.LEFT, "");
        }
        for (int cell = 0; cell < cells.size(); cell += COLUMNS) {
            table.row(cells.subList(cell, cell + COLUMNS));
        }
        return table.lines();
    }
}
