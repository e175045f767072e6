package clipramp.record;

import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import com.lowagie.text.Font;

/** Every margin, worst first, with its formula, source and remedy. */
final class MarginsSection {
    private MarginsSection() {}

    static void write(Paper paper, RecordContent content) {
        paper.section("Margins, worst first");
        paper.text("The bar is the ratio of what there is to what is asked (the other way round for a ceiling), full at three."
                + " The long tick is what is asked; the short one is where a margin counts as held rather than tight.");
        Faces faces = paper.faces();
        Grid grid = new Grid(faces, new float[] {3.1f, 1.9f, 1.5f, 1.5f, 0.9f, 1.7f, 1.2f}, 2, 3, 4);
        grid.heads("margin", "worst at", "asked", "there is", "ratio", "against what is asked", "verdict");
        for (Margin margin : content.check().margins()) {
            row(grid, faces, margin);
        }
        paper.add(grid.table());
    }

    private static void row(Grid grid, Faces faces, Margin margin) {
        boolean fails = margin.verdict() == Verdict.FAILS;
        Font name = fails ? faces.marked(Faces.SMALL) : faces.smallBold();
        grid.bare(margin.name(), name, 0);
        grid.bare(margin.condition(), faces.small(), 1);
        grid.bare(Shown.asked(margin), faces.small(), 2);
        grid.bare(Shown.of(margin.offered(), margin), faces.small(), 3);
        grid.bare(Shown.ratio(margin), faces.small(), 4);
        grid.bare(new RatioBar(margin), 14);
        grid.bare(Shown.word(margin.verdict()), name, 6);
        StringBuilder rest = new StringBuilder(margin.formula());
        rest.append("\nsource: ").append(margin.source());
        if (!margin.remedy().isEmpty()) {
            rest.append("\nremedy: ").append(margin.remedy());
        }
        if (!margin.parts().isEmpty()) {
            rest.append("\nmoved by: ").append(String.join(", ", margin.parts()));
        }
        grid.across(rest.toString(), faces.quiet());
    }
}
