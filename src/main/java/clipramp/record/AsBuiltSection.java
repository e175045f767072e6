package clipramp.record;

import clipramp.fit.FitResult;
import clipramp.fit.FitWords;
import clipramp.fit.Fitted;
import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Fitted.Within;
import clipramp.fit.Quality;
import clipramp.fit.Residual;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import com.lowagie.text.Font;
import java.util.List;
import java.util.stream.Collectors;

/** One unit as its bench readings have it: design, as built, difference, tolerance; and what the readings cannot tell. */
final class AsBuiltSection {

    private AsBuiltSection() {}

    static void write(Paper paper, FitResult fit) {
        paper.newPage();
        paper.section("As built");
        Quality quality = fit.quality();
        paper.text("One unit, fitted from " + quality.used() + " of " + quality.readings() + " bench readings ("
                + fit.readings().name() + ") at "
                + QuantityText.format(fit.readings().celsius(), Unit.CELSIUS)
                + ". Intervals hold 19 times in 20. " + String.join(" ", FitWords.quality(fit)));
        values(paper, fit);
        paper.quiet(
                "Before any reading, every value is taken as its design's, one standard deviation to its limit. Told: half"
                        + " or less of that is left. * limits are the program's, because the design states none.");
        untold(paper, fit);
        strangers(paper, fit);
        residuals(paper, fit);
    }

    private static void values(Paper paper, FitResult fit) {
        Grid grid = new Grid(paper.faces(), new float[] {2.5f, 1.1f, 1.2f, 2.2f, 1.3f, 2.2f, 1.9f}, 1, 2, 4);
        grid.heads("value", "design", "as built", "95 % interval", "difference", "limits", "verdict");
        for (Knowledge knowledge : List.of(Knowledge.TOLD, Knowledge.NARROWED)) {
            for (Fitted value : fit.values()) {
                if (value.knowledge() == knowledge) {
                    grid.row(font(paper, value), cells(value));
                }
            }
        }
        paper.add(grid.table());
    }

    private static Font font(Paper paper, Fitted value) {
        return value.within() == Within.OUTSIDE
                ? paper.faces().marked(Faces.SMALL)
                : paper.faces().small();
    }

    private static List<String> cells(Fitted value) {
        Unit unit = value.unit();
        return List.of(
                value.name(),
                FitWords.amount(value.nominal(), unit),
                FitWords.amount(value.value(), unit),
                FitWords.amount(value.from(), unit) + " to " + FitWords.amount(value.to(), unit),
                FitWords.signedPercent(value.difference()),
                FitWords.amount(value.low(), unit) + " to " + FitWords.amount(value.high(), unit)
                        + (value.limitsAssumed() ? " *" : ""),
                value.within().word());
    }

    private static void untold(Paper paper, FitResult fit) {
        FitWords.untold(fit).ifPresent(paper::text);
        if (!fit.together().isEmpty()) {
            paper.text("Told only together (correlation): "
                    + fit.together().stream()
                            .map(pair -> FitWords.together(fit, pair))
                            .collect(Collectors.joining("; "))
                    + ".");
        }
    }

    private static void strangers(Paper paper, FitResult fit) {
        for (Residual stranger : fit.strangers()) {
            paper.text("Does not belong, and was left out: line " + stranger.line() + ", " + stranger.column() + ": "
                    + FitWords.stranger(stranger));
        }
    }

    private static void residuals(Paper paper, FitResult fit) {
        Grid grid = new Grid(paper.faces(), new float[] {0.7f, 3.4f, 1.8f, 1.8f, 2.4f, 2.3f}, 0, 2, 3, 4);
        grid.heads("line", "what", "read", "this unit", "standard deviations", "");
        for (Residual residual : fit.residuals().subList(0, fit.readings().count())) {
            grid.row(
                    Integer.toString(residual.line()),
                    residual.what(),
                    FitWords.amount(residual.read(), residual.unit()),
                    FitWords.amount(residual.shown(), residual.unit()),
                    QuantityText.fixed(residual.deviations(), 1),
                    residual.belongs() ? "" : "does not belong");
        }
        paper.add(grid.table());
    }
}
