package clipramp.engine;

/**
 * How a linear form of a piece may go on from where the piece was last looked at: bounds that hold, and how long the form
 * surely stays under zero. One instance belongs to a piece and serves every search in it.
 *
 * <p>Over a stretch H the form stays under f + f' h + f'' h²/2 + J h³/6 with J a bound of its third derivative, and so under
 * the parabola whose bend is f'' + J H/3. An exponential that holds the form down and fades within the stretch is taken out of
 * that: it lies under every tangent of its own, and the one where the form seems to come to zero is the sharpest.
 */
final class Outlook {
    /** By how much more is looked ahead than the way to the zero seems to be. */
    private static final double LOOK_AHEAD = 1.25;

    /** Time constants beyond which an exponential is no parabola any more. */
    private static final double FADES = 0.1;

    private final Piece piece;
    private Affine form = new Affine();

    /** Greatest second and third derivative that the source's sinusoids give the form. */
    private double swingBend;

    private double swingJerk;

    private double value;
    private double slope;
    private double bend;

    /** What the exponentials give the form, and how fast they fade, 1/s. */
    private double quick;

    private double quickRate;
    private double slow;
    private double slowRate;

    Outlook(Piece piece) {
        this.piece = piece;
    }

    /** Takes up a form of the piece as it has begun. */
    void of(Affine nextForm) {
        form = nextForm;
        swingBend = 0;
        swingJerk = 0;
        int count = piece.sinusoids();
        for (int i = 0; i < count; i++) {
            double w = piece.sinusoidRate(i);
            double sine = piece.sineOf(form, i);
            double cosine = piece.cosineOf(form, i);
            double most = w * w * Math.sqrt(sine * sine + cosine * cosine);
            swingBend += most;
            swingJerk += w * most;
        }
    }

    /** Value of the form where the piece was last looked at. */
    double value() {
        return piece.value(form);
    }

    /** Whether a form that stands at zero may rise at once; one that stays at zero (nothing charged, no supply) does not. */
    boolean rises() {
        look();
        return slope > 0 || (slope == 0 && bendBound() > 0);
    }

    private void look() {
        slope = piece.slope(form);
        bend = piece.bend(form);
        quick = piece.quickPart(form);
        quickRate = piece.quickRate();
        slow = piece.slowPart(form);
        slowRate = piece.slowRate();
    }

    /**
     * How long the form surely stays under zero from where the piece was last looked at, s; POSITIVE_INFINITY for all the rest.
     *
     * @param valueNow its value there, 0 or less
     * @param rest how far to look, s
     */
    double surelyNegative(double valueNow, double rest) {
        look();
        value = valueNow;
        double guess = firstRoot(value, slope, bend);
        double way = FADES / Math.min(guess, rest);
        if ((quick < 0 && quickRate > way) || (slow < 0 && slowRate > way)) {
            return whileItFades(rest);
        }
        double stretch = Math.min(rest, LOOK_AHEAD * guess);
        double bound = Math.min(bendBound(), bend + jerkBound() * stretch * (1. / 3));
        return within(stretch, rest, firstRoot(value, slope, bound));
    }

    private double whileItFades(double rest) {
        double downQuick = Math.min(0, quick);
        double downSlow = Math.min(0, slow);
        double otherValue = value - downQuick - downSlow;
        double otherSlope = slope + quickRate * downQuick + slowRate * downSlow;
        double otherBend = bend - quickRate * quickRate * downQuick - slowRate * slowRate * downSlow;
        double gone = rest;
        if (otherValue > 0) {
            gone = Math.min(
                    rest, Math.max(fadesTo(downQuick, quickRate, otherValue), fadesTo(downSlow, slowRate, otherValue)));
        }
        double guess = Math.min(rest, tangentRoot(otherValue, otherSlope, otherBend, gone));
        double stretch = Math.min(rest, LOOK_AHEAD * guess);
        double bound = Math.min(bendBound(), otherBend + swingJerk * stretch * (1. / 3));
        return within(stretch, rest, tangentRoot(otherValue, otherSlope, bound, guess));
    }

    /** When an exponential that pulls down is no more than a level, s. */
    private static double fadesTo(double pull, double rate, double level) {
        return -pull > level ? Math.log(-pull / level) / rate : 0;
    }

    /**
     * First root of a parabola and tangents of the exponentials that pull down beside it: those at a time or those at the
     * start, whichever leads farther.
     */
    private double tangentRoot(double otherValue, double otherSlope, double otherBend, double at) {
        double atStart = firstRoot(value, slope, otherBend);
        double leftQuick = quick < 0 ? quick * Math.exp(-quickRate * at) : 0;
        double leftSlow = slow < 0 ? slow * Math.exp(-slowRate * at) : 0;
        double height = otherValue + leftQuick * (1 + quickRate * at) + leftSlow * (1 + slowRate * at);
        // Tangents so far off that they lie over zero say nothing about now.
        return height < 0
                ? Math.max(
                        atStart, firstRoot(height, otherSlope - quickRate * leftQuick - slowRate * leftSlow, otherBend))
                : atStart;
    }

    private static double within(double stretch, double rest, double root) {
        return root <= stretch ? root : stretch < rest ? stretch : Double.POSITIVE_INFINITY;
    }

    /**
     * Whether so long a step, just told, ends at the zero but for rounding: it leaves no more than its third power times the
     * third derivative.
     *
     * @param ahead the step, s
     * @param leftSeconds what counts as rounding, s
     */
    boolean arrives(double ahead, double leftSeconds) {
        double size = swingJerk
                + Math.abs(quick) * quickRate * quickRate * quickRate
                + Math.abs(slow) * slowRate * slowRate * slowRate
                + piece.meshedJerk(form);
        return ahead * ahead * ahead * size <= leftSeconds * slope;
    }

    /** An upper bound of the second derivative where last asked about and at any later time. */
    double bendBound() {
        return swingBend
                + Math.max(0, quick) * quickRate * quickRate
                + Math.max(0, slow) * slowRate * slowRate
                + piece.meshedBend(form);
    }

    /** The same of the third. */
    private double jerkBound() {
        return swingJerk
                + Math.max(0, -quick) * quickRate * quickRate * quickRate
                + Math.max(0, -slow) * slowRate * slowRate * slowRate
                + piece.meshedJerk(form);
    }

    /** First positive root of value + slope h + bend h²/2, value at or under 0; POSITIVE_INFINITY for none. */
    private static double firstRoot(double value, double slope, double bend) {
        double discriminant = slope * slope - 2 * bend * value;
        if (discriminant < 0) {
            return Double.POSITIVE_INFINITY;
        }
        double root = Math.sqrt(discriminant);
        if (slope > 0) {
            return -2 * value / (slope + root);
        }
        return bend > 0 ? (root - slope) / bend : Double.POSITIVE_INFINITY;
    }
}
