package clipramp.margins;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Snubber;
import clipramp.firing.Firing;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** What is said of a load beside the margins, and what pot and capacitor bear. */
class LoadNotesTest {
    private static final OptionalDouble FREE = OptionalDouble.empty();

    private static List<Note> notes(Design design) {
        Bench bench = new Bench(design, FREE, FREE);
        return new LoadNotes(bench, bench.usual()).all();
    }

    private static String text(Design design, String id) {
        return notes(design).stream()
                .filter(note -> note.id().equals(id))
                .map(Note::text)
                .findFirst()
                .orElse("");
    }

    @Test
    void aLampIsSaidToBeOne() {
        Design lamp = SampleDesigns.heater().withLoad(new Load.Filament(300, 230, 1.55, 12));
        assertThat(text(lamp, "filament")).contains("V^1.55").contains("V^3.4");
        assertThat(text(SampleDesigns.heater(), "filament")).isEmpty();
    }

    @Test
    void anInductiveLoadsAngleAndTimeConstantAreGiven() {
        // tau = L/R: 0.1 H over 20 ohm are 5 ms.
        Design coil = SampleDesigns.triacHeater().withLoad(new Load.Inductive(20, 0.1, Optional.empty()));
        assertThat(text(coil, "inductive")).contains("time constant 5 ms");
        assertThat(text(coil, "no-snubber")).contains("100 pF");
        Design snubbed = coil.withSnubber(Optional.of(new Snubber(100, 1e-7)));
        assertThat(text(snubbed, "no-snubber")).isEmpty();
        // Discharged at the crest of the high line, 253 sqrt 2 V over 100 ohm.
        assertThat(text(snubbed, "snubber")).contains("3.578 A");
    }

    @Test
    void aRateOfRiseAsksForTheInductanceThatKeepsIt() {
        // L = V/(di/dt): 253 sqrt 2 V over 50 A/us are 7.156 uH.
        Design rated =
                Changed.with(SampleDesigns.heater(), "thyristor.device.limits.ampsPerSecond", OptionalDouble.of(50e6));
        assertThat(text(rated, "turn-on-rate")).contains("7.156 µH").contains("50 A/µs");
        assertThat(text(SampleDesigns.heater(), "turn-on-rate")).isEmpty();
    }

    @Test
    void aGateShuntThatTakesMuchOfTheDriveIsNamedWithItsShare() {
        // The sheet's line from 1.5 V at -40 °C to 1 V at 25 °C gives 1.192 V at 0 °C, over 47 ohm 25.37 mA.
        Design shunted = Changed.with(SampleDesigns.heater(), "gate.shunt", Optional.of(Part.of(47)));
        assertThat(text(shunted, "gate-shunt-share")).contains("25.37 mA");
        Design slight = Changed.with(SampleDesigns.heater(), "gate.shunt", Optional.of(Part.of(1e5)));
        assertThat(text(slight, "gate-shunt-share")).isEmpty();
    }

    @Test
    void thePotsTrackBearsTheSquareOfItsCurrentATenthFromTheEnd() {
        // Joule's law: the ramp's current is one, so track and R_E share the heat as their resistances.
        Design design = SampleDesigns.heater();
        Bench bench = new Bench(design, FREE, FREE);
        List<Margin> margins = new PartMargins(bench).all();
        double nearEnd = 5_600 + 6_800;
        double worst = bench.conditions().stream()
                .mapToDouble(at ->
                        Firing.dissipation(design, at.condition(), nearEnd).rampWatts() * 68_000 / nearEnd)
                .max()
                .orElseThrow();
        assertThat(offered(margins, MarginKind.POT_POWER)).isCloseTo(worst, within(1e-9 * worst));
        // The capacitor is charged to the peak point, 0.655 of some 20 V and a diode's drop, never over the clip.
        assertThat(offered(margins, MarginKind.CAPACITOR_VOLTAGE)).isBetween(12.0, 21.0);
    }

    private static double offered(List<Margin> margins, MarginKind kind) {
        return margins.stream()
                .filter(m -> m.kind() == kind)
                .findFirst()
                .orElseThrow()
                .offered();
    }
}
