package clipramp.desk;

import clipramp.desk.model.Bench;
import clipramp.desk.model.Figures;
import clipramp.desk.model.Reading;
import clipramp.units.Expected;
import clipramp.units.LenientEntry;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import javafx.css.PseudoClass;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The line of figures between lanes and knob; the firing angle is a field. */
final class ReadoutView {
    private static final Expected ANGLE =
            Expected.within(Unit.ANGLE, 0, Math.PI).allowingBare();

    private final Bench bench;
    private final TextField angle = new TextField();
    private final Label resistance = figure();
    private final Label position = figure();
    private final Label power = figure();
    private final Label share = figure();
    private final Label state = new Label();
    private final Label complaint = new Label();
    private final HBox figures = new HBox();
    private final VBox box = new VBox(figures);

    ReadoutView(Bench bench) {
        this.bench = bench;
        angle.setId("angle");
        angle.getStyleClass().add("angle-field");
        angle.setAccessibleText("Firing angle in degrees. Enter moves the firing line there.");
        angle.setOnAction(event -> commit());
        angle.focusedProperty().addListener((property, before, now) -> {
            if (!now) {
                refresh();
            }
        });
        resistance.setId("resistance");
        position.setId("position");
        power.setId("power");
        state.setId("state");
        state.getStyleClass().add("state");
        state.setWrapText(true);
        complaint.setId("angle-complaint");
        complaint.getStyleClass().add("complaint");
        complaint.setWrapText(true);
        complaint.setMinHeight(Region.USE_PREF_SIZE);
        box.getStyleClass().add("readout");
        figures.getStyleClass().add("readout-cells");
        VBox last = cell("state", state);
        last.setMinWidth(0);
        HBox.setHgrow(last, Priority.ALWAYS);
        figures.getChildren()
                .addAll(
                        cell("firing angle α", angle),
                        cell("ramp resistance R_E", resistance),
                        cell("knob", position),
                        cell("load", power),
                        cell("of full power", share),
                        last);
        bench.onReading(this::refresh);
    }

    private static Label figure() {
        Label label = new Label("–");
        label.getStyleClass().add("figure-text");
        return label;
    }

    private static VBox cell(String caption, Node value) {
        Label head = new Label(caption);
        head.getStyleClass().add("caption");
        VBox cell = new VBox(head, value);
        cell.setMinWidth(Region.USE_PREF_SIZE);
        cell.getStyleClass().add("readout-cell");
        return cell;
    }

    VBox node() {
        return box;
    }

    private void refresh() {
        bench.reading().map(Figures::of).ifPresent(f -> {
            angle.setText(f.angle());
            resistance.setText(f.resistance());
            position.setText(f.position());
            power.setText(f.power());
            share.setText(f.share());
            state.setText(f.state());
        });
        refused("");
        bench.reading().flatMap(Reading::remark).ifPresent(this::say);
    }

    private void commit() {
        try {
            bench.fireAt(LenientEntry.read(angle.getText(), ANGLE).quantity().value());
        } catch (RefusedQuantityException e) {
            refused(e.refusal().message());
        }
    }

    private void refused(String why) {
        angle.pseudoClassStateChanged(PseudoClass.getPseudoClass("refused"), !why.isEmpty());
        angle.setAccessibleHelp(why);
        say(why);
    }

    private void say(String why) {
        complaint.setText(why);
        if (why.isEmpty()) {
            box.getChildren().remove(complaint);
        } else if (!box.getChildren().contains(complaint)) {
            box.getChildren().add(complaint);
        }
    }
}
