package clipramp.desk;

import clipramp.desk.Actions.Page;
import clipramp.desk.Actions.Shown;
import clipramp.desk.model.DeskModel;
import clipramp.desk.model.RecordMaker;
import clipramp.desk.model.Recovery;
import clipramp.desk.model.Resized;
import clipramp.desk.model.Settings;
import clipramp.figures.CircuitFigure;
import clipramp.figures.Figure;
import clipramp.figures.HarmonicsFigure;
import clipramp.files.ReadingsTable;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.scene.image.Image;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;

/** One window: menu bar, header and a page. */
final class DeskWindow {
    private static final double WIDTH = 1366;
    private static final double HEIGHT = 768;
    private static final double LEAST_WIDTH = 640;
    private static final double LEAST_HEIGHT = 480;
    private static final List<String> ICONS = List.of("icon-16.png", "icon-32.png", "icon-64.png");

    private final Stage stage;
    private final Theme theme;
    private final DeskModel model;
    private final BorderPane root = new BorderPane();
    private final StartPage start;
    private final Late<NewPage> fresh;
    private final Late<ProposalPage> proposal;
    private final Late<BenchPage> bench;
    private final Late<SpreadPage> spread;
    private final Late<FitPage> fit;
    private final Map<Page, Late<? extends PageView>> pages = new EnumMap<>(Page.class);
    private final Late<HeaderView> header;
    private final Late<PageTabs> tabs;
    private final Menus menus;
    private final FlowPane bar = new FlowPane();
    private final VBox top = new VBox(bar);
    private Page page = Page.BENCH;

    DeskWindow(Stage stage, Theme theme, DeskModel model, Late<RecordMaker> maker, Actions actions) {
        this.stage = stage;
        this.theme = theme;
        this.model = model;
        this.start = new StartPage(actions);
        this.fresh = new Late<>(() -> new NewPage(
                model.proposing(),
                wish -> actions.propose(wish, false),
                wish -> actions.propose(wish, true),
                actions::giveUpNew));
        this.proposal = new Late<>(() -> new ProposalPage(theme, actions));
        this.bench = new Late<>(this::makeBench);
        this.spread = new Late<>(() -> new SpreadPage(theme, model.draft(), model.spread(), this::layBands));
        pages.put(Page.BENCH, bench);
        pages.put(Page.LINE, new Late<>(() -> new LinePage(theme, model)));
        pages.put(Page.FAULTS, new Late<>(() -> new FaultsPage(theme, model)));
        pages.put(Page.SPREAD, spread);
        this.fit = new Late<>(() -> new FitPage(theme, model.draft(), model.fitting(), actions));
        pages.put(Page.FIT, fit);
        pages.put(Page.SIZE, new Late<>(() -> new SizePage(theme, model.draft(), model.resizing())));
        pages.put(
                Page.RECORD,
                new Late<>(() -> new RecordPage(
                        theme, model.draft(), maker.get(), model.spread(), model.fitting(), actions::saveRecord)));
        this.header = new Late<>(() -> new HeaderView(model, actions, () -> bench().unfold(true)));
        this.tabs = new Late<>(() -> new PageTabs(actions));
        this.menus = new Menus(actions, model.draft());
        bar.getStyleClass().add("top-bar");
        bar.getChildren().setAll(menus.node());
        root.setTop(top);
        root.setCenter(start.node());
        Scene scene = new Scene(root, WIDTH, HEIGHT);
        theme.dress(scene.getStylesheets());
        stage.setScene(scene);
        stage.setMinWidth(LEAST_WIDTH);
        stage.setMinHeight(LEAST_HEIGHT);
        stage.setTitle("clipramp");
        ICONS.forEach(name -> stage.getIcons().add(new Image(DeskWindow.class.getResourceAsStream(name))));
        stage.setOnCloseRequest(event -> {
            event.consume();
            actions.close();
        });
        takeDrops(scene, actions);
        model.draft().onChange(this::refresh);
        model.draft().onChange(this::layBands);
        theme.onChange(this::mark);
    }

    private BenchPage makeBench() {
        BenchPage made = new BenchPage(theme, model);
        made.widthProperty().addListener(property -> mark());
        return made;
    }

    /** Makes what the first painted window did without, so that the first design need not wait for it. */
    void finish() {
        List<Region> pieces =
                new ArrayList<>(List.of(header.get().node(), tabs.get().node()));
        pieces.addAll(bench().pieces());
        if (bench().getParent() == null) {
            FirstDressing.of(
                    theme, List.of(bench(), header.get().node(), tabs.get().node()), pieces);
        }
    }

