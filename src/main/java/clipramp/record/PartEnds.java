package clipramp.record;

import clipramp.circuit.Characteristic;
import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.Ramp;
import clipramp.circuit.RefusedCircuit;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.power.KnobMap;
import clipramp.power.OperatingPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

/**
 * How far a good unit may read from the nominal one: every part that sets the timing goes to either end of its tolerance
 * or data sheet, one at a time, and the shifts to either side are summed. That is the worst case of a circuit whose parts
 * act apart, and a wide one.
 */
final class PartEnds {
    /**
     * A reading and how far off it may be.
     *
     * @param nominal of the nominal unit, in the reading's SI unit
     * @param low least of a good unit
     * @param high greatest of a good unit
     * @param sure whether a part at either end still gives a reading at all
     */
    record Band(double nominal, double low, double high, boolean sure) {}

    private final Condition condition;
    private final List<Design[]> ends = new ArrayList<>();
    private final Design nominal;

    PartEnds(Design design, Condition condition) {
        this.condition = condition;
        this.nominal = design;
        ClipSupply clip = design.clip();
        Ramp ramp = design.ramp();
        part(clip.dropper(), part -> design.withClip(withDropper(clip, part)));
        characteristic(clip.zener().volts(), volts -> design.withClip(withZener(clip, volts)));
        part(ramp.capacitor(), part -> design.withRamp(new Ramp(part, ramp.fixed(), ramp.pot(), ramp.trimmers())));
        part(ramp.fixed(), part -> design.withRamp(new Ramp(ramp.capacitor(), part, ramp.pot(), ramp.trimmers())));
        ramp.pot().ifPresent(pot -> part(pot.track(), part -> design.withRamp(withTrack(ramp, pot, part))));
        if (design.trigger() instanceof Trigger.UnijunctionTrigger trigger) {
            unijunction(design, trigger);
        } else if (design.trigger() instanceof Trigger.ProgrammableTrigger trigger) {
            part(
                    trigger.upper(),
                    part -> design.withTrigger(new Trigger.ProgrammableTrigger(
                            trigger.device(), trigger.baseOne(), part, trigger.lower())));
            part(
                    trigger.lower(),
                    part -> design.withTrigger(new Trigger.ProgrammableTrigger(
                            trigger.device(), trigger.baseOne(), trigger.upper(), part)));
        }
    }

    private void unijunction(Design design, Trigger.UnijunctionTrigger trigger) {
        Unijunction device = trigger.device();
        characteristic(
                device.standoff(),
                value -> design.withTrigger(new Trigger.UnijunctionTrigger(
                        with(device, value, device.interbaseOhms()), trigger.baseOne(), trigger.baseTwo())));
        characteristic(
                device.interbaseOhms(),
                value -> design.withTrigger(new Trigger.UnijunctionTrigger(
                        with(device, device.standoff(), value), trigger.baseOne(), trigger.baseTwo())));
        part(
                trigger.baseOne(),
                part -> design.withTrigger(new Trigger.UnijunctionTrigger(device, part, trigger.baseTwo())));
    }

    private void part(Part part, Function<Part, Design> with) {
        if (!part.tolerance().isNone()) {
            ends.add(new Design[] {with.apply(part.withValue(part.lowest())), with.apply(part.withValue(part.highest()))
            });
        }
    }

    private void characteristic(Characteristic value, Function<Characteristic, Design> with) {
        if (value.lowest() < value.highest()) {
            ends.add(new Design[] {
                with.apply(Characteristic.exactly(value.lowest())), with.apply(Characteristic.exactly(value.highest()))
            });
        }
    }

    private static ClipSupply withDropper(ClipSupply clip, Part dropper) {
        return new ClipSupply(
                clip.tap(), clip.rectifier(), clip.diodeDropVolts(), dropper, clip.zener(), clip.winding());
    }

    private static ClipSupply withZener(ClipSupply clip, Characteristic volts) {
        Zener zener = clip.zener();
        return new ClipSupply(
                clip.tap(),
                clip.rectifier(),
                clip.diodeDropVolts(),
                clip.dropper(),
                new Zener(
                        zener.id(),
                        volts,
                        zener.testCurrentAmps(),
                        zener.slopeOhms(),
                        zener.driftPerKelvin(),
                        zener.ratedWatts()),
                clip.winding());
    }

    private static Ramp withTrack(Ramp ramp, Pot pot, Part track) {
        return new Ramp(
                ramp.capacitor(),
                ramp.fixed(),
                Optional.of(new Pot(track, pot.endOhms(), pot.law(), pot.sense(), pot.shunt())),
                ramp.trimmers());
    }

    private static Unijunction with(Unijunction device, Characteristic standoff, Characteristic interbase) {
        return new Unijunction(
                device.id(),
                standoff,
                interbase,
                device.interbaseDriftPerKelvin(),
                device.emitterDropVolts(),
                device.emitterDriftVoltsPerKelvin(),
                device.peakCurrentAmps(),
                device.valley(),
                device.saturation(),
                device.modulated(),
                device.baseOnePulse(),
                device.limits());
    }

    /**
     * The solved ends at one knob position.
     *
     * @param position 0..1; any for a fixed ramp
     */
    At at(double position) {
        List<Optional<OperatingPoint[]>> solved = new ArrayList<>();
        for (Design[] pair : ends) {
            solved.add(solve(pair, position));
        }
        return new At(KnobMap.at(nominal, condition, position), solved);
    }

    private Optional<OperatingPoint[]> solve(Design[] pair, double position) {
        try {
            return Optional.of(new OperatingPoint[] {
                KnobMap.at(pair[0], condition, position), KnobMap.at(pair[1], condition, position)
            });
        } catch (RefusedCircuit refused) {
            // A part at its end may make a circuit that cannot be built; then there is no band to print.
            return Optional.empty();
        }
    }

    /** A knob position solved at nominal parts and at every end. */
    record At(OperatingPoint nominal, List<Optional<OperatingPoint[]>> ends) {
        /** Band of a reading; empty where the nominal circuit has none. */
        Optional<Band> band(Function<OperatingPoint, OptionalDouble> reading) {
            OptionalDouble middle = reading.apply(nominal);
            if (middle.isEmpty()) {
                return Optional.empty();
            }
            double value = middle.getAsDouble();
            double low = value;
            double high = value;
            boolean sure = true;
            for (Optional<OperatingPoint[]> pair : ends) {
                double below = 0;
                double above = 0;
                sure &= pair.isPresent();
                for (OperatingPoint end : pair.orElse(new OperatingPoint[0])) {
                    OptionalDouble there = reading.apply(end);
                    sure &= there.isPresent();
                    double shift = there.orElse(value) - value;
                    below = Math.min(below, shift);
                    above = Math.max(above, shift);
                }
                low += below;
                high += above;
            }
            return Optional.of(new Band(value, low, high, sure));
        }
    }
}
