package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.firing.HalfCycle;
import clipramp.firing.Solution;
import clipramp.firing.Solution.Settling;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.RombergIntegrator;
import org.junit.jupiter.api.Test;

class LoadPowerTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);
    private static final Condition AMERICA = new Condition(120, 60, 25);

    private static LoadResult textbook(Stage stage, Condition condition, double ohms, double degrees) {
        return LoadPower.of(Fired.textbook(stage, ohms), condition, Fired.at(condition, Math.toRadians(degrees)));
    }

    @Test
    void rashidExample11Point1FullWaveControllerAtNinetyDegrees() {
        // Rashid, Power Electronics, example 11.1: 120 V, 10 ohm, 90 degrees.
        LoadResult load = textbook(Stage.INVERSE_PARALLEL, AMERICA, 10, 90);
        assertThat(load.rmsVolts()).isCloseTo(84.85, within(0.005));
        assertThat(load.watts()).isCloseTo(720, within(0.05));
        assertThat(load.powerFactor()).isCloseTo(0.7071, within(5e-5));
        assertThat(load.thyristorMeanAmps()).isCloseTo(2.7, within(0.005));
        assertThat(load.thyristorRmsAmps()).isCloseTo(6.0, within(0.005));
    }

    @Test
    void bimbhraExample9Point2FullWaveControllerAtFortyFiveDegrees() {
        // Bimbhra, Power Electronics, example 9.2: 230 V, 20 ohm, 45 degrees.
        LoadResult load = textbook(Stage.INVERSE_PARALLEL, EUROPE, 20, 45);
        assertThat(load.rmsVolts()).isCloseTo(219.304, within(0.005));
        assertThat(load.watts()).isCloseTo(2404.71, within(0.15));
        assertThat(load.powerFactor()).isCloseTo(0.9535, within(5e-5));
        assertThat(load.thyristorMeanAmps()).isCloseTo(4.42, within(0.005));
        assertThat(load.thyristorRmsAmps()).isCloseTo(7.75, within(0.005));
    }

    @Test
    void guptaExample3Point15HeaterAtEightHundredWatts() {
        // Gupta & Singhal, Power Electronics, example 3.15: a 1000 W heater at 800 W; the angle 61 printed is rounded.
        Design heater = Fired.textbook(Stage.INVERSE_PARALLEL, 230.0 * 230.0 / 1000);
        double rad = KnobSearch.firingRadForWatts(heater, EUROPE, 800).getAsDouble();
        LoadResult load = LoadPower.of(heater, EUROPE, Fired.at(EUROPE, rad));
        assertThat(Math.toDegrees(rad)).isCloseTo(60.54, within(0.005));
        assertThat(load.rmsVolts()).isCloseTo(205.72, within(0.005));
        assertThat(load.rmsAmps()).isCloseTo(3.889, within(5e-4));
    }

    @Test
    void bimbhraExample6Point1HalfWave() {
        // Bimbhra, Power Electronics, example 6.1: 230 V, 1 kW heater, 45 and 90 degrees.
        double ohms = 230.0 * 230.0 / 1000;
        assertThat(textbook(Stage.HALF_WAVE, EUROPE, ohms, 45).watts()).isCloseTo(454.58, within(0.05));
        assertThat(textbook(Stage.HALF_WAVE, EUROPE, ohms, 90).watts()).isCloseTo(250.00, within(0.005));
    }

    @Test
    void bimbhraExample6Point5HalfWaveFigures() {
        // Bimbhra, Power Electronics, example 6.5: 230 V, 10 ohm, 60 degrees.
        LoadResult load = textbook(Stage.HALF_WAVE, EUROPE, 10, 60);
        double meanVolts = load.meanAmps() * 10;
        double efficiency = Math.pow(meanVolts / load.rmsVolts(), 2);
        assertThat(efficiency).isCloseTo(0.2834, within(2e-4));
        assertThat(load.formFactor()).isCloseTo(1.879, within(1e-3));
        assertThat(Math.sqrt(Math.pow(load.formFactor(), 2) - 1)).isCloseTo(1.5903, within(1e-3));
        assertThat(load.dcAmps()).isEqualTo(load.meanAmps());
    }

    @Test
    void hartExample5Point1FromMemory() {
        // Hart, Power Electronics, example 5-1, from memory: 120 V, 15 ohm, 500 W.
        Design heater = Fired.textbook(Stage.INVERSE_PARALLEL, 15);
        double rad = KnobSearch.firingRadForWatts(heater, AMERICA, 500).getAsDouble();
        LoadResult load = LoadPower.of(heater, AMERICA, Fired.at(AMERICA, rad));
        assertThat(Math.toDegrees(rad)).isCloseTo(88.1, within(0.1));
        assertThat(load.rmsAmps()).isCloseTo(5.77, within(0.005));
        assertThat(load.thyristorRmsAmps()).isCloseTo(4.08, within(0.005));
        assertThat(load.thyristorMeanAmps()).isCloseTo(1.86, within(0.01));
        assertThat(load.powerFactor()).isCloseTo(0.72, within(0.005));
    }

    @Test
    void applicationNoteShareOfPowerByConductionAngle() {
        // Teccor AN1003: full-wave conduction of 150 and 30 degrees is 97 and 3 % of power; half-wave 180 degrees 50 %.
        assertThat(textbook(Stage.BRIDGE_DC, EUROPE, 50, 30).fraction()).isCloseTo(0.97, within(0.005));
        assertThat(textbook(Stage.BRIDGE_DC, EUROPE, 50, 150).fraction()).isCloseTo(0.03, within(0.005));
        assertThat(textbook(Stage.HALF_WAVE, EUROPE, 50, 0).fraction()).isCloseTo(0.5, within(1e-12));
    }

    @Test
    void shareOfPowerFollowsTheClosedFormAtEveryAngle() {
        for (int degrees = 0; degrees <= 180; degrees += 3) {
            double rad = Math.toRadians(degrees);
            double share = 1 - rad / Math.PI + Math.sin(2 * rad) / (2 * Math.PI);
            assertThat(textbook(Stage.BRIDGE_AC, EUROPE, 44, degrees).fraction())
                    .isCloseTo(share, within(1e-13));
            assertThat(textbook(Stage.HALF_WAVE, EUROPE, 44, degrees).fraction())
                    .isCloseTo(share / 2, within(1e-13));
        }
    }

    @Test
    void dropsInTheLoadsPathAgreeWithRombergIntegration() {
        // Outside truth: Commons Math's Romberg integrator on the instantaneous law, drawn over stages and angles.
        long seed = 20_260;
        Random random = new Random(seed);
        for (int draw = 0; draw < 60; draw++) {
            Design design = SampleDesigns.heater()
                    .withStageDiodes(new StageDiodes(1.5 * random.nextDouble(), 0.2 * random.nextDouble()))
                    .withLoad(new Load.Resistor(5 + 200 * random.nextDouble()));
            Condition condition = new Condition(5 + 245 * random.nextDouble(), 50, 25);
            double rad = Math.PI * random.nextDouble();
            LoadResult load = LoadPower.of(design, condition, Fired.at(condition, rad));
            compare(design, condition, rad, load, "seed " + seed + " draw " + draw);
        }
    }

    private static void compare(Design design, Condition condition, double rad, LoadResult load, String what) {
        double drop = 1.0 + 2 * design.stageDiodes().dropVolts();
        double ohms =
                design.load().resistanceOhms() + 0.02 + 2 * design.stageDiodes().slopeOhms();
        double crest = Math.sqrt(2) * condition.lineVolts();
        double end = Math.PI - Math.asin(drop / crest);
        UnivariateFunction current = t -> Math.max(0, (crest * Math.sin(t) - drop) / ohms);
        double mean = integral(current, rad, end) / Math.PI;
        double square = integral(t -> current.value(t) * current.value(t), rad, end) / Math.PI;
        assertThat(load.meanAmps()).as(what).isCloseTo(mean, within(1e-7 * (1 + mean)));
        assertThat(load.watts())
                .as(what)
                .isCloseTo(square * design.load().resistanceOhms(), within(1e-7 * (1 + square * 200)));
        double loss = mean + 0.02 * square;
        assertThat(load.thyristorWatts()).as(what).isCloseTo(loss, within(1e-7 * (1 + loss)));
    }

    private static double integral(UnivariateFunction f, double from, double to) {
        return from >= to ? 0 : new RombergIntegrator(1e-10, 1e-12, 4, 30).integrate(2_000_000, f, from, to);
    }

    @Test
    void conductionEndsWhereTheLineFallsUnderTheDrops() {
        Condition low = new Condition(12, 50, 25);
        Design design = SampleDesigns.heater();
        double edge = Math.asin((1.0 + 1.8) / (Math.sqrt(2) * 12));
        assertThat(LoadPower.of(design, low, Fired.at(low, 1)).conductionRad())
                .isCloseTo(Math.PI - edge - 1, within(1e-12));
        assertThat(LoadPower.of(design, low, Fired.at(low, 0)).conductionRad())
                .isCloseTo(Math.PI - 2 * edge, within(1e-12));
        assertThat(LoadPower.of(design, low, Fired.at(low, Math.PI - edge / 2)).watts())
                .isZero();
    }

    @Test
    void aLineWithHarmonicsAgreesWithRombergIntegration() {
        Line line = new Line(
                230,
                50,
                207,
                253,
                List.of(new Line.Harmonic(5, 0.06, 0.4), new Line.Harmonic(7, 0.05, 2), new Line.Harmonic(2, 0.02, 1)));
        Design design = SampleDesigns.heater().withLine(line);
        for (double rad : new double[] {0.3, 1.2, 2.4}) {
            LoadResult load = LoadPower.of(design, EUROPE, Fired.unlike(EUROPE, rad, rad));
            double drop = 2.8;
            double ohms = design.load().resistanceOhms() + 0.02;
            UnivariateFunction positive = t -> Math.max(0, (line.voltsAt(230, t) - drop) / ohms);
            UnivariateFunction negative = t -> Math.max(0, (-line.voltsAt(230, t + Math.PI) - drop) / ohms);
            double first = integral(positive, rad, 3.3);
            double second = integral(negative, rad, 3.3);
            assertThat(load.meanAmps()).isCloseTo((first + second) / (2 * Math.PI), within(1e-7));
            assertThat(load.dcAmps()).isCloseTo((first - second) / (2 * Math.PI), within(1e-7));
            double square = integral(t -> Math.pow(positive.value(t), 2), rad, 3.3);
            assertThat(load.halfWatts().get(0))
                    .isCloseTo(square / Math.PI * design.load().resistanceOhms(), within(1e-4));
            assertThat(load.halfWatts()).hasSize(2);
        }
    }

    @Test
    void quadratureWithAVanishingHarmonicEqualsTheClosedForm() {
        Design plain = SampleDesigns.heater();
        Design ripple = plain.withLine(new Line(230, 50, 207, 253, List.of(new Line.Harmonic(40, 0, 0))));
        for (double rad = 0; rad < Math.PI; rad += 0.1) {
            LoadResult exact = LoadPower.of(plain, EUROPE, Fired.at(EUROPE, rad));
            LoadResult rule = LoadPower.of(ripple, EUROPE, Fired.at(EUROPE, rad));
            assertThat(rule.watts()).isCloseTo(exact.watts(), within(1e-9));
            assertThat(rule.meanAmps()).isCloseTo(exact.meanAmps(), within(1e-12));
            assertThat(rule.peakAmps()).isCloseTo(exact.peakAmps(), within(1e-9));
            assertThat(rule.conductionRad()).isCloseTo(exact.conductionRad(), within(1e-11));
        }
    }

    @Test
    void aHalfCycleWithoutAFiringPulseGivesNothing() {
        LoadResult load = LoadPower.of(SampleDesigns.heater(), EUROPE, Fired.silent(EUROPE));
        assertThat(load.watts()).isZero();
        assertThat(load.thyristorWatts()).isZero();
        assertThat(load.formFactor()).isNaN();
    }

    @Test
    void huntingHalvesAreToldApartAndPutDcIntoTheLoad() {
        Design design = Fired.textbook(Stage.TRIAC, 50);
        LoadResult load = LoadPower.of(design, EUROPE, Fired.unlike(EUROPE, 1.0, 2.0));
        LoadResult early = LoadPower.of(design, EUROPE, Fired.at(EUROPE, 1.0));
        LoadResult late = LoadPower.of(design, EUROPE, Fired.at(EUROPE, 2.0));
        assertThat(load.halfWatts().get(0)).isCloseTo(early.watts(), within(1e-9));
        assertThat(load.halfWatts().get(1)).isCloseTo(late.watts(), within(1e-9));
        assertThat(load.watts()).isCloseTo((early.watts() + late.watts()) / 2, within(1e-9));
        assertThat(load.dcAmps()).isCloseTo((early.meanAmps() - late.meanAmps()) / 2, within(1e-12));
    }

    @Test
    void ofTwoThyristorsTheHarderWorkedOneIsReported() {
        Design design = Fired.textbook(Stage.INVERSE_PARALLEL, 50);
        LoadResult unlike = LoadPower.of(design, EUROPE, Fired.unlike(EUROPE, 2.0, 1.0));
        LoadResult early = LoadPower.of(design, EUROPE, Fired.at(EUROPE, 1.0));
        assertThat(unlike.thyristorMeanAmps()).isCloseTo(early.thyristorMeanAmps(), within(1e-12));
        assertThat(unlike.thyristorRmsAmps()).isCloseTo(early.thyristorRmsAmps(), within(1e-12));
    }

    @Test
    void aPulsePastTheLoadsZeroActsInTheNextHalfCycleAsFullPower() {
        double lag = Math.toRadians(20);
        Design design = SampleDesigns.windingHeater(lag, false);
        double made = Math.PI - Math.toRadians(12);
        HalfCycle late = Fired.half(EUROPE, true, made, made + lag - Math.PI, true);
        Solution solution = new Solution(EUROPE, 1e5, Settling.STEADY, List.of(late));
        assertThat(ActingPulses.spillOver(design, solution)).isTrue();
        assertThat(LoadPower.of(design, EUROPE, solution).fraction()).isGreaterThan(0.97);

        HalfCycle timely = Fired.half(EUROPE, true, 1.0, 1.0 + lag, true);
        Solution sound = new Solution(EUROPE, 1e5, Settling.STEADY, List.of(timely));
        assertThat(ActingPulses.spillOver(design, sound)).isFalse();
    }

    @Test
    void aSingleDiodeSupplyFiresOneHalfCycleOfAFullWaveStageOnly() {
        Design design = Fired.textbook(Stage.TRIAC, 50);
        HalfCycle half = Fired.half(EUROPE, true, 1.0, true);
        HalfCycle period =
                new HalfCycle(true, 0.02, 0.5, 0.5, OptionalDouble.empty(), 1.57, false, false, half.pulses(), 0);
        LoadResult load = LoadPower.of(design, EUROPE, new Solution(EUROPE, 1e4, Settling.STEADY, List.of(period)));
        LoadResult both = LoadPower.of(design, EUROPE, Fired.at(EUROPE, 1.0));
        assertThat(load.watts()).isCloseTo(both.watts() / 2, within(1e-9));
        assertThat(load.dcAmps()).isCloseTo(both.meanAmps() / 2, within(1e-12));
    }

    @Test
    void laterFiringNeverGivesMorePower() {
        double last = Double.POSITIVE_INFINITY;
        for (double rad = 0; rad <= Math.PI; rad += 0.01) {
            double watts =
                    LoadPower.atFiringAngle(SampleDesigns.heater(), EUROPE, rad).watts();
            assertThat(watts).isLessThanOrEqualTo(last);
            last = watts;
        }
    }
}
