package clipramp.sizing;

import static org.assertj.core.api.Assertions.assertThat;

import clipramp.circuit.Design;
import clipramp.circuit.PotLaw;
import clipramp.files.DesignFiles;
import clipramp.files.Example;
import clipramp.files.Source;
import clipramp.power.KnobMap;
import clipramp.sizing.KnobShape.What;
import clipramp.units.PreferredSeries;
import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The knob made straight, and base two against temperature, each against plain trying. */
class ShapingTest {
    private static Design cabinet(String... with) {
        return DesignFiles.load(
                        new Source(
                                "cabinet.yaml",
                                Example.named("drying-cabinet").orElseThrow().text()),
                        List.of(with),
                        Requests.LIBRARY)
                .design();
    }

    private static SizingRequest rampOpen(Design design) {
        return new SizingRequest(
                design,
                EnumSet.of(OpenPart.FIXED, OpenPart.TRACK),
                new Stock(List.of(), List.of(), List.of()),
                PreferredSeries.E12);
    }

    @Test
    void aShapedKnobIsStraighterAndStillReachesWhatIsWanted() {
        Design before = cabinet("ramp.pot.law=log");
        KnobShape shaped = KnobShaping.straightest(rampOpen(before), before, What.POWER);

        assertThat(shaped.largestDeparture())
                .isLessThan(KnobShape.of(before, What.POWER).largestDeparture());
        assertThat(Timing.lack(shaped.design(), Reach.of(shaped.design()))).isZero();
    }

    @Test
    void lightAsksForAnotherKnobThanPower() {
        Design design = cabinet();
        SizingRequest request = rampOpen(design);
        KnobShape power = KnobShaping.straightest(request, design, What.POWER);
        KnobShape light = KnobShaping.straightest(request, design, What.LIGHT);

        assertThat(light.largestDeparture())
                .isLessThanOrEqualTo(KnobShape.of(power.design(), What.LIGHT).largestDeparture() + 0.005);
        assertThat(power.largestDeparture())
                .isLessThanOrEqualTo(KnobShape.of(light.design(), What.POWER).largestDeparture() + 0.005);
    }

    @Test
    void departureAndSteepestStepAreThoseOfTheSolvedMap() {
        Design design = cabinet();
        KnobShape shape = KnobShape.of(design, What.POWER);
        double first = KnobMap.at(design, design.nominalCondition(), 0).load().fraction();
        double last = KnobMap.at(design, design.nominalCondition(), 1).load().fraction();
        double middle =
                KnobMap.at(design, design.nominalCondition(), 0.4).load().fraction();

        assertThat(shape.largestDeparture()).isGreaterThanOrEqualTo(Math.abs(middle - first - 0.4 * (last - first)));
        // No step is steeper than the whole, and one at least is as steep as the mean.
        assertThat(shape.steepestPerDegree())
                .isGreaterThan((last - first) / KnobShape.ROTATION_DEGREES)
                .isLessThan(last - first);
        assertThat(design.ramp().pot().orElseThrow().law()).isInstanceOf(PotLaw.Linear.class);
    }

    @Test
    void noResistorThatIsTriedIsFlatterThanTheFlattest() {
        Design design = cabinet();
        Compensation compensation = Compensation.of(design).orElseThrow();

        for (double ohms = PreferredSeries.E24.atLeast(100); ohms < 2000; ohms = PreferredSeries.E24.nextUp(ohms)) {
            assertThat(Compensation.driftRad(design, ohms))
                    .as("%s ohm", ohms)
                    .isGreaterThanOrEqualTo(compensation.flattest().driftRad() - 1e-6);
        }
        assertThat(compensation.rules())
                .hasSize(4)
                .allSatisfy(rule -> assertThat(rule.driftRad())
                        .isGreaterThanOrEqualTo(compensation.flattest().driftRad() - 1e-6));
    }

    @Test
    void aProgrammableDeviceHasNoBaseTwoToCompensateWith() {
        Design drawer = DesignFiles.load(
                        new Source(
                                "drawer.yaml",
                                Example.named("seed-drawer").orElseThrow().text()),
                        List.of(),
                        Requests.LIBRARY)
                .design();

        assertThat(Compensation.of(drawer)).isEmpty();
    }
}
