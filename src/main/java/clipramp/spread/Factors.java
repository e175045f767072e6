package clipramp.spread;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.engine.ProgrammableDevice;
import clipramp.spread.Factor.Kind;
import clipramp.spread.Factor.Law;
import clipramp.spread.Factor.Slot;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * What differs from unit to unit: every toleranced value of a design, every figure of its devices that has limits, line and
 * temperature. What has no room between its limits is left out.
 */
public final class Factors {
    /** How far a public line's frequency strays, as a share: EN 50160, 1 % for all but half a percent of a year. */
    private static final double FREQUENCY_SHARE = 0.01;

    private final List<Factor> factors = new ArrayList<>();

    private Factors() {}

    /** The factors of a sound design: line and temperature, then the parts in the order of the signal. */
    public static List<Factor> of(Design design) {
        Factors all = new Factors();
        all.surroundings(design);
        all.part("clip.dropper", "dropping resistor", design.clip().dropper(), (u, v) -> u.dropperOhms = v);
        all.sheet("clip.zener.voltage", "zener voltage", design.clip().zener().volts(), (u, v) -> u.zenerVolts = v);
        all.part("ramp.capacitor", "ramp capacitor", design.ramp().capacitor(), (u, v) -> u.capacitorFarads = v);
        all.part("ramp.fixed", "fixed ramp resistor", design.ramp().fixed(), (u, v) -> u.fixedOhms = v);
        design.ramp().pot().ifPresent(all::pot);
        all.part("trigger.base-one", "base-one resistor", design.trigger().baseOne(), (u, v) -> u.baseOneOhms = v);
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            all.part("trigger.base-two", "base-two resistor", trigger.baseTwo(), (u, v) -> u.baseTwoOhms = v);
            all.unijunction(trigger.device());
        } else if (design.trigger() instanceof ProgrammableTrigger trigger) {
            all.programmable(trigger);
        }
        all.part("gate.series", "gate series resistor", design.gate().series(), (u, v) -> u.gateSeriesOhms = v);
        design.gate()
                .shunt()
                .ifPresent(p -> all.part("gate.shunt", "gate-cathode resistor", p, (u, v) -> u.gateShuntOhms = v));
        return List.copyOf(all.factors);
    }

    private void surroundings(Design design) {
        var line = design.line();
        outside(
                "line.voltage",
                "line voltage",
                line.lowVolts(),
                line.volts(),
                line.highVolts(),
                (u, v) -> u.lineVolts = v);
        double hertz = line.hertz();
        outside(
                "line.frequency",
                "line frequency",
                hertz * (1 - FREQUENCY_SHARE),
                hertz,
                hertz * (1 + FREQUENCY_SHARE),
                (u, v) -> u.lineHertz = v);
        double cold = design.surroundings().coldestCelsius();
        double hot = design.surroundings().hottestCelsius();
        outside("surroundings", "temperature", cold, Math.min(hot, Math.max(cold, 25)), hot, (u, v) -> u.celsius = v);
    }

    private void pot(Pot pot) {
        part("ramp.pot.track", "pot track", pot.track(), (u, v) -> u.trackOhms = v);
        pot.shunt().ifPresent(p -> part("ramp.pot.shunt", "pot shunt resistor", p, (u, v) -> u.potShuntOhms = v));
    }

    private void unijunction(Unijunction device) {
        String key = "trigger.device.";
        sheet(key + "standoff", "standoff ratio", device.standoff(), (u, v) -> u.standoff = v);
        sheet(key + "interbase", "interbase resistance", device.interbaseOhms(), (u, v) -> u.interbaseOhms = v);
        sheet(
                key + "interbase-drift",
                "drift of the interbase resistance",
                device.interbaseDriftPerKelvin(),
                (u, v) -> u.interbaseDrift = v);
        sheet(key + "emitter-drop", "emitter diode drop", device.emitterDropVolts(), (u, v) -> u.emitterDropVolts = v);
        sheet(
                key + "emitter-drift",
                "drift of the emitter diode",
                device.emitterDriftVoltsPerKelvin(),
                (u, v) -> u.emitterDrift = v);
        sheet(key + "peak-current", "peak-point current", device.peakCurrentAmps(), (u, v) -> u.peakCurrentAmps = v);
        sheet(key + "valley.current", "valley current", device.valley().amps(), (u, v) -> u.valleyAmps = v);
        sheet(key + "valley.voltage", "valley voltage", device.valley().volts(), (u, v) -> u.valleyVolts = v);
        device.baseOnePulse().ifPresent(this::baseOnePulse);
        device.modulated()
                .ifPresent(m -> sheet(
                        key + "modulated.current",
                        "modulated interbase current",
                        m.amps(),
                        (u, v) -> u.modulatedAmps = v));
    }

    private void baseOnePulse(Unijunction.BaseOnePulse pulse) {
        double typical = pulse.nominalVolts();
        add(
                "trigger.device.base-one-pulse",
                "base-one pulse",
                Kind.DEVICE,
                pulse.minVolts().orElse(typical),
                typical,
                typical,
                Law.THREE_POINT,
                (u, v) -> u.baseOnePulseVolts = v);
    }

    private void programmable(ProgrammableTrigger trigger) {
        ProgrammableUnijunction device = trigger.device();
        double gateOhms = ProgrammableDevice.gateOhms(trigger);
        part("trigger.upper", "upper divider resistor", trigger.upper(), (u, v) -> u.upperOhms = v);
        part("trigger.lower", "lower divider resistor", trigger.lower(), (u, v) -> u.lowerOhms = v);
        device(
                "trigger.device.offset",
                "offset voltage",
                pick -> ProgrammableDevice.offsetVolts(device, gateOhms, pick),
                (u, v) -> u.emitterDropVolts = v);
        device(
                "trigger.device.peak-current",
                "peak-point current",
                pick -> ProgrammableDevice.amps(device.peakCurrentAmps(), gateOhms, pick),
                (u, v) -> u.peakCurrentAmps = v);
        device(
                "trigger.device.valley-current",
                "valley current",
                pick -> ProgrammableDevice.amps(device.valleyCurrentAmps(), gateOhms, pick),
                (u, v) -> u.valleyAmps = v);
        sheet(
                "trigger.device.forward.voltage",
                "forward voltage",
                device.forwardVolts(),
                (u, v) -> u.saturationVolts = v);
    }

    /** A figure of the device that follows its divider: its least, nominal and greatest by what is picked of the sheet's. */
    private void device(
            String path, String name, ToDoubleFunction<ToDoubleFunction<Characteristic>> figure, Slot slot) {
        add(
                path,
                name,
                Kind.DEVICE,
                figure.applyAsDouble(Characteristic::lowest),
                figure.applyAsDouble(Characteristic::nominal),
                figure.applyAsDouble(Characteristic::highest),
                Law.THREE_POINT,
                slot);
    }

    private void outside(String path, String name, double low, double nominal, double high, Slot slot) {
        add(path, name, Kind.SURROUNDINGS, low, nominal, high, Law.UNIFORM, slot);
    }

    private void part(String path, String name, Part part, Slot slot) {
        add(path, name, Kind.PART, part.lowest(), part.value(), part.highest(), Law.CHOSEN, slot);
    }

    /** Minimum and maximum without a typical value say nothing of a middle: uniform. One limit is that limit only. */
    private void sheet(String path, String name, Characteristic figure, Slot slot) {
        Law law = figure.typ().isPresent() ? Law.THREE_POINT : Law.UNIFORM;
        add(path, name, Kind.DEVICE, figure.lowest(), figure.nominal(), figure.highest(), law, slot);
    }

    private void add(String path, String name, Kind kind, double low, double nominal, double high, Law law, Slot slot) {
        if (low < high) {
            factors.add(new Factor(path, name, kind, low, nominal, high, law, slot));
        }
    }
}
