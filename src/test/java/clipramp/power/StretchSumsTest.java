package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Stretches of constant current, whose means and squares are rectangles added by hand, and integrals in closed form. */
class StretchSumsTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final double TURN = 2 * Math.PI;
    private static final List<ActingPulses.Slot> TWO_SORTS = List.of(slot(true, 0), slot(false, 1));

    private static ActingPulses.Slot slot(boolean positive, int index) {
        return new ActingPulses.Slot(positive, OptionalDouble.of(1), index);
    }

    private static CurrentSpan steady(double from, double to, int direction, double amps, double volts) {
        return new CurrentSpan(from, to, direction, 0, rad -> amps, rad -> volts);
    }

    /** 2 A one way over half the turn and more, 1 A through the diode, 3 A the other way. */
    private static List<CurrentSpan> turn(double from) {
        return List.of(
                steady(from + 0.5, from + 4, 1, 2, 20),
                steady(from + 4, from + 4.5, 0, 1, -1),
                steady(from + 4.5, from + 6, -1, 3, 30));
    }

    private static LoadPeriod period(double spanRad, List<CurrentSpan> spans) {
        return new LoadPeriod(spanRad, spans, OptionalDouble.of(0.5), OptionalDouble.of(4.5), 1, true, false);
    }

    private static Design coil(Stage stage) {
        return Fired.textbook(stage, 10).withLoad(new Load.Inductive(10, 0.1, Optional.empty()));
    }

    @Test
    void meansAndSquaresAreTheRectanglesOverTheTurn() {
        // Charge 3.5 x 2 + 0.5 x 1 + 1.5 x 3 = 12 A rad, squares 14 + 0.5 + 13.5 = 28 A² rad.
        Design design = coil(Stage.TRIAC);
        LoadResult load = SpanTotals.of(design, EUROPE, period(TURN, turn(0)), 2, TWO_SORTS);
        assertThat(load.meanAmps()).isCloseTo(12 / TURN, within(1e-12));
        assertThat(load.rmsAmps()).isCloseTo(Math.sqrt(28 / TURN), within(1e-12));
        assertThat(load.watts()).isCloseTo(280 / TURN, within(1e-10));
        assertThat(load.fraction()).isCloseTo(280 / TURN / LoadPower.fullWatts(design, EUROPE), within(1e-12));
        assertThat(load.rmsVolts()).isCloseTo(Math.sqrt((3.5 * 400 + 0.5 * 1 + 1.5 * 900) / TURN), within(1e-11));
        assertThat(load.peakAmps()).isEqualTo(3);
        assertThat(load.formFactor()).isCloseTo(Math.sqrt(28 * TURN) / 12, within(1e-12));
        assertThat(load.conductionRad()).isCloseTo(5.5 / 2, within(1e-12));
    }

    @Test
    void theDiodesShareReachesTheLoadButNeitherLineNorThyristor() {
        LoadResult load = SpanTotals.of(coil(Stage.TRIAC), EUROPE, period(TURN, turn(0)), 2, TWO_SORTS);
        assertThat(load.dcAmps()).isCloseTo((7 - 4.5) / TURN, within(1e-12));
        assertThat(load.thyristorMeanAmps()).isCloseTo((7 + 4.5) / TURN, within(1e-12));
        assertThat(load.thyristorRmsAmps()).isCloseTo(Math.sqrt((14 + 13.5) / TURN), within(1e-12));
        assertThat(load.powerFactor()).isCloseTo(280 / TURN / (230 * Math.sqrt(27.5 / TURN)), within(1e-12));
        LoadResult pair = SpanTotals.of(coil(Stage.INVERSE_PARALLEL), EUROPE, period(TURN, turn(0)), 2, TWO_SORTS);
        assertThat(pair.thyristorMeanAmps()).as("the busier of two").isCloseTo(7 / TURN, within(1e-12));
        assertThat(pair.thyristorRmsAmps()).isCloseTo(Math.sqrt(14 / TURN), within(1e-12));
    }

    @Test
    void aStretchOverTheZeroGivesEachHalfCycleItsPart() {
        double first = (Math.PI - 0.5) * 4;
        List<Double> apart = SpanTotals.of(coil(Stage.TRIAC), EUROPE, period(TURN, turn(0)), 2, TWO_SORTS)
                .halfWatts();
        assertThat(apart).hasSize(2);
        assertThat(apart.get(0)).isCloseTo(first / Math.PI * 10, within(1e-11));
        assertThat(apart.get(1)).isCloseTo((28 - first) / Math.PI * 10, within(1e-11));
        List<Double> alike = SpanTotals.of(
                        coil(Stage.TRIAC), EUROPE, period(TURN, turn(0)), 1, List.of(slot(true, 0), slot(false, 0)))
                .halfWatts();
        assertThat(alike).hasSize(1);
        assertThat(alike.get(0)).isCloseTo(28 / TURN * 10, within(1e-11));
    }

    @Test
    void twiceTheSameTurnSaysTheSame() {
        List<CurrentSpan> both = new ArrayList<>(turn(0));
        both.addAll(turn(TURN));
        LoadResult once = SpanTotals.of(coil(Stage.TRIAC), EUROPE, period(TURN, turn(0)), 2, TWO_SORTS);
        LoadResult twice = SpanTotals.of(coil(Stage.TRIAC), EUROPE, period(2 * TURN, both), 2, TWO_SORTS);
        assertThat(twice.watts()).isCloseTo(once.watts(), within(1e-10));
        assertThat(twice.rmsVolts()).isCloseTo(once.rmsVolts(), within(1e-10));
        assertThat(twice.conductionRad()).isCloseTo(once.conductionRad(), within(1e-11));
        assertThat(twice.halfWatts().get(0)).isCloseTo(once.halfWatts().get(0), within(1e-10));
        assertThat(twice.halfWatts().get(1)).isCloseTo(once.halfWatts().get(1), within(1e-10));
        assertThat(twice.halfCycles()).isEqualTo(4);
    }

    @Test
    void ofAHalfWaveStageOnlyTheHalvesThatMayConductCount() {
        List<CurrentSpan> one = List.of(steady(0.5, 3, 1, 2, 20));
        assertThat(SpanTotals.of(coil(Stage.HALF_WAVE), EUROPE, period(TURN, one), 1, TWO_SORTS.subList(0, 1))
                        .conductionRad())
                .isCloseTo(2.5, within(1e-12));
        assertThat(SpanTotals.of(coil(Stage.TRIAC), EUROPE, period(TURN, one), 1, TWO_SORTS.subList(0, 1))
                        .conductionRad())
                .isCloseTo(1.25, within(1e-12));
    }

    @Test
    void whatThePeriodKnowsIsPassedOn() {
        LoadResult load = SpanTotals.of(coil(Stage.TRIAC), EUROPE, period(TURN, turn(0)), 2, TWO_SORTS);
        assertThat(load.firedRad()).hasValue(0.5);
        assertThat(load.extinctionRad()).hasValue(4.5);
        assertThat(load.missedHalves()).isEqualTo(1);
        assertThat(load.letsGo()).isFalse();
        assertThat(load.lightShare()).isEmpty();
    }

    @Test
    void aCurrentEndsWhereNoneTakesItsPlace() {
        assertThat(period(TURN, turn(0)).extinctionsRad()).containsExactly(6.0);
        List<CurrentSpan> gaps = List.of(steady(0.2, 1, 1, 2, 20), steady(1.5, 2, 0, 1, 0), steady(2, TURN, -1, 1, 1));
        assertThat(period(TURN, gaps).extinctionsRad()).containsExactly(1.0, TURN);
        List<CurrentSpan> round = List.of(steady(0, 1, 1, 2, 20), steady(1, TURN, -1, 1, 1));
        assertThat(period(TURN, round).extinctionsRad()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({"0.002,2", "0.05,2", "0.05,40", "0.5,40", "1,11", "30,80"})
    void anExponentialTimesASinusoidIsIntegratedToRounding(double memoryRad, int order) {
        // Integral of e^(-x/m) sin(n x) from 0 to b, as in any table of integrals.
        double from = 0.3;
        double length = 3;
        CurrentSpan span = new CurrentSpan(from, from + length, 1, memoryRad, rad -> 0, rad -> 0);
        double[] sum = {0, 0};
        SpanQuadrature.visit(span, order, (rad, weight) -> {
            sum[0] += weight * Math.exp(-(rad - from) / memoryRad) * Math.sin(order * (rad - from));
            sum[1] += weight;
        });
        double a = 1 / memoryRad;
        double gone = Math.exp(-a * length) * (a * Math.sin(order * length) + order * Math.cos(order * length));
        double exact = (order - gone) / (a * a + order * order);
        assertThat(sum[0]).isCloseTo(exact, within(1e-11));
        assertThat(sum[1]).isCloseTo(length, within(1e-13));
    }

    @Test
    void anOrderIsAShareOfTheFundamentalAndNoCurrentHasNoShares() {
        // A square wave's third is a third of its fundamental, its fifth a fifth; any handbook.
        Design design = Fired.textbook(Stage.TRIAC, 10);
        List<CurrentSpan> square = List.of(steady(0, Math.PI, 1, 5, 50), steady(Math.PI, TURN, -1, 5, 50));
        LineCurrent current = LineCurrent.of(design, EUROPE, period(TURN, square));
        assertThat(current.shareOf(1)).isEqualTo(1);
        assertThat(current.shareOf(3)).isCloseTo(1 / 3.0, within(1e-12));
        assertThat(current.shareOf(5)).isCloseTo(1 / 5.0, within(1e-12));
        assertThat(current.fundamentalAmps()).isCloseTo(5 * 4 / Math.PI / Math.sqrt(2), within(1e-12));
        assertThat(current.rmsAmps()).isCloseTo(5, within(1e-12));
        assertThat(current.lineWatts()).isCloseTo(5 * 2 * Math.sqrt(2) * 230 / Math.PI, within(1e-9));
        assertThat(LineCurrent.of(design, EUROPE, period(TURN, List.of())).shareOf(3))
                .isNaN();
    }

    @Test
    void theDiodesCurrentIsNoneOfTheLines() {
        Design design = Fired.textbook(Stage.BRIDGE_DC, 10);
        List<CurrentSpan> diode = List.of(steady(0, 1, 1, 2, 20), steady(1, 3, 0, 4, 0));
        LineCurrent current = LineCurrent.of(design, EUROPE, period(TURN, diode));
        assertThat(current.rmsAmps()).isCloseTo(Math.sqrt(4 / TURN), within(1e-12));
        assertThat(current.dcAmps()).isCloseTo(2 / TURN, within(1e-12));
    }

    @Test
    void theHighestOrderOfALineIsThatOfItsLastHarmonic() {
        Line.Harmonic seventh = new Line.Harmonic(7, 0.01, 0);
        Line.Harmonic third = new Line.Harmonic(3, 0.01, 0);
        assertThat(SpanTotals.highestOrder(new Line(230, 50, 207, 253, List.of(seventh, third))))
                .isEqualTo(7);
        assertThat(SpanTotals.highestOrder(new Line(230, 50, 207, 253, List.of())))
                .isEqualTo(1);
    }
}
