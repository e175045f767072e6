package clipramp.desk;

import javafx.scene.Node;
import javafx.scene.layout.VBox;

/** The column at the left of a page: what is asked there; it scrolls where the window is low. */
final class SidePanel {
    private final VBox column = new VBox();
    private final Scroller scroll = Scroller.ofControls(column);

    SidePanel(Node... contents) {
        column.getStyleClass().add("record-side");
        column.getChildren().addAll(contents);
        scroll.getStyleClass().add("record-side-scroll");
    }

    Scroller node() {
        return scroll;
    }

    VBox column() {
        return column;
    }
}
