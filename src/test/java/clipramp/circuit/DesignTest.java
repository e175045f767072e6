package clipramp.circuit;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import java.lang.reflect.Method;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Changing one thing of a design changes that thing only; which bridge feeds the firing circuit; what the parts are called. */
class DesignTest {
    @Test
    void aChangeOfOneThingLeavesEverythingElse() throws ReflectiveOperationException {
        Design from = SampleDesigns.heater();
        Design other = everythingElse();
        List<String> changed = new ArrayList<>();
        for (Method method : Design.class.getDeclaredMethods()) {
            if (!method.getName().startsWith("with") || method.getParameterCount() != 1) {
                continue;
            }
            String name = Character.toLowerCase(method.getName().charAt(4))
                    + method.getName().substring(5);
            Object value = Design.class.getDeclaredMethod(name).invoke(other);
            Object made = method.invoke(from, value);
            assertThat(value)
                    .as(name)
                    .isNotEqualTo(Design.class.getDeclaredMethod(name).invoke(from));
            for (RecordComponent component : Design.class.getRecordComponents()) {
                Object expected = component.getName().equals(name)
                        ? value
                        : component.getAccessor().invoke(from);
                assertThat(component.getAccessor().invoke(made))
                        .as(method.getName() + ", " + component.getName())
                        .isEqualTo(expected);
            }
            changed.add(name);
        }
        assertThat(changed)
                .contains("line", "stage", "load", "clip", "ramp", "trigger", "gate", "thyristor", "snubber");
    }

    /** A design that has nothing in common with the heater. */
    private static Design everythingElse() {
        Design other = SampleDesigns.triacHeater();
        other = Changed.with(other, "line", new Line(120, 60, 110, 130, List.of()));
        other = Changed.with(other, "stageDiodes", new StageDiodes(0.7, 0.01));
        other = Changed.with(other, "load", new Load.Resistor(10));
        other = Changed.with(other, "clip", SampleDesigns.thyristorTapHeater().clip());
        other = Changed.with(other, "ramp", SampleDesigns.programmableHeater().ramp());
        other = Changed.with(
                other, "trigger", SampleDesigns.programmableHeater().trigger());
        other = Changed.with(other, "snubber", Optional.of(new Snubber(100, 1e-7)));
        other = Changed.with(other, "surroundings", new Surroundings(-20, 40));
        other = Changed.with(other, "wanted", new Wanted(Optional.empty(), Optional.empty()));
        return Changed.with(other, "resistorDerating", 0.7);
    }

    @ParameterizedTest
    @CsvSource({
        "BRIDGE_DC,LINE,BRIDGE,false,true",
        "BRIDGE_DC,LINE,BRIDGE,true,false",
        "BRIDGE_DC,LINE,DIODE,false,false",
        "BRIDGE_AC,THYRISTOR,BRIDGE,false,true",
        "BRIDGE_AC,LINE,BRIDGE,false,false",
        "TRIAC,LINE,BRIDGE,false,false",
        "TRIAC,THYRISTOR,BRIDGE,false,false",
        "HALF_WAVE,LINE,DIODE,false,false",
    })
    void oneBridgeFeedsStageAndSupplyOnlyWhereTheyShareIt(
            Stage stage, Tap tap, Rectifier rectifier, boolean winding, boolean shared) {
        Design design = design(stage, tap, rectifier, winding);
        assertThat(design.isSuppliedByStageBridge()).isEqualTo(shared);
        Map<String, String> names = Designators.of(design);
        // A shared bridge is one component with one name; two bridges have eight diodes.
        assertThat(names.containsKey("clip.rectifier")).isEqualTo(!shared);
        assertThat(names.containsKey("stage-diodes")).isEqualTo(stage.bridgeDiodes() > 0);
        if (stage.bridgeDiodes() > 0) {
            assertThat(names).containsEntry("stage-diodes", shared ? "D1–D4" : "D5–D8");
        }
        if (!shared) {
            assertThat(names).containsEntry("clip.rectifier", rectifier == Rectifier.BRIDGE ? "D1–D4" : "D1");
        }
        assertThat(names.containsKey("clip.winding")).isEqualTo(winding);
    }

