package clipramp.circuit;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * SCR or triac, data-sheet figures.
 *
 * @param kind SCR or triac
 * @param id profile or in-place name
 * @param gate gate data
 * @param latching I_L against junction temperature, if known
 * @param holding I_H against junction temperature, if known
 * @param turnOffSeconds t_q, s, if known
 * @param commutating commutating dv/dt, if known
 * @param onState threshold and slope of the on-state voltage
 * @param limits absolute ratings
 * @param junctionToCaseKelvinPerWatt R_thJC, K/W, if known
 */
public record ThyristorDevice(
        Kind kind,
        String id,
        Gate gate,
        Optional<TemperatureCurve> latching,
        Optional<TemperatureCurve> holding,
        OptionalDouble turnOffSeconds,
        Optional<Commutating> commutating,
        OnState onState,
        Limits limits,
        OptionalDouble junctionToCaseKelvinPerWatt) {

    /** Which way it conducts. */
    public enum Kind {
        /** One way. */
        SCR("scr"),
        /** Both ways. */
        TRIAC("triac");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }
    }

    /** Triac quadrants: polarity of main terminal two, then of the gate. */
    public enum Quadrant {
        /** Both positive. */
        I_PLUS("I+"),
        /** Main terminal two positive, gate negative. */
        I_MINUS("I-"),
        /** Both negative. */
        III_MINUS("III-"),
        /** Main terminal two negative, gate positive. */
        III_PLUS("III+");

        private final String word;

        Quadrant(String word) {
            this.word = word;
        }

        /** The word that stands in a design file. */
        public String word() {
            return word;
        }
    }

    /**
     * Gate data. The typical gate junction is i_G = max(0, (v_GK - knee)/slope).
     *
     * @param kneeVolts V_G0, V, 0 or more
     * @param slopeOhms r_G, ohm, above 0
     * @param trigger I_GT and V_GT against junction temperature, largest of any device
     * @param quadrants the same by quadrant, triacs only; a missing quadrant is not specified
     * @param nonTrigger V_GD, if known
     * @param turnOnSeconds t_gt, s, if known
     * @param limits gate ratings
     */
    public record Gate(
            double kneeVolts,
            double slopeOhms,
            TriggerDemand trigger,
            Map<Quadrant, TriggerDemand> quadrants,
            Optional<NonTrigger> nonTrigger,
            OptionalDouble turnOnSeconds,
            GateLimits limits) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Gate {
            Require.notNegative("gate knee voltage", kneeVolts);
            Require.positive("gate slope resistance", slopeOhms);
            quadrants = Map.copyOf(quadrants);
        }

        /**
         * The same gate with another junction i_G = max(0, (v_GK - knee)/slope).
         *
         * @param newKneeVolts V, 0 or more
         * @param newSlopeOhms ohm, above 0
         * @throws IllegalArgumentException outside those ranges
         */
        public Gate withJunction(double newKneeVolts, double newSlopeOhms) {
            return new Gate(newKneeVolts, newSlopeOhms, trigger, quadrants, nonTrigger, turnOnSeconds, limits);
        }
    }

    /**
     * A gate voltage at which no device of the type triggers.
     *
     * @param volts V_GD, V, above 0
     * @param celsius junction temperature that it holds at, °C
     */
    public record NonTrigger(double volts, double celsius) {
        /** @throws IllegalArgumentException where the voltage is not above zero */
        public NonTrigger {
            Require.positive("non-trigger voltage", volts);
        }
    }

    /**
     * Gate ratings, each where the sheet states it.
     *
     * @param amps I_GM, A
     * @param volts V_GM forward, V
     * @param reverseVolts V_RGM, V
     * @param peakWatts P_GM, W
     * @param peakWattsForSeconds pulse length that P_GM holds for, s
     * @param meanWatts P_G(AV), W
     */
    public record GateLimits(
            OptionalDouble amps,
            OptionalDouble volts,
            OptionalDouble reverseVolts,
            OptionalDouble peakWatts,
            OptionalDouble peakWattsForSeconds,
            OptionalDouble meanWatts) {}

    /**
     * How fast voltage may come back as the current dies.
     *
     * @param voltsPerSecond (dv/dt)c, V/s
     * @param celsius junction temperature that it holds at, °C
     */
    public record Commutating(double voltsPerSecond, double celsius) {}

    /**
     * v_T = threshold + slope i_T.
     *
     * @param thresholdVolts V_T0, V, 0 or more
     * @param slopeOhms r_T, ohm, 0 or more
     */
    public record OnState(double thresholdVolts, double slopeOhms) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public OnState {
            Require.notNegative("on-state threshold", thresholdVolts);
            Require.notNegative("on-state slope", slopeOhms);
        }
    }

    /**
     * Absolute ratings, each where the sheet states it.
     *
     * @param volts V_DRM, V_RRM, V
     * @param rmsAmps I_T(RMS), A
     * @param meanAmps I_T(AV), A
     * @param surgeAmps I_TSM, A
     * @param ampsSquaredSeconds I squared t, A²s
     * @param junctionCelsius T_J max, °C
     * @param voltsPerSecond rate of rise of the off-state voltage that it bears without turning on, V/s
     * @param ampsPerSecond rate of rise of the on-state current that it bears as it turns on, A/s
     */
    public record Limits(
            OptionalDouble volts,
            OptionalDouble rmsAmps,
            OptionalDouble meanAmps,
            OptionalDouble surgeAmps,
            OptionalDouble ampsSquaredSeconds,
            OptionalDouble junctionCelsius,
            OptionalDouble voltsPerSecond,
            OptionalDouble ampsPerSecond) {}

    /** Quadrants that a pulse of one polarity uses, first in the positive half cycle. */
    public static List<Quadrant> quadrantsOf(GateDrive.Polarity polarity) {
        return polarity == GateDrive.Polarity.POSITIVE
                ? List.of(Quadrant.I_PLUS, Quadrant.III_PLUS)
                : List.of(Quadrant.I_MINUS, Quadrant.III_MINUS);
    }

    /** The same device with other gate data. */
    public ThyristorDevice withGate(Gate newGate) {
        return new ThyristorDevice(
                kind,
                id,
                newGate,
                latching,
                holding,
                turnOffSeconds,
                commutating,
                onState,
                limits,
                junctionToCaseKelvinPerWatt);
    }

    /** The same device with another on-state line. */
    public ThyristorDevice withOnState(OnState newOnState) {
        return new ThyristorDevice(
                kind,
                id,
                gate,
                latching,
                holding,
                turnOffSeconds,
                commutating,
                newOnState,
                limits,
                junctionToCaseKelvinPerWatt);
    }
}
