package clipramp.record;

import clipramp.circuit.Design;
import clipramp.circuit.Trigger;
import clipramp.firing.HalfCycle;
import clipramp.firing.PublishedRelations;
import clipramp.firing.Pulse;
import clipramp.margins.Check;
import clipramp.power.OperatingPoint;
import clipramp.units.Unit;

/** The solved firing instant beside the textbook's formula, and where the two part. */
final class FiringSection {
    private final Paper paper;
    private final Check check;
    private final Design design;
    private final double eta;
    private final double farads;

    FiringSection(Paper paper, RecordContent content) {
        this.paper = paper;
        this.check = content.check();
        this.design = check.design();
        this.eta = standoff(design.trigger());
        this.farads = design.ramp().capacitor().value();
    }

    /** Intrinsic standoff ratio, or the programmable device's divider. */
    private static double standoff(Trigger trigger) {
        if (trigger instanceof Trigger.UnijunctionTrigger unijunction) {
            return unijunction.device().standoff().nominal();
        }
        Trigger.ProgrammableTrigger programmable = (Trigger.ProgrammableTrigger) trigger;
        return programmable.lower().value()
                / (programmable.lower().value() + programmable.upper().value());
    }

    void write() {
        paper.section("Firing");
        paper.text("The textbook's delay is T = R_E C_E ln(1/(1 − η)), here with η = " + Shown.number(eta, 4)
                + " and C_E = "
                + Shown.quantity(farads, Unit.FARAD)
                + ", counted from the line's zero. It takes the supply as constant from"
                + " there on, the capacitor as empty, and the peak point as η times the supply. The solved delay takes none"
                + " of that for granted.");
        everyKnob();
        OperatingPoint middle = check.knob().get(check.knob().size() / 2);
        middle.solution().shown().shownPulse().ifPresent(pulse -> steps(middle, pulse));
    }

    private void everyKnob() {
        Grid grid =
                new Grid(paper.faces(), new float[] {0.8f, 1.2f, 1.3f, 1.2f, 1.3f, 1.2f, 1.3f, 1}, 0, 1, 2, 3, 4, 5, 6);
        grid.heads("knob", "R_E", "solved delay", "α", "textbook T", "ω T", "solved − textbook", "state");
        for (OperatingPoint point : check.knob()) {
            double textbook = PublishedRelations.textbookPeriodSeconds(point.rampOhms(), farads, eta);
            Pulse pulse = point.solution().shown().shownPulse().orElse(null);
            double solved = pulse == null ? Double.NaN : pulse.startSeconds();
            grid.row(
                    Shown.quantity(point.position(), Unit.FRACTION),
                    Shown.quantity(point.rampOhms(), Unit.OHM),
                    Shown.quantity(solved, Unit.SECOND),
                    pulse == null ? Shown.NOTHING : Shown.quantity(pulse.startRad(), Unit.ANGLE),
                    Shown.quantity(textbook, Unit.SECOND),
                    Shown.quantity(textbook * check.condition().omega(), Unit.ANGLE),
                    signed(solved - textbook),
                    point.solution().state().word());
        }
        paper.add(grid.table());
    }

    private static String signed(double seconds) {
        String text = Shown.brief(seconds, Unit.SECOND);
        return seconds > 0 ? "+" + text : text;
    }

    /** One assumption dropped after the other, at mid-knob. */
    private void steps(OperatingPoint point, Pulse pulse) {
        HalfCycle half = point.solution().shown();
        double ohms = point.rampOhms();
        double peak = pulse.peakPointVolts();
        if (!(peak < pulse.supplyVolts()) || !(half.startVolts() < peak)) {
            paper.text(
                    "At mid-knob the pulse comes as the supply collapses; the textbook's formula says nothing of that.");
            return;
        }
        paper.need(130);
        paper.heading("Why they differ, at R_E = " + Shown.quantity(ohms, Unit.OHM));
        paper.add(whyTheyDiffer(half, pulse, ohms).table());
    }

    private Grid whyTheyDiffer(HalfCycle half, Pulse pulse, double ohms) {
        double supply = pulse.supplyVolts();
        double peak = pulse.peakPointVolts();
        double textbook = PublishedRelations.textbookPeriodSeconds(ohms, farads, eta);
        double peakKnown = PublishedRelations.freeRunningPeriodSeconds(ohms, farads, supply, 0, peak);
        double startKnown = PublishedRelations.freeRunningPeriodSeconds(ohms, farads, supply, half.startVolts(), peak);
        Grid grid = new Grid(paper.faces(), new float[] {4.6f, 1.2f, 1, 1.2f}, 1, 2, 3);
        grid.heads("with", "delay", "angle", "difference");
        step(grid, "R_E C_E ln(1/(1 − η))", textbook, Double.NaN);
        step(
                grid,
                "the peak point as it is, V_P = " + Shown.quantity(peak, Unit.VOLT) + " at V_S = "
                        + Shown.quantity(supply, Unit.VOLT) + ", " + Shown.number(peak / supply, 4)
                        + " of the supply: the base resistors take their share, the emitter diode adds its drop",
                peakKnown,
                peakKnown - textbook);
        step(
                grid,
                "the ramp from what is left on the capacitor at the zero, "
                        + Shown.quantity(half.startVolts(), Unit.VOLT),
                startKnown,
                startKnown - peakKnown);
        step(grid, asTheSupplyIs(half), pulse.startSeconds(), pulse.startSeconds() - startKnown);
        return grid;
    }

    private static String asTheSupplyIs(HalfCycle half) {
        return "the supply as it rises with the line and is clipped"
                + (half.clipFromRad().isPresent()
                        ? " from " + Shown.degrees(half.clipFromRad().getAsDouble()) + " on"
                        : " nowhere")
                + ": the solved delay";
    }

    private void step(Grid grid, String what, double seconds, double difference) {
        grid.row(
                what,
                Shown.quantity(seconds, Unit.SECOND),
                Shown.quantity(seconds * check.condition().omega(), Unit.ANGLE),
                Double.isNaN(difference) ? "" : signed(difference));
    }
}
