package clipramp.figures;

import java.awt.BasicStroke;
import java.awt.Font;

/**
 * How a figure is lettered and ruled: a palette, and one factor on both type sizes and all line widths.
 *
 * @param palette colours
 * @param zoom 1 on a screen at 100 %; above 0
 */
public record Style(Palette palette, double zoom) {
    private static final double SMALL = 11;
    private static final double TEXT = 13;

    /** A screen at 100 %, and pictures. */
    public static final Style SCREEN = new Style(Palette.PAPER, 1);
    /** A printed page, whose unit is the point: the same drawing at two thirds. */
    public static final Style PRINT = new Style(Palette.PAPER, 0.66);

    /**
     * Refuses a style that draws nothing.
     *
     * @throws IllegalArgumentException for a zoom that is not above 0
     */
    public Style {
        if (!(zoom > 0)) {
            throw new IllegalArgumentException("zoom must be above 0, is " + zoom);
        }
    }

    /** The same sizes in other colours. */
    public Style with(Palette other) {
        return new Style(other, zoom);
    }

    Font small() {
        return Lettering.regular(SMALL * zoom);
    }

    Font textBold() {
        return Lettering.bold(TEXT * zoom);
    }

    Font smallBold() {
        return Lettering.bold(SMALL * zoom);
    }

    /** Half the eight-unit rhythm, scaled. */
    double gap() {
        return 4 * zoom;
    }

    BasicStroke hairline() {
        return solid(0.6);
    }

    BasicStroke trace() {
        return solid(1.4);
    }

    BasicStroke heavy() {
        return solid(2.6);
    }

    /** The dashed trace of what belongs to a signal without being it. */
    BasicStroke dashed() {
        return broken(5, 3.5);
    }

    BasicStroke dotted() {
        return broken(1.2, 3);
    }

    /** Dash and dot, for a limit. */
    BasicStroke limit() {
        return broken(8, 2.5, 1.5, 2.5);
    }

    BasicStroke solid(double width) {
        return new BasicStroke((float) (width * zoom), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    }

    private BasicStroke broken(double... lengths) {
        float[] dash = new float[lengths.length];
        for (int i = 0; i < dash.length; i++) {
            dash[i] = (float) (lengths[i] * zoom);
        }
        return new BasicStroke((float) (1.2 * zoom), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dash, 0);
    }
}
