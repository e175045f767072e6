package clipramp.faults;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.TestPoint;
import clipramp.faults.Observation.Meter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DiagnosisTest {
    private static final Design DESIGN = SampleDesigns.heater();
    private static final FaultSheet SHEET = Faults.of(DESIGN, DESIGN.nominalCondition());
    private static final ObservationReader READER = new ObservationReader(DESIGN);

    private static List<String> ranked(String seen) {
        return Diagnosis.rank(SHEET, READER.read(seen)).stream()
                .map(c -> c.effect().fault().id())
                .toList();
    }

    /** Whoever reads every meter at a circuit with a fault finds that fault first, or one that no meter tells from it. */
    @Test
    void everyFaultsOwnReadingsLeadBackToIt() {
        for (FaultEffect effect : SHEET.faults()) {
            List<Observation> seen = new ArrayList<>();
            seen.add(new Observation.Load("load", java.util.Set.of(effect.gets())));
            seen.add(new Observation.Knob("knob", effect.knobActs()));
            effect.readings().forEach((point, reading) -> {
                for (Meter meter : Meter.values()) {
                    seen.add(new Observation.Volts(point + meter.word(), point, meter, meter.of(reading)));
                }
            });
            Diagnosis.Candidate best = Diagnosis.rank(SHEET, seen).get(0);
            assertThat(best.contradicts()).as(effect.fault().words()).isEmpty();
            assertThat(best.misfit()).as(effect.fault().words()).isZero();
            assertThat(best.effect().readings()).isEqualTo(effect.readings());
        }
    }

    @Test
    void fullPowerAndADeadKnobMeanAShortedThyristor() {
        assertThat(ranked("load:full,knob:dead")).startsWith("thyristor-shorted");
    }

    @Test
    void aSupplyWithoutARampPointsAtTheRamp() {
        assertThat(ranked("load:none,TP1=19V,TP2.peak=0V").subList(0, 3))
                .contains("capacitor-shorted", "wiper-open", "ramp-fixed-open");
    }

    @Test
    void aBurntTriggerDeviceLeadsToWhatBurntIt() {
        List<Diagnosis.Candidate> fitting = Diagnosis.rank(SHEET, READER.read("blown:Q1")).stream()
                .filter(c -> c.contradicts().isEmpty())
                .toList();
        assertThat(fitting)
                .extracting(c -> c.effect().fault().id())
                .contains("zener-open", "dropper-shorted", "trigger-dead")
                .doesNotContain("none", "load-open");
    }

    @Test
    void aBlownFuseMeansAShortedDiode() {
        assertThat(ranked("fuse:blown").get(0)).isEqualTo("stage-diode-shorted");
    }

    @Test
    void aHealthyCircuitsReadingsSayThatNothingIsWrong() {
        Reading supply = SHEET.healthy().readings().get(TestPoint.TP1);
        Reading across = SHEET.healthy().readings().get(TestPoint.TP5);
        String seen = String.format(
                Locale.ROOT,
                "load:same,knob:acts,TP1=%.3fV,TP5=%.3fV,TP5.ac=%.3fV",
                supply.dcVolts(),
                across.dcVolts(),
                across.acVolts());
        Diagnosis.Candidate best = Diagnosis.rank(SHEET, READER.read(seen)).stream()
                .filter(c -> c.effect() == SHEET.healthy())
                .findFirst()
                .orElseThrow();
        assertThat(best.contradicts()).isEmpty();
    }

    @Test
    void whatContradictsSaysWhatWouldBeSeenInstead() {
        Diagnosis.Candidate shorted = Diagnosis.rank(SHEET, READER.read("load:none,knob:acts")).stream()
                .filter(c -> c.effect().fault().id().equals("thyristor-shorted"))
                .findFirst()
                .orElseThrow();
        assertThat(shorted.contradicts())
                .extracting(Diagnosis.Contradiction::instead)
                .containsExactly("load: full power", "knob dead");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "load", "load:much", "TP0=3V", "TP1=3A", "TP1.rms=3V", "blown:X9", "tea:hot", "load:none,,"})
    void whatIsNotUnderstoodIsRefusedWithTheGrammar(String text) {
        assertThatThrownBy(() -> READER.read(text))
                .isInstanceOf(RefusedObservationException.class)
                .hasMessageContaining("Expected load:none|half");
    }
}
