package clipramp.faults;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Stage;
import clipramp.circuit.TestPoint;
import clipramp.circuit.TriggerDemand;
import clipramp.engine.Network;
import clipramp.engine.NetworkOfDesign;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import clipramp.firing.Study;
import clipramp.power.KnobMap;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What a repairer knows of these circuits, held against what the engine says. Qualitative truths: common practice. */
class FaultsTest {
    /** One of every stage, tap, coupling and trigger device, solved once for all tests. */
    private static final List<FaultSheet> SHEETS = Stream.of(
                    SampleDesigns.heater(),
                    SampleDesigns.halfWaveHeater(),
                    SampleDesigns.triacHeater(),
                    SampleDesigns.inverseParallelHeater(),
                    SampleDesigns.thyristorTapHeater(),
                    SampleDesigns.windingHeater(0.02, false),
                    SampleDesigns.programmableHeater())
            .map(FaultsTest::sheet)
            .toList();

    private static final FaultSheet HEATER = SHEETS.get(0);
    private static final FaultSheet HALF_WAVE = SHEETS.get(1);
    private static final FaultSheet TRIAC = SHEETS.get(2);
    private static final FaultSheet PAIR = SHEETS.get(3);
    private static final FaultSheet ACROSS_THYRISTOR = SHEETS.get(4);

    private static FaultSheet sheet(Design design) {
        return Faults.of(design, design.nominalCondition());
    }

    private static FaultEffect effect(FaultSheet sheet, String id) {
        return sheet.faults().stream()
                .filter(e -> e.fault().id().equals(id))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no fault " + id));
    }

    private static Reading reading(FaultSheet sheet, String id, TestPoint point) {
        return effect(sheet, id).readings().get(point);
    }

    static Stream<FaultSheet> everyStage() {
        return SHEETS.stream();
    }

    @ParameterizedTest
    @MethodSource("everyStage")
    void everyFaultOfEveryStageIsComputedAndNamesAPartOfTheDesign(FaultSheet sheet) {
        assertThat(sheet.notComputed()).isEmpty();
        assertThat(sheet.faults())
                .extracting(e -> e.fault().id())
                .doesNotHaveDuplicates()
                .hasSizeGreaterThan(20);
        for (FaultEffect effect : sheet.faults()) {
            assertThat(Designators.of(sheet.design()))
                    .containsKey(effect.fault().part());
            assertThat(effect.fault().words()).doesNotContain("@");
            assertThat(effect.readings()).hasSize(5);
            assertThat(effect.middle().fraction()).isBetween(0.0, 1.0);
        }
    }

    @ParameterizedTest
    @MethodSource("everyStage")
    void theHealthyCircuitIsTheKnobMaps(FaultSheet sheet) {
        double watts = KnobMap.at(sheet.design(), sheet.condition(), 0.5).load().watts();
        assertThat(sheet.healthy().middle().watts()).isEqualTo(watts);
        assertThat(sheet.healthy().knobActs()).isTrue();
    }

    /** Common practice: a shorted thyristor gives full power and the knob does nothing. */
    @ParameterizedTest
    @MethodSource("everyStage")
    void aShortedThyristorGivesFullPowerWhateverTheKnob(FaultSheet sheet) {
        FaultEffect effect = effect(sheet, "thyristor-shorted");
        assertThat(effect.gets()).isEqualTo(LoadGets.FULL);
        assertThat(effect.knobActs()).isFalse();
        double atLeast = sheet.design().stage().bridgeDiodes() > 0 ? 0.97 : 1;
        assertThat(effect.middle().fraction()).isBetween(atLeast - 1e-12, 1.0);
        assertThat(effect.readings().get(TestPoint.TP5).acVolts()).isZero();
    }

