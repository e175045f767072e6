package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeSet;

/**
 * A condition that margins are judged at, with its name.
 *
 * @param condition line and temperature
 * @param words such as "low line, 0 °C"
 */
record JudgedCondition(Condition condition, String words) {
    /** Line low, nominal, high by coldest, 25 °C, hottest; a pinned axis has one value. */
    static List<JudgedCondition> of(Design design, OptionalDouble pinnedVolts, OptionalDouble pinnedCelsius) {
        List<JudgedCondition> all = new ArrayList<>();
        for (Map.Entry<String, Double> line : lines(design, pinnedVolts).entrySet()) {
            for (double celsius : temperatures(design, pinnedCelsius)) {
                Condition condition =
                        new Condition(line.getValue(), design.line().hertz(), celsius);
                all.add(new JudgedCondition(
                        condition, line.getKey() + ", " + QuantityText.format(celsius, Unit.CELSIUS)));
            }
        }
        return all;
    }

    private static Map<String, Double> lines(Design design, OptionalDouble pinned) {
        Map<String, Double> lines = new LinkedHashMap<>();
        if (pinned.isPresent()) {
            lines.put(QuantityText.format(pinned.getAsDouble(), Unit.VOLT), pinned.getAsDouble());
            return lines;
        }
        double nominal = design.line().volts();
        lines.put("nominal line", nominal);
        if (design.line().lowVolts() < nominal) {
            lines.put("low line", design.line().lowVolts());
        }
        if (design.line().highVolts() > nominal) {
            lines.put("high line", design.line().highVolts());
        }
        return lines;
    }

    private static TreeSet<Double> temperatures(Design design, OptionalDouble pinned) {
        if (pinned.isPresent()) {
            return new TreeSet<>(List.of(pinned.getAsDouble()));
        }
        return new TreeSet<>(List.of(
                design.surroundings().coldestCelsius(),
                Condition.SHEET_CELSIUS,
                design.surroundings().hottestCelsius()));
    }
}
