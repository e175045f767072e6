package clipramp.engine;

/**
 * Leads the firing circuit from event to event through a half cycle, exactly (DEVELOPERS.md, To fire or to stall; Events,
 * exactly). Allocates nothing once made. Times are seconds since the line zero that begins the half cycle.
 *
 * <p>Use: {@link #start} at a line zero, then {@link #advance} again and again; between two calls {@link #piece()} is
 * the piece just passed, from its own start to {@link #seconds()}.
 */
public final class Stepper {
    /** Looks at a stall that waits for a live supply: coarse, since it happens on a nearly dead supply only. */
    private static final int REGENERATION_LOOKS = 400;

    private static final int BISECTIONS = 60;

    /** A ramp that exceeds the peak point by more than rounding was left above it by a jump, V. */
    static final double ABOVE_VOLTS = 1e-9;

    /** By how much more than the valley current a pulse must begin with, as a share of it. */
    static final double VALLEY_ROUNDING = 1e-6;

    /**
     * A branch that has just switched is asked again after this part of the half cycle: what it switched by and what it
     * is asked by now round differently, and where next to no resistance stands against much (the books' ideal clip)
     * would switch it to and fro for ever. A thousandth of the accuracy that event times have.
     */
    private static final double REST_SHARE = 1e-9;

    /** Events without progress after which the circuit is taken to rest on a threshold. */
    private static final int MOST_IDLE = 12;

    /** Share of the half cycle under which time has not gone on. */
    private static final double NO_PROGRESS = 1e-13;

    /** First pause of a resting circuit, as a share of the half cycle. */
    private static final double FIRST_PAUSE = 1e-11;

    private final Network n;
    private final Piece piece = new Piece();
    private final Piece trial = new Piece();
    private final Affine form = new Affine();
    private SourceWave wave = new SourceWave();

    private Mode mode = Mode.OFF;
    private boolean rectifies;
    private boolean clips;
    private boolean gateConducts;
    private boolean clamps;
    private double seconds;
    private double rampVolts;
    private double fluxAmps;
    private int idle;
    private double pause;
    private double rectifierSwitched;
    private double zenerSwitched;
    private double gateSwitched;
    private Event nextEvent = Event.END;
    private double nextSeconds;

    /** A stepper for a network, derived before the first start; it may be filled anew between two half cycles. */
    public Stepper(Network network) {
        n = network;
    }

    /**
     * Begins a half cycle with the state that the last one ended in.
     *
     * @param source what stands behind the dropper; it must stay as it is until the half cycle's end
     * @param startMode what the device does
     * @param startRampVolts V_C, V above the firing common
     * @param startFluxAmps magnetising current, A; 0 without a pulse transformer
     */
    public void start(SourceWave source, Mode startMode, double startRampVolts, double startFluxAmps) {
        wave = source;
        mode = startMode;
        seconds = 0;
        idle = 0;
        pause = 0;
        rampVolts = startRampVolts;
        fluxAmps = startFluxAmps;
        nothingSwitched();
        settle();
    }

    /** Goes on in the middle of a half cycle, without a pulse transformer, in a state that is known to agree with itself. */
    void resume(
            SourceWave source,
            Mode nowMode,
            boolean nowRectifies,
            boolean nowClips,
            boolean nowGateConducts,
            double nowSeconds,
            double nowRampVolts) {
        wave = source;
        mode = nowMode;
        rectifies = nowRectifies;
        clips = nowClips;
        gateConducts = nowGateConducts;
        clamps = false;
        boolean elsewhere = nowSeconds != seconds;
        seconds = nowSeconds;
        rampVolts = nowRampVolts;
        fluxAmps = 0;
        idle = 0;
        pause = 0;
        if (elsewhere) {
            // At the very instant where it stopped, what has just switched still rests.
            nothingSwitched();
        }
    }

    /** Finds the switches that agree with a state that was just resumed. */
    void settleResumed() {
        settle();
    }

    private void nothingSwitched() {
        rectifierSwitched = Double.NEGATIVE_INFINITY;
        zenerSwitched = Double.NEGATIVE_INFINITY;
        gateSwitched = Double.NEGATIVE_INFINITY;
    }

    /** Puts another source behind the dropper from here on: the thyristor takes the supply away or gives it back. */
    public void switchSource(SourceWave source) {
        wave = source;
        settle();
    }

    /**
     * Goes back to an instant just after firing.
     *
     * @param firingSeconds when, s
     * @param firingRampVolts V_C then, V
     * @param firingFluxAmps magnetising current then, A
     */
    public void returnToFiring(double firingSeconds, double firingRampVolts, double firingFluxAmps) {
        seconds = firingSeconds;
        rampVolts = firingRampVolts;
        fluxAmps = firingFluxAmps;
        turnOn();
    }

