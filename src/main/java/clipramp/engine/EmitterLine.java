package clipramp.engine;

import clipramp.circuit.RefusedCircuit;
import clipramp.units.QuantityText;
import clipramp.units.Unit;

/**
 * The saturated emitter line I_E = (V_EB1 - V_D - xi V_S)/r_on, drawn through data-sheet points at 25 °C.
 *
 * <p>Through the valley point (I_V, V_V at V_spec) it always goes, both scaled with the supply. Its second point is the
 * saturation voltage, or, where the sheet has it, the base-one pulse V_OB1 in its test circuit: the valley voltage is on
 * no sheet, and a line through the saturation point alone gives less pulse than the sheet's minimum (DEVELOPERS.md, The
 * conducting device).
 */
final class EmitterLine {
    private EmitterLine() {}

    /**
     * r_on, ohm.
     *
     * @throws RefusedCircuit if the data give no rising line
     */
    static double slopeOhms(UnitValues unit) {
        double slope = Double.isNaN(unit.baseOnePulseVolts) ? fromSaturation(unit) : fromBaseOnePulse(unit);
        if (!(slope > 0) || Double.isInfinite(slope)) {
            throw new RefusedCircuit(
                    "trigger.device",
                    "the saturated emitter line of " + unit.deviceId + " comes out with a slope of "
                            + QuantityText.format(slope, Unit.OHM)
                            + "; it must rise. Check saturation, valley and base-one-pulse against the data sheet.");
        }
        return slope;
    }

    /** xi, the line's intercept per volt of supply. */
    static double intercept(UnitValues unit, double slopeOhms) {
        return (unit.valleyVolts - slopeOhms * unit.valleyAmps - unit.emitterDropVolts) / unit.valleyAtVolts;
    }

    private static double fromSaturation(UnitValues unit) {
        double drop = unit.emitterDropVolts;
        double scale = unit.saturationAtVolts / unit.valleyAtVolts;
        return (unit.saturationVolts - drop - scale * (unit.valleyVolts - drop))
                / (unit.saturationAmps - unit.valleyAmps * scale);
    }

    /**
     * In the test circuit the supply feeds base two directly and the capacitor fires at its peak point; the pulse is
     * highest at that instant. Base one's current law there is linear in r_on.
     */
    private static double fromBaseOnePulse(UnitValues unit) {
        double supply = unit.pulseSupplyVolts;
        double drop = unit.emitterDropVolts;
        double test = unit.pulseBaseOneOhms;
        double share = (test + unit.standoff * unit.interbaseOhms) / (unit.interbaseOhms + test);
        double peak = share * supply + drop;
        double out = unit.baseOnePulseVolts;
        double emitter = out / test - (supply - out) / unit.modulatedOhms(unit.interbaseOhms);
        double scale = supply / unit.valleyAtVolts;
        return (peak - out - drop - scale * (unit.valleyVolts - drop)) / (emitter - scale * unit.valleyAmps);
    }
}
