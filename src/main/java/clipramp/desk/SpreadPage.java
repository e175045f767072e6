package clipramp.desk;

import clipramp.desk.model.Draft;
import clipramp.desk.model.Sheet;
import clipramp.desk.model.SpreadRun;
import clipramp.desk.model.Trouble;
import clipramp.figures.HistogramFigure;
import clipramp.figures.SpreadFigure;
import clipramp.files.Remedied;
import clipramp.spread.DrawLaw;
import clipramp.spread.Remedy;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import clipramp.spread.SpreadWords;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.TextField;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** What the next thousand units do: asked on the left, drawn in the middle while it runs, told underneath. */
final class SpreadPage implements PageView {
    private static final double HISTOGRAM_SHARE = 0.42;
    private static final double CURVES_SHARE = 0.55;
    private static final double LEAST_HISTOGRAM = 200;
    private static final double LEAST_CURVES = 320;

    private final Draft draft;
    private final SpreadRun run;
    private final TextField units = new TextField(Integer.toString(SpreadOptions.DEFAULT.samples()));
    private final TextField seed = new TextField(Long.toString(SpreadOptions.DEFAULT.seed()));
    private final ComboBox<String> law = new ComboBox<>();
    private final Button start = new Button("Draw the units");
    private final Button cancel = new Button("Cancel");
    private final CheckBox bands = new CheckBox("Bands over lanes and knob");
    private final ProgressBar bar = new ProgressBar(0);
    private final Label progress = new Label();
    private final Label complaint = new Label();
    private final FigurePane histogram;
    private final FigurePane spread;
    private final VBox words = new VBox();
    private final BorderPane box = new BorderPane();
    private final VBox middle;
    private final List<Button> taking = new ArrayList<>();
    private Optional<SpreadResult> told = Optional.empty();

    SpreadPage(Theme theme, Draft draft, SpreadRun run, Runnable bandsChanged) {
        this.draft = draft;
        this.run = run;
        histogram = new FigurePane(theme);
        spread = new FigurePane(theme);
        histogram.setId("spread-histogram");
        spread.setId("spread-figure");
        histogram.setVisible(false);
        spread.setVisible(false);
        ask();
        bands.setSelected(true);
        bands.setId("spread-bands");
        bands.setOnAction(event -> bandsChanged.run());
        words.getStyleClass().add("spread-words");
        words.setId("spread-words");
        middle = new VBox(histogram, spread, words);
        middle.getStyleClass().add("spread-middle");
        for (FigurePane pane : List.of(histogram, spread)) {
            pane.setMinHeight(Region.USE_PREF_SIZE);
        }
        box.heightProperty().addListener(property -> fit(theme.zoom()));
        theme.onChange(() -> fit(theme.zoom()));
        fit(theme.zoom());
        Scroller scroll = Scroller.ofText(middle, "Spread: figures and words; arrow keys scroll");
        scroll.getStyleClass().add("record-scroll");
        box.setCenter(scroll);
        run.onChange(this::refresh);
        run.onChange(bandsChanged);
        draft.onChange(this::refresh);
    }

    /** Both figures in one look where there is room; never so low that their legends lie over the curves. */
    private void fit(double zoom) {
        histogram.setPrefHeight(Math.max(LEAST_HISTOGRAM * zoom, box.getHeight() * HISTOGRAM_SHARE));
        spread.setPrefHeight(Math.max(LEAST_CURVES * zoom, box.getHeight() * CURVES_SHARE));
    }

    private void ask() {
        law.getItems().addAll(Arrays.stream(DrawLaw.values()).map(DrawLaw::word).toList());
        law.setValue(SpreadOptions.DEFAULT.law().word());
        law.setId("spread-law");
        law.setAccessibleText("How parts lie within their tolerance");
        units.setId("spread-units");
        units.setAccessibleText("Units to draw");
        seed.setId("spread-seed");
        seed.setAccessibleText("Seed: the same one draws the same units");
        start.setId("spread-start");
        start.setDefaultButton(true);
        start.setOnAction(event -> start());
        cancel.setId("spread-cancel");
        cancel.setVisible(false);
        cancel.managedProperty().bind(cancel.visibleProperty());
        bar.managedProperty().bind(bar.visibleProperty());
        progress.managedProperty().bind(progress.textProperty().isNotEmpty());
        complaint.managedProperty().bind(complaint.textProperty().isNotEmpty());
        complaint.getStyleClass().add("complaint");
        cancel.setOnAction(event -> run.cancel());
        dressProgress();
        Label about =
                new Label("Every tolerance, data-sheet limit, line and temperature of the design, drawn together.");
        about.setWrapText(true);
        box.setLeft(new SidePanel(
                        about,
                        named("units", units),
                        named("parts lie", law),
                        named("seed", seed),
                        complaint,
                        start,
                        cancel,
                        bar,
                        progress,
                        bands)
                .node());
    }

    /** What tells how far the drawing is. */
    private void dressProgress() {
        bar.setMaxWidth(Double.MAX_VALUE);
        bar.setAccessibleText("Units drawn");
        bar.setVisible(false);
        progress.setId("spread-progress");
        progress.setWrapText(true);
        progress.getStyleClass().add("quiet");
        complaint.setId("spread-complaint");
        complaint.setWrapText(true);
    }

    /** A control under its name. */
    static VBox named(String name, Region control) {
        Label label = new Label(name);
        label.getStyleClass().add("quiet");
        label.setLabelFor(control);
        control.setMaxWidth(Double.MAX_VALUE);
        VBox named = new VBox(label, control);
        named.getStyleClass().add("named");
        return named;
    }

