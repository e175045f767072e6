package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class ParagraphTest {
    @Test
    void noLineIsWiderThanThePageAndNoWordIsLost() {
        String text = "the ramp capacitor charges through the knob ".repeat(20).strip();

        assertThat(Paragraph.wrap(text, "Note: ", "  "))
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(Paragraph.WIDTH))
                .hasSizeGreaterThan(5);
        assertThat(String.join(" ", Paragraph.wrap(text, ""))).isEqualTo(text);
    }

    @Test
    void aWordLongerThanThePageStandsAlone() {
        String word = "x".repeat(Paragraph.WIDTH + 10);

        assertThat(Paragraph.wrap("a " + word + " b", "")).containsExactly("a", word, "b");
    }
}
