package clipramp.circuit;

import java.util.OptionalDouble;

/**
 * The power switch as mounted.
 *
 * @param device SCR or triac
 * @param caseToAmbientKelvinPerWatt thermal resistance from case to ambient, K/W, if stated
 */
public record Thyristor(ThyristorDevice device, OptionalDouble caseToAmbientKelvinPerWatt) {}
