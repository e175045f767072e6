package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Design;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Laws of changing and writing design texts, on seeded cases. */
class EditPropertyTest {
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();
    private static final int CASES = 600;

    /** Keys with values that every example takes. */
    private static final List<List<String>> EDITS = List.of(
            List.of("title", "Another: \"title\" # with signs", "plain", "- dash", "{braces}", "'", "ends in colon:"),
            List.of("notes", "[not a list]", "a, b", "50 %", "none of it"),
            List.of("document.revision", "C", "D, E", "1"),
            List.of("line.low", "-12 %", "-5 %"),
            List.of("stage-diodes.drop", "1 V", "0.85 V"),
            List.of("clip.dropper", "12 kΩ ±5 % 10 W", "4k7"),
            List.of("clip.zener", "zener-15v", "{like: zener-15v, power: 5 W}"),
            List.of("clip.zener.power", "2 W", "0.5 W"),
            List.of("ramp.capacitor", "100 nF ±5 %", "2n2K"),
            List.of("ramp.pot.shunt", "1 MΩ", "470 kΩ ±5 %"),
            List.of("ramp.pot", "none"),
            List.of("gate.shunt", "none", "2k2"),
            List.of("gate.charge-time", "30 us", "10 us"),
            List.of("thyristor.device.turn-off", "40 us"),
            List.of("thyristor.case-to-ambient", "2 K/W"),
            List.of("surroundings.coldest", "-10 degC"),
            List.of("wanted.lowest", "3 % at 0 %", "1 %..4 % at 10 %"),
            List.of("derating.resistors", "60 %"),
            List.of("designators", "{ramp.capacitor: C9}"));

    @Test
    void aChangedTextSaysWhatWasPutInAndReadsAsTheOverrideWould() throws IOException {
        long seed = 4711;
        Random random = new Random(seed);
        List<DesignText> texts = new ArrayList<>();
        for (Path example : GoodFilesTest.examples()) {
            texts.add(DesignText.of(Source.of(example)));
        }
        texts.add(new DesignText("wax", BadInputTest.base(), List.of()));
        DesignText text = texts.get(0);
        for (int i = 0; i < CASES; i++) {
            if (i % 6 == 0) {
                text = texts.get(random.nextInt(texts.size()));
            }
            List<String> edit = EDITS.get(random.nextInt(EDITS.size()));
            String path = edit.get(0);
            String value = edit.get(1 + random.nextInt(edit.size() - 1));
            if (path.startsWith("ramp.pot.") && text.valueAt("ramp.pot").equals(java.util.Optional.of("none"))) {
                continue;
            }
            DesignText changed = text.withValue(path, value);
            String as = "seed " + seed + ", case " + i + ", " + path + "=" + value + "\n" + changed.text();
            assertThat(changed.valueAt(path)).as(as).contains(value);
            Design design = read(changed, as);
            if (!path.equals("title") && !path.equals("notes") && !value.startsWith("{")) {
                Design overridden = DesignFiles.load(new Source("o", text.text()), List.of(path + "=" + value), SHIPPED)
                        .design();
                assertThat(design).as(as).isEqualTo(overridden);
            }
            assertThat(changed.withValue(path, value).text()).as(as).isEqualTo(changed.text());
            assertThat(read(new DesignText("w", DesignWriter.write(design), List.of()), as))
                    .isEqualTo(design);
            text = changed;
        }
    }

    private static Design read(DesignText text, String as) {
        DesignText.Reading reading = text.read(SHIPPED);
        assertThat(reading).as(as).isInstanceOf(DesignText.Reading.Good.class);
        return ((DesignText.Reading.Good) reading).loaded().design();
    }
}
