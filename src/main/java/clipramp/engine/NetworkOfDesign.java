package clipramp.engine;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Part;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.Trigger;
import clipramp.circuit.TriggerDemand;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import java.util.Comparator;
import java.util.Objects;

/** Reduces a design at a condition to the numbers of its network, nominal parts. */
public final class NetworkOfDesign {
    /** Temperature that data-sheet figures hold at, °C. */
    private static final double SHEET_CELSIUS = 25;

    /** Drop of a conducting SCR's own gate junction, which bleeds latching and holding current away, V. */
    private static final double GATE_BLEED_VOLTS = 0.7;

    private NetworkOfDesign() {}

    /**
     * @param design the design
     * @param condition line and temperature; parts are at the ambient temperature
     * @param rampOhms R_E, ohm
     * @throws RefusedCircuit where the device's data contradict themselves or the circuit is not computed
     */
    public static Network of(Design design, Condition condition, double rampOhms) {
        Network n = new Network();
        n.dropperOhms = design.clip().dropper().value();
        zener(n, design.clip().zener(), condition);
        n.rampOhms = rampOhms;
        n.capacitorFarads = design.ramp().capacitor().value();
        n.baseOneOhms = design.trigger().baseOne().value();
        if (design.trigger() instanceof Trigger.ProgrammableTrigger programmable) {
            ProgrammableDevice.fill(n, programmable);
        } else if (design.trigger() instanceof Trigger.UnijunctionTrigger unijunction) {
            n.baseTwoOhms = unijunction.baseTwo().value();
            device(n, unijunction.device(), condition);
        }
        gate(n, design, condition);
        n.derive();
        return n;
    }

    private static void zener(Network n, Zener zener, Condition condition) {
        double volts = zener.volts().nominal() * (1 + zener.driftPerKelvin() * warmth(condition));
        n.zenerSlopeOhms = zener.slopeOhms();
        n.zenerKneeVolts = volts - zener.slopeOhms() * zener.testCurrentAmps();
    }

    private static double warmth(Condition condition) {
        return condition.celsius() - SHEET_CELSIUS;
    }

    private static void device(Network n, Unijunction device, Condition condition) {
        double warmth = warmth(condition);
        double interbase25 = device.interbaseOhms().nominal();
        n.interbaseOhms = interbase25 * (1 + device.interbaseDriftPerKelvin().nominal() * warmth);
        n.standoff = device.standoff().nominal();
        n.emitterDropVolts = device.emitterDropVolts().nominal()
                + device.emitterDriftVoltsPerKelvin().nominal() * warmth;
        n.peakCurrentAmps = device.peakCurrentAmps().nominal();
        n.modulatedOhms = device.modulated()
                .map(m -> m.atVolts() / m.amps().nominal())
                .orElse((1 - n.standoff) * n.interbaseOhms);
        double modulated25 =
                device.modulated().map(m -> m.atVolts() / m.amps().nominal()).orElse((1 - n.standoff) * interbase25);
        n.onOhms = EmitterLine.slopeOhms(device, interbase25, modulated25);
        n.onIntercept = EmitterLine.intercept(device, n.onOhms);
        n.valleySiemens = device.valley().amps().nominal() / device.valley().atVolts();
    }

    private static void gate(Network n, Design design, Condition condition) {
        GateDrive drive = design.gate();
        drive.transformer()
                .ifPresent(
                        transformer -> transformer(n, transformer, design.clip().diodeDropVolts()));
        ThyristorDevice thyristor = design.thyristor().device();
        n.gateSeriesOhms = drive.series().value();
        n.gateShuntSiemens = drive.shunt().map(s -> 1 / s.value()).orElse(0.0);
        n.gateKneeVolts = thyristor.gate().kneeVolts();
        n.gateSlopeOhms = thyristor.gate().slopeOhms();
        n.triggerAmps =
                triggerDemand(thyristor, drive.polarity(), condition.celsius()).ampsAt(condition.celsius());
        n.turnOnSeconds = thyristor.gate().turnOnSeconds().orElse(0);
        n.latchingAmps = thyristor
                .latching()
                .map(curve -> curve.ampsAt(condition.celsius()) + gateBleedAmps(design))
                .orElse(0.0);
    }

    private static void transformer(Network n, PulseTransformer transformer, double diodeVolts) {
        n.transformerCoupled = true;
        n.turnsRatio = transformer.ratio();
        n.secondaries = transformer.secondaries();
        n.magnetisingHenries = transformer.magnetisingHenries();
        n.primaryOhms = transformer.primaryOhms();
        n.secondaryOhms = transformer.secondaryOhms();
        n.clampVolts = transformer.clampDiode() ? diodeVolts : Double.POSITIVE_INFINITY;
    }

    /**
     * Trigger data that govern: an SCR's own, or the worse of the two quadrants that a triac's pulse polarity uses
     * (a quadrant that the sheet lacks is passed over here; the margins fail it).
     */
    public static TriggerDemand triggerDemand(ThyristorDevice device, GateDrive.Polarity polarity, double celsius) {
        if (device.kind() == ThyristorDevice.Kind.SCR) {
            return device.gate().trigger();
        }
        return ThyristorDevice.quadrantsOf(polarity).stream()
                .map((Quadrant q) -> device.gate().quadrants().get(q))
                .filter(Objects::nonNull)
                .max(Comparator.comparingDouble(d -> d.ampsAt(celsius)))
                .orElse(device.gate().trigger());
    }

    /**
     * What a conducting SCR's gate junction loses to the gate circuit, beyond the sheet's own gate-cathode resistor: 0.7
     * V over R_GK parallel (R_G + R1, or the secondary winding), A. It raises latching and holding current. A triac's terminals are too well joined inside to notice.
     */
    public static double gateBleedAmps(Design design) {
        if (design.thyristor().device().kind() == ThyristorDevice.Kind.TRIAC) {
            return 0;
        }
        double path =
                design.gate().series().value() + design.trigger().baseOne().value();
        double shuntSiemens =
                design.gate().shunt().map(Part::value).map(ohms -> 1 / ohms).orElse(0.0);
        return GATE_BLEED_VOLTS * (1 / path + shuntSiemens);
    }
}
