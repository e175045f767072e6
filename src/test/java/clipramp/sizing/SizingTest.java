package clipramp.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import clipramp.circuit.Design;
import clipramp.circuit.PotLaw;
import clipramp.files.DesignText.Reading;
import clipramp.files.Example;
import clipramp.files.InvalidInputException;
import clipramp.files.PartialDesign;
import clipramp.files.SizedText;
import clipramp.files.Source;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Verdict;
import clipramp.sizing.SizingAnswer.Outcome;
import clipramp.units.PreferredSeries;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** From a request to a design that the judge passes. The judge is the one that check asks, on the text read anew. */
class SizingTest {
    private static final String CABINET = """
            clipramp: 1
            line: line-230v-50hz
            stage: %s
            load: {kind: resistor, rated: 700 W at 230 V}
            surroundings: {coldest: 0 degC, hottest: 50 degC}
            wanted: {lowest: 5 %% at 0 %%, highest: %s %% at 100 %%}
            """;

    private static Check checked(PartialDesign partial, SizingAnswer answer) {
        Reading reading = SizedText.of(partial, answer.design()).read(Requests.LIBRARY);
        assertThat(reading).isInstanceOf(Reading.Good.class);
        Design read = ((Reading.Good) reading).loaded().design();
        return Judge.check(read, OptionalDouble.empty(), OptionalDouble.empty());
    }

    @ParameterizedTest
    @ValueSource(strings = {"bridge-dc", "half-wave", "bridge-ac", "inverse-parallel", "triac"})
    void everyStageIsSizedSoThatItsTextReadAnewHolds(String stage) {
        PartialDesign partial = Requests.read(CABINET.formatted(stage, stage.equals("half-wave") ? "45" : "92"));
        SizingAnswer answer = Sizing.propose(partial.request(Requests.LIBRARY, PreferredSeries.E24));

        assertThat(answer.outcome()).isNotEqualTo(Outcome.NOTHING);
        assertThat(answer.conflicts()).isEmpty();
        assertThat(checked(partial, answer).verdict()).isNotEqualTo(Verdict.FAILS);
    }

    @Test
    void aProgrammableDeviceKeepsItsRampOverItsSmallValleyCurrent() {
        String text = Example.named("seed-drawer").orElseThrow().text();
        PartialDesign partial = PartialDesign.read(
                new Source("drawer.yaml", text),
                EnumSet.of(OpenPart.CAPACITOR, OpenPart.FIXED, OpenPart.TRACK),
                Set.of(),
                Requests.LIBRARY);
        SizingAnswer answer = Sizing.propose(partial.request(Requests.LIBRARY, PreferredSeries.E12));

        assertThat(answer.conflicts()).isEmpty();
        assertThat(checked(partial, answer).verdict()).isNotEqualTo(Verdict.FAILS);
    }

    @Test
    void theSameRequestGivesTheSameDesign() {
        String text = Requests.text(3);

        assertThat(Sizing.propose(Requests.request(text, PreferredSeries.E12)).design())
                .isEqualTo(Sizing.propose(Requests.request(text, PreferredSeries.E12))
                        .design());
    }

    @Test
    void whatIsDecidedStaysAndWhatIsKeptStays() {
        String text = CABINET.formatted("bridge-dc", "90") + "clip: {dropper: 12 kΩ ±1 % 17 W 500 V}\n";
        PartialDesign partial = PartialDesign.read(
                new Source("kept.yaml", text), Set.of(), EnumSet.of(OpenPart.CAPACITOR), Requests.LIBRARY);
        Design design = Sizing.propose(partial.request(Requests.LIBRARY, PreferredSeries.E12))
                .design();

        assertThat(design.clip().dropper().value()).isEqualTo(12e3);
        assertThat(design.ramp().capacitor())
                .isEqualTo(partial.loaded().design().ramp().capacitor());
        assertThat(partial.open())
                .doesNotContain(OpenPart.DROPPER, OpenPart.CAPACITOR)
                .contains(OpenPart.FIXED);
    }

