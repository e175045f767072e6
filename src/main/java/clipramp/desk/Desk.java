package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.Places;
import clipramp.desk.model.RecordMaker;
import clipramp.desk.model.Recovery;
import clipramp.desk.model.Settings;
import clipramp.desk.model.Trouble;
import clipramp.desk.model.Workers;
import clipramp.desk.model.Workshop;
import clipramp.figures.Palette;
import clipramp.files.ProfileLibrary;
import clipramp.files.Release;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.Executor;
import java.util.concurrent.Executors;
import javafx.application.Platform;
import javafx.stage.Stage;

/** Opens the window. */
public final class Desk {
    private Desk() {}

    /**
     * Shows the window and returns when it is closed.
     *
     * @param designFile the design to open, as typed; none for the start page
     * @return 0
     * @throws UnsupportedOperationException where there is no screen
     */
    public static int open(Optional<String> designFile) {
        // The drawing code's font metrics come from AWT, which must not look for a screen of its own.
        System.setProperty("java.awt.headless", "true");
        CountDownLatch closed = new CountDownLatch(1);
        Map<String, String> environment = System.getenv();
        Path home = Path.of(System.getProperty("user.home", "."));
        Platform.setImplicitExit(false);
        Platform.startup(() -> {
            Theme.loadFonts();
            Setup setup = new Setup(Places.of(environment, home), environment, home, SystemFileAsk::new);
            setup.show(new Stage(), designFile.map(Path::of), closed::countDown);
        });
        try {
            closed.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        Platform.exit();
        return 0;
    }

    /** How a window asks for files. */
    @FunctionalInterface
    interface Asking {
        FileAsk of(Stage stage);
    }

    /**
     * What a window is made of.
     *
     * @param places where it remembers
     * @param environment the process's environment
     * @param home the user's home folder
     * @param asking how it asks for files
     */
    record Setup(Places places, Map<String, String> environment, Path home, Asking asking) {
        /** Lanes and power curve are drawn at the same time. */
        private static final int PAINTERS = 2;

        /** Shows a window; it is painted before anything is read or computed. */
        DeskModel show(Stage stage, Optional<Path> file, Runnable closed) {
            Workers workers = new Workers(
                    Platform::runLater,
                    worker("turning"),
                    worker("judging"),
                    worker("writing"),
                    worker("drawing"),
                    worker("searching"));
            Recovery recovery = new Recovery(places, ProcessHandle.current(), System.identityHashCode(stage));
            WindowActions[] actions = new WindowActions[1];
            Workshop workshop = new Workshop(this::library);
            DeskModel model = new DeskModel(workers, workshop, recovery, trouble -> actions[0].show(trouble));
            Late<RecordMaker> maker = new Late<>(
                    () -> new RecordMaker(workers, workshop, Release.version(), trouble -> actions[0].show(trouble)));
            actions[0] = new WindowActions(model, maker, recovery, places, workers, closed);
            Theme theme = new Theme(Palette.PAPER, 1, workers("painting", PAINTERS));
            DeskWindow window = new DeskWindow(stage, theme, model, maker, actions[0]);
            actions[0].serve(window, asking.of(stage));
            actions[0].take(Settings.load(places));
            stage.show();
            Thread.currentThread()
                    .setUncaughtExceptionHandler(
                            (thread, failure) -> actions[0].show(Trouble.of("Something went wrong", failure)));
            // Twice: behind the frame that is being made now.
            Platform.runLater(() -> Platform.runLater(() -> {
                window.finish();
                actions[0].greet();
                file.ifPresentOrElse(model.draft()::open, actions[0]::offerRecovery);
                askSystemTheme(actions[0]);
            }));
            return model;
        }

        private static void askSystemTheme(WindowActions actions) {
            Thread asking = new Thread(
                    () -> {
                        boolean dark = SystemTheme.isDark(System.getProperty("os.name", ""));
                        Platform.runLater(() -> actions.takeSystemTheme(dark));
                    },
                    "desk-theme");
            asking.setDaemon(true);
            asking.start();
        }

        private ProfileLibrary library(Optional<Path> file) {
            boolean windows =
                    System.getProperty("os.name", "").toLowerCase(Locale.ROOT).contains("windows");
            return ProfileLibrary.usual(file, environment, home, windows);
        }

        private static Executor worker(String name) {
            return workers(name, 1);
        }

        private static Executor workers(String name, int threads) {
            return Executors.newFixedThreadPool(threads, task -> {
                Thread thread = new Thread(task, "desk-" + name);
                thread.setDaemon(true);
                return thread;
            });
        }
    }
}
