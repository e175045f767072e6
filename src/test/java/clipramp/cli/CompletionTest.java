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

/**
 * The shell's completion, asked as the shell asks it; bash(1), Programmable Completion, and zshcompwid(1), Completion
 * Special Parameters, name the variables.
 */
class CompletionTest {
    private static final Path BASH = Path.of("/bin/bash");
    private static final Path ZSH = Path.of("/usr/bin/zsh");

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

    /** zsh itself keeps what the word so far begins; here its builtins only say what they were given. */
    @ParameterizedTest
    @CsvSource({
        "clipramp, ma, map",
        "clipramp map, --for, --for-angle=",
        "clipramp new, --from=ta, tasting-lamps",
        "clipramp check, exa, files",
        "clipramp record x.yaml, --out=m, files"
    })
    void zshIsOfferedTheSame(String before, String word, String offered) throws IOException, InterruptedException {
        assumeTrue(Files.isExecutable(ZSH), "no zsh here");
        String builtins =
                "compdef() { }; compset() { }; _files() { print files }; compadd() { print -r -- ${@[$#]} }\n";
        String typed = "words=(" + before + " " + word + "); CURRENT=$#words; PREFIX=" + word + "; _clipramp\n";
        Path script = folder.resolve("ask");
        Files.writeString(script, builtins + CliRun.of("completion", "zsh").out() + typed, StandardCharsets.UTF_8);

        assertThat(said(ZSH.toString(), "-f", script.toString())).contains(offered);
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
        return said(BASH.toString(), "--norc", script.toString());
    }

    private static List<String> said(String... command) throws IOException, InterruptedException {
        Process shell = new ProcessBuilder(command).redirectErrorStream(true).start();
        String said = new String(shell.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(shell.waitFor(20, TimeUnit.SECONDS)).isTrue();
        return said.lines().toList();
    }
}
