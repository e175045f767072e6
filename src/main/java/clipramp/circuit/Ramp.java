package clipramp.circuit;

import java.util.Optional;

/**
 * The ramp: C_E charged through R_E, which is the fixed resistor, what the pot gives, and presets that are set on every unit.
 *
 * @param capacitor C_E, F
 * @param fixed fixed part of R_E, ohm
 * @param pot the knob, or none for a fixed ramp
 * @param trimmers presets in series with the fixed resistor and across the pot, if there are any
 */
public record Ramp(Part capacitor, Part fixed, Optional<Pot> pot, Trimmers trimmers) {
    /** No wiper's contact is nothing, and no circuit can tell less from this, ohm. */
    private static final double LEAST_OHMS = 0.01;

    public Ramp {
        Require.positive("ramp capacitor", capacitor.value());
        if (pot.isEmpty()) {
            Require.positive("fixed ramp resistor", fixed.value());
            if (trimmers.low().isPresent()) {
                throw new IllegalArgumentException(
                        "a trimmer for the lowest setting lies across a pot, and there is none");
            }
        }
    }

    /** A ramp without trimmers. */
    public Ramp(Part capacitor, Part fixed, Optional<Pot> pot) {
        this(capacitor, fixed, pot, Trimmers.NONE);
    }

    /** The fixed resistor and its trimmer at mid-track, ohm. */
    public double seriesOhms() {
        return fixed.value() + Trimmers.nominalOhms(trimmers.high());
    }

    /** What lies across the pot's used section, its trimmer at mid-track, ohm; POSITIVE_INFINITY for nothing. */
    public double acrossOhms() {
        Optional<Part> shunt = pot.flatMap(Pot::shunt);
        return shunt.isEmpty() && trimmers.low().isEmpty()
                ? Double.POSITIVE_INFINITY
                : shunt.map(Part::value).orElse(0.0) + Trimmers.nominalOhms(trimmers.low());
    }

    /**
     * R_E at a knob position, nominal parts (model: knob).
     *
     * @param position 0 fully anticlockwise .. 1 fully clockwise; ignored for a fixed ramp
     * @return ohms
     */
    public double rampOhms(double position) {
        double used = pot.map(p ->
                        Pot.ohms(p.trackShare(position), p.endOhms(), p.track().value(), acrossOhms()))
                .orElse(0.0);
        return Math.max(LEAST_OHMS, seriesOhms() + used);
    }
}
