package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.Thyristor;
import clipramp.margins.LineCheck.Rule;
import clipramp.margins.LineCheck.Setting;
import clipramp.margins.LineCheck.Standing;
import clipramp.power.LineCurrent;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class LineCheckTest {
    private static final Condition EUROPE = new Condition(230, 50, 25);

    private static Design textbook(Stage stage, Load load) {
        Design design = SampleDesigns.heater()
                .withStage(stage)
                .withStageDiodes(new StageDiodes(0, 0))
                .withLoad(load);
        design = Changed.with(design, "thyristor.device.onState.thresholdVolts", 0.0);
        return Changed.with(design, "thyristor.device.onState.slopeOhms", 0.0);
    }

    private static Load heater(double watts) {
        return new Load.Resistor(230.0 * 230.0 / watts);
    }

    private static LineCheck at(Design design, double... degrees) {
        List<Setting> settings = new ArrayList<>();
        for (int i = 0; i < degrees.length; i++) {
            double rad = Math.toRadians(degrees[i]);
            LoadResult load = LoadPower.atFiringAngle(design, EUROPE, rad);
            settings.add(new Setting(
                    degrees.length == 1 ? OptionalDouble.empty() : OptionalDouble.of((double) i / (degrees.length - 1)),
                    1e4,
                    load.firedRad(),
                    load.watts(),
                    LineCurrent.of(design, EUROPE, LoadPower.periodAtFiringAngle(design, EUROPE, rad))));
        }
        return LineCheck.of(design, EUROPE, settings);
    }

    private static Rule rule(LineCheck check, String id) {
        return check.rules().stream().filter(r -> r.id().equals(id)).findFirst().orElseThrow();
    }

    @Test
    void aResistorAtNinetyDegreesIsBoundByThe15thAt758Point7Watts() {
        // IEC 61000-3-2 class A and the closed form of the 15th harmonic, 1/(7 pi) of the full fundamental.
        Rule classA = rule(at(textbook(Stage.TRIAC, heater(500)), 90), "class-a");
        assertThat(classA.order()).hasValue(15);
        assertThat(classA.bindsAtWatts()).isCloseTo(758.7, within(0.05));
        assertThat(classA.standing()).isEqualTo(Standing.UNDER);
        assertThat(rule(at(textbook(Stage.TRIAC, heater(800)), 90), "class-a").standing())
                .isEqualTo(Standing.OVER);
    }

    @Test
    void tableOneIsThePrintedOne() {
        // IEC 61000-3-2, class A.
        int[] orders = {2, 3, 4, 5, 6, 7, 8, 9, 11, 13, 15, 21, 39, 40};
        double[] amps = {1.08, 2.30, 0.43, 1.14, 0.30, 0.77, 0.23, 0.40, 0.33, 0.21, 0.15, 0.10714, 0.05769, 0.046};
        for (int i = 0; i < orders.length; i++) {
            assertThat(LineTable.CLASS_A.limitAmps(orders[i], 0, 0).getAsDouble())
                    .isCloseTo(amps[i], within(1e-5));
        }
    }

    @Test
    void theRuleForHeatingElementsLetsSmallOnesThroughAndForbidsLargeOnes() {
        Rule small = rule(at(textbook(Stage.TRIAC, heater(200)), 90), "heating-element");
        assertThat(small.standing()).isEqualTo(Standing.NO_LIMITS);
        Rule large = rule(at(textbook(Stage.TRIAC, heater(1200)), 90), "heating-element");
        assertThat(large.standing()).isEqualTo(Standing.RULED_OUT);
        assertThat(large.text()).contains("15th harmonic").contains("758.7 W").contains("forbids");
        assertThat(rule(at(textbook(Stage.TRIAC, heater(700)), 90), "heating-element")
                        .standing())
                .isEqualTo(Standing.UNDER);
    }

    @Test
    void halfWaveAboveAHundredWattsIsOutBeforeAnyTable() {
        Design design = textbook(Stage.HALF_WAVE, heater(400));
        assertThat(rule(at(design, 0), "asymmetrical").standing()).isEqualTo(Standing.RULED_OUT);
        assertThat(at(design, 0).rules()).noneMatch(r -> r.id().equals("heating-element"));
        assertThat(rule(at(textbook(Stage.HALF_WAVE, heater(150)), 0), "asymmetrical")
                        .standing())
                .isEqualTo(Standing.NO_LIMITS);
    }

    @Test
    void theSharesOfClassCNeverHoldAtNinetyDegreesWhateverTheLamp() {
        for (double watts : new double[] {40, 300, 2000}) {
            LineCheck check = at(textbook(Stage.TRIAC, new Load.Filament(watts, 230, 1.55, 12)), 90);
            Rule luminaire = rule(check, "luminaire");
            assertThat(luminaire.standing()).isEqualTo(Standing.OVER);
            assertThat(luminaire.used()).isGreaterThan(2);
            assertThat(luminaire.bindsAtWatts()).isNaN();
            assertThat(rule(check, "dimmer").standing()).isEqualTo(watts <= 1000 ? Standing.NO_LIMITS : Standing.OVER);
        }
    }

    @Test
    void theWorstSettingAndTheLargestOfEveryOrderAreFound() {
        LineCheck check = at(textbook(Stage.TRIAC, heater(1000)), 10, 60, 90, 150);
        assertThat(check.orders()).hasSize(39);
        assertThat(check.orders().get(1).amps())
                .as("the third is largest at 90 degrees")
                .isCloseTo(check.settings().get(2).current().ampsOf(3), within(1e-12));
        double most = LineCheck.mostUsed(check.worstSetting().current());
        assertThat(check.settings()).allMatch(s -> LineCheck.mostUsed(s.current()) <= most);
    }

    @Test
    void noWordingClaimsMoreThanWasComputed() {
        for (Stage stage : Stage.values()) {
            for (Load load : List.of(heater(60), heater(1500), new Load.Filament(300, 230, 1.55, 12))) {
                assertThat(at(textbook(stage, load), 5, 90, 175).rules())
                        .isNotEmpty()
                        .allSatisfy(r -> assertThat(r.text() + r.standing().word() + r.name())
                                .doesNotContainIgnoringCase("compl")
                                .doesNotContainIgnoringCase("safe")
                                .doesNotContain("NaN")
                                .doesNotContain("∞"));
            }
        }
    }

    @Test
    void theJudgeTellsTheLineCurrentOfEverySetting() {
        Check check = Judge.check(SampleDesigns.heater(), OptionalDouble.empty(), OptionalDouble.empty());
        LineCheck line = check.lineCurrent().orElseThrow();
        assertThat(line.settings()).hasSameSizeAs(check.knob());
        for (int i = 0; i < check.knob().size(); i++) {
            LoadResult load = check.knob().get(i).load();
            assertThat(line.settings().get(i).current().rmsAmps()).isCloseTo(load.rmsAmps(), within(1e-9));
            assertThat(line.settings().get(i).current().dcAmps()).isCloseTo(load.dcAmps(), within(1e-9));
        }
        assertThat(rule(line, "heating-element").standing()).isEqualTo(Standing.RULED_OUT);
    }

    @Test
    void heatIsWorstAtFullConductionAndNamesTheSinkThatWouldDo() {
        Design design = SampleDesigns.heater();
        HeatCheck heat = Judge.check(design, OptionalDouble.empty(), OptionalDouble.empty())
                .heat()
                .orElseThrow();
        assertThat(heat.where()).isEqualTo("full conduction");
        double sink = heat.sinkKelvinPerWatt().getAsDouble();
        Design atLimit = design.withThyristor(new Thyristor(design.thyristor().device(), OptionalDouble.of(sink)));
        HeatCheck hot = Judge.check(atLimit, OptionalDouble.empty(), OptionalDouble.empty())
                .heat()
                .orElseThrow();
        assertThat(hot.junctionCelsius().getAsDouble())
                .isCloseTo(
                        design.thyristor().device().limits().junctionCelsius().getAsDouble(), within(1e-9));
    }
}
