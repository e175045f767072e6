package clipramp.spread;

import java.util.List;

/**
 * Units counted by their share of full power at one knob position, while a run goes on and at its end.
 *
 * @param position knob position 0..1; 0 for a fixed ramp
 * @param units units counted
 * @param counts units in each of {@link #BINS} equal bins from no power to full power, the last taking in what lies above
 */
public record Histogram(double position, int units, List<Integer> counts) {
    /** Bins of 2 %. */
    public static final int BINS = 50;

    /** Keeps the counts as they are. */
    public Histogram {
        counts = List.copyOf(counts);
    }

    /** The bin that a share of full power, 0 or more, belongs to. */
    static int bin(double fraction) {
        return Math.min(BINS - 1, (int) (fraction * BINS));
    }

    /** The fullest bin's count. */
    public int most() {
        return counts.stream().mapToInt(Integer::intValue).max().orElse(0);
    }
}
