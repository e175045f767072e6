package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The fuzzer's saved corpora: every input that once mattered ends in a value or in a refusal. */
class FuzzCorpusTest {
    private static final Path CORPORA = Path.of("src/test/resources/clipramp/files/DesignFuzzTestInputs");

    static List<Arguments> corpora() throws IOException {
        List<Arguments> inputs = new ArrayList<>();
        for (FuzzTarget target : FuzzTarget.values()) {
            try (Stream<Path> files = Files.list(CORPORA.resolve(target.folder()))) {
                files.sorted().forEach(file -> inputs.add(Arguments.of(target, file)));
            }
        }
        return inputs;
    }

    @ParameterizedTest
    @MethodSource("corpora")
    void endsInAValueOrInARefusal(FuzzTarget target, Path file) throws IOException {
        target.read(Files.readAllBytes(file));
    }

    @Test
    void everyTargetHasACorpus() throws IOException {
        for (FuzzTarget target : FuzzTarget.values()) {
            try (Stream<Path> files = Files.list(CORPORA.resolve(target.folder()))) {
                assertThat(files).as(target.folder()).isNotEmpty();
            }
        }
    }
}
