package clipramp.fit;

import java.util.List;
import java.util.Optional;

/**
 * Everything that was read at one setting.
 *
 * @param line where it stands in its file, from 1
 * @param setting what the knob or the bench resistor stood at
 * @param lineVolts line voltage at that moment, rms, V, where it was read
 * @param readings at least one
 */
public record BenchLine(int line, Setting setting, Optional<LineVolts> lineVolts, List<Reading> readings) {
    /**
     * The line voltage as read.
     *
     * @param volts rms, V, above 0
     * @param accuracy how far it may be off
     * @param column what stood over it
     */
    public record LineVolts(double volts, Accuracy accuracy, String column) {
        /** One percent: a hand-held meter, common practice. */
        public static final Accuracy USUAL = Accuracy.share(0.01);
    }

    /**
     * Refuses a line that tells nothing.
     *
     * @throws IllegalArgumentException without a reading
     */
    public BenchLine {
        readings = List.copyOf(readings);
        if (readings.isEmpty()) {
            throw new IllegalArgumentException("line " + line + " has no reading");
        }
    }
}
