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
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Full power, first half cycles, snubbers and crests against closed forms, on loads that are far from the usual ones. */
class PowerEdgesTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);

    private static Design with(Stage stage, Load load) {
        return Fired.textbook(stage, 10).withLoad(load);
    }

    private static Load.Inductive coil(double ohms, double henries) {
        return new Load.Inductive(ohms, henries, Optional.empty());
    }

    @Test
    void fullPowerOfALampIsThatOfItsExponent() {
        // Handbook law of tungsten: P = P_rated (V/V_rated)^1.55.
        Design lamp = with(Stage.TRIAC, new Load.Filament(300, 230, 1.55, 15));
        assertThat(LoadPower.fullWatts(lamp, EUROPE)).isCloseTo(300, within(1e-9));
        assertThat(LoadPower.fullWatts(lamp, new Condition(200, 50, 25)))
                .isCloseTo(300 * Math.pow(200 / 230.0, 1.55), within(1e-9));
    }

    @Test
    void fullPowerOfACoilIsTheSumOverTheLinesOrders() {
        // Superposition: V_k² R/(R² + (k w L)²) for every order.
        double ohms = 20;
        double reactance = EUROPE.omega() * 0.1;
        Design design = with(Stage.TRIAC, coil(ohms, 0.1))
                .withLine(new Line(
                        230, 50, 207, 253, List.of(new Line.Harmonic(3, 0.2, 1), new Line.Harmonic(5, 0.1, 0))));
        double watts = 0;
        for (double[] order : new double[][] {{1, 1}, {3, 0.2}, {5, 0.1}}) {
            watts += Math.pow(230 * order[1], 2) * ohms / (ohms * ohms + Math.pow(order[0] * reactance, 2));
        }
        assertThat(LoadPower.fullWatts(design, EUROPE)).isCloseTo(watts, within(1e-9));
    }

    @Test
    void fullPowerBehindABridgeIsThatOfTheRectifiedSinesSeries() {
        // |sin|: mean 2/pi, orders 2k of amplitude (4/pi)/(4k² - 1); from any handbook on rectifiers.
        double ohms = 20;
        double henries = 0.05;
        Design design =
                with(Stage.BRIDGE_DC, new Load.Inductive(ohms, henries, Optional.of(new StageDiodes(0.9, 0.01))));
        double crest = Math.sqrt(2) * 230;
        double watts = Math.pow(crest * 2 / Math.PI, 2) / ohms;
        for (int k = 1; k < 400; k++) {
            double amplitude = crest * 4 / Math.PI / (4.0 * k * k - 1);
            double impedance = Math.hypot(ohms, 2 * k * EUROPE.omega() * henries);
            watts += Math.pow(amplitude / impedance, 2) / 2 * ohms;
        }
        assertThat(LoadPower.fullWatts(design, EUROPE)).isCloseTo(watts, within(1e-6 * watts));
    }

    @Test
    void theFirstWaveOfAPureInductanceHoldsThreePiOfItsSquare() {
        // i = V/(wL) (1 - cos): its square over the whole turn is 3 pi (V/(wL))².
        Inrush inrush = Inrush.worst(with(Stage.TRIAC, coil(1e-3, 0.5)), EUROPE);
        double crest = Math.sqrt(2) * 230 / (EUROPE.omega() * 0.5);
        double square = 3 * Math.PI * crest * crest / EUROPE.omega();
        assertThat(inrush.ampsSquaredSeconds()).isCloseTo(square, within(2e-3 * square));
        // A volt of drop delays the start by a fifth of a degree and takes a hundredth at most.
        Design dropping =
                Changed.with(with(Stage.TRIAC, coil(1e-3, 0.5)), "thyristor.device.onState", new OnState(1, 0));
        assertThat(Inrush.worst(dropping, EUROPE).peakAmps())
                .isBetween(0.99 * inrush.peakAmps(), inrush.peakAmps() * (1 - 1e-6));
    }

    @Test
    void theLoadsAngleIsThatOfItsImpedance() {
        // Bimbhra, Power Electronics, example 9.5: 3 + j4 ohm, 53.13 degrees; a slope of 1 ohm in the path makes it 45.
        Design design = with(Stage.INVERSE_PARALLEL, coil(3, 4 / (100 * Math.PI)));
        assertThat(Math.toDegrees(PulseLength.loadAngleRad(design, EUROPE))).isCloseTo(53.13, within(5e-3));
        Design sloped = Changed.with(design, "thyristor.device.onState", new OnState(0, 1));
        assertThat(Math.toDegrees(PulseLength.loadAngleRad(sloped, EUROPE))).isCloseTo(45, within(1e-9));
        assertThat(PulseLength.loadAngleRad(with(Stage.TRIAC, new Load.Resistor(3)), EUROPE))
                .isZero();
    }

    @Test
    void aSnubberOfAnyResistanceLeaksByTheWholeSeriesImpedance() {
        // Ohm's law with phasors: 2000 + 1000 - j 3183 ohm; with 5 H in series 2000 + 1000 - j (3183 - 1571).
        Snubber snubber = new Snubber(1_000, 1e-6);
        double reactance = 1 / (EUROPE.omega() * 1e-6);
        SnubberDuty heater = SnubberDuty.worst(Fired.textbook(Stage.TRIAC, 2_000), snubber, EUROPE);
        double amps = 230 / Math.hypot(3_000, reactance);
        assertThat(heater.leakageAmps()).isCloseTo(amps, within(1e-12));
        assertThat(heater.leakageWatts()).isCloseTo(amps * amps * 2_000, within(1e-9));
        assertThat(heater.resistorWatts()).isCloseTo(100 * 1e-6 * 230 * 230 + amps * amps * 1_000, within(1e-9));
        SnubberDuty magnet = SnubberDuty.worst(with(Stage.TRIAC, coil(2_000, 5)), snubber, EUROPE);
        double less = 230 / Math.hypot(3_000, reactance - EUROPE.omega() * 5);
        assertThat(magnet.leakageAmps()).isCloseTo(less, within(1e-12));
        // The step back at extinction costs as much again.
        assertThat(magnet.resistorWatts()).isCloseTo(2 * 100 * 1e-6 * 230 * 230 + less * less * 1_000, within(1e-9));
        SnubberDuty half = SnubberDuty.worst(Fired.textbook(Stage.HALF_WAVE, 2_000), snubber, EUROPE);
        assertThat(half.resistorWatts()).isCloseTo(50 * 1e-6 * 230 * 230 + amps * amps * 1_000, within(1e-9));
    }

    @Test
    void aDampedSnubberTakesTheStepWithoutASwing() {
        // 140 ohm, 1 mH, 1 uF is overdamped: V rises steepest at once, R_s V/L, and never over the step.
        ReappliedVoltage damped = ReappliedVoltage.of(coil(40, 1e-3), Optional.of(new Snubber(100, 1e-6)), 300);
        assertThat(damped.voltsPerSecond()).isCloseTo(100 * 300 / 1e-3, within(1.0));
        assertThat(damped.peakVolts()).isCloseTo(300, within(1e-9));
    }

    @Test
    void aCapacitorBehindALargeResistanceIsChargedByTheCrestOfTheCurrent() {
        // i = V/(L(p - q)) (e^pt - e^qt) with the roots of the characteristic equation; its crest over C is the rate.
        double ohms = 400;
        double henries = 1e-3;
        double farads = 1e-6;
        double half = ohms / (2 * henries);
        double root = Math.sqrt(half * half - 1 / (henries * farads));
        double p = -half + root;
        double q = -half - root;
        double crestSeconds = Math.log(q / p) / (p - q);
        double crest = 300 / (henries * (p - q)) * (Math.exp(p * crestSeconds) - Math.exp(q * crestSeconds));
        ReappliedVoltage slow = ReappliedVoltage.of(coil(ohms, henries), Optional.of(new Snubber(1e-6, farads)), 300);
        assertThat(slow.voltsPerSecond()).isCloseTo(crest / farads, within(1e-3 * crest / farads));
        assertThat(slow.peakVolts()).isCloseTo(300, within(1e-6));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.5, 0.73, 0.81, 1, 1.234, 1.4, 1.57, 1.9, 2})
    void theCrestOfAStretchIsFoundWhereverItStandsAndNothingBesideItCounts(double crestRad) {
        DoubleUnaryOperator amps = rad -> rad < 0.5 || rad > 2 ? 50 : 2 + Math.cos(rad - crestRad);
        CurrentSpan span = new CurrentSpan(0.5, 2, 1, 0, amps, rad -> 0);
        assertThat(SpanPeak.of(span, 1)).isCloseTo(3, within(1e-9));
        assertThat(SpanPeak.of(span, 7)).isCloseTo(3, within(1e-9));
    }

    @Test
    void aResistorsStretchDropsTheLinesVoltageLessThePaths() {
        // Ohm's and Kirchhoff's laws: 10 ohm behind 1 V and 0.5 ohm.
        Design design = Changed.with(
                Fired.textbook(Stage.INVERSE_PARALLEL, 10), "thyristor.device.onState", new OnState(1, 0.5));
        CurrentSpan span = new ResistorCurrent(design, EUROPE)
                .spanFiredAt(false, 1, Math.PI)
                .orElseThrow();
        double driving = Math.sqrt(2) * 230 * Math.sin(1.3) - 1;
        assertThat(span.direction()).isEqualTo(-1);
        assertThat(span.fromRad()).isCloseTo(Math.PI + 1, within(1e-12));
        assertThat(span.amps().applyAsDouble(Math.PI + 1.3)).isCloseTo(driving / 10.5, within(1e-9));
        assertThat(span.loadVolts().applyAsDouble(Math.PI + 1.3)).isCloseTo(driving / 10.5 * 10, within(1e-9));
    }

    @Test
    void aPathsSlopeAndHarmonicsShareTheSameSums() {
        // A whole half cycle of odd orders: squares add by Parseval, means by the sum of 2 a_k/(k pi); divided by the
        // loop.
        Design design = Changed.with(Fired.textbook(Stage.TRIAC, 10), "thyristor.device.onState", new OnState(0, 2.5))
                .withLine(new Line(230, 50, 207, 253, List.of(new Line.Harmonic(3, 0.1, 0))));
        HalfCycleCurrent half = new ResistorCurrent(design, EUROPE).firedAt(true, 0);
        double crest = Math.sqrt(2) * 230 / 12.5;
        assertThat(half.squareAmpRad()).isCloseTo(crest * crest * Math.PI / 2 * 1.01, within(1e-6));
        assertThat(half.chargeAmpRad()).isCloseTo(crest * 2 * (1 + 0.1 / 3), within(1e-6));
    }
}
