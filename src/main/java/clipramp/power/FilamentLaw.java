package clipramp.power;

import clipramp.circuit.Load;

/**
 * A lamp in its steady state: P = P_rated (V/V_rated)^k, so its resistance at an rms voltage is V²/P, never under the cold
 * one. Over one line period its temperature, and so its resistance, stands still (DEVELOPERS.md, Loads with memory).
 */
final class FilamentLaw {
    /** Light grows as V to this power: handbook, 3.4..3.5. */
    private static final double LIGHT_EXPONENT = 3.4;

    private static final double SAME = 1e-14;
    private static final int MOST_STEPS = 100;

    private final Load.Filament filament;

    FilamentLaw(Load.Filament filament) {
        this.filament = filament;
    }

    /** Resistance at an rms voltage in V, ohm. */
    double ohmsAt(double rmsVolts) {
        double warm = filament.resistanceOhms() * Math.pow(rmsVolts / filament.ratedVolts(), 2 - filament.exponent());
        return Math.max(coldOhms(), warm);
    }

    /** Resistance of the cold filament, ohm. */
    double coldOhms() {
        return filament.resistanceOhms() / filament.coldRatio();
    }

    /** Power at an rms voltage in V, W. */
    double wattsAt(double rmsVolts) {
        return rmsVolts == 0 ? 0 : rmsVolts * rmsVolts / ohmsAt(rmsVolts);
    }

    /** Light at an rms voltage in V as a share of the light at rated voltage. */
    double lightShareAt(double rmsVolts) {
        return Math.pow(rmsVolts / filament.ratedVolts(), LIGHT_EXPONENT);
    }

    /** What rms voltage, V, a resistance in ohms gets where the filament is. */
    interface RmsVolts {
        double over(double ohms);
    }

    /** Where resistance and voltage agree; the drops in the path make the voltage depend on the resistance, weakly. */
    double settledOhms(RmsVolts volts) {
        double ohms = filament.resistanceOhms();
        for (int step = 0; step < MOST_STEPS; step++) {
            double next = ohmsAt(volts.over(ohms));
            if (Math.abs(next - ohms) <= SAME * ohms) {
                return next;
            }
            ohms = next;
        }
        return ohms;
    }
}
