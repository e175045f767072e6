package clipramp.circuit;

/**
 * What a design is solved at.
 *
 * @param lineVolts rms of the line's fundamental, V, above 0
 * @param lineHertz line frequency, Hz, above 0
 * @param celsius ambient temperature, °C; parts are taken to be at it
 */
public record Condition(double lineVolts, double lineHertz, double celsius) {
    /** Temperature that data-sheet figures hold at, and that benches are read at, °C. */
    public static final double SHEET_CELSIUS = 25;

    /** @throws IllegalArgumentException outside the stated ranges */
    public Condition {
        Require.positive("line voltage", lineVolts);
        Require.positive("line frequency", lineHertz);
        Require.finite("temperature", celsius);
    }

    /** Angular frequency of the line, rad/s. */
    public double omega() {
        return 2 * Math.PI * lineHertz;
    }

    /** Half a period of the line, s. */
    public double halfCycleSeconds() {
        return 0.5 / lineHertz;
    }
}
