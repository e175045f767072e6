package clipramp.record;

import clipramp.circuit.Design;
import clipramp.figures.GateFigure;
import clipramp.figures.KnobFigure;
import clipramp.figures.LanesFigure;
import clipramp.figures.NumberTable;
import clipramp.figures.SpreadBands;
import clipramp.margins.Check;
import clipramp.units.Unit;
import java.util.Arrays;
import java.util.stream.IntStream;

/** Knob and power, the half cycle, and the gate's drive: each a figure with its numbers. */
final class CurvesSection {
    private static final double MID_KNOB = 0.5;

    private final Paper paper;
    private final RecordContent content;
    private final Check check;
    private final Design design;

    CurvesSection(Paper paper, RecordContent content) {
        this.paper = paper;
        this.content = content;
        this.check = content.check();
        this.design = check.design();
    }

    void write() {
        knob();
        halfCycle();
        gate();
    }

    private void knob() {
        paper.need(paper.width() / 2.3f + 260);
        paper.section("Knob and power");
        KnobFigure figure = new KnobFigure(check.knob(), design.wanted())
                .withBand(content.spread().flatMap(SpreadBands::knob));
        paper.text(figure.sentence() + " Full power is what the same load would take with the thyristor always on.");
        paper.figure(figure, paper.width() / 2.3f);
        table(figure.numbers());
    }

    private void halfCycle() {
        paper.need(paper.width() / 1.35f + 260);
        LanesFigure figure = new LanesFigure(content.lanes())
                .withBand(content.spread().flatMap(s -> SpreadBands.lanes(s, MID_KNOB)));
        paper.section(figure.title());
        paper.text((design.ramp().pot().isPresent() ? "At mid-knob. " : "") + figure.sentence());
        paper.figure(figure, paper.width() / 1.35f);
        table(figure.numbers());
    }

    private void gate() {
        paper.need(paper.width() / 1.6f + 190);
        paper.section("Gate drive");
        GateFigure figure = check.pulse()
                .map(summary -> GateFigure.ofPulse(
                        design,
                        content.lanes().waves(),
                        summary.pulse().startSeconds(),
                        summary.pulse().endSeconds()))
                .orElseGet(() -> new GateFigure(design, new double[0], new double[0]));
        paper.text(figure.sentence() + " Both scales are logarithmic, so that a power is a straight line.");
        paper.figure(figure, paper.width() / 1.6f);
        check.pulse().ifPresent(this::pulse);
    }

    private void pulse(Check.PulseSummary summary) {
        Grid grid = new Grid(paper.faces(), new float[] {3, 1.2f, 3, 1.2f}, 1, 3);
        grid.heads("the firing pulse", "", "", "");
        var pulse = summary.pulse();
        grid.row(
                "peak gate current", Shown.quantity(pulse.peakGateAmps(), Unit.AMPERE),
                "charge into the gate", Shown.quantity(pulse.gateCoulombs(), Unit.COULOMB));
        grid.row(
                "peak gate voltage", Shown.quantity(pulse.peakGateVolts(), Unit.VOLT),
                "energy into the gate", Shown.quantity(pulse.gateJoules(), Unit.JOULE));
        grid.row(
                "peak gate power", Shown.quantity(pulse.peakGateWatts(), Unit.WATT),
                "energy that the capacitor gave up", Shown.quantity(pulse.capacitorJoules(), Unit.JOULE));
        grid.row(
                "gate current above the trigger current for", Shown.quantity(pulse.aboveTriggerSeconds(), Unit.SECOND),
                "mean gate power", Shown.quantity(summary.meanGateWatts(), Unit.WATT));
        grid.row(
                "peak voltage at base one", Shown.quantity(pulse.peakBaseOneVolts(), Unit.VOLT),
                "standing gate voltage, at its highest", Shown.quantity(summary.quiescentGateVolts(), Unit.VOLT));
        grid.row(
                "anode current as the gate's ends",
                Shown.quantity(pulse.anodeAmps(), Unit.AMPERE),
                "turns on and latches",
                pulse.latches() ? "yes" : pulse.turnsOn() ? "turns on, does not latch" : "no");
        paper.add(grid.table());
    }

    /** A figure's numbers; the last column is text. */
    private void table(NumberTable numbers) {
        int columns = numbers.heads().size();
        float[] widths = new float[columns];
        Arrays.fill(widths, 1);
        int[] right = IntStream.range(0, columns - 1).toArray();
        Grid grid = new Grid(paper.faces(), widths, right);
        grid.heads(numbers.heads().toArray(String[]::new));
        numbers.rows().forEach(row -> grid.row(paper.faces().small(), row));
        paper.add(grid.table());
    }
}