    /**
     * Moves to the next event and through it.
     *
     * @param limitSeconds where to stop if nothing happens before, s
     * @return what happened; {@link #seconds()} says when, to rounding and never later than it does
     */
    public Event advance(double limitSeconds) {
        beginPiece();
        nextSeconds = limitSeconds;
        nextEvent = Event.END;
        switch (mode) {
            case OFF -> offer(Event.STALLS, peakReached(nextSeconds));
            case ON -> {
                offer(Event.VALLEY, valleyReached(nextSeconds));
                offer(Event.GATE, gateSwitches(nextSeconds));
            }
            case STALLED -> {
                offer(Event.FIRES, stallFires(nextSeconds));
                offer(Event.UNSTALLS, stallLeaves(nextSeconds));
            }
        }
        offer(Event.ZENER, zenerSwitches(nextSeconds));
        offer(Event.RECTIFIER, rectifierSwitches(nextSeconds));
        if (n.clampVolts < Double.POSITIVE_INFINITY) {
            offer(Event.CLAMP, clampSwitches(nextSeconds));
        }
        rest(nextSeconds, limitSeconds);
        seconds = nextSeconds;
        piece.look(seconds);
        rampVolts = piece.rampVolts;
        fluxAmps = piece.fluxAmps;
        return pass(nextEvent);
    }

    private void beginPiece() {
        piece.mode = mode;
        piece.rectifies = rectifies;
        piece.clips = clips;
        piece.gateConducts = gateConducts;
        piece.clamps = clamps;
        NodeLaws.shape(n, piece);
        piece.begin(n, wave, seconds, rampVolts, fluxAmps);
    }

    /** The soonest of what may end the piece ends it. */
    private void offer(Event event, double at) {
        if (at < nextSeconds) {
            nextSeconds = at;
            nextEvent = event;
        }
    }

    /**
     * A circuit that rests on a threshold (a supply of no inner resistance, a device without an emitter drop) may switch to
     * and fro on rounding. After a few events without progress the searches begin a little later, and later again while
     * that lasts: on the threshold either state is right.
     */
    private void rest(double time, double limitSeconds) {
        if (time - seconds > 2 * pause + limitSeconds * NO_PROGRESS) {
            idle = 0;
            pause = 0;
        } else if (++idle > MOST_IDLE) {
            idle = 0;
            pause = Math.max(limitSeconds * FIRST_PAUSE, 2 * pause);
        }
    }

    private Event pass(Event event) {
        switch (event) {
            case RECTIFIER -> {
                rectifies = !rectifies;
                rectifierSwitched = seconds;
            }
            case ZENER -> {
                clips = !clips;
                zenerSwitched = seconds;
            }
            case GATE -> {
                gateConducts = !gateConducts;
                gateSwitched = seconds;
            }
            case CLAMP -> clamps = !clamps;
            case UNSTALLS -> mode = Mode.OFF;
            case VALLEY -> passValley();
            case FIRES -> turnOn();
            case STALLS -> {
                if (canFire()) {
                    turnOn();
                    return Event.FIRES;
                }
                mode = Mode.STALLED;
            }
            case END -> {}
        }
        return event;
    }

    private void turnOn() {
        mode = Mode.ON;
        settle();
    }

    private void passValley() {
        mode = Mode.OFF;
        settle();
        if (rampVolts > trial.peak.at(rampVolts, fluxAmps, wave.at(seconds)) - ABOVE_VOLTS) {
            // A dying supply leaves no room between valley and peak point: the ramp follows the peak point.
            mode = Mode.STALLED;
            settle();
        }
    }

    // --- what may end a piece ---------------------------------------------------------------------------------------

    private double search(double limit) {
        return FirstCrossing.after(piece, form, Math.min(seconds + pause, limit), limit);
    }

    private double searchAfterRest(double switched, double limit) {
        double from = switched == seconds ? seconds + REST_SHARE * wave.seconds() : seconds;
        return from < limit ? FirstCrossing.after(piece, form, from, limit) : Double.POSITIVE_INFINITY;
    }

    private double rectifierSwitches(double limit) {
        EventForms.rectifier(piece, form);
        return searchAfterRest(rectifierSwitched, limit);
    }

    private double zenerSwitches(double limit) {
        EventForms.zener(n, piece, form);
        return searchAfterRest(zenerSwitched, limit);
    }

    private double gateSwitches(double limit) {
        EventForms.gate(n, piece, form);
        return searchAfterRest(gateSwitched, limit);
    }

