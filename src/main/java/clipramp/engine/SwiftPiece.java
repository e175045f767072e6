package clipramp.engine;

/**
 * The piece that a {@link SwiftStepper} is in: its law from its start on, and where along it one looks just now. Sine,
 * cosine and exponential are carried along from look to look by short polynomials.
 */
final class SwiftPiece {
    /** What a step may leave of the way to a zero, s; it leaves about a third of itself times its bend squared. */
    private static final double CLOSE_SECONDS = 1e-14;

    /** The same for a half cycle that is only run to learn roughly how it ends. */
    private static final double ROUGHLY_SECONDS = 1e-8;

    /** Turns up to which longer polynomials are exact to rounding. */
    private static final double MIDDLING = 0.1;

    /** Turns up to which the series of a quarter of the turn are. */
    private static final double QUARTERED = 1.4;

    /** Turns up to which the short polynomials are exact to rounding. */
    private static final double SHORT = 6e-3;

    private static final int MOST_TURNS = 12;
    private static final int MOST_BACK = 6;

    /** Up to here three terms of the arcsine make a good first guess. */
    private static final double SMALL_SINE = 0.3;

    /** Nothing was found. */
    static final int NONE = -1;

    /** The half cycle's end in place of a form. */
    static final int END = 0;

    final double[] rows;
    private double endSine;
    private double endCosine;
    double omega;

    // The piece, from its start on.
    int row;
    double rate;
    double startX;
    double startSine;
    double startCosine;
    private double startSeconds;
    private double close = CLOSE_SECONDS;
    /** Until the half cycle's end, s. */
    double limit;

    // Where it is looked at.
    double ahead;
    double x;
    double s;
    double c;

    SwiftPiece(double[] lawRows) {
        rows = lawRows;
    }

    /** Begins a half cycle. */
    void start(boolean rough) {
        close = rough ? ROUGHLY_SECONDS : CLOSE_SECONDS;
    }

    /** Takes up another supply. */
    void take(double angularRate, double halfSeconds) {
        omega = angularRate;
        endSine = Math.sin(omega * halfSeconds);
        endCosine = Math.cos(omega * halfSeconds);
    }

    /** Begins under the law of a row. */
    void begin(int lawRow, double seconds, double limitSeconds, double rampVolts, double sine, double cosine) {
        row = lawRow;
        rate = rows[row + SwiftLaws.RATE];
        startSeconds = seconds;
        limit = limitSeconds;
        startSine = sine;
        startCosine = cosine;
        startX = rampVolts
                - rows[row + SwiftLaws.STEADY]
                - rows[row + SwiftLaws.SINE] * sine
                - rows[row + SwiftLaws.COSINE] * cosine;
    }

    // --- guesses ----------------------------------------------------------------------------------------------------

    /** Looks at the half cycle's end. */
    int lookAtEnd() {
        ahead = limit;
        x = startX * Math.exp(-rate * limit);
        s = endSine;
        c = endCosine;
        return END;
    }

    private void lookAtStart() {
        ahead = 0;
        x = startX;
        s = startSine;
        c = startCosine;
    }

    /** Looks where the piece would be after what {@link #decay} and {@link #turnSine} once came to. */
    void lookAfter(double by, double decay, double turnSine, double turnCosine) {
        ahead = by;
        x = startX * decay;
        s = startSine * turnCosine + startCosine * turnSine;
        c = startCosine * turnCosine - startSine * turnSine;
    }

    /** Looks at a time after the start at which so much is left of the exponential. */
    void lookWhere(double part) {
        lookAtStart();
        ahead = -Math.log(part) / rate;
        x = startX * part;
        rotate(omega * ahead);
    }

    /** Looks near the first zero of a form as seen from the piece's start; says what it looks at, the form or the END. */
    int aim(int target) {
        if (target == END) {
            return lookAtEnd();
        }
        int at = row + target;
        double decaying = rows[at] * startX;
        double turning = rows[at + 1] * startSine + rows[at + 2] * startCosine;
        double rest = rows[at + 3];
        if (rate * Math.abs(decaying) > 2 * rows[at + 4]) {
            double part = -(turning + rest) / decaying;
            if (part > 0 && part < 1 && decaying < 0) {
                lookWhere(part);
                // Where the sinusoid falls meanwhile, the form may turn round before; its zero is on the rising side.
                for (int back = 0; back < MOST_BACK && slope(at) <= 0; back++) {
                    turn(-1 / rate);
                }
                return target;
            }
            // The exponential alone does not get there; the sinusoid may, once the exponential is gone.
            return aimAtSine(target, startSine - (turning + rest) / rows[at + 1], rows[at + 1] > 0);
        }
        // The source moves, the ramp hardly.
        double ofSource = rows[at + 1] - rows[at] * rows[row + SwiftLaws.SINE];
        return aimAtSine(target, startSine - (decaying + turning + rest) / ofSource, ofSource > 0);
    }

    /** Looks at where the supply's sine comes to a level, rising or falling. */
    private int aimAtSine(int target, double level, boolean rising) {
        if (!(Math.abs(level) < 1)) {
            // Out of the sinusoid's reach from here; the proof says whether anything else comes before the end.
            return lookAtEnd();
        }
        double angle = Math.abs(level) < SMALL_SINE
                ? level * (1 + level * level * (1. / 6) * (1 + level * level * (9. / 20)))
                : Math.asin(level);
        double by = (rising ? angle : Math.PI - angle) / omega - startSeconds;
        if (by >= limit) {
            return lookAtEnd();
        }
        lookAtStart();
        turn(Math.max(0, by));
        return target;
    }

