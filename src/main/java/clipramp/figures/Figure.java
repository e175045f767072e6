package clipramp.figures;

import java.awt.Graphics2D;

/** A drawing that any surface can show: screen, PDF, SVG or PNG. It never changes; a changed one is another figure. */
public interface Figure {
    /** What it is, in a few words. */
    String title();

    /** What it shows, in one sentence, for a screen reader. */
    String sentence();

    /** Its numbers as a table. */
    NumberTable numbers();

    /** Width over height that suits it. */
    double proportion();

    /**
     * Draws it into the rectangle from 0, 0 to width, height, ground included.
     *
     * @param g surface, in user units with y downwards
     * @param width in user units, above 0
     * @param height in user units, above 0
     * @param style colours and sizes
     */
    void draw(Graphics2D g, double width, double height, Style style);
}
