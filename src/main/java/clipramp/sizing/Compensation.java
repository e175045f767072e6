package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.firing.Firing;
import clipramp.firing.PublishedRelations;
import clipramp.firing.PublishedRelations.BaseTwoRule;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The base-two resistor against temperature: the one that makes the firing angle flattest from the coldest to the
 * hottest, by the exact engine, beside the published rules and what each of them leaves. Nominal device, at mid-knob and
 * nominal line.
 *
 * @param flattest the exact answer, not rounded
 * @param rules the published rules, in their order
 */
public record Compensation(Choice flattest, List<Choice> rules) {
    /** Solved from the coldest to the hottest, both included. */
    private static final int TEMPERATURES = 5;

    private static final double LEAST_OHMS = 10;
    private static final double MOST_OHMS = 10_000;
    private static final int SCANNED = 25;
    private static final int TRIALS = 60;
    private static final double MID_KNOB = 0.5;

    /** 1e-4 of the resistor moves the drift far less than it is told to. */
    private static final double LOG_ACCURACY = 1e-4;

    /**
     * One base-two resistor and what it leaves.
     *
     * @param rule where it comes from
     * @param ohms base-two resistor, ohm
     * @param driftRad difference between the latest and the earliest firing angle over the temperatures, rad, 0 or more
     */
    public record Choice(String rule, double ohms, double driftRad) {}

    /** Keeps the rules as they are. */
    public Compensation {
        rules = List.copyOf(rules);
    }

    /**
     * The comparison for a sound design; empty for a programmable device, which has no base two.
     *
     * <p>The flattest resistor is looked for between 10 ohm and 10 kohm, to a ten-thousandth of itself.
     */
    public static Optional<Compensation> of(Design design) {
        if (!(design.trigger() instanceof UnijunctionTrigger trigger)) {
            return Optional.empty();
        }
        List<Choice> rules = new ArrayList<>();
        Unijunction device = trigger.device();
        double supply = design.clip().zener().volts().nominal();
        double baseOne = trigger.baseOne().value();
        for (BaseTwoRule rule : BaseTwoRule.values()) {
            double ohms = PublishedRelations.baseTwoOhms(
                    rule,
                    device.standoff().nominal(),
                    supply,
                    device.interbaseOhms().nominal(),
                    baseOne);
            rules.add(new Choice(words(rule), ohms, driftRad(design, ohms)));
        }
        OptionalDouble flat = Start.driftFreeOhms(design);
        if (flat.isPresent()) {
            rules.add(new Choice("dV_P/dT = 0, exactly", flat.getAsDouble(), driftRad(design, flat.getAsDouble())));
        }
        return Optional.of(new Compensation(flattest(design), rules));
    }

    /** How far the firing angle of a design as it stands moves between the coldest and the hottest, rad; NaN without a base two. */
    public static double driftRad(Design design) {
        return design.trigger() instanceof UnijunctionTrigger u
                ? driftRad(design, u.baseTwo().value())
                : Double.NaN;
    }

    private static String words(BaseTwoRule rule) {
        return switch (rule) {
            case TEN_THOUSAND -> "10 000/(eta V)";
            case SEVEN_TENTHS -> "0.70 R_BB/(eta V) + (1 - eta) R1/eta";
            case FOUR_TENTHS -> "0.40 R_BB/(eta V) + (1 - eta) R1/eta";
        };
    }

    private static Choice flattest(Design design) {
        double step = Math.log(MOST_OHMS / LEAST_OHMS) / (SCANNED - 1);
        List<Choice> scanned = new ArrayList<>();
        for (int i = 0; i < SCANNED; i++) {
            double ohms = LEAST_OHMS * Math.exp(i * step);
            scanned.add(new Choice("", ohms, driftRad(design, ohms)));
        }
        double near = Math.log(scanned.stream()
                .min(Comparator.comparingDouble(Choice::driftRad))
                .orElseThrow()
                .ohms());
        double log = new BrentOptimizer(LOG_ACCURACY, LOG_ACCURACY)
                .optimize(
                        new MaxEval(TRIALS),
                        GoalType.MINIMIZE,
                        new UnivariateObjectiveFunction(x -> driftRad(design, Math.exp(x))),
                        new SearchInterval(near - step, near + step))
                .getPoint();
        return new Choice("flattest firing angle, exact engine", Math.exp(log), driftRad(design, Math.exp(log)));
    }

    /**
     * How far the firing angle moves between the coldest and the hottest with a base-two resistor in ohms, rad; a
     * temperature at which the thyristor stays off counts as a whole half cycle.
     */
    static double driftRad(Design design, double baseTwoOhms) {
        Design tried = Edit.baseTwo(design, Part.of(baseTwoOhms));
        double coldest = design.surroundings().coldestCelsius();
        double hottest = design.surroundings().hottestCelsius();
        double earliest = Math.PI;
        double latest = 0;
        for (int i = 0; i < TEMPERATURES; i++) {
            Condition at = new Condition(
                    design.line().volts(),
                    design.line().hertz(),
                    coldest + (hottest - coldest) * i / (TEMPERATURES - 1));
            double rad = Firing.solve(tried, at, design.ramp().rampOhms(MID_KNOB))
                    .shown()
                    .firingRad()
                    .orElse(Math.PI);
            earliest = Math.min(earliest, rad);
            latest = Math.max(latest, rad);
        }
        return latest - earliest;
    }
}
