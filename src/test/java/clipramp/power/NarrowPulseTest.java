package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import clipramp.firing.Solution.Settling;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** What short gate pulses do to an inductive load: the pulse against the current of the half cycle before. */
class NarrowPulseTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);

    /** 3 + j4 ohm: the load's angle is 53.13 degrees. */
    private static final Load.Inductive COIL = new Load.Inductive(3, 4 / (100 * Math.PI), Optional.empty());

    private static Design coil(Stage stage) {
        return Fired.textbook(stage, 10).withLoad(COIL);
    }

    /** Pulses of one length at several angles of every half cycle. */
    private static Solution pulses(double seconds, double... degrees) {
        List<Pulse> pulses = new ArrayList<>();
        for (double angle : degrees) {
            pulses.add(pulse(Math.toRadians(angle), seconds));
        }
        HalfCycle half = new HalfCycle(
                true, 0.01, 0.5, 0.5, OptionalDouble.of(0.1), 3.05, false, false, pulses, pulses.isEmpty() ? -1 : 0);
        return new Solution(EUROPE, 1e4, Settling.STEADY, List.of(half));
    }

    private static Pulse pulse(double rad, double seconds) {
        double start = rad / EUROPE.omega();
        return new Pulse(
                rad,
                start,
                start + seconds,
                20,
                13,
                false,
                false,
                0.1,
                2,
                0.2,
                4,
                seconds,
                1e-6,
                2e-6,
                5e-6,
                true,
                1,
                true);
    }

    private static LoadResult load(Design design, Solution solution) {
        return LoadPower.of(design, EUROPE, solution);
    }

    @Test
    void aNarrowPulseUnderTheLoadsAngleMissesEverySecondHalfCycle() {
        LoadResult load = load(coil(Stage.INVERSE_PARALLEL), pulses(20e-6, 40));
        assertThat(load.missedHalves()).isEqualTo(1);
        assertThat(load.halfCycles()).isEqualTo(2);
        // One thyristor alone, as in a half-wave stage: its mean is the line's direct current.
        LoadResult alone = LoadPower.atFiringAngle(coil(Stage.HALF_WAVE), EUROPE, Math.toRadians(40));
        assertThat(load.dcAmps()).isCloseTo(alone.meanAmps(), within(1e-9));
        assertThat(load.watts()).isCloseTo(alone.watts(), within(1e-6));
        assertThat(Math.toDegrees(load.extinctionRad().getAsDouble())).isGreaterThan(180 + 40);
    }

    @Test
    void beyondTheLoadsAngleTheSamePulseFiresBothHalves() {
        LoadResult load = load(coil(Stage.INVERSE_PARALLEL), pulses(20e-6, 60));
        assertThat(load.missedHalves()).isZero();
        assertThat(load.dcAmps()).isCloseTo(0, within(1e-9));
        assertThat(load.watts())
                .isCloseTo(
                        LoadPower.atFiringAngle(coil(Stage.TRIAC), EUROPE, Math.toRadians(60))
                                .watts(),
                        within(1e-6));
    }

    @Test
    void aTrainOfPulsesRescuesTheHalfCycleThatItsFirstPulseMissed() {
        LoadResult load = load(coil(Stage.TRIAC), pulses(20e-6, 40, 50, 60, 70));
        assertThat(load.missedHalves()).isZero();
        LoadResult missing = load(coil(Stage.TRIAC), pulses(20e-6, 40));
        LoadResult latest = load(coil(Stage.TRIAC), pulses(20e-6, 70));
        assertThat(Math.abs(load.dcAmps())).isLessThan(0.3 * missing.dcAmps());
        assertThat(load.watts()).isGreaterThan(latest.watts());
    }

    @Test
    void aPulseThatOutlastsTheOldCurrentFiresAtItsExtinction() {
        // From 40 to 60 degrees: both thyristors conduct all the time, and the load takes the whole line.
        double seconds = Math.toRadians(20) / EUROPE.omega();
        LoadResult load = load(coil(Stage.TRIAC), pulses(seconds, 40));
        assertThat(load.missedHalves()).isZero();
        assertThat(load.watts()).isCloseTo(6348, within(0.5));
        assertThat(load.conductionRad()).isCloseTo(Math.PI, within(1e-5));
    }

    @Test
    void aPulseMustLeaveTheTurnOnTimeAfterTheExtinction() {
        double turnOn =
                coil(Stage.TRIAC).thyristor().device().gate().turnOnSeconds().getAsDouble();
        double extinction = Math.toDegrees(load(coil(Stage.TRIAC), pulses(20e-6, 40))
                        .extinctionRad()
                        .getAsDouble())
                - 180;
        double just = Math.toRadians(2) / EUROPE.omega();
        assertThat(twoPulses(40, extinction - 2, just + 2 * turnOn).missedHalves())
                .isZero();
        assertThat(twoPulses(40, extinction - 2, just + turnOn / 2).missedHalves())
                .isEqualTo(1);
    }

    private static LoadResult twoPulses(double shortDegrees, double longDegrees, double longSeconds) {
        List<Pulse> pulses =
                List.of(pulse(Math.toRadians(shortDegrees), 20e-6), pulse(Math.toRadians(longDegrees), longSeconds));
        HalfCycle half = new HalfCycle(true, 0.01, 0.5, 0.5, OptionalDouble.of(0.1), 3.05, false, false, pulses, 0);
        return load(coil(Stage.TRIAC), new Solution(EUROPE, 1e4, Settling.STEADY, List.of(half)));
    }

    @Test
    void aPulseThatEndsUnderTheLatchingCurrentGivesNothingToSpeakOf() {
        // 5 H: after 20 us at the crest 325 V x 20 us / 5 H = 1.3 mA flow, under any latching current.
        Design solenoid = Fired.textbook(Stage.TRIAC, 10).withLoad(new Load.Inductive(200, 5, Optional.empty()));
        LoadResult dead = load(solenoid, pulses(20e-6, 90));
        assertThat(dead.watts()).isLessThan(1e-6);
        assertThat(dead.firedRad()).isEmpty();
        assertThat(load(solenoid, pulses(5e-3, 90)).watts()).isGreaterThan(0.5);
    }

    @Test
    void aFreewheelingCurrentLatchesAtOnce() {
        // The diode keeps the current between pulses, so a pulse far too short to build it up hands it over.
        Design solenoid = Fired.textbook(Stage.BRIDGE_DC, 10)
                .withLoad(new Load.Inductive(200, 5, Optional.of(new StageDiodes(0.9, 0))));
        LoadResult first = load(solenoid, pulses(20e-6, 90));
        assertThat(first.watts()).as("from rest it never starts").isLessThan(1e-3);
        LoadResult second = load(solenoid, pulses(3e-3, 90));
        assertThat(second.meanAmps()).isGreaterThan(0.4);
    }

    @Test
    void aPulseInThePositiveHalfOnlyOfAHalfWaveStageIsNotMissed() {
        LoadResult load = load(coil(Stage.HALF_WAVE), pulses(20e-6, 40));
        assertThat(load.missedHalves()).isZero();
        assertThat(load.dcAmps()).isGreaterThan(1);
    }
}
