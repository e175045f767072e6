package clipramp.circuit;

/**
 * Where the design must work.
 *
 * @param coldestCelsius lowest ambient temperature that the design must work at, °C
 * @param hottestCelsius highest ambient temperature that the design must work at, °C
 */
public record Surroundings(double coldestCelsius, double hottestCelsius) {
    /** @throws IllegalArgumentException where the coldest lies above the hottest, or either is no finite number */
    public Surroundings {
        Require.finite("coldest", coldestCelsius);
        Require.finite("hottest", hottestCelsius);
        if (coldestCelsius > hottestCelsius) {
            throw new IllegalArgumentException(
                    "coldest (" + coldestCelsius + " °C) lies above hottest (" + hottestCelsius + " °C)");
        }
    }
}
