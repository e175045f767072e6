package clipramp.engine;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Trimmers;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.units.QuantityText;
import clipramp.units.Unit;

/**
 * One unit built to a design, as plain numbers: what its parts and devices really are at 25 °C, and what line and
 * temperature it stands at. A mutable kitchen vessel: whoever draws many units changes the public fields and calls {@link
 * #fill} again, which allocates nothing.
 */
public final class UnitValues {
    /** rms of the line's fundamental, V. */
    public double lineVolts;
    /** Line frequency, Hz. */
    public double lineHertz;
    /** Ambient temperature, °C. */
    public double celsius;
    /** R_D, ohm. */
    public double dropperOhms;
    /** C_E, F. */
    public double capacitorFarads;
    /** Fixed part of R_E, ohm. */
    public double fixedOhms;
    /** Pot track, ohm; 0 for none. */
    public double trackOhms;
    /** Resistor across the pot's used section, ohm; POSITIVE_INFINITY for none. */
    public double potShuntOhms;
    /** What the trimmer in series with the fixed resistor is set to, ohm; 0 for none. */
    public double highTrimOhms;
    /** What the trimmer across the pot is set to, in series with the resistor there, ohm; 0 for none. */
    public double lowTrimOhms;
    /** R1, ohm. */
    public double baseOneOhms;
    /** R2, ohm. */
    public double baseTwoOhms;
    /** R_A of a programmable device, ohm. */
    public double upperOhms;
    /** R_B of a programmable device, ohm. */
    public double lowerOhms;
    /** R_G, ohm. */
    public double gateSeriesOhms;
    /** R_GK, ohm; POSITIVE_INFINITY for none. */
    public double gateShuntOhms;
    /** V_Z, V. */
    public double zenerVolts;
    /** eta. */
    public double standoff;
    /** R_BB, ohm. */
    public double interbaseOhms;
    /** Relative drift of R_BB, 1/K. */
    public double interbaseDrift;
    /** V_D, or a programmable device's offset, V. */
    public double emitterDropVolts;
    /** Drift of V_D, V/K. */
    public double emitterDrift;
    /** I_P, A. */
    public double peakCurrentAmps;
    /** I_V, A. */
    public double valleyAmps;
    /** V_V, V. */
    public double valleyVolts;
    /** V_EB1(sat), or a programmable device's V_F, V. */
    public double saturationVolts;
    /** I_B2(mod), A; NaN where the sheet has none. */
    public double modulatedAmps = Double.NaN;
    /** V_OB1, V; NaN where the sheet has none. */
    public double baseOnePulseVolts = Double.NaN;

    // What the design fixes for every unit.
    final boolean programmable;
    final double zenerSlopeOhms;
    final double zenerTestAmps;
    final double zenerDrift;
    final double potEndOhms;
    final double valleyAtVolts;
    final double saturationAmps;
    final double saturationAtVolts;
    final double modulatedAtVolts;
    final double pulseSupplyVolts;
    final double pulseBaseOneOhms;
    final String deviceId;
    private final GateSide gate;

