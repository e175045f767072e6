package clipramp.fit;

/**
 * Two values that the readings tell only together.
 *
 * @param first path of the one
 * @param second path of the other
 * @param correlation -1..1; positive: both larger look alike
 */
public record Together(String first, String second, double correlation) {}
