package clipramp.desk;

import clipramp.desk.model.Draft;
import clipramp.desk.model.LongRun;
import clipramp.desk.model.PartSlot;
import clipramp.desk.model.Resized;
import clipramp.desk.model.Resizing;
import clipramp.desk.model.Resizing.Goal;
import clipramp.desk.model.Sheet;
import clipramp.desk.model.SizedRows;
import clipramp.figures.ShapeFigure;
import clipramp.files.SizedText;
import clipramp.sizing.OpenPart;
import clipramp.units.PreferredSeries;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Values searched for anew: what is free and wanted on the left, what was found and why beside it, taken in one step. */
final class SizePage implements PageView {
    private static final Set<OpenPart> RAMP = EnumSet.of(OpenPart.FIXED, OpenPart.TRACK);
    private static final Set<OpenPart> AT_FIRST = EnumSet.of(OpenPart.CAPACITOR, OpenPart.FIXED, OpenPart.TRACK);
    private static final Set<OpenPart> ADDED = EnumSet.of(OpenPart.ACROSS, OpenPart.TRIM_HIGH, OpenPart.TRIM_LOW);
    private static final List<String> WANTED = List.of("wanted.lowest", "wanted.highest");
    private static final double FIGURE_HEIGHT = 300;

    private final Draft draft;
    private final LongRun<Resizing.Asked, Resized> run;
    private final Theme theme;
    private final ComboBox<String> goal = new ComboBox<>();
    private final ComboBox<String> series = new ComboBox<>();
    private final Map<OpenPart, CheckBox> free = new EnumMap<>(OpenPart.class);
    private final VBox parts = new VBox();
    private final VBox wanted = new VBox();
    private final List<SlotView> slots = new ArrayList<>();
    private final Button start = new Button("Search");
    private final Label complaint = Words.wrapped("");
    private final Button take = new Button("Take over");
    private final Label state = Words.wrapped("");
    private final FigurePane curve;
    private final VBox tables = new VBox();
    private final SizedView found = new SizedView();
    private final VBox result = new VBox();
    private final BorderPane box = new BorderPane();
    private Optional<Resized> told = Optional.empty();

    SizePage(Theme theme, Draft draft, LongRun<Resizing.Asked, Resized> run) {
        this.theme = theme;
        this.draft = draft;
        this.run = run;
        this.curve = new FigurePane(theme);
        curve.setId("size-curve");
        ask();
        show();
        run.onChange(this::refresh);
        theme.onChange(this::fit);
        fit();
    }

    private void fit() {
        curve.setMinHeight(FIGURE_HEIGHT * theme.zoom());
        curve.setPrefHeight(FIGURE_HEIGHT * theme.zoom());
    }

    private void ask() {
        askForGoal();
        series.getItems()
                .setAll(Arrays.stream(PreferredSeries.values()).map(Enum::name).toList());
        series.setValue(PreferredSeries.E24.name());
        series.setId("size-series");
        series.setAccessibleText("Preferred values of resistors");
        parts.getStyleClass().add("size-parts");
        wanted.getStyleClass().add("size-wanted");
        start.setId("size-start");
        start.setDefaultButton(true);
        start.setOnAction(event -> start());
        complaint.setId("size-complaint");
        complaint.getStyleClass().add("complaint");
        complaint.managedProperty().bind(complaint.textProperty().isNotEmpty());
        box.setLeft(new SidePanel(
                        SpreadPage.named("look for", goal),
                        wanted,
                        SpreadPage.named("series", series),
                        parts,
                        start,
                        new RunBar(run, "size", "searching for values").node(),
                        complaint)
                .node());
    }

    private void askForGoal() {
        goal.getItems()
                .setAll(
                        "values that hold",
                        "a straight knob, power",
                        "a straight knob, light",
                        "an angle that heat leaves alone");
        goal.setValue(goal.getItems().get(0));
        goal.setId("size-goal");
        goal.setAccessibleText("What is looked for");
        goal.valueProperty().addListener(property -> {
            offer();
            refresh();
        });
    }

    private void show() {
        take.setId("size-take");
        take.setOnAction(event -> take());
        state.setId("size-state");
        tables.setId("size-tables");
        tables.getStyleClass().add("sized");
        result.getChildren().setAll(state, take, curve, tables, found.node());
        result.getStyleClass().add("spread-middle");
        Scroller scroll = Scroller.ofText(result, "What was found; arrow keys scroll");
        scroll.getStyleClass().add("record-scroll");
        box.setCenter(scroll);
    }

    @Override
    public Region node() {
        return box;
    }

    @Override
    public void follow() {
        draft.sheet().ifPresent(sheet -> {
            wanted(sheet);
            offer();
        });
        refresh();
    }

    private void wanted(Sheet sheet) {
        List<PartSlot> here = PartSlot.at(WANTED, sheet);
        if (slots.isEmpty()) {
            for (PartSlot slot : here) {
                SlotView view = new SlotView(slot, draft, key -> {});
                slots.add(view);
                wanted.getChildren().add(view.box());
            }
        }
        for (int i = 0; i < here.size(); i++) {
            slots.get(i).show(here.get(i));
        }
    }

    private Goal chosen() {
        return Goal.values()[Math.max(0, goal.getItems().indexOf(goal.getValue()))];
    }

