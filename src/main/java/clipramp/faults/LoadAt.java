package clipramp.faults;

import java.util.OptionalDouble;

/**
 * What the load gets at one knob position.
 *
 * @param position of the knob, 0..1; empty for a fixed ramp
 * @param rampOhms R_E, ohm
 * @param firingRad firing angle, from the zero of the half cycle, rad; empty where the thyristor is not fired, or always on
 * @param watts power, W
 * @param fraction of full power, 0..1
 * @param rmsAmps rms current, A
 * @param dcAmps dc in the line, A, signed
 */
public record LoadAt(
        OptionalDouble position,
        double rampOhms,
        OptionalDouble firingRad,
        double watts,
        double fraction,
        double rmsAmps,
        double dcAmps) {}
