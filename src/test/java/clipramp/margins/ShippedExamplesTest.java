package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.files.DesignFiles;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shipped examples are what their headings say: all but two hold, and those fail where they say. */
class ShippedExamplesTest {
    private static final String GONE_WRONG = "cabinet-gone-wrong.yaml";
    private static final String NARROW_PULSE = "store-fan-narrow-pulse.yaml";

    static List<Path> examples() {
        try (Stream<Path> files = Files.list(Path.of("examples"))) {
            return files.filter(f -> f.toString().endsWith(".yaml")).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static List<Path> soundExamples() {
        return examples().stream()
                .filter(f -> !f.endsWith(GONE_WRONG) && !f.endsWith(NARROW_PULSE))
                .toList();
    }

    @ParameterizedTest
    @MethodSource("examples")
    void beginsByTellingWhatItIs(Path file) throws IOException {
        List<String> lines = Files.readAllLines(file);
        long heading = lines.stream().takeWhile(l -> l.startsWith("# ")).count();
        assertThat(heading).isBetween(2L, 6L);
        assertThat(lines.get((int) heading)).isEqualTo("clipramp: 1");
    }

    @ParameterizedTest
    @MethodSource("soundExamples")
    void holdsEveryMargin(Path file) {
        assertThat(check(file).margins())
                .as(file.toString())
                .hasSizeGreaterThan(30)
                .allSatisfy(margin -> assertThat(margin.verdict())
                        .as(margin.id() + ": " + margin.formula())
                        .isEqualTo(Verdict.HOLDS));
    }

    @Test
    void theOneGoneWrongFailsWhereItsHeadingSays() {
        Check check = check(Path.of("examples", GONE_WRONG));
        assertThat(check.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(check.margins().stream()
                        .filter(m -> m.verdict() == Verdict.FAILS)
                        .map(Margin::kind))
                .contains(
                        MarginKind.SILENT,
                        MarginKind.CLIP_BEFORE_FIRING,
                        MarginKind.LATCHED_ON,
                        MarginKind.RAMP_BEFORE_COLLAPSE,
                        MarginKind.GATE_PEAK_CURRENT,
                        MarginKind.GATE_TIME,
                        MarginKind.GATE_STANDING_VOLTAGE,
                        MarginKind.DROPPER_POWER,
                        MarginKind.BLOCKING_VOLTAGE);
    }

    @Test
    void theNarrowPulseIsOverBeforeTheFansCurrentLatchesTheTriac() {
        Check check = check(Path.of("examples", NARROW_PULSE));
        assertThat(check.margins().stream()
                        .filter(m -> m.verdict() == Verdict.FAILS)
                        .map(Margin::kind))
                .contains(MarginKind.LATCHING_EARLIEST, MarginKind.LATCHING_LATEST, MarginKind.COMMUTATING_DVDT);
        assertThat(check.margins().stream()
                        .filter(m -> m.kind() == MarginKind.LATCHING_EARLIEST)
                        .map(Margin::formula))
                .allMatch(formula -> formula.contains("would need"));
        assertThat(check.knob()).allMatch(row -> row.load().watts() < 1e-3);
    }

    @Test
    void theRuleForHeatingElementsForbidsTheUpperHeatersAndSaysSo() {
        Check check = check(Path.of("examples", "upper-heaters.yaml"));
        assertThat(check.lineCurrent().orElseThrow().rules()).anySatisfy(rule -> {
            assertThat(rule.id()).isEqualTo("heating-element");
            assertThat(rule.standing()).isEqualTo(LineCheck.Standing.RULED_OUT);
            assertThat(rule.text()).contains("forbids");
        });
    }

    private static Check check(Path file) {
        try {
            LoadedDesign loaded = DesignFiles.load(Source.of(file), List.of(), ProfileLibrary.shipped());
            return Judge.check(loaded.design(), OptionalDouble.empty(), OptionalDouble.empty());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
