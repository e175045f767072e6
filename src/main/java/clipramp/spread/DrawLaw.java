package clipramp.spread;

import java.util.Locale;
import org.apache.commons.math3.distribution.NormalDistribution;

/** How a part's value lies between the limits of its tolerance. No standard says; all three are common practice. */
public enum DrawLaw {
    /** Normal, three standard deviations from the middle to either limit, cut there. */
    NORMAL("normal, cut at the limits, which lie three standard deviations out"),
    /** Every value between the limits alike. */
    UNIFORM("uniform between the limits"),
    /** Triangular, its corner at the nominal value. */
    TRIANGULAR("triangular, its corner at the nominal value");

    private static final double LIMIT_SIGMAS = 3;

    /** Straight pieces that the normal quantile is drawn from: 1e-7 of the half width inside, 1e-4 in the last pieces. */
    private static final int PIECES = 8192;

    private static final double[] NORMAL_QUANTILES = normalQuantiles();

    private final String words;

    DrawLaw(String words) {
        this.words = words;
    }

    /** The law in words that follow "parts lie". */
    public String words() {
        return words;
    }

    /** The one word that asks for it. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /**
     * Place of a drawn value between its limits.
     *
     * @param chance uniform, 0..1
     * @return -1 at the lower limit, 0 nominal, +1 at the upper one
     */
    double place(double chance) {
        return switch (this) {
            case NORMAL -> normal(chance);
            case UNIFORM -> 2 * chance - 1;
            case TRIANGULAR -> chance < 0.5 ? Math.sqrt(2 * chance) - 1 : 1 - Math.sqrt(2 * (1 - chance));
        };
    }

    /**
     * A value with a corner between two limits, by the triangular law: what a data sheet's min, typ and max are read as.
     *
     * @param corner where the law is highest, low..high
     * @param chance uniform, 0..1
     */
    static double threePoint(double low, double corner, double high, double chance) {
        double width = high - low;
        if (width == 0) {
            return low;
        }
        double below = (corner - low) / width;
        return chance < below
                ? low + Math.sqrt(chance * width * (corner - low))
                : high - Math.sqrt((1 - chance) * width * (high - corner));
    }

    private static double normal(double chance) {
        double at = chance * PIECES;
        int piece = Math.min(PIECES - 1, (int) at);
        double left = NORMAL_QUANTILES[piece];
        return left + (at - piece) * (NORMAL_QUANTILES[piece + 1] - left);
    }

    private static double[] normalQuantiles() {
        NormalDistribution normal = new NormalDistribution(null, 0, 1);
        double cut = normal.cumulativeProbability(-LIMIT_SIGMAS);
        double[] quantiles = new double[PIECES + 1];
        for (int i = 1; i < PIECES; i++) {
            double chance = cut + (1 - 2 * cut) * i / PIECES;
            quantiles[i] = normal.inverseCumulativeProbability(chance) / LIMIT_SIGMAS;
        }
        quantiles[0] = -1;
        quantiles[PIECES] = 1;
        return quantiles;
    }
}
