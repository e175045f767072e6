package clipramp.spread;

/**
 * What a spread is asked for.
 *
 * @param samples units to draw, 1 or more
 * @param seed any number: the same seed gives the same answer
 * @param law how parts lie within their tolerance
 * @param judged how many of the units are put before the judge with all margins, 0 or more; all of them where it is larger
 */
public record SpreadOptions(int samples, long seed, DrawLaw law, int judged) {
    /** Units to draw, unless said. */
    public static final int USUAL_SAMPLES = 20_000;

    /** Most units that are drawn: their figures lie in memory together. */
    public static final int MOST_SAMPLES = 2_000_000;

    /** Highest seed that window and command take, so that either draws what the other drew. */
    public static final int HIGHEST_SEED = Integer.MAX_VALUE;

    /** Units put before the judge, unless said. */
    public static final int USUAL_JUDGED = 200;

    /** What is taken where nothing is said: seed 1, parts normally spread. */
    public static final SpreadOptions DEFAULT = new SpreadOptions(USUAL_SAMPLES, 1, DrawLaw.NORMAL, USUAL_JUDGED);

    /**
     * Refuses what no spread can draw.
     *
     * @throws IllegalArgumentException for no unit to draw, or fewer than none to judge
     */
    public SpreadOptions {
        if (samples < 1 || judged < 0) {
            throw new IllegalArgumentException("a spread draws one unit or more, not " + samples + " and " + judged);
        }
    }
}
