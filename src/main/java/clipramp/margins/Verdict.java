package clipramp.margins;

/** What is said of a margin, and of a whole design: the worst of its margins. Better ones come first. */
public enum Verdict {
    /** With the reserve that its kind asks for. */
    HOLDS("holds"),
    /** A datum is missing. */
    NOT_JUDGED("not-judged"),
    /** It is met, with less reserve than its kind asks for; or a rule of thumb is not met. */
    TIGHT("tight"),
    /** It is not met. */
    FAILS("fails");

    private final String word;

    Verdict(String word) {
        this.word = word;
    }

    /** The word that answers give. */
    public String word() {
        return word;
    }
}
