package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Words that other programs read: they stand in answers and must not change unnoticed. */
class WordsTest {
    @Test
    void figuresInFormulasCarryTheirUnitAndFourDigits() {
        assertThat(Say.volts(12.34567)).isEqualTo("12.35 V");
        assertThat(Say.amps(4.2e-3)).isEqualTo("4.2 mA");
        assertThat(Say.ohms(4_700)).isEqualTo("4.7 kΩ");
        assertThat(Say.watts(0.5)).isEqualTo("500 mW");
        assertThat(Say.seconds(2e-5)).isEqualTo("20 µs");
        assertThat(Say.coulombs(2e-7)).isEqualTo("200 nC");
        assertThat(Say.joules(1.5e-8)).isEqualTo("15 nJ");
        assertThat(Say.celsius(-40)).isEqualTo("-40 °C");
        assertThat(Say.angle(Math.PI / 2)).isEqualTo("90°");
        assertThat(Say.henries(2e-3)).isEqualTo("2 mH");
        assertThat(Say.hertz(49.5)).isEqualTo("49.5 Hz");
        assertThat(Say.ampsSquaredSeconds(145)).isEqualTo("145 A²s");
        assertThat(Say.number(1.55)).isEqualTo("1.55");
    }

    @Test
    void verdictsSidesAndStandingsHaveTheirWords() {
        assertThat(List.of(Verdict.values()))
                .extracting(Verdict::word)
                .containsExactly("holds", "not-judged", "tight", "fails");
        assertThat(List.of(Margin.Sense.values()))
                .extracting(Margin.Sense::word)
                .containsExactly("at-least", "at-most");
        assertThat(List.of(LineCheck.Standing.values()))
                .extracting(LineCheck.Standing::word)
                .containsExactly("no limits", "under the limits", "over the limits", "ruled out");
        assertThat(LineTable.CLASS_A.source()).contains("table 1").contains("from memory");
        assertThat(LineTable.CLASS_C.source()).contains("table 2").contains("from memory");
    }

    @ParameterizedTest
    @EnumSource(MarginKind.class)
    void aMarginIsFoundByItsIdAndItsIdIsItsName(MarginKind kind) {
        assertThat(MarginKind.byId(kind.id())).contains(kind);
        assertThat(kind.id()).matches("[a-z][a-z0-9-]+");
        assertThat(kind.title()).isNotBlank();
        assertThat(kind.source()).isNotBlank();
        assertThat(kind.remedy()).endsWith(".");
        assertThat(kind.parts()).isNotEmpty().allMatch(key -> key.matches("[a-z][a-z0-9.-]+"));
        assertThat(kind.holdsFrom())
                .as("a demand, or a demand with the least reserve")
                .isIn(1.0, 1.2);
        assertThat(kind.gravest()).isIn(Verdict.FAILS, Verdict.TIGHT);
    }

    @Test
    void anIdThatIsNoneFindsNothing() {
        assertThat(MarginKind.byId("no-such-margin")).isEmpty();
        assertThat(MarginKind.byId("")).isEmpty();
    }

    @Test
    void aMarginCarriesItsKindsIdAndName() {
        Finding finding = new Finding("here", 1, 2, Margin.Sense.AT_LEAST, "f");
        Margin margin = Finding.worst(MarginKind.GATE_TIME, List.of(finding));
        assertThat(margin.id()).isEqualTo(MarginKind.GATE_TIME.id());
        assertThat(margin.name()).isEqualTo(MarginKind.GATE_TIME.title());
        assertThat(margin.parts()).isEqualTo(MarginKind.GATE_TIME.parts());
    }
}
