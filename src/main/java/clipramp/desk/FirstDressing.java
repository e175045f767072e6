package clipramp.desk;

import clipramp.figures.Lettering;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import javafx.application.Platform;
import javafx.scene.Group;
import javafx.scene.Node;
import javafx.scene.Scene;

/**
 * Dresses what the first design will show in a scene that nobody sees, one piece after the other, while the start page waits
 * for the user: skins, style rules and faces are dear only the first time.
 */
final class FirstDressing {
    private final Theme theme;
    private final Group group;
    private final Scene unseen;
    private final Deque<Node> pieces;

    private FirstDressing(Theme theme, List<? extends Node> wholes, List<? extends Node> pieces) {
        this.theme = theme;
        this.group = new Group(new ArrayList<>(wholes));
        this.unseen = new Scene(group);
        this.pieces = new ArrayDeque<>(pieces);
        theme.dress(unseen.getStylesheets());
    }

    /**
     * Begins; each piece waits for what else the window has to do, and nothing more is done once they are wanted.
     *
     * @param wholes what will be shown; in no scene yet
     * @param pieces parts of them, each dressed in one go
     */
    static void of(Theme theme, List<? extends Node> wholes, List<? extends Node> pieces) {
        theme.painting().execute(Lettering::prepare);
        new FirstDressing(theme, wholes, pieces).next();
    }

    private void next() {
        Platform.runLater(() -> {
            boolean wanted = group.getChildren().isEmpty();
            if (pieces.isEmpty() || wanted) {
                group.getChildren().clear();
                theme.undress(unseen.getStylesheets());
            } else {
                pieces.remove().applyCss();
                next();
            }
        });
    }
}
