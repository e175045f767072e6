package clipramp.desk;

import javafx.scene.Node;
import javafx.scene.control.ScrollPane;

/** A pane as wide as its place that scrolls up and down. */
final class Scroller extends ScrollPane {
    private Scroller(Node content) {
        super(content);
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.NEVER);
        skinProperty().addListener(property -> paintWhatChanged());
    }

    /** For content whose own controls take the keyboard. */
    static Scroller ofControls(Node content) {
        Scroller scroller = new Scroller(content);
        scroller.setFocusTraversable(false);
        return scroller;
    }

    /**
     * For content to be read, which takes the keyboard itself.
     *
     * @param said what a screen reader says of it
     */
    static Scroller ofText(Node content, String said) {
        Scroller scroller = new Scroller(content);
        scroller.setAccessibleText(said);
        return scroller;
    }

    /** The skin keeps a picture of the whole content, which a single changed figure would have painted anew. */
    private void paintWhatChanged() {
        Node viewport = lookup(".viewport");
        if (viewport != null) {
            viewport.setCache(false);
        }
    }
}
