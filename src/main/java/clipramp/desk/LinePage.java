package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.LineNow;
import clipramp.desk.model.LineRow;
import clipramp.figures.HarmonicsFigure;
import clipramp.figures.NumberTable;
import clipramp.margins.LineCheck;
import java.util.List;
import java.util.Optional;
import javafx.geometry.HPos;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** What the load's current is for the line: its orders beside the table for them, as the knob stands and at worst. */
final class LinePage implements PageView {
    /** Shorter than the figure's own, whose setting stands beside it here. */
    private static final List<String> HEADS = List.of("order", "now mA", "largest mA", "class A mA", "used %");

    private static final double FIGURE_SHARE = 0.5;
    private static final double LEAST_FIGURE = 240;
    private static final double TABLE_HEIGHT = 330;
    private static final double BESIDE_FROM = 1000;

    private final Theme theme;
    private final DeskModel model;
    private final LineNow now;
    private final GridPane totals = new GridPane();
    private final FigurePane figure;
    private final Label binding = Words.wrapped("");
    private final VBox rules = new VBox();
    private final TableView<List<String>> orders;
    private final GridPane lower = new GridPane();
    private final VBox middle = new VBox();
    private final BorderPane box = new BorderPane();
    private Optional<LineCheck> told = Optional.empty();

    LinePage(Theme theme, DeskModel model) {
        this.theme = theme;
        this.model = model;
        this.now = model.line();
        figure = new FigurePane(theme);
        figure.setId("line-figure");
        figure.setMinHeight(Region.USE_PREF_SIZE);
        orders = Tables.empty();
        orders.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_ALL_COLUMNS);
        orders.setId("line-orders");
        orders.getStyleClass().add("two-line-heads");
        binding.setId("line-binding");
        binding.getStyleClass().add("verdict");
        rules.setId("line-rules");
        rules.getStyleClass().add("spread-words");
        totals.getStyleClass().add("spread-table");
        totals.setId("line-totals");
        DialView dial = new DialView(model.bench());
        HBox knob = new HBox(dial.node());
        knob.getStyleClass().add("line-knob");
        Label guidance =
                Words.quiet("Guidance for a designer: nominal line and parts, the firing supply's own current left out."
                        + " A test house and local rules decide.");
        guidance.setId("line-guidance");
        box.setLeft(new SidePanel(knob, totals, guidance).node());
        middle.getStyleClass().add("spread-middle");
        lower.getStyleClass().add("line-lower");
        middle.getChildren().addAll(figure, binding, lower);
        Scroller scroll = Scroller.ofText(middle, "Line current: figure, rules and orders; arrow keys scroll");
        scroll.getStyleClass().add("record-scroll");
        box.setCenter(scroll);
        box.sceneProperty().addListener((property, before, scene) -> now.watch(scene != null));
        box.widthProperty().addListener(property -> arrange());
        box.heightProperty().addListener(property -> arrange());
        theme.onChange(this::arrange);
        now.onChange(this::refresh);
        model.onJudgement(this::refresh);
        arrange();
    }

    @Override
    public BorderPane node() {
        return box;
    }

    @Override
    public void follow() {
        refresh();
    }

    /** Rules and orders stand side by side where there is room, else one under the other. */
    private void arrange() {
        double zoom = theme.zoom();
        figure.setPrefHeight(Math.max(LEAST_FIGURE * zoom, box.getHeight() * FIGURE_SHARE));
        orders.setPrefHeight(TABLE_HEIGHT * zoom);
        lower.getChildren().clear();
        boolean beside = box.getWidth() / zoom >= BESIDE_FROM;
        lower.add(rules, 0, 0);
        lower.add(orders, beside ? 1 : 0, beside ? 0 : 1);
        for (Region part : List.of(rules, orders)) {
            GridPane.setHgrow(part, Priority.ALWAYS);
            part.setPrefWidth(1);
            part.setMinWidth(0);
            part.setMaxWidth(Double.MAX_VALUE);
        }
    }

    private void refresh() {
        if (box.getScene() == null) {
            return;
        }
        model.judgement().flatMap(j -> j.check().lineCurrent()).ifPresent(check -> {
            HarmonicsFigure shown = new HarmonicsFigure(check, now.setting());
            figure.show(shown);
            Tables.fill(orders, new NumberTable(HEADS, shown.numbers().rows()));
            orders.getColumns().forEach(column -> column.setText(Tables.unitBelow(column.getText())));
            orders.setAccessibleText(shown.sentence());
            fillTotals(now.setting().orElseGet(check::worstSetting), check.worstSetting());
            if (!told.equals(Optional.of(check))) {
                told = Optional.of(check);
                binding.setText(LineRow.binding(check));
                rules.getChildren().clear();
                check.rules().forEach(this::tell);
            }
        });
    }

    private void fillTotals(LineCheck.Setting standing, LineCheck.Setting worst) {
        List<LineRow> rows = LineRow.all(standing, worst);
        if (totals.getChildren().isEmpty()) {
            totals.addRow(0, Words.quiet(""), right(Words.quiet("now")), right(Words.quiet("at worst")));
            for (int i = 0; i < rows.size(); i++) {
                totals.addRow(i + 1, Words.quiet(rows.get(i).name()), right(new Label()), right(new Label()));
            }
        }
        for (int i = 0; i < rows.size(); i++) {
            int first = 3 * (i + 1);
            ((Label) totals.getChildren().get(first + 1)).setText(rows.get(i).now());
            ((Label) totals.getChildren().get(first + 2)).setText(rows.get(i).worst());
        }
    }

    private static Label right(Label label) {
        GridPane.setHalignment(label, HPos.RIGHT);
        label.setMinWidth(Region.USE_PREF_SIZE);
        GridPane.setHgrow(label, Priority.ALWAYS);
        return label;
    }

    private void tell(LineCheck.Rule rule) {
        Label head = Words.wrapped(rule.name() + ": " + rule.standing().word());
        head.getStyleClass().add("verdict");
        rules.getChildren().add(new VBox(head, Words.wrapped(rule.text()), Words.quiet(rule.source())));
    }
}
