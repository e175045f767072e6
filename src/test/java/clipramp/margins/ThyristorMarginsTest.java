package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.circuit.TemperatureCurve;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** The thyristor against its sheet: heat by Kelvin a watt, surges by their squares, turn-off by the sine. */
class ThyristorMarginsTest {
    private static final Design HEATER = SampleDesigns.heater();
    private static final double OHMS = 230.0 * 230 / 1200;
    private static final double CREST = Math.sqrt(2) * 230;
    private static final String LIMITS = "thyristor.device.limits.";

    private static List<Margin> margins(Design design) {
        return new ThyristorMargins(OnTheBench.usual(design)).all();
    }

    private static Margin margin(Design design, MarginKind kind) {
        return OnTheBench.of(margins(design), kind);
    }

    private static Margin surge(Design design, MarginKind kind) {
        return OnTheBench.of(new SurgeMargins(OnTheBench.usual(design)).all(), kind);
    }

    /** On-state loss of the SCR at full conduction: 1 V x mean + 0.02 ohm x square, with 2.8 V and 20 mohm in the path. */
    private static double fullConductionWatts() {
        double loop = OHMS + 0.02;
        double edge = Math.asin(2.8 / CREST);
        double length = Math.PI - 2 * edge;
        double mean = (2 * CREST * Math.cos(edge) - 2.8 * length) / loop / Math.PI;
        double square = (CREST * CREST * (length / 2 + Math.sin(2 * edge) / 2)
                        - 4 * CREST * 2.8 * Math.cos(edge)
                        + 2.8 * 2.8 * length)
                / (loop * loop)
                / Math.PI;
        return mean + 0.02 * square;
    }

    @Test
    void theJunctionIsWarmedByTheLossOfFullConduction() {
        // T_j = T_a + P (R_thJC + R_thCA): 1.5 + 4 K/W.
        double watts = fullConductionWatts();
        Margin margin = margin(HEATER, MarginKind.JUNCTION_TEMPERATURE);
        assertThat(margin.demand()).isCloseTo(125 - 25, within(1e-9));
        assertThat(margin.offered()).isCloseTo(5.5 * watts, within(1e-7));
        assertThat(margin.formula())
                .startsWith(Say.watts(watts) + " (full conduction) x (1.5 K/W + 4 K/W) = " + Say.kelvin(5.5 * watts)
                        + " over 25 °C: " + Say.celsius(25 + 5.5 * watts))
                .endsWith("needs case-to-ambient " + Say.thermal(100 / watts - 1.5) + " or less");
    }

    @Test
    void withoutASinkTheOneThatIsNeededIsNamed() {
        Design bare = Changed.with(HEATER, "thyristor.caseToAmbientKelvinPerWatt", OptionalDouble.empty());
        assertThat(margin(bare, MarginKind.JUNCTION_TEMPERATURE).formula())
                .isEqualTo("not judged: the design states no thyristor.case-to-ambient; needed is "
                        + Say.thermal(100 / fullConductionWatts() - 1.5) + " or less");
        Design cool = Changed.with(bare, LIMITS + "junctionCelsius", OptionalDouble.of(26));
        assertThat(margin(cool, MarginKind.JUNCTION_TEMPERATURE).formula())
                .endsWith("needed is more than any sink can give: a larger thyristor");
        Design unknown = Changed.with(HEATER, LIMITS + "junctionCelsius", OptionalDouble.empty());
        assertThat(margin(unknown, MarginKind.JUNCTION_TEMPERATURE).formula()).endsWith("limits.junction");
        Design inside = Changed.with(HEATER, "thyristor.device.junctionToCaseKelvinPerWatt", OptionalDouble.empty());
        assertThat(margin(inside, MarginKind.JUNCTION_TEMPERATURE).formula()).endsWith("junction-to-case");
    }

