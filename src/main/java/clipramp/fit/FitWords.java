package clipramp.fit;

import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Fitted.Within;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/** A fit in sentences. */
public final class FitWords {
    private static final int FIGURES = 4;

    /** Scatter beyond this is no matter of instruments. */
    private static final double HARDLY_OF_IT = 5;

    private FitWords() {}

    /** A value in SI with four figures and its unit: as many as a fit deserves. */
    public static String amount(double value, Unit unit) {
        return QuantityText.format(value, unit, FIGURES);
    }

    /** A share in percent, with its sign and one decimal. */
    public static String signedPercent(double share) {
        String text = QuantityText.fixed(100 * share, 1);
        return (text.startsWith("-") || text.equals("0.0") ? "" : "+") + text + " %";
    }

    /** How a value lies to its limits, in a few words that also say where the limits are ours. */
    public static String verdict(Fitted value) {
        String word = value.within().word();
        return value.limitsAssumed() && value.within() != Within.UNKNOWN ? word + " (ours)" : word;
    }

    /** How far a reading is off the unit that was found: standard deviations with one decimal, and "out" where it was left out. */
    public static String deviations(Residual residual) {
        return QuantityText.fixed(residual.deviations(), 1) + (residual.belongs() ? "" : " out");
    }

    /** What is said of a reading that does not belong, after its place. */
    public static String stranger(Residual stranger) {
        return "read " + amount(stranger.read(), stranger.unit()) + "; the others say "
                + amount(stranger.shown(), stranger.unit()) + ", "
                + QuantityText.fixed(Math.abs(stranger.deviations()), 1)
                + " standard deviations off.";
    }

    /** What the readings cannot tell; empty where they tell everything. */
    public static Optional<String> untold(FitResult result) {
        String untold = result.values().stream()
                .filter(value -> value.knowledge() == Knowledge.NOT_TOLD)
                .map(Fitted::name)
                .collect(Collectors.joining(", "));
        return untold.isEmpty()
                ? Optional.empty()
                : Optional.of("The readings cannot tell: " + untold + ". These keep the design's values and limits.");
    }

    /** Two values that are told only together. */
    public static String together(FitResult result, Together pair) {
        String first = result.value(pair.first()).map(Fitted::name).orElse(pair.first());
        String second = result.value(pair.second()).map(Fitted::name).orElse(pair.second());
        return first + " and " + second + ", " + QuantityText.fixed(pair.correlation(), 2) + ": "
                + (pair.correlation() < 0 ? "more of one with less of the other" : "more of both")
                + " reads nearly alike";
    }

    /** What is said where no reading was left out. A bad fit as a whole is no praise of its readings. */
    public static String noStrangers(FitResult result) {
        return result.quality().widened() > HARDLY_OF_IT
                ? "No single reading stands out, but together they do not fit this design."
                : "Every reading belongs.";
    }

    /** How much the readings tell, and how well they fit. */
    public static List<String> quality(FitResult result) {
        Quality quality = result.quality();
        String condition = quality.condition().isPresent()
                ? "; the best told is "
                        + QuantityText.number(quality.condition().getAsDouble(), 2)
                        + " times better told than the worst"
                : "; some combination is not told at all";
        String scatter = quality.widened() > 1
                ? "They scatter " + QuantityText.fixed(quality.widened(), 1)
                        + " times as far as the instruments' accuracies explain; the intervals are widened by that."
                        + (quality.widened() > HARDLY_OF_IT
                                ? " So far off, they are hardly of this design, or most heads name a wrong unit."
                                : "")
                : "They scatter no more than the instruments' accuracies explain.";
        return List.of(
                "The readings tell " + count(quality.directions(), "independent combination") + " of "
                        + count(quality.unknowns(), "value") + condition + ".",
                scatter);
    }

    /** A number of things, with their plural. */
    public static String count(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }

    /** How the fit was made, and what was assumed. */
    public static List<String> notes(FitResult result) {
        List<String> notes = new ArrayList<>();
        notes.add(
                "Accuracies hold for 19 readings in 20; where a head says none, the usual ones: firing angle 1°, delay"
                        + " 1 % + 20 µs, load true rms 1 % + 0.2 V, average-reading 1.5 % + 0.2 V, power 2 % + 0.5 W, base one"
                        + " 3 % + 50 mV, supply and peak point 2 %, ohmmeter 0.5 % + 1 Ω, line 1 %, knob 1 % of its travel.");
        notes.add(
                "Before any reading, every value is taken as its design's with one standard deviation to its tolerance or"
                        + " data-sheet limit (a weak prior): what no reading moves stays there. Told means that half or less of that"
                        + " uncertainty is left.");
        String ours = result.values().stream()
                .filter(Fitted::limitsAssumed)
                .map(value -> value.name() + " " + amount(value.low(), value.unit()) + " .. "
                        + amount(value.high(), value.unit()))
                .collect(Collectors.joining("; "));
        if (!ours.isEmpty()) {
            notes.add("Limits of ours, because the design states none: " + ours + ".");
        }
        if (result.value(FitResult.LINE_PATH).isPresent()) {
            notes.add("The line voltage was not read on every line; there it is fitted as one value for the day.");
        }
        return notes;
    }
}
