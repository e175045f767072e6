package clipramp.desk;

import clipramp.desk.model.LongRun;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** How far a long run is, and the button that ends it; there only while one goes on. */
final class RunBar {
    private final LongRun<?, ?> run;
    private final ProgressBar bar = new ProgressBar();
    private final Label words = new Label();
    private final Button cancel = new Button("Cancel");
    private final VBox box = new VBox(words, bar, cancel);

    /**
     * @param run what is followed
     * @param id begins the ids of its controls
     * @param what what is going on, for a screen reader
     */
    RunBar(LongRun<?, ?> run, String id, String what) {
        this.run = run;
        bar.setMaxWidth(Double.MAX_VALUE);
        bar.setAccessibleText(what);
        words.setId(id + "-progress");
        words.setWrapText(true);
        words.setMinHeight(Region.USE_PREF_SIZE);
        words.getStyleClass().add("quiet");
        cancel.setId(id + "-cancel");
        cancel.setAccessibleText("Cancel: " + what);
        cancel.setOnAction(event -> run.cancel());
        box.getStyleClass().add("run-bar");
        run.onChange(this::refresh);
        refresh();
    }

    VBox node() {
        return box;
    }

    private void refresh() {
        box.setVisible(run.isRunning());
        box.setManaged(run.isRunning());
        cancel.setDisable(run.isEnding());
        if (run.isEnding()) {
            words.setText("Ending…");
        } else {
            words.setText(run.progress().map(LongRun.Progress::words).orElse("Beginning…"));
            bar.setProgress(run.progress()
                    .map(p -> p.share().orElse(ProgressBar.INDETERMINATE_PROGRESS))
                    .orElse(0.0));
        }
    }
}
