package clipramp.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What the analyses answer, held against the keys and words that were agreed for them. */
class AnswersTest {
    private static final String HOLDS = "examples/drying-cabinet.yaml";
    private static final String FAILS = "examples/cabinet-gone-wrong.yaml";

    private static final String[] HEAD = {
        "format", "program", "inputDigest", "verdict", "notes", "assumed", "profiles", "overrides"
    };
    private static final String[] ROW = {
        "position",
        "rampOhms",
        "firingDeg",
        "delaySeconds",
        "conductionDeg",
        "loadVolts",
        "loadAmps",
        "loadWatts",
        "powerFraction",
        "pulsesPerHalfCycle",
        "state",
        "latches",
        "endPulseDeg",
        "residualVolts",
        "peakPointVolts",
        "supplyVolts",
        "halves"
    };
    private static final String[] HALF = {
        "firingDeg",
        "residualVolts",
        "loadWatts",
        "peakPointVolts",
        "supplyVolts",
        "stalled",
        "endPulse",
        "pulses",
        "peakGateAmps",
        "peakGateVolts",
        "peakBaseOneVolts",
        "gateJoules",
        "gateCoulombs"
    };
    private static final String[] PULSE = {
        "atKnob",
        "peakGateAmps",
        "peakGateVolts",
        "peakGateWatts",
        "peakBaseOneVolts",
        "gateJoules",
        "gateCoulombs",
        "capacitorJoules",
        "aboveTriggerSeconds",
        "meanGateWatts",
        "quiescentGateVolts"
    };
    private static final String[] MARGIN = {
        "id", "name", "demand", "offered", "unit", "sense", "ratio", "holdsFrom", "condition", "verdict"
    };

