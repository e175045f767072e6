package clipramp.desk;

import clipramp.desk.model.Recovery;
import clipramp.files.Example;
import java.nio.file.Path;
import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;

/** What stands on the desk while no design does: begin, open, or look at an example. */
final class StartPage {
    private final Actions actions;
    private final VBox page = new VBox();
    private final VBox recent = column("Opened lately");
    private final VBox left = new VBox();
    private final Scroller scroll = Scroller.ofControls(page);

    StartPage(Actions actions) {
        this.actions = actions;
        Label title = new Label("clipramp");
        title.getStyleClass().add("head");
        Label line = new Label("Designs firing circuits that keep time with the line: clipped supply, ramp,"
                + " trigger, gate, thyristor, load.");
        line.setWrapText(true);
        FlowPane columns = new FlowPane(begin(), examples(), recent);
        columns.getStyleClass().add("start-columns");
        page.getStyleClass().add("page");
        page.getChildren().addAll(title, line, left, columns);
        left.getStyleClass().add("start-column");
        left.setManaged(false);
        scroll.setId("start");
    }

    Scroller node() {
        return scroll;
    }

    private static VBox column(String head) {
        Label title = new Label(head);
        title.getStyleClass().add("quiet");
        VBox box = new VBox(title);
        box.getStyleClass().add("start-column");
        return box;
    }

    private VBox begin() {
        VBox box = column("Begin");
        box.getChildren()
                .addAll(
                        entry("start-new", "New design", "five questions, then a working circuit", actions::startNew),
                        entry("start-open", "Open a file", "a design file, .yaml; or drop one here", actions::open),
                        caution());
        return box;
    }

    private VBox examples() {
        VBox box = column("Look at an example");
        for (Example example : Example.all()) {
            box.getChildren()
                    .add(entry(
                            "example-" + example.id(),
                            example.title(),
                            example.about(),
                            () -> actions.openExample(example)));
        }
        return box;
    }

    private VBox caution() {
        Label words = new Label("Mains voltage kills. This program computes; it never says that a circuit is safe.");
        words.setWrapText(true);
        Button read = new Button("Before you build or measure");
        read.setId("start-cautions");
        read.setOnAction(event -> actions.showCautions());
        VBox box = new VBox(words, read);
        box.getStyleClass().add("notice");
        return box;
    }

    /** Files opened before. */
    void showRecent(List<Path> files) {
        recent.getChildren().remove(1, recent.getChildren().size());
        recent.setVisible(!files.isEmpty());
        recent.setManaged(!files.isEmpty());
        for (Path file : files) {
            String folder = file.getParent() == null ? "" : file.getParent().toString();
            recent.getChildren()
                    .add(entry("", String.valueOf(file.getFileName()), folder, () -> actions.openFile(file)));
        }
    }

    /** Work that a window left behind when its process ended. */
    void offer(List<Recovery.Left> works) {
        left.getChildren().clear();
        left.setManaged(!works.isEmpty());
        left.getStyleClass().setAll("notice");
        if (!works.isEmpty()) {
            left.getChildren().add(new Label("Unsaved work was left when the program ended."));
        }
        for (Recovery.Left work : works) {
            String name = work.file().map(f -> String.valueOf(f.getFileName())).orElse("a design that was never saved")
                    + (work.readings().isPresent() ? " with its readings" : "");
            Button back = new Button("Take back " + name);
            back.getStyleClass().add("recover");
            back.setOnAction(event -> actions.recover(work));
            Button forget = new Button("Forget it");
            forget.setAccessibleText("Forget the unsaved work on " + name);
            forget.setOnAction(event -> actions.forget(work));
            HBox row = new HBox(back, forget);
            row.getStyleClass().add("stations");
            left.getChildren().add(row);
        }
    }

    private static Button entry(String id, String head, String about, Runnable action) {
        Label title = new Label(head);
        Label words = new Label(about);
        words.getStyleClass().add("quiet");
        Button button = new Button();
        button.setId(id);
        button.setGraphic(new VBox(title, words));
        button.setMaxWidth(Double.MAX_VALUE);
        button.getStyleClass().add("start-entry");
        button.setAccessibleText(head + ": " + about);
        button.setOnAction(event -> action.run());
        return button;
    }
}
