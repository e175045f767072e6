package clipramp.circuit;

/** How thyristors, bridge and load are put together. */
public enum Stage {
    HALF_WAVE("half-wave", false, 0),
    BRIDGE_DC("bridge-dc", true, 2),
    BRIDGE_AC("bridge-ac", true, 2),
    INVERSE_PARALLEL("inverse-parallel", true, 0),
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

    /** Number of bridge diodes that the load's current passes. */
    public int bridgeDiodes() {
        return bridgeDiodes;
    }
}
