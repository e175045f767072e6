package clipramp.power;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.circuit.Ramp;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.TemperatureCurve;
import clipramp.firing.Firing;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class KnobSearchTest {
    private static final Condition NOMINAL = new Condition(230, 50, 25);
    private static final Design HEATER = SampleDesigns.heater();

    @Test
    void theRampThatIsFoundFiresAtTheAngleAskedFor() {
        for (int degrees = 20; degrees <= 160; degrees += 20) {
            double wanted = Math.toRadians(degrees);
            double ohms = KnobSearch.rampOhmsForAngle(HEATER, NOMINAL, wanted).getAsDouble();
            double fires =
                    Firing.solve(HEATER, NOMINAL, ohms).shown().firingRad().getAsDouble();
            assertThat(Math.toDegrees(fires)).isCloseTo(degrees, within(1e-6));
        }
    }

    @Test
    void theRampThatIsFoundGivesThePowerAskedFor() {
        for (double watts : new double[] {40, 300, 600, 1100}) {
            double ohms = KnobSearch.rampOhmsForWatts(HEATER, NOMINAL, watts).getAsDouble();
            assertThat(KnobMap.atRampOhms(HEATER, NOMINAL, ohms).load().watts()).isCloseTo(watts, within(1e-4));
        }
        double ohms = KnobSearch.rampOhmsForVolts(HEATER, NOMINAL, 150).getAsDouble();
        assertThat(KnobMap.atRampOhms(HEATER, NOMINAL, ohms).load().rmsVolts()).isCloseTo(150, within(1e-5));
    }

    @Test
    void whatNoRampCanGiveIsNotFound() {
        assertThat(KnobSearch.rampOhmsForWatts(HEATER, NOMINAL, 1300)).isEmpty();
        assertThat(KnobSearch.rampOhmsForWatts(HEATER, NOMINAL, 0)).isEmpty();
        // The supply reaches no peak point so early.
        assertThat(KnobSearch.rampOhmsForAngle(HEATER, NOMINAL, Math.toRadians(0.05)))
                .isEmpty();
    }

    @ParameterizedTest
    @ValueSource(doubles = {22, 32.5, 36.5, 51})
    void anAngleThatIsJumpedOverGetsTheNearerSideOfTheJump(double degrees) {
        // One pulse more fits in before the line's zero, so the next ramp begins with another charge.
        double wanted = Math.toRadians(degrees);
        assertThat(KnobSearch.rampOhmsForAngle(HEATER, NOMINAL, wanted)).isEmpty();
        double ohms =
                KnobSearch.nearestRampOhmsForAngle(HEATER, NOMINAL, wanted).orElseThrow();
        double off = Math.abs(fires(ohms) - degrees);
        double less = Math.abs(fires(ohms * (1 - 1e-6)) - degrees);
        double more = Math.abs(fires(ohms * (1 + 1e-6)) - degrees);
        assertThat(Math.abs(fires(ohms * (1 - 1e-6)) - fires(ohms * (1 + 1e-6))))
                .as("it does jump there")
                .isGreaterThan(0.02);
        assertThat(off).isLessThan(3).isLessThanOrEqualTo(Math.min(less, more) + 1e-3);
    }

    private static double fires(double ohms) {
        return Math.toDegrees(
                Firing.solve(HEATER, NOMINAL, ohms).shown().firingRad().orElseThrow());
    }

    @Test
    void theNearestIsTheAngleItselfWhereThereIsNoJumpAndNothingWhereItIsFar() {
        for (double degrees : new double[] {60, 90, 120}) {
            double wanted = Math.toRadians(degrees);
            double found =
                    KnobSearch.nearestRampOhmsForAngle(HEATER, NOMINAL, wanted).orElseThrow();
            assertThat(fires(found)).isCloseTo(degrees, within(1e-6));
        }
        assertThat(KnobSearch.nearestRampOhmsForAngle(HEATER, NOMINAL, Math.toRadians(0.05)))
                .isEmpty();
        // With an I_L of 20 A it never fires, so that no R_E is near any angle.
        Design lazy = Changed.with(HEATER, "thyristor.device.latching", Optional.of(TemperatureCurve.at25(20)));
        assertThat(KnobSearch.nearestRampOhmsForAngle(lazy, NOMINAL, 1)).isEmpty();
    }

    @Test
    void theLastAngleBeforeSilenceServesThreeDegreesBeyondItAndNoFurther() {
        // Through 40 kohm of dropper the last pulse comes a little short of 176 degrees; then there is none.
        Design starved = Changed.with(HEATER, "clip.dropper.value", 40_000.0);
        double last = KnobSearch.nearestRampOhmsForAngle(starved, NOMINAL, Math.toRadians(178))
                .orElseThrow();
        double fires = Math.toDegrees(
                Firing.solve(starved, NOMINAL, last).shown().firingRad().orElseThrow());
        assertThat(fires).isBetween(175.0, 176.0);
        assertThat(KnobSearch.rampOhmsForAngle(starved, NOMINAL, Math.toRadians(178)))
                .isEmpty();
        assertThat(KnobSearch.nearestRampOhmsForAngle(starved, NOMINAL, Math.toRadians(fires + 2.99)))
                .isPresent();
        assertThat(KnobSearch.nearestRampOhmsForAngle(starved, NOMINAL, Math.toRadians(fires + 3.01)))
                .isEmpty();
    }

    @Test
    void aPositionIsFoundForEveryLawAndEitherSense() {
        List<PotLaw> laws = List.of(
                new PotLaw.Linear(),
                new PotLaw.Logarithmic(0.15),
                new PotLaw.ReverseLogarithmic(0.15),
                new PotLaw.Table(List.of(
                        new PotLaw.Table.Point(0, 0), new PotLaw.Table.Point(0.3, 0.5), new PotLaw.Table.Point(1, 1))));
        for (PotLaw law : laws) {
            for (Pot.Sense sense : Pot.Sense.values()) {
                Pot pot = new Pot(
                        SampleDesigns.part(68_000, 0.2, 0.5),
                        20,
                        law,
                        sense,
                        Optional.of(SampleDesigns.part(1e6, 0, 1)));
                Ramp ramp = new Ramp(HEATER.ramp().capacitor(), HEATER.ramp().fixed(), Optional.of(pot));
                for (double position = 0; position <= 1; position += 0.125) {
                    double found =
                            KnobSearch.position(ramp, ramp.rampOhms(position)).getAsDouble();
                    assertThat(found).as(law + " " + sense).isCloseTo(position, within(1e-9));
                }
            }
        }
    }

    @Test
    void aResistanceOutOfReachHasNoPosition() {
        assertThat(KnobSearch.position(HEATER.ramp(), 5_000)).isEqualTo(OptionalDouble.empty());
        assertThat(KnobSearch.position(HEATER.ramp(), 80_000)).isEmpty();
        Ramp fixed = new Ramp(HEATER.ramp().capacitor(), HEATER.ramp().fixed(), Optional.empty());
        assertThat(KnobSearch.position(fixed, 5_600)).isEmpty();
    }

    @Test
    void theKnobMapRunsFromEndToEnd() {
        List<OperatingPoint> map = KnobMap.of(HEATER, NOMINAL, 5);
        assertThat(map).hasSize(5);
        assertThat(map.get(0).position()).hasValue(0);
        assertThat(map.get(4).rampOhms()).isCloseTo(5_600, within(1e-9));
        assertThat(map).extracting(p -> p.load().watts()).isSorted();
        assertThat(KnobMap.of(HEATER, NOMINAL, 2)).hasSize(2);
        assertThatThrownBy(() -> KnobMap.of(HEATER, NOMINAL, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("2 positions or more, not 1");
        List<OperatingPoint> fixed = KnobMap.of(Changed.with(HEATER, "ramp.pot", Optional.empty()), NOMINAL, 5);
        assertThat(fixed).hasSize(1);
        assertThat(fixed.get(0).position()).isEmpty();
        assertThat(fixed.get(0).rampOhms()).isEqualTo(5_600);
    }

    @Test
    void theGapUnderTheHoldingCurrentFollowsTheSine() {
        // i = (sqrt 2 V sin theta - D)/R reaches I_H at asin((I_H R + D)/(sqrt 2 V)), on either side of the zero.
        double drop = 1.0 + 2 * 0.9;
        double ohms = HEATER.load().resistanceOhms() + 0.02;
        double rad = 2 * Math.asin((30e-3 * ohms + drop) / (Math.sqrt(2) * 230));
        assertThat(HoldingGap.seconds(HEATER, NOMINAL, LoadPower.periodAtFiringAngle(HEATER, NOMINAL, 0), 30e-3))
                .isCloseTo(rad / NOMINAL.omega(), within(1e-12));
        assertThat(HoldingGap.seconds(HEATER, NOMINAL, LoadPower.periodAtFiringAngle(HEATER, NOMINAL, 0), 100))
                .isCloseTo(0.01, within(1e-12));
    }
}
