package clipramp.desk;

import clipramp.desk.model.DeskModel;
import clipramp.desk.model.MarginRow;
import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/**
 * Lanes and knob on the left, which always stay; parts and margins on the right, both where there is room, one of them
 * where there is less, folded away where there is none.
 */
final class BenchPage extends Pane implements PageView {
    /** Widths and heights are in effective pixels: real ones over the zoom. */
    private static final double FOLD_BELOW = 1000;

    private static final double BOTH_FROM = 940;
    private static final double LEFT_SHARE = 0.53;
    private static final double LEAST_LANES = 300;
    private static final double LEAST_KNOB = 170;
    private static final double KNOB_SHARE = 0.27;
    private static final double DRAWER = 620;
    private static final double PARTS_SHARE = 0.56;

    private final Theme theme;
    private final LanesView lanes;
    private final PartsView parts;
    private final MarginsView margins;
    private final KnobView knob;
    private final VBox left = new VBox();
    private final Scroller leftScroll = Scroller.ofControls(left);
    private final VBox right = new VBox();
    private final HBox tabs = new HBox();
    private final ToggleButton partsTab = tab("parts", "Circuit and parts");
    private final ToggleButton marginsTab = tab("margins", "Margins");
    private final Button fold = new Button("Close");
    private boolean partsChosen;
    private boolean drawn;

    BenchPage(Theme theme, DeskModel model) {
        this.theme = theme;
        this.lanes = new LanesView(theme, model.bench());
        this.parts = new PartsView(theme, model.draft());
        this.margins = new MarginsView(this::showPart);
        this.knob = new KnobView(theme, model.bench());
        ReadoutView readout = new ReadoutView(model.bench());
        getStyleClass().add("bench");
        left.getStyleClass().add("bench-left");
        right.getStyleClass().add("bench-right");
        VBox.setVgrow(lanes.node(), Priority.ALWAYS);
        knob.node().setMinHeight(Region.USE_PREF_SIZE);
        left.getChildren().addAll(lanes.node(), readout.node(), knob.node());
        leftScroll.setFitToHeight(true);
        tabs.getStyleClass().add("tabs");
        tabs.setMinHeight(Region.USE_PREF_SIZE);
        marginsTab.setOnAction(event -> choose(false));
        partsTab.setOnAction(event -> choose(true));
        fold.setOnAction(event -> unfold(false));
        fold.setAccessibleText("Fold parts and margins away");
        // Placed here by hand: what changes inside one of them lays out that one only.
        leftScroll.setManaged(false);
        right.setManaged(false);
        getChildren().addAll(leftScroll, right);
        model.onJudgement(() -> model.judgement()
                .ifPresent(j -> margins.show(MarginRow.all(j.check().margins()))));
        theme.onChange(this::arrange);
        widthProperty().addListener(property -> arrange());
        heightProperty().addListener(property -> arrange());
        arrange();
    }

    private static ToggleButton tab(String id, String text) {
        ToggleButton button = new ToggleButton(text);
        button.setId("tab-" + id);
        button.setAccessibleText(text);
        return button;
    }

    @Override
    public Pane node() {
        return this;
    }

    LanesView lanes() {
        return lanes;
    }

    KnobView knob() {
        return knob;
    }

    /** What it is put together from. */
    List<Region> pieces() {
        return List.of(leftScroll, tabs, parts.node(), right);
    }

    /** Whether there is no room for parts and margins beside the lanes. */
    boolean isFolded() {
        return getWidth() / theme.zoom() < FOLD_BELOW;
    }

    /** Brings parts or margins up. */
    void choose(boolean wantsParts) {
        partsChosen = wantsParts;
        drawn = true;
        arrange();
    }

    /** Opens parts and margins over the lanes where they are folded away, or folds them again. */
    void unfold(boolean wanted) {
        drawn = wanted;
        arrange();
    }

    /** Puts the keyboard on the knob. */
    void begin() {
        knob.begin();
    }

    /** Begins at the first station, to enter a circuit part by part. */
    void enterParts() {
        choose(true);
        parts.begin();
    }

    private void showPart(String key) {
        choose(true);
        parts.choose(key);
    }

    private boolean bothFit() {
        return !isFolded() && getHeight() / theme.zoom() >= BOTH_FROM;
    }

    private void arrange() {
        boolean folded = isFolded();
        // Five lanes and a curve need so much to be read; a small or much enlarged window scrolls.
        lanes.node().setMinHeight(LEAST_LANES * theme.zoom());
        knob.node().setPrefHeight(Math.max(LEAST_KNOB * theme.zoom(), getHeight() * KNOB_SHARE));
        if (bothFit()) {
            parts.node().setMinHeight(getHeight() * PARTS_SHARE);
            parts.node().setPrefHeight(getHeight() * PARTS_SHARE);
            stack(parts.node(), margins.node());
        } else {
            tabs.getChildren().setAll(marginsTab, partsTab);
            if (folded) {
                tabs.getChildren().add(fold);
            }
            // Not a toggle group: every one of them is reached by Tab.
            partsTab.setSelected(partsChosen);
            marginsTab.setSelected(!partsChosen);
            Region body = partsChosen ? parts.node() : margins.node();
            body.setMinHeight(0);
            body.setPrefHeight(Region.USE_COMPUTED_SIZE);
            stack(tabs, body);
        }
        right.setVisible(!folded || drawn);
        requestLayout();
    }

    private void stack(Region upper, Region lower) {
        VBox.setVgrow(lower, Priority.ALWAYS);
        List<Region> wanted = List.of(upper, lower);
        if (!right.getChildren().equals(wanted)) {
            right.getChildren().setAll(wanted);
        }
    }

    @Override
    protected void layoutChildren() {
        double width = getWidth();
        double height = getHeight();
        if (isFolded()) {
            leftScroll.resizeRelocate(0, 0, width, height);
            double drawer = Math.min(width, DRAWER * theme.zoom());
            right.resizeRelocate(width - drawer, 0, drawer, height);
        } else {
            double split = Math.round(width * LEFT_SHARE);
            leftScroll.resizeRelocate(0, 0, split, height);
            right.resizeRelocate(split, 0, width - split, height);
        }
    }
}
