package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import clipramp.circuit.Design;
import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class WritingTest {
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();

    static List<Path> examples() throws IOException {
        return GoodFilesTest.examples();
    }

    private static Design load(String text, String... overrides) {
        return DesignFiles.load(new Source("t.yaml", text), List.of(overrides), SHIPPED)
                .design();
    }

    private static DesignText example(String name) throws IOException {
        return DesignText.of(Source.of(Path.of("examples", name + ".yaml")));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void whatIsWrittenReadsBackAsTheSameDesign(Path file) throws IOException {
        Design design = DesignFiles.load(Source.of(file), List.of(), SHIPPED).design();
        String text = DesignWriter.write(design);
        assertThat(load(text)).isEqualTo(design);
        assertThat(DesignWriter.write(load(text))).isEqualTo(text);
    }

    @Test
    void everyKindOfPartReadsBackAsTheSameDesign() throws IOException {
        String base = Files.readString(Path.of("examples/shed-heater.yaml"));
        Design design = load(
                base,
                "title=Ends in a colon: \"quoted\" # and a hash",
                "line={voltage: 231.7 V, frequency: 50 Hz, low: 199.3 V, high: 260 V, harmonics: [{order: 5, share: 3.3 %,"
                        + " phase: 12.7 deg}]}",
                "load={kind: inductive, resistance: 40 ohm, inductance: 120 mH}",
                "clip.winding={primary: 230 V, secondary: 24 V, phase: opposite, lag: -3.7 deg}",
                "ramp.capacitor=2n2K 63 V",
                "ramp.pot={track: 100 kΩ -10 % +20 %, law: table, points: [[0 %, 0 %], [33 %, 17 %], [100 %, 100 %]],"
                        + " shunt: 1 MΩ +5 %}",
                "wanted={lowest: 2 %..5 % at 0 %, highest: 10 deg at 100 %}",
                "designators={ramp.capacitor: \"C3, C4\"}",
                "document={number: \"1: 2\", date: 2031-01-31}");
        assertThat(load(DesignWriter.write(design))).isEqualTo(design);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "drying-cabinet | ramp.capacitor | 330 nF ±10 % 63 V",
                "drying-cabinet | ramp.pot.track | 47 kΩ ±20 %",
                "drying-cabinet | clip.zener | zener-18v",
                "drying-cabinet | stage-diodes.slope | 10 mohm",
                "drying-cabinet | title | Cabinet: the lower one #2",
                "drying-cabinet | document.number | {DC}, 15",
                "drying-cabinet | notes | A longer note",
                "upper-heaters | gate.transformer.ratio | 2:1",
            })
    void changingAValueLeavesEveryOtherByteAlone(String name, String path, String value) throws IOException {
        DesignText before = example(name);
        DesignText after = before.withValue(path, value);
        String old = before.valueAt(path).orElseThrow();
        assertThat(after.valueAt(path)).contains(value);
        assertThat(after.notes()).isEmpty();
        assertThat(after.withValue(path, old).text()).isEqualTo(before.text());
        assertThat(commonEnds(before.text(), after.text()))
                .isGreaterThanOrEqualTo(before.text().length() - old.length());
        assertThat(after.read(SHIPPED)).isInstanceOf(DesignText.Reading.Good.class);
    }

    /** How many signs two texts share at their beginning and end together. */
    private static int commonEnds(String a, String b) {
        int start = 0;
        while (start < Math.min(a.length(), b.length()) && a.charAt(start) == b.charAt(start)) {
            start++;
        }
        int end = 0;
        while (end < Math.min(a.length(), b.length()) - start
                && a.charAt(a.length() - 1 - end) == b.charAt(b.length() - 1 - end)) {
            end++;
        }
        return start + end;
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "gate.charge-time | 30 us",
                "derating.resistors | 60 %",
                "ramp.pot.shunt | 1 MΩ",
                "ramp.trim-high | 5 kΩ ±20 %",
                "ramp.trim-low | 470 kΩ",
                "clip.winding | {primary: 230 V, secondary: 24 V}",
                "trigger.device.standoff | 0.7",
                "trigger.device.valley.current | 9 mA",
                "thyristor.device.latching | 50 mA",
                "line.harmonics | [{order: 3, share: 2 %}]",
                "clip.zener.voltage | 19.5 V",
                "designators.gate.shunt | R9",
            })
    void addsAKeyThatIsMissing(String path, String value) throws IOException {
        DesignText before = example("drying-cabinet");
        boolean designator = path.startsWith("designators.");
        DesignText after =
                designator ? before.withValue("designators", "{gate.shunt: R9}") : before.withValue(path, value);
        assertThat(after.read(SHIPPED)).isInstanceOf(DesignText.Reading.Good.class);
        if (!designator) {
            assertThat(after.valueAt(path)).contains(value);
            Design viaText =
                    ((DesignText.Reading.Good) after.read(SHIPPED)).loaded().design();
            assertThat(viaText.line())
                    .isEqualTo(load(before.text(), path + "=" + value).line());
            assertThat(viaText.gate())
                    .isEqualTo(load(before.text(), path + "=" + value).gate());
        }
        assertThat(comments(after.text())).isEqualTo(comments(before.text()));
    }

    private static List<String> comments(String text) {
        return text.lines().filter(l -> l.startsWith("#")).toList();
    }

    @Test
    void takesKeysOut() throws IOException {
        DesignText before = example("drying-cabinet");
        for (String path : List.of(
                "wanted",
                "wanted.lowest",
                "wanted.highest",
                "gate.shunt",
                "gate.overdrive",
                "document.number",
                "stage-diodes",
                "stage-diodes.slope",
                "ramp.pot",
                "designators",
                "notes",
                "surroundings.hottest")) {
            DesignText after = before.without(path);
            assertThat(after.valueAt(path)).as(path).isEmpty();
            assertThat(after.read(SHIPPED)).as(path).isInstanceOf(DesignText.Reading.Good.class);
            assertThat(comments(after.text())).isEqualTo(comments(before.text()));
        }
        assertThat(before.without("gate.nothing").text()).isEqualTo(before.text());
    }

    @Test
    void saysWhenCommentsInsideAReplacedBlockAreLost() throws IOException {
        DesignText text = example("drying-cabinet");
        DesignText commented =
                new DesignText("t", text.text().replace("  tap: line", "  tap: line # across the line"), List.of());
        DesignText after = commented.withValue("clip", "{dropper: 10 kΩ, zener: zener-20v}");
        assertThat(after.notes()).containsExactly("Comments inside clip were not kept.");
        assertThat(after.read(SHIPPED)).isInstanceOf(DesignText.Reading.Good.class);
    }

    @Test
    void keepsTheLineEndingsOfTheFile() throws IOException {
        DesignText text = example("shed-heater");
        DesignText windows = new DesignText("t", text.text().replace("\n", "\r\n"), List.of());
        DesignText after = windows.withValue("derating.resistors", "60 %").withValue("ramp.fixed", "4k7");
        assertThat(after.text().replace("\r\n", "")).doesNotContain("\n").doesNotContain("\r");
        assertThat(after.read(SHIPPED)).isInstanceOf(DesignText.Reading.Good.class);
    }

    @Test
    void aBrokenTextIsToldAndNotChanged() {
        DesignText broken = new DesignText("t.yaml", "clipramp: [1", List.of());
        assertThat(broken.read(SHIPPED)).isInstanceOf(DesignText.Reading.Bad.class);
        assertThatThrownBy(() -> broken.withValue("title", "x")).isInstanceOf(InvalidInputException.class);
    }

    @Test
    void filesAreWrittenWholeOrNotAtAll(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("out.yaml");
        WholeFile.write(file, "first", false);
        assertThat(file).hasContent("first");
        assertThatThrownBy(() -> WholeFile.write(file, "second", false)).isInstanceOf(FileAlreadyExistsException.class);
        assertThatThrownBy(() -> WholeFile.write(
                        file,
                        out -> {
                            out.write(65);
                            throw new IOException("disk full");
                        },
                        true))
                .hasMessage("disk full");
        assertThat(file).hasContent("first");
        WholeFile.write(file, "second", true);
        assertThat(file).hasContent("second");
        try (Stream<Path> left = Files.list(folder)) {
            assertThat(left).containsExactly(file);
        }
        assertThatThrownBy(() -> WholeFile.write(folder.resolve("no/such/folder.yaml"), "x", true))
                .isInstanceOf(IOException.class);
    }

    @Test
    void writingFollowsALinkAndKeepsPermissions(@TempDir Path folder) throws IOException {
        Path real = folder.resolve("real.yaml");
        Files.writeString(real, "old");
        Files.setPosixFilePermissions(real, java.nio.file.attribute.PosixFilePermissions.fromString("rw-rw-r--"));
        Path link = Files.createSymbolicLink(folder.resolve("link.yaml"), real);
        WholeFile.write(link, "new", true);
        assertThat(link).isSymbolicLink();
        assertThat(real).hasContent("new");
        assertThat(Files.getPosixFilePermissions(real))
                .isEqualTo(java.nio.file.attribute.PosixFilePermissions.fromString("rw-rw-r--"));
    }
}
