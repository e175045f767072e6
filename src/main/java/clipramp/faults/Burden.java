package clipramp.faults;

import clipramp.units.Unit;
import java.util.function.BiFunction;

/**
 * What a part bears against one of its ratings.
 *
 * @param part design key
 * @param what which rating, in words
 * @param unit its unit
 * @param borne what there is, in the SI unit; POSITIVE_INFINITY where only the line and its fuse limit it
 * @param rating what the part is rated at, in the SI unit; NaN where that is not stated or does not matter
 */
public record Burden(String part, String what, Unit unit, double borne, double rating) {
    /** A current that only the line and its fuse limit. */
    static Burden unlimited(String part, String what) {
        return new Burden(part, what, Unit.AMPERE, Double.POSITIVE_INFINITY, Double.NaN);
    }

    /**
     * What is told of it: "R1 power 7.1 W where it is rated 5 W", or "V1, current that only the fuse limits".
     *
     * @param name what the part is called on this board, such as R1
     * @param amount writes a value, in the SI unit, with that unit
     */
    public String said(String name, BiFunction<Double, Unit, String> amount) {
        return isUnlimited()
                ? name + ", " + what
                : name + " " + what + " " + amount.apply(borne, unit) + " where it is rated "
                        + amount.apply(rating, unit);
    }

    /** How many times its rating; NaN where that is not stated. */
    public double ratio() {
        return isUnlimited() ? Double.POSITIVE_INFINITY : borne / rating;
    }

    /** Whether only the line and its fuse limit it. */
    public boolean isUnlimited() {
        return borne == Double.POSITIVE_INFINITY;
    }

    /** Whether it is more than the rating, as far as that is stated. */
    boolean isOver() {
        return isUnlimited() || borne > rating;
    }
}
