package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.figures.HarmonicsFigure;
import clipramp.margins.LineCheck;
import java.nio.file.Path;
import java.util.List;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The page of the line current, used as a person uses it. */
class LinePageTest {
    @TempDir
    Path home;

    private static List<String> words(Harness window, String selector) {
        return Harness.at(() -> Texts.all(window.stage.getScene().lookup(selector)).stream()
                .filter(Label.class::isInstance)
                .map(n -> ((Label) n).getText())
                .toList());
    }

    private static HarmonicsFigure figure(Harness window) {
        return Harness.at(
                () -> (HarmonicsFigure) ((FigurePane) window.stage.getScene().lookup("#line-figure")).figure());
    }

    /**
     * IEC 61000-3-2, table 1 (recalled): the third order is let through up to 2.30 A. A resistor behind a stage without
     * drops would have 15/64 ... of its own; here the table and its order are looked for, and that the figures follow.
     */
    @Test
    void ordersStandBesideTheTableAndFollowKnobAndEdits() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.press("#page-line");
            window.await(() ->
                    window.stage.getScene().lookup("#line-figure") instanceof FigurePane pane && pane.figure() != null);
            window.await(() -> !window.model.isBusy());
            @SuppressWarnings("unchecked")
            TableView<List<String>> orders = window.find("#line-orders", TableView.class);
            assertThat(Harness.at(() -> orders.getItems().size())).isEqualTo(40);
            assertThat(Harness.at(() -> orders.getItems().get(2)))
                    .startsWith("3")
                    .contains("2300.0");
            assertThat(words(window, "#line-rules")).anyMatch(text -> text.contains("IEC 61000-3-2"));
            assertThat(window.find("#line-binding", Label.class).getText())
                    .startsWith("Order ")
                    .contains("binds first", "of full power");
            assertThat(words(window, "#line-guidance")).hasSize(1);

            LineCheck.Setting before = figure(window).standing().orElseThrow();
            window.focus("#knob").robot.push(KeyCode.HOME);
            window.await(() -> !window.model.isBusy());
            LineCheck.Setting after = figure(window).standing().orElseThrow();
            assertThat(after.position().orElseThrow()).isZero();
            assertThat(after.watts()).isNotCloseTo(before.watts(), within(1.0));
            assertThat(words(window, "#line-totals")).contains("0.0 %");

            double binds = figure(window).check().bindsAtWatts();
            Harness.at(() -> {
                window.model.draft().set("load.rated", "rated", "350 W at 230 V", trouble -> {});
                return null;
            });
            window.settle();
            // Half the power, half of every order's current: the power at which it binds stays.
            assertThat(figure(window).check().binding().used()).isLessThan(0.6);
            assertThat(figure(window).check().bindsAtWatts()).isCloseTo(binds, within(0.02 * binds));
        }
    }

    @Test
    void nothingIsSolvedForAPageThatNobodyLooksAt() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            window.focus("#knob").robot.push(KeyCode.END);
            window.settle();
            assertThat(window.model.line().setting()).isEmpty();
            window.press("#page-line");
            window.await(() -> window.model.line().setting().isPresent());
            Node dial = window.find("#knob", Node.class);
            assertThat(Harness.at(dial::getAccessibleText)).contains("Knob at 100.0 %");
        }
    }
}