    private static JsonNode json(String... arguments) {
        List<String> all = new ArrayList<>(Arrays.asList(arguments));
        all.add("--json");
        CliRun run = CliRun.of(all.toArray(new String[0]));
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).doesNotContain("NaN", "Infinity");
        try {
            return new ObjectMapper().readTree(run.out());
        } catch (IOException broken) {
            throw new AssertionError(run.out(), broken);
        }
    }

    private static List<String> keys(JsonNode node) {
        List<String> keys = new ArrayList<>();
        node.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    @Test
    void checkAnswersWithEveryAgreedKey() {
        JsonNode answer = json("check", HOLDS);

        assertThat(keys(answer)).contains(HEAD).contains("title", "condition", "knob", "pulse", "supply", "margins");
        assertThat(answer.at("/format/name").textValue()).isEqualTo("check");
        assertThat(answer.at("/format/version").intValue()).isEqualTo(1);
        assertThat(keys(answer.get("condition"))).containsExactly("lineVolts", "lineHertz", "celsius");
        assertThat(answer.get("knob"))
                .hasSize(11)
                .allSatisfy(row -> assertThat(keys(row)).contains(ROW));
        assertThat(answer.get("knob"))
                .allSatisfy(row -> assertThat(row.get("halves"))
                        .isNotEmpty()
                        .allSatisfy(half -> assertThat(keys(half)).contains(HALF)));
        assertThat(keys(answer.get("pulse"))).contains(PULSE);
        assertThat(keys(answer.get("supply"))).contains("dropperWatts", "zenerWatts", "clipFromDeg");
        assertThat(answer.get("margins"))
                .isNotEmpty()
                .allSatisfy(row -> assertThat(keys(row)).contains(MARGIN));
        assertThat(answer.get("inputDigest").textValue()).matches("[0-9a-f]{64}");
    }

    @Test
    void knobRowsAreInDegreesFractionsAndSi() {
        JsonNode knob = json("check", HOLDS).get("knob");

        assertThat(knob.get(0).get("position").doubleValue()).isZero();
        assertThat(knob.get(10).get("position").doubleValue()).isEqualTo(1);
        for (JsonNode row : knob) {
            double degrees = row.get("firingDeg").doubleValue();
            assertThat(degrees).isBetween(1.0, 180.0);
            assertThat(row.get("delaySeconds").doubleValue())
                    .as("no lag, 50 Hz: the delay is the angle's share of 10 ms")
                    .isCloseTo(degrees / 180 * 0.01, within(1e-9));
            assertThat(row.get("powerFraction").doubleValue()).isBetween(0.0, 1.0);
            assertThat(row.get("loadWatts").doubleValue())
                    .as("a resistor")
                    .isCloseTo(
                            row.get("loadVolts").doubleValue()
                                    * row.get("loadAmps").doubleValue(),
                            within(1e-6));
        }
    }

    @Test
    void aFixedRampHasOneRowWithoutPosition() {
        JsonNode answer = json("check", HOLDS, "--with=ramp.pot=none", "--with=wanted=none");

        assertThat(answer.get("knob")).hasSize(1);
        assertThat(answer.at("/knob/0/position").isNull()).isTrue();
        assertThat(answer.at("/pulse/atKnob").isNull()).isTrue();
    }

    @Test
    void marginWordsAreTheAgreedOnes() {
        assertThat(json("check", FAILS).get("margins")).allSatisfy(margin -> {
            assertThat(margin.get("verdict").textValue()).isIn("holds", "tight", "fails", "not-judged");
            assertThat(margin.get("sense").textValue()).isIn("at-least", "at-most");
        });
    }

    @Test
    void aFailingDesignExitsWithOneFromCheckOnly() {
        assertThat(CliRun.of("check", HOLDS).code()).isZero();
        assertThat(CliRun.of("check", FAILS).code()).isEqualTo(1);
        CliRun map = CliRun.of("map", FAILS);
        assertThat(map.code()).isZero();
        assertThat(map.out()).contains("This design fails:");
        assertThat(CliRun.of("trace", FAILS).code()).isZero();
    }

    @Test
    void strictTakesTightAndNotJudgedForFailing() {
        String notJudged = "--with=thyristor.device.gate.limits.current=none";
        assertThat(json("check", HOLDS, notJudged).get("margins").findValuesAsText("verdict"))
                .contains("not-judged");

        assertThat(CliRun.of("check", HOLDS, notJudged).code()).isZero();
        assertThat(CliRun.of("check", HOLDS, notJudged, "--strict").code()).isEqualTo(1);
        assertThat(CliRun.of("check", HOLDS, "--strict").code()).isZero();
    }

    @Test
    void overridesActTheLastOneWinningAndAreEchoed() {
        JsonNode answer = json("map", HOLDS, "--with=ramp.fixed=1k", "--with=ramp.fixed=10 kΩ");

        assertThat(answer.at("/knob/10/rampOhms").doubleValue()).isCloseTo(10_000, within(1e-6));
        assertThat(answer.get("overrides")).hasSize(2);
        assertThat(answer.get("overrides").get(1).textValue()).isEqualTo("ramp.fixed=10 kΩ");
        assertThat(CliRun.of("map", HOLDS, "--with=ramp.fixed=10 kΩ").out()).contains("with ramp.fixed=10 kΩ");
    }

    @Test
    void conditionsPinTheirAxis() {
        JsonNode answer = json("check", HOLDS, "--line=207V", "--temperature=0degC");

        assertThat(answer.at("/condition/lineVolts").doubleValue()).isEqualTo(207);
        assertThat(answer.at("/condition/celsius").doubleValue()).isZero();
        assertThat(answer.at("/knob/0/firingDeg").doubleValue())
                .isNotEqualTo(json("check", HOLDS).at("/knob/0/firingDeg").doubleValue());
    }

    @Test
    void theSameInputGivesTheSameBytesAndAnotherInputAnotherDigest() {
        String once = CliRun.of("check", HOLDS, "--json").out();

        assertThat(CliRun.of("check", HOLDS, "--json").out()).isEqualTo(once);
        assertThat(json("check", HOLDS, "--with=ramp.fixed=3k9").get("inputDigest"))
                .isNotEqualTo(json("check", HOLDS).get("inputDigest"));
    }

    @Test
    void standardInputIsReadForADash() throws IOException {
        String text = Files.readString(Path.of(HOLDS), StandardCharsets.UTF_8);
        CliRun run = CliRun.withInput(text, "check", "-");

        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("(-)");
    }

    @Test
    void theTextTellsTheSameVerdictAsTheAnswerForMachines() {
        JsonNode answer = json("check", FAILS);
        String text = CliRun.of("check", FAILS).out();

        assertThat(text).contains("Verdict: " + answer.get("verdict").textValue());
        answer.get("margins")
                .forEach(margin -> assertThat(text).contains(margin.get("name").textValue()));
        assertThat(text.lines().limit(2)).anyMatch(line -> line.contains("explain safety"));
        assertThat(text.lines().findFirst().orElseThrow()).startsWith("Nominal parts, tolerances not included.");
    }

    @Test
    void answersKeepWithinAHundredColumns() {
        for (String command : List.of("check", "map", "trace")) {
            for (String design : List.of(HOLDS, FAILS)) {
                assertThat(CliRun.of(command, design).out().lines())
                        .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(100));
            }
        }
    }

    @Test
    void mapHasAsManyRowsAsAskedFor() {
        assertThat(json("map", HOLDS, "--positions=5").get("knob")).hasSize(5);
        List<String> csv =
                CliRun.of("map", HOLDS, "--positions=5", "--csv").out().lines().toList();
        assertThat(csv).hasSize(6);
        assertThat(csv.get(0)).startsWith("knob (%),ramp resistance (ohm),delay (s),firing angle (deg)");
        assertThat(CliRun.of("map", HOLDS, "--csv").out()).contains("\r\n").doesNotContain("NaN");
    }

    @Test
    void morePowerThanTheLoadTakesIsAnsweredWithWhatItTakes() {
        CliRun run = CliRun.of("map", HOLDS, "--for-power=5kW");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("5kW", "full power is 700 W").doesNotContain("mW");
    }

    @Test
    void mapGoesBackwardsFromAngleAndPower() {
        assertThat(json("map", HOLDS, "--for-angle=60").at("/knob/0/firingDeg").doubleValue())
                .isCloseTo(60, within(1e-6));
        assertThat(json("map", HOLDS, "--for-power=300W")
                        .at("/knob/0/loadWatts")
                        .doubleValue())
                .isCloseTo(300, within(1e-5));
        assertThat(json("map", HOLDS, "--for-power=40%")
                        .at("/knob/0/powerFraction")
                        .doubleValue())
                .isCloseTo(0.4, within(1e-8));
        assertThat(json("map", HOLDS, "--for-volts=150V")
                        .at("/knob/0/loadVolts")
                        .doubleValue())
                .isCloseTo(150, within(1e-5));
    }

    @Test
    void anAngleThatIsJumpedOverIsAnsweredWithTheNearestOnEitherSide() {
        for (int degrees = 30; degrees <= 150; degrees += 10) {
            JsonNode answer = json("map", HOLDS, "--for-angle=" + degrees);
            boolean jumps = answer.get("notes").findValuesAsText("id").contains("angle-jumps");
            assertThat(answer.get("knob")).isNotEmpty();
            for (JsonNode row : answer.get("knob")) {
                assertThat(row.get("firingDeg").doubleValue()).isCloseTo(degrees, within(jumps ? 3 : 1e-6));
            }
        }
    }

    @Test
    void traceGivesColumnsOfOneLengthWithTimeNeverRunningBack() {
        JsonNode waves = json("trace", HOLDS, "--knob=50%").get("waveforms");
        int instants = waves.get("seconds").size();

        assertThat(instants).isGreaterThan(700);
        waves.forEach(column -> assertThat(column).hasSize(instants));
        for (int i = 1; i < instants; i++) {
            assertThat(waves.get("seconds").get(i).doubleValue())
                    .isGreaterThanOrEqualTo(waves.get("seconds").get(i - 1).doubleValue());
        }
        List<String> csv =
                CliRun.of("trace", HOLDS, "--knob=50%", "--csv").out().lines().toList();
        assertThat(csv).hasSize(instants + 1);
        assertThat(csv).allSatisfy(line -> assertThat(line.split(",", -1)).hasSize(waves.size()));
    }

    @Test
    void traceByAngleAndByResistanceMeetAtOnePoint() {
        double ohms = json("trace", HOLDS, "--angle=100").at("/point/rampOhms").doubleValue();

        assertThat(json("trace", HOLDS, "--resistance=" + ohms)
                        .at("/point/firingDeg")
                        .doubleValue())
                .isCloseTo(100, within(1e-6));
    }
}
