package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class SpellingTest {
    @Test
    void asciiSpellsTheTradesSigns() {
        assertThat(Spelling.ASCII.of("4.7 kΩ ±5 %, 20 µs at 90°, 25 °C, ≥ 3"))
                .isEqualTo("4.7 kohm +-5 %, 20 us at 90 deg, 25 degC, >= 3");
    }

    @Test
    void asciiHoldsNothingElse() {
        assertThat(Spelling.ASCII.of("Trockenschrank größer 乾燥")).matches("[ -~]*");
    }

    @Test
    void aTitleCannotSteerTheTerminal() {
        assertThat(Spelling.FULL.of("a\u001B[2Jb\u0007\u202Ec\rd")).doesNotContain("\u001B", "\u0007", "\u202E", "\r");
    }

    @Test
    void fullSpellingLeavesSignsAlone() {
        assertThat(Spelling.FULL.of("10 kΩ ±5 %")).isEqualTo("10 kΩ ±5 %");
    }
}
