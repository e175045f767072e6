package clipramp.engine;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.TriggerDemand;
import java.util.Arrays;
import java.util.Comparator;

/** Reduces a design at a condition to the numbers of its network, nominal parts. */
public final class NetworkOfDesign {
    private NetworkOfDesign() {}

    /**
     * The network of the nominal unit.
     *
     * @param design the design
     * @param condition line and temperature; parts are at the ambient temperature
     * @param rampOhms R_E, ohm, above 0
     * @throws RefusedCircuit where the device's data contradict themselves
     */
    public static Network of(Design design, Condition condition, double rampOhms) {
        Network network = new Network();
        UnitValues.nominal(design).at(condition).fill(network, rampOhms);
        return network;
    }

    /**
     * Trigger data that govern: an SCR's own, or the worse of the two quadrants that a triac's pulse polarity uses
     * (a quadrant that the sheet lacks is passed over here; the margins fail it).
     *
     * @param device the thyristor
     * @param polarity sign of the pulse at its gate
     * @param celsius junction temperature at which the larger I_GT is the worse, °C
     */
    public static TriggerDemand triggerDemand(ThyristorDevice device, GateDrive.Polarity polarity, double celsius) {
        return Arrays.stream(GateSide.demands(device, polarity))
                .max(Comparator.comparingDouble(demand -> demand.ampsAt(celsius)))
                .orElseThrow();
    }

    /**
     * What a conducting SCR's gate junction loses to the gate circuit, A: it raises latching and holding current by as much
     * (DEVELOPERS.md, Thyristor). 0 for a triac.
     */
    public static double gateBleedAmps(Design design) {
        GateDrive gate = design.gate();
        double shuntSiemens = gate.shunt().map(shunt -> 1 / shunt.value()).orElse(0.0);
        return GateSide.bleedAmps(
                design.thyristor().device().kind(),
                gate.transformer().isPresent(),
                gate.series().value() + design.trigger().baseOne().value(),
                shuntSiemens);
    }
}
