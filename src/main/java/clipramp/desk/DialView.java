package clipramp.desk;

import clipramp.desk.model.Bench;
import clipramp.desk.model.Figures;
import clipramp.sizing.KnobShape;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.Pane;
import javafx.scene.layout.StackPane;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Line;

/** The shaft as seen from the front: 270 degrees from stop to stop, the pointer where it stands. */
final class DialView {
    private static final double FINE = 0.001;
    private static final double STEP = 0.01;
    private static final double COARSE = 0.1;
    private static final int MARKS = 10;

    private final Bench bench;
    private final Face face = new Face();
    private final StackPane pane = new StackPane(face);

    DialView(Bench bench) {
        this.bench = bench;
        pane.setId("knob");
        pane.getStyleClass().add("dial");
        pane.setAlignment(Pos.CENTER);
        pane.setFocusTraversable(true);
        pane.setAccessibleRole(AccessibleRole.SLIDER);
        pane.addEventHandler(KeyEvent.KEY_PRESSED, this::key);
        pane.addEventHandler(MouseEvent.MOUSE_PRESSED, this::point);
        pane.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::point);
        pane.addEventHandler(ScrollEvent.SCROLL, this::roll);
        bench.onReading(this::refresh);
        refresh();
    }

    StackPane node() {
        return pane;
    }

    private void refresh() {
        face.turn(bench.position());
        pane.setAccessibleText("Knob at " + Figures.percent(bench.position())
                + ". Arrow keys turn it by 1 %, with Shift by 0.1 %, page keys by 10 %.");
    }

    private void key(KeyEvent event) {
        double step = event.isShiftDown() ? FINE : STEP;
        switch (event.getCode()) {
            case RIGHT, UP -> bench.turnBy(step);
            case LEFT, DOWN -> bench.turnBy(-step);
            case PAGE_UP -> bench.turnBy(COARSE);
            case PAGE_DOWN -> bench.turnBy(-COARSE);
            case HOME -> bench.turnTo(0);
            case END -> bench.turnTo(1);
            default -> {
                return;
            }
        }
        refresh();
        event.consume();
    }

    private void roll(ScrollEvent event) {
        bench.turnBy(Math.signum(event.getDeltaY()) * (event.isShiftDown() ? FINE : STEP));
        refresh();
        event.consume();
    }

    /** The pointer follows the mouse around the shaft; below the stops it stays at the nearer one. */
    private void point(MouseEvent event) {
        pane.requestFocus();
        double x = event.getX() - pane.getWidth() / 2;
        double y = event.getY() - pane.getHeight() / 2;
        double fromTop = Math.toDegrees(Math.atan2(x, -y));
        bench.turnTo((fromTop + KnobShape.ROTATION_DEGREES / 2) / KnobShape.ROTATION_DEGREES);
        refresh();
    }

    /** Circle, marks from stop to stop, and the pointer. */
    private static final class Face extends Pane {
        private final Circle rim = new Circle();
        private final Line pointer = new Line();
        private final Line[] marks = new Line[MARKS + 1];
        private double position;

        Face() {
            rim.getStyleClass().add("dial-rim");
            pointer.getStyleClass().add("dial-pointer");
            getChildren().add(rim);
            for (int i = 0; i <= MARKS; i++) {
                marks[i] = new Line();
                marks[i].getStyleClass().add("dial-mark");
                getChildren().add(marks[i]);
            }
            getChildren().add(pointer);
        }

        void turn(double newPosition) {
            position = newPosition;
            requestLayout();
        }

        @Override
        protected void layoutChildren() {
            double radius = Math.min(getWidth(), getHeight()) / 2 - 2;
            double centreX = getWidth() / 2;
            double centreY = getHeight() / 2;
            rim.setCenterX(centreX);
            rim.setCenterY(centreY);
            rim.setRadius(radius * 0.76);
            place(pointer, centreX, centreY, radius * 0.28, radius * 0.76, position);
            for (int i = 0; i <= MARKS; i++) {
                double inner = i % MARKS == 0 ? 0.82 : 0.88;
                place(marks[i], centreX, centreY, radius * inner, radius, (double) i / MARKS);
            }
        }

        private static void place(Line line, double x, double y, double from, double to, double position) {
            double angle = Math.toRadians(-KnobShape.ROTATION_DEGREES / 2 + KnobShape.ROTATION_DEGREES * position);
            line.setStartX(x + from * Math.sin(angle));
            line.setStartY(y - from * Math.cos(angle));
            line.setEndX(x + to * Math.sin(angle));
            line.setEndY(y - to * Math.cos(angle));
        }
    }
}
