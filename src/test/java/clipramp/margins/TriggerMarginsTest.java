package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The trigger device against the sheets of 2N2646 and 2N6027, and resistors, capacitor and zener against their ratings. */
class TriggerMarginsTest {
    private static final Design HEATER = SampleDesigns.heater();
    private static final Design PROGRAMMABLE = SampleDesigns.programmableHeater();
    private static final String LIMITS = "trigger.device.limits.";

    private static Margin margin(Design design, MarginKind kind) {
        return margin(design, kind, 25);
    }

    private static Margin margin(Design design, MarginKind kind, double celsius) {
        return OnTheBench.of(new TriggerMargins(OnTheBench.at(design, 230, celsius)).all(), kind);
    }

    private static Margin part(Design design, MarginKind kind) {
        return OnTheBench.of(new PartMargins(OnTheBench.usual(design)).all(), kind);
    }

    /** The larger of what a figure comes to at both ends of the knob. */
    private static double hardest(Design design, ToDoubleFunction<Dissipation> figure) {
        return Math.max(
                figure.applyAsDouble(Firing.dissipation(
                        design, OnTheBench.USUAL, design.ramp().rampOhms(0))),
                figure.applyAsDouble(Firing.dissipation(
                        design, OnTheBench.USUAL, design.ramp().rampOhms(1))));
    }

    @ParameterizedTest
    @CsvSource({"0,0.3,0 K", "25,0.3,0 K", "50,0.225,25 K", "85,0.12,60 K"})
    void powerIsDeratedByThreeMilliwattsAKelvinAboveTwentyFiveDegrees(double celsius, double allowed, String warmth) {
        // 2N2646: 300 mW, 3 mW/K; below 25 °C the sheet allows no more.
        Margin power = margin(HEATER, MarginKind.TRIGGER_POWER, celsius);
        assertThat(power.demand()).isCloseTo(allowed, within(1e-12));
        assertThat(power.formula()).contains("300 mW - 3 mW/K x " + warmth).endsWith("= " + Say.watts(allowed));
        Condition condition = new Condition(230, 50, celsius);
        double most = Math.max(
                Firing.dissipation(HEATER, condition, 5_600).deviceWatts(),
                Firing.dissipation(HEATER, condition, 73_600).deviceWatts());
        assertThat(power.offered()).isCloseTo(most, within(1e-12));
    }

    @Test
    void whatTheProfileDoesNotStateIsNamedByItsKey() {
        for (String[] missing : new String[][] {
            {"watts", "TRIGGER_POWER", "power"},
            {"deratingWattsPerKelvin", "TRIGGER_POWER", "derating"},
            {"capacitorFarads", "EMITTER_CAPACITOR", "capacitor"},
            {"interbaseVolts", "INTERBASE_VOLTAGE", "interbase"},
            {"emitterPeakAmps", "EMITTER_PEAK_CURRENT", "emitter-peak"},
            {"emitterRmsAmps", "EMITTER_RMS_CURRENT", "emitter-rms"},
            {"emitterReverseVolts", "EMITTER_REVERSE_VOLTAGE", "emitter-reverse"},
        }) {
            Design design = Changed.with(HEATER, LIMITS + missing[0], OptionalDouble.empty());
            Margin margin = margin(design, MarginKind.valueOf(missing[1]));
            assertThat(margin.verdict()).isEqualTo(Verdict.NOT_JUDGED);
            assertThat(margin.formula())
                    .isEqualTo("not judged: the profile states no trigger.device.limits." + missing[2]);
        }
        for (String[] missing : new String[][] {
            {"watts", "TRIGGER_POWER", "power"},
            {"dischargeJoules", "EMITTER_CAPACITOR", "discharge-energy"},
            {"peakAmps", "EMITTER_PEAK_CURRENT", "peak"},
            {"meanAmps", "EMITTER_RMS_CURRENT", "mean"},
            {"anodeVolts", "EMITTER_REVERSE_VOLTAGE", "anode"},
        }) {
            Design design = Changed.with(PROGRAMMABLE, LIMITS + missing[0], OptionalDouble.empty());
            assertThat(margin(design, MarginKind.valueOf(missing[1])).formula())
                    .isEqualTo("not judged: the profile states no trigger.device.limits." + missing[2]);
        }
    }

