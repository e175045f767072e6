package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The shell's completion, asked as the shell asks it; bash(1), Programmable Completion, names the variables. */
class CompletionTest {
    private static final Path BASH = Path.of("/bin/bash");

    @TempDir
    private Path folder;

    @ParameterizedTest
    @CsvSource({
        "clipramp ma, map manual",
        "clipramp map --for, --for-angle= --for-power= --for-volts=",
        "clipramp explain gate-peak-c, gate-peak-current",
        "clipramp parts 2n264, 2n2646 2n2647",
        "clipramp new --from=tasting, tasting-lamps",
        "clipramp check x.yaml --with=ramp.c, ramp.capacitor=",
        "clipramp record --paper=, a4 letter",
        "clipramp completion z, zsh",
        "clipramp check examples/seed, examples/seed-drawer.yaml",
        "clipramp record --out=examples/tasting, examples/tasting-lamps.yaml"
    })
    void bashOffersWhatFits(String typed, String offered) throws IOException, InterruptedException {
        assumeTrue(Files.isExecutable(BASH), "no bash here");

        assertThat(asked(typed)).containsExactly(offered.split(" "));
    }

    @Test
    void bashOffersEveryCommandFirst() throws IOException, InterruptedException {
        assumeTrue(Files.isExecutable(BASH), "no bash here");

        assertThat(asked("clipramp ")).contains("check", "map", "spread", "explain", "--help");
    }

    @Test
    void anotherShellIsRefused() {
        CliRun run = CliRun.of("completion", "fish");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("\"fish\" is not what SHELL takes");
    }

    private List<String> asked(String typed) throws IOException, InterruptedException {
        Path script = folder.resolve("ask");
        // bash breaks words at blanks and at =, which stands as a word of its own.
        String words = typed.replace("=", " = ") + (typed.endsWith(" ") || typed.endsWith("=") ? "''" : "");
        Files.writeString(
                script,
                CliRun.of("completion", "bash").out() + "COMP_WORDS=(" + words
                        + ")\nCOMP_CWORD=$((${#COMP_WORDS[@]}-1))\n" + "COMP_LINE='" + typed
                        + "'\nCOMP_POINT=${#COMP_LINE}\n_clipramp\nprintf '%s\\n' \"${COMPREPLY[@]}\"\n",
                StandardCharsets.UTF_8);
        Process bash = new ProcessBuilder(BASH.toString(), "--norc", script.toString())
                .redirectErrorStream(true)
                .start();
        String said = new String(bash.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(bash.waitFor(20, TimeUnit.SECONDS)).isTrue();
        return said.lines().toList();
    }
}
