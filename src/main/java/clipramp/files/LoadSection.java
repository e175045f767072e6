package clipramp.files;

import clipramp.circuit.Load;
import clipramp.circuit.StageDiodes;
import clipramp.files.Node.Scalar;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.QuantityText;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.Optional;

/** Reads {@code load} and {@code stage-diodes}. */
final class LoadSection {
    private final Scope scope;
    private final double lineVolts;
    private final double diodeDropVolts;

    private LoadSection(Scope scope, double lineVolts, double diodeDropVolts) {
        this.scope = scope;
        this.lineVolts = lineVolts;
        this.diodeDropVolts = diodeDropVolts;
    }

    /**
     * @param scope the load's mapping
     * @param lineVolts nominal line, which a rating without "at" is taken at
     * @param diodeDropVolts default drop of a freewheeling diode
     */
    static Optional<Load> read(Scope scope, double lineVolts, double diodeDropVolts) {
        Optional<String> kind = scope.word("kind");
        if (kind.isEmpty()) {
            scope.closeUnknown();
        }
        return kind.flatMap(k -> new LoadSection(scope, lineVolts, diodeDropVolts).ofKind(k));
    }

    private Optional<Load> ofKind(String kind) {
        int before = scope.findings().count();
        Optional<Load> load = switch (kind) {
            case "inductive" -> inductive(before);
            case "filament" -> filament(before);
            default -> resistor(before);
        };
        scope.close("with kind " + kind);
        return load;
    }

    private Optional<Load> resistor(int before) {
        if (scope.has("rated") == scope.has("resistance")) {
            String why = scope.has("rated")
                    ? "rated and resistance both stand here; keep exactly one."
                    : "needs exactly one of rated and resistance, such as rated: 1.2 kW at 230 V.";
            scope.findings().problem(scope.place(), scope.path(), why);
            scope.take("rated");
            scope.take("resistance");
            return Optional.empty();
        }
        if (scope.has("resistance")) {
            double ohms = scope.quantity("resistance");
            double cold = coldRatio();
            return scope.make(before, () -> new Load.Resistor(ohms, cold));
        }
        double cold = coldRatio();
        return rated().flatMap(r ->
                scope.make(before, () -> new Load.Resistor(r.volts() * r.volts() / r.watts(), cold)));
    }

    /** A heater's resistance is taken as the same warm and cold unless it says otherwise. */
    private double coldRatio() {
        return scope.has("cold-ratio") ? scope.quantity("cold-ratio") : 1;
    }

    private Optional<Load> inductive(int before) {
        double ohms = scope.quantity("resistance");
        double henries = scope.quantity("inductance");
        Optional<StageDiodes> freewheel = scope.child("freewheel").map(s -> diodes(s, diodeDropVolts));
        return scope.make(before, () -> new Load.Inductive(ohms, henries, freewheel));
    }

    private Optional<Load> filament(int before) {
        Optional<Rated> rated = rated();
        double exponent = scope.quantity("exponent");
        double coldRatio = scope.quantity("cold-ratio");
        return rated.flatMap(
                r -> scope.make(before, () -> new Load.Filament(r.watts(), r.volts(), exponent, coldRatio)));
    }

    static StageDiodes diodes(Scope scope, double defaultDropVolts) {
        String words = "clip.diode-drop, " + QuantityText.format(defaultDropVolts, Unit.VOLT);
        double drop = scope.quantityOr("drop", defaultDropVolts, words);
        double slope = scope.quantity("slope");
        scope.close("");
        return new StageDiodes(drop, slope);
    }

    private record Rated(double watts, double volts) {}

    private Optional<Rated> rated() {
        Key key = KeyCatalogue.standard().require("load.rated");
        Optional<Scalar> scalar = scope.phrase("rated");
        if (scalar.isEmpty()) {
            return Optional.empty();
        }
        AtPhrase phrase = AtPhrase.of(scalar.get().text());
        try {
            double watts = QuantityReader.read(phrase.what(), key.expected()).value();
            if (phrase.at().isEmpty()) {
                scope.findings()
                        .assume(scope.pathOf("rated"), "at line.voltage, " + QuantityText.format(lineVolts, Unit.VOLT));
                return Optional.of(new Rated(watts, lineVolts));
            }
            Expected volts = Expected.within(Unit.VOLT, 1, 1000);
            return Optional.of(new Rated(
                    watts, QuantityReader.read(phrase.at().get(), volts).value()));
        } catch (RefusedQuantityException e) {
            scope.findings().refused(scalar.get().place(), scope.pathOf("rated"), e.refusal());
            return Optional.empty();
        }
    }
}
