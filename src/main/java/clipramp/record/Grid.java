package clipramp.record;

import com.lowagie.text.Element;
import com.lowagie.text.Font;
import com.lowagie.text.Phrase;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfPCell;
import com.lowagie.text.pdf.PdfPCellEvent;
import com.lowagie.text.pdf.PdfPTable;
import java.util.List;

/** A table under hairlines: heads repeat on every page, numbers stand at the right, long text wraps. */
final class Grid {
    private static final float LEADING = 1.28f;

    private final Faces faces;
    private final PdfPTable table;
    private final boolean[] atRight;

    /**
     * @param widths relative widths of the columns
     * @param rightAligned columns, from 0, whose cells are numbers
     */
    Grid(Faces faces, float[] widths, int... rightAligned) {
        this.faces = faces;
        this.table = new PdfPTable(widths);
        this.atRight = new boolean[widths.length];
        for (int column : rightAligned) {
            atRight[column] = true;
        }
        table.setWidthPercentage(100);
        table.setSpacingBefore(3);
        table.setSpacingAfter(6);
        table.setSplitLate(true);
        table.setSplitRows(true);
    }

    /** Heads that stand again on top of every page. */
    Grid heads(String... heads) {
        onceHeads(heads);
        table.setHeaderRows(1);
        return this;
    }

    Grid onceHeads(String... heads) {
        for (int i = 0; i < heads.length; i++) {
            PdfPCell cell = cell(heads[i], faces.quiet(), i);
            cell.setVerticalAlignment(Element.ALIGN_BOTTOM);
            cell.setBorderWidthBottom(0.8f);
            cell.setBorderColorBottom(faces.small().getColor());
            table.addCell(cell);
        }
        return this;
    }

    void row(String... cells) {
        row(faces.small(), List.of(cells));
    }

    void row(Font font, List<String> cells) {
        for (int i = 0; i < cells.size(); i++) {
            table.addCell(cell(cells.get(i), font, i));
        }
    }

    /** One cell of a row that is put together cell by cell. */
    void add(String text, Font font, int column) {
        table.addCell(cell(text, font, column));
    }

    /** A cell that draws or holds something else than text. */
    void add(PdfPCellEvent event, float height) {
        PdfPCell cell = cell("", faces.small(), 0);
        cell.setCellEvent(event);
        cell.setMinimumHeight(height);
        table.addCell(cell);
    }

    /** A cell without a rule under it: its row goes on in the next. */
    void bare(String text, Font font, int column) {
        PdfPCell cell = cell(text, font, column);
        cell.setBorder(Rectangle.NO_BORDER);
        table.addCell(cell);
    }

    void bare(PdfPCellEvent event, float height) {
        PdfPCell cell = cell("", faces.small(), 0);
        cell.setBorder(Rectangle.NO_BORDER);
        cell.setCellEvent(event);
        cell.setMinimumHeight(height);
        table.addCell(cell);
    }

    /** A line of text across all columns. */
    void across(String text, Font font) {
        PdfPCell cell = cell(text, font, 0);
        cell.setHorizontalAlignment(Element.ALIGN_LEFT);
        cell.setColspan(atRight.length);
        table.addCell(cell);
    }

    /** The same without a rule under it. */
    void bareAcross(String text, Font font) {
        PdfPCell cell = cell(text, font, 0);
        cell.setBorder(Rectangle.NO_BORDER);
        cell.setPaddingTop(1);
        cell.setPaddingBottom(2.5f);
        cell.setHorizontalAlignment(Element.ALIGN_LEFT);
        cell.setColspan(atRight.length);
        table.addCell(cell);
    }

    private PdfPCell cell(String text, Font font, int column) {
        PdfPCell cell = new PdfPCell(new Phrase(font.getSize() * LEADING, faces.printable(text), font));
        cell.setLeading(font.getSize() * LEADING, 0);
        cell.setBorder(Rectangle.BOTTOM);
        cell.setBorderWidthBottom(0.4f);
        cell.setBorderColorBottom(Faces.hairline());
        cell.setPaddingLeft(column == 0 ? 0 : 5);
        cell.setPaddingRight(column == atRight.length - 1 ? 0 : 3);
        cell.setPaddingTop(2);
        cell.setPaddingBottom(3);
        cell.setUseAscender(true);
        cell.setHorizontalAlignment(atRight[column] ? Element.ALIGN_RIGHT : Element.ALIGN_LEFT);
        return cell;
    }

    PdfPTable table() {
        return table;
    }
}
