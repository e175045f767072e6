package clipramp.files;

import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.Limits;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.TriggerDemand;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Winding;
import clipramp.circuit.Zener;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.List;
import java.util.Optional;

/** Devices written in place, with every figure. */
final class DeviceText {
    static final String IN_PLACE = "in place";

    private DeviceText() {}

    private static FlowText named(String kind, String id) {
        FlowText text = new FlowText().raw("kind", kind);
        return id.equals(IN_PLACE) ? text : text.word("id", id);
    }

    static FlowText winding(Winding winding) {
        return new FlowText()
                .quantity("primary", winding.primaryVolts(), Unit.VOLT)
                .quantity("secondary", winding.secondaryVolts(), Unit.VOLT)
                .raw("phase", winding.opposite() ? "opposite" : "same")
                .quantity("lag", winding.lagRad(), Unit.ANGLE);
    }

    static FlowText zener(Zener zener) {
        return named("zener", zener.id())
                .characteristic("voltage", zener.volts(), Unit.VOLT)
                .quantity("test-current", zener.testCurrentAmps(), Unit.AMPERE)
                .quantity("slope", zener.slopeOhms(), Unit.OHM)
                .quantity("drift", zener.driftPerKelvin(), Unit.PER_KELVIN)
                .optional("power", zener.ratedWatts(), Unit.WATT);
    }

    static FlowText unijunction(Unijunction u) {
        FlowText text = named("unijunction", u.id())
                .characteristic("standoff", u.standoff(), Unit.FRACTION)
                .characteristic("interbase", u.interbaseOhms(), Unit.OHM)
                .characteristic("interbase-drift", u.interbaseDriftPerKelvin(), Unit.PER_KELVIN)
                .characteristic("emitter-drop", u.emitterDropVolts(), Unit.VOLT)
                .characteristic("emitter-drift", u.emitterDriftVoltsPerKelvin(), Unit.VOLT_PER_KELVIN)
                .characteristic("peak-current", u.peakCurrentAmps(), Unit.AMPERE)
                .mapping("valley", valley(u.valley()))
                .mapping("saturation", saturation(u.saturation()));
        u.modulated().ifPresent(modulated -> text.mapping("modulated", modulated(modulated)));
        u.baseOnePulse().ifPresent(pulse -> text.mapping("base-one-pulse", baseOnePulse(pulse)));
        return text.mapping("limits", limits(u.limits()));
    }

    private static FlowText valley(Unijunction.Valley valley) {
        return new FlowText()
                .characteristic("current", valley.amps(), Unit.AMPERE)
                .characteristic("voltage", valley.volts(), Unit.VOLT)
                .quantity("at", valley.atVolts(), Unit.VOLT);
    }

    private static FlowText saturation(Unijunction.Saturation saturation) {
        return new FlowText()
                .characteristic("voltage", saturation.volts(), Unit.VOLT)
                .quantity("current", saturation.amps(), Unit.AMPERE)
                .quantity("at", saturation.atVolts(), Unit.VOLT);
    }

    private static FlowText modulated(Unijunction.Modulated modulated) {
        return new FlowText()
                .characteristic("current", modulated.amps(), Unit.AMPERE)
                .quantity("at", modulated.atVolts(), Unit.VOLT);
    }

    private static FlowText baseOnePulse(Unijunction.BaseOnePulse pulse) {
        return new FlowText()
                .optional("min", pulse.minVolts(), Unit.VOLT)
                .optional("typ", pulse.typVolts(), Unit.VOLT)
                .quantity("supply", pulse.supplyVolts(), Unit.VOLT)
                .quantity("capacitor", pulse.capacitorFarads(), Unit.FARAD)
                .quantity("base-one", pulse.baseOneOhms(), Unit.OHM);
    }

    private static FlowText limits(Unijunction.Limits limits) {
        return new FlowText()
                .optional("interbase", limits.interbaseVolts(), Unit.VOLT)
                .optional("emitter-peak", limits.emitterPeakAmps(), Unit.AMPERE)
                .optional("emitter-rms", limits.emitterRmsAmps(), Unit.AMPERE)
                .optional("emitter-reverse", limits.emitterReverseVolts(), Unit.VOLT)
                .mapping(
                        "capacitor",
                        new FlowText()
                                .optional("capacitance", limits.capacitorFarads(), Unit.FARAD)
                                .optional("voltage", limits.capacitorVolts(), Unit.VOLT))
                .optional("power", limits.watts(), Unit.WATT)
                .optional("derating", limits.deratingWattsPerKelvin(), Unit.WATT_PER_KELVIN);
    }

    static FlowText programmable(ProgrammableUnijunction p) {
        ProgrammableUnijunction.Limits limits = p.limits();
        return named("programmable-unijunction", p.id())
                .raw("offset", table(p.offsetVolts(), Unit.VOLT))
                .mapping(
                        "forward",
                        new FlowText()
                                .characteristic("voltage", p.forwardVolts(), Unit.VOLT)
                                .quantity("current", p.forwardAmps(), Unit.AMPERE))
                .raw("peak-current", table(p.peakCurrentAmps(), Unit.AMPERE))
                .raw("valley-current", table(p.valleyCurrentAmps(), Unit.AMPERE))
                .mapping(
                        "limits",
                        new FlowText()
                                .optional("anode", limits.anodeVolts(), Unit.VOLT)
                                .optional("gate-reverse", limits.gateReverseVolts(), Unit.VOLT)
                                .optional("mean", limits.meanAmps(), Unit.AMPERE)
                                .optional("peak", limits.peakAmps(), Unit.AMPERE)
                                .optional("peak-for", limits.peakSeconds(), Unit.SECOND)
                                .optional("power", limits.watts(), Unit.WATT)
                                .optional("derating", limits.deratingWattsPerKelvin(), Unit.WATT_PER_KELVIN)
                                .optional("discharge-energy", limits.dischargeJoules(), Unit.JOULE));
    }

