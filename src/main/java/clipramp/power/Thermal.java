package clipramp.power;

import clipramp.circuit.Thyristor;
import java.util.OptionalDouble;

/** Heat from the thyristor's junction to the air: T_J = T_A + P (R_thJC + R_thCA). */
public final class Thermal {
    private Thermal() {}

    /**
     * Junction temperature.
     *
     * @param thyristor device and sink
     * @param watts on-state loss of one thyristor, W
     * @param ambientCelsius air, °C
     * @return °C; empty where one of the thermal resistances is not stated
     */
    public static OptionalDouble junctionCelsius(Thyristor thyristor, double watts, double ambientCelsius) {
        OptionalDouble inside = thyristor.device().junctionToCaseKelvinPerWatt();
        OptionalDouble outside = thyristor.caseToAmbientKelvinPerWatt();
        return inside.isEmpty() || outside.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(ambientCelsius + watts * (inside.getAsDouble() + outside.getAsDouble()));
    }

    /**
     * The largest thermal resistance from case to air that keeps a junction at its limit: (T_J - T_A)/P - R_thJC.
     *
     * @param junctionCelsius highest junction temperature, °C
     * @param ambientCelsius air, °C
     * @param watts loss, W, above zero
     * @param junctionToCaseKelvinPerWatt R_thJC, K/W
     * @return K/W; negative where no sink is good enough
     */
    public static double largestCaseToAmbient(
            double junctionCelsius, double ambientCelsius, double watts, double junctionToCaseKelvinPerWatt) {
        return (junctionCelsius - ambientCelsius) / watts - junctionToCaseKelvinPerWatt;
    }
}
