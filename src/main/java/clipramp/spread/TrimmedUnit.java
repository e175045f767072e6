package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.engine.UnitValues;

/** A unit of a design with trimmers after its trimmers have been set, as the units of a spread are. */
public final class TrimmedUnit {
    private TrimmedUnit() {}

    /**
     * The unit with plain resistors where its trimmers are; a design without trimmers gives the unit back.
     *
     * @param nominal the design whose nominal firing angles the unit is set to
     * @param unit the same design with exact part and device values of its own
     * @return the unit, each trimmer a resistor of what it was set to
     */
    public static Design of(Design nominal, Design unit) {
        if (nominal.ramp().trimmers().isNone()) {
            return unit;
        }
        UnitValues values = UnitValues.nominal(unit);
        new UnitSolver(nominal).prepare(values);
        return unit.withRamp(DrawnDesign.ramp(unit.ramp(), values));
    }
}
