package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A few of the draws that {@link AbsurdStudy} makes by the thousand. */
class AbsurdDrawsTest {
    private static final int DRAWS = 3;
    private static final long SEED = 20310131;

    @ParameterizedTest
    @ValueSource(strings = {"drying-cabinet", "upper-heaters", "seed-drawer", "store-fan", "tasting-lamps"})
    void legalButAbsurdDesignsAreAnsweredOrRefusedInWords(String name) throws IOException {
        Path example = Path.of("examples", name + ".yaml");
        AbsurdDraws draws = new AbsurdDraws(example, SEED);
        for (int i = 0; i < DRAWS; i++) {
            List<String> changes = draws.next();
            for (List<String> command : List.of(List.of("check", "--json"), List.of("trace", "--json"))) {
                List<String> words = AbsurdStudy.words(command, example, changes);
                assertThat(AbsurdStudy.fault(CliRun.of(words.toArray(String[]::new))))
                        .as("seed %d, %s", SEED, words)
                        .isEmpty();
            }
        }
    }
}
