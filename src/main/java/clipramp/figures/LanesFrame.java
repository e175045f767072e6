package clipramp.figures;

import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.Optional;

/**
 * Where the lanes lie on a surface, for pointing at them.
 *
 * @param left x at which the shown angles begin
 * @param right x at which they end
 * @param top y of the first lane's top
 * @param bottom y of the last lane's bottom
 * @param laneTops y of each lane's top, in the order of {@link Lane}
 * @param laneBottoms y of each lane's bottom
 * @param fromRad first angle shown, rad
 * @param toRad last angle shown, rad
 */
public record LanesFrame(
        double left,
        double right,
        double top,
        double bottom,
        double[] laneTops,
        double[] laneBottoms,
        double fromRad,
        double toRad) {
    /** x of an angle in rad. */
    public double xOf(double angleRad) {
        return left + (angleRad - fromRad) / (toRad - fromRad) * (right - left);
    }

    /** Angle in rad at an x, kept within what is shown. */
    public double radAt(double x) {
        double share = Math.min(1, Math.max(0, (x - left) / (right - left)));
        return fromRad + share * (toRad - fromRad);
    }

    /** The lane at a y, if there is one. */
    public Optional<Lane> laneAt(double y) {
        return Arrays.stream(Lane.values())
                .filter(lane -> y >= laneTops[lane.ordinal()] && y <= laneBottoms[lane.ordinal()])
                .findFirst();
    }

    /** Rectangle of a lane's plot. */
    public Rectangle2D plot(Lane lane) {
        double laneTop = laneTops[lane.ordinal()];
        return new Rectangle2D.Double(left, laneTop, right - left, laneBottoms[lane.ordinal()] - laneTop);
    }
}
