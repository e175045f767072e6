package clipramp.desk;

import static clipramp.desk.Texts.isShown;
import static org.assertj.core.api.Assertions.assertThat;

import clipramp.desk.model.Settings;
import clipramp.figures.Palette;
import java.awt.Color;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.event.Event;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.MenuBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TableRow;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import javafx.scene.paint.Paint;
import javafx.scene.text.Text;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Every page: what a screen reader, a keyboard and weak eyes find there. */
class PagesTest {
    @TempDir
    Path home;

    private interface Look {
        void at(String page, Harness window) throws Exception;
    }

    /** Goes through every page of a window. */
    private static void everyPage(Harness window, Look look) throws Exception {
        everyPageAsItComes(window, (page, shown) -> {
            shown.awaitStill();
            look.at(page, shown);
        });
    }

    private static void everyPageAsItComes(Harness window, Look look) throws Exception {
        look.at("start", window);
        window.press("#start-new");
        window.await(() -> window.stage.getScene().lookup("#new-propose") != null);
        look.at("new", window);
        window.press("#new-propose");
        window.find("#proposal-take", Node.class);
        look.at("proposal", window);
        window.press("#proposal-take");
        window.settle();
        look.at("bench", window);
        if (Harness.at(() -> window.stage.getScene().lookup("#fold-margins").isVisible())) {
            window.press("#fold-margins");
        }
        look.at("bench with margins", window);
        Harness.at(() -> {
            ((javafx.scene.control.ButtonBase) window.stage.getScene().lookup(".margin-row")).fire();
            return null;
        });
        look.at("bench with an open margin", window);
        if (Harness.at(() -> window.stage.getScene().lookup("#tab-parts")) != null) {
            window.press("#tab-parts");
        }
        for (String station : List.of("line", "clip", "ramp", "trigger", "gate", "load", "asked")) {
            window.press("#station-" + station);
            look.at("parts of " + station, window);
        }
        window.press("#page-line");
        window.await(() -> !window.model.isBusy());
        look.at("line current", window);
        window.press("#page-faults");
        window.await(() -> window.model.faults().answer().isPresent()
                && !window.model.faults().isRunning());
        look.at("faults", window);
        Harness.at(() -> {
            ((ComboBox<?>) window.stage.getScene().lookup("#seen-load"))
                    .getSelectionModel()
                    .select(1);
            ((TextField) window.stage.getScene().lookup("#seen-TP1")).setText("0");
            return null;
        });
        look.at("faults, something seen", window);
        window.press("#page-spread");
        look.at("spread, nothing drawn", window);
        Harness.at(() -> {
            ((TextField) window.stage.getScene().lookup("#spread-units")).setText("100");
            return null;
        });
        window.press("#spread-start");
        window.await(() -> !window.model.spread().isRunning()
                && window.model.spread().answer().isPresent());
        look.at("spread", window);
        window.press("#page-size");
        look.at("size, nothing found", window);
        window.press("#size-start");
        window.await(() -> !window.model.resizing().isRunning());
        look.at("size", window);
        window.press("#page-fit");
        look.at("fit, nothing read", window);
        Harness.at(() -> {
            // Angles that no unit of this design has, so that there is something to say.
            for (int row = 0; row < 4; row++) {
                ((TextField) window.stage.getScene().lookup("#fit-cell-" + row + "-0")).setText(20 + 20 * row + "");
                ((TextField) window.stage.getScene().lookup("#fit-cell-" + row + "-2")).setText(130 - 20 * row + "");
            }
            return null;
        });
        window.press("#fit-start");
        window.await(() -> !window.model.fitting().isRunning());
        look.at("fit", window);
        window.press("#page-record");
        window.await(() -> window.stage.getScene().lookup("#record-progress") instanceof Label label
                && label.getText().contains("pages."));
        look.at("record", window);
    }

    /** What a person can act on: buttons, fields, lists, links, and what takes the keyboard. */
    private static List<Node> controls(Harness window) {
        return Harness.at(() -> {
            List<Node> found = new ArrayList<>();
            for (Node node : Texts.all(window.stage.getScene().getRoot())) {
                boolean inner = within(node, ComboBox.class) || within(node, MenuBar.class);
                boolean acts = node.isFocusTraversable() && !inner;
                if (acts && isShown(node) && !node.isDisabled()) {
                    found.add(node);
                }
            }
            return found;
        });
    }

