package clipramp.circuit;

import java.util.OptionalDouble;

/**
 * A resistor or capacitor as it is bought: a value with its tolerance and, where stated, its ratings.
 *
 * @param value nominal value in ohms or farads, 0 or more
 * @param tolerance how far a bought one may be off
 * @param ratedWatts rated dissipation in watts, if stated
 * @param ratedVolts rated voltage in volts, if stated
 */
public record Part(double value, Tolerance tolerance, OptionalDouble ratedWatts, OptionalDouble ratedVolts) {
    /** @throws IllegalArgumentException where the value is negative or no finite number */
    public Part {
        Require.notNegative("part value", value);
    }

    /** An exact, unrated part; its value in ohms or farads. */
    public static Part of(double value) {
        return new Part(value, Tolerance.NONE, OptionalDouble.empty(), OptionalDouble.empty());
    }

    /** Lowest value within tolerance. */
    public double lowest() {
        return value * (1 - tolerance.minus());
    }

    /** Highest value within tolerance. */
    public double highest() {
        return value * (1 + tolerance.plus());
    }

    /** The same part with another nominal value. */
    public Part withValue(double newValue) {
        return new Part(newValue, tolerance, ratedWatts, ratedVolts);
    }
}
