package clipramp.desk;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.Labeled;

/** Reads what stands under a node. */
final class Texts {
    private Texts() {}

    static List<Node> all(Node root) {
        List<Node> nodes = new ArrayList<>();
        collect(root, nodes);
        return nodes;
    }

    private static void collect(Node node, List<Node> nodes) {
        nodes.add(node);
        if (node instanceof Parent parent) {
            parent.getChildrenUnmodifiable().forEach(child -> collect(child, nodes));
        }
    }

    static boolean isShown(Node node) {
        for (Node each = node; each != null; each = each.getParent()) {
            if (!each.isVisible()) {
                return false;
            }
        }
        return node.getLayoutBounds().getWidth() > 0;
    }

    static String of(Node root) {
        StringBuilder text = new StringBuilder();
        for (Node node : Harness.at(() -> all(root))) {
            if (node instanceof Labeled labeled && labeled.getText() != null) {
                text.append(labeled.getText()).append('\n');
            }
        }
        return text.toString();
    }

    static Node link(Node root, String words) {
        return labeled(root, words, Labeled.class);
    }

    static Button button(Node root, String words) {
        return (Button) labeled(root, words, Button.class);
    }

    private static Node labeled(Node root, String words, Class<? extends Labeled> type) {
        return Harness.at(() -> all(root)).stream()
                .filter(type::isInstance)
                .filter(node -> words.equals(((Labeled) node).getText()))
                .findFirst()
                .orElseThrow(() -> new AssertionError("nothing says " + words));
    }
}
