package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import clipramp.firing.Firing;
import clipramp.firing.HalfCycle;
import clipramp.power.LoadPower;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** The ramp between clip and collapse: Kirchhoff's laws at the crest by hand, and angles of the solved half cycle. */
class RampMarginsTest {
    private static final Design HEATER = SampleDesigns.heater();

    private static Margin margin(Design design, MarginKind kind) {
        Bench bench = OnTheBench.usual(design);
        return OnTheBench.of(new RampMargins(bench, bench.usual()).all(), kind);
    }

    /** Supply at the crest, 10 kohm into zener, base bar and ramp, the ramp held at the peak point: nodal law by hand. */
    private static double supplyAtTheCrest(double rampOhms) {
        double base = 1 / (1 / 39.0 + 1 / 1000.0);
        double bar = 470 + 7_000 + base;
        double share = (base + 0.655 * 7_000) / bar;
        double source = Math.sqrt(2) * 230 - 2 * 0.7;
        double knee = 20 - 22 * 12.5e-3;
        double siemens = 1 / 10e3 + 1 / 22.0 + 1 / bar + (1 - share) / rampOhms;
        return (source / 10e3 + knee / 22 + 0.47 / rampOhms) / siemens;
    }

    private static double peakPoint(double supply) {
        double base = 1 / (1 / 39.0 + 1 / 1000.0);
        return (base + 0.655 * 7_000) / (470 + 7_000 + base) * supply + 0.47;
    }

    @Test
    void thePeakPointCurrentIsWhatTheLargestRampResistorBringsAtTheCrest() {
        // Sheet of the 2N2646: 5 uA at most.
        double supply = supplyAtTheCrest(73_600);
        double fed = (supply - peakPoint(supply)) / 73_600;
        Margin margin = margin(HEATER, MarginKind.PEAK_POINT_CURRENT);
        assertThat(margin.demand()).isCloseTo(5e-6, within(1e-15));
        assertThat(margin.offered()).isCloseTo(fed, within(1e-12));
        assertThat(margin.formula())
                .startsWith("(" + Say.volts(supply) + " - " + Say.volts(peakPoint(supply)) + ")/73.6 kΩ = "
                        + Say.amps(fed) + " against I_P 5 µA");
    }

    @Test
    void theCapacitorFromWhichPeakPointCurrentCannotBindIsToldByTheTextbooksDelay() {
        // Largest R (V - V_P)/I_P and half cycle R C ln(V/(V - V_P)): some 7 nF here.
        double knee = 20 - 22 * 12.5e-3;
        double peak = peakPoint(knee);
        double farads = 0.01 / ((knee - peak) / 5e-6 * Math.log(knee / (knee - peak)));
        assertThat(farads).isBetween(6e-9, 8e-9);
        assertThat(margin(HEATER, MarginKind.PEAK_POINT_CURRENT).formula())
                .endsWith("with more than " + Say.farads(farads) + " the half cycle is over before R_E gets so large");
        Design high = Changed.with(HEATER, "trigger.device.emitterDropVolts", Characteristic.exactly(9));
        assertThat(margin(high, MarginKind.PEAK_POINT_CURRENT).formula())
                .endsWith("the peak point lies above the supply");
    }

    @Test
    void theValleyCurrentOfTheSheetGrowsWithTheSupplyAndTheSmallestResistorMustNotFeedIt() {
        // 4 mA at least at 20 V interbase, valley line from 0.47 V to 2 V there; the supply at the crest from above.
        double supply = supplyAtTheCrest(5_600);
        double fed = (supply - (0.47 + (2 - 0.47) * supply / 20)) / 5_600;
        Margin margin = margin(HEATER, MarginKind.LATCHED_ON);
        assertThat(margin.demand()).isCloseTo(4e-3 * supply / 20, within(1e-9));
        assertThat(margin.offered()).isCloseTo(fed, within(1e-9));
        assertThat(margin.formula()).contains("against I_V ").doesNotContain("does stay on");
        Design low = HEATER.withRamp(SampleDesigns.ramp(1e-6, 560, 6_800));
        assertThat(margin(low, MarginKind.LATCHED_ON).formula()).endsWith("; the nominal device does stay on");
    }

    @Test
    void theRampMustReachThePeakPointBeforeTheZenerLetsGo() {
        HalfCycle half = Firing.solve(HEATER, OnTheBench.USUAL, 73_600).shown();
        Margin margin = margin(HEATER, MarginKind.RAMP_BEFORE_COLLAPSE);
        assertThat(margin.offered())
                .isCloseTo(Math.toDegrees(half.pulses().get(0).startRad()), within(1e-9));
        assertThat(margin.demand()).isCloseTo(Math.toDegrees(half.collapseRad()), within(1e-9));
        // Clipped as long as the source exceeds the zener by what bar and ramp drop: e > V_Z0 (1 + R_D/R_bar + ...).
        assertThat(margin.demand()).isBetween(160.0, 178.0);
        assertThat(margin.formula()).contains("the ramp reaches the peak point at ");
        Design never = Changed.with(HEATER, "clip.dropper.value", 5e6);
        Margin dead = margin(never, MarginKind.RAMP_BEFORE_COLLAPSE);
        assertThat(dead.offered()).isCloseTo(180, within(1e-9));
        assertThat(dead.formula()).contains("never reaches the peak point (taken as 180°)");
        assertThat(dead.verdict()).isEqualTo(Verdict.FAILS);
    }

