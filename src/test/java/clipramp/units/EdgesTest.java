package clipramp.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Quantities just at the edges of the grammar, of a window and of what stays readable. */
class EdgesTest {
    private static final Expected RESISTOR = Expected.part(Unit.OHM, 0, 1e9);

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "10 kΩ - 10 % + 20 %;0.1;0.2",
                "10000 0.5 %;0.005;0.005",
                "10000 9 %;0.09;0.09",
                "10 kΩ -99 %;0.99;0",
                "10 kΩ +1000 %;0;10",
            })
    void readsTolerancesAtTheirEdges(String text, double minus, double plus) {
        Quantity quantity = QuantityReader.read(text, RESISTOR);
        assertThat(quantity.minus()).isEqualTo(minus);
        assertThat(quantity.plus()).isEqualTo(plus);
        assertThat(quantity.hasTolerance()).isTrue();
    }

    @Test
    void aValueWithoutToleranceHasNone() {
        assertThat(QuantityReader.read("10 kΩ", RESISTOR).hasTolerance()).isFalse();
    }

    @Test
    void aBareShareAfterAValueIsATolerance() {
        assertThatThrownBy(() -> QuantityReader.read("230 V 5 %", Expected.any(Unit.VOLT)))
                .hasMessageContaining("without a tolerance");
    }

    @Test
    void saysAWindowThatIsOpenOnEitherSide() {
        double none = Double.POSITIVE_INFINITY;
        assertThat(Expected.any(Unit.OHM).inWords()).isEqualTo("a resistance, such as 10 kΩ");
        assertThat(Expected.within(Unit.OHM, 100, none).inWords()).isEqualTo("100 Ω or more");
        assertThat(Expected.within(Unit.OHM, -none, 1e6).inWords()).isEqualTo("1 MΩ or less");
        assertThat(Expected.within(Unit.OHM, 100, 1e6).inWords()).isEqualTo("100 Ω..1 MΩ");
    }

    @Test
    void aWindowHoldsItsOwnEnds() {
        Expected window = Expected.within(Unit.OHM, 100, 1e6);
        assertThat(QuantityReader.read("100 ohm", window).value()).isEqualTo(100);
        assertThat(QuantityReader.read("1 Mohm", window).value()).isEqualTo(1e6);
        assertThatThrownBy(() -> QuantityReader.read("99.9 ohm", window)).hasMessageContaining("100 Ω..1 MΩ");
        assertThatThrownBy(() -> QuantityReader.read("1.01 Mohm", window)).hasMessageContaining("100 Ω..1 MΩ");
    }

    @Test
    void aRefusedValueIsSaidInThePlainUnitWhileThatCanBeRead() {
        Expected window = Expected.within(Unit.OHM, 1000, 1e5);
        assertThatThrownBy(() -> QuantityReader.read("1.25 m", window)).hasMessageContaining("(0.00125 Ω)");
        assertThatThrownBy(() -> QuantityReader.read("0.125 m", window)).hasMessageContaining("(125 µΩ)");
        assertThatThrownBy(() -> QuantityReader.read("0.5 M", window)).hasMessageContaining("(500000 Ω)");
        assertThatThrownBy(() -> QuantityReader.read("5000 k", window)).hasMessageContaining("(5 MΩ)");
    }

    @ParameterizedTest
    @CsvSource({"1e14,100000000000000", "1e15,1e15", "-2.5e16,-25e15", "1e-7,0.0000001", "1e-8,1e-8"})
    void digitsStayPlainWhileTheyCanBeCounted(double value, String text) {
        assertThat(QuantityText.number(value, 4)).isEqualTo(text);
    }

    @Test
    void infinityHasItsSign() {
        assertThat(QuantityText.format(Double.NEGATIVE_INFINITY, Unit.VOLT)).isEqualTo("-∞");
    }

    @Test
    void theNearestPreferredValueIsTheOneInRatioAboveAndBelowOne() {
        // Between 1000 and 1200 the ratios are equal at their geometric mean, 1095.4; the middle would be 1100.
        PreferredSeries e12 = PreferredSeries.E12;
        assertThat(e12.nearest(1094)).isEqualTo(1000);
        assertThat(e12.nearest(1097)).isEqualTo(1200);
        assertThat(e12.nearest(0.1094)).isEqualTo(0.1);
        assertThat(e12.nearest(0.1097)).isEqualTo(0.12);
        assertThat(e12.step(1094, 0)).isEqualTo(1000);
        assertThat(e12.contains(0)).isFalse();
        assertThat(e12.contains(-1000)).isFalse();
    }

    @Test
    void aBandMayBeOneValueButNeedsBothEnds() {
        List<Expected> choices = List.of(Expected.within(Unit.FRACTION, 0, 1));
        assertThat(Band.read("5 %..5 %", choices).high().value()).isEqualTo(0.05);
        assertThatThrownBy(() -> Band.read("..5 %", choices)).hasMessageContaining("An empty value");
        assertThatThrownBy(() -> Band.read("5 %..", choices)).hasMessageContaining("An empty value");
    }
}
