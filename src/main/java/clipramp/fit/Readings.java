package clipramp.fit;

import java.util.List;
import java.util.Optional;

/**
 * What was read of one unit in one session.
 *
 * @param name where it comes from, such as a file's name
 * @param celsius ambient temperature, °C
 * @param lines at least one
 */
public record Readings(String name, double celsius, List<BenchLine> lines) {
    /**
     * Refuses a session without a line.
     *
     * @throws IllegalArgumentException without a line
     */
    public Readings {
        lines = List.copyOf(lines);
        if (lines.isEmpty()) {
            throw new IllegalArgumentException("no readings");
        }
    }

    /** How many numbers were read, settings and line voltages not counted. */
    public int count() {
        return lines.stream().mapToInt(line -> line.readings().size()).sum();
    }

    /** Whether an instrument was read on any line. */
    boolean has(Meter meter) {
        return lines.stream().flatMap(line -> line.readings().stream()).anyMatch(reading -> reading.meter() == meter);
    }

    /** The same with this line voltage, rms in V, above 0, on every line that has none of its own; its accuracy is the usual one. */
    public Readings onLine(double volts) {
        BenchLine.LineVolts all = new BenchLine.LineVolts(volts, BenchLine.LineVolts.USUAL, "--line");
        return new Readings(
                name,
                celsius,
                lines.stream()
                        .map(line -> new BenchLine(
                                line.line(),
                                line.setting(),
                                Optional.of(line.lineVolts().orElse(all)),
                                line.readings()))
                        .toList());
    }
}