    /** Common practice: no ramp, no device, no gate, no supply: no power. */
    @ParameterizedTest
    @MethodSource("everyStage")
    void whatStopsThePulseLeavesTheLoadWithoutPower(FaultSheet sheet) {
        for (String id : List.of(
                "dropper-open",
                "zener-shorted",
                "ramp-fixed-open",
                "wiper-open",
                "capacitor-open",
                "capacitor-shorted",
                "trigger-dead",
                "base-one-shorted",
                "load-open")) {
            FaultEffect effect = effect(sheet, id);
            assertThat(effect.gets()).as(id).isEqualTo(LoadGets.NOTHING);
            assertThat(effect.middle().watts()).as(id).isLessThan(1e-6);
            assertThat(effect.knobActs()).as(id).isFalse();
        }
    }

    /** Common practice: with a dead unijunction the ramp climbs to the supply instead of sawing. */
    @Test
    void aDeadUnijunctionLetsTheRampClimbToTheSupply() {
        Reading ramp = reading(HEATER, "trigger-dead", TestPoint.TP2);
        Reading supply = reading(HEATER, "trigger-dead", TestPoint.TP1);
        assertThat(ramp.dcVolts()).isCloseTo(supply.dcVolts(), within(0.5));
        assertThat(ramp.dcVolts())
                .isGreaterThan(
                        2 * HEATER.healthy().readings().get(TestPoint.TP2).dcVolts());
    }

    /** Common practice: base two open leaves a mere diode at the emitter. */
    @Test
    void anOpenBaseTwoHoldsTheRampAtOneDiodeDrop() {
        assertThat(reading(HEATER, "base-two-open", TestPoint.TP2).peakVolts()).isCloseTo(0.47, within(0.01));
        assertThat(effect(HEATER, "base-two-open").gets()).isEqualTo(LoadGets.NOTHING);
    }

    /** Common practice: without the zener the supply rises and the trigger device suffers; 2N2646: 35 V, 300 mW (JEDEC). */
    @Test
    void anOpenZenerLetsTheSupplyRiseOverTheTriggerDevicesRatings() {
        FaultEffect effect = effect(HEATER, "zener-open");
        double before = HEATER.healthy().readings().get(TestPoint.TP1).peakVolts();
        assertThat(effect.readings().get(TestPoint.TP1).peakVolts()).isGreaterThan(3 * before);
        assertThat(effect.over())
                .extracting(b -> b.part() + " " + b.what() + " " + b.rating())
                .contains("trigger.device interbase voltage 35.0", "trigger.device power 0.3");
    }

    /** At the crest i_D = V_S/(R2 + R_BB + R1p) + ramp: a plain divider of R_D and the base bar, by Ohm's law. */
    @Test
    void anOpenZenersSupplyIsTheDividerOfDropperAndBaseBar() {
        double crest = Math.sqrt(2) * 230 - 1.4;
        double bar = 470 + 7000 + 1 / (1 / 39.0 + 1 / 1000.0);
        Reading supply = reading(
                sheet(Changed.with(SampleDesigns.heater(), "ramp.fixed.value", 1e9)), "zener-open", TestPoint.TP1);
        assertThat(supply.peakVolts()).isCloseTo(crest * bar / (bar + 10_000), within(0.005));
    }

    @Test
    void aShortedDropperCooksTheZenerFirst() {
        Burden worst = effect(HEATER, "dropper-shorted").over().get(0);
        assertThat(worst.part()).isEqualTo("clip.zener");
        // The rectified line less the zener's volts stands across its 22 ohm: hundreds of watts into one.
        assertThat(worst.borne()).isGreaterThan(1000);
        assertThat(worst.rating()).isEqualTo(1);
    }

    /** One diode of four gone: every second half cycle is missing and the rest is as before. */
    @Test
    void anOpenBridgeDiodeHalvesThePower() {
        FaultEffect effect = effect(HEATER, "stage-diode-open");
        assertThat(effect.gets()).isEqualTo(LoadGets.HALF);
        double before = HEATER.healthy().middle().watts();
        // The ramp starts from another residual after a dead half cycle, so not exactly half.
        assertThat(effect.middle().watts()).isBetween(0.4 * before, 0.6 * before);
        assertThat(Math.abs(effect.middle().dcAmps())).isGreaterThan(0.5);
        assertThat(effect.readings().get(TestPoint.TP1).dcVolts())
                .isCloseTo(HEATER.healthy().readings().get(TestPoint.TP1).dcVolts() / 2, within(0.2));
    }

