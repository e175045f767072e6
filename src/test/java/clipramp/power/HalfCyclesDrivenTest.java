package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.engine.LineWave;
import clipramp.firing.HalfCycle;
import clipramp.firing.Solution;
import clipramp.firing.Solution.Settling;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Which half cycles are driven from where to where, and what the load's voltage looks like then. */
class HalfCyclesDrivenTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final double CREST = Math.sqrt(2) * 230;

    /** Share of full power of one half cycle fired at an angle; any book on power electronics. */
    private static double share(double rad) {
        return 1 - rad / Math.PI + Math.sin(2 * rad) / (2 * Math.PI);
    }

    private static Solution period(double firingRad) {
        HalfCycle half = Fired.half(EUROPE, true, firingRad, true);
        HalfCycle period =
                new HalfCycle(true, 0.02, 0.5, 0.5, OptionalDouble.empty(), 1.57, false, false, half.pulses(), 0);
        return new Solution(EUROPE, 1e4, Settling.STEADY, List.of(period));
    }

    @Test
    void aNegativeHalfCycleThatPassesTheThyristorByIsWhole() {
        Design design = Fired.textbook(Stage.BRIDGE_DC, 50);
        double full = 230.0 * 230 / 50;
        for (Solution solution : List.of(Fired.at(EUROPE, 2), Fired.unlike(EUROPE, 2, 1), period(2))) {
            LoadResult load = LoadPower.withNegativeHalvesFree(design, EUROPE, solution);
            assertThat(load.watts()).isCloseTo(full * (1 + share(2)) / 2, within(1e-9));
            assertThat(load.dcAmps()).as("the negative one is the larger").isNegative();
        }
        Solution late = Fired.unlike(EUROPE, 2, 1);
        LoadPeriod period = LoadPower.periodWithNegativeHalvesFree(design, EUROPE, late);
        assertThat(period.spans()).hasSize(2);
        assertThat(period.spans().get(0).fromRad()).isCloseTo(2, within(1e-12));
        assertThat(period.spans().get(1).fromRad()).isCloseTo(Math.PI, within(1e-12));
        assertThat(period.spans().get(1).toRad()).isCloseTo(2 * Math.PI, within(1e-12));
    }

    @Test
    void anInductiveLoadFeelsTheFreeHalfCycleFromTheLinesZeroOn() {
        // With L gone it is the resistor's power again.
        Design coil = Fired.textbook(Stage.BRIDGE_AC, 50).withLoad(new Load.Inductive(50, 1e-7, Optional.empty()));
        double full = 230.0 * 230 / 50;
        for (Solution solution : List.of(Fired.at(EUROPE, 2), period(2))) {
            assertThat(LoadPower.withNegativeHalvesFree(coil, EUROPE, solution).halfCycles())
                    .isEqualTo(2);
        }
        assertThat(LoadPower.withNegativeHalvesFree(coil, EUROPE, weak()).watts())
                .isCloseTo(full / 2, within(1e-3 * full));
        Firings free = Firings.of(coil, EUROPE, Fired.unlike(EUROPE, 2, 1))
                .withNegativeHalvesFree(new LineWave(coil.line(), EUROPE));
        assertThat(free.slots()).extracting(ActingPulses.Slot::positive).containsExactly(true, false);
        assertThat(free.slots().get(0).firingRad()).hasValue(2);
        assertThat(free.slots().get(1).firingRad()).hasValue(0);
        assertThat(free.windows()).extracting(GateWindow::half).containsExactly(0, 1);
        assertThat(free.windows().get(1).fromRad()).isCloseTo(Math.PI, within(1e-12));
        assertThat(free.windows().get(1).toRad()).isCloseTo(2 * Math.PI, within(1e-12));
        assertThat(free.turnOnRad()).isCloseTo(1.5e-6 * EUROPE.omega(), within(1e-15));
    }

    @Test
    void aFreeHalfCycleOfADistortedLineBeginsAtTheLinesOwnZero() {
        Line line = new Line(230, 50, 207, 253, List.of(new Line.Harmonic(2, 0.05, 1)));
        LineWave wave = new LineWave(line, EUROPE);
        Design coil = Fired.textbook(Stage.BRIDGE_AC, 50)
                .withLine(line)
                .withLoad(new Load.Inductive(50, 1e-3, Optional.empty()));
        Firings free = Firings.of(coil, EUROPE, Fired.unlike(EUROPE, 2, 1)).withNegativeHalvesFree(wave);
        GateWindow negative = free.windows().get(1);
        assertThat(wave.voltsAt(negative.fromRad())).isCloseTo(0, within(1e-9));
        assertThat(wave.voltsAt(negative.toRad())).isCloseTo(0, within(1e-9));
        assertThat(wave.voltsAt((negative.fromRad() + negative.toRad()) / 2)).isLessThan(-200);
        assertThat(negative.toRad() - negative.fromRad()).isBetween(2.9, 3.4);
    }

    @Test
    void ofHalfCyclesThatNeverSettleEveryPositiveOneKeepsItsPulse() {
        Design coil = Fired.textbook(Stage.BRIDGE_AC, 50).withLoad(new Load.Inductive(50, 1e-3, Optional.empty()));
        List<HalfCycle> four = List.of(
                Fired.half(EUROPE, true, 1, true),
                Fired.half(EUROPE, false, 1.2, true),
                Fired.half(EUROPE, true, 1.4, true),
                Fired.half(EUROPE, false, 1.6, true));
        Firings free = Firings.of(coil, EUROPE, new Solution(EUROPE, 1e4, Settling.NEVER, four))
                .withNegativeHalvesFree(new LineWave(coil.line(), EUROPE));
        assertThat(free.windows()).extracting(GateWindow::half).containsExactly(0, 1, 2, 3);
        assertThat(free.windows().get(2).fromRad()).isCloseTo(2 * Math.PI + 1.4, within(1e-12));
        assertThat(free.windows().get(3).fromRad()).isCloseTo(3 * Math.PI, within(1e-12));
    }

    @Test
    void aPulseOfALongLagIsCountedFromTheHalfCycleThatItWasMadeIn() {
        // Made at 150 degrees of the supply, which lags 60 degrees: 210 degrees of the load, 30 degrees of its next
        // half.
        double lag = Math.toRadians(60);
        Design design = SampleDesigns.windingHeater(lag, false);
        HalfCycle late = Fired.half(EUROPE, true, Math.toRadians(150), Math.toRadians(30), true);
        Solution solution = new Solution(EUROPE, 1e5, Settling.STEADY, List.of(late));
        assertThat(ActingPulses.madeRad(design, solution, late.pulses().get(0)))
                .isCloseTo(Math.toRadians(210), within(1e-12));
        assertThat(ActingPulses.spillOver(design, solution)).isTrue();
    }

    @Test
    void everyPulseThatReachesTheTriggerCurrentDrivesTheGateForAsLongAsItDoes() {
        // 10 us at 50 Hz are pi/1000.
        double length = Math.PI / 1000;
        assertThat(GateWindow.of(Fired.at(EUROPE, 1)))
                .containsExactly(
                        new GateWindow(1, 1 + length, 0), new GateWindow(1 + Math.PI, 1 + Math.PI + length, 1));
        assertThat(GateWindow.of(Fired.unlike(EUROPE, 1, 2)))
                .containsExactly(
                        new GateWindow(1, 1 + length, 0), new GateWindow(2 + Math.PI, 2 + Math.PI + length, 1));
        assertThat(GateWindow.of(period(1))).containsExactly(new GateWindow(1, 1 + length, 0));
        assertThat(GateWindow.of(period(4))).containsExactly(new GateWindow(4, 4 + length, 1));
    }

    @Test
    void aPulseThatNeverReachesTheTriggerCurrentDrivesNothing() {
        assertThat(GateWindow.of(weak())).isEmpty();
    }

    private static Solution weak() {
        HalfCycle half = Fired.half(EUROPE, true, 1, false);
        HalfCycle weak = new HalfCycle(
                true, 0.01, 0.5, 0.5, OptionalDouble.empty(), 3, false, false, List.of(Fired.weak(half)), -1);
        return new Solution(EUROPE, 1e4, Settling.STEADY, List.of(weak));
    }

    @Test
    void theFirstHalfCycleThatConductsIsTheOneThatIsTold() {
        Design design = Fired.textbook(Stage.TRIAC, 50);
        HalfCycle silent = Fired.half(EUROPE, true, 1, false);
        HalfCycle fires = Fired.half(EUROPE, false, 2, true);
        Solution second = new Solution(EUROPE, 1e4, Settling.HUNTS, List.of(silent, fires));
        LoadResult load = LoadPower.of(design, EUROPE, second);
        assertThat(load.firedRad().orElseThrow()).isCloseTo(2, within(1e-12));
        assertThat(load.extinctionRad().orElseThrow()).isCloseTo(Math.PI, within(1e-12));
        LoadResult both = LoadPower.of(design, EUROPE, Fired.unlike(EUROPE, 1, 2));
        assertThat(both.firedRad().orElseThrow()).isCloseTo(1, within(1e-12));
        LoadResult none = LoadPower.of(design, EUROPE, Fired.silent(EUROPE));
        assertThat(none.firedRad()).isEmpty();
        assertThat(none.extinctionRad()).isEmpty();
    }

    @Test
    void fullRmsCurrentIsOhmsLawAndALampsIsItsPowerOverItsVoltage() {
        assertThat(LoadPower.fullRmsAmps(Fired.textbook(Stage.TRIAC, 50), EUROPE))
                .isCloseTo(4.6, within(1e-12));
        // P = 300 W (200/230)^1.55 at 200 V.
        Design lamp = Fired.textbook(Stage.TRIAC, 50).withLoad(new Load.Filament(300, 230, 1.55, 12));
        assertThat(LoadPower.fullRmsAmps(lamp, new Condition(200, 50, 25)))
                .isCloseTo(300 * Math.pow(200 / 230.0, 1.55) / 200, within(1e-12));
    }

    @ParameterizedTest
    @EnumSource(
            value = Stage.class,
            names = {"TRIAC", "BRIDGE_AC", "BRIDGE_DC", "INVERSE_PARALLEL"})
    void theLoadsWaveIsNothingUntilItFiresAndThenTheLines(Stage stage) {
        LoadWave wave = LoadWave.of(Fired.textbook(stage, 50), EUROPE, Fired.at(EUROPE, 2));
        double[] rad = wave.rad();
        assertThat(rad).isSorted().startsWith(0).endsWith(Math.PI);
        for (int i = 0; i < rad.length; i++) {
            if (rad[i] < 2 - 1e-9) {
                assertThat(wave.volts()[i]).isZero();
            } else if (rad[i] > 2 + 1e-9) {
                assertThat(wave.volts()[i]).isCloseTo(CREST * Math.sin(rad[i]), within(1e-9));
            }
        }
        assertThat(samplesAbove(wave, 1)).isGreaterThan(170);
    }

    private static long samplesAbove(LoadWave wave, double volts) {
        return Arrays.stream(wave.volts()).filter(v -> v > volts).count();
    }

    @Test
    void aHalfWaveStageIsShownOverThePeriod() {
        LoadWave wave = LoadWave.of(Fired.textbook(Stage.HALF_WAVE, 50), EUROPE, Fired.at(EUROPE, 2));
        assertThat(wave.rad()).isSorted().endsWith(2 * Math.PI);
        for (int i = 0; i < wave.rad().length; i++) {
            if (wave.rad()[i] < 2 || wave.rad()[i] > Math.PI + 1e-9) {
                assertThat(wave.volts()[i]).isZero();
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.03, 0.04})
    void theCurrentOfTheHalfCycleBeforeShowsTheLineAsWell(double henries) {
        // While either current flows the load has the line's own voltage, whichever way it flows.
        Design coil = Fired.textbook(Stage.TRIAC, 50).withLoad(new Load.Inductive(8, henries, Optional.empty()));
        double fired = Math.toRadians(110);
        LoadWave wave = LoadWave.of(coil, EUROPE, Fired.at(EUROPE, fired));
        double ends = LoadPower.period(coil, EUROPE, Fired.at(EUROPE, fired))
                        .extinctionRad()
                        .orElseThrow()
                - Math.PI;
        assertThat(ends).isBetween(0.3, fired);
        boolean seen = false;
        for (int i = 0; i < wave.rad().length; i++) {
            double rad = wave.rad()[i];
            double line = CREST * Math.sin(rad);
            if (rad > ends + 1e-9 && rad < fired - 1e-9) {
                assertThat(wave.volts()[i]).isZero();
            } else if (wave.volts()[i] != 0) {
                assertThat(wave.volts()[i]).isCloseTo(line, within(1e-6));
                seen |= rad < ends && rad > 0.1;
            }
        }
        assertThat(seen).as("what is left of the other half cycle").isTrue();
    }

    @Test
    void aHuntingCircuitIsShownInItsPositiveHalfCycle() {
        HalfCycle first = Fired.half(EUROPE, false, 1, true);
        HalfCycle second = Fired.half(EUROPE, true, 2, true);
        Solution hunts = new Solution(EUROPE, 1e4, Settling.HUNTS, List.of(first, second));
        LoadWave wave = LoadWave.of(Fired.textbook(Stage.TRIAC, 50), EUROPE, hunts);
        assertThat(wave.rad()).isSorted().startsWith(0).endsWith(Math.PI);
        for (int i = 0; i < wave.rad().length; i++) {
            double line = wave.rad()[i] > 2 + 1e-9 ? CREST * Math.sin(wave.rad()[i]) : 0;
            assertThat(Math.abs(wave.rad()[i] - 2) < 1e-9 ? line : wave.volts()[i])
                    .isCloseTo(line, within(1e-9));
        }
        assertThat(Arrays.stream(wave.volts()).min().orElseThrow()).isGreaterThan(-1e-9);
    }

    @Test
    void aFilamentSettlesWhereItsResistanceAndItsVoltageAgree() {
        // A divider: 230 V over 20 ohm in series; the lamp's own law must give the same current (Ohm).
        FilamentLaw law = new FilamentLaw(new Load.Filament(300, 230, 1.55, 12));
        double ohms = law.settledOhms(trial -> 230 * trial / (trial + 20));
        double volts = 230 * ohms / (ohms + 20);
        assertThat(ohms).isCloseTo(230.0 * 230 / 300 * Math.pow(volts / 230, 0.45), within(1e-9));
        assertThat(law.wattsAt(volts)).isCloseTo(volts * volts / ohms, within(1e-9));
        assertThat(law.wattsAt(0)).isZero();
    }
}
