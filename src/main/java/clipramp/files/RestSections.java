package clipramp.files;

import clipramp.circuit.Document;
import clipramp.circuit.Snubber;
import clipramp.circuit.Surroundings;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.files.Node.Mapping;
import clipramp.files.Node.Scalar;
import clipramp.units.Band;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.QuantityText;
import clipramp.units.Refusal;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Reads {@code document}, {@code snubber}, {@code surroundings}, {@code wanted}, {@code derating} and {@code designators}. */
final class RestSections {
    private static final List<Expected> GOALS = List.of(
            Expected.within(Unit.FRACTION, 0, 1),
            Expected.within(Unit.WATT, 0, 1e6),
            Expected.within(Unit.VOLT, 0, 1000),
            Expected.within(Unit.ANGLE, 0, Math.PI));

    private RestSections() {}

    static Document document(Scope root) {
        Scope scope = root.child("document").orElse(null);
        if (scope == null) {
            return Document.EMPTY;
        }
        Document document = new Document(
                scope.text("number"),
                scope.text("revision"),
                scope.text("prepared-by"),
                scope.text("reviewed-by"),
                date(scope));
        scope.close("");
        return document;
    }

    private static String date(Scope scope) {
        String date = scope.text("date");
        if (!date.isEmpty() && !isDate(date)) {
            scope.findings()
                    .problem(
                            scope.placeOf("date"),
                            "document.date",
                            date,
                            "year-month-day",
                            "read \"" + date + "\"; expected a date as year-month-day, such as 2031-01-31.");
        }
        return date;
    }

    private static boolean isDate(String text) {
        try {
            LocalDate.parse(text);
            return true;
        } catch (DateTimeParseException e) {
            return false;
        }
    }

    static Optional<Surroundings> surroundings(Scope root) {
        Scope scope = root.child("surroundings")
                .orElseGet(() -> new Scope(
                        root.findings(), Mapping.empty(root.placeOf("surroundings")), "surroundings", "surroundings"));
        int before = scope.findings().count();
        double coldest = scope.quantity("coldest");
        double hottest = scope.quantity("hottest");
        scope.close("");
        if (coldest > hottest && scope.findings().count() == before) {
            scope.findings()
                    .problem(
                            scope.placeOf("coldest"),
                            "surroundings.coldest",
                            QuantityText.format(coldest, Unit.CELSIUS),
                            QuantityText.format(hottest, Unit.CELSIUS) + " or less",
                            "read " + QuantityText.format(coldest, Unit.CELSIUS) + ", above surroundings.hottest of "
                                    + QuantityText.format(hottest, Unit.CELSIUS) + ". Exchange them?");
            return Optional.empty();
        }
        return scope.make(before, () -> new Surroundings(coldest, hottest));
    }

    static Optional<Snubber> snubber(Scope scope) {
        int before = scope.findings().count();
        double ohms = scope.quantity("resistance");
        double farads = scope.quantity("capacitance");
        scope.close("");
        return scope.make(before, () -> new Snubber(ohms, farads));
    }

    static double derating(Scope root) {
        Scope scope = root.child("derating")
                .orElseGet(() ->
                        new Scope(root.findings(), Mapping.empty(root.placeOf("derating")), "derating", "derating"));
        double share = scope.quantity("resistors");
        scope.close("");
        return share;
    }

    static Wanted wanted(Scope root) {
        Optional<Scope> scope = root.child("wanted");
        Wanted wanted = new Wanted(scope.flatMap(s -> goal(s, "lowest")), scope.flatMap(s -> goal(s, "highest")));
        scope.ifPresent(s -> s.close(""));
        return wanted;
    }

    private static Optional<Goal> goal(Scope scope, String name) {
        Optional<Scalar> scalar = scope.phrase(name);
        if (scalar.isEmpty()) {
            return Optional.empty();
        }
        String text = scalar.get().text();
        AtPhrase phrase = AtPhrase.of(text);
        try {
            Band band = Band.read(phrase.what(), GOALS);
            String at = phrase.at()
                    .orElseThrow(() -> new RefusedQuantityException(new Refusal(
                            text,
                            "",
                            "a goal at a knob position",
                            text + (name.equals("lowest") ? " at 0 %?" : " at 100 %?"))));
            double position = QuantityReader.read(at, Expected.within(Unit.FRACTION, 0, 1))
                    .value();
            return Optional.of(new Goal(
                    measure(band.low().unit()), band.low().value(), band.high().value(), position));
        } catch (RefusedQuantityException e) {
            scope.findings().refused(scalar.get().place(), scope.pathOf(name), e.refusal());
            return Optional.empty();
        }
    }

    private static Measure measure(Unit unit) {
        return switch (unit) {
            case WATT -> Measure.WATTS;
            case VOLT -> Measure.VOLTS;
            case ANGLE -> Measure.ANGLE;
            default -> Measure.FRACTION;
        };
    }

    static Map<String, String> designators(Scope root) {
        Map<String, String> names = new TreeMap<>();
        Node node = root.take("designators").orElse(null);
        if (node == null || (node instanceof Scalar s && s.isNone())) {
            return names;
        }
        if (!(node instanceof Mapping mapping)) {
            root.findings().problem(node.place(), "designators", "expected names by key, {ramp.capacitor: C3}.");
            return names;
        }
        List<String> known = Designatable.PATHS;
        for (Node.Entry entry : mapping.entries()) {
            String path = "designators." + entry.key();
            if (!known.contains(entry.key())) {
                root.findings().unknown(entry.place(), path, entry.key(), "no part has this key", known);
            } else if (entry.value() instanceof Scalar scalar) {
                designator(root.findings(), names, entry.key(), scalar, path);
            } else {
                root.findings().problem(entry.value().place(), path, "expected one name, such as C3.");
            }
        }
        return names;
    }

    private static void designator(
            Findings findings, Map<String, String> names, String key, Scalar scalar, String path) {
        String part = key.equals("ramp.pot") ? "ramp.pot.track" : key;
        if (names.containsValue(scalar.text())) {
            findings.problem(
                    scalar.place(),
                    path,
                    scalar.text(),
                    "a name of its own",
                    "read \"" + scalar.text() + "\", which names another part already. Give each part its own.");
        } else if (names.put(part, scalar.text()) != null) {
            findings.problem(scalar.place(), path, "the pot is named twice, as ramp.pot and as ramp.pot.track.");
        }
    }
}
