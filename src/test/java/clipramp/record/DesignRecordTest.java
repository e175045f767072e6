package clipramp.record;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Trigger;
import clipramp.faults.FaultEffect;
import clipramp.files.LoadedDesign;
import clipramp.margins.LineCheck;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.power.OperatingPoint;
import clipramp.runs.Watch;
import clipramp.spread.DrawLaw;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import clipramp.units.Unit;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.PDXObject;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.pdmodel.graphics.image.PDImageXObject;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;
import org.apache.pdfbox.pdmodel.interactive.form.PDField;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** Reads the record back with another library than the one that wrote it. */
class DesignRecordTest {
    private static RecordContent content;
    private static byte[] pdf;
    private static RecordContent failing;
    private static byte[] failingPdf;

    @BeforeAll
    static void write() throws IOException {
        content = SampleRecords.of("drying-cabinet");
        pdf = DesignRecord.bytes(content, PageSize.A4);
        failing = SampleRecords.of("cabinet-gone-wrong");
        failingPdf = DesignRecord.bytes(failing, PageSize.LETTER);
    }

    private static String text(byte[] bytes, int page) throws IOException {
        try (PDDocument document = Loader.loadPDF(bytes)) {
            PDFTextStripper stripper = new PDFTextStripper();
            if (page > 0) {
                stripper.setStartPage(page);
                stripper.setEndPage(page);
            }
            return stripper.getText(document);
        }
    }

    @Test
    void everySignOfTheTradeCanBeSelected() throws IOException {
        assertThat(text(pdf, 0)).contains("Ω", "α", "µ", "η", "°", "≥", "≤", "−", "±", "ω");
    }

    /** The closed form of a resistor's current is checked in LineCurrentTest; here, that the record shows the judge's. */
    @Test
    void theLineCurrentHasItsPageWithEveryOrderAndNoVerdict() throws IOException {
        LineCheck line = content.check().lineCurrent().orElseThrow();
        String page = text(pdf, pageOf(pdf, "order of the line's frequency")).replaceAll("\\s+", " ");
        assertThat(page)
                .contains("Line current", "displacement factor", "power factor", "distortion", "direct part")
                .contains("IEC 61000-3-2 to edition 4", "from memory", "A test house and local rules decide")
                .contains("order " + line.binding().order() + " binds first")
                .contains(Shown.quantity(line.bindsAtWatts(), Unit.WATT))
                .doesNotContain("complies")
                .doesNotContain("compliant");
        for (LineCheck.Order order : line.orders()) {
            assertThat(page).contains(" " + order.order() + " ");
        }
        assertThat(page).contains(Shown.brief(line.orders().get(13).amps(), Unit.AMPERE));
    }

    private static int pageOf(byte[] bytes, String words) throws IOException {
        int page = 1;
        while (!text(bytes, page).contains(words)) {
            page++;
        }
        return page;
    }

