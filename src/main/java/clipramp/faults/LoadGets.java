package clipramp.faults;

/** What the load gets, beside what it should get at the same knob position. */
public enum LoadGets {
    /** Under half a percent of full power. */
    NOTHING("nothing"),
    /** One half cycle of every two, so that dc flows. */
    HALF("half cycles missing"),
    /** Less power, of both half cycles. */
    LESS("less"),
    /** The same power, within a twentieth. */
    AS_BEFORE("as before"),
    /** More power, but not all. */
    MORE("more"),
    /** All that the stage can give. */
    FULL("full power");

    private final String word;

    LoadGets(String word) {
        this.word = word;
    }

    /** The words that answers give. */
    public String word() {
        return word;
    }
}
