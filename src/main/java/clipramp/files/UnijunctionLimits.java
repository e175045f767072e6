package clipramp.files;

import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.Unijunction;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the ratings of trigger devices; whatever is not there is not judged. */
final class UnijunctionLimits {
    private UnijunctionLimits() {}

    static Unijunction.Limits read(Scope device) {
        Optional<Scope> limits = device.child("limits");
        Optional<Scope> capacitor = limits.flatMap(l -> l.child("capacitor"));
        Unijunction.Limits read = new Unijunction.Limits(
                optional(limits, "interbase"),
                optional(limits, "emitter-peak"),
                optional(limits, "emitter-rms"),
                optional(limits, "emitter-reverse"),
                capacitor.map(c -> OptionalDouble.of(c.quantity("capacitance"))).orElse(OptionalDouble.empty()),
                capacitor.map(c -> OptionalDouble.of(c.quantity("voltage"))).orElse(OptionalDouble.empty()),
                optional(limits, "power"),
                optional(limits, "derating"));
        capacitor.ifPresent(c -> c.close(""));
        limits.ifPresent(l -> l.close(""));
        return read;
    }

    static ProgrammableUnijunction.Limits programmable(Scope device) {
        Optional<Scope> limits = device.child("limits");
        ProgrammableUnijunction.Limits read = new ProgrammableUnijunction.Limits(
                optional(limits, "anode"),
                optional(limits, "gate-reverse"),
                optional(limits, "mean"),
                optional(limits, "peak"),
                optional(limits, "peak-for"),
                optional(limits, "power"),
                optional(limits, "derating"),
                optional(limits, "discharge-energy"));
        limits.ifPresent(l -> l.close(""));
        return read;
    }

    static OptionalDouble optional(Optional<Scope> scope, String name) {
        return scope.map(s -> s.optional(name)).orElse(OptionalDouble.empty());
    }
}
