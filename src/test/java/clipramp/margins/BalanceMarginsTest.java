package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.ThyristorDevice.OnState;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.firing.Firing;
import clipramp.firing.HalfCycle;
import clipramp.firing.Solution;
import clipramp.power.LoadPower;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Half cycles that are alike or not, an angle that the line moves, and what was wanted of the knob's ends. */
class BalanceMarginsTest {
    private static final Design HEATER = SampleDesigns.heater();
    private static final OptionalDouble FREE = OptionalDouble.empty();

    private static Margin balance(Design design, MarginKind kind) {
        Bench bench = OnTheBench.usual(design);
        return OnTheBench.of(new BalanceMargins(bench, bench.usual()).all(), kind);
    }

    private static Margin drift(Bench bench) {
        return new AngleDrift(bench, bench.usual()).margin();
    }

    private static double firesAt(Design design, Condition condition) {
        return Firing.solve(design, condition, design.ramp().rampOhms(0.5))
                .shown()
                .firingRad()
                .orElseThrow();
    }

    @Test
    void huntingIsHowFarAlternatingFiringAnglesLieApart() {
        Design hunting = EachMarginFailsTest.hunting();
        Bench bench = new Bench(hunting, FREE, FREE);
        Solution solution = Firing.solve(hunting, bench.usual(), bench.leastOhms());
        assertThat(solution.hunts()).isTrue();
        List<Double> angles = solution.halves().stream()
                .map(HalfCycle::firingRad)
                .map(rad -> rad.orElse(Math.PI))
                .toList();
        double apart = Math.abs(angles.get(0) - angles.get(1));
        Margin margin = OnTheBench.of(new BalanceMargins(bench, bench.usual()).all(), MarginKind.HUNTING);
        assertThat(margin.demand()).as("half a degree, a rule of ours").isEqualTo(0.5);
        assertThat(margin.offered()).isCloseTo(Math.toDegrees(apart), within(1e-9));
        assertThat(margin.formula()).endsWith("half cycles alternate, " + Say.angle(apart) + " apart");
        assertThat(margin.verdict()).isEqualTo(Verdict.FAILS);
    }

    @Test
    void aSteadyCircuitHuntsByNothing() {
        Margin margin = balance(HEATER, MarginKind.HUNTING);
        assertThat(margin.offered()).isZero();
        assertThat(margin.formula()).endsWith(": every line period is like the one before");
    }

