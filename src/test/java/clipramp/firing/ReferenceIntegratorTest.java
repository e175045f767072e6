package clipramp.firing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.firing.ReferenceHalf.Periodic;
import clipramp.firing.ReferenceHalf.Settling;
import com.fasterxml.jackson.databind.JsonNode;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The integrator itself against the solved circuits, at the accuracy that those claim for themselves. */
class ReferenceIntegratorTest {
    static List<ReferenceCases.Row> rows() {
        return ReferenceCases.rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void agreesWithTheSolvedCircuits(ReferenceCases.Row row) {
        Periodic periodic = ReferenceIntegrator.solve(row.design(), row.design().nominalCondition(), row.rampOhms());
        assertThat(periodic.settling()).isEqualTo(row.hunts() ? Settling.HUNTS : Settling.STEADY);
        List<ReferenceHalf> halves = periodic.halves().stream()
                .sorted(Comparator.comparingDouble(h -> h.pulses().get(0).startRad()))
                .toList();
        List<JsonNode> expected = row.halves().stream()
                .sorted(Comparator.comparingDouble(n -> n.get("firingDeg").asDouble()))
                .toList();
        for (int i = 0; i < expected.size(); i++) {
            JsonNode want = expected.get(i);
            ReferenceHalf half = halves.get(i);
            Pulse first = half.pulses().get(0);
            // Held rows: the solved circuits leave a hold up to 1e-9 s before the zener stops, where the emitter
            // current
            // jumps (0.1 microvolt above the zener's foot); no second solver checked those rows.
            double degrees = half.stalled() ? 2e-5 : 1e-6;
            assertThat(Math.toDegrees(first.startRad()))
                    .isCloseTo(want.get("firingDeg").asDouble(), within(degrees));
            assertThat(half.startVolts()).isCloseTo(want.get("residualVolts").asDouble(), within(1e-6));
            assertThat(first.supplyVolts()).isCloseTo(want.get("supplyVolts").asDouble(), within(1e-6));
            assertThat(first.peakPointVolts())
                    .isCloseTo(want.get("peakPointVolts").asDouble(), within(1e-6));
            assertThat(half.stalled()).isEqualTo(want.get("stalled").asBoolean());
            assertThat(first.endPulse()).isEqualTo(want.get("endPulse").asBoolean());
            assertThat(half.pulses()).hasSize(want.get("pulses").asInt());
            relative(first.gateJoules(), want, "gateJoules", 2e-5);
            relative(first.gateCoulombs(), want, "gateCoulombs", 2e-5);
            relative(first.peakGateAmps(), want, "peakGateAmps", 2e-3);
            relative(first.peakGateVolts(), want, "peakGateVolts", 2e-3);
            relative(first.peakBaseOneVolts(), want, "peakBaseOneVolts", 2e-3);
        }
    }

    private static void relative(double found, JsonNode want, String key, double tolerance) {
        double value = want.get(key).asDouble();
        assertThat(found).as(key).isCloseTo(value, within(tolerance * value));
    }
}
