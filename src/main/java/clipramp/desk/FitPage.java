package clipramp.desk;

import clipramp.desk.model.BenchSheet;
import clipramp.desk.model.Draft;
import clipramp.desk.model.Fitting;
import clipramp.desk.model.LongRun;
import clipramp.desk.model.Sheet;
import clipramp.files.ReadingsTable;
import clipramp.units.Expected;
import clipramp.units.LenientEntry;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** What was read of one unit, and from it the unit as built; taken over in one step. */
final class FitPage implements PageView {
    private static final String NAME = "readings";
    private static final Expected AIR = Expected.within(Unit.CELSIUS, -60, 150).allowingBare();
    private static final Expected VOLTS = Expected.within(Unit.VOLT, 1, 2000).allowingBare();

    private final Draft draft;
    private final LongRun<Fitting.Asked, Fitting.Answer> run;
    private final Actions actions;
    private final FlowPane columns = new FlowPane();
    private final TextField air = new TextField("25 °C");
    private final TextField volts = new TextField();
    private final Button start = new Button("Fit");
    private final Label complaint = Words.wrapped("");
    private final BenchTable table;
    private final Button take = new Button("Take over as built");
    private final Label state = Words.wrapped("");
    private final FitView view = new FitView();
    private final SidePanel side = new SidePanel();
    private final VBox middle = new VBox();
    private final TwoColumns box;
    private Optional<Boolean> knob = Optional.empty();
    private Optional<Fitting.Answer> told = Optional.empty();
    private boolean typed;
    /** The readings as some file has them. */
    private Optional<ReadingsTable> saved = Optional.empty();

    /** The readings as they are kept against a sudden end. */
    private Optional<ReadingsTable> kept = Optional.empty();

    FitPage(Theme theme, Draft draft, LongRun<Fitting.Asked, Fitting.Answer> run, Actions actions) {
        this.draft = draft;
        this.run = run;
        this.actions = actions;
        this.table = new BenchTable(complaint::setText, this::typed);
        ask();
        show();
        box = new TwoColumns(theme, side, middle, "Readings and what they tell; arrow keys scroll");
        box.scroll().setId("fit-scroll");
        run.onChange(this::refresh);
    }

    private void ask() {
        columns.getStyleClass().add("bench-columns");
        air.setId("fit-air");
        air.setAccessibleText("Ambient temperature while it was read");
        volts.setId("fit-line");
        volts.setPromptText("not read: fitted");
        volts.setAccessibleText("Line voltage on lines where none was read; empty where it is not known");
        start.setId("fit-start");
        start.setDefaultButton(true);
        start.setOnAction(event -> start());
        complaint.setId("fit-complaint");
        complaint.getStyleClass().add("complaint");
        complaint.managedProperty().bind(complaint.textProperty().isNotEmpty());
        side.column()
                .getChildren()
                .setAll(
                        start,
                        new RunBar(run, "fit", "fitting the unit to its readings").node(),
                        complaint,
                        SpreadPage.named("what was read", columns),
                        SpreadPage.named("ambient", air),
                        SpreadPage.named("line, where not read", volts));
    }

    private void show() {
        Button open = new Button("Open readings…");
        open.setId("fit-open");
        open.setAccessibleText("Open a file of readings, comma-separated");
        open.setOnAction(event -> actions.openReadings(this::offer));
        Button paste = new Button("Paste");
        paste.setId("fit-paste");
        paste.setAccessibleText("Paste a table from the clipboard, from the first line on");
        paste.setOnAction(event -> pasteAll());
        Button save = new Button("Save readings…");
        save.setId("fit-save");
        save.setAccessibleText("Save the readings as a file, comma-separated");
        save.setOnAction(event -> saveThen(() -> {}));
        take.setId("fit-take");
        take.setOnAction(event -> take());
        state.setId("fit-state");
        FlowPane buttons = new FlowPane(open, paste, save, take);
        buttons.getStyleClass().add("flow-buttons");
        middle.getChildren().setAll(buttons, state, table.node(), view.node());
    }

    @Override
    public Region node() {
        return box.node();
    }

    @Override
    public void follow() {
        draft.sheet().ifPresent(sheet -> {
            boolean turns = sheet.design().ramp().pot().isPresent();
            if (!knob.equals(Optional.of(turns)) && !typed) {
                table.show(new BenchSheet(turns));
                offerColumns();
            }
            knob = Optional.of(turns);
        });
        refresh();
    }