    @Test
    void directCurrentInTheLoadIsHeldAgainstOnePercentOfTheFullCurrent() {
        // A second harmonic makes the half cycles unlike; full current V/R of fundamental and harmonic together.
        Design uneven = HEATER.withLine(new Line(230, 50, 207, 253, List.of(new Line.Harmonic(2, 0.04, Math.PI / 2))));
        double full = 230 * Math.sqrt(1 + 0.04 * 0.04) / (230.0 * 230 / 1200);
        double most = 0;
        for (int step = 0; step <= 10; step++) {
            Solution solution =
                    Firing.solve(uneven, OnTheBench.USUAL, uneven.ramp().rampOhms(step / 10.0));
            most = Math.max(
                    most,
                    Math.abs(LoadPower.of(uneven, OnTheBench.USUAL, solution).dcAmps()));
        }
        Margin margin = balance(uneven, MarginKind.DC_IN_LOAD);
        assertThat(margin.demand()).isCloseTo(0.01 * full, within(1e-9));
        assertThat(margin.offered()).isCloseTo(most, within(1e-9));
        assertThat(margin.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(balance(HEATER, MarginKind.DC_IN_LOAD).offered()).isCloseTo(0, within(1e-9));
    }

    @Test
    void directCurrentIsAskedOfTheUsualConditionOnlyAndNotOfAHalfWaveStage() {
        Bench free = new Bench(HEATER, FREE, FREE);
        assertThat(OnTheBench.of(new BalanceMargins(free, free.usual()).all(), MarginKind.DC_IN_LOAD)
                        .condition())
                .isEqualTo("nominal line, 25 °C");
        Bench half = OnTheBench.usual(SampleDesigns.halfWaveHeater());
        assertThat(new BalanceMargins(half, half.usual()).all())
                .extracting(Margin::kind)
                .containsExactly(MarginKind.HUNTING);
    }

    @Test
    void aPinnedLineStillMayLeaveItsFrequencyByOnePercent() {
        // EN 50160: 1 % either way. A ramp counts in seconds, so its angle goes nearly with the frequency.
        Bench bench = OnTheBench.usual(HEATER);
        double usual = firesAt(HEATER, OnTheBench.USUAL);
        double slow = Math.abs(firesAt(HEATER, new Condition(230, 49.5, 25)) - usual);
        double fast = Math.abs(firesAt(HEATER, new Condition(230, 50.5, 25)) - usual);
        Margin margin = drift(bench);
        assertThat(margin.demand()).as("degrees, a rule of ours").isEqualTo(3);
        assertThat(margin.offered()).isCloseTo(Math.toDegrees(Math.max(slow, fast)), within(1e-9));
        assertThat(margin.offered()).isBetween(0.008 * Math.toDegrees(usual), 0.011 * Math.toDegrees(usual));
        assertThat(margin.condition()).isEqualTo(slow > fast ? "line at 49.5 Hz" : "line at 50.5 Hz");
        assertThat(margin.formula()).startsWith("R_E = 39.6 kΩ: " + Say.angle(usual) + " becomes ");
    }

    @Test
    void aFreeLineMovesTheAngleByItsVoltageToo() {
        // 40 kohm reach the clip late, so that the ramp still follows the line as it begins.
        Design late = Changed.with(HEATER, "clip.dropper.value", 40_000.0);
        Bench bench = new Bench(late, FREE, FREE);
        double usual = firesAt(late, OnTheBench.USUAL);
        double low = Math.abs(firesAt(late, new Condition(207, 50, 25)) - usual);
        assertThat(Math.toDegrees(low))
                .isGreaterThan(drift(OnTheBench.usual(late)).offered());
        Margin margin = drift(bench);
        assertThat(margin.offered()).isCloseTo(Math.toDegrees(low), within(1e-9));
        assertThat(margin.condition()).isEqualTo("low line, 25 °C");
    }

    @Test
    void anAngleThatIsNotThereDoesNotDrift() {
        Design lazy = Changed.with(HEATER, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20)));
        Margin margin = drift(OnTheBench.usual(lazy));
        assertThat(margin.verdict()).isEqualTo(Verdict.NOT_JUDGED);
        assertThat(margin.formula()).isEqualTo("not judged: the thyristor stays off at mid-knob");
    }

    /** Without drops: 44.08 ohm take half of 1200 W at 90 degrees. */
    private static Design textbook() {
        return Changed.with(HEATER, "thyristor.device.onState", new OnState(0, 0))
                .withStageDiodes(new StageDiodes(0, 0));
    }

    @ParameterizedTest
    @CsvSource({
        "FRACTION,0.25,300", // 0.25 x 1200 W
        "WATTS,77,77",
        "VOLTS,115,300", // (115/230)² of 1200 W
        "VOLTS,400,1200", // out of reach: full power
        "ANGLE,1.5707963267948966,600", // closed form at 90 degrees
    })
    void theLowestWantedPowerFollowsFromWhateverWasWanted(Measure measure, double wanted, double watts) {
        Design design =
                textbook().withWanted(new Wanted(Optional.of(new Goal(measure, wanted, wanted, 0)), Optional.empty()));
        Bench bench = OnTheBench.usual(design);
        assertThat(WantedMargins.lowestWatts(bench, bench.conditions().get(0)).orElseThrow())
                .isCloseTo(watts, within(1e-7 * watts));
    }

    private static Margin wanted(MarginKind kind, Goal goal) {
        Optional<Goal> some = Optional.of(goal);
        boolean low = kind == MarginKind.WANTED_LOWEST;
        Design design = HEATER.withWanted(new Wanted(low ? some : Optional.empty(), low ? Optional.empty() : some));
        List<Margin> margins = WantedMargins.of(OnTheBench.usual(design));
        assertThat(margins).hasSize(1);
        return OnTheBench.of(margins, kind);
    }

    @ParameterizedTest
    @CsvSource({
        "WANTED_LOWEST,WATTS,100,AT_MOST,W,at most 100 W",
        "WANTED_LOWEST,FRACTION,0.1,AT_MOST,'',at most 10 %",
        "WANTED_LOWEST,VOLTS,90,AT_MOST,V,at most 90 V",
        "WANTED_LOWEST,ANGLE,2,AT_LEAST,deg,at least 114.6°",
        "WANTED_HIGHEST,WATTS,900,AT_LEAST,W,at least 900 W",
        "WANTED_HIGHEST,VOLTS,200,AT_LEAST,V,at least 200 V",
        "WANTED_HIGHEST,ANGLE,0.5,AT_MOST,deg,at most 28.65°",
    })
    void aWishIsHeldAgainstWhatTheKnobGivesOnItsOwnSide(
            MarginKind kind, Measure measure, double value, Margin.Sense sense, String unit, String words) {
        double position = kind == MarginKind.WANTED_LOWEST ? 0 : 1;
        Margin margin = wanted(kind, new Goal(measure, value, value, position));
        Solution solution = Firing.solve(HEATER, OnTheBench.USUAL, HEATER.ramp().rampOhms(position));
        var load = LoadPower.of(HEATER, OnTheBench.USUAL, solution);
        double there = switch (measure) {
            case WATTS -> load.watts();
            case FRACTION -> load.watts() / 1200;
            case VOLTS -> Math.sqrt(load.watts() * 230 * 230 / 1200);
            case ANGLE -> Math.toDegrees(solution.shown().firingRad().orElseThrow());
        };
        assertThat(margin.sense()).isEqualTo(sense);
        assertThat(margin.unit()).isEqualTo(unit);
        assertThat(margin.offered()).isCloseTo(there, within(1e-9 * there));
        assertThat(margin.demand()).isCloseTo(measure == Measure.ANGLE ? Math.toDegrees(value) : value, within(1e-9));
        assertThat(margin.formula()).endsWith("wanted " + words).contains("fires at ");
        assertThat(margin.formula()).startsWith("knob at " + Say.share(position) + ": R_E = ");
        assertThat(margin.remedy()).isEqualTo(kind.remedy());
    }

    @Test
    void aBandIsJudgedOnTheSideWhereItIsWorse() {
        double watts = wanted(MarginKind.WANTED_LOWEST, new Goal(Measure.WATTS, 100, 100, 0))
                .offered();
        Goal under = new Goal(Measure.WATTS, 2 * watts, 3 * watts, 0);
        assertThat(wanted(MarginKind.WANTED_LOWEST, under).sense()).isEqualTo(Margin.Sense.AT_LEAST);
        assertThat(wanted(MarginKind.WANTED_LOWEST, under).demand()).isCloseTo(2 * watts, within(1e-9));
        Goal over = new Goal(Measure.WATTS, 0.2 * watts, 0.5 * watts, 0);
        assertThat(wanted(MarginKind.WANTED_LOWEST, over).sense()).isEqualTo(Margin.Sense.AT_MOST);
        assertThat(wanted(MarginKind.WANTED_LOWEST, over).demand()).isCloseTo(0.5 * watts, within(1e-9));
        Goal within = new Goal(Measure.WATTS, 0.5 * watts, 2 * watts, 0);
        assertThat(wanted(MarginKind.WANTED_LOWEST, within).verdict()).isEqualTo(Verdict.HOLDS);
    }

    @Test
    void whereNothingFiresTheRemedySaysWhereToLook() {
        Design lazy = Changed.with(HEATER, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20)));
        List<Margin> margins = WantedMargins.of(OnTheBench.usual(lazy));
        Margin highest = OnTheBench.of(margins, MarginKind.WANTED_HIGHEST);
        assertThat(highest.remedy()).startsWith("The thyristor stays off here");
        assertThat(highest.formula()).contains("stays off");
        assertThat(highest.offered()).isZero();
        Margin lowest = OnTheBench.of(margins, MarginKind.WANTED_LOWEST);
        assertThat(lowest.remedy()).isEqualTo(MarginKind.WANTED_LOWEST.remedy());
        Goal late = new Goal(Measure.ANGLE, 2, 2, 0);
        Design angle = lazy.withWanted(new Wanted(Optional.of(late), Optional.empty()));
        assertThat(WantedMargins.of(OnTheBench.usual(angle)).get(0).offered())
                .as("as good as fired at the half cycle's end")
                .isCloseTo(180, within(1e-9));
    }

    @Test
    void whereNothingIsWantedNothingIsJudged() {
        assertThat(WantedMargins.of(OnTheBench.usual(SampleDesigns.halfWaveHeater())))
                .isEmpty();
    }
}
