package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** size from the command line: what it writes, what it refuses, what it tells the shell. */
class SizeCommandTest {
    private static final String REQUEST = """
            # My heater; this remark stays.
            clipramp: 1
            line: line-230v-50hz
            stage: bridge-dc
            load: {kind: resistor, rated: 700 W at 230 V}
            wanted: {lowest: 5 % at 0 %, highest: 90 % at 100 %}
            """;

    @Test
    void writesADesignThatCheckPassesAndKeepsTheRemarks(@TempDir Path folder) throws IOException {
        Path out = folder.resolve("sized.yaml");
        CliRun sized = CliRun.withInput(REQUEST, "size", "-", "--out=" + out);

        assertThat(sized.code()).as(sized.err()).isZero();
        assertThat(Files.readString(out, StandardCharsets.UTF_8)).startsWith("# My heater; this remark stays.");
        assertThat(CliRun.of("check", out.toString()).code()).isZero();
        assertThat(sized.out()).contains("Why", "ramp.fixed", "Next: clipramp check");

        CliRun again = CliRun.withInput(REQUEST, "size", "-", "--out=" + out);
        assertThat(again.code()).isEqualTo(4);
        assertThat(again.err()).contains("--replace");
    }

    @Test
    void tellsTheShellWhenNothingHolds() {
        CliRun run = CliRun.withInput(REQUEST.replace("bridge-dc", "half-wave"), "size", "-", "--json");

        assertThat(run.code()).isEqualTo(1);
        assertThat(run.out().replace(" ", "")).contains("\"outcome\":\"nothing\"", "wanted-highest", "\"nearest\"");
    }

    /** As with every other command, none takes a key out where it is no value of its own. */
    @Test
    void noneTakesAKeyOut() {
        String coupled = REQUEST + "gate: {coupling: direct, transformer: {ratio: 1}}\n";

        assertThat(CliRun.withInput(coupled, "size", "-").err()).contains("gate.transformer", "has no place");
        assertThat(CliRun.withInput(coupled, "size", "-", "--with=gate.transformer=none")
                        .err())
                .doesNotContain("has no place");
        assertThat(CliRun.withInput(REQUEST, "size", "-", "--with=ramp.capacitor=none", "--with=gate.transformer=none")
                        .code())
                .isZero();
        assertThat(CliRun.withInput(REQUEST, "size", "-", "--with=ramp.pot.shunt=none")
                        .out())
                .contains("shunt: none");
    }

    @Test
    void refusesWhatIsNoPartAndNoSeries() {
        assertThat(CliRun.withInput(REQUEST, "size", "-", "--free=rampp").err()).contains("rampp", "Nearest: ramp");
        assertThat(CliRun.withInput(REQUEST, "size", "-", "--free=capacitor").err())
                .contains("capacitor", "Nearest: ramp.capacitor");
        assertThat(CliRun.withInput(REQUEST, "size", "-", "--series=E13").err()).contains("E13", "Nearest: E3");
        assertThat(CliRun.withInput(REQUEST, "size", "-", "--shape=colour").code())
                .isEqualTo(2);
    }
}
