package clipramp.circuit;

import java.util.Optional;

/**
 * Presets that are set once on every unit, so that parts and devices may stray. Both are wired as variable resistors; the
 * nominal unit has them at the middle of their tracks.
 *
 * @param high in series with the fixed ramp resistor: sets the firing angle at the highest wanted setting
 * @param low in series with the resistor across the pot, or alone there: sets it at the lowest wanted setting
 */
public record Trimmers(Optional<Part> high, Optional<Part> low) {
    /** No presets. */
    public static final Trimmers NONE = new Trimmers(Optional.empty(), Optional.empty());

    private static final double NOMINAL_SHARE = 0.5;

    /** Whether there is neither. */
    public boolean isNone() {
        return high.isEmpty() && low.isEmpty();
    }

    /** What a preset at the middle of its track adds, ohm; 0 without one. */
    public static double nominalOhms(Optional<Part> trimmer) {
        return trimmer.map(t -> NOMINAL_SHARE * t.value()).orElse(0.0);
    }
}
