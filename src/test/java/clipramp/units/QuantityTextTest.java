package clipramp.units;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumSet;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class QuantityTextTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "4700;OHM;4.7 kΩ",
                "1e-7;FARAD;100 nF",
                "999.96;VOLT;1 kV",
                "19.951;VOLT;19.95 V",
                "0;AMPERE;0 A",
                "-0.0025;VOLT_PER_KELVIN;-2.5 mV/K",
                "1e12;OHM;1000 GΩ",
                "1e-15;FARAD;0.001 pF",
                "0.05;FRACTION;5 %",
                "0.004;PER_KELVIN;0.4 %/K",
                "25;CELSIUS;25 °C",
                "3;NUMBER;3",
                "0.27013;ANGLE;15.48°",
                "NaN;VOLT;unknown",
                "Infinity;OHM;∞",
            })
    void writesEngineeringNotation(double value, Unit unit, String text) {
        assertThat(QuantityText.format(value, unit)).isEqualTo(text);
    }

    @Test
    void exactTextReadsBackAsTheSameDouble() {
        long seed = 20260101;
        Random random = new Random(seed);
        for (Unit unit : EnumSet.allOf(Unit.class)) {
            for (int i = 0; i < 80; i++) {
                double value = (random.nextBoolean() ? 1 : -1) * Math.pow(10, random.nextDouble() * 24 - 14);
                String text = QuantityText.exact(value, unit);
                assertThat(QuantityReader.read(text, Expected.any(unit)).value())
                        .as("seed %d, %s", seed, text)
                        .isEqualTo(value);
                String ascii = Notation.ASCII.apply(text);
                assertThat(ascii).matches("\\p{ASCII}*");
                assertThat(QuantityReader.read(ascii, Expected.any(unit)).value())
                        .isEqualTo(value);
            }
        }
    }

    @Test
    void exactTextStaysShort() {
        assertThat(QuantityText.exact(1e-7, Unit.FARAD)).isEqualTo("100 nF");
        assertThat(QuantityText.exact(4700, Unit.OHM)).isEqualTo("4.7 kΩ");
        assertThat(QuantityText.exact(0.1, Unit.FRACTION)).isEqualTo("10 %");
        assertThat(QuantityText.exact(Math.toRadians(15.3), Unit.ANGLE)).isEqualTo("15.3 deg");
    }

    @Test
    void asciiNamesEverySign() {
        assertThat(Notation.ASCII.apply("10 kΩ ±5 %, 20 µs, 25 °C, 90°, 40 A²s"))
                .isEqualTo("10 kohm +-5 %, 20 us, 25 degC, 90 deg, 40 A2s");
        assertThat(Notation.UNICODE.apply("10 kΩ")).isEqualTo("10 kΩ");
    }
}
