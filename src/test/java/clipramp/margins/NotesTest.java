package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Changed;
import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.SampleDesigns;
import clipramp.firing.Firing;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Every note appears where its condition holds and nowhere else, and its figures are those of the circuit. */
class NotesTest {
    private static final Design HEATER = SampleDesigns.heater();

    private static List<Note> notes(Design design) {
        Bench bench = OnTheBench.usual(design);
        return new Notes(bench, bench.usual()).all();
    }

    private static Optional<String> text(Design design, String id) {
        return notes(design).stream()
                .filter(n -> n.id().equals(id))
                .map(Note::text)
                .findFirst();
    }

    @Test
    void aPlainCircuitIsToldItsAssumptionsAndNoMore() {
        assertThat(notes(HEATER))
                .extracting(Note::id)
                .containsExactly("nominal-parts", "self-heating", "emitter-leakage", "gate-energy");
    }

    @Test
    void selfHeatingIsPowerOverTheDeratingOfTheSheet() {
        // 2N2646: 3 mW/K; 2N6027: 4 mW/K.
        double watts = Firing.dissipation(HEATER, OnTheBench.USUAL, 5_600).deviceWatts();
        assertThat(text(HEATER, "self-heating").orElseThrow())
                .contains(Say.watts(watts) + " at 3 mW/K would warm it by " + Say.kelvin(watts / 3e-3));
        assertThat(text(SampleDesigns.programmableHeater(), "self-heating").orElseThrow())
                .contains("at 4 mW/K");
        for (OptionalDouble none : List.of(OptionalDouble.empty(), OptionalDouble.of(0))) {
            Design unknown = Changed.with(HEATER, "trigger.device.limits.deratingWattsPerKelvin", none);
            assertThat(text(unknown, "self-heating")).isEmpty();
        }
    }

    @Test
    void leakageIsATenthOfAMicroampereThroughTheLargestRampResistor() {
        // Ohm's law: 0.1 uA x 73.6 kohm = 7.36 mV.
        double peak = Firing.solve(HEATER, OnTheBench.USUAL, 73_600)
                .shown()
                .pulses()
                .get(0)
                .peakPointVolts();
        assertThat(text(HEATER, "emitter-leakage").orElseThrow())
                .contains("every 100 nA")
                .contains("up to 7.36 mV at the largest R_E, against a peak point of " + Say.volts(peak) + ".");
        Design dead = Changed.with(HEATER, "clip.dropper.value", 5e6);
        assertThat(text(dead, "emitter-leakage").orElseThrow()).endsWith("at the largest R_E.");
    }

    @Test
    void aLoadInSeriesWithTheDropperIsToldFromOnePercentOn() {
        // 10 kohm of dropper: 100 ohm are one hundredth.
        Design tapped = SampleDesigns.thyristorTapHeater();
        assertThat(text(tapped.withLoad(new Load.Resistor(100)), "load-in-series"))
                .isEmpty();
        assertThat(text(tapped.withLoad(new Load.Resistor(150)), "load-in-series")
                        .orElseThrow())
                .contains("150 Ω in series")
                .contains("it is 1.5 % of it");
        assertThat(text(HEATER.withLoad(new Load.Resistor(150)), "load-in-series"))
                .isEmpty();
    }

    @Test
    void theEnergyOfAMinimalTriggerPulseIsGivenBesideThePulses() {
        // V_GT I_GT t_gt = 1 V x 10 mA x 1.5 us at 25 °C.
        double joules = Firing.solve(HEATER, OnTheBench.USUAL, 39_600)
                .shown()
                .firingPulse()
                .orElseThrow()
                .gateJoules();
        assertThat(text(HEATER, "gate-energy").orElseThrow())
                .contains("gives the gate " + Say.joules(joules) + "; V_GT x I_GT x t_gt is 15 nJ");
        Design unknown = Changed.with(HEATER, "thyristor.device.gate.turnOnSeconds", OptionalDouble.empty());
        assertThat(text(unknown, "gate-energy")).isEmpty();
        Design dead = Changed.with(HEATER, "clip.dropper.value", 5e6);
        assertThat(text(dead, "gate-energy")).isEmpty();
    }

    @Test
    void figuresOfTheSheetThatWereExtendedOrMissingAreNamed() {
        Bench cold = OnTheBench.at(HEATER, 230, -60);
        assertThat(new Notes(cold, cold.usual()).all())
                .anySatisfy(note -> assertThat(note.text()).startsWith("I_GT and V_GT at -60 °C lie outside"))
                .anySatisfy(note -> assertThat(note.text()).startsWith("Latching and holding current at -60 °C lie"));
        assertThat(text(HEATER, "trigger-data-extended")).isEmpty();
        assertThat(text(HEATER, "latching-data-extended")).isEmpty();
        Design untold = Changed.with(HEATER, "trigger.device.baseOnePulse", Optional.empty());
        assertThat(text(untold, "typical-drive").orElseThrow()).startsWith("The profile states no smallest base-one");
        Design typical = Changed.with(HEATER, "trigger.device.baseOnePulse.minVolts", OptionalDouble.empty());
        assertThat(text(typical, "typical-drive")).isPresent();
        assertThat(text(HEATER, "typical-drive")).isEmpty();
        assertThat(text(SampleDesigns.programmableHeater(), "typical-drive")).isEmpty();
        assertThat(text(SampleDesigns.triacHeater(), "leakage-inductance").orElseThrow())
                .endsWith("the computed gate peak is optimistic.");
        assertThat(text(HEATER, "leakage-inductance")).isEmpty();
    }

    @Test
    void aDeviceThatStaysOnIsSaidToWithItsHeat() {
        Design low = HEATER.withRamp(SampleDesigns.ramp(1e-6, 560, 6_800));
        double watts = Firing.dissipation(low, OnTheBench.USUAL, 560).deviceWatts();
        assertThat(text(low, "latched-on").orElseThrow()).contains("and " + Say.watts(watts) + " heat the device");
        assertThat(text(HEATER, "latched-on")).isEmpty();
    }

    @Test
    void aHalfWaveStageIsToldItsDirectCurrentAndAWholeBridgeItsReverseDrive() {
        Design half = SampleDesigns.halfWaveHeater();
        assertThat(text(half, "half-wave-dc")).isPresent();
        assertThat(text(half, "reverse-anode-drive")).isEmpty();
        Design driven = Changed.with(
                SampleDesigns.windingHeater(0, false).withStage(half.stage()), "clip.rectifier", Rectifier.BRIDGE);
        assertThat(text(driven, "reverse-anode-drive")).isPresent();
        assertThat(text(HEATER, "half-wave-dc")).isEmpty();
    }

    @Test
    void aLampsLightIsThatOfItsVoltage() {
        // Light as V^3.4 (handbook): at full conduction nearly all of it.
        Design lamp = HEATER.withLoad(new Load.Filament(1200, 230, 1.55, 12));
        String text = text(lamp, "filament").orElseThrow();
        assertThat(text).contains("V^1.55").contains(" of its light at rated voltage over the knob's travel");
        String dim = text.substring(text.indexOf("from ") + 5, text.indexOf(" % to "));
        String bright = text.substring(text.indexOf(" % to ") + 6, text.indexOf(" % of its light"));
        assertThat(Double.parseDouble(dim)).isLessThan(10);
        assertThat(Double.parseDouble(bright)).isBetween(85.0, 100.0);
    }
}
