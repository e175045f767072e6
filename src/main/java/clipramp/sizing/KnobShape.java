package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Ramp;
import clipramp.power.KnobMap;
import clipramp.power.LoadResult;
import java.util.Arrays;
import java.util.List;

/**
 * How straight a knob is: power or light against rotation, nominal parts and line.
 *
 * @param design the design
 * @param what what is to follow the rotation
 * @param largestDeparture farthest distance from the straight line between the two ends, as a share of full, 0..1
 * @param deadLow rotation from the low-power end over which it stays within half a per cent of full of that end, 0..1
 * @param deadHigh the same from the high-power end
 * @param steepestPerDegree greatest change for one degree of rotation, as a share of full
 * @param values shares of full at even steps of rotation from 0 to 1
 */
public record KnobShape(
        Design design,
        What what,
        double largestDeparture,
        double deadLow,
        double deadHigh,
        double steepestPerDegree,
        List<Double> values) {
    /** How far a pot turns, degrees (common practice for single-turn pots). */
    public static final double ROTATION_DEGREES = 270;

    /** One for every two degrees. */
    private static final int STEPS = 135;

    /** Share of full that nobody sees or feels: half a per cent. */
    private static final double UNNOTICED = 0.005;

    /** What a knob sets. */
    public enum What {
        /** Share of full power. */
        POWER,
        /** Share of full light of a filament lamp: the voltage's share to the power 3.4 (lamp handbooks; from memory). */
        LIGHT;

        private static final double LIGHT_EXPONENT = 3.4;

        double of(LoadResult load, double fullVolts) {
            return this == POWER ? load.fraction() : Math.pow(load.rmsVolts() / fullVolts, LIGHT_EXPONENT);
        }
    }

    /** Keeps the values as they are. */
    public KnobShape {
        values = List.copyOf(values);
    }

    /** The knob of a sound design, its power solved at every two degrees of rotation. */
    public static KnobShape of(Design design, What what) {
        Condition condition = design.nominalCondition();
        double full = condition.lineVolts() * design.line().rmsFactor();
        double[] values = new double[STEPS + 1];
        for (int i = 0; i <= STEPS; i++) {
            values[i] =
                    what.of(KnobMap.at(design, condition, (double) i / STEPS).load(), full);
        }
        return of(design, what, values);
    }

    /** A design's knob from a curve over R_E that is known already. */
    static KnobShape of(Design design, What what, PowerCurve curve) {
        Ramp ramp = design.ramp();
        double[] values = new double[STEPS + 1];
        for (int i = 0; i <= STEPS; i++) {
            values[i] = curve.at(ramp.rampOhms((double) i / STEPS));
        }
        return of(design, what, values);
    }

    private static KnobShape of(Design design, What what, double[] values) {
        double first = values[0];
        double last = values[STEPS];
        double departure = 0;
        double steepest = 0;
        for (int i = 0; i <= STEPS; i++) {
            departure = Math.max(departure, Math.abs(values[i] - first - (last - first) * i / STEPS));
            steepest = i == 0 ? 0 : Math.max(steepest, Math.abs(values[i] - values[i - 1]));
        }
        double fromStart = dead(values);
        double[] turned = values.clone();
        for (int i = 0; i <= STEPS; i++) {
            turned[i] = values[STEPS - i];
        }
        double fromEnd = dead(turned);
        boolean rises = last >= first;
        return new KnobShape(
                design,
                what,
                departure,
                rises ? fromStart : fromEnd,
                rises ? fromEnd : fromStart,
                steepest * STEPS / ROTATION_DEGREES,
                Arrays.stream(values).boxed().toList());
    }

    private static double dead(double[] values) {
        int moves = (int) Arrays.stream(values)
                .takeWhile(v -> Math.abs(v - values[0]) <= UNNOTICED)
                .count();
        return (double) (moves - 1) / STEPS;
    }
}
