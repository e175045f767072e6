package clipramp.sizing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;

/**
 * The fastest and the slowest unit that the tolerances allow: capacitor, ramp resistors, pot and standoff ratio all at
 * the limit that brings the ramp forward, or back. The judge takes the weakest device, line and temperature by himself.
 */
final class CornerUnits {
    private CornerUnits() {}

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
        return at(design, p -> p.withValue(p.lowest()), Characteristic::lowest);
    }

    static Design slowest(Design design) {
        return at(design, p -> p.withValue(p.highest()), Characteristic::highest);
    }

    private static Design at(
            Design design, UnaryOperator<Part> limit, java.util.function.ToDoubleFunction<Characteristic> figure) {
        Ramp ramp = design.ramp();
        Design moved = design.withRamp(new Ramp(
                limit.apply(ramp.capacitor()),
                limit.apply(ramp.fixed()),
                ramp.pot()
                        .map(p -> new Pot(
                                limit.apply(p.track()),
                                p.endOhms(),
                                p.law(),
                                p.sense(),
                                p.shunt().map(limit)))));
        return design.trigger() instanceof UnijunctionTrigger u
                ? Edit.device(
                        moved,
                        withStandoff(u.device(), figure.applyAsDouble(u.device().standoff())))
                : moved;
    }

    private static Unijunction withStandoff(Unijunction u, double standoff) {
        return new Unijunction(
                u.id(),
                Characteristic.exactly(standoff),
                u.interbaseOhms(),
                u.interbaseDriftPerKelvin(),
                u.emitterDropVolts(),
                u.emitterDriftVoltsPerKelvin(),
                u.peakCurrentAmps(),
                u.valley(),
                u.saturation(),
                u.modulated(),
                u.baseOnePulse(),
                u.limits());
    }
}
