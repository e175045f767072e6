package clipramp.desk;

import clipramp.desk.model.LatestWins;
import clipramp.figures.Figure;
import clipramp.figures.PixelSurface;
import clipramp.figures.Style;
import java.nio.IntBuffer;
import javafx.application.Platform;
import javafx.geometry.Rectangle2D;
import javafx.scene.AccessibleRole;
import javafx.scene.image.ImageView;
import javafx.scene.image.PixelBuffer;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;

/**
 * A figure on the screen, drawn away from the window's thread: what is on the screen stays until the next is ready, and
 * figures that are overtaken are never drawn. Its sentence is what a screen reader says.
 */
final class FigurePane extends Region {
    private record Drawing(Figure figure, double width, double height, double scale, Style style) {
        /** Whether the other would look the same because it is of the very same figure. */
        boolean isOnlyAgain(@Nullable Drawing other) {
            return other != null
                    && figure == other.figure
                    && width == other.width
                    && height == other.height
                    && scale == other.scale
                    && style.equals(other.style);
        }
    }

    private record Drawn(Drawing drawing, PixelSurface surface) {}

    private final ImageView view = new ImageView();
    private final Theme theme;
    private final LatestWins<Drawing, Drawn> painter;
    /** One is copied to the screen while the other is drawn into. */
    private PixelSurface spare = new PixelSurface(1, 1);

    private PixelSurface used = new PixelSurface(1, 1);
    private @Nullable PixelBuffer<IntBuffer> pixels;
    private @Nullable Figure figure;
    private @Nullable Figure painted;
    private @Nullable Drawing asked;
    private boolean stale;

    FigurePane(Theme theme) {
        this.theme = theme;
        this.painter = new LatestWins<>(this::draw, theme.painting(), Platform::runLater, this::take, failure -> {
            throw failure;
        });
        view.setSmooth(false);
        getChildren().add(view);
        getStyleClass().add("figure");
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        theme.onChange(this::redraw);
        sceneProperty().addListener((property, before, now) -> {
            if (stale) {
                redraw();
            }
        });
    }

    void show(Figure other) {
        figure = other;
        setAccessibleText(other.title());
        setAccessibleHelp(other.sentence());
        redraw();
    }

    @Nullable
    Figure figure() {
        return figure;
    }

    /** Whether what is on the screen is what was last given. */
    boolean isPainted() {
        return figure == painted;
    }

    Style style() {
        return theme.style();
    }

    /** Where figure and pointer meet: the figure fills the pane. */
    Rectangle2D area() {
        return new Rectangle2D(0, 0, Math.floor(getWidth()), Math.floor(getHeight()));
    }

    /** Nothing is drawn for a pane that is in no window. */
    private void redraw() {
        Rectangle2D area = area();
        stale = getScene() == null || area.getWidth() < 1 || area.getHeight() < 1;
        if (figure != null && !stale) {
            double scale =
                    getScene().getWindow() == null ? 1 : getScene().getWindow().getRenderScaleX();
            Drawing drawing = new Drawing(figure, area.getWidth(), area.getHeight(), scale, theme.style());
            if (!drawing.isOnlyAgain(asked)) {
                asked = drawing;
                painter.ask(drawing);
            }
        }
    }

    private Drawn draw(Drawing drawing) {
        int columns = (int) Math.ceil(drawing.width() * drawing.scale());
        int rows = (int) Math.ceil(drawing.height() * drawing.scale());
        PixelSurface surface = spare;
        if (surface.columns() != columns || surface.rows() != rows) {
            surface = new PixelSurface(columns, rows);
        }
        spare = used;
        used = surface;
        surface.draw(drawing.figure(), drawing.scale(), drawing.style());
        return new Drawn(drawing, surface);
    }

    private void take(Drawn drawn) {
        PixelSurface surface = drawn.surface();
        PixelBuffer<IntBuffer> screen = pixels;
        if (screen == null || screen.getWidth() != surface.columns() || screen.getHeight() != surface.rows()) {
            screen = new PixelBuffer<>(
                    surface.columns(),
                    surface.rows(),
                    IntBuffer.allocate(surface.columns() * surface.rows()),
                    PixelFormat.getIntArgbPreInstance());
            pixels = screen;
            view.setImage(new WritableImage(screen));
        }
        view.setFitWidth(drawn.drawing().width());
        view.setFitHeight(drawn.drawing().height());
        screen.getBuffer().put(0, surface.argb());
        screen.updateBuffer(all -> null);
        painted = drawn.drawing().figure();
    }

    @Override
    protected double computeMinWidth(double height) {
        return 0;
    }

    @Override
    protected double computeMinHeight(double width) {
        return 0;
    }

    @Override
    protected double computePrefWidth(double height) {
        return 400;
    }

    @Override
    protected double computePrefHeight(double width) {
        return 200;
    }

    @Override
    protected void layoutChildren() {
        Rectangle2D area = area();
        if (stale || view.getFitWidth() != area.getWidth() || view.getFitHeight() != area.getHeight()) {
            redraw();
        }
    }
}
