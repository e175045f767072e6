package clipramp.engine;

import java.util.Arrays;

/**
 * {@link Stepper} on a sinusoidal supply with direct coupling, for the very same events some twenty times as fast.
 *
 * <p>A piece is guessed from how the same state ended before, refined by Newton's method with a second-order term, and
 * then proven: every form that may end the piece is bounded over all of it. Sine, cosine and exponential are carried
 * along by short polynomials. Where the proof fails, or the device is stalled, {@link Stepper} does the piece. Reason
 * for the length of this class: what it does is one loop, and the loop is hot.
 */
public final class SwiftStepper {
    /** Turns up to which the short polynomials are exact to rounding. */
    private static final double SHORT = 6e-3;

    /** Turns up to which polynomials of a quarter of the turn are exact to rounding. */
    private static final double QUARTERED = 1.4;

    /** Turn, rad or time constants, after which the next one would be under rounding: its cube is 3e-14. */
    private static final double CLOSE = 3e-5;

    /** The same for a half cycle that is only run to learn roughly how it ends. */
    private static final double ROUGHLY = 2e-3;

    private static final int MOST_TURNS = 12;
    private static final int MOST_TARGETS = 6;
    private static final int MOST_BACK = 6;
    private static final int MOST_ROUNDS = 9;

    /** A form nearer to zero than this, V or A, is a matter for the careful stepper. */
    private static final double DOUBTFUL = 1e-11;

    /** Forms nearer to zero than this, V, or this a kilohm, A, might change sides for a neighbouring residual. */
    private static final double EDGE_VOLTS = 1e-3;

    private static final double EDGE_AMPS = 1e-6;

    /** Sinusoids keep their sign over less than half a turn. */
    private static final double HALF_TURN = 3.1;

    /** How often the span of a proof is halved before it is given up. */
    private static final int DEEPEST = 5;

    private static final int END = 0;
    private static final int NONE = -1;
    private static final int DOUBT = -2;

    private static final int STATES = 16;
    private static final int VISITS = 24;
    private static final int MEMORY_COLUMNS = 4;

    private final Network n;
    private final SwiftLaws laws;
    private final double[] rows;
    private final Stepper careful;
    private SourceWave wave = new SourceWave();
    private boolean proving = true;
    private double close = CLOSE;
    private double omega;
    private double endSine;
    private double endCosine;

    // The state now.
    private boolean stalled;
    private boolean unsettled;
    private int state;
    private double seconds;
    private double rampVolts;
    private double sine;
    private double cosine;

    // The piece being looked at: its start, and where it is looked at.
    private int row;
    private double rate;
    private double startX;
    private double startSine;
    private double startCosine;
    private double ahead;
    private double decay;
    /** Where the valley was last not excluded: it is looked for once before giving up. */
    private double lastDoubt;

    /** Whether another event nearly took the place of one of those passed since the start. */
    private boolean nearEdge;

    private double x;
    private double s;
    private double c;

    /** How the ramp voltage now moves with the ramp voltage at the start; NaN where that was not followed. */
    private double kept;

    /** How the instant of the last firing moves with it, s/V. */
    private double firingShift;

    // The piece just passed.
    private int passedState;
    private double passedSeconds;

    /** How pieces ended before in this unit: by state, supply rising or falling, and visit within the half cycle. */
    private final double[] memory = new double[2 * STATES * VISITS * MEMORY_COLUMNS];

    private final int[] memoryTarget = new int[2 * STATES * VISITS];
    private final int[] memoryUnit = new int[2 * STATES * VISITS];
    private final int[] visits = new int[2 * STATES];
    private int unit;
    private int slot;
    private long carefulPieces;
    private long pieces;

    public SwiftStepper(Network network) {
        n = network;
        laws = new SwiftLaws(network);
        rows = laws.rows;
        careful = new Stepper(network);
    }