    private void offerColumns() {
        columns.getChildren().clear();
        List<BenchSheet.Column> all = table.sheet().columns();
        for (BenchSheet.Column column : all) {
            CheckBox check = new CheckBox(column.head());
            check.setId("fit-column-" + all.indexOf(column));
            check.setAccessibleText("Column " + column.head());
            check.setSelected(column.isShown());
            check.setOnAction(event -> {
                column.setShown(check.isSelected());
                table.draw();
                typed();
            });
            columns.getChildren().add(check);
        }
    }

    /** Takes readings from a file in place of what stands in the table; what is not saved there is asked about first. */
    void offer(ReadingsTable read) {
        if (unsaved().isPresent()) {
            actions.replaceReadings(() -> load(read, true));
        } else {
            load(read, true);
        }
    }

    /** Takes readings back that were typed in another window and never saved. */
    void takeBack(ReadingsTable read) {
        load(read, false);
    }

    private void load(ReadingsTable read, boolean isSaved) {
        table.sheet().load(read);
        table.draw();
        offerColumns();
        complaint.setText("");
        saved = isSaved ? Optional.of(table.sheet().table()) : Optional.empty();
        typed();
    }

    private void saveThen(Runnable then) {
        ReadingsTable written = table.sheet().table();
        actions.saveReadings(written, () -> {
            saved = Optional.of(written);
            keep(unsaved(), then);
        });
    }

    /** Goes on at once, or after the user has decided about readings that are in no file. */
    void whenSaved(Runnable then) {
        if (unsaved().isPresent()) {
            actions.leaveReadings(() -> saveThen(then), () -> keep(Optional.empty(), then));
        } else {
            then.run();
        }
    }

    /** What was read and stands in no file; empty where there is no such thing. */
    private Optional<ReadingsTable> unsaved() {
        ReadingsTable now = table.sheet().table();
        boolean empty = now.rows().stream().allMatch(row -> row.stream().allMatch(String::isBlank));
        return Optional.of(now).filter(all -> typed && !empty && !saved.equals(Optional.of(all)));
    }

    private void keep(Optional<ReadingsTable> readings, Runnable then) {
        if (readings.equals(kept)) {
            then.run();
        } else {
            kept = readings;
            draft.keepReadings(readings, then);
        }
    }

    private void pasteAll() {
        List<BenchSheet.Column> shown = table.sheet().shown();
        if (shown.isEmpty()) {
            complaint.setText("Tick a column first.");
        } else {
            table.paste(0, shown.get(0));
            offerColumns();
        }
    }

    /** Readings have changed: what was marked may not hold. */
    private void typed() {
        typed = true;
        keep(unsaved(), () -> {});
        table.mark(List.of());
        refresh();
    }

    private void start() {
        complaint.setText("");
        try {
            double celsius = LenientEntry.read(air.getText(), AIR).quantity().value();
            OptionalDouble line = volts.getText().isBlank()
                    ? OptionalDouble.empty()
                    : OptionalDouble.of(
                            LenientEntry.read(volts.getText(), VOLTS).quantity().value());
            draft.sheet()
                    .ifPresent(sheet -> run.start(new Fitting.Asked(
                            sheet, draft.file(), NAME, table.sheet().table(), celsius, line)));
        } catch (RefusedQuantityException e) {
            complaint.setText(e.refusal().message());
        }
    }

    private void take() {
        told.ifPresent(answer -> draft.edit(
                "the unit as built",
                sheet -> answer.built().text(),
                trouble -> complaint.setText(trouble.map(t -> t.text()).orElse(""))));
    }

    private void refresh() {
        start.setDisable(run.isRunning());
        run.trouble().ifPresent(trouble -> complaint.setText(trouble.text()));
        if (!run.answer().equals(told)) {
            told = run.answer();
            told.ifPresent(answer -> {
                view.show(answer);
                table.mark(answer.result().strangers());
            });
        }
        take.setDisable(told.isEmpty() || !stands() || !told.get().result().isTelling());
        String words = words();
        state.setText(words);
        state.setManaged(!words.isEmpty());
    }

    private boolean stands() {
        Optional<Sheet> now = draft.sheet();
        return told.isPresent()
                && now.isPresent()
                && told.get().isOf(now.get())
                && told.get().asked().table().equals(table.sheet().table());
    }

    private String words() {
        if (told.isEmpty()) {
            return "Type what was read of one unit, one line a setting; paste it from a spreadsheet, or open a file. An empty"
                    + " field was not read. Under each head its accuracy, which 19 readings in 20 keep within.";
        }
        if (stands()) {
            return "";
        }
        boolean taken = draft.sheet().map(told.get()::isTaken).orElse(false);
        return taken
                ? "Taken over: the design is this unit. Undo takes it back."
                : "Readings or design have changed since; fit again.";
    }
}
