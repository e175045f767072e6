package clipramp.engine;

/**
 * The proof that nothing else ends a piece sooner: every form that could is bounded over all of it. A form is the sum of
 * an exponential, which lies between its ends, a sinusoid, which bulges over its chord by no more than its second
 * derivative allows, and a constant.
 */
final class SwiftProof {
    /** What {@link #judge} answers where it can neither prove nor refute. */
    static final int DOUBT = -2;

    /** A form nearer to zero than this, V or A, is a matter for the careful stepper. */
    private static final double DOUBTFUL = 1e-11;

    /** Forms nearer to zero than this, V, or this a kilohm, A, might change sides for a neighbouring residual. */
    private static final double EDGE_VOLTS = 1e-3;

    private static final double EDGE_AMPS = 1e-6;

    /** Sinusoids keep their sign over less than half a turn. */
    private static final double HALF_TURN = 3.1;

    /** How often the span of a proof is halved before it is given up. */
    private static final int DEEPEST = 5;

    private final SwiftPiece piece;
    private final double[] rows;

    /** Where the valley was last not excluded: it is looked for once before giving up. */
    private double lastDoubt;

    private boolean nearEdge;

    SwiftProof(SwiftPiece of) {
        piece = of;
        rows = of.rows;
    }

    /** Begins a half cycle. */
    void start() {
        nearEdge = false;
    }

    /** Begins a piece. */
    void begin() {
        lastDoubt = Double.POSITIVE_INFINITY;
    }

    void doubt() {
        nearEdge = true;
    }

    /** Whether another event nearly took the place of one of those passed since the start. */
    boolean nearEdge() {
        return nearEdge;
    }

    /**
     * Whether no form reaches zero between the piece's start and where it is looked at, the target's zero there apart:
     * NONE if so, the offset of a form that is past its zero, or DOUBT.
     *
     * @param on whether the device conducts, and the gate junction may switch
     * @param proving whether to prove it; else only the end is looked at
     */
    int judge(int target, boolean on, boolean proving) {
        int forms = on ? SwiftLaws.JUNCTION : SwiftLaws.RECTIFIER;
        boolean doubt = false;
        for (int form = SwiftLaws.DEVICE; form <= forms; form += SwiftLaws.FORM_COLUMNS) {
            int at = piece.row + form;
            double decaying = rows[at] * piece.x;
            double turning = rows[at + 1] * piece.s + rows[at + 2] * piece.c;
            if (form != target) {
                double after = decaying + turning + rows[at + 3];
                if (after > DOUBTFUL) {
                    return form;
                }
                if (after > -(on && form == SwiftLaws.DEVICE ? EDGE_AMPS : EDGE_VOLTS)) {
                    nearEdge = true;
                    doubt |= after > -DOUBTFUL;
                }
            }
            if (proving && !isUnder(at, form == target, decaying, turning)) {
                if (form != target && form == SwiftLaws.DEVICE && piece.ahead < lastDoubt) {
                    lastDoubt = piece.ahead;
                    return form;
                }
                doubt = true;
            }
        }
        return doubt ? DOUBT : SwiftPiece.NONE;
    }

    private boolean isUnder(int at, boolean zeroAtEnd, double decaying, double turning) {
        double decayingBefore = rows[at] * piece.startX;
        if (zeroAtEnd && decaying < 0 && -piece.rate * Math.max(decaying, decayingBefore) >= rows[at + 4]) {
            return true;
        }
        double turningBefore = rows[at + 1] * piece.startSine + rows[at + 2] * piece.startCosine;
        double bulge = rows[at + 4] * piece.ahead * piece.omega * piece.ahead * 0.125;
        double most = (decaying > decayingBefore ? decaying : decayingBefore)
                + (turning > turningBefore ? turning : turningBefore);
        return most + bulge + rows[at + 3] < 0
                || staysUnder(
                        at,
                        piece.startX,
                        piece.startSine,
                        piece.startCosine,
                        piece.x,
                        piece.s,
                        piece.c,
                        piece.ahead,
                        zeroAtEnd,
                        DEEPEST);
    }

    /**
     * The finer proof for one form over a span of time between two looks: it rises all the way, or falls, or cannot bend
     * enough to reach zero; else the same for the two halves of the span. Longer than most methods: it hands seven
     * numbers on to itself.
     *
     * @param zeroAtEnd whether the form is known to be zero at the end
     */
    private boolean staysUnder(
            int at,
            double x0,
            double s0,
            double c0,
            double x1,
            double s1,
            double c1,
            double span,
            boolean zeroAtEnd,
            int depth) {
        double rate = piece.rate;
        double omega = piece.omega;
        double p = rows[at];
        double q = rows[at + 1];
        double r = rows[at + 2];
        double k = rows[at + 3];
        double decaying0 = p * x0;
        double decaying1 = p * x1;
        double turning0 = q * s0 + r * c0;
        double turning1 = q * s1 + r * c1;
        double mostDecaying = decaying0 > decaying1 ? decaying0 : decaying1;
        double leastDecaying = decaying0 > decaying1 ? decaying1 : decaying0;
        double turned = omega * span;
        double greatest = rows[at + 4];
        double bulge = greatest * span * turned * 0.125;
        if (mostDecaying + (turning0 > turning1 ? turning0 : turning1) + bulge + k < 0) {
            return true;
        }
        double steepness0 = omega * (q * c0 - r * s0);
        double steepness1 = omega * (q * c1 - r * s1);
        double leastSteep = steepness0 < steepness1 ? steepness0 : steepness1;
        double mostSteep = steepness0 < steepness1 ? steepness1 : steepness0;
        double sag = greatest * turned * turned * 0.125;
        double after = zeroAtEnd ? 0 : decaying1 + turning1 + k;
        if (-rate * mostDecaying + leastSteep - sag >= 0) {
            return after <= 0;
        }
        double before = Math.min(0, decaying0 + turning0 + k);
        if (!zeroAtEnd && -rate * leastDecaying + mostSteep + sag <= 0) {
            return true;
        }
        double bend = -rate * rate * (leastDecaying < 0 ? leastDecaying : 0);
        if (turning0 > 0 || turning1 > 0 || turned > HALF_TURN) {
            bend += omega * greatest;
        }
        if (0.5 * bend * span * span <= -before - after) {
            return true;
        }
        if (depth == 0 || turned > HALF_TURN) {
            return false;
        }
        double middleX = Math.copySign(Math.sqrt(x0 * x1), x0);
        double norm = 1 / Math.sqrt((s0 + s1) * (s0 + s1) + (c0 + c1) * (c0 + c1));
        double middleSine = (s0 + s1) * norm;
        double middleCosine = (c0 + c1) * norm;
        double half = 0.5 * span;
        return p * middleX + q * middleSine + r * middleCosine + k < 0
                && staysUnder(at, middleX, middleSine, middleCosine, x1, s1, c1, half, zeroAtEnd, depth - 1)
                && staysUnder(at, x0, s0, c0, middleX, middleSine, middleCosine, half, false, depth - 1);
    }
}
