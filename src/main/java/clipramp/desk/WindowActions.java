package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.Draft;
import clipramp.desk.model.LongRun;
import clipramp.desk.model.NewDesign;
import clipramp.desk.model.Places;
import clipramp.desk.model.RecordMaker;
import clipramp.desk.model.Recovery;
import clipramp.desk.model.Resized;
import clipramp.desk.model.Resizing;
import clipramp.desk.model.Settings;
import clipramp.desk.model.Trouble;
import clipramp.desk.model.ViewCondition;
import clipramp.desk.model.Wish;
import clipramp.desk.model.Workers;
import clipramp.figures.Palette;
import clipramp.figures.Style;
import clipramp.files.Example;
import clipramp.files.ReadingsTable;
import java.nio.file.Path;
import java.util.Objects;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;

/** Does what the window is asked: files and figures by helpers of their own, the rest here. */
final class WindowActions implements Actions {
    private final DeskModel model;
    private final Late<RecordMaker> maker;
    private final Recovery recovery;
    private final Places places;
    private final Workers workers;
    private final Runnable closed;
    private @Nullable Served served;
    private Settings settings = Settings.FIRST;
    private boolean systemIsDark;
    private boolean entering;

    private record Served(Service service, FileActions files, FigureActions figures) {}

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
        model.proposing().onChange(this::followProposal);
    }

    void serve(DeskWindow window, FileAsk fileAsk) {
        Service service = new Service(window, fileAsk, workers);
        served = new Served(service, new FileActions(service, draft(), recovery, maker), new FigureActions(service));
    }

    private Served served() {
        return Objects.requireNonNull(served, "no window is served yet");
    }

    private DeskWindow window() {
        return served().service().window();
    }

    private Dialogs dialogs() {
        return served().service().dialogs();
    }

    private FileActions files() {
        return served().files();
    }

    private Draft draft() {
        return model.draft();
    }

    /** Shows a failure. */
    void show(Trouble trouble) {
        served().service().show(trouble);
    }

    // --- files

    @Override
    public void startNew() {
        files().whenSaved(window()::showNew);
    }

    @Override
    public void propose(Wish wish, boolean wantsToEnter) {
        NewDesign.Checked checked = NewDesign.check(wish);
        window().complainNew(checked.refusal().orElse(""));
        if (checked.refusal().isEmpty()) {
            entering = wantsToEnter;
            model.proposing().start(Resizing.Asked.fresh(NewDesign.request(checked.wish())));
        }
    }

    private void followProposal() {
        LongRun<Resizing.Asked, Resized> run = model.proposing();
        run.trouble().ifPresent(trouble -> window().complainNew(trouble.text()));
        if (!run.isRunning() && run.answer().isPresent()) {
            Resized found = run.answer().get();
            run.clear();
            if (!window().isAsking()) {
                return;
            }
            if (entering) {
                takeProposal(found, Page.BENCH);
            } else {
                window().showProposal(found);
            }
        }
    }

    @Override
    public void takeProposal(Resized found, Page page) {
        draft().take(found, () -> {
            window().showPage(page);
            if (entering) {
                window().bench().enterParts();
            }
        });
    }

    @Override
    public void openReadings(Consumer<ReadingsTable> then) {
        new ReadingsActions(served().service()).open(then);
    }

    @Override
    public void saveReadings(ReadingsTable table, Runnable then) {
        new ReadingsActions(served().service()).save(table, draft().file(), then);
    }

    @Override
    public void replaceReadings(Runnable then) {
        dialogs().replaceReadings(answer -> {
            if (answer == Dialogs.REPLACE) {
                then.run();
            }
        });
    }

    @Override
    public void leaveReadings(Runnable save, Runnable then) {
        dialogs().unsavedReadings(answer -> {
            if (answer == Dialogs.SAVE) {
                save.run();
            } else if (answer == Dialogs.DISCARD) {
                then.run();
            }
        });
    }

    @Override
    public void takeFile(Path file) {
        if (ReadingsActions.isReadings(file)) {
            takeReadings(file);
        } else {
            openFile(file);
        }
    }

    private void takeReadings(Path file) {
        if (draft().isOpen()) {
            new ReadingsActions(served().service()).open(file, window()::showReadings);
        } else {
            dialogs()
                    .text(
                            "readings",
                            "Readings need a design",
                            dialogs()
                                    .words(file.getFileName()
                                            + " holds readings of one unit. Open the design that the unit was"
                                            + " built from, or enter it under New design, and drop the file again."));
        }
    }

    @Override
    public void changeAnswers() {
        window().showQuestions();
    }

    @Override
    public void giveUpNew() {
        window().leaveNew();
    }

    @Override
    public void open() {
        files().open(this::takeReadings);
    }

    @Override
    public void openFile(Path file) {
        files().whenSaved(() -> draft().open(file));
    }

    @Override
    public void openExample(Example example) {
        files().whenSaved(() -> draft().openUnsaved(example.id() + ".yaml", example.text()));
    }

    @Override
    public void recover(Recovery.Left work) {
        files().recover(work);
    }

    @Override
    public void forget(Recovery.Left work) {
        files().forget(work);
    }

    /** Looks for work that was left behind, and offers it. */
    void offerRecovery() {
        files().offerRecovery();
    }

    @Override
    public void save() {
        files().save();
    }

    @Override
    public void saveAs() {
        files().saveAs();
    }

    @Override
    public void saveRecord() {
        files().saveRecord();
    }

    @Override
    public void close() {
        files().whenSaved(() -> window().whenReadingsSaved(() -> {
            window().stage().hide();
            closed.run();
        }));
    }

    private void rememberFile() {
        draft().file().ifPresent(file -> {
            if (settings.recent().isEmpty() || !settings.recent().get(0).equals(file)) {
                remember(settings.withRecent(file));
            }
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

    @Override
    public void showNumbers(Shown what) {
        served().figures().showNumbers(what);
    }

    @Override
    public void copyPicture(Shown what) {
        served().figures().copyPicture(what);
    }

    @Override
    public void copyTable(Shown what) {
        served().figures().copyTable(what);
    }

    @Override
    public void export(Shown what, FileAsk.Kind kind) {
        served().figures().export(what, kind, draft().file());
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
    public void showLicences() {
        Dialogs dialogs = dialogs();
        dialogs.text("licences", "Licences", dialogs.scrolling(Leaflets.licences(dialogs)));
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
        served().service().away("The settings could not be kept", () -> changed.save(places), () -> {});
    }
}
