package clipramp.gate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Part;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.ThyristorDevice.GateLimits;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.TriggerDemand;
import clipramp.circuit.Unijunction.BaseOnePulse;
import clipramp.circuit.Winding;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The gate's figures where a part is absent, a limit is just met or the condition is not the nominal one. */
class GateEdgesTest {
    private static final Condition NOMINAL = new Condition(230, 50, 25);

    @ParameterizedTest
    @ValueSource(doubles = {4, 18, 24, 230})
    void theStandingSupplyKeepsKirchhoffsCurrentLawClippedOrNot(double secondaryVolts) {
        // Charges are conserved at the supply's node: what the dropper brings, zener and base bar take.
        Design design = Changed.with(
                SampleDesigns.heater(), "clip.winding", Optional.of(new Winding(230, secondaryVolts, false, 0)));
        Condition hot = new Condition(253, 50, 85);
        StandingVoltage standing = StandingVoltage.of(design, hot);
        double source = Math.sqrt(2) * 253 * secondaryVolts / 230 - 2 * 0.7;
        double knee = 21 * (1 + 0.85e-3 * 60) - 22 * 12.5e-3;
        double dropper = (source - standing.supplyVolts()) / 10_000;
        double zener = Math.max(0, (standing.supplyVolts() - knee) / 22);
        double bar = standing.supplyVolts() / (470 + standing.interbaseOhms() + standing.baseOneOhms());
        assertThat(dropper).isPositive().isCloseTo(zener + bar, within(1e-12));
        assertThat(zener > 0).isEqualTo(secondaryVolts > 100);
    }

    @Test
    void theBaseBarOfAStandingVoltageDriftsWithHeat() {
        // 2N2646: 4.7 k at least, and 0.5 %/K over 60 K make 1.3 times that.
        StandingVoltage hot = StandingVoltage.of(SampleDesigns.heater(), new Condition(230, 50, 85));
        assertThat(hot.interbaseOhms()).isCloseTo(4700 * 1.3, within(1e-9));
        assertThat(hot.volts())
                .isLessThan(StandingVoltage.of(SampleDesigns.heater(), NOMINAL).volts());
    }

    @Test
    void withoutAShuntTheGateSeesAllOfBaseOne() {
        Design bare = Changed.with(SampleDesigns.heater(), "gate.shunt", Optional.empty());
        bare = Changed.with(bare, "gate.series", Part.of(33));
        StandingVoltage standing = StandingVoltage.of(bare, NOMINAL);
        assertThat(standing.baseOneOhms()).isCloseTo(39, within(1e-12));
        assertThat(standing.volts()).isCloseTo(standing.supplyVolts() * 39 / (470 + 4700 + 39), within(1e-12));
        // With one, R_G and R_GK divide it: 33 to 1000 ohm.
        Design divided = Changed.with(SampleDesigns.heater(), "gate.series", Part.of(33));
        StandingVoltage less = StandingVoltage.of(divided, NOMINAL);
        double base = 39.0 * 1033 / 1072;
        assertThat(less.baseOneOhms()).isCloseTo(base, within(1e-12));
        assertThat(less.volts())
                .isCloseTo(less.supplyVolts() * base / (470 + 4700 + base) * 1000 / 1033, within(1e-12));
    }

    @Test
    void aLineTooLowForTheRectifierLeavesNothingStanding() {
        Design low = Changed.with(SampleDesigns.heater(), "clip.winding", Optional.of(new Winding(230, 0.5, false, 0)));
        assertThat(StandingVoltage.of(low, NOMINAL).volts()).isZero();
    }

    @Test
    void theEquivalentWidthOfAPulseTimesItsPeakPowerIsItsEnergy() {
        Pulse pulse = Firing.solve(SampleDesigns.heater(), NOMINAL, 20_000)
                .shown()
                .pulses()
                .get(0);
        double width = GatePower.equivalentSeconds(pulse);
        assertThat(width * pulse.peakGateWatts())
                .isCloseTo(pulse.gateJoules(), within(1e-12 * pulse.gateJoules()))
                .isPositive();
        // A pulse cannot hold more energy than its peak power over its whole length.
        assertThat(width).isLessThan(pulse.endSeconds() - pulse.startSeconds());
        Pulse powerless = Changed.with(Changed.with(pulse, "peakGateWatts", 0.0), "gateJoules", 0.0);
        assertThat(GatePower.equivalentSeconds(powerless)).isZero();
    }

