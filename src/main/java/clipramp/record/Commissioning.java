package clipramp.record;

import clipramp.circuit.Design;
import clipramp.firing.Pulse;
import clipramp.margins.Check;
import clipramp.power.OperatingPoint;
import clipramp.record.PartEnds.Band;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** What to measure on a built unit, where, with what, and what to expect. */
final class Commissioning {
    private static final String PROBE = "isolated or differential probe, oscilloscope";
    private static final String TRUE_RMS = "true-rms meter, isolated, rated for the line";
    private static final double FULL_TURN = 1;
    private static final double MID_KNOB = 0.5;

    private final Design design;
    private final Check check;
    private final List<Expectation> lines = new ArrayList<>();

    private Commissioning(Check check) {
        this.check = check;
        this.design = check.design();
    }

    /** The lines of the sheet, in the order in which they are measured. */
    static List<Expectation> of(Check check) {
        Commissioning sheet = new Commissioning(check);
        sheet.line();
        PartEnds ends = new PartEnds(check.design(), check.condition());
        sheet.firingCircuit(ends.at(MID_KNOB));
        if (check.design().ramp().pot().isPresent()) {
            sheet.load(ends.at(0), "knob 0\u00A0%");
            sheet.load(ends.at(MID_KNOB), "knob 50\u00A0%");
            sheet.load(ends.at(FULL_TURN), "knob 100\u00A0%");
        } else {
            sheet.load(ends.at(MID_KNOB), "fixed ramp");
        }
        return sheet.lines;
    }

    private void line() {
        lines.add(new Expectation(
                "line",
                "line voltage, rms",
                Shown.brief(check.condition().lineVolts(), Unit.VOLT),
                range(design.line().lowVolts(), design.line().highVolts(), Unit.VOLT),
                TRUE_RMS));
    }

    private void firingCircuit(PartEnds.At at) {
        String knob = design.ramp().pot().isPresent() ? ", knob 50\u00A0%" : "";
        pulse(at, "TP1", "clipped supply, flat part" + knob, Pulse::supplyVolts, Unit.VOLT);
        pulse(at, "TP2", "ramp at the instant of firing" + knob, Pulse::peakPointVolts, Unit.VOLT);
        add(
                "TP2",
                "ramp at the line's zero" + knob,
                at.band(point -> OptionalDouble.of(point.solution().shown().startVolts())),
                Unit.VOLT,
                PROBE);
        pulse(at, "TP3", "pulse at base one, peak" + knob, Pulse::peakBaseOneVolts, Unit.VOLT);
        pulse(at, "TP4", "gate pulse, peak" + knob, Pulse::peakGateVolts, Unit.VOLT);
        pulse(at, "TP4", "gate current above the trigger current for" + knob, Pulse::aboveTriggerSeconds, Unit.SECOND);
        check.pulse()
                .ifPresent(pulse -> lines.add(new Expectation(
                        "TP4",
                        "standing gate voltage, between pulses",
                        "≤ " + Shown.brief(pulse.quiescentGateVolts(), Unit.VOLT),
                        "",
                        PROBE)));
    }

    private void load(PartEnds.At at, String knob) {
        add(
                "TP5",
                "firing angle, " + knob,
                at.band(point -> point.solution().shown().firingRad()),
                Unit.ANGLE,
                PROBE);
        add(
                "load",
                "load voltage, rms, " + knob,
                at.band(point -> of(point.load().rmsVolts())),
                Unit.VOLT,
                TRUE_RMS);
        add("load", "load power, " + knob, at.band(point -> of(point.load().watts())), Unit.WATT, "true-power meter");
    }

    private static OptionalDouble of(double value) {
        return OptionalDouble.of(value);
    }

    private void pulse(PartEnds.At at, String where, String what, ToDoubleFunction<Pulse> reading, Unit unit) {
        Function<OperatingPoint, OptionalDouble> ofPoint = point -> point.solution().shown().shownPulse().stream()
                .mapToDouble(reading)
                .findFirst();
        add(where, what, at.band(ofPoint), unit, PROBE);
    }

    private void add(String where, String what, Optional<Band> band, Unit unit, String instrument) {
        lines.add(new Expectation(
                where,
                what,
                band.map(b -> Shown.brief(b.nominal(), unit)).orElse("none"),
                band.map(b -> range(b, unit)).orElse(""),
                instrument));
    }

    private static String range(Band band, Unit unit) {
        boolean late = unit == Unit.ANGLE && band.high() >= Math.PI;
        String text =
                late ? Shown.brief(band.low(), unit) + " or later" : range(Math.max(0, band.low()), band.high(), unit);
        return band.sure() && !late ? text : text + ", or none";
    }

    private static String range(double low, double high, Unit unit) {
        return Shown.brief(low, unit) + " to " + Shown.brief(high, unit);
    }
}
