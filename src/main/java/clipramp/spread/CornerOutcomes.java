package clipramp.spread;

import clipramp.engine.UnitValues;
import java.util.HashMap;
import java.util.Map;

/**
 * What units with this value of the one factor and that value of the other do at one knob position. The search for the
 * earliest unit asks for most of those that the search for the strongest one does, and each asks for many twice.
 */
final class CornerOutcomes {
    private record Corner(double latestRad, double fraction) {}

    private final Lot lot;
    private final double trackShare;
    private final UnitSolver solver;
    private final UnitValues unit;
    private final UnitOutcome outcome = new UnitOutcome();
    private final Map<Figures, Corner> known = new HashMap<>();

    CornerOutcomes(Lot lot, double trackShare) {
        this.lot = lot;
        this.trackShare = trackShare;
        solver = lot.solver();
        unit = lot.blank();
    }

    /** Firing angle, rad; pi where the thyristor stays off. */
    double latestRad(double[] values) {
        return at(values).latestRad();
    }

    /** Power as a share of full power. */
    double fraction(double[] values) {
        return at(values).fraction();
    }

    private Corner at(double[] values) {
        return known.computeIfAbsent(new Figures(values), figures -> {
            for (int k = 0; k < values.length; k++) {
                lot.factors().get(k).slot().set(unit, values[k]);
            }
            solver.prepare(unit);
            solver.solve(unit, trackShare, outcome);
            return new Corner(outcome.latestRad(), outcome.fraction);
        });
    }
}
