package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.ThyristorDevice.OnState;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** How long a thyristor is let recover, against the closed form of the current through resistance and inductance. */
class HoldingGapTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final double CREST = Math.sqrt(2) * 230;

    private static Design coil(Stage stage, double ohms, double henries) {
        return Fired.textbook(stage, 10).withLoad(new Load.Inductive(ohms, henries, Optional.empty()));
    }

    /** From nothing at an angle: V/Z (sin(x - phi) - sin(a - phi) e^...) - D/R (1 - e^...), any book on power electronics. */
    private static DoubleUnaryOperator grown(double ohms, double henries, double drop, double from) {
        double reactance = EUROPE.omega() * henries;
        double phi = Math.atan2(reactance, ohms);
        return rad -> {
            double gone = Math.exp(-(rad - from) * ohms / reactance);
            return CREST / Math.hypot(ohms, reactance) * (Math.sin(rad - phi) - Math.sin(from - phi) * gone)
                    - drop / ohms * (1 - gone);
        };
    }

    private static double root(DoubleUnaryOperator function, double from, double to) {
        return new BrentSolver(1e-14).solve(300, function::applyAsDouble, from, to);
    }

    @ParameterizedTest
    @CsvSource({"100,0.02", "100,0.5", "80,0.3", "130,0.3"})
    void onTheAcSideOfABridgeTheGapLiesAroundTheCurrentsOwnZero(double degrees, double holdingAmps) {
        // The bridge turns the load's current over at once, so it would grow again the other way from its end on.
        Design design = Changed.with(coil(Stage.BRIDGE_AC, 20, 0.2), "thyristor.device.onState", new OnState(1, 0.5))
                .withStageDiodes(new StageDiodes(0.9, 0));
        double fired = Math.toRadians(degrees);
        DoubleUnaryOperator first = grown(20.5, 0.2, 2.8, fired);
        double end = root(first, fired + 0.5, fired + 1.9 * Math.PI);
        double before = end - root(rad -> first.applyAsDouble(rad) - holdingAmps, end - 0.3, end);
        DoubleUnaryOperator second = grown(20.5, 0.2, 2.8, end - Math.PI);
        double after =
                root(rad -> second.applyAsDouble(rad) - holdingAmps, end - Math.PI, end - Math.PI / 2) - end + Math.PI;
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, fired);
        assertThat(HoldingGap.seconds(design, EUROPE, period, holdingAmps))
                .isCloseTo((before + after) / EUROPE.omega(), within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(doubles = {12, 24, 230})
    void hardlyAnyInductanceLeavesTheGapOfAResistor(double volts) {
        // With L gone the current follows (|v| - D)/R: under I_H within asin((D + R I_H)/V) of the zero on either side.
        Condition line = new Condition(volts, 50, 25);
        Design design = Changed.with(coil(Stage.BRIDGE_AC, 20, 1e-6), "thyristor.device.onState", new OnState(1, 0))
                .withStageDiodes(new StageDiodes(0.9, 0));
        double edge = Math.asin((2.8 + 20 * 30e-3) / (Math.sqrt(2) * volts));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, line, 1);
        assertThat(HoldingGap.seconds(design, line, period, 30e-3)).isCloseTo(2 * edge / line.omega(), within(2e-6));
    }

    @Test
    void aCurrentThatNeverReachesTheHoldingCurrentLeavesAQuarterPeriodOnEitherSideAtMost() {
        Design design = coil(Stage.BRIDGE_AC, 20, 0.2);
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, Math.toRadians(150));
        assertThat(HoldingGap.seconds(design, EUROPE, period, 50)).isCloseTo(0.01, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource({"0,0", "0.05,0", "0.05,0.4"})
    void behindAFreewheelingDiodeTheSlopesMoveTheInstantOfTakingTheCurrentBack(double slope, double pathSlope) {
        // Kirchhoff: carrying I_H of a current i, the path needs |v| = D + r I_H - V_FW - r_FW (i - I_H).
        double holding = 0.1;
        Design design = Changed.with(
                        Fired.textbook(Stage.BRIDGE_DC, 10), "thyristor.device.onState", new OnState(1, pathSlope))
                .withStageDiodes(new StageDiodes(0.9, 0))
                .withLoad(new Load.Inductive(40, 0.4, Optional.of(new StageDiodes(0.7, slope))));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, 1);
        double carried = carried(period, Math.PI);
        assertThat(carried).isGreaterThan(1);
        double needed = 2.8 + pathSlope * holding - 0.7 - slope * (carried - holding);
        assertThat(HoldingGap.seconds(design, EUROPE, period, holding))
                .isCloseTo(2 * Math.asin(needed / CREST) / EUROPE.omega(), within(1e-9));
    }

    @Test
    void aDiodeThatTakesItsCurrentBackAtTwiceTheHoldingCurrentLeavesNoGap() {
        // At the zero the diode has it (2.7 V + 3 ohm x i under 2.8 V + 3.5 ohm x i); the path with I_H alone drops
        // less.
        double holding = 0.1;
        Design design = Changed.with(
                        Fired.textbook(Stage.BRIDGE_DC, 10), "thyristor.device.onState", new OnState(1, 3.5))
                .withStageDiodes(new StageDiodes(0.9, 0))
                .withLoad(new Load.Inductive(40, 0.4, Optional.of(new StageDiodes(2.7, 3))));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, 1);
        assertThat(period.letsGo()).isTrue();
        assertThat(HoldingGap.seconds(design, EUROPE, period, holding)).isZero();
    }

    @ParameterizedTest
    @CsvSource({"12,2e-3", "12,0.03", "230,2e-3", "230,0.03"})
    void aFreewheelingCurrentUnderTheHoldingCurrentMustGrowToItAgain(double volts, double henries) {
        // Fired late, what is left at the zero is under I_H; from where the line exceeds the drops it grows again.
        Condition line = new Condition(volts, 50, 25);
        Design design = Changed.with(Fired.textbook(Stage.BRIDGE_DC, 10), "thyristor.device.onState", new OnState(1, 0))
                .withStageDiodes(new StageDiodes(0.9, 0))
                .withLoad(new Load.Inductive(20, henries, Optional.of(new StageDiodes(0.7, 0))));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, line, Math.toRadians(179));
        double edge = Math.asin(2.8 / (Math.sqrt(2) * volts));
        double reactance = line.omega() * henries;
        double phi = Math.atan2(reactance, 20);
        double holding = 0.1;
        DoubleUnaryOperator amps = rad -> {
            double gone = Math.exp(-(rad - edge) * 20 / reactance);
            return Math.sqrt(2)
                            * volts
                            / Math.hypot(20, reactance)
                            * (Math.sin(rad - phi) - Math.sin(edge - phi) * gone)
                    - 2.8 / 20 * (1 - gone);
        };
        double reached = root(rad -> amps.applyAsDouble(rad) - holding, edge, Math.PI / 2);
        assertThat(HoldingGap.seconds(design, line, period, holding)).isCloseTo(reached / line.omega(), within(1e-5));
    }

    @Test
    void ofTwoZerosTheOneWhereTheDiodeCarriesMoreLeavesTheShorterGap() {
        // Half cycles fired at 1 rad and at 2.4 rad: more is left at pi than at 2 pi, and the slope counts it.
        Design design = Changed.with(Fired.textbook(Stage.BRIDGE_DC, 10), "thyristor.device.onState", new OnState(1, 0))
                .withStageDiodes(new StageDiodes(0.9, 0))
                .withLoad(new Load.Inductive(4, 0.04, Optional.of(new StageDiodes(0.7, 0.05))));
        LoadPeriod period = LoadPower.period(design, EUROPE, Fired.unlike(EUROPE, 1, 2.4));
        assertThat(period.settled()).isTrue();
        assertThat(period.halfCycles()).isEqualTo(2);
        double first = carried(period, Math.PI);
        assertThat(first).isGreaterThan(carried(period, 2 * Math.PI) + 1);
        double needed = 2.8 - 0.7 - 0.05 * (first - 0.1);
        assertThat(HoldingGap.seconds(design, EUROPE, period, 0.1))
                .isCloseTo(2 * Math.asin(needed / CREST) / EUROPE.omega(), within(1e-9));
    }

    private static double carried(LoadPeriod period, double rad) {
        return period.spans().stream()
                .filter(span -> !span.throughThyristor() && span.fromRad() <= rad && rad <= span.toRad())
                .mapToDouble(span -> span.amps().applyAsDouble(rad))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void onADistortedLineEitherSideOfTheZeroHasItsOwnSlope() {
        // |v| = R I_H to the left and to the right of each of the line's zeros, each found by itself.
        Line line =
                new Line(230, 50, 207, 253, List.of(new Line.Harmonic(2, 0.15, 1.2), new Line.Harmonic(3, 0.15, 0.5)));
        Design design = Fired.textbook(Stage.BRIDGE_DC, 10).withLine(line);
        DoubleUnaryOperator volts = rad -> line.voltsAt(230, rad);
        double holding = 8;
        double least = Double.POSITIVE_INFINITY;
        for (double near : new double[] {0, Math.PI}) {
            double zero = root(volts, near - 0.5, near + 0.5);
            double left = root(rad -> Math.abs(volts.applyAsDouble(rad)) - 10 * holding, zero - 0.6, zero);
            double right = root(rad -> Math.abs(volts.applyAsDouble(rad)) - 10 * holding, zero, zero + 0.6);
            assertThat(Math.abs(zero - left - (right - zero))).isGreaterThan(1e-3);
            least = Math.min(least, right - left);
        }
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, 1);
        assertThat(HoldingGap.seconds(design, EUROPE, period, holding))
                .isCloseTo(least / EUROPE.omega(), within(1e-10));
    }

    @Test
    void elsewhereTheLineReversesTheThyristorUntilItsOwnHalfCycleBeginsAgain() {
        Design design = coil(Stage.TRIAC, 20, 0.2);
        double[][] ends = {{1, 4, 2 * Math.PI - 4}, {-1, 7, 3 * Math.PI - 7}, {1, 2 * Math.PI, 2 * Math.PI}};
        for (double[] end : ends) {
            CurrentSpan span = new CurrentSpan(end[1] - 1, end[1], (int) end[0], 0, rad -> 1, rad -> 10);
            LoadPeriod period = new LoadPeriod(
                    4 * Math.PI, List.of(span), OptionalDouble.of(1), OptionalDouble.of(2), 0, true, true);
            assertThat(HoldingGap.seconds(design, EUROPE, period, 30e-3) * EUROPE.omega())
                    .isCloseTo(Math.min(Math.PI, end[2]), within(1e-9));
        }
    }

    @Test
    void aThyristorThatNeverLetsGoHasNoGap() {
        Design design = coil(Stage.TRIAC, 20, 0.2);
        LoadPeriod held =
                new LoadPeriod(2 * Math.PI, List.of(), OptionalDouble.of(1), OptionalDouble.empty(), 0, true, false);
        assertThat(HoldingGap.seconds(design, EUROPE, held, 30e-3)).isZero();
    }
}
