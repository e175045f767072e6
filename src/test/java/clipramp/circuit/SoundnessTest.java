package clipramp.circuit;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Soundness.Reason;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The table of power stages in the model: which supply and coupling are sound with which stage. */
class SoundnessTest {
    private static ClipSupply supply(String tap, String rectifier, boolean winding) {
        Zener zener = new Zener("z", Characteristic.exactly(20), 0.005, 20, 0, OptionalDouble.empty());
        return new ClipSupply(
                tap.equals("line") ? Tap.LINE : Tap.THYRISTOR,
                rectifier.equals("bridge") ? Rectifier.BRIDGE : Rectifier.DIODE,
                0.7,
                Part.of(10_000),
                zener,
                winding ? Optional.of(new Winding(230, 24, false, 0)) : Optional.empty());
    }

    private static GateDrive gate(String coupling, int secondaries, Polarity polarity) {
        boolean transformer = coupling.equals("transformer");
        return new GateDrive(
                transformer ? Coupling.TRANSFORMER : Coupling.DIRECT,
                Part.of(0),
                Optional.empty(),
                3,
                20e-6,
                polarity,
                transformer
                        ? Optional.of(
                                new PulseTransformer(1, secondaries, 2e-3, 0.5, 0.5, false, OptionalDouble.empty()))
                        : Optional.empty());
    }

    private static Stage stage(String word) {
        for (Stage stage : Stage.values()) {
            if (stage.word().equals(word)) {
                return stage;
            }
        }
        throw new AssertionError(word);
    }

    private static List<Reason> reasons(String stage, String tap, String rectifier, boolean winding, String coupling) {
        Stage of = stage(stage);
        ClipSupply clip = supply(tap, rectifier, winding);
        List<Reason> reasons = new ArrayList<>(Soundness.ofSupply(of, clip));
        int secondaries = of == Stage.INVERSE_PARALLEL ? 2 : 1;
        reasons.addAll(Soundness.ofCoupling(of, clip, gate(coupling, secondaries, Polarity.POSITIVE)));
        return reasons;
    }

