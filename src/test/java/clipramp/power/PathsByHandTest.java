package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Snubber;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.ThyristorDevice.OnState;
import clipramp.engine.InductiveCurrent;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Paths of the load's current by Kirchhoff's laws, crests against dense samples, first waves against closed forms. */
class PathsByHandTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final double CREST = Math.sqrt(2) * 230;

    /** 1 V and 0.5 ohm of thyristor, twice 0.9 V and 0.1 ohm of bridge, 40 ohm and 0.1 H, a diode of 0.8 V and 0.2 ohm. */
    private static Design dcSide() {
        return Changed.with(Fired.textbook(Stage.BRIDGE_DC, 10), "thyristor.device.onState", new OnState(1, 0.5))
                .withStageDiodes(new StageDiodes(0.9, 0.1))
                .withLoad(new Load.Inductive(40, 0.1, Optional.of(new StageDiodes(0.8, 0.2))));
    }

    private static LoadLoop loop(Design design) {
        return LoadLoop.of(design, EUROPE, (Load.Inductive) design.load());
    }

    @Test
    void whatTheLoadGetsIsTheLineLessEveryDropOfItsPath() {
        LoadLoop loop = loop(dcSide());
        double there = CREST * Math.sin(1.2);
        assertThat(loop.drivingVolts(1.2)).isCloseTo(there - 2.8, within(1e-9));
        assertThat(loop.drivingVolts(1.2 + Math.PI)).isCloseTo(there - 2.8, within(1e-9));
        assertThat(loop.thyristorLoadVolts(1.2, 1, 3)).isCloseTo(there - 2.8 - 3 * 0.7, within(1e-9));
        assertThat(loop.thyristorLoadVolts(1.2 + Math.PI, -1, 3)).isCloseTo(there - 2.8 - 3 * 0.7, within(1e-9));
        assertThat(loop.diodeLoadVolts(3)).isCloseTo(-0.8 - 3 * 0.2, within(1e-12));
        assertThat(loop.directionAt(1.2)).isEqualTo(1);
        assertThat(loop.directionAt(1.2 + Math.PI)).isEqualTo(-1);
        LoadLoop ideal = loop.withoutDrops();
        assertThat(ideal.drivingVolts(1.2)).isCloseTo(there, within(1e-9));
        assertThat(ideal.diodeLoadVolts(3)).isZero();
    }

    @Test
    void aHalfWaveStageIsDrivenOneWayOnly() {
        LoadLoop loop =
                loop(Fired.textbook(Stage.HALF_WAVE, 10).withLoad(new Load.Inductive(40, 0.1, Optional.empty())));
        assertThat(loop.drivingVolts(1.2 + Math.PI)).isCloseTo(-CREST * Math.sin(1.2), within(1e-9));
        assertThat(loop.directionAt(1.2 + Math.PI)).isEqualTo(1);
    }

    @Test
    void aFreewheelingCurrentFadesWithItsTimeConstantTowardsTheDiodesDrop() {
        // L di/dt = -V_F - (R + r) i, solved by hand.
        LoadLoop loop = loop(dcSide());
        InductiveCurrent current = loop.throughDiode(Math.PI, 5);
        double tau = 0.1 / 40.2;
        double seconds = 2e-3;
        double amps = (5 + 0.8 / 40.2) * Math.exp(-seconds / tau) - 0.8 / 40.2;
        double rad = Math.PI + seconds * EUROPE.omega();
        assertThat(current.ampsAt(rad)).isCloseTo(amps, within(1e-12));
        CurrentSpan span = loop.diodeSpan(Math.PI, rad, current);
        assertThat(span.memoryRad()).isCloseTo(EUROPE.omega() * tau, within(1e-12));
        assertThat(span.throughThyristor()).isFalse();
        assertThat(span.loadVolts().applyAsDouble(rad)).isCloseTo(-0.8 - 0.2 * amps, within(1e-12));
    }

    @Test
    void aStretchThroughTheThyristorKeepsKirchhoffsVoltageLaw() {
        LoadLoop loop = loop(dcSide());
        CurrentSpan span = loop.thyristorSpan(1, 2, 1, loop.throughThyristor(1, 1, 0.5));
        double tau = 0.1 / 40.7;
        assertThat(span.memoryRad()).isCloseTo(EUROPE.omega() * tau, within(1e-12));
        double h = 1e-4;
        for (double rad = 1.1; rad < 1.9; rad += 0.1) {
            double amps = span.amps().applyAsDouble(rad);
            double slope = (span.amps().applyAsDouble(rad + h) - span.amps().applyAsDouble(rad - h)) / (2 * h);
            double load = 40 * amps + 0.1 * EUROPE.omega() * slope;
            assertThat(span.loadVolts().applyAsDouble(rad)).isCloseTo(load, within(1e-4));
            assertThat(load).isCloseTo(CREST * Math.sin(rad) - 2.8 - 0.7 * amps, within(1e-4));
        }
    }

    @Test
    void aZeroThatIsHereIsNotTheNextOne() {
        LoadLoop loop = loop(dcSide());
        assertThat(loop.nextZeroRad(0)).isCloseTo(Math.PI, within(1e-12));
        assertThat(loop.nextZeroRad(Math.PI)).isCloseTo(2 * Math.PI, within(1e-12));
        assertThat(loop.nextZeroRad(3.5)).isCloseTo(2 * Math.PI, within(1e-12));
        assertThat(loop.nextZeroRad(0.5)).isCloseTo(Math.PI, within(1e-12));
        assertThat(loop.nextZeroRad(20)).isCloseTo(7 * Math.PI, within(1e-12));
    }

    @Test
    void crestsOfDistortedLinesAreThoseOfDenseSamples() {
        int seed = 3_107;
        Random random = new Random(seed);
        for (int draw = 0; draw < 60; draw++) {
            Line line = new Line(
                    230,
                    50,
                    207,
                    253,
                    List.of(
                            new Line.Harmonic(3, 0.25 * random.nextDouble(), 6 * random.nextDouble()),
                            new Line.Harmonic(5, 0.1 * random.nextDouble(), 6 * random.nextDouble())));
            Design design = Fired.textbook(Stage.TRIAC, 10).withLine(line);
            double fired = 0.4 + 2 * random.nextDouble();
            HalfCycleCurrent half = new ResistorCurrent(design, EUROPE).firedAt(true, fired);
            double most = 0;
            for (int i = 0; i <= 20_000; i++) {
                double rad = fired + (half.toRad() - fired) * i / 20_000;
                most = Math.max(most, line.voltsAt(230, rad) / 10);
            }
            String what = "seed " + seed + " draw " + draw;
            assertThat(half.peakAmps()).as(what).isCloseTo(most, within(1e-5));
            assertThat(half.peakAmps()).as(what).isGreaterThan(most - 1e-9);
            assertThat(line.voltsAt(230, half.toRad())).as(what).isCloseTo(0, within(1e-8));
        }
    }

    @ParameterizedTest
    @CsvSource({"0.05,true", "1,true", "3.07,false"})
    void aDistortedLinesCurrentBeginsWhereItExceedsTheDropsAndNotAtAllAfterItFell(double fired, boolean flows) {
        // 28 V of drops against a crest of 325 V: between asin(28/325) and pi less that; the harmonic is next to
        // nothing.
        Line line = new Line(230, 50, 207, 253, List.of(new Line.Harmonic(3, 1e-12, 0)));
        Design design = Changed.with(Fired.textbook(Stage.TRIAC, 10), "thyristor.device.onState", new OnState(28, 0))
                .withLine(line);
        double edge = Math.asin(28 / CREST);
        HalfCycleCurrent half = new ResistorCurrent(design, EUROPE).firedAt(true, fired);
        Optional<CurrentSpan> span = new ResistorCurrent(design, EUROPE).spanFiredAt(true, fired, 0);
        if (!flows) {
            assertThat(half.flows()).isFalse();
            assertThat(half.conductionRad()).isZero();
            assertThat(span).isEmpty();
            return;
        }
        assertThat(half.flows()).isTrue();
        assertThat(half.fromRad()).isCloseTo(Math.max(fired, edge), within(1e-9));
        assertThat(half.toRad()).isCloseTo(Math.PI - edge, within(1e-9));
        assertThat(half.conductionRad()).isCloseTo(Math.PI - edge - Math.max(fired, edge), within(1e-9));
        assertThat(span.orElseThrow().toRad()).isCloseTo(Math.PI - edge, within(1e-9));
    }

    @Test
    void aLineUnderTheDropsDrivesNothing() {
        Design design = Changed.with(Fired.textbook(Stage.TRIAC, 10), "thyristor.device.onState", new OnState(28, 0));
        Condition weak = new Condition(27.9 / Math.sqrt(2), 50, 25);
        ResistorCurrent path = new ResistorCurrent(design, weak);
        assertThat(path.firedAt(true, 1).flows()).isFalse();
        assertThat(path.spanFiredAt(true, 1, 0)).isEmpty();
        assertThat(path.loadVoltsAt(true, Math.PI / 2)).isCloseTo(0, within(1e-12));
        assertThat(ResistorCurrent.sineSquare(28, 28, 1)).isZero();
        assertThat(ResistorCurrent.sineSquare(28, 29, 1)).isZero();
        // Without a drop: a² (pi - x + sin 2x/2)/2.
        assertThat(ResistorCurrent.sineSquare(28, 0, 1))
                .isCloseTo(28 * 28 * (Math.PI - 1 + Math.sin(2) / 2) / 2, within(1e-9));
    }

    @Test
    void aCriticallyDampedStepRisesAsTheBooksSay() {
        // L = 1 H, C = 1 F, 1.75 + 0.25 ohm: i = V t e^-t. Rate R_s i' + i/C = V e^-t (0.25 + 0.75 t), largest at t =
        // 2/3.
        Load.Inductive load = new Load.Inductive(1.75, 1, Optional.empty());
        ReappliedVoltage back = ReappliedVoltage.of(load, Optional.of(new Snubber(0.25, 1)), 100);
        assertThat(back.voltsPerSecond()).isCloseTo(100 * 0.75 * Math.exp(-2 / 3.0), within(1e-3));
        // V - R i - L i' = V (1 - e^-t (1 + 0.75 t)), under V throughout.
        assertThat(back.peakVolts()).isCloseTo(100, within(1e-9));
        assertThat(back.stepVolts()).isEqualTo(100);
        assertThat(back.snubbed()).isTrue();
    }

    @Test
    void theWorstFirstWaveOfALowLineBeginsWhereItExceedsTheDrops() {
        // i = V/Z (sin(x - phi) - sin(a - phi) e^...) - D/R (1 - e^...), fired at asin(D/V): the most displaced wave.
        Condition low = new Condition(12, 50, 25);
        Design design = Changed.with(Fired.textbook(Stage.BRIDGE_AC, 10), "thyristor.device.onState", new OnState(1, 0))
                .withStageDiodes(new StageDiodes(0.9, 0))
                .withLoad(new Load.Inductive(0.5, 20e-3, Optional.empty()));
        double crest = Math.sqrt(2) * 12;
        double from = Math.asin(2.8 / crest);
        double reactance = low.omega() * 20e-3;
        double phi = Math.atan2(reactance, 0.5);
        double peak = 0;
        double square = 0;
        double step = 1e-4;
        for (double rad = from + step / 2; rad < from + 2 * Math.PI; rad += step) {
            double gone = Math.exp(-(rad - from) * 0.5 / reactance);
            double amps = crest / Math.hypot(0.5, reactance) * (Math.sin(rad - phi) - Math.sin(from - phi) * gone)
                    - 2.8 / 0.5 * (1 - gone);
            if (amps < 0) {
                break;
            }
            peak = Math.max(peak, amps);
            square += amps * amps * step;
        }
        Inrush inrush = Inrush.worst(design, low);
        assertThat(inrush.peakAmps()).isCloseTo(peak, within(1e-4 * peak));
        assertThat(inrush.ampsSquaredSeconds()).isCloseTo(square / low.omega(), within(1e-3 * square / low.omega()));
        assertThat(inrush.coldOhms()).isEqualTo(0.5);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.001, 0.2, 1.7})
    void theTimeToACurrentIsThatOfTheExponentialRise(double amps) {
        // A line so slow that its crest stands still: t = -tau ln(1 - R i/V), V = 100 V less the path's 2.8 V.
        Condition still = new Condition(100 / Math.sqrt(2), 1e-3, 25);
        Design design = dcSide();
        double ohms = 40.7;
        OptionalDouble seconds = PulseLength.secondsToReach(design, still, Math.PI / 2, amps);
        assertThat(seconds.orElseThrow()).isCloseTo(-0.1 / ohms * Math.log(1 - ohms * amps / 97.2), within(1e-9));
    }

    @Test
    void underTheDropsNoPulseIsLongEnough() {
        assertThat(PulseLength.secondsToReach(dcSide(), EUROPE, 0.005, 1e-3)).isEmpty();
        Design heater = Changed.with(Fired.textbook(Stage.TRIAC, 10), "thyristor.device.onState", new OnState(1, 0));
        double exactly = (CREST * Math.sin(1) - 1) / 10;
        assertThat(PulseLength.secondsToReach(heater, EUROPE, 1, exactly - 1e-9))
                .hasValue(0);
        assertThat(PulseLength.secondsToReach(heater, EUROPE, 1, exactly + 1e-9))
                .isEmpty();
        assertThat(PulseLength.secondsToReach(heater, EUROPE, 0.001, 1e-6)).isEmpty();
    }
}
