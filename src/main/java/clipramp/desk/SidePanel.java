package clipramp.desk;

import javafx.scene.Node;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;

/** The column at the left of a page: what is asked there; it scrolls where the window is low. */
final class SidePanel {
    private final VBox column = new VBox();
    private final ScrollPane scroll = new ScrollPane(column);

    SidePanel(Node... contents) {
        column.getStyleClass().add("record-side");
        column.getChildren().addAll(contents);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setFocusTraversable(false);
        scroll.getStyleClass().add("record-side-scroll");
    }

    ScrollPane node() {
        return scroll;
    }

    VBox column() {
        return column;
    }
}
