package clipramp.firing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The engine against the solved circuits of reference-cases.json (how they were made stands beside them). */
class ReferenceCasesTest {
    static List<ReferenceCases.Row> rows() {
        return ReferenceCases.rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyHalfCycleIsAsSolvedByBruteForce(ReferenceCases.Row row) {
        Solution solution = Firing.solve(row.design(), row.design().nominalCondition(), row.rampOhms());
        assertThat(solution.hunts()).isEqualTo(row.hunts());
        assertThat(solution.halves()).hasSameSizeAs(row.halves());
        List<HalfCycle> halves = solution.halves().stream()
                .sorted(Comparator.comparingDouble(half -> half.pulses().get(0).startRad()))
                .toList();
        List<JsonNode> expected = row.halves().stream()
                .sorted(Comparator.comparingDouble(half -> half.get("firingDeg").asDouble()))
                .toList();
        for (int i = 0; i < halves.size(); i++) {
            agrees(halves.get(i), expected.get(i));
        }
    }

    private static void agrees(HalfCycle half, JsonNode want) {
        Pulse first = half.pulses().get(0);
        assertThat(Math.toDegrees(first.startRad()))
                .isCloseTo(want.get("firingDeg").asDouble(), within(0.001));
        assertThat(half.startVolts()).isCloseTo(want.get("residualVolts").asDouble(), within(1e-4));
        assertThat(first.supplyVolts()).isCloseTo(want.get("supplyVolts").asDouble(), within(1e-4));
        assertThat(first.peakPointVolts()).isCloseTo(want.get("peakPointVolts").asDouble(), within(1e-4));
        assertThat(half.stalled()).isEqualTo(want.get("stalled").asBoolean());
        assertThat(first.endPulse()).isEqualTo(want.get("endPulse").asBoolean());
        assertThat(half.pulses()).hasSize(want.get("pulses").asInt());
        relative(first.gateJoules(), want, "gateJoules", 0.001);
        relative(first.gateCoulombs(), want, "gateCoulombs", 0.001);
        relative(first.peakGateAmps(), want, "peakGateAmps", 0.005);
        relative(first.peakGateVolts(), want, "peakGateVolts", 0.005);
        relative(first.peakBaseOneVolts(), want, "peakBaseOneVolts", 0.005);
    }

    private static void relative(double found, JsonNode want, String key, double tolerance) {
        double value = want.get(key).asDouble();
        assertThat(found).as(key).isCloseTo(value, within(tolerance * value));
    }

    /** Tighter, where the solved circuits are that good: they stand on no hold, and peaks are left out. */
    @ParameterizedTest
    @MethodSource("rows")
    void firesWithinMillionthsOfADegreeWhereNothingIsHeld(ReferenceCases.Row row) {
        Solution solution = Firing.solve(row.design(), row.design().nominalCondition(), row.rampOhms());
        for (JsonNode want : row.halves()) {
            if (want.get("stalled").asBoolean()) {
                continue;
            }
            assertThat(solution.halves()).anySatisfy(half -> {
                Pulse first = half.pulses().get(0);
                assertThat(Math.toDegrees(first.startRad()))
                        .isCloseTo(want.get("firingDeg").asDouble(), within(1e-6));
                assertThat(half.startVolts())
                        .isCloseTo(want.get("residualVolts").asDouble(), within(1e-6));
                relative(first.gateJoules(), want, "gateJoules", 2e-5);
                relative(first.gateCoulombs(), want, "gateCoulombs", 2e-5);
            });
        }
    }
}
