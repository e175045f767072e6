package clipramp.spread;

import java.util.Optional;

/**
 * What one change would do for the yield against what is wanted.
 *
 * @param path design key that is changed
 * @param change the change in words
 * @param yield yield with it
 * @param gain share of all units that it wins, -1..1
 * @param limits what the figure at the path would lie between; empty where the change is no figure of the design, such as
 *     a trimmer
 */
public record Remedy(String path, String change, Yield yield, double gain, Optional<Limits> limits) {
    /**
     * What a figure of the design would lie between.
     *
     * @param low least value, SI
     * @param nominal value of the nominal unit, SI
     * @param high greatest value, SI
     */
    public record Limits(double low, double nominal, double high) {}
}
