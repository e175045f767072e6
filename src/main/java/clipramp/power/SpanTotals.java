package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import java.util.List;

/** Sums up the stretches of a load's current into what load and thyristor get. */
final class SpanTotals {
    private final Design design;
    private final Condition condition;
    private final LoadPeriod period;
    private final int highestOrder;
    private final double[] halfSquare;
    private final Duty forward = new Duty();
    private final Duty backward = new Duty();
    private double charge;
    private double square;
    private double squareVolts;
    private double peak;
    private double conduction;

    /** Sums over one direction of the line's current. */
    private static final class Duty {
        private double charge;
        private double square;

        CurrentSums.Polarity sums() {
            return new CurrentSums.Polarity(charge, square);
        }
    }

    private SpanTotals(Design design, Condition condition, LoadPeriod period) {
        this.design = design;
        this.condition = condition;
        this.period = period;
        halfSquare = new double[period.halfCycles()];
        highestOrder = highestOrder(design.line());
        for (CurrentSpan span : period.spans()) {
            add(span);
        }
    }

    /** Highest order of the line's harmonics; 1 without any. */
    static int highestOrder(Line line) {
        return line.harmonics().stream().mapToInt(Line.Harmonic::order).max().orElse(1);
    }

    /**
     * What load and thyristor get.
     *
     * @param halves how many of the solution's half cycles differ
     * @param slots which of them each half cycle of the load belongs to
     */
    static LoadResult of(
            Design design, Condition condition, LoadPeriod period, int halves, List<ActingPulses.Slot> slots) {
        return new SpanTotals(design, condition, period).result(halves, slots);
    }

    private void add(CurrentSpan span) {
        double from = span.fromRad();
        while (from < span.toRad()) {
            int half = Math.min(halfSquare.length - 1, (int) Math.floor(from / Math.PI + 1e-12));
            double to = Math.min(span.toRad(), (half + 1) * Math.PI);
            if (!(to > from)) {
                to = span.toRad();
            }
            addWithin(span.between(from, to), half);
            from = to;
        }
        conduction += span.toRad() - span.fromRad();
    }

    private void addWithin(CurrentSpan span, int half) {
        Duty duty = span.direction() >= 0 ? forward : backward;
        boolean thyristor = span.throughThyristor();
        SpanQuadrature.visit(span, SpanQuadrature.productOrder(highestOrder), (rad, weight) -> {
            double amps = span.amps().applyAsDouble(rad);
            double volts = span.loadVolts().applyAsDouble(rad);
            charge += weight * amps;
            square += weight * amps * amps;
            squareVolts += weight * volts * volts;
            halfSquare[half] += weight * amps * amps;
            if (thyristor) {
                duty.charge += weight * amps;
                duty.square += weight * amps * amps;
            }
        });
        peak = Math.max(peak, SpanPeak.of(span, highestOrder));
    }

    private LoadResult result(int halves, List<ActingPulses.Slot> slots) {
        CurrentSums sums = new CurrentSums(charge, square, peak, forward.sums(), backward.sums());
        double halfCyclesThatMayConduct = period.halfCycles() * (design.stage().isFullWave() ? 1 : 0.5);
        return sums.result(
                design,
                condition,
                period,
                Math.sqrt(squareVolts / period.spanRad()),
                conduction / halfCyclesThatMayConduct,
                halfWatts(halves, slots));
    }

    private List<Double> halfWatts(int halves, List<ActingPulses.Slot> slots) {
        double[] squares = new double[halves];
        int[] counts = new int[halves];
        for (int half = 0; half < halfSquare.length; half++) {
            int index = slots.get(half % slots.size()).index();
            squares[index] += halfSquare[half];
            counts[index]++;
        }
        return CurrentSums.halfWatts(squares, counts, design.load().resistanceOhms());
    }
}