    @Test
    void theHeatCheckKnowsTheWorstLossAndTheSinkThatKeepsIt() {
        double watts = fullConductionWatts();
        HeatCheck heat = HeatCheck.of(OnTheBench.usual(HEATER));
        assertThat(heat.watts()).isCloseTo(watts, within(1e-9));
        assertThat(heat.fullConductionWatts()).isCloseTo(watts, within(1e-9));
        assertThat(heat.where()).isEqualTo("full conduction");
        assertThat(heat.condition()).isEqualTo("230 V, 25 °C");
        assertThat(heat.junctionCelsius().orElseThrow()).isCloseTo(25 + 5.5 * watts, within(1e-7));
        assertThat(heat.sinkKelvinPerWatt().orElseThrow()).isCloseTo(100 / watts - 1.5, within(1e-9));
        Design ideal = Changed.with(HEATER, "thyristor.device.onState.thresholdVolts", 0.0);
        ideal = Changed.with(ideal, "thyristor.device.onState.slopeOhms", 0.0);
        HeatCheck cold = HeatCheck.of(OnTheBench.usual(ideal));
        assertThat(cold.watts()).isZero();
        assertThat(cold.sinkKelvinPerWatt()).as("no loss needs no sink").isEmpty();
        Bench all = new Bench(HEATER, OptionalDouble.empty(), OptionalDouble.empty());
        assertThat(HeatCheck.of(all).condition()).startsWith("high line");
        assertThat(HeatCheck.of(all).junctionCelsius().orElseThrow()).isGreaterThan(50 + 5.5 * watts);
        assertThat(HeatCheck.of(all).sinkKelvinPerWatt().orElseThrow()).isLessThan(75 / watts - 1.5);
    }

    @Test
    void blockingIsTheCrestAndCurrentsAreThoseOfTheHighestSetting() {
        Margin volts = margin(HEATER, MarginKind.BLOCKING_VOLTAGE);
        assertThat(volts.demand()).isEqualTo(600);
        assertThat(volts.offered()).isCloseTo(CREST, within(1e-9));
        assertThat(margin(HEATER, MarginKind.THYRISTOR_RMS).demand()).isEqualTo(16);
        assertThat(margin(HEATER, MarginKind.THYRISTOR_MEAN).demand()).isEqualTo(10);
        // Form factor of a full-wave rectified sine: pi/(2 sqrt 2); cut at some 20 degrees a little more.
        double form = margin(HEATER, MarginKind.THYRISTOR_RMS).offered()
                / margin(HEATER, MarginKind.THYRISTOR_MEAN).offered();
        assertThat(form).isBetween(Math.PI / (2 * Math.sqrt(2)), 1.2);
        assertThat(margins(SampleDesigns.triacHeater()))
                .extracting(Margin::kind)
                .as("a triac's sheet rates the rms current alone")
                .doesNotContain(MarginKind.THYRISTOR_MEAN, MarginKind.TURN_OFF_TIME);
    }

    @Test
    void anInductiveTriacBlocksWhatComesBackAsItsCurrentDies() {
        Design coil = SampleDesigns.triacHeater().withLoad(new Load.Inductive(40, 0.2, Optional.empty()));
        double blocked = margin(coil, MarginKind.BLOCKING_VOLTAGE).offered();
        // Without a snubber the step swings to nearly twice its height.
        assertThat(blocked).isBetween(1.2 * CREST, 2 * CREST);
    }

    @Test
    void turnOffAroundTheLinesZeroIsTwiceTheAngleUnderTheHoldingCurrent() {
        double edge = Math.asin((30e-3 * (OHMS + 0.02) + 2.8) / CREST);
        Margin margin = margin(HEATER, MarginKind.TURN_OFF_TIME);
        assertThat(margin.demand()).isEqualTo(50e-6);
        assertThat(margin.offered()).isCloseTo(2 * edge / (100 * Math.PI), within(1e-10));
        assertThat(margin.formula())
                .isEqualTo("R_E = 5.6 kΩ: under I_H 30 mA for " + Say.seconds(margin.offered())
                        + " around the line's zero; t_q 50 µs");
        Design unknown = Changed.with(HEATER, "thyristor.device.turnOffSeconds", OptionalDouble.empty());
        assertThat(margin(unknown, MarginKind.TURN_OFF_TIME).formula())
                .isEqualTo("not judged: the profile states no thyristor.device.turn-off");
        Design holding = Changed.with(HEATER, "thyristor.device.holding", Optional.empty());
        assertThat(margin(holding, MarginKind.TURN_OFF_TIME).formula())
                .isEqualTo("not judged: the profile states no thyristor.device.holding");
    }

    @Test
    void turnOffIsAskedWhereTheLineGivesNoReverseVoltageOrAnInductanceLeavesLittleTime() {
        Design pair = SampleDesigns.inverseParallelHeater();
        assertThat(margins(pair)).extracting(Margin::kind).doesNotContain(MarginKind.TURN_OFF_TIME);
        assertThat(margins(SampleDesigns.thyristorTapHeater()))
                .extracting(Margin::kind)
                .contains(MarginKind.TURN_OFF_TIME);
        Design coil = Changed.with(
                pair.withLoad(new Load.Inductive(40, 0.06, Optional.empty())),
                "thyristor.device.latching",
                Optional.of(TemperatureCurve.at25(1e-3)));
        coil = Changed.with(coil, "gate.transformer.secondaryOhms", 100.0);
        assertThat(margin(coil, MarginKind.TURN_OFF_TIME).formula())
                .contains("reversed by the line for ")
                .endsWith(" after its current has died; t_q 50 µs");
    }

