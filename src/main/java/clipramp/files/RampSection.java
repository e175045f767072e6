package clipramp.files;

import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.circuit.PotLaw.Table.Point;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trimmers;
import clipramp.files.Node.Scalar;
import clipramp.files.Node.Sequence;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads {@code ramp}. */
final class RampSection {
    private final Findings findings;

    private RampSection(Findings findings) {
        this.findings = findings;
    }

    static Optional<Ramp> read(Scope scope) {
        return new RampSection(scope.findings()).ramp(scope);
    }

    private Optional<Ramp> ramp(Scope scope) {
        int before = findings.count();
        Part capacitor = scope.part("capacitor");
        Part fixed = scope.part("fixed");
        if (!scope.has("pot")) {
            findings.assume("ramp.pot", "none, a fixed ramp");
        }
        Optional<Scope> potScope = scope.child("pot");
        Optional<Pot> pot = potScope.flatMap(this::pot);
        Trimmers trimmers = new Trimmers(scope.optionalPart("trim-high"), scope.optionalPart("trim-low"));
        scope.close("");
        if (potScope.isPresent() && pot.isEmpty()) {
            return Optional.empty();
        }
        if (pot.isEmpty() && fixed.value() == 0 && findings.count() == before) {
            findings.problem(
                    scope.placeOf("fixed"),
                    "ramp.fixed",
                    "0",
                    "a resistance above zero",
                    "read 0 Ω without a pot: the ramp would have no resistance at all. Give ramp.fixed a value.");
            return Optional.empty();
        }
        if (pot.isEmpty() && trimmers.low().isPresent() && findings.count() == before) {
            findings.problem(
                    scope.placeOf("trim-low"),
                    "ramp.trim-low",
                    "a trimmer across a pot, and ramp.pot is none. Give a pot, or leave trim-low out.");
            return Optional.empty();
        }
        return scope.make(before, () -> new Ramp(capacitor, fixed, pot, trimmers));
    }

    private Optional<Pot> pot(Scope scope) {
        int before = findings.count();
        Part track = scope.part("track");
        double end = scope.part("end").value();
        Optional<String> word = scope.word("law");
        Optional<PotLaw> law = word.flatMap(w -> law(scope, w));
        Optional<Pot.Sense> sense =
                scope.word("sense").map(w -> w.equals("falling") ? Pot.Sense.FALLING : Pot.Sense.RISING);
        Optional<Part> shunt = scope.optionalPart("shunt");
        if (word.isPresent()) {
            scope.close("with law " + word.get());
        } else {
            scope.closeUnknown();
        }
        if (law.isEmpty() || sense.isEmpty()) {
            return Optional.empty();
        }
        return scope.make(before, () -> new Pot(track, end, law.get(), sense.get(), shunt));
    }

    private Optional<PotLaw> law(Scope scope, String word) {
        return switch (word) {
            case "log" -> Optional.of(new PotLaw.Logarithmic(scope.quantity("half")));
            case "reverse-log" -> Optional.of(new PotLaw.ReverseLogarithmic(scope.quantity("half")));
            case "table" -> table(scope);
            default -> Optional.of(new PotLaw.Linear());
        };
    }

    private Optional<PotLaw> table(Scope scope) {
        int before = findings.count();
        List<Point> points = new ArrayList<>();
        List<Node> items = scope.listed("points");
        for (int i = 0; i < items.size(); i++) {
            point(items.get(i), scope.pathOf("points") + "[" + i + "]").ifPresent(points::add);
        }
        if (findings.count() > before) {
            return Optional.empty();
        }
        Optional<String> fault = fault(points);
        if (fault.isPresent()) {
            findings.problem(scope.placeOf("points"), scope.pathOf("points"), fault.get());
            return Optional.empty();
        }
        return Optional.of(new PotLaw.Table(points));
    }

    private static Optional<String> fault(List<Point> points) {
        int last = points.size() - 1;
        if (last < 1 || points.get(0).rotation() != 0 || points.get(last).rotation() != 1) {
            return Optional.of("a pot's table runs from rotation 0 % to rotation 100 %, two points at least.");
        }
        for (int i = 1; i <= last; i++) {
            if (points.get(i).rotation() <= points.get(i - 1).rotation()
                    || points.get(i).share() < points.get(i - 1).share()) {
                return Optional.of("a pot's rotations rise from point to point and its shares never fall; point " + i
                        + " breaks that.");
            }
        }
        return Optional.empty();
    }

    private Optional<Point> point(Node node, String path) {
        if (node instanceof Sequence pair && pair.items().size() == 2) {
            OptionalDouble rotation = share(pair.items().get(0), path + "[0]");
            OptionalDouble share = share(pair.items().get(1), path + "[1]");
            return rotation.isPresent() && share.isPresent()
                    ? Optional.of(new Point(rotation.getAsDouble(), share.getAsDouble()))
                    : Optional.empty();
        }
        findings.problem(node.place(), path, "expected a pair of rotation and track share, [50 %, 15 %].");
        return Optional.empty();
    }

    private OptionalDouble share(Node node, String path) {
        if (!(node instanceof Scalar scalar)) {
            findings.problem(node.place(), path, "expected a share, such as 50 %.");
            return OptionalDouble.empty();
        }
        try {
            return OptionalDouble.of(QuantityReader.read(scalar.text(), Expected.within(Unit.FRACTION, 0, 1))
                    .value());
        } catch (RefusedQuantityException e) {
            findings.refused(scalar.place(), path, e.refusal());
            return OptionalDouble.empty();
        }
    }
}
