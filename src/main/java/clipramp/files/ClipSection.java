package clipramp.files;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.Part;
import clipramp.circuit.Winding;
import clipramp.circuit.Zener;
import clipramp.files.Devices.Device;
import java.util.Optional;

/** Reads {@code clip}. */
final class ClipSection {
    private ClipSection() {}

    /**
     * @param scope the mapping
     * @param devices where profiles are found
     * @param halfWave whether the stage is half-wave, which a single diode then feeds by default
     */
    static Optional<ClipSupply> read(Scope scope, Devices devices, boolean halfWave) {
        int before = scope.findings().count();
        Optional<Tap> tap = scope.word("tap").map(w -> w.equals("line") ? Tap.LINE : Tap.THYRISTOR);
        Optional<Rectifier> rectifier = scope.wordOr("rectifier", halfWave ? "diode" : "bridge")
                .map(w -> w.equals("bridge") ? Rectifier.BRIDGE : Rectifier.DIODE);
        double drop = scope.quantity("diode-drop");
        Part dropper = scope.part("dropper");
        Optional<Zener> zener =
                device(scope, devices, "zener", DevicePlace.ZENER).flatMap(d -> zener(scope, d));
        Optional<Winding> winding = winding(scope, devices);
        scope.close("");
        if (tap.isPresent() && tap.get() == Tap.THYRISTOR && winding.isPresent()) {
            scope.findings()
                    .problem(
                            scope.placeOf("tap"),
                            "clip.tap",
                            "thyristor",
                            "line",
                            "read \"thyristor\" with clip.winding: a winding is fed by the line and sees nothing of the"
                                    + " thyristor. Use line, or winding: none.");
            return Optional.empty();
        }
        if (tap.isEmpty() || rectifier.isEmpty() || zener.isEmpty()) {
            return Optional.empty();
        }
        return scope.make(
                before, () -> new ClipSupply(tap.get(), rectifier.get(), drop, dropper, zener.get(), winding));
    }

    static Optional<Device> device(Scope scope, Devices devices, String name, DevicePlace place) {
        Optional<Node> node = scope.take(name);
        if (node.isEmpty()) {
            scope.missing(name, KeyCatalogue.standard().require(place.path()));
        }
        return node.flatMap(n -> devices.resolve(n, place));
    }

    private static Optional<Zener> zener(Scope clip, Device device) {
        Scope scope = new Scope(clip.findings(), device.mapping(), "clip.zener", "zener");
        int before = scope.findings().count();
        var volts = scope.characteristic("voltage");
        double testAmps = scope.quantity("test-current");
        double slope = scope.quantity("slope");
        double drift = scope.quantity("drift");
        var watts = scope.optional("power");
        scope.closeDevice();
        return scope.make(before, () -> new Zener(device.id(), volts, testAmps, slope, drift, watts));
    }

    private static Optional<Winding> winding(Scope clip, Devices devices) {
        Optional<Node> node = clip.take("winding");
        if (node.isEmpty() || (node.get() instanceof Node.Scalar s && s.isNone())) {
            return Optional.empty();
        }
        return devices.resolve(node.get(), DevicePlace.WINDING).flatMap(device -> {
            Scope scope = new Scope(clip.findings(), device.mapping(), "clip.winding", "winding");
            int before = scope.findings().count();
            double primary = scope.quantity("primary");
            double secondary = scope.quantity("secondary");
            boolean opposite = scope.word("phase").orElse("same").equals("opposite");
            double lag = scope.quantity("lag");
            scope.closeDevice();
            return scope.make(before, () -> new Winding(primary, secondary, opposite, lag));
        });
    }
}
