package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * The whole way from a design file to the answer for machines, on circuits solved apart from this program: by
 * brute-force adaptive integration (relative tolerance 1e-11) of the same laws, good to 1e-6 degrees, 1e-6 V, 1e-5
 * relative in energy and charge, and 1e-3 in peaks. Case 5 fires 1.4e-5 degrees beside a corner of its supply.
 */
class SolvedCircuitsTest {
    private static final double DEGREES = 2e-5;
    private static final double VOLTS = 2e-5;
    private static final double ENERGY = 3e-5;
    private static final double PEAK = 1e-3;

    @Test
    void everySolvedRowComesOut() throws IOException {
        ObjectMapper mapper = new ObjectMapper();
        JsonNode cases;
        try (InputStream in = SolvedCircuitsTest.class.getResourceAsStream("/clipramp/firing/reference-cases.json")) {
            cases = mapper.readTree(in);
        }
        for (JsonNode solved : cases) {
            CliRun run = CliRun.withInput(solved.get("design").textValue(), "check", "-", "--json");
            assertThat(run.code()).as(run.err()).isIn(0, 1);
            JsonNode knob = mapper.readTree(run.out()).get("knob");
            for (JsonNode row : solved.get("rows")) {
                compare(solved.get("name").textValue(), row, answered(knob, row.get("position")));
            }
        }
    }

    private static JsonNode answered(JsonNode knob, JsonNode position) {
        return position.isNull() ? knob.get(0) : knob.get((int) Math.round(10 * position.doubleValue()));
    }

    private static void compare(String name, JsonNode solved, JsonNode answered) {
        String where = name + " at " + solved.get("position");
        relative(where + " rampOhms", solved, answered, "rampOhms", 1e-9);
        assertThat(answered.get("state").textValue().equals("hunts"))
                .as(where)
                .isEqualTo(solved.get("hunts").booleanValue());
        List<JsonNode> halves = byAngle(answered.get("halves"));
        List<JsonNode> expected = byAngle(solved.get("halves"));
        assertThat(halves).as(where).hasSameSizeAs(expected);
        for (int i = 0; i < expected.size(); i++) {
            compareHalf(where, expected.get(i), halves.get(i));
        }
    }

    private static void compareHalf(String where, JsonNode solved, JsonNode answered) {
        assertThat(answered.get("stalled")).as(where).isEqualTo(solved.get("stalled"));
        assertThat(answered.get("endPulse")).as(where).isEqualTo(solved.get("endPulse"));
        assertThat(answered.get("pulses").intValue())
                .as(where)
                .isEqualTo(solved.get("pulses").intValue());
        absolute(where, solved, answered, "firingDeg", DEGREES);
        for (String key : List.of("residualVolts", "supplyVolts", "peakPointVolts")) {
            absolute(where, solved, answered, key, VOLTS);
        }
        for (String key : List.of("gateJoules", "gateCoulombs")) {
            relative(where, solved, answered, key, ENERGY);
        }
        for (String key : List.of("peakGateAmps", "peakGateVolts", "peakBaseOneVolts")) {
            relative(where, solved, answered, key, PEAK);
        }
    }

    /** Two that hunt stand in either order. */
    private static List<JsonNode> byAngle(JsonNode halves) {
        List<JsonNode> sorted = new ArrayList<>();
        halves.forEach(sorted::add);
        sorted.sort((a, b) -> Double.compare(
                a.get("firingDeg").doubleValue(), b.get("firingDeg").doubleValue()));
        return sorted;
    }

    private static void absolute(String where, JsonNode solved, JsonNode answered, String key, double tolerance) {
        assertThat(answered.get(key).doubleValue())
                .as(where + " " + key)
                .isCloseTo(solved.get(key).doubleValue(), within(tolerance));
    }

    private static void relative(String where, JsonNode solved, JsonNode answered, String key, double tolerance) {
        double value = solved.get(key).doubleValue();
        assertThat(answered.get(key).doubleValue())
                .as(where + " " + key)
                .isCloseTo(value, within(Math.abs(value) * tolerance));
    }
}
