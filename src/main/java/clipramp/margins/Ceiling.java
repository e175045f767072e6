package clipramp.margins;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

/** A rating that something must stay under: the shape that most margins share. */
final class Ceiling {
    private Ceiling() {}

    /**
     * A ceiling judged at several conditions.
     *
     * @param kind the margin
     * @param conditions where
     * @param limit the rating; empty where it is not stated
     * @param missing which datum is missing then, in words
     * @param offered what there is at a condition
     * @param say how a figure is written
     */
    static Margin over(
            MarginKind kind,
            List<JudgedCondition> conditions,
            OptionalDouble limit,
            String missing,
            ToDoubleFunction<JudgedCondition> offered,
            DoubleFunction<String> say) {
        if (limit.isEmpty()) {
            return unjudged(kind, missing);
        }
        List<Finding> findings = new ArrayList<>();
        double ceiling = limit.getAsDouble();
        for (JudgedCondition at : conditions) {
            double there = offered.applyAsDouble(at);
            findings.add(new Finding(
                    at.words(), ceiling, there, kind.sense(), say.apply(there) + " against " + say.apply(ceiling)));
        }
        return Finding.worst(kind, findings);
    }

    /** A margin that cannot be judged anywhere, for want of a datum that is named in words. */
    static Margin unjudged(MarginKind kind, String missing) {
        return Finding.worst(kind, List.of(Finding.missing(kind, "any condition", missing)));
    }
}
