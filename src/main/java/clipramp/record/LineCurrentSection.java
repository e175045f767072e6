package clipramp.record;

import clipramp.figures.HarmonicsFigure;
import clipramp.margins.LineCheck;
import clipramp.margins.LineCheck.Order;
import clipramp.margins.LineCheck.Rule;
import clipramp.power.LineCurrent;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The line current: its orders beside the table that others will hold it against, and what the standard's rules say. */
final class LineCurrentSection {
    /** Up to this an order is what rounding leaves, A. */
    private static final double ROUNDING_AMPS = 1e-9;

    private static final int[] NUMBERS = {0, 1, 2, 3, 4, 5, 6, 7, 8, 9};

    private final Paper paper;
    private final LineCheck check;

    private LineCurrentSection(Paper paper, LineCheck check) {
        this.paper = paper;
        this.check = check;
    }

    static void write(Paper paper, LineCheck check) {
        new LineCurrentSection(paper, check).write();
    }

    private void write() {
        paper.newPage();
        paper.section("Line current");
        HarmonicsFigure figure = new HarmonicsFigure(check);
        paper.text(figure.sentence());
        paper.figure(figure, paper.width() / 2.3f);
        totals();
        orders();
        paper.heading("What the rules say");
        for (Rule rule : check.rules()) {
            paper.small(rule.name() + " (" + rule.standing().word() + "). " + rule.text() + " Source: " + rule.source()
                    + ".");
        }
        paper.quiet("Guidance for a designer, nominal line and parts, the firing supply's own current left out. A test"
                + " house and local rules decide.");
    }

    private void totals() {
        LineCurrent current = check.worstSetting().current();
        Grid grid = new Grid(paper.faces(), new float[] {1.2f, 1, 1, 1, 1, 1, 1.3f, 1.2f}, 0, 1, 2, 3, 4, 5, 6, 7);
        grid.heads(
                "knob",
                "load power",
                "rms",
                "fundamental",
                "direct part",
                "distortion",
                "displacement factor",
                "power factor");
        grid.row(
                knob(check.worstSetting().position()),
                Shown.quantity(check.worstSetting().watts(), Unit.WATT),
                Shown.quantity(current.rmsAmps(), Unit.AMPERE),
                Shown.quantity(current.fundamentalAmps(), Unit.AMPERE),
                Shown.quantity(current.toldDcAmps(), Unit.AMPERE),
                Shown.quantity(current.distortion(), Unit.FRACTION),
                Shown.number(current.displacementFactor(), 3),
                Shown.number(current.powerFactor(), 3));
        paper.add(grid.table());
    }

    /** Odd orders at the left, the even one after each at the right. */
    private void orders() {
        Grid grid = new Grid(paper.faces(), new float[] {0.7f, 1, 1, 1, 0.8f, 0.9f, 1, 1, 1, 0.8f}, NUMBERS);
        List<String> heads = List.of("order", "largest", "at knob", "class A", "used");
        List<String> both = new ArrayList<>(heads);
        both.addAll(heads);
        grid.heads(both.toArray(String[]::new));
        for (int odd = 1; odd < LineCurrent.HIGHEST_ORDER; odd += 2) {
            List<String> cells = new ArrayList<>(
                    odd == 1 ? fundamental() : cells(check.orders().get(odd - 2)));
            cells.addAll(cells(check.orders().get(odd - 1)));
            grid.row(paper.faces().small(), cells);
        }
        paper.add(grid.table());
    }

    private List<String> fundamental() {
        LineCheck.Setting largest = check.settings().get(0);
        for (LineCheck.Setting setting : check.settings()) {
            largest = setting.current().fundamentalAmps() > largest.current().fundamentalAmps() ? setting : largest;
        }
        return List.of(
                "1",
                Shown.brief(largest.current().fundamentalAmps(), Unit.AMPERE),
                knob(largest.position()),
                Shown.NOTHING,
                Shown.NOTHING);
    }

    private static List<String> cells(Order order) {
        boolean flows = order.amps() > ROUNDING_AMPS;
        return List.of(
                Integer.toString(order.order()),
                flows ? Shown.brief(order.amps(), Unit.AMPERE) : Shown.NOTHING,
                flows ? knob(order.position()) : Shown.NOTHING,
                Shown.brief(order.limitAmps(), Unit.AMPERE),
                flows ? Shown.share(order.used()) : Shown.NOTHING);
    }

    private static String knob(OptionalDouble position) {
        return position.isPresent() ? Shown.quantity(position, Unit.FRACTION) : "fixed";
    }
}
