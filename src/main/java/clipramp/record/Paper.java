package clipramp.record;

import clipramp.figures.Figure;
import clipramp.figures.Style;
import clipramp.figures.Surfaces;
import com.lowagie.text.Chunk;
import com.lowagie.text.Document;
import com.lowagie.text.Element;
import com.lowagie.text.Font;
import com.lowagie.text.Image;
import com.lowagie.text.Paragraph;
import com.lowagie.text.pdf.PdfAction;
import com.lowagie.text.pdf.PdfOutline;
import com.lowagie.text.pdf.PdfTemplate;
import com.lowagie.text.pdf.PdfWriter;
import java.awt.Graphics2D;
import java.util.List;

/** What sections are set on: headings with bookmarks, running text, tables, figures, in the order of reading. */
final class Paper {
    private static final float LEADING = 1.35f;

    private final Document document;
    private final PdfWriter writer;
    private final Faces faces;
    private int sections;

    Paper(Document document, PdfWriter writer, Faces faces) {
        this.document = document;
        this.writer = writer;
        this.faces = faces;
    }

    Faces faces() {
        return faces;
    }

    PdfWriter writer() {
        return writer;
    }

    float width() {
        return document.right() - document.left();
    }

    /** Height that is left on this page, in points. */
    float room() {
        return writer.getVerticalPosition(false) - document.bottom();
    }

    void newPage() {
        document.newPage();
    }

    /** Begins another page unless so much height is left. */
    void need(float points) {
        if (room() < points) {
            newPage();
        }
    }

    /** A section's heading, which the outline leads to. */
    void section(String title) {
        need(120);
        sections++;
        String place = "section-" + sections;
        Paragraph head = new Paragraph(Faces.HEAD * LEADING, "", faces.head());
        head.add(new Chunk(sections + "  " + title, faces.head()).setLocalDestination(place));
        head.setSpacingBefore(room() < document.top() - document.bottom() - 1 ? 14 : 0);
        head.setSpacingAfter(5);
        document.add(head);
        PdfOutline root = writer.getDirectContent().getRootOutline();
        new PdfOutline(root, PdfAction.gotoLocalPage(place, false), sections + "  " + title);
    }

    void heading(String title) {
        need(60);
        paragraph(title, faces.textBold(), 8, 3);
    }

    void text(String text) {
        paragraph(text, faces.text(), 0, 4);
    }

    void small(String text) {
        paragraph(text, faces.small(), 0, 3);
    }

    void quiet(String text) {
        paragraph(text, faces.quiet(), 2, 4);
    }

    void paragraph(String text, Font font, float before, float after) {
        Paragraph paragraph = new Paragraph(font.getSize() * LEADING, faces.printable(text), font);
        paragraph.setSpacingBefore(before);
        paragraph.setSpacingAfter(after);
        document.add(paragraph);
    }

    /** Sentences as a list with dashes. */
    void list(List<String> lines, Font font) {
        for (String line : lines) {
            Paragraph paragraph = new Paragraph(font.getSize() * LEADING, "", font);
            paragraph.add(new Chunk("–  ", font));
            paragraph.add(new Chunk(faces.printable(line), font));
            paragraph.setIndentationLeft(12);
            paragraph.setFirstLineIndent(-12);
            paragraph.setSpacingAfter(2);
            document.add(paragraph);
        }
    }

    void add(Element element) {
        document.add(element);
    }

    /** A figure over the whole width at a height in points. */
    void figure(Figure figure, float height) {
        need(height + 8);
        document.add(picture(figure, width(), height));
    }

    Image picture(Figure figure, float width, float height) {
        PdfTemplate template = writer.getDirectContent().createTemplate(width, height);
        Graphics2D g = template.createGraphics(width, height, faces);
        Surfaces.draw(figure, g, width, height, Style.PRINT.with(PrintPalette.WHITE));
        g.dispose();
        Image image = Image.getInstance(template);
        image.setAlt(figure.sentence());
        image.setAlignment(Element.ALIGN_LEFT);
        return image;
    }
}
