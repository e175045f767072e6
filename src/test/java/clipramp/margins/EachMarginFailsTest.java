package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Changed;
import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Snubber;
import clipramp.circuit.Surroundings;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.NonTrigger;
import clipramp.circuit.Wanted;
import clipramp.circuit.Wanted.Goal;
import clipramp.circuit.Wanted.Measure;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** For every margin a design that holds but for one change, which breaks that margin and nothing that it should not. */
class EachMarginFailsTest {
    private static final String DEVICE = "trigger.device.limits.";
    private static final String GATE = "thyristor.device.gate.limits.";
    private static final String THYRISTOR = "thyristor.device.limits.";

    /** A design with one fault, and the margins that fall with it because they ask the same in other words. */
    private record Broken(Design design, Set<MarginKind> besides) {}

    private final Map<MarginKind, Broken> broken = new EnumMap<>(MarginKind.class);

    private void breaks(MarginKind kind, Design design, MarginKind... besides) {
        Set<MarginKind> allowed = EnumSet.noneOf(MarginKind.class);
        allowed.addAll(List.of(besides));
        broken.put(kind, new Broken(design, allowed));
    }

    private void breaks(MarginKind kind, String path, double limit, MarginKind... besides) {
        breaks(kind, Changed.with(SampleDesigns.heater(), path, OptionalDouble.of(limit)), besides);
    }

    private void designs() {
        settings();
        gates();
        ratings();
        coils();
    }

