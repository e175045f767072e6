package clipramp.circuit;

/**
 * One diode in the load's path, of the stage's bridge or freewheeling: v = drop + slope i.
 *
 * @param dropVolts threshold of the forward drop, V, 0 or more
 * @param slopeOhms forward slope resistance, ohm, 0 or more
 */
public record StageDiodes(double dropVolts, double slopeOhms) {
    /** @throws IllegalArgumentException outside the stated ranges */
    public StageDiodes {
        Require.notNegative("stage diode drop", dropVolts);
        Require.notNegative("stage diode slope", slopeOhms);
    }
}
