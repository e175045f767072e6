package clipramp.record;

import com.lowagie.text.Document;
import com.lowagie.text.Element;
import com.lowagie.text.Font;
import com.lowagie.text.Phrase;
import com.lowagie.text.pdf.ColumnText;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfPageEventHelper;
import com.lowagie.text.pdf.PdfTemplate;
import com.lowagie.text.pdf.PdfWriter;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/** What stands on every page: which design this is, whether it fails, what the record is not, and page x of y. */
final class PageFrame extends PdfPageEventHelper {
    private static final float ABOVE = 14;
    private static final float BELOW = 16;

    private final Faces faces;
    private final String title;
    private final String mark;
    private final String foot;
    private @Nullable PdfTemplate total;

    /**
     * @param title design and document at the top left
     * @param mark what every page of a failing design says, or empty
     * @param foot what stands at the bottom left
     */
    PageFrame(Faces faces, String title, String mark, String foot) {
        this.faces = faces;
        this.title = title;
        this.mark = mark;
        this.foot = foot;
    }

    @Override
    public void onOpenDocument(PdfWriter writer, Document document) {
        total = writer.getDirectContent().createTemplate(24, 12);
    }

    @Override
    public void onEndPage(PdfWriter writer, Document document) {
        PdfContentByte page = writer.getDirectContent();
        float top = document.top() + ABOVE;
        float bottom = document.bottom() - BELOW;
        rule(page, document, top - 5);
        rule(page, document, bottom + 10);
        Font marked = faces.marked(Faces.SMALL);
        float markWidth = mark.isEmpty() ? 0 : marked.getBaseFont().getWidthPoint(mark, Faces.SMALL) + 12;
        float room = document.right() - document.left() - markWidth;
        show(page, Element.ALIGN_LEFT, fitted(title, faces.quiet(), room), faces.quiet(), document.left(), top);
        if (!mark.isEmpty()) {
            show(page, Element.ALIGN_RIGHT, mark, marked, document.right(), top);
        }
        show(page, Element.ALIGN_LEFT, foot, faces.quiet(), document.left(), bottom);
        String number = "page " + writer.getPageNumber() + " of ";
        float digits = faces.regular().getWidthPoint("000", Faces.SMALL) + 2;
        show(page, Element.ALIGN_RIGHT, number, faces.quiet(), document.right() - digits, bottom);
        page.addTemplate(template(), document.right() - digits + 2, bottom);
    }

    private PdfTemplate template() {
        return Objects.requireNonNull(total, "a page ended before the document was opened");
    }

    /** A text cut to a width, with a mark that it was. */
    private String fitted(String text, Font font, float width) {
        String shown = faces.printable(text);
        while (font.getBaseFont().getWidthPoint(shown, font.getSize()) > width && shown.length() > 2) {
            shown = shown.substring(0, shown.length() - 2).stripTrailing() + "…";
        }
        return shown;
    }

    private static void rule(PdfContentByte page, Document document, float y) {
        page.saveState();
        page.setColorStroke(Faces.hairline());
        page.setLineWidth(0.4f);
        page.moveTo(document.left(), y);
        page.lineTo(document.right(), y);
        page.stroke();
        page.restoreState();
    }

    private static void show(PdfContentByte page, int alignment, String text, Font font, float x, float y) {
        ColumnText.showTextAligned(page, alignment, new Phrase(text, font), x, y, 0);
    }

    @Override
    public void onCloseDocument(PdfWriter writer, Document document) {
        // The writer already stands on the page after the last.
        String pages = String.valueOf(writer.getPageNumber() - 1);
        ColumnText.showTextAligned(template(), Element.ALIGN_LEFT, new Phrase(pages, faces.quiet()), 0, 0, 0);
    }
}