    @Test
    void theClipMustComeBeforeTheEarliestPulse() {
        HalfCycle half = Firing.solve(HEATER, OnTheBench.USUAL, 5_600).shown();
        Margin margin = margin(HEATER, MarginKind.CLIP_BEFORE_FIRING);
        assertThat(margin.demand())
                .isCloseTo(Math.toDegrees(half.pulses().get(0).startRad()), within(1e-9));
        assertThat(margin.offered()).isCloseTo(Math.toDegrees(half.clipFromRad().orElseThrow()), within(1e-9));
        assertThat(margin.formula()).contains("the zener conducts from ");
        Design never = Changed.with(HEATER, "clip.dropper.value", 5e6);
        assertThat(margin(never, MarginKind.CLIP_BEFORE_FIRING).formula())
                .isEqualTo("not judged: there is no pulse at the smallest R_E");
        Design unclipped = Changed.with(HEATER, "clip.zener.volts", Characteristic.exactly(60));
        unclipped = Changed.with(unclipped, "clip.dropper.value", 60_000.0);
        Margin bare = margin(unclipped, MarginKind.CLIP_BEFORE_FIRING);
        assertThat(bare.offered()).isCloseTo(180, within(1e-9));
        assertThat(bare.formula()).endsWith("the zener never conducts (taken as 180°)");
    }

    @Test
    void anEndPulseMayLeakOnePercentWhereNothingIsWanted() {
        // A rule of ours, see DEVELOPERS.md: 1 % of 230²/44.08 = 1200 W.
        Design late = HEATER.withRamp(SampleDesigns.ramp(100e-9, 5_600, 100_000))
                .withWanted(new Wanted(Optional.empty(), Optional.empty()));
        double leaked = LoadPower.of(late, OnTheBench.USUAL, Firing.solve(late, OnTheBench.USUAL, 105_600))
                .watts();
        assertThat(leaked).isPositive();
        Margin margin = margin(late, MarginKind.END_PULSE);
        assertThat(margin.demand()).isCloseTo(12, within(1e-9));
        assertThat(margin.offered()).isGreaterThanOrEqualTo(leaked);
        assertThat(margin.formula()).contains("end pulse at ").endsWith("; allowed 12 W");
        Design wanting = late.withWanted(new Wanted(Optional.of(new Goal(Measure.WATTS, 30, 30, 0)), Optional.empty()));
        assertThat(margin(wanting, MarginKind.END_PULSE).demand()).isEqualTo(30);
        Margin none = margin(HEATER, MarginKind.END_PULSE);
        assertThat(none.offered()).isZero();
        assertThat(none.formula()).endsWith(": no end pulse fires the load");
    }

    @Test
    void anEndPulseThatDoesNotLatchIsSaidNotTo() {
        Design lazy = Changed.with(
                HEATER.withRamp(SampleDesigns.ramp(100e-9, 105_600, 1)),
                "thyristor.device.latching",
                Optional.of(TemperatureCurve.at25(20)));
        Margin margin = margin(lazy, MarginKind.END_PULSE);
        assertThat(margin.offered()).isZero();
        assertThat(margin.formula()).contains("does not latch the thyristor");
    }

    @Test
    void everySettingOfAWindingThatLagsIsAskedWhetherItSpillsOver() {
        Design lagging = SampleDesigns.windingHeater(0.3, false);
        Margin margin = margin(lagging, MarginKind.FULL_POWER_PULSE);
        assertThat(margin.verdict()).isEqualTo(Verdict.FAILS);
        assertThat(margin.offered()).isBetween(1.0, 11.0);
        assertThat(margin.formula())
                .startsWith(Math.round(margin.offered()) + " of 11 settings")
                .endsWith("the winding lags 17.19°");
        Bench bench = OnTheBench.usual(SampleDesigns.windingHeater(0, false));
        assertThat(new RampMargins(bench, bench.usual()).all())
                .extracting(Margin::kind)
                .doesNotContain(MarginKind.FULL_POWER_PULSE);
    }

    @Test
    void silenceIsToldFromPulsesThatTurnNothingOn() {
        assertThat(margin(HEATER, MarginKind.SILENT).formula()).isEqualTo("R_E = 5.6 kΩ: fires");
        assertThat(margin(HEATER, MarginKind.SILENT).verdict()).isEqualTo(Verdict.HOLDS);
        Design dead = Changed.with(HEATER, "clip.dropper.value", 5e6);
        assertThat(margin(dead, MarginKind.SILENT).formula()).endsWith(": no pulse");
        assertThat(margin(dead, MarginKind.SILENT).verdict()).isEqualTo(Verdict.FAILS);
        Design lazy = Changed.with(HEATER, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20)));
        assertThat(margin(lazy, MarginKind.SILENT).formula())
                .endsWith(": pulses, but none turns the thyristor on and latches it");
    }
}
