package clipramp;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The same bytes wherever the user lives: a process of its own, because a locale belongs to the whole process. */
class OtherLocalesTest {
    @TempDir
    private Path folder;

    @Test
    void aRecordMadeWhereDigitsAreArabicIsTheSameAndCanBeRead() throws Exception {
        Path plain = record("plain.pdf", "-Duser.language=en");
        Path arabic = record("arabic.pdf", "-Duser.language=ar", "-Duser.extensions=u-nu-arab");

        assertThat(Files.readAllBytes(arabic)).isEqualTo(Files.readAllBytes(plain));
        try (PDDocument pdf = Loader.loadPDF(arabic.toFile())) {
            assertThat(pdf.getNumberOfPages()).isGreaterThan(2);
        }
    }

    private Path record(String name, String... options) throws IOException, InterruptedException {
        Path pdf = folder.resolve(name);
        List<String> command = new ArrayList<>(
                List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-XX:TieredStopAtLevel=1"));
        command.addAll(List.of(options));
        command.addAll(List.of(
                "-cp", OwnClassPath.text(), "clipramp.Main", "record", "examples/tray-lamp.yaml", "--out=" + pdf));
        Process process = new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(folder.resolve("said").toFile())
                .start();
        assertThat(process.waitFor(120, TimeUnit.SECONDS)).isTrue();
        assertThat(process.exitValue()).isZero();
        return pdf;
    }
}