    @ParameterizedTest
    @CsvSource({
        "half-wave,line,diode,false,direct",
        "half-wave,line,diode,false,transformer",
        "half-wave,line,diode,true,direct",
        "half-wave,line,bridge,true,direct",
        "bridge-dc,line,bridge,false,direct",
        "bridge-dc,line,bridge,false,transformer",
        "bridge-ac,thyristor,bridge,false,direct",
        "bridge-ac,thyristor,bridge,false,transformer",
        "bridge-ac,line,bridge,false,transformer",
        "bridge-ac,line,bridge,true,direct",
        "inverse-parallel,line,bridge,false,transformer",
        "inverse-parallel,line,bridge,true,transformer",
        "triac,line,bridge,false,transformer",
        "triac,line,bridge,true,direct",
        "triac,line,bridge,true,transformer",
    })
    void soundCombinationsPass(String stage, String tap, String rectifier, boolean winding, String coupling) {
        assertThat(reasons(stage, tap, rectifier, winding, coupling)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({
        "half-wave,line,bridge,false,direct,clip.rectifier",
        "half-wave,line,bridge,false,transformer,clip.rectifier",
        "half-wave,thyristor,diode,false,direct,clip.tap",
        "bridge-dc,line,diode,false,direct,clip.rectifier",
        "bridge-ac,line,bridge,false,direct,gate.coupling",
        "inverse-parallel,line,bridge,false,direct,gate.coupling",
        "inverse-parallel,line,bridge,true,direct,gate.coupling",
        "triac,line,bridge,false,direct,gate.coupling",
        "triac,thyristor,bridge,false,direct,gate.coupling",
        "triac,line,diode,true,direct,clip.rectifier",
    })
    void unsoundCombinationsAreRefusedWithTheirReason(
            String stage, String tap, String rectifier, boolean winding, String coupling, String key) {
        List<Reason> reasons = reasons(stage, tap, rectifier, winding, coupling);
        assertThat(reasons).extracting(Reason::key).containsExactly(key);
        assertThat(reasons.get(0).sentence())
                .contains("with stage " + stage)
                .contains(": ")
                .contains(". Use ");
    }

    @Test
    void secondariesFollowTheNumberOfGates() {
        ClipSupply clip = supply("line", "bridge", false);
        assertThat(Soundness.ofCoupling(Stage.INVERSE_PARALLEL, clip, gate("transformer", 1, Polarity.POSITIVE)))
                .extracting(Reason::sentence)
                .containsExactly("gate.transformer.secondaries 1 with stage inverse-parallel: two gates at different"
                        + " potentials need a secondary each. Use 2.");
        assertThat(Soundness.ofCoupling(Stage.BRIDGE_DC, clip, gate("transformer", 2, Polarity.POSITIVE)))
                .hasSize(1);
    }

    @Test
    void negativePulsesAreForTriacsBehindATransformer() {
        ClipSupply isolated = supply("line", "bridge", true);
        assertThat(Soundness.ofCoupling(Stage.TRIAC, isolated, gate("transformer", 1, Polarity.NEGATIVE)))
                .isEmpty();
        assertThat(Soundness.ofCoupling(Stage.TRIAC, isolated, gate("direct", 1, Polarity.NEGATIVE)))
                .hasSize(1);
        assertThat(Soundness.ofCoupling(Stage.BRIDGE_DC, isolated, gate("transformer", 1, Polarity.NEGATIVE)))
                .hasSize(1);
    }

    @Test
    void inductanceNeedsAStageThatLetsGo() {
        Load bare = new Load.Inductive(40, 0.12, Optional.empty());
        Load freewheeling = new Load.Inductive(40, 0.12, Optional.of(new StageDiodes(0.9, 0)));
        assertThat(ofLoad(Stage.BRIDGE_DC, bare)).extracting(Reason::key).containsExactly("load.kind");
        assertThat(ofLoad(Stage.BRIDGE_DC, freewheeling)).isEmpty();
        assertThat(ofLoad(Stage.BRIDGE_AC, bare)).hasSize(1);
        assertThat(ofLoad(Stage.TRIAC, bare)).isEmpty();
        assertThat(ofLoad(Stage.TRIAC, freewheeling)).hasSize(1);
        assertThat(ofLoad(Stage.HALF_WAVE, freewheeling)).isEmpty();
        assertThat(ofLoad(Stage.BRIDGE_AC, new Load.Resistor(40))).isEmpty();
    }

    @Test
    void theDeviceIsTheStagesOwn() {
        assertThat(Soundness.ofDevice(Stage.TRIAC, ThyristorDevice.Kind.TRIAC)).isEmpty();
        assertThat(Soundness.ofDevice(Stage.TRIAC, ThyristorDevice.Kind.SCR))
                .extracting(Reason::sentence)
                .containsExactly("thyristor.device scr with stage triac: an SCR conducts one way, and this stage is one"
                        + " device that conducts both. Use a triac, or stage inverse-parallel.");
        assertThat(Soundness.ofDevice(Stage.BRIDGE_DC, ThyristorDevice.Kind.TRIAC))
                .extracting(Reason::sentence)
                .containsExactly(
                        "thyristor.device triac with stage bridge-dc: this stage is built of SCRs. Use an SCR, or"
                                + " stage triac.");
    }

    @Test
    void anInductiveLoadOnTheAcSideOfABridgeNeedsASnubberAndAKnownTurnOffTime() {
        Load coil = new Load.Inductive(40, 0.1, Optional.empty());
        Optional<Snubber> snubber = Optional.of(new Snubber(100, 100e-9));
        Optional<ThyristorDevice> known =
                Optional.of(SampleDesigns.heater().thyristor().device());
        Optional<ThyristorDevice> unknown = Optional.of(
                Changed.with(SampleDesigns.heater(), "thyristor.device.turnOffSeconds", OptionalDouble.empty())
                        .thyristor()
                        .device());
        assertThat(known.get().turnOffSeconds()).isPresent();
        assertThat(Soundness.ofLoad(Stage.BRIDGE_AC, coil, snubber, known)).isEmpty();
        assertThat(Soundness.ofLoad(Stage.BRIDGE_AC, coil, snubber, unknown)
                        .get(0)
                        .sentence())
                .contains("turn-off time");
        assertThat(Soundness.ofLoad(Stage.BRIDGE_AC, coil, Optional.empty(), known)
                        .get(0)
                        .sentence())
                .contains("there is no snubber");
    }

    private static List<Soundness.Reason> ofLoad(Stage stage, Load load) {
        return Soundness.ofLoad(stage, load, Optional.empty(), Optional.empty());
    }
}
