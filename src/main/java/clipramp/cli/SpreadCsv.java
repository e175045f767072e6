package clipramp.cli;

import clipramp.spread.PositionSpread;
import clipramp.spread.SpreadResult;
import java.util.ArrayList;
import java.util.List;

/** A spread as comma-separated values, one line a knob position. */
final class SpreadCsv {
    private SpreadCsv() {}

    static String of(SpreadResult result) {
        List<String> head = new ArrayList<>(List.of("knob (%)"));
        for (String what : List.of("firing angle (deg)", "load power (W)", "share of full power (%)")) {
            SpreadResult.PERCENTAGES.forEach(p -> head.add(what + " at " + p.intValue() + " % of units"));
        }
        head.addAll(List.of(
                "stalls (%)",
                "latched on (%)",
                "end pulse (%)",
                "stays off (%)",
                "hunts (%)",
                "earliest firing angle (deg)",
                "latest firing angle (deg)",
                "least share of full power (%)",
                "greatest share of full power (%)"));
        Csv csv = new Csv().words(head);
        result.positions().forEach(p -> csv.words(row(p)));
        return csv.text();
    }

    private static List<String> row(PositionSpread p) {
        List<String> row = new ArrayList<>();
        row.add(Csv.number(100 * p.position().orElse(Double.NaN)));
        p.firingRad().forEach(rad -> row.add(Csv.number(Math.toDegrees(rad))));
        p.watts().forEach(watts -> row.add(Csv.number(watts)));
        p.fraction().forEach(fraction -> row.add(Csv.number(100 * fraction)));
        for (double share : new double[] {p.stalls(), p.latchedOn(), p.endPulse(), p.misfires(), p.hunts()}) {
            row.add(Csv.number(100 * share));
        }
        row.add(Csv.number(Math.toDegrees(p.worstFiring().least())));
        row.add(Csv.number(Math.toDegrees(p.worstFiring().greatest())));
        row.add(Csv.number(100 * p.worstFraction().least()));
        row.add(Csv.number(100 * p.worstFraction().greatest()));
        return row;
    }
}
