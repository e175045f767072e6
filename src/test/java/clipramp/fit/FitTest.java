package clipramp.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Design;
import clipramp.fit.Fitted.Knowledge;
import clipramp.fit.Fitted.Within;
import clipramp.runs.Watch;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * What a fit must do whatever the unit. The readings are the engine's own with noise from a seeded generator: checks of
 * the estimation, not of the engine. The wide study is {@link FitStudy}.
 */
class FitTest {
    private static final Design CABINET = FitStudy.design("drying-cabinet");

    @Test
    void intervalsCoverTheTruthAboutAsOftenAsTheySay() {
        int covered = 0;
        int told = 0;
        for (int seed = 300; seed < 304; seed++) {
            SyntheticBench bench = SyntheticBench.of(CABINET, seed, 4, FitStudy.METERS);
            FitResult result = Fit.run(CABINET, bench.readings, Watch.NONE);
            for (Fitted value : result.values()) {
                double truth = bench.truth(value.path());
                covered += value.from() <= truth && truth <= value.to() ? 1 : 0;
                told++;
            }
        }
        // 95 % of 68 are 64.6; under 61 has a chance of less than one in a hundred (binomial distribution).
        assertThat(told).isEqualTo(68);
        assertThat(covered).isGreaterThanOrEqualTo(61);
    }

    /** Power and voltage across an inductor, and across a lamp that is the hotter the more it gets. */
    @ParameterizedTest
    @ValueSource(strings = {"store-fan", "tasting-lamps"})
    void aUnitIsFoundBehindEveryKindOfLoad(String example) {
        Design design = FitStudy.design(example);
        SyntheticBench bench = SyntheticBench.of(
                design, 700, 5, List.of(Meter.DELAY, Meter.LOAD_TRUE_RMS, Meter.LOAD_WATTS, Meter.PEAK_POINT));

        FitResult result = Fit.run(design, bench.readings, Watch.NONE);

        assertThat(result.strangers()).isEmpty();
        assertThat(result.quality().widened()).isEqualTo(1);
        Fitted standoff = result.value("trigger.device.standoff").orElseThrow();
        assertThat(standoff.knowledge()).isEqualTo(Knowledge.TOLD);
        assertThat(bench.truth(standoff.path())).isBetween(standoff.from(), standoff.to());
        for (Fitted value : result.told()) {
            double truth = bench.truth(value.path());
            // A half-width is 1.96 standard deviations; 2.3 of them hold all but seven normal errors in a million.
            assertThat(Math.abs(value.value() - truth))
                    .as(value.path())
                    .isLessThan(2.3 * (value.to() - value.from()) / 2);
        }
    }

    @Test
    void aGrossErrorIsNamedAndTheFitIsAsWithoutIt() {
        for (int seed = 400; seed < 403; seed++) {
            SyntheticBench bench = SyntheticBench.of(CABINET, seed, 5, FitStudy.METERS);
            Random random = new Random(seed);
            int line = 1 + random.nextInt(3);
            int reading = random.nextInt(FitStudy.METERS.size());

            FitResult result = Fit.run(CABINET, bench.withGrossError(line, reading, 1.3), Watch.NONE);

            assertThat(result.strangers()).as("seed " + seed).singleElement().satisfies(stranger -> {
                assertThat(stranger.line()).isEqualTo(line + 2);
                assertThat(stranger.column())
                        .isEqualTo(FitStudy.METERS.get(reading).words());
            });
            double eta = bench.truth("trigger.device.standoff");
            assertThat(result.value("trigger.device.standoff").orElseThrow().value())
                    .as("seed " + seed)
                    .isCloseTo(eta, within(0.06 * eta));
        }
    }

    @Test
    void whatNoReadingMovesKeepsTheDesignsValueAndLimits() {
        FitResult result = Fit.run(CABINET, byOhms(List.of(5e3, 10e3, 20e3), 1), Watch.NONE);

        Fitted track = result.value("ramp.pot.track").orElseThrow();
        assertThat(track.knowledge()).isEqualTo(Knowledge.NOT_TOLD);
        assertThat(track.value()).isEqualTo(25e3, within(1e-6));
        assertThat(track.within()).isEqualTo(Within.UNKNOWN);
        assertThat(result.untouched()).contains("ramp.pot.track", "ramp.fixed");
        assertThat(result.value("ramp.pot.law"))
                .as("no knob was read, so no law can be")
                .isEmpty();
        assertThat(result.quality().condition())
                .as("capacitor and standoff enter as one product")
                .isEmpty();
    }

