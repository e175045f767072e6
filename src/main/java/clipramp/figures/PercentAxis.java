package clipramp.figures;

import org.jfree.chart.axis.NumberAxis;

/** An axis from 0 to 100 %, a little beyond at both ends so that nothing is cut off there. */
final class PercentAxis {
    static final double LEAST = -2;
    static final double MOST = 102;

    private PercentAxis() {}

    /**
     * @param room its length in the figure, in units of the figure
     * @param style whose zoom says how many marks find room
     */
    static NumberAxis of(double room, Style style) {
        NumberAxis axis = new NumberAxis();
        axis.setRange(LEAST, MOST);
        double step = room / style.zoom() > 260 ? 10 : room / style.zoom() > 120 ? 25 : 50;
        axis.setTickUnit(Plot.ticks(step, Numerals::plain));
        return axis;
    }
}
