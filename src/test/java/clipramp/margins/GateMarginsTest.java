package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.TemperatureCurve;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** What the thyristor asks of the pulse, with the sheet's figures multiplied out by hand. */
class GateMarginsTest {
    private static final Design HEATER = SampleDesigns.heater();

    private static Margin margin(Design design, MarginKind kind) {
        return OnTheBench.of(new GateMargins(OnTheBench.usual(design)).all(), kind);
    }

    private static Margin cold(Design design, MarginKind kind) {
        return OnTheBench.of(new GateMargins(OnTheBench.at(design, 230, 0)).all(), kind);
    }

    @Test
    void thePeakAsksForOverdriveTimesTheTriggerCurrent() {
        // 3 x 10 mA at 25 °C; at 0 °C log I_GT is linear between 20 mA at -40 °C and 10 mA at 25 °C.
        Margin warm = margin(HEATER, MarginKind.GATE_PEAK_CURRENT);
        assertThat(warm.demand()).isCloseTo(30e-3, within(1e-12));
        assertThat(warm.formula()).startsWith("3 x 10 mA = 30 mA wanted").contains("V_GT 1 V at 25 °C");
        double amps = 10e-3 * Math.pow(2, 25 / 65.0);
        assertThat(cold(HEATER, MarginKind.GATE_PEAK_CURRENT).demand()).isCloseTo(3 * amps, within(1e-9));
    }

    @Test
    void theChargeAsksForTwentyMicrosecondsOfTheTriggerCurrent() {
        Margin charge = margin(HEATER, MarginKind.GATE_CHARGE);
        assertThat(charge.demand()).isCloseTo(200e-9, within(1e-15));
        assertThat(charge.formula()).startsWith("10 mA x 20 µs = 200 nC wanted");
        assertThat(charge.unit()).isEqualTo("C");
    }

    @Test
    void theTimeAsksForTheTurnOnTimeOfTheSheet() {
        Margin time = margin(HEATER, MarginKind.GATE_TIME);
        assertThat(time.demand()).isEqualTo(1.5e-6);
        assertThat(time.formula()).contains("i_G >= I_GT 10 mA for ").endsWith("t_gt 1.5 µs");
        Design unknown = Changed.with(HEATER, "thyristor.device.gate.turnOnSeconds", OptionalDouble.empty());
        Margin missing = margin(unknown, MarginKind.GATE_TIME);
        assertThat(missing.verdict()).isEqualTo(Verdict.NOT_JUDGED);
        assertThat(missing.formula()).contains("thyristor.device.gate.turn-on");
        assertThat(margin(unknown, MarginKind.GATE_CHARGE).verdict()).isEqualTo(Verdict.HOLDS);
    }

    @Test
    void whatTheShuntTakesIsSaidByOhmsLaw() {
        // V_GT over R_GK: 1 V over 1 kohm.
        assertThat(margin(HEATER, MarginKind.GATE_PEAK_CURRENT).formula()).contains("(R_GK takes 1 mA besides)");
        Design bare = Changed.with(HEATER, "gate.shunt", Optional.empty());
        assertThat(margin(bare, MarginKind.GATE_PEAK_CURRENT).formula()).doesNotContain("R_GK");
    }

    @Test
    void figuresBeyondTheSheetsPointsAreSaidToBeExtended() {
        Design triac = SampleDesigns.triacHeater();
        assertThat(cold(triac, MarginKind.GATE_PEAK_CURRENT).formula()).contains("at 0 °C (extended beyond");
        assertThat(cold(HEATER, MarginKind.GATE_PEAK_CURRENT).formula()).doesNotContain("extended");
    }

    @Test
    void theLatestPulseCountsBesideTheEarliest() {
        // Late in the half cycle the dropper brings the zener less, so the supply and with it the pulse are lower.
        Design both = HEATER.withRamp(SampleDesigns.ramp(100e-9, 30_000, 40_000));
        Design earliest = Changed.with(both, "ramp.pot", Optional.empty());
        double alone = margin(earliest, MarginKind.GATE_PEAK_CURRENT).offered();
        assertThat(margin(both, MarginKind.GATE_PEAK_CURRENT).offered()).isLessThan(alone);
        assertThat(margin(both, MarginKind.GATE_CHARGE).offered())
                .isLessThan(margin(earliest, MarginKind.GATE_CHARGE).offered());
    }

