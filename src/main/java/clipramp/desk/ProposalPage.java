package clipramp.desk;

import clipramp.desk.Actions.Page;
import clipramp.desk.model.Resized;
import clipramp.figures.CircuitFigure;
import clipramp.figures.KnobFigure;
import clipramp.margins.Check;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** A design that was found for five answers: drawn, and beside it why each part is what it is; taken over or not. */
final class ProposalPage {
    /** Under this width in effective pixels the words stand under the drawing. */
    private static final double STACK_BELOW = 1000;

    private static final double DRAWING_SHARE = 0.5;
    private static final double LEAST_DRAWING = 260;
    private static final double LEAST_CURVE = 200;

    private final Theme theme;
    private final Actions actions;
    private final FigurePane drawing;
    private final FigurePane curve;
    private final VBox figures;
    private final SizedView words = new SizedView();
    private final Label title = new Label();
    private final Button take = new Button("Take it to the bench");
    private final Button record = new Button("Take it over, and its record");
    private final VBox page = new VBox();
    private final HBox sides = new HBox();
    private final VBox stacked = new VBox();
    private final Scroller scroll = Scroller.ofText(words.node(), "The proposal in words; arrow keys scroll");

    ProposalPage(Theme theme, Actions actions) {
        this.theme = theme;
        this.actions = actions;
        this.drawing = new FigurePane(theme);
        this.curve = new FigurePane(theme);
        drawing.setId("proposal-circuit");
        curve.setId("proposal-knob");
        VBox.setVgrow(drawing, Priority.ALWAYS);
        figures = new VBox(drawing, curve);
        title.getStyleClass().add("head");
        title.setWrapText(true);
        take.setId("proposal-take");
        take.setDefaultButton(true);
        record.setId("proposal-record");
        record.setAccessibleText("Take the design over and lay its record out");
        Button again = new Button("Change the answers");
        again.setId("proposal-again");
        again.setOnAction(event -> actions.changeAnswers());
        Button back = new Button("Give up");
        back.setId("proposal-back");
        back.setAccessibleText("Give the proposal up");
        back.setCancelButton(true);
        back.setOnAction(event -> actions.giveUpNew());
        FlowPane buttons = new FlowPane(take, record, again, back);
        buttons.getStyleClass().add("flow-buttons");
        scroll.getStyleClass().add("record-scroll");
        sides.getStyleClass().add("proposal-sides");
        stacked.getStyleClass().add("proposal-sides");
        VBox.setVgrow(sides, Priority.ALWAYS);
        VBox.setVgrow(scroll, Priority.ALWAYS);
        page.getStyleClass().add("proposal");
        page.getChildren().addAll(title, buttons);
        page.widthProperty().addListener(property -> arrange());
        theme.onChange(this::arrange);
        arrange();
    }

    VBox node() {
        return page;
    }

    void show(Resized found) {
        title.setText("Proposed: " + found.sheet().design().title());
        drawing.show(new CircuitFigure(found.sheet().design()));
        Check check = found.sizing().check();
        curve.show(new KnobFigure(check.knob(), check.design().wanted()));
        words.show(found);
        scroll.setVvalue(0);
        take.setOnAction(event -> actions.takeProposal(found, Page.BENCH));
        record.setOnAction(event -> actions.takeProposal(found, Page.RECORD));
    }

    void begin() {
        take.requestFocus();
    }

    private void arrange() {
        boolean narrow = page.getWidth() / theme.zoom() < STACK_BELOW;
        sides.getChildren().clear();
        stacked.getChildren().clear();
        while (page.getChildren().size() > 2) {
            page.getChildren().remove(2);
        }
        figures.minWidthProperty().unbind();
        drawing.setMinHeight(LEAST_DRAWING * theme.zoom());
        curve.setMinHeight(LEAST_CURVE * theme.zoom());
        if (narrow) {
            figures.setMinWidth(0);
            stacked.getChildren().addAll(figures, words.node());
            scroll.setContent(stacked);
            page.getChildren().add(scroll);
        } else {
            figures.minWidthProperty().bind(sides.widthProperty().multiply(DRAWING_SHARE));
            scroll.setContent(words.node());
            HBox.setHgrow(scroll, Priority.ALWAYS);
            sides.getChildren().addAll(figures, scroll);
            page.getChildren().add(sides);
        }
    }
}
