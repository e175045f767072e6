package clipramp.desk;

import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** Small tables that are read with the words around them: the first row holds the heads, the first column names the rows. */
final class TextGrid {
    private TextGrid() {}

    /** Words in the cells, which take as many lines as there is need of; the names of the rows keep theirs whole. */
    static GridPane ofWords(String id, List<List<String>> rows) {
        return grid(id, rows, column -> column > 0);
    }

    /** Figures in the cells, which are never broken; names and last words take as many lines as there is need of. */
    static GridPane ofFigures(String id, List<List<String>> rows) {
        int last = rows.get(0).size() - 1;
        return grid(id, rows, column -> column == 0 || column == last);
    }

    private interface Bends {
        boolean at(int column);
    }

    private static GridPane grid(String id, List<List<String>> rows, Bends bends) {
        GridPane grid = new GridPane();
        grid.setId(id);
        grid.getStyleClass().add("spread-table");
        for (int c = 0; c < rows.get(0).size(); c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setHgrow(Priority.NEVER);
            column.setMinWidth(bends.at(c) ? 0 : Region.USE_PREF_SIZE);
            grid.getColumnConstraints().add(column);
        }
        for (int r = 0; r < rows.size(); r++) {
            for (int c = 0; c < rows.get(r).size(); c++) {
                Label cell = Words.wrapped(rows.get(r).get(c));
                if (r == 0 || c == 0) {
                    cell.getStyleClass().add("quiet");
                }
                if (!bends.at(c)) {
                    cell.setMinWidth(Region.USE_PREF_SIZE);
                }
                grid.add(cell, c, r);
            }
        }
        return grid;
    }
}
