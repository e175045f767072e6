package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.margins.Judge;
import clipramp.margins.Margin;
import clipramp.margins.Verdict;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.Unit;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.dataformat.yaml.YAMLMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The shipped profiles against what is in print. published-figures.csv names the source of each figure; "sheet" is the
 * manufacturer's data sheet of the JEDEC type.
 */
class ShippedProfilesTest {
    private static final Path PROFILES = Path.of("profiles");
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();
    private static final YAMLMapper YAML = new YAMLMapper();
    private static final List<String> HEAD = List.of("clipramp", "kind", "id", "sources");

    /** EN 50160: greatest share of single orders, and of all together. */
    private static final Map<Integer, Double> EN_50160 =
            Map.of(3, 0.05, 5, 0.06, 7, 0.05, 9, 0.015, 11, 0.035, 13, 0.03);

    private static final double EN_50160_TOTAL = 0.08;

    private static final Map<String, String> PLACE = Map.of(
            "unijunction", "trigger.device",
            "programmable-unijunction", "trigger.device",
            "zener", "clip.zener",
            "scr", "thyristor.device",
            "triac", "thyristor.device",
            "line", "line",
            "winding", "clip.winding");

    private static final Map<String, String> USED_IN = Map.of(
            "unijunction", "drying-cabinet",
            "programmable-unijunction", "seed-drawer",
            "zener", "drying-cabinet",
            "scr", "drying-cabinet",
            "triac", "shed-heater",
            "line", "drying-cabinet",
            "winding", "shed-heater");

