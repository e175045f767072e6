package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Line;
import clipramp.circuit.Line.Harmonic;
import clipramp.circuit.RefusedCircuit;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** The line and what stands behind the dropper, against the sums of sines that DEVELOPERS.md (Line and source) writes. */
class LineWaveTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);

    private static LineWave wave(Harmonic... harmonics) {
        return new LineWave(new Line(230, 50, 207, 253, List.of(harmonics)), EUROPE);
    }

    @Test
    void aPureSineHasItsZerosAtTheFundamentals() {
        LineWave line = wave();
        assertThat(line.voltsAt(Math.PI / 2)).isCloseTo(325.269, within(1e-3));
        assertThat(line.positiveStartRad()).isZero();
        assertThat(line.negativeStartRad()).isEqualTo(Math.PI);
        assertThat(line.omega()).isCloseTo(314.159, within(1e-3));
        assertThat(line.isPureSine()).isTrue();
        assertThat(wave(new Harmonic(3, 0.02, 0)).isPureSine()).isFalse();
    }

    @Test
    void harmonicsAddAsSharesOfTheFundamental() {
        LineWave line = wave(new Harmonic(3, 0.05, 0.4), new Harmonic(7, 0.03, -1));
        double expected = Math.sqrt(2) * 230 * (Math.sin(1.1) + 0.05 * Math.sin(3.3 + 0.4) + 0.03 * Math.sin(7.7 - 1));
        assertThat(line.voltsAt(1.1)).isCloseTo(expected, within(1e-10));
    }

    @Test
    void theWavesOwnZerosAreFoundOneRisingOneFalling() {
        List<Harmonic[]> lines = List.of(
                new Harmonic[] {new Harmonic(5, 0.06, 0.7)},
                new Harmonic[] {new Harmonic(2, 0.1, Math.PI / 2)},
                new Harmonic[] {new Harmonic(3, 0.05, 1.2), new Harmonic(7, 0.05, 2)},
                new Harmonic[] {new Harmonic(40, 0.015, -0.5)});
        for (Harmonic[] harmonics : lines) {
            LineWave line = wave(harmonics);
            double rising = line.positiveStartRad();
            double falling = line.negativeStartRad();
            assertThat(line.voltsAt(rising)).isCloseTo(0, within(1e-9));
            assertThat(line.voltsAt(falling)).isCloseTo(0, within(1e-9));
            assertThat(line.voltsAt(rising + 1e-6)).isPositive();
            assertThat(line.voltsAt(falling + 1e-6)).isNegative();
            assertThat(rising).isBetween(-0.5, 0.5).isNotZero();
            assertThat(falling).isBetween(Math.PI - 0.5, Math.PI + 0.5);
        }
    }

    @Test
    void moreThanTwoZerosARefusalCounts() {
        // sin x - 0.6 sin 3x falls through both of the fundamental's zeros: three zeros at each.
        assertThatThrownBy(() -> wave(new Harmonic(3, 0.6, Math.PI)))
                .isInstanceOf(RefusedCircuit.class)
                .hasMessageContaining("6 zeros");
    }

    /** x = 0.021 sin 50 x has three roots within a fiftieth of a radian. */
    @Test
    void zerosThatLieCloseTogetherAreSeen() {
        assertThatThrownBy(() -> wave(new Harmonic(50, 0.021, Math.PI)))
                .isInstanceOf(RefusedCircuit.class)
                .hasMessageContaining("4 zeros");
        assertThat(wave(new Harmonic(50, 0.019, Math.PI)).positiveStartRad()).isCloseTo(0, within(1e-12));
        assertThatThrownBy(() -> wave(new Harmonic(50, 0.021, Math.PI), new Harmonic(2, 0.001, 0)))
                .isInstanceOf(RefusedCircuit.class);
    }

    /** Ten harmonics that add up to a notch at each crest, a twentieth of a radian wide: ten zeros by dense sampling. */
    @Test
    void aNotchFarFromAnyOtherZeroIsSeen() {
        Harmonic[] notch = IntStream.range(0, 10)
                .mapToObj(i -> new Harmonic(11 + 2 * i, 0.11, i % 2 == 0 ? 0 : Math.PI))
                .toArray(Harmonic[]::new);
        assertThatThrownBy(() -> wave(notch)).isInstanceOf(RefusedCircuit.class).hasMessageContaining("10 zeros");
    }

    @Test
    void evenOrdersBreakTheSymmetryOfTheHalves() {
        assertThat(wave().isHalfWaveSymmetric()).isTrue();
        assertThat(wave(new Harmonic(3, 0.05, 1), new Harmonic(5, 0.05, 1)).isHalfWaveSymmetric())
                .isTrue();
        assertThat(wave(new Harmonic(2, 0.01, 0)).isHalfWaveSymmetric()).isFalse();
        assertThat(wave(new Harmonic(2, 0, 0)).isHalfWaveSymmetric()).isTrue();
    }

    // --- behind the dropper -----------------------------------------------------------------------------------------

    @Test
    void theSourceIsTheLineScaledAndLessTheDrops() {
        LineWave line = wave(new Harmonic(3, 0.05, 0.4), new Harmonic(5, 0.02, 2));
        SourceWave source = new SourceWave();
        double start = line.negativeStartRad();
        source.set(line, start, -0.1, 1.4, 0.01);
        for (double t : new double[] {0, 1e-3, 5e-3, 9.9e-3}) {
            assertThat(source.at(t)).isCloseTo(-0.1 * line.voltsAt(start + line.omega() * t) - 1.4, within(1e-10));
            assertThat(source.slopeAt(t)).isCloseTo((source.at(t + 1e-7) - source.at(t - 1e-7)) / 2e-7, within(1e-3));
        }
        assertThat(source.seconds()).isEqualTo(0.01);
    }

    @Test
    void oneSourceServesLinesOfManySinusoidsAndOfOne() {
        SourceWave source = new SourceWave();
        source.set(wave(new Harmonic(3, 0.05, 0.4), new Harmonic(5, 0.02, 2)), 0, 1, 0, 0.01);
        source.setSine(100 * Math.PI, 325, 0.7, 0.02);
        assertThat(source.at(5e-3)).isCloseTo(325 - 0.7, within(1e-10));
        assertThat(source.slopeAt(0)).isCloseTo(325 * 100 * Math.PI, within(1e-7));
        assertThat(source.seconds()).isEqualTo(0.02);
        source.setConstant(1.3, 0.03);
        assertThat(source.at(7e-3)).isEqualTo(1.3);
        assertThat(source.slopeAt(7e-3)).isZero();
        assertThat(source.seconds()).isEqualTo(0.03);
    }
}
