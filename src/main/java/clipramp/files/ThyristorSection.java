package clipramp.files;

import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Commutating;
import clipramp.circuit.ThyristorDevice.Gate;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.ThyristorDevice.Limits;
import clipramp.circuit.ThyristorDevice.NonTrigger;
import clipramp.circuit.ThyristorDevice.OnState;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.TriggerDemand;
import clipramp.files.Devices.Device;
import clipramp.files.Node.Sequence;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads {@code thyristor}. */
final class ThyristorSection {
    private ThyristorSection() {}

    /**
     * @param scope the mapping
     * @param devices where profiles are found
     * @param triacStage whether the stage wants a triac, the default kind of a device in place
     */
    static Optional<Thyristor> read(Scope scope, Devices devices, boolean triacStage) {
        Optional<Device> device = ClipSection.device(scope, devices, "device", DevicePlace.THYRISTOR);
        OptionalDouble toAmbient = scope.optional("case-to-ambient");
        scope.close("");
        return device.flatMap(d -> {
                    String kind = d.kind().isEmpty() ? (triacStage ? "triac" : "scr") : d.kind();
                    if (d.kind().isEmpty()) {
                        scope.findings().assume("thyristor.device.kind", kind);
                    }
                    Scope own = new Scope(scope.findings(), d.mapping(), "thyristor.device", kind);
                    return device(own, kind.equals("scr") ? Kind.SCR : Kind.TRIAC, d.id());
                })
                .map(d -> new Thyristor(d, toAmbient));
    }

    private static Optional<ThyristorDevice> device(Scope scope, Kind kind, String id) {
        int before = scope.findings().count();
        Optional<Gate> gate = scope.child("gate").flatMap(g -> gate(g, kind));
        Optional<TemperatureCurve> latching = curve(scope, "latching");
        Optional<TemperatureCurve> holding = curve(scope, "holding");
        OptionalDouble turnOff = scope.optional("turn-off");
        Optional<Commutating> commutating =
                kind == Kind.TRIAC ? scope.child("commutating").map(ThyristorSection::commutating) : Optional.empty();
        Optional<OnState> onState = scope.child("on-state").flatMap(ThyristorSection::onState);
        Limits limits = limits(scope.child("limits"));
        OptionalDouble junctionToCase = scope.optional("junction-to-case");
        scope.closeDevice();
        if (gate.isEmpty() || onState.isEmpty()) {
            return Optional.empty();
        }
        return scope.make(
                before,
                () -> new ThyristorDevice(
                        kind,
                        id,
                        gate.get(),
                        latching,
                        holding,
                        turnOff,
                        commutating,
                        onState.get(),
                        limits,
                        junctionToCase));
    }

    private static Optional<Gate> gate(Scope scope, Kind kind) {
        int before = scope.findings().count();
        double knee = scope.quantity("knee");
        double slope = scope.quantity("slope");
        Map<Quadrant, TriggerDemand> quadrants = kind == Kind.TRIAC
                ? scope.child("quadrants").map(ThyristorSection::quadrants).orElse(Map.of())
                : Map.of();
        Optional<TriggerDemand> trigger =
                scope.has("trigger") || quadrants.isEmpty() ? points(scope, "trigger") : worst(quadrants);
        Optional<NonTrigger> nonTrigger = scope.child("non-trigger").flatMap(s -> {
            double volts = s.quantity("voltage");
            double at = s.quantity("at");
            s.close("");
            return Optional.of(new NonTrigger(volts, at));
        });
        OptionalDouble turnOn = scope.optional("turn-on");
        GateLimits limits = gateLimits(scope.child("limits"));
        scope.close("");
        return trigger.flatMap(
                t -> scope.make(before, () -> new Gate(knee, slope, t, quadrants, nonTrigger, turnOn, limits)));
    }

