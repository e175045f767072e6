package clipramp.circuit;

import java.util.OptionalDouble;

/**
 * The clipping zener: i_Z = max(0, (V_S - V_Z0)/r_z) with V_Z0 = V_Z - r_z I_ZT.
 *
 * @param id profile or in-place name
 * @param volts V_Z, at the test current and 25 °C, V, above 0
 * @param testCurrentAmps I_ZT, A, 0 or more
 * @param slopeOhms r_z, ohm, above 0
 * @param driftPerKelvin relative drift of V_Z from 25 °C, 1/K
 * @param ratedWatts rated dissipation, W, if stated
 */
public record Zener(
        String id,
        Characteristic volts,
        double testCurrentAmps,
        double slopeOhms,
        double driftPerKelvin,
        OptionalDouble ratedWatts) {
    /** @throws IllegalArgumentException outside the stated ranges */
    public Zener {
        Require.positive("zener voltage", volts.nominal());
        Require.notNegative("zener test current", testCurrentAmps);
        Require.positive("zener slope", slopeOhms);
        Require.finite("zener drift", driftPerKelvin);
    }
}
