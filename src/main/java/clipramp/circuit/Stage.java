package clipramp.circuit;

/** How thyristors, bridge and load are put together. */
public enum Stage {
    /** One SCR in series with the load. */
    HALF_WAVE("half-wave", false, 0),
    /** A bridge, load and SCR on its dc side. */
    BRIDGE_DC("bridge-dc", true, 2),
    /** A bridge in series with the load, the SCR across its dc side. */
    BRIDGE_AC("bridge-ac", true, 2),
    /** Two SCRs, one each way, in series with the load. */
    INVERSE_PARALLEL("inverse-parallel", true, 0),
    /** A triac in series with the load. */
    TRIAC("triac", true, 0);

    private final String word;
    private final boolean fullWave;
    private final int bridgeDiodes;

    Stage(String word, boolean fullWave, int bridgeDiodes) {
        this.word = word;
        this.fullWave = fullWave;
        this.bridgeDiodes = bridgeDiodes;
    }

    /** The word that stands in a design file. */
    public String word() {
        return word;
    }

    /** Whether both half cycles reach the load. */
    public boolean isFullWave() {
        return fullWave;
    }

    /** How many bridge diodes in series the load's current passes. */
    public int bridgeDiodes() {
        return bridgeDiodes;
    }
}
