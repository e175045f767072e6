package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Fit from files to answers. */
class FitCommandTest {
    private static final String DESIGN = "examples/drying-cabinet.yaml";
    private static final String READINGS = "examples/drying-cabinet-readings.csv";

    @Test
    void theExampleTellsWhatItCanAndNamesWhatItCannot() {
        CliRun run = CliRun.of("fit", DESIGN, READINGS);

        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("Told by the readings", "standoff ratio", "The readings cannot tell", "Every reading belongs")
                .contains("No answer says that a build is safe");
        assertThat(run.err()).isEmpty();
    }

    @Test
    void theExamplesReadingsAreSaidToBeMadeUp() throws IOException {
        assertThat(Files.readString(Path.of(READINGS), StandardCharsets.UTF_8))
                .startsWith("# ")
                .contains("made them up");
    }

    @Test
    void theDesignAsBuiltReadsBackKeepsItsCommentsAndFitsItsOwnReadings(@TempDir Path folder) throws IOException {
        Path out = folder.resolve("built.yaml");
        assertThat(CliRun.of("fit", DESIGN, READINGS, "--out=" + out).code()).isZero();
        assertThat(CliRun.of("fit", DESIGN, READINGS, "--out=" + out).code())
                .as("a file that is there is not written over")
                .isEqualTo(4);

        String text = Files.readString(out, StandardCharsets.UTF_8);
        assertThat(text).startsWith("# Lower heater of a fruit-drying cabinet").contains("As built");
        JsonNode again = json(CliRun.of("fit", out.toString(), READINGS, "--json"));
        for (JsonNode residual : again.get("residuals")) {
            assertThat(residual.get("belongs").asBoolean()).isTrue();
        }
        for (JsonNode value : again.get("values")) {
            if (value.get("knowledge").asText().equals("told")) {
                assertThat(value.get("difference").asDouble())
                        .as(value.get("path").asText())
                        .isCloseTo(0, within(0.02));
            }
        }
    }

    @Test
    void aSlippedReadingIsNamedWithItsLineAndColumn(@TempDir Path folder) throws IOException {
        Path bad = folder.resolve("bad.csv");
        String good = Files.readString(Path.of(READINGS), StandardCharsets.UTF_8);
        assertThat(good).contains(",145.99,");
        Files.writeString(bad, good.replace(",145.99,", ",114.99,"), StandardCharsets.UTF_8);

        CliRun run = CliRun.of("fit", DESIGN, bad.toString());

        assertThat(run.out()).contains("Do not belong").contains("line 6, load voltage (V true-rms) +-2 %: read 115 V");
    }

    @Test
    void readingsThatTellNothingExitWithOne() {
        CliRun run = CliRun.withInput("knob (%),load voltage (V true-rms)\n95,221\n", "fit", DESIGN, "-");

        assertThat(run.out()).contains("The readings tell none of the unit's values");
        assertThat(run.code()).isEqualTo(1);
    }

    @Test
    void aWrongHeadIsToldWithItsPlaceInJsonToo() throws IOException {
        CliRun run = CliRun.withInput("knob (%),load voltage (V)\n95,221\n", "fit", DESIGN, "-", "--json");

        assertThat(run.code()).isEqualTo(2);
        JsonNode problem =
                new ObjectMapper().readTree(run.out()).get("problems").get(0);
        assertThat(problem.get("line").asInt()).isEqualTo(1);
        assertThat(problem.get("column").asInt()).isEqualTo(10);
        assertThat(problem.get("message").asText()).contains("average-reading");
    }

    @Test
    void readingsThatFitNothingAreNotPraised(@TempDir Path folder) throws IOException {
        Path readings = folder.resolve("far-off.csv");
        Files.writeString(readings, "knob (%),firing angle (deg)\n5,43\n40,97\n80,50\n");
        CliRun run = CliRun.of("fit", DESIGN, readings.toString());

        assertThat(run.out()).contains("together they do not fit this design").doesNotContain("Every reading belongs");
    }

    @Test
    void theRecordHasAPageAboutTheUnit(@TempDir Path folder) throws IOException {
        Path pdf = folder.resolve("unit.pdf");
        CliRun run = CliRun.of("fit", DESIGN, READINGS, "--record=" + pdf);

        assertThat(run.out()).endsWith("Record: " + pdf + "\n");
        try (PDDocument document = Loader.loadPDF(pdf.toFile())) {
            String text = new PDFTextStripper().getText(document).replaceAll("\\s+", " ");
            assertThat(text)
                    .contains("As built", "fitted from 24 of 24 bench readings", "95 % interval", "within tolerance")
                    .contains("The readings cannot tell:");
        }
    }

    @Test
    void overridesAreNotWrittenBehindTheUsersBack(@TempDir Path folder) {
        CliRun run =
                CliRun.of("fit", DESIGN, READINGS, "--with=ramp.capacitor=200nF", "--out=" + folder.resolve("x.yaml"));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--with and --out");
    }

    @Test
    void aFileThatCannotBeWrittenIsRefusedBeforeTheFit(@TempDir Path folder) throws IOException {
        // The readings are not there either: whoever looked at them first would say so.
        Path nowhere = folder.resolve("nowhere.csv");
        assertThat(CliRun.of("fit", DESIGN, nowhere.toString(), "--record=unit.yaml")
                        .err())
                .contains("ends in .pdf");
        assertThat(CliRun.of("fit", DESIGN, nowhere.toString(), "--record=" + folder.resolve("no/unit.pdf")))
                .satisfies(run -> assertThat(run.code()).isEqualTo(4))
                .satisfies(run -> assertThat(run.err()).contains("there is no folder " + folder.resolve("no")));
        Path there = Files.createFile(folder.resolve("there.yaml"));
        assertThat(CliRun.of("fit", DESIGN, nowhere.toString(), "--out=" + there)
                        .err())
                .contains("exists already");
        assertThat(CliRun.of("fit", DESIGN, nowhere.toString(), "--out=" + folder)
                        .err())
                .contains("it is a folder");
    }

    private static JsonNode json(CliRun run) throws IOException {
        assertThat(run.code()).isZero();
        JsonNode answer = new ObjectMapper().readTree(run.out());
        assertThat(answer.get("format").get("name").asText()).isEqualTo("fit");
        return answer;
    }
}
