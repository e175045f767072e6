package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.fit.Residual;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The page that fits one unit to its readings, used as a person uses it. */
class FitPageTest {
    @TempDir
    Path home;

    private static Harness onThePage(Path home) {
        Harness window = Harness.start(home).example("drying-cabinet");
        window.press("#page-fit");
        window.find("#fit-start", Node.class);
        return window;
    }

    private static void open(Harness window, Path file, String text) throws Exception {
        Files.writeString(file, text, StandardCharsets.UTF_8);
        window.ask.answer = file;
        window.press("#fit-open");
        window.find("#fit-cell-5-4", TextField.class);
    }

    private static String example() throws Exception {
        return Files.readString(Path.of("examples", "drying-cabinet-readings.csv"), StandardCharsets.UTF_8);
    }

    private static void fit(Harness window) {
        window.press("#fit-start");
        window.await(() -> !window.model.fitting().isRunning());
    }

    private static String text(Harness window) {
        return window.model.draft().sheet().orElseThrow().text().text();
    }

    /** The same way that a dropped file takes. */
    @Test
    void readingsThatAreOpenedAsADesignGoToTheFitPage() throws Exception {
        Path file = Files.writeString(home.resolve("Mine.CSV"), example(), StandardCharsets.UTF_8);
        try (Harness window = Harness.start(home)) {
            window.ask.answer = file;
            window.menu("File", "Open…");
            Node dialog = window.find("#dialog-readings", Node.class);
            assertThat(Texts.of(dialog)).contains("Mine.CSV holds readings", "Open the design");
            Harness.at(() -> {
                dialog.getScene().getWindow().hide();
                return null;
            });
            String before = text(window.example("drying-cabinet"));
            window.menu("File", "Open…");
            Node question = window.find("#dialog-unsaved", Node.class);
            window.robot.clickOn((Node) Texts.button(question, "Do not save"));
            assertThat(window.find("#fit-cell-5-4", TextField.class).getText()).isEqualTo("4.55");
            assertThat(text(window)).isEqualTo(before);
        }
    }

    @Test
    void readingsFromAFileBecomeTheUnitAsBuiltInOneStep() throws Exception {
        try (Harness window = onThePage(home)) {
            String before = text(window);
            open(window, home.resolve("mine.csv"), example());
            fit(window);
            assertThat(Texts.of(window.find("#fitted", Node.class)))
                    .contains("Every reading belongs.", "standoff ratio", "0.7549", "The readings cannot tell: ");
            window.press("#fit-take");
            window.await(() -> !text(window).equals(before));
            window.settle();
            assertThat(window.model.draft().undoName()).hasValue("the unit as built");
            assertThat(text(window)).contains("As built: fitted from 24 of 24 bench readings.");
            window.press("#page-record");
            window.find("#record-fit", CheckBox.class);
            window.press("#record-fit");
            window.await(() -> !window.find("#record-save", Button.class).isDisabled());
            Path pdf = home.resolve("unit.pdf");
            window.ask.answer = pdf;
            window.press("#record-save");
            window.await(() -> Files.exists(pdf) && !window.model.isBusy());
            try (PDDocument record = Loader.loadPDF(pdf.toFile())) {
                assertThat(new PDFTextStripper().getText(record)).contains("of 24 bench readings", "95 % interval");
            }
            window.press("#page-fit");
            Harness.at(() -> {
                window.model.draft().undo();
                return null;
            });
            window.settle();
            assertThat(text(window)).isEqualTo(before);
        }
    }

    private static String cell(Harness window, String selector) {
        return window.find(selector, TextField.class).getText();
    }

    @Test
    void readingsThatWereTypedGiveWayToAFileOnlyWhereTheUserAgrees() throws Exception {
        try (Harness window = onThePage(home)) {
            window.type("#fit-cell-0-0", "33");
            window.ask.answer = Files.writeString(home.resolve("mine.csv"), example(), StandardCharsets.UTF_8);
            window.press("#fit-open");
            Node question = window.find("#dialog-replace", Node.class);
            window.robot.clickOn((Node) Texts.button(question, "Keep them"));
            window.settle();
            assertThat(cell(window, "#fit-cell-0-0")).isEqualTo("33");
            window.press("#fit-open");
            question = window.find("#dialog-replace", Node.class);
            window.robot.clickOn((Node) Texts.button(question, "Replace them"));
            assertThat(cell(window, "#fit-cell-5-4")).isEqualTo("4.55");
            // What came from a file and stands there still is replaced unasked.
            window.press("#fit-open");
            window.settle();
            assertThat(cell(window, "#fit-cell-5-4")).isEqualTo("4.55");
        }
    }

