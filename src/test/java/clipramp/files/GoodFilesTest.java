package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Everything that the program ships reads without a problem. */
class GoodFilesTest {
    static List<Path> examples() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("examples"))) {
            return files.filter(f -> f.toString().endsWith(".yaml")).sorted().toList();
        }
    }

    @ParameterizedTest
    @MethodSource("examples")
    void reads(Path file) throws IOException {
        LoadedDesign loaded = DesignFiles.load(Source.of(file), List.of(), ProfileLibrary.shipped());
        assertThat(loaded.design().title()).isNotEmpty();
        assertThat(loaded.inputDigest()).matches("[0-9a-f]{64}");
    }

    @Test
    void everyShippedProfileReadsInADesign() {
        ProfileLibrary library = ProfileLibrary.shipped();
        assertThat(library.all()).hasSizeGreaterThan(20);
        for (ProfileLibrary.Found found : library.all()) {
            Profile profile = Profile.read(found);
            assertThat(profile.figures()).as(found.id()).isNotEmpty();
        }
    }
}
