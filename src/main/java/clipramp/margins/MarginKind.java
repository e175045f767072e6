package clipramp.margins;

/** Every margin that is judged: its id in answers, its name, and what it means. */
public enum MarginKind {
    GATE_PEAK_CURRENT(
            "gate-peak-current",
            "peak gate current",
            "The pulse must drive overdrive x I_GT into a gate held at V_GT of the coldest junction.");

    private final String id;
    private final String title;
    private final String meaning;

    MarginKind(String id, String title, String meaning) {
        this.id = id;
        this.title = title;
        this.meaning = meaning;
    }

    /** The id in answers, such as gate-peak-current. */
    public String id() {
        return id;
    }

    /** The name that people read. */
    public String title() {
        return title;
    }

    /** What is asked, and why, in a sentence or two. */
    public String meaning() {
        return meaning;
    }
}
