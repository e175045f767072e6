package clipramp.desk.model;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Stage;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.margins.Verdict;
import clipramp.runs.Watch;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class NewDesignTest {
    private final Workshop workshop = Bystander.workshop();

    private Check judged(Wish wish) {
        String text = NewDesign.request(NewDesign.check(wish).wish());
        Resized found = new Resizing(workshop).of(Resizing.Asked.fresh(text), words -> Watch.NONE);
        return Judge.check(found.sheet().design(), OptionalDouble.empty(), OptionalDouble.empty());
    }

    private static Wish wish(String line, String load, Stage stage) {
        boolean low = NewDesign.isLowVoltage(line);
        return new Wish(
                line, load, stage, Wish.usualLowest(stage, low), Wish.usualHighest(stage, low), "0 degC", "50 degC");
    }

    /** What is written is a working design: the judge, on the text read anew, finds no margin that fails. */
    @ParameterizedTest
    @EnumSource(Stage.class)
    void aHeaterOfFourHundredWattsWorksOnEveryStage(Stage stage) {
        Check check = judged(wish("line-230v-50hz", "400 W", stage));
        assertThat(check.margins()).noneMatch(margin -> margin.verdict() == Verdict.FAILS);
    }

    @Test
    void aKilowattWorksOn120VoltsToo() {
        Check check = judged(wish("line-120v-60hz", "1 kW", Stage.BRIDGE_DC));
        assertThat(check.margins()).noneMatch(margin -> margin.verdict() == Verdict.FAILS);
    }

    @Test
    void aSmallLoadOn24VoltsGetsASensitiveThyristor() {
        Check check = judged(wish("line-24v-50hz", "10 W", Stage.BRIDGE_DC));
        assertThat(check.design().thyristor().device().id()).startsWith("2n506");
        assertThat(check.margins()).noneMatch(margin -> margin.verdict() == Verdict.FAILS);
    }

    @Test
    void theKnobReachesWhatIsWantedAtBothEnds() {
        Check check = judged(wish("line-230v-50hz", "1 kW", Stage.BRIDGE_DC));
        assertThat(check.knob().get(0).load().fraction()).isLessThanOrEqualTo(0.10);
        assertThat(check.knob().get(10).load().fraction()).isGreaterThanOrEqualTo(0.90);
    }

    @Test
    void aBareTemperatureAndADecimalCommaAreTaken() {
        Wish typed = new Wish("line-230v-50hz", "1,2 kW", Stage.BRIDGE_DC, "10 %", "90 %", "-5", "45");
        NewDesign.Checked checked = NewDesign.check(typed);
        assertThat(checked.refusal()).isEmpty();
        assertThat(checked.wish().load()).isEqualTo("1.2 kW");
        assertThat(checked.wish().coldest()).isEqualTo("-5 degC");
    }

    @Test
    void anAnswerThatCannotBeReadIsNamed() {
        Wish typed = new Wish("line-230v-50hz", "1 kW", Stage.BRIDGE_DC, "10 V", "90 %", "0 degC", "50 degC");
        assertThat(NewDesign.check(typed).refusal().orElseThrow()).startsWith("lowest wanted: read \"10 V\"");
    }

    @Test
    void linesAreNamedInWords() {
        assertThat(NewDesign.lineInWords("line-230v-50hz")).isEqualTo("230 V 50 Hz");
        assertThat(NewDesign.lineInWords("line-230v-50hz-en50160-peaked")).isEqualTo("230 V 50 Hz, en50160 peaked");
        assertThat(workshop.lineIds().get(0)).isEqualTo("line-230v-50hz");
    }
}