    private static boolean within(Node node, Class<?> type) {
        for (Node each = node.getParent(); each != null; each = each.getParent()) {
            if (type.isInstance(each)) {
                return true;
            }
        }
        return false;
    }

    /** One walk over all pages for everything that can be told from what is shown. */
    @Test
    void everyPageCanBeHeardReadAndReached() throws Exception {
        List<String> faults = new ArrayList<>();
        int[] seen = new int[2];
        try (Harness window = Harness.start(home)) {
            everyPage(window, (page, shown) -> {
                for (Node node : controls(shown)) {
                    seen[0]++;
                    silent(node).ifPresent(fault -> faults.add(page + ": " + fault));
                    small(node).ifPresent(fault -> faults.add(page + ": " + fault));
                }
                Harness.at(() -> {
                    Texts.all(shown.stage.getScene().getRoot()).stream()
                            .filter(node -> node instanceof Text && isShown(node))
                            .map(Text.class::cast)
                            .filter(text -> !text.getText().isBlank())
                            .forEach(text -> {
                                seen[1]++;
                                faint(text).ifPresent(fault -> faults.add(page + ": " + fault));
                                cutOff(text).ifPresent(fault -> faults.add(page + ": " + fault));
                            });
                    return null;
                });
                unreachable(shown).forEach(node -> faults.add(page + ": not reached by Tab: " + node));
            });
        }
        assertThat(seen[0]).isGreaterThan(200);
        assertThat(seen[1]).isGreaterThan(400);
        assertThat(faults).isEmpty();
    }

    /** A name in a table that is cut off has it whole beside the pointer; nothing else may be cut off. */
    private static Optional<String> cutOff(Text text) {
        boolean cut = text.getText().endsWith("...") && !within(text, TableRow.class);
        return cut ? Optional.of("cut off: " + text.getText()) : Optional.empty();
    }

    /** The least window that is promised, at the largest type, on the other theme. */
    @Test
    void nothingIsCutOffAtTwiceTheSizeAndEveryTextReadsOnInkToo() throws Exception {
        List<String> faults = new ArrayList<>();
        try (Harness window = Harness.start(home, 1366, 768, 200, Settings.Look.INK)) {
            everyPage(
                    window,
                    (page, shown) -> Harness.at(() -> {
                        for (Node node : Texts.all(shown.stage.getScene().getRoot())) {
                            if (node instanceof Text text && isShown(text)) {
                                cutOff(text).ifPresent(fault -> faults.add(page + ": " + fault));
                                Optional.of(text)
                                        .filter(some -> !some.getText().isBlank())
                                        .flatMap(PagesTest::faint)
                                        .ifPresent(fault -> faults.add(page + ": " + fault));
                            } else if (node instanceof TextField field && isShown(field) && !fits(field)) {
                                faults.add(page + ": no room for " + field.getText());
                            }
                        }
                        return null;
                    }));
        }
        assertThat(faults).isEmpty();
    }

    private static boolean fits(TextField field) {
        Text whole = new Text(field.getText());
        whole.setFont(field.getFont());
        double room = field.getWidth()
                - field.getInsets().getLeft()
                - field.getInsets().getRight();
        return whole.getLayoutBounds().getWidth() <= room;
    }

    private static Optional<String> silent(Node node) {
        String text = node.getAccessibleText();
        String words = node instanceof Labeled labeled ? labeled.getText() : "";
        boolean says = (text != null && !text.isBlank()) || (words != null && words.length() > 2);
        return says || node instanceof MenuBar ? Optional.empty() : Optional.of("says nothing: " + node);
    }

    /** WCAG 2.2, 2.5.8: targets of 24 px at least. */
    private static Optional<String> small(Node node) {
        double height = node.getLayoutBounds().getHeight();
        return height >= 23.9 || node instanceof MenuBar
                ? Optional.empty()
                : Optional.of("only " + height + " px high: " + node);
    }

    /** WCAG 2.1, 1.4.3: text against what it stands on, as it is shown. */
    private static Optional<String> faint(Text text) {
        double contrast = contrast(awt(text.getFill()), groundOf(text));
        return contrast >= 4.5 ? Optional.empty() : Optional.of("contrast " + contrast + ": " + text.getText());
    }

