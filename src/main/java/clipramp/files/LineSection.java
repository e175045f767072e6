package clipramp.files;

import clipramp.circuit.Line;
import clipramp.circuit.Line.Harmonic;
import clipramp.files.Node.Scalar;
import clipramp.units.Expected;
import clipramp.units.Quantity;
import clipramp.units.QuantityReader;
import clipramp.units.Refusal;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
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
        double volts = scope.quantity("voltage");
        double hertz = scope.quantity("frequency");
        double low = limit(scope, "low", volts);
        double high = limit(scope, "high", volts);
        List<Harmonic> harmonics = harmonics(scope);
        scope.closeDevice();
        return scope.make(before, () -> new Line(volts, hertz, low, high, harmonics));
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
