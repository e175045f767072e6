package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import clipramp.units.QuantityReader;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

class KeyCatalogueTest {
    private static final KeyCatalogue CATALOGUE = KeyCatalogue.standard();

    /** Defaults that stand for another key's value. */
    private static final Set<String> BORROWED =
            Set.of("stage-diodes.drop", "load.freewheel.drop", "unijunction.saturation.at");

    @Test
    void everyKeySaysWhatItMeans() {
        assertThat(CATALOGUE.all()).hasSizeGreaterThan(150).allSatisfy(key -> {
            assertThat(key.meaning()).as(key.path()).endsWith(".");
            assertThat(key.range()).as(key.path()).isNotBlank();
        });
    }

    @Test
    void everyDefaultLiesInItsOwnWindow() {
        for (Key key : CATALOGUE.all()) {
            boolean quantity = Set.of(Key.Kind.QUANTITY, Key.Kind.PART, Key.Kind.CHARACTERISTIC, Key.Kind.WHOLE)
                    .contains(key.kind());
            if (key.need() == Key.Need.DEFAULTED && quantity && !BORROWED.contains(key.path())) {
                assertThatCode(() -> QuantityReader.read(key.standard(), key.expected()))
                        .as(key.path())
                        .doesNotThrowAnyException();
            }
            assertThat(key.need() == Key.Need.DEFAULTED)
                    .isEqualTo(!key.standard().isEmpty());
        }
    }

    @Test
    void keysAreFoundThroughDevicesIndicesAndByTheirLastPart() {
        assertThat(CATALOGUE.meant("clip.dropper")).extracting(Key::path).containsExactly("clip.dropper");
        assertThat(CATALOGUE.meant("trigger.device.standoff"))
                .extracting(Key::path)
                .containsExactly("unijunction.standoff");
        assertThat(CATALOGUE.meant("thyristor.device.latching"))
                .extracting(Key::path)
                .containsExactly("scr.latching", "triac.latching");
        assertThat(CATALOGUE.meant("line.harmonics[0].share"))
                .extracting(Key::path)
                .containsExactly("line.harmonics.share");
        assertThat(CATALOGUE.meant("standoff")).extracting(Key::path).containsExactly("unijunction.standoff");
        assertThat(CATALOGUE.meant("nonsense")).isEmpty();
    }

    @Test
    void theTableHoldsEveryKeyOnce() {
        List<String> rows = KeyTable.markdown().lines().skip(2).toList();
        assertThat(rows).hasSameSizeAs(CATALOGUE.all()).allMatch(r -> r.startsWith("| `") && r.endsWith(" |"));
    }

    @Test
    void theReadmesTableIsTheCataloguesOwn() throws IOException {
        Path readme = Path.of("README.md");
        String text = Files.exists(readme) ? Files.readString(readme) : "";
        int from = text.indexOf("<!-- keys -->");
        int to = text.indexOf("<!-- /keys -->");
        if (from >= 0 && to > from) {
            assertThat(text.substring(from + "<!-- keys -->".length(), to).strip())
                    .isEqualTo(KeyTable.markdown().strip());
        }
    }
}
