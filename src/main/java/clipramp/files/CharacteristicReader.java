package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.files.Node.Entry;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.units.Expected;
import clipramp.units.Quantity;
import clipramp.units.QuantityReader;
import clipramp.units.QuantityText;
import clipramp.units.RefusedQuantityException;
import java.util.List;
import java.util.OptionalDouble;

/** Reads {min:, typ:, max:}, and says which nominal value comes of it where there is no typ. */
final class CharacteristicReader {
    private static final List<String> NAMES = List.of("min", "typ", "max");

    private final Findings findings;
    private final Key key;
    private final String path;
    private final Mapping node;

    CharacteristicReader(Findings findings, Key key, String path, Mapping node) {
        this.findings = findings;
        this.key = key;
        this.path = path;
        this.node = node;
    }

    /** A value with a tolerance as a characteristic. */
    static Characteristic spread(Quantity q) {
        double low = q.value() * (1 - q.minus());
        double high = q.value() * (1 + q.plus());
        return Characteristic.of(Math.min(low, high), q.value(), Math.max(low, high));
    }

    Characteristic read() {
        int before = findings.count();
        refuseUnknown();
        OptionalDouble min = figure("min");
        OptionalDouble typ = figure("typ");
        OptionalDouble max = figure("max");
        Characteristic standIn = Characteristic.exactly(key.standIn());
        if (findings.count() > before) {
            return standIn;
        }
        if (min.isEmpty() && typ.isEmpty() && max.isEmpty()) {
            findings.problem(node.place(), path, "needs at least one of min, typ, max.");
            return standIn;
        }
        double low = min.orElse(Double.NEGATIVE_INFINITY);
        double high = max.orElse(Double.POSITIVE_INFINITY);
        double middle = typ.orElse(low);
        if (low > high || middle < low || middle > high) {
            String read = "min " + words(min) + ", typ " + words(typ) + ", max " + words(max);
            findings.problem(
                    node.place(), path, read, "min <= typ <= max", "min, typ and max are out of order: " + read + ".");
            return standIn;
        }
        Characteristic figure = new Characteristic(min, typ, max);
        if (typ.isEmpty()) {
            noteNominal(figure);
        }
        return figure;
    }

    private void noteNominal(Characteristic figure) {
        String how = figure.min().isPresent() && figure.max().isPresent()
                ? "the middle of min and max"
                : figure.min().isPresent()
                        ? "the minimum, the only figure there is"
                        : "the maximum, the only figure there is";
        findings.note(path + " has no typical value; nominal is " + how + ", "
                + QuantityText.format(figure.nominal(), key.unit()) + ".");
    }

    private void refuseUnknown() {
        for (Entry entry : node.entries()) {
            if (!NAMES.contains(entry.key())) {
                findings.unknown(entry.place(), path + "." + entry.key(), entry.key(), "unknown key", NAMES);
            }
        }
    }

    private String words(OptionalDouble value) {
        return value.isPresent() ? QuantityText.format(value.getAsDouble(), key.unit()) : "none";
    }

    private OptionalDouble figure(String name) {
        Node found = node.get(name).orElse(null);
        if (found == null) {
            return OptionalDouble.empty();
        }
        if (!(found instanceof Scalar scalar)) {
            findings.problem(found.place(), path + "." + name, "expected one value.");
            return OptionalDouble.empty();
        }
        if (scalar.isNone()) {
            return OptionalDouble.empty();
        }
        try {
            Expected expected = Expected.within(key.unit(), key.low(), key.high());
            return OptionalDouble.of(
                    QuantityReader.read(scalar.text(), expected).value());
        } catch (RefusedQuantityException e) {
            findings.refused(scalar.place(), path + "." + name, e.refusal());
            return OptionalDouble.empty();
        }
    }
}
