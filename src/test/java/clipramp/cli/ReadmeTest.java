package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.files.KeyTable;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** What the README shows of the program is what the program says. */
class ReadmeTest {
    private static final Path README = Path.of("README.md");
    private static final Path REGENERATED = Path.of("target", "README.md");
    private static final Pattern BLOCK =
            Pattern.compile("(?m)^<!-- begin: (?<what>.+?) -->\\n(?<old>(?s:.*?))^<!-- end -->$");

    @Test
    void everyMarkedBlockIsAsTheProgramWritesIt() throws IOException {
        String readme = Files.readString(README, StandardCharsets.UTF_8);
        String regenerated = BLOCK.matcher(readme)
                .replaceAll(block -> Matcher.quoteReplacement(
                        "<!-- begin: " + block.group(1) + " -->\n" + written(block.group(1)) + "<!-- end -->"));
        Files.createDirectories(REGENERATED.getParent());
        Files.writeString(REGENERATED, regenerated, StandardCharsets.UTF_8);

        assertThat(readme)
                .as(
                        "README.md has drifted; the regenerated text is in %s: copy it over and read the change",
                        REGENERATED)
                .isEqualTo(regenerated);
    }

    private static String written(String what) {
        if (what.equals("keys")) {
            return KeyTable.markdown();
        }
        if (what.equals("margins")) {
            return ReadmeTables.margins();
        }
        if (what.equals("examples")) {
            return ReadmeTables.examples();
        }
        if (what.startsWith("clipramp ")) {
            return commandOutput(what);
        }
        throw new IllegalArgumentException("no such block: " + what);
    }

    /** The command and its answer, as a fenced block; "| first N lines" after the command shortens it. */
    private static String commandOutput(String what) {
        Matcher shortened = Pattern.compile("(.+) \\| first (\\d+) lines").matcher(what);
        boolean cut = shortened.matches();
        String command = cut ? shortened.group(1) : what;
        CliRun run = CliRun.of(command.substring("clipramp ".length()).split(" "));
        List<String> lines = (run.out() + run.err()).lines().toList();
        int shown = cut ? Math.min(lines.size(), Integer.parseInt(shortened.group(2))) : lines.size();
        return "```\n$ " + command + "\n" + String.join("\n", lines.subList(0, shown))
                + (shown < lines.size() ? "\n..." : "") + "\n```\n";
    }
}
