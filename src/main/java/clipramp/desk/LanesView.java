package clipramp.desk;

import clipramp.desk.model.Bench;
import clipramp.desk.model.Figures;
import clipramp.desk.model.Reading;
import clipramp.figures.Lane;
import clipramp.figures.LanesFigure;
import clipramp.figures.LanesFrame;
import clipramp.figures.SpreadBands;
import clipramp.firing.Pulse;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;

/** The five lanes: the firing line can be dragged, the pointer reads all lanes, a click on a pulse looks closer. */
final class LanesView {
    private static final double GRIP = 12;
    private static final double STEP_RAD = Math.toRadians(1);
    private static final double FINE_RAD = Math.toRadians(0.1);
    /** How much of the line is shown before a pulse, and how much after, as multiples of its length. */
    private static final double BEFORE = 0.25;

    private static final double AFTER = 1.25;

    private final FigurePane pane;
    private final Bench bench;
    private OptionalDouble crosshair = OptionalDouble.empty();
    private boolean close;
    private boolean dragging;

    LanesView(Theme theme, Bench bench) {
        this.pane = new FigurePane(theme);
        this.bench = bench;
        pane.setId("lanes");
        pane.setFocusTraversable(true);
        pane.addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
        pane.addEventHandler(MouseEvent.MOUSE_EXITED, event -> read(OptionalDouble.empty()));
        pane.addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        pane.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        pane.addEventHandler(MouseEvent.MOUSE_RELEASED, event -> dragging = false);
        pane.addEventHandler(MouseEvent.MOUSE_CLICKED, this::click);
        pane.addEventHandler(KeyEvent.KEY_PRESSED, this::key);
        bench.onReading(this::refresh);
    }

    FigurePane node() {
        return pane;
    }

    Optional<LanesFigure> figure() {
        return Optional.ofNullable((LanesFigure) pane.figure());
    }

    boolean isClose() {
        return close;
    }

    /** Looks at the pulse in microseconds, or back at the whole half cycle. */
    void setClose(boolean wanted) {
        close = wanted;
        refresh();
    }

    private void refresh() {
        bench.reading().ifPresent(reading -> {
            LanesFigure whole = new LanesFigure(reading.lanes())
                    .withBand(bench.spread().flatMap(s -> SpreadBands.lanes(s, bench.position())));
            LanesFigure shown = close ? near(whole, reading) : whole;
            pane.show(shown.withCrosshair(crosshair));
            pane.setAccessibleText("Half-cycle lanes, firing angle "
                    + Figures.of(reading).angle() + ". Left and right move it by 1 degree, with Shift by 0.1.");
        });
    }

    private static LanesFigure near(LanesFigure whole, Reading reading) {
        Optional<Pulse> pulse = reading.point().solution().shown().shownPulse();
        if (pulse.isEmpty()) {
            return whole;
        }
        double omega = reading.request().condition().omega();
        double length = omega * (pulse.get().endSeconds() - pulse.get().startSeconds());
        double start = pulse.get().startRad();
        return whole.withView(start - BEFORE * length, start + AFTER * length);
    }

    private Optional<LanesFrame> frame() {
        return figure().map(f -> f.frame(pane.area().getWidth(), pane.area().getHeight(), pane.style()));
    }

    private void read(OptionalDouble rad) {
        if (!crosshair.equals(rad)) {
            crosshair = rad;
            figure().ifPresent(f -> pane.show(f.withCrosshair(rad)));
        }
    }

    private boolean isOnFiringLine(double x) {
        OptionalDouble rad = bench.reading().map(Reading::firingRad).orElse(OptionalDouble.empty());
        return rad.isPresent()
                && frame().map(f -> Math.abs(f.xOf(rad.getAsDouble()) - x)
                                <= GRIP * pane.style().zoom())
                        .orElse(false);
    }

    private void hover(MouseEvent event) {
        frame().ifPresent(f -> {
            boolean inside = event.getX() >= f.left() && event.getX() <= f.right();
            read(inside ? OptionalDouble.of(f.radAt(event.getX())) : OptionalDouble.empty());
            pane.setCursor(isOnFiringLine(event.getX()) ? Cursor.H_RESIZE : Cursor.DEFAULT);
        });
    }

    private void press(MouseEvent event) {
        pane.requestFocus();
        dragging = !close && isOnFiringLine(event.getX());
        if (dragging) {
            read(OptionalDouble.empty());
        }
    }

    private void drag(MouseEvent event) {
        if (dragging) {
            frame().ifPresent(f -> bench.fireAt(f.radAt(event.getX())));
        }
    }

    private void click(MouseEvent event) {
        boolean onPulse = frame().flatMap(f -> f.laneAt(event.getY()))
                .filter(Lane.PULSE::equals)
                .isPresent();
        if (event.isStillSincePress() && (close || (onPulse && !isOnFiringLine(event.getX())))) {
            setClose(!close);
        }
    }

    private void key(KeyEvent event) {
        double step = event.isShiftDown() ? FINE_RAD : STEP_RAD;
        if (event.getCode() == KeyCode.LEFT) {
            bench.fireLaterBy(-step);
        } else if (event.getCode() == KeyCode.RIGHT) {
            bench.fireLaterBy(step);
        } else if (event.getCode() == KeyCode.ENTER || event.getCode() == KeyCode.SPACE) {
            setClose(!close);
        } else if (event.getCode() == KeyCode.ESCAPE && close) {
            setClose(false);
        } else {
            return;
        }
        event.consume();
    }
}
