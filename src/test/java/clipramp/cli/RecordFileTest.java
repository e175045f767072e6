package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.net.URI;
import java.net.URLClassLoader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The record on disk: there whole, or not there. */
class RecordFileTest {
    private static final String DESIGN = "examples/drying-cabinet.yaml";
    private static final int KILLS = 10;

    @Test
    void checkPrintsTheJudgementAndWritesTheRecord(@TempDir Path folder) throws IOException {
        Path pdf = folder.resolve("record.pdf");
        CliRun run = CliRun.of("check", DESIGN, "--record=" + pdf);

        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("Verdict: holds", "Record: " + pdf);
        assertThat(Files.readAllBytes(pdf)).startsWith('%', 'P', 'D', 'F', '-');
        Path alone = folder.resolve("alone.pdf");
        assertThat(CliRun.of("record", DESIGN, "--out=" + alone).code()).isZero();
        assertThat(alone).hasSameBinaryContentAs(pdf);
    }

    @Test
    void checkDrawsTheLineCurrent(@TempDir Path folder) throws IOException {
        Path svg = folder.resolve("line.svg");
        CliRun run = CliRun.of("check", DESIGN, "--plot=" + svg);

        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("Plot: " + svg);
        assertThat(svg).content().contains("Line current by order", "class A limit", "order 15 binds first");
        assertThat(CliRun.of("check", DESIGN, "--plot=line.gif").code()).isEqualTo(2);
    }

    @Test
    void aRecordIsNeverWrittenOverADesign(@TempDir Path folder) throws IOException {
        Path design = Files.copy(Path.of(DESIGN), folder.resolve("mine.yaml"));
        CliRun run = CliRun.of("record", design.toString(), "--out=" + design);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("mine.yaml", ".pdf", "Nothing was written");
        assertThat(design).hasSameTextualContentAs(Path.of(DESIGN));
    }

    @Test
    void aFailingDesignGetsItsRecordToo(@TempDir Path folder) {
        Path pdf = folder.resolve("record.pdf");
        CliRun run = CliRun.of("record", "examples/cabinet-gone-wrong.yaml", "--out=" + pdf);

        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("This design fails");
        assertThat(pdf).isNotEmptyFile();
    }

    @Test
    void anOldRecordSurvivesANewOneThatCannotBeMade(@TempDir Path folder) throws IOException {
        Path pdf = Files.writeString(folder.resolve("record.pdf"), "old");

        assertThat(CliRun.of("record", DESIGN, "--with=load.rated=-3 W", "--out=" + pdf)
                        .code())
                .isEqualTo(2);
        assertThat(pdf).hasContent("old");
        try (Stream<Path> files = Files.list(folder)) {
            assertThat(files).containsExactly(pdf);
        }
    }

    /**
     * Kills a child at random instants while it writes two records in turn, slowly and without pause, through what every
     * command writes files with; the file must be whole each time.
     */
    @Test
    void aKillWhileWritingLeavesAWholeRecord(@TempDir Path folder) throws IOException, InterruptedException {
        Path a4 = folder.resolve("a4.pdf");
        Path letter = folder.resolve("letter.pdf");
        CliRun.of("record", DESIGN, "--out=" + a4, "--paper=a4");
        CliRun.of("record", DESIGN, "--out=" + letter, "--paper=letter");
        List<String> whole = List.of(text(a4), text(letter));
        assertThat(whole.get(0)).isNotEqualTo(whole.get(1));

        long seed = 14;
        Random random = new Random(seed);
        Path pdf = Files.copy(a4, folder.resolve("record.pdf"));
        int inTheMiddle = 0;
        for (int kill = 0; kill < KILLS; kill++) {
            Process writer = startWriting(a4, letter, pdf, folder.resolve("started" + kill));
            Thread.sleep(random.nextInt(100));
            writer.destroyForcibly().waitFor();
            assertThat(whole).as("kill %d, seed %d", kill, seed).contains(text(pdf));
            try (Stream<Path> files = Files.list(folder)) {
                inTheMiddle =
                        (int) files.filter(f -> f.toString().contains(".part")).count();
            }
        }
        assertThat(inTheMiddle)
                .as("kills that fell into a write, or they would prove nothing")
                .isPositive();
    }

    private static String text(Path file) throws IOException {
        return new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1);
    }

    /** A child that has written at least one record and goes on writing. */
    private static Process startWriting(Path a4, Path letter, Path pdf, Path started)
            throws IOException, InterruptedException {
        Process child = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-XX:TieredStopAtLevel=1",
                        "-cp",
                        classPath(),
                        WritesRecords.class.getName(),
                        a4.toString(),
                        letter.toString(),
                        pdf.toString(),
                        started.toString())
                .redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start();
        for (int i = 0; i < 3000 && !Files.exists(started); i++) {
            assertThat(child.isAlive())
                    .as("the child writes until it is killed")
                    .isTrue();
            child.waitFor(10, TimeUnit.MILLISECONDS);
        }
        assertThat(started).exists();
        return child;
    }

    /** What these tests themselves run from. */
    private static String classPath() {
        return RecordFileTest.class.getClassLoader() instanceof URLClassLoader own
                ? Arrays.stream(own.getURLs())
                        .map(url -> Path.of(URI.create(url.toString())).toString())
                        .collect(Collectors.joining(File.pathSeparator))
                : System.getProperty("java.class.path");
    }

    /** The child's program: arguments are the two contents, the file to write and the file that tells of the first time. */
    static final class WritesRecords {
        private static final int PIECE = 4096;

        private WritesRecords() {}

        public static void main(String[] arguments) throws IOException {
            List<byte[]> contents =
                    List.of(Files.readAllBytes(Path.of(arguments[1])), Files.readAllBytes(Path.of(arguments[0])));
            Path started = Path.of(arguments[3]);
            for (int i = 0; ; i++) {
                byte[] content = contents.get(i % 2);
                Outputs.write(
                        arguments[2],
                        out -> {
                            for (int at = 0; at < content.length; at += PIECE) {
                                out.write(content, at, Math.min(PIECE, content.length - at));
                                out.flush();
                            }
                        },
                        true);
                if (i == 0) {
                    Files.createFile(started);
                }
            }
        }
    }
}
