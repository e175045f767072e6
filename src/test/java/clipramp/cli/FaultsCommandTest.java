package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.junit.jupiter.api.Test;

class FaultsCommandTest {
    private static final String CABINET = "examples/drying-cabinet.yaml";

    @Test
    void theSheetOpensWithTheCautionAndNamesTheDesignsOwnDesignators() {
        CliRun run = CliRun.of("faults", CABINET);
        assertThat(run.code()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.out().lines().limit(2)).anyMatch(line -> line.contains("Mains voltage kills"));
        assertThat(run.out())
                .contains("isolated", "instruments", "zener V1 open", "thyristor V3 shorted", "burns next");
        assertThat(run.out()).doesNotContain("NaN", "Infinity", "-0.0 ");
    }

    @Test
    void whatWasSeenIsRankedWithWhatSpeaksAgainst() {
        CliRun run = CliRun.of("faults", CABINET, "--seen=load:full", "--seen=knob:acts");
        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("1. ", "against it: ", "2 observations");
    }

    @Test
    void everyMeterIsShownOnDemand() {
        CliRun run = CliRun.of("faults", CABINET, "--meters");
        assertThat(run.out()).contains("Every test point on every meter", "peak");
    }

    @Test
    void machinesGetTheSameInSiUnits() throws IOException {
        CliRun run = CliRun.of("faults", CABINET, "--json", "--seen=blown:V2,TP1=80V");
        JsonNode answer = new ObjectMapper().readTree(run.out());
        assertThat(answer.at("/format/name").asText()).isEqualTo("faults");
        assertThat(answer.at("/healthy/readings")).hasSize(5);
        assertThat(answer.at("/faults").size()).isGreaterThan(20);
        assertThat(answer.at("/ranked/0/id").asText()).isEqualTo("zener-open");
        assertThat(answer.at("/ranked/0/fits")).hasSize(2);
        assertThat(answer.at("/seen/1").asText()).isEqualTo("TP1=80V");
        for (JsonNode fault : answer.at("/faults")) {
            assertThat(fault.at("/knob")).hasSize(3);
        }
    }

    @Test
    void whatIsNotUnderstoodIsRefusedBeforeAnythingIsComputed() {
        CliRun run = CliRun.of("faults", CABINET, "--seen=TP9=3V");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("--seen", "TP9=3V", "TP1 to TP5");
    }

    @Test
    void aDecimalCommaIsRecognisedAmongCommasThatPart() {
        CliRun run = CliRun.of("faults", CABINET, "--seen=load:none,TP1=19,5V");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("TP1=19,5V", "decimals take a dot: TP1=19.5V?");
    }

    @Test
    void aFixedRampHasNoKnobToTurn() {
        CliRun run = CliRun.of("faults", CABINET, "--with=ramp.pot=none");
        assertThat(run.code()).isZero();
        assertThat(run.out()).doesNotContain("wiper", "knob in the middle");
    }
}
