package clipramp.cli;

import clipramp.cli.TextTable.Align;
import clipramp.margins.HeatCheck;
import clipramp.margins.LineCheck;
import clipramp.power.LineCurrent;
import clipramp.units.Unit;
import java.util.Comparator;
import java.util.List;

/** Line current and heat for people. */
final class LineText {
    /** How many orders are shown: those that use most of their limit. */
    private static final int SHOWN_ORDERS = 6;

    private LineText() {}

    static void print(Output out, LineCheck check) {
        LineCheck.Setting worst = check.worstSetting();
        LineCurrent current = worst.current();
        String where = worst.position().isPresent() ? " at knob " + KnobText.position(worst.position()) + " %" : "";
        out.line("Line current" + where + ", where it is most distorted for the table");
        out.lines(new Facts(out.spelling())
                .amount("rms", current.rmsAmps(), Unit.AMPERE)
                .amount("fundamental", current.fundamentalAmps(), Unit.AMPERE)
                .amount("distortion", current.distortion(), Unit.FRACTION)
                .amount("direct part", current.toldDcAmps(), Unit.AMPERE)
                .fact("power factor", Shown.fixed(current.powerFactor(), 3))
                .fact("of displacement", Shown.fixed(current.displacementFactor(), 3))
                .lines());
        orders(out, check);
        for (LineCheck.Rule rule : check.rules()) {
            String text =
                    rule.name() + " (" + rule.standing().word() + "): " + rule.text() + " [" + rule.source() + "]";
            out.lines(Paragraph.wrap(text, "  ", "    "));
        }
        out.line("  Guidance, no verdict: a test house and local rules decide.");
        out.line("");
    }

    private static void orders(Output out, LineCheck check) {
        TextTable table = new TextTable(out.spelling(), "  ")
                .column(Align.RIGHT, "order")
                .column(Align.RIGHT, "largest")
                .column(Align.RIGHT, "class A")
                .column(Align.DECIMAL, "used %")
                .column(Align.RIGHT, "at knob");
        List<LineCheck.Order> orders = check.orders().stream()
                .sorted(Comparator.comparingDouble(LineCheck.Order::used).reversed())
                .limit(SHOWN_ORDERS)
                .filter(order -> order.used() > 1e-6)
                .toList();
        for (LineCheck.Order order : orders) {
            table.row(
                    Integer.toString(order.order()),
                    Shown.amount(order.amps(), Unit.AMPERE),
                    Shown.amount(order.limitAmps(), Unit.AMPERE),
                    Shown.fixed(100 * order.used(), 1),
                    KnobText.position(order.position()) + (order.position().isPresent() ? " %" : ""));
        }
        if (!orders.isEmpty()) {
            out.lines(table.lines());
        }
    }

    static void printHeat(Output out, HeatCheck heat) {
        String junction = heat.junctionCelsius().isPresent()
                ? ", junction " + Shown.fixed(heat.junctionCelsius().getAsDouble(), 1) + " °C"
                : "";
        String sink = heat.sinkKelvinPerWatt().isEmpty()
                ? ""
                : heat.sinkKelvinPerWatt().getAsDouble() > 0
                        ? ", case to ambient needed "
                                + Shown.amount(heat.sinkKelvinPerWatt().getAsDouble(), Unit.KELVIN_PER_WATT)
                                + " or less"
                        : ", more than any sink can carry away";
        out.line("Thyristor's heat at its worst");
        out.lines(Paragraph.wrap(
                Shown.amount(heat.watts(), Unit.WATT) + " at " + heat.where() + " (" + heat.condition() + ")" + junction
                        + sink + ".",
                "  "));
        out.line("");
    }
}
