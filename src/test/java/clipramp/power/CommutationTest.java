package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Snubber;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import java.util.Optional;
import java.util.Random;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.apache.commons.math3.ode.sampling.StepHandler;
import org.apache.commons.math3.ode.sampling.StepInterpolator;
import org.junit.jupiter.api.Test;

class CommutationTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);

    private static Load.Inductive coil(double ohms, double henries) {
        return new Load.Inductive(ohms, henries, Optional.empty());
    }

    @Test
    void withoutASnubberAnUndampedStepRingsToTwiceItsHeight() {
        // Series resonance: peak 2 V, largest rate V/sqrt(LC), as in any handbook.
        ReappliedVoltage back = ReappliedVoltage.of(coil(1e-3, 0.1), Optional.empty(), 300);
        assertThat(back.peakVolts()).isCloseTo(600, within(0.5));
        assertThat(back.voltsPerSecond())
                .isCloseTo(300 / Math.sqrt(0.1 * ReappliedVoltage.STRAY_FARADS), within(1e-3 * 1e8));
        assertThat(back.snubbed()).isFalse();
    }

    @Test
    void theStepThroughASnubberAgreesWithAGeneralPurposeIntegrator() {
        for (int seed = 0; seed < 20; seed++) {
            Random random = new Random(seed);
            double ohms = 5 * Math.pow(40, random.nextDouble());
            double henries = 0.01 * Math.pow(100, random.nextDouble());
            Snubber snubber =
                    new Snubber(20 * Math.pow(50, random.nextDouble()), 10e-9 * Math.pow(50, random.nextDouble()));
            double step = 50 + 250 * random.nextDouble();
            ReappliedVoltage back = ReappliedVoltage.of(coil(ohms, henries), Optional.of(snubber), step);
            double[] truth = integrated(ohms, henries, snubber, step);
            assertThat(back.peakVolts()).as("seed " + seed).isCloseTo(Math.max(step, truth[0]), within(1e-3 * step));
            assertThat(back.voltsPerSecond()).as("seed " + seed).isCloseTo(truth[1], within(2e-3 * truth[1]));
        }
    }

    /** Largest voltage and rate of rise at the thyristor, by integration. */
    private static double[] integrated(double ohms, double henries, Snubber snubber, double step) {
        double rs = snubber.resistanceOhms();
        double c = snubber.capacitanceFarads();
        double[] most = {0, step * rs / henries};
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-12, 1e-5, 1e-10, 1e-10);
        integrator.addStepHandler(new StepHandler() {
            @Override
            public void init(double t0, double[] y0, double t) {}

            @Override
            public void handleStep(StepInterpolator interpolator, boolean last) {
                for (int i = 0; i <= 20; i++) {
                    double from = interpolator.getPreviousTime();
                    interpolator.setInterpolatedTime(from + (interpolator.getCurrentTime() - from) * i / 20);
                    double amps = interpolator.getInterpolatedState()[0];
                    double slope = interpolator.getInterpolatedDerivatives()[0];
                    most[0] = Math.max(most[0], rs * amps + interpolator.getInterpolatedState()[1]);
                    most[1] = Math.max(most[1], rs * slope + amps / c);
                }
            }
        });
        double[] y = {0, 0};
        integrator.integrate(
                new FirstOrderDifferentialEquations() {
                    @Override
                    public int getDimension() {
                        return 2;
                    }

                    @Override
                    public void computeDerivatives(double t, double[] s, double[] ds) {
                        ds[0] = (step - (ohms + rs) * s[0] - s[1]) / henries;
                        ds[1] = s[0] / c;
                    }
                },
                0,
                y,
                6 * Math.max(Math.sqrt(henries * c), (ohms + rs) * c),
                y);
        return most;
    }

    @Test
    void aLargerSnubberCapacitorIsSlower() {
        double last = Double.POSITIVE_INFINITY;
        for (double farads = 10e-9; farads < 1e-6; farads *= 2) {
            double rate = ReappliedVoltage.of(coil(40, 0.1), Optional.of(new Snubber(47, farads)), 300)
                    .voltsPerSecond();
            assertThat(rate).isLessThan(last);
            last = rate;
        }
    }

    @Test
    void onTheAcSideOfABridgeTheHoldingCurrentIsPassedInTwiceItTimesLOverV() {
        // Near its zero the current runs at v/L: under I_H for 2 I_H L/v, drops left out.
        Design design = Fired.textbook(Stage.BRIDGE_AC, 10).withLoad(coil(20, 0.2));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, Math.toRadians(100));
        double v =
                Math.abs(Math.sqrt(2) * 230 * Math.sin(period.extinctionsRad().get(0)));
        double gap = HoldingGap.seconds(design, EUROPE, period, 20e-3);
        assertThat(gap).isCloseTo(2 * 20e-3 * 0.2 / v, within(0.02 * gap));
    }

    @Test
    void aFreewheelingDiodeLeavesTheThyristorOnlyWhatTheDropsDiffer() {
        // The thyristor takes the current back when |v| exceeds V_T0 + 2 V_F - V_FW: here 1 + 1.8 - 0.7 = 2.1 V.
        Design design = SampleDesigns.heater()
                .withStageDiodes(new StageDiodes(0.9, 0))
                .withLoad(new Load.Inductive(40, 0.4, Optional.of(new StageDiodes(0.7, 0))));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, 1);
        double edge = Math.asin((1 + 1.8 - 0.7 + 0.02 * 30e-3) / (Math.sqrt(2) * 230));
        assertThat(HoldingGap.seconds(design, EUROPE, period, 30e-3))
                .isCloseTo(2 * edge / EUROPE.omega(), within(1e-9));
    }

    @Test
    void theLineReversesAThyristorFromExtinctionToItsNextZero() {
        Design design = Fired.textbook(Stage.HALF_WAVE, 10).withLoad(coil(20, 0.04));
        LoadPeriod period = LoadPower.periodAtFiringAngle(design, EUROPE, 1);
        double expected = (2 * Math.PI - period.extinctionRad().getAsDouble()) / EUROPE.omega();
        assertThat(HoldingGap.seconds(design, EUROPE, period, 30e-3)).isCloseTo(expected, within(1e-9));
    }

    @Test
    void aSnubberLeaksLikeItsReactanceAndBurnsItsChargeTwiceACycle() {
        // 100 nF at 50 Hz is 31.8 kohm: 7.2 mA at 230 V; C V^2/2 a hundred times a second.
        Snubber snubber = new Snubber(100, 100e-9);
        SnubberDuty duty = SnubberDuty.worst(Fired.textbook(Stage.TRIAC, 50), snubber, EUROPE);
        assertThat(duty.leakageAmps()).isCloseTo(230 * 100 * Math.PI * 100e-9, within(1e-5));
        assertThat(duty.resistorWatts()).isCloseTo(100 * 100e-9 * 230 * 230, within(0.01));
        assertThat(duty.dischargeAmps()).isCloseTo(Math.sqrt(2) * 2.3, within(1e-9));
        assertThat(SnubberDuty.worst(Fired.textbook(Stage.BRIDGE_DC, 50), snubber, EUROPE)
                        .leakageAmps())
                .isZero();
    }
}
