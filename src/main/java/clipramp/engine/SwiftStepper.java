package clipramp.engine;

/**
 * {@link Stepper} on a sinusoidal supply with direct coupling, for the very same events some twenty times as fast.
 *
 * <p>The end of a piece is guessed from how the same state ended before ({@link SwiftMemory}), refined by Newton's method
 * with a second-order term ({@link SwiftPiece}), and then proven: every form that may end the piece is bounded over all of
 * it ({@link SwiftProof}). Where the proof fails, or the device is stalled, {@link Stepper} does the piece. Longer
 * than most files: events, their settling and the way to the careful stepper and back all turn over the same state.
 *
 * <p>It fires and leaves the valley at {@link Stepper}'s instants to within 1e-11 s; a switch of rectifier, zener or gate near
 * where its form bends round may be up to 1e-10 s off (DEVELOPERS.md, Many units at once). Times are seconds since the
 * line zero that begins the half cycle, voltages against the firing common. Not for two threads at once.
 */
public final class SwiftStepper {
    private static final int MOST_TARGETS = 6;
    private static final int MOST_ROUNDS = 9;

    /** Gate currents nearer to the trigger current than this, V across the junction, are not judged here. */
    private static final double DOUBTFUL = 1e-11;

    private final Network n;
    private final SwiftLaws laws;
    private final double[] rows;
    private final SwiftPiece piece;
    private final SwiftProof proof;
    private final SwiftMemory memory = new SwiftMemory();
    private final Stepper careful;
    private SourceWave wave = new SourceWave();
    private boolean proving = true;
    private double omega;

    // The state now.
    private boolean stalled;
    private boolean unsettled;
    private int state;
    private double seconds;
    private double rampVolts;
    private double sine;
    private double cosine;

    /** How the ramp voltage now moves with the ramp voltage at the start; NaN where that was not followed. */
    private double kept;

    /** How the instant of the last firing moves with it, s/V. */
    private double firingShift;

    // The piece just passed.
    private int passedState;
    private double passedSeconds;

    private long carefulPieces;
    private long pieces;

    /** A stepper for a network that may be filled anew, and must be taken up by {@link #take} then. */
    public SwiftStepper(Network network) {
        n = network;
        laws = new SwiftLaws(network);
        rows = laws.rows;
        piece = new SwiftPiece(rows);
        proof = new SwiftProof(piece);
        careful = new Stepper(network);
    }

    /**
     * Takes up a network whose numbers have changed, or another supply.
     *
     * @param source a pure sine from its zero on; it must stay as it is until another is taken up
     * @throws IllegalArgumentException for another source, or a network with a pulse transformer
     */
    public void take(SourceWave source) {
        if (source.count != 1 || source.phases[0] != 0 || n.transformerCoupled) {
            throw new IllegalArgumentException("the swift stepper is for a sinusoidal supply and direct coupling");
        }
        wave = source;
        omega = source.rates[0];
        piece.take(omega, source.seconds);
        laws.reset(source);
        memory.forget();
    }

    /**
     * Begins a half cycle.
     *
     * @param startMode what the device does
     * @param startRampVolts V_C, V
     * @param rough whether instants good to 1e-8 s will do
     * @param proven whether the pieces are known to be those of a half cycle before, or a look at their ends will do
     */
    public void start(Mode startMode, double startRampVolts, boolean rough, boolean proven) {
        proving = !proven;
        memory.start();
        proof.start();
        piece.start(rough);
        kept = 1;
        firingShift = Double.NaN;
        seconds = 0;
        rampVolts = startRampVolts;
        sine = 0;
        cosine = 1;
        stalled = startMode == Mode.STALLED;
        unsettled = false;
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
        piece.begin(laws.row(state), seconds, wave.seconds - seconds, rampVolts, sine, cosine);
        if (unsettled) {
            return carefully();
        }
        int target = reach();
        if (target == SwiftProof.DOUBT) {
            proof.doubt();
            return carefully();
        }
        return pass(target);
    }

    /** Looks at the proven first event; says which one it is, or DOUBT. */
    private int reach() {
        proof.begin();
        boolean on = (state & SwiftLaws.ON) != 0;
        int target = memory.recall(piece, state, cosine < 0);
        if (target == SwiftPiece.NONE) {
            target = piece.aim(memory.usual(likely()));
        }
        int lost = 0;
        for (int i = 0; i < MOST_TARGETS; i++) {
            if (target != SwiftPiece.END) {
                boolean found = piece.seek(piece.row + target);
                if (piece.ahead >= piece.limit) {
                    target = piece.lookAtEnd();
                } else if (!found) {
                    // Misled by memory; or what usually happens does not, and the form turns round before its zero.
                    lost++;
                    target = lost == 1 ? piece.aim(likely()) : piece.lookAtEnd();
                    if (target != SwiftPiece.END) {
                        continue;
                    }
                }
            }
            int other = proof.judge(target, on, proving);
            if (other == SwiftPiece.NONE || other == SwiftProof.DOUBT) {
                return other == SwiftPiece.NONE ? target : other;
            }
            target = piece.aim(other);
        }
        return SwiftProof.DOUBT;
    }