    @Test
    void everyFontIsEmbeddedAndIsDejaVu() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            Set<String> names = new HashSet<>();
            for (PDPage page : document.getPages()) {
                fonts(page.getResources(), names);
            }
            PDResources form = document.getDocumentCatalog().getAcroForm(null).getDefaultResources();
            fonts(form, names);
            assertThat(names).isNotEmpty().allMatch(name -> name.contains("DejaVuSans"), "DejaVu Sans");
        }
    }

    private static void fonts(PDResources resources, Set<String> names) throws IOException {
        for (COSName name : resources.getFontNames()) {
            PDFont font = resources.getFont(name);
            assertThat(font.isEmbedded()).as(font.getName()).isTrue();
            names.add(font.getName());
        }
        for (COSName name : resources.getXObjectNames()) {
            PDXObject object = resources.getXObject(name);
            assertThat(object).as("figures are drawn, not photographed").isNotInstanceOf(PDImageXObject.class);
            if (object instanceof PDFormXObject drawing && drawing.getResources() != null) {
                fonts(drawing.getResources(), names);
            }
        }
    }

    @Test
    void thePageNumbersRunToTheLast() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            int pages = document.getNumberOfPages();
            assertThat(pages).isBetween(8, 30);
            for (int page = 1; page <= pages; page++) {
                assertThat(text(pdf, page).replaceAll("\\s+", " ")).contains("page " + page + " of " + pages);
            }
        }
    }

    @Test
    void titleLanguageAndTheDesignsOwnDateAreSet() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            assertThat(document.getDocumentCatalog().getLanguage()).isEqualTo("en");
            assertThat(document.getDocumentInformation().getTitle())
                    .isEqualTo("Design record: Drying cabinet, lower heater");
            assertThat(document.getDocumentInformation().getCreationDate().getTime())
                    .isEqualTo("2031-01-31T00:00:00Z");
            assertThat(document.getDocumentInformation().getModificationDate()).isNull();
        }
        try (PDDocument document = Loader.loadPDF(failingPdf)) {
            assertThat(document.getDocumentInformation().getCreationDate()).isNull();
        }
    }

    @Test
    void theOutlineLeadsToEverySection() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            List<String> titles = new ArrayList<>();
            int lastPage = 0;
            for (PDOutlineItem item :
                    document.getDocumentCatalog().getDocumentOutline().children()) {
                titles.add(item.getTitle());
                PDPage page = item.findDestinationPage(document);
                assertThat(page).as(item.getTitle()).isNotNull();
                int number = document.getPages().indexOf(page) + 1;
                assertThat(number).as(item.getTitle()).isGreaterThanOrEqualTo(lastPage);
                assertThat(text(pdf, number)).contains(item.getTitle().replaceFirst("^\\d+ +", ""));
                lastPage = number;
            }
            assertThat(titles)
                    .hasSize(15)
                    .anyMatch(title -> title.contains("Review"))
                    .anyMatch(title -> title.contains("Commissioning"))
                    .anyMatch(title -> title.contains("Signatures"));
        }
    }

    @Test
    void alikeInputGivesAlikeBytes() throws IOException {
        assertThat(DesignRecord.bytes(SampleRecords.of("drying-cabinet"), PageSize.A4))
                .isEqualTo(pdf);
    }

    @Test
    void pageOneFitsOnePageAndSaysWhatAReviewerNeeds() throws IOException {
        String first = text(pdf, 1).replaceAll("\\s+", " ");
        assertThat(first)
                .contains("Mains voltage kills", "DC-14", "2031-01-31", "clipramp 0.1.0", "no statement of compliance")
                .contains(content.check().margins().get(0).name())
                .contains("Assumed:", "Not judged:", "Local profiles that hide others:");
        assertThat(first.replace(" ", "")).contains(content.loaded().inputDigest());
        assertThat(text(pdf, 2)).contains("Before you build or measure", "Isolate at a switch");
    }

    @Test
    void everyMarginStandsInTheRecordWithFormulaSourceAndRemedy() throws IOException {
        String all = text(failingPdf, 0).replaceAll("[\\s\u00a0]+", "");
        for (Margin margin : failing.check().margins()) {
            assertThat(all).contains(margin.name().replaceAll("\\s+", ""));
            assertThat(all).contains(margin.formula().replaceAll("\\s+", ""));
            assertThat(all).contains(margin.remedy().replaceAll("\\s+", ""));
            assertThat(all).contains(margin.source().replaceAll("\\s+", ""));
        }
    }

    @Test
    void aFailingDesignIsMarkedOnEveryPageAndASoundOneOnNone() throws IOException {
        assertThat(failing.check().verdict()).isEqualTo(Verdict.FAILS);
        try (PDDocument document = Loader.loadPDF(failingPdf)) {
            for (int page = 1; page <= document.getNumberOfPages(); page++) {
                assertThat(text(failingPdf, page)).as("page " + page).contains("FAILS: ");
            }
        }
        assertThat(text(pdf, 0)).doesNotContain("FAILS");
    }

    @Test
    void nothingIsSaidToComplyOrToBeSafe() throws IOException {
        String cautions = SafetyPage.text().replaceAll("\\s+", " ");
        String judged = text(pdf, 0).replaceAll("\\s+", " ");
        for (String word : List.of("complies", "compliant", " is safe", " safely", "approved", "certified")) {
            assertThat(judged.replace("never says that a circuit is safe", "")).doesNotContain(word);
        }
        assertThat(cautions).contains("never says that a circuit is safe");
    }

    @Test
    void theCommissioningSheetHasAnEmptyFieldForEveryMeasurement() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            List<PDField> fields =
                    document.getDocumentCatalog().getAcroForm(null).getFields();
            long measured = fields.stream()
                    .filter(field -> field.getFullyQualifiedName().startsWith("measured-"))
                    .filter(field -> !field.getFullyQualifiedName().equals("measured-by"))
                    .count();
            assertThat(measured).isEqualTo(content.commissioning().size()).isGreaterThan(10);
            for (PDField field : fields) {
                assertThat(field.getValueAsString()).isEmpty();
                assertThat(field.getAlternateFieldName()).isNotBlank();
            }
        }
    }

    @Test
    void paperIsAsAsked() throws IOException {
        try (PDDocument a4 = Loader.loadPDF(pdf);
                PDDocument letter = Loader.loadPDF(failingPdf)) {
            // ISO 216: 210 mm x 297 mm; US letter: 8.5 in x 11 in; a point is 1/72 in.
            assertThat(a4.getPage(0).getMediaBox().getWidth() / 72 * 25.4).isBetween(209.0, 211.0);
            assertThat(a4.getPage(0).getMediaBox().getHeight() / 72 * 25.4).isBetween(296.0, 298.0);
            assertThat(letter.getPage(0).getMediaBox().getWidth()).isEqualTo(612);
            assertThat(letter.getPage(0).getMediaBox().getHeight()).isEqualTo(792);
        }
    }

    /** However much a design leaves to defaults and however it is named, the cautions stay on page two. */
    @Test
    void pageOneStaysOnePageWithEverythingLong() throws IOException {
        LoadedDesign loaded = content.loaded();
        List<LoadedDesign.Assumed> assumed = new ArrayList<>();
        List<String> overrides = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            assumed.add(
                    new LoadedDesign.Assumed("some.long.path.of.a.key.number" + i, "value with many words ".repeat(9)));
            overrides.add("trigger.device.standoff=0." + i + "5".repeat(60));
        }
        LoadedDesign longer = new LoadedDesign(
                loaded.design(),
                "a-long-name-of-a-file-".repeat(12) + "\u4E2D.yaml",
                assumed,
                loaded.profiles(),
                loaded.notes(),
                overrides,
                loaded.inputDigest());
        RecordContent long_ = new RecordContent(
                longer,
                content.check(),
                content.profiles(),
                content.lanes(),
                content.commissioning(),
                content.faults(),
                "0.1.0",
                Optional.empty(),
                Optional.empty());
        for (PageSize size : PageSize.values()) {
            byte[] bytes = DesignRecord.bytes(long_, size);
            assertThat(text(bytes, 1).replaceAll("\\s+", " "))
                    .contains("no statement of compliance with any standard", "and 52 more");
            assertThat(text(bytes, 2).replaceAll("\\s+", " "))
                    .contains("Before you build or measure", "says nothing about the circuit as a whole");
        }
    }

    @Test
    void aSpreadHasItsPageAndItsBands() throws IOException {
        SpreadResult spread =
                Spread.run(content.loaded().design(), new SpreadOptions(60, 1, DrawLaw.NORMAL, 0), Watch.NONE);
        byte[] with = DesignRecord.bytes(content.withSpread(Optional.of(spread)), PageSize.A4);
        String all = text(with, 0).replaceAll("\\s+", " ");
        assertThat(all)
                .contains("Spread: 60 units", "reach what is wanted", "What matters at mid-knob", "Seed 1, law normal");
        assertThat(text(pdf, 0)).doesNotContain("Spread: ");
        assertThat(DesignRecord.bytes(content.withSpread(Optional.of(spread)), PageSize.A4))
                .isEqualTo(with);
    }

    @Test
    void theSymptomSheetNamesEveryFaultWithWhatTheLoadGets() throws IOException {
        String all = text(pdf, 0).replaceAll("\\s+", " ");
        assertThat(content.faults().faults()).hasSizeGreaterThan(20);
        for (FaultEffect effect : content.faults().faults()) {
            assertThat(all).contains(effect.fault().words());
        }
        assertThat(all).contains("burns next:", "isolated instruments only");
    }

    @Test
    void everySolvedDelayStandsBesideTheTextbooks() throws IOException {
        String all = text(pdf, 0).replaceAll("\\s+", " ");
        double eta = ((Trigger.UnijunctionTrigger) content.check().design().trigger())
                .device()
                .standoff()
                .nominal();
        double farads = content.check().design().ramp().capacitor().value();
        for (OperatingPoint point : content.check().knob()) {
            double solved = point.solution().shown().firingPulse().orElseThrow().startSeconds();
            // Mehta, Principles of Electronics, 21.11: T = R C ln(1/(1 - eta)).
            double textbook = point.rampOhms() * farads * -Math.log1p(-eta);
            assertThat(all)
                    .contains(Shown.quantity(solved, Unit.SECOND))
                    .contains(Shown.quantity(textbook, Unit.SECOND));
        }
    }
}
