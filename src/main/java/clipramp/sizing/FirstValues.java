package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.power.KnobSearch;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.power.Thermal;
import clipramp.units.PreferredSeries;
import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * First values for a design that does not exist yet, one relation a value, each rounded to what can be bought. They are
 * where a design starts; margins judge what they come to.
 */
public final class FirstValues {
    /** Ratings that dropping resistors come in, W (common practice). */
    private static final double[] WATTS = {0.25, 0.5, 1, 2, 3, 5, 7, 10, 12, 17, 25, 50};

    /** Limiting element voltages that dropping resistors come in, V (common practice). */
    private static final double[] VOLTS = {250, 350, 500, 750, 1000};

    /** Tracks that pots come in, ohm (common practice). */
    private static final double[] TRACKS = {
        1e3, 2e3, 2.5e3, 5e3, 10e3, 20e3, 25e3, 50e3, 100e3, 200e3, 250e3, 500e3, 1e6
    };

    /** On a low line and with a ±5 % resistor the ramp is slower than at nominal: keep this much under. */
    private static final double FIXED_RESERVE = 0.92;

    /** A pot of ±10 % may be this much less than it says. */
    private static final double TRACK_RESERVE = 1.02;

    /** A sink that keeps the junction this much of the rise below its limit. */
    private static final double SINK_RESERVE = 1.3;

    private static final double LARGEST_SINK = 60;

    private FirstValues() {}

    /**
     * Dropping resistor: (crest of the line at its lowest, less zener and rectifier) over the current wanted at the
     * crest, to E24.
     *
     * @param lowLineVolts lowest voltage that feeds the supply, rms, V
     * @param zenerVolts V_Z, V
     * @param rectifierVolts drops of the rectifier, V
     * @param crestAmps current wanted at the crest, A
     * @return ohm
     */
    public static double dropperOhms(double lowLineVolts, double zenerVolts, double rectifierVolts, double crestAmps) {
        double over = Math.sqrt(2) * lowLineVolts - zenerVolts - rectifierVolts;
        return PreferredSeries.E24.nearest(Math.max(1, over) / crestAmps);
    }

    /** Rating of a resistor that shall use a share of it at most: the next one made, W. */
    public static double ratedWatts(double watts, double share) {
        return nextOf(WATTS, watts / share);
    }

    /** Voltage rating of a resistor: the next one made, V. */
    public static double ratedVolts(double volts) {
        return nextOf(VOLTS, volts);
    }

    private static double nextOf(double[] made, double least) {
        return Arrays.stream(made).filter(value -> value >= least).findFirst().orElse(made[made.length - 1]);
    }

    /** What the dropping resistor bears on the high line, W. */
    public static double dropperWatts(Design design, double rampOhms) {
        Condition high = new Condition(design.line().highVolts(), design.line().hertz(), 25);
        return Firing.dissipation(design, high, rampOhms).dropperWatts();
    }

    /**
     * Fixed resistor and pot track between which the knob spans two shares of full power at nominal parts.
     *
     * @param fixedOhms fixed resistor, ohm
     * @param trackOhms pot's track, ohm
     */
    public record Span(double fixedOhms, double trackOhms) {}

    /**
     * The ramp's resistances by the exact knob map turned round: R_E for the highest wanted power gives the fixed
     * resistor, R_E for the lowest the track.
     *
     * @param design stage, supply, trigger and capacitor, with any resistances
     * @param lowest lowest wanted share of full power, above 0
     * @param highest highest wanted share of full power, above {@code lowest}
     * @return ohms; empty fields where no resistance gives a share
     */
    public static Optional<Span> span(Design design, double lowest, double highest) {
        Condition nominal = design.nominalCondition();
        double full = LoadPower.fullWatts(design, nominal);
        OptionalDouble least = KnobSearch.rampOhmsForWatts(design, nominal, highest * full);
        OptionalDouble most = KnobSearch.rampOhmsForWatts(design, nominal, lowest * full);
        if (least.isEmpty() || most.isEmpty() || least.getAsDouble() >= most.getAsDouble()) {
            return Optional.empty();
        }
        double fixed = PreferredSeries.E24.atMost(least.getAsDouble() * FIXED_RESERVE);
        return Optional.of(new Span(fixed, nextOf(TRACKS, (most.getAsDouble() - fixed) * TRACK_RESERVE)));
    }

    /**
     * Thermal resistance from case to air that keeps the junction well under its limit on the high line at the hottest,
     * to E12.
     *
     * @param design the design with its thyristor
     * @param rampOhms R_E of the highest power, ohm
     * @return K/W; empty where the thyristor's data do not say, or no sink is good enough
     */
    public static OptionalDouble caseToAmbient(Design design, double rampOhms) {
        OptionalDouble inside = design.thyristor().device().junctionToCaseKelvinPerWatt();
        OptionalDouble limit = design.thyristor().device().limits().junctionCelsius();
        Condition high = new Condition(
                design.line().highVolts(),
                design.line().hertz(),
                design.surroundings().hottestCelsius());
        Solution solution = Firing.solve(design, high, rampOhms);
        LoadResult load = LoadPower.of(design, high, solution);
        if (inside.isEmpty() || limit.isEmpty() || !(load.thyristorWatts() > 0)) {
            return OptionalDouble.empty();
        }
        double most = Thermal.largestCaseToAmbient(
                limit.getAsDouble(), high.celsius(), load.thyristorWatts() * SINK_RESERVE, inside.getAsDouble());
        return most > 0
                ? OptionalDouble.of(PreferredSeries.E12.atMost(Math.min(LARGEST_SINK, most)))
                : OptionalDouble.empty();
    }
}