    @Test
    void withoutAStatedLengthOrRatingPeakPowerIsNotShortenedOrNotJudged() {
        GateLimits limits = SampleDesigns.scr16Amps().gate().limits();
        GateLimits anyLength = Changed.with(limits, "peakWattsForSeconds", OptionalDouble.empty());
        assertThat(GatePower.allowedPeakWatts(anyLength, 1)).hasValue(20);
        GateLimits unstated = Changed.with(limits, "peakWatts", OptionalDouble.empty());
        assertThat(GatePower.allowedPeakWatts(unstated, 1e-6)).isEmpty();
        // A mean rating above the peak one, a slip of a sheet, never allows more than the peak.
        GateLimits slip = Changed.with(limits, "meanWatts", OptionalDouble.of(50));
        assertThat(GatePower.allowedPeakWatts(slip, 1e-3)).hasValue(20);
    }

    @Test
    void aTriacsNeedIsThatOfTheWorseQuadrantInVoltsToo() {
        Design triac = Changed.with(
                SampleDesigns.triacHeater(),
                "thyristor.device.gate.quadrants",
                Map.of(
                        Quadrant.I_PLUS, at25(10e-3, 1.1),
                        Quadrant.I_MINUS, at25(12e-3, 1.5),
                        Quadrant.III_PLUS, at25(30e-3, 1.4)));
        TriggerNeed positive = TriggerNeed.of(triac, 25);
        assertThat(positive.volts()).isEqualTo(1.4);
        assertThat(positive.amps()).isEqualTo(30e-3);
        assertThat(positive.missing()).isEmpty();
        TriggerNeed negative = TriggerNeed.of(Changed.with(triac, "gate.polarity", Polarity.NEGATIVE), 25);
        assertThat(negative.missing()).containsExactly(Quadrant.III_MINUS);
        assertThat(negative.volts()).isEqualTo(1.5);
    }

    @Test
    void anScrUsesNoQuadrantAndItsOwnTriggerVoltage() {
        // The sample's sheet points: 1.5 V at -40 °C, 1 V at 25 °C, a straight line between.
        TriggerNeed need = TriggerNeed.of(SampleDesigns.heater(), -7.5);
        assertThat(need.used()).isEmpty();
        assertThat(need.missing()).isEmpty();
        assertThat(need.volts()).isCloseTo(1.25, within(1e-12));
        assertThat(need.celsius()).isEqualTo(-7.5);
    }

    private static TriggerDemand at25(double amps, double volts) {
        return new TriggerDemand(List.of(new TriggerDemand.Point(25, amps, volts)));
    }

    @Test
    void aDeviceWhoseSheetGivesNoSmallestPulseStaysAsItIs() {
        Design typical = Changed.with(
                SampleDesigns.heater(),
                "trigger.device.baseOnePulse",
                Optional.of(new BaseOnePulse(OptionalDouble.empty(), OptionalDouble.of(5), 20, 0.2e-6, 20)));
        assertThat(WeakestPulse.withWeakestDevice(typical)).isSameAs(typical);
        Design unknown = Changed.with(SampleDesigns.heater(), "trigger.device.baseOnePulse", Optional.empty());
        assertThat(WeakestPulse.withWeakestDevice(unknown)).isSameAs(unknown);
    }

    @Test
    void aProgrammableDeviceOfTheLargestForwardVoltageGivesTheSmallerPulse() {
        Design nominal = SampleDesigns.programmableHeater();
        double usual = firstPulse(nominal).peakBaseOneVolts();
        double weakest = firstPulse(WeakestPulse.withWeakestDevice(nominal)).peakBaseOneVolts();
        assertThat(weakest).isPositive().isLessThan(usual);
    }

    private static Pulse firstPulse(Design design) {
        return Firing.solve(design, NOMINAL, 40_000).shown().pulses().get(0);
    }

    @Test
    void holdingCurrentIsTheSheetsWithoutWhatTheGateCircuitBleedsAway() {
        Design heater = SampleDesigns.heater();
        assertThat(LatchingNeed.sheetHoldingAmps(heater, 25)).hasValue(30e-3);
        Design unknown = Changed.with(heater, "thyristor.device.holding", Optional.empty());
        assertThat(LatchingNeed.sheetHoldingAmps(unknown, 25)).isEmpty();
    }
}
