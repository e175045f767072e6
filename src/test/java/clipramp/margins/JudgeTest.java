package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.margins.Margin.Sense;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class JudgeTest {
    private static final OptionalDouble FREE = OptionalDouble.empty();

    private static Check check(Design design) {
        return Judge.check(design, FREE, FREE);
    }

    private static Margin margin(Check check, MarginKind kind) {
        return check.margins().stream()
                .filter(m -> m.kind() == kind)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void eachMarginIsJudgedAtItsWorstConditionWhichItNames() {
        Check check = check(SampleDesigns.heater());
        // The coldest junction asks for most gate current, the lowest line gives the least.
        assertThat(margin(check, MarginKind.GATE_PEAK_CURRENT).condition()).isEqualTo("low line, 0 °C");
        assertThat(margin(check, MarginKind.DROPPER_POWER).condition()).startsWith("high line");
        assertThat(margin(check, MarginKind.TRIGGER_POWER).condition()).isEqualTo("high line, 50 °C");
        assertThat(margin(check, MarginKind.JUNCTION_TEMPERATURE).condition()).isEqualTo("high line, 50 °C");
        assertThat(margin(check, MarginKind.GATE_STANDING_VOLTAGE).condition()).endsWith("50 °C");
        assertThat(margin(check, MarginKind.RAMP_BEFORE_COLLAPSE).condition()).startsWith("low line");
    }

    @Test
    void aPinnedLineOrTemperatureIsTheOnlyOneJudgedOnItsAxis() {
        Check check = Judge.check(SampleDesigns.heater(), OptionalDouble.of(220), OptionalDouble.of(10));
        assertThat(check.condition().lineVolts()).isEqualTo(220);
        assertThat(check.condition().celsius()).isEqualTo(10);
        assertThat(check.margins())
                .extracting(Margin::condition)
                .allMatch(words ->
                        words.equals("220 V, 10 °C") || words.equals("any condition") || words.startsWith("line at"));
    }

    @Test
    void worstComesFirstAndTheDesignIsAsGoodAsItsWorstMargin() {
        Check check = check(Changed.with(SampleDesigns.heater(), "gate.overdrive", 12.0));
        assertThat(check.margins().get(0).kind()).isEqualTo(MarginKind.GATE_PEAK_CURRENT);
        assertThat(check.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(check.margins()).isSortedAccordingTo((a, b) -> b.verdict().compareTo(a.verdict()));
    }

    @Test
    void aMissingDatumIsNotJudgedAndNeverHolds() {
        Design design = Changed.with(SampleDesigns.heater(), "clip.dropper.ratedVolts", OptionalDouble.empty());
        Check check = check(design);
        Margin margin = margin(check, MarginKind.DROPPER_VOLTAGE);
        assertThat(margin.verdict()).isEqualTo(Verdict.NOT_JUDGED);
        assertThat(margin.ratio()).isEmpty();
        assertThat(margin.demand()).isNaN();
        assertThat(margin.formula()).contains("clip.dropper");
        assertThat(check.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    }

    @Test
    void holdsTightAndFailsFollowTheRatio() {
        // The thyristor's rms current is the same three times; its rating is 1.3, 1.1 and 0.9 times it.
        Check check = check(SampleDesigns.heater());
        double amps = margin(check, MarginKind.THYRISTOR_RMS).offered();
        assertThat(rated(1.3 * amps).verdict()).isEqualTo(Verdict.HOLDS);
        assertThat(rated(1.1 * amps).verdict()).isEqualTo(Verdict.TIGHT);
        assertThat(rated(0.9 * amps).verdict()).isEqualTo(Verdict.FAILS);
        assertThat(rated(1.1 * amps).ratio().getAsDouble()).isCloseTo(1.1, within(1e-9));
        assertThat(rated(1.1 * amps).holdsFrom()).isEqualTo(1.2);
    }

    private static Margin rated(double amps) {
        Design design =
                Changed.with(SampleDesigns.heater(), "thyristor.device.limits.rmsAmps", OptionalDouble.of(amps));
        return margin(check(design), MarginKind.THYRISTOR_RMS);
    }

    @Test
    void aRuleOfThumbIsTightAtWorst() {
        Check check = check(Changed.with(SampleDesigns.heater(), "gate.chargeSeconds", 1.0));
        Margin charge = margin(check, MarginKind.GATE_CHARGE);
        assertThat(charge.ratio().getAsDouble()).isLessThan(0.01);
        assertThat(charge.verdict()).isEqualTo(Verdict.TIGHT);
    }

    @Test
    void aWantedBandIsJudgedOnBothSidesAndAnAngleRunsAgainstThePower() {
        Design heater = SampleDesigns.heater();
        Check band = check(
                heater.withWanted(new Wanted(Optional.of(new Goal(Measure.FRACTION, 0.2, 0.3, 0)), Optional.empty())));
        Margin low = margin(band, MarginKind.WANTED_LOWEST);
        assertThat(low.sense()).isEqualTo(Sense.AT_LEAST);
        assertThat(low.demand()).isEqualTo(0.2);
        assertThat(low.verdict()).isEqualTo(Verdict.FAILS);

        double rad = Math.toRadians(130);
        Check angle = check(
                heater.withWanted(new Wanted(Optional.of(new Goal(Measure.ANGLE, rad, rad, 0)), Optional.empty())));
        Margin late = margin(angle, MarginKind.WANTED_LOWEST);
        assertThat(late.sense()).isEqualTo(Sense.AT_LEAST);
        assertThat(late.unit()).isEqualTo("deg");
        assertThat(late.demand()).isCloseTo(130, within(1e-9));
        assertThat(late.verdict()).isEqualTo(Verdict.HOLDS);
    }

    @Test
    void theKnobTableHasElevenRowsAndAFixedRampOne() {
        Check check = check(SampleDesigns.heater());
        assertThat(check.knob()).hasSize(11);
        assertThat(check.knob().get(10).position()).hasValue(1);
        assertThat(check.knob().get(10).rampOhms()).isCloseTo(5_600, within(1e-9));
        assertThat(check.pulse().orElseThrow().atKnob()).hasValue(0.5);

        Check fixed = check(Changed.with(
                Changed.with(SampleDesigns.heater(), "ramp.pot", Optional.empty()), "ramp.fixed.value", 40_000.0));
        assertThat(fixed.knob()).hasSize(1);
        assertThat(fixed.knob().get(0).position()).isEmpty();
        assertThat(fixed.pulse().orElseThrow().atKnob()).isEmpty();
    }

    @Test
    void everyMarginCarriesFormulaSourceRemedyAndParts() {
        for (Margin margin : check(SampleDesigns.triacHeater()).margins()) {
            assertThat(margin.formula()).as(margin.id()).isNotBlank().doesNotContain("NaN");
            assertThat(margin.source()).as(margin.id()).isNotBlank();
            assertThat(margin.remedy()).as(margin.id()).isNotBlank();
            assertThat(margin.parts()).as(margin.id()).isNotEmpty();
            assertThat(MarginKind.byId(margin.id())).contains(margin.kind());
        }
    }

    @Test
    void everyKindHasAnIdOfItsOwn() {
        List<String> ids =
                List.of(MarginKind.values()).stream().map(MarginKind::id).toList();
        assertThat(ids).doesNotHaveDuplicates().allMatch(id -> id.matches("[a-z0-9-]+"));
    }

    @Test
    void aTriacWithoutTheQuadrantOfThePulseFails() {
        Design design = SampleDesigns.triacHeater();
        var quadrants =
                new java.util.HashMap<>(design.thyristor().device().gate().quadrants());
        quadrants.remove(clipramp.circuit.ThyristorDevice.Quadrant.III_PLUS);
        Margin margin = margin(
                check(Changed.with(design, "thyristor.device.gate.quadrants", quadrants)), MarginKind.GATE_POLARITY);
        assertThat(margin.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(margin.formula()).contains("III+");
    }

    @Test
    void notesGiveTheModelsAssumptionsWithTheirSize() {
        assertThat(check(SampleDesigns.heater()).notes())
                .extracting(Note::id)
                .contains("nominal-parts", "self-heating", "emitter-leakage", "gate-energy")
                .doesNotContain("load-in-series", "latched-on", "trigger-data-extended");
        Design heavy = SampleDesigns.thyristorTapHeater().withLoad(new Load.Resistor(150));
        assertThat(check(heavy).notes()).extracting(Note::id).contains("load-in-series");
        assertThat(check(SampleDesigns.triacHeater()).notes())
                .extracting(Note::id)
                .contains("trigger-data-extended", "leakage-inductance");
    }

    @Test
    void aLatchedOnDeviceIsSaidToFireStill() {
        Design design = SampleDesigns.heater().withRamp(SampleDesigns.ramp(1e-6, 560, 6_800));
        Check check = check(design);
        assertThat(margin(check, MarginKind.LATCHED_ON).verdict()).isEqualTo(Verdict.FAILS);
        assertThat(margin(check, MarginKind.SILENT).verdict()).isEqualTo(Verdict.HOLDS);
        assertThat(check.notes()).extracting(Note::id).contains("latched-on");
    }

    @Test
    void aLineWithoutToleranceIsJudgedOnce() {
        Design design = SampleDesigns.heater().withLine(new Line(230, 50, 230, 230, List.of()));
        assertThat(check(design).margins()).extracting(Margin::condition).noneMatch(c -> c.contains("low line"));
    }

    @Test
    void aHalfWaveStageIsNotAskedToLatchInTheHalfCycleThatItBlocks() {
        Design design = SampleDesigns.windingHeater(0, false)
                .withStage(clipramp.circuit.Stage.HALF_WAVE)
                .withThyristor(SampleDesigns.heater().thyristor())
                .withGate(SampleDesigns.directGate(1_000))
                .withWanted(new Wanted(Optional.empty(), Optional.empty()));
        Check check = check(design);
        assertThat(margin(check, MarginKind.LATCHING_EARLIEST).verdict()).isEqualTo(Verdict.HOLDS);
        assertThat(check.notes()).extracting(Note::id).contains("half-wave-dc", "reverse-anode-drive");
    }

    @Test
    void aSupplyTurnedOverIsJudgedOnItsOwnHalfCycle() {
        Design upright = SampleDesigns.halfWaveHeater()
                .withStage(clipramp.circuit.Stage.TRIAC)
                .withThyristor(SampleDesigns.triacHeater().thyristor());
        var winding = Optional.of(new clipramp.circuit.Winding(230, 230, false, 0));
        var over = Optional.of(new clipramp.circuit.Winding(230, 230, true, 0));
        Margin first = margin(check(Changed.with(upright, "clip.winding", winding)), MarginKind.RAMP_BEFORE_COLLAPSE);
        Margin second = margin(check(Changed.with(upright, "clip.winding", over)), MarginKind.RAMP_BEFORE_COLLAPSE);
        assertThat(second.demand()).isCloseTo(first.demand(), within(1e-6));
        assertThat(second.offered()).isCloseTo(first.offered(), within(1e-6));
    }

    @Test
    void aThyristorThatTheNominalPulseDoesNotLatchIsRatedAsIfAnotherDid() {
        Design lazy = Changed.with(
                SampleDesigns.heater(),
                "thyristor.device.latching",
                Optional.of(clipramp.circuit.TemperatureCurve.at25(20)));
        double asleep = margin(check(lazy), MarginKind.THYRISTOR_RMS).offered();
        double awake =
                margin(check(SampleDesigns.heater()), MarginKind.THYRISTOR_RMS).offered();
        assertThat(asleep).isCloseTo(awake, within(1e-3 * awake));
    }

    @Test
    void aRampWithoutAnyResistanceIsJudgedAndLatchesOn() {
        Check check = check(Changed.with(SampleDesigns.heater(), "ramp.fixed.value", 0.0));
        assertThat(margin(check, MarginKind.LATCHED_ON).verdict()).isEqualTo(Verdict.FAILS);
        assertThat(margin(check, MarginKind.WANTED_HIGHEST).remedy()).contains("stays off");
        assertThat(check.margins()).extracting(Margin::verdict).doesNotContain(Verdict.NOT_JUDGED);
    }
}
