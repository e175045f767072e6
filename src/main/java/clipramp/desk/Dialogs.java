package clipramp.desk;

import clipramp.desk.model.Trouble;
import clipramp.figures.Figure;
import java.util.List;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.DialogPane;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.stage.Modality;
import javafx.stage.Window;

/** Every dialog of the window; the one place where failures reach the screen. */
final class Dialogs {
    static final ButtonType SAVE = new ButtonType("Save", ButtonData.YES);
    static final ButtonType DISCARD = new ButtonType("Do not save", ButtonData.NO);
    static final ButtonType REPLACE = new ButtonType("Replace them", ButtonData.YES);
    private static final ButtonType LEAVE = new ButtonType("Keep them", ButtonData.CANCEL_CLOSE);
    static final ButtonType BACK = new ButtonType("Back to the design", ButtonData.CANCEL_CLOSE);
    private static final ButtonType CLOSE = new ButtonType("Close", ButtonData.OK_DONE);
    private static final double TEXT_EMS = 46;
    private static final double MOST_HEIGHT_EMS = 34;

    private final Window owner;
    private final Theme theme;

    Dialogs(Window owner, Theme theme) {
        this.owner = owner;
        this.theme = theme;
    }

    /** What went wrong, and what to do. */
    void trouble(Trouble trouble) {
        show("trouble", trouble.headline(), words(trouble.text()), List.of(CLOSE), answer -> {});
    }

    /** Whether unsaved work is saved, given up, or gone on with. */
    void unsaved(String name, Consumer<ButtonType> then) {
        Label words = words("“" + name + "” differs from what is saved.");
        show("unsaved", "Save the design first?", words, List.of(SAVE, DISCARD, BACK), then);
    }

    /** Whether readings that are in no file are saved, given up, or gone on with. */
    void unsavedReadings(Consumer<ButtonType> then) {
        Label words = words("The readings on the page Fit are in no file.");
        show("unsaved-readings", "Save the readings first?", words, List.of(SAVE, DISCARD, BACK), then);
    }

    /** Whether readings that are in no file give way to others. */
    void replaceReadings(Consumer<ButtonType> then) {
        Label words = words("The readings on the page Fit are in no file.");
        show("replace", "Replace the readings?", words, List.of(REPLACE, LEAVE), then);
    }

    /** A long text with a heading. */
    void text(String id, String head, Node body) {
        show(id, head, body, List.of(CLOSE), answer -> {});
    }

    /** A figure's numbers. */
    void numbers(Figure figure) {
        TableView<List<String>> view = Tables.of(figure.numbers());
        view.setAccessibleText(figure.sentence());
        VBox box = new VBox(words(figure.sentence()), view);
        box.getStyleClass().add("start-column");
        show("numbers", figure.title(), box, List.of(CLOSE), answer -> {});
    }

    Label words(String text) {
        Label words = new Label(text);
        words.setWrapText(true);
        words.setMaxWidth(TEXT_EMS * em());
        words.setMinHeight(Region.USE_PREF_SIZE);
        return words;
    }

    private double em() {
        return 13 * theme.zoom();
    }

    /** A text that may be longer than the screen. */
    Node scrolling(Node body) {
        Scroller scroll = Scroller.ofText(body, "Text; arrow keys scroll");
        scroll.setPrefWidth(TEXT_EMS * em() + 2 * em());
        scroll.setPrefHeight(MOST_HEIGHT_EMS * em());
        return scroll;
    }

    private void show(String id, String head, Node body, List<ButtonType> buttons, Consumer<ButtonType> then) {
        Dialog<ButtonType> dialog = new Dialog<>();
        dialog.initOwner(owner);
        dialog.initModality(Modality.WINDOW_MODAL);
        dialog.setTitle(head);
        dialog.setResizable(true);
        DialogPane pane = dialog.getDialogPane();
        pane.setId("dialog-" + id);
        theme.dress(pane.getStylesheets());
        pane.getStyleClass().add("root");
        Label title = new Label(head);
        title.getStyleClass().add("head");
        VBox content = new VBox(title, body);
        content.getStyleClass().add("start-column");
        content.setMaxWidth(Double.MAX_VALUE);
        pane.setContent(content);
        pane.getButtonTypes().setAll(buttons);
        dialog.setOnHidden(event -> {
            theme.undress(pane.getStylesheets());
            ButtonType answer = dialog.getResult();
            then.accept(answer == null ? buttons.get(buttons.size() - 1) : answer);
        });
        dialog.show();
    }
}
