package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.Winding;
import clipramp.engine.UnitValues;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Nominal units of every sort that the swift path takes, and one of every sort that it leaves to the reference path. */
class SwiftEdgesTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final Design HEATER = SampleDesigns.heater();
    private static final Design HALF_WAVE = SampleDesigns.halfWaveHeater();

    private static Design wound(Design design, double volts, boolean opposite, double lagRad) {
        return Changed.with(design, "clip.winding", Optional.of(new Winding(230, volts, opposite, lagRad)));
    }

    static Stream<Design> taken() {
        Design low = Changed.with(wound(HEATER, 48, true, 0), "clip.dropper.value", 1_500.0);
        return Stream.of(
                HEATER,
                HEATER.withStageDiodes(new StageDiodes(1.1, 0.4)),
                low,
                HALF_WAVE,
                wound(HALF_WAVE, 200, false, 0),
                SampleDesigns.programmableHeater());
    }

    @ParameterizedTest
    @MethodSource("taken")
    void whatItTakesIsTheReferencePathsAngleAndPower(Design design) {
        assertThat(SwiftPoint.suits(design)).isTrue();
        SwiftPoint swift = new SwiftPoint(design);
        for (double ohms : new double[] {12_000, 30_000, 55_000}) {
            assertThat(swift.solve(UnitValues.nominal(design), ohms)).isTrue();
            Solution reference = Firing.solve(design, EUROPE, ohms);
            LoadResult load = LoadPower.of(design, EUROPE, reference);
            assertThat(swift.firingRad())
                    .isCloseTo(reference.shown().firingRad().orElseThrow(), within(1e-9 * Math.PI));
            assertThat(swift.watts()).isCloseTo(load.watts(), within(1e-8 * 1200));
            assertThat(swift.fraction()).isCloseTo(load.fraction(), within(1e-8));
            assertThat(swift.state()).isEqualTo(reference.state());
        }
    }

    @Test
    void aThyristorThatStaysOffGivesNoAngleAndNoPower() {
        Design lazy = Changed.with(HEATER, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20)));
        SwiftPoint swift = new SwiftPoint(lazy);
        assertThat(swift.solve(UnitValues.nominal(lazy), 30_000)).isTrue();
        assertThat(swift.firingRad()).isNaN();
        assertThat(swift.watts()).isZero();
        assertThat(swift.fraction()).isZero();
    }

    @Test
    void everyOtherSortIsLeftToTheReferencePath() {
        Line distorted = new Line(230, 50, 207, 253, List.of(new Line.Harmonic(5, 0.05, 0)));
        assertThat(Stream.of(
                        HEATER.withLine(distorted),
                        SampleDesigns.thyristorTapHeater(),
                        wound(HEATER, 230, false, 0.1),
                        wound(HALF_WAVE, 230, true, 0),
                        HALF_WAVE.withStage(HEATER.stage()),
                        SampleDesigns.inverseParallelHeater(),
                        HEATER.withLoad(new Load.Filament(300, 230, 1.55, 12)),
                        HALF_WAVE.withLoad(new Load.Inductive(40, 0.1, Optional.empty()))))
                .noneMatch(SwiftPoint::suits);
    }
}