    @Test
    void aHalfDeadTriacGivesExactlyHalfWithDirectCurrent() {
        FaultEffect effect = effect(TRIAC, "thyristor-half-dead");
        assertThat(effect.gets()).isEqualTo(LoadGets.HALF);
        assertThat(effect.middle().watts())
                .isCloseTo(
                        TRIAC.healthy().middle().watts() / 2,
                        within(1e-9 * effect.middle().watts()));
        assertThat(effect.middle().dcAmps()).isPositive();
        assertThat(effect.readings().get(TestPoint.TP5).dcVolts()).isNegative();
        assertThat(TRIAC.healthy().readings().get(TestPoint.TP5).dcVolts()).isCloseTo(0, within(1e-6));
    }

    @Test
    void oneDeadThyristorOfAPairGivesHalfAndABrokenGateLeadTheSame() {
        double dead = effect(PAIR, "thyristor-half-dead").middle().watts();
        assertThat(dead).isEqualTo(effect(PAIR, "gate-open").middle().watts());
        assertThat(dead).isCloseTo(PAIR.healthy().middle().watts() / 2, within(1e-6));
    }

    @Test
    void aHalfWaveStageWithAShortedThyristorGivesMoreThanItEverDoes() {
        double most = HALF_WAVE.healthy().knob().stream()
                .mapToDouble(LoadAt::watts)
                .max()
                .orElseThrow();
        assertThat(effect(HALF_WAVE, "thyristor-shorted").middle().watts()).isGreaterThan(1.9 * most);
    }

    /** RC time: half the capacitor fires earlier, so more power. */
    @ParameterizedTest
    @MethodSource("everyStage")
    void aCapacitorThatLostHalfItsValueFiresEarlier(FaultSheet sheet) {
        FaultEffect effect = effect(sheet, "capacitor-drifted");
        assertThat(effect.middle().firingRad().orElseThrow())
                .isLessThan(sheet.healthy().middle().firingRad().orElseThrow());
        assertThat(effect.middle().watts())
                .isGreaterThan(sheet.healthy().middle().watts());
    }

    /** A wiper tied to the free end of its track falls back to the whole track: the latest setting, everywhere. */
    @ParameterizedTest
    @MethodSource("everyStage")
    void anOpenWiperThatIsTiedGivesTheLatestSettingEverywhere(FaultSheet sheet) {
        FaultEffect effect = effect(sheet, "wiper-open-tied");
        double latest = sheet.healthy().knob().get(0).watts();
        assertThat(effect.knob()).allSatisfy(at -> assertThat(at.watts()).isCloseTo(latest, within(1e-9 * latest)));
        assertThat(effect.knobActs()).isFalse();
    }

    /** A leak divides what the ramp can reach: R_leak/(R_E + R_leak) V_S must stay over V_P. */
    @Test
    void aLeakyCapacitorSilencesMidKnobAndWhatLiesBeyondIt() {
        FaultEffect effect = effect(HEATER, "capacitor-leaky");
        double midOhms = SampleDesigns.heater().ramp().rampOhms(0.5);
        double leak = effect.fault().leakOhms();
        double supply = HEATER.healthy().readings().get(TestPoint.TP1).peakVolts();
        double reached = supply * leak / (midOhms + leak);
        assertThat(effect.readings().get(TestPoint.TP2).peakVolts()).isLessThanOrEqualTo(reached);
        assertThat(effect.knob().get(0).fraction()).isLessThan(0.005);
        assertThat(effect.knob().get(1).fraction()).isLessThan(0.005);
        assertThat(effect.knob().get(2).fraction()).isGreaterThan(0.9);
    }

