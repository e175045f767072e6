package clipramp.faults;

/** What a part does instead of its work. */
public enum How {
    /** No current passes. */
    OPEN("open"),
    /** It is a wire. */
    SHORTED("shorted"),
    /** Its value has moved far beyond its tolerance. */
    DRIFTED("drifted"),
    /** A resistance lies across it. */
    LEAKY("leaky"),
    /** A device never conducts. */
    DEAD("dead"),
    /** A device conducts one way only where it should both. */
    HALF_DEAD("half dead"),
    /** Not a fault: the healthy circuit, as a candidate like any other. */
    SOUND("sound");

    private final String word;

    How(String word) {
        this.word = word;
    }

    /** The words that answers give. */
    public String word() {
        return word;
    }
}
