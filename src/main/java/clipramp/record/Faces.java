package clipramp.record;

import clipramp.figures.Lettering;
import clipramp.figures.Palette;
import com.lowagie.text.Font;
import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.FontMapper;
import java.awt.Color;
import java.io.IOException;

/** The record's type: DejaVu Sans in three sizes, embedded, and the same faces for the figures drawn into it. */
final class Faces implements FontMapper {
    static final float SMALL = 7.5f;
    static final float TEXT = 9;
    static final float HEAD = 13;
    private static final int REPLACEMENT = 0xFFFD;

    private final BaseFont regular;
    private final BaseFont bold;
    private final BaseFont field;

    Faces() throws IOException {
        regular = embedded("DejaVuSans.ttf", false, BaseFont.IDENTITY_H);
        bold = embedded("DejaVuSans-Bold.ttf", true, BaseFont.IDENTITY_H);
        // A form field is filled in by a viewer that knows only single-byte text, with any letter of Latin 1.
        field = embedded("DejaVuSans.ttf", false, BaseFont.WINANSI);
        field.addSubsetRange(new int[] {0x20, 0xFF});
    }

    private static BaseFont embedded(String name, boolean bold, String encoding) throws IOException {
        return BaseFont.createFont(name, encoding, BaseFont.EMBEDDED, false, Lettering.fontFile(bold), null);
    }

    /** A text with a mark in place of every sign that the face does not have. */
    String printable(String text) {
        StringBuilder printable = new StringBuilder();
        text.codePoints().forEach(sign -> {
            boolean shown = sign == '\n' || regular.charExists(sign);
            printable.appendCodePoint(shown ? sign : REPLACEMENT);
        });
        return printable.toString();
    }

    BaseFont field() {
        return field;
    }

    BaseFont regular() {
        return regular;
    }

    Font small() {
        return new Font(regular, SMALL, Font.NORMAL, Palette.PAPER.ink());
    }

    Font quiet() {
        return new Font(regular, SMALL, Font.NORMAL, Palette.PAPER.quiet());
    }

    Font smallBold() {
        return new Font(bold, SMALL, Font.NORMAL, Palette.PAPER.ink());
    }

    Font text() {
        return new Font(regular, TEXT, Font.NORMAL, Palette.PAPER.ink());
    }

    Font textBold() {
        return new Font(bold, TEXT, Font.NORMAL, Palette.PAPER.ink());
    }

    Font head() {
        return new Font(bold, HEAD, Font.NORMAL, Palette.PAPER.ink());
    }

    Font marked(float size) {
        return new Font(bold, size, Font.NORMAL, Palette.PAPER.ramp());
    }

    /** Rules between rows, which carry no meaning of their own. */
    static Color hairline() {
        return Palette.PAPER.hairline();
    }

    /** Frames that a hand must find. */
    static Color axis() {
        return Palette.PAPER.axis();
    }

    @Override
    public BaseFont awtToPdf(java.awt.Font font) {
        return font.isBold() ? bold : regular;
    }

    @Override
    public java.awt.Font pdfToAwt(BaseFont font, int size) {
        throw new UnsupportedOperationException("figures are drawn into a record, never out of it");
    }
}
