package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.Places;
import clipramp.desk.model.Settings;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.testfx.api.FxRobot;
import org.testfx.api.FxToolkit;

/** A real window on the headless platform, with its own folders and a file dialog that answers what it was told. */
final class Harness implements AutoCloseable {
    private static final int PATIENCE_SECONDS = 60;

    /** Answers every question for a file with the next of these. */
    static final class ToldAsk implements FileAsk {
        volatile Path answer = Path.of("none");
        volatile String asked = "";

        @Override
        public Optional<Path> toOpen(Kind kind) {
            asked = "open " + kind;
            return Optional.of(answer);
        }

        @Override
        public Optional<Path> toWrite(Kind kind, String name, Optional<Path> beside) {
            asked = "write " + kind + " " + name;
            return Optional.of(answer);
        }
    }

    final FxRobot robot = new FxRobot();
    final ToldAsk ask = new ToldAsk();
    final Stage stage;
    final DeskModel model;
    final Places places;
    volatile boolean closed;

    private Harness(Path home, Optional<Path> file, int width, int height) {
        places = new Places(home.resolve("config"), home.resolve("state"));
        try {
            FxToolkit.registerPrimaryStage();
            Platform.setImplicitExit(false);
        } catch (java.util.concurrent.TimeoutException e) {
            throw new IllegalStateException(e);
        }
        Desk.Setup setup = new Desk.Setup(places, Map.of(), home, shown -> ask);
        stage = at(() -> {
            Theme.loadFonts();
            Stage made = new Stage();
            made.setX(0);
            made.setY(0);
            made.setWidth(width);
            made.setHeight(height);
            return made;
        });
        model = at(() -> setup.show(stage, file, () -> closed = true));
        at(() -> {
            stage.setWidth(width);
            stage.setHeight(height);
            return null;
        });
    }

    /** A window at 1366 x 768 in which the cautions were read before. */
    static Harness start(Path home) {
        return start(home, 1366, 768, 100, Settings.Look.PAPER);
    }

    static Harness start(Path home, int width, int height, int zoom, Settings.Look look) {
        remember(home, new Settings(look, zoom, true, List.of()));
        Harness harness = new Harness(home, Optional.empty(), width, height);
        harness.await(() -> harness.stage.getScene().lookup("#start-new") != null);
        harness.await(() -> !harness.model.isBusy());
        return harness;
    }

    /** A window as on the very first start. */
    static Harness firstStart(Path home) {
        return new Harness(home, Optional.empty(), 1366, 768);
    }

    static Harness startWith(Path home, Path file) {
        remember(home, new Settings(Settings.Look.PAPER, 100, true, List.of()));
        Harness harness = new Harness(home, Optional.of(file), 1366, 768);
        harness.settle();
        return harness;
    }

    private static void remember(Path home, Settings settings) {
        try {
            settings.save(new Places(home.resolve("config"), home.resolve("state")));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Opens an example and waits until it is solved and judged. */
    Harness example(String id) {
        click("#example-" + id);
        return settle();
    }

    Harness settle() {
        await(() ->
                model.draft().isOpen() && !model.isBusy() && model.judgement().isPresent());
        await(() -> true);
        return this;
    }

    /** Waits until everything that is shown is laid out and drawn. */
    void awaitStill() {
        await(() -> {
            Parent root = stage.getScene().getRoot();
            return !root.isNeedsLayout()
                    && Texts.all(root).stream()
                            .allMatch(node ->
                                    !(node instanceof FigurePane pane) || !Texts.isShown(pane) || pane.isPainted());
        });
    }

    void click(String selector) {
        await(() -> node(selector) != null);
        robot.clickOn(node(selector));
    }

    /** Presses a button by keyboard, wherever it has been scrolled to. */
    void press(String selector) {
        ButtonBase button = find(selector, ButtonBase.class);
        at(() -> {
            button.fire();
            return null;
        });
    }

    /** Chooses from the menu bar, by the words of each step. */
    void menu(String... words) {
        MenuBar bar = find(".menu-bar", MenuBar.class);
        at(() -> {
            List<? extends MenuItem> items = bar.getMenus();
            for (String word : words) {
                MenuItem item = items.stream()
                        .filter(i ->
                                i.getText() != null && word.equals(i.getText().replace("_", "")))
                        .findFirst()
                        .orElseThrow(() -> new AssertionError("no menu " + word));
                if (item instanceof Menu menu) {
                    items = menu.getItems();
                } else {
                    item.fire();
                }
            }
            return null;
        });
    }

    /** Clicks into a field and types over what stands there. */
    void type(String selector, String text) {
        click(selector);
        TextField field = find(selector, TextField.class);
        at(() -> {
            field.selectAll();
            return null;
        });
        robot.write(text).push(KeyCode.ENTER);
        settle();
    }

    <T extends Node> T find(String selector, Class<T> type) {
        await(() -> node(selector) != null);
        return type.cast(node(selector));
    }

    private Node node(String selector) {
        for (javafx.stage.Window window : javafx.stage.Window.getWindows()) {
            Scene scene = window.getScene();
            Node node = scene == null ? null : scene.getRoot().lookup(selector);
            if (node != null && (window == stage || isOwned(window))) {
                return node;
            }
        }
        return null;
    }

    private boolean isOwned(javafx.stage.Window window) {
        return window instanceof Stage other && other.getOwner() == stage;
    }

    /** Puts the keyboard somewhere and types keys there. */
    Harness focus(String selector) {
        Node node = find(selector, Node.class);
        at(() -> {
            node.requestFocus();
            return null;
        });
        return this;
    }

    void await(BooleanSupplier done) {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        while (!at(done::getAsBoolean)) {
            if (System.nanoTime() > end) {
                throw new AssertionError("the window did not come to it in " + PATIENCE_SECONDS + " s");
            }
            try {
                Thread.sleep(10);
            } catch (InterruptedException e) {
                throw new IllegalStateException(e);
            }
        }
    }

    static <T> T at(Callable<T> task) {
        if (Platform.isFxApplicationThread()) {
            try {
                return task.call();
            } catch (Exception e) {
                throw new IllegalStateException(e);
            }
        }
        FutureTask<T> future = new FutureTask<>(task);
        Platform.runLater(future);
        try {
            return future.get(PATIENCE_SECONDS, TimeUnit.SECONDS);
        } catch (Exception e) {
            throw new IllegalStateException(e);
        }
    }

    @Override
    public void close() {
        at(() -> {
            for (javafx.stage.Window window : List.copyOf(javafx.stage.Window.getWindows())) {
                window.hide();
            }
            return null;
        });
    }
}
