package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Thyristor;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class ThermalTest {
    @Test
    void guptaExample2Point23SinkForThirtyWatts() {
        // Gupta & Singhal, Power Electronics, example 2.23: 125 and 50 degC, 30 W, 1.0 + 0.3 K/W.
        assertThat(Thermal.largestCaseToAmbient(125, 50, 30, 1.0 + 0.3)).isCloseTo(1.2, within(1e-12));
    }

    @Test
    void theJunctionStandsAboveTheAirByLossTimesResistance() {
        Thyristor thyristor = new Thyristor(SampleDesigns.scr16Amps(), OptionalDouble.of(4));
        assertThat(Thermal.junctionCelsius(thyristor, 6, 50).getAsDouble()).isCloseTo(50 + 6 * 5.5, within(1e-12));
    }

    @Test
    void withoutASinkThereIsNoAnswer() {
        Thyristor thyristor = new Thyristor(SampleDesigns.scr16Amps(), OptionalDouble.empty());
        assertThat(Thermal.junctionCelsius(thyristor, 6, 50)).isEmpty();
    }
}
