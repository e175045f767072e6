package clipramp.desk;

import java.util.Optional;
import javafx.geometry.Insets;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** What is asked beside what is told of it; one over the other where there is too little room for both. */
final class TwoColumns {
    /** Under this width in effective pixels. */
    private static final double STACK_BELOW = 1000;

    private static final double GAP = 16;

    private final Theme theme;
    private final SidePanel side;
    private final VBox middle;
    private final VBox stacked = new VBox();
    private final Scroller scroll;
    private final BorderPane box = new BorderPane();
    private Optional<Region> first = Optional.empty();
    private Optional<Boolean> arranged = Optional.empty();

    /**
     * @param side what is asked
     * @param middle what is told
     * @param said what a screen reader says of the part that scrolls
     */
    TwoColumns(Theme theme, SidePanel side, VBox middle, String said) {
        this.theme = theme;
        this.side = side;
        this.middle = middle;
        middle.getStyleClass().add("spread-middle");
        scroll = Scroller.ofText(middle, said);
        scroll.getStyleClass().add("record-scroll");
        box.setCenter(scroll);
        box.widthProperty().addListener(property -> arrange());
        theme.onChange(this::arrange);
        arrange();
    }

    BorderPane node() {
        return box;
    }

    Scroller scroll() {
        return scroll;
    }

    /** What stands over everything else: over what is told, and where that comes second over what is asked. */
    void begin(Region notice) {
        first = Optional.of(notice);
        arranged = Optional.empty();
        arrange();
    }

    private void arrange() {
        boolean narrow = box.getWidth() > 0 && box.getWidth() / theme.zoom() < STACK_BELOW;
        if (!arranged.equals(Optional.of(narrow))) {
            arranged = Optional.of(narrow);
            stacked.getChildren().clear();
            first.ifPresent(middle.getChildren()::remove);
            side.node().setContent(narrow ? null : side.column());
            if (narrow) {
                stacked.getChildren().setAll(side.column(), middle);
            }
            first.ifPresent(notice -> (narrow ? stacked : middle).getChildren().add(0, notice));
            first.ifPresent(notice -> VBox.setMargin(notice, new Insets(narrow ? GAP * theme.zoom() : 0)));
            scroll.setContent(narrow ? stacked : middle);
            box.setLeft(narrow ? null : side.node());
        }
    }
}