    static List<Path> profiles() {
        try (Stream<Path> files = Files.walk(PROFILES)) {
            return files.filter(f -> f.toString().endsWith(".yaml")).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @ParameterizedTest
    @MethodSource("profiles")
    void everyProfileStandsUnderItsKindAndId(Path file) {
        JsonNode profile = read(file);
        assertThat(profile.path("clipramp").asText()).isEqualTo("1");
        assertThat(profile.path("kind").asText())
                .isEqualTo(file.getParent().getFileName().toString());
        assertThat(profile.path("id").asText() + ".yaml")
                .isEqualTo(file.getFileName().toString())
                .matches("[a-z0-9-]+\\.yaml");
    }

    /** Reading a design judges every figure of the profiles that it uses: key, unit, plausible window. */
    @ParameterizedTest
    @MethodSource("profiles")
    void everyProfileReadsInADesignThatUsesIt(Path file) {
        String kind = file.getParent().getFileName().toString();
        String id = read(file).path("id").asText();
        LoadedDesign loaded =
                DesignFiles.load(example(USED_IN.get(kind)), List.of(PLACE.get(kind) + "=" + id), SHIPPED);
        assertThat(loaded.profiles()).anySatisfy(use -> {
            assertThat(use.id()).isEqualTo(id);
            assertThat(use.kind()).isEqualTo(kind);
            assertThat(use.from()).isEqualTo(ProfileLibrary.PROGRAM);
        });
        assertThat(loaded.design().notes()).isNotBlank();
    }

    @Test
    void everyProfileIsFoundByTheProgramWithASourceForEachFigure() {
        assertThat(SHIPPED.all())
                .hasSameSizeAs(profiles())
                .allSatisfy(found -> assertThat(Profile.read(found).figures())
                        .isNotEmpty()
                        .noneMatch(figure -> figure.source().equals("not stated")));
    }

    @ParameterizedTest
    @MethodSource("profiles")
    void everyFigureHasASourceOfAKnownSort(Path file) {
        JsonNode profile = read(file);
        JsonNode sources = profile.path("sources");
        assertThat(sources.path("default").asText()).isNotBlank();
        List<String> figures = new ArrayList<>();
        profile.fieldNames().forEachRemaining(k -> {
            if (!HEAD.contains(k)) {
                figures.addAll(paths(profile.get(k), k));
            }
        });
        sources.properties().forEach(source -> {
            assertThat(source.getValue().asText())
                    .containsPattern("data sheet|from memory|common practice|typical of the class|calculated|derived"
                            + "|Teccor AN1002|IEC 60038|EN 50160|ANSI C84.1|^ours");
            if (!source.getKey().equals("default")) {
                assertThat(figures)
                        .as("what the source of " + source.getKey() + " belongs to")
                        .anyMatch(p -> p.equals(source.getKey()) || p.startsWith(source.getKey() + "."));
            }
        });
    }

    @ParameterizedTest(name = "{0} {1}")
    @CsvFileSource(resources = "published-figures.csv", numLinesToSkip = 1)
    void holdsThePublishedFigure(String profile, String pointer, Unit unit, double expected, String source) {
        assertThat(figure(profile, pointer, unit))
                .as(profile + pointer + ", " + source)
                .isCloseTo(expected, within(1e-9 * Math.max(Math.abs(expected), 1e-12)));
    }

    /** Largest on-state voltage V_TM at a current, manufacturer's data sheets of the types. */
    @ParameterizedTest
    @CsvSource({
        "scr/2n5061, 1.2, 1.7",
        "scr/2n6397, 24, 2.2",
        "scr/2n6404, 32, 1.7",
        "scr/2n6508, 50, 1.8",
        "triac/2n6075a, 6, 2",
        "triac/2n6344, 11, 1.55",
        "triac/2n6349, 11, 1.55"
    })
    void onStateLinePassesThroughTheSheetsVoltage(String profile, double amps, double volts) {
        double line =
                figure(profile, "/on-state/threshold", Unit.VOLT) + figure(profile, "/on-state/slope", Unit.OHM) * amps;
        assertThat(line).isCloseTo(volts, within(0.005));
    }

    /** A series differs in its voltage class only; ends of the series from the sheets, the middle from memory. */
    @ParameterizedTest
    @CsvSource({
        "2n6400, 2n6405, 50, 800",
        "2n6504, 2n6509, 50, 800",
        "2n6394, 2n6399, 50, 800",
        "2n5060, 2n5064, 30, 200"
    })
    void voltageClassesRiseAlongASeries(String first, String last, double lowest, double highest) {
        List<Double> classes = profiles().stream()
                .filter(f -> f.getParent().endsWith("scr"))
                .filter(f -> isBetween(f.getFileName().toString(), first, last + ".yaml"))
                .map(f -> value(read(f).at("/limits/voltage"), Unit.VOLT))
                .toList();
        assertThat(classes)
                .isSorted()
                .doesNotHaveDuplicates()
                .startsWith(lowest)
                .endsWith(highest);
    }

    @Test
    void zenersAreFivePercentTypesTestedAtAQuarterOfTheirPower() {
        List<Path> zeners =
                profiles().stream().filter(f -> f.getParent().endsWith("zener")).toList();
        assertThat(zeners).hasSize(9);
        for (Path file : zeners) {
            JsonNode zener = read(file);
            double volts = value(zener.at("/voltage/typ"), Unit.VOLT);
            assertThat(value(zener.at("/voltage/min"), Unit.VOLT)).isCloseTo(0.95 * volts, within(1e-9));
            assertThat(value(zener.at("/voltage/max"), Unit.VOLT)).isCloseTo(1.05 * volts, within(1e-9));
            double testWatts = volts * value(zener.at("/test-current"), Unit.AMPERE);
            // Common practice, data sheets round to half a milliampere.
            assertThat(testWatts).isCloseTo(value(zener.at("/power"), Unit.WATT) / 4, within(0.01));
        }
    }

    @ParameterizedTest
    @CsvSource({"line/line-230v-50hz-en50160", "line/line-230v-50hz-en50160-peaked"})
    void distortedLinesStayUnderTheSharesOfEn50160(String profile) {
        double sumOfSquares = 0;
        for (JsonNode harmonic : profile(profile).path("harmonics")) {
            double share = value(harmonic.path("share"), Unit.FRACTION);
            assertThat(share)
                    .isLessThanOrEqualTo(EN_50160.get(harmonic.path("order").asInt()));
            sumOfSquares += share * share;
        }
        assertThat(Math.sqrt(sumOfSquares)).isBetween(0.99 * EN_50160_TOTAL, EN_50160_TOTAL);
    }

    @ParameterizedTest
    @CsvSource({"line/line-230v-50hz-en50160, 1.00", "line/line-230v-50hz-en50160-peaked, 1.18"})
    void distortedLinesCrossZeroOnceAHalfCycle(String profile, double crest) {
        JsonNode harmonics = profile(profile).path("harmonics");
        double highest = 0;
        for (int i = 1; i < 1800; i++) {
            double theta = Math.PI * i / 1800;
            double v = Math.sin(theta);
            for (JsonNode h : harmonics) {
                v += value(h.path("share"), Unit.FRACTION)
                        * Math.sin(h.path("order").asInt() * theta + value(h.path("phase"), Unit.ANGLE));
            }
            assertThat(v).as("%s at %d tenths of a degree", profile, i).isPositive();
            highest = Math.max(highest, v);
        }
        // A flat-topped wave and a peaked one: the phases are ours.
        assertThat(highest).isCloseTo(crest, within(0.005));
    }

    private static Source example(String name) {
        try {
            return Source.of(Path.of("examples", name + ".yaml"));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static boolean isBetween(String name, String first, String last) {
        return name.compareTo(first) >= 0 && name.compareTo(last) <= 0;
    }

    private static double figure(String profile, String pointer, Unit unit) {
        return value(profile(profile).at(pointer), unit);
    }

    private static double value(JsonNode node, Unit unit) {
        return QuantityReader.read(node.asText(), Expected.any(unit)).value();
    }

    private static JsonNode profile(String name) {
        return read(PROFILES.resolve(name + ".yaml"));
    }

    private static JsonNode read(Path file) {
        try {
            return YAML.readTree(Files.readString(file));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static List<String> paths(JsonNode node, String path) {
        List<String> all = new ArrayList<>(List.of(path));
        node.properties().forEach(e -> all.addAll(paths(e.getValue(), path + "." + e.getKey())));
        return all;
    }

    /** 2N5060 family 30 V/us, 2N6394, 2N6400 and 2N6504 families 50 V/us, typical: data sheets of the types, from memory. */
    @Test
    void everyScrStatesItsStaticRateOfRiseAndThatItIsRecalled() throws IOException {
        List<Path> scrs = profiles().stream()
                .filter(file -> file.toString().contains("scr"))
                .toList();
        assertThat(scrs).hasSizeGreaterThan(15);
        for (Path file : scrs) {
            JsonNode profile = YAML.readTree(file.toFile());
            boolean sensitive = profile.get("id").asText().startsWith("2n506");
            assertThat(profile.get("limits").get("dv-dt").asText()).isEqualTo(sensitive ? "30 V/µs" : "50 V/µs");
            assertThat(profile.get("sources").get("limits.dv-dt").asText()).contains("from memory");
        }
    }

    @Test
    void aPairOfScrsOnAnInductiveLoadIsJudgedByItAndASnubberHelps() {
        String load = "load={kind: inductive, resistance: 40 ohm, inductance: 60 mH}";
        String snubber = "snubber={resistance: 100 ohm, capacitance: 100 nF}";
        Margin bare = offState(List.of(load));
        Margin snubbed = offState(List.of(load, snubber));
        assertThat(bare.demand()).isEqualTo(50e6);
        assertThat(bare.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(snubbed.verdict()).isEqualTo(Verdict.HOLDS);
        assertThat(snubbed.offered()).isLessThan(bare.offered() / 10);
    }

    private static Margin offState(List<String> overrides) {
        String text = Example.named("upper-heaters").orElseThrow().text();
        LoadedDesign loaded = DesignFiles.load(new Source("upper-heaters.yaml", text), overrides, SHIPPED);
        return Judge.check(loaded.design(), OptionalDouble.empty(), OptionalDouble.empty()).margins().stream()
                .filter(margin -> margin.id().equals("off-state-dv-dt"))
                .findFirst()
                .orElseThrow();
    }
}
