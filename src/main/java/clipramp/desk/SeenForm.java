package clipramp.desk;

import clipramp.units.Expected;
import clipramp.units.LenientEntry;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.TilePane;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;

/** What a repairer has seen: a choice or a field each; what is left open was not looked at. */
final class SeenForm {
    private static final Expected VOLTS = Expected.within(Unit.VOLT, -1e4, 1e4).allowingBare();
    private static final String OPEN = "not looked at";

    /** What is chosen, and the word that the reader of observations takes for it. */
    private static final Map<String, String> LOADS = words(
            "nothing",
            "none",
            "half cycles missing",
            "half",
            "less",
            "less",
            "as before",
            "same",
            "more",
            "more",
            "full power",
            "full");

    private static final Map<String, String> KNOBS = words("acts", "acts", "does nothing", "dead");
    private static final Map<String, String> FUSES = words("whole", "whole", "blown", "blown");

    /** A reading's name on the form and in an observation. */
    private static final Map<String, String> READINGS = words(
            "TP1 dc",
            "TP1",
            "TP2 dc",
            "TP2",
            "TP3 peak",
            "TP3.peak",
            "TP4 peak",
            "TP4.peak",
            "TP5 dc",
            "TP5",
            "TP5 ac",
            "TP5.ac");

    private final ComboBox<String> load = choice("seen-load", "What the load gets", LOADS);
    private final ComboBox<String> knob = choice("seen-knob", "Whether the knob acts", KNOBS);
    private final ComboBox<String> fuse = choice("seen-fuse", "The line's fuse", FUSES);
    private final ComboBox<String> burnt = choice("seen-burnt", "A part that is burnt", Map.of());
    private final Map<String, TextField> readings = new LinkedHashMap<>();
    private final TextField more = new TextField();
    private final VBox box = new VBox();

    /** @param changed told whenever something else was seen */
    SeenForm(Runnable changed) {
        Label head = new Label("What was seen");
        head.getStyleClass().add("verdict");
        TilePane grid = new TilePane();
        grid.getStyleClass().add("seen-grid");
        row(grid, "load gets", load);
        row(grid, "knob", knob);
        row(grid, "fuse", fuse);
        row(grid, "burnt", burnt);
        for (ComboBox<String> combo : List.of(load, knob, fuse, burnt)) {
            combo.valueProperty().addListener(property -> changed.run());
        }
        READINGS.forEach((name, key) -> {
            TextField field = new TextField();
            field.setId("seen-" + key.replace('.', '-'));
            field.setPromptText("V");
            field.setAccessibleText(name + " in volts, as it was read");
            field.textProperty().addListener(property -> changed.run());
            readings.put(key, field);
            row(grid, name, field);
        });
        more.setId("seen-more");
        more.setPromptText("TP2.peak=13V");
        more.setAccessibleText("More that was seen, such as TP2.peak=13V, with commas between");
        more.textProperty().addListener(property -> changed.run());
        row(grid, "more", more);
        Button clear = new Button("Nothing seen");
        clear.setId("seen-clear");
        clear.setOnAction(event -> clear());
        box.getStyleClass().add("spread-words");
        box.getChildren().addAll(head, grid, clear);
    }

    private static Map<String, String> words(String... pairs) {
        Map<String, String> map = new LinkedHashMap<>();
        for (int i = 0; i < pairs.length; i += 2) {
            map.put(pairs[i], pairs[i + 1]);
        }
        return map;
    }

    private static ComboBox<String> choice(String id, String words, Map<String, String> choices) {
        ComboBox<String> combo = new ComboBox<>();
        combo.getItems().add(OPEN);
        combo.getItems().addAll(choices.keySet());
        combo.setValue(OPEN);
        combo.setId(id);
        combo.setAccessibleText(words);
        return combo;
    }

    /** One under the other, or in two columns where the form is as wide as the page. */
    private static void row(TilePane grid, String name, Region control) {
        Label label = new Label(name);
        label.getStyleClass().add("quiet");
        label.setMinWidth(Region.USE_PREF_SIZE);
        label.setLabelFor(control);
        control.setMaxWidth(Double.MAX_VALUE);
        control.setMinWidth(0);
        HBox.setHgrow(control, Priority.ALWAYS);
        HBox row = new HBox(label, control);
        row.getStyleClass().add("seen");
        grid.getChildren().add(row);
    }

    VBox node() {
        return box;
    }

    /** Parts that can be found burnt. */
    void offer(List<String> parts) {
        List<String> wanted = new ArrayList<>(List.of(OPEN));
        wanted.addAll(parts);
        if (!burnt.getItems().equals(wanted)) {
            String before = burnt.getValue();
            burnt.getItems().setAll(wanted);
            burnt.setValue(wanted.contains(before) ? before : OPEN);
        }
    }

    /**
     * Everything that was seen, one observation each, as it is written for the command.
     *
     * @throws RefusedQuantityException for a reading that is no voltage
     */
    List<String> observations() {
        List<String> seen = new ArrayList<>();
        said(seen, "load:", LOADS.get(load.getValue()));
        said(seen, "knob:", KNOBS.get(knob.getValue()));
        said(seen, "fuse:", FUSES.get(fuse.getValue()));
        if (!OPEN.equals(burnt.getValue()) && burnt.getValue() != null) {
            seen.add("blown:" + burnt.getValue());
        }
        readings.forEach((key, field) -> {
            String text = field.getText().strip();
            if (!text.isEmpty()) {
                seen.add(key + "=" + volts(text));
            }
        });
        if (!more.getText().isBlank()) {
            seen.add(more.getText().strip());
        }
        return seen;
    }

    /** With the unit, and a decimal comma made a dot. */
    private static String volts(String text) {
        String plain = LenientEntry.read(text, VOLTS).text();
        return Character.isLetter(plain.charAt(plain.length() - 1)) ? plain : plain + " V";
    }

    private static void said(List<String> seen, String what, @Nullable String word) {
        if (word != null) {
            seen.add(what + word);
        }
    }

    private void clear() {
        for (ComboBox<String> combo : List.of(load, knob, fuse, burnt)) {
            combo.setValue(OPEN);
        }
        readings.values().forEach(TextField::clear);
        more.clear();
    }
}
