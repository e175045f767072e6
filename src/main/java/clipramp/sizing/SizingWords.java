package clipramp.sizing;

import clipramp.margins.Margin;
import clipramp.sizing.SizingAnswer.Conflict;
import clipramp.spread.SpreadWords;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Optional;
import java.util.stream.Collectors;

/** What sizing found, in sentences. */
public final class SizingWords {
    private static final int FIGURES = 3;

    private SizingWords() {}

    /** What the design keeps, in a few words that {@link #clause} goes on. */
    public static String headline(SizingAnswer answer) {
        return switch (answer.outcome()) {
            case WORST_CASE -> "Holds in the worst case";
            case NOMINAL -> "Holds with nominal parts";
            case NOTHING -> "Nothing holds";
        };
    }

    /** What follows that headline, its punctuation first, to the end of the sentence. */
    public static String clause(SizingAnswer answer) {
        return switch (answer.outcome()) {
            case WORST_CASE ->
                ": the fastest and the slowest unit fail no margin"
                        + (answer.design().ramp().trimmers().isNone() ? "." : ", once trimmed.");
            case NOMINAL -> ": no margin fails at any line and temperature.";
            case NOTHING -> "; this is the nearest that was found.";
        };
    }

    /** What the extreme units of a design that holds with nominal parts miss; empty for any other design. */
    public static Optional<String> extremes(SizingAnswer answer) {
        if (answer.outcome() != SizingAnswer.Outcome.NOMINAL) {
            return Optional.empty();
        }
        String names = answer.cornerFailures().stream().map(Margin::name).collect(Collectors.joining(", "));
        return Optional.of("For the fastest or the slowest unit that the tolerances allow these fail: " + names
                + ". About " + SpreadWords.ofUnits(answer.yield())
                + " of all units reach everything that is wanted without selection or trimming.");
    }

    /** How one trimmer is set, a sentence. */
    public static String setting(UnitSetting setting) {
        return "With the knob at " + text(setting.position(), Unit.FRACTION) + " turn "
                + setting.part().key() + " until the load has " + text(setting.loadVolts(), Unit.VOLT)
                + " rms (it then fires at " + QuantityText.number(Math.toDegrees(setting.firingRad()), FIGURES)
                + "° and gets " + text(setting.fraction(), Unit.FRACTION) + " of full power).";
    }

    /** Heat, dead travel and how much was tried. */
    public static String figures(SizingAnswer answer) {
        return text(answer.watts(), Unit.WATT) + " in the firing circuit, " + text(answer.deadTravel(), Unit.FRACTION)
                + " of the rotation lies past what is wanted, " + answer.candidates()
                + (answer.candidates() == 1 ? " design" : " designs") + " judged.";
    }

    /** A demand that is not met, with which it cannot be met, and the nearest that can. */
    public static String conflict(Conflict conflict) {
        String with = conflict.with().isEmpty()
                ? " No design that was tried meets it."
                : " Where it is met, this fails: " + String.join(", ", conflict.with()) + ".";
        return conflict.margin().name() + ":" + with + " " + conflict.nearest();
    }

    /** Why a part is what it is, and what its neighbours would do. */
    public static String reason(Reason reason) {
        return reason.relation() + "." + neighbour("Up", reason.up()) + neighbour("Down", reason.down());
    }

    private static String neighbour(String which, String effect) {
        return effect.isEmpty() ? "" : " " + which + ", " + effect + ".";
    }

    /** How straight a knob is. */
    public static String shape(KnobShape shape) {
        return "Farthest from a straight line " + text(shape.largestDeparture(), Unit.FRACTION)
                + " of full; nothing moves over " + text(shape.deadLow(), Unit.FRACTION)
                + " of the rotation at the low end and " + text(shape.deadHigh(), Unit.FRACTION)
                + " at the high end; the steepest degree of "
                + QuantityText.number(KnobShape.ROTATION_DEGREES, FIGURES) + " makes "
                + text(shape.steepestPerDegree(), Unit.FRACTION) + ".";
    }

    private static String text(double value, Unit unit) {
        return QuantityText.format(value, unit, FIGURES);
    }
}
