package clipramp.record;

import com.lowagie.text.Rectangle;

/** The paper that a record is laid out for. */
public enum PageSize {
    A4("A4", com.lowagie.text.PageSize.A4),
    LETTER("letter", com.lowagie.text.PageSize.LETTER);

    private final String word;
    private final Rectangle points;

    PageSize(String word, Rectangle points) {
        this.word = word;
        this.points = points;
    }

    /** The word that stands in an option. */
    public String word() {
        return word;
    }

    Rectangle points() {
        return new Rectangle(points);
    }
}
