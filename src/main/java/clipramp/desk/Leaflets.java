package clipramp.desk;

import clipramp.desk.Actions.Page;
import clipramp.desk.model.Cautions;
import clipramp.files.Licences;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;

/** Texts that the window shows as they are. */
final class Leaflets {
    private static final List<List<String>> KEYS = List.of(
            List.of("Lanes: Left, Right", "firing line by 1°; with Shift by 0.1°"),
            List.of("Lanes: Enter", "look closer at the pulse, or back; Escape back"),
            List.of("Knob: arrows", "turn by 1 %; with Shift by 0.1 %"),
            List.of("Knob: Page up, Page down", "turn by 10 %"),
            List.of("Knob: Home, End", "to the stops"),
            List.of("A value: Up, Down", "next preferred value"),
            List.of("A value: Enter, Escape", "take it, or back to what stands in the file"),
            List.of("Faults: Up, Down", "the fault that is told in detail"),
            List.of("Readings: Up, Down, Enter", "the cell above or below; Ctrl+V pastes a whole table"),
            List.of("Any page: Tab, Shift+Tab", "to the next control, or back; Space presses it"),
            List.of("Any page: Enter", "its heavy button: work out, draw, search, fit, save"),
            List.of("Alt, or F10", "the menus"),
            List.of("Ctrl+N, O, S, W", "new, open, save, close; with Shift+S save as"),
            List.of("Ctrl+Z, Ctrl+Shift+Z", "undo, redo"),
            List.of("Ctrl+1 … " + Page.values().length, pages()),
            List.of("Ctrl+P", "the record, to be saved"),
            List.of("Ctrl+L", "look closer at the pulse, or back"),
            List.of("Ctrl++, −, 0", "zoom"),
            List.of("F1, F2", "these keys, mains safety"));

    private Leaflets() {}

    /** The pages in the order of their tabs and digits. */
    private static String pages() {
        return Arrays.stream(Page.values())
                .map(page -> page.words().toLowerCase(Locale.ROOT))
                .collect(Collectors.joining(", "));
    }

    static Node keys() {
        GridPane grid = new GridPane();
        grid.getStyleClass().add("form");
        for (int i = 0; i < KEYS.size(); i++) {
            grid.addRow(i, new Label(KEYS.get(i).get(0)), new Label(KEYS.get(i).get(1)));
        }
        return grid;
    }

    static String about() {
        return "Designs line-synchronised thyristor firing circuits from first principles: every figure can be followed"
                + " to its formula and source. It computes what a circuit of these parts does; it cannot see your wiring,"
                + " and it never says that a build is safe or meets a standard. Licence: Apache-2.0; more under Help, Licences.";
    }

    /** The safety cautions, as the program carries them. */
    static Node cautions(Dialogs dialogs) {
        return text(dialogs, Cautions.read());
    }

    /** Who is licensed how, and a button for every full text. */
    static Node licences(Dialogs dialogs) {
        VBox box = text(dialogs, Cautions.paragraphs(Licences.overview().replace("`", "")));
        FlowPane texts = new FlowPane();
        texts.getStyleClass().add("flow");
        for (String id : Licences.ids()) {
            Button button = new Button(id);
            button.setId("licence-" + id.replace('.', '-'));
            button.setAccessibleText("Full text of " + id);
            button.setOnAction(event -> dialogs.text("licence", id, dialogs.scrolling(new Label(Licences.text(id)))));
            texts.getChildren().add(button);
        }
        box.getChildren().add(texts);
        return box;
    }

    private static VBox text(Dialogs dialogs, List<Cautions.Paragraph> paragraphs) {
        VBox box = new VBox();
        box.getStyleClass().add("start-column");
        for (Cautions.Paragraph paragraph : paragraphs) {
            Label words = dialogs.words(paragraph.text());
            if (paragraph.heading()) {
                words.getStyleClass().add("verdict");
            }
            box.getChildren().add(words);
        }
        return box;
    }
}
