package clipramp.power;

import clipramp.firing.Solution;
import java.util.OptionalDouble;

/**
 * One knob position from shaft to load.
 *
 * @param position knob position 0..1; empty for a fixed ramp
 * @param solution the firing circuit there
 * @param load what the load gets
 */
public record OperatingPoint(OptionalDouble position, Solution solution, LoadResult load) {
    /** The whole R_E there, ohm. */
    public double rampOhms() {
        return solution.rampOhms();
    }
}
