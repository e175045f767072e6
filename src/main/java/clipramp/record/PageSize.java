package clipramp.record;

import com.lowagie.text.Rectangle;

/** The paper that a record is laid out for. */
public enum PageSize {
    /** 210 mm by 297 mm (ISO 216). */
    A4("A4", com.lowagie.text.PageSize.A4),
    /** 8.5 in by 11 in. */
    LETTER("letter", com.lowagie.text.PageSize.LETTER);

    private final String word;
    private final Rectangle points;

    PageSize(String word, Rectangle points) {
        this.word = word;
        this.points = points;
    }

    /** What people call it. */
    public String word() {
        return word;
    }

    Rectangle points() {
        return new Rectangle(points);
    }
}
