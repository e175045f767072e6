package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.files.Example;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The frame around every command: finding it, refusing kindly, exit codes, streams. */
class CliTest {
    private static final String DESIGN = "examples/drying-cabinet.yaml";

    @Test
    void withoutArgumentsItNamesThreeNextSteps() {
        CliRun run = CliRun.of();

        assertThat(run.code()).isZero();
        assertThat(run.out().lines().filter(line -> line.startsWith("  clipramp ")))
                .hasSize(3);
        assertThat(run.err()).isEmpty();
    }

    @Test
    void theOverviewNamesEveryCommandThatThereIs() {
        CliRun run = CliRun.of("--help");

        assertThat(run.out()).contains("check", "map", "trace", "record", "new", "parts", "explain");
        assertThat(run.out()).as("no window was handed in").doesNotContain("desk");
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "map", "trace", "record", "new", "parts", "explain", "completion", "manual"})
    void everyCommandHelpsAndNamesItsVersion(String command) {
        CliRun help = CliRun.of(command, "--help");
        assertThat(help.code()).isZero();
        assertThat(help.out()).startsWith("Usage: clipramp " + command).contains("--ascii", "--help", "--version");
        assertThat(help.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(100));
        assertThat(CliRun.of("help", command).out()).isEqualTo(help.out());

        CliRun version = CliRun.of(command, "--version");
        assertThat(version.code()).isZero();
        assertThat(version.out()).startsWith("clipramp ");
    }

    @Test
    void everyExampleIsNamedByHelpAndCanBeStartedFrom(@TempDir Path folder) throws IOException {
        String help = CliRun.of("new", "--help").out();
        try (Stream<Path> files = Files.list(Path.of("examples"))) {
            List<String> ids = files.map(f -> String.valueOf(f.getFileName()))
                    .filter(name -> name.endsWith(".yaml"))
                    .map(name -> name.replace(".yaml", ""))
                    .toList();
            assertThat(Example.all()).extracting(Example::id).containsExactlyInAnyOrderElementsOf(ids);
        }
        for (Example example : Example.all()) {
            assertThat(help).contains(example.id());
            Path out = folder.resolve(example.id() + ".yaml");
            assertThat(CliRun.of("new", "--from=" + example.id(), "--out=" + out)
                            .code())
                    .isZero();
            assertThat(Files.readString(out, StandardCharsets.UTF_8)).isEqualTo(example.text());
            assertThat(CliRun.of("check", out.toString()).code()).isIn(0, 1);
        }
    }

    @Test
    void aFileThatIsThereIsOnlyReplacedOnRequest(@TempDir Path folder) throws IOException {
        Path out = Files.writeString(folder.resolve("mine.yaml"), "mine");

        CliRun refused = CliRun.of("new", "--out=" + out);
        assertThat(refused.code()).isEqualTo(4);
        assertThat(refused.err()).contains("exists already", "--replace");
        assertThat(Files.readString(out)).isEqualTo("mine");
        assertThat(CliRun.of("new", "--out=" + out, "--replace").code()).isZero();
        assertThat(Files.readString(out)).startsWith("# ");
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "map", "trace", "record", "new", "parts", "explain", "completion", "manual"})
    void everyOptionHasALongNameOnly(String command) {
        assertThat(CliRun.of(command, "--help").out().lines().filter(line -> line.matches(" +-[a-zA-Z]\\b.*")))
                .isEmpty();
    }

    @Test
    void aMistypedCommandIsToldTheNearest() {
        CliRun run = CliRun.of("chekc", "a.yaml");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("\"chekc\" is no command", "Nearest: check");
        assertThat(run.out()).isEmpty();
    }

    @Test
    void aMistypedOptionIsToldTheNearest() {
        CliRun run = CliRun.of("check", DESIGN, "--jsno");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--jsno", "Nearest: --json");
    }

    @Test
    void aRefusalIsJsonWhereJsonWasAskedFor() throws IOException {
        CliRun run = CliRun.of("check", DESIGN, "--json", "--line=10 mohm");

        assertThat(run.code()).isEqualTo(2);
        JsonNode problem =
                new ObjectMapper().readTree(run.out()).get("problems").get(0);
        assertThat(problem.fieldNames())
                .toIterable()
                .containsExactly("file", "line", "column", "path", "read", "expected", "nearest", "message");
        assertThat(problem.get("file").textValue()).isEqualTo("--line");
        assertThat(problem.get("read").textValue()).isEqualTo("10 mohm");
        assertThat(problem.get("line").isNull()).isTrue();
    }

    @Test
    void allProblemsOfAFileAreToldAtOnceWithTheirPlaces() throws IOException {
        String broken = "clipramp: 1\nstage: bridge-cd\nline: {voltage: 230 V, frequency: 50 W}\nlaod: 3\n";
        CliRun run = CliRun.withInput(broken, "check", "-", "--json");

        assertThat(run.code()).isEqualTo(2);
        JsonNode problems = new ObjectMapper().readTree(run.out()).get("problems");
        assertThat(problems.findValuesAsText("path")).contains("stage", "line.frequency", "laod");
        assertThat(problems.findValuesAsText("nearest")).contains("bridge-dc", "load");
        assertThat(run.err()).contains("-:2:8 stage", "-:3:").doesNotContain("Exception", "\tat ");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "check",
                "check a b",
                "check " + DESIGN + " --with",
                "check " + DESIGN + " --with=",
                "check " + DESIGN + " --with==",
                "check " + DESIGN + " --with=clip",
                "check " + DESIGN + " --with=clip=3",
                "check " + DESIGN + " --with=line.harmonics[99999999999].share=1",
                "check " + DESIGN + " --with=ramp.capacitor=1e400",
                "check " + DESIGN + " --with=trigger.device=none",
                "check " + DESIGN + " --line=0V",
                "check " + DESIGN + " --line=NaN",
                "check " + DESIGN + " --line=1e999V",
                "check " + DESIGN + " --line=",
                "check " + DESIGN + " --temperature=-500degC",
                "check " + DESIGN + " --temperature=20degF",
                "check " + DESIGN + " --profiles=mine",
                "check " + DESIGN + " --strict=maybe",
                "check " + DESIGN + " --line=230V --line=207V",
                "map " + DESIGN + " --positions=1",
                "map " + DESIGN + " --positions=2.5",
                "map " + DESIGN + " --positions=1000000000",
                "map " + DESIGN + " --positions=-3",
                "map " + DESIGN + " --for-angle=190",
                "map " + DESIGN + " --for-angle=90 --for-power=300W",
                "map " + DESIGN + " --for-power=5kW",
                "map " + DESIGN + " --for-power=120%",
                "map " + DESIGN + " --for-volts=1kV",
                "map " + DESIGN + " --csv --plot=out",
                "map " + DESIGN + " --plot=out.gif",
                "trace " + DESIGN + " --knob=50",
                "trace " + DESIGN + " --knob=-1%",
                "trace " + DESIGN + " --knob=1% --angle=90",
                "trace " + DESIGN + " --resistance=0",
                "trace " + DESIGN + " --resistance=50V",
                "trace " + DESIGN + " --samples=1",
                "record " + DESIGN,
                "record " + DESIGN + " --out=x.pdf --paper=a3",
                "new",
                "new --out=x.yaml --from=nothing",
                "parts nosuchpart",
                "parts ../../etc/passwd",
                "explain",
                "explain no.such.key.at.all",
                "desk",
                "@" + DESIGN,
                "-x",
                "check -- -x -y"
            })
    void whatCannotBeUsedIsRefusedInWords(String line) {
        CliRun run = CliRun.of(line.split(" "));

        assertThat(run.code()).as(run.err()).isEqualTo(2);
        assertThat(run.err()).isNotBlank().doesNotContain("Exception", "\tat ", "null", "Optional");
        assertThat(run.out()).isEmpty();
    }

    @Test
    void aFileWithoutAFiringCircuitIsLedToSize() {
        String request = "clipramp: 1\nwanted: {lowest: 5 % at 0 %, highest: 95 % at 100 %}\n";
        assertThat(CliRun.withInput(request, "check", "-").err())
                .contains("line: is missing", "clipramp size - makes a design from line, stage, load and wanted");
        assertThat(CliRun.withInput(request, "size", "-").err()).contains("line: is missing");
    }

    @Test
    void aFileNameInPlaceOfAnOptionIsProposedAsOne() {
        assertThat(CliRun.of("new", "target/x.yaml").err())
                .contains("--out is missing. Is it --out=target/x.yaml? See clipramp new --help.");
        assertThat(CliRun.of("record", DESIGN, "my.pdf").err()).contains("Is it --out=my.pdf?");
        assertThat(CliRun.of("record", DESIGN).err()).doesNotContain("Is it");
    }

    @Test
    void signsThatTheLocaleSwallowedAreExplained() {
        assertThat(CliRun.of("map", DESIGN, "--with=clip.dropper=10 k\uFFFD\uFFFD")
                        .err())
                .contains("Write ohm, u, deg and +- instead");
        assertThat(CliRun.of("map", DESIGN, "--with=clip.dropper=10 q").err()).doesNotContain("locale");
    }

    @Test
    void twoFormsCannotBothGoToStandardOutput() {
        CliRun run = CliRun.of("map", DESIGN, "--json", "--csv");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--json and --csv cannot both");
    }

    @Test
    void argumentsOfRandomSignsNeverReachOurFault() {
        long seed = 20310131;
        Random random = new Random(seed);
        String[] words = {
            "check",
            "map",
            "trace",
            "explain",
            "parts",
            DESIGN,
            "-",
            "--with",
            "--with=",
            "=",
            "--line=",
            "--knob=",
            "--json",
            "--csv",
            "230V",
            "\u0000",
            "Ω",
            "%",
            "--for-power=",
            "",
            " ",
            "--",
            "--positions=",
            "[0]",
            "\uFFFD",
            "a:b"
        };
        for (int i = 0; i < 300; i++) {
            String[] arguments = new String[1 + random.nextInt(4)];
            for (int j = 0; j < arguments.length; j++) {
                arguments[j] = words[random.nextInt(words.length)]
                        + (random.nextInt(3) == 0 ? words[random.nextInt(words.length)] : "");
            }
            CliRun run = CliRun.of(arguments);
            assertThat(run.code())
                    .as("seed %d, arguments %s: %s", seed, List.of(arguments), run.err())
                    .isIn(0, 1, 2, 4);
        }
    }

    @Test
    void aFileThatIsNotThereIsNamedWithThoseThatAre() {
        CliRun run = CliRun.of("check", "examples/drying.yaml");

        assertThat(run.code()).isEqualTo(4);
        assertThat(run.err())
                .contains("examples/drying.yaml cannot be read", "no such file", "cabinet-gone-wrong.yaml");
    }

    @Test
    void aFolderIsNoDesign() {
        CliRun run = CliRun.of("check", "examples");

        assertThat(run.code()).isEqualTo(4);
        assertThat(run.err()).contains("it is a folder");
    }

    @Test
    void aFolderThatIsNotThereIsNamed(@TempDir Path folder) {
        Path out = folder.resolve("missing").resolve("x.yaml");
        CliRun run = CliRun.of("new", "--out=" + out);

        assertThat(run.code()).isEqualTo(4);
        assertThat(run.err()).contains("there is no folder", "missing");
    }

    @Test
    void aClosedPipeIsQuiet() {
        CliRun run = intoFailingStream("Broken pipe", "parts");

        assertThat(run.code()).isZero();
        assertThat(run.err()).isEmpty();
    }

    @Test
    void aFullDiskIsNot() {
        CliRun run = intoFailingStream("No space left on device", "parts");

        assertThat(run.code()).isEqualTo(4);
        assertThat(run.err()).contains("No space left on device");
    }

    private static CliRun intoFailingStream(String reason, String... arguments) {
        OutputStream failing = new OutputStream() {
            @Override
            public void write(int b) throws IOException {
                throw new IOException(reason);
            }
        };
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Cli.run(
                arguments,
                new Terminal(
                        new ByteArrayInputStream(new byte[0]), failing, err, Map.of(), false, StandardCharsets.UTF_8),
                Optional.empty());
        return new CliRun(code, "", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aTerminalThatLacksTheSignsGetsAscii() {
        assertThat(onTerminal(StandardCharsets.ISO_8859_1, Map.of("TERM", "xterm"), "explain", "clip.dropper"))
                .contains("Mohm")
                .matches("[\\x00-\\x7F]*");
        assertThat(onTerminal(StandardCharsets.UTF_8, Map.of("TERM", "xterm"), "explain", "clip.dropper"))
                .contains("MΩ");
    }

    @Test
    void aPipeGetsUtf8WhateverTheLocaleUnlessAsciiIsAskedFor() {
        assertThat(CliRun.of("explain", "clip.dropper").out()).contains("MΩ");
        assertThat(CliRun.of("explain", "clip.dropper", "--ascii").out()).contains("Mohm");
        assertThat(CliRun.of("--ascii", "explain", "clip.dropper").out()).contains("Mohm");
    }

    @Test
    void boldTypeShowsOnATerminalOnlyAndNeverWithNoColor() {
        assertThat(onTerminal(StandardCharsets.UTF_8, Map.of("TERM", "xterm"), "parts", "2n2646"))
                .contains("\u001B[1m");
        assertThat(onTerminal(StandardCharsets.UTF_8, Map.of("TERM", "xterm", "NO_COLOR", "1"), "parts", "2n2646"))
                .doesNotContain("\u001B");
        assertThat(CliRun.of("parts", "2n2646").out()).doesNotContain("\u001B");
    }

    private static String onTerminal(Charset charset, Map<String, String> environment, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(
                new ByteArrayInputStream(new byte[0]), out, new ByteArrayOutputStream(), environment, true, charset);
        Cli.run(arguments, terminal, Optional.empty());
        return out.toString(charset);
    }

    @Test
    void theWindowIsOpenedByWhoeverStartedTheProgram() {
        String[] opened = {""};
        Terminal terminal = new Terminal(
                new ByteArrayInputStream(new byte[0]),
                new ByteArrayOutputStream(),
                new ByteArrayOutputStream(),
                Map.of(),
                false,
                StandardCharsets.UTF_8);
        int code = Cli.run(new String[] {"desk", "a.yaml"}, terminal, Optional.of(file -> {
            opened[0] = file.orElse("");
            return 0;
        }));

        assertThat(code).isZero();
        assertThat(opened[0]).isEqualTo("a.yaml");
    }
}
