package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.figures.HistogramFigure;
import clipramp.figures.SpreadFigure;
import java.nio.file.Path;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The spread's page, used as a person uses it. */
class SpreadPageTest {
    @TempDir
    Path home;

    private static Harness onThePage(Path home) {
        Harness window = Harness.start(home).example("drying-cabinet");
        window.press("#page-spread");
        return window;
    }

    private static void draw(Harness window, int units) {
        TextField field = window.find("#spread-units", TextField.class);
        Harness.at(() -> {
            field.setText(Integer.toString(units));
            return null;
        });
        window.press("#spread-start");
    }

    private static boolean isOver(Harness window) {
        return window.model.spread().answer().isPresent()
                && !window.model.spread().isRunning();
    }

    @Test
    void unitsAreDrawnToldAndLaidOverTheBench() {
        try (Harness window = onThePage(home)) {
            draw(window, 40);
            window.await(() -> isOver(window));
            assertThat(window.find("#spread-histogram", FigurePane.class).figure())
                    .isInstanceOfSatisfying(
                            HistogramFigure.class,
                            f -> assertThat(f.histogram().units()).isEqualTo(40));
            assertThat(window.find("#spread-figure", FigurePane.class).figure()).isInstanceOf(SpreadFigure.class);
            assertThat(Harness.at(() -> Texts.all(window.stage.getScene().lookup("#spread-words")).stream()
                            .filter(Label.class::isInstance)
                            .map(n -> ((Label) n).getText())
                            .toList()))
                    .anyMatch(text -> text.contains("reach what is wanted"))
                    .anyMatch(text -> text.contains("of the spread in power"));
            window.press("#page-bench");
            window.settle();
            assertThat(window.model.bench().spread()).isPresent();
            assertThat(Harness.at(() -> ((clipramp.figures.LanesFigure)
                                    ((FigurePane) window.stage.getScene().lookup("#lanes")).figure())
                            .band()))
                    .isPresent();
            recordTellsOfIt(window);
            window.press("#page-spread");
            Harness.at(() -> {
                ((CheckBox) window.stage.getScene().lookup("#spread-bands")).fire();
                return null;
            });
            assertThat(window.model.bench().spread()).isEmpty();
        }
    }

    /** The record has the spread's page where it is wanted, and one page less where not. */
    private static void recordTellsOfIt(Harness window) {
        window.press("#page-record");
        window.await(() -> pages(window) > 0);
        int without = pages(window);
        Harness.at(() -> {
            ((CheckBox) window.stage.getScene().lookup("#record-spread")).fire();
            return null;
        });
        window.await(() -> pages(window) > without);
    }

    /** Pages of the record once they are all drawn. */
    private static int pages(Harness window) {
        String text = Harness.at(() -> ((Label) window.stage.getScene().lookup("#record-progress")).getText());
        return text.contains(" pages.") ? Integer.parseInt(text.substring(0, text.indexOf(' '))) : 0;
    }

    @Test
    void aCancelledRunTellsOfTheUnitsThatWereDrawn() {
        try (Harness window = onThePage(home)) {
            draw(window, 900_000);
            window.await(() -> window.model.spread().histogram().isPresent());
            assertThat(window.find("#spread-start", Button.class).isDisabled()).isTrue();
            window.press("#spread-cancel");
            window.await(() -> isOver(window));
            int units = window.model.spread().answer().orElseThrow().spread().units();
            assertThat(units).isPositive().isLessThan(900_000);
            assertThat(Harness.at(() -> Texts.all(window.stage.getScene().lookup("#spread-words")).stream()
                            .filter(Label.class::isInstance)
                            .map(n -> ((Label) n).getText())
                            .toList()))
                    .anyMatch(text -> text.startsWith("Cancelled after " + units + " of 900000"));
        }
    }

    @Test
    void whatIsNoNumberOfUnitsIsSaid() {
        try (Harness window = onThePage(home)) {
            TextField field = window.find("#spread-units", TextField.class);
            Harness.at(() -> {
                field.setText("many");
                return null;
            });
            window.press("#spread-start");
            assertThat(window.find("#spread-complaint", Label.class).getText()).contains("1 to 2000000", "many");
            assertThat(window.model.spread().isRunning()).isFalse();
            assertThat(window.find("#page-spread", ToggleButton.class).isSelected())
                    .isTrue();
        }
    }

    @Test
    void aRemedyIsTakenOverInOneStepAndTheOldSpreadIsStale() {
        try (Harness window = onThePage(home)) {
            draw(window, 300);
            window.await(() -> isOver(window));
            String before = window.model.draft().sheet().orElseThrow().text().text();
            Button take = Harness.at(() -> Texts.all(window.stage.getScene().lookup("#spread-words")).stream()
                    .filter(n -> n instanceof Button
                            && n.getId() != null
                            && n.getId().startsWith("take-"))
                    .map(Button.class::cast)
                    .findFirst()
                    .orElseThrow());
            String change = take.getAccessibleText().substring("Take over: ".length());
            Harness.at(() -> {
                take.fire();
                return null;
            });
            window.settle();
            assertThat(window.model.draft().sheet().orElseThrow().text().text()).isNotEqualTo(before);
            assertThat(window.model.draft().undoName()).contains(change);
            assertThat(take.isDisabled()).isTrue();
            assertThat(window.find("#spread-progress", Label.class).getText()).contains("has changed since");
            window.menu("Edit", "Undo " + change);
            window.settle();
            assertThat(window.model.draft().sheet().orElseThrow().text().text()).isEqualTo(before);
            assertThat(take.isDisabled()).isFalse();
        }
    }
}
