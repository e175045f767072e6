package clipramp.record;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Ramp;
import clipramp.circuit.SampleDesigns;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.margins.Judge;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class EveryStageRecordTest {
    static Stream<Arguments> designs() {
        Ramp ramp = SampleDesigns.heater().ramp();
        return Stream.of(
                Arguments.of("bridge-dc", SampleDesigns.heater()),
                Arguments.of("half-wave", SampleDesigns.halfWaveHeater()),
                Arguments.of("triac", SampleDesigns.triacHeater()),
                Arguments.of("inverse-parallel", SampleDesigns.inverseParallelHeater()),
                Arguments.of("bridge-ac", SampleDesigns.thyristorTapHeater()),
                Arguments.of("synchronising winding", SampleDesigns.windingHeater(0.05, true)),
                Arguments.of("programmable unijunction", SampleDesigns.programmableHeater()),
                Arguments.of(
                        "fixed ramp",
                        SampleDesigns.heater().withRamp(new Ramp(ramp.capacitor(), Part.of(33_000), Optional.empty()))),
                Arguments.of(
                        "a ramp that never fires",
                        SampleDesigns.heater().withRamp(new Ramp(ramp.capacitor(), Part.of(10e6), Optional.empty()))));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("designs")
    void isPrintedWithoutAGap(String name, Design design) throws IOException {
        LoadedDesign loaded = new LoadedDesign(
                design, "a.yaml", List.of(), List.of(), List.of(), List.of(), "0123456789abcdef".repeat(4));
        var check = Judge.check(design, OptionalDouble.empty(), OptionalDouble.empty());
        byte[] pdf =
                DesignRecord.bytes(RecordContent.of(loaded, check, ProfileLibrary.shipped(), "0.1.0"), PageSize.A4);
        try (PDDocument document = Loader.loadPDF(pdf)) {
            String text = new PDFTextStripper().getText(document).replaceAll("\\s+", " ");
            assertThat(text)
                    .contains("Stage " + design.stage().word())
                    .doesNotContain("NaN", "Optional", "null", "Infinity");
            assertThat(document.getNumberOfPages()).isBetween(8, 20);
            int last = document.getNumberOfPages();
            for (int page = 1; page <= last; page++) {
                PDFTextStripper one = new PDFTextStripper();
                one.setStartPage(page);
                one.setEndPage(page);
                assertThat(one.getText(document).length()).as("page " + page).isGreaterThan(180);
            }
        }
    }
}
