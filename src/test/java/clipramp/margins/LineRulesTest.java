package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.margins.LineCheck.Order;
import clipramp.margins.LineCheck.Rule;
import clipramp.margins.LineCheck.Setting;
import clipramp.margins.LineCheck.Standing;
import clipramp.power.LineCurrent;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Rules of IEC 61000-3-2 at their limits, on line currents that were written down by hand. */
class LineRulesTest {
    private static final Design HEATER = SampleDesigns.heater();

    /** A current of a fundamental and one harmonic, in A. */
    private static LineCurrent current(double fundamental, int order, double amps) {
        List<LineCurrent.Harmonic> harmonics = new ArrayList<>();
        for (int n = 2; n <= LineCurrent.HIGHEST_ORDER; n++) {
            harmonics.add(new LineCurrent.Harmonic(n, n == order ? amps : 0, 0));
        }
        double rms = Math.hypot(fundamental, amps);
        return new LineCurrent(fundamental, harmonics, 0, rms, 230 * fundamental, amps / fundamental, 1, 0.9);
    }

    private static Setting setting(double position, double watts, LineCurrent current) {
        return new Setting(OptionalDouble.of(position), 1e4, OptionalDouble.of(1), watts, current);
    }

    private static Design taking(double watts, Stage stage) {
        return HEATER.withStage(stage).withLoad(new Load.Resistor(230.0 * 230 / watts));
    }

    private static LineCheck check(Design design, Setting... settings) {
        return LineCheck.of(design, new Condition(230, 50, 25), List.of(settings));
    }

    private static Rule rule(LineCheck check, String id) {
        return check.rules().stream().filter(r -> r.id().equals(id)).findFirst().orElseThrow();
    }

    private static List<String> ids(double fullWatts) {
        Design design = taking(fullWatts, Stage.TRIAC);
        List<Setting> settings = List.of(setting(0, fullWatts, current(1, 3, 0.1)));
        List<Order> orders = check(design, settings.get(0)).orders();
        return new LineRules(design, fullWatts, settings, orders)
                .all().stream().map(Rule::id).toList();
    }

    @Test
    void smallEquipmentEndsAtSeventyFiveWattsAndProfessionalBeginsAboveAThousand() {
        assertThat(ids(75)).containsExactly("heating-element", "class-a", "small");
        assertThat(ids(Math.nextUp(75.0))).containsExactly("heating-element", "class-a");
        assertThat(ids(1000)).containsExactly("heating-element", "class-a");
        assertThat(ids(Math.nextUp(1000.0))).containsExactly("heating-element", "class-a", "professional");
    }

    @Test
    void aHeatingElementIsFreeUpToTwoHundredWattsAndUnderTheTableBeyond() {
        LineCurrent third = current(1, 3, 2.30);
        Design design = taking(200, Stage.TRIAC);
        List<Setting> settings = List.of(setting(0.5, 200, third));
        List<Order> orders = check(design, settings.get(0)).orders();
        Rule free = new LineRules(design, 200, settings, orders).all().get(0);
        assertThat(free.standing()).isEqualTo(Standing.NO_LIMITS);
        assertThat(free.text()).endsWith("no limits up to 200 W of full power; this one takes 200 W.");
        assertThat(free.order()).isEmpty();
        Rule held = new LineRules(design, Math.nextUp(200.0), settings, orders)
                .all()
                .get(0);
        // Exactly at the 2.30 A of the table the order is not over it.
        assertThat(held.standing()).isEqualTo(Standing.UNDER);
        assertThat(held.order()).hasValue(3);
        assertThat(held.used()).isEqualTo(1);
        assertThat(held.bindsAtWatts()).isCloseTo(200, within(1e-9));
        assertThat(held.text())
                .contains("The 3rd harmonic binds first: 2.3 A of 2.3 A with the knob at 50 %")
                .doesNotContain("forbids");
    }

