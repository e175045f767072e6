package clipramp.circuit;

import java.util.OptionalDouble;

/**
 * The clipping zener: i_Z = max(0, (V - V_Z0)/r_z) with V_Z0 = V_Z - r_z I_ZT.
 *
 * @param id profile or in-place name
 * @param volts zener voltage at the test current, V
 * @param testCurrentAmps I_ZT, A
 * @param slopeOhms r_z, ohm
 * @param driftPerKelvin relative drift of the voltage from 25 °C, 1/K
 * @param ratedWatts rated dissipation, W, if stated
 */
public record Zener(
        String id,
        Characteristic volts,
        double testCurrentAmps,
        double slopeOhms,
        double driftPerKelvin,
        OptionalDouble ratedWatts) {
    public Zener {
        Require.positive("zener voltage", volts.nominal());
        Require.notNegative("zener test current", testCurrentAmps);
        Require.positive("zener slope", slopeOhms);
        Require.finite("zener drift", driftPerKelvin);
    }
}
