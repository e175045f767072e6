package clipramp.record;

import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Arrays;
import java.util.OptionalDouble;

/** Figures as the record prints them: four digits at most, what is missing as a dash. */
final class Shown {
    static final String NOTHING = "–";
    private static final int DIGITS = 4;
    private static final double NEGLIGIBLE = 0.001;

    private Shown() {}

    static String quantity(double value, Unit unit) {
        return Double.isNaN(value)
                ? NOTHING
                : QuantityText.format(value, unit, DIGITS).replace("-", "−");
    }

    static String quantity(OptionalDouble value, Unit unit) {
        return value.isPresent() ? quantity(value.getAsDouble(), unit) : NOTHING;
    }

    static String number(double value, int digits) {
        return Double.isNaN(value)
                ? NOTHING
                : QuantityText.number(value, digits).replace("-", "−");
    }

    /** With three digits, for what is judged at a glance. */
    static String brief(double value, Unit unit) {
        return Double.isNaN(value)
                ? NOTHING
                : QuantityText.format(value, unit, 3).replace("-", "−");
    }

    /** How much of a limit is used; what is next to nothing is said so. */
    static String share(double share) {
        return share < NEGLIGIBLE ? "< " + brief(NEGLIGIBLE, Unit.FRACTION) : brief(share, Unit.FRACTION);
    }

    /** A margin's figure in its own unit. */
    static String of(double value, Margin margin) {
        if (Double.isNaN(value)) {
            return NOTHING;
        }
        if (margin.unit().equals("deg")) {
            return brief(Math.toRadians(value), Unit.ANGLE);
        }
        return Arrays.stream(Unit.values())
                .filter(unit -> unit.symbol().equals(margin.unit()))
                .findFirst()
                .map(unit -> brief(value, unit))
                .orElseGet(() -> brief(value, Unit.NUMBER) + " " + margin.unit());
    }

    /** What a margin asks: at least, or at most, so much. */
    static String asked(Margin margin) {
        String sign = margin.sense() == Margin.Sense.AT_LEAST ? "≥ " : "≤ ";
        return Double.isNaN(margin.demand()) ? NOTHING : sign + of(margin.demand(), margin);
    }

    static String ratio(Margin margin) {
        return margin.ratio().isPresent() ? number(margin.ratio().getAsDouble(), 3) : NOTHING;
    }

    static String word(Verdict verdict) {
        return verdict.word().replace('-', ' ');
    }

    static String degrees(double rad) {
        return Double.isNaN(rad) ? NOTHING : brief(rad, Unit.ANGLE);
    }
}
