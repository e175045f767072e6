package clipramp.desk;

import clipramp.figures.NumberTable;
import java.util.List;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.layout.Region;

/** Tables of numbers on the screen: in the order they come in, neither sorted nor moved about. */
final class Tables {
    private Tables() {}

    /** Nothing in it yet, and no words about that: what is being worked out is told beside it. */
    static TableView<List<String>> empty() {
        TableView<List<String>> view = new TableView<>();
        view.setPlaceholder(new Region());
        return view;
    }

    static TableView<List<String>> of(NumberTable table) {
        TableView<List<String>> view = empty();
        view.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_ALL_COLUMNS);
        fill(view, table);
        return view;
    }

    /** Other rows, and other heads where they differ; what was chosen stays chosen. */
    static void fill(TableView<List<String>> view, NumberTable table) {
        while (view.getColumns().size() < table.heads().size()) {
            view.getColumns().add(column(view.getColumns().size()));
        }
        for (int i = 0; i < table.heads().size(); i++) {
            view.getColumns().get(i).setText(table.heads().get(i));
        }
        int chosen = view.getSelectionModel().getSelectedIndex();
        if (view.getItems().size() == table.rows().size()) {
            for (int i = 0; i < table.rows().size(); i++) {
                if (!view.getItems().get(i).equals(table.rows().get(i))) {
                    view.getItems().set(i, table.rows().get(i));
                }
            }
        } else {
            view.getItems().setAll(table.rows());
        }
        if (chosen >= 0 && chosen < table.rows().size()) {
            view.getSelectionModel().select(chosen);
        }
    }

    /** A head with its unit in a line of its own, where figures of a few digits stand in narrow columns. */
    static String unitBelow(String head) {
        return head.replaceFirst(" (mA|%|W|dc V|ac V|peak V)$", "\n$1");
    }

    private static TableColumn<List<String>, String> column(int index) {
        TableColumn<List<String>, String> column = new TableColumn<>();
        column.setCellValueFactory(
                row -> new ReadOnlyStringWrapper(row.getValue().get(index)));
        column.setSortable(false);
        column.setReorderable(false);
        return column;
    }
}
