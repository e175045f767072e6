package clipramp.desk;

import javafx.scene.control.Label;
import javafx.scene.layout.Region;

/** Labels that are read rather than acted on. */
final class Words {
    private Words() {}

    /** As many lines as it takes. */
    static Label wrapped(String text) {
        Label label = new Label(text);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        return label;
    }

    /** The same, smaller and paler. */
    static Label quiet(String text) {
        Label label = wrapped(text);
        label.getStyleClass().add("quiet");
        return label;
    }
}
