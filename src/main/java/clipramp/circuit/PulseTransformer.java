package clipramp.circuit;

import java.util.OptionalDouble;

/**
 * Pulse transformer between base one and the gate or gates.
 *
 * @param ratio n, primary over secondary turns, above 0
 * @param secondaries one or two
 * @param magnetisingHenries L_m at the primary, H, above 0
 * @param primaryOhms primary winding resistance, ohm, 0 or more
 * @param secondaryOhms resistance of one secondary, ohm, 0 or more
 * @param clampDiode whether a diode clamps the primary
 * @param voltSeconds rated volt-seconds at the primary, Vs, if stated
 */
public record PulseTransformer(
        double ratio,
        int secondaries,
        double magnetisingHenries,
        double primaryOhms,
        double secondaryOhms,
        boolean clampDiode,
        OptionalDouble voltSeconds) {
    /** @throws IllegalArgumentException outside the stated ranges */
    public PulseTransformer {
        Require.positive("transformer ratio", ratio);
        Require.positive("magnetising inductance", magnetisingHenries);
        Require.notNegative("primary resistance", primaryOhms);
        Require.notNegative("secondary resistance", secondaryOhms);
        if (secondaries != 1 && secondaries != 2) {
            throw new IllegalArgumentException("a pulse transformer has one or two secondaries, not " + secondaries);
        }
    }
}