    @Test
    void withoutAPulseNothingIsOffered() {
        Design dead = Changed.with(HEATER, "clip.dropper.value", 5e6);
        Margin none = margin(dead, MarginKind.GATE_PEAK_CURRENT);
        assertThat(none.offered()).isZero();
        assertThat(none.demand()).isCloseTo(30e-3, within(1e-12));
        assertThat(none.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(none.formula()).isEqualTo("no pulse at R_E = 5.6 kΩ");
        assertThat(margin(dead, MarginKind.LATCHING_EARLIEST).formula()).isEqualTo("not judged: there is no pulse");
        assertThat(margin(dead, MarginKind.LATCHING_LATEST).formula())
                .isEqualTo("not judged: no setting fires before the supply's collapse");
    }

    @Test
    void latchingAsksForTheSheetsCurrentAndWhatTheGateCircuitBleedsAway() {
        // 0.7 V over R_GK parallel R1: 0.7/1000 + 0.7/39 = 18.65 mA beyond the sheet's 40 mA.
        Margin latching = margin(HEATER, MarginKind.LATCHING_EARLIEST);
        double bleed = 0.7 / 1000 + 0.7 / 39;
        assertThat(latching.demand()).isCloseTo(40e-3 + bleed, within(1e-9));
        assertThat(latching.formula()).contains("I_L 40 mA + " + Say.amps(bleed) + " that the gate circuit bleeds");
        assertThat(latching.formula()).doesNotContain("would need");
        // A triac's sheet current stands for itself: with a bleed of none nothing is added.
        Margin triac = margin(SampleDesigns.triacHeater(), MarginKind.LATCHING_EARLIEST);
        assertThat(triac.demand()).isCloseTo(40e-3, within(1e-12));
        assertThat(triac.formula()).contains("I_L 40 mA").doesNotContain("bleeds");
        Design unknown = Changed.with(HEATER, "thyristor.device.latching", Optional.empty());
        assertThat(margin(unknown, MarginKind.LATCHING_EARLIEST).formula())
                .isEqualTo("not judged: the profile states no thyristor.device.latching");
    }

    @Test
    void aPulseIntoAnInductanceIsToldHowLongItWouldHaveToLast() {
        Design coil = SampleDesigns.triacHeater().withLoad(new Load.Inductive(40, 5, Optional.empty()));
        assertThat(margin(coil, MarginKind.LATCHING_EARLIEST).formula())
                .contains("; the pulse lasts ")
                .contains(" and would need ");
        Design never = SampleDesigns.triacHeater().withLoad(new Load.Inductive(40, 500, Optional.empty()));
        assertThat(margin(never, MarginKind.LATCHING_EARLIEST).formula())
                .endsWith("; the load never takes that much when fired there");
    }

    @Test
    void latchingIsWorstWhereTheCurveIsHighest() {
        TemperatureCurve curve = new TemperatureCurve(
                List.of(new TemperatureCurve.Point(-40, 60e-3), new TemperatureCurve.Point(25, 40e-3)));
        double bleed = 0.7 / 1000 + 0.7 / 39;
        assertThat(cold(HEATER, MarginKind.LATCHING_EARLIEST).demand())
                .isCloseTo(curve.ampsAt(0) + bleed, within(1e-9));
        assertThat(curve.ampsAt(0)).isBetween(45e-3, 49e-3);
    }

    @Test
    void anScrWantsAPositivePulse() {
        assertThat(margin(HEATER, MarginKind.GATE_POLARITY).verdict()).isEqualTo(Verdict.HOLDS);
        Margin wrong = margin(Changed.with(HEATER, "gate.polarity", Polarity.NEGATIVE), MarginKind.GATE_POLARITY);
        assertThat(wrong.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(wrong.formula()).isEqualTo("negative pulse into an SCR, which needs a positive one");
    }

    @Test
    void aTriacNamesTheQuadrantsThatThePulseUses() {
        // IEC 60747-6: a positive pulse is I+ in one half cycle and III+ in the other, a negative one I- and III-.
        Design triac = SampleDesigns.triacHeater();
        assertThat(margin(triac, MarginKind.GATE_POLARITY).formula())
                .isEqualTo("positive pulse: quadrants I+ and III+, both specified");
        Margin negative = margin(Changed.with(triac, "gate.polarity", Polarity.NEGATIVE), MarginKind.GATE_POLARITY);
        assertThat(negative.formula()).contains("I-").contains("III-").endsWith("both specified");
        Margin none =
                margin(Changed.with(triac, "thyristor.device.gate.quadrants", Map.of()), MarginKind.GATE_POLARITY);
        assertThat(none.offered()).isEqualTo(2);
        assertThat(none.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(none.formula()).endsWith("not specified: I+ and III+");
    }
}
