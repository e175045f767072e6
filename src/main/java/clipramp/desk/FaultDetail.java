package clipramp.desk;

import clipramp.desk.model.FaultWords;
import clipramp.faults.Diagnosis;
import clipramp.faults.FaultEffect;
import clipramp.figures.NumberTable;
import java.util.List;
import javafx.geometry.HPos;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;

/** Everything about one fault: what the load gets, what every meter shows, what burns next, what speaks for it. */
final class FaultDetail {
    private final VBox words = new VBox();
    private final FlowPane tables = new FlowPane();
    private final VBox rest = new VBox();
    private final VBox box = new VBox(words, tables, rest);

    FaultDetail() {
        box.setId("fault-detail");
        box.getStyleClass().add("spread-middle-part");
        words.getStyleClass().add("fault-words");
        rest.getStyleClass().add("fault-words");
        tables.getStyleClass().add("fault-tables");
    }

    VBox node() {
        return box;
    }

    void show(FaultWords all, Diagnosis.Candidate candidate) {
        FaultEffect effect = candidate.effect();
        words.getChildren().clear();
        Label head = Words.wrapped(effect.fault().words());
        head.getStyleClass().add("verdict");
        words.getChildren().add(head);
        FaultWords.reasons(candidate).forEach(this::add);
        List<String> burns = all.burns(effect);
        if (!burns.isEmpty()) {
            Label over = Words.wrapped("Over its rating, burns next");
            over.getStyleClass().add("verdict");
            words.getChildren().add(over);
            burns.forEach(this::add);
        }
        effect.remarks().forEach(this::add);
        tables.getChildren().setAll(grid(FaultWords.load(effect)), grid(FaultWords.meters(effect)));
    }

    /** Faults without figures. */
    void say(List<String> notComputed) {
        rest.getChildren().setAll(notComputed.stream().map(Words::quiet).toList());
    }

    private void add(String sentence) {
        words.getChildren().add(Words.wrapped(sentence));
    }

    private static GridPane grid(NumberTable table) {
        GridPane grid = new GridPane();
        grid.getStyleClass().add("spread-table");
        for (int c = 0; c < table.heads().size(); c++) {
            put(grid, Words.quiet(table.heads().get(c)), c, 0);
            for (int r = 0; r < table.rows().size(); r++) {
                put(grid, new Label(table.rows().get(r).get(c)), c, r + 1);
            }
        }
        return grid;
    }

    private static void put(GridPane grid, Label label, int column, int row) {
        label.setWrapText(false);
        GridPane.setHalignment(label, column == 0 ? HPos.LEFT : HPos.RIGHT);
        grid.add(label, column, row);
    }
}
