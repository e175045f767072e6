package clipramp.circuit;

/**
 * One diode of the stage's bridge, in the load's path.
 *
 * @param dropVolts forward drop, V
 * @param slopeOhms forward slope resistance, ohm
 */
public record StageDiodes(double dropVolts, double slopeOhms) {
    public StageDiodes {
        Require.notNegative("stage diode drop", dropVolts);
        Require.notNegative("stage diode slope", slopeOhms);
    }
}