    private static List<Node> unreachable(Harness window) {
        // In one go: between two looks a control may have come or gone.
        return Harness.at(() -> {
            List<Node> wanted = new ArrayList<>(controls(window));
            wanted.removeIf(MenuBar.class::isInstance);
            Set<Node> reached = new HashSet<>();
            Scene scene = window.stage.getScene();
            wanted.get(0).requestFocus();
            for (int i = 0; i < 2 * wanted.size() + 10; i++) {
                reached.add(scene.getFocusOwner());
                KeyEvent tab = new KeyEvent(KeyEvent.KEY_PRESSED, "", "", KeyCode.TAB, false, false, false, false);
                Event.fireEvent(scene.getFocusOwner(), tab);
            }
            wanted.removeAll(reached);
            return wanted;
        });
    }

    private static Color groundOf(Node node) {
        for (Node each = node; each != null; each = each.getParent()) {
            if (each instanceof Region region && region.getBackground() != null) {
                var fills = region.getBackground().getFills();
                for (int i = fills.size() - 1; i >= 0; i--) {
                    Paint paint = fills.get(i).getFill();
                    if (paint instanceof javafx.scene.paint.Color colour && colour.getOpacity() > 0.99) {
                        return awt(colour);
                    }
                }
            }
        }
        throw new AssertionError("no ground under " + node);
    }

    private static Color awt(Paint paint) {
        javafx.scene.paint.Color colour = (javafx.scene.paint.Color) paint;
        return new Color((float) colour.getRed(), (float) colour.getGreen(), (float) colour.getBlue());
    }

    /** The lines that carry meaning are 3:1 and the text colours 4.5:1 by WCAG's formula, which is computed here anew. */
    @Test
    void everyColourOfBothPalettesKeepsItsContrast() {
        for (Palette palette : List.of(Palette.PAPER, Palette.INK)) {
            Map<String, String> colours = palette.webColours();
            Color ground = Color.decode(colours.get("ground"));
            Color wash = Color.decode(colours.get("wash"));
            for (String text : List.of("ink", "quiet", "line", "supply", "ramp", "pulse", "load")) {
                assertThat(contrast(Color.decode(colours.get(text)), ground))
                        .as(palette.name() + " " + text)
                        .isGreaterThanOrEqualTo(4.5);
                assertThat(contrast(Color.decode(colours.get(text)), wash))
                        .as(palette.name() + " " + text + " on wash")
                        .isGreaterThanOrEqualTo(4.5);
            }
            assertThat(contrast(Color.decode(colours.get("axis")), ground))
                    .as(palette.name() + " axis")
                    .isGreaterThanOrEqualTo(3);
        }
    }

    private static double contrast(Color a, Color b) {
        double x = luminance(a);
        double y = luminance(b);
        return (Math.max(x, y) + 0.05) / (Math.min(x, y) + 0.05);
    }

    private static double luminance(Color colour) {
        double[] weights = {0.2126, 0.7152, 0.0722};
        float[] parts = colour.getRGBColorComponents(null);
        double sum = 0;
        for (int i = 0; i < 3; i++) {
            sum += weights[i] * (parts[i] <= 0.04045 ? parts[i] / 12.92 : Math.pow((parts[i] + 0.055) / 1.055, 2.4));
        }
        return sum;
    }

    @Test
    void nothingScrollsSidewaysAtTwiceTheSize() throws Exception {
        try (Harness window = Harness.start(home, 1366, 768, 200, Settings.Look.PAPER)) {
            everyPage2(window);
        }
    }

    private static void everyPage2(Harness window) {
        window.press("#example-drying-cabinet");
        window.settle();
        Harness.at(() -> {
            assertThat(window.stage.getScene().lookup("#fold-margins").isVisible())
                    .isTrue();
            assertThat(isShown(window.stage.getScene().lookup("#margins"))).isFalse();
            return null;
        });
        window.click("#fold-margins");
        Harness.at(() -> {
            for (Node node : Texts.all(window.stage.getScene().getRoot())) {
                if (node instanceof ScrollPane pane && isShown(pane)) {
                    assertThat(pane.getHbarPolicy()).isEqualTo(ScrollPane.ScrollBarPolicy.NEVER);
                }
            }
            assertThat(isShown(window.stage.getScene().lookup("#margins"))).isTrue();
            return null;
        });
    }

    @Test
    void theDesignInTheStyleSheetHasNoColourOfItsOwn() throws Exception {
        String css = Files.readString(
                Path.of("src", "main", "resources", "clipramp", "desk", "desk.css"), StandardCharsets.UTF_8);
        assertThat(css).doesNotContainPattern("#[0-9a-fA-F]{3,6}\\b").doesNotContain("gradient", "dropshadow");
    }
}
