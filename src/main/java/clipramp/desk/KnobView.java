package clipramp.desk;

import clipramp.desk.model.Bench;
import clipramp.figures.KnobFigure;
import clipramp.figures.SpreadBands;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;

/** The shaft and, beside it, the power curve over its rotation; both turn it. */
final class KnobView {
    private final Bench bench;
    private final DialView dial;
    private final FigurePane curve;
    private final HBox box = new HBox();
    private Optional<KnobFigure> figure = Optional.empty();

    KnobView(Theme theme, Bench bench) {
        this.bench = bench;
        this.dial = new DialView(bench);
        this.curve = new FigurePane(theme);
        curve.setId("knob-curve");
        curve.addEventHandler(MouseEvent.MOUSE_PRESSED, this::turn);
        curve.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::turn);
        HBox.setHgrow(curve, Priority.ALWAYS);
        box.getStyleClass().add("knob");
        box.getChildren().addAll(dial.node(), curve);
        bench.onCurve(this::refreshCurve);
        bench.onReading(this::refreshPosition);
    }

    HBox node() {
        return box;
    }

    /** Puts the keyboard on the shaft. */
    void begin() {
        dial.node().requestFocus();
    }

    Optional<KnobFigure> figure() {
        return figure;
    }

    private void refreshCurve() {
        bench.curve()
                .ifPresent(c -> figure =
                        Optional.of(new KnobFigure(c.points(), c.design().wanted())
                                .withBand(bench.spread().flatMap(SpreadBands::knob))));
        boolean turns =
                bench.curve().map(c -> c.design().ramp().pot().isPresent()).orElse(false);
        dial.node().setVisible(turns);
        dial.node().setManaged(turns);
        refreshPosition();
    }

    private void refreshPosition() {
        figure.ifPresent(f -> curve.show(
                f.withPosition(bench.reading().map(r -> r.point().position()).orElse(OptionalDouble.empty()))));
    }

    private void turn(MouseEvent event) {
        dial.node().requestFocus();
        figure.ifPresent(f -> f.positionAt(
                        event.getX(), curve.area().getWidth(), curve.area().getHeight(), curve.style())
                .ifPresent(bench::turnTo));
    }
}
