package clipramp.gate;

import clipramp.circuit.Design;
import clipramp.circuit.TemperatureCurve;
import clipramp.engine.NetworkOfDesign;
import java.util.Optional;
import java.util.OptionalDouble;

/** Latching and holding current as the gate circuit leaves them (DEVELOPERS.md, The circuit laws). */
public final class LatchingNeed {
    private LatchingNeed() {}

    /** I_L at a junction temperature in °C, raised by what the gate circuit bleeds away, A; empty where unknown. */
    public static OptionalDouble latchingAmps(Design design, double celsius) {
        return at(design, design.thyristor().device().latching(), celsius);
    }

    /** I_H at a junction temperature in °C, raised by what the gate circuit bleeds away, A; empty where unknown. */
    public static OptionalDouble holdingAmps(Design design, double celsius) {
        return at(design, design.thyristor().device().holding(), celsius);
    }

    /** I_H of the sheet at a junction temperature in °C, A; empty where unknown. */
    public static OptionalDouble sheetHoldingAmps(Design design, double celsius) {
        return design.thyristor().device().holding().stream()
                .mapToDouble(curve -> curve.ampsAt(celsius))
                .findFirst();
    }

    /** 0.7 V/(R_GK parallel (R_G + R1)): by how much the gate circuit raises both, A. */
    public static double bleedAmps(Design design) {
        return NetworkOfDesign.gateBleedAmps(design);
    }

    private static OptionalDouble at(Design design, Optional<TemperatureCurve> sheet, double celsius) {
        return sheet.map(curve -> OptionalDouble.of(curve.ampsAt(celsius) + bleedAmps(design)))
                .orElse(OptionalDouble.empty());
    }
}
