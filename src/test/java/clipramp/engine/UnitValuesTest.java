package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Changed;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Trimmers;
import java.lang.reflect.Field;
import java.lang.reflect.Modifier;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** One unit as plain numbers, against the design's own figures and the drifts of the data sheets, linear from 25 °C. */
class UnitValuesTest {
    private static final Condition WARM = new Condition(240, 60, 75);

    private static Network filled(Design design, Condition condition) {
        return NetworkOfDesign.of(design, condition, 33e3);
    }

    @Test
    void aNominalUnitHasThePartsOfItsDesign() {
        Network n = filled(SampleDesigns.heater(), new Condition(230, 50, 25));
        assertThat(n.dropperOhms).isEqualTo(10e3);
        assertThat(n.zenerSlopeOhms).isEqualTo(22);
        assertThat(n.zenerKneeVolts).as("20 V less 12.5 mA in 22 ohm").isCloseTo(19.725, within(1e-12));
        assertThat(n.rampOhms).isEqualTo(33e3);
        assertThat(n.capacitorFarads).isEqualTo(100e-9);
        assertThat(n.baseOneOhms).isEqualTo(39);
        assertThat(n.baseTwoOhms).isEqualTo(470);
        assertThat(n.standoff).isEqualTo(0.655);
        assertThat(n.interbaseOhms).isCloseTo(7000, within(1e-9));
        assertThat(n.emitterDropVolts).isEqualTo(0.47);
        assertThat(n.peakCurrentAmps).isEqualTo(1e-6);
        assertThat(n.valleySiemens).as("6 mA at 20 V").isCloseTo(3e-4, within(1e-15));
        assertThat(n.modulatedOhms).as("10 V by 15 mA").isCloseTo(666.667, within(1e-3));
        assertThat(n.programmable).isFalse();
        assertThat(n.peakShare()).isBetween(0.6, 0.65);
    }

    @Test
    void warmthMovesZenerBarAndEmitterDrop() {
        Network n = filled(SampleDesigns.heater(), WARM);
        assertThat(n.zenerKneeVolts).isCloseTo(20 * (1 + 0.85e-3 * 50) - 12.5e-3 * 22, within(1e-12));
        assertThat(n.interbaseOhms).isCloseTo(7000 * 1.25, within(1e-9));
        assertThat(n.emitterDropVolts).isCloseTo(0.47 - 0.125, within(1e-12));
        assertThat(n.onOhms)
                .as("the emitter line is drawn at 25 degrees")
                .isEqualTo(filled(SampleDesigns.heater(), new Condition(230, 50, 25)).onOhms);
    }

    /** R_A 10 k parallel R_B 18 k is 6.43 k: offset, peak-point and valley current of that gate resistance. */
    @Test
    void aProgrammableDeviceFollowsItsGateResistance() {
        Network n = filled(SampleDesigns.programmableHeater(), WARM);
        double share = Math.log(6428.571 / 10e3) / Math.log(100);
        assertThat(n.programmable).isTrue();
        assertThat(n.upperOhms).isEqualTo(10e3);
        assertThat(n.lowerOhms).isEqualTo(18e3);
        assertThat(n.emitterDropVolts).isCloseTo(0.35 + 0.35 * share, within(1e-6));
        assertThat(n.peakCurrentAmps).isCloseTo(4e-6 * Math.pow(1.25 / 4, share), within(1e-11));
        assertThat(n.valleySiemens).isCloseTo(15e-6 * Math.pow(18. / 150, share), within(1e-10));
        assertThat(n.onOhms).isCloseTo(4, within(1e-12));
        assertThat(n.onIntercept).isZero();
    }

    @Test
    void aConditionSetsLineAndTemperature() {
        UnitValues unit = UnitValues.nominal(SampleDesigns.heater());
        assertThat(unit.lineVolts).isEqualTo(230);
        assertThat(unit.lineHertz).isEqualTo(50);
        assertThat(unit.celsius).isEqualTo(25);
        assertThat(unit.at(WARM)).isSameAs(unit);
        assertThat(unit.lineVolts).isEqualTo(240);
        assertThat(unit.lineHertz).isEqualTo(60);
        assertThat(unit.celsius).isEqualTo(75);
    }

