package clipramp.margins;

import clipramp.margins.Margin.Sense;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;

/**
 * One margin at one condition: what is asked and what there is.
 *
 * @param condition where, in words
 * @param demand what is asked, in the kind's unit; NaN where a datum is missing
 * @param offered what there is, in the kind's unit; NaN where a datum is missing
 * @param sense which side is good
 * @param formula the formula with the numbers in, or which datum is missing
 */
record Finding(String condition, double demand, double offered, Sense sense, String formula) {

    /** A finding that is none: a datum, named in words, is missing. */
    static Finding missing(MarginKind kind, String condition, String datum) {
        return new Finding(condition, Double.NaN, Double.NaN, kind.sense(), "not judged: " + datum);
    }

    /** Offered over demand, or demand over offered for a ceiling; empty for a zero divisor or a missing datum. */
    OptionalDouble ratio() {
        double over = sense == Sense.AT_LEAST ? offered : demand;
        double under = sense == Sense.AT_LEAST ? demand : offered;
        return under == 0 || Double.isNaN(over) || Double.isNaN(under)
                ? OptionalDouble.empty()
                : OptionalDouble.of(over / under);
    }

    /** The word for this finding alone. */
    Verdict verdict(MarginKind kind) {
        if (Double.isNaN(demand) || Double.isNaN(offered)) {
            return Verdict.NOT_JUDGED;
        }
        boolean meets = sense == Sense.AT_LEAST ? offered >= demand : offered <= demand;
        if (!meets) {
            return kind.gravest();
        }
        return ratio().isPresent() && ratio().getAsDouble() < kind.holdsFrom() && ratio().getAsDouble() >= 0
                ? Verdict.TIGHT
                : Verdict.HOLDS;
    }

    /** Smaller is worse; an absent ratio is worst where it fails and best where it holds. */
    private double rank(MarginKind kind) {
        double absent = verdict(kind) == Verdict.FAILS ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        return ratio().orElse(absent);
    }

    /** The margin of the worst of several findings of one kind. */
    static Margin worst(MarginKind kind, List<Finding> findings) {
        Comparator<Finding> gravity =
                Comparator.comparing((Finding finding) -> finding.verdict(kind)).reversed();
        Finding worst = findings.stream()
                .min(gravity.thenComparingDouble(finding -> finding.rank(kind)))
                .orElseThrow();
        return new Margin(
                kind,
                worst.demand(),
                worst.offered(),
                kind.unit(),
                worst.sense(),
                worst.ratio(),
                kind.holdsFrom(),
                worst.condition(),
                worst.verdict(kind),
                worst.formula(),
                kind.source(),
                kind.remedy(),
                kind.parts());
    }
}
