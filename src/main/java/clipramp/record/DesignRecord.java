package clipramp.record;

import clipramp.circuit.Design;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import com.lowagie.text.Document;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;

/**
 * Writes the design record: what a reviewer, a builder and a bench need of one design. Alike input gives alike bytes; the
 * only date in it is the design's own.
 */
public final class DesignRecord {
    private static final float SIDE = 48;
    private static final float TOP = 54;
    private static final float BOTTOM = 50;
    private static final int DIGEST_SHOWN = 12;

    private DesignRecord() {}

    /**
     * Writes the whole record or nothing.
     *
     * @param content what it prints
     * @param out where to; left open
     * @param size paper
     * @throws IOException where {@code out} cannot be written
     */
    public static void write(RecordContent content, OutputStream out, PageSize size) throws IOException {
        out.write(bytes(content, size));
    }

    /**
     * The record as a PDF file in memory.
     *
     * @param content what it prints
     * @param size paper
     * @throws IOException where the PDF cannot be put together
     */
    public static byte[] bytes(RecordContent content, PageSize size) throws IOException {
        ByteArrayOutputStream pdf = new ByteArrayOutputStream();
        Document document = new Document(size.points(), SIDE, SIDE, TOP, BOTTOM);
        PdfWriter writer = PdfWriter.getInstance(document, pdf);
        writer.setPdfVersion(PdfWriter.PDF_VERSION_1_7);
        writer.setViewerPreferences(PdfWriter.PageModeUseOutlines | PdfWriter.DisplayDocTitle);
        Faces faces = new Faces();
        writer.setPageEvent(new PageFrame(faces, heading(content), mark(content), foot(content)));
        document.addTitle(title(content));
        document.addSubject("Design record: computed, no statement of compliance");
        document.addCreator("clipramp " + content.programVersion());
        document.open();
        describe(writer, content);
        sections(new Paper(document, writer, faces), content);
        document.close();
        return Reproducible.settled(pdf.toByteArray());
    }

    private static void sections(Paper paper, RecordContent content) {
        Design design = content.check().design();
        new ReviewPage(paper, content).write();
        SafetyPage.write(paper);
        paper.newPage();
        PartsSection parts = new PartsSection(paper, design);
        parts.circuit();
        new FiringSection(paper, content).write();
        new CurvesSection(paper, content).write();
        content.spread().filter(s -> s.units() > 0).ifPresent(s -> SpreadSection.write(paper, s));
        paper.newPage();
        MarginsSection.write(paper, content);
        new DissipationSection(paper, content).write();
        content.check().lineCurrent().ifPresent(line -> LineCurrentSection.write(paper, line));
        parts.parts();
        CommissioningSection.write(paper, content);
        FaultsSection.write(paper, content);
        content.fit().ifPresent(fit -> AsBuiltSection.write(paper, fit));
        paper.newPage();
        SourcesSection.write(paper, content);
        SignatureSection.write(paper, content);
    }

    /** Language, and no clock: the only date is the design's own. */
    private static void describe(PdfWriter writer, RecordContent content) {
        writer.getExtraCatalog().put(PdfName.LANG, new PdfString("en"));
        PdfDictionary info = writer.getInfo();
        info.remove(PdfName.MODDATE);
        String date = content.check().design().document().date();
        if (date.matches("\\d{4}-\\d{2}-\\d{2}")) {
            info.put(PdfName.CREATIONDATE, new PdfString("D:" + date.replace("-", "")));
        } else {
            info.remove(PdfName.CREATIONDATE);
        }
    }

    private static String title(RecordContent content) {
        String title = content.check().design().title();
        return "Design record: " + (title.isBlank() ? content.loaded().name() : title);
    }

    private static String heading(RecordContent content) {
        var block = content.check().design().document();
        StringBuilder heading = new StringBuilder(title(content));
        if (!block.number().isBlank()) {
            heading.append(" · ").append(block.number());
        }
        if (!block.revision().isBlank()) {
            heading.append(" · revision ").append(block.revision());
        }
        return heading.toString();
    }

    private static String mark(RecordContent content) {
        if (content.check().verdict() != Verdict.FAILS) {
            return "";
        }
        long failing = content.check().margins().stream()
                .map(Margin::verdict)
                .filter(verdict -> verdict == Verdict.FAILS)
                .count();
        return "FAILS: " + failing + " of " + content.check().margins().size() + " margins";
    }

    private static String foot(RecordContent content) {
        String digest = content.loaded().inputDigest();
        return "computed; no statement of compliance · input "
                + digest.substring(0, Math.min(DIGEST_SHOWN, digest.length())) + " · clipramp "
                + content.programVersion();
    }
}
