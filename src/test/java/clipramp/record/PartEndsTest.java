package clipramp.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.SampleDesigns;
import clipramp.circuit.Trigger;
import clipramp.power.OperatingPoint;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

class PartEndsTest {
    private static final Function<OperatingPoint, OptionalDouble> DELAY =
            point -> OptionalDouble.of(point.solution().shown().pulses().get(0).startSeconds());

    private static final Function<OperatingPoint, OptionalDouble> PEAK_POINT =
            point -> OptionalDouble.of(point.solution().shown().pulses().get(0).peakPointVolts());

    /** The heater with exact parts but for those that a test gives. */
    private static Design exact(Part capacitor, boolean anyTrigger) {
        Design heater = SampleDesigns.heater();
        Ramp ramp = heater.ramp();
        Pot pot = ramp.pot().orElseThrow();
        Trigger.UnijunctionTrigger trigger = (Trigger.UnijunctionTrigger) heater.trigger();
        var clip = heater.clip();
        var zener = clip.zener();
        Design design = heater.withRamp(new Ramp(
                        capacitor,
                        Part.of(ramp.fixed().value()),
                        Optional.of(new Pot(
                                Part.of(pot.track().value()), pot.endOhms(), pot.law(), pot.sense(), pot.shunt()))))
                .withClip(new clipramp.circuit.ClipSupply(
                        clip.tap(),
                        clip.rectifier(),
                        clip.diodeDropVolts(),
                        Part.of(clip.dropper().value()),
                        new clipramp.circuit.Zener(
                                zener.id(),
                                clipramp.circuit.Characteristic.exactly(
                                        zener.volts().nominal()),
                                zener.testCurrentAmps(),
                                zener.slopeOhms(),
                                zener.driftPerKelvin(),
                                zener.ratedWatts()),
                        clip.winding()));
        return anyTrigger
                ? design
                : design.withTrigger(new Trigger.ProgrammableTrigger(
                        SampleDesigns.programmable2n6027(), Part.of(47), Part.of(10_000), Part.of(18_000)));
    }

    @Test
    void exactPartsLeaveNoBand() {
        Design design = exact(Part.of(100e-9), false);
        PartEnds.Band band = new PartEnds(design, design.nominalCondition())
                .at(0.5)
                .band(DELAY)
                .orElseThrow();
        assertThat(band.low()).isEqualTo(band.nominal());
        assertThat(band.high()).isEqualTo(band.nominal());
        assertThat(band.sure()).isTrue();
    }

    /**
     * Every published form of the delay is proportional to C (Mehta, Principles of Electronics, 21.11); what the solved
     * one adds, the supply's rise, is not, hence the two per cent.
     */
    @Test
    void aCapacitorTenPerCentOffMovesTheDelayByAlmostTenPerCent() {
        Design design = exact(SampleDesigns.part(100e-9, 0.1, 1), false);
        PartEnds.Band band = new PartEnds(design, design.nominalCondition())
                .at(0.5)
                .band(DELAY)
                .orElseThrow();
        assertThat(band.high() / band.nominal()).isCloseTo(1.1, within(0.02));
        assertThat(band.low() / band.nominal()).isCloseTo(0.9, within(0.02));
    }

    /** V_P = eta V + V_D (Mehta 21.8), eta 0.56..0.75 of the sheet: ends about eta times the supply apart. */
    @Test
    void theStandoffRatioOfTheSheetSpreadsThePeakPoint() {
        Design design = exact(Part.of(100e-9), true);
        PartEnds.At at = new PartEnds(design, design.nominalCondition()).at(0.5);
        PartEnds.Band band = at.band(PEAK_POINT).orElseThrow();
        double supply = at.nominal().solution().shown().pulses().get(0).supplyVolts();
        assertThat(band.high() - band.low()).isBetween(0.17 * supply, 0.22 * supply);
        assertThat(band.low()).isLessThan(band.nominal());
        assertThat(band.high()).isGreaterThan(band.nominal());
    }

    @Test
    void whereAPartAtItsEndNoLongerFiresTheBandSaysSo() {
        Design design = SampleDesigns.heater().withRamp(SampleDesigns.ramp(150e-9, 4_700, 68_000));
        PartEnds.Band band = new PartEnds(design, design.nominalCondition())
                .at(0.15)
                .band(point -> point.solution().shown().endPulse().isPresent()
                        ? OptionalDouble.empty()
                        : point.solution().shown().firingRad())
                .orElseThrow();
        assertThat(band.sure()).isFalse();
    }
}
