package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.Draft;
import clipramp.desk.model.Places;
import clipramp.desk.model.RecordMaker;
import clipramp.desk.model.Recovery;
import clipramp.desk.model.Settings;
import clipramp.desk.model.TableText;
import clipramp.desk.model.Trouble;
import clipramp.desk.model.ViewCondition;
import clipramp.desk.model.Wish;
import clipramp.desk.model.Workers;
import clipramp.figures.Figure;
import clipramp.figures.Palette;
import clipramp.figures.Style;
import clipramp.figures.Surfaces;
import clipramp.files.Example;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Objects;
import java.util.function.Consumer;
import javafx.scene.canvas.Canvas;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import org.jfree.fx.FXGraphics2D;
import org.jspecify.annotations.Nullable;

/** Does what the window is asked. */
final class WindowActions implements Actions {
    private static final double PICTURE_WIDTH = 900;
    private static final double PICTURE_SCALE = 2;

    private final DeskModel model;
    private final Late<RecordMaker> maker;
    private final Recovery recovery;
    private final Places places;
    private final Workers workers;
    private final Runnable closed;
    private @Nullable DeskWindow window;
    private @Nullable FileAsk asks;
    private Settings settings = Settings.FIRST;
    private boolean systemIsDark;

    /**
     * @param model the design on the desk
     * @param maker lays the record out
     * @param recovery keeps unsaved work
     * @param places where settings lie
     * @param workers where work is done
     * @param closed told when the window has gone
     */
    WindowActions(
            DeskModel model,
            Late<RecordMaker> maker,
            Recovery recovery,
            Places places,
            Workers workers,
            Runnable closed) {
        this.model = model;
        this.maker = maker;
        this.recovery = recovery;
        this.places = places;
        this.workers = workers;
        this.closed = closed;
        model.draft().onChange(this::rememberFile);
    }

    void serve(DeskWindow served, FileAsk fileAsk) {
        window = served;
        asks = fileAsk;
    }

    private DeskWindow window() {
        return Objects.requireNonNull(window, "no window is served yet");
    }

    private FileAsk asks() {
        return Objects.requireNonNull(asks, "no window is served yet");
    }

    private Dialogs dialogs() {
        return new Dialogs(window().stage(), window().theme());
    }

    private Draft draft() {
        return model.draft();
    }

    /** Shows a failure. */
    void show(Trouble trouble) {
        dialogs().trouble(trouble);
    }

    // --- files

    @Override
    public void startNew() {
        whenSaved(window()::showNew);
    }

    @Override
    public void propose(Wish wish, boolean entering) {
        draft().propose(
                        wish,
                        trouble -> trouble.ifPresentOrElse(t -> window().complainNew(t.text()), () -> {
                            window().showPage(Page.BENCH);
                            if (entering) {
                                window().bench().enterParts();
                            }
                        }));
    }

    @Override
    public void giveUpNew() {
        window().leaveNew();
    }

    @Override
    public void open() {
        whenSaved(() -> asks().toOpen(FileAsk.Kind.DESIGN).ifPresent(draft()::open));
    }

    @Override
    public void openFile(Path file) {
        whenSaved(() -> draft().open(file));
    }

    @Override
    public void openExample(Example example) {
        whenSaved(() -> draft().openUnsaved(example.id() + ".yaml", example.text()));
    }

    @Override
    public void recover(Recovery.Left work) {
        whenSaved(() -> draft().recover(work));
    }

    @Override
    public void forget(Recovery.Left work) {
        away("The unsaved work could not be forgotten", () -> recovery.forget(work), this::offerRecovery);
    }

    /** Looks for work that was left behind, and offers it. */
    void offerRecovery() {
        workers.writing().execute(() -> {
            try {
                var works = recovery.leftBehind();
                workers.home().execute(() -> window().offer(works));
            } catch (IOException e) {
                workers.home().execute(() -> show(Trouble.of("Unsaved work could not be looked for", e)));
            }
        });
    }

    @Override
    public void save() {
        saveThen(() -> {});
    }

    private void saveThen(Runnable then) {
        draft().file().ifPresentOrElse(file -> draft().save(file, then), () -> saveAsThen(then));
    }

    @Override
    public void saveAs() {
        saveAsThen(() -> {});
    }

    private void saveAsThen(Runnable then) {
        asks().toWrite(FileAsk.Kind.DESIGN, draft().name(), draft().file()).ifPresent(file -> draft().save(file, then));
    }

