package clipramp.desk.model;

import clipramp.fit.FitResult;
import clipramp.fit.FitWords;
import clipramp.fit.Fitted;
import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Residual;
import java.util.ArrayList;
import java.util.List;

/** A fit as rows of tables, heads first. */
public final class FitRows {
    private FitRows() {}

    /** Values of which so much is known; heads alone where there are none. */
    public static List<List<String>> values(FitResult result, Knowledge knowledge) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("", "design", "as built", "95 % interval", "difference", "tolerance"));
        for (Fitted value : result.values()) {
            if (value.knowledge() == knowledge) {
                rows.add(List.of(
                        value.name(),
                        FitWords.amount(value.nominal(), value.unit()),
                        FitWords.amount(value.value(), value.unit()),
                        FitWords.amount(value.from(), value.unit()) + " .. "
                                + FitWords.amount(value.to(), value.unit()),
                        FitWords.signedPercent(value.difference()),
                        FitWords.verdict(value)));
            }
        }
        return rows;
    }

    /** Every reading beside what the unit that was found shows. */
    public static List<List<String>> readings(FitResult result) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("line", "what", "read", "this unit", "deviations"));
        for (Residual residual : result.residuals().subList(0, result.readings().count())) {
            rows.add(List.of(
                    Integer.toString(residual.line()),
                    residual.what(),
                    FitWords.amount(residual.read(), residual.unit()),
                    FitWords.amount(residual.shown(), residual.unit()),
                    FitWords.deviations(residual)));
        }
        return rows;
    }
}
