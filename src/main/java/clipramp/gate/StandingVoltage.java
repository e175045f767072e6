package clipramp.gate;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.Trigger;
import clipramp.engine.ClippedSupply;
import clipramp.engine.Network;
import clipramp.engine.UnitValues;

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
    /** No base bar's current reaches the gate: a transformer, or a programmable device, whose cathode is off. */
    private static final StandingVoltage NONE = new StandingVoltage(0, Double.NaN, Double.NaN, Double.NaN);

    /**
     * The highest standing gate voltage of a design at a condition.
     *
     * @throws clipramp.circuit.RefusedCircuit where the device's data contradict themselves
     */
    public static StandingVoltage of(Design design, Condition condition) {
        if (design.gate().coupling() == Coupling.TRANSFORMER
                || !(design.trigger() instanceof Trigger.UnijunctionTrigger trigger)) {
            return NONE;
        }
        UnitValues highest = UnitValues.nominal(design).at(condition);
        highest.zenerVolts = design.clip().zener().volts().highest();
        Network network = new Network();
        // What the ramp draws from the supply would lower it a little: left out, on the safe side.
        highest.fill(network, Double.POSITIVE_INFINITY);
        Characteristic interbase = trigger.device().interbaseOhms();
        network.interbaseOhms *= interbase.lowest() / interbase.nominal();
        network.derive();
        double supply = ClippedSupply.crestVolts(design, condition, network);
        return new StandingVoltage(
                network.standingGateShare() * supply,
                supply,
                network.interbaseOhms,
                network.quiescentShare() / network.standingSiemens());
    }
}