    @Test
    void overTheTableTheRuleForbidsAndClassAIsOver() {
        LineCheck check = check(taking(500, Stage.TRIAC), setting(0, 100, current(1, 5, 2.28)));
        Rule heating = rule(check, "heating-element");
        assertThat(heating.standing()).isEqualTo(Standing.RULED_OUT);
        assertThat(heating.text()).endsWith("The rule for heating elements forbids this phase control of this heater.");
        Rule classA = rule(check, "class-a");
        assertThat(classA.standing()).isEqualTo(Standing.OVER);
        // 2.28 A of the table's 1.14 A: half the power would do.
        assertThat(classA.used()).isCloseTo(2, within(1e-12));
        assertThat(classA.bindsAtWatts()).isCloseTo(250, within(1e-9));
        assertThat(classA.text()).contains("5th harmonic").contains("would reach the limit at 250 W of full power");
        assertThat(check.bindsAtWatts()).isCloseTo(250, within(1e-9));
        assertThat(check.binding().order()).isEqualTo(5);
    }

    @Test
    void ofSeveralSettingsEachOrderCountsWhereItIsLargest() {
        LineCheck check = check(
                taking(500, Stage.TRIAC),
                setting(0, 50, current(1, 3, 1.0)),
                setting(0.5, 200, current(2, 5, 0.9)),
                setting(1, 490, current(3, 3, 1.2)));
        assertThat(check.orders().get(1)).isEqualTo(new Order(3, 1.2, OptionalDouble.of(1), 2.30));
        assertThat(check.orders().get(3)).isEqualTo(new Order(5, 0.9, OptionalDouble.of(0.5), 1.14));
        assertThat(check.worst()).as("0.9/1.14 is more than 1.2/2.3").isEqualTo(1);
        assertThat(check.worstSetting().watts()).isEqualTo(200);
        assertThat(check.fullWatts()).isCloseTo(500, within(1e-9));
    }

    @Test
    void asymmetricalControlEndsAtAHundredWattsOfWhatTheStageGives() {
        Design half = taking(300, Stage.HALF_WAVE);
        Rule free = rule(
                check(half, setting(0, 30, current(1, 2, 0.1)), setting(1, 100, current(1, 2, 0.1))), "asymmetrical");
        assertThat(free.standing()).isEqualTo(Standing.NO_LIMITS);
        assertThat(free.text()).endsWith("this stage gives its load up to 100 W.");
        Rule out = rule(
                check(half, setting(0, Math.nextUp(100.0), current(1, 2, 0.1)), setting(1, 20, current(1, 2, 0.1))),
                "asymmetrical");
        assertThat(out.standing()).isEqualTo(Standing.RULED_OUT);
        assertThat(out.text()).endsWith("It is out before any table is looked at.");
        assertThat(out.source()).contains("clause 6.1").contains("from memory");
    }

    @ParameterizedTest
    @CsvSource({"219.9,true", "220,false", "230,false", "240,false", "240.1,true", "120,true"})
    void theTablesAreMadeForPublicSuppliesOf220To240Volts(double volts, boolean orientation) {
        Design design = taking(500, Stage.TRIAC).withLine(new Line(volts, 50, 0.9 * volts, 1.1 * volts, List.of()));
        List<Rule> rules = check(design, setting(0, 100, current(1, 3, 0.1))).rules();
        assertThat(rules.get(0).id().equals("line-voltage")).isEqualTo(orientation);
        if (orientation) {
            assertThat(rules.get(0).text()).contains("220 V to 240 V; this line has " + Say.volts(volts));
        }
    }