    private static Design design(Stage stage, Tap tap, Rectifier rectifier, boolean winding) {
        Optional<Winding> isolated = winding ? Optional.of(new Winding(230, 24, false, 0)) : Optional.empty();
        return SampleDesigns.heater()
                .withStage(stage)
                .withClip(SampleDesigns.clip(tap, rectifier, Part.of(10_000), isolated));
    }

    @Test
    void everyPartHasOneNameOfItsOwn() {
        Trimmers both = new Trimmers(Optional.of(Part.of(10_000)), Optional.of(Part.of(200_000)));
        Design full = Changed.with(SampleDesigns.triacHeater(), "ramp.trimmers", both);
        full = Changed.with(full, "ramp.pot.shunt", Optional.of(Part.of(1e5)));
        assertThat(Designators.of(full))
                .containsEntry("ramp.pot.track", "RP")
                .containsEntry("ramp.pot.shunt", "RS")
                .containsEntry("ramp.trim-high", "RV1")
                .containsEntry("ramp.trim-low", "RV2")
                .containsEntry("gate.shunt", "RGK")
                .containsEntry("gate.transformer", "T1")
                .containsEntry("trigger.base-two", "R2")
                .containsEntry("thyristor.device", "V1")
                .doesNotContainKey("trigger.upper");
        assertThat(Designators.of(full).values()).doesNotHaveDuplicates();
        assertThat(Designators.of(SampleDesigns.inverseParallelHeater())).containsEntry("thyristor.device", "V1, V2");
        assertThat(Designators.of(SampleDesigns.programmableHeater()))
                .containsEntry("trigger.upper", "RA")
                .containsEntry("trigger.lower", "RB")
                .doesNotContainKey("trigger.base-two")
                .doesNotContainKey("gate.transformer");
    }

    @Test
    void aNameTakenByTheDrawingIsNotGivenTwice() {
        Design named =
                Changed.with(SampleDesigns.heater(), "designators", Map.of("ramp.capacitor", "RD", "load", "R10"));
        Map<String, String> names = Designators.of(named);
        assertThat(names).containsEntry("ramp.capacitor", "RD").containsEntry("load", "R10");
        // R10 is the load's already, so the dropper, no longer RD, gets the next free number.
        assertThat(names).containsEntry("clip.dropper", "R11");
        assertThat(names.values()).doesNotHaveDuplicates();
    }

    @Test
    void theNominalConditionIsTheNominalLineAtRoomTemperature() {
        assertThat(SampleDesigns.heater().nominalCondition()).isEqualTo(new Condition(230, 50, 25));
    }

    @Test
    void wordsOfADesignFileAreDistinctAndLowerCase() {
        List<String> words = new ArrayList<>();
        Arrays.stream(Stage.values()).map(Stage::word).forEach(words::add);
        Arrays.stream(Tap.values()).map(Tap::word).forEach(words::add);
        Arrays.stream(Rectifier.values()).map(Rectifier::word).forEach(words::add);
        Arrays.stream(Pot.Sense.values()).map(Pot.Sense::word).forEach(words::add);
        Arrays.stream(GateDrive.Coupling.values()).map(GateDrive.Coupling::word).forEach(words::add);
        Arrays.stream(GateDrive.Polarity.values()).map(GateDrive.Polarity::word).forEach(words::add);
        words.add(new Load.Filament(1, 1, 1.55, 1).word());
        words.add(new Load.Inductive(1, 1, Optional.empty()).word());
        words.add(new PotLaw.ReverseLogarithmic(0.1).word());
        assertThat(words).contains("filament", "inductive", "reverse-log");
        assertThat(words).doesNotHaveDuplicates().allMatch(word -> word.matches("[a-z]+(-[a-z]+)*"));
        assertThat(Set.of(new Load.Resistor(1).word(), new PotLaw.Linear().word(), new PotLaw.Logarithmic(0.1).word()))
                .containsExactlyInAnyOrder("resistor", "linear", "log");
    }
}
