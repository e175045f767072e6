package clipramp.fit;

import java.util.List;

/**
 * What was read of one unit in one session.
 *
 * @param name where it comes from, such as a file's name
 * @param celsius ambient temperature, °C
 * @param lines at least one
 */
public record Readings(String name, double celsius, List<BenchLine> lines) {
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

    /** The same session at another temperature. */
    public Readings at(double newCelsius) {
        return new Readings(name, newCelsius, lines);
    }
}
