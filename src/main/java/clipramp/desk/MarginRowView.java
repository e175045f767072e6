package clipramp.desk;

import clipramp.desk.model.MarginRow;
import clipramp.margins.Verdict;
import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import javafx.css.PseudoClass;
import javafx.geometry.HPos;
import javafx.scene.control.Button;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** A margin's row: a button that opens it, and what it opens to. */
final class MarginRowView {
    /** Share of the row's width: name, asked, there is, bar, ratio, verdict. */
    private static final double[] COLUMNS = {36, 14, 13, 14, 8, 15};

    private static final double ROW_PADDING = 16;
    private static final int LONG_NAME = 28;

    private static final List<String> VERDICTS = List.of("fails", "tight", "holds", "not-judged");

    private final Label name = cell("margin-name");
    private final Label asked = cell("margin-figure");
    private final Label offered = cell("margin-figure");
    private final Label ratio = cell("margin-figure");
    private final Label verdict = cell("margin-verdict");
    private final Bar bar = new Bar();
    private final Button row = new Button();
    private final VBox details = new VBox();
    private final VBox box = new VBox(row);
    private final Consumer<String> chosen;
    private boolean open;
    private MarginRow shown =
            new MarginRow("", "", "", "", "", 0, 0, Verdict.NOT_JUDGED, "", "", "", "", "", List.of());

    MarginRowView(Consumer<String> chosen) {
        this.chosen = chosen;
        GridPane grid = new GridPane();
        grid.getStyleClass().add("margin-grid");
        for (double share : COLUMNS) {
            ColumnConstraints column = new ColumnConstraints();
            column.setPercentWidth(share);
            grid.getColumnConstraints().add(column);
        }
        grid.addRow(0, name, asked, offered, bar, ratio, verdict);
        for (Label figure : List.of(asked, offered, ratio)) {
            GridPane.setHalignment(figure, HPos.RIGHT);
        }
        grid.setMouseTransparent(true);
        row.setGraphic(grid);
        grid.prefWidthProperty().bind(row.widthProperty().subtract(ROW_PADDING));
        row.setMaxWidth(Double.MAX_VALUE);
        row.getStyleClass().setAll("margin-row");
        row.setOnAction(event -> setOpen(!open));
        details.getStyleClass().add("margin-details");
    }

    /** A long name takes two lines. */
    private static String inLines(String words) {
        int middle = words.lastIndexOf(' ', LONG_NAME);
        return words.length() <= LONG_NAME || middle < 0
                ? words
                : words.substring(0, middle) + "\n" + words.substring(middle + 1);
    }

    private static Label cell(String style) {
        Label label = new Label();
        label.getStyleClass().add(style);
        return label;
    }

    VBox node() {
        return box;
    }

    void show(MarginRow margin) {
        if (margin.equals(shown)) {
            return;
        }
        shown = margin;
        name.setText(inLines(margin.name()));
        asked.setText(margin.asked());
        offered.setText(margin.offered());
        ratio.setText(margin.ratio());
        verdict.setText(MarginRow.shape(margin.verdict()) + " " + MarginRow.word(margin.verdict()));
        for (String word : VERDICTS) {
            PseudoClass state = PseudoClass.getPseudoClass(word);
            boolean on = word.equals(margin.verdict().word().toLowerCase(Locale.ROOT));
            verdict.pseudoClassStateChanged(state, on);
            bar.fill.pseudoClassStateChanged(state, on);
        }
        bar.set(margin.barShare(), margin.limitShare());
        row.setId("margin-" + margin.id());
        row.setAccessibleText(margin.sentence() + ". Opens to formula, source and what to do.");
        if (open) {
            fillDetails();
        }
    }

    void setOpen(boolean wanted) {
        open = wanted;
        if (open) {
            fillDetails();
            box.getChildren().setAll(row, details);
        } else {
            box.getChildren().setAll(row);
        }
    }

    private void fillDetails() {
        details.getChildren().clear();
        add("", shown.meaning());
        add("worst at", shown.condition());
        add("formula", shown.formula());
        add("source", shown.source());
        add("what to do", shown.remedy());
        if (!shown.parts().isEmpty()) {
            FlowPane links = new FlowPane();
            links.getStyleClass().add("margin-parts");
            links.getChildren().add(quiet("moved by"));
            for (String part : shown.parts()) {
                Hyperlink link = new Hyperlink(part);
                link.setAccessibleText("Show the part " + part);
                link.setOnAction(event -> chosen.accept(part));
                links.getChildren().add(link);
            }
            details.getChildren().add(links);
        }
    }

    private void add(String head, String text) {
        if (!text.isEmpty()) {
            Label words = new Label(text);
            words.setWrapText(true);
            words.setMinHeight(Region.USE_PREF_SIZE);
            if (!head.isEmpty()) {
                details.getChildren().add(quiet(head));
            }
            details.getChildren().add(words);
        }
    }

    private static Label quiet(String text) {
        Label label = new Label(text);
        label.getStyleClass().add("quiet");
        return label;
    }

    /** The ratio as a bar on a track, and its limit as a mark across it. */
    private static final class Bar extends Pane {
        private static final double LIMIT_WIDTH = 2;
        private final Region track = new Region();
        private final Region fill = new Region();
        private final Region limit = new Region();
        private double share;
        private double limitShare;

        Bar() {
            track.getStyleClass().add("bar-track");
            fill.getStyleClass().add("bar-fill");
            limit.getStyleClass().add("bar-limit");
            getStyleClass().add("bar");
            getChildren().addAll(track, fill, limit);
        }

        void set(double newShare, double newLimit) {
            share = newShare;
            limitShare = newLimit;
            requestLayout();
        }

        @Override
        protected void layoutChildren() {
            double width = getWidth();
            double middle = getHeight() / 2;
            double thick = Math.round(getHeight() / 3);
            track.resizeRelocate(0, Math.floor(middle), width, 1);
            fill.resizeRelocate(0, middle - thick / 2, Math.max(1, width * share), thick);
            limit.resizeRelocate(width * limitShare - LIMIT_WIDTH / 2, middle - thick, LIMIT_WIDTH, 2 * thick);
        }
    }
}