    @Test
    void chosenResistorsAreOfTheSeriesAskedFor() {
        Design design = Sizing.propose(Requests.request(CABINET.formatted("bridge-dc", "90"), PreferredSeries.E6))
                .design();

        assertThat(PreferredSeries.E6.contains(design.ramp().fixed().value())).isTrue();
        assertThat(PreferredSeries.E6.contains(design.clip().dropper().value())).isTrue();
        assertThat(PreferredSeries.E6.contains(design.trigger().baseOne().value()))
                .isTrue();
        assertThat(PreferredSeries.E6.contains(design.ramp().capacitor().value()))
                .isTrue();
    }

    @Test
    void moreThanAHalfWaveStageCanGiveIsToldAsAConflictWithTheNearestThatCanBeHad() {
        SizingAnswer answer =
                Sizing.propose(Requests.request(CABINET.formatted("half-wave", "80"), PreferredSeries.E24));

        assertThat(answer.outcome()).isEqualTo(Outcome.NOTHING);
        assertThat(answer.conflicts()).anySatisfy(c -> {
            assertThat(c.margin().id()).isEqualTo("wanted-highest");
            assertThat(c.nearest()).contains("in place of 80 %", "every second half cycle only");
        });
    }

    /** Bridge and thyristor leave a line of 24 V with four fifths of its power: no firing circuit gives more. */
    @Test
    void whatTheDropsTakeIsSaidTogetherWithTheNearestThatHolds() {
        SizingAnswer answer = Sizing.propose(Requests.request(Requests.text(1), PreferredSeries.E24));

        assertThat(answer.conflicts()).singleElement().satisfies(c -> {
            assertThat(c.margin().id()).isEqualTo("wanted-highest");
            assertThat(c.nearest())
                    .startsWith("The nearest that can be met: ")
                    .contains("the design shown holds with that")
                    .contains("the drops of thyristor and bridge take the rest");
        });
    }

    /** Seed 23 was silent: across the thyristor the supply is gone with the pulse, and 12 V leave the gate nothing. */
    @Test
    void aBridgeOnALowLineIsCoupledByTransformerUnlessItIsSaidOtherwise() {
        PartialDesign partial = Requests.read(Requests.text(23).replace("80 % at 100 %", "70 % at 100 %"));

        assertThat(partial.text().valueAt("gate.coupling")).contains("transformer");
        assertThat(partial.notes()).anySatisfy(n -> assertThat(n).contains("a line this low"));
        assertThat(Sizing.propose(partial.request(Requests.LIBRARY, PreferredSeries.E24))
                        .outcome())
                .isEqualTo(Outcome.WORST_CASE);
    }

    /** The standoff ratio alone moves the delay by a fifth either way: presets take that up. */
    @Test
    void trimmersAreProposedWhereUnitsStrayAndTheExtremeOnesThenHold() {
        SizingRequest request = Requests.request(CABINET.formatted("bridge-dc", "92"), PreferredSeries.E24);
        SizingAnswer answer = Sizing.propose(request);

        assertThat(answer.outcome()).isEqualTo(Outcome.WORST_CASE);
        assertThat(UnitSetting.of(answer.design()))
                .extracting(UnitSetting::part)
                .containsExactly(OpenPart.TRIM_HIGH, OpenPart.TRIM_LOW);
        for (Design unit : List.of(CornerUnits.fastest(answer.design()), CornerUnits.slowest(answer.design()))) {
            assertThat(Judge.check(unit, OptionalDouble.empty(), OptionalDouble.empty())
                            .verdict())
                    .isNotEqualTo(Verdict.FAILS);
        }
    }

    /** The trimmers' tracks want a shunt far under the pot's, which bends a linear track: a taper bends it back. */
    @Test
    void ofTrimmedDesignsThatHoldTheOneWithTheStraightKnobIsProposedUnlessTheLawIsDecided() {
        String text = CABINET.formatted("bridge-ac", "92");
        SizingAnswer free = Sizing.propose(Requests.request(text, PreferredSeries.E24));
        PartialDesign partial = PartialDesign.read(
                new Source("linear.yaml", text), Set.of(), EnumSet.of(OpenPart.LAW), Requests.LIBRARY);
        SizingAnswer linear = Sizing.propose(partial.request(Requests.LIBRARY, PreferredSeries.E24));

        assertThat(free.outcome()).isEqualTo(Outcome.WORST_CASE);
        assertThat(linear.design().ramp().pot().orElseThrow().law()).isInstanceOf(PotLaw.Linear.class);
        assertThat(KnobShape.of(free.design(), KnobShape.What.POWER).largestDeparture())
                .isLessThan(0.16)
                .isLessThan(0.6
                        * KnobShape.of(linear.design(), KnobShape.What.POWER).largestDeparture());
    }

