package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Part;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Trigger;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Against the 2N6027's sheet (JEDEC): its figures at 10 kilohm and 1 megohm, and the laws between and beyond. */
class ProgrammableDeviceTest {
    private static final ProgrammableUnijunction DEVICE = SampleDesigns.programmable2n6027();

    private static double offset(double gateOhms) {
        return ProgrammableDevice.offsetVolts(DEVICE, gateOhms, Characteristic::nominal);
    }

    private static double peakAmps(double gateOhms) {
        return ProgrammableDevice.amps(DEVICE.peakCurrentAmps(), gateOhms, Characteristic::nominal);
    }

    @Test
    void theSheetsPointsAreHit() {
        assertThat(offset(10e3)).isCloseTo(0.35, within(1e-12));
        assertThat(offset(1e6)).isCloseTo(0.70, within(1e-12));
        assertThat(peakAmps(10e3)).isCloseTo(4e-6, within(1e-17));
        assertThat(peakAmps(1e6)).isCloseTo(1.25e-6, within(1e-17));
        assertThat(ProgrammableDevice.offsetVolts(DEVICE, 1e6, Characteristic::highest))
                .isCloseTo(1.6, within(1e-12));
    }

    /** A hundred kilohm is half way on a logarithmic axis. */
    @Test
    void betweenThemTheOffsetIsLinearAndTheCurrentsAreAPower() {
        assertThat(offset(100e3)).isCloseTo(0.525, within(1e-12));
        assertThat(peakAmps(100e3)).isCloseTo(Math.sqrt(4 * 1.25) * 1e-6, within(1e-17));
    }

    @Test
    void beyondThemTheEndSlopesGoOn() {
        assertThat(offset(1e3)).isCloseTo(0.175, within(1e-12));
        assertThat(offset(10e6)).isCloseTo(0.875, within(1e-12));
        assertThat(peakAmps(100e6)).isCloseTo(1.25e-6 * 1.25 / 4, within(1e-17));
    }

    private static AtGateResistance at(double gateOhms, double value) {
        return new AtGateResistance(gateOhms, Characteristic.exactly(value));
    }

    /** Valley current, as the sheet has it: 1.5 mA at 200 ohm, 150 uA at 10 kilohm, 18 uA at 1 megohm. */
    @Test
    void ofThreePointsTheTwoAroundCount() {
        List<AtGateResistance> table = List.of(at(200, 1.5e-3), at(10e3, 150e-6), at(1e6, 18e-6));
        double low = ProgrammableDevice.amps(table, Math.sqrt(200 * 10e3), Characteristic::nominal);
        assertThat(low).isCloseTo(Math.sqrt(1.5e-3 * 150e-6), within(1e-15));
        assertThat(ProgrammableDevice.amps(table, 10e3, Characteristic::nominal))
                .isCloseTo(150e-6, within(1e-15));
        double high = ProgrammableDevice.amps(table, 100e3, Characteristic::nominal);
        assertThat(high).isCloseTo(Math.sqrt(150e-6 * 18e-6), within(1e-15));
        assertThat(ProgrammableDevice.amps(table, 10e6, Characteristic::nominal))
                .isCloseTo(18e-6 * Math.sqrt(18. / 150), within(1e-15));
    }

    @Test
    void aSinglePointHoldsEverywhere() {
        List<AtGateResistance> table = List.of(at(10e3, 150e-6));
        assertThat(ProgrammableDevice.amps(table, 1e6, Characteristic::nominal)).isCloseTo(150e-6, within(1e-15));
    }

    @Test
    void theGateSeesBothDividerResistorsInParallel() {
        Trigger.ProgrammableTrigger trigger =
                new Trigger.ProgrammableTrigger(DEVICE, Part.of(47), Part.of(30e3), Part.of(60e3));
        assertThat(ProgrammableDevice.gateOhms(trigger)).isCloseTo(20e3, within(1e-9));
    }

    /** V_F 0.8 V at 50 mA, of which 0.6 V are the junction's. */
    @Test
    void theOnStateIsAJunctionAndASlope() {
        assertThat(ProgrammableDevice.onOhms(0.8, 50e-3, "2n6027")).isCloseTo(4, within(1e-12));
        for (double tooLittle : new double[] {0.6, 0.5}) {
            assertThatThrownBy(() -> ProgrammableDevice.onOhms(tooLittle, 50e-3, "2n6027"))
                    .isInstanceOf(RefusedCircuit.class)
                    .hasMessageContaining("2n6027");
        }
    }
}
