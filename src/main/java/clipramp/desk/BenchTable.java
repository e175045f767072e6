package clipramp.desk;

import clipramp.desk.model.BenchSheet;
import clipramp.desk.model.BenchSheet.Column;
import clipramp.files.InvalidInputException;
import clipramp.fit.FitWords;
import clipramp.fit.Residual;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import javafx.css.PseudoClass;
import javafx.geometry.VPos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Bench readings as a table of fields: typed, or pasted from a spreadsheet; what does not belong is marked there. */
final class BenchTable {
    private static final PseudoClass REFUSED = PseudoClass.getPseudoClass("refused");

    private final Consumer<String> complain;
    private final Runnable changed;
    private final GridPane grid = new GridPane();
    private final Map<String, TextField> fields = new HashMap<>();
    private final List<Label> remarks = new ArrayList<>();
    private BenchSheet sheet = new BenchSheet(true);
    private int drawn;

    /**
     * @param complain takes what is wrong with a text that was pasted
     * @param changed told when readings have changed
     */
    BenchTable(Consumer<String> complain, Runnable changed) {
        this.complain = complain;
        this.changed = changed;
        grid.setId("fit-table");
        grid.getStyleClass().add("bench-table");
    }

    GridPane node() {
        return grid;
    }

    BenchSheet sheet() {
        return sheet;
    }

    void show(BenchSheet other) {
        sheet = other;
        draw();
    }

    /** Draws every cell anew. */
    void draw() {
        grid.getChildren().clear();
        grid.getColumnConstraints().clear();
        fields.clear();
        remarks.clear();
        drawn = 0;
        ColumnConstraints numbers = new ColumnConstraints();
        numbers.setMinWidth(Region.USE_PREF_SIZE);
        grid.getColumnConstraints().add(numbers);
        List<Column> columns = sheet.shown();
        Label corner = new Label("±");
        corner.getStyleClass().add("quiet");
        GridPane.setValignment(corner, VPos.BOTTOM);
        grid.add(corner, 0, 0);
        for (int c = 0; c < columns.size(); c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setHgrow(Priority.ALWAYS);
            column.setMinWidth(0);
            column.setPercentWidth(94.0 / columns.size());
            grid.getColumnConstraints().add(column);
            grid.add(head(columns.get(c), c), c + 1, 0);
        }
        for (int r = 0; r < sheet.rowCount(); r++) {
            row(r);
        }
    }

    private VBox head(Column column, int c) {
        Label name = Words.wrapped(column.head());
        name.setId("fit-head-" + c);
        TextField accuracy = new TextField(column.accuracy());
        accuracy.setId("fit-accuracy-" + c);
        accuracy.setPromptText("± usual");
        accuracy.setAccessibleText("Accuracy of " + column.head() + ", as in 1 or 2 %; empty for the usual one");
        accuracy.textProperty().addListener((property, before, now) -> {
            column.setAccuracy(now);
            changed.run();
        });
        Region gap = new Region();
        VBox.setVgrow(gap, Priority.ALWAYS);
        return new VBox(name, gap, accuracy);
    }

    /** Two rows of the grid for one of the table: its fields, and what is to be said of them. */
    private void row(int r) {
        Label number = new Label(Integer.toString(r + 2));
        number.getStyleClass().add("quiet");
        grid.add(number, 0, 2 * r + 1);
        List<Column> columns = sheet.shown();
        for (int c = 0; c < columns.size(); c++) {
            TextField field = new Cell(r, columns.get(c));
            field.setId("fit-cell-" + r + "-" + c);
            fields.put(key(r, columns.get(c)), field);
            grid.add(field, c + 1, 2 * r + 1);
        }
        Label remark = Words.wrapped("");
        remark.setId("fit-remark-" + r);
        remark.getStyleClass().add("complaint");
        remark.setManaged(false);
        remarks.add(remark);
        grid.add(remark, 1, 2 * r + 2, Math.max(1, columns.size()), 1);
        drawn++;
    }

    private static String key(int row, Column column) {
        return row + " " + column.head();
    }

    /** Marks what does not belong, and says why; an empty list takes all marks away. */
    void mark(List<Residual> strangers) {
        fields.values().forEach(field -> {
            field.pseudoClassStateChanged(REFUSED, false);
            field.setAccessibleHelp("");
        });
        for (Label remark : remarks) {
            remark.setText("");
            remark.setManaged(false);
        }
        for (Residual stranger : strangers) {
            int row = stranger.line() - 2;
            sheet.shown().stream()
                    .filter(column -> column.written().equals(stranger.column()))
                    .findFirst()
                    .ifPresent(column -> mark(row, column, stranger));
        }
    }

    private void mark(int row, Column column, Residual stranger) {
        TextField field = fields.get(key(row, column));
        if (field == null) {
            return;
        }
        String words = "✕ " + column.head() + " does not belong: " + FitWords.stranger(stranger);
        field.pseudoClassStateChanged(REFUSED, true);
        field.setAccessibleHelp(words);
        Label remark = remarks.get(row);
        remark.setText((remark.getText() + "\n" + words).strip());
        remark.setManaged(true);
    }

    /** Takes the clipboard's table from a place on. */
    void paste(int row, Column at) {
        String text = Clipboard.getSystemClipboard().getString();
        if (text == null || text.isBlank()) {
            complain.accept("The clipboard holds no text. Copy the readings in your spreadsheet first.");
            return;
        }
        take(row, at, text);
    }

    void take(int row, Column at, String text) {
        try {
            sheet.paste(row, at, text);
            complain.accept("");
            draw();
            changed.run();
        } catch (InvalidInputException e) {
            complain.accept(e.problems().get(0).text());
        }
    }

    /** One cell. */
    private final class Cell extends TextField {
        private final int row;
        private final Column column;

        Cell(int row, Column column) {
            super(sheet.cell(row, column));
            this.row = row;
            this.column = column;
            setAccessibleText("line " + (row + 2) + ", " + column.head());
            textProperty().addListener((property, before, now) -> {
                sheet.set(this.row, this.column, now);
                pseudoClassStateChanged(REFUSED, false);
                if (this.row == sheet.rowCount() - 1 && !now.isBlank()) {
                    sheet.grow(sheet.rowCount() + 1);
                    row(drawn);
                }
                changed.run();
            });
            focusedProperty().addListener((property, before, now) -> {
                if (!now && !getText().equals(sheet.cell(this.row, this.column))) {
                    setText(sheet.cell(this.row, this.column));
                }
            });
            addEventFilter(KeyEvent.KEY_PRESSED, this::move);
        }

        private void move(KeyEvent event) {
            int step = event.getCode() == KeyCode.UP
                    ? -1
                    : event.getCode() == KeyCode.DOWN || event.getCode() == KeyCode.ENTER ? 1 : 0;
            TextField next = step == 0 ? null : fields.get(key(row + step, column));
            if (next != null) {
                next.requestFocus();
                next.selectAll();
                event.consume();
            }
        }

        @Override
        public void paste() {
            String text = Clipboard.getSystemClipboard().getString();
            boolean several = text != null && (text.strip().contains("\n") || text.contains("\t"));
            if (several) {
                take(row, column, text);
            } else {
                super.paste();
            }
        }
    }
}
