package clipramp.spread;

/**
 * How much one factor matters at mid-knob. The shares are estimates from a finite lot of units, so that small ones are noisy.
 *
 * @param path design key
 * @param name what people call it
 * @param firingLowRad firing angle with it at its lower limit and all else nominal, rad
 * @param firingHighRad the same at its upper limit, rad
 * @param fractionLow share of full power with it at its lower limit
 * @param fractionHigh the same at its upper limit
 * @param firstOrder share of the variance of power that it causes alone, 0..1 (Saltelli and others 2010)
 * @param total share of the variance of power that it has a part in, 0..1 (Jansen 1999)
 */
public record Influence(
        String path,
        String name,
        double firingLowRad,
        double firingHighRad,
        double fractionLow,
        double fractionHigh,
        double firstOrder,
        double total) {}
