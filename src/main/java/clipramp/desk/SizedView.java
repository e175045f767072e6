package clipramp.desk;

import clipramp.desk.model.MarginRow;
import clipramp.desk.model.Resized;
import clipramp.margins.Check;
import clipramp.margins.Margin;
import clipramp.sizing.Reason;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.sizing.SizingWords;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;

/** What a search found, in words: what it keeps, what cannot be met, and every value with its reason. */
final class SizedView {
    private final VBox box = new VBox();

    SizedView() {
        box.getStyleClass().add("sized");
        box.setId("sized");
    }

    VBox node() {
        return box;
    }

    void clear() {
        box.getChildren().clear();
    }

    void show(Resized found) {
        clear();
        outcome(found);
        found.before().ifPresent(before -> compare(before, found.sizing().check()));
        conflicts(found);
        found.notes().forEach(note -> add(note, "quiet"));
        values(found);
    }

    private void outcome(Resized found) {
        String shape = MarginRow.shape(found.sizing().check().verdict());
        add(shape + " " + SizingWords.headline(found.sizing()) + SizingWords.clause(found.sizing()), "verdict")
                .setId("sized-outcome");
        SizingWords.extremes(found.sizing()).ifPresent(words -> add(words, ""));
        add(SizingWords.figures(found.sizing()), "");
    }

    private void compare(Check before, Check after) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("", "as it stands", "found"));
        rows.add(List.of("verdict", verdict(before), verdict(after)));
        rows.add(List.of("margins", summary(before), summary(after)));
        rows.add(List.of("decided by", deciding(before), deciding(after)));
        box.getChildren().add(TextGrid.ofWords("sized-verdicts", rows));
        if (before.verdict().compareTo(after.verdict()) < 0) {
            add("What stands there has the better verdict. Free more parts, or keep it.", "");
        }
    }

    private static String verdict(Check check) {
        return MarginRow.shape(check.verdict()) + " " + MarginRow.word(check.verdict());
    }

    private static String summary(Check check) {
        return MarginRow.summary(MarginRow.all(check.margins()));
    }

    /** The worst margin, which the verdict hangs on. */
    private static String deciding(Check check) {
        if (check.margins().isEmpty()) {
            return "nothing is judged";
        }
        Margin worst = check.margins().get(0);
        MarginRow row = MarginRow.of(worst);
        return row.name() + ", ratio " + row.ratio() + (row.condition().isEmpty() ? "" : " (" + row.condition() + ")");
    }

    private void conflicts(Resized found) {
        if (found.sizing().conflicts().isEmpty()) {
            return;
        }
        head("What cannot be met").setId("sized-conflicts");
        for (Conflict conflict : found.sizing().conflicts()) {
            add(SizingWords.conflict(conflict), "");
        }
    }

    private void values(Resized found) {
        List<Resized.Change> changes = found.changes();
        if (changes.isEmpty()) {
            return;
        }
        boolean fresh = found.before().isEmpty();
        head(fresh ? "Every part, and why" : found.reasons().isEmpty() ? "Values" : "Values, and why");
        changes.forEach(change -> box.getChildren().add(value(change, found, fresh)));
    }

    private static VBox value(Resized.Change change, Resized found, boolean fresh) {
        String name = (change.slot().designator() + "  " + change.slot().label()).strip();
        Label title = new Label(name);
        title.getStyleClass().add("quiet");
        String after = change.after().isEmpty() ? "none" : change.after();
        String words = fresh
                ? after
                : change.differs()
                        ? (change.before().isEmpty() ? "none" : change.before()) + "  →  " + after
                        : after + ", as it stands";
        Label figures = Words.wrapped(words);
        figures.setId("sized-value-" + change.slot().key().replace('.', '-'));
        if (fresh || change.differs()) {
            figures.getStyleClass().add("verdict");
        }
        VBox part = new VBox(title, figures);
        part.getStyleClass().add("sized-part");
        found.reason(change.slot().key()).ifPresent(reason -> why(part, reason));
        return part;
    }

    private static void why(VBox part, Reason reason) {
        part.getChildren().add(Words.wrapped(reason.relation() + "."));
        if (!reason.up().isEmpty()) {
            part.getChildren().add(Words.quiet("next up, " + reason.up()));
        }
        if (!reason.down().isEmpty()) {
            part.getChildren().add(Words.quiet("next down, " + reason.down()));
        }
    }

    Label head(String words) {
        Label label = new Label(words);
        label.getStyleClass().add("sized-head");
        box.getChildren().add(label);
        return label;
    }

    private Label add(String words, String style) {
        Label label = Words.wrapped(words);
        if (!style.isEmpty()) {
            label.getStyleClass().add(style);
        }
        box.getChildren().add(label);
        return label;
    }
}