    @Test
    void aLargeCapacitorIsPutDownToCapacitorAndStandoffTogether() {
        FitResult result = Fit.run(CABINET, byOhms(List.of(5e3, 8e3, 12e3, 16e3), 1.1), Watch.NONE);

        double capacitor = result.value("ramp.capacitor").orElseThrow().value() / 220e-9;
        double eta = result.value("trigger.device.standoff").orElseThrow().value();
        // The limiting case RC ln(1/(1-eta)), as every textbook has it: 10 % more of the product.
        double time = capacitor * Math.log(1 / (1 - eta)) / Math.log(1 / (1 - 0.75));
        assertThat(time).isCloseTo(1.1, within(0.015));
        assertThat(result.together())
                .anySatisfy(pair -> assertThat(List.of(pair.first(), pair.second()))
                        .contains("ramp.capacitor", "trigger.device.standoff"));
    }

    /** Delays of the nominal cabinet but for its capacitor. */
    private static Readings byOhms(List<Double> ohms, double factor) {
        BenchModel model = new BenchModel(CABINET);
        TriedUnit unit = new TriedUnit(CABINET, 25);
        unit.values.capacitorFarads *= factor;
        List<BenchLine> lines = new ArrayList<>();
        for (int i = 0; i < ohms.size(); i++) {
            Setting setting = new Setting(Setting.Kind.RAMP_OHMS, ohms.get(i), Accuracy.share(0.001), "R");
            BenchLine plan = new BenchLine(
                    i + 2,
                    setting,
                    Optional.of(new BenchLine.LineVolts(230, Accuracy.share(0.01), "V")),
                    List.of(new Reading(Meter.DELAY, 1, Accuracy.share(0.005), "delay")));
            double delay = model.shown(unit, plan, 0, 0)[0];
            lines.add(new BenchLine(
                    plan.line(),
                    setting,
                    plan.lineVolts(),
                    List.of(new Reading(Meter.DELAY, delay, Accuracy.share(0.005), "delay"))));
        }
        return new Readings("made up", 25, lines);
    }

    @Test
    void anAverageReadingMeterShowsASineAsItsRms() {
        // Form factor of a sine, pi / (2 sqrt 2) = 1.1107 (any handbook).
        assertThat(BenchModel.AVERAGE_TO_SINE_RMS).isCloseTo(1.1107, within(1e-4));
    }

    @Test
    void anAverageReadingMeterReadsAChoppedWaveTooLowByItsFormFactor() {
        BenchModel model = new BenchModel(CABINET);
        BenchLine line = new BenchLine(
                2,
                new Setting(Setting.Kind.KNOB, 0.3, Setting.USUAL_KNOB, "knob"),
                Optional.empty(),
                List.of(
                        new Reading(Meter.FIRING_ANGLE, 1, Meter.FIRING_ANGLE.usual(), "a"),
                        new Reading(Meter.LOAD_TRUE_RMS, 1, Meter.LOAD_TRUE_RMS.usual(), "b"),
                        new Reading(Meter.LOAD_AVERAGE_READING, 1, Meter.LOAD_TRUE_RMS.usual(), "c"),
                        new Reading(Meter.LOAD_WATTS, 1, Meter.LOAD_WATTS.usual(), "d")));

        double[] shown = model.shown(new TriedUnit(CABINET, 25), line, 0, 0);

        // Resistor on a full wave, drops left out (Rashid, Power Electronics, ch. 11): rms and mean of the chopped
        // sine.
        double alpha = shown[0];
        double rms = 230 * Math.sqrt(1 - alpha / Math.PI + Math.sin(2 * alpha) / (2 * Math.PI));
        double mean = 230 * Math.sqrt(2) / Math.PI * (1 + Math.cos(alpha));
        assertThat(shown[1]).isCloseTo(rms, within(0.015 * rms));
        assertThat(shown[2]).isCloseTo(1.1107 * mean, within(0.025 * mean));
        assertThat(shown[2]).isLessThan(0.85 * shown[1]);
        assertThat(shown[3]).isCloseTo(shown[1] * shown[1] * 700 / (230 * 230), within(0.5));
    }

    @Test
    void aWatchCanCallItOff() {
        Watch off = new Watch() {
            @Override
            public void progress(int done, int of) {}

            @Override
            public boolean isCancelled() {
                return true;
            }
        };
        assertThatThrownBy(() -> Fit.run(CABINET, byOhms(List.of(5e3), 1), off))
                .isInstanceOf(CancellationException.class);
    }
}
