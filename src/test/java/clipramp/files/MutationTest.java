package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Whatever stands in a file, reading ends in a design or in problems with a place: never in anything else. */
class MutationTest {
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();
    private static final int MUTATIONS = 10_000;

    private static final List<String> PIECES = List.of(
            ":",
            ": ",
            "{",
            "}",
            "[",
            "]",
            ",",
            "\n",
            "  ",
            "- ",
            "#",
            "&a ",
            "*a",
            "!!int ",
            "\"",
            "'",
            "|\n",
            ">\n",
            "\t",
            "none",
            "0",
            "-1",
            "1e999",
            "NaN",
            "%",
            "±5 %",
            "..",
            " at ",
            "k",
            "Ω",
            "µ",
            "\u0000",
            "\ud83d\ude00",
            "---\n",
            "...\n",
            "? ",
            "like: 2n2646",
            "<<: ",
            "\r",
            "\u2028",
            "1,5",
            "~",
            "@",
            "`",
            "%YAML 1.1\n",
            "\ufeff",
            "[0]");

    @Test
    void mutatedFilesReadOrAreRefusedInOurWords() throws IOException {
        List<String> good = new ArrayList<>(List.of(BadInputTest.base()));
        for (Path example : GoodFilesTest.examples()) {
            good.add(Source.of(example).text());
        }
        long seed = 20310131;
        Random random = new Random(seed);
        List<String> mutations = new ArrayList<>();
        for (int i = 0; i < MUTATIONS; i++) {
            mutations.add(mutated(good.get(random.nextInt(good.size())), random));
        }
        long read =
                mutations.parallelStream().filter(text -> isRead(text, seed)).count();
        assertThat(read).as("mutations that still read").isBetween(MUTATIONS / 20L, MUTATIONS * 19L / 20);
    }

    /** One to three changes: a piece put in, a stretch taken out, a stretch doubled, two signs exchanged. */
    private static String mutated(String text, Random random) {
        StringBuilder out = new StringBuilder(text);
        int changes = 1 + random.nextInt(3);
        for (int i = 0; i < changes && out.length() > 2; i++) {
            int at = random.nextInt(out.length() - 1);
            int end = Math.min(out.length(), at + 1 + random.nextInt(12));
            switch (random.nextInt(5)) {
                case 0 -> out.insert(at, PIECES.get(random.nextInt(PIECES.size())));
                case 1 -> out.delete(at, end);
                case 2 -> out.insert(at, out.substring(at, end));
                case 3 -> out.setCharAt(at, out.charAt(random.nextInt(out.length())));
                default -> out.replace(at, end, PIECES.get(random.nextInt(PIECES.size())));
            }
        }
        return out.toString();
    }

    private static boolean isRead(String text, long seed) {
        try {
            LoadedDesign loaded = DesignFiles.load(new Source("m.yaml", text), List.of(), SHIPPED);
            assertThat(loaded.inputDigest()).hasSize(64);
            return true;
        } catch (InvalidInputException e) {
            assertThat(e.problems()).isNotEmpty().allSatisfy(p -> {
                assertThat(p.message()).isNotBlank().doesNotContain("Exception", "java.", "snakeyaml", "jackson");
                assertThat(p.line()).isPositive();
                assertThat(p.column()).isPositive();
            });
            return false;
        } catch (RuntimeException | StackOverflowError e) {
            throw new AssertionError("seed " + seed + ":\n" + text, e);
        }
    }
}
