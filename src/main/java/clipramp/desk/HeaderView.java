package clipramp.desk;

import clipramp.circuit.Design;
import clipramp.desk.Actions.Page;
import clipramp.desk.model.DeskModel;
import clipramp.desk.model.MarginRow;
import clipramp.desk.model.Sheet;
import clipramp.desk.model.ViewCondition;
import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Over every page: what the design is, whether it is saved, at what condition it is shown, and the verdict. */
final class HeaderView {
    private final DeskModel model;
    private final Label title = new Label();
    private final Label saved = new Label();
    private final Label verdict = new Label();
    private final Label counts = new Label();
    private final Label note = new Label();
    private final Button margins = new Button("Margins");
    private final ComboBox<String> condition = new ComboBox<>();
    private final HBox row = new HBox();
    private final HBox under = new HBox();
    private final Tooltip whole = new Tooltip();
    private final VBox box;
    private boolean filling;

    HeaderView(DeskModel model, Actions actions, Runnable showMargins) {
        this.model = model;
        title.getStyleClass().add("title");
        title.setId("title");
        title.setMinWidth(0);
        saved.getStyleClass().add("quiet");
        saved.setId("saved");
        verdict.getStyleClass().add("verdict");
        verdict.setId("verdict");
        counts.setId("counts");
        margins.setId("fold-margins");
        margins.setAccessibleText("Show margins and parts");
        margins.setOnAction(event -> showMargins.run());
        conditions(actions);
        Hyperlink cautions = new Hyperlink("Mains safety");
        cautions.setId("cautions");
        cautions.setAccessibleText("Before you build or measure: mains safety");
        cautions.setOnAction(event -> actions.showCautions());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        row.getChildren().setAll(title, saved, gap, verdict, counts, margins, condition, cautions);
        row.getStyleClass().add("header");
        for (Region fixed : List.of(saved, verdict, counts, margins, condition, cautions)) {
            fixed.setMinWidth(Region.USE_PREF_SIZE);
        }
        note.getStyleClass().add("quiet");
        note.setId("condition-note");
        note.setWrapText(true);
        note.setMinHeight(Region.USE_PREF_SIZE);
        note.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(note, Priority.ALWAYS);
        under.getStyleClass().add("condition-note");
        under.getChildren().setAll(note);
        box = new VBox(row, under);
        model.draft().onChange(this::refresh);
        model.onCondition(this::refresh);
        model.onJudgement(this::refreshVerdict);
    }

    private void conditions(Actions actions) {
        condition.setId("condition");
        condition.setAccessibleText("Condition that everything is shown at");
        for (ViewCondition each : ViewCondition.values()) {
            condition.getItems().add(each.word());
        }
        condition.valueProperty().addListener((property, before, now) -> {
            int index = condition.getItems().indexOf(now);
            if (!filling && index >= 0) {
                actions.setCondition(ViewCondition.values()[index]);
            }
        });
    }

    VBox node() {
        return box;
    }

    /** Marks the page that is shown, and whether margins are folded away on it. */
    void showPage(Page page, boolean folded) {
        margins.setVisible(folded && page == Page.BENCH);
        margins.setManaged(folded && page == Page.BENCH);
        stack(folded);
        counts.setVisible(!folded);
        counts.setManaged(!folded);
    }

    /** Where there is no room for everything in one row, the next tells whether it is saved, and the title is smaller. */
    private void stack(boolean narrow) {
        boolean stacked = under.getChildren().contains(saved);
        Css.state(title, "narrow", narrow);
        if (narrow && !stacked) {
            row.getChildren().remove(saved);
            under.getChildren().add(saved);
        } else if (!narrow && stacked) {
            under.getChildren().remove(saved);
            row.getChildren().add(1, saved);
        }
        refreshNote();
    }

    /** Under the title's row: what the condition means, and where there is little room whether it is saved. */
    private void refreshNote() {
        boolean narrow = under.getChildren().contains(saved);
        String word = narrow ? "" : model.condition().word() + ": ";
        model.draft()
                .sheet()
                .map(Sheet::design)
                .ifPresent(design -> note.setText(word + model.condition().explained(design)));
        boolean nominal = model.condition() == ViewCondition.NOMINAL;
        note.setVisible(!nominal);
        under.setVisible(!nominal || narrow);
        under.setManaged(under.isVisible());
    }

    /** A word about what was done, until the design changes. */
    void say(String words) {
        saved.setText(words);
    }

    private void refresh() {
        model.draft().sheet().map(Sheet::design).ifPresent(this::show);
    }

    private void show(Design design) {
        title.setText(design.title().isEmpty() ? "Untitled design" : design.title());
        whole.setText(title.getText());
        Tooltip.install(title, whole);
        saved.setText(model.draft().isDirty() ? "differs from saved" : "saved");
        filling = true;
        condition.setValue(model.condition().word());
        filling = false;
        refreshNote();
    }

    private void refreshVerdict() {
        model.judgement().ifPresent(j -> {
            verdict.setText(MarginRow.shape(j.check().verdict()) + " "
                    + MarginRow.word(j.check().verdict()));
            counts.setText(MarginRow.summary(MarginRow.all(j.check().margins())));
        });
    }
}
