package clipramp.fit;

import clipramp.circuit.Design;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * The fit as numbers. Unknown are the unit's values and how far each setting and each line voltage that was read was off;
 * all count in standard deviations of what was known beforehand, so that 0 is the drawing and the instruments as read.
 * Observed are the readings, each in its own standard deviations, and those zeros.
 */
final class BenchProblem {
    /** Trial step of a derivative, in prior standard deviations. */
    private static final double STEP = 0.01;

    /** Farther than this a setting or a line voltage was not misread but not read, standard deviations. */
    private static final double FARTHEST_OFF = 50;

    /** Less effect than this of a whole prior deviation, in deviations of all readings together, is none. */
    private static final double LEAST_EFFECT = 0.05;

    private final Design design;
    private final Readings readings;
    private final BenchModel model;
    private final List<Unknown> unknowns;
    private final List<Observed> observed = new ArrayList<>();
    private final int readingCount;
    private final double[] deviation;
    private final double[] target;
    private final int[] active;

    BenchProblem(Design design, Readings readings) {
        this.design = design;
        this.readings = readings;
        model = new BenchModel(design);
        unknowns = Unknowns.of(design, readings);
        List<BenchLine> lines = readings.lines();
        for (int l = 0; l < lines.size(); l++) {
            for (int r = 0; r < lines.get(l).readings().size(); r++) {
                observed.add(new Observed(l, r));
            }
        }
        readingCount = observed.size();
        for (int l = 0; l < lines.size(); l++) {
            if (lines.get(l).setting().kind() != Setting.Kind.FIXED) {
                observed.add(new Observed(l, Observed.SETTING));
            }
            if (lines.get(l).lineVolts().isPresent()) {
                observed.add(new Observed(l, Observed.LINE_VOLTS));
            }
        }
        deviation = new double[readingCount];
        target = new double[readingCount];
        double[] nominal = nominalShown();
        for (int i = 0; i < readingCount; i++) {
            Reading reading = reading(i);
            // A slipped decimal point must not lend a reading ten times its weight.
            deviation[i] =
                    reading.accuracy().deviation(Math.max(reading.value(), Math.min(nominal[i], typical(reading))));
            target[i] = reading.value() / deviation[i];
        }
        active = screened();
    }

    /** The largest value of the same instrument, in the same session. */
    private double typical(Reading one) {
        return readings.lines().stream()
                .flatMap(line -> line.readings().stream())
                .filter(reading -> reading.meter() == one.meter())
                .mapToDouble(Reading::value)
                .max()
                .orElse(one.value());
    }

    private double[] nominalShown() {
        double[] all = new double[readingCount];
        TriedUnit unit = new TriedUnit(design, readings.celsius());
        fill(unit, new double[unknowns.size()]);
        int i = 0;
        for (BenchLine line : readings.lines()) {
            for (double value : model.shown(unit, line, 0, 0)) {
                all[i++] = value;
            }
        }
        return all;
    }

    private void fill(TriedUnit unit, double[] z) {
        for (int k = 0; k < unknowns.size(); k++) {
            unknowns.get(k).slot().set(unit, unknowns.get(k).at(z[k]));
        }
    }

    /** Unknowns that move some reading at all, tried a deviation to either side. */
    private int[] screened() {
        double[] z = new double[unknowns.size()];
        TriedUnit unit = new TriedUnit(design, readings.celsius());
        List<Integer> kept = new ArrayList<>();
        double[] offs = new double[observed.size()];
        for (int k = 0; k < z.length; k++) {
            z[k] = 1;
            double[] up = whitened(unit, z, offs);
            z[k] = -1;
            double[] down = whitened(unit, z, offs);
            z[k] = 0;
            double square = 0;
            for (int i = 0; i < up.length; i++) {
                square += (up[i] - down[i]) * (up[i] - down[i]) / 4;
            }
            if (Math.sqrt(square) >= LEAST_EFFECT) {
                kept.add(k);
            }
        }
        return kept.stream().mapToInt(Integer::intValue).toArray();
    }

    /** What the instruments would show, in deviations; unknowns by number, offs by number of what was observed. */
    private double[] whitened(TriedUnit unit, double[] z, double[] offs) {
        fill(unit, z);
        double[] all = new double[readingCount];
        int first = 0;
        for (int l = 0; l < readings.lines().size(); l++) {
            first = whitenedLine(unit, l, offs, first, all);
        }
        return all;
    }

    private int whitenedLine(TriedUnit unit, int l, double[] offs, int first, double[] into) {
        BenchLine line = readings.lines().get(l);
        double[] shown = model.shown(unit, line, offs(offs, l, Observed.SETTING), offs(offs, l, Observed.LINE_VOLTS));
        for (int r = 0; r < shown.length; r++) {
            into[first + r] = shown[r] / deviation[first + r];
        }
        return first + shown.length;
    }

