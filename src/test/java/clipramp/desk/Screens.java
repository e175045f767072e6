package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.Places;
import clipramp.desk.model.Settings;
import clipramp.files.Example;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;
import javafx.embed.swing.SwingFXUtils;
import javafx.event.ActionEvent;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.image.WritableImage;
import javafx.stage.Stage;
import javax.imageio.ImageIO;

/** Writes every page of the window as a picture into a folder, for a person to look at: {@code Screens FOLDER [ONLY]}. */
public final class Screens {
    private static final int STEP = 25;

    /** In milliseconds: a search on a busy machine takes its time, and a picture of half an answer helps nobody. */
    private static final int PATIENCE = 120_000;

    private Screens() {}

    /** Answers with the example's readings, one of them misread. */
    private static final class Readings implements FileAsk {
        @Override
        public Optional<Path> toOpen(Kind kind) {
            try {
                String text = Files.readString(Path.of("examples", "drying-cabinet-readings.csv"));
                return Optional.of(Files.writeString(
                        Files.createTempFile("readings", ".csv"), text.replace("75.2,186.97", "57.2,186.97")));
            } catch (IOException e) {
                throw new IllegalStateException(e);
            }
        }

        @Override
        public Optional<Path> toWrite(Kind kind, String name, Optional<Path> beside) {
            return Optional.empty();
        }
    }

    private record Size(int width, int height, int zoom) {
        String words() {
            return width + "x" + height + "-" + zoom;
        }
    }

    public static void main(String[] arguments) throws Exception {
        Path folder = Files.createDirectories(Path.of(arguments[0]));
        String only = arguments.length > 1 ? arguments[1] : "";
        Path home = Files.createTempDirectory("desk");
        new Settings(Settings.Look.PAPER, 100, true, List.of())
                .save(new Places(home.resolve("config"), home.resolve("state")));
        Platform.setImplicitExit(false);
        Platform.startup(Theme::loadFonts);
        for (Size size : new Size[] {
            new Size(1366, 768, 100), new Size(1920, 1080, 100), new Size(1366, 768, 200), new Size(1920, 1080, 200)
        }) {
            for (Settings.Look look : new Settings.Look[] {Settings.Look.PAPER, Settings.Look.INK}) {
                if ((size.words() + "-" + look).toLowerCase(Locale.ROOT).contains(only)) {
                    shoot(folder, home, size, look);
                }
            }
        }
        System.exit(0);
    }