    @Test
    void aFreedDesignThatStandsBetterThanWhatIsFoundIsKept() {
        SizingRequest request = Requests.request(CABINET.formatted("bridge-dc", "92"), PreferredSeries.E24);
        Design holds = Sizing.propose(request).design();
        // Without trimmers to choose, the search alone comes to nominal parts only.
        SizingRequest freed = new SizingRequest(
                holds, EnumSet.of(OpenPart.CAPACITOR, OpenPart.TRACK), request.stock(), request.series());

        assertThat(Sizing.propose(freed).outcome()).isEqualTo(Outcome.WORST_CASE);
    }

    @Test
    void noTrimmerIsProposedWhereTheRequestSaysNone() {
        String text = CABINET.formatted("bridge-dc", "92") + "ramp: {trim-high: none, trim-low: none}\n";
        SizingAnswer answer = Sizing.propose(Requests.request(text, PreferredSeries.E24));

        assertThat(answer.design().ramp().trimmers().isNone()).isTrue();
        assertThat(answer.outcome()).isEqualTo(Outcome.NOMINAL);
    }

    /** The 24th of the drawn requests once ended in a crash: no request may. */
    @ParameterizedTest
    @ValueSource(longs = {24, 28, 35, 50})
    void everyRequestEndsInADesignOrInARefusalThatNamesTheDemand(long seed) {
        SizingAnswer answer = Sizing.propose(Requests.request(Requests.text(seed), PreferredSeries.E24));

        assertThat(answer.holds() || !answer.conflicts().isEmpty()).isTrue();
        assertThat(answer.conflicts()).allSatisfy(c -> assertThat(c.nearest()).isNotBlank());
    }

    @Test
    void aWrongKeyInARequestIsRefusedAtItsOwnLineAndMissingPartsAreNot() {
        String text = CABINET.formatted("bridge-dc", "90") + "ramp: {capacitr: 100 nF}\n";

        assertThatThrownBy(() -> Requests.read(text))
                .isInstanceOfSatisfying(
                        InvalidInputException.class,
                        e -> assertThat(e.problems()).singleElement().satisfies(p -> {
                            assertThat(p.line()).isEqualTo(7);
                            assertThat(p.message()).contains("capacitr");
                        }));
    }

    @Test
    void aKnobThatGivesMostAnticlockwiseIsWiredTheOtherWay() {
        String text = CABINET.formatted("bridge-dc", "90")
                .replace("at 0 %,", "at 100 %,")
                .replace("90 % at 100 %", "90 % at 0 %");
        Design design =
                Sizing.propose(Requests.request(text, PreferredSeries.E24)).design();

        assertThat(design.ramp().rampOhms(0)).isLessThan(design.ramp().rampOhms(1));
    }

    @Test
    void everyReasonNamesItsRelationAndTheNeighbourOfTheTrackFails() {
        SizingRequest request = Requests.request(CABINET.formatted("bridge-dc", "92"), PreferredSeries.E24);
        SizingAnswer answer = Sizing.propose(request);

        assertThat(Reasons.of(request, answer))
                .hasSize(request.open().size())
                .allSatisfy(r -> assertThat(r.relation()).isNotBlank());
        assertThat(Reasons.of(request, answer))
                .filteredOn(r -> r.part() == OpenPart.TRACK)
                .singleElement()
                .satisfies(r -> assertThat(r.down()).contains("lowest wanted setting"));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2})
    void theSearchFindsAsGoodARampAsTryingEveryOne(long seed) {
        SizingRequest request = Requests.ramp(seed);

        assertThat(Exhaustive.searched(request).grade())
                .as("seed %d", seed)
                .isEqualTo(Exhaustive.best(request).grade());
    }
}
