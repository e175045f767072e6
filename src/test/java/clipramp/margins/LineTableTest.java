package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Limits of the line current against the tables of IEC 61000-3-2, and how figures are written beside them. */
class LineTableTest {
    @ParameterizedTest
    @CsvSource({
        "2,1.08",
        "3,2.30",
        "4,0.43",
        "5,1.14",
        "6,0.30",
        "7,0.77",
        "9,0.40",
        "11,0.33",
        "13,0.21",
        "15,0.15",
        "25,0.09",
        "39,0.0577",
        "8,0.23",
        "16,0.115",
        "40,0.046",
    })
    void classAIsTableOneInAmperes(int order, double amps) {
        // IEC 61000-3-2, table 1 (from memory): 0.15 A x 15/n from 15 on, 0.23 A x 8/n from 8 on.
        assertThat(LineTable.CLASS_A.limitAmps(order, 7, 0.5).orElseThrow()).isCloseTo(amps, within(5e-5));
    }

    @ParameterizedTest
    @CsvSource({"2,0.04", "3,0.54", "5,0.2", "7,0.14", "9,0.1", "11,0.06", "39,0.06"})
    void classCIsTableTwoInSharesOfTheFundamental(int order, double amps) {
        // IEC 61000-3-2, table 2 (from memory): 2, 30 x power factor, 10, 7, 5 and 3 %; here of 2 A at 0.9.
        assertThat(LineTable.CLASS_C.limitAmps(order, 2, 0.9).orElseThrow()).isCloseTo(amps, within(1e-12));
    }

    @Test
    void classCHasNoOtherEvenOrder() {
        assertThat(LineTable.CLASS_C.limitAmps(4, 2, 0.9)).isEmpty();
        assertThat(LineTable.CLASS_C.limitAmps(40, 2, 0.9)).isEmpty();
    }

    @Test
    void figuresInFormulasCarryTheirUnit() {
        assertThat(Say.farads(1e-7)).isEqualTo("100 nF");
        assertThat(Say.share(0.05)).isEqualTo("5 %");
        assertThat(Say.rate(5e6)).isEqualTo("5 V/µs");
        assertThat(Say.kelvin(10)).isEqualTo("10 K");
        assertThat(Say.thermal(4)).isEqualTo("4 K/W");
        assertThat(Say.voltSeconds(2.5e-4)).isEqualTo("250 µVs");
    }

    @Test
    void everyKindSaysItsFormulaAndMeaning() {
        for (MarginKind kind : MarginKind.values()) {
            assertThat(kind.formula()).as(kind.id()).isNotBlank();
            assertThat(kind.meaning()).as(kind.id()).isNotBlank();
            assertThat(kind.title()).as(kind.id()).isNotBlank();
        }
    }
}
