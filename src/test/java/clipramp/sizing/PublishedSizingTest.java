package clipramp.sizing;

import static clipramp.firing.PublishedRelations.baseTwoOhms;
import static clipramp.firing.PublishedRelations.largestBaseOneOhms;
import static clipramp.firing.PublishedRelations.largestRampOhms;
import static clipramp.firing.PublishedRelations.peakPointVolts;
import static clipramp.firing.PublishedRelations.smallestRampOhms;
import static clipramp.firing.PublishedRelations.textbookPeriodSeconds;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.files.DesignFiles;
import clipramp.files.Example;
import clipramp.files.Source;
import clipramp.firing.PublishedRelations.BaseTwoRule;
import clipramp.power.KnobSearch;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import clipramp.units.PreferredSeries;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Worked examples in print, asked backwards: from what is wanted to the part. To print accuracy unless a value is rounded. */
class PublishedSizingTest {
    /** Rashid, Power Electronics 4e, example 9.5. */
    @Test
    void rashidsOscillatorIsSizedAsPrinted() {
        double peak = peakPointVolts(0.51, 30, 0.5);
        double ohms = rampOhms(1.0 / 60, 0.5e-6, 0.51);

        assertThat(peak).isCloseTo(15.8, within(0.05));
        assertThat(largestRampOhms(30, peak, 10e-6)).isCloseTo(1.42e6, within(0.005e6));
        assertThat(smallestRampOhms(30, 3.5, 10e-3)).isCloseTo(2.65e3, within(5.0));
        assertThat(ohms).isCloseTo(46.7e3, within(50.0));
        assertThat(baseTwoOhms(BaseTwoRule.TEN_THOUSAND, 0.51, 30, 0, 0)).isCloseTo(654, within(0.5));
        // Rounded to what is sold: the printed 46.7 kΩ lies within one step of 47 kΩ.
        assertThat(PreferredSeries.E24.nearest(ohms)).isEqualTo(47e3);
    }

    /** Gupta and Singhal, Power Electronics, 2.29. */
    @Test
    void guptaAndSinghalsTwoKilohertzAreSizedAsPrinted() {
        // The 5 mA of the example are the largest current through R.
        assertThat(largestRampOhms(10, peakPointVolts(0.6, 10, 0.5), 5e-3)).isCloseTo(700, within(0.5));
        assertThat(rampOhms(0.5e-3, 0.5e-6, 0.6)).isCloseTo(1091, within(0.5));
        assertThat(rampOhms(0.5e-3, 1e-6, 0.6)).isCloseTo(545.7, within(0.05));
    }

    /** Gupta and Singhal 2.31; its printed R_B1 < 103.55 Ω does not follow from its own R_B2 (see the exact 105.42). */
    @Test
    void guptaAndSinghalsLimitsAreSizedAsPrintedButForTheirBaseOne() {
        assertThat(smallestRampOhms(12, 2, 4e-3)).isCloseTo(2.5e3, within(1.0));
        assertThat(largestRampOhms(12, peakPointVolts(0.63, 12, 0.5), 5e-6)).isCloseTo(788e3, within(500.0));
        assertThat(baseTwoOhms(BaseTwoRule.TEN_THOUSAND, 0.63, 12, 0, 0)).isCloseTo(1.32e3, within(5.0));
        assertThat(largestBaseOneOhms(0.18, 12, 5.6e3, 1.32e3)).isCloseTo(105.42, within(0.05));
    }

    /** The period's closed form, turned round. */
    private static double rampOhms(double periodSeconds, double rampFarads, double standoff) {
        return periodSeconds / textbookPeriodSeconds(1, rampFarads, standoff);
    }

    /** Gupta and Singhal 3.15: a 1000 W heater at 800 W; printed 61°, exactly 60.54°. */
    @Test
    void eightHundredWattsOfAThousandAskForTheExactAngle() {
        Design design = ideal("1 kW at 230 V", "line-230v-50hz");
        Condition condition = design.nominalCondition();
        double rad = KnobSearch.firingRadForWatts(design, condition, 800).orElseThrow();
        LoadResult load = LoadPower.atFiringAngle(design, condition, rad);

        assertThat(Math.toDegrees(rad)).isCloseTo(60.54, within(0.01));
        assertThat(load.rmsVolts()).isCloseTo(205.72, within(0.01));
        assertThat(load.rmsAmps()).isCloseTo(3.889, within(0.001));
    }

    /** Hart, Power Electronics, 5-1 (from memory): 120 V, 15 Ω, 500 W. */
    @Test
    void fiveHundredWattsInFifteenOhmsAskForTheAngleInPrint() {
        Design design = ideal("960 W at 120 V", "line-120v-60hz");
        Condition condition = design.nominalCondition();
        double rad = KnobSearch.firingRadForWatts(design, condition, 500).orElseThrow();
        LoadResult load = LoadPower.atFiringAngle(design, condition, rad);

        assertThat(Math.toDegrees(rad)).isCloseTo(88.1, within(0.05));
        assertThat(load.rmsAmps()).isCloseTo(5.77, within(0.005));
        assertThat(load.thyristorRmsAmps()).isCloseTo(4.08, within(0.005));
        assertThat(load.thyristorMeanAmps()).isCloseTo(1.86, within(0.01));
    }

    /** A circuit without drops, as the books compute. */
    private static Design ideal(String rated, String line) {
        String text = Example.named("upper-heaters").orElseThrow().text();
        return DesignFiles.load(
                        new Source("ideal.yaml", text),
                        List.of(
                                "line=" + line,
                                "load.rated=" + rated,
                                "thyristor.device.on-state.threshold=0 V",
                                "thyristor.device.on-state.slope=0 ohm"),
                        Requests.LIBRARY)
                .design();
    }
}
