package clipramp.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.TriggerDemand.Point;
import java.util.List;
import org.junit.jupiter.api.Test;

class TriggerDemandTest {
    private static final TriggerDemand ONE_POINT = new TriggerDemand(List.of(new Point(25, 0.02, 0.8)));

    @Test
    void aSinglePointGainsAVoltTowardsTheCold() {
        // Common practice: 1 V more and twice the current at -40 °C.
        assertThat(ONE_POINT.voltsAt(-40)).isCloseTo(1.8, within(1e-12));
        assertThat(ONE_POINT.ampsAt(-40)).isCloseTo(0.04, within(1e-12));
    }

    @Test
    void inTheHeatItStaysAtTheVoltageThatTriggersNoDevice() {
        // The straight line would reach -0.74 V at 125 °C; V_GD there is 0.2 V on most sheets (from memory).
        assertThat(ONE_POINT.voltsAt(125)).isEqualTo(0.2);
    }

    @Test
    void aSheetThatGivesLessIsBelieved() {
        TriggerDemand twoPoints = new TriggerDemand(List.of(new Point(25, 2e-4, 0.6), new Point(110, 1e-4, 0.15)));

        assertThat(twoPoints.voltsAt(110)).isCloseTo(0.15, within(1e-12));
        assertThat(twoPoints.voltsAt(150)).isEqualTo(0.15);
    }
}
