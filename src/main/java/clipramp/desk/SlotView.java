package clipramp.desk;

import clipramp.desk.model.Draft;
import clipramp.desk.model.Entry;
import clipramp.desk.model.PartSlot;
import clipramp.desk.model.Stepping;
import clipramp.desk.model.Trouble;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.css.PseudoClass;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** One place of the strip: its name, what stands there, and under it what is wrong with a bad entry. */
final class SlotView {
    private final Draft draft;
    private final Label name = new Label();
    private final Label complaint = new Label();
    private final Control control;
    private final VBox box = new VBox();
    private PartSlot slot;
    private boolean filling;

    SlotView(PartSlot slot, Draft draft, Consumer<String> focused) {
        this.slot = slot;
        this.draft = draft;
        this.control = slot.isChoice() ? choice(slot) : field();
        control.setId("slot-" + slot.key().replace('.', '-'));
        control.setMaxWidth(Double.MAX_VALUE);
        control.focusedProperty().addListener((property, before, now) -> {
            if (now) {
                focused.accept(slot.key());
            }
        });
        name.setLabelFor(control);
        name.getStyleClass().add("quiet");
        complaint.getStyleClass().add("complaint");
        complaint.setId("complaint-" + slot.key().replace('.', '-'));
        complaint.setWrapText(true);
        complaint.setMinHeight(Region.USE_PREF_SIZE);
        box.getStyleClass().add("slot");
        box.getChildren().addAll(name, control);
    }

    String key() {
        return slot.key();
    }

    Control node() {
        return control;
    }

    VBox box() {
        return box;
    }

    /** What decides whether a view can go on showing a slot. */
    record Shape(String key, List<String> choices) {}

    Shape shape() {
        return shapeOf(slot);
    }

    static Shape shapeOf(PartSlot slot) {
        return new Shape(slot.key(), slot.choices());
    }

    void show(PartSlot other) {
        slot = other;
        name.setText((other.designator().isEmpty() ? "" : other.designator() + "  ") + other.label());
        control.setAccessibleText(other.label() + ", " + other.shown() + ". " + other.meaning());
        control.setTooltip(other.meaning().isEmpty() ? null : new Tooltip(other.key() + ": " + other.meaning()));
        filling = true;
        if (control instanceof TextField field) {
            field.setText(other.text());
            field.setPromptText(other.standIn());
        } else if (control instanceof ComboBox<?> combo) {
            @SuppressWarnings("unchecked")
            ComboBox<String> words = (ComboBox<String>) combo;
            words.setValue(other.shown());
        }
        filling = false;
        complain("");
    }

    private TextField field() {
        TextField field = new TextField();
        field.setOnAction(event -> commit(field));
        field.focusedProperty().addListener((property, before, now) -> {
            if (!now) {
                commit(field);
            }
        });
        field.addEventFilter(KeyEvent.KEY_PRESSED, event -> {
            if (event.getCode() == KeyCode.UP || event.getCode() == KeyCode.DOWN) {
                step(field, event.getCode() == KeyCode.UP ? 1 : -1);
                event.consume();
            } else if (event.getCode() == KeyCode.ESCAPE) {
                field.setText(slot.text());
                complain("");
                event.consume();
            }
        });
        return field;
    }

    private ComboBox<String> choice(PartSlot shown) {
        ComboBox<String> combo = new ComboBox<>();
        combo.getItems().setAll(shown.choices());
        combo.valueProperty().addListener((property, before, now) -> {
            if (!filling && now != null && !now.equals(slot.shown())) {
                draft.choose(slot.key(), now, this::answer);
            }
        });
        return combo;
    }

    private void step(TextField field, int steps) {
        String from = field.getText().isBlank() ? slot.standIn() : field.getText();
        Stepping.step(slot.key(), from, steps).ifPresent(text -> {
            field.setText(text);
            commit(field);
            field.end();
        });
    }

    private void commit(TextField field) {
        String typed = field.getText();
        boolean untouched = typed.isBlank() && slot.text().isEmpty();
        if (untouched || typed.strip().equals(slot.text())) {
            complain("");
            return;
        }
        Entry entry = Entry.read(slot.key(), typed);
        if (!entry.refusal().isEmpty()) {
            complain(entry.refusal());
            return;
        }
        draft.set(slot.key(), slot.label(), entry.text(), this::answer);
    }

    private void answer(Optional<Trouble> trouble) {
        trouble.ifPresentOrElse(t -> complain(t.text()), () -> complain(""));
        if (trouble.isPresent() && control instanceof ComboBox<?>) {
            String words = trouble.get().text();
            show(slot);
            complain(words);
        }
    }

    private void complain(String words) {
        complaint.setText(words);
        boolean there = box.getChildren().contains(complaint);
        if (words.isEmpty() && there) {
            box.getChildren().remove(complaint);
        } else if (!words.isEmpty() && !there) {
            box.getChildren().add(complaint);
        }
        control.pseudoClassStateChanged(PseudoClass.getPseudoClass("refused"), !words.isEmpty());
        control.setAccessibleHelp(words);
    }
}
