package clipramp.spread;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * What many units of a design do.
 *
 * @param options what was asked
 * @param units how many units were drawn; fewer than asked if it was interrupted
 * @param factors everything that was drawn
 * @param positions what the units do, by knob position
 * @param wanted yield against what is wanted at the knob's ends; empty if nothing is wanted
 * @param margins yield against all margins, judged on some of the units; empty if none were
 * @param failures share of the judged units that fail a margin, by the margin's id, the most frequent first
 * @param influences what matters at mid-knob, most first
 * @param remedies what would help the yield, most first
 */
public record SpreadResult(
        SpreadOptions options,
        int units,
        List<Factor> factors,
        List<PositionSpread> positions,
        Optional<Yield> wanted,
        Optional<Yield> margins,
        Map<String, Double> failures,
        List<Influence> influences,
        List<Remedy> remedies) {
    /** The percentages of units at which firing angle and power are told. */
    public static final List<Double> PERCENTAGES = List.of(1.0, 5.0, 25.0, 50.0, 75.0, 95.0, 99.0);

    /** Whether every unit asked for was drawn. */
    public boolean isComplete() {
        return units == options.samples();
    }

    /** The most important factor in a sentence; empty where nothing spreads. */
    public String sentence() {
        return influences.stream()
                .findFirst()
                .map(most -> String.format(
                        Locale.ROOT,
                        "%.0f %% of the spread in power at mid-knob is the %s.",
                        100 * most.total(),
                        most.name()))
                .orElse("");
    }
}
