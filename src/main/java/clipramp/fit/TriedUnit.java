package clipramp.fit;

import clipramp.circuit.Design;
import clipramp.engine.UnitValues;

/** One supposed unit: its plain numbers, its pot's law, and the line voltage where nobody read it. A mutable vessel. */
final class TriedUnit {
    final UnitValues values;
    /** Track share at half rotation; NaN where the design's own law stands. */
    double halfShare = Double.NaN;
    /** rms, V, for lines whose voltage was not read. */
    double lineVolts;

    TriedUnit(Design design, double celsius) {
        values = UnitValues.nominal(design);
        values.celsius = celsius;
        lineVolts = design.line().volts();
    }
}
