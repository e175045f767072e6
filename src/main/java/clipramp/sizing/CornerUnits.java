package clipramp.sizing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trigger;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.spread.TrimmedUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.function.UnaryOperator;

/**
 * The fastest and the slowest unit that the tolerances allow: capacitor, ramp resistors, pot, standoff ratio (or divider)
 * and emitter drop all at the limit that brings the ramp forward, or back, and trimmers then set as the units of a spread
 * are. The judge takes the weakest device, line and temperature by himself.
 */
final class CornerUnits {
    private CornerUnits() {}

    private static Part lowest(Part part) {
        return part.withValue(part.lowest());
    }

    private static Part highest(Part part) {
        return part.withValue(part.highest());
    }

    /** Margins that fail for either, the fastest unit's first. */
    static List<Margin> failures(Design design) {
        List<Margin> failures = new ArrayList<>();
        for (Design unit : List.of(fastest(design), slowest(design))) {
            Judge.check(unit, OptionalDouble.empty(), OptionalDouble.empty()).margins().stream()
                    .filter(m -> m.verdict() == Verdict.FAILS)
                    .filter(m -> failures.stream().noneMatch(f -> f.kind() == m.kind()))
                    .forEach(failures::add);
        }
        return failures;
    }

    static Design fastest(Design design) {
        return TrimmedUnit.of(design, fastestDevice(resistors(design, CornerUnits::lowest)));
    }

    static Design slowest(Design design) {
        return TrimmedUnit.of(design, slowestDevice(resistors(design, CornerUnits::highest)));
    }

    /** The fastest unit, but its ramp resistors are nominal. */
    static Design fastestDevice(Design design) {
        return device(design, CornerUnits::lowest, CornerUnits::highest, Characteristic::lowest);
    }

    static Design slowestDevice(Design design) {
        return device(design, CornerUnits::highest, CornerUnits::lowest, Characteristic::highest);
    }

    /** Trimmers keep their tracks: they are set, and so do not stray. */
    private static Design resistors(Design design, UnaryOperator<Part> limit) {
        Ramp ramp = design.ramp();
        Optional<Pot> pot = ramp.pot()
                .map(p -> new Pot(
                        limit.apply(p.track()),
                        p.endOhms(),
                        p.law(),
                        p.sense(),
                        p.shunt().map(limit)));
        return design.withRamp(new Ramp(ramp.capacitor(), limit.apply(ramp.fixed()), pot, ramp.trimmers()));
    }

    private static Design device(
            Design design,
            UnaryOperator<Part> limit,
            UnaryOperator<Part> upper,
            ToDoubleFunction<Characteristic> figure) {
        Ramp ramp = design.ramp();
        Design moved =
                design.withRamp(new Ramp(limit.apply(ramp.capacitor()), ramp.fixed(), ramp.pot(), ramp.trimmers()));
        Trigger trigger = design.trigger();
        if (trigger instanceof UnijunctionTrigger u) {
            return moved.withTrigger(new UnijunctionTrigger(unijunction(u.device(), figure), u.baseOne(), u.baseTwo()));
        }
        ProgrammableTrigger p = (ProgrammableTrigger) trigger;
        // The peak point falls with a larger upper resistor.
        return moved.withTrigger(new ProgrammableTrigger(
                programmable(p.device(), figure), p.baseOne(), upper.apply(p.upper()), limit.apply(p.lower())));
    }

    private static Unijunction unijunction(Unijunction u, ToDoubleFunction<Characteristic> figure) {
        return new Unijunction(
                u.id(),
                Characteristic.exactly(figure.applyAsDouble(u.standoff())),
                u.interbaseOhms(),
                u.interbaseDriftPerKelvin(),
                Characteristic.exactly(figure.applyAsDouble(u.emitterDropVolts())),
                u.emitterDriftVoltsPerKelvin(),
                u.peakCurrentAmps(),
                u.valley(),
                u.saturation(),
                u.modulated(),
                u.baseOnePulse(),
                u.limits());
    }

    private static ProgrammableUnijunction programmable(
            ProgrammableUnijunction d, ToDoubleFunction<Characteristic> figure) {
        List<AtGateResistance> offset = d.offsetVolts().stream()
                .map(a -> new AtGateResistance(a.gateOhms(), Characteristic.exactly(figure.applyAsDouble(a.value()))))
                .toList();
        return new ProgrammableUnijunction(
                d.id(),
                offset,
                d.forwardVolts(),
                d.forwardAmps(),
                d.peakCurrentAmps(),
                d.valleyCurrentAmps(),
                d.limits());
    }
}