    @Test
    void theRampResistorIsWhatStandsInSeries() {
        UnitValues unit = UnitValues.nominal(SampleDesigns.heater());
        assertThat(unit.rampOhms(0)).isEqualTo(5600);
        assertThat(unit.rampOhms(0.25)).isCloseTo(5600 + 17_000, within(1e-9));
        assertThat(unit.usedTrackOhms(0.25)).isCloseTo(17_000, within(1e-9));
        unit.highTrimOhms = 1000;
        unit.potShuntOhms = 60_000;
        unit.lowTrimOhms = 8000;
        assertThat(unit.rampOhms(1)).as("68 k across 68 k").isCloseTo(5600 + 1000 + 34_000, within(1e-9));
        unit.trackOhms = 0;
        assertThat(unit.rampOhms(1)).isEqualTo(6600);
    }

    @Test
    void theEndResistanceIsAlwaysInUse() {
        Design design = Changed.with(SampleDesigns.heater(), "ramp.pot.endOhms", 100.0);
        UnitValues unit = UnitValues.nominal(design);
        assertThat(unit.rampOhms(0)).isCloseTo(5700, within(1e-9));
        assertThat(unit.usedTrackOhms(0.5)).isCloseTo(34_100, within(1e-9));
    }

    /** Each trimmer begins at half its track; the one across the pot stands in series with the resistor there. */
    @Test
    void trimmersBeginInTheirMiddle() {
        Design design = Changed.with(
                SampleDesigns.heater(),
                "ramp.trimmers",
                new Trimmers(
                        Optional.of(SampleDesigns.part(10_000, 0.2, 0.5)),
                        Optional.of(SampleDesigns.part(100_000, 0.2, 0.5))));
        Design shunted = Changed.with(design, "ramp.pot.shunt", Optional.of(SampleDesigns.part(220_000, 0.05, 0.25)));
        UnitValues unit = UnitValues.nominal(shunted);
        assertThat(unit.highTrimOhms).isEqualTo(5000);
        assertThat(unit.lowTrimOhms).isEqualTo(50_000);
        assertThat(unit.potShuntOhms).isCloseTo(220_000, within(1e-9));
        assertThat(unit.rampOhms(1)).isCloseTo(5600 + 5000 + 68e3 * 270e3 / 338e3, within(1e-6));
        assertThat(UnitValues.nominal(SampleDesigns.heater()).potShuntOhms).isInfinite();
    }

    /** Every drawn number is a part of the unit, but for the condition it stands at and how its trimmers are set. */
    @Test
    void aUnitIsTheSameWhileNoneOfItsPartsChanges() throws IllegalAccessException {
        Set<String> notItsOwn = Set.of("lineVolts", "lineHertz", "celsius", "highTrimOhms", "lowTrimOhms");
        double[] as = UnitValues.nominal(SampleDesigns.heater()).parts();
        for (Field field : UnitValues.class.getFields()) {
            if (Modifier.isStatic(field.getModifiers())) {
                continue;
            }
            UnitValues changed = UnitValues.nominal(SampleDesigns.heater());
            field.setDouble(changed, 12.34);
            if (notItsOwn.contains(field.getName())) {
                assertThat(changed.parts()).as(field.getName()).isEqualTo(as);
            } else {
                assertThat(changed.parts()).as(field.getName()).isNotEqualTo(as);
            }
        }
    }

    @Test
    void aDriftThatLeavesNothingIsRefused() {
        Design design = Changed.with(SampleDesigns.heater(), "clip.zener.driftPerKelvin", -0.02);
        assertThatThrownBy(() -> filled(design, WARM))
                .isInstanceOf(RefusedCircuit.class)
                .hasMessageContaining("nothing is left of the zener voltage at 75.0 °C");
        assertThat(filled(design, new Condition(230, 50, 74)).zenerKneeVolts).isPositive();
    }
}
