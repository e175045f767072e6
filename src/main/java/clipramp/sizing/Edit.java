package clipramp.sizing;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Ramp;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Trimmers;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import java.util.Optional;
import java.util.OptionalDouble;

/** A design with one part changed. */
final class Edit {
    private Edit() {}

    static Design zener(Design design, Zener zener) {
        ClipSupply c = design.clip();
        return design.withClip(
                new ClipSupply(c.tap(), c.rectifier(), c.diodeDropVolts(), c.dropper(), zener, c.winding()));
    }

    static Design dropper(Design design, Part dropper) {
        ClipSupply c = design.clip();
        return design.withClip(
                new ClipSupply(c.tap(), c.rectifier(), c.diodeDropVolts(), dropper, c.zener(), c.winding()));
    }

    static Design capacitor(Design design, Part capacitor) {
        return design.withRamp(new Ramp(
                capacitor,
                design.ramp().fixed(),
                design.ramp().pot(),
                design.ramp().trimmers()));
    }

    static Design fixed(Design design, Part fixed) {
        return design.withRamp(new Ramp(
                design.ramp().capacitor(),
                fixed,
                design.ramp().pot(),
                design.ramp().trimmers()));
    }

    static Design pot(Design design, Pot pot) {
        Ramp r = design.ramp();
        return design.withRamp(new Ramp(r.capacitor(), r.fixed(), Optional.of(pot), r.trimmers()));
    }

    static Design track(Design design, Part track) {
        Pot pot = design.ramp().pot().orElseThrow();
        return pot(design, new Pot(track, pot.endOhms(), pot.law(), pot.sense(), pot.shunt()));
    }

    static Design law(Design design, PotLaw law) {
        Pot pot = design.ramp().pot().orElseThrow();
        return pot(design, new Pot(pot.track(), pot.endOhms(), law, pot.sense(), pot.shunt()));
    }

    static Design trimHigh(Design design, Optional<Part> high) {
        Ramp r = design.ramp();
        return design.withRamp(new Ramp(
                r.capacitor(),
                r.fixed(),
                r.pot(),
                new Trimmers(high, r.trimmers().low())));
    }

    static Design trimLow(Design design, Optional<Part> across, Optional<Part> low) {
        Ramp r = design.ramp();
        return design.withRamp(new Ramp(
                r.capacitor(),
                r.fixed(),
                r.pot().map(p -> new Pot(p.track(), p.endOhms(), p.law(), p.sense(), across)),
                new Trimmers(r.trimmers().high(), low)));
    }

    static Design device(Design design, Unijunction device) {
        Trigger t = design.trigger();
        Part baseTwo = t instanceof UnijunctionTrigger u ? u.baseTwo() : Part.of(470);
        return design.withTrigger(new UnijunctionTrigger(device, t.baseOne(), baseTwo));
    }

    static Design baseOne(Design design, Part part) {
        if (design.trigger() instanceof UnijunctionTrigger u) {
            return design.withTrigger(new UnijunctionTrigger(u.device(), part, u.baseTwo()));
        }
        ProgrammableTrigger p = (ProgrammableTrigger) design.trigger();
        return design.withTrigger(new ProgrammableTrigger(p.device(), part, p.upper(), p.lower()));
    }

    /** Base two's resistor of a unijunction; a programmable device has none and stays as it is. */
    static Design baseTwo(Design design, Part part) {
        return design.trigger() instanceof UnijunctionTrigger u
                ? design.withTrigger(new UnijunctionTrigger(u.device(), u.baseOne(), part))
                : design;
    }

    /** The divider of a programmable device; a unijunction has none and stays as it is. */
    static Design divider(Design design, Part upper, Part lower) {
        return design.trigger() instanceof ProgrammableTrigger p
                ? design.withTrigger(new ProgrammableTrigger(p.device(), p.baseOne(), upper, lower))
                : design;
    }

    static Design series(Design design, Part series) {
        return gate(design, series, design.gate().shunt(), design.gate().transformer());
    }

    static Design shunt(Design design, Optional<Part> shunt) {
        return gate(design, design.gate().series(), shunt, design.gate().transformer());
    }

    static Design transformer(Design design, PulseTransformer transformer) {
        return gate(design, design.gate().series(), design.gate().shunt(), Optional.of(transformer));
    }

    private static Design gate(
            Design design, Part series, Optional<Part> shunt, Optional<PulseTransformer> transformer) {
        GateDrive g = design.gate();
        return design.withGate(new GateDrive(
                g.coupling(), series, shunt, g.overdrive(), g.chargeSeconds(), g.polarity(), transformer));
    }

    static Design thyristor(Design design, ThyristorDevice device) {
        return design.withThyristor(new Thyristor(device, design.thyristor().caseToAmbientKelvinPerWatt()));
    }

    static Design sink(Design design, OptionalDouble caseToAmbient) {
        return design.withThyristor(new Thyristor(design.thyristor().device(), caseToAmbient));
    }
}
