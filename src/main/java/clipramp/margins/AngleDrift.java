package clipramp.margins;

import clipramp.circuit.Condition;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** How far line voltage and frequency alone move the firing angle at mid-knob. */
final class AngleDrift {
    /** A rule of ours, degrees: at 90 it is 3 % of full power. */
    private static final double ALLOWED_DEGREES = 3;

    /** EN 50160: the interconnected network keeps its frequency within 1 % nearly always. */
    private static final double FREQUENCY_SHARE = 0.01;

    private final Bench bench;
    private final Condition usual;

    AngleDrift(Bench bench, Condition usual) {
        this.bench = bench;
        this.usual = usual;
    }

    Margin margin() {
        MarginKind kind = MarginKind.ANGLE_DRIFT;
        double ohms = bench.midOhms();
        OptionalDouble middle = firingRad(usual, ohms);
        if (middle.isEmpty()) {
            return Ceiling.unjudged(kind, "the thyristor stays off at mid-knob");
        }
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            if (at.condition().celsius() == usual.celsius() && !at.condition().equals(usual)) {
                findings.add(moved(kind, at.words(), at.condition(), ohms, middle.getAsDouble()));
            }
        }
        for (int side = -1; side <= 1; side += 2) {
            double hertz = usual.lineHertz() * (1 + side * FREQUENCY_SHARE);
            Condition condition = new Condition(usual.lineVolts(), hertz, usual.celsius());
            findings.add(moved(kind, "line at " + Say.hertz(hertz), condition, ohms, middle.getAsDouble()));
        }
        return Finding.worst(kind, findings);
    }

    private Finding moved(MarginKind kind, String words, Condition condition, double ohms, double middleRad) {
        double there = firingRad(condition, ohms).orElse(Math.PI);
        double moved = Math.abs(there - middleRad);
        return new Finding(
                words,
                ALLOWED_DEGREES,
                Math.toDegrees(moved),
                kind.sense(),
                "R_E = " + Say.ohms(ohms) + ": " + Say.angle(middleRad) + " becomes " + Say.angle(there));
    }

    private OptionalDouble firingRad(Condition condition, double ohms) {
        return bench.solution(condition, ohms).shown().firingRad();
    }
}
