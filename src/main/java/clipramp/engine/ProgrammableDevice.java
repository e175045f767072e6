package clipramp.engine;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * A programmable unijunction transistor with its divider as numbers. Offset, peak-point and valley current follow the
 * gate resistance R_G = R_A parallel R_B: the offset linearly in log R_G, the currents as powers of it, through the data
 * sheet's points and along the end slopes beyond them (DEVELOPERS.md, Peak point; The conducting device).
 */
public final class ProgrammableDevice {
    /** Supply that data sheets give the valley current at, V. */
    static final double VALLEY_VOLTS = 10;

    private ProgrammableDevice() {}

    /** R_A parallel R_B, ohm. */
    public static double gateOhms(ProgrammableTrigger trigger) {
        double upper = trigger.upper().value();
        double lower = trigger.lower().value();
        return upper * lower / (upper + lower);
    }

    /**
     * r_on = (V_F - 0.6 V)/I_F, ohm.
     *
     * @throws RefusedCircuit if the forward voltage leaves nothing
     */
    static double onOhms(double forwardVolts, double forwardAmps, String deviceId) {
        double ohms = (forwardVolts - Network.PROGRAMMABLE_DROP_VOLTS) / forwardAmps;
        if (!(ohms > 0)) {
            throw new RefusedCircuit(
                    "trigger.device.forward",
                    "the forward voltage of " + deviceId + " is " + forwardVolts + " V; it must exceed "
                            + Network.PROGRAMMABLE_DROP_VOLTS + " V.");
        }
        return ohms;
    }

    /**
     * Peak-point voltage above the divider's.
     *
     * @param device the device
     * @param gateOhms R_G, ohm, above 0
     * @param pick which figure of the sheet's is asked for, such as {@link Characteristic#nominal}
     * @return V
     */
    public static double offsetVolts(
            ProgrammableUnijunction device, double gateOhms, ToDoubleFunction<Characteristic> pick) {
        return along(device.offsetVolts(), gateOhms, pick);
    }

    /**
     * A tabulated current.
     *
     * @param table peak-point or valley current against gate resistance
     * @param gateOhms R_G, ohm, above 0
     * @param pick which figure of the sheet's is asked for, above 0
     * @return A
     */
    public static double amps(List<AtGateResistance> table, double gateOhms, ToDoubleFunction<Characteristic> pick) {
        return Math.exp(along(table, gateOhms, c -> Math.log(pick.applyAsDouble(c))));
    }

    /** Straight lines over log R_G, the end slopes extended. */
    private static double along(List<AtGateResistance> table, double gateOhms, ToDoubleFunction<Characteristic> pick) {
        if (table.size() == 1) {
            return pick.applyAsDouble(table.get(0).value());
        }
        int upper = 1;
        while (upper < table.size() - 1 && table.get(upper).gateOhms() < gateOhms) {
            upper++;
        }
        AtGateResistance a = table.get(upper - 1);
        AtGateResistance b = table.get(upper);
        double share = Math.log(gateOhms / a.gateOhms()) / Math.log(b.gateOhms() / a.gateOhms());
        double low = pick.applyAsDouble(a.value());
        return low + share * (pick.applyAsDouble(b.value()) - low);
    }
}
