package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Optional;

/**
 * The nearest highest setting that a stage can give where the one that is wanted is out of its reach: what the least R_E
 * gives that neither feeds the valley current nor arrives before the supply is clipped, at its worst line and
 * temperature.
 *
 * @param wanted what was wanted, with that setting in place of the highest
 * @param why what takes the rest, a sentence
 */
record NearestSetting(Wanted wanted, String why) {
    /** The slowest unit is set to some three quarters of the nominal R_E, and must not feed the valley current either. */
    private static final double RESERVE = 1.4;

    private static final double CLIP_RESERVE = 1.02;

    /** Rounded to what people ask for, and under what rounding of values may cost. */
    private static final double SHARE = 0.99;

    private static final double LESS = 0.94;

    /** The setting for a design; empty where what is wanted lies in reach, or no angle or share was wanted. */
    static Optional<NearestSetting> of(Design design, Reach reach) {
        Optional<Goal> highest = design.wanted().highest();
        if (highest.isEmpty() || highest.get().measure() == Measure.ANGLE) {
            return Optional.empty();
        }
        Goal goal = highest.get();
        double ohms = Math.max(reach.valley() * RESERVE, reach.clip() * CLIP_RESERVE);
        double most = Double.POSITIVE_INFINITY;
        double atZero = Double.POSITIVE_INFINITY;
        for (Condition at : Reach.conditions(design)) {
            Solution solution = Firing.solve(design, at, ohms);
            double rad = solution.shown().firingRad().orElse(Reach.firstRad(solution));
            if (Double.isNaN(rad)) {
                return Optional.empty();
            }
            most = Math.min(most, value(goal.measure(), LoadPower.atFiringAngle(design, at, rad)));
            atZero = Math.min(atZero, value(goal.measure(), LoadPower.atFiringAngle(design, at, 0)));
        }
        double there = rounded(most * SHARE);
        if (!(there > 0) || there >= goal.from()) {
            return Optional.empty();
        }
        Goal nearer = new Goal(goal.measure(), there, Math.max(there, goal.to()), goal.position());
        if (!goal.isBand()) {
            nearer = new Goal(goal.measure(), there, there, goal.position());
        }
        return Optional.of(new NearestSetting(
                new Wanted(design.wanted().lowest(), Optional.of(nearer)), why(design, goal, atZero, there)));
    }

    /** The same with a little less asked of the highest setting. */
    NearestSetting less() {
        Goal goal = wanted.highest().orElseThrow();
        double from = rounded(goal.from() * LESS);
        double to = goal.isBand() ? goal.to() : from;
        return new NearestSetting(
                new Wanted(wanted.lowest(), Optional.of(new Goal(goal.measure(), from, to, goal.position()))), why);
    }

    private static double value(Measure measure, LoadResult load) {
        return switch (measure) {
            case FRACTION, ANGLE -> load.fraction();
            case WATTS -> load.watts();
            case VOLTS -> load.rmsVolts();
        };
    }

    /** Down to two figures. */
    private static double rounded(double value) {
        double unit = Math.pow(10, Math.floor(Math.log10(value)) - 1);
        return Math.floor(value / unit) * unit;
    }

    private static String why(Design design, Goal goal, double atZero, double there) {
        String drops = "Fired at 0° the load would get " + text(goal.measure(), atZero)
                + " at its worst line and temperature; "
                + (design.stage().isFullWave()
                        ? "the drops of thyristor and bridge take the rest"
                        : "a half-wave stage passes every second half cycle only");
        return atZero < goal.from()
                ? drops + ", whatever the firing circuit does."
                : "The supply is clipped too late, or the valley current holds R_E too large, to fire any earlier than for "
                        + text(goal.measure(), there) + ".";
    }

    static String text(Measure measure, double value) {
        return switch (measure) {
            case FRACTION, ANGLE -> QuantityText.format(value, Unit.FRACTION, 3);
            case WATTS -> QuantityText.format(value, Unit.WATT, 3);
            case VOLTS -> QuantityText.format(value, Unit.VOLT, 3);
        };
    }
}
