package clipramp.record;

import clipramp.figures.Palette;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfPCell;
import com.lowagie.text.pdf.PdfPCellEvent;
import com.lowagie.text.pdf.PdfPTable;

/**
 * A margin's ratio as a bar against its limit: full scale is three times what is asked, the long tick is what is asked,
 * the short one where it holds. A failing bar is open, so that it is told apart without colour.
 */
final class RatioBar implements PdfPCellEvent {
    private static final double FULL_SCALE = 3;
    private static final float THICK = 4;

    private final Margin margin;

    RatioBar(Margin margin) {
        this.margin = margin;
    }

    @Override
    public void cellLayout(PdfPCell cell, Rectangle position, PdfContentByte[] canvases) {
        if (margin.ratio().isEmpty()) {
            return;
        }
        PdfContentByte page = canvases[PdfPTable.LINECANVAS];
        float left = position.getLeft() + 5;
        float width = position.getWidth() - 10;
        float middle = position.getTop() - 5.5f;
        float length = (float) (Math.min(margin.ratio().getAsDouble(), FULL_SCALE) / FULL_SCALE) * width;
        float asked = left + (float) (width / FULL_SCALE);
        float holds = left + (float) (width * margin.holdsFrom() / FULL_SCALE);
        page.saveState();
        page.setLineWidth(0.6f);
        page.setColorStroke(Palette.PAPER.ink());
        page.setColorFill(Palette.PAPER.quiet());
        page.rectangle(left, middle - THICK / 2, length, THICK);
        if (margin.verdict() == Verdict.FAILS) {
            page.stroke();
        } else {
            page.fill();
        }
        upright(page, asked, middle, 4.5f, 1.1f);
        if (margin.holdsFrom() > 1) {
            upright(page, holds, middle, 3, 0.5f);
        }
        page.restoreState();
    }

    private static void upright(PdfContentByte page, float x, float middle, float reach, float weight) {
        page.setLineWidth(weight);
        page.moveTo(x, middle - reach);
        page.lineTo(x, middle + reach);
        page.stroke();
    }
}
