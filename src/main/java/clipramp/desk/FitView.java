package clipramp.desk;

import clipramp.desk.model.FitRows;
import clipramp.desk.model.Fitting;
import clipramp.fit.FitResult;
import clipramp.fit.FitWords;
import clipramp.fit.Fitted.Knowledge;
import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;

/** One unit as its readings have it. */
final class FitView {
    private static final int MOST_TOGETHER = 5;

    private final VBox box = new VBox();

    FitView() {
        box.getStyleClass().add("sized");
        box.setId("fitted");
    }

    VBox node() {
        return box;
    }

    void show(Fitting.Answer answer) {
        FitResult result = answer.result();
        box.getChildren().clear();
        int strangers = result.strangers().size();
        add(
                strangers == 0
                        ? "● " + FitWords.noStrangers(result)
                        : "✕ " + FitWords.count(strangers, "reading")
                                + " left out of the fit and marked in the table. Read "
                                + (strangers == 1 ? "it again." : "them again."),
                "verdict");
        if (!result.isTelling()) {
            add("The readings tell none of the unit's values.", "");
        }
        table("Told by the readings", "fit-told", FitRows.values(result, Knowledge.TOLD));
        table("Narrowed, not told", "fit-narrowed", FitRows.values(result, Knowledge.NARROWED));
        FitWords.untold(result).ifPresent(words -> add(words, ""));
        if (!result.together().isEmpty()) {
            head("Told only together (correlation)");
            result.together().stream().limit(MOST_TOGETHER).forEach(pair -> add(FitWords.together(result, pair), ""));
        }
        head("How well it fits");
        FitWords.quality(result).forEach(words -> add(words, ""));
        table("Reading by reading", "fit-readings", FitRows.readings(result));
        answer.notes().forEach(words -> add(words, "quiet"));
    }

    private void table(String words, String id, List<List<String>> rows) {
        if (rows.size() > 1) {
            head(words);
            box.getChildren().add(TextGrid.ofFigures(id, rows));
        }
    }

    private void head(String words) {
        add(words, "sized-head");
    }

    private void add(String words, String style) {
        Label label = Words.wrapped(words);
        if (!style.isEmpty()) {
            label.getStyleClass().add(style);
        }
        box.getChildren().add(label);
    }
}