    private static Map<Quadrant, TriggerDemand> quadrants(Scope scope) {
        Map<Quadrant, TriggerDemand> quadrants = new EnumMap<>(Quadrant.class);
        for (Quadrant quadrant : Quadrant.values()) {
            if (scope.has(quadrant.word())) {
                points(scope, quadrant.word()).ifPresent(d -> quadrants.put(quadrant, d));
            }
        }
        scope.close("");
        return quadrants;
    }

    private static Optional<TriggerDemand> worst(Map<Quadrant, TriggerDemand> quadrants) {
        return quadrants.values().stream().max(Comparator.comparingDouble(d -> d.ampsAt(25)));
    }

    private static Optional<TriggerDemand> points(Scope scope, String name) {
        List<TriggerDemand.Point> points = new ArrayList<>();
        for (Scope item : scope.items(name)) {
            double at = item.quantity("at");
            double amps = item.quantity("current");
            double volts = item.quantity("voltage");
            item.close("");
            if (points.stream().anyMatch(p -> p.celsius() == at)) {
                twice(item);
            }
            points.add(new TriggerDemand.Point(at, amps, volts));
        }
        return points.isEmpty() ? Optional.empty() : Optional.of(new TriggerDemand(points));
    }

    private static void twice(Scope item) {
        item.findings().problem(item.placeOf("at"), item.pathOf("at"), "this temperature stands twice in the list.");
    }

    private static Optional<TemperatureCurve> curve(Scope scope, String name) {
        if (!(scope.take(name).orElse(null) instanceof Sequence)) {
            OptionalDouble amps = scope.optional(name);
            return amps.isPresent() ? Optional.of(TemperatureCurve.at25(amps.getAsDouble())) : Optional.empty();
        }
        List<TemperatureCurve.Point> points = new ArrayList<>();
        for (Scope item : scope.items(name)) {
            double at = item.quantity("at");
            double amps = item.quantity("current");
            item.close("");
            if (points.stream().anyMatch(p -> p.celsius() == at)) {
                twice(item);
            }
            points.add(new TemperatureCurve.Point(at, amps));
        }
        if (points.isEmpty()) {
            scope.findings()
                    .problem(scope.placeOf(name), scope.pathOf(name), "the list is empty. Write none, or a current.");
            return Optional.empty();
        }
        return Optional.of(new TemperatureCurve(points));
    }

    private static Commutating commutating(Scope scope) {
        Commutating read = new Commutating(scope.quantity("dv-dt"), scope.quantity("at"));
        scope.close("");
        return read;
    }

    private static Optional<OnState> onState(Scope scope) {
        int before = scope.findings().count();
        double threshold = scope.quantity("threshold");
        double slope = scope.quantity("slope");
        scope.close("");
        return scope.make(before, () -> new OnState(threshold, slope));
    }

    private static GateLimits gateLimits(Optional<Scope> scope) {
        GateLimits read = new GateLimits(
                UnijunctionLimits.optional(scope, "current"),
                UnijunctionLimits.optional(scope, "voltage"),
                UnijunctionLimits.optional(scope, "reverse"),
                UnijunctionLimits.optional(scope, "peak-power"),
                UnijunctionLimits.optional(scope, "peak-power-for"),
                UnijunctionLimits.optional(scope, "mean-power"));
        scope.ifPresent(s -> s.close(""));
        return read;
    }

    private static Limits limits(Optional<Scope> scope) {
        Limits read = new Limits(
                UnijunctionLimits.optional(scope, "voltage"),
                UnijunctionLimits.optional(scope, "rms"),
                UnijunctionLimits.optional(scope, "mean"),
                UnijunctionLimits.optional(scope, "surge"),
                UnijunctionLimits.optional(scope, "i2t"),
                UnijunctionLimits.optional(scope, "junction"),
                UnijunctionLimits.optional(scope, "dv-dt"),
                UnijunctionLimits.optional(scope, "di-dt"));
        scope.ifPresent(s -> s.close(""));
        return read;
    }
}
