package clipramp.desk.model;

import clipramp.margins.LineCheck;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.List;
import java.util.OptionalDouble;

/**
 * One figure of the line current, as the knob stands and where it uses most of the table.
 *
 * @param name what it is
 * @param now as the knob stands
 * @param worst where most of the table is used
 */
public record LineRow(String name, String now, String worst) {
    private static final String NOTHING = "–";

    /** Every figure, in the order of the page. */
    public static List<LineRow> all(LineCheck.Setting now, LineCheck.Setting worst) {
        return List.of(
                new LineRow("knob", position(now.position()), position(worst.position())),
                row("load power", Unit.WATT, now.watts(), worst.watts()),
                amps("rms", now.current().rmsAmps(), worst.current().rmsAmps()),
                amps(
                        "fundamental",
                        now.current().fundamentalAmps(),
                        worst.current().fundamentalAmps()),
                amps("direct part", now.current().toldDcAmps(), worst.current().toldDcAmps()),
                row(
                        "distortion",
                        Unit.FRACTION,
                        now.current().distortion(),
                        worst.current().distortion()),
                new LineRow(
                        "displacement factor",
                        factor(now.current().displacementFactor()),
                        factor(worst.current().displacementFactor())),
                new LineRow(
                        "power factor",
                        factor(now.current().powerFactor()),
                        factor(worst.current().powerFactor())));
    }

    /** Which order binds first and at what power, or that none does. */
    public static String binding(LineCheck check) {
        LineCheck.Order binding = check.binding();
        if (binding.used() == 0) {
            return "No line current flows at any setting.";
        }
        String where = binding.position().isPresent() ? " with the knob at " + position(binding.position()) : "";
        return "Order " + binding.order() + " binds first: "
                + QuantityText.format(binding.amps(), Unit.AMPERE, 3) + " of "
                + QuantityText.format(binding.limitAmps(), Unit.AMPERE, 3) + " in class A" + where
                + ". Such a load would reach that limit at "
                + QuantityText.format(check.bindsAtWatts(), Unit.WATT, 3) + " of full power.";
    }

    private static LineRow amps(String name, double now, double worst) {
        return row(name, Unit.AMPERE, now, worst);
    }

    private static LineRow row(String name, Unit unit, double now, double worst) {
        return new LineRow(name, quantity(now, unit), quantity(worst, unit));
    }

    private static String quantity(double value, Unit unit) {
        return Double.isNaN(value) ? NOTHING : QuantityText.format(value, unit, 3);
    }

    private static String factor(double value) {
        return Double.isNaN(value) ? NOTHING : QuantityText.number(value, 3);
    }

    private static String position(OptionalDouble position) {
        return position.isPresent() ? Figures.percent(position.getAsDouble()) : "fixed";
    }
}
