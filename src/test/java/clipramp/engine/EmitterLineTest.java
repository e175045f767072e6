package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.SampleDesigns;
import org.junit.jupiter.api.Test;

/**
 * The saturated line of a 2N2646 (JEDEC sheet: V_EB1(sat) 3.5 V at 50 mA and 10 V, I_V 6 mA and V_OB1 5 V in its circuit of
 * 20 V and 20 ohm; V_V 2 V is common practice) against the points that it must go through.
 */
class EmitterLineTest {
    private static UnitValues unit() {
        return UnitValues.nominal(SampleDesigns.heater());
    }

    /** V_EB1 on the line at a current and a supply: V_D + xi V_S + r_on I. */
    private static double volts(UnitValues unit, double slope, double amps, double supply) {
        return unit.emitterDropVolts + EmitterLine.intercept(unit, slope) * supply + slope * amps;
    }

    @Test
    void throughTheSaturationPointWhereTheSheetGivesNoPulse() {
        UnitValues unit = unit();
        unit.baseOnePulseVolts = Double.NaN;
        double slope = EmitterLine.slopeOhms(unit);
        assertThat(volts(unit, slope, 50e-3, 10)).isCloseTo(3.5, within(1e-12));
        assertThat(volts(unit, slope, 6e-3, 20)).isCloseTo(2, within(1e-12));
    }

    /** At the instant of firing the capacitor stands at the peak point of the test circuit; base one's currents balance. */
    @Test
    void reproducesTheBaseOnePulseOfTheTestCircuit() {
        UnitValues unit = unit();
        double slope = EmitterLine.slopeOhms(unit);
        assertThat(volts(unit, slope, 6e-3, 20)).as("the valley point").isCloseTo(2, within(1e-12));
        double peak = 20 * (20 + 0.655 * 7000) / (20 + 7000) + 0.47;
        double emitter = (peak - 5 - 0.47 - EmitterLine.intercept(unit, slope) * 20) / slope;
        double baseTwo = (20 - 5) / (10 / 15e-3);
        assertThat(emitter + baseTwo).isCloseTo(5.0 / 20, within(1e-12));
    }

    @Test
    void theModulatedInterbaseResistanceIsTheSheetsOrTheUpperBar() {
        UnitValues unit = unit();
        assertThat(unit.modulatedOhms(7000)).isCloseTo(666.667, within(1e-3));
        unit.modulatedAmps = Double.NaN;
        assertThat(unit.modulatedOhms(8000)).isCloseTo(0.345 * 8000, within(1e-9));
        double slope = EmitterLine.slopeOhms(unit);
        double peak = 20 * (20 + 0.655 * 7000) / (20 + 7000) + 0.47;
        double emitter = (peak - 5 - 0.47 - EmitterLine.intercept(unit, slope) * 20) / slope;
        assertThat(emitter + 15 / (0.345 * 7000)).isCloseTo(5.0 / 20, within(1e-12));
    }

    @Test
    void aLineThatDoesNotRiseIsRefusedByName() {
        UnitValues level = unit();
        level.baseOnePulseVolts = Double.NaN;
        level.valleyVolts = 0.47;
        level.saturationVolts = 0.47;
        assertThatThrownBy(() -> EmitterLine.slopeOhms(level))
                .isInstanceOf(RefusedCircuit.class)
                .hasMessageContaining("2n2646")
                .hasMessageContaining("must rise");
        UnitValues falling = unit();
        falling.baseOnePulseVolts = Double.NaN;
        falling.saturationVolts = 0.5;
        assertThatThrownBy(() -> EmitterLine.slopeOhms(falling)).isInstanceOf(RefusedCircuit.class);
        UnitValues upright = unit();
        upright.baseOnePulseVolts = Double.NaN;
        upright.valleyAmps = 0.1;
        assertThatThrownBy(() -> EmitterLine.slopeOhms(upright)).isInstanceOf(RefusedCircuit.class);
    }
}
