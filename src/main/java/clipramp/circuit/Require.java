package clipramp.circuit;

/** The checks that records make in their constructors. */
final class Require {
    private Require() {}

    static void positive(String name, double value) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be above zero, is " + value);
        }
    }

    static void atLeastOne(String name, double value) {
        if (!(value >= 1) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be 1 or more, is " + value);
        }
    }

    static void notNegative(String name, double value) {
        if (!(value >= 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must not be negative, is " + value);
        }
    }

    static void finite(String name, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(name + " must be a number, is " + value);
        }
    }

    static void fraction(String name, double value) {
        if (!(value >= 0 && value <= 1)) {
            throw new IllegalArgumentException(name + " must lie in 0..1, is " + value);
        }
    }
}