    @Test
    void aLampsDimmerIsFreeUpToAThousandWattsAndClassABeyond() {
        Design lamp = HEATER.withStage(Stage.TRIAC).withLoad(new Load.Filament(1000, 230, 1.55, 12));
        LineCurrent current = current(3, 3, 0.5);
        List<Setting> settings = List.of(setting(0.25, 400, current));
        List<Order> orders = check(lamp, settings.get(0)).orders();
        Rule free = new LineRules(lamp, 1000, settings, orders).all().get(0);
        assertThat(free.id()).isEqualTo("dimmer");
        assertThat(free.standing()).isEqualTo(Standing.NO_LIMITS);
        Rule held =
                new LineRules(lamp, Math.nextUp(1000.0), settings, orders).all().get(0);
        assertThat(held.standing()).isEqualTo(Standing.UNDER);
        assertThat(held.text()).startsWith("An independent phase-control dimmer is class A. The 3rd harmonic");
        assertThat(held.name()).isEqualTo("independent dimmer");
        assertThat(held.source()).contains("class A");
    }

    @Test
    void insideALuminaireTheSharesOfTheFundamentalBind() {
        // Class C, table 2: the fifth up to 10 %, the 39th up to 3 % of the fundamental; no other even order than 2.
        Design lamp = HEATER.withStage(Stage.TRIAC).withLoad(new Load.Filament(300, 230, 1.55, 12));
        Rule at = rule(check(lamp, setting(0.25, 100, current(2, 5, 0.2))), "luminaire");
        assertThat(at.used()).isCloseTo(1, within(1e-12));
        assertThat(at.order()).hasValue(5);
        assertThat(at.text()).contains("The 5th harmonic binds first: 10 % of 10 % with the knob at 25 %");
        assertThat(at.bindsAtWatts()).isNaN();
        Rule over = rule(check(lamp, setting(0.25, 100, current(2, 39, 0.09))), "luminaire");
        assertThat(over.standing()).isEqualTo(Standing.OVER);
        assertThat(over.order()).hasValue(39);
        assertThat(rule(check(lamp, setting(0, 100, current(2, 7, 0.1))), "luminaire")
                        .standing())
                .isEqualTo(Standing.UNDER);
        Rule worst = rule(
                check(lamp, setting(0, 10, current(2, 7, 0.1)), setting(1, 250, current(4, 7, 0.26))), "luminaire");
        assertThat(worst.text()).contains("6.5 % of 7 % with the knob at 100 %");
        Rule even = rule(check(lamp, setting(0, 100, current(2, 4, 1))), "luminaire");
        assertThat(even.text()).isEqualTo("No current flows.");
    }

    @Test
    void withoutCurrentNothingBinds() {
        LineCheck none = check(taking(500, Stage.TRIAC), setting(0, 0, current(0, 3, 0)));
        assertThat(rule(none, "class-a").text()).isEqualTo("No current flows.");
        assertThat(rule(none, "class-a").standing()).isEqualTo(Standing.UNDER);
        assertThat(none.bindsAtWatts()).isInfinite();
    }

    @ParameterizedTest
    @CsvSource({
        "2,2nd", "3,3rd", "4,4th", "5,5th", "9,9th", "10,10th", "11,11th", "12,12th", "13,13th", "14,14th", "20,20th",
        "21,21st", "22,22nd", "23,23rd", "24,24th", "31,31st", "33,33rd", "40,40th"
    })
    void ordinalsAreWrittenAsTheyAreSpoken(int order, String spoken) {
        assertThat(LineRules.ordinal(order)).isEqualTo(spoken);
    }

    @Test
    void whatNoLimitHoldsIsSaidWithTheClauseThatItStandsIn() {
        Rule small = rule(check(taking(60, Stage.TRIAC), setting(0, 10, current(1, 3, 0.1))), "small");
        assertThat(small.standing().word()).isEqualTo("no limits");
        assertThat(small.source()).startsWith("IEC 61000-3-2 to edition 4, limits (clause 7");
        assertThat(small.text()).isEqualTo("Up to 75 W no class but C has limits; this load takes 60 W.");
        Rule large = rule(check(taking(2000, Stage.TRIAC), setting(0, 10, current(1, 3, 0.1))), "professional");
        assertThat(large.text()).contains("above 1 kW has no limits here; this load takes 2 kW");
    }
}