    @Test
    void readingsThatWereTypedAreAskedAboutBeforeTheWindowClosesAndSurviveASuddenEnd() throws Exception {
        Path unsaved;
        String left;
        try (Harness window = onThePage(home)) {
            unsaved = window.places.state().resolve("unsaved");
            window.type("#fit-cell-0-0", "33");
            window.await(() -> !window.model.isBusy());
            Path kept = Files.list(unsaved).findFirst().orElseThrow();
            left = Files.readString(kept);
            assertThat(left).contains("# unsaved reading: 33,");
            window.menu("File", "Close");
            Node question = window.find("#dialog-unsaved", Node.class);
            window.robot.clickOn((Node) Texts.button(question, "Do not save"));
            question = window.find("#dialog-unsaved-readings", Node.class);
            window.robot.clickOn((Node) Texts.button(question, "Do not save"));
            window.await(() -> window.closed);
            assertThat(unsaved).isEmptyDirectory();
        }
        // As a process that is gone would have left it: its id is above any that Linux gives.
        Files.writeString(unsaved.resolve("99999999-1-1.yaml"), left);
        try (Harness next = Harness.start(home)) {
            next.click(".recover");
            assertThat(cell(next, "#fit-cell-0-0")).isEqualTo("33");
        }
    }

    @Test
    void aReadingThatDoesNotBelongIsMarkedInTheTable() throws Exception {
        try (Harness window = onThePage(home)) {
            open(window, home.resolve("mine.csv"), example().replace("75.2,186.97", "57.2,186.97"));
            fit(window);
            Residual stranger = window.model
                    .fitting()
                    .answer()
                    .orElseThrow()
                    .result()
                    .strangers()
                    .get(0);
            assertThat(stranger.line()).isEqualTo(5);
            assertThat(window.find("#fit-remark-3", Label.class).getText())
                    .startsWith("✕ firing angle (deg) does not belong: read 57.2°; the others say 75.");
            TextField cell = window.find("#fit-cell-3-2", TextField.class);
            assertThat(cell.getAccessibleHelp()).contains("does not belong");
            assertThat(window.find("#fit-take", Button.class).isDisabled()).isFalse();
            Harness.at(() -> {
                cell.setText("75.2");
                return null;
            });
            assertThat(window.find("#fit-remark-3", Label.class).getText()).isEmpty();
            assertThat(window.find("#fit-take", Button.class).isDisabled()).isTrue();
        }
    }

    @Test
    void typingGrowsTheTableAndArrowsMoveInIt() {
        try (Harness window = onThePage(home)) {
            window.focus("#fit-cell-0-0").robot.write("5,1").push(KeyCode.DOWN);
            assertThat(window.find("#fit-cell-1-0", TextField.class).isFocused())
                    .isTrue();
            assertThat(window.find("#fit-cell-0-0", TextField.class).getText()).isEqualTo("5.1");
            window.find("#fit-cell-5-0", TextField.class);
            Harness.at(() -> {
                ((TextField) window.stage.getScene().lookup("#fit-cell-5-0")).setText("95");
                return null;
            });
            window.find("#fit-cell-6-0", TextField.class);
        }
    }

    @Test
    void aTableOnTheClipboardIsPasted() {
        try (Harness window = onThePage(home)) {
            Harness.at(() -> {
                ClipboardContent content = new ClipboardContent();
                content.putString("knob (%)\tfiring angle (deg) ±1\n10\t133,5\n50\t87\n");
                Clipboard.getSystemClipboard().setContent(content);
                return null;
            });
            window.press("#fit-paste");
            assertThat(window.find("#fit-cell-0-1", TextField.class).getText()).isEqualTo("133.5");
            assertThat(window.find("#fit-accuracy-1", TextField.class).getText())
                    .isEqualTo("1");
        }
    }

    @Test
    void whatCannotBeReadIsNamedWithItsLine() {
        try (Harness window = onThePage(home)) {
            window.find("#fit-cell-1-2", TextField.class);
            Harness.at(() -> {
                ((TextField) window.stage.getScene().lookup("#fit-cell-1-0")).setText("5O");
                ((TextField) window.stage.getScene().lookup("#fit-cell-1-2")).setText("90");
                return null;
            });
            fit(window);
            assertThat(window.find("#fit-complaint", Label.class).getText())
                    .contains("readings:3:", "knob (%)", "read \"5O\"");
        }
    }
}
