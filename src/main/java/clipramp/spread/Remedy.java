package clipramp.spread;

/**
 * What one change would do for the yield against what is wanted.
 *
 * @param path design key that is changed
 * @param change the change in words
 * @param yield yield with it
 * @param gain share of all units that it wins, may be negative
 */
public record Remedy(String path, String change, Yield yield, double gain) {}