    @Test
    void aCapacitorIsAllowedUpToItsValueAndOnlyUpToItsVoltage() {
        // 2N2646: 10 uF at up to 30 V; the emitter peaks at some 13 V here.
        Margin allowed = margin(HEATER, MarginKind.EMITTER_CAPACITOR);
        assertThat(allowed.demand()).isEqualTo(10e-6);
        assertThat(allowed.offered()).isEqualTo(100e-9);
        assertThat(allowed.formula()).startsWith("100 nF charged to ").endsWith("against 10 µF at up to 30 V");
        double peak = hardest(HEATER, Dissipation::capacitorVolts);
        Design exact = Changed.with(HEATER, LIMITS + "capacitorVolts", OptionalDouble.of(peak));
        assertThat(margin(exact, MarginKind.EMITTER_CAPACITOR).demand()).isEqualTo(10e-6);
        Design under = Changed.with(HEATER, LIMITS + "capacitorVolts", OptionalDouble.of(Math.nextDown(peak)));
        assertThat(margin(under, MarginKind.EMITTER_CAPACITOR).verdict()).isEqualTo(Verdict.FAILS);
        Design any = Changed.with(HEATER, LIMITS + "capacitorVolts", OptionalDouble.empty());
        assertThat(margin(any, MarginKind.EMITTER_CAPACITOR).formula()).endsWith("against 10 µF");
    }

    @Test
    void aProgrammableDeviceIsAllowedTheCapacitorThatHoldsItsDischargeEnergy() {
        // 2N6027: 250 uJ; C = 2 W/V².
        double volts = hardest(PROGRAMMABLE, Dissipation::capacitorVolts);
        Margin allowed = margin(PROGRAMMABLE, MarginKind.EMITTER_CAPACITOR);
        assertThat(allowed.demand()).isCloseTo(2 * 250e-6 / (volts * volts), within(1e-12));
        assertThat(allowed.offered()).isEqualTo(100e-9);
        assertThat(allowed.formula())
                .contains("holds " + Say.joules(100e-9 * volts * volts / 2))
                .endsWith("allowed 250 µJ");
        assertThat(allowed.verdict()).isEqualTo(Verdict.HOLDS);
        assertThat(new TriggerMargins(OnTheBench.usual(PROGRAMMABLE)).all())
                .extracting(Margin::kind)
                .doesNotContain(MarginKind.INTERBASE_VOLTAGE);
    }

    @Test
    void peaksAreThoseOfTheHarderEndOfTheKnob() {
        assertThat(margin(HEATER, MarginKind.EMITTER_RMS_CURRENT).offered())
                .isCloseTo(hardest(HEATER, Dissipation::emitterRmsAmps), within(1e-15));
        assertThat(margin(HEATER, MarginKind.EMITTER_REVERSE_VOLTAGE).offered())
                .isCloseTo(hardest(HEATER, Dissipation::emitterReverseVolts), within(1e-12));
        assertThat(margin(HEATER, MarginKind.INTERBASE_VOLTAGE).demand()).isEqualTo(35);
        assertThat(margin(HEATER, MarginKind.EMITTER_PEAK_CURRENT).demand()).isEqualTo(2);
        assertThat(margin(PROGRAMMABLE, MarginKind.EMITTER_PEAK_CURRENT).demand())
                .isEqualTo(2);
        assertThat(margin(PROGRAMMABLE, MarginKind.EMITTER_RMS_CURRENT).demand())
                .isEqualTo(0.15);
        assertThat(margin(PROGRAMMABLE, MarginKind.EMITTER_REVERSE_VOLTAGE).demand())
                .isEqualTo(40);
    }