    /** Takes up a network whose numbers have changed, or another supply: a pure sine from its zero on. */
    public void take(SourceWave source) {
        if (source.count != 1 || source.phases[0] != 0 || n.transformerCoupled) {
            throw new IllegalArgumentException("the swift stepper is for a sinusoidal supply and direct coupling");
        }
        wave = source;
        omega = source.rates[0];
        endSine = Math.sin(omega * source.seconds);
        endCosine = Math.cos(omega * source.seconds);
        laws.reset(source);
        unit++;
    }

    /**
     * Begins a half cycle.
     *
     * @param rough whether instants good to 1e-8 of a piece will do, and a look at the end of each piece for proof
     */
    public void start(Mode startMode, double startRampVolts, boolean rough) {
        proving = !rough;
        close = rough ? ROUGHLY : CLOSE;
        Arrays.fill(visits, 0);
        kept = 1;
        firingShift = Double.NaN;
        seconds = 0;
        rampVolts = startRampVolts;
        sine = 0;
        cosine = 1;
        stalled = startMode == Mode.STALLED;
        unsettled = false;
        nearEdge = false;
        state = startMode == Mode.ON ? SwiftLaws.ON : 0;
        if (stalled) {
            careful.start(wave, startMode, startRampVolts, 0);
            state = careful.mode() == Mode.ON ? SwiftLaws.ON : 0;
            state |= flags();
        } else {
            settle();
        }
    }

    /** Moves to the next event and through it; see {@link Stepper#advance}. The limit is the half cycle's end. */
    public Event advance() {
        pieces++;
        passedState = state;
        passedSeconds = seconds;
        if (stalled) {
            return carefully();
        }
        row = laws.row(state);
        rate = rows[row + SwiftLaws.RATE];
        startSine = sine;
        startCosine = cosine;
        startX = rampVolts
                - rows[row + SwiftLaws.STEADY]
                - rows[row + SwiftLaws.SINE] * sine
                - rows[row + SwiftLaws.COSINE] * cosine;
        int target = unsettled ? DOUBT : reach();
        if (target == DOUBT) {
            nearEdge |= !unsettled;
            return carefully();
        }
        // Back onto the unit circle: remembered turns are products, and would make rounding grow.
        double onto = 1.5 - 0.5 * (s * s + c * c);
        s *= onto;
        c *= onto;
        decay = startX == 0 ? Math.exp(-rate * ahead) : x / startX;
        kept *= decay;
        remember(target);
        seconds = target == END ? wave.seconds : seconds + ahead;
        sine = s;
        cosine = c;
        rampVolts =
                rows[row + SwiftLaws.STEADY] + rows[row + SwiftLaws.SINE] * s + rows[row + SwiftLaws.COSINE] * c + x;
        return pass(target);
    }

    /** Looks at the proven first event; says which one it is, or DOUBT. */
    private int reach() {
        lastDoubt = Double.POSITIVE_INFINITY;
        double limit = wave.seconds - seconds;
        int target = recall();
        boolean recalled = target != NONE;
        if (target == NONE) {
            target = aim(likely(), limit);
        }
        for (int i = 0; i < MOST_TARGETS; i++) {
            if (target == DOUBT) {
                return DOUBT;
            }
            if (target != END) {
                boolean found = seek(row + target);
                if (ahead >= limit) {
                    target = END;
                    lookAtEnd(limit);
                } else if (!found) {
                    // Misled by memory, once; else lost.
                    target = recalled ? aim(likely(), limit) : DOUBT;
                    recalled = false;
                    continue;
                }
            }
            int other = judge(target);
            if (other == NONE) {
                return target;
            }
            target = other == DOUBT ? DOUBT : aim(other, limit);
        }
        return DOUBT;
    }

    // --- guesses ----------------------------------------------------------------------------------------------------

