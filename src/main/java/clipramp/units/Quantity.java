package clipramp.units;

import java.util.OptionalDouble;

/**
 * A value as read, with whatever was written after it.
 *
 * @param value in the SI unit (radians for angles, °C for temperatures, 0..1 for shares)
 * @param unit what it is measured in
 * @param minus tolerance below, as a fraction of the value, 0..1
 * @param plus tolerance above, as a fraction of the value, 0..10
 * @param ratedWatts rated dissipation, W, where written
 * @param ratedVolts rated voltage, V, where written
 */
public record Quantity(
        double value, Unit unit, double minus, double plus, OptionalDouble ratedWatts, OptionalDouble ratedVolts) {

    /** Whether it may lie off either way. */
    public boolean hasTolerance() {
        return minus != 0 || plus != 0;
    }
}