    /** What usually ends a piece in this state. */
    private int likely() {
        boolean on = (state & SwiftLaws.ON) != 0;
        if ((state & SwiftLaws.RECTIFIES) == 0) {
            return cosine > 0 ? SwiftLaws.RECTIFIER : SwiftPiece.END;
        }
        boolean clips = (state & SwiftLaws.CLIPS) != 0;
        if (on) {
            return clips || (state & SwiftLaws.GATE) == 0 ? SwiftLaws.DEVICE : SwiftLaws.JUNCTION;
        }
        return clips || cosine < 0 ? SwiftLaws.DEVICE : SwiftLaws.ZENER;
    }

    // --- events -----------------------------------------------------------------------------------------------------

    /** Moves to where the piece is looked at, and through the event there. */
    private Event pass(int target) {
        piece.straighten();
        double decay = piece.decay();
        kept *= decay;
        memory.keep(piece, target, decay);
        seconds = target == SwiftPiece.END ? wave.seconds : seconds + piece.ahead;
        sine = piece.s;
        cosine = piece.c;
        rampVolts = piece.rampVolts();
        return switch (target) {
            case SwiftPiece.END -> Event.END;
            case SwiftLaws.ZENER -> {
                state ^= SwiftLaws.CLIPS;
                yield Event.ZENER;
            }
            case SwiftLaws.RECTIFIER -> {
                state ^= SwiftLaws.RECTIFIES;
                yield Event.RECTIFIER;
            }
            case SwiftLaws.JUNCTION -> {
                state ^= SwiftLaws.GATE;
                yield Event.GATE;
            }
            default -> passDevice();
        };
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
        double spare = Stepper.VALLEY_ROUNDING * n.valleySiemens * supplyVolts(state);
        if (now(at + SwiftLaws.DEVICE, decaying(at)) < -spare) {
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
        int at = piece.row + SwiftLaws.DEVICE;
        double shift = -kept * rows[at] / piece.slope(at);
        if (fired) {
            firingShift = shift;
        }
        kept += shift * (rampSlope(piece.row) - rampSlope(laws.row(state)));
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
        piece.ahead = seconds - passedSeconds;
        double decay = Math.exp(-piece.rate * piece.ahead);
        piece.x = piece.startX * decay;
        piece.s = sine;
        piece.c = cosine;
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
        double decaying = rows[at] * piece.startX;
        double before = decaying + rows[at + 1] * piece.startSine + rows[at + 2] * piece.startCosine + rows[at + 3];
        piece.ahead = seconds - passedSeconds;
        piece.x = piece.startX * Math.exp(-piece.rate * piece.ahead);
        piece.s = sine;
        piece.c = cosine;
        double after = rows[at] * piece.x + rows[at + 1] * sine + rows[at + 2] * cosine + rows[at + 3];
        boolean falls = -piece.rate * rows[at] * piece.x >= rows[at + 4];
        if (!falls || Math.abs(before) < DOUBTFUL || Math.abs(after) < DOUBTFUL) {
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
            piece.lookWhere(part);
        }
        return piece.seek(at) ? passedSeconds + piece.ahead : Double.NaN;
    }

    /** Whether, at the end of the piece just passed, the ramp resistor alone feeds more than the valley current. */
    public boolean isHeldByResistor() {
        double supply = supplyVolts(passedState);
        return (supply - rampVolts) / n.rampOhms > n.valleySiemens * supply;
    }

    /** V_S now under a state's law, V. */
    private double supplyVolts(int under) {
        int at = laws.row(under);
        double overKnee = now(at + SwiftLaws.ZENER, decaying(at));
        return n.zenerKneeVolts + ((under & SwiftLaws.CLIPS) != 0 ? -overKnee : overKnee);
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

    /** How the ramp voltage now moves with the one at the start, V/V; NaN where that was not followed. */
    public double kept() {
        return kept;
    }

    /** How the instant of the last firing moves with the ramp voltage at the start, s/V; NaN where that was not followed. */
    public double firingShift() {
        return firingShift;
    }

    /** What the device does now. */
    public Mode mode() {
        return stalled ? Mode.STALLED : (state & SwiftLaws.ON) != 0 ? Mode.ON : Mode.OFF;
    }

    /** Whether a half cycle from a neighbouring ramp voltage might pass other events than this one did. */
    public boolean nearEdge() {
        return proof.nearEdge();
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
