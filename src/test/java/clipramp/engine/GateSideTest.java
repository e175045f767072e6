package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.circuit.TriggerDemand;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Gate drive and thyristor in the network, against the sheets' figures and DEVELOPERS.md (Thyristor). */
class GateSideTest {
    private static Network at(Design design, double celsius) {
        return NetworkOfDesign.of(design, new Condition(230, 50, celsius), 33e3);
    }

    @Test
    void theGatesPartsAndJunctionAreTheDesigns() {
        Design design = Changed.with(SampleDesigns.heater(), "gate.series", SampleDesigns.part(22, 0.05, 0.25));
        Network n = at(design, 25);
        assertThat(n.gateSeriesOhms).isEqualTo(22);
        assertThat(n.gateShuntSiemens).isCloseTo(1e-3, within(1e-15));
        assertThat(n.gateKneeVolts).isEqualTo(0.7);
        assertThat(n.gateSlopeOhms).isEqualTo(10);
        assertThat(n.turnOnSeconds).isEqualTo(1.5e-6);
        assertThat(n.transformerCoupled).isFalse();
        assertThat(n.clampVolts).isInfinite();
        Network bare = at(Changed.with(design, "gate.shunt", Optional.empty()), 25);
        assertThat(bare.gateShuntSiemens).isZero();
        Network instant = at(Changed.with(design, "thyristor.device.gate.turnOnSeconds", OptionalDouble.empty()), 25);
        assertThat(instant.turnOnSeconds).isZero();
    }

    /** 10 mA at 25 and 20 mA at -40 degrees. */
    @Test
    void anScrsTriggerCurrentIsItsOwnAtItsTemperature() {
        assertThat(at(SampleDesigns.heater(), 25).triggerAmps).isCloseTo(10e-3, within(1e-12));
        assertThat(at(SampleDesigns.heater(), -40).triggerAmps).isCloseTo(20e-3, within(1e-12));
    }

    /** Positive pulses meet I+ and III+, negative ones I- and III-; the worse of the two counts. */
    @Test
    void aTriacsTriggerCurrentIsThatOfTheWorseQuadrant() {
        assertThat(at(SampleDesigns.triacHeater(), 25).triggerAmps).isCloseTo(25e-3, within(1e-12));
        Design negative = Changed.with(SampleDesigns.triacHeater(), "gate.polarity", Polarity.NEGATIVE);
        assertThat(at(negative, 25).triggerAmps).isCloseTo(10e-3, within(1e-12));
        ThyristorDevice triac = SampleDesigns.triac8Amps();
        assertThat(NetworkOfDesign.triggerDemand(triac, Polarity.POSITIVE, 25).ampsAt(25))
                .isCloseTo(25e-3, within(1e-12));
        assertThat(NetworkOfDesign.triggerDemand(triac, Polarity.NEGATIVE, 25).ampsAt(25))
                .isCloseTo(10e-3, within(1e-12));
    }

    /** Of two quadrants that change places with the cold, the one that is worse there. */
    @Test
    void theWorseQuadrantIsThatOfTheTemperature() {
        TriggerDemand steep = points(10e-3, 80e-3);
        TriggerDemand level = points(20e-3, 25e-3);
        ThyristorDevice triac = Changed.with(
                SampleDesigns.triac8Amps(), "gate.quadrants", Map.of(Quadrant.I_PLUS, steep, Quadrant.III_PLUS, level));
        assertThat(NetworkOfDesign.triggerDemand(triac, Polarity.POSITIVE, 25)).isEqualTo(level);
        assertThat(NetworkOfDesign.triggerDemand(triac, Polarity.POSITIVE, -40)).isEqualTo(steep);
    }

    private static TriggerDemand points(double amps, double coldAmps) {
        return new TriggerDemand(
                List.of(new TriggerDemand.Point(-40, coldAmps, 2), new TriggerDemand.Point(25, amps, 1.3)));
    }

    @Test
    void aQuadrantThatTheSheetLacksIsPassedOver() {
        ThyristorDevice one =
                Changed.with(SampleDesigns.triac8Amps(), "gate.quadrants", Map.of(Quadrant.I_PLUS, points(7e-3, 9e-3)));
        assertThat(NetworkOfDesign.triggerDemand(one, Polarity.POSITIVE, 25).ampsAt(25))
                .isCloseTo(7e-3, within(1e-12));
        assertThat(NetworkOfDesign.triggerDemand(one, Polarity.NEGATIVE, 25))
                .as("neither: what the sheet gives without a quadrant")
                .isEqualTo(SampleDesigns.triac8Amps().gate().trigger());
    }

    @Test
    void anScrAsksNoQuadrants() {
        ThyristorDevice scr = Changed.with(
                SampleDesigns.scr16Amps(), "gate.quadrants", Map.of(Quadrant.I_PLUS, points(70e-3, 90e-3)));
        assertThat(NetworkOfDesign.triggerDemand(scr, Polarity.POSITIVE, 25))
                .isEqualTo(SampleDesigns.scr16Amps().gate().trigger());
    }

    /** 0.7 V over 1 kilohm parallel (22 + 39) ohm: 12.2 mA on top of the sheet's 40 mA. */
    @Test
    void aConductingScrsGateLosesCurrentThatLatchingMustBring() {
        Design design = Changed.with(SampleDesigns.heater(), "gate.series", SampleDesigns.part(22, 0.05, 0.25));
        double bleed = 0.7 / 1000 + 0.7 / 61;
        assertThat(NetworkOfDesign.gateBleedAmps(design)).isCloseTo(bleed, within(1e-12));
        assertThat(at(design, 25).latchingAmps).isCloseTo(40e-3 + bleed, within(1e-12));
        assertThat(at(design, -40).latchingAmps).isCloseTo(60e-3 + bleed, within(1e-12));
        Design unknown = Changed.with(design, "thyristor.device.latching", Optional.empty());
        assertThat(at(unknown, 25).latchingAmps).isZero();
    }

    @Test
    void behindATransformerOnlyTheShuntBleeds() {
        assertThat(NetworkOfDesign.gateBleedAmps(SampleDesigns.inverseParallelHeater()))
                .isCloseTo(0.7e-3, within(1e-12));
        assertThat(at(SampleDesigns.inverseParallelHeater(), 25).latchingAmps).isCloseTo(40.7e-3, within(1e-12));
        assertThat(GateSide.bleedAmps(Kind.TRIAC, false, 61, 1e-3)).isZero();
        assertThat(at(SampleDesigns.triacHeater(), 25).latchingAmps).isCloseTo(40e-3, within(1e-12));
    }

    @Test
    void aPulseTransformerIsTheDesigns() {
        Design design = Changed.with(SampleDesigns.inverseParallelHeater(), "gate.transformer.ratio", 2.0);
        Design uneven = Changed.with(design, "gate.transformer.secondaryOhms", 0.3);
        Network n = at(uneven, 25);
        assertThat(n.transformerCoupled).isTrue();
        assertThat(n.turnsRatio).isEqualTo(2);
        assertThat(n.secondaries).isEqualTo(2);
        assertThat(n.magnetisingHenries).isEqualTo(2e-3);
        assertThat(n.primaryOhms).isEqualTo(0.5);
        assertThat(n.secondaryOhms).isEqualTo(0.3);
        assertThat(n.clampVolts).as("the supply's kind of diode").isEqualTo(0.7);
        Network open = at(Changed.with(uneven, "gate.transformer.clampDiode", false), 25);
        assertThat(open.clampVolts).isInfinite();
    }
}