    @Test
    void resistorsAreUsedAtHalfTheirRatingAndOthersAtTheWhole() {
        // Common practice: half; the dropper of the heater is rated 20 W and 500 V, its zener 1 W, its capacitor 100 V.
        assertThat(part(HEATER, MarginKind.DROPPER_POWER).demand()).isEqualTo(10);
        assertThat(part(HEATER, MarginKind.DROPPER_POWER).formula()).contains("50 % x 20 W = 10 W");
        assertThat(part(HEATER, MarginKind.DROPPER_VOLTAGE).demand()).isEqualTo(500);
        assertThat(part(HEATER, MarginKind.ZENER_POWER).demand()).isEqualTo(1);
        assertThat(part(HEATER, MarginKind.CAPACITOR_VOLTAGE).demand()).isEqualTo(100);
        assertThat(part(HEATER, MarginKind.BASE_ONE_POWER).demand()).isEqualTo(0.25);
        // The line's crest less the zener and two diodes at most, on 10 kohm: 230²/10 000 W less a tenth.
        assertThat(part(HEATER, MarginKind.DROPPER_POWER).offered()).isBetween(4.2, 5.29);
        assertThat(part(HEATER, MarginKind.DROPPER_VOLTAGE).offered()).isBetween(300.0, 325.3);
    }

    @Test
    void theFixedRampResistorBearsItsShareOfTheRampsHeat() {
        // One current flows through fixed resistor, pot and shunt alike: heat divides as the resistances do (Joule).
        double least = Firing.dissipation(HEATER, OnTheBench.USUAL, 5_600).rampWatts();
        double most = Firing.dissipation(HEATER, OnTheBench.USUAL, 73_600).rampWatts() * 5_600 / 73_600;
        assertThat(part(HEATER, MarginKind.RAMP_RESISTOR_POWER).offered())
                .isCloseTo(Math.max(least, most), within(1e-12));
        Design none = Changed.with(HEATER, "ramp.fixed.value", 0.0);
        assertThat(part(none, MarginKind.RAMP_RESISTOR_POWER).offered()).isZero();
    }

    @Test
    void aPartWithoutARatingSaysHowToWriteIt() {
        for (String[] missing : new String[][] {
            {"clip.dropper.ratedWatts", "DROPPER_POWER", "clip.dropper states no power rating"},
            {"clip.dropper.ratedVolts", "DROPPER_VOLTAGE", "clip.dropper states no voltage rating"},
            {"clip.zener.ratedWatts", "ZENER_POWER", "the profile states no clip.zener.power"},
            {"ramp.capacitor.ratedVolts", "CAPACITOR_VOLTAGE", "ramp.capacitor states no voltage rating"},
            {"trigger.baseOne.ratedWatts", "BASE_ONE_POWER", "trigger.base-one states no power rating"},
            {"trigger.baseTwo.ratedWatts", "BASE_TWO_POWER", "trigger.base-two states no power rating"},
            {"ramp.fixed.ratedWatts", "RAMP_RESISTOR_POWER", "ramp.fixed states no power rating"},
            {"ramp.pot.track.ratedWatts", "POT_POWER", "ramp.pot.track states no power rating"},
        }) {
            Margin margin =
                    part(Changed.with(HEATER, missing[0], OptionalDouble.empty()), MarginKind.valueOf(missing[1]));
            assertThat(margin.verdict()).isEqualTo(Verdict.NOT_JUDGED);
            assertThat(margin.formula()).contains(missing[2]);
        }
        Design upper = Changed.with(PROGRAMMABLE, "trigger.upper.ratedWatts", OptionalDouble.empty());
        assertThat(part(upper, MarginKind.BASE_TWO_POWER).formula()).contains("trigger.upper states no");
    }

    @Test
    void aFixedRampHasNoPotToBurn() {
        Design fixed = Changed.with(HEATER, "ramp.pot", Optional.empty());
        assertThat(new PartMargins(OnTheBench.usual(fixed)).all())
                .extracting(Margin::kind)
                .doesNotContain(MarginKind.POT_POWER)
                .contains(MarginKind.RAMP_RESISTOR_POWER);
    }
}