    /** Goes on at once, or after the user has decided about unsaved work. */
    private void whenSaved(Runnable then) {
        if (!draft().isDirty()) {
            then.run();
            return;
        }
        dialogs().unsaved(draft().name(), answer -> {
            if (answer == Dialogs.SAVE) {
                saveThen(then);
            } else if (answer == Dialogs.DISCARD) {
                draft().abandon(then);
            }
        });
    }

    @Override
    public void close() {
        whenSaved(() -> {
            window().stage().hide();
            closed.run();
        });
    }

    private void rememberFile() {
        draft().file().ifPresent(file -> {
            if (settings.recent().isEmpty() || !settings.recent().get(0).equals(file)) {
                remember(settings.withRecent(file));
            }
        });
    }

    @Override
    public void saveRecord() {
        maker.get().pdf().ifPresent(pdf -> {
            String name = draft().name().replaceFirst("\\.ya?ml$", "") + ".pdf";
            asks().toWrite(FileAsk.Kind.RECORD, name, draft().file())
                    .ifPresent(file -> draft().export(file, pdf, () -> window().say("Saved " + file.getFileName())));
        });
    }

    // --- editing

    @Override
    public void undo() {
        draft().undo();
    }

    @Override
    public void redo() {
        draft().redo();
    }

    // --- figures

    private void with(Shown what, Consumer<Figure> action) {
        window().figure(what).ifPresent(action);
    }

    @Override
    public void showNumbers(Shown what) {
        with(what, dialogs()::numbers);
    }

    @Override
    public void copyPicture(Shown what) {
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

    @Override
    public void copyTable(Shown what) {
        with(what, figure -> {
            ClipboardContent content = new ClipboardContent();
            content.putString(TableText.tabbed(figure.numbers()));
            Clipboard.getSystemClipboard().setContent(content);
        });
    }

    @Override
    public void export(Shown what, FileAsk.Kind kind) {
        with(
                what,
                figure -> asks().toWrite(kind, what.words().replace(' ', '-') + "." + kind.ending(), draft().file())
                        .ifPresent(file -> away(
                                "The file cannot be written",
                                () -> clipramp.files.WholeFile.write(file, out -> out.write(drawn(figure, kind)), true),
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

    // --- the window itself

    @Override
    public void showCautions() {
        Dialogs dialogs = dialogs();
        dialogs.text("cautions", "Before you build or measure", dialogs.scrolling(Leaflets.cautions(dialogs)));
        if (!settings.cautionsRead()) {
            remember(settings.withCautionsRead());
        }
    }

    @Override
    public void showShortcuts() {
        dialogs().text("keys", "Keys", Leaflets.keys());
    }

    @Override
    public void showAbout() {
        Dialogs dialogs = dialogs();
        dialogs.text("about", "clipramp", dialogs.words(Leaflets.about()));
    }

    @Override
    public void showPage(Page page) {
        window().showPage(page);
    }

    @Override
    public void zoomPulse() {
        LanesView lanes = window().bench().lanes();
        lanes.setClose(!lanes.isClose());
    }

    @Override
    public void setCondition(ViewCondition condition) {
        model.setCondition(condition);
    }

    @Override
    public void zoomBy(int percent) {
        zoomTo(settings.zoomPercent() + percent);
    }

    @Override
    public void zoomTo(int percent) {
        remember(settings.withZoomPercent(percent));
        dress();
    }

    @Override
    public void setLook(Settings.Look look) {
        remember(settings.withLook(look));
        dress();
    }

    /** Takes what was remembered, and shows it. */
    void take(Settings remembered) {
        settings = remembered;
        window().showSettings(settings);
        dress();
    }

    /** The safety cautions stand before everything else on the first start. */
    void greet() {
        if (!settings.cautionsRead()) {
            showCautions();
        }
    }

    void takeSystemTheme(boolean dark) {
        systemIsDark = dark;
        dress();
    }

    private void dress() {
        Palette palette = Theme.palette(settings.look(), systemIsDark);
        double zoom = settings.zoomPercent() / 100.0;
        Theme theme = window().theme();
        if (!theme.style().equals(new Style(palette, zoom))) {
            theme.set(palette, zoom);
        }
    }

    private void remember(Settings changed) {
        settings = changed;
        window().showSettings(settings);
        away("The settings could not be kept", () -> changed.save(places), () -> {});
    }

    private interface Task {
        void run() throws IOException;
    }

    private void away(String what, Task task, Runnable then) {
        workers.writing().execute(() -> {
            try {
                task.run();
                workers.home().execute(then);
            } catch (IOException | RuntimeException e) {
                workers.home().execute(() -> show(Trouble.of(what, e)));
            }
        });
    }
}