    /** Parts that may be free: those that the design has, for a straight knob only the ramp's resistances. */
    private void offer() {
        draft.sheet().ifPresent(sheet -> {
            List<OpenPart> shown = Arrays.stream(OpenPart.values())
                    .filter(part -> chosen() == Goal.PARTS || (isShaping() && RAMP.contains(part)))
                    .filter(part -> SizedText.value(part, sheet.design()).isPresent() || mayBeAdded(part, sheet))
                    .toList();
            parts.getChildren().clear();
            if (!shown.isEmpty()) {
                parts.getChildren().add(Words.quiet("free to be chosen; all else is kept"));
            } else {
                parts.getChildren().add(Words.quiet("base two's resistor is chosen; all else is kept"));
            }
            for (OpenPart part : shown) {
                parts.getChildren().add(box(part, sheet));
            }
            if (isShaping()) {
                parts.getChildren().add(Words.quiet("law, end and shunt of the pot are always chosen"));
            }
        });
    }

    /** A resistor across the pot and trimmers, which most designs do without. */
    private boolean mayBeAdded(OpenPart part, Sheet sheet) {
        return !isShaping()
                && ADDED.contains(part)
                && sheet.design().ramp().pot().isPresent();
    }

    private boolean isShaping() {
        return chosen() == Goal.STRAIGHT_POWER || chosen() == Goal.STRAIGHT_LIGHT;
    }

    private CheckBox box(OpenPart part, Sheet sheet) {
        PartSlot slot = PartSlot.at(List.of(part.key()), sheet).get(0);
        String name = (slot.designator() + "  " + slot.label()).strip();
        CheckBox check = free.computeIfAbsent(part, p -> {
            CheckBox made = new CheckBox();
            made.setId("size-free-" + p.key().replace('.', '-'));
            made.setSelected(AT_FIRST.contains(p));
            made.setMaxWidth(Double.MAX_VALUE);
            return made;
        });
        // Tolerance and ratings stand on the bench; here the value is enough, and nothing may be cut off.
        String shown = slot.shown().startsWith("{") ? "" : ", " + slot.shown().replaceFirst(" *(±|\\+-).*", "");
        check.setText(name + shown);
        check.setAccessibleText("Free to be chosen: " + name + shown);
        return check;
    }

    private void start() {
        Set<OpenPart> ticked = EnumSet.noneOf(OpenPart.class);
        free.forEach((part, check) -> {
            if (check.isSelected() && parts.getChildren().contains(check)) {
                ticked.add(part);
            }
        });
        draft.sheet()
                .ifPresent(sheet -> run.start(Resizing.Asked.of(
                        sheet, draft.file(), chosen(), ticked, PreferredSeries.valueOf(series.getValue()))));
    }

    private void take() {
        told.ifPresent(t -> draft.edit(
                "values of " + t.changed() + (t.changed() == 1 ? " part" : " parts"),
                sheet -> t.sheet().text(),
                trouble -> complaint.setText(trouble.map(w -> w.text()).orElse(""))));
    }

    private void refresh() {
        start.setDisable(run.isRunning());
        complaint.setText(run.trouble().map(t -> t.text()).orElse(""));
        // What was found for another goal is no answer to this one.
        Optional<Resized> answer = run.answer().filter(a -> a.asked().goal() == chosen());
        if (!answer.equals(told)) {
            told = answer;
            told.ifPresentOrElse(this::tell, this::hush);
        }
        boolean stands = told.flatMap(t -> draft.sheet().map(t::isOf)).orElse(false);
        boolean changes = told.map(t -> t.changed() > 0).orElse(false);
        take.setDisable(!stands || !changes);
        take.setVisible(told.isPresent());
        curve.setVisible(told.flatMap(Resized::knobs).isPresent());
        curve.setManaged(curve.isVisible());
        tables.setManaged(!tables.getChildren().isEmpty());
        state.setText(state(stands, changes));
        state.setManaged(!state.getText().isEmpty());
    }

    private String state(boolean stands, boolean changes) {
        if (told.isEmpty()) {
            return "Tick what may change and search. Nothing changes in the design until you take it over, and that is one"
                    + " step that can be undone.";
        }
        if (stands) {
            return changes ? "" : "Nothing better was found than what stands there.";
        }
        boolean taken = draft.sheet()
                .map(s -> s.text().text().equals(told.get().sheet().text().text()))
                .orElse(false);
        return taken ? "Taken over. Undo takes it back." : "The design has changed since; search again.";
    }

    private void hush() {
        found.clear();
        tables.getChildren().clear();
    }

    private void tell(Resized answer) {
        found.show(answer);
        tables.getChildren().clear();
        answer.knobs().ifPresent(knobs -> {
            curve.show(new ShapeFigure(knobs.before(), knobs.after()));
            tables.getChildren().add(TextGrid.ofFigures("size-shape", SizedRows.of(knobs)));
        });
        answer.steadied().ifPresent(steadied -> {
            Label head = Words.wrapped("Base two against temperature, at mid-knob");
            head.getStyleClass().add("sized-head");
            tables.getChildren().addAll(head, TextGrid.ofFigures("size-steady", SizedRows.of(steadied)));
        });
    }
}
