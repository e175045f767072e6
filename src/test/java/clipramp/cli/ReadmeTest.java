package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.files.KeyTable;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** What the README shows of the program is what the program says. */
class ReadmeTest {
    private static final Path README = Path.of("README.md");
    private static final Path REGENERATED = Path.of("target", "README.md");
    private static final Pattern BLOCK =
            Pattern.compile("(?m)^<!-- begin: (?<what>.+?) -->\\n(?<old>(?s:.*?))^<!-- end -->$");

    /** "first 9 lines", "last 9 lines", "lines 3 to 9". */
    private static final Pattern SHOWN =
            Pattern.compile("(?:first|(?<end>last)|lines (?<from>\\d+) to) (?<to>\\d+)(?: lines)?");

    /** Answers so far, by command: one that is shown in two parts is asked once. */
    private final Map<String, List<String>> answers = new HashMap<>();

    @Test
    void everyMarkedBlockIsAsTheProgramWritesIt() throws IOException {
        String readme = Files.readString(README, StandardCharsets.UTF_8);
        Matcher block = BLOCK.matcher(readme);
        StringBuilder written = new StringBuilder();
        while (block.find()) {
            String what = block.group("what");
            block.appendReplacement(
                    written,
                    Matcher.quoteReplacement("<!-- begin: " + what + " -->\n" + written(what) + "<!-- end -->"));
        }
        String regenerated = block.appendTail(written).toString();
        Files.createDirectories(REGENERATED.getParent());
        Files.writeString(REGENERATED, regenerated, StandardCharsets.UTF_8);

        assertThat(readme)
                .as(
                        "README.md has drifted; the regenerated text is in %s: copy it over and read the change",
                        REGENERATED)
                .isEqualTo(regenerated);
    }

    private String written(String what) throws IOException {
        if (what.equals("keys")) {
            return KeyTable.markdown();
        }
        if (what.equals("margins")) {
            return ReadmeTables.margins();
        }
        if (what.equals("examples")) {
            return ReadmeTables.examples();
        }
        if (what.startsWith("file ")) {
            return "```yaml\n" + Files.readString(Path.of(what.substring("file ".length())), StandardCharsets.UTF_8)
                    + "```\n";
        }
        if (what.startsWith("clipramp ")) {
            return commandOutput(what);
        }
        throw new IllegalArgumentException("no such block: " + what);
    }

    private static List<String> answer(String... arguments) throws IOException {
        for (String argument : arguments) {
            if (argument.startsWith("--out=")) {
                Files.deleteIfExists(Path.of(argument.substring("--out=".length())));
            }
        }
        CliRun run = CliRun.of(arguments);
        return (run.out() + run.err()).lines().toList();
    }

    /** The command and its answer, as a fenced block; which lines of it stands behind a bar. */
    private String commandOutput(String what) throws IOException {
        String[] parts = what.split(" \\| ");
        if (!answers.containsKey(parts[0])) {
            answers.put(
                    parts[0], answer(parts[0].substring("clipramp ".length()).split(" ")));
        }
        List<String> lines = answers.get(parts[0]);
        int first = 0;
        int last = lines.size();
        if (parts.length > 1) {
            Matcher shown = SHOWN.matcher(parts[1]);
            assertThat(shown.matches()).as(what).isTrue();
            first = shown.group("from") == null ? 0 : Integer.parseInt(shown.group("from")) - 1;
            last = Math.min(last, Integer.parseInt(shown.group("to")));
            if (shown.group("end") != null) {
                first = Math.max(0, lines.size() - last);
                last = lines.size();
            }
        }
        String block = "```\n$ " + parts[0] + "\n" + (first > 0 ? "...\n" : "")
                + String.join("\n", lines.subList(first, last))
                + (last < lines.size() ? "\n..." : "") + "\n```\n";
        // A reader's own files lie where he works.
        return block.replace("target/", "");
    }
}
