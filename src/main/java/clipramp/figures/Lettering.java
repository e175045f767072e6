package clipramp.figures;

import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The one type family, DejaVu Sans, from the program's own font files: nothing depends on what a machine has installed. */
public final class Lettering {
    /** The family's name, as a style sheet and an SVG know it. */
    public static final String FAMILY = "DejaVu Sans";

    private static final String FOLDER = "/net/sf/jasperreports/fonts/dejavu/";
    /** Measures alike for every surface: fractional widths, no hinting. */
    private static final FontRenderContext MEASURE = new FontRenderContext(null, true, true);

    private Lettering() {}

    /** Loaded on first use, because reading a face takes tens of milliseconds that a command line may not need. */
    private static final class Faces {
        private static final Font REGULAR = awt(fontFile(false));
        private static final Font BOLD = awt(fontFile(true));

        private static Font awt(byte[] trueType) {
            try {
                return Font.createFont(Font.TRUETYPE_FONT, new ByteArrayInputStream(trueType));
            } catch (FontFormatException e) {
                throw new IllegalStateException("the program's own font file is damaged", e);
            } catch (IOException e) {
                throw new UncheckedIOException(
                        "the fonts cannot be unpacked into the folder for temporary files, "
                                + System.getProperty("java.io.tmpdir") + ": " + e.getMessage(),
                        e);
            }
        }
    }

    /** Reads the faces and measures a word, so that the first figure need not wait for that. */
    public static void prepare() {
        width("0", bold(1));
        width("0", regular(1));
    }

    /**
     * The TrueType file of a face, for a surface that embeds or loads it itself.
     *
     * @param bold whether the bold face is meant; the regular one else
     */
    public static byte[] fontFile(boolean bold) {
        String name = FOLDER + (bold ? "DejaVuSans-Bold.ttf" : "DejaVuSans.ttf");
        try (InputStream in = Lettering.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("the program's own font file " + name + " is missing");
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The regular face at a size in user units. */
    static Font regular(double size) {
        return Faces.REGULAR.deriveFont((float) size);
    }

    /** The bold face; it also bears AWT's bold style, by which an SVG knows it. */
    static Font bold(double size) {
        return Faces.BOLD.deriveFont(Font.BOLD, (float) size);
    }

    /** Advance width of a text in user units. */
    static double width(String text, Font font) {
        return text.isEmpty() ? 0 : font.getStringBounds(text, MEASURE).getWidth();
    }

    /** How far the box that a line of text keeps free reaches over the baseline: to the tops of capitals and figures. */
    static double ascent(Font font) {
        return font.getSize2D() * 0.76;
    }

    /** And how far of that box lies under the baseline. */
    static double descent(Font font) {
        return font.getSize2D() * 0.24;
    }

    /** The box of a text whose baseline begins at x, y. */
    static Rectangle2D box(String text, Font font, double x, double y) {
        return new Rectangle2D.Double(x, y - ascent(font), width(text, font), ascent(font) + descent(font));
    }
}
