package clipramp.desk;

import clipramp.figures.Figure;
import clipramp.figures.Style;
import clipramp.figures.Surfaces;
import javafx.application.Platform;
import javafx.geometry.Rectangle2D;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import org.jfree.fx.FXGraphics2D;
import org.jspecify.annotations.Nullable;

/**
 * A figure on the screen. However often it is given another one, it draws once a frame, just before the frame is laid
 * out, and lays nothing out for it. Its sentence is what a screen reader says.
 */
final class FigurePane extends Region {
    private final Canvas canvas = new Canvas();
    private final Theme theme;
    private final Runnable drawing = this::drawIfStale;
    private @Nullable Figure figure;
    private boolean stale;

    FigurePane(Theme theme) {
        this.theme = theme;
        getChildren().add(canvas);
        getStyleClass().add("figure");
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        theme.onChange(this::redraw);
        sceneProperty().addListener((property, before, now) -> {
            if (before != null) {
                before.removePreLayoutPulseListener(drawing);
            }
            if (now != null) {
                now.addPreLayoutPulseListener(drawing);
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

    Style style() {
        return theme.style();
    }

    /** Where figure and pointer meet: the canvas fills the pane. */
    Rectangle2D area() {
        return new Rectangle2D(0, 0, canvas.getWidth(), canvas.getHeight());
    }

    private void redraw() {
        stale = true;
        Platform.requestNextPulse();
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
        double width = Math.floor(getWidth());
        double height = Math.floor(getHeight());
        if (canvas.getWidth() != width || canvas.getHeight() != height) {
            canvas.setWidth(width);
            canvas.setHeight(height);
            stale = true;
            drawIfStale();
        }
    }

    private void drawIfStale() {
        if (stale && figure != null && canvas.getWidth() > 0 && canvas.getHeight() > 0) {
            paint(figure, canvas.getWidth(), canvas.getHeight());
        }
    }

    private void paint(Figure shown, double width, double height) {
        stale = false;
        GraphicsContext context = canvas.getGraphicsContext2D();
        context.save();
        context.clearRect(0, 0, width, height);
        Surfaces.draw(shown, new FXGraphics2D(context), width, height, theme.style());
        context.restore();
    }
}
