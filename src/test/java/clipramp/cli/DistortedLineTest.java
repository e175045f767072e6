package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Lines that are recorded, distorted to the limits of EN 50160 or off their frequency, in every command that solves. */
class DistortedLineTest {
    private static final String OWN_LINE = "line: line-230v-50hz\n";
    private static final double WATTS = 700;

    @TempDir
    static Path folder;

    private static String recorded;
    private static String fixed;

    @BeforeAll
    static void write() throws IOException {
        String heater = Files.readString(Path.of("examples/drying-cabinet.yaml"));
        assertThat(heater).contains(OWN_LINE);
        String onRecording =
                heater.replace(OWN_LINE, "line: {frequency: 50 Hz, low: -10 %, high: +10 %, recorded: cycle.csv}\n");
        Files.writeString(folder.resolve("cycle.csv"), cycle());
        recorded = Files.writeString(folder.resolve("heater.yaml"), onRecording).toString();
        // One setting in place of eleven: what is slow on such a line stays quick.
        String still = onRecording
                .replaceAll("(?m)^  pot: .*$", "  pot: none")
                .replaceAll("(?m)^  fixed: .*$", "  fixed: 16 kΩ ±5 % 0.25 W")
                .replaceAll("(?m)^wanted: .*$", "");
        fixed = Files.writeString(folder.resolve("still.yaml"), still).toString();
    }

    /** 226 V with 4 % of fifth, 3 % of third and 0.4 % of second: invented, and begun somewhere in the period. */
    private static String cycle() {
        StringBuilder text = new StringBuilder("time (s),voltage (V)\n");
        for (int i = 0; i < 500; i++) {
            double t = 0.02 * i / 500;
            double x = 2 * Math.PI * 50 * t + 0.9;
            double shape = Math.sin(x)
                    + 0.03 * Math.sin(3 * x + 2.9)
                    + 0.04 * Math.sin(5 * x + 0.3)
                    + 0.004 * Math.sin(2 * x + 0.7);
            text.append(String.format(Locale.ROOT, "%.6f,%.6f%n", t, Math.sqrt(2) * 226 * shape));
        }
        return text.toString();
    }

    static Stream<Arguments> commands() throws IOException {
        Path readings = Files.writeString(
                folder.resolve("readings.csv"),
                "ramp resistance (kohm) +-1 %,line voltage (V) +-1 %,firing angle (deg) +-1\n"
                        + "16,226,92\n20,226,112\n10,226,60\n");
        String pdf = folder.resolve("record.pdf").toString();
        return Stream.of(
                Arguments.of((Object) new String[] {"check", recorded}),
                Arguments.of((Object) new String[] {"map", recorded}),
                Arguments.of((Object) new String[] {"map", recorded, "--for-power=300W"}),
                Arguments.of((Object) new String[] {"trace", recorded, "--knob=50%"}),
                Arguments.of((Object) new String[] {"faults", recorded}),
                Arguments.of((Object) new String[] {"record", fixed, "--out=" + pdf}),
                Arguments.of((Object) new String[] {"fit", fixed, readings.toString()}),
                Arguments.of((Object) new String[] {"size", fixed, "--free=trigger.base-two"}),
                Arguments.of((Object) new String[] {"spread", fixed, "--samples=10", "--judged=0"}),
                Arguments.of((Object) new String[] {"parts", "--for=" + fixed}));
    }

    @ParameterizedTest
    @MethodSource("commands")
    void everyCommandAnswersOnARecordedLine(String[] command) {
        CliRun run = CliRun.of(command);
        assertThat(run.code()).as(run.err()).isIn(0, 1);
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).hasSizeGreaterThan(20).doesNotContain("NaN", "∞");
    }

    @ParameterizedTest
    @MethodSource("lines")
    void aLoadOnAShortedThyristorGetsTheTrueRmsOfTheLine(String line, double volts, double... shares)
            throws IOException {
        // Parseval: V_rms squared is V_1 squared (1 + sum of shares squared); triac, so no diode is in the path.
        CliRun run = CliRun.of("faults", "examples/shed-heater.yaml", "--json", "--with=line=" + line);
        JsonNode faults = new ObjectMapper().readTree(run.out()).get("faults");
        double watts = StreamSupport.stream(faults.spliterator(), false)
                .filter(fault -> fault.get("id").asText().equals("thyristor-shorted"))
                .findFirst()
                .orElseThrow()
                .get("knob")
                .get(1)
                .get("loadWatts")
                .asDouble();
        double sum = 1;
        for (double share : shares) {
            sum += share * share;
        }
        assertThat(watts).isCloseTo(400 * sum * volts * volts / (230 * 230), within(1e-6 * WATTS));
    }

    static Stream<Arguments> lines() {
        double[] limits = {0.0382, 0.0458, 0.0382, 0.0114, 0.0267, 0.0229};
        return Stream.of(
                Arguments.of("line-230v-50hz", 230, new double[0]),
                Arguments.of("line-230v-50hz-en50160", 230, limits),
                Arguments.of("line-230v-50hz-en50160-peaked", 230, limits),
                Arguments.of("{voltage: 240 V, frequency: 51 Hz}", 240, new double[0]),
                Arguments.of(
                        "{voltage: 230 V, frequency: 50 Hz, harmonics: [{order: 2, share: 3 %, phase: 40 deg}]}",
                        230, new double[] {0.03}));
    }

    @Test
    void aWaveWithMoreThanTwoZerosIsRefusedWithWhatToDo() {
        CliRun run = CliRun.of(
                "check",
                "examples/shed-heater.yaml",
                "--with=line.harmonics=[{order: 7, share: 60 %, phase: 180 deg}]");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("zeros a period", "Make the harmonics smaller");
    }

    @Test
    void aRecordingThatIsNotThereIsNamedWithWhereItIsLookedFor() {
        CliRun run = CliRun.of("map", recorded, "--with=line.recorded=gone.csv");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("gone.csv cannot be read");
    }
}