    /** Looks where the same state ended when it was last entered for as many times in a half cycle. */
    private int recall() {
        int kind = state + (cosine < 0 ? STATES : 0);
        int visit = Math.min(visits[kind]++, VISITS - 1);
        slot = kind * VISITS + visit;
        int from = slot;
        if (memoryUnit[from] != unit && visit > 0) {
            from--;
        }
        if (memoryUnit[from] != unit || memoryTarget[from] == END) {
            return NONE;
        }
        int at = from * MEMORY_COLUMNS;
        ahead = memory[at];
        x = startX * memory[at + 1];
        double turnSine = memory[at + 2];
        double turnCosine = memory[at + 3];
        s = startSine * turnCosine + startCosine * turnSine;
        c = startCosine * turnCosine - startSine * turnSine;
        return memoryTarget[from];
    }

    private void remember(int target) {
        memoryUnit[slot] = unit;
        memoryTarget[slot] = target;
        int at = slot * MEMORY_COLUMNS;
        memory[at] = ahead;
        memory[at + 1] = decay;
        memory[at + 2] = s * startCosine - c * startSine;
        memory[at + 3] = c * startCosine + s * startSine;
    }

    /** What usually ends a piece in this state. */
    private int likely() {
        boolean on = (state & SwiftLaws.ON) != 0;
        if ((state & SwiftLaws.RECTIFIES) == 0) {
            return cosine > 0 ? SwiftLaws.RECTIFIER : END;
        }
        boolean clips = (state & SwiftLaws.CLIPS) != 0;
        if (on) {
            return clips || (state & SwiftLaws.GATE) == 0 ? SwiftLaws.DEVICE : SwiftLaws.JUNCTION;
        }
        return clips || cosine < 0 ? SwiftLaws.DEVICE : SwiftLaws.ZENER;
    }

    private void lookAtEnd(double limit) {
        ahead = limit;
        x = startX * Math.exp(-rate * limit);
        s = endSine;
        c = endCosine;
    }

    /** Looks near the first zero of a form seen from the piece's start; says what it looks at. */
    private int aim(int target, double limit) {
        if (target == END) {
            lookAtEnd(limit);
            return END;
        }
        int at = row + target;
        double decaying = rows[at] * startX;
        double turning = rows[at + 1] * startSine + rows[at + 2] * startCosine;
        double rest = rows[at + 3];
        ahead = 0;
        x = startX;
        s = startSine;
        c = startCosine;
        if (rate * Math.abs(decaying) > 2 * rows[at + 4]) {
            double part = -(turning + rest) / decaying;
            if (part > 0 && part < 1 && decaying < 0) {
                ahead = -Math.log(part) / rate;
                x = startX * part;
                rotate(omega * ahead);
                // Where the sinusoid falls meanwhile, the form may turn round before; its zero is on the rising side.
                for (int back = 0; back < MOST_BACK && slope(at) <= 0; back++) {
                    turn(-1 / rate);
                }
                return target;
            }
            // The exponential alone does not get there; the sinusoid may, once the exponential is gone.
            return aimAtSine(target, startSine - (turning + rest) / rows[at + 1], rows[at + 1] > 0, limit);
        }
        // The source moves, the ramp hardly.
        double ofSource = rows[at + 1] - rows[at] * rows[row + SwiftLaws.SINE];
        return aimAtSine(target, startSine - (decaying + turning + rest) / ofSource, ofSource > 0, limit);
    }

    /** Looks at where the supply's sine comes to a level, rising or falling. */
    private int aimAtSine(int target, double level, boolean rising, double limit) {
        if (!(Math.abs(level) < 1)) {
            // Out of the sinusoid's reach from here; the proof says whether anything else comes before the end.
            lookAtEnd(limit);
            return END;
        }
        double angle = Math.abs(level) < 0.3
                ? level * (1 + level * level * (1. / 6) * (1 + level * level * (9. / 20)))
                : Math.asin(level);
        double by = (rising ? angle : Math.PI - angle) / omega - seconds;
        if (by >= limit) {
            lookAtEnd(limit);
            return END;
        }
        turn(Math.max(0, by));
        return target;
    }

    // --- looking ----------------------------------------------------------------------------------------------------

