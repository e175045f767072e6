package clipramp.circuit;

import java.util.Optional;

/** What the power goes to. */
public sealed interface Load {
    /** Resistance in ohms at rated conditions (for an inductive load: its resistive part). */
    double resistanceOhms();

    /** The word that stands in a design file. */
    String word();

    /**
     * A heater: the same resistance hot and cold.
     *
     * @param resistanceOhms resistance, ohm
     */
    record Resistor(double resistanceOhms) implements Load {
        public Resistor {
            Require.positive("load resistance", resistanceOhms);
        }

        @Override
        public String word() {
            return "resistor";
        }
    }

    /**
     * A resistance in series with an inductance: a fan, a solenoid, a transformer's primary.
     *
     * @param resistanceOhms resistance, ohm
     * @param inductanceHenries inductance, H
     * @param freewheel diode across the load, if there is one
     */
    record Inductive(double resistanceOhms, double inductanceHenries, Optional<StageDiodes> freewheel) implements Load {
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
     * A lamp: P = ratedWatts (V / ratedVolts)^exponent.
     *
     * @param ratedWatts power at rated voltage, W
     * @param ratedVolts rated rms voltage, V
     * @param exponent how power grows with rms voltage; 1.55 for tungsten, 2 for a resistor
     * @param coldRatio hot over cold resistance, 1 or more
     */
    record Filament(double ratedWatts, double ratedVolts, double exponent, double coldRatio) implements Load {
        public Filament {
            Require.positive("rated power", ratedWatts);
            Require.positive("rated voltage", ratedVolts);
            Require.positive("power exponent", exponent);
            Require.positive("cold ratio", coldRatio);
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