    @Test
    void onTheAcSideOfABridgeTheGapLiesAroundTheCurrentsZero() {
        Design coil = SampleDesigns.inverseParallelHeater()
                .withStage(Stage.BRIDGE_AC)
                .withGate(SampleDesigns.transformerGate(1))
                .withLoad(new Load.Inductive(40, 0.06, Optional.empty()));
        coil = Changed.with(coil, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(1e-3)));
        assertThat(margin(coil, MarginKind.TURN_OFF_TIME).formula()).contains(" around the current's zero; t_q");
    }

    @Test
    void aCurrentThatStaysThroughTheZeroNeverTurnsOff() {
        Design held = HEATER.withStageDiodes(new StageDiodes(0, 0))
                .withLoad(new Load.Inductive(20, 0.2, Optional.of(new StageDiodes(2, 0))));
        held = Changed.with(held, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(1e-3)));
        held = Changed.with(held, "trigger.baseOne.value", 100.0);
        Margin margin = margin(held, MarginKind.TURN_OFF_TIME);
        assertThat(margin.offered()).isZero();
        assertThat(margin.formula()).contains("stays in the SCR through the line's zero: it never turns off; t_q");
    }

    @Test
    void theFirstHalfCycleIntoAColdLoadIsItsCrestAndHalfASquaredSine() {
        // Cold at a fifth: (V - 2.8 V)/(R/5 + 20 mohm) at the crest.
        Design cold = HEATER.withLoad(new Load.Resistor(OHMS, 5));
        Margin peak = surge(cold, MarginKind.SURGE_CURRENT);
        double amps = (CREST - 2.8) / (OHMS / 5 + 0.02);
        assertThat(peak.demand()).isEqualTo(160);
        assertThat(peak.offered()).isCloseTo(amps, within(1e-9));
        assertThat(peak.formula())
                .isEqualTo("switched on at the worst angle into " + Say.ohms(OHMS / 5) + ": " + Say.amps(amps)
                        + "; I_TSM 160 A");
        Margin energy = surge(cold, MarginKind.SURGE_ENERGY);
        assertThat(energy.demand()).isEqualTo(145);
        assertThat(energy.offered()).isCloseTo(amps * amps / 200, within(0.02 * amps * amps / 200));
        assertThat(energy.formula()).startsWith("one half cycle into ").endsWith("limit 145 A²s");
    }

    @Test
    void aSheetWithoutItsSquareIsTakenAsASixtyHertzHalfCycleOfItsSurge() {
        // Integral of a squared half sine: I²/(4 f) = 160²/240.
        Design unstated = Changed.with(HEATER, LIMITS + "ampsSquaredSeconds", OptionalDouble.empty());
        Margin energy = surge(unstated, MarginKind.SURGE_ENERGY);
        assertThat(energy.demand()).isCloseTo(160.0 * 160 / 240, within(1e-9));
        assertThat(energy.formula()).endsWith("limit 106.7 A²s, that of a 60 Hz half cycle of I_TSM");
        Design neither = Changed.with(unstated, LIMITS + "surgeAmps", OptionalDouble.empty());
        assertThat(surge(neither, MarginKind.SURGE_ENERGY).formula())
                .isEqualTo("not judged: the profile states neither thyristor.device.limits.i2t nor surge");
        assertThat(surge(neither, MarginKind.SURGE_CURRENT).formula())
                .isEqualTo("not judged: the profile states no thyristor.device.limits.surge");
        Design alone = Changed.with(HEATER, LIMITS + "surgeAmps", OptionalDouble.empty());
        assertThat(surge(alone, MarginKind.SURGE_ENERGY).demand()).isEqualTo(145);
    }

    @Test
    void aRatingThatTheSheetLacksIsNamedByItsKey() {
        for (String[] missing : new String[][] {
            {"volts", "BLOCKING_VOLTAGE", "voltage"},
            {"rmsAmps", "THYRISTOR_RMS", "rms"},
            {"meanAmps", "THYRISTOR_MEAN", "mean"},
        }) {
            Design design = Changed.with(HEATER, LIMITS + missing[0], OptionalDouble.empty());
            assertThat(margin(design, MarginKind.valueOf(missing[1])).formula())
                    .isEqualTo("not judged: the profile states no thyristor.device.limits." + missing[2]);
        }
    }
}