    private void turn(double by) {
        double z = -rate * by;
        x *= Math.abs(z) < SHORT
                ? 1 + z * (1 + z * (1. / 2) * (1 + z * (1. / 3) * (1 + z * (1. / 4) * (1 + z * (1. / 5)))))
                : Math.exp(z);
        ahead += by;
        rotate(omega * by);
    }

    private void rotate(double y) {
        double turnSine;
        double turnCosine;
        double yy = y * y;
        if (Math.abs(y) < SHORT) {
            turnSine = y * (1 - yy * (1. / 6) * (1 - yy * (1. / 20)));
            turnCosine = 1 - yy * (1. / 2) * (1 - yy * (1. / 12) * (1 - yy * (1. / 30)));
        } else if (Math.abs(y) < QUARTERED) {
            double quarter = 0.25 * y;
            double qq = quarter * quarter;
            double sin = quarter
                    * (1
                            - qq
                                    * (1. / 6)
                                    * (1
                                            - qq
                                                    * (1. / 20)
                                                    * (1
                                                            - qq
                                                                    * (1. / 42)
                                                                    * (1
                                                                            - qq
                                                                                    * (1. / 72)
                                                                                    * (1
                                                                                            - qq
                                                                                                    * (1. / 110)
                                                                                                    * (1
                                                                                                            - qq
                                                                                                                    * (1.
                                                                                                                            / 156)))))));
            double cos = 1
                    - qq
                            * (1. / 2)
                            * (1
                                    - qq
                                            * (1. / 12)
                                            * (1
                                                    - qq
                                                            * (1. / 30)
                                                            * (1
                                                                    - qq
                                                                            * (1. / 56)
                                                                            * (1
                                                                                    - qq
                                                                                            * (1. / 90)
                                                                                            * (1 - qq * (1. / 132))))));
            double halfSine = 2 * sin * cos;
            double halfCosine = 1 - 2 * sin * sin;
            turnSine = 2 * halfSine * halfCosine;
            turnCosine = 1 - 2 * halfSine * halfSine;
        } else {
            turnSine = Math.sin(y);
            turnCosine = Math.cos(y);
        }
        double turned = s * turnCosine + c * turnSine;
        c = c * turnCosine - s * turnSine;
        s = turned;
    }

    /** From where it is looked at, goes to the zero of a rising form nearby; false if it is lost. */
    private boolean seek(int at) {
        double p = rows[at];
        double q = rows[at + 1];
        double r = rows[at + 2];
        double k = rows[at + 3];
        double w = omega;
        double lambda = rate;
        double near = close / Math.max(lambda, w);
        double shortStep = SHORT / Math.max(lambda, w);
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
            if (length < shortStep) {
                double z = -lambda * step;
                double y = w * step;
                double yy = y * y;
                double zz = z * z;
                double turnSine = y - y * yy * (1. / 6 - yy * (1. / 120));
                double turnCosine = 1 - yy * (0.5 - yy * (1. / 24));
                nowX *= 1 + z + zz * (0.5 + z * (1. / 6)) + zz * zz * (1. / 24 + z * (1. / 120));
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
            if (length < near) {
                x = nowX;
                s = nowS;
                c = nowC;
                ahead = time;
                return time >= 0;
            }
        }
        return false;
    }

    // --- proof ------------------------------------------------------------------------------------------------------

