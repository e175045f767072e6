package clipramp.figures;

import clipramp.spread.PositionSpread;
import clipramp.spread.SpreadResult;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A spread as the bands that lanes and knob curve can carry: from the first to the last percent of the units. */
public final class SpreadBands {
    private static final int LAST = SpreadResult.PERCENTAGES.size() - 1;

    private SpreadBands() {}

    /** Power over the knob; empty for a fixed ramp, and where no unit was drawn. */
    public static Optional<KnobFigure.Band> knob(SpreadResult spread) {
        List<PositionSpread> all = spread.positions();
        if (all.size() < 2) {
            return Optional.empty();
        }
        return Optional.of(new KnobFigure.Band(
                column(all, p -> p.position().orElse(0)),
                column(all, p -> p.fraction().get(0)),
                column(all, p -> p.fraction().get(LAST))));
    }

    private static double[] column(List<PositionSpread> all, ToDoubleFunction<PositionSpread> of) {
        return all.stream().mapToDouble(of).toArray();
    }

    /**
     * Firing angles at a knob position, between the drawn positions in proportion; empty where no unit was drawn.
     *
     * @param spread what the units do
     * @param position 0..1; ignored for a fixed ramp
     */
    public static Optional<LanesFigure.Band> lanes(SpreadResult spread, double position) {
        List<PositionSpread> all = spread.positions();
        if (all.isEmpty()) {
            return Optional.empty();
        }
        double place = Math.min(1, Math.max(0, position)) * (all.size() - 1);
        int below = Math.min(all.size() - 1, (int) place);
        int above = Math.min(all.size() - 1, below + 1);
        double share = place - below;
        return Optional.of(new LanesFigure.Band(
                between(
                        all.get(below).firingRad().get(0),
                        all.get(above).firingRad().get(0),
                        share),
                between(
                        all.get(below).firingRad().get(LAST),
                        all.get(above).firingRad().get(LAST),
                        share)));
    }

    private static double between(double from, double to, double share) {
        return from + share * (to - from);
    }
}
