package clipramp.engine;

import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.Unijunction;

/**
 * The saturated emitter line I_E = (V_EB1 - V_D - xi V_S)/r_on, drawn through data-sheet points at 25 °C.
 *
 * <p>Through the valley point (I_V, V_V at V_spec) it always goes, both scaled with the supply. Its second point is the
 * saturation voltage, or, where the sheet has it, the base-one pulse V_OB1 in its test circuit: the valley voltage is on
 * no sheet, and a line through the saturation point alone gives less pulse than the sheet's minimum.
 */
final class EmitterLine {
    private EmitterLine() {}

    /**
     * r_on, ohm.
     *
     * @param interbaseOhms R_BB at 25 °C, ohm
     * @param modulatedOhms R_B2on at 25 °C, ohm
     * @throws RefusedCircuit if the data give no rising line
     */
    static double slopeOhms(Unijunction device, double interbaseOhms, double modulatedOhms) {
        double slope = device.baseOnePulse()
                .map(pulse -> fromBaseOnePulse(device, pulse, interbaseOhms, modulatedOhms))
                .orElseGet(() -> fromSaturation(device));
        if (!(slope > 0) || Double.isInfinite(slope)) {
            throw new RefusedCircuit(
                    "trigger.device",
                    "the saturated emitter line of " + device.id() + " comes out with a slope of " + slope
                            + " Ω; it must rise. Check saturation, valley and base-one-pulse against the data sheet.");
        }
        return slope;
    }

    /** xi, the line's intercept per volt of supply. */
    static double intercept(Unijunction device, double slopeOhms) {
        var valley = device.valley();
        return (valley.volts().nominal()
                        - slopeOhms * valley.amps().nominal()
                        - device.emitterDropVolts().nominal())
                / valley.atVolts();
    }

    private static double fromSaturation(Unijunction device) {
        var valley = device.valley();
        var saturation = device.saturation();
        double drop = device.emitterDropVolts().nominal();
        double scale = saturation.atVolts() / valley.atVolts();
        return (saturation.volts().nominal() - drop - scale * (valley.volts().nominal() - drop))
                / (saturation.amps() - valley.amps().nominal() * scale);
    }

    /**
     * In the test circuit the supply feeds base two directly and the capacitor fires at its peak point; the pulse is
     * highest at that instant. Base one's current law there is linear in r_on.
     */
    private static double fromBaseOnePulse(
            Unijunction device, Unijunction.BaseOnePulse pulse, double interbaseOhms, double modulatedOhms) {
        double supply = pulse.supplyVolts();
        double drop = device.emitterDropVolts().nominal();
        double share = (pulse.baseOneOhms() + device.standoff().nominal() * interbaseOhms)
                / (interbaseOhms + pulse.baseOneOhms());
        double peak = share * supply + drop;
        double out = pulse.nominalVolts();
        double emitter = out / pulse.baseOneOhms() - (supply - out) / modulatedOhms;
        var valley = device.valley();
        double scale = supply / valley.atVolts();
        return (peak - out - drop - scale * (valley.volts().nominal() - drop))
                / (emitter - scale * valley.amps().nominal());
    }
}
