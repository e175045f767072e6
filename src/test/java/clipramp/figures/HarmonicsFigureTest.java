package clipramp.figures;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.margins.LineCheck;
import java.util.List;
import org.junit.jupiter.api.Test;

class HarmonicsFigureTest {
    private static LineCheck heater(double ohms) {
        return SampleChecks.lineCurrent(SampleDesigns.heater().withLoad(new Load.Resistor(ohms)));
    }

    @Test
    void itsTableHoldsFortyOrdersWithTheLimitsOfClassA() {
        // IEC 61000-3-2, class A: 2.30 A for the third, 0.15 x 15/n from the fifteenth on.
        List<List<String>> rows = new HarmonicsFigure(heater(100)).numbers().rows();
        assertThat(rows).hasSize(40);
        assertThat(rows.get(0)).contains("1", Numerals.NOTHING);
        assertThat(rows.get(2).get(3)).isEqualTo("2300.0");
        assertThat(rows.get(14).get(3)).isEqualTo("150.0");
        assertThat(rows.get(38).get(3)).isEqualTo("57.7");
    }

    @Test
    void theLargerLoadDrawsOverTheLimitAndTheFigureSaysSo() {
        assertThat(Surfaces.toSvg(new HarmonicsFigure(heater(100)), 800, 400)).doesNotContain("over the limit");
        assertThat(Surfaces.toSvg(new HarmonicsFigure(heater(25)), 800, 400)).contains("over the limit");
    }

    @Test
    void theSentenceNamesTheOrderThatBindsAndThePowerAtWhichItDoes() {
        LineCheck small = heater(100);
        LineCheck large = heater(25);
        assertThat(new HarmonicsFigure(small).sentence())
                .contains("order " + small.binding().order() + " binds first");
        assertThat(small.bindsAtWatts())
                .as("drops apart, the power at which an order binds is a matter of the angle alone")
                .isCloseTo(large.bindsAtWatts(), within(0.02 * large.bindsAtWatts()));
    }

    @Test
    void aLineWithoutCurrentIsSaidToBeOne() {
        var silent = SampleDesigns.heater();
        silent = silent.withRamp(new clipramp.circuit.Ramp(
                silent.ramp().capacitor(), clipramp.circuit.Part.of(10e6), java.util.Optional.empty()));
        HarmonicsFigure figure = new HarmonicsFigure(SampleChecks.lineCurrent(silent));
        assertThat(figure.sentence()).contains("No line current flows");
        assertThat(Surfaces.toSvg(figure, 800, 400))
                .contains("no current flows")
                .doesNotContain("NaN");
    }
}
