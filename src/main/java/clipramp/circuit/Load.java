package clipramp.circuit;

import java.util.Optional;

/** What the power goes to. */
public sealed interface Load {
    /** Resistance at rated conditions, ohm; of an inductive load, its resistive part. */
    double resistanceOhms();

    /** The word that stands in a design file. */
    String word();

    /** Hot over cold resistance, 1 or more: what the first half cycle after a long pause makes of the current. */
    default double coldRatio() {
        return 1;
    }

    /**
     * A heater: one resistance at every power once it is warm.
     *
     * @param resistanceOhms resistance, warm, ohm, above 0
     * @param coldRatio warm over cold resistance, 1 or more
     */
    record Resistor(double resistanceOhms, double coldRatio) implements Load {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Resistor {
            Require.positive("load resistance", resistanceOhms);
            Require.atLeastOne("cold ratio", coldRatio);
        }

        /** A heater with the same resistance warm and cold, ohm. */
        public Resistor(double resistanceOhms) {
            this(resistanceOhms, 1);
        }

        @Override
        public String word() {
            return "resistor";
        }
    }

    /**
     * A resistance in series with an inductance: a fan, a solenoid, a transformer's primary.
     *
     * @param resistanceOhms resistance, ohm, above 0
     * @param inductanceHenries inductance, H, above 0
     * @param freewheel diode across the load, if there is one (on the dc side of a bridge, or half-wave)
     */
    record Inductive(double resistanceOhms, double inductanceHenries, Optional<StageDiodes> freewheel) implements Load {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Inductive {
            Require.positive("load resistance", resistanceOhms);
            Require.positive("load inductance", inductanceHenries);
        }

        @Override
        public String word() {
            return "inductive";
        }
    }

    /**
     * A lamp: P = ratedWatts (V / ratedVolts)^exponent at its own rms voltage V (DEVELOPERS.md, Loads with memory).
     *
     * @param ratedWatts power at rated voltage, W, above 0
     * @param ratedVolts rated rms voltage, V, above 0
     * @param exponent above 0; 1.55 for tungsten, 2 for a resistor
     * @param coldRatio hot over cold resistance, 1 or more
     */
    record Filament(double ratedWatts, double ratedVolts, double exponent, double coldRatio) implements Load {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Filament {
            Require.positive("rated power", ratedWatts);
            Require.positive("rated voltage", ratedVolts);
            Require.positive("power exponent", exponent);
            Require.atLeastOne("cold ratio", coldRatio);
        }

        @Override
        public double resistanceOhms() {
            return ratedVolts * ratedVolts / ratedWatts;
        }

        @Override
        public String word() {
            return "filament";
        }
    }
}
