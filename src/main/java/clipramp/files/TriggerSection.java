package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Part;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.files.Devices.Device;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads {@code trigger}. */
final class TriggerSection {
    private static final String DEVICE = "trigger.device";
    private static final String PROGRAMMABLE = "programmable-unijunction";

    private TriggerSection() {}

    static Optional<Trigger> read(Scope scope, Devices devices) {
        Optional<Device> device = ClipSection.device(scope, devices, "device", DevicePlace.TRIGGER);
        Part baseOne = scope.part("base-one");
        if (device.isEmpty()) {
            scope.closeUnknown();
            return Optional.empty();
        }
        String kind = device.get().kind();
        if (kind.isEmpty()) {
            kind = scope.has("upper") || scope.has("lower") ? PROGRAMMABLE : "unijunction";
            scope.findings().assume(DEVICE + ".kind", kind);
        }
        return kind.equals(PROGRAMMABLE)
                ? programmable(scope, device.get(), baseOne)
                : unijunction(scope, device.get(), baseOne);
    }

    private static Optional<Trigger> unijunction(Scope scope, Device device, Part baseOne) {
        int before = scope.findings().count();
        Part baseTwo = scope.part("base-two");
        scope.close("with a unijunction, which has base-two; upper and lower belong to a programmable one");
        return unijunction(new Scope(scope.findings(), device.mapping(), DEVICE, "unijunction"), device.id())
                .flatMap(u -> scope.make(before, () -> new Trigger.UnijunctionTrigger(u, baseOne, baseTwo)));
    }

    private static Optional<Unijunction> unijunction(Scope scope, String id) {
        int before = scope.findings().count();
        Characteristic standoff = scope.characteristic("standoff");
        Characteristic interbase = scope.characteristic("interbase");
        Characteristic interbaseDrift = scope.characteristic("interbase-drift");
        Characteristic drop = scope.characteristic("emitter-drop");
        Characteristic drift = scope.characteristic("emitter-drift");
        Characteristic peak = scope.characteristic("peak-current");
        Optional<Unijunction.Valley> valley = scope.child("valley").flatMap(TriggerSection::valley);
        Optional<Unijunction.Saturation> saturation = scope.child("saturation").flatMap(s -> saturation(s, valley));
        Optional<Unijunction.Modulated> modulated = scope.child("modulated").flatMap(TriggerSection::modulated);
        Optional<Unijunction.BaseOnePulse> pulse = scope.child("base-one-pulse").flatMap(TriggerSection::pulse);
        Unijunction.Limits limits = UnijunctionLimits.read(scope);
        scope.closeDevice();
        if (valley.isEmpty() || saturation.isEmpty()) {
            return Optional.empty();
        }
        return scope.make(
                before,
                () -> new Unijunction(
                        id,
                        standoff,
                        interbase,
                        interbaseDrift,
                        drop,
                        drift,
                        peak,
                        valley.get(),
                        saturation.get(),
                        modulated,
                        pulse,
                        limits));
    }

    private static Optional<Unijunction.Valley> valley(Scope scope) {
        int before = scope.findings().count();
        Characteristic amps = scope.characteristic("current");
        Characteristic volts = scope.characteristic("voltage");
        double at = scope.quantity("at");
        scope.close("");
        return scope.make(before, () -> new Unijunction.Valley(amps, volts, at));
    }

    private static Optional<Unijunction.Saturation> saturation(Scope scope, Optional<Unijunction.Valley> valley) {
        int before = scope.findings().count();
        Characteristic volts = scope.characteristic("voltage");
        double amps = scope.quantity("current");
        double valleyAt = valley.map(Unijunction.Valley::atVolts).orElse(20.0);
        double at = scope.quantityOr("at", valleyAt, "valley.at, " + QuantityText.format(valleyAt, Unit.VOLT));
        scope.close("");
        return scope.make(before, () -> new Unijunction.Saturation(volts, amps, at));
    }

    private static Optional<Unijunction.Modulated> modulated(Scope scope) {
        int before = scope.findings().count();
        Characteristic amps = scope.characteristic("current");
        double at = scope.quantity("at");
        scope.close("");
        return scope.make(before, () -> new Unijunction.Modulated(amps, at));
    }

    private static Optional<Unijunction.BaseOnePulse> pulse(Scope scope) {
        int before = scope.findings().count();
        OptionalDouble min = scope.optional("min");
        OptionalDouble typ = scope.optional("typ");
        double supply = scope.quantity("supply");
        double capacitor = scope.quantity("capacitor");
        double baseOne = scope.quantity("base-one");
        scope.close("");
        return scope.make(before, () -> new Unijunction.BaseOnePulse(min, typ, supply, capacitor, baseOne));
    }

    private static Optional<Trigger> programmable(Scope scope, Device device, Part baseOne) {
        int before = scope.findings().count();
        Part upper = scope.part("upper");
        Part lower = scope.part("lower");
        scope.close("with a programmable unijunction, which has upper and lower instead");
        return programmable(new Scope(scope.findings(), device.mapping(), DEVICE, PROGRAMMABLE), device.id())
                .flatMap(p -> scope.make(before, () -> new Trigger.ProgrammableTrigger(p, baseOne, upper, lower)));
    }

    private static Optional<ProgrammableUnijunction> programmable(Scope scope, String id) {
        int before = scope.findings().count();
        List<AtGateResistance> offset = table(scope, "offset");
        Optional<Scope> forward = scope.child("forward");
        Characteristic forwardVolts =
                forward.map(f -> f.characteristic("voltage")).orElse(Characteristic.exactly(1));
        double forwardAmps = forward.map(f -> f.quantity("current")).orElse(1.0);
        forward.ifPresent(f -> f.close(""));
        List<AtGateResistance> peak = table(scope, "peak-current");
        List<AtGateResistance> valley = table(scope, "valley-current");
        ProgrammableUnijunction.Limits limits = UnijunctionLimits.programmable(scope);
        scope.closeDevice();
        return scope.make(
                before, () -> new ProgrammableUnijunction(id, offset, forwardVolts, forwardAmps, peak, valley, limits));
    }

    private static List<AtGateResistance> table(Scope scope, String name) {
        List<AtGateResistance> rows = new ArrayList<>();
        for (Scope item : scope.items(name)) {
            double ohms = item.quantity("gate-resistance");
            Characteristic value = item.characteristic("value");
            item.close("");
            if (rows.stream().anyMatch(r -> r.gateOhms() == ohms)) {
                item.findings()
                        .problem(item.placeOf("gate-resistance"), item.pathOf("gate-resistance"), "stands twice.");
            }
            rows.add(new AtGateResistance(ohms, value));
        }
        return rows;
    }
}