    @Override
    public BorderPane node() {
        return box;
    }

    /** The spread to be laid over lanes and knob: of the design as it stands, and wanted. */
    Optional<SpreadResult> bands() {
        return bands.isSelected() ? draft.sheet().map(Sheet::loaded).flatMap(run::of) : Optional.empty();
    }

    private void start() {
        Optional<Long> count = whole(units, 1, SpreadOptions.MOST_SAMPLES);
        Optional<Long> number = whole(seed, 0, SpreadOptions.HIGHEST_SEED);
        if (count.isEmpty()) {
            complaint.setText("Units are a whole number from 1 to " + SpreadOptions.MOST_SAMPLES + ", not \""
                    + units.getText() + "\".");
        } else if (number.isEmpty()) {
            complaint.setText("The seed is a whole number from 0 to " + SpreadOptions.HIGHEST_SEED + ", not \""
                    + seed.getText() + "\".");
        } else {
            complaint.setText("");
            SpreadOptions options = new SpreadOptions(
                    count.get().intValue(),
                    number.get(),
                    DrawLaw.values()[law.getItems().indexOf(law.getValue())],
                    SpreadOptions.DEFAULT.judged());
            draft.sheet().ifPresent(sheet -> run.start(sheet.loaded(), options));
        }
    }

    private static Optional<Long> whole(TextField field, long least, long most) {
        String text = field.getText().strip();
        if (!text.matches("\\d{1,18}")) {
            return Optional.empty();
        }
        return Optional.of(Long.parseLong(text)).filter(n -> n >= least && n <= most);
    }

    private void refresh() {
        start.setDisable(run.isRunning());
        cancel.setVisible(run.isRunning());
        cancel.setDisable(run.isEnding());
        bar.setVisible(run.isRunning());
        run.progress().ifPresent(now -> {
            bar.setProgress(now.share().orElse(ProgressBar.INDETERMINATE_PROGRESS));
            progress.setText(run.isEnding() ? "Ending…" : run.isRunning() ? now.words() : over());
        });
        run.histogram().filter(h -> h.units() > 0).ifPresent(h -> {
            histogram.setVisible(true);
            histogram.show(new HistogramFigure(h));
        });
        Optional<SpreadResult> result =
                run.answer().map(SpreadRun.Answer::spread).filter(s -> s.units() > 0);
        if (!result.equals(told)) {
            told = result;
            result.ifPresent(this::tell);
        }
        boolean stale = !run.isRunning() && isStale();
        Css.state(middle, "stale", stale);
        taking.forEach(button -> button.setDisable(stale));
    }

    private boolean isStale() {
        return run.answer().isPresent()
                && draft.sheet().map(Sheet::loaded).flatMap(run::of).isEmpty();
    }

    private String over() {
        return isStale() ? "The design has changed since; draw again." : "";
    }

    private void tell(SpreadResult result) {
        spread.setVisible(true);
        spread.show(new SpreadFigure(result));
        words.getChildren().clear();
        taking.clear();
        for (String sentence : SpreadWords.sentences(result)) {
            Label label = new Label(sentence);
            label.setWrapText(true);
            words.getChildren().add(label);
        }
        table(
                "What matters at mid-knob",
                List.of("", "alone", "in all", "power from one limit to the other"),
                SpreadWords.influences(result));
        GridPane help = table("What would help", List.of("", "yield", "gain"), SpreadWords.remedies(result));
        offer(help, SpreadWords.helping(result));
    }

    /** Behind each remedy a button that writes it into the design. */
    private void offer(GridPane grid, List<Remedy> remedies) {
        for (int i = 0; i < remedies.size(); i++) {
            Remedy remedy = remedies.get(i);
            Button take = new Button("Take over");
            take.setId("take-" + remedy.path().replace('.', '-'));
            take.setAccessibleText("Take over: " + remedy.change());
            take.setMinWidth(Region.USE_PREF_SIZE);
            take.setOnAction(event -> take(remedy));
            taking.add(take);
            grid.add(take, 3, i + 1);
        }
    }

    /** One step that can be taken back. */
    private void take(Remedy remedy) {
        draft.edit(
                remedy.change(),
                sheet -> Remedied.of(sheet.text(), sheet.design(), remedy).orElse(sheet.text()),
                trouble -> complaint.setText(trouble.map(Trouble::text).orElse("")));
    }

    private GridPane table(String title, List<String> heads, List<List<String>> rows) {
        GridPane grid = new GridPane();
        if (rows.isEmpty()) {
            return grid;
        }
        Label head = new Label(title);
        head.getStyleClass().add("verdict");
        grid.getStyleClass().add("spread-table");
        for (int c = 0; c < heads.size(); c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setHgrow(c == 0 ? Priority.ALWAYS : Priority.NEVER);
            grid.getColumnConstraints().add(column);
            grid.add(Words.quiet(heads.get(c)), c, 0);
        }
        for (int r = 0; r < rows.size(); r++) {
            for (int c = 0; c < heads.size(); c++) {
                Label cell = Words.wrapped(rows.get(r).get(c));
                cell.setWrapText(c == 0);
                if (c > 0) {
                    cell.setMinWidth(Region.USE_PREF_SIZE);
                }
                grid.add(cell, c, r + 1);
            }
        }
        words.getChildren().addAll(head, grid);
        return grid;
    }
}
