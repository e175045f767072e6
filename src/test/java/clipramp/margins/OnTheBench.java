package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import java.util.List;
import java.util.OptionalDouble;

/** A design judged in one condition, margin by margin: quicker than a whole run of the judge. */
final class OnTheBench {
    static final Condition USUAL = new Condition(230, 50, 25);

    private OnTheBench() {}

    /** Nominal line of 230 V at 25 °C alone. */
    static Bench usual(Design design) {
        return at(design, 230, 25);
    }

    static Bench at(Design design, double lineVolts, double celsius) {
        return new Bench(design, OptionalDouble.of(lineVolts), OptionalDouble.of(celsius));
    }

    /** The one of a kind; fails where it is not judged. */
    static Margin of(List<Margin> margins, MarginKind kind) {
        return margins.stream().filter(m -> m.kind() == kind).findFirst().orElseThrow();
    }
}
