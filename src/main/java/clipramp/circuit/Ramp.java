package clipramp.circuit;

import java.util.Optional;

/**
 * The ramp: C_E charged through R_E, which is the fixed resistor, what the pot gives, and presets that are set on every unit.
 *
 * @param capacitor C_E, F, above 0
 * @param fixed fixed part of R_E, ohm; 0 with a pot only
 * @param pot the knob, or none for a fixed ramp
 * @param trimmers presets in series with the fixed resistor and across the pot, if there are any
 */
public record Ramp(Part capacitor, Part fixed, Optional<Pot> pot, Trimmers trimmers) {
    /** No wiper's contact is nothing, and no circuit can tell less from this, ohm. */
    private static final double LEAST_OHMS = 0.01;

    /** @throws IllegalArgumentException outside the stated ranges, or with a low trimmer and no pot */
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

    /**
     * A ramp without trimmers.
     *
     * @throws IllegalArgumentException as the full constructor
     */
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
     * R_E at a knob position, nominal parts: the fixed resistor, what the pot's used section and its shunt leave, and the
     * trimmers at mid-track; never under 10 mohm.
     *
     * @param position 0 fully anticlockwise .. 1 fully clockwise; ignored for a fixed ramp
     * @return ohm
     * @throws IllegalArgumentException where there is a pot and the position lies outside 0..1
     */
    public double rampOhms(double position) {
        double used = pot.map(p ->
                        Pot.ohms(p.trackShare(position), p.endOhms(), p.track().value(), acrossOhms()))
                .orElse(0.0);
        return Math.max(LEAST_OHMS, seriesOhms() + used);
    }
}
