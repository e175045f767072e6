package clipramp.desk;

import clipramp.desk.model.Draft;
import clipramp.desk.model.PartGroup;
import clipramp.desk.model.PartSlot;
import clipramp.desk.model.Sheet;
import clipramp.figures.CircuitFigure;
import clipramp.figures.PartBox;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.scene.Cursor;
import javafx.scene.control.Button;
import javafx.scene.control.ToggleButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.TilePane;
import javafx.scene.layout.VBox;

/** The drawn circuit and, along it in the order of the signal, its parts: choosing one in either marks it in both. */
final class PartsView {
    /** Lower than this, in effective pixels, nothing on the drawing can be read. */
    private static final double LEAST_DRAWING = 240;

    private final Draft draft;
    private final FigurePane drawing;
    private final TilePane slots = new TilePane();
    private final Map<PartGroup, ToggleButton> stations = new EnumMap<>(PartGroup.class);
    private final VBox box = new VBox();
    private final Scroller whole = Scroller.ofControls(box);
    private final List<SlotView> views = new ArrayList<>();
    private PartGroup station = PartGroup.RAMP;
    private String chosen = "";
    private Optional<CircuitFigure> circuit = Optional.empty();

    PartsView(Theme theme, Draft draft) {
        this.draft = draft;
        this.drawing = new FigurePane(theme);
        drawing.setId("circuit");
        drawing.setFocusTraversable(true);
        drawing.addEventHandler(MouseEvent.MOUSE_CLICKED, this::pick);
        drawing.addEventHandler(
                MouseEvent.MOUSE_MOVED,
                event -> drawing.setCursor(partAt(event).isPresent() ? Cursor.HAND : Cursor.DEFAULT));
        slots.getStyleClass().add("slots");
        Scroller scroll = Scroller.ofControls(slots);
        scroll.getStyleClass().add("slot-scroll");
        VBox.setVgrow(drawing, Priority.ALWAYS);
        box.getStyleClass().add("parts");
        box.getChildren().addAll(drawing, strip(), scroll);
        whole.setFitToHeight(true);
        theme.onChange(() -> drawing.setMinHeight(LEAST_DRAWING * theme.zoom()));
        drawing.setMinHeight(LEAST_DRAWING * theme.zoom());
        draft.onChange(this::refresh);
    }

    Scroller node() {
        return whole;
    }

    private HBox strip() {
        HBox strip = new HBox();
        strip.getStyleClass().add("stations");
        for (PartGroup each : PartGroup.values()) {
            ToggleButton button = new ToggleButton(each.word());
            button.setId("station-" + each.word());
            button.setAccessibleText("Parts of the station " + each.word());
            button.setOnAction(event -> show(each, ""));
            stations.put(each, button);
            strip.getChildren().add(button);
        }
        Button next = new Button("next ›");
        next.setId("station-next");
        next.setAccessibleText("Next station of the signal");
        next.setOnAction(event -> next());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        strip.getChildren().addAll(gap, next);
        return strip;
    }

    /** Shows the first station and puts the keyboard there. */
    void begin() {
        show(PartGroup.LINE, "");
        views.stream().findFirst().ifPresent(this::focus);
    }

    private void next() {
        PartGroup[] all = PartGroup.values();
        show(all[(station.ordinal() + 1) % all.length], "");
        views.stream().findFirst().ifPresent(this::focus);
    }

    /** Brings a part's station up and puts the keyboard into its place. */
    void choose(String key) {
        show(PartGroup.of(key), key);
        views.stream().filter(view -> view.key().equals(key)).findFirst().ifPresent(this::focus);
    }

    /** What was never shown before has no place for the keyboard until it is laid out. */
    private void focus(SlotView view) {
        whole.applyCss();
        whole.layout();
        view.node().requestFocus();
        // The drawing may leave no room for the parts under it.
        whole.setVvalue(whole.getVmax());
    }

    private void show(PartGroup group, String key) {
        boolean other = station != group;
        station = group;
        chosen = key;
        if (other) {
            views.clear();
        }
        refresh();
    }

    private void refresh() {
        stations.forEach((group, button) -> button.setSelected(group == station));
        draft.sheet().ifPresent(sheet -> {
            circuit = Optional.of(new CircuitFigure(sheet.design()));
            mark();
            fill(sheet);
        });
    }

    private void mark() {
        circuit.ifPresent(c -> drawing.show(c.withChosen(chosen.isEmpty() ? Set.of() : Set.of(chosen))));
    }

    private void fill(Sheet sheet) {
        List<PartSlot> wanted = PartSlot.of(station, sheet, draft.workshop(), draft.file());
        boolean same = views.stream()
                .map(SlotView::shape)
                .toList()
                .equals(wanted.stream().map(SlotView::shapeOf).toList());
        if (!same) {
            views.clear();
            wanted.forEach(slot -> views.add(new SlotView(slot, draft, this::focused)));
            slots.getChildren().setAll(views.stream().map(SlotView::box).toList());
        }
        for (int i = 0; i < wanted.size(); i++) {
            views.get(i).show(wanted.get(i));
        }
    }

    private void focused(String key) {
        if (!chosen.equals(key)) {
            chosen = key;
            mark();
        }
    }

    private Optional<String> partAt(MouseEvent event) {
        return circuit.flatMap(
                c -> c.parts(drawing.area().getWidth(), drawing.area().getHeight()).stream()
                        .filter(part -> part.contains(event.getX(), event.getY()))
                        .map(PartBox::key)
                        .findFirst());
    }

    private void pick(MouseEvent event) {
        partAt(event).ifPresent(this::choose);
    }
}