    /**
     * Whether no form reaches zero between the piece's start and where it is looked at, the target's zero there apart:
     * NONE if proven, the offset of a form that is past its zero, or DOUBT.
     */
    private int judge(int target) {
        int forms = (state & SwiftLaws.ON) != 0 ? SwiftLaws.JUNCTION : SwiftLaws.RECTIFIER;
        double turned = omega * ahead;
        boolean doubt = false;
        for (int form = SwiftLaws.DEVICE; form <= forms; form += SwiftLaws.FORM_COLUMNS) {
            int at = row + form;
            double decaying = rows[at] * x;
            double turning = rows[at + 1] * s + rows[at + 2] * c;
            double after = decaying + turning + rows[at + 3];
            if (form == target) {
                after = 0;
            } else if (after > DOUBTFUL) {
                return form;
            } else if (after > -edge(form)) {
                nearEdge = true;
                doubt |= after > -DOUBTFUL;
            }
            if (!proving) {
                continue;
            }
            double decayingBefore = rows[at] * startX;
            double turningBefore = rows[at + 1] * startSine + rows[at + 2] * startCosine;
            double bulge = rows[at + 4] * ahead * turned * 0.125;
            if (form == target && decaying < 0 && -rate * Math.max(decaying, decayingBefore) >= rows[at + 4]) {
                continue;
            }
            if (Math.max(decaying, decayingBefore) + Math.max(turning, turningBefore) + bulge + rows[at + 3] < 0) {
                continue;
            }
            if (!staysUnder(at, startX, startSine, startCosine, x, s, c, ahead, form == target, DEEPEST)) {
                if (form != target && form == SwiftLaws.DEVICE && ahead < lastDoubt) {
                    lastDoubt = ahead;
                    return form;
                }
                doubt = true;
            }
        }
        return doubt ? DOUBT : NONE;
    }

    private double edge(int form) {
        return form == SwiftLaws.DEVICE && (state & SwiftLaws.ON) != 0 ? EDGE_AMPS : EDGE_VOLTS;
    }

    /**
     * The finer proof for one form over a span of time between two looks: it rises all the way, or falls, or cannot bend
     * enough to reach zero; else the same for the two halves of the span.
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
        double p = rows[at];
        double q = rows[at + 1];
        double r = rows[at + 2];
        double k = rows[at + 3];
        double decaying0 = p * x0;
        double decaying1 = p * x1;
        double turning0 = q * s0 + r * c0;
        double turning1 = q * s1 + r * c1;
        double turned = omega * span;
        double greatest = rows[at + 4];
        double bulge = greatest * span * turned * 0.125;
        if (Math.max(decaying0, decaying1) + Math.max(turning0, turning1) + bulge + k < 0) {
            return true;
        }
        double steepness0 = omega * (q * c0 - r * s0);
        double steepness1 = omega * (q * c1 - r * s1);
        double sag = greatest * turned * turned * 0.125;
        double after = zeroAtEnd ? 0 : decaying1 + turning1 + k;
        if (-rate * Math.max(decaying0, decaying1) + Math.min(steepness0, steepness1) - sag >= 0) {
            return after <= 0;
        }
        double before = Math.min(0, decaying0 + turning0 + k);
        if (!zeroAtEnd && -rate * Math.min(decaying0, decaying1) + Math.max(steepness0, steepness1) + sag <= 0) {
            return true;
        }
        double bend = -rate * rate * Math.min(0, Math.min(decaying0, decaying1));
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

    // --- events -----------------------------------------------------------------------------------------------------

    private Event pass(int target) {
        switch (target) {
            case END:
                return Event.END;
            case SwiftLaws.ZENER:
                state ^= SwiftLaws.CLIPS;
                return Event.ZENER;
            case SwiftLaws.RECTIFIER:
                state ^= SwiftLaws.RECTIFIES;
                return Event.RECTIFIER;
            case SwiftLaws.JUNCTION:
                state ^= SwiftLaws.GATE;
                return Event.GATE;
            default:
                return passDevice();
        }
    }

    private Event passDevice() {
        if ((state & SwiftLaws.ON) != 0) {
            state &= ~(SwiftLaws.ON | SwiftLaws.GATE);
            settle();
            int at = laws.row(state);
            if (now(at + SwiftLaws.DEVICE, decaying(at)) > -Stepper.ABOVE_VOLTS) {
                stallAtValley();
            } else {
                switched(false);
            }
            return Event.VALLEY;
        }
        int off = state;
        if (!(now(laws.row(state) + SwiftLaws.PEAK_CURRENT, 0) >= 0)) {
            stalled = true;
            return Event.STALLS;
        }
        state |= SwiftLaws.ON | SwiftLaws.GATE;
        settle();
        int at = laws.row(state);
        // Regenerative: the saturated line carries more than the valley current.
        if (now(at + SwiftLaws.DEVICE, decaying(at)) < 0) {
            switched(true);
            return Event.FIRES;
        }
        state = off;
        stalled = true;
        return Event.STALLS;
    }

    /** No room between valley and peak point: the ramp follows the peak point, as {@link Stepper} has it. */
    private void stallAtValley() {
        handOver(Mode.STALLED);
        careful.settleResumed();
        state = flags();
        stalled = true;
        kept = Double.NaN;
    }

