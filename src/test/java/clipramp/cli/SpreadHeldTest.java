package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** {@code spread} at a line voltage or a temperature that is asked for: it is held there and no longer drawn. */
class SpreadHeldTest {
    private static JsonNode spread(String... conditions) throws IOException {
        List<String> all = new ArrayList<>(
                List.of("spread", "examples/drying-cabinet.yaml", "--samples=60", "--judged=0", "--seed=7", "--json"));
        all.addAll(List.of(conditions));
        CliRun run = CliRun.of(all.toArray(new String[0]));
        assertThat(run.err()).isEmpty();
        return new ObjectMapper().readTree(run.out());
    }

    private static List<String> drawn(JsonNode answer) {
        return answer.get("factors").findValuesAsText("path");
    }

    @Test
    void lineAndTemperatureAreDrawnUnlessTheyAreHeld() throws IOException {
        assertThat(drawn(spread())).contains("line.voltage", "surroundings", "line.frequency");
        assertThat(drawn(spread("--line=207V", "--temperature=0degC")))
                .doesNotContain("line.voltage", "surroundings")
                .contains("line.frequency", "ramp.capacitor");
        assertThat(drawn(spread("--line=207V"))).doesNotContain("line.voltage").contains("surroundings");
    }

    /** A higher line reaches the zener's voltage sooner after its zero, and so units fire sooner. */
    @Test
    void unitsStandAtTheVoltageTheyAreHeldAt() throws IOException {
        JsonNode low = spread("--line=207V").get("knob");
        JsonNode high = spread("--line=253V").get("knob");
        assertThat(low).hasSize(11);
        // Not at position 0, where pulses of the supply's collapse come sooner at a low line.
        for (int i = 1; i < 11; i++) {
            assertThat(low.get(i).at("/firingDeg/p50").doubleValue())
                    .as("median firing angle in knob row " + i)
                    .isGreaterThan(high.get(i).at("/firingDeg/p50").doubleValue())
                    .isGreaterThan(5);
        }
    }
}
