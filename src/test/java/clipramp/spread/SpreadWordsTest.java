package clipramp.spread;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What is said of many units. The expected words are arithmetic on the counts. */
class SpreadWordsTest {
    @ParameterizedTest
    @CsvSource({
        "199956, 200000, 99.98 %",
        "199999, 200000, 99.9995 %",
        "200000, 200000, 100.0 %",
        "1, 20000, 0.01 %",
        "44, 200000, 0.02 %",
        "0, 200000, 0.0 %",
        "973, 1000, 97.3 %"
    })
    void fewNeverReadAsNoneNorAllButAFewAsAll(int held, int of, String words) {
        assertThat(SpreadWords.ofUnits((double) held / of)).isEqualTo(words);
    }

    @Test
    void progressLeavesNoSecondsOnlyWhenNothingIsLeft() {
        assertThat(SpreadWords.progress(500, 1000, 2)).isEqualTo("500 of 1000 units, 250 a second, 2 s left");
        assertThat(SpreadWords.progress(999, 1000, 2)).endsWith(", 1 s left");
    }
}