    private UnitValues(Design design) {
        lineVolts = design.line().volts();
        lineHertz = design.line().hertz();
        celsius = Condition.SHEET_CELSIUS;
        parts(design);
        Zener zener = design.clip().zener();
        zenerSlopeOhms = zener.slopeOhms();
        zenerTestAmps = zener.testCurrentAmps();
        zenerDrift = zener.driftPerKelvin();
        potEndOhms = design.ramp().pot().map(Pot::endOhms).orElse(0.0);
        gate = new GateSide(design);
        deviceId = design.trigger().deviceId();
        if (design.trigger() instanceof UnijunctionTrigger trigger) {
            Unijunction device = trigger.device();
            programmable = false;
            baseTwoOhms = trigger.baseTwo().value();
            unijunction(device);
            valleyAtVolts = device.valley().atVolts();
            saturationAmps = device.saturation().amps();
            saturationAtVolts = device.saturation().atVolts();
            modulatedAtVolts =
                    device.modulated().map(Unijunction.Modulated::atVolts).orElse(Double.NaN);
            pulseSupplyVolts = device.baseOnePulse().map(p -> p.supplyVolts()).orElse(Double.NaN);
            pulseBaseOneOhms = device.baseOnePulse().map(p -> p.baseOneOhms()).orElse(Double.NaN);
        } else {
            ProgrammableTrigger trigger = (ProgrammableTrigger) design.trigger();
            programmable = true;
            programmable(trigger);
            valleyAtVolts = ProgrammableDevice.VALLEY_VOLTS;
            saturationAmps = trigger.device().forwardAmps();
            saturationAtVolts = Double.NaN;
            modulatedAtVolts = Double.NaN;
            pulseSupplyVolts = Double.NaN;
            pulseBaseOneOhms = Double.NaN;
        }
    }

    private void parts(Design design) {
        dropperOhms = design.clip().dropper().value();
        zenerVolts = design.clip().zener().volts().nominal();
        capacitorFarads = design.ramp().capacitor().value();
        fixedOhms = design.ramp().fixed().value();
        trackOhms = design.ramp().pot().map(p -> p.track().value()).orElse(0.0);
        highTrimOhms = Trimmers.nominalOhms(design.ramp().trimmers().high());
        lowTrimOhms = Trimmers.nominalOhms(design.ramp().trimmers().low());
        potShuntOhms = design.ramp().acrossOhms() - lowTrimOhms;
        baseOneOhms = design.trigger().baseOne().value();
        gateSeriesOhms = design.gate().series().value();
        gateShuntOhms = design.gate().shunt().map(Part::value).orElse(Double.POSITIVE_INFINITY);
    }

    private void unijunction(Unijunction device) {
        standoff = device.standoff().nominal();
        interbaseOhms = device.interbaseOhms().nominal();
        interbaseDrift = device.interbaseDriftPerKelvin().nominal();
        emitterDropVolts = device.emitterDropVolts().nominal();
        emitterDrift = device.emitterDriftVoltsPerKelvin().nominal();
        peakCurrentAmps = device.peakCurrentAmps().nominal();
        valleyAmps = device.valley().amps().nominal();
        valleyVolts = device.valley().volts().nominal();
        saturationVolts = device.saturation().volts().nominal();
        modulatedAmps = device.modulated().map(m -> m.amps().nominal()).orElse(Double.NaN);
        baseOnePulseVolts = device.baseOnePulse()
                .map(Unijunction.BaseOnePulse::nominalVolts)
                .orElse(Double.NaN);
    }

    private void programmable(ProgrammableTrigger trigger) {
        ProgrammableUnijunction device = trigger.device();
        upperOhms = trigger.upper().value();
        lowerOhms = trigger.lower().value();
        double gateOhms = ProgrammableDevice.gateOhms(trigger);
        emitterDropVolts = ProgrammableDevice.offsetVolts(device, gateOhms, Characteristic::nominal);
        peakCurrentAmps = ProgrammableDevice.amps(device.peakCurrentAmps(), gateOhms, Characteristic::nominal);
        valleyAmps = ProgrammableDevice.amps(device.valleyCurrentAmps(), gateOhms, Characteristic::nominal);
        saturationVolts = device.forwardVolts().nominal();
    }

    /** Every part and device at its nominal value, line nominal, 25 °C. */
    public static UnitValues nominal(Design design) {
        return new UnitValues(design);
    }

    /** Puts the unit at a condition; gives the unit back. */
    public UnitValues at(Condition condition) {
        lineVolts = condition.lineVolts();
        lineHertz = condition.lineHertz();
        celsius = condition.celsius();
        return this;
    }

