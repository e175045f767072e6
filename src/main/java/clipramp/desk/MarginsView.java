package clipramp.desk;

import clipramp.desk.model.MarginRow;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;

/** One row a check, worst first; a row opens to its formula, its source and what moves it. */
final class MarginsView {
    private final VBox rows = new VBox();
    private final ScrollPane scroll = new ScrollPane(rows);
    private final Label empty = new Label("Margins follow once the circuit is solved.");
    private final Map<String, MarginRowView> byId = new HashMap<>();
    private final Consumer<String> chosen;

    /**
     * @param chosen takes the key of a part that the user follows from a margin
     */
    MarginsView(Consumer<String> chosen) {
        this.chosen = chosen;
        rows.getStyleClass().add("margins");
        rows.setId("margins");
        rows.getChildren().add(empty);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setFocusTraversable(false);
    }

    ScrollPane node() {
        return scroll;
    }

    /** Shows other figures; rows that were open stay open. */
    void show(List<MarginRow> margins) {
        List<VBox> shown = new ArrayList<>();
        for (MarginRow margin : margins) {
            MarginRowView row = byId.computeIfAbsent(margin.id(), id -> new MarginRowView(chosen));
            row.show(margin);
            shown.add(row.node());
        }
        if (!rows.getChildren().equals(shown)) {
            rows.getChildren().setAll(shown);
        }
    }
}
