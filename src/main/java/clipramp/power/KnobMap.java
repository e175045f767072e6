package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** From the shaft to the load: knob positions, what fires there, what the load gets. */
public final class KnobMap {
    private KnobMap() {}

    /**
     * Operating points at evenly spaced knob positions from 0 (fully anticlockwise) to 1; one, without a position, for a
     * fixed ramp.
     *
     * @param design the design
     * @param condition line and temperature
     * @param positions how many, 2 or more
     * @throws IllegalArgumentException for fewer
     * @throws clipramp.circuit.RefusedCircuit as {@link Firing}
     */
    public static List<OperatingPoint> of(Design design, Condition condition, int positions) {
        if (positions < 2) {
            throw new IllegalArgumentException("a knob map needs 2 positions or more, not " + positions);
        }
        if (design.ramp().pot().isEmpty()) {
            return List.of(fixed(design, condition));
        }
        List<OperatingPoint> points = new ArrayList<>();
        for (int i = 0; i < positions; i++) {
            points.add(at(design, condition, (double) i / (positions - 1)));
        }
        return points;
    }

    /**
     * One operating point.
     *
     * @param design the design
     * @param condition line and temperature
     * @param position knob position, 0 fully anticlockwise .. 1 fully clockwise; ignored for a fixed ramp
     * @throws IllegalArgumentException for a position outside 0..1 of a ramp with a pot
     * @throws clipramp.circuit.RefusedCircuit as {@link Firing}
     */
    public static OperatingPoint at(Design design, Condition condition, double position) {
        return design.ramp().pot().isEmpty()
                ? fixed(design, condition)
                : point(
                        design,
                        condition,
                        OptionalDouble.of(position),
                        design.ramp().rampOhms(position));
    }

    /**
     * The operating point of a whole R_E, with the knob position that gives it, if one does.
     *
     * @param design the design
     * @param condition line and temperature
     * @param rampOhms R_E, ohm, above 0
     * @throws clipramp.circuit.RefusedCircuit as {@link Firing}
     */
    public static OperatingPoint atRampOhms(Design design, Condition condition, double rampOhms) {
        return point(design, condition, KnobSearch.position(design.ramp(), rampOhms), rampOhms);
    }

    private static OperatingPoint fixed(Design design, Condition condition) {
        return point(design, condition, OptionalDouble.empty(), design.ramp().rampOhms(0));
    }

    private static OperatingPoint point(Design design, Condition condition, OptionalDouble position, double rampOhms) {
        Solution solution = Firing.solve(design, condition, rampOhms);
        return new OperatingPoint(position, solution, LoadPower.of(design, condition, solution));
    }
}
