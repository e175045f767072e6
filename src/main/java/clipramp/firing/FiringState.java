package clipramp.firing;

/** What a knob position comes to, in one word; the first that applies. */
public enum FiringState {
    SILENT("silent"),
    HUNTS("hunts"),
    STALLS("stalls"),
    LATCHED_ON("latched-on"),
    END_PULSE("end-pulse"),
    FIRES("fires");

    private final String word;

    FiringState(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
