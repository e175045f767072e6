package clipramp.sizing;

import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * What can be bought: the devices that have profiles, and the steps in which the rest is sold.
 *
 * @param unijunctions trigger devices
 * @param thyristors SCRs and triacs
 * @param zeners clipping zeners, in any order; kept in that of their voltage
 */
public record Stock(List<Unijunction> unijunctions, List<ThyristorDevice> thyristors, List<Zener> zeners) {
    /** Tracks that pots are sold with, in one decade (common practice; catalogues hold one of each pair). */
    private static final double[] TRACKS = {1, 2.2, 2.5, 4.7, 5};

    /** Tracks that presets are sold with, in one decade (common practice). */
    private static final double[] TRIMMERS = {1, 2, 2.5, 5};

    /** Ratings that resistors are sold with, W (common practice). */
    private static final double[] WATTS = {0.25, 0.5, 1, 2, 3, 5, 7, 10, 12, 17, 25, 50, 100};

    /** Limiting voltages that resistors are sold with, V (common practice). */
    private static final double[] RESISTOR_VOLTS = {250, 350, 500, 750, 1000, 1500, 2500};

    /** Ratings that film capacitors are sold with, V (common practice). */
    private static final double[] CAPACITOR_VOLTS = {63, 100, 250, 400};

    /** Sorts the zeners. */
    public Stock {
        unijunctions = List.copyOf(unijunctions);
        thyristors = List.copyOf(thyristors);
        zeners = zeners.stream()
                .sorted(Comparator.comparingDouble(z -> z.volts().nominal()))
                .toList();
    }

    /** Every track between two resistances in ohms, rising. */
    static List<Double> tracks(double leastOhms, double mostOhms) {
        return sold(TRACKS, leastOhms, mostOhms);
    }

    /** Every preset's track between two resistances in ohms, rising. */
    static List<Double> trimmers(double leastOhms, double mostOhms) {
        return sold(TRIMMERS, leastOhms, mostOhms);
    }

    private static List<Double> sold(double[] decade, double leastOhms, double mostOhms) {
        List<Double> tracks = new ArrayList<>();
        for (int power = 1; power <= 6; power++) {
            for (double track : decade) {
                double ohms = new BigDecimal(String.valueOf(track))
                        .scaleByPowerOfTen(power)
                        .doubleValue();
                if (ohms >= leastOhms && ohms <= mostOhms) {
                    tracks.add(ohms);
                }
            }
        }
        return tracks;
    }

    /** Rating of the least resistor that bears a power at a share of its rating, W. */
    static double ratedWatts(double watts, double share) {
        return next(WATTS, watts / share);
    }

    /** Least limiting voltage sold that bears a voltage, V. */
    static double resistorVolts(double volts) {
        return next(RESISTOR_VOLTS, volts);
    }

    /** Least voltage rating of a film capacitor sold that bears a voltage, V. */
    static double capacitorVolts(double volts) {
        return next(CAPACITOR_VOLTS, volts);
    }

    private static double next(double[] sold, double least) {
        return Arrays.stream(sold).filter(s -> s >= least).findFirst().orElse(sold[sold.length - 1]);
    }
}