    /** A gate that needs microamperes is fired by the base bar's own current once nothing shunts it away. */
    @Test
    void aSensitiveGateFiresByItselfWithoutItsBaseOneResistor() {
        Design sensitive = Changed.with(
                SampleDesigns.heater(),
                "thyristor.device.gate.trigger",
                new TriggerDemand(List.of(new TriggerDemand.Point(25, 0.2e-3, 0.8))));
        FaultEffect effect = effect(sheet(sensitive), "base-one-open");
        assertThat(effect.gets()).isEqualTo(LoadGets.FULL);
        assertThat(effect.knobActs()).isFalse();
        assertThat(effect.remarks()).anyMatch(remark -> remark.contains("fires by itself"));
        assertThat(effect(HEATER, "base-one-open").gets()).isNotEqualTo(LoadGets.FULL);
    }

    @Test
    void aSupplyAcrossTheThyristorIsGoneWithAShortedThyristorAndWithAnOpenLoad() {
        assertThat(reading(ACROSS_THYRISTOR, "thyristor-shorted", TestPoint.TP1).peakVolts())
                .isLessThan(0.05);
        assertThat(reading(ACROSS_THYRISTOR, "load-open", TestPoint.TP1).peakVolts())
                .isLessThan(0.05);
        assertThat(reading(HEATER, "thyristor-shorted", TestPoint.TP1).peakVolts())
                .isGreaterThan(19);
    }

    @Test
    void aShortedBridgeDiodeShortsTheLineAndOnlyThereIsOne() {
        assertThat(effect(HEATER, "stage-diode-shorted").over()).anyMatch(Burden::isUnlimited);
        assertThat(HEATER.faults().stream()
                        .filter(e -> e.over().stream().anyMatch(Burden::isUnlimited))
                        .map(e -> e.fault().id()))
                .containsExactly("stage-diode-shorted", "load-shorted");
        assertThat(SampleDesigns.heater().stage()).isEqualTo(Stage.BRIDGE_DC);
    }

    /** Mean of a full-wave rectified sine 2 V_m/pi, rms V_m/sqrt 2: textbook values, the drops of the bridge taken off. */
    @Test
    void acrossAThyristorThatNeverFiresStandsTheRectifiedLine() {
        Reading reading = reading(HEATER, "thyristor-dead", TestPoint.TP5);
        double crest = Math.sqrt(2) * 230;
        assertThat(reading.dcVolts()).isCloseTo(2 * crest / Math.PI - 1.8, within(0.05));
        assertThat(Math.hypot(reading.acVolts(), reading.dcVolts())).isBetween(228.0, 230.0);
        Reading triac = reading(TRIAC, "thyristor-dead", TestPoint.TP5);
        assertThat(triac.acVolts()).isCloseTo(230, within(0.001));
    }

    /** Common practice: a thyristor fired into a short takes the fuse with it, or is the faster of the two. */
    @ParameterizedTest
    @MethodSource("everyStage")
    void aShortedLoadTakesTheFuseOrTheThyristorWithTheFirstPulse(FaultSheet sheet) {
        FaultEffect effect = effect(sheet, "load-shorted");
        assertThat(effect.gets()).isEqualTo(LoadGets.NOTHING);
        assertThat(effect.over()).allMatch(Burden::isUnlimited);
        assertThat(effect.over()).extracting(Burden::part).contains("thyristor.device");
        assertThat(effect.over().stream().anyMatch(b -> b.part().equals("stage-diodes")))
                .isEqualTo(sheet.design().stage().bridgeDiodes() > 0);
        assertThat(effect.remarks()).anyMatch(remark -> remark.contains("only a fuse that lets less through"));
        assertThat(effect.readings().values()).allMatch(Reading.ZERO::equals);
    }

    @Test
    void aShortedLoadDoesNothingToACircuitThatNeverFires() {
        FaultEffect effect =
                effect(sheet(Changed.with(SampleDesigns.heater(), "ramp.fixed.value", 20e6)), "load-shorted");
        assertThat(effect.over()).isEmpty();
        assertThat(effect.readings().get(TestPoint.TP5).dcVolts()).isGreaterThan(200);
    }

