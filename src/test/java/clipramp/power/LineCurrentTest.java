package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;
import org.junit.jupiter.api.Test;

class LineCurrentTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final int SAMPLES = 1 << 14;

    private static LineCurrent current(Design design, double rad) {
        return LineCurrent.of(design, EUROPE, LoadPower.periodAtFiringAngle(design, EUROPE, rad));
    }

    @Test
    void aResistorsHarmonicsAreThoseOfTheClosedFormAtEveryFifteenDegrees() {
        // Fourier integrals of sin(theta) from alpha to pi, both half cycles, as in any handbook.
        Design heater = Fired.textbook(Stage.TRIAC, 50);
        double full = 230.0 / 50;
        for (int degrees = 0; degrees < 180; degrees += 15) {
            double a = Math.toRadians(degrees);
            LineCurrent current = current(heater, a);
            for (int n = 3; n <= 39; n += 2) {
                double sine = (Math.sin((n + 1) * a) / (n + 1) - Math.sin((n - 1) * a) / (n - 1)) / Math.PI;
                double cosine =
                        ((Math.cos((n + 1) * a) - 1) / (n + 1) + (1 - Math.cos((n - 1) * a)) / (n - 1)) / Math.PI;
                assertThat(current.ampsOf(n))
                        .as("order " + n + " at " + degrees)
                        .isCloseTo(full * Math.hypot(sine, cosine), within(1e-12));
            }
            for (int n = 2; n <= 40; n += 2) {
                assertThat(current.ampsOf(n)).isCloseTo(0, within(1e-12));
            }
        }
    }

    @Test
    void atNinetyDegreesTheThirdIsOneOverPiOfTheFullFundamental() {
        // Closed form: I1 0.5927, I3 1/pi, I5 = I7 = 0.1061 of the full fundamental; THD 65.05 %, PF 0.7071.
        LineCurrent current = current(Fired.textbook(Stage.INVERSE_PARALLEL, 50), Math.PI / 2);
        double full = 230.0 / 50;
        assertThat(current.ampsOf(1) / full).isCloseTo(0.5927, within(5e-5));
        assertThat(current.ampsOf(3) / full).isCloseTo(1 / Math.PI, within(1e-13));
        assertThat(current.ampsOf(5) / full).isCloseTo(0.1061, within(5e-5));
        assertThat(current.ampsOf(7)).isCloseTo(current.ampsOf(5), within(1e-12));
        assertThat(current.distortion()).isCloseTo(0.6505, within(5e-5));
        assertThat(current.powerFactor()).isCloseTo(Math.sqrt(0.5), within(1e-12));
        // Displacement of the half-controlled sine: tan phi = (1/pi)/(1/2).
        assertThat(current.displacementFactor()).isCloseTo(Math.cos(Math.atan(2 / Math.PI)), within(1e-12));
    }

    @Test
    void hartExample5Point1FromMemoryHasADistortionOf63Percent() {
        // Hart, Power Electronics, example 5-1, from memory: 120 V, 15 ohm, 500 W at 88.1 degrees.
        Condition america = new Condition(120, 60, 25);
        Design heater = Fired.textbook(Stage.TRIAC, 15);
        double rad = KnobSearch.firingRadForWatts(heater, america, 500).getAsDouble();
        LineCurrent current = LineCurrent.of(heater, america, LoadPower.periodAtFiringAngle(heater, america, rad));
        assertThat(current.distortion()).isCloseTo(0.63, within(0.005));
        assertThat(current.powerFactor()).isCloseTo(0.72, within(0.005));
    }

    @Test
    void everyStageAndLoadAgreesWithAFastFourierTransformOfItsSampledCurrent() {
        Line distorted =
                new Line(230, 50, 207, 253, List.of(new Line.Harmonic(5, 0.06, 1), new Line.Harmonic(7, 0.05, 2)));
        // On the sampling grid, so that the sample on the jump can be given its middle value.
        double rad = 2 * Math.PI * (SAMPLES / 5) / SAMPLES;
        // Without drops the diode takes over at the line's zero, which is on the grid too.
        Optional<StageDiodes> diode = Optional.of(new StageDiodes(0, 0));
        Load coil = new Load.Inductive(30, 0.12, Optional.empty());
        for (Design design : List.of(
                Fired.textbook(Stage.TRIAC, 40),
                Fired.textbook(Stage.HALF_WAVE, 40),
                Fired.textbook(Stage.BRIDGE_DC, 40).withLine(distorted),
                Fired.textbook(Stage.TRIAC, 40).withLoad(new Load.Filament(300, 230, 1.55, 12)),
                Fired.textbook(Stage.INVERSE_PARALLEL, 40).withLoad(coil),
                Fired.textbook(Stage.TRIAC, 40).withLoad(coil).withLine(distorted),
                Fired.textbook(Stage.HALF_WAVE, 40).withLoad(coil),
                Fired.textbook(Stage.HALF_WAVE, 40).withLoad(new Load.Inductive(30, 0.12, diode)),
                Fired.textbook(Stage.BRIDGE_DC, 40).withLoad(new Load.Inductive(30, 0.12, diode)))) {
            compare(design, rad);
        }
    }

    private static void compare(Design design, double rad) {
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, rad);
        LineCurrent current = LineCurrent.of(design, EUROPE, period);
        Complex[] spectrum =
                new FastFourierTransformer(DftNormalization.STANDARD).transform(sampled(period), TransformType.FORWARD);
        double within = 1e-6 * current.fundamentalAmps();
        assertThat(current.dcAmps()).isCloseTo(spectrum[0].getReal() / SAMPLES, within(within));
        for (int order = 1; order <= 40; order++) {
            assertThat(current.ampsOf(order))
                    .as(design.stage() + " " + design.load() + " order " + order)
                    .isCloseTo(Math.sqrt(2) * spectrum[order].abs() / SAMPLES, within(within));
        }
    }

    /** Line current at evenly spaced angles; where it jumps, the mean of both sides, as Fourier's series has it. */
    private static double[] sampled(LoadPeriod period) {
        double[] samples = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            double rad = 2 * Math.PI * i / SAMPLES;
            samples[i] = (at(period, rad - 1e-9) + at(period, rad + 1e-9)) / 2;
        }
        return samples;
    }

    private static double at(LoadPeriod period, double rad) {
        double there = rad < 0 ? rad + period.spanRad() : rad;
        return period.spans().stream()
                .filter(span -> span.fromRad() <= there && there < span.toRad())
                .mapToDouble(span -> span.direction() * span.amps().applyAsDouble(there))
                .sum();
    }

    @Test
    void aHalfWaveStageDrawsDirectCurrentAndEvenHarmonics() {
        LineCurrent current = current(Fired.textbook(Stage.HALF_WAVE, 50), 0);
        // Half-wave rectified sine of amplitude 1: dc 1/pi, fundamental 1/2, second 2/(3 pi), fourth 2/(15 pi).
        double crest = Math.sqrt(2) * 230 / 50;
        assertThat(current.dcAmps()).isCloseTo(crest / Math.PI, within(1e-12));
        assertThat(current.ampsOf(1) * Math.sqrt(2)).isCloseTo(crest / 2, within(1e-12));
        assertThat(current.ampsOf(2) * Math.sqrt(2)).isCloseTo(crest * 2 / (3 * Math.PI), within(1e-12));
        assertThat(current.ampsOf(4) * Math.sqrt(2)).isCloseTo(crest * 2 / (15 * Math.PI), within(1e-12));
        assertThat(current.ampsOf(3)).isCloseTo(0, within(1e-12));
    }

    @Test
    void powerOfTheLineIsTheLoadsAndWhatTheStageLoses() {
        Design coil = Fired.textbook(Stage.BRIDGE_DC, 40)
                .withStageDiodes(new StageDiodes(1, 0.02))
                .withLoad(new Load.Inductive(30, 0.12, Optional.of(new StageDiodes(0, 0))));
        LoadPeriod period = LoadPower.periodAtFiringAngle(coil, EUROPE, 1.2);
        LoadResult load = LoadPower.atFiringAngle(coil, EUROPE, 1.2);
        double lost = 2 * (1 * load.thyristorMeanAmps() + 0.02 * load.thyristorRmsAmps() * load.thyristorRmsAmps());
        assertThat(LineCurrent.of(coil, EUROPE, period).lineWatts())
                .isCloseTo(load.watts() + lost, within(1e-7 * load.watts()));
    }

    @Test
    void aLoadThatStaysOffHasNoFactors() {
        LineCurrent none = LineCurrent.of(
                Fired.textbook(Stage.TRIAC, 40),
                EUROPE,
                LoadPower.period(Fired.textbook(Stage.TRIAC, 40), EUROPE, Fired.silent(EUROPE)));
        assertThat(none.rmsAmps()).isZero();
        assertThat(none.distortion()).isNaN();
        assertThat(none.powerFactor()).isNaN();
    }
}
