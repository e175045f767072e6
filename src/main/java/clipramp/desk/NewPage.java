package clipramp.desk;

import clipramp.circuit.Stage;
import clipramp.desk.model.LongRun;
import clipramp.desk.model.NewDesign;
import clipramp.desk.model.Wish;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Five questions, each answered beforehand as it usually would be. */
final class NewPage {
    private final ComboBox<String> line = new ComboBox<>();
    private final TextField load = new TextField(Wish.USUAL.load());
    private final ComboBox<String> stage = new ComboBox<>();
    private final TextField lowest = new TextField(Wish.USUAL.lowest());
    private final TextField highest = new TextField(Wish.USUAL.highest());
    private final TextField coldest = new TextField(Wish.USUAL.coldest());
    private final TextField hottest = new TextField(Wish.USUAL.hottest());
    private final Label about = new Label();
    private final Label complaint = new Label();
    private final VBox page = new VBox();
    private final Scroller scroll = Scroller.ofControls(page);
    private final List<String> lineIds = new ArrayList<>();

    /**
     * @param run searches for the design
     * @param propose takes the answers to make a design of
     * @param enter takes the answers to start entering a circuit that there is
     * @param back gives up
     */
    NewPage(LongRun<?, ?> run, Consumer<Wish> propose, Consumer<Wish> enter, Runnable back) {
        Label title = new Label("New design");
        title.getStyleClass().add("head");
        GridPane form = new GridPane();
        form.getStyleClass().add("form");
        for (int column = 0; column < 3; column++) {
            ColumnConstraints fields = new ColumnConstraints();
            fields.setMinWidth(column == 0 ? 0 : Region.USE_PREF_SIZE);
            form.getColumnConstraints().add(fields);
        }
        ColumnConstraints rest = new ColumnConstraints();
        rest.setHgrow(Priority.ALWAYS);
        form.getColumnConstraints().add(rest);
        for (Stage each : Stage.values()) {
            stage.getItems().add(each.word());
        }
        stage.setValue(Wish.USUAL.stage().word());
        row(form, 0, "1  line", "what the circuit hangs on", line, "new-line");
        row(form, 1, "2  load", "rated power of a heater on that line", load, "new-load");
        row(form, 2, "3  stage", "how thyristors, bridge and load are put together", stage, "new-stage");
        row(
                form,
                4,
                "4  wanted",
                "share of full power at the knob's two ends",
                lowest,
                "new-lowest",
                highest,
                "new-highest");
        row(
                form,
                5,
                "5  surroundings",
                "coldest and hottest air around the parts",
                coldest,
                "new-coldest",
                hottest,
                "new-hottest");
        about.getStyleClass().add("quiet");
        about.setWrapText(true);
        about.setMinHeight(Region.USE_PREF_SIZE);
        form.add(about, 1, 3, 3, 1);
        complaint.getStyleClass().add("complaint");
        complaint.setId("new-complaint");
        complaint.setWrapText(true);
        complaint.setMinHeight(Region.USE_PREF_SIZE);
        stage.valueProperty().addListener(property -> usual());
        line.valueProperty().addListener(property -> usual());
        page.getStyleClass().add("page");
        FlowPane buttons = buttons(propose, enter, back);
        run.onChange(() -> {
            form.setDisable(run.isRunning());
            buttons.setDisable(run.isRunning());
        });
        RunBar bar = new RunBar(run, "new", "searching for values that hold");
        page.getChildren().addAll(title, form, complaint, buttons, bar.node());
        usual();
    }

    private FlowPane buttons(Consumer<Wish> propose, Consumer<Wish> enter, Runnable back) {
        Button first = new Button("Propose a design");
        first.setId("new-propose");
        first.setDefaultButton(true);
        first.setOnAction(event -> propose.accept(wish()));
        Button second = new Button("I have a circuit: enter its parts");
        second.setId("new-enter");
        second.setOnAction(event -> enter.accept(wish()));
        Button third = new Button("Back");
        third.setCancelButton(true);
        third.setOnAction(event -> back.run());
        FlowPane box = new FlowPane(first, second, third);
        box.getStyleClass().add("flow-buttons");
        return box;
    }

    private static void row(GridPane form, int row, String head, String words, Control control, String id) {
        form.add(label(head, words), 0, row);
        control.setMaxWidth(Double.MAX_VALUE);
        control.setId(id);
        control.setAccessibleText(head.substring(3) + ": " + words);
        form.add(control, 1, row, 2, 1);
    }

    private static void row(
            GridPane form, int row, String head, String words, Control from, String fromId, Control to, String toId) {
        row(form, row, head, words, from, fromId);
        GridPane.setColumnSpan(from, 1);
        to.setId(toId);
        to.setAccessibleText(head.substring(3) + ", upper end: " + words);
        form.add(to, 2, row);
    }

    private static Node label(String head, String words) {
        Label title = new Label(head);
        return new VBox(title, Words.quiet(words));
    }

    Scroller node() {
        return scroll;
    }

    /** Lines to choose from, by their profiles. */
    void offer(List<String> lines) {
        lineIds.clear();
        lineIds.addAll(lines);
        line.getItems().setAll(lines.stream().map(NewDesign::lineInWords).toList());
        line.setValue(NewDesign.lineInWords(Wish.USUAL.lineId()));
    }

    /** What is wrong with the answers. */
    void complain(String words) {
        complaint.setText(words);
    }

    void begin() {
        complain("");
        load.requestFocus();
        load.selectAll();
    }

    private Stage chosenStage() {
        return Stage.values()[Math.max(0, stage.getItems().indexOf(stage.getValue()))];
    }

    private String chosenLine() {
        int index = line.getItems().indexOf(line.getValue());
        return index < 0 ? Wish.USUAL.lineId() : lineIds.get(index);
    }

    private void usual() {
        boolean low = NewDesign.isLowVoltage(chosenLine());
        about.setText(NewDesign.about(chosenStage()));
        lowest.setText(Wish.usualLowest(chosenStage(), low));
        highest.setText(Wish.usualHighest(chosenStage(), low));
    }

    private Wish wish() {
        return new Wish(
                chosenLine(),
                load.getText().strip(),
                chosenStage(),
                lowest.getText().strip(),
                highest.getText().strip(),
                coldest.getText().strip(),
                hottest.getText().strip());
    }
}
