package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.FaultRun;
import clipramp.desk.model.FaultWords;
import clipramp.desk.model.LongRun;
import clipramp.faults.Diagnosis;
import clipramp.faults.FaultSheet;
import clipramp.faults.Observation;
import clipramp.faults.ObservationReader;
import clipramp.faults.RefusedObservationException;
import clipramp.units.RefusedQuantityException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Single faults and what follows from each; and backwards, which of them fit what was seen. */
final class FaultsPage implements PageView {
    /** Of the table's width: fault, fits, load gets, load, knob, and the test points. */
    private static final double[] SHARES = {30, 6, 11, 6.5, 5.5, 7.3, 7.3, 8.3, 8.3, 7.6, 7.6};

    private static final double SCROLL_BAR = 16;
    private static final double TABLE_SHARE = 0.44;
    private static final double LEAST_TABLE = 220;
    private static final double POINTS_FROM_WIDTH = 970;

    private final Theme theme;
    private final DeskModel model;
    private final LongRun<FaultRun.Asked, FaultRun.Answer> run;
    private final Button start = new Button("Work the faults out");
    private final Button cancel = new Button("Cancel");
    private final ProgressBar bar = new ProgressBar(0);
    private final Label progress = Words.quiet("");
    private final Label complaint = Words.wrapped("");
    private final SeenForm seen = new SeenForm(this::rank);
    private final Label heading = Words.quiet("");
    private final TableView<List<String>> table = new TableView<>();
    private final FaultDetail detail = new FaultDetail();
    private final VBox middle = new VBox();
    private final BorderPane box = new BorderPane();
    private List<Diagnosis.Candidate> shown = List.of();
    private boolean ranked;
    private Optional<FaultSheet> told = Optional.empty();

    FaultsPage(Theme theme, DeskModel model) {
        this.theme = theme;
        this.model = model;
        this.run = model.faults();
        ask();
        table.setId("faults-table");
        table.widthProperty().addListener(property -> columns());
        table.setAccessibleText("Faults, one a row; choosing one shows it below");
        table.getSelectionModel().selectedIndexProperty().addListener(property -> choose());
        middle.getStyleClass().add("spread-middle");
        middle.setId("faults-middle");
        Label live = Words.wrapped(FaultSheet.LIVE);
        live.setId("faults-live");
        live.getStyleClass().add("notice");
        middle.getChildren().addAll(live, heading, table, detail.node());
        ScrollPane scroll = new ScrollPane(middle);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setAccessibleText("Faults: table and detail; arrow keys scroll");
        scroll.getStyleClass().add("record-scroll");
        box.setCenter(scroll);
        box.widthProperty().addListener(property -> arrange());
        box.heightProperty().addListener(property -> arrange());
        theme.onChange(this::arrange);
        run.onChange(this::refresh);
        model.onCondition(this::refresh);
        arrange();
    }

    private void ask() {
        start.setId("faults-start");
        start.setDefaultButton(true);
        start.setOnAction(event -> start());
        cancel.setId("faults-cancel");
        cancel.setOnAction(event -> run.cancel());
        bar.setMaxWidth(Double.MAX_VALUE);
        bar.setAccessibleText("Faults worked out");
        bar.managedProperty().bind(bar.visibleProperty());
        progress.managedProperty().bind(progress.textProperty().isNotEmpty());
        progress.setId("faults-progress");
        complaint.setId("faults-complaint");
        complaint.getStyleClass().add("complaint");
        complaint.managedProperty().bind(complaint.textProperty().isNotEmpty());
        box.setLeft(new SidePanel(start, cancel, bar, progress, seen.node(), complaint).node());
    }

    @Override
    public BorderPane node() {
        return box;
    }

    /** The first time they are worked out unasked: it is a matter of a second. */
    @Override
    public void follow() {
        if (run.answer().isEmpty() && run.trouble().isEmpty() && !run.isRunning()) {
            start();
        }
        refresh();
    }

    private void start() {
        FaultRun.of(model.draft(), model.condition()).ifPresent(run::start);
    }

    private boolean isStale() {
        return run.answer().isPresent()
                && !FaultRun.of(model.draft(), model.condition())
                        .equals(run.answer().map(FaultRun.Answer::asked));
    }

