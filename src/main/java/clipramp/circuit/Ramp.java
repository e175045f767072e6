package clipramp.circuit;

import java.util.Optional;

/**
 * The ramp: C_E charged through R_E, which is the fixed resistor and what the pot gives.
 *
 * @param capacitor C_E, F
 * @param fixed fixed part of R_E, ohm
 * @param pot the knob, or none for a fixed ramp
 */
public record Ramp(Part capacitor, Part fixed, Optional<Pot> pot) {
    /** No wiper's contact is nothing, and no circuit can tell less from this, ohm. */
    private static final double LEAST_OHMS = 0.01;

    public Ramp {
        Require.positive("ramp capacitor", capacitor.value());
        if (pot.isEmpty()) {
            Require.positive("fixed ramp resistor", fixed.value());
        }
    }

    /**
     * R_E at a knob position, nominal parts (model: knob).
     *
     * @param position 0 fully anticlockwise .. 1 fully clockwise; ignored for a fixed ramp
     * @return ohms
     */
    public double rampOhms(double position) {
        return Math.max(
                LEAST_OHMS, fixed.value() + pot.map(p -> p.ohms(position)).orElse(0.0));
    }
}
