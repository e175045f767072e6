package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.LineWave;
import clipramp.engine.LoadCurrent;
import java.util.Optional;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Current of a resistor behind a thyristor and a bridge: i = max(0, (|v| - D)/R) from the firing angle until it first
 * reaches zero, with D = V_T0 + n_b V_F and R = load + r_T + n_b slope (DEVELOPERS.md, Power).
 *
 * <p>A sinusoidal line is integrated in closed form; a line with harmonics by Gauss-Legendre quadrature on panels short
 * against its highest order, between limits found to 1e-13 rad.
 */
final class ResistorCurrent {
    private static final double LIMIT_RAD = 1e-13;
    private static final int TRIALS = 200;

    private final Design design;
    private final LineWave line;
    private final double lineVolts;
    private final double dropVolts;
    private final double loadOhms;
    private final double pathOhms;

    ResistorCurrent(Design design, Condition condition) {
        this.design = design;
        this.line = new LineWave(design.line(), condition);
        this.lineVolts = condition.lineVolts();
        this.loadOhms = design.load().resistanceOhms();
        LoadCurrent load = new LoadCurrent(design, condition);
        this.dropVolts = load.dropVolts();
        this.pathOhms = load.loopOhms();
    }

    /** What is over for the load's path at an angle counted from the half cycle's own zero of the fundamental, V. */
    private double drivingVolts(boolean positive, double rad) {
        double volts = positive ? line.voltsAt(rad) : -line.voltsAt(rad + Math.PI);
        return volts - dropVolts;
    }

    /** Voltage across the load while the thyristor is on, V; 0 where the line does not reach over the drops. */
    double loadVoltsAt(boolean positive, double rad) {
        return Math.max(0, drivingVolts(positive, rad)) * loadOhms / pathOhms;
    }

    /**
     * One half cycle fired at an angle.
     *
     * @param positive which half cycle of the line
     * @param firingRad firing angle from the fundamental's zero that begins this half cycle, rad
     */
    HalfCycleCurrent firedAt(boolean positive, double firingRad) {
        return line.isPureSine() ? closedForm(firingRad) : byQuadrature(positive, firingRad);
    }

    /**
     * The stretch of current in one half cycle fired at an angle.
     *
     * @param positive which half cycle of the line
     * @param firingRad firing angle from the fundamental's zero that begins this half cycle, rad
     * @param zeroRad that zero on the line's angle, rad
     */
    Optional<CurrentSpan> spanFiredAt(boolean positive, double firingRad, double zeroRad) {
        return limitsRad(positive, firingRad)
                .map(limits -> new CurrentSpan(
                        zeroRad + limits.from(),
                        zeroRad + limits.to(),
                        positive ? 1 : -1,
                        0,
                        rad -> Math.max(0, drivingVolts(positive, rad - zeroRad)) / pathOhms,
                        rad -> loadVoltsAt(positive, rad - zeroRad)));
    }

    private record Limits(double from, double to) {}

    private Optional<Limits> limitsRad(boolean positive, double firingRad) {
        return line.isPureSine() ? closedLimits(firingRad) : searchedLimits(positive, firingRad);
    }

    private Optional<Limits> closedLimits(double firingRad) {
        double crest = Math.sqrt(2) * lineVolts;
        if (crest <= dropVolts) {
            return Optional.empty();
        }
        double edge = Math.asin(dropVolts / crest);
        double from = Math.max(firingRad, edge);
        double to = Math.PI - edge;
        return from >= to ? Optional.empty() : Optional.of(new Limits(from, to));
    }

    /**
     * Integral over angle of (crest sin - drop) squared while the current flows, V² rad; allocates nothing.
     *
     * @param crest crest of the line, V
     * @param drop drops in the load's path, V
     * @param firingRad firing angle, rad
     */
    static double sineSquare(double crest, double drop, double firingRad) {
        if (crest <= drop) {
            return 0;
        }
        double edge = Math.asin(drop / crest);
        double from = Math.max(firingRad, edge);
        double to = Math.PI - edge;
        return from >= to ? 0 : sineSquare(crest, drop, from, to);
    }

