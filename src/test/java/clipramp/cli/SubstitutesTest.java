package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

/** Other devices put in an example's place: voltage classes of JEDEC types and missing quadrants decide as they must. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class SubstitutesTest {
    private final Map<String, JsonNode> answers = new HashMap<>();

    @Test
    void aThyristorOfTooLowAVoltageClassIsDecidedByItsBlockingVoltage() throws Exception {
        JsonNode answer = answer("examples/drying-cabinet.yaml");
        // 2N6400: 50 V (manufacturer's data sheet of the type), on a 230 V line.
        JsonNode low = substitute(answer, "2n6400");
        assertThat(low.get("verdict").asText()).isEqualTo("fails");
        assertThat(low.get("decidingMargin").asText()).isEqualTo("blocking-voltage");
        assertThat(low.get("ratio").asDouble()).isBetween(0.13, 0.15);
        assertThat(substitute(answer, "2n6404").get("original").asBoolean()).isTrue();
        assertThat(substitute(answer, "2n6404").get("verdict").asText())
                .isEqualTo(substitute(answer, "2n6405").get("verdict").asText());
    }

    @Test
    void aTriacWithoutTheQuadrantFails() throws Exception {
        // The 2N6344's sheet specifies I+ and III- only; a positive pulse needs I+ and III+.
        JsonNode answer = answer("examples/shed-heater.yaml");
        assertThat(substitute(answer, "2n6344").get("verdict").asText()).isEqualTo("fails");
        assertThat(substitute(answer, "2n6344").get("decidingMargin").asText()).isEqualTo("gate-polarity");
    }

    @Test
    void aProgrammableUnijunctionComesWithTheDividerThatItWants() throws Exception {
        JsonNode answer = answer("examples/tray-lamp.yaml");
        JsonNode programmable = substitute(answer, "2n6027");
        assertThat(programmable.get("path").asText()).isEqualTo("trigger.device");
        assertThat(programmable.get("verdict").asText()).isNotEqualTo("fails");
        assertThat(programmable.get("changes").toString())
                .contains("trigger.base-two=none", "trigger.upper=", "trigger.lower=", "ramp.capacitor=");
        assertThat(substitute(answer, "2n2647").get("changes")).isEmpty();
    }

    @Test
    void whatItSaysHasToChangeGivesTheVerdictThatItSays() throws Exception {
        for (String[] pair : new String[][] {{"tray-lamp", "2n6027"}, {"seed-drawer", "2n2646"}}) {
            String file = "examples/" + pair[0] + ".yaml";
            JsonNode said = substitute(answer(file), pair[1]);
            List<String> command =
                    new ArrayList<>(List.of("check", file, "--json", "--with=trigger.device=" + pair[1]));
            said.get("changes").forEach(change -> command.add("--with=" + change.asText()));
            CliRun run = CliRun.of(command.toArray(String[]::new));
            assertThat(new ObjectMapper().readTree(run.out()).get("verdict")).isEqualTo(said.get("verdict"));
        }
    }

    @Test
    void aHundredthOfTheValleyCurrentLeavesNoRoomForTheHighestSetting() throws Exception {
        // 2N6027: I_V 150 uA typ at 10 kohm; 2N2647: 10 mA typ (manufacturers' data sheets of the types). The capacitor
        // that
        // an ampere gate wants asks for a small R_E at the highest setting; the valley forbids it.
        JsonNode programmable = substitute(answer("examples/drying-cabinet.yaml"), "2n6027");
        assertThat(programmable.get("verdict").asText()).isEqualTo("fails");
        assertThat(programmable.get("decidingMargin").asText()).isEqualTo("wanted-highest");
        assertThat(programmable.get("ratio").asDouble()).isBetween(0.5, 0.95);
    }

    /** Every device in an example's place is seconds of work: asked once an example. */
    private JsonNode answer(String file) throws Exception {
        if (!answers.containsKey(file)) {
            CliRun run = CliRun.of("parts", "--for=" + file, "--json");
            assertThat(run.code()).isEqualTo(0);
            answers.put(file, new ObjectMapper().readTree(run.out()));
        }
        return answers.get(file);
    }

    private static JsonNode substitute(JsonNode answer, String id) {
        return StreamSupport.stream(answer.get("substitutes").spliterator(), false)
                .filter(s -> s.get("id").asText().equals(id))
                .findFirst()
                .orElseThrow();
    }
}
