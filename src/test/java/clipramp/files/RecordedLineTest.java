package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Line;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RecordedLineTest {
    /** A wave of our own, so that every share and phase is known. */
    private static final Line TRUTH =
            new Line(231, 50, 231, 231, List.of(new Line.Harmonic(5, 0.04, 1.2), new Line.Harmonic(7, 0.02, -0.7)));

    private static String recording(DoubleUnaryOperator volts, int samples) {
        StringBuilder text = new StringBuilder("time (s),voltage (V)\n");
        for (int i = 0; i < samples; i++) {
            double t = 0.02 * i / samples;
            text.append(String.format(Locale.ROOT, "%.9f,%.9f%n", t + 3, volts.applyAsDouble(t)));
        }
        return text.toString();
    }

    /** Recording that begins somewhere in the period. */
    private static double volts(double t) {
        return TRUTH.voltsAt(231, 2 * Math.PI * 50 * t + 0.8);
    }

    @Test
    void findsFundamentalSharesAndPhasesWhereverTheRecordingBegins() {
        RecordedLine read = RecordedLine.of(recording(RecordedLineTest::volts, 1000), 50);
        assertThat(read.rmsVolts()).isCloseTo(231, within(1e-4));
        assertThat(read.harmonics()).hasSize(2);
        for (int i = 0; i < 2; i++) {
            Line.Harmonic truth = TRUTH.harmonics().get(i);
            assertThat(read.harmonics().get(i).order()).isEqualTo(truth.order());
            assertThat(read.harmonics().get(i).share()).isCloseTo(truth.share(), within(1e-5));
            assertThat(read.harmonics().get(i).phaseRad()).isCloseTo(truth.phaseRad(), within(1e-4));
        }
    }

    @Test
    void saysWhatItLeavesOut() {
        RecordedLine read = RecordedLine.of(recording(t -> volts(t) + 2, 500), 50);
        assertThat(read.leftOut()).contains("2 harmonics").contains("direct voltage of 2 V");
        assertThat(read.harmonics()).hasSize(2);
    }

    @Test
    void refusesWhatIsNoPeriod() {
        assertThatThrownBy(() -> RecordedLine.of(recording(RecordedLineTest::volts, 20), 50))
                .hasMessageContaining("holds 20 samples");
        assertThatThrownBy(() -> RecordedLine.of(recording(RecordedLineTest::volts, 500), 20))
                .hasMessageContaining("one whole period");
        assertThatThrownBy(() -> RecordedLine.of("t,v\n0,1\nmuch,2\n", 50)).hasMessageContaining("row 3");
        assertThatThrownBy(() -> RecordedLine.of("t,v\n1,1\n0,2\n", 50)).hasMessageContaining("time does not grow");
        assertThatThrownBy(() -> RecordedLine.of("", 50)).hasMessageContaining("no sample");
    }

    /** Found by the fuzzer: a period is nothing beside such a time. */
    @Test
    void refusesTimesAndVoltsBeyondWhatIsRecorded() {
        assertThatThrownBy(() -> RecordedLine.of("0,1\n6e79,2\n", 50))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("row 2: read 6e79 seconds; expected -1000..1000");
        assertThatThrownBy(() -> RecordedLine.of("0,1\n0.001,NaN\n", 50))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("row 2: read NaN volts; expected -100000..100000");
    }

    @Test
    void aDesignReadsTheRecordingBesideIt(@TempDir Path folder) throws IOException {
        String design = Files.readString(Path.of("examples/drying-cabinet.yaml"))
                .replace("line: line-230v-50hz", "line: {recorded: shed.csv, frequency: 50 Hz}");
        Path file = folder.resolve("design.yaml");
        Files.writeString(file, design);
        assertThatThrownBy(() -> load(file))
                .isInstanceOf(InvalidInputException.class)
                .hasMessageContaining("shed.csv");
        Files.writeString(folder.resolve("shed.csv"), recording(RecordedLineTest::volts, 400), StandardCharsets.UTF_8);
        LoadedDesign loaded = load(file);
        assertThat(loaded.design().line().volts()).isCloseTo(231, within(0.01));
        assertThat(loaded.design().line().harmonics()).hasSize(2);
        assertThat(loaded.notes()).anyMatch(note -> note.contains("left out"));
        Files.writeString(folder.resolve("shed.csv"), recording(t -> 1.01 * volts(t), 400), StandardCharsets.UTF_8);
        assertThat(load(file).inputDigest()).isNotEqualTo(loaded.inputDigest());
    }

    private static LoadedDesign load(Path file) throws IOException {
        return DesignFiles.load(Source.of(file), List.of(), ProfileLibrary.shipped());
    }
}