    /** All that is drawn of the unit itself, its line, its temperature and its trimmers left out: the same unit by content. */
    public double[] parts() {
        return new double[] {
            dropperOhms,
            capacitorFarads,
            fixedOhms,
            trackOhms,
            potShuntOhms,
            baseOneOhms,
            baseTwoOhms,
            upperOhms,
            lowerOhms,
            gateSeriesOhms,
            gateShuntOhms,
            zenerVolts,
            standoff,
            interbaseOhms,
            interbaseDrift,
            emitterDropVolts,
            emitterDrift,
            peakCurrentAmps,
            valleyAmps,
            valleyVolts,
            saturationVolts,
            modulatedAmps,
            baseOnePulseVolts
        };
    }

    /** R_E of this unit with a share 0..1 of its track in use, ohm. */
    public double rampOhms(double trackShare) {
        double across = potShuntOhms + lowTrimOhms;
        return fixedOhms + highTrimOhms + (trackOhms == 0 ? 0 : Pot.ohms(trackShare, potEndOhms, trackOhms, across));
    }

    /** The pot's used section by itself with a share 0..1 of the track in use, nothing across it, ohm. */
    public double usedTrackOhms(double trackShare) {
        return potEndOhms + trackOhms * trackShare;
    }

    /**
     * Works out the network of this unit at its line and temperature.
     *
     * @param n network to fill and derive
     * @param rampOhms R_E, ohm, above 0
     * @throws RefusedCircuit where the device's data contradict themselves
     */
    public void fill(Network n, double rampOhms) {
        double warmth = celsius - Condition.SHEET_CELSIUS;
        n.dropperOhms = dropperOhms;
        n.zenerSlopeOhms = zenerSlopeOhms;
        n.zenerKneeVolts =
                warmed("clip.zener", "zener voltage", zenerVolts, zenerDrift) - zenerSlopeOhms * zenerTestAmps;
        n.rampOhms = rampOhms;
        n.capacitorFarads = capacitorFarads;
        n.baseOneOhms = baseOneOhms;
        n.peakCurrentAmps = peakCurrentAmps;
        n.valleySiemens = valleyAmps / valleyAtVolts;
        n.programmable = programmable;
        if (programmable) {
            n.upperOhms = upperOhms;
            n.lowerOhms = lowerOhms;
            n.emitterDropVolts = emitterDropVolts;
            n.onIntercept = 0;
            n.onOhms = ProgrammableDevice.onOhms(saturationVolts, saturationAmps, deviceId);
        } else {
            n.baseTwoOhms = baseTwoOhms;
            n.standoff = standoff;
            n.interbaseOhms = warmed("trigger.device", "interbase resistance", interbaseOhms, interbaseDrift);
            n.emitterDropVolts = emitterDropVolts + emitterDrift * warmth;
            n.modulatedOhms = modulatedOhms(n.interbaseOhms);
            n.onOhms = EmitterLine.slopeOhms(this);
            n.onIntercept = EmitterLine.intercept(this, n.onOhms);
        }
        gate.fill(n, this);
        n.derive();
    }

    /** A sheet's value at this unit's temperature; a drift that leaves nothing of it is no drift of a real part. */
    private double warmed(String path, String name, double at25, double driftPerKelvin) {
        double share = 1 + driftPerKelvin * (celsius - Condition.SHEET_CELSIUS);
        if (!(share > 0)) {
            throw new RefusedCircuit(
                    path,
                    "with a drift of " + QuantityText.format(driftPerKelvin, Unit.PER_KELVIN)
                            + " nothing is left of the " + name + " at " + celsius
                            + " °C. Check the drift against the data sheet, or stay nearer to 25 °C.");
        }
        return at25 * share;
    }

    /** R_B2on for a base bar of so many ohms, ohm: V/I_B2(mod) where the sheet has it, else (1 - eta) R_BB. */
    double modulatedOhms(double barOhms) {
        return Double.isNaN(modulatedAmps) ? (1 - standoff) * barOhms : modulatedAtVolts / modulatedAmps;
    }
}
