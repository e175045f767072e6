package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.StageDiodes;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** What a whole judgement shows first, and what it says of mid-knob. */
class JudgeOrderTest {
    private static final Design HEATER = SampleDesigns.heater();

    private static Check check(Design design) {
        return Judge.check(design, OptionalDouble.of(230), OptionalDouble.of(25));
    }

    @Test
    void ofTwoThatHoldTheOneNearerToItsOwnLimitComesFirst() {
        // 1.3 where 1.2 is asked is nearer than 1.2 where 1 is: ratio over the ratio that it holds from.
        List<Margin> margins = check(HEATER).margins();
        Comparator<Margin> gravity = Comparator.comparing(Margin::verdict).reversed();
        assertThat(margins)
                .isSortedAccordingTo(
                        gravity.thenComparingDouble(m -> m.ratio().orElse(Double.POSITIVE_INFINITY) / m.holdsFrom()));
        assertThat(margins).extracting(Margin::holdsFrom).contains(1.0, 1.2);
        assertThat(margins.get(margins.size() - 1).ratio()).isEmpty();
    }

    @Test
    void whatFailsWithoutARatioFailsFirst() {
        // A wrong polarity has no ratio; a drive a little too weak has one.
        Design design = Changed.with(HEATER, "gate.overdrive", 15.0);
        design = Changed.with(design, "thyristor.device.limits.volts", OptionalDouble.of(300));
        design = Changed.with(design, "gate.polarity", Polarity.NEGATIVE);
        Check check = check(design);
        assertThat(check.verdict()).isEqualTo(Verdict.FAILS);
        List<Margin> failing = check.margins().stream()
                .filter(m -> m.verdict() == Verdict.FAILS)
                .toList();
        assertThat(failing).hasSizeGreaterThan(1);
        int polarity = failing.stream().map(Margin::kind).toList().indexOf(MarginKind.GATE_POLARITY);
        int drive = failing.stream().map(Margin::kind).toList().indexOf(MarginKind.BLOCKING_VOLTAGE);
        assertThat(polarity).isLessThan(drive);
    }

    @Test
    void thePulseAtMidKnobHasItsMeanAndItsStandingVoltage() {
        Solution middle = Firing.solve(HEATER, OnTheBench.USUAL, 39_600);
        Check.PulseSummary summary = check(HEATER).pulse().orElseThrow();
        double joules =
                middle.shown().pulses().stream().mapToDouble(Pulse::gateJoules).sum();
        assertThat(summary.atKnob()).hasValue(0.5);
        assertThat(summary.pulse().startRad())
                .isCloseTo(middle.shown().firingRad().orElseThrow(), within(1e-12));
        assertThat(summary.meanGateWatts()).isCloseTo(100 * joules, within(1e-12));
        // R1p of 39 || 1000 ohm under 470 + 4700 ohm and a supply of 21 V at the most.
        assertThat(summary.quiescentGateVolts()).isBetween(0.145, 0.16);
        assertThat(check(Changed.with(HEATER, "clip.dropper.value", 5e6)).pulse())
                .isEmpty();
    }

    @Test
    void theKnobsRowsAreTenStepsOfTheRamp() {
        Check check = check(HEATER);
        for (int step = 0; step <= 10; step++) {
            assertThat(check.knob().get(step).position().orElseThrow()).isCloseTo(step / 10.0, within(1e-12));
            assertThat(check.knob().get(step).rampOhms()).isCloseTo(73_600 - 6_800 * step, within(1e-6));
        }
        assertThat(check.condition()).isEqualTo(OnTheBench.USUAL);
        assertThat(check.clipFromRad().orElseThrow())
                .isCloseTo(
                        Firing.solve(HEATER, OnTheBench.USUAL, 39_600)
                                .shown()
                                .clipFromRad()
                                .orElseThrow(),
                        within(1e-12));
    }

    @Test
    void theGateShuntIsToldFromATenthOfTheTriggerCurrentOn() {
        // V_GT 1 V over 1 kohm is exactly a tenth of 10 mA at 25 °C; a little less resistance is more.
        assertThat(notes(Changed.with(HEATER, "gate.shunt", Optional.of(Part.of(1_001)))))
                .doesNotContain("gate-shunt-share");
        assertThat(notes(Changed.with(HEATER, "gate.shunt", Optional.of(Part.of(999)))))
                .contains("gate-shunt-share");
    }

    private static List<String> notes(Design design) {
        return check(design).notes().stream().map(Note::id).toList();
    }

    @Test
    void theFreewheelingDiodeIsSaidToTakeOverAtOnce() {
        Design dcSide = HEATER.withLoad(new Load.Inductive(40, 0.06, Optional.of(new StageDiodes(0.9, 0))));
        assertThat(notes(dcSide)).contains("freewheel", "inductive", "no-snubber");
        assertThat(notes(HEATER)).doesNotContain("freewheel", "inductive", "no-snubber", "snubber");
    }
}
