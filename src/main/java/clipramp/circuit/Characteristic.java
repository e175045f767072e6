package clipramp.circuit;

import java.util.OptionalDouble;

/**
 * A data-sheet figure: any of minimum, typical and maximum; at least one of them.
 *
 * @param min least value of any device, if the sheet says; in the unit of the figure, which its holder's name gives
 * @param typ typical value, if the sheet says
 * @param max greatest value of any device, if the sheet says
 */
public record Characteristic(OptionalDouble min, OptionalDouble typ, OptionalDouble max) {
    /** @throws IllegalArgumentException where no figure is given, or they are not in the order min, typ, max */
    public Characteristic {
        if (min.isEmpty() && typ.isEmpty() && max.isEmpty()) {
            throw new IllegalArgumentException("a characteristic needs at least one of min, typ, max");
        }
        double low = min.orElse(Double.NEGATIVE_INFINITY);
        double high = max.orElse(Double.POSITIVE_INFINITY);
        double middle = typ.orElse(low);
        if (low > high || middle < low || middle > high) {
            throw new IllegalArgumentException("min, typ, max out of order: " + min + ", " + typ + ", " + max);
        }
    }

    /** One figure without a spread. */
    public static Characteristic exactly(double value) {
        return new Characteristic(OptionalDouble.empty(), OptionalDouble.of(value), OptionalDouble.empty());
    }

    /**
     * All three figures.
     *
     * @throws IllegalArgumentException where they do not rise
     */
    public static Characteristic of(double min, double typ, double max) {
        return new Characteristic(OptionalDouble.of(min), OptionalDouble.of(typ), OptionalDouble.of(max));
    }

    /** Typical; else the middle of minimum and maximum; else whichever one there is. */
    public double nominal() {
        if (typ.isPresent()) {
            return typ.getAsDouble();
        }
        if (min.isPresent() && max.isPresent()) {
            return (min.getAsDouble() + max.getAsDouble()) / 2;
        }
        return min.orElseGet(max::getAsDouble);
    }

    /** Minimum where stated, else nominal. */
    public double lowest() {
        return min.orElse(nominal());
    }

    /** Maximum where stated, else nominal. */
    public double highest() {
        return max.orElse(nominal());
    }
}
