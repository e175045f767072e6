package clipramp.files;

import clipramp.circuit.Line;
import clipramp.circuit.Line.Harmonic;
import clipramp.files.Node.Scalar;
import clipramp.units.Expected;
import clipramp.units.Quantity;
import clipramp.units.QuantityReader;
import clipramp.units.QuantityText;
import clipramp.units.Refusal;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.io.IOException;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Reads {@code line}. */
final class LineSection {
    private LineSection() {}

    static Optional<Line> read(Scope scope) {
        int before = scope.findings().count();
        double hertz = scope.quantity("frequency");
        Optional<RecordedLine> recorded = recorded(scope, hertz);
        double volts = recorded.isPresent()
                ? scope.quantityOr(
                        "voltage",
                        recorded.get().rmsVolts(),
                        QuantityText.format(recorded.get().rmsVolts(), Unit.VOLT, 4) + " as recorded")
                : scope.quantity("voltage");
        double low = limit(scope, "low", volts);
        double high = limit(scope, "high", volts);
        List<Harmonic> written = harmonics(scope);
        List<Harmonic> harmonics = recorded.map(RecordedLine::harmonics).orElse(written);
        scope.closeDevice();
        return scope.make(before, () -> new Line(volts, hertz, low, high, harmonics));
    }

    private static Optional<RecordedLine> recorded(Scope scope, double hertz) {
        String name = scope.text("recorded");
        if (name.isEmpty() || name.equals("none")) {
            return Optional.empty();
        }
        Place place = scope.placeOf("recorded");
        String path = scope.pathOf("recorded");
        if (scope.has("harmonics")) {
            scope.findings().problem(place, path, "recorded and harmonics both stand here; keep one of them.");
        }
        try {
            Source source = Source.of(Path.of(place.file()).resolveSibling(name));
            RecordedLine recorded = RecordedLine.of(source.text(), hertz);
            scope.findings().alsoRead(source.text());
            scope.findings().note(recorded.leftOut());
            return Optional.of(recorded);
        } catch (IOException | InvalidPathException e) {
            scope.findings()
                    .problem(place, path, "the file " + name + " cannot be read. It is looked for beside the design.");
        } catch (IllegalArgumentException e) {
            scope.findings().problem(place, path, name + " " + e.getMessage() + ".");
        }
        return Optional.empty();
    }

    private static double limit(Scope scope, String name, double nominal) {
        Key key = KeyCatalogue.standard().require("line." + name);
        Optional<Scalar> scalar = scope.phrase(name);
        if (scalar.isEmpty()) {
            return nominal;
        }
        boolean low = name.equals("low");
        List<Expected> choices = List.of(
                Expected.within(Unit.FRACTION, key.low(), key.high()),
                Expected.within(Unit.VOLT, low ? nominal / 2 : nominal, low ? nominal : nominal * 1.5));
        String text = scalar.get().text();
        try {
            Quantity q = QuantityReader.readOneOf(text, choices);
            return q.unit() == Unit.VOLT ? q.value() : nominal + nominal * q.value();
        } catch (RefusedQuantityException e) {
            Refusal r = e.refusal();
            Refusal helped = new Refusal(r.read(), r.meaning(), r.expected(), suggestion(text, low, r.suggestion()));
            scope.findings().refused(scalar.get().place(), scope.pathOf(name), helped);
            return nominal;
        }
    }

    private static String suggestion(String text, boolean low, String other) {
        if (low && text.matches("\\d+(\\.\\d+)? ?%")) {
            return "-" + text + "?";
        }
        if (text.matches("\\d{2,}(\\.\\d+)?")) {
            return text + " V?";
        }
        return other;
    }

    private static List<Harmonic> harmonics(Scope scope) {
        List<Harmonic> harmonics = new ArrayList<>();
        Set<Integer> orders = new HashSet<>();
        for (Scope item : scope.items("harmonics")) {
            int order = item.whole("order");
            double share = item.quantity("share");
            double phase = item.quantity("phase");
            item.close("");
            if (!orders.add(order)) {
                item.findings()
                        .problem(item.placeOf("order"), item.pathOf("order"), "order " + order + " stands twice.");
            }
            harmonics.add(new Harmonic(order, share, phase));
        }
        return harmonics;
    }
}
