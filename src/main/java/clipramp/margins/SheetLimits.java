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

    /** The device that asks for the largest peak-point current. */
    static Design highestPeakCurrent(Design design) {
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction d = trigger.device();
            return design.withTrigger(with(
                    trigger,
                    unijunction(d, Characteristic.exactly(d.peakCurrentAmps().highest()), d.valley())));
        }
        ProgrammableTrigger trigger = (ProgrammableTrigger) design.trigger();
        ProgrammableUnijunction d = trigger.device();
        return design.withTrigger(with(
                trigger, programmable(d, at(d.peakCurrentAmps(), Characteristic::highest), d.valleyCurrentAmps())));
    }

    /** The device that stays on with the smallest current. */
    static Design lowestValleyCurrent(Design design) {
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction d = trigger.device();
            Unijunction.Valley valley = new Unijunction.Valley(
                    Characteristic.exactly(d.valley().amps().lowest()),
                    d.valley().volts(),
                    d.valley().atVolts());
            return design.withTrigger(with(trigger, unijunction(d, d.peakCurrentAmps(), valley)));
        }
        ProgrammableTrigger trigger = (ProgrammableTrigger) design.trigger();
        ProgrammableUnijunction d = trigger.device();
        return design.withTrigger(
                with(trigger, programmable(d, d.peakCurrentAmps(), at(d.valleyCurrentAmps(), Characteristic::lowest))));
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

    private static Unijunction unijunction(Unijunction d, Characteristic peakCurrent, Unijunction.Valley valley) {
        return new Unijunction(
                d.id(),
                d.standoff(),
                d.interbaseOhms(),
                d.interbaseDriftPerKelvin(),
                d.emitterDropVolts(),
                d.emitterDriftVoltsPerKelvin(),
                peakCurrent,
                valley,
                d.saturation(),
                d.modulated(),
                d.baseOnePulse(),
                d.limits());
    }

    private static ProgrammableUnijunction programmable(
            ProgrammableUnijunction d, List<AtGateResistance> peak, List<AtGateResistance> valley) {
        return new ProgrammableUnijunction(
                d.id(), d.offsetVolts(), d.forwardVolts(), d.forwardAmps(), peak, valley, d.limits());
    }

    private static List<AtGateResistance> at(List<AtGateResistance> table, ToDoubleFunction<Characteristic> limit) {
        return table.stream()
                .map(row ->
                        new AtGateResistance(row.gateOhms(), Characteristic.exactly(limit.applyAsDouble(row.value()))))
                .toList();
    }
}
