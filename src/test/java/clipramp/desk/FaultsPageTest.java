package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The page of single faults, used as a person uses it. */
class FaultsPageTest {
    @TempDir
    Path home;

    private static Harness onThePage(Path home) {
        Harness window = Harness.start(home).example("drying-cabinet");
        window.press("#page-faults");
        window.await(() -> window.model.faults().answer().isPresent());
        return window;
    }

    @SuppressWarnings("unchecked")
    private static TableView<List<String>> table(Harness window) {
        return window.find("#faults-table", TableView.class);
    }

    private static List<String> row(Harness window, int index) {
        return Harness.at(() -> table(window).getItems().get(index));
    }

    private static List<String> detail(Harness window) {
        return Harness.at(() -> Texts.all(window.stage.getScene().lookup("#fault-detail")).stream()
                .filter(Label.class::isInstance)
                .map(n -> ((Label) n).getText())
                .toList());
    }

    private static void set(Harness window, String selector, String text) {
        TextField field = window.find(selector, TextField.class);
        Harness.at(() -> {
            field.setText(text);
            return null;
        });
    }

    @SuppressWarnings("unchecked")
    private static void choose(Harness window, String selector, String word) {
        ComboBox<String> combo = window.find(selector, ComboBox.class);
        Harness.at(() -> {
            combo.setValue(word);
            return null;
        });
    }

    /** An answer comes by way of the window's own thread, so within one turn of that thread there is none yet. */
    @Test
    void noTableStandsBeforeThereAreFaultsInIt() {
        try (Harness window = Harness.start(home).example("drying-cabinet")) {
            ButtonBase page = window.find("#page-faults", ButtonBase.class);
            boolean stands = Harness.at(() -> {
                page.fire();
                page.getScene().getRoot().applyCss();
                return page.getScene().lookup("#faults-table").isVisible();
            });
            assertThat(stands).isFalse();
            window.await(() -> window.model.faults().answer().isPresent());
            assertThat(Harness.at(() -> table(window).isVisible())).isTrue();
        }
    }

    /** A shorted thyristor gives full power whatever the knob does: no source needed beyond the circuit itself. */
    @Test
    void everyFaultStandsInTheTableAndOneIsShownWhole() {
        try (Harness window = onThePage(home)) {
            assertThat(row(window, 0)).startsWith("no fault");
            List<String> shorted = Harness.at(() -> table(window).getItems().stream()
                    .filter(r -> r.get(0).startsWith("thyristor") && r.get(0).endsWith("shorted"))
                    .findFirst()
                    .orElseThrow());
            assertThat(shorted).contains("full power", "dead");
            Harness.at(() -> {
                int dropper = table(window).getItems().stream()
                        .map(r -> r.get(0))
                        .toList()
                        .indexOf("dropper R1 shorted");
                table(window).getSelectionModel().select(dropper);
                return null;
            });
            assertThat(detail(window))
                    .contains("dropper R1 shorted", "Over its rating, burns next", "TP1", "TP5")
                    .anyMatch(text -> text.startsWith("V1 power ") && text.contains("where it is rated 1 W"));
            assertThat(window.find("#faults-live", Label.class).getText()).contains("live at line potential");
        }
    }

    @Test
    void whatWasSeenRanksTheFaultsThatFit() {
        try (Harness window = onThePage(home)) {
            choose(window, "#seen-load", "nothing");
            set(window, "#seen-TP1", "75,0");
            set(window, "#seen-TP1", "0");
            assertThat(row(window, 0).get(1)).isEqualTo("2 of 2");
            assertThat(row(window, 0).get(0)).containsAnyOf("dropper R1 open", "zener V1 shorted", "D1–D4 shorted");
            assertThat(detail(window)).anyMatch(text -> text.startsWith("For it: load none, TP1 = 0"));
            choose(window, "#seen-load", "full power");
            set(window, "#seen-TP1", "18,9");
            choose(window, "#seen-knob", "does nothing");
            assertThat(row(window, 0).get(0)).startsWith("thyristor").endsWith("shorted");
            set(window, "#seen-TP1", "often");
            assertThat(window.find("#faults-complaint", Label.class).getText()).contains("often");
            window.press("#seen-clear");
            assertThat(row(window, 0).get(0)).isEqualTo("no fault");
            assertThat(window.find("#faults-complaint", Label.class).getText()).isEmpty();
        }
    }

    @Test
    void aChangedDesignMakesTheSheetStaleUntilItIsWorkedOutAgain() {
        try (Harness window = onThePage(home)) {
            PseudoClass stale = PseudoClass.getPseudoClass("stale");
            Harness.at(() -> {
                window.model.draft().set("ramp.fixed", "fixed resistor", "5.6 kΩ ±5 % 0.25 W", trouble -> {});
                return null;
            });
            window.settle();
            javafx.scene.Node middle = window.find("#faults-middle", javafx.scene.Node.class);
            assertThat(Harness.at(() -> middle.getPseudoClassStates().contains(stale)))
                    .isTrue();
            assertThat(window.find("#faults-state", Label.class).getText()).contains("has changed since");
            window.press("#faults-start");
            window.await(() -> !window.model.faults().isRunning());
            assertThat(Harness.at(() -> middle.getPseudoClassStates().contains(stale)))
                    .isFalse();
        }
    }

    @Test
    void aRunThatIsCancelledLeavesTheSheetAsItWas() {
        try (Harness window = onThePage(home)) {
            var before = Harness.at(() -> window.model.faults().answer());
            Harness.at(() -> {
                window.find("#faults-start", javafx.scene.control.Button.class).fire();
                window.model.faults().cancel();
                return null;
            });
            window.await(() -> !window.model.faults().isRunning());
            assertThat(Harness.at(() -> window.model.faults().answer())).isEqualTo(before);
        }
    }
}
