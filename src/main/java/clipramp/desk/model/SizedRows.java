package clipramp.desk.model;

import clipramp.sizing.Compensation.Choice;
import clipramp.sizing.KnobShape;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** What a search changed, as rows of a table, heads first. */
public final class SizedRows {
    private static final int FIGURES = 3;

    private SizedRows() {}

    /** A knob before and after. */
    public static List<List<String>> of(Resized.Knobs knobs) {
        KnobShape before = knobs.before();
        KnobShape after = knobs.after();
        return List.of(
                List.of("", "as it stands", "found"),
                List.of(
                        "farthest from a straight line",
                        percent(before.largestDeparture()),
                        percent(after.largestDeparture())),
                List.of("dead travel, low end", percent(before.deadLow()), percent(after.deadLow())),
                List.of("dead travel, high end", percent(before.deadHigh()), percent(after.deadHigh())),
                List.of(
                        "steepest step, a degree",
                        percent(before.steepestPerDegree()),
                        percent(after.steepestPerDegree())));
    }

    /** Base two's resistor by every rule, and how far the firing angle moves with it. */
    public static List<List<String>> of(Resized.Steadied steadied) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("", "R2", "angle moves"));
        rows.add(row("as it stands", steadied.nowOhms(), steadied.nowDriftRad()));
        rows.add(row("found: preferred value", steadied.chosenOhms(), steadied.chosenDriftRad()));
        rows.add(row(steadied.found().flattest()));
        steadied.found().rules().forEach(rule -> rows.add(row(rule)));
        return rows;
    }

    private static List<String> row(Choice choice) {
        return row(choice.rule().replaceAll("\\beta\\b", "η").replace(" - ", " − "), choice.ohms(), choice.driftRad());
    }

    private static List<String> row(String what, double ohms, double driftRad) {
        return List.of(
                what,
                QuantityText.format(ohms, Unit.OHM, FIGURES),
                String.format(Locale.ROOT, "%.3f°", Math.toDegrees(driftRad)));
    }

    private static String percent(double share) {
        return QuantityText.format(share, Unit.FRACTION, FIGURES);
    }
}
