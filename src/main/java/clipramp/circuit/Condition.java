package clipramp.circuit;

/**
 * What a design is solved at.
 *
 * @param lineVolts rms of the line's fundamental, V
 * @param lineHertz line frequency, Hz
 * @param celsius ambient temperature, °C; parts are taken to be at it
 */
public record Condition(double lineVolts, double lineHertz, double celsius) {
    public Condition {
        Require.positive("line voltage", lineVolts);
        Require.positive("line frequency", lineHertz);
        Require.finite("temperature", celsius);
    }

    public double omega() {
        return 2 * Math.PI * lineHertz;
    }

    public double halfCycleSeconds() {
        return 0.5 / lineHertz;
    }
}