    private void handOver(Mode now) {
        careful.resume(
                wave,
                now,
                (state & SwiftLaws.RECTIFIES) != 0,
                (state & SwiftLaws.CLIPS) != 0,
                (state & SwiftLaws.GATE) != 0,
                seconds,
                rampVolts);
    }

    /** The device has switched: the ramp goes on with another slope from an instant that moves with its voltage. */
    private void switched(boolean fired) {
        int at = row + SwiftLaws.DEVICE;
        double shift = -kept * rows[at] / slope(at);
        if (fired) {
            firingShift = shift;
        }
        kept += shift * (rampSlope(row) - rampSlope(laws.row(state)));
    }

    /** Slope of a form of the piece just passed at its end. */
    private double slope(int at) {
        return omega * (rows[at + 1] * c - rows[at + 2] * s) - rate * rows[at] * x;
    }

    /** dV_C/dt now under a state's law. */
    private double rampSlope(int at) {
        return omega * (rows[at + SwiftLaws.SINE] * cosine - rows[at + SwiftLaws.COSINE] * sine)
                - rows[at + SwiftLaws.RATE] * decaying(at);
    }

    private double decaying(int at) {
        return rampVolts
                - rows[at + SwiftLaws.STEADY]
                - rows[at + SwiftLaws.SINE] * sine
                - rows[at + SwiftLaws.COSINE] * cosine;
    }

    private double now(int at, double decaying) {
        return rows[at] * decaying + rows[at + 1] * sine + rows[at + 2] * cosine + rows[at + 3];
    }

    /** As {@link NodeLaws#settle}: turns switches over until the state agrees with itself. */
    private void settle() {
        for (int round = 0; round < MOST_ROUNDS; round++) {
            int at = laws.row(state);
            double decaying = decaying(at);
            int wrong = 0;
            if (now(at + SwiftLaws.ZENER, decaying) > 0) {
                wrong |= SwiftLaws.CLIPS;
            }
            if (now(at + SwiftLaws.RECTIFIER, decaying) > 0) {
                wrong |= SwiftLaws.RECTIFIES;
            }
            if ((state & SwiftLaws.ON) != 0 && now(at + SwiftLaws.JUNCTION, decaying) > 0) {
                wrong |= SwiftLaws.GATE;
            }
            if (wrong == 0) {
                return;
            }
            state ^= wrong;
        }
    }

    // --- doubt ------------------------------------------------------------------------------------------------------

    private Event carefully() {
        carefulPieces++;
        boolean wasStalled = stalled;
        handOver(mode());
        Event event = careful.advance(wave.seconds);
        seconds = careful.seconds();
        rampVolts = careful.rampVolts();
        sine = Math.sin(omega * seconds);
        cosine = Math.cos(omega * seconds);
        stalled = careful.mode() == Mode.STALLED;
        state = flags() | (careful.mode() == Mode.ON ? SwiftLaws.ON : 0);
        // A stall may leave switches that do not agree with the ramp; they turn over at once, in pieces of no length.
        unsettled = wasStalled || seconds == passedSeconds;
        followCarefully(event, wasStalled);
        return event;
    }

