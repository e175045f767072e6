package clipramp.margins;

import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.firing.Solution;
import clipramp.margins.Margin.Sense;
import clipramp.power.KnobSearch;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What the knob was wanted to reach at its ends, against what it does. */
final class WantedMargins {
    private static final String ASLEEP =
            "The thyristor stays off here in some condition; the gate, latching and valley-current margins say why.";

    private WantedMargins() {}

    static List<Margin> of(Bench bench) {
        List<Margin> margins = new ArrayList<>();
        bench.design().wanted().lowest().ifPresent(goal -> margins.add(judged(bench, MarginKind.WANTED_LOWEST, goal)));
        bench.design()
                .wanted()
                .highest()
                .ifPresent(goal -> margins.add(judged(bench, MarginKind.WANTED_HIGHEST, goal)));
        return margins;
    }

    private static Margin judged(Bench bench, MarginKind kind, Goal goal) {
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            findings.addAll(compared(bench, kind, goal, at));
        }
        Margin worst = Finding.worst(kind, findings);
        return new Margin(
                kind,
                worst.demand(),
                worst.offered(),
                unit(goal.measure()),
                worst.sense(),
                worst.ratio(),
                worst.holdsFrom(),
                worst.condition(),
                worst.verdict(),
                worst.formula(),
                worst.source(),
                asleep(bench, kind, goal) ? ASLEEP : worst.remedy(),
                worst.parts());
    }

    /** More power cannot be had by a smaller R_E where nothing fires at all. */
    private static boolean asleep(Bench bench, MarginKind kind, Goal goal) {
        double ohms = bench.design().ramp().rampOhms(goal.position());
        return kind == MarginKind.WANTED_HIGHEST
                && bench.conditions().stream()
                        .anyMatch(at -> bench.load(at.condition(), ohms).watts() == 0);
    }

    private static List<Finding> compared(Bench bench, MarginKind kind, Goal goal, JudgedCondition at) {
        double ohms = bench.design().ramp().rampOhms(goal.position());
        Solution solution = bench.solution(at.condition(), ohms);
        LoadResult load = bench.load(at.condition(), ohms);
        double there = shown(goal.measure(), measured(goal.measure(), solution, load));
        double from = shown(goal.measure(), goal.from());
        double to = shown(goal.measure(), goal.to());
        // An angle runs against the power: the lowest setting is wanted at or over it.
        boolean atMost = (kind == MarginKind.WANTED_LOWEST) != (goal.measure() == Measure.ANGLE);
        List<Finding> findings = new ArrayList<>();
        if (atMost || goal.isBand()) {
            findings.add(new Finding(
                    at.words(), to, there, Sense.AT_MOST, formula(goal, ohms, solution, load, "at most", goal.to())));
        }
        if (!atMost || goal.isBand()) {
            findings.add(new Finding(
                    at.words(),
                    from,
                    there,
                    Sense.AT_LEAST,
                    formula(goal, ohms, solution, load, "at least", goal.from())));
        }
        return findings;
    }

    private static double measured(Measure measure, Solution solution, LoadResult load) {
        return switch (measure) {
            case FRACTION -> load.fraction();
            case WATTS -> load.watts();
            case VOLTS -> load.rmsVolts();
            // A thyristor that stays off is as good as fired at the half cycle's end.
            case ANGLE -> solution.shown().firingRad().orElse(Math.PI);
        };
    }

    private static double shown(Measure measure, double value) {
        return measure == Measure.ANGLE ? Math.toDegrees(value) : value;
    }

    private static String formula(
            Goal goal, double ohms, Solution solution, LoadResult load, String bound, double limit) {
        String fired = solution.shown().firingRad().isPresent()
                ? "fires at " + Say.angle(solution.shown().firingRad().getAsDouble())
                : "stays off";
        return "knob at " + Say.share(goal.position()) + ": R_E = " + Say.ohms(ohms) + ", " + fired + ", "
                + Say.volts(load.rmsVolts()) + ", " + Say.watts(load.watts()) + " = " + Say.share(load.fraction())
                + " of full power; wanted " + bound + " " + text(goal.measure(), limit);
    }

    private static String text(Measure measure, double value) {
        return switch (measure) {
            case FRACTION -> Say.share(value);
            case WATTS -> Say.watts(value);
            case VOLTS -> Say.volts(value);
            case ANGLE -> Say.angle(value);
        };
    }

    private static String unit(Measure measure) {
        return switch (measure) {
            case FRACTION -> "";
            case WATTS -> "W";
            case VOLTS -> "V";
            case ANGLE -> "deg";
        };
    }

    /** The lowest wanted power at a condition, W, where one is wanted. */
    static Optional<Double> lowestWatts(Bench bench, JudgedCondition at) {
        return bench.design().wanted().lowest().map(goal -> {
            double full = LoadPower.fullWatts(bench.design(), at.condition());
            return switch (goal.measure()) {
                case FRACTION -> goal.to() * full;
                case WATTS -> goal.to();
                case VOLTS ->
                    KnobSearch.firingRadForVolts(bench.design(), at.condition(), goal.to()).stream()
                            .map(rad -> wattsAt(bench, at, rad))
                            .findFirst()
                            .orElse(full);
                case ANGLE -> wattsAt(bench, at, goal.from());
            };
        });
    }

    private static double wattsAt(Bench bench, JudgedCondition at, double firingRad) {
        return LoadPower.atFiringAngle(bench.design(), at.condition(), firingRad)
                .watts();
    }
}
