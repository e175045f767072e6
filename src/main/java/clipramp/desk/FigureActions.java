package clipramp.desk;

import clipramp.desk.Actions.Shown;
import clipramp.desk.model.TableText;
import clipramp.figures.Figure;
import clipramp.figures.Palette;
import clipramp.figures.Style;
import clipramp.figures.Surfaces;
import clipramp.files.WholeFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.canvas.Canvas;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import org.jfree.fx.FXGraphics2D;

/** Takes figures out of the window: their numbers, a picture, a table, a file. */
final class FigureActions {
    private static final double PICTURE_WIDTH = 900;
    private static final double PICTURE_SCALE = 2;

    private final Service service;

    FigureActions(Service service) {
        this.service = service;
    }

    private void with(Shown what, Consumer<Figure> action) {
        service.window().figure(what).ifPresent(action);
    }

    void showNumbers(Shown what) {
        with(what, service.dialogs()::numbers);
    }

    void copyPicture(Shown what) {
        with(what, figure -> {
            double height = PICTURE_WIDTH / figure.proportion();
            Canvas canvas = new Canvas(PICTURE_WIDTH, height);
            Style style = new Style(Palette.PAPER, 1);
            Surfaces.draw(figure, new FXGraphics2D(canvas.getGraphicsContext2D()), PICTURE_WIDTH, height, style);
            ClipboardContent content = new ClipboardContent();
            content.putImage(canvas.snapshot(null, null));
            Clipboard.getSystemClipboard().setContent(content);
        });
    }

    void copyTable(Shown what) {
        with(what, figure -> {
            ClipboardContent content = new ClipboardContent();
            content.putString(TableText.tabbed(figure.numbers()));
            Clipboard.getSystemClipboard().setContent(content);
        });
    }

    void export(Shown what, FileAsk.Kind kind, Optional<Path> beside) {
        String name = what.words().replace(' ', '-') + "." + kind.ending();
        with(
                what,
                figure -> service.asks()
                        .toWrite(kind, name, beside)
                        .ifPresent(file -> service.away(
                                "The file cannot be written",
                                () -> WholeFile.write(file, out -> out.write(drawn(figure, kind)), true),
                                () -> {})));
    }

    private static byte[] drawn(Figure figure, FileAsk.Kind kind) {
        double height = PICTURE_WIDTH / figure.proportion();
        return switch (kind) {
            case SVG -> Surfaces.toSvg(figure, PICTURE_WIDTH, height).getBytes(StandardCharsets.UTF_8);
            case PNG -> Surfaces.toPng(figure, PICTURE_WIDTH, height, PICTURE_SCALE);
            default -> TableText.csv(figure.numbers()).getBytes(StandardCharsets.UTF_8);
        };
    }
}
