package clipramp.files;

import clipramp.circuit.GateDrive;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Part;
import clipramp.circuit.PulseTransformer;
import java.util.Optional;

/** Reads {@code gate}. */
final class GateSection {
    private GateSection() {}

    static Optional<GateDrive> read(Scope scope) {
        int before = scope.findings().count();
        Optional<Coupling> coupling =
                scope.word("coupling").map(w -> w.equals("direct") ? Coupling.DIRECT : Coupling.TRANSFORMER);
        Part series = scope.part("series");
        Optional<Part> shunt = scope.optionalPart("shunt");
        double overdrive = scope.quantity("overdrive");
        double chargeTime = scope.quantity("charge-time");
        Optional<Polarity> polarity =
                scope.word("polarity").map(w -> w.equals("positive") ? Polarity.POSITIVE : Polarity.NEGATIVE);
        boolean byTransformer = coupling.isPresent() && coupling.get() == Coupling.TRANSFORMER;
        Optional<PulseTransformer> transformer =
                byTransformer ? scope.child("transformer").flatMap(GateSection::transformer) : Optional.empty();
        if (coupling.isPresent()) {
            scope.close("with coupling direct");
        } else {
            scope.closeUnknown();
        }
        if (coupling.isEmpty() || polarity.isEmpty() || byTransformer != transformer.isPresent()) {
            return Optional.empty();
        }
        return scope.make(
                before,
                () -> new GateDrive(coupling.get(), series, shunt, overdrive, chargeTime, polarity.get(), transformer));
    }

    private static Optional<PulseTransformer> transformer(Scope scope) {
        int before = scope.findings().count();
        double ratio = scope.ratio("ratio");
        int secondaries = scope.whole("secondaries");
        double magnetising = scope.quantity("magnetising");
        double primary = scope.quantity("primary-resistance");
        double secondary = scope.quantity("secondary-resistance");
        boolean clamp = scope.word("clamp").orElse("none").equals("diode");
        var voltSeconds = scope.optional("volt-seconds");
        scope.close("");
        return scope.make(
                before,
                () -> new PulseTransformer(ratio, secondaries, magnetising, primary, secondary, clamp, voltSeconds));
    }
}
