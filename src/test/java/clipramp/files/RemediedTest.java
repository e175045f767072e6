package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import clipramp.circuit.Design;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trimmers;
import clipramp.runs.Watch;
import clipramp.spread.Factor;
import clipramp.spread.Factors;
import clipramp.spread.Remedy;
import clipramp.spread.Spread;
import clipramp.spread.SpreadOptions;
import clipramp.spread.SpreadResult;
import clipramp.spread.Yield;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * What a remedy promises must come of writing it into the design: the same units, drawn with the same seed from the changed
 * text, reach what is wanted as often as the remedy said.
 */
class RemediedTest {
    private static final SpreadOptions OPTIONS = new SpreadOptions(200, 7, SpreadOptions.DEFAULT.law(), 0);

    private static DesignText example(String id) {
        return DesignText.of(new Source(
                id,
                Example.all().stream()
                        .filter(e -> e.id().equals(id))
                        .findFirst()
                        .orElseThrow()
                        .text()));
    }

    /** Every part's tolerance and every figure of the devices, in every kind of circuit, is read back as it was written. */
    @ParameterizedTest
    @ValueSource(strings = {"drying-cabinet", "seed-drawer", "tray-lamp", "upper-heaters", "store-fan"})
    void everyFigureIsReadBackBetweenTheLimitsThatWereWritten(String id) {
        ProfileLibrary library = ProfileLibrary.shipped();
        DesignText text = example(id);
        Design design = read(text, library).design();
        List<Factor> factors = Factors.of(design).stream()
                .filter(f -> f.kind() != Factor.Kind.SURROUNDINGS)
                .toList();
        assertThat(factors).hasSizeGreaterThan(8);
        for (Factor factor : factors) {
            double low = factor.nominal() - (factor.nominal() - factor.low()) / 2;
            double high = factor.nominal() + (factor.high() - factor.nominal()) / 2;
            Remedy remedy = new Remedy(
                    factor.path(),
                    "half",
                    new Yield(0, 1, 0, 1),
                    0,
                    Optional.of(new Remedy.Limits(low, factor.nominal(), high)));
            Design after = read(Remedied.of(text, design, remedy).orElseThrow(), library)
                    .design();
            Factor changed = Factors.of(after).stream()
                    .filter(f -> f.path().equals(factor.path()))
                    .findFirst()
                    .orElseThrow();
            assertThat(changed.low()).as(factor.path()).isCloseTo(low, withinPercentage(0.01));
            assertThat(changed.high()).as(factor.path()).isCloseTo(high, withinPercentage(0.01));
            assertThat(changed.nominal()).as(factor.path()).isCloseTo(factor.nominal(), withinPercentage(0.01));
            assertThat(changed.law()).as(factor.path()).isEqualTo(factor.law());
        }
    }

    @Test
    void aDesignWithTheRemedyHasTheYieldThatWasPromised() {
        ProfileLibrary library = ProfileLibrary.shipped();
        DesignText text = example("drying-cabinet");
        LoadedDesign loaded = read(text, library);
        SpreadResult spread = Spread.run(loaded.design(), OPTIONS, Watch.NONE);
        List<Remedy> written = spread.remedies().stream()
                .filter(r -> r.limits().isPresent())
                .limit(2)
                .toList();
        assertThat(written).isNotEmpty();
        for (Remedy remedy : written) {
            DesignText changed = Remedied.of(text, loaded.design(), remedy).orElseThrow();
            assertThat(changed.text()).as(remedy.change()).isNotEqualTo(text.text());
            SpreadResult after = Spread.run(read(changed, library).design(), OPTIONS, Watch.NONE);
            assertThat(after.wanted().orElseThrow().share())
                    .as(remedy.change())
                    .isCloseTo(remedy.yield().share(), within(2.5 / OPTIONS.samples()));
        }
        Remedy trimmer = spread.remedies().stream()
                .filter(r -> r.limits().isEmpty())
                .findFirst()
                .orElseThrow();
        Ramp before = loaded.design().ramp();
        Ramp trimmed = read(Remedied.of(text, loaded.design(), trimmer).orElseThrow(), library)
                .design()
                .ramp();
        assertThat(trimmed.trimmers().high()).isPresent();
        // At the middle of the track the unit is the one before, within a step of the series of parts that are sold.
        assertThat(trimmed.fixed().value()
                        + Trimmers.nominalOhms(trimmed.trimmers().high()))
                .isCloseTo(before.fixed().value(), withinPercentage(5));
    }

    private static LoadedDesign read(DesignText text, ProfileLibrary library) {
        return ((DesignText.Reading.Good) text.read(library)).loaded();
    }
}
