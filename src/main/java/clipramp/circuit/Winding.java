package clipramp.circuit;

/**
 * Isolated synchronising winding, rms and open circuit.
 *
 * @param primaryVolts rms of the primary, V, above 0
 * @param secondaryVolts rms of the secondary with that on the primary, V, above 0
 * @param opposite whether the secondary is turned over
 * @param lagRad angle by which the secondary lags the line, rad, within a quarter period either way
 */
public record Winding(double primaryVolts, double secondaryVolts, boolean opposite, double lagRad) {
    /** @throws IllegalArgumentException outside the stated ranges */
    public Winding {
        Require.positive("winding primary voltage", primaryVolts);
        Require.positive("winding secondary voltage", secondaryVolts);
        if (!(Math.abs(lagRad) < Math.PI / 2)) {
            throw new IllegalArgumentException("winding lag must lie within -90..90 degrees, is " + lagRad + " rad");
        }
    }

    /** Secondary over primary voltage. */
    public double ratio() {
        return secondaryVolts / primaryVolts;
    }
}
