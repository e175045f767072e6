package clipramp.gate;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.Part;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;

/**
 * The gate's voltage between pulses at its highest: smallest R_BB of the type, highest zener of the type, crest of the
 * line. V_B1q = V_S R1p/(R2 + R_BB + R1p), R1p = R1 parallel (R_G + R_GK), and the gate sees R_GK's share of it
 * (DEVELOPERS.md, The clipped supply, Peak point).
 *
 * @param volts gate to cathode, V; 0 where no base bar stands in the way
 * @param supplyVolts V_S that it was computed with, V to common; NaN likewise
 * @param interbaseOhms R_BB that it was computed with, ohm; NaN likewise
 * @param baseOneOhms R1p, ohm; NaN likewise
 */
public record StandingVoltage(double volts, double supplyVolts, double interbaseOhms, double baseOneOhms) {
    private static final double SHEET_CELSIUS = 25;

    /** No base bar's current reaches the gate: a transformer, or a programmable device, whose cathode is off. */
    private static final StandingVoltage NONE = new StandingVoltage(0, Double.NaN, Double.NaN, Double.NaN);

    /** The highest standing gate voltage of a design at a condition. */
    public static StandingVoltage of(Design design, Condition condition) {
        if (design.gate().coupling() == Coupling.TRANSFORMER
                || !(design.trigger() instanceof Trigger.UnijunctionTrigger trigger)) {
            return NONE;
        }
        double warmth = condition.celsius() - SHEET_CELSIUS;
        Unijunction device = trigger.device();
        double interbase = device.interbaseOhms().lowest()
                * (1 + device.interbaseDriftPerKelvin().nominal() * warmth);
        double shunt = design.gate().shunt().map(Part::value).orElse(Double.POSITIVE_INFINITY);
        double series = design.gate().series().value();
        double base = 1 / (1 / trigger.baseOne().value() + 1 / (series + shunt));
        double bar = trigger.baseTwo().value() + interbase + base;
        double supply = crestSupply(design, condition, 1 / bar);
        double divided = Double.isInfinite(shunt) ? 1 : shunt / (series + shunt);
        return new StandingVoltage(supply * base / bar * divided, supply, interbase, base);
    }

    private static double crestSupply(Design design, Condition condition, double loadSiemens) {
        double ratio = design.clip().winding().map(w -> w.ratio()).orElse(1.0);
        double crest = design.line().crestVolts(condition.lineVolts());
        double source = crest * ratio
                - design.clip().rectifier().diodesInPath() * design.clip().diodeDropVolts();
        Zener zener = design.clip().zener();
        double warmth = condition.celsius() - SHEET_CELSIUS;
        double knee = zener.volts().highest() * (1 + zener.driftPerKelvin() * warmth)
                - zener.slopeOhms() * zener.testCurrentAmps();
        double dropperSiemens = 1 / design.clip().dropper().value();
        double unclipped = source * dropperSiemens / (dropperSiemens + loadSiemens);
        double zenerSiemens = 1 / zener.slopeOhms();
        double clipped =
                (source * dropperSiemens + knee * zenerSiemens) / (dropperSiemens + zenerSiemens + loadSiemens);
        return Math.max(0, unclipped > knee ? clipped : unclipped);
    }
}
