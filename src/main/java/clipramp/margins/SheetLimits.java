package clipramp.margins;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.Trigger;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The same design with a trigger device at one limit of its sheet. */
final class SheetLimits {
    /** Anode to cathode of a conducting programmable device at its valley, V: one junction. */
    private static final double PROGRAMMABLE_VALLEY_VOLTS = 0.6;

    private SheetLimits() {}

    /** With the device that asks for the largest peak-point current. */
    static Design highestPeakCurrent(Design design) {
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction device = trigger.device();
            return design.withTrigger(with(
                    trigger,
                    unijunction(
                            device,
                            Characteristic.exactly(device.peakCurrentAmps().highest()),
                            device.valley())));
        }
        ProgrammableTrigger trigger = (ProgrammableTrigger) design.trigger();
        ProgrammableUnijunction device = trigger.device();
        return design.withTrigger(with(
                trigger,
                programmable(
                        device, at(device.peakCurrentAmps(), Characteristic::highest), device.valleyCurrentAmps())));
    }

    /** With the device that stays on with the smallest current. */
    static Design lowestValleyCurrent(Design design) {
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction device = trigger.device();
            Unijunction.Valley valley = new Unijunction.Valley(
                    Characteristic.exactly(device.valley().amps().lowest()),
                    device.valley().volts(),
                    device.valley().atVolts());
            return design.withTrigger(with(trigger, unijunction(device, device.peakCurrentAmps(), valley)));
        }
        ProgrammableTrigger trigger = (ProgrammableTrigger) design.trigger();
        ProgrammableUnijunction device = trigger.device();
        return design.withTrigger(with(
                trigger,
                programmable(
                        device, device.peakCurrentAmps(), at(device.valleyCurrentAmps(), Characteristic::lowest))));
    }

    /** Emitter voltage at the valley with a supply in V: V_D + (V_V - V_D) V_S/V_spec; base one's own is left out. */
    static double valleyVolts(Design design, double supplyVolts) {
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction device = trigger.device();
            double drop = device.emitterDropVolts().nominal();
            return drop
                    + (device.valley().volts().nominal() - drop)
                            * supplyVolts
                            / device.valley().atVolts();
        }
        return PROGRAMMABLE_VALLEY_VOLTS;
    }

    private static Trigger with(UnijunctionTrigger trigger, Unijunction device) {
        return new UnijunctionTrigger(device, trigger.baseOne(), trigger.baseTwo());
    }

    private static Trigger with(ProgrammableTrigger trigger, ProgrammableUnijunction device) {
        return new ProgrammableTrigger(device, trigger.baseOne(), trigger.upper(), trigger.lower());
    }

    private static Unijunction unijunction(Unijunction device, Characteristic peakCurrent, Unijunction.Valley valley) {
        return new Unijunction(
                device.id(),
                device.standoff(),
                device.interbaseOhms(),
                device.interbaseDriftPerKelvin(),
                device.emitterDropVolts(),
                device.emitterDriftVoltsPerKelvin(),
                peakCurrent,
                valley,
                device.saturation(),
                device.modulated(),
                device.baseOnePulse(),
                device.limits());
    }

    private static ProgrammableUnijunction programmable(
            ProgrammableUnijunction device, List<AtGateResistance> peak, List<AtGateResistance> valley) {
        return new ProgrammableUnijunction(
                device.id(),
                device.offsetVolts(),
                device.forwardVolts(),
                device.forwardAmps(),
                peak,
                valley,
                device.limits());
    }

    private static List<AtGateResistance> at(List<AtGateResistance> table, ToDoubleFunction<Characteristic> limit) {
        return table.stream()
                .map(row ->
                        new AtGateResistance(row.gateOhms(), Characteristic.exactly(limit.applyAsDouble(row.value()))))
                .toList();
    }
}
