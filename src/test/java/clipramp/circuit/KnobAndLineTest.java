package clipramp.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.PotLaw.Table.Point;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The laws of the knob, of the line's wave and of the sheet's curves against their closed forms. */
class KnobAndLineTest {
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.1, 0.15, 0.3, 0.49})
    void aLogarithmicTrackGrowsByTheSameFactorOverEveryStepOfTheKnob(double half) {
        // An exponential through 0 at 0, m at one half and 1 at 1; its steps form a geometric series of ratio 1/m - 1.
        PotLaw law = new PotLaw.Logarithmic(half);
        assertThat(law.share(0)).isZero();
        assertThat(law.share(0.5)).isCloseTo(half, within(1e-12));
        assertThat(law.share(1)).isCloseTo(1, within(1e-12));
        double first = law.share(0.25);
        double ratio = Math.sqrt(1 / half - 1);
        assertThat(law.share(0.75) - law.share(0.5)).isCloseTo(first * ratio * ratio, within(1e-12));
        PotLaw reverse = new PotLaw.ReverseLogarithmic(half);
        for (double x = 0; x <= 1; x += 0.125) {
            assertThat(reverse.share(x)).isCloseTo(1 - law.share(1 - x), within(1e-15));
        }
        assertThat(reverse.share(0.5)).isCloseTo(1 - half, within(1e-12));
    }

    @Test
    void aMeasuredTrackRunsStraightBetweenItsPoints() {
        PotLaw table = new PotLaw.Table(List.of(new Point(0, 0.02), new Point(0.5, 0.2), new Point(1, 1)));
        assertThat(table.share(0)).isEqualTo(0.02);
        assertThat(table.share(0.25)).isCloseTo(0.11, within(1e-15));
        assertThat(table.share(0.5)).isCloseTo(0.2, within(1e-15));
        assertThat(table.share(0.75)).isCloseTo(0.6, within(1e-15));
        assertThat(table.share(1)).isEqualTo(1);
        assertThat(new PotLaw.Linear().share(0.3)).isEqualTo(0.3);
    }

    @Test
    void aTrimmerAtZeroAcrossATrackAtItsEndLeavesNothing() {
        assertThat(Pot.ohms(0, 0, 100_000, 0)).isZero();
        assertThat(Pot.ohms(1, 0, 100_000, 0)).isZero();
    }

    @Test
    void aShuntLiesAcrossTheUsedSectionOnly() {
        // Resistors in parallel: 30 k of a 40 k track (and 10 k of its end) across 40 k are 20 k.
        Pot pot = new Pot(Part.of(40_000), 10_000, new PotLaw.Linear(), Pot.Sense.RISING, Optional.of(Part.of(40_000)));
        Pot falling = Changed.with(pot, "sense", Pot.Sense.FALLING);
        Pot without = Changed.with(pot, "shunt", Optional.empty());
        assertThat(knobOnly(pot).rampOhms(0.75)).isCloseTo(20_000, within(1e-9));
        assertThat(knobOnly(falling).rampOhms(0.25)).isCloseTo(20_000, within(1e-9));
        assertThat(knobOnly(without).rampOhms(0.75)).isCloseTo(40_000, within(1e-9));
        assertThatThrownBy(() -> pot.trackShare(1.01)).hasMessageContaining("knob position");
    }

    /** A ramp whose resistor is the pot alone. */
    private static Ramp knobOnly(Pot pot) {
        return new Ramp(Part.of(100e-9), Part.of(0), Optional.of(pot));
    }

    @Test
    void trimmersStandAtTheMiddleOfTheirTracks() {
        Pot bare = new Pot(Part.of(100_000), 0, new PotLaw.Linear(), Pot.Sense.RISING, Optional.empty());
        Trimmers both = new Trimmers(Optional.of(Part.of(10_000)), Optional.of(Part.of(200_000)));
        Ramp ramp = new Ramp(Part.of(1e-7), Part.of(4_700), Optional.of(bare), both);
        assertThat(ramp.seriesOhms()).isEqualTo(9_700);
        assertThat(ramp.acrossOhms()).isEqualTo(100_000);
        assertThat(ramp.rampOhms(1)).isCloseTo(9_700 + 50_000, within(1e-9));
        Pot shunted = Changed.with(bare, "shunt", Optional.of(Part.of(50_000)));
        assertThat(Changed.with(ramp, "pot", Optional.of(shunted)).acrossOhms()).isEqualTo(150_000);
        assertThat(new Ramp(Part.of(1e-7), Part.of(4_700), Optional.of(bare)).acrossOhms())
                .isInfinite();
        assertThat(new Ramp(Part.of(1e-7), Part.of(4_700), Optional.of(shunted)).acrossOhms())
                .isEqualTo(50_000);
        assertThat(new Ramp(Part.of(1e-7), Part.of(4_700), Optional.empty()).rampOhms(0.5))
                .isEqualTo(4_700);
        assertThat(both.isNone()).isFalse();
        assertThat(new Trimmers(Optional.empty(), both.low()).isNone()).isFalse();
        assertThat(Trimmers.NONE.isNone()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.12, 1.0 / 6, 0.25, 0.5, 1})
    void aThirdHarmonicFlattensTheCrestAsPublished(double share) {
        // sin x + a sin 3x with a > 1/9 has its crests beside 90 degrees: (2/3)(1 + 3a) sqrt((1 + 3a)/(12a)); a = 1/6
        // gives the sqrt 3/2 of third-harmonic injection (Holmes and Lipo, Pulse Width Modulation for Power
        // Converters).
        Line line = new Line(230, 50, 207, 253, List.of(new Line.Harmonic(3, share, 0)));
        double crest = 2.0 / 3 * (1 + 3 * share) * Math.sqrt((1 + 3 * share) / (12 * share));
        assertThat(line.crestVolts(230)).isCloseTo(Math.sqrt(2) * 230 * crest, within(1e-9 * 325));
        assertThat(line.rmsFactor()).isCloseTo(Math.sqrt(1 + share * share), within(1e-15));
    }

    @Test
    void theWaveIsTheSumOfItsSines() {
        Line line = new Line(100, 50, 90, 110, List.of(new Line.Harmonic(5, 0.2, Math.PI)));
        // At 90 degrees the fundamental stands at 1 and the fifth, half a turn on, at -0.2.
        assertThat(line.voltsAt(100, Math.PI / 2)).isCloseTo(Math.sqrt(2) * 100 * 0.8, within(1e-9));
        assertThat(line.voltsAt(100, Math.PI / 10))
                .isCloseTo(Math.sqrt(2) * 100 * (Math.sin(Math.PI / 10) - 0.2), within(1e-9));
        Line third = new Line(100, 50, 90, 110, List.of(new Line.Harmonic(3, 0.1, Math.PI)));
        assertThat(third.crestVolts(100)).isCloseTo(Math.sqrt(2) * 110, within(1e-9));
        // An even harmonic raises one crest and lowers the other: the larger one counts, whichever half it stands in.
        for (double phase : new double[] {Math.PI / 2, -Math.PI / 2}) {
            Line even = new Line(100, 50, 90, 110, List.of(new Line.Harmonic(2, 0.1, phase)));
            assertThat(even.crestVolts(100)).isCloseTo(Math.sqrt(2) * 110, within(1e-9));
        }
    }

    @Test
    void theCrestOfALineWithoutSymmetryIsItsHighestOne() {
        // Found again by a scan of a thousandth of a degree; a crest is flat, so its best sample is right to 1e-9.
        Line line =
                new Line(100, 50, 90, 110, List.of(new Line.Harmonic(2, 0.05, 0.7), new Line.Harmonic(5, 0.1, 2.1)));
        double highest = 0;
        for (int i = 0; i < 360_000; i++) {
            highest = Math.max(highest, Math.abs(line.voltsAt(100, Math.toRadians(i / 1000.0))));
        }
        assertThat(line.crestVolts(100)).isBetween(highest - 1e-9, highest + 1e-6);
    }

    @Test
    void aSheetsCurrentIsStraightOnALogarithmicScale() {
        // Halfway between two temperatures stands the geometric mean; beyond the points the end slope goes on.
        TemperatureCurve curve = new TemperatureCurve(List.of(
                new TemperatureCurve.Point(125, 4e-3),
                new TemperatureCurve.Point(-40, 64e-3),
                new TemperatureCurve.Point(25, 16e-3)));
        assertThat(curve.ampsAt(-7.5)).isCloseTo(32e-3, within(1e-12));
        assertThat(curve.ampsAt(75)).isCloseTo(8e-3, within(1e-12));
        assertThat(curve.ampsAt(25)).isCloseTo(16e-3, within(1e-12));
        assertThat(curve.ampsAt(175)).isCloseTo(2e-3, within(1e-12));
        assertThat(curve.ampsAt(-72.5)).isCloseTo(128e-3, within(1e-12));
        assertThat(curve.isExtendedAt(-41)).isTrue();
        assertThat(curve.isExtendedAt(-40)).isFalse();
        assertThat(curve.isExtendedAt(125)).isFalse();
        assertThat(curve.isExtendedAt(126)).isTrue();
        // Common practice for a single point: twice the current at -40 °C.
        assertThat(TemperatureCurve.at25(10e-3).ampsAt(-40)).isCloseTo(20e-3, within(1e-12));
        assertThat(TemperatureCurve.at25(10e-3).isExtendedAt(25)).isFalse();
    }

    @Test
    void triggerDataOfThreePointsAreReadWithinTheirStretch() {
        TriggerDemand demand = new TriggerDemand(List.of(
                new TriggerDemand.Point(125, 4e-3, 0.6),
                new TriggerDemand.Point(-40, 64e-3, 1.6),
                new TriggerDemand.Point(25, 16e-3, 1.0)));
        assertThat(demand.ampsAt(-7.5)).isCloseTo(32e-3, within(1e-12));
        assertThat(demand.voltsAt(-7.5)).isCloseTo(1.3, within(1e-12));
        assertThat(demand.ampsAt(75)).isCloseTo(8e-3, within(1e-12));
        assertThat(demand.voltsAt(75)).isCloseTo(0.8, within(1e-12));
        assertThat(demand.voltsAt(25)).isCloseTo(1.0, within(1e-12));
        assertThat(demand.isExtendedAt(-40.5)).isTrue();
        assertThat(demand.isExtendedAt(-40)).isFalse();
        assertThat(demand.isExtendedAt(125)).isFalse();
        assertThat(demand.isExtendedAt(125.5)).isTrue();
    }
}
