package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The fuzzer's saved corpus: every input that once mattered ends in a design or in problems. */
class FuzzCorpusTest {
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();

    static List<Path> corpus() throws IOException {
        Path folder = Path.of("src/test/resources/clipramp/files/DesignFuzzTestInputs/readsAnyBytes");
        try (Stream<Path> files = Files.list(folder)) {
            return files.sorted().toList();
        }
    }

    @ParameterizedTest
    @MethodSource("corpus")
    void endsInADesignOrInProblems(Path file) throws IOException {
        readEveryWay(Files.readAllBytes(file));
    }

    /** As a design, as a text to change, and as an override. */
    static void readEveryWay(byte[] bytes) {
        orProblems(() -> DesignFiles.load(source(bytes), List.of(), SHIPPED));
        orProblems(() -> DesignText.of(source(bytes))
                .withValue("ramp.pot.shunt", "1 MΩ")
                .withValue("title", "x")
                .without("gate.shunt"));
        String override = new String(bytes, StandardCharsets.UTF_8);
        orProblems(() -> DesignFiles.load(new Source("wax.yaml", BadInputTest.base()), List.of(override), SHIPPED));
    }

    private static Source source(byte[] bytes) {
        try {
            return Source.of("fuzz.yaml", new ByteArrayInputStream(bytes));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void orProblems(Runnable reading) {
        try {
            reading.run();
        } catch (InvalidInputException e) {
            assertThat(e.problems()).isNotEmpty();
        }
    }
}
