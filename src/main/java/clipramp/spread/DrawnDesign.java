package clipramp.spread;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Line;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.engine.UnitValues;
import java.util.Optional;
import java.util.OptionalDouble;

/** A drawn unit as a design of its own, for the judge. A programmable device keeps its sheet's figures. */
final class DrawnDesign {
    /** What a trimmer at its end leaves, ohm. */
    private static final double LEAST_OHMS = 0.01;

    private DrawnDesign() {}

    static Design of(Design design, UnitValues unit) {
        GateDrive gate = design.gate();
        return design.withLine(line(design.line(), unit))
                .withClip(clip(design.clip(), unit))
                .withRamp(ramp(design.ramp(), unit))
                .withTrigger(trigger(design.trigger(), unit))
                .withGate(new GateDrive(
                        gate.coupling(),
                        exact(gate.series(), unit.gateSeriesOhms),
                        gate.shunt().map(p -> exact(p, unit.gateShuntOhms)),
                        gate.overdrive(),
                        gate.chargeSeconds(),
                        gate.polarity(),
                        gate.transformer()));
    }

    private static Part exact(Part part, double value) {
        return part.withValue(value);
    }

    /** The unit's own line is low, nominal and high at once: it stands at that voltage. */
    private static Line line(Line line, UnitValues unit) {
        return new Line(unit.lineVolts, unit.lineHertz, unit.lineVolts, unit.lineVolts, line.harmonics());
    }

    private static ClipSupply clip(ClipSupply clip, UnitValues unit) {
        Zener zener = clip.zener();
        return new ClipSupply(
                clip.tap(),
                clip.rectifier(),
                clip.diodeDropVolts(),
                exact(clip.dropper(), unit.dropperOhms),
                new Zener(
                        zener.id(),
                        Characteristic.exactly(unit.zenerVolts),
                        zener.testCurrentAmps(),
                        zener.slopeOhms(),
                        zener.driftPerKelvin(),
                        zener.ratedWatts()),
                clip.winding());
    }

    static Ramp ramp(Ramp ramp, UnitValues unit) {
        return new Ramp(
                exact(ramp.capacitor(), unit.capacitorFarads),
                exact(ramp.fixed(), unit.fixedOhms + unit.highTrimOhms),
                ramp.pot()
                        .map(pot -> new Pot(
                                exact(pot.track(), unit.trackOhms),
                                pot.endOhms(),
                                pot.law(),
                                pot.sense(),
                                across(pot, unit))));
    }

    /** A set trimmer is as good as a resistor of that value. */
    private static Optional<Part> across(Pot pot, UnitValues unit) {
        double ohms = unit.potShuntOhms + unit.lowTrimOhms;
        return Double.isInfinite(ohms)
                ? Optional.empty()
                : Optional.of(exact(pot.shunt().orElse(Part.of(ohms)), Math.max(LEAST_OHMS, ohms)));
    }

    private static Trigger trigger(Trigger trigger, UnitValues unit) {
        Part baseOne = exact(trigger.baseOne(), unit.baseOneOhms);
        if (trigger instanceof UnijunctionTrigger unijunction) {
            return new UnijunctionTrigger(
                    device(unijunction.device(), unit), baseOne, exact(unijunction.baseTwo(), unit.baseTwoOhms));
        }
        Trigger.ProgrammableTrigger programmable = (Trigger.ProgrammableTrigger) trigger;
        return new Trigger.ProgrammableTrigger(
                programmable.device(),
                baseOne,
                exact(programmable.upper(), unit.upperOhms),
                exact(programmable.lower(), unit.lowerOhms));
    }

    private static Unijunction device(Unijunction sheet, UnitValues unit) {
        return new Unijunction(
                sheet.id(),
                Characteristic.exactly(unit.standoff),
                Characteristic.exactly(unit.interbaseOhms),
                Characteristic.exactly(unit.interbaseDrift),
                Characteristic.exactly(unit.emitterDropVolts),
                Characteristic.exactly(unit.emitterDrift),
                Characteristic.exactly(unit.peakCurrentAmps),
                new Unijunction.Valley(
                        Characteristic.exactly(unit.valleyAmps),
                        Characteristic.exactly(unit.valleyVolts),
                        sheet.valley().atVolts()),
                sheet.saturation(),
                sheet.modulated()
                        .map(m -> new Unijunction.Modulated(Characteristic.exactly(unit.modulatedAmps), m.atVolts())),
                pulse(sheet, unit),
                sheet.limits());
    }

    private static Optional<Unijunction.BaseOnePulse> pulse(Unijunction sheet, UnitValues unit) {
        return sheet.baseOnePulse()
                .map(p -> new Unijunction.BaseOnePulse(
                        OptionalDouble.empty(),
                        OptionalDouble.of(unit.baseOnePulseVolts),
                        p.supplyVolts(),
                        p.capacitorFarads(),
                        p.baseOneOhms()));
    }
}
