package clipramp.circuit;

/**
 * @param coldestCelsius lowest ambient temperature that the design must work at, °C
 * @param hottestCelsius highest ambient temperature that the design must work at, °C
 */
public record Surroundings(double coldestCelsius, double hottestCelsius) {
    public Surroundings {
        Require.finite("coldest", coldestCelsius);
        Require.finite("hottest", hottestCelsius);
        if (coldestCelsius > hottestCelsius) {
            throw new IllegalArgumentException(
                    "coldest (" + coldestCelsius + " °C) lies above hottest (" + hottestCelsius + " °C)");
        }
    }
}