    private void refresh() {
        start.setDisable(run.isRunning());
        cancel.setDisable(!run.isRunning() || run.isEnding());
        bar.setVisible(run.isRunning());
        run.progress().ifPresent(now -> bar.setProgress(now.share().orElse(ProgressBar.INDETERMINATE_PROGRESS)));
        progress.setText(words());
        Css.state(middle, "stale", isStale());
        run.answer().map(FaultRun.Answer::sheet).ifPresent(sheet -> {
            if (!told.equals(Optional.of(sheet))) {
                told = Optional.of(sheet);
                FaultWords words = new FaultWords(sheet);
                heading.setText(words.heading());
                seen.offer(words.parts());
                rank();
            }
        });
    }

    private String words() {
        if (run.isRunning()) {
            return run.isEnding()
                    ? "Ending…"
                    : run.progress().map(LongRun.Progress::words).orElse("Working them out…");
        }
        if (run.trouble().isPresent()) {
            return run.trouble().get().text();
        }
        return isStale() ? "The design or its condition has changed since; work them out again." : "";
    }

    /** The order of the signal, or of what was seen. */
    private void rank() {
        told.ifPresent(sheet -> {
            FaultWords words = new FaultWords(sheet);
            List<Observation> observations = observations(sheet);
            Optional<String> chosen = chosen().map(c -> c.effect().fault().id());
            shown = words.candidates(observations);
            Tables.fill(table, words.table(shown));
            ranked = !observations.isEmpty();
            columns();
            select(observations.isEmpty() ? chosen : Optional.empty());
            detail.say(words.notComputed());
        });
    }

    private List<Observation> observations(FaultSheet sheet) {
        ObservationReader reader = new ObservationReader(sheet.design());
        List<Observation> all = new ArrayList<>();
        try {
            for (String text : seen.observations()) {
                all.addAll(reader.read(text));
            }
            complaint.setText("");
        } catch (RefusedObservationException | RefusedQuantityException e) {
            complaint.setText(String.valueOf(e.getMessage()));
        }
        return all;
    }

    /** The one that was chosen, or the first: where something was seen, the one that fits best. */
    private void select(Optional<String> id) {
        int row = 0;
        for (int i = 0; i < shown.size(); i++) {
            row = id.equals(Optional.of(shown.get(i).effect().fault().id())) ? i : row;
        }
        table.getSelectionModel().select(row);
        if (id.isEmpty()) {
            table.scrollTo(0);
        }
        choose();
    }

    private Optional<Diagnosis.Candidate> chosen() {
        int row = table.getSelectionModel().getSelectedIndex();
        return row >= 0 && row < shown.size() ? Optional.of(shown.get(row)) : Optional.empty();
    }

    private void choose() {
        told.ifPresent(sheet -> chosen().ifPresent(candidate -> detail.show(new FaultWords(sheet), candidate)));
    }

    /** Where there is no room the test points stand in the detail only. */
    private void columns() {
        if (table.getColumns().size() < SHARES.length) {
            return;
        }
        boolean wide = box.getWidth() / theme.zoom() >= POINTS_FROM_WIDTH;
        double all = 0;
        for (int i = 0; i < SHARES.length; i++) {
            boolean visible = i == FaultWords.FITS ? ranked : wide || i < FaultWords.POINTS_FROM;
            table.getColumns().get(i).setVisible(visible);
            all += visible ? SHARES[i] : 0;
        }
        double room = table.getWidth() - SCROLL_BAR * theme.zoom();
        for (int i = 0; i < SHARES.length; i++) {
            TableColumn<List<String>, ?> column = table.getColumns().get(i);
            column.setPrefWidth(Math.floor(room * SHARES[i] / all));
            if (i <= FaultWords.FITS + 1 && !column.getStyleClass().contains("words-column")) {
                column.getStyleClass().add("words-column");
            }
        }
    }

    private void arrange() {
        table.setMinHeight(Region.USE_PREF_SIZE);
        table.setPrefHeight(Math.max(LEAST_TABLE * theme.zoom(), box.getHeight() * TABLE_SHARE));
        columns();
    }
}
