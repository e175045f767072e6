package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Part;
import clipramp.circuit.Tolerance;
import clipramp.files.Key.Need;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.files.Node.Sequence;
import clipramp.units.Quantity;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Supplier;

/**
 * One mapping being read: takes keys by their catalogue entry, uses defaults, collects every problem. What was refused
 * is replaced by a plausible value, so that reading goes on and finds the rest.
 */
final class Scope {
    /** Keys that any device may carry beside its figures. */
    private static final Set<String> DEVICE_WORDS = Set.of("clipramp", "kind", "id", "like", "sources");

    private final KeyCatalogue catalogue = KeyCatalogue.standard();
    private final Findings findings;
    private final Mapping node;
    private final String path;
    private final String prefix;
    private final MappingProblems problems;
    private final Set<String> taken = new HashSet<>();

    /**
     * @param findings where problems go
     * @param node the mapping
     * @param path its key as a person names it
     * @param prefix its key in the catalogue
     */
    Scope(Findings findings, Mapping node, String path, String prefix) {
        this.findings = findings;
        this.node = node;
        this.path = path;
        this.prefix = prefix;
        problems = new MappingProblems(findings, node, path, catalogue.namesUnder(prefix));
    }

    Place place() {
        return node.place();
    }

    String path() {
        return path;
    }

    Findings findings() {
        return findings;
    }

    String pathOf(String name) {
        return problems.pathOf(name);
    }

    private String catalogued(String name) {
        return prefix.isEmpty() ? name : prefix + "." + name;
    }

    boolean has(String name) {
        return node.entry(name).isPresent();
    }

    /** The node at a key, which counts as read from here on. */
    Optional<Node> take(String name) {
        taken.add(name);
        return node.get(name);
    }

    Place placeOf(String name) {
        return node.get(name).map(Node::place).orElse(node.place());
    }

    /** Where the value of a dotted key stands, or the nearest mapping around it that is there. */
    Place placeOfPath(String dotted) {
        return node.placeOf(dotted);
    }

    /** What a key holds as one text; empty where it is missing, which has then been dealt with. */
    private Optional<Scalar> scalar(String name) {
        Key key = catalogue.require(catalogued(name));
        Optional<Node> found = take(name);
        if (found.isEmpty()) {
            if (key.need() == Need.DEFAULTED) {
                findings.assume(pathOf(name), key.standard());
                return Optional.of(new Scalar(key.standard(), false, node.place()));
            }
            if (key.need() == Need.REQUIRED) {
                missing(name, key);
            }
            return Optional.empty();
        }
        if (found.get() instanceof Scalar scalar) {
            return key.need() == Need.OPTIONAL && scalar.isNone() ? Optional.empty() : found.map(n -> scalar);
        }
        problems.wrongShape(name, found.get(), key.range());
        return Optional.empty();
    }

    void missing(String name, Key key) {
        problems.missing(name, key);
    }

    private <T> Optional<T> read(String name, Scalar scalar, Supplier<T> reader) {
        try {
            return Optional.of(reader.get());
        } catch (RefusedQuantityException e) {
            findings.refused(scalar.place(), pathOf(name), e.refusal());
            return Optional.empty();
        }
    }

    Optional<Quantity> quantityAt(String name) {
        Key key = catalogue.require(catalogued(name));
        return scalar(name).flatMap(s -> read(name, s, () -> QuantityReader.read(s.text(), key.expected())));
    }

    /** A required or defaulted quantity, SI. */
    double quantity(String name) {
        return quantityAt(name).map(Quantity::value).orElseGet(() -> standIn(name));
    }

    /** A quantity whose default is another value, in words that say where it comes from. */
    double quantityOr(String name, double other, String otherInWords) {
        if (has(name)) {
            return quantity(name);
        }
        taken.add(name);
        findings.assume(pathOf(name), otherInWords);
        return other;
    }

    OptionalDouble optional(String name) {
        return quantityAt(name).map(q -> OptionalDouble.of(q.value())).orElse(OptionalDouble.empty());
    }

    private double standIn(String name) {
        return catalogue.require(catalogued(name)).standIn();
    }

    Part part(String name) {
        return quantityAt(name).map(Scope::asPart).orElseGet(() -> Part.of(standIn(name)));
    }

    Optional<Part> optionalPart(String name) {
        return quantityAt(name).map(Scope::asPart);
    }

    private static Part asPart(Quantity q) {
        return new Part(q.value(), new Tolerance(q.minus(), q.plus()), q.ratedWatts(), q.ratedVolts());
    }

    int whole(String name) {
        Key key = catalogue.require(catalogued(name));
        Optional<Scalar> scalar = scalar(name);
        if (scalar.isEmpty()) {
            return (int) key.low();
        }
        double value = read(
                        name,
                        scalar.get(),
                        () -> QuantityReader.read(scalar.get().text(), key.expected()))
                .map(Quantity::value)
                .orElse(key.low());
        if (value != Math.rint(value)) {
            findings.problem(
                    scalar.get().place(),
                    pathOf(name),
                    scalar.get().text(),
                    "a whole number",
                    "read \"" + scalar.get().text() + "\"; expected a whole number, " + key.range() + ".");
            return (int) key.low();
        }
        return (int) value;
    }

