package clipramp.units;

import java.util.OptionalDouble;

/**
 * A value as read, with whatever was written after it.
 *
 * @param value in the SI unit (radians for angles, °C for temperatures, 0..1 for shares)
 * @param unit what it is measured in
 * @param unitWritten whether a unit or a prefix stood beside the number
 * @param minus tolerance below, as a fraction of the value, 0..1
 * @param plus tolerance above, as a fraction of the value
 * @param ratedWatts rated dissipation, W, where written
 * @param ratedVolts rated voltage, V, where written
 */
public record Quantity(
        double value,
        Unit unit,
        boolean unitWritten,
        double minus,
        double plus,
        OptionalDouble ratedWatts,
        OptionalDouble ratedVolts) {

    /** A bare value. */
    static Quantity of(double value, Unit unit, boolean unitWritten) {
        return new Quantity(value, unit, unitWritten, 0, 0, OptionalDouble.empty(), OptionalDouble.empty());
    }

    public boolean hasTolerance() {
        return minus != 0 || plus != 0;
    }
}