    private static void shoot(Path folder, Path home, Size size, Settings.Look look) throws Exception {
        Places places = new Places(home.resolve("config"), home.resolve("state"));
        new Settings(look, size.zoom(), true, List.of()).save(places);
        Desk.Setup setup = new Desk.Setup(places, Map.of(), home, stage -> new Readings());
        Stage stage = at(Stage::new);
        DeskModel model = at(() -> {
            DeskModel shown = setup.show(stage, Optional.empty(), () -> {});
            stage.setX(0);
            stage.setY(0);
            stage.setWidth(size.width());
            stage.setHeight(size.height());
            return shown;
        });
        String name = size.words() + "-" + look.name().toLowerCase(Locale.ROOT);
        settle(() -> true);
        Thread.sleep(600);
        save(stage, folder.resolve("start-" + name + ".png"));
        fire(stage, "#start-new");
        settle(() -> true);
        save(stage, folder.resolve("new-" + name + ".png"));
        fire(stage, "#new-propose");
        settle(() ->
                model.proposing().progress().isPresent() || !model.proposing().isRunning());
        save(stage, folder.resolve("new-searching-" + name + ".png"));
        settle(() -> stage.getScene().getRoot().lookup("#proposal-take") != null);
        save(stage, folder.resolve("proposal-" + name + ".png"));
        fire(stage, "#proposal-take");
        settle(() -> !model.isBusy() && model.judgement().isPresent());
        save(stage, folder.resolve("bench-" + name + ".png"));
        at(() -> {
            model.draft().abandon(() -> model.draft().openUnsaved("cabinet.yaml", text("drying-cabinet")));
            return null;
        });
        settle(() -> !model.isBusy() && model.draft().name().equals("cabinet.yaml"));
        settle(() -> !model.isBusy());
        at(() -> {
            model.bench().turnTo(0.8);
            return null;
        });
        fire(stage, ".margin-row");
        settle(() -> !model.isBusy());
        save(stage, folder.resolve("margins-" + name + ".png"));
        fire(stage, "#tab-parts");
        settle(() -> !model.isBusy());
        save(stage, folder.resolve("parts-" + name + ".png"));
        fire(stage, "#page-line");
        settle(() -> !model.isBusy());
        save(stage, folder.resolve("line-" + name + ".png"));
        fire(stage, "#page-faults");
        settle(() -> model.faults().answer().isPresent() && !model.isBusy());
        save(stage, folder.resolve("faults-" + name + ".png"));
        at(() -> {
            if (stage.getScene().getRoot().lookup("#seen-load") instanceof ComboBox<?> load) {
                load.getSelectionModel().select(1);
            }
            if (stage.getScene().getRoot().lookup("#seen-TP1") instanceof TextField field) {
                field.setText("0");
            }
            return null;
        });
        settle(() -> true);
        save(stage, folder.resolve("seen-" + name + ".png"));
        fire(stage, "#page-spread");
        settle(() -> stage.getScene().getRoot().lookup("#spread-start") != null);
        at(() -> {
            if (stage.getScene().getRoot().lookup("#spread-units") instanceof TextField units) {
                units.setText("1000");
            }
            return null;
        });
        fire(stage, "#spread-start");
        settle(() -> model.spread().answer().isPresent());
        save(stage, folder.resolve("spread-" + name + ".png"));
        fire(stage, "#page-bench");
        settle(() -> !model.isBusy());
        save(stage, folder.resolve("bands-" + name + ".png"));
        fire(stage, "#page-size");
        settle(() -> stage.getScene().getRoot().lookup("#size-start") != null);
        for (String goal : List.of("values", "knob, power", "heat")) {
            choose(stage, "#size-goal", goal);
            fire(stage, "#size-start");
            settle(() -> !model.resizing().isRunning());
            save(stage, folder.resolve("size-" + goal.replaceAll("\\W+", "-") + "-" + name + ".png"));
        }
        fire(stage, "#page-fit");
        settle(() -> stage.getScene().getRoot().lookup("#fit-start") != null);
        save(stage, folder.resolve("fit-empty-" + name + ".png"));
        at(() -> {
            model.draft()
                    .abandon(() -> model.draft()
                            .openUnsaved("cabinet.yaml", Example.all().get(0).text()));
            return null;
        });
        settle(() -> !model.isBusy());
        fire(stage, "#fit-open");
        settle(() -> stage.getScene().getRoot().lookup("#fit-cell-5-4") != null);
        fire(stage, "#fit-start");
        settle(() -> model.fitting().answer().isPresent());
        save(stage, folder.resolve("fit-" + name + ".png"));
        at(() -> {
            ((ScrollPane) stage.getScene().getRoot().lookup("#fit-scroll")).setVvalue(0.4);
            return null;
        });
        save(stage, folder.resolve("fit-told-" + name + ".png"));
        fire(stage, "#page-record");
        settle(() -> stage.getScene().getRoot().lookup("#record-progress") instanceof Label label
                && label.getText().contains("pages"));
        save(stage, folder.resolve("record-" + name + ".png"));
        at(() -> {
            stage.hide();
            return null;
        });
    }

    private static String text(String id) {
        return Example.all().stream()
                .filter(example -> example.id().equals(id))
                .findFirst()
                .orElseThrow()
                .text();
    }

    private static void fire(Stage stage, String selector) throws Exception {
        at(() -> {
            Node node = stage.getScene().getRoot().lookup(selector);
            if (node != null) {
                node.requestFocus();
                node.fireEvent(new ActionEvent());
            }
            return null;
        });
    }

    private static void choose(Stage stage, String selector, String word) throws Exception {
        at(() -> {
            if (stage.getScene().getRoot().lookup(selector) instanceof ComboBox<?> combo) {
                for (int i = 0; i < combo.getItems().size(); i++) {
                    if (String.valueOf(combo.getItems().get(i)).contains(word)) {
                        combo.getSelectionModel().select(i);
                    }
                }
            }
            return null;
        });
    }

    private static void settle(BooleanSupplier done) throws Exception {
        for (int i = 0; i < PATIENCE / STEP && !at(done::getAsBoolean); i++) {
            Thread.sleep(STEP);
        }
        Thread.sleep(200);
    }

    private static <T> T at(Callable<T> task) throws Exception {
        FutureTask<T> future = new FutureTask<>(task);
        Platform.runLater(future);
        try {
            return future.get();
        } catch (ExecutionException e) {
            throw e;
        }
    }

    private static void save(Stage stage, Path file) throws Exception {
        settle(() -> Texts.all(stage.getScene().getRoot()).stream()
                .allMatch(node -> !(node instanceof FigurePane pane) || !Texts.isShown(pane) || pane.isPainted()));
        WritableImage image = at(() -> stage.getScene().snapshot(null));
        try {
            ImageIO.write(SwingFXUtils.fromFXImage(image, null), "png", file.toFile());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