    private void followCarefully(Event event, boolean wasStalled) {
        if (wasStalled || stalled) {
            // Held at the peak point the ramp knows only when that began and ends.
            kept = Double.NaN;
            return;
        }
        ahead = seconds - passedSeconds;
        decay = Math.exp(-rate * ahead);
        x = startX * decay;
        s = sine;
        c = cosine;
        kept *= decay;
        if (event == Event.VALLEY || event == Event.FIRES) {
            switched(event == Event.FIRES);
        }
    }

    private int flags() {
        return (careful.rectifies() ? SwiftLaws.RECTIFIES : 0)
                | (careful.clips() ? SwiftLaws.CLIPS : 0)
                | (careful.gateConducts() ? SwiftLaws.GATE : 0);
    }

    // --- the gate in the piece just passed --------------------------------------------------------------------------

    /**
     * Until when the gate current stays at or above the trigger current from the start of the piece just passed on, s;
     * POSITIVE_INFINITY for its end and on, NEGATIVE_INFINITY for not even at its start, NaN for don't know.
     */
    public double triggerHeldUntil() {
        int conducting = SwiftLaws.ON | SwiftLaws.GATE;
        if ((passedState & conducting) != conducting) {
            return Double.NEGATIVE_INFINITY;
        }
        int at = laws.row(passedState) + SwiftLaws.TRIGGER;
        double decaying = rows[at] * startX;
        double before = decaying + rows[at + 1] * startSine + rows[at + 2] * startCosine + rows[at + 3];
        ahead = seconds - passedSeconds;
        x = startX * Math.exp(-rate * ahead);
        s = sine;
        c = cosine;
        double after = rows[at] * x + rows[at + 1] * s + rows[at + 2] * c + rows[at + 3];
        if (-rate * rows[at] * x < rows[at + 4] || Math.abs(before) < DOUBTFUL || Math.abs(after) < DOUBTFUL) {
            return Double.NaN;
        }
        if (before > 0) {
            return Double.NEGATIVE_INFINITY;
        }
        if (after < 0) {
            return Double.POSITIVE_INFINITY;
        }
        double part = (decaying - before) / decaying;
        if (part > 0 && part < 1) {
            ahead = -Math.log(part) / rate;
            x = startX * part;
            s = startSine;
            c = startCosine;
            rotate(omega * ahead);
        }
        return seek(at) ? passedSeconds + ahead : Double.NaN;
    }

    /** Whether, at the end of the piece just passed, the ramp resistor alone feeds more than the valley current. */
    public boolean isHeldByResistor() {
        int at = laws.row(passedState);
        double overKnee = now(at + SwiftLaws.ZENER, decaying(at));
        double supply = n.zenerKneeVolts + ((passedState & SwiftLaws.CLIPS) != 0 ? -overKnee : overKnee);
        return (supply - rampVolts) / n.rampOhms > n.valleySiemens * supply;
    }

    // --- what the caller sees ---------------------------------------------------------------------------------------

    /** Time since the line zero, s. */
    public double seconds() {
        return seconds;
    }

    /** Ramp voltage now, V. */
    public double rampVolts() {
        return rampVolts;
    }

    /** How the ramp voltage now moves with the one at the start; NaN where that was not followed. */
    public double kept() {
        return kept;
    }

    /** How the instant of the last firing moves with the ramp voltage at the start, s/V. */
    public double firingShift() {
        return firingShift;
    }

    /** What the device does now. */
    public Mode mode() {
        return stalled ? Mode.STALLED : (state & SwiftLaws.ON) != 0 ? Mode.ON : Mode.OFF;
    }

    /** Whether a half cycle from a neighbouring ramp voltage might pass other events than this one did. */
    public boolean nearEdge() {
        return nearEdge;
    }

    /** Whether the zener conducts now. */
    public boolean clips() {
        return (state & SwiftLaws.CLIPS) != 0;
    }

    /** Pieces passed since made. */
    public long pieces() {
        return pieces;
    }

    /** Those of them that the careful stepper did. */
    public long carefulPieces() {
        return carefulPieces;
    }
}
