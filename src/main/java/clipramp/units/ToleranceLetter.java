package clipramp.units;

import java.util.OptionalDouble;

/** Tolerance letters of IEC 60062, symmetrical ones. */
final class ToleranceLetter {
    private ToleranceLetter() {}

    /** Tolerance as a fraction: J is 0.05. */
    static OptionalDouble fraction(String letter) {
        double percent = switch (letter) {
            case "B" -> 0.1;
            case "C" -> 0.25;
            case "D" -> 0.5;
            case "F" -> 1;
            case "G" -> 2;
            case "H" -> 3;
            case "J" -> 5;
            case "K" -> 10;
            case "M" -> 20;
            case "N" -> 30;
            default -> 0;
        };
        return percent == 0 ? OptionalDouble.empty() : OptionalDouble.of(percent / 100);
    }
}
