package clipramp.faults;

import clipramp.units.Unit;

/**
 * What a part bears beyond its rating.
 *
 * @param part design key
 * @param what which rating, in words
 * @param unit its unit
 * @param borne what there is; POSITIVE_INFINITY where only the line and its fuse limit it
 * @param rating what the part is rated at; NaN where it does not matter
 */
public record Burden(String part, String what, Unit unit, double borne, double rating) {
    /** A current that only the line and its fuse limit. */
    static Burden unlimited(String part, String what) {
        return new Burden(part, what, Unit.AMPERE, Double.POSITIVE_INFINITY, Double.NaN);
    }

    /** How many times its rating. */
    public double ratio() {
        return isUnlimited() ? Double.POSITIVE_INFINITY : borne / rating;
    }

    /** Whether only the line and its fuse limit it. */
    public boolean isUnlimited() {
        return borne == Double.POSITIVE_INFINITY;
    }

    boolean isOver() {
        return isUnlimited() || borne > rating;
    }
}
