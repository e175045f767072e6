package clipramp.spread;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Ramp;
import clipramp.circuit.Trimmers;
import clipramp.files.DesignFiles;
import clipramp.files.Example;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.firing.Firing;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Presets that are set on every unit: the nominal unit has them at mid-track, each other one where its maker sets them. */
class TrimmerTest {
    private static final double NEAR_RAD = Math.toRadians(0.05);

    private static Design trimmed() {
        return DesignFiles.load(
                        new Source(
                                "cabinet.yaml",
                                Example.named("drying-cabinet").orElseThrow().text()),
                        List.of(
                                "ramp.fixed=1.3 kΩ ±5 %",
                                "ramp.trim-high=5 kΩ ±20 %",
                                "ramp.pot.track=100 kΩ ±10 %",
                                "ramp.pot.shunt=8.2 kΩ ±5 %",
                                "ramp.trim-low=50 kΩ ±20 %"),
                        ProfileLibrary.shipped())
                .design();
    }

    @Test
    void theNominalUnitHasItsTrimmersAtMidTrack() {
        Ramp ramp = trimmed().ramp();

        assertThat(ramp.rampOhms(1)).isCloseTo(1300 + 2500, within(1e-9));
        // 100 kΩ in parallel with 8.2 kΩ + 25 kΩ.
        assertThat(ramp.rampOhms(0)).isCloseTo(3800 + 100e3 * 33.2e3 / 133.2e3, within(1e-6));
    }

    @Test
    void aSlowUnitFiresWhereTheNominalOneDoesOnceItsTrimmersAreSet() {
        Design design = trimmed();
        Ramp ramp = design.ramp();
        Part slow = ramp.capacitor().withValue(ramp.capacitor().value() * 1.15);
        Design unit = design.withRamp(new Ramp(slow, ramp.fixed(), ramp.pot(), ramp.trimmers()));
        Design set = TrimmedUnit.of(design, unit);

        assertThat(set.ramp().trimmers().isNone()).isTrue();
        for (double position : new double[] {0, 1}) {
            assertThat(rad(set, position)).isCloseTo(rad(design, position), within(NEAR_RAD));
            assertThat(Math.abs(rad(unit, position) - rad(design, position))).isGreaterThan(20 * NEAR_RAD);
        }
    }

    @Test
    void aTrimmerReachesNoFartherThanTheLeastTrackOfItsTolerance() {
        Design design = trimmed();
        Ramp ramp = design.ramp();
        Part fast = ramp.capacitor().withValue(ramp.capacitor().value() / 3);
        Design set = TrimmedUnit.of(design, design.withRamp(new Ramp(fast, ramp.fixed(), ramp.pot(), ramp.trimmers())));

        assertThat(set.ramp().fixed().value()).isCloseTo(1300 + 4000, within(1e-6));
    }

    @Test
    void unitsThatAreSetReachWhatIsWantedWhereBareOnesDoNot() {
        Design design = trimmed();
        Ramp ramp = design.ramp();
        Design bare = design.withRamp(new Ramp(
                ramp.capacitor(),
                Part.of(ramp.seriesOhms()),
                ramp.pot()
                        .map(p -> new clipramp.circuit.Pot(
                                p.track(), p.endOhms(), p.law(), p.sense(), Optional.of(Part.of(ramp.acrossOhms())))),
                Trimmers.NONE));
        SpreadOptions options = new SpreadOptions(100, 1, DrawLaw.NORMAL, 0);

        assertThat(Spread.run(design, options, Watch.NONE)
                        .wanted()
                        .orElseThrow()
                        .share())
                .isEqualTo(1);
        assertThat(Spread.run(bare, options, Watch.NONE).wanted().orElseThrow().share())
                .isLessThan(0.95);
    }

    private static double rad(Design design, double position) {
        return Firing.solve(design, design.nominalCondition(), design.ramp().rampOhms(position))
                .shown()
                .firingRad()
                .orElseThrow();
    }
}