    private static String table(List<AtGateResistance> rows, Unit unit) {
        return FlowText.list(rows.stream()
                .map(r -> new FlowText()
                        .quantity("gate-resistance", r.gateOhms(), Unit.OHM)
                        .characteristic("value", r.value(), unit)
                        .text())
                .toList());
    }

    static FlowText thyristor(ThyristorDevice device) {
        FlowText text = named(device.kind().word(), device.id()).mapping("gate", gate(device.gate()));
        curve(text, "latching", device.latching());
        curve(text, "holding", device.holding());
        text.optional("turn-off", device.turnOffSeconds(), Unit.SECOND);
        device.commutating()
                .ifPresent(c -> text.mapping(
                        "commutating",
                        new FlowText()
                                .quantity("dv-dt", c.voltsPerSecond(), Unit.VOLT_PER_SECOND)
                                .raw("at", DesignWriter.celsius(c.celsius()))));
        return text.mapping(
                        "on-state",
                        new FlowText()
                                .quantity("threshold", device.onState().thresholdVolts(), Unit.VOLT)
                                .quantity("slope", device.onState().slopeOhms(), Unit.OHM))
                .mapping("limits", limits(device.limits()))
                .optional("junction-to-case", device.junctionToCaseKelvinPerWatt(), Unit.KELVIN_PER_WATT);
    }

    private static FlowText gate(ThyristorDevice.Gate gate) {
        FlowText text = new FlowText()
                .quantity("knee", gate.kneeVolts(), Unit.VOLT)
                .quantity("slope", gate.slopeOhms(), Unit.OHM)
                .raw("trigger", points(gate.trigger()));
        FlowText quadrants = new FlowText();
        for (Quadrant quadrant : Quadrant.values()) {
            TriggerDemand demand = gate.quadrants().get(quadrant);
            if (demand != null) {
                quadrants.raw(quadrant.word(), points(demand));
            }
        }
        text.mapping("quadrants", quadrants);
        gate.nonTrigger()
                .ifPresent(n -> text.mapping(
                        "non-trigger",
                        new FlowText()
                                .quantity("voltage", n.volts(), Unit.VOLT)
                                .raw("at", DesignWriter.celsius(n.celsius()))));
        GateLimits limits = gate.limits();
        return text.optional("turn-on", gate.turnOnSeconds(), Unit.SECOND)
                .mapping(
                        "limits",
                        new FlowText()
                                .optional("current", limits.amps(), Unit.AMPERE)
                                .optional("voltage", limits.volts(), Unit.VOLT)
                                .optional("reverse", limits.reverseVolts(), Unit.VOLT)
                                .optional("peak-power", limits.peakWatts(), Unit.WATT)
                                .optional("peak-power-for", limits.peakWattsForSeconds(), Unit.SECOND)
                                .optional("mean-power", limits.meanWatts(), Unit.WATT));
    }

    private static String points(TriggerDemand demand) {
        return FlowText.list(demand.points().stream()
                .map(p -> new FlowText()
                        .raw("at", DesignWriter.celsius(p.celsius()))
                        .quantity("current", p.amps(), Unit.AMPERE)
                        .quantity("voltage", p.volts(), Unit.VOLT)
                        .text())
                .toList());
    }

    private static void curve(FlowText text, String key, Optional<TemperatureCurve> curve) {
        curve.ifPresent(c -> {
            boolean plain = c.points().size() == 1 && c.points().get(0).celsius() == 25;
            text.raw(
                    key,
                    plain
                            ? QuantityText.exact(c.points().get(0).amps(), Unit.AMPERE)
                            : FlowText.list(c.points().stream()
                                    .map(p -> new FlowText()
                                            .raw("at", DesignWriter.celsius(p.celsius()))
                                            .quantity("current", p.amps(), Unit.AMPERE)
                                            .text())
                                    .toList()));
        });
    }

    private static FlowText limits(Limits limits) {
        FlowText text = new FlowText()
                .optional("voltage", limits.volts(), Unit.VOLT)
                .optional("rms", limits.rmsAmps(), Unit.AMPERE)
                .optional("mean", limits.meanAmps(), Unit.AMPERE)
                .optional("surge", limits.surgeAmps(), Unit.AMPERE)
                .optional("i2t", limits.ampsSquaredSeconds(), Unit.AMPERE_SQUARED_SECOND);
        limits.junctionCelsius().ifPresent(j -> text.raw("junction", DesignWriter.celsius(j)));
        return text.optional("dv-dt", limits.voltsPerSecond(), Unit.VOLT_PER_SECOND)
                .optional("di-dt", limits.ampsPerSecond(), Unit.AMPERE_PER_SECOND);
    }
}
