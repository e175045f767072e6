package clipramp.power;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The load's current over whole periods of the line, in its periodic state: every stretch of it in order. Means, duties
 * and harmonics are all integrals over these stretches.
 *
 * @param spanRad angle that the stretches cover, a multiple of 2 pi, rad
 * @param spans stretches of current in order, from 0, the fundamental's positive-going zero, to {@code spanRad}
 * @param firedRad angle, counted from the zero of its own half cycle, at which current first begins in the thyristor;
 *     empty where none does
 * @param extinctionRad angle, counted from the same zero, at which the load's current ends; empty where there is none,
 *     or where it never ends
 * @param missedHalves half cycles in the span whose pulses all came while the current of the half cycle before still
 *     flowed
 * @param settled whether the current repeats; otherwise this is the last of what was computed
 * @param letsGo whether the thyristor turns off in every half cycle; false on the dc side of a bridge whose current
 *     stays in the thyristor through the line's zero
 */
public record LoadPeriod(
        double spanRad,
        List<CurrentSpan> spans,
        OptionalDouble firedRad,
        OptionalDouble extinctionRad,
        int missedHalves,
        boolean settled,
        boolean letsGo) {
    /** Two stretches nearer than this follow each other without a gap, rad. */
    private static final double NEXT_RAD = 1e-5;

    /** Keeps a copy of the stretches. */
    public LoadPeriod {
        spans = List.copyOf(spans);
    }

    /** Line angles, 0 to {@code spanRad}, at which a current through the thyristor dies and none takes its place, rad. */
    public List<Double> extinctionsRad() {
        List<Double> ends = new ArrayList<>();
        for (int i = 0; i < spans.size(); i++) {
            CurrentSpan span = spans.get(i);
            CurrentSpan next = spans.get((i + 1) % spans.size());
            double nextFrom = next.fromRad() + (i + 1 == spans.size() ? spanRad : 0);
            if (span.throughThyristor() && nextFrom - span.toRad() > NEXT_RAD) {
                ends.add(span.toRad());
            }
        }
        return ends;
    }

    /** How many half cycles of the line the span holds. */
    public int halfCycles() {
        return (int) Math.round(spanRad / Math.PI);
    }
}
