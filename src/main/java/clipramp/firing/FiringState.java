package clipramp.firing;

/** What a knob position comes to, in one word; the first that applies. */
public enum FiringState {
    /** No pulse at all. */
    SILENT("silent"),
    /** Half cycles that the line and the load treat alike differ, so that the load gets dc. */
    HUNTS("hunts"),
    /** The ramp was held at the peak point for want of peak-point current. */
    STALLS("stalls"),
    /** The trigger device stayed on after a pulse until the supply collapsed. */
    LATCHED_ON("latched-on"),
    /** The pulse comes of the supply's collapse only. */
    END_PULSE("end-pulse"),
    /** None of these: a pulse of the ramp's own. */
    FIRES("fires");

    private final String word;

    FiringState(String word) {
        this.word = word;
    }

    /** The word that answers give. */
    public String word() {
        return word;
    }
}
