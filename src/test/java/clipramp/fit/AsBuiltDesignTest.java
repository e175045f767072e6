package clipramp.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Design;
import clipramp.files.AsBuilt;
import clipramp.files.DesignText;
import clipramp.files.DesignText.Reading.Good;
import clipramp.files.Example;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.runs.Watch;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The design as built, written and read back, is the unit that was fitted, whatever device and pot it has. */
class AsBuiltDesignTest {
    @ParameterizedTest
    @ValueSource(strings = {"seed-drawer", "tray-lamp"})
    void readsBackAsTheUnitThatWasFitted(String example) {
        Design design = FitStudy.design(example);
        SyntheticBench bench =
                SyntheticBench.of(design, 77, 4, List.of(Meter.FIRING_ANGLE, Meter.SUPPLY, Meter.PEAK_POINT));
        FitResult result = Fit.run(design, bench.readings, Watch.NONE);
        DesignText drawn = DesignText.of(
                new Source(example, Example.named(example).orElseThrow().text()));

        DesignText built = AsBuilt.of(drawn, design, result);

        assertThat(built.text().lines().filter(line -> line.startsWith("#")))
                .containsExactlyElementsOf(drawn.text()
                        .lines()
                        .filter(line -> line.startsWith("#"))
                        .toList());
        assertThat(built.read(ProfileLibrary.shipped())).isInstanceOfSatisfying(Good.class, good -> {
            Design unit = good.loaded().design();
            BenchModel model = new BenchModel(unit);
            int i = 0;
            for (BenchLine line : bench.readings.lines()) {
                // The lines' own line voltages and knob positions as fitted: how far off they were stands in the
                // residuals.
                double[] shown = model.shown(new TriedUnit(unit, 25), fitted(line, result), 0, 0);
                for (double value : shown) {
                    double asFitted = result.residuals().get(i++).shown();
                    assertThat(value).as(example + " " + i).isCloseTo(asFitted, within(0.005 * asFitted));
                }
            }
        });
    }

    private static BenchLine fitted(BenchLine line, FitResult result) {
        double knob = setting(line, result, "knob position");
        double volts = setting(line, result, "line voltage");
        return new BenchLine(
                line.line(),
                new Setting(Setting.Kind.KNOB, Math.max(0, Math.min(1, knob)), Setting.USUAL_KNOB, ""),
                java.util.Optional.of(new BenchLine.LineVolts(volts, BenchLine.LineVolts.USUAL, "")),
                line.readings());
    }

    private static double setting(BenchLine line, FitResult result, String what) {
        return result.residuals().stream()
                .filter(residual ->
                        residual.line() == line.line() && residual.what().equals(what))
                .findFirst()
                .orElseThrow()
                .shown();
    }
}
