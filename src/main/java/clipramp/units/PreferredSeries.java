package clipramp.units;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Map;

/**
 * Preferred numbers of IEC 60063. E24 and its parts follow 10^(i/24) to two figures with eight exceptions, E192 and
 * its parts follow 10^(i/192) to three figures with one. The number in a series' name counts its values to a decade. A
 * value within 1e-9 of a preferred one is taken as that one.
 */
public enum PreferredSeries {
    E3(3),
    E6(6),
    E12(12),
    E24(24),
    E48(48),
    E96(96),
    E192(192);

    /** IEC 60063, E24: what stands in the table by place, in tenths. */
    private static final Map<Integer, Integer> E24_EXCEPTIONS =
            Map.of(10, 27, 11, 30, 12, 33, 13, 36, 14, 39, 15, 43, 16, 47, 22, 82);

    /** IEC 60063, E192: 9.20 in the place of 9.19. */
    private static final int E192_EXCEPTION_PLACE = 185;

    private static final int E192_EXCEPTION = 920;
    private static final double RELATIVE_SLACK = 1e-9;

    private final int perDecade;

    PreferredSeries(int perDecade) {
        this.perDecade = perDecade;
    }

    /** How many values a decade holds. */
    public int perDecade() {
        return perDecade;
    }

    /**
     * The value at a place of the series.
     *
     * @param place counted from the value 1 at 0; perDecade is 10, negative places lie below 1
     * @return a clean decimal, such as exactly 4700
     */
    public double at(int place) {
        int decade = Math.floorDiv(place, perDecade);
        int within = Math.floorMod(place, perDecade);
        if (perDecade <= 24) {
            int full = within * (24 / perDecade);
            int tenths = E24_EXCEPTIONS.getOrDefault(full, rounded(full, 24, 10));
            return new BigDecimal(tenths).scaleByPowerOfTen(decade - 1).doubleValue();
        }
        int full = within * (192 / perDecade);
        int hundredths = full == E192_EXCEPTION_PLACE ? E192_EXCEPTION : rounded(full, 192, 100);
        return new BigDecimal(hundredths).scaleByPowerOfTen(decade - 2).doubleValue();
    }

    private static int rounded(int place, int perDecade, int scale) {
        return BigDecimal.valueOf(scale * Math.pow(10, (double) place / perDecade))
                .setScale(0, RoundingMode.HALF_UP)
                .intValueExact();
    }

    /**
     * Least preferred value that is not under another.
     *
     * @param value above zero, finite
     * @throws IllegalArgumentException where it is not, here and in every method that takes a value
     */
    public double atLeast(double value) {
        return at(placeAtLeast(value));
    }

    /** Greatest preferred value that is not over {@code value}. */
    public double atMost(double value) {
        int place = placeAtLeast(value);
        return isAt(place, value) ? at(place) : at(place - 1);
    }

    /** The next preferred value above, even where {@code value} is preferred itself. */
    public double nextUp(double value) {
        int place = placeAtLeast(value);
        return isAt(place, value) ? at(place + 1) : at(place);
    }

    /** The next preferred value below, even where {@code value} is preferred itself. */
    public double nextDown(double value) {
        return at(placeAtLeast(value) - 1);
    }

    /** The preferred value that is nearest in ratio; of two as near, the lower. */
    public double nearest(double value) {
        double above = atLeast(value);
        double below = atMost(value);
        return above / value < value / below ? above : below;
    }

    /** {@code value} moved by a number of preferred values, up or down; 0 gives the nearest. */
    public double step(double value, int steps) {
        double moved = value;
        for (int i = 0; i < Math.abs(steps); i++) {
            moved = steps > 0 ? nextUp(moved) : nextDown(moved);
        }
        return steps == 0 ? nearest(value) : moved;
    }

    /** Whether a value is preferred; none at or below zero is. */
    public boolean contains(double value) {
        return value > 0 && isAt(placeAtLeast(value), value);
    }

    private boolean isAt(int place, double value) {
        return Math.abs(at(place) / value - 1) < RELATIVE_SLACK;
    }

    private int placeAtLeast(double value) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("preferred values lie above zero, not at " + value);
        }
        int place = (int) Math.floor(perDecade * Math.log10(value)) - 2;
        while (at(place) < value * (1 - RELATIVE_SLACK)) {
            place++;
        }
        return place;
    }
}
