package clipramp.desk;

import clipramp.desk.model.Settings;
import clipramp.figures.Lettering;
import clipramp.figures.Palette;
import clipramp.figures.Style;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Base64;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.Executor;
import javafx.collections.ObservableList;
import javafx.scene.text.Font;

/** Colours and sizes of the window: the figures' palette and one factor on everything. */
final class Theme {
    private static final double TEXT_PIXELS = 13;

    private final List<Runnable> listeners = new ArrayList<>();
    private final List<ObservableList<String>> sheets = new ArrayList<>();
    private final Executor painting;
    private Style style;

    /** @param painting where figures are drawn */
    Theme(Palette palette, double zoom, Executor painting) {
        this.painting = painting;
        this.style = new Style(palette, zoom);
    }

    /** Makes the type family known to the toolkit; nothing depends on what a machine has installed. */
    static void loadFonts() {
        for (boolean bold : new boolean[] {false, true}) {
            Font.loadFont(new ByteArrayInputStream(Lettering.fontFile(bold)), TEXT_PIXELS);
        }
    }

    /** Where figures are drawn. */
    Executor painting() {
        return painting;
    }

    Style style() {
        return style;
    }

    double zoom() {
        return style.zoom();
    }

    void set(Palette palette, double zoom) {
        style = new Style(palette, zoom);
        sheets.forEach(this::fill);
        listeners.forEach(Runnable::run);
    }

    void onChange(Runnable listener) {
        listeners.add(listener);
    }

    /** Keeps a scene's or a dialog's style sheets in step. */
    void dress(ObservableList<String> stylesheets) {
        sheets.add(stylesheets);
        fill(stylesheets);
    }

    void undress(ObservableList<String> stylesheets) {
        sheets.remove(stylesheets);
    }

    private void fill(ObservableList<String> stylesheets) {
        String common =
                Objects.requireNonNull(Theme.class.getResource("desk.css")).toExternalForm();
        stylesheets.setAll(common, dataUri(variables()));
    }

    /** Colours under the palette's own names, and the size that everything else is a multiple of. */
    private String variables() {
        StringBuilder css = new StringBuilder(".root {");
        style.palette()
                .webColours()
                .forEach((name, colour) -> css.append(" -c-")
                        .append(name)
                        .append(": ")
                        .append(colour)
                        .append(';'));
        return css.append(" -fx-font-size: ")
                .append(TEXT_PIXELS * style.zoom())
                .append("px; }")
                .toString();
    }

    private static String dataUri(String css) {
        return "data:text/css;base64," + Base64.getEncoder().encodeToString(css.getBytes(StandardCharsets.UTF_8));
    }

    /** The palette of a choice; {@code systemIsDark} decides where the system shall. */
    static Palette palette(Settings.Look look, boolean systemIsDark) {
        return switch (look) {
            case PAPER -> Palette.PAPER;
            case INK -> Palette.INK;
            case SYSTEM -> systemIsDark ? Palette.INK : Palette.PAPER;
        };
    }
}