    private static double sineSquare(double crest, double drop, double from, double to) {
        return Math.max(
                0,
                crest * crest * ((to - from) / 2 - (Math.sin(2 * to) - Math.sin(2 * from)) / 4)
                        + 2 * crest * drop * (Math.cos(to) - Math.cos(from))
                        + drop * drop * (to - from));
    }

    private HalfCycleCurrent closedForm(double firingRad) {
        return closedLimits(firingRad)
                .map(limits -> closedForm(limits.from(), limits.to()))
                .orElse(HalfCycleCurrent.NONE);
    }

    private HalfCycleCurrent closedForm(double from, double to) {
        double crest = Math.sqrt(2) * lineVolts;
        double charge = crest * (Math.cos(from) - Math.cos(to)) - dropVolts * (to - from);
        double peak = crest * Math.sin(Math.max(from, Math.PI / 2)) - dropVolts;
        return new HalfCycleCurrent(
                Math.max(0, charge / pathOhms),
                sineSquare(crest, dropVolts, from, to) / (pathOhms * pathOhms),
                peak / pathOhms,
                from,
                to);
    }

    private HalfCycleCurrent byQuadrature(boolean positive, double firingRad) {
        return searchedLimits(positive, firingRad)
                .map(limits -> between(rad -> drivingVolts(positive, rad), limits.from(), limits.to()))
                .orElse(HalfCycleCurrent.NONE);
    }

    private Optional<Limits> searchedLimits(boolean positive, double firingRad) {
        UnivariateFunction driving = rad -> drivingVolts(positive, rad);
        double step = panelRad();
        double latest = 1.5 * Math.PI;
        double from = firingRad;
        if (driving.value(from) <= 0) {
            double open = firingRad;
            while (open < Math.PI && driving.value(open) <= 0) {
                open += step;
            }
            if (open >= Math.PI) {
                return Optional.empty();
            }
            from = new BrentSolver(LIMIT_RAD).solve(TRIALS, driving, open - step, open);
        }
        double shut = from + step;
        while (shut < latest && driving.value(shut) > 0) {
            shut += step;
        }
        double lower = Math.max(from, shut - step);
        double to = driving.value(lower) > 0 ? new BrentSolver(LIMIT_RAD).solve(TRIALS, driving, lower, shut) : lower;
        return Optional.of(new Limits(from, to));
    }

    private HalfCycleCurrent between(UnivariateFunction driving, double from, double to) {
        Sums sums = new Sums(driving, from);
        SpanQuadrature.visit(from, to, 2 * SpanTotals.highestOrder(design.line()), sums);
        double highest = Math.max(driving.value(from), crestNear(driving, sums.peakRad, 2 * panelRad(), from, to));
        return new HalfCycleCurrent(
                sums.charge / pathOhms,
                sums.square / (pathOhms * pathOhms),
                Math.max(sums.peak, highest) / pathOhms,
                from,
                to);
    }

    /** Integrals of the driving voltage and of its square, and the largest of it at any node. */
    private static final class Sums implements SpanQuadrature.Visitor {
        private final UnivariateFunction driving;
        private double charge;
        private double square;
        private double peak;
        private double peakRad;

        Sums(UnivariateFunction driving, double fromRad) {
            this.driving = driving;
            this.peakRad = fromRad;
        }

        @Override
        public void node(double rad, double weightRad) {
            double volts = driving.value(rad);
            charge += weightRad * volts;
            square += weightRad * volts * volts;
            if (volts > peak) {
                peak = volts;
                peakRad = rad;
            }
        }
    }

    private static double crestNear(UnivariateFunction driving, double rad, double width, double from, double to) {
        double left = Math.max(from, rad - width);
        double right = Math.min(to, rad + width);
        return left < right
                ? new BrentOptimizer(1e-10, 1e-12)
                        .optimize(
                                new UnivariateObjectiveFunction(driving),
                                GoalType.MAXIMIZE,
                                new SearchInterval(left, right),
                                new MaxEval(TRIALS))
                        .getValue()
                : driving.value(rad);
    }

    /** A step within which the driving voltage has one zero or one crest at most: half a radian of the highest order. */
    private double panelRad() {
        return 0.5 / SpanTotals.highestOrder(design.line());
    }
}
