package clipramp.circuit;

import java.util.Optional;

/**
 * What the knob is to reach at its ends.
 *
 * @param lowest at or under this, if stated
 * @param highest at or over this, if stated
 */
public record Wanted(Optional<Goal> lowest, Optional<Goal> highest) {
    /** What a goal is measured in. */
    public enum Measure {
        /** Share of full-wave full power, 0..1. */
        FRACTION,
        /** Load power, W. */
        WATTS,
        /** Load rms voltage, V. */
        VOLTS,
        /** Firing angle, rad. */
        ANGLE
    }

    /**
     * What is wanted at one end of the knob.
     *
     * @param measure what from and to are in
     * @param from low end of the band; equal to {@code to} where no band was given
     * @param to high end of the band, not under {@code from}
     * @param position knob position at which it is wanted, 0 anticlockwise .. 1 clockwise
     */
    public record Goal(Measure measure, double from, double to, double position) {
        /** @throws IllegalArgumentException where the band runs downwards or the position lies outside 0..1 */
        public Goal {
            if (!(from <= to)) {
                throw new IllegalArgumentException("a wanted band runs from low to high, not " + from + ".." + to);
            }
            Require.fraction("knob position", position);
        }

        /** Whether more than one value will do. */
        public boolean isBand() {
            return from < to;
        }
    }
}
