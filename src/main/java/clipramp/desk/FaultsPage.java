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
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableRow;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;

/** Single faults and what follows from each; and backwards, which of them fit what was seen. */
final class FaultsPage implements PageView {
    /** In effective pixels behind the fault's name: fits, load gets, load, knob, and the test points. */
    private static final double[] WIDTHS = {62, 144, 56, 56, 58, 58, 74, 74, 58, 58};

    private static final double LEAST_NAME = 230;
    private static final double SCROLL_BAR = 18;
    private static final double TABLE_SHARE = 0.48;
    private static final double ROW = 25;
    private static final double HEADS = 44;
    private static final double LEAST_ROWS = 7;

    private final Theme theme;
    private final DeskModel model;
    private final LongRun<FaultRun.Asked, FaultRun.Answer> run;
    private final Button start = new Button("Work the faults out");
    private final Label state = Words.quiet("");
    private final Label complaint = Words.wrapped("");
    private final SeenForm seen = new SeenForm(this::rank);
    private final Label heading = Words.quiet("");
    private final TableView<List<String>> table = Tables.empty();
    private final FaultDetail detail = new FaultDetail();
    private final VBox middle = new VBox();
    private final TwoColumns box;
    private List<Diagnosis.Candidate> shown = List.of();
    private boolean ranked;
    private Optional<FaultSheet> told = Optional.empty();

    FaultsPage(Theme theme, DeskModel model) {
        this.theme = theme;
        this.model = model;
        this.run = model.faults();
        table.setId("faults-table");
        table.setVisible(false);
        table.getStyleClass().add("two-line-heads");
        table.setRowFactory(view -> new NamedRow());
        table.widthProperty().addListener(property -> columns());
        table.setAccessibleText("Faults, one a row; choosing one shows it below");
        table.getSelectionModel().selectedIndexProperty().addListener(property -> choose());
        middle.setId("faults-middle");
        Label live = Words.wrapped(FaultSheet.LIVE);
        live.setId("faults-live");
        live.getStyleClass().add("notice");
        middle.getChildren().addAll(heading, table, detail.node());
        box = new TwoColumns(theme, asked(), middle, "Faults: table and detail; arrow keys scroll");
        box.begin(live);
        box.node().heightProperty().addListener(property -> arrange());
        theme.onChange(this::arrange);
        run.onChange(this::refresh);
        model.onCondition(this::refresh);
        arrange();
    }

    /** A name that is cut off can be read whole where the pointer rests, as it stands in the detail below. */
    private static final class NamedRow extends TableRow<List<String>> {
        @Override
        protected void updateItem(@Nullable List<String> item, boolean empty) {
            super.updateItem(item, empty);
            setTooltip(item == null || empty ? null : new Tooltip(item.get(0)));
        }
    }

    private SidePanel asked() {
        start.setId("faults-start");
        start.setDefaultButton(true);
        start.setOnAction(event -> start());
        state.managedProperty().bind(state.textProperty().isNotEmpty());
        state.setId("faults-state");
        complaint.setId("faults-complaint");
        complaint.getStyleClass().add("complaint");
        complaint.managedProperty().bind(complaint.textProperty().isNotEmpty());
        return new SidePanel(
                start, new RunBar(run, "faults", "working the faults out").node(), state, seen.node(), complaint);
    }

    @Override
    public BorderPane node() {
        return box.node();
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
        state.setText(words());
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
            return "";
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
            table.setVisible(true);
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

    /** Where there is no room the test points stand in the detail only; the fault's name takes what is left. */
    private void columns() {
        if (table.getColumns().size() <= WIDTHS.length) {
            return;
        }
        double room = table.getWidth() - SCROLL_BAR * theme.zoom();
        boolean wide = room / theme.zoom() >= LEAST_NAME + width(i -> true);
        IntPredicate shows = i -> i == FaultWords.FITS ? ranked : wide || i < FaultWords.POINTS_FROM;
        for (int i = 0; i < table.getColumns().size(); i++) {
            TableColumn<List<String>, ?> column = table.getColumns().get(i);
            column.setVisible(shows.test(i));
            column.setPrefWidth(Math.floor(i == 0 ? room - width(shows) * theme.zoom() : WIDTHS[i - 1] * theme.zoom()));
            boolean words = i == 0 || i == FaultWords.FITS + 1 || i == FaultWords.POINTS_FROM - 1;
            if (words && !column.getStyleClass().contains("words-column")) {
                column.getStyleClass().add("words-column");
            }
            column.setText(Tables.unitBelow(FaultWords.HEADS.get(i)));
        }
    }

    private static double width(IntPredicate shown) {
        return IntStream.rangeClosed(1, WIDTHS.length)
                .filter(shown)
                .mapToDouble(i -> WIDTHS[i - 1])
                .sum();
    }

    private void arrange() {
        double room = box.node().getHeight() * TABLE_SHARE;
        double row = ROW * theme.zoom();
        table.setFixedCellSize(row);
        // Whole rows under the heads, so that none is cut through.
        double rows = Math.max(LEAST_ROWS, Math.floor(room / row) - 2);
        table.setMinHeight(Region.USE_PREF_SIZE);
        table.setPrefHeight(HEADS * theme.zoom() + rows * row + 2);
        columns();
    }
}
