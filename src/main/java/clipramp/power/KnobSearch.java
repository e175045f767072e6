package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Ramp;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.Comparator;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The knob backwards: which R_E, and which position, gives a firing angle, a power or a voltage. Roots of the exact
 * engine over the logarithm of R_E between 1 ohm and 1 Gohm; more R_E fires later and gives less. R_E comes out to 1e-10 of
 * it, which moves the angle by less than 1e-8 of a degree. Where the target is jumped over (firing on one side, silent on
 * the other) there is no root, and the answer is none (DEVELOPERS.md, Power).
 */
public final class KnobSearch {
    private static final double LEAST_OHMS = 1;
    private static final double MOST_OHMS = 1e9;
    private static final double STEP = Math.log(1.6);
    private static final double LOG_ACCURACY = 1e-10;

    /** Share of pi, or of full power, from which a step across the root is a jump. */
    private static final double LEAST_JUMP = 1e-4;

    private static final double MOST_OFF_RAD = Math.toRadians(3);
    private static final int TRIALS = 80;

    private KnobSearch() {}

    /**
     * The whole R_E that fires at an angle.
     *
     * @param design the design
     * @param condition line and temperature
     * @param firingRad wanted firing angle, rad, 0..pi
     * @return ohm; empty where no R_E fires there
     */
    public static OptionalDouble rampOhmsForAngle(Design design, Condition condition, double firingRad) {
        return search(guessOhms(design, condition, firingRad), lateness(design, condition, firingRad));
    }

    /** By how much of pi an R_E in ohms fires later than wanted. */
    private static UnivariateFunction lateness(Design design, Condition condition, double firingRad) {
        return ohms -> (firstFiringRad(design, Firing.solve(design, condition, ohms)) - firingRad) / Math.PI;
    }

    /**
     * The whole R_E that fires at an angle, or the nearer side of the jump where the angle is jumped over: the charge that
     * one half cycle leaves to the next changes suddenly where it holds one pulse more.
     *
     * @param design the design
     * @param condition line and temperature
     * @param firingRad wanted firing angle, rad, 0..pi
     * @return ohm; empty where no R_E fires within three degrees of it
     */
    public static OptionalDouble nearestRampOhmsForAngle(Design design, Condition condition, double firingRad) {
        UnivariateFunction over = lateness(design, condition, firingRad);
        OptionalDouble root = root(guessOhms(design, condition, firingRad), over);
        if (root.isEmpty()) {
            return root;
        }
        double below = Math.exp(root.getAsDouble() - 2 * LOG_ACCURACY);
        double above = Math.exp(root.getAsDouble() + 2 * LOG_ACCURACY);
        double offBelow = Math.abs(over.value(below));
        double offAbove = Math.abs(over.value(above));
        if (Math.min(offBelow, offAbove) * Math.PI > MOST_OFF_RAD) {
            return OptionalDouble.empty();
        }
        boolean jump = Math.abs(over.value(above) - over.value(below)) > LEAST_JUMP;
        return OptionalDouble.of(!jump ? Math.exp(root.getAsDouble()) : offBelow <= offAbove ? below : above);
    }

    /**
     * The whole R_E that gives a load power.
     *
     * @param design the design
     * @param condition line and temperature
     * @param watts wanted load power, W
     * @return ohm; empty where no R_E gives it
     */
    public static OptionalDouble rampOhmsForWatts(Design design, Condition condition, double watts) {
        return rampOhmsFor(design, condition, LoadResult::watts, watts, LoadPower.fullWatts(design, condition));
    }

    /** The whole R_E, ohm, that gives a load rms voltage in volts; empty where none does. */
    public static OptionalDouble rampOhmsForVolts(Design design, Condition condition, double volts) {
        return rampOhmsFor(design, condition, LoadResult::rmsVolts, volts, condition.lineVolts());
    }

    private static OptionalDouble rampOhmsFor(
            Design design, Condition condition, ToDoubleFunction<LoadResult> measure, double wanted, double full) {
        OptionalDouble angle = firingRadFor(design, condition, measure, wanted);
        if (angle.isEmpty()) {
            return OptionalDouble.empty();
        }
        return search(guessOhms(design, condition, angle.getAsDouble()), ohms -> {
            Solution solution = Firing.solve(design, condition, ohms);
            return (wanted - measure.applyAsDouble(LoadPower.of(design, condition, solution))) / full;
        });
    }

