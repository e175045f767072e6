package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Values that a design may have but no circuit does: answered or refused in words, never our fault. */
class AbsurdValuesTest {
    @ParameterizedTest
    @CsvSource({
        "drying-cabinet, --temperature=125degC, 1",
        "cabinet-gone-wrong, --with=trigger.device.interbase-drift=-5 %/K --temperature=125degC, 2",
        "drying-cabinet, --with=trigger.device.interbase-drift=5 %/K --temperature=0degC, 2",
        "cabinet-gone-wrong, --with=trigger.device.valley.at=500 mV --with=clip.dropper=100 Ω, 2",
        "cabinet-gone-wrong, --with=trigger.device.valley.at=500 mV --with=trigger.base-one=1 MΩ --with=clip.dropper=1 MΩ, 2",
        "upper-heaters, --with=gate.transformer.primary-resistance=0 Ω, 0"
    })
    void areAnsweredOrRefusedInWords(String example, String options, int code) {
        String[] words = ("check#examples/" + example + ".yaml#" + options.replace(" --", "#--")).split("#");
        CliRun run = CliRun.of(words);

        assertThat(run.code()).as(run.err()).isEqualTo(code);
        assertThat(run.out() + run.err()).doesNotContain("Exception", "NaN", "Infinity");
    }

    @ParameterizedTest
    @CsvSource({
        "--with=trigger.device.interbase-drift=-5 %/K, -5 %/K nothing is left of the interbase resistance at 125",
        "--with=clip.zener.drift=-1 %/K, nothing is left of the zener voltage"
    })
    void aDriftThatLeavesNothingIsNamed(String option, String said) {
        assertThat(CliRun.of("check", "examples/drying-cabinet.yaml", "--temperature=125degC", option)
                        .err())
                .contains(said, "Check the drift against the data sheet");
    }
}
