package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Design;
import clipramp.fit.BenchLine;
import clipramp.fit.Meter;
import clipramp.fit.Readings;
import clipramp.fit.Setting;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Readings in: what is taken, and what is refused where and how. */
class ReadingsFileTest {
    private static final Design CABINET = design("drying-cabinet");

    private static Design design(String example) {
        return DesignFiles.load(
                        new Source(example, Example.named(example).orElseThrow().text()),
                        List.of(),
                        ProfileLibrary.shipped())
                .design();
    }

    private static Readings read(String text) {
        return ReadingsFile.read(new Source("bench.csv", text), CABINET, 25);
    }

    @Test
    void readsUnitsAccuraciesRemarksAndEmptyFields() {
        Readings readings = read("# a remark, with a comma\r\n"
                + "knob (%) ±2,ramp resistance (kohm),delay (ms) +-1 %,load voltage (V average-reading),note\r\n"
                + "50,16.4,\"4.2\",,\"he said \"\"steady\"\", twice\"\r\n"
                + ",10.5,2.5,101.5,\r\n");

        BenchLine first = readings.lines().get(0);
        assertThat(first.line()).isEqualTo(3);
        assertThat(first.setting().kind()).isEqualTo(Setting.Kind.KNOB);
        assertThat(first.setting().value()).isEqualTo(0.5);
        assertThat(first.setting().accuracy().absolute()).isCloseTo(0.02, within(1e-12));
        assertThat(first.readings()).extracting(r -> r.meter()).containsExactly(Meter.DELAY, Meter.RAMP_OHMS);
        assertThat(first.readings().get(0).value()).isCloseTo(4.2e-3, within(1e-12));
        assertThat(first.readings().get(0).accuracy().relative()).isCloseTo(0.01, within(1e-12));
        BenchLine second = readings.lines().get(1);
        assertThat(second.setting().kind()).isEqualTo(Setting.Kind.RAMP_OHMS);
        assertThat(second.setting().value()).isCloseTo(10.5e3, within(1e-6));
        assertThat(second.readings().get(1).meter()).isEqualTo(Meter.LOAD_AVERAGE_READING);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "knob (%),fring angle (deg)~50,90 | 1:10 | firing angle (deg)",
                "knob (%),load voltage (V)~50,90 | 1:10 | say which meter",
                "knob (%),firing angle~50,90 | 1:10 | unit in brackets",
                "knob (%),firing angle (V)~50,90 | 1:10 | firing angle (deg)",
                "knob (%),delay (ms)~50,\"4,2\" | 2:4 | Write a dot: 4.2",
                "knob (%),delay (ms)~50,soon | 2:4 | expected a number",
                "knob (%),firing angle (deg)~50,200 | 2:4 | 0..180",
                "knob (%),firing angle (deg)~120,90 | 2:1 | 0..100",
                "knob (%),firing angle (deg)~,90 | 2:1 | where did the knob stand",
                "firing angle (deg)~90 | 1:1 | the design has a knob",
                "knob (%)~50 | 1:1 | no column holds a reading",
                "knob (%),firing angle (deg)~50, | 2:1 | nothing was read",
                "knob (%),firing angle (deg)~50,90,3 | 2:7 | 3 fields under 2 heads",
                "knob (%);firing angle (deg)~50;90 | 1:1 | commas",
                "knob (%),firing angle (deg) ±0~50,90 | 1:10 | accuracy",
                "knob (%),firing angle (deg)~50,\"90 | 2:4 | never closed",
                "knob (%) | 1:1 | lines of readings"
            })
    void refusesWithPlaceAndRemedy(String text, String place, String said) {
        assertThatThrownBy(() -> read(text.replace('~', '\n')))
                .isInstanceOf(InvalidInputException.class)
                .hasMessageContaining("bench.csv:" + place + " ")
                .hasMessageContaining(said);
    }

    @Test
    void refusesAnAverageReadingMeterAcrossAnInductiveLoad() {
        Design fan = design(Path.of("examples", "store-fan.yaml"));
        Source bench = new Source("bench.csv", "knob (%),load voltage (V average-reading)\n50,90\n");
        assertThatThrownBy(() -> ReadingsFile.read(bench, fan, 25))
                .isInstanceOf(InvalidInputException.class)
                .hasMessageContaining("bench.csv:1:10 ")
                .hasMessageContaining("true rms");
    }

    private static Design design(Path file) {
        try {
            return DesignFiles.load(Source.of(file), List.of(), ProfileLibrary.shipped())
                    .design();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void everyHeadThatIsOfferedIsTaken() {
        for (String head : ReadingsFile.heads()) {
            Findings findings = new Findings();
            assertThat(ReadingsColumn.of(head, Place.of("x", 1, 1), findings))
                    .as(head)
                    .isPresent();
            assertThat(findings.hasProblems()).as(head).isFalse();
        }
    }

    @Test
    void aNewLineInQuotesCountsAsALine() {
        Readings readings = read("knob (%),delay (ms),note\n50,4,\"two\nlines\"\n60,3,\n");
        assertThat(readings.lines()).extracting(BenchLine::line).containsExactly(2, 4);
    }
}