    /**
     * The firing angle that gives a load power when both half cycles fire at it, to 1e-13 rad.
     *
     * @param design the design
     * @param condition line and temperature
     * @param watts wanted load power, W
     * @return rad; empty where no angle gives it
     */
    public static OptionalDouble firingRadForWatts(Design design, Condition condition, double watts) {
        return firingRadFor(design, condition, LoadResult::watts, watts);
    }

    /** The firing angle, rad, that gives a load rms voltage in volts when both half cycles fire at it; empty for none. */
    public static OptionalDouble firingRadForVolts(Design design, Condition condition, double volts) {
        return firingRadFor(design, condition, LoadResult::rmsVolts, volts);
    }

    private static OptionalDouble firingRadFor(
            Design design, Condition condition, ToDoubleFunction<LoadResult> measure, double wanted) {
        UnivariateFunction lacking =
                rad -> wanted - measure.applyAsDouble(LoadPower.atFiringAngle(design, condition, rad));
        if (!(wanted > 0) || lacking.value(0) > 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(new BrentSolver(1e-13).solve(TRIALS, lacking, 0, Math.PI));
    }

    /**
     * The knob position that gives a whole R_E, nominal parts.
     *
     * @param ramp the ramp
     * @param rampOhms R_E, ohm
     * @return 0..1; empty for a fixed ramp or an R_E out of the pot's reach
     */
    public static OptionalDouble position(Ramp ramp, double rampOhms) {
        if (ramp.pot().isEmpty()) {
            return OptionalDouble.empty();
        }
        UnivariateFunction over = position -> ramp.rampOhms(position) - rampOhms;
        double atStart = over.value(0);
        double atEnd = over.value(1);
        double near = 1e-9 * rampOhms;
        if (Math.abs(atStart) <= near) {
            return OptionalDouble.of(0);
        }
        if (Math.abs(atEnd) <= near) {
            return OptionalDouble.of(1);
        }
        return atStart * atEnd > 0
                ? OptionalDouble.empty()
                : OptionalDouble.of(new BrentSolver(1e-13).solve(TRIALS, over, 0, 1));
    }

    /**
     * The angle of the first pulse that latches the thyristor, not folded to the load's half cycle, so that it grows
     * with R_E through the load's zero; a whole period where the thyristor stays off.
     */
    private static double firstFiringRad(Design design, Solution solution) {
        return solution.shown().pulses().stream()
                .filter(Pulse::latches)
                .min(Comparator.comparingDouble(Pulse::startSeconds))
                .map(pulse -> ActingPulses.madeRad(design, solution, pulse))
                .orElse(2 * Math.PI);
    }

    /** delay = R_E C_E ln(1/(1-eta)) turned round, with a standoff ratio of 0.63: near enough to start from. */
    private static double guessOhms(Design design, Condition condition, double firingRad) {
        double seconds = Math.max(firingRad, 0.05) / condition.omega();
        return seconds / design.ramp().capacitor().value();
    }

    private static OptionalDouble search(double guessOhms, UnivariateFunction over) {
        OptionalDouble root = root(guessOhms, over);
        return root.isEmpty() ? root : confirmed(root.getAsDouble(), over);
    }

    /** The logarithm of the R_E at which a function that grows with it changes its sign, by a root or by a jump. */
    private static OptionalDouble root(double guessOhms, UnivariateFunction over) {
        double low = Math.log(Math.min(MOST_OHMS, Math.max(LEAST_OHMS, guessOhms)));
        double high = low;
        double atLow = over.value(Math.exp(low));
        double atHigh = atLow;
        while (atLow > 0 && low > Math.log(LEAST_OHMS)) {
            high = low;
            atHigh = atLow;
            low -= STEP;
            atLow = over.value(Math.exp(low));
        }
        while (atHigh < 0 && high < Math.log(MOST_OHMS)) {
            low = high;
            atLow = atHigh;
            high += STEP;
            atHigh = over.value(Math.exp(high));
        }
        if (atLow > 0 || atHigh < 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(
                new BrentSolver(LOG_ACCURACY).solve(TRIALS, log -> over.value(Math.exp(log)), low, high));
    }

    /** A jump through zero (from firing to silent) is no root: the thyristor fires on one side of it only. */
    private static OptionalDouble confirmed(double logOhms, UnivariateFunction over) {
        double below = over.value(Math.exp(logOhms - 2 * LOG_ACCURACY));
        double above = over.value(Math.exp(logOhms + 2 * LOG_ACCURACY));
        return Math.abs(above - below) > LEAST_JUMP ? OptionalDouble.empty() : OptionalDouble.of(Math.exp(logOhms));
    }
}
