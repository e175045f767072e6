package clipramp.record;

import clipramp.fit.FitResult;
import clipramp.fit.Fitted;
import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Fitted.Within;
import clipramp.fit.Quality;
import clipramp.fit.Residual;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import com.lowagie.text.Font;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.stream.Collectors;

/** One unit as its bench readings have it: design, as built, difference, tolerance; and what the readings cannot tell. */
final class AsBuiltSection {
    private static final int FIGURES = 4;

    private AsBuiltSection() {}

    static void write(Paper paper, FitResult fit) {
        paper.newPage();
        paper.section("As built");
        Quality quality = fit.quality();
        paper.text("One unit, fitted from " + quality.used() + " of " + quality.readings() + " bench readings ("
                + fit.readings().name() + ") at "
                + QuantityText.format(fit.readings().celsius(), Unit.CELSIUS)
                + ". Intervals hold 19 times in 20. "
                + (quality.widened() > 1
                        ? "The readings scatter " + decimals(quality.widened(), 1)
                                + " times as far as their instruments explain; the intervals are widened by that."
                        : "The readings scatter no more than their instruments explain."));
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
        String difference = decimals(100 * value.difference(), 1);
        return List.of(
                value.name(),
                amount(value.nominal(), unit),
                amount(value.value(), unit),
                amount(value.from(), unit) + " to " + amount(value.to(), unit),
                (difference.startsWith("-") ? "" : "+") + difference + " %",
                amount(value.low(), unit) + " to " + amount(value.high(), unit) + (value.limitsAssumed() ? " *" : ""),
                value.knowledge() == Knowledge.NARROWED && value.within() == Within.UNKNOWN
                        ? "not told"
                        : value.within().word());
    }

    private static void untold(Paper paper, FitResult fit) {
        String untold = fit.values().stream()
                .filter(value -> value.knowledge() == Knowledge.NOT_TOLD)
                .map(Fitted::name)
                .collect(Collectors.joining(", "));
        if (!untold.isEmpty()) {
            paper.text("These readings cannot tell: " + untold + ".");
        }
        if (!fit.together().isEmpty()) {
            paper.text("Told only together (correlation): "
                    + fit.together().stream()
                            .map(pair -> name(fit, pair.first()) + " and " + name(fit, pair.second()) + " "
                                    + decimals(pair.correlation(), 2))
                            .collect(Collectors.joining("; "))
                    + ".");
        }
    }

    private static String name(FitResult fit, String path) {
        return fit.value(path).map(Fitted::name).orElse(path);
    }

    private static void strangers(Paper paper, FitResult fit) {
        for (Residual stranger : fit.strangers()) {
            paper.text(
                    "Does not belong, and was left out: line " + stranger.line() + ", " + stranger.column() + ", read "
                            + amount(stranger.read(), stranger.unit()) + "; the others say "
                            + amount(stranger.shown(), stranger.unit()) + ".");
        }
    }

    private static void residuals(Paper paper, FitResult fit) {
        Grid grid = new Grid(paper.faces(), new float[] {0.7f, 3.4f, 1.8f, 1.8f, 2.4f, 2.3f}, 0, 2, 3, 4);
        grid.heads("line", "what", "read", "this unit", "standard deviations", "");
        for (Residual residual : fit.residuals().subList(0, fit.readings().count())) {
            grid.row(
                    Integer.toString(residual.line()),
                    residual.what(),
                    amount(residual.read(), residual.unit()),
                    amount(residual.shown(), residual.unit()),
                    decimals(residual.deviations(), 1),
                    residual.belongs() ? "" : "does not belong");
        }
        paper.add(grid.table());
    }

    private static String amount(double value, Unit unit) {
        return QuantityText.format(value, unit, FIGURES);
    }

    private static String decimals(double value, int places) {
        BigDecimal rounded = new BigDecimal(value).setScale(places, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? rounded.abs().toPlainString() : rounded.toPlainString();
    }
}
