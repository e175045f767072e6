package clipramp.faults;

/** What the load gets, beside what it should get at the same knob position. */
public enum LoadGets {
    NOTHING("nothing"),
    /** One half cycle of every two, so that dc flows. */
    HALF("half cycles missing"),
    LESS("less"),
    AS_BEFORE("as before"),
    MORE("more"),
    FULL("full power");

    private final String word;

    LoadGets(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
