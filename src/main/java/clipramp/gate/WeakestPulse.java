package clipramp.gate;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Unijunction.BaseOnePulse;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The design that a drive margin is computed on: the weakest trigger device of its type, driving a gate that stays at
 * V_GT whatever it is given (DEVELOPERS.md, Margins). Its pulse is solved by the same engine as any other, so nothing is
 * approximated.
 */
public final class WeakestPulse {
    /** Slope of the gate held at V_GT: a tenth of a volt at ten amperes, nothing beside any gate drive. */
    private static final double HELD_SLOPE_OHMS = 0.01;

    private WeakestPulse() {}

    /**
     * The same design with the weakest trigger device and a gate held at a voltage.
     *
     * @param design the design
     * @param gateVolts voltage that the gate is held at once it conducts, to cathode or main terminal one, V
     */
    public static Design intoGateHeldAt(Design design, double gateVolts) {
        Design weakest = withWeakestDevice(design);
        ThyristorDevice device = weakest.thyristor().device();
        return weakest.withThyristor(new Thyristor(
                device.withGate(device.gate().withJunction(gateVolts, HELD_SLOPE_OHMS)),
                weakest.thyristor().caseToAmbientKelvinPerWatt()));
    }

    /**
     * The same design with the weakest trigger device of its type: calibrated on the smallest V_OB1 of the sheet, or of
     * the largest forward voltage (programmable). Where the sheet gives neither, the design as it is.
     */
    static Design withWeakestDevice(Design design) {
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger) {
            return trigger.device()
                    .baseOnePulse()
                    .filter(pulse -> pulse.minVolts().isPresent())
                    .map(pulse -> design.withTrigger(new Trigger.UnijunctionTrigger(
                            onMinimum(trigger.device(), pulse), trigger.baseOne(), trigger.baseTwo())))
                    .orElse(design);
        }
        Trigger.ProgrammableTrigger trigger = (Trigger.ProgrammableTrigger) design.trigger();
        return design.withTrigger(new Trigger.ProgrammableTrigger(
                withLargestForwardVoltage(trigger.device()), trigger.baseOne(), trigger.upper(), trigger.lower()));
    }

    private static Unijunction onMinimum(Unijunction device, BaseOnePulse pulse) {
        return device.withBaseOnePulse(Optional.of(new BaseOnePulse(
                pulse.minVolts(),
                OptionalDouble.empty(),
                pulse.supplyVolts(),
                pulse.capacitorFarads(),
                pulse.baseOneOhms())));
    }

    private static ProgrammableUnijunction withLargestForwardVoltage(ProgrammableUnijunction device) {
        return new ProgrammableUnijunction(
                device.id(),
                device.offsetVolts(),
                Characteristic.exactly(device.forwardVolts().highest()),
                device.forwardAmps(),
                device.peakCurrentAmps(),
                device.valleyCurrentAmps(),
                device.limits());
    }
}
