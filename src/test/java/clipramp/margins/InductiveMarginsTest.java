package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.TemperatureCurve;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.power.ReappliedVoltage;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** What an inductance asks: pulses beyond the load's angle, and voltage that comes back slowly enough. */
class InductiveMarginsTest {
    /** A triac on 40 ohm and 60 mH behind a snubber of 100 ohm and 220 nF, fired from beyond its angle on. */
    private static final Design COIL = EachMarginFailsTest.coil(SampleDesigns.triacHeater());

    private static final Design EARLY = COIL.withRamp(SampleDesigns.ramp(150e-9, 5_600, 27_000));

    private static List<Margin> margins(Design design) {
        return new InductiveMargins(OnTheBench.usual(design)).all();
    }

    private static Margin margin(Design design, MarginKind kind) {
        return OnTheBench.of(margins(design), kind);
    }

    @Test
    void controlBeginsAtTheLoadsAngle() {
        // phi = atan(wL/R), as in any book on power electronics; the triac's own 50 mohm belong to the loop.
        double phi = Math.toDegrees(Math.atan2(100 * Math.PI * 0.06, 40.05));
        double fires = Math.toDegrees(Firing.solve(COIL, OnTheBench.USUAL, 5_600)
                .shown()
                .pulses()
                .get(0)
                .startRad());
        Margin margin = margin(COIL, MarginKind.CONTROL_RANGE);
        assertThat(margin.demand()).isCloseTo(phi, within(1e-9));
        assertThat(margin.offered()).isCloseTo(fires, within(1e-9));
        assertThat(margin.formula()).startsWith("R_E = 5.6 kΩ: first pulse at ").endsWith(" to 180°");
        assertThat(margin(EARLY, MarginKind.CONTROL_RANGE).verdict()).isEqualTo(Verdict.TIGHT);
        Design dead = Changed.with(COIL, "clip.dropper.value", 5e6);
        assertThat(margin(dead, MarginKind.CONTROL_RANGE).formula())
                .isEqualTo("not judged: there is no pulse at the smallest R_E");
    }

    @Test
    void everyHalfCycleIsFiredBeyondTheLoadsAngle() {
        Margin margin = margin(COIL, MarginKind.MISSED_HALF_CYCLES);
        assertThat(margin.offered()).isZero();
        assertThat(margin.formula()).contains("every half cycle is fired").contains(" pulses in each)");
        Design dead = Changed.with(COIL, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20)));
        assertThat(margin(dead, MarginKind.MISSED_HALF_CYCLES).formula())
                .endsWith("no pulse turns the thyristor on and latches it");
    }

    @Test
    void aSinglePulseUnderTheLoadsAngleMissesEverySecondHalfCycle() {
        // A device that stays on makes one pulse only, and it comes while the old current still flows.
        Design single = Changed.with(EARLY, "trigger.device.valley.amps", Characteristic.exactly(1e-4));
        Solution solution = Firing.solve(single, OnTheBench.USUAL, 5_600);
        LoadResult load = LoadPower.of(single, OnTheBench.USUAL, solution);
        assertThat(load.missedHalves()).isEqualTo(1);
        assertThat(solution.shown().pulses()).hasSize(1);
        Margin margin = margin(single, MarginKind.MISSED_HALF_CYCLES);
        assertThat(margin.offered()).isEqualTo(1);
        assertThat(margin.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(margin.formula())
                .contains("the current of one half cycle flows until ")
                .contains(" of the next half cycle; the pulse at ")
                .contains(" long, is spent by then: 1 of 2 half cycles missed, dc ");
        double ends = load.extinctionRad().orElseThrow() - Math.PI;
        double begins = solution.shown().pulses().get(0).startRad();
        assertThat(ends).as("the old current outlives the pulse").isGreaterThan(begins);
        assertThat(margin.formula())
                .startsWith("R_E = 5.6 kΩ: ")
                .contains("until " + Say.angle(ends) + " of")
                .contains("dc " + Say.amps(Math.abs(load.dcAmps())));
    }

    @Test
    void theRateIsThatOfTheLargestStepThroughTheSnubber() {
        Bench bench = OnTheBench.usual(COIL);
        JudgedCondition at = bench.conditions().get(0);
        List<ReappliedVoltage> back = InductiveMargins.reapplied(bench, at);
        assertThat(back).hasSize(11).allMatch(ReappliedVoltage::snubbed);
        double most = back.stream()
                .mapToDouble(ReappliedVoltage::voltsPerSecond)
                .max()
                .orElseThrow();
        // At the step the snubber's resistor sees V R_s/L at once; the step is the line's voltage at extinction.
        double step =
                back.stream().mapToDouble(ReappliedVoltage::stepVolts).max().orElseThrow();
        assertThat(step).isBetween(100.0, Math.sqrt(2) * 230);
        assertThat(most).isGreaterThanOrEqualTo(step * 100 / 0.06);
        Margin margin = margin(COIL, MarginKind.COMMUTATING_DVDT);
        assertThat(margin.demand()).isEqualTo(20e6);
        assertThat(margin.offered()).isCloseTo(most, within(1e-6 * most));
        assertThat(margin.formula()).contains(" behind the snubber; limit 20 V/µs");
        Margin bare = margin(COIL.withSnubber(Optional.empty()), MarginKind.COMMUTATING_DVDT);
        assertThat(bare.formula()).contains(" with no snubber and 100 pF of stray capacitance (common practice)");
        assertThat(bare.offered()).isGreaterThan(10 * most);
    }

    @Test
    void aPairOfScrsIsHeldToItsStaticRate() {
        Design pair = EachMarginFailsTest.coil(SampleDesigns.inverseParallelHeater());
        assertThat(margins(pair))
                .extracting(Margin::kind)
                .contains(MarginKind.OFF_STATE_DVDT)
                .doesNotContain(MarginKind.COMMUTATING_DVDT);
        assertThat(margin(pair, MarginKind.OFF_STATE_DVDT).demand()).isEqualTo(50e6);
        Design unknown = Changed.with(pair, "thyristor.device.limits.voltsPerSecond", OptionalDouble.empty());
        assertThat(margin(unknown, MarginKind.OFF_STATE_DVDT).formula()).contains("thyristor.device.limits.dv-dt");
        Design triac = Changed.with(COIL, "thyristor.device.commutating", Optional.empty());
        assertThat(margin(triac, MarginKind.COMMUTATING_DVDT).formula()).contains("thyristor.device.commutating.dv-dt");
    }

    @Test
    void aLoadWithoutInductanceOrWithoutAnAlternatingCurrentIsNotAsked() {
        assertThat(margins(SampleDesigns.triacHeater())).isEmpty();
        Design dcSide =
                SampleDesigns.heater().withLoad(new Load.Inductive(40, 0.06, Optional.of(new StageDiodes(0.9, 0))));
        assertThat(margins(dcSide)).isEmpty();
        Bench bench = OnTheBench.usual(dcSide);
        assertThat(InductiveMargins.reapplied(bench, bench.conditions().get(0))).isEmpty();
        Bench heater = OnTheBench.usual(SampleDesigns.triacHeater());
        assertThat(InductiveMargins.reapplied(heater, heater.conditions().get(0)))
                .isEmpty();
        Design half = SampleDesigns.halfWaveHeater().withLoad(new Load.Inductive(40, 0.06, Optional.empty()));
        assertThat(margins(half)).isEmpty();
    }
}