    private double clampSwitches(double limit) {
        if (clamps) {
            form.copy(piece.clamp);
        } else {
            form.copy(piece.baseOne);
            form.constant += n.clampVolts;
        }
        form.negate();
        return search(limit);
    }

    private double peakReached(double limit) {
        EventForms.peak(piece, form);
        return search(limit);
    }

    private double valleyReached(double limit) {
        EventForms.valley(n, piece, form);
        return search(limit);
    }

    private double stallLeaves(double limit) {
        form.copy(piece.emitter);
        form.negate();
        return search(limit);
    }

    /** The emitter gets its peak-point current, and the pulse would be regenerative. */
    private double stallFires(double limit) {
        EventForms.peakCurrent(n, piece, form);
        double enough = search(limit);
        return enough >= limit || regenerates(enough) ? enough : waitForRegeneration(enough, limit);
    }

    private double waitForRegeneration(double from, double limit) {
        double low = from;
        for (int i = 1; i <= REGENERATION_LOOKS; i++) {
            double high = from + (limit - from) * i / REGENERATION_LOOKS;
            if (hasPeakCurrent(high) && regenerates(high)) {
                for (int b = 0; b < BISECTIONS; b++) {
                    double middle = (low + high) / 2;
                    if (hasPeakCurrent(middle) && regenerates(middle)) {
                        high = middle;
                    } else {
                        low = middle;
                    }
                }
                return high;
            }
            low = high;
        }
        return Double.POSITIVE_INFINITY;
    }

    private boolean hasPeakCurrent(double time) {
        piece.look(time);
        return piece.value(piece.emitter) >= n.peakCurrentAmps;
    }

    private boolean regenerates(double time) {
        piece.look(time);
        return regenerates(piece.rampVolts, piece.fluxAmps, piece.sourceVolts);
    }

    // --- firing ----------------------------------------------------------------------------------------------------

    /**
     * With the ramp at the peak point: does the emitter get the peak-point current, and would the pulse regenerate? A ramp
     * that a falling supply has left above the peak point feeds the emitter without limit.
     */
    private boolean canFire() {
        if (piece.rampVolts - piece.value(piece.peak) > ABOVE_VOLTS) {
            return regenerates(rampVolts, fluxAmps, wave.at(seconds));
        }
        trial.mode = Mode.STALLED;
        trial.rectifies = rectifies;
        trial.clips = clips;
        trial.clamps = clamps;
        NodeLaws.shape(n, trial);
        double source = wave.at(seconds);
        double emitter =
                trial.emitter.at(rampVolts, fluxAmps, source) + trial.emitter.sourceSlope * wave.slopeAt(seconds);
        return emitter >= n.peakCurrentAmps && regenerates(rampVolts, fluxAmps, source);
    }

    /** Whether the saturated emitter line would carry more than the valley current at a ramp and source voltage. */
    private boolean regenerates(double ramp, double flux, double source) {
        trial.mode = Mode.ON;
        trial.rectifies = rectifies;
        trial.clips = clips;
        trial.gateConducts = false;
        trial.clamps = clamps;
        NodeLaws.settle(n, trial, ramp, flux, source);
        double valleyAmps = n.valleySiemens * trial.supply.at(ramp, flux, source);
        // A device that has just left its valley stands on the limit: rounding must not fire it again and again.
        return trial.emitter.at(ramp, flux, source) > valleyAmps * (1 + VALLEY_ROUNDING);
    }

    private void settle() {
        trial.mode = mode;
        trial.rectifies = rectifies;
        trial.clips = clips;
        trial.gateConducts = gateConducts;
        trial.clamps = clamps;
        NodeLaws.settle(n, trial, rampVolts, fluxAmps, wave.at(seconds));
        rectifies = trial.rectifies;
        clips = trial.clips;
        gateConducts = trial.gateConducts;
        clamps = trial.clamps;
    }

    // --- what the caller sees --------------------------------------------------------------------------------------

    /** The piece just passed; valid until the next call. */
    public Piece piece() {
        return piece;
    }

    /** Time since the line zero, s. */
    public double seconds() {
        return seconds;
    }

    /** Ramp voltage now, V. */
    public double rampVolts() {
        return rampVolts;
    }

    /** Magnetising current now, A; 0 without a pulse transformer. */
    public double fluxAmps() {
        return fluxAmps;
    }

    /** What the device does now. */
    public Mode mode() {
        return mode;
    }

    /** Whether the zener conducts now. */
    public boolean clips() {
        return clips;
    }

    boolean rectifies() {
        return rectifies;
    }

    boolean gateConducts() {
        return gateConducts;
    }
}
