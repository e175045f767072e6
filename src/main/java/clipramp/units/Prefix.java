package clipramp.units;

import java.util.Optional;

/** The prefixes that the grammar knows, case-sensitive. */
enum Prefix {
    PICO("p", -12),
    NANO("n", -9),
    MICRO("µ", -6),
    MILLI("m", -3),
    NONE("", 0),
    KILO("k", 3),
    MEGA("M", 6),
    GIGA("G", 9);

    private final String symbol;
    private final int exponent;

    Prefix(String symbol, int exponent) {
        this.symbol = symbol;
        this.exponent = exponent;
    }

    String symbol() {
        return symbol;
    }

    /** Symbol in ASCII: u for micro. */
    String ascii() {
        return this == MICRO ? "u" : symbol;
    }

    int exponent() {
        return exponent;
    }

    /** The prefix that leaves one to three digits before the dot of a value whose first digit counts 10^power. */
    static Prefix engineering(int power) {
        Prefix greatest = PICO;
        for (Prefix prefix : values()) {
            greatest = prefix.exponent <= power ? prefix : greatest;
        }
        return greatest;
    }

    /** The prefix of a symbol in either spelling; K counts as kilo only where the unit is the ohm. */
    static Optional<Prefix> of(String text, Unit unit) {
        if (text.equals("K")) {
            return unit == Unit.OHM ? Optional.of(KILO) : Optional.empty();
        }
        for (Prefix prefix : values()) {
            if (prefix.symbol.equals(text) || prefix.ascii().equals(text)) {
                return Optional.of(prefix);
            }
        }
        return Optional.empty();
    }

    /** The prefix that differs only in case, which is how milli and mega are mistaken for each other. */
    Optional<Prefix> otherCase() {
        return switch (this) {
            case MILLI -> Optional.of(MEGA);
            case MEGA -> Optional.of(MILLI);
            default -> Optional.empty();
        };
    }
}
