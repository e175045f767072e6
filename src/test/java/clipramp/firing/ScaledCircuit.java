package clipramp.firing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.Ramp;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.TriggerDemand;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.firing.RandomCircuits.Drawn;

/** The same circuit at another impedance: voltages and times stand, resistances times k, currents and capacitors over k. */
final class ScaledCircuit {
    private final double k;

    private ScaledCircuit(double k) {
        this.k = k;
    }

    static Drawn of(Drawn drawn, double k) {
        return new Drawn(
                drawn.seed(), new ScaledCircuit(k).design(drawn.design()), drawn.condition(), drawn.rampOhms() * k);
    }

    private Design design(Design d) {
        Trigger.UnijunctionTrigger trigger = (Trigger.UnijunctionTrigger) d.trigger();
        ClipSupply clip = d.clip();
        GateDrive gate = d.gate();
        return d.withStageDiodes(new StageDiodes(
                        d.stageDiodes().dropVolts(), d.stageDiodes().slopeOhms() * k))
                .withLoad(new Load.Resistor(d.load().resistanceOhms() * k))
                .withClip(new ClipSupply(
                        clip.tap(),
                        clip.rectifier(),
                        clip.diodeDropVolts(),
                        up(clip.dropper()),
                        zener(clip.zener()),
                        clip.winding()))
                .withRamp(new Ramp(
                        Part.of(d.ramp().capacitor().value() / k),
                        up(d.ramp().fixed()),
                        d.ramp().pot()))
                .withTrigger(new Trigger.UnijunctionTrigger(
                        device(trigger.device()), up(trigger.baseOne()), up(trigger.baseTwo())))
                .withGate(new GateDrive(
                        gate.coupling(),
                        up(gate.series()),
                        gate.shunt().map(this::up),
                        gate.overdrive(),
                        gate.chargeSeconds(),
                        gate.polarity(),
                        gate.transformer()))
                .withThyristor(new Thyristor(
                        thyristor(d.thyristor().device()), d.thyristor().caseToAmbientKelvinPerWatt()));
    }

    private Part up(Part part) {
        return Part.of(part.value() * k);
    }

    private Characteristic up(Characteristic ohms) {
        return Characteristic.exactly(ohms.nominal() * k);
    }

    private Characteristic down(Characteristic amps) {
        return Characteristic.exactly(amps.nominal() / k);
    }

    private Zener zener(Zener z) {
        return new Zener(
                z.id(), z.volts(), z.testCurrentAmps() / k, z.slopeOhms() * k, z.driftPerKelvin(), z.ratedWatts());
    }

    private Unijunction device(Unijunction u) {
        return new Unijunction(
                u.id(),
                u.standoff(),
                up(u.interbaseOhms()),
                u.interbaseDriftPerKelvin(),
                u.emitterDropVolts(),
                u.emitterDriftVoltsPerKelvin(),
                down(u.peakCurrentAmps()),
                new Unijunction.Valley(
                        down(u.valley().amps()), u.valley().volts(), u.valley().atVolts()),
                new Unijunction.Saturation(
                        u.saturation().volts(),
                        u.saturation().amps() / k,
                        u.saturation().atVolts()),
                u.modulated().map(m -> new Unijunction.Modulated(down(m.amps()), m.atVolts())),
                u.baseOnePulse()
                        .map(b -> new Unijunction.BaseOnePulse(
                                b.minVolts(),
                                b.typVolts(),
                                b.supplyVolts(),
                                b.capacitorFarads() / k,
                                b.baseOneOhms() * k)),
                u.limits());
    }

    private ThyristorDevice thyristor(ThyristorDevice t) {
        TriggerDemand demand = new TriggerDemand(t.gate().trigger().points().stream()
                .map(p -> new TriggerDemand.Point(p.celsius(), p.amps() / k, p.volts()))
                .toList());
        ThyristorDevice.Gate gate = t.gate();
        return new ThyristorDevice(
                t.kind(),
                t.id(),
                new ThyristorDevice.Gate(
                        gate.kneeVolts(),
                        gate.slopeOhms() * k,
                        demand,
                        gate.quadrants().entrySet().stream()
                                .collect(java.util.stream.Collectors.toMap(
                                        java.util.Map.Entry::getKey, entry -> demand)),
                        gate.nonTrigger(),
                        gate.turnOnSeconds(),
                        gate.limits()),
                t.latching().map(this::down),
                t.holding().map(this::down),
                t.turnOffSeconds(),
                t.commutating(),
                new ThyristorDevice.OnState(
                        t.onState().thresholdVolts(), t.onState().slopeOhms() * k),
                t.limits(),
                t.junctionToCaseKelvinPerWatt());
    }

    private TemperatureCurve down(TemperatureCurve curve) {
        return new TemperatureCurve(curve.points().stream()
                .map(p -> new TemperatureCurve.Point(p.celsius(), p.amps() / k))
                .toList());
    }
}
