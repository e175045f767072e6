package clipramp.desk;

import javafx.css.PseudoClass;
import javafx.scene.Node;

/** States that the style sheet knows. */
final class Css {
    private Css() {}

    static void state(Node node, String name, boolean on) {
        node.pseudoClassStateChanged(PseudoClass.getPseudoClass(name), on);
    }
}