    private static void takeDrops(Scene scene, Actions actions) {
        scene.setOnDragOver(event -> {
            if (event.getDragboard().hasFiles()) {
                event.acceptTransferModes(TransferMode.COPY);
            }
            event.consume();
        });
        scene.setOnDragDropped(event -> {
            boolean files = event.getDragboard().hasFiles();
            if (files) {
                actions.takeFile(event.getDragboard().getFiles().get(0).toPath());
            }
            event.setDropCompleted(files);
            event.consume();
        });
    }

    private void refresh() {
        boolean shown = top.getChildren().size() > 1;
        if (model.draft().isOpen() && !shown) {
            showPage(Page.BENCH);
        } else if (model.draft().isOpen()) {
            view(page).follow();
        }
        stage.setTitle(model.draft().name() + (model.draft().isDirty() ? " (differs from saved)" : "") + " – clipramp");
        mark();
    }

    void showPage(Page wanted) {
        page = wanted;
        bar.getChildren().setAll(menus.node(), tabs.get().node());
        top.getChildren().setAll(bar, header.get().node());
        root.setCenter(view(page).node());
        view(page).follow();
        if (page == Page.BENCH) {
            Platform.runLater(bench()::begin);
        }
        mark();
    }

    /** Brings readings from a file up where a unit is fitted to them. */
    void showReadings(ReadingsTable readings) {
        showPage(Page.FIT);
        fit.get().offer(readings);
    }

    /** Brings readings back that were typed and never saved. */
    void takeBack(ReadingsTable readings) {
        showPage(Page.FIT);
        fit.get().takeBack(readings);
    }

    /** Goes on once readings that are in no file are saved or given up. */
    void whenReadingsSaved(Runnable then) {
        if (fit.isMade()) {
            fit.get().whenSaved(then);
        } else {
            then.run();
        }
    }

    private PageView view(Page of) {
        return Objects.requireNonNull(pages.get(of)).get();
    }

    /** The spread of the design as it stands lies over lanes and knob, where it is wanted. */
    private void layBands() {
        if (spread.isMade()) {
            model.bench().lay(spread.get().bands());
        }
    }

    /** Asks for a new design. */
    void showNew() {
        fresh.get().offer(model.draft().workshop().lineIds());
        showQuestions();
    }

    /** The questions as they were answered last. */
    void showQuestions() {
        bar.getChildren().setAll(menus.node());
        top.getChildren().setAll(bar);
        root.setCenter(fresh.get().node());
        Platform.runLater(fresh.get()::begin);
    }

    /** Whether a new design is being asked for. */
    boolean isAsking() {
        return fresh.isMade() && fresh.get().node().equals(root.getCenter());
    }

    /** Shows what was found for the answers. */
    void showProposal(Resized found) {
        proposal.get().show(found);
        root.setCenter(proposal.get().node());
        Platform.runLater(proposal.get()::begin);
    }

    void complainNew(String words) {
        fresh.get().complain(words);
    }

    /** Back to what was there before. */
    void leaveNew() {
        if (model.draft().isOpen()) {
            showPage(page);
        } else {
            root.setCenter(start.node());
        }
    }

    private void mark() {
        if (header.isMade() && bench.isMade()) {
            header.get().showPage(page, bench().isFolded());
            tabs.get().show(page);
        }
    }

    void showSettings(Settings settings) {
        menus.showRecent(settings.recent());
        start.showRecent(settings.recent());
    }

    void offer(List<Recovery.Left> works) {
        start.offer(works);
    }

    /** A word about what was done, beside the title. */
    void say(String words) {
        header.get().say(words);
    }

    Stage stage() {
        return stage;
    }

    Theme theme() {
        return theme;
    }

    BenchPage bench() {
        return bench.get();
    }

    Optional<Figure> figure(Shown what) {
        return switch (what) {
            case LANES -> bench().lanes().figure().map(f -> (Figure) f);
            case KNOB -> bench().knob().figure().map(f -> (Figure) f);
            case LINE ->
                model.judgement()
                        .flatMap(j -> j.check().lineCurrent())
                        .map(check -> new HarmonicsFigure(check, model.line().setting()));
            case CIRCUIT -> model.draft().sheet().map(s -> new CircuitFigure(s.design()));
        };
    }
}
