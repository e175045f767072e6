package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import clipramp.margins.Check;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import java.util.Comparator;

/**
 * What a candidate is worth; the smaller is the better one. First no margin may fail, then as few as can be are tight,
 * then as many units as can be reach what is wanted, then the knob has as little dead travel as can be, then the circuit
 * runs cool, then it needs few different values. Figures are compared as coarsely as they matter.
 *
 * @param failing by how much margins fail, in fiftieths; 0 where none does
 * @param tight by how much margins lie under the ratio that they hold from, in twentieths
 * @param missing units in twenty that miss what is wanted
 * @param deadTravel dead travel in thirtieths of the rotation, some ten degrees each
 * @param heat power of the firing circuit, in steps of 10 %
 * @param values number of different resistors
 */
record Grade(long failing, long tight, long missing, long deadTravel, long heat, int values)
        implements Comparable<Grade> {
    private static final Comparator<Grade> ORDER = Comparator.comparingLong(Grade::failing)
            .thenComparingLong(Grade::tight)
            .thenComparingLong(Grade::missing)
            .thenComparingLong(Grade::deadTravel)
            .thenComparingLong(Grade::heat)
            .thenComparingInt(Grade::values);

    /** A margin that fails costs at least this much, so that one bad failure is better than two slight ones. */
    private static final double FAILED = 0.25;

    /** What the ramp lacks by more than this is no matter of rounding. */
    private static final double CLEAR_LACK = 0.03;

    private static final double MID_KNOB = 0.5;
    private static final double FIFTY = 50;
    private static final double TWENTY = 20;
    private static final double THIRTY = 30;
    private static final double HEAT_STEP = 0.1;

    static Grade of(Check check, Timing timing) {
        double failing = 0;
        double tight = 0;
        for (Margin margin : check.margins()) {
            if (margin.verdict() == Verdict.FAILS) {
                failing += FAILED + (1 - Math.min(1, Math.max(0, margin.ratio().orElse(0))));
            } else if (margin.verdict() == Verdict.TIGHT) {
                tight += Math.max(0, 1 - margin.ratio().orElse(1) / margin.holdsFrom());
            }
        }
        return new Grade(
                Math.round(FIFTY * failing),
                Math.round(TWENTY * tight),
                missing(timing),
                deadTravel(timing),
                heat(check.dissipation()),
                DistinctValues.of(check.design()));
    }

    /** The best that a design can come to, before it is judged: with no margin failing and none tight. */
    static Grade atBest(Design design, Timing timing) {
        Dissipation middle = Firing.dissipation(
                design, design.nominalCondition(), design.ramp().rampOhms(MID_KNOB));
        return new Grade(
                Math.round(FIFTY * (timing.lack() > CLEAR_LACK ? FAILED : 0)),
                0,
                missing(timing),
                deadTravel(timing),
                heat(middle),
                DistinctValues.of(design));
    }

    private static long missing(Timing timing) {
        return Math.round(TWENTY * (1 - timing.yield()));
    }

    /** Dead travel as coarsely as it matters. */
    static long deadTravel(Timing timing) {
        return Math.round(THIRTY * timing.deadTravel());
    }

    private static long heat(Dissipation dissipation) {
        return Math.round(Math.log(watts(dissipation)) / HEAT_STEP);
    }

    /** What the firing circuit turns into heat at mid-knob, W. */
    static double watts(Dissipation heat) {
        return heat.dropperWatts()
                + heat.zenerWatts()
                + heat.baseOneWatts()
                + heat.baseTwoWatts()
                + heat.lowerWatts()
                + heat.rampWatts()
                + heat.deviceWatts()
                + heat.gateWatts()
                + heat.gateSeriesWatts()
                + heat.gateShuntWatts();
    }

    boolean holds() {
        return failing == 0;
    }

    @Override
    public int compareTo(Grade other) {
        return ORDER.compare(this, other);
    }
}
