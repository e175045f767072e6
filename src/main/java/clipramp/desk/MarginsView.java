package clipramp.desk;

import clipramp.desk.model.MarginRow;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import javafx.application.Platform;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;

/** One row a check, worst first; a row opens to its formula, its source and what moves it. */
final class MarginsView {
    private static final int AT_ONCE = 12;

    private final VBox rows = new VBox();
    private final Scroller scroll = Scroller.ofControls(rows);
    private final Label empty = new Label("Margins follow once the circuit is solved.");
    private final Map<String, MarginRowView> byId = new HashMap<>();
    private final Consumer<String> chosen;
    private int turn;

    /**
     * @param chosen takes the key of a part that the user follows from a margin
     */
    MarginsView(Consumer<String> chosen) {
        this.chosen = chosen;
        rows.getStyleClass().add("margins");
        rows.setId("margins");
        rows.getChildren().add(empty);
    }

    Scroller node() {
        return scroll;
    }

    /** Shows other figures; rows that were open stay open. */
    void show(List<MarginRow> margins) {
        turn++;
        fill(margins, turn);
    }

    /** New rows come some at a time, the worst first, so that the window's thread is not held up by forty of them. */
    private void fill(List<MarginRow> margins, int asked) {
        List<VBox> shown = new ArrayList<>();
        int made = 0;
        for (MarginRow margin : margins) {
            made += byId.containsKey(margin.id()) ? 0 : 1;
            if (made > AT_ONCE) {
                Platform.runLater(() -> {
                    if (asked == turn) {
                        fill(margins, asked);
                    }
                });
                break;
            }
            MarginRowView row = byId.computeIfAbsent(margin.id(), id -> new MarginRowView(chosen));
            row.show(margin);
            shown.add(row.node());
        }
        if (!rows.getChildren().equals(shown)) {
            rows.getChildren().setAll(shown);
        }
    }
}
