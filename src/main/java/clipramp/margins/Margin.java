package clipramp.margins;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One demand held against what the circuit offers, at the worst of the judged conditions.
 *
 * @param kind which margin, with its meaning, source and remedy
 * @param demand what is asked (or the ceiling), in {@code unit}; NaN where a datum is missing
 * @param offered what there is, in {@code unit}; NaN where a datum is missing
 * @param unit SI unit symbol; deg for angles, empty for shares and counts
 * @param sense which side is good
 * @param ratio offered over demand for at-least, demand over offered for at-most; empty for a zero divisor or a
 *     missing datum
 * @param holdsFrom ratio from which it holds; below it and from 1 on it is tight
 * @param condition where it is worst, such as "low line, 0 °C"
 * @param verdict the word
 * @param formula the formula with the numbers in
 * @param source where demand and formula come from
 * @param remedy what to change, in which direction
 * @param parts design keys that move it, such as ramp.capacitor
 */
public record Margin(
        MarginKind kind,
        double demand,
        double offered,
        String unit,
        Sense sense,
        OptionalDouble ratio,
        double holdsFrom,
        String condition,
        Verdict verdict,
        String formula,
        String source,
        String remedy,
        List<String> parts) {
    /** Which side of the demand is good. */
    public enum Sense {
        /** What there is must reach what is asked. */
        AT_LEAST("at-least"),
        /** What there is must stay at or under the ceiling. */
        AT_MOST("at-most");

        private final String word;

        Sense(String word) {
            this.word = word;
        }

        /** The word that answers give. */
        public String word() {
            return word;
        }
    }

    /** Keeps a copy of the parts. */
    public Margin {
        parts = List.copyOf(parts);
    }

    /** The kind's id, such as gate-peak-current. */
    public String id() {
        return kind.id();
    }

    /** The name that people read. */
    public String name() {
        return kind.title();
    }
}