    private void settings() {
        Design heater = SampleDesigns.heater();
        breaks(MarginKind.WANTED_LOWEST, wanting(heater, Measure.FRACTION, 0.03, 0));
        breaks(
                MarginKind.WANTED_HIGHEST,
                heater.withWanted(new Wanted(Optional.empty(), Optional.of(new Goal(Measure.WATTS, 1190, 1190, 1)))));
        breaks(MarginKind.RAMP_BEFORE_COLLAPSE, heater.withRamp(SampleDesigns.ramp(100e-9, 5_600, 100_000)));
        breaks(
                MarginKind.CLIP_BEFORE_FIRING,
                Changed.with(heater, "clip.dropper.value", 40_000.0),
                MarginKind.ANGLE_DRIFT);
        breaks(
                MarginKind.PEAK_POINT_CURRENT,
                Changed.with(
                        heater,
                        "trigger.device.peakCurrentAmps",
                        new Characteristic(OptionalDouble.empty(), OptionalDouble.of(1e-6), OptionalDouble.of(1e-3))));
        breaks(
                MarginKind.LATCHED_ON,
                Changed.with(
                        heater,
                        "trigger.device.valley.amps",
                        new Characteristic(OptionalDouble.of(2e-3), OptionalDouble.of(6e-3), OptionalDouble.empty())));
        breaks(
                MarginKind.END_PULSE,
                wanting(heater.withRamp(SampleDesigns.ramp(100e-9, 5_600, 100_000)), Measure.WATTS, 0.1, 0),
                MarginKind.RAMP_BEFORE_COLLAPSE,
                MarginKind.WANTED_LOWEST);
        breaks(
                MarginKind.ANGLE_DRIFT,
                Changed.with(heater, "clip.dropper.value", 80_000.0),
                MarginKind.CLIP_BEFORE_FIRING,
                MarginKind.RAMP_BEFORE_COLLAPSE,
                MarginKind.GATE_PEAK_CURRENT,
                MarginKind.GATE_TIME);
        breaks(
                MarginKind.DC_IN_LOAD,
                heater.withLine(new Line(230, 50, 207, 253, List.of(new Line.Harmonic(2, 0.04, Math.PI / 2)))));
        breaks(
                MarginKind.SILENT,
                Changed.with(heater, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20))),
                MarginKind.LATCHING_EARLIEST,
                MarginKind.LATCHING_LATEST,
                MarginKind.WANTED_HIGHEST);
        breaks(MarginKind.HUNTING, hunting());
        Set<MarginKind> lagging = EnumSet.allOf(MarginKind.class);
        broken.put(MarginKind.FULL_POWER_PULSE, new Broken(SampleDesigns.windingHeater(0.3, false), lagging));
    }

    private static Design wanting(Design design, Measure measure, double most, double position) {
        return design.withWanted(new Wanted(Optional.of(new Goal(measure, most, most, position)), Optional.empty()));
    }

    /** A circuit whose last ramp of a half cycle meets the collapsing supply in every second one only. */
    static Design hunting() {
        Design design = SampleDesigns.heater()
                .withLine(new Line(240, 50, 240, 240, List.of()))
                .withSurroundings(new Surroundings(25, 25))
                .withWanted(new Wanted(Optional.empty(), Optional.empty()));
        design = Changed.with(design, "clip.dropper.value", 11_327.28495);
        design = Changed.with(design, "clip.diodeDropVolts", 0.9804657661);
        design = Changed.with(design, "clip.zener.volts", Characteristic.exactly(17.92027387));
        design = Changed.with(design, "clip.zener.testCurrentAmps", 0.009909004113);
        design = Changed.with(design, "clip.zener.slopeOhms", 28.65725915);
        design = Changed.with(design, "ramp.capacitor.value", 4.273397143e-07);
        design = Changed.with(design, "ramp.fixed.value", 4755.199604);
        design = Changed.with(design, "ramp.pot", Optional.empty());
        design = Changed.with(design, "trigger.device.standoff", Characteristic.exactly(0.7766889152));
        design = Changed.with(design, "trigger.device.interbaseOhms", Characteristic.exactly(7704.919973));
        design = Changed.with(design, "trigger.device.emitterDropVolts", Characteristic.exactly(0.6288216071));
        design = Changed.with(design, "trigger.device.peakCurrentAmps", Characteristic.exactly(4.379514512e-06));
        design = Changed.with(design, "trigger.device.valley.amps", Characteristic.exactly(0.009420037806));
        design = Changed.with(design, "trigger.device.valley.volts", Characteristic.exactly(1.793042047));
        design = Changed.with(design, "trigger.device.saturation.volts", Characteristic.exactly(3.182529342));
        design = Changed.with(design, "trigger.device.saturation.atVolts", 20.0);
        design = Changed.with(design, "trigger.device.modulated.amps", Characteristic.exactly(0.01591709118));
        design = Changed.with(design, "trigger.device.baseOnePulse", Optional.empty());
        design = Changed.with(design, "trigger.baseOne.value", 100.0);
        design = Changed.with(design, "trigger.baseTwo.value", 1000.0);
        design = Changed.with(design, "gate.series.value", 10.0);
        design = Changed.with(design, "gate.shunt.value", 470.0);
        design = Changed.with(design, "thyristor.device.gate.kneeVolts", 0.631865796);
        return Changed.with(design, "thyristor.device.gate.slopeOhms", 13.7622942);
    }

    private void gates() {
        Design heater = SampleDesigns.heater();
        Design two = SampleDesigns.inverseParallelHeater();
        breaks(MarginKind.GATE_POLARITY, Changed.with(heater, "gate.polarity", Polarity.NEGATIVE));
        breaks(MarginKind.GATE_PEAK_CURRENT, Changed.with(heater, "gate.overdrive", 12.0));
        breaks(MarginKind.GATE_TIME, "thyristor.device.gate.turnOnSeconds", 9.9e-6);
        breaks(MarginKind.GATE_CHARGE, Changed.with(heater, "gate.chargeSeconds", 60e-6));
        breaks(
                MarginKind.GATE_STANDING_VOLTAGE,
                Changed.with(heater, "thyristor.device.gate.nonTrigger", Optional.of(new NonTrigger(0.1, 110))));
        breaks(MarginKind.GATE_CURRENT_LIMIT, GATE + "amps", 0.1);
        breaks(MarginKind.GATE_VOLTAGE_LIMIT, GATE + "volts", 2);
        breaks(MarginKind.GATE_POWER_LIMIT, GATE + "peakWatts", 0.1, MarginKind.GATE_MEAN_POWER);
        breaks(MarginKind.GATE_MEAN_POWER, GATE + "meanWatts", 1e-3);
        breaks(
                MarginKind.GATE_REVERSE_VOLTAGE,
                Changed.with(
                        Changed.with(two, "gate.transformer.clampDiode", false),
                        "thyristor.device.gate.limits.reverseVolts",
                        OptionalDouble.of(0.05)));
        breaks(
                MarginKind.TRANSFORMER_VOLT_SECONDS,
                Changed.with(two, "gate.transformer.voltSeconds", OptionalDouble.of(10e-6)),
                MarginKind.TRANSFORMER_CORE);
        breaks(
                MarginKind.TRANSFORMER_CORE,
                Changed.with(two, "gate.transformer.voltSeconds", OptionalDouble.of(19e-6)));
        breaks(MarginKind.LATCHING_EARLIEST, latching(heater, 2.5), MarginKind.SILENT);
        breaks(
                MarginKind.LATCHING_LATEST,
                latching(
                        wanting(heater, Measure.FRACTION, 1, 0).withRamp(SampleDesigns.ramp(100e-9, 18_000, 68_000)),
                        3.1));
        breaks(MarginKind.TURN_OFF_TIME, "thyristor.device.turnOffSeconds", 100e-6);
    }

    private static Design latching(Design design, double amps) {
        TemperatureCurve flat = new TemperatureCurve(
                List.of(new TemperatureCurve.Point(-40, amps), new TemperatureCurve.Point(25, amps)));
        return Changed.with(design, "thyristor.device.latching", Optional.of(flat));
    }

    private void ratings() {
        Design heater = SampleDesigns.heater();
        breaks(MarginKind.INTERBASE_VOLTAGE, DEVICE + "interbaseVolts", 15);
        breaks(MarginKind.EMITTER_PEAK_CURRENT, DEVICE + "emitterPeakAmps", 0.1);
        breaks(MarginKind.EMITTER_RMS_CURRENT, DEVICE + "emitterRmsAmps", 5e-3);
        breaks(MarginKind.EMITTER_REVERSE_VOLTAGE, DEVICE + "emitterReverseVolts", 10);
        breaks(MarginKind.EMITTER_CAPACITOR, DEVICE + "capacitorVolts", 10);
        breaks(MarginKind.TRIGGER_POWER, DEVICE + "watts", 0.1);
        breaks(MarginKind.CAPACITOR_VOLTAGE, "ramp.capacitor.ratedVolts", 10);
        breaks(MarginKind.DROPPER_POWER, "clip.dropper.ratedWatts", 5);
        breaks(MarginKind.DROPPER_VOLTAGE, "clip.dropper.ratedVolts", 250);
        breaks(MarginKind.ZENER_POWER, "clip.zener.ratedWatts", 0.2);
        breaks(MarginKind.BASE_ONE_POWER, "trigger.baseOne.ratedWatts", 2e-3);
        breaks(MarginKind.BASE_TWO_POWER, "trigger.baseTwo.ratedWatts", 10e-3);
        breaks(MarginKind.RAMP_RESISTOR_POWER, "ramp.fixed.ratedWatts", 30e-3);
        breaks(MarginKind.POT_POWER, "ramp.pot.track.ratedWatts", 0.1);
        breaks(MarginKind.BLOCKING_VOLTAGE, THYRISTOR + "volts", 300);
        breaks(MarginKind.THYRISTOR_RMS, THYRISTOR + "rmsAmps", 5);
        breaks(MarginKind.THYRISTOR_MEAN, THYRISTOR + "meanAmps", 4);
        breaks(
                MarginKind.JUNCTION_TEMPERATURE,
                Changed.with(heater, "thyristor.caseToAmbientKelvinPerWatt", OptionalDouble.of(20)));
    }

    /** A triac on a coil of 25 degrees, behind a snubber; the knob begins beyond its angle. */
    static Design coil(Design heater) {
        Design design = heater.withLoad(new Load.Inductive(40, 0.06, Optional.empty()))
                .withSnubber(Optional.of(new Snubber(100, 220e-9)))
                .withRamp(SampleDesigns.ramp(220e-9, 5_600, 27_000))
                .withWanted(new Wanted(Optional.empty(), Optional.empty()));
        design = latching(design, 10e-3);
        design = Changed.with(design, THYRISTOR + "volts", OptionalDouble.of(1200));
        design = Changed.with(design, THYRISTOR + "voltsPerSecond", OptionalDouble.of(50e6));
        design = Changed.with(design, "trigger.baseOne.value", 100.0);
        return Changed.with(
                design, "thyristor.device.commutating", Optional.of(new ThyristorDevice.Commutating(20e6, 80)));
    }

    private void coils() {
        Design triac = coil(SampleDesigns.triacHeater());
        Design two = coil(SampleDesigns.inverseParallelHeater());
        Design early = triac.withRamp(SampleDesigns.ramp(150e-9, 5_600, 27_000));
        breaks(MarginKind.CONTROL_RANGE, early);
        breaks(
                MarginKind.MISSED_HALF_CYCLES,
                // A device that stays on makes one pulse only, and no train rescues what that one missed.
                Changed.with(early, "trigger.device.valley.amps", Characteristic.exactly(1e-4)),
                MarginKind.LATCHED_ON,
                MarginKind.DC_IN_LOAD);
        breaks(MarginKind.COMMUTATING_DVDT, triac.withSnubber(Optional.empty()));
        breaks(
                MarginKind.OFF_STATE_DVDT,
                two.withSnubber(Optional.empty()),
                // The secondaries' half ohm shorts the conducting gates.
                MarginKind.SILENT,
                MarginKind.LATCHING_EARLIEST,
                MarginKind.LATCHING_LATEST);
        breaks(MarginKind.SURGE_CURRENT, THYRISTOR + "surgeAmps", 5);
        breaks(MarginKind.SURGE_ENERGY, THYRISTOR + "ampsSquaredSeconds", 0.1);
    }

    private static Check check(Design design) {
        return Judge.check(design, OptionalDouble.empty(), OptionalDouble.empty());
    }

    private static String table(Check check) {
        return check.margins().stream()
                .filter(m -> m.verdict() != Verdict.HOLDS)
                .map(m -> m.id() + " " + m.verdict() + " " + m.ratio() + " " + m.formula())
                .collect(Collectors.joining("\n"));
    }

    @Test
    void theUnbrokenHeaterHoldsEverywhere() {
        Check check = check(SampleDesigns.heater());
        assertThat(check.verdict()).as(table(check)).isEqualTo(Verdict.HOLDS);
        assertThat(check.margins()).hasSizeGreaterThan(35);
    }

    @Test
    void everyMarginHasADesignThatBreaksIt() {
        designs();
        assertThat(broken.keySet()).containsExactlyInAnyOrder(MarginKind.values());
    }

    @TestFactory
    List<DynamicTest> breaksExactlyTheMarginItShould() {
        designs();
        List<DynamicTest> tests = new ArrayList<>();
        broken.forEach((kind, fault) -> tests.add(DynamicTest.dynamicTest(kind.id(), () -> {
            Check check = check(fault.design());
            Margin margin = check.margins().stream()
                    .filter(m -> m.kind() == kind)
                    .findFirst()
                    .orElseThrow();
            assertThat(margin.verdict()).as(margin + "\n" + table(check)).isEqualTo(kind.gravest());
            Set<MarginKind> fallen = check.margins().stream()
                    .filter(m -> m.verdict() == Verdict.FAILS && m.kind() != kind)
                    .map(Margin::kind)
                    .collect(Collectors.toSet());
            assertThat(fault.besides()).as(table(check)).containsAll(fallen);
        })));
        return tests;
    }
}