    // --- looking ----------------------------------------------------------------------------------------------------

    private void turn(double by) {
        double z = -rate * by;
        x *= Math.abs(z) < MIDDLING ? middlingDecay(z) : Math.exp(z);
        ahead += by;
        rotate(omega * by);
    }

    private void rotate(double angle) {
        if (Math.abs(angle) < MIDDLING) {
            double b = angle * angle;
            double sin = angle - angle * b * (1. / 6 - b * (1. / 120 - b * (1. / 5040)));
            rotate(sin, 1 - b * (0.5 - b * (1. / 24 - b * (1. / 720 - b * (1. / 40320)))));
        } else if (Math.abs(angle) < QUARTERED) {
            rotateByQuarters(angle);
        } else {
            rotate(Math.sin(angle), Math.cos(angle));
        }
    }

    /** By the series of a quarter of the angle, doubled twice. */
    private void rotateByQuarters(double angle) {
        double a = 0.25 * angle;
        double b = a * a;
        double sin = 1. / 39916800 - b * (1. / 6227020800.);
        sin = 1. / 362880 - b * sin;
        sin = 1. / 5040 - b * sin;
        sin = 1. / 120 - b * sin;
        sin = 1. / 6 - b * sin;
        sin = a - a * b * sin;
        double cos = 1. / 3628800 - b * (1. / 479001600);
        cos = 1. / 40320 - b * cos;
        cos = 1. / 720 - b * cos;
        cos = 1. / 24 - b * cos;
        cos = 0.5 - b * cos;
        cos = 1 - b * cos;
        double halfSine = 2 * sin * cos;
        double halfCosine = 1 - 2 * sin * sin;
        rotate(2 * halfSine * halfCosine, 1 - 2 * halfSine * halfSine);
    }

    private void rotate(double turnSine, double turnCosine) {
        double turned = s * turnCosine + c * turnSine;
        c = c * turnCosine - s * turnSine;
        s = turned;
    }

    private static double middlingDecay(double z) {
        double zz = z * z;
        double even = zz * (0.5 + zz * (1. / 24 + zz * (1. / 720 + zz * (1. / 40320))));
        double odd = z + z * zz * (1. / 6 + zz * (1. / 120 + zz * (1. / 5040)));
        return 1 + (odd + even);
    }

    private static double shortDecay(double z) {
        double zz = z * z;
        return 1 + z + zz * (0.5 + z * (1. / 6)) + zz * zz * (1. / 24 + z * (1. / 120));
    }

    /** Slope of a form, 1/s. */
    double slope(int at) {
        return omega * (rows[at + 1] * c - rows[at + 2] * s) - rate * rows[at] * x;
    }

    /**
     * From where it is looked at, goes to the zero of a rising form nearby; false if it is lost. The hottest loop of all:
     * everything is kept in local variables, which is why it is longer than most.
     */
    boolean seek(int at) {
        double p = rows[at];
        double q = rows[at + 1];
        double r = rows[at + 2];
        double k = rows[at + 3];
        double w = omega;
        double lambda = rate;
        double fastest = lambda > w ? lambda : w;
        double nowX = x;
        double nowS = s;
        double nowC = c;
        double time = ahead;
        for (int i = 0; i < MOST_TURNS; i++) {
            double decaying = p * nowX;
            double turning = q * nowS + r * nowC;
            double slope = w * (q * nowC - r * nowS) - lambda * decaying;
            if (!(slope > 0)) {
                return false;
            }
            double perSlope = 1 / slope;
            double step = -(decaying + turning + k) * perSlope;
            double bend = (lambda * lambda * decaying - w * w * turning) * perSlope * step;
            step *= Math.abs(bend) < 0.5 ? 1 - 0.5 * bend : 1;
            double length = Math.abs(step);
            if (length * fastest < SHORT) {
                double y = w * step;
                double yy = y * y;
                double turnSine = y - y * yy * (1. / 6 - yy * (1. / 120));
                double turnCosine = 1 - yy * (0.5 - yy * (1. / 24));
                nowX *= shortDecay(-lambda * step);
                double turned = nowS * turnCosine + nowC * turnSine;
                nowC = nowC * turnCosine - nowS * turnSine;
                nowS = turned;
            } else {
                x = nowX;
                s = nowS;
                c = nowC;
                turn(step);
                nowX = x;
                nowS = s;
                nowC = c;
            }
            time += step;
            if (length * bend * bend < close) {
                x = nowX;
                s = nowS;
                c = nowC;
                ahead = time;
                return time >= 0;
            }
        }
        return false;
    }

    /** exp(-rate t) where it is looked at. */
    double decay() {
        return startX == 0 ? Math.exp(-rate * ahead) : x / startX;
    }

    /** Sine of the angle turned since the start. */
    double turnSine() {
        return s * startCosine - c * startSine;
    }

    /** Its cosine. */
    double turnCosine() {
        return c * startCosine + s * startSine;
    }

    /** Back onto the unit circle: turns are products, and would make rounding grow. */
    void straighten() {
        double onto = 1.5 - 0.5 * (s * s + c * c);
        s *= onto;
        c *= onto;
    }

    /** V_C where it is looked at, V. */
    double rampVolts() {
        return rows[row + SwiftLaws.STEADY] + rows[row + SwiftLaws.SINE] * s + rows[row + SwiftLaws.COSINE] * c + x;
    }
}