    private double offs(double[] offs, int line, int which) {
        for (int i = readingCount; i < observed.size(); i++) {
            if (observed.get(i).line() == line && observed.get(i).reading() == which) {
                return offs[i];
            }
        }
        return 0;
    }

    List<Unknown> unknowns() {
        return unknowns;
    }

    List<Observed> observed() {
        return observed;
    }

    int readingCount() {
        return readingCount;
    }

    /** Numbers of the unknowns that are fitted. */
    int[] active() {
        return active.clone();
    }

    /** How many numbers are fitted: unknowns first, then how far settings and line voltages were off. */
    int dimension() {
        return active.length + observed.size() - readingCount;
    }

    /** The nearest point at which no value lies farther out than it may. */
    double[] within(double[] point) {
        double[] near = point.clone();
        for (int c = 0; c < near.length; c++) {
            double farthest = c < active.length ? unknowns.get(active[c]).farthest() : FARTHEST_OFF;
            near[c] = Math.max(-farthest, Math.min(farthest, near[c]));
        }
        return near;
    }

    /** One reading's value in its own deviations. */
    double target(int i) {
        return i < readingCount ? target[i] : 0;
    }

    double deviation(int i) {
        return deviation[i];
    }

    Reading reading(int i) {
        Observed which = observed.get(i);
        return readings.lines().get(which.line()).readings().get(which.reading());
    }

    BenchLine line(int i) {
        return readings.lines().get(observed.get(i).line());
    }

    /** What everything observed would show at a point, in deviations. */
    double[] value(double[] point) {
        double[] shown = whitened(new TriedUnit(design, readings.celsius()), wide(point), offsOf(point));
        double[] all = Arrays.copyOf(shown, observed.size());
        System.arraycopy(point, active.length, all, readingCount, observed.size() - readingCount);
        return all;
    }

    /** Derivatives of the same by central differences on the exact engine. */
    RealMatrix jacobian(double[] point) {
        return differences(point, STEP, offset(point, -STEP), 2 * STEP);
    }

    /**
     * The same by forward differences, half the work: half a percent off at worst, which changes the way to the minimum
     * and hardly the minimum.
     *
     * @param shown what everything shows at the point
     */
    RealMatrix roughJacobian(double[] point, double[] shown) {
        return differences(point, STEP, column -> shown, STEP);
    }

    /** What is shown with one coordinate moved. */
    private interface Offset {
        double[] shown(int column);
    }

    private Offset offset(double[] point, double step) {
        TriedUnit unit = new TriedUnit(design, readings.celsius());
        return column -> moved(unit, point, column, step);
    }

    private RealMatrix differences(double[] point, double step, Offset from, double span) {
        RealMatrix all = new Array2DRowRealMatrix(observed.size(), point.length);
        Offset to = offset(point, step);
        for (int c = 0; c < point.length; c++) {
            double[] up = to.shown(c);
            double[] down = from.shown(c);
            int first = c < active.length ? 0 : firstReading(lineOf(c));
            int end = c < active.length ? readingCount : firstReading(lineOf(c) + 1);
            for (int i = first; i < end; i++) {
                all.setEntry(i, c, (up[i] - down[i]) / span);
            }
            if (c >= active.length) {
                all.setEntry(readingCount + c - active.length, c, 1);
            }
        }
        return all;
    }

    /** Readings with one coordinate moved; of a setting's or a line voltage's, only those of its own line. */
    private double[] moved(TriedUnit unit, double[] point, int column, double step) {
        double[] there = point.clone();
        there[column] += step;
        if (column < active.length) {
            return whitened(unit, wide(there), offsOf(there));
        }
        fill(unit, wide(there));
        double[] all = new double[readingCount];
        whitenedLine(unit, lineOf(column), offsOf(there), firstReading(lineOf(column)), all);
        return all;
    }

    private int lineOf(int column) {
        return observed.get(readingCount + column - active.length).line();
    }

    private int firstReading(int line) {
        int first = 0;
        for (int before = 0; before < line; before++) {
            first += readings.lines().get(before).readings().size();
        }
        return first;
    }

    /** All unknowns of a point; those that are not fitted stay nominal. */
    double[] wide(double[] point) {
        double[] z = new double[unknowns.size()];
        for (int c = 0; c < active.length; c++) {
            z[active[c]] = point[c];
        }
        return z;
    }

    private double[] offsOf(double[] point) {
        double[] offs = new double[observed.size()];
        System.arraycopy(point, active.length, offs, readingCount, observed.size() - readingCount);
        return offs;
    }
}