    /** The neighbour diode and the short carry one polarity whole; the other is P/P_full = 1 - a/pi + sin 2a/(2 pi). */
    @Test
    void aShortedDiodeOfABridgeWithTheLoadOutsideLetsOneHalfThroughWhole() {
        FaultEffect effect = effect(ACROSS_THYRISTOR, "stage-diode-shorted");
        double rad = effect.middle().firingRad().orElseThrow();
        double controlled = 1 - rad / Math.PI + Math.sin(2 * rad) / (2 * Math.PI);
        // Drops of thyristor and bridge: 2.8 V of 207 V mean.
        assertThat(effect.middle().fraction()).isCloseTo((1 + controlled) / 2, within(0.02));
        assertThat(effect.middle().dcAmps()).isNegative();
        assertThat(effect.knob()).allSatisfy(at -> assertThat(at.fraction()).isGreaterThan(0.48));
        assertThat(effect.knobActs()).isTrue();
        assertThat(effect.gets()).isEqualTo(LoadGets.MORE);
        assertThat(effect.over()).noneMatch(Burden::isUnlimited);
    }

    @Test
    void aShortedRectifierDoublesTheDroppersHeatAndDelaysTheRamp() {
        Design design = HALF_WAVE.design();
        double rampOhms = design.ramp().rampOhms(0.5);
        Network network = NetworkOfDesign.of(design, HALF_WAVE.condition(), rampOhms);
        network.reverseVolts = ReverseHalf.ZENER_VOLTS;
        Study study = Firing.study(design, HALF_WAVE.condition(), network);
        Dissipation bears = ReverseHalf.borne(design, HALF_WAVE.condition(), network, study.dissipation());
        // Half a sine wave over R_D with the zener's 0.7 V taken off: closed form of (V_m sin - V_z)^2 and of its mean.
        double crest = Math.sqrt(2) * 230;
        double back = (crest * crest * Math.PI / 2 - 4 * crest * 0.7 + 0.49 * Math.PI) / (2 * Math.PI * 10_000);
        assertThat(bears.dropperWatts() - study.dissipation().dropperWatts()).isCloseTo(back, within(1e-3));
        double backAmps = (2 * crest - 0.7 * Math.PI) / (2 * Math.PI * 10_000);
        assertThat(bears.zenerWatts() - study.dissipation().zenerWatts()).isCloseTo(0.7 * backAmps, within(1e-5));
        assertThat(bears.dropperPeakVolts()).isCloseTo(crest - 0.7, within(0.01));
        FaultEffect effect = effect(HALF_WAVE, "rectifier-shorted");
        assertThat(effect.middle().firingRad().orElseThrow())
                .isGreaterThan(HALF_WAVE.healthy().middle().firingRad().orElseThrow() + 0.01);
        assertThat(effect.readings().get(TestPoint.TP1).dcVolts())
                .isCloseTo(HALF_WAVE.healthy().readings().get(TestPoint.TP1).dcVolts() - 0.35, within(0.1));
        // An RC settling towards -0.7 V over ten milliseconds, from where the emitter leaves it.
        double from = Math.min(0.45, network.emitterDropVolts - 0.7 * network.peakShare());
        double start = -0.7 + (from + 0.7) * Math.exp(-0.01 / (rampOhms * 100e-9));
        assertThat(study.solution().shown().startVolts()).isCloseTo(start, within(0.02));
    }

    @Test
    void aShortedDiodeBehindAWindingBurnsTheWindingAndLeavesHalfTheLoad() {
        FaultEffect effect = effect(SHEETS.get(5), "rectifier-shorted");
        assertThat(effect.gets()).isEqualTo(LoadGets.HALF);
        assertThat(effect.over()).anyMatch(b -> b.isUnlimited() && b.part().equals("clip.winding"));
        assertThat(effect.remarks())
                .anyMatch(remark -> remark.contains("winding is shorted in every second half cycle"));
    }
}
