package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.figures.ShapeFigure;
import java.nio.file.Path;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The page that searches for values, used as a person uses it. */
class SizePageTest {
    @TempDir
    Path home;

    private static Harness onThePage(Path home) {
        Harness window = Harness.start(home).example("drying-cabinet");
        window.press("#page-size");
        window.find("#size-start", Node.class);
        return window;
    }

    private static void choose(Harness window, int goal) {
        ComboBox<?> goals = window.find("#size-goal", ComboBox.class);
        Harness.at(() -> {
            goals.getSelectionModel().select(goal);
            return null;
        });
    }

    private static void untick(Harness window, String... parts) {
        window.find("#size-free-" + parts[0], CheckBox.class);
        Harness.at(() -> {
            for (String part : parts) {
                ((CheckBox) window.stage.getScene().lookup("#size-free-" + part)).setSelected(false);
            }
            return null;
        });
    }

    private static void search(Harness window) {
        window.press("#size-start");
        window.await(() -> !window.model.resizing().isRunning());
    }

    private static String text(Harness window) {
        return window.model.draft().sheet().orElseThrow().text().text();
    }

    @Test
    void whatIsFoundIsTakenOverInOneStepThatIsUndone() {
        try (Harness window = Harness.start(home).example("cabinet-gone-wrong")) {
            window.press("#page-size");
            String before = text(window);
            untick(window, "ramp-capacitor", "ramp-fixed", "ramp-pot-track");
            Harness.at(() -> {
                ((CheckBox) window.stage.getScene().lookup("#size-free-clip-dropper")).setSelected(true);
                return null;
            });
            search(window);
            assertThat(text(window)).isEqualTo(before);
            assertThat(Texts.of(window.find("#sized", Node.class)))
                    .contains("as it stands", "✕ fails", "decided by", "(low crest - V_Z - rectifier)", "next up, ");
            assertThat(window.stage.getScene().lookup("#sized-value-ramp-capacitor"))
                    .isNull();
            window.press("#size-take");
            window.await(() -> !text(window).equals(before));
            window.settle();
            assertThat(window.model.draft().undoName()).hasValue("values of 1 part");
            assertThat(window.find("#size-state", Label.class).getText()).isEqualTo("Taken over. Undo takes it back.");
            Harness.at(() -> {
                window.model.draft().undo();
                return null;
            });
            window.settle();
            assertThat(text(window)).isEqualTo(before);
            assertThat(window.find("#size-take", Button.class).isDisabled()).isFalse();
        }
    }

    /** The cabinet's own ramp is what the search comes to: its spelling is its author's affair. */
    @Test
    void whatComesOutAsItWasChangesNothing() {
        try (Harness window = onThePage(home)) {
            search(window);
            assertThat(window.model.resizing().answer().orElseThrow().changed()).isZero();
            assertThat(window.find("#size-take", Button.class).isDisabled()).isTrue();
            assertThat(window.find("#size-state", Label.class).getText())
                    .isEqualTo("Nothing better was found than what stands there.");
        }
    }

    @Test
    void nothingFreeIsSaid() {
        try (Harness window = onThePage(home)) {
            untick(window, "ramp-capacitor", "ramp-fixed", "ramp-pot-track");
            search(window);
            assertThat(window.find("#size-complaint", Label.class).getText()).contains("No part is free");
        }
    }

    @Test
    void aStraighterKnobIsDrawnOverTheOldOne() {
        try (Harness window = onThePage(home)) {
            choose(window, 1);
            // Law, end and shunt alone are fewer knobs to draw.
            untick(window, "ramp-fixed", "ramp-pot-track");
            search(window);
            ShapeFigure figure =
                    (ShapeFigure) window.find("#size-curve", FigurePane.class).figure();
            assertThat(figure.after().largestDeparture())
                    .isLessThan(figure.before().largestDeparture());
            assertThat(Texts.of(window.find("#size-shape", Node.class)))
                    .contains("farthest from a straight line", "dead travel, low end", "steepest step, a degree");
            window.press("#size-take");
            window.await(() -> window.model.draft().undoName().isPresent());
            window.settle();
            var ramp = window.model.draft().sheet().orElseThrow().design().ramp();
            assertThat(ramp.rampOhms(0.5))
                    .isEqualTo(figure.after().design().ramp().rampOhms(0.5));
        }
    }

    @Test
    void theSteadyResistorStandsBesideThePublishedRules() {
        try (Harness window = onThePage(home)) {
            choose(window, 3);
            search(window);
            var steadied =
                    window.model.resizing().answer().orElseThrow().steadied().orElseThrow();
            assertThat(steadied.chosenDriftRad()).isLessThan(steadied.nowDriftRad());
            assertThat(Texts.of(window.find("#size-steady", Node.class)))
                    .contains("as it stands", "found: preferred value", "10 000/(η V)", "dV_P/dT = 0, exactly");
        }
    }
}
