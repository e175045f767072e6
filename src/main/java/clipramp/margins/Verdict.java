package clipramp.margins;

/** What is said of a margin, and of a whole design: the worst of its margins. Better ones come first. */
public enum Verdict {
    HOLDS("holds"),
    NOT_JUDGED("not-judged"),
    TIGHT("tight"),
    FAILS("fails");

    private final String word;

    Verdict(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
