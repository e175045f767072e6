package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;
import picocli.CommandLine.Model.OptionSpec;

/** The manual page, in the macros of man(7). */
class ManualTest {
    private static final Terminal TERMINAL = new Terminal(
            new ByteArrayInputStream(new byte[0]),
            new ByteArrayOutputStream(),
            new ByteArrayOutputStream(),
            Map.of(),
            false,
            StandardCharsets.UTF_8);

    @Test
    void everyCommandAndEveryOptionStandsInIt() {
        String page = CliRun.of("manual").out();
        Output nowhere = new Output(new ByteArrayOutputStream(), StandardCharsets.UTF_8, false);
        CommandLine root = CommandTree.of(new Session(TERMINAL, nowhere, nowhere, false, Optional.empty()));

        assertThat(root.getSubcommands()).hasSizeGreaterThan(10);
        root.getSubcommands().forEach((name, command) -> {
            assertThat(page).contains("\n.SS \"" + name);
            for (OptionSpec option : command.getCommandSpec().options()) {
                assertThat(page).contains("\n.B \"" + option.longestName().replace("-", "\\-"));
            }
        });
    }

    @Test
    void everyLineIsOneOfItsMacrosOrText() {
        assertThat(CliRun.of("manual").out().lines())
                .allMatch(line -> line.matches("\\.(TH|SH|SS|TP|PP|B)( \".*\")?|[^.'].*"))
                .noneMatch(line -> line.replaceAll("\\\\(-|e|&|\\(dq)", "").contains("\\"))
                .noneMatch(line -> line.contains("%%") || line.contains("%n"));
    }

    @Test
    void theSectionsStandInTheirUsualOrder() {
        // Order of sections: man-pages(7).
        assertThat(CliRun.of("manual").out().lines().filter(line -> line.startsWith(".SH")))
                .containsExactly(
                        ".SH \"NAME\"",
                        ".SH \"SYNOPSIS\"",
                        ".SH \"DESCRIPTION\"",
                        ".SH \"COMMANDS\"",
                        ".SH \"EXIT STATUS\"",
                        ".SH \"ENVIRONMENT\"",
                        ".SH \"SEE ALSO\"");
    }
}
