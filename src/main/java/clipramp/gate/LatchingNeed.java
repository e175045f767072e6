package clipramp.gate;

import clipramp.circuit.Design;
import clipramp.circuit.TemperatureCurve;
import clipramp.engine.NetworkOfDesign;
import java.util.Optional;
import java.util.OptionalDouble;

/** Latching and holding current, and what the gate circuit makes of them (DEVELOPERS.md, Thyristor). */
public final class LatchingNeed {
    private LatchingNeed() {}

    /** I_L at a junction temperature in °C, raised by what the gate circuit bleeds away, A; empty where unknown. */
    public static OptionalDouble latchingAmps(Design design, double celsius) {
        return amps(design.thyristor().device().latching(), celsius, bleedAmps(design));
    }

    /** I_H of the sheet at a junction temperature in °C, A; empty where unknown. */
    public static OptionalDouble sheetHoldingAmps(Design design, double celsius) {
        return amps(design.thyristor().device().holding(), celsius, 0);
    }

    /**
     * By how much the gate circuit raises both, A: 0.7 V/(R_GK parallel (R_G + R1)), behind a pulse transformer 0.7
     * V/R_GK; 0 for a triac.
     */
    public static double bleedAmps(Design design) {
        return NetworkOfDesign.gateBleedAmps(design);
    }

    private static OptionalDouble amps(Optional<TemperatureCurve> sheet, double celsius, double more) {
        return sheet.stream().mapToDouble(curve -> curve.ampsAt(celsius) + more).findFirst();
    }
}
