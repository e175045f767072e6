package clipramp.spread;

/**
 * @param samples units to draw, 1 or more
 * @param seed any number: the same seed gives the same answer
 * @param law how parts lie within their tolerance
 * @param judged how many of the units are put before the judge with all margins
 */
public record SpreadOptions(int samples, long seed, DrawLaw law, int judged) {
    /** Units to draw, unless said. */
    public static final int USUAL_SAMPLES = 20_000;

    /** Units put before the judge, unless said. */
    public static final int USUAL_JUDGED = 200;

    public static final SpreadOptions DEFAULT = new SpreadOptions(USUAL_SAMPLES, 1, DrawLaw.NORMAL, USUAL_JUDGED);

    public SpreadOptions {
        if (samples < 1 || judged < 0) {
            throw new IllegalArgumentException("a spread draws one unit or more, not " + samples + " and " + judged);
        }
    }
}
