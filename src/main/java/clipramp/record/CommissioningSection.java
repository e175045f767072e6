package clipramp.record;

import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfFormField;
import com.lowagie.text.pdf.PdfPCell;
import com.lowagie.text.pdf.PdfPCellEvent;
import com.lowagie.text.pdf.TextField;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;

/** The sheet for the bench: what to expect at each test point, how far off it may be, and a field to fill in. */
final class CommissioningSection {
    private static final float FIELD_HEIGHT = 17;

    private CommissioningSection() {}

    static void write(Paper paper, RecordContent content) {
        paper.newPage();
        paper.section("Commissioning");
        paper.text(
                "Test the timing on a low isolated voltage first. Use isolated instruments only: a differential probe, or a"
                        + " battery instrument made for this line. Never clip an earthed probe to the firing common. A meter that"
                        + " reads averages misreads a chopped wave: true rms where it says so. The expected figures are of nominal"
                        + " parts at nominal line and 25 °C; note the line voltage first.");
        paper.quiet(
                "Tolerance: the parts' own, one at a time to either end, effects summed. It includes neither the line's"
                        + " nor the instrument's. The fields can be filled in on a screen or by hand.");
        Grid grid = new Grid(paper.faces(), new float[] {0.9f, 3.6f, 1.3f, 2, 1.7f, 2.6f}, 2);
        grid.heads("where", "what", "expected", "tolerance", "measured", "instrument");
        List<Expectation> lines = content.commissioning();
        for (int i = 0; i < lines.size(); i++) {
            Expectation line = lines.get(i);
            grid.add(line.where(), paper.faces().smallBold(), 0);
            grid.add(line.what(), paper.faces().small(), 1);
            grid.add(line.expected(), paper.faces().small(), 2);
            grid.add(line.tolerance(), paper.faces().small(), 3);
            grid.add(new Field(paper, "measured-" + (i + 1), line.where() + ": " + line.what()), FIELD_HEIGHT);
            grid.add(line.instrument(), paper.faces().small(), 5);
        }
        paper.add(grid.table());
        who(paper);
    }

    private static void who(Paper paper) {
        Grid grid = new Grid(paper.faces(), new float[] {1.1f, 2.4f, 1.1f, 1.5f, 1.2f, 1.8f});
        for (String[] pair :
                new String[][] {{"measured by", "date", "serial number"}, {"instruments", "line voltage", "ambient"}}) {
            for (int i = 0; i < pair.length; i++) {
                grid.add(pair[i], paper.faces().quiet(), 2 * i);
                grid.add(new Field(paper, pair[i].replace(' ', '-'), pair[i]), FIELD_HEIGHT);
            }
        }
        paper.add(grid.table());
    }

    /** An empty form field in a cell. */
    private static final class Field implements PdfPCellEvent {
        private final Paper paper;
        private final String name;
        private final String spoken;

        Field(Paper paper, String name, String spoken) {
            this.paper = paper;
            this.name = name;
            this.spoken = spoken;
        }

        @Override
        public void cellLayout(PdfPCell cell, Rectangle position, PdfContentByte[] canvases) {
            Rectangle box = new Rectangle(
                    position.getLeft() + 4,
                    position.getBottom() + 1.5f,
                    position.getRight() - 4,
                    position.getTop() - 1.5f);
            TextField text = new TextField(paper.writer(), box, name);
            text.setFont(paper.faces().field());
            text.setFontSize(Faces.SMALL);
            text.setBorderColor(Faces.axis());
            text.setBorderWidth(0.5f);
            text.setTextColor(paper.faces().small().getColor());
            try {
                PdfFormField field = text.getTextField();
                field.setUserName(spoken);
                paper.writer().addAnnotation(field);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
    }
}
