package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Series by tolerance and their values: IEC 60063. */
class SteppingTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "ramp.capacitor;220 nF ±10 % 63 V;1;270 nF ±10 % 63 V",
                "ramp.capacitor;220 nF ±20 %;1;330 nF ±20 %",
                "clip.dropper;10 kΩ ±5 % 12 W 500 V;-1;9.1 kΩ ±5 % 12 W 500 V",
                "clip.dropper;10 kΩ ±5 % 12 W 500 V;2;12 kΩ ±5 % 12 W 500 V",
                "trigger.upper;1 kΩ ±1 % 0.25 W;1;1.02 kΩ ±1 % 0.25 W",
                "trigger.base-one;4k7;1;5.1 kΩ",
                "ramp.fixed;4k7J;1;5.1 kΩ ±5 %",
                "ramp.fixed;5 kΩ ±5 %;1;5.1 kΩ ±5 %",
                "gate.overdrive;3;1;4",
                "line.low;-10 %;1;-9 %",
                "line.high;+10 %;-1;+9 %",
                "surroundings.coldest;-20 degC;-1;-21 degC",
                "stage-diodes.drop;0.9 V;1;1.0 V",
            })
    void stepsByPreferredValuesAndElseByTheLastDigit(String key, String text, int steps, String stepped) {
        assertThat(Stepping.step(key, text, steps)).hasValue(stepped);
    }

    @Test
    void staysWithinWhatTheKeyTakes() {
        assertThat(Stepping.step("clip.dropper", "100 Ω ±5 %", -1)).isEmpty();
        assertThat(Stepping.step("gate.series", "0 Ω", 1)).isEmpty();
        assertThat(Stepping.step("ramp.capacitor", "none", 1)).isEmpty();
    }
}
