package clipramp.gate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.TriggerDemand;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class GateTest {
    private static final Condition NOMINAL = new Condition(230, 50, 25);

    @Test
    void bimbhraExample4Point4WhereALoadLineGivesTheGateItsPower() {
        // Bimbhra, Power Electronics, example 4.4: 15 V, load line of 120 V/A, 0.4 W.
        double smaller = GatePower.ampsAtPower(15, -120, 0.4).orElseThrow();
        assertThat(smaller).isCloseTo(38.56e-3, within(5e-6));
        assertThat(15 - 120 * smaller).isCloseTo(10.37, within(5e-3));
        double larger = 0.4 / (120 * smaller);
        assertThat(larger).isCloseTo(86.44e-3, within(5e-6));
        assertThat(15 - 120 * larger).isCloseTo(4.628, within(2e-3));
        // Maximum power transfer: E²/(4 R) at E/(2 R), and never more.
        assertThat(GatePower.ampsAtPower(4, -1, 4)).hasValue(2);
        assertThat(GatePower.ampsAtPower(4, -1, 4.001)).isEmpty();
    }

    @Test
    void bimbhraExample4Point5SeriesResistanceAndPulseRate() {
        // Bimbhra, Power Electronics, example 4.5: v = 1 + 10 i, 5 W peak for 20 us, 0.3 W mean, 15 V; 11.248 ohm, 3
        // kHz.
        double amps = GatePower.ampsAtPower(1, 10, 5).orElseThrow();
        assertThat((15 - (1 + 10 * amps)) / amps).isCloseTo(11.248, within(1e-3));
        OptionalDouble any = OptionalDouble.empty();
        GateLimits limits =
                new GateLimits(any, any, any, OptionalDouble.of(5), OptionalDouble.of(20e-6), OptionalDouble.of(0.3));
        // The energy of 20 us at 5 W spread over a period of 3 kHz is the mean rating, over less it is more.
        assertThat(GatePower.allowedPeakWatts(limits, 1 / 3000.).orElseThrow()).isCloseTo(0.3, within(1e-9));
        assertThat(GatePower.allowedPeakWatts(limits, 1 / 3100.).orElseThrow()).isCloseTo(0.31, within(1e-9));
    }

    @Test
    void peakPowerBeyondItsPulseLengthIsThatOfEqualEnergyAndNeverUnderTheMean() {
        GateLimits limits = SampleDesigns.scr16Amps().gate().limits();
        assertThat(GatePower.allowedPeakWatts(limits, 0.5e-6)).hasValue(20);
        assertThat(GatePower.allowedPeakWatts(limits, 4e-6)).hasValue(5);
        assertThat(GatePower.allowedPeakWatts(limits, 1e-3)).hasValue(0.5);
    }

    @Test
    void meanGatePowerIsTheEnergyOfAllPulsesOverTime() {
        // Two ways apart: pulses as measured one by one, and the piecewise integral over the whole period.
        Solution solution = Firing.solve(SampleDesigns.heater(), NOMINAL, 20_000);
        Dissipation bears = Firing.dissipation(SampleDesigns.heater(), NOMINAL, 20_000);
        assertThat(GatePower.meanWatts(solution)).isCloseTo(bears.gateWatts(), within(1e-6 * bears.gateWatts()));
    }

    @Test
    void triggerDataOf2N6071AByQuadrantAndTemperature() {
        // 2N6071A sheet: 5/5/5/10 mA at 25 degC, 20/20/20/30 mA at -40 degC, I+ I- III- III+.
        Design design = SampleDesigns.triacHeater();
        var at = java.util.Map.of(
                Quadrant.I_PLUS, demand(5e-3, 20e-3),
                Quadrant.I_MINUS, demand(5e-3, 20e-3),
                Quadrant.III_MINUS, demand(5e-3, 20e-3),
                Quadrant.III_PLUS, demand(10e-3, 30e-3));
        Design triac = Changed.with(design, "thyristor.device.gate.quadrants", at);
        TriggerNeed positive = TriggerNeed.of(triac, 25);
        assertThat(positive.amps()).isEqualTo(10e-3);
        assertThat(positive.used()).containsExactly(Quadrant.I_PLUS, Quadrant.III_PLUS);
        assertThat(positive.extended()).isFalse();
        TriggerNeed negative = TriggerNeed.of(Changed.with(triac, "gate.polarity", Polarity.NEGATIVE), -40);
        assertThat(negative.amps()).isCloseTo(20e-3, within(1e-15));
        assertThat(negative.used()).containsExactly(Quadrant.I_MINUS, Quadrant.III_MINUS);
        assertThat(TriggerNeed.of(triac, -50).extended()).isTrue();
    }

    private static TriggerDemand demand(double warmAmps, double coldAmps) {
        return new TriggerDemand(
                List.of(new TriggerDemand.Point(-40, coldAmps, 2.5), new TriggerDemand.Point(25, warmAmps, 2.5)));
    }

    @Test
    void aGateHeldAtAVoltageStaysThere() {
        Design held = WeakestPulse.intoGateHeldAt(SampleDesigns.heater(), 1.2);
        Pulse pulse = Firing.solve(held, NOMINAL, 40_000).shown().pulses().get(0);
        assertThat(pulse.peakGateVolts()).isCloseTo(1.2, within(0.01));
    }

    @Test
    void theWeakestDeviceGivesItsSheetsSmallestBaseOnePulse() {
        // 2N2646's own test circuit: 20 V, 0.2 uF, 20 ohm at base one; V_OB1 3 V minimum, 5 V typical (from memory).
        assertThat(testCircuit(SampleDesigns.heater())).isCloseTo(5, within(0.05));
        assertThat(testCircuit(WeakestPulse.withWeakestDevice(SampleDesigns.heater())))
                .isCloseTo(3, within(0.05));
    }

    /** Base-one pulse at 20 V, 0.2 uF, 20 ohm with the gate as good as absent. */
    private static double testCircuit(Design design) {
        Design bench = Changed.with(design, "trigger.baseOne.value", 20.0);
        bench = Changed.with(bench, "trigger.baseTwo.value", 0.0);
        bench = Changed.with(bench, "ramp.capacitor.value", 0.2e-6);
        bench = Changed.with(bench, "gate.shunt", java.util.Optional.empty());
        bench = Changed.with(bench, "gate.series.value", 1e6);
        bench = Changed.with(bench, "clip.zener.slopeOhms", 0.1);
        return Firing.solve(bench, NOMINAL, 20_000).shown().pulses().get(0).peakBaseOneVolts();
    }

    @Test
    void standingVoltageIsTheBaseBarsDividerAtItsHighest() {
        // By hand, 25 degC: zener 21 V at 12.5 mA and 22 ohm, R_BB 4.7 k, R1p = 39 || 1000, R2 470.
        Design heater = SampleDesigns.heater();
        StandingVoltage standing = StandingVoltage.of(heater, NOMINAL);
        double base = 39.0 * 1000 / 1039;
        double bar = 470 + 4700 + base;
        double knee = 21 - 22 * 12.5e-3;
        double source = Math.sqrt(2) * 230 - 1.4;
        double supply = (source / 10_000 + knee / 22) / (1.0 / 10_000 + 1.0 / 22 + 1 / bar);
        assertThat(standing.volts()).isCloseTo(supply * base / bar, within(1e-12));
        assertThat(StandingVoltage.of(SampleDesigns.inverseParallelHeater(), NOMINAL)
                        .volts())
                .isZero();
        assertThat(StandingVoltage.of(SampleDesigns.programmableHeater(), NOMINAL)
                        .volts())
                .isZero();
    }

    @Test
    void theStandingVoltageBoundsWhatTheEngineSeesBetweenPulses() {
        Design heater = SampleDesigns.heater();
        double[] volts = Firing.waveforms(heater, NOMINAL, 60_000, 400).gateVolts();
        double[] base = Firing.waveforms(heater, NOMINAL, 60_000, 400).emitterAmps();
        double highest = 0;
        for (int i = 0; i < volts.length; i++) {
            highest = base[i] == 0 ? Math.max(highest, volts[i]) : highest;
        }
        assertThat(highest)
                .isPositive()
                .isLessThan(StandingVoltage.of(heater, NOMINAL).volts());
    }

    @Test
    void theGateCircuitRaisesLatchingCurrentByWhatItBleedsAway() {
        // 0.7 V over 1 k parallel (0 + 39) ohm.
        double bleed = 0.7 * (1 / 39.0 + 1 / 1000.0);
        assertThat(LatchingNeed.bleedAmps(SampleDesigns.heater())).isCloseTo(bleed, within(1e-12));
        assertThat(LatchingNeed.latchingAmps(SampleDesigns.heater(), 25).getAsDouble())
                .isCloseTo(40e-3 + bleed, within(1e-12));
        Design unknown = Changed.with(SampleDesigns.heater(), "thyristor.device.latching", java.util.Optional.empty());
        assertThat(LatchingNeed.latchingAmps(unknown, 25)).isEqualTo(OptionalDouble.empty());
    }
}
