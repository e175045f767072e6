package clipramp.record;

import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import com.lowagie.text.Font;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfPCell;
import com.lowagie.text.pdf.PdfPTable;

/** Every margin, worst first, with its formula, source and remedy. */
final class MarginsSection {
    private MarginsSection() {}

    static void write(Paper paper, RecordContent content) {
        paper.section("Margins, worst first");
        paper.text(
                "The bar is the ratio of what there is to what is asked (the other way round for a ceiling), full at three."
                        + " The long tick is what is asked; the short one is where a margin counts as held rather than tight.");
        Faces faces = paper.faces();
        PdfPTable all = new PdfPTable(1);
        all.setWidthPercentage(100);
        all.setHeaderRows(1);
        all.setSplitRows(false);
        all.addCell(whole(
                grid(faces).onceHeads("margin", "worst at", "asked", "there is", "ratio", "tick: asked", "verdict")));
        for (Margin margin : content.check().margins()) {
            all.addCell(whole(row(faces, margin)));
        }
        paper.add(all);
    }

    private static Grid grid(Faces faces) {
        return new Grid(faces, new float[] {2.9f, 2.3f, 1.4f, 1.4f, 0.9f, 1.6f, 1.1f}, 2, 3, 4);
    }

    /** A margin's lines as one cell, which no page break divides. */
    private static PdfPCell whole(Grid grid) {
        PdfPCell cell = new PdfPCell(grid.table());
        cell.setBorder(Rectangle.NO_BORDER);
        cell.setPadding(0);
        return cell;
    }

    private static Grid row(Faces faces, Margin margin) {
        Grid grid = grid(faces);
        boolean fails = margin.verdict() == Verdict.FAILS;
        Font name = fails ? faces.marked(Faces.SMALL) : faces.smallBold();
        grid.bare(margin.name(), name, 0);
        grid.bare(margin.condition(), faces.small(), 1);
        grid.bare(Shown.asked(margin), faces.small(), 2);
        grid.bare(Shown.of(margin.offered(), margin), faces.small(), 3);
        grid.bare(Shown.ratio(margin), faces.small(), 4);
        grid.bare(new RatioBar(margin), 14);
        grid.bare(Shown.word(margin.verdict()), name, 6);
        grid.bareAcross(margin.formula(), faces.small());
        if (!margin.remedy().isEmpty()) {
            grid.bareAcross("what to do: " + margin.remedy(), faces.quiet());
        }
        String parts = margin.parts().isEmpty() ? "" : " · moved by: " + String.join(", ", margin.parts());
        grid.across("source: " + margin.source() + parts, faces.quiet());
        return grid;
    }
}
