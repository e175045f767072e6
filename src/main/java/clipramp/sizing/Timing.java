package clipramp.sizing;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.Tolerance;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Wanted.Goal;
import clipramp.power.KnobSearch;
import java.util.OptionalDouble;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * How a ramp's resistors stand to what the knob is to reach: how many units reach it, and how much of the knob's travel
 * does nothing. A unit's delay is its R_E C_E times a figure of its standoff ratio; their deviations are taken as
 * independent and their sum of logarithms as normal, cut where every one stands at its limit.
 *
 * @param yield share of units that reach both wanted settings and whose ramp arrives before the collapse, 0..1
 * @param deadTravel share of the rotation past the wanted settings, both ends together, 0..1
 * @param lack how far nominal parts miss, as a sum of logarithms of resistance; 0 where they meet everything
 */
record Timing(double yield, double deadTravel, double lack) {
    private static final double LIMIT_SIGMAS = 3;
    private static final double RESERVE = 1.2;
    private static final double DIVIDER_SHARE = 0.02;

    /** What tight valley current costs beside a demand that is not met at all. */
    private static final double SOFT = 0.01;

    static Timing of(Design design, Reach reach) {
        Ramp ramp = design.ramp();
        double high = ramp.rampOhms(highPosition(design));
        double low = ramp.rampOhms(lowPosition(design));
        double most = Math.max(ramp.rampOhms(0), ramp.rampOhms(1));
        Spreading highEnd = Spreading.of(design, ramp.fixed().tolerance());
        Tolerance tolerance = ramp.pot()
                .map(Pot::track)
                .map(Part::tolerance)
                .orElse(ramp.fixed().tolerance());
        Spreading lowEnd = Spreading.of(design, tolerance);
        double slowest = Math.min(
                highEnd.below(Math.log(reach.highestTo() / high)), lowEnd.below(Math.log(reach.collapse() / most)));
        double fastest = Math.max(
                lowEnd.below(Math.log(reach.lowestFrom() / low)),
                reach.highestFrom() > 0 ? highEnd.below(Math.log(reach.highestFrom() / high)) : 0);
        return new Timing(Math.max(0, slowest - fastest), dead(design, reach), lack(design, reach));
    }

    /** How far nominal parts miss, as a sum of logarithms of resistance; 0 where they meet everything. */
    static double lack(Design design, Reach reach) {
        Ramp ramp = design.ramp();
        double high = ramp.rampOhms(highPosition(design));
        double low = ramp.rampOhms(lowPosition(design));
        double most = Math.max(ramp.rampOhms(0), ramp.rampOhms(1));
        double least = Math.min(ramp.rampOhms(0), ramp.rampOhms(1));
        return over(high, reach.highestTo())
                + over(reach.highestFrom(), high)
                + over(reach.lowestFrom(), low)
                + over(low, reach.lowestTo())
                + over(most, reach.collapse())
                + over(reach.clip(), least)
                + over(reach.valley(), least)
                + SOFT * over(reach.valley() * RESERVE, least);
    }

    private static double over(double value, double limit) {
        return value > limit ? Math.log(value / limit) : 0;
    }

    private static double dead(Design design, Reach reach) {
        if (design.ramp().pot().isEmpty()) {
            return 0;
        }
        return past(design.ramp(), reach.highestTo(), highPosition(design))
                + past(design.ramp(), reach.lowestFrom(), lowPosition(design));
    }

    /** Where the knob stands for the highest wanted setting, 0..1; fully clockwise where none is wanted. */
    static double highPosition(Design design) {
        return design.wanted().highest().map(Goal::position).orElse(1.0);
    }

    /** Where the knob stands for the lowest wanted setting, 0..1; fully anticlockwise where none is wanted. */
    static double lowPosition(Design design) {
        return design.wanted().lowest().map(Goal::position).orElse(0.0);
    }

    private static double past(Ramp ramp, double ohms, double end) {
        OptionalDouble position = KnobSearch.position(ramp, ohms);
        return position.isPresent() ? Math.abs(position.getAsDouble() - end) : 0;
    }

    /** Logarithm of a unit's delay over the nominal one's: standard deviation and limits. */
    private record Spreading(double sigma, double least, double most) {
        static Spreading of(Design design, Tolerance ramp) {
            Tolerance c = design.ramp().capacitor().tolerance();
            double variance = square(half(c) / LIMIT_SIGMAS) + square(half(ramp) / LIMIT_SIGMAS);
            double least = Math.log1p(-c.minus()) + Math.log1p(-ramp.minus());
            double most = Math.log1p(c.plus()) + Math.log1p(ramp.plus());
            if (design.trigger() instanceof UnijunctionTrigger trigger) {
                Characteristic standoff = trigger.device().standoff();
                double low = delay(standoff.lowest()) - delay(standoff.nominal());
                double high = delay(standoff.highest()) - delay(standoff.nominal());
                variance += square(high - low) / (standoff.typ().isPresent() ? 24 : 12);
                least += low;
                most += high;
            } else {
                variance += square(DIVIDER_SHARE);
                least -= DIVIDER_SHARE * LIMIT_SIGMAS;
                most += DIVIDER_SHARE * LIMIT_SIGMAS;
            }
            return new Spreading(Math.sqrt(variance), least, most);
        }

        private static double half(Tolerance t) {
            return (t.minus() + t.plus()) / 2;
        }

        private static double square(double x) {
            return x * x;
        }

        /** ln ln(1/(1 - eta)). */
        private static double delay(double standoff) {
            return Math.log(-Math.log1p(-standoff));
        }

        /** Share of units whose logarithm lies below a bound. */
        double below(double bound) {
            if (!(bound > least)) {
                return 0;
            }
            return bound >= most ? 1 : new NormalDistribution(null, 0, sigma).cumulativeProbability(bound);
        }
    }
}