    /** A ratio, 2 or 2:1. */
    double ratio(String name) {
        Key key = catalogue.require(catalogued(name));
        return scalar(name)
                .flatMap(s -> read(name, s, () -> RatioText.read(s.text(), key.expected())))
                .orElse(key.standIn());
    }

    /** One of a key's words; empty where it was refused. */
    Optional<String> word(String name) {
        Key key = catalogue.require(catalogued(name));
        Optional<Scalar> scalar = scalar(name);
        if (scalar.isPresent() && !key.words().contains(scalar.get().text())) {
            problems.noSuchWord(name, scalar.get(), key.words());
            return Optional.empty();
        }
        return scalar.map(Scalar::text);
    }

    /** A word whose default depends on others. */
    Optional<String> wordOr(String name, String other) {
        if (has(name)) {
            return word(name);
        }
        taken.add(name);
        findings.assume(pathOf(name), other);
        return Optional.of(other);
    }

    String text(String name) {
        return scalar(name).map(Scalar::text).orElse("");
    }

    Characteristic characteristic(String name) {
        if (node.get(name).orElse(null) instanceof Mapping) {
            taken.add(name);
            Key key = catalogue.require(catalogued(name));
            return new CharacteristicReader(findings, key, pathOf(name), (Mapping)
                            node.get(name).orElseThrow())
                    .read();
        }
        return quantityAt(name)
                .map(q -> q.hasTolerance() ? CharacteristicReader.spread(q) : Characteristic.exactly(q.value()))
                .orElseGet(() -> Characteristic.exactly(standIn(name)));
    }

    /** The mapping at a key; a missing required one is read as empty, so that what it lacks is not told twice. */
    Optional<Scope> child(String name) {
        Key key = catalogue.require(catalogued(name));
        Optional<Node> found = take(name);
        boolean optional = key.need() != Need.REQUIRED;
        if (found.isEmpty()) {
            if (!optional) {
                missing(name, key);
            }
            return Optional.empty();
        }
        if (found.get() instanceof Mapping mapping) {
            return Optional.of(new Scope(findings, mapping, pathOf(name), catalogued(name)));
        }
        if (found.get() instanceof Scalar scalar && scalar.isNone() && optional) {
            return Optional.empty();
        }
        problems.wrongShape(
                name, found.get(), "more keys, {" + String.join(", ", catalogue.namesUnder(catalogued(name))) + "}");
        return Optional.empty();
    }

    /** The mappings of a list; empty where the key is missing or wrong, which has then been said. */
    List<Scope> items(String name) {
        List<Scope> scopes = new ArrayList<>();
        List<Node> nodes = listed(name);
        for (int i = 0; i < nodes.size(); i++) {
            String itemPath = pathOf(name) + "[" + i + "]";
            if (nodes.get(i) instanceof Mapping mapping) {
                scopes.add(new Scope(findings, mapping, itemPath, catalogued(name)));
            } else {
                String keys = String.join(": , ", catalogue.namesUnder(catalogued(name)));
                findings.problem(
                        nodes.get(i).place(), itemPath, "", keys, "expected keys in braces, {" + keys + ": }.");
            }
        }
        return scopes;
    }

    /** The items of a list. */
    List<Node> listed(String name) {
        Key key = catalogue.require(catalogued(name));
        Optional<Node> found = take(name);
        if (found.isEmpty()) {
            if (key.need() == Need.REQUIRED) {
                missing(name, key);
            }
            return List.of();
        }
        if (found.get() instanceof Sequence sequence) {
            if (sequence.items().isEmpty() && key.need() == Need.REQUIRED) {
                findings.problem(sequence.place(), pathOf(name), "[]", "at least one item", "the list is empty.");
            }
            return sequence.items();
        }
        if (!(found.get() instanceof Scalar scalar && scalar.isNone() && key.need() == Need.OPTIONAL)) {
            problems.wrongShape(name, found.get(), "a list, [ ]");
        }
        return List.of();
    }

    /**
     * Makes a record; what its constructor refuses becomes a problem of this mapping, unless problems are known since
     * {@code before}, which is then the cause.
     */
    <T> Optional<T> make(int before, Supplier<T> maker) {
        try {
            return Optional.of(maker.get());
        } catch (IllegalArgumentException e) {
            if (findings.count() == before) {
                findings.problem(node.place(), path, e.getMessage() + ".");
            }
            return Optional.empty();
        }
    }

    /** The text of an optional phrase key, such as a goal; empty where it is missing or none. */
    Optional<Scalar> phrase(String name) {
        return scalar(name);
    }

    /** Refuses what was not taken: unknown keys, and known ones that have no place here. */
    void close(String why) {
        close(why, Set.of());
    }

    /** The same for a device, which may also carry id, kind and sources. */
    void closeDevice() {
        close("", DEVICE_WORDS);
    }

    /** Refuses unknown keys only, where a problem leaves open which of the known ones belong. */
    void closeUnknown() {
        close("", Set.copyOf(catalogue.namesUnder(prefix)));
    }

    private void close(String why, Set<String> allowed) {
        problems.leftOver(taken, allowed, why);
    }
}
