package clipramp.desk;

import clipramp.desk.model.Draft;
import clipramp.desk.model.Fitting;
import clipramp.desk.model.LongRun;
import clipramp.desk.model.PartSlot;
import clipramp.desk.model.RecordMaker;
import clipramp.desk.model.Sheet;
import clipramp.desk.model.SpreadRun;
import clipramp.fit.FitResult;
import clipramp.record.PageSize;
import clipramp.record.RecordPreview;
import clipramp.spread.SpreadResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.binding.Bindings;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.image.ImageView;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/** The record's pages as they will be saved, and its title block. */
final class RecordPage implements PageView {
    private static final List<String> TITLE_BLOCK = List.of(
            "title",
            "document.number",
            "document.revision",
            "document.prepared-by",
            "document.reviewed-by",
            "document.date");

    private final Draft draft;
    private final SpreadRun run;
    private final CheckBox spread = new CheckBox("With the spread");
    private final Label spreadHint = Words.quiet("");
    private final RecordMaker maker;
    private final LongRun<Fitting.Asked, Fitting.Answer> fitting;
    private final CheckBox unit = new CheckBox("With the unit as built");
    private final VBox pages = new VBox();
    private final VBox side = new VBox();
    private final Button save = new Button("Save the record…");
    private final Label progress = new Label();
    private final BorderPane box = new BorderPane();
    private final List<SlotView> slots = new ArrayList<>();
    private int drawn;

    /**
     * @param run the spread, whose page the record may have
     * @param fitting the fit of one unit, whose page the record may have
     * @param saving saves the record
     */
    RecordPage(
            Theme theme,
            Draft draft,
            RecordMaker maker,
            SpreadRun run,
            LongRun<Fitting.Asked, Fitting.Answer> fitting,
            Runnable saving) {
        this.fitting = fitting;
        this.draft = draft;
        this.run = run;
        this.maker = maker;
        pages.getStyleClass().add("record-pages");
        pages.setId("record-pages");
        Scroller scroll = Scroller.ofText(pages, "Pages of the record; arrow keys scroll");
        scroll.getStyleClass().add("record-scroll");
        save.setId("record-save");
        save.setDefaultButton(true);
        save.setOnAction(event -> saving.run());
        box.setLeft(side());
        box.setCenter(scroll);
        maker.onChange(this::refresh);
        theme.onChange(() -> maker.setZoom(theme.zoom()));
    }

    private Scroller side() {
        side.getStyleClass().add("record-side");
        progress.getStyleClass().add("quiet");
        progress.setId("record-progress");
        progress.setWrapText(true);
        unit.setId("record-fit");
        unit.setAccessibleText("A page about the unit as built, from its bench readings");
        unit.setOnAction(event -> maker.setFit(measured()));
        spread.setId("record-spread");
        spread.setAccessibleText("With a page on what many units do, as it was last drawn");
        spread.setOnAction(event -> follow());
        spreadHint.setId("record-spread-hint");
        spreadHint.managedProperty().bind(spreadHint.textProperty().isNotEmpty());
        side.getChildren().addAll(save, progress, paper(), unit, spread, spreadHint);
        Scroller sideScroll = Scroller.ofControls(side);
        sideScroll.getStyleClass().add("record-side-scroll");
        return sideScroll;
    }

    private ComboBox<String> paper() {
        ComboBox<String> paper = new ComboBox<>();
        for (PageSize size : PageSize.values()) {
            paper.getItems().add(size.word());
        }
        paper.setValue(PageSize.A4.word());
        paper.setId("record-paper");
        paper.setAccessibleText("Paper");
        paper.valueProperty()
                .addListener(property ->
                        maker.setSize(PageSize.values()[paper.getItems().indexOf(paper.getValue())]));
        return paper;
    }

    @Override
    public BorderPane node() {
        return box;
    }

    /** Brings the pages up to the design as it stands. */
    @Override
    public void follow() {
        draft.sheet().ifPresent(sheet -> {
            offerUnit(sheet);
            maker.setFit(measured());
            Optional<SpreadResult> drawn = run.of(sheet.loaded());
            spread.setDisable(drawn.isEmpty());
            spreadHint.setText(
                    drawn.isPresent()
                            ? ""
                            : "Its page tells of the units of this very design: draw them on Spread first.");
            maker.setSpread(drawn.filter(units -> spread.isSelected()));
            maker.show(sheet.loaded(), draft.file());
            titleBlock(sheet);
        });
    }

    /** A unit that was fitted to this very design, or whose design this is, can have its page. */
    private void offerUnit(Sheet sheet) {
        boolean there = fitting.answer()
                .map(answer -> answer.isOf(sheet) || answer.isTaken(sheet))
                .orElse(false);
        unit.setVisible(there);
        unit.setManaged(there);
    }

    private Optional<FitResult> measured() {
        return unit.isVisible() && unit.isSelected() ? fitting.answer().map(Fitting.Answer::result) : Optional.empty();
    }

    private void titleBlock(Sheet sheet) {
        List<PartSlot> wanted = PartSlot.at(TITLE_BLOCK, sheet);
        if (slots.isEmpty()) {
            for (PartSlot slot : wanted) {
                SlotView view = new SlotView(slot, draft, key -> {});
                slots.add(view);
                side.getChildren().add(view.box());
            }
        }
        for (int i = 0; i < wanted.size(); i++) {
            slots.get(i).show(wanted.get(i));
        }
    }

    private void refresh() {
        List<RecordPreview.Page> all = maker.pages();
        save.setDisable(maker.pdf().isEmpty());
        if (all.size() < drawn) {
            pages.getChildren().clear();
            drawn = 0;
        }
        while (drawn < all.size()) {
            pages.getChildren().add(picture(all.get(drawn)));
            drawn++;
        }
        progress.setText(words(all));
    }

    private String words(List<RecordPreview.Page> all) {
        if (maker.isBusy()) {
            return all.isEmpty()
                    ? "Laying the record out…"
                    : "Page " + all.size() + " of " + all.get(0).count();
        }
        return all.size() + " pages. Computed; no statement of compliance.";
    }

    private StackPane picture(RecordPreview.Page page) {
        WritableImage image = new WritableImage(page.width(), page.height());
        image.getPixelWriter()
                .setPixels(
                        0,
                        0,
                        page.width(),
                        page.height(),
                        PixelFormat.getIntArgbInstance(),
                        page.argb(),
                        0,
                        page.width());
        ImageView view = new ImageView(image);
        view.setPreserveRatio(true);
        view.fitWidthProperty()
                .bind(Bindings.createDoubleBinding(
                        () -> Math.min(
                                page.width(),
                                pages.getWidth()
                                        - pages.getInsets().getLeft()
                                        - pages.getInsets().getRight()),
                        pages.widthProperty(),
                        pages.insetsProperty()));
        StackPane sheet = new StackPane(view);
        sheet.setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        sheet.setAccessibleText("Page " + page.number() + " of " + page.count() + " of the record");
        return sheet;
    }
}
