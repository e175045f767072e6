package clipramp.faults;

/** What a part does instead of its work. */
public enum How {
    OPEN("open"),
    SHORTED("shorted"),
    DRIFTED("drifted"),
    LEAKY("leaky"),
    DEAD("dead"),
    HALF_DEAD("half dead"),
    /** Not a fault: the healthy circuit, as a candidate like any other. */
    SOUND("sound");

    private final String word;

    How(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
