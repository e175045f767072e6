package clipramp.firing;

import clipramp.engine.Event;
import clipramp.engine.Mode;
import clipramp.engine.Network;
import clipramp.engine.SourceWave;
import clipramp.engine.SwiftStepper;

/**
 * The periodic state of one unit, as {@link PeriodicState} finds it, but only what a statistic over many units needs:
 * when the thyristor fires and what becomes of the pulse. For a sinusoidal line without lag and direct coupling.
 * Allocates nothing once made.
 *
 * <p>The residual voltage is a fixed point of the half cycle. A half cycle forgets nearly all of the residual that it
 * began with, so two of them and a secant through them leave an error under 1e-9 V; where that does not work out, half cycles
 * follow each other as {@link PeriodicState} has it. What is out of reach (a pulse across the zero, no clipping) is refused
 * and left to {@link Firing}. Longer than most files: one half cycle fills some twenty plain numbers that everything here
 * reads, since a record of them would be allocated for every unit.
 */
public final class SwiftFiring {
    /** Error of a firing instant that is let stand, s: 2e-10 of a half cycle at 50 Hz. */
    private static final double LEFT_SECONDS = 2e-12;

    private static final double SAME_VOLTS = 1e-10;

    /** How many times more bent it may be near its fixed point than between two half cycles. */
    private static final double MORE_BENT = 12;

    /** Farther than this the half cycle's map may be on another branch, V. */
    private static final double NEAR_VOLTS = 0.01;

    /** Relative bend of everything that depends on the residual, 1/V: three times the most that was seen. */
    private static final double BENT = 30;

    /** Share of the residual's error that a half cycle may keep for the secant to be trusted. */
    private static final double MOST_KEPT = 0.2;

    /** With the emitter off at the zero, the firing instant bends over so many volts by as much as it moves, at least. */
    private static final double STRAIGHT_VOLTS = 10;

    private static final int MOST_PASSES = 8;

    /** As {@link PeriodicState} has them: half cycles to wait for repetition, how many are shown without, and what repeats. */
    private static final int MOST_HALVES = 60;

    private static final int SHOWN_UNSETTLED = 8;
    private static final double HUNTING_VOLTS = 1e-9;
    private static final int MOST_EVENTS = 5000;

    /** How far the gate current of the pulse going on has been followed. */
    private enum Watch {
        NONE,
        FRESH,
        HELD
    }

    private final Network n;
    private final SwiftStepper stepper;
    private double omega;
    private double crestVolts;
    private double loadDropVolts;
    private double loadLoopOhms;
    private boolean bothHalves;

    private Watch watch = Watch.NONE;
    private double pulseSeconds;
    private int begun;
    private boolean going;
    private boolean doubt;

    private double firstSeconds;
    private double firedSeconds;
    private double firedShift;
    private int firedPulse;
    private boolean following;
    private boolean stalled;
    private boolean latchedOn;
    private boolean endPulse;
    private double clipUntil;
    /** A number for the order of events of the half cycle just run. */
    private int course;

    private final Mode[] modes = new Mode[MOST_HALVES + 1];
    private final double[] volts = new double[MOST_HALVES + 1];
    private final double[] fired = new double[SHOWN_UNSETTLED];
    private int shown = 1;

    /** For a network that is filled anew, and derived, before each {@link #solve}. */
    public SwiftFiring(Network network) {
        n = network;
        stepper = new SwiftStepper(network);
    }

    /**
     * Sets the load's current with the thyristor on: i = (crest |sin| - drop)/loop.
     *
     * @param lineCrestVolts crest of the line that feeds the load, V
     * @param dropVolts fixed drops in its path, V
     * @param loopOhms everything resistive in its path, ohm, above 0
     * @param inBothHalves whether both half cycles are used, or the positive one only
     */
    public void load(double lineCrestVolts, double dropVolts, double loopOhms, boolean inBothHalves) {
        crestVolts = lineCrestVolts;
        loadDropVolts = dropVolts;
        loadLoopOhms = loopOhms;
        bothHalves = inBothHalves;
    }

    /**
     * Solves the network as it stands.
     *
     * @param wave supply behind the dropper over a half cycle (a period for a single diode), from the line's zero on
     * @param angularRate omega of the line, rad/s
     * @return false where it is not sure of itself: ask {@link Firing}
     */
    public boolean solve(SourceWave wave, double angularRate) {
        omega = angularRate;
        stepper.take(wave);
        shown = 1;
        return settlesQuickly() || (!doubt && settlesSlowly());
    }

    /** By two or three half cycles and the secant through them; false where that does not work out. */
    private boolean settlesQuickly() {
        // As the reference does, from a discharged capacitor: where two periodic states exist, it decides between them.
        Mode mode = Mode.OFF;
        double volts = 0;
        Mode modeBefore = Mode.STALLED;
        double voltsBefore = 0;
        double endBefore = 0;
        int courseBefore = 0;
        double keptBefore = Double.NaN;
        for (int pass = 0; pass < MOST_PASSES; pass++) {
            if (!run(mode, volts, pass == 0, 0)) {
                return false;
            }
            double end = stepper.rampVolts();
            Mode endMode = stepper.mode();
            double kept = stepper.kept();
            boolean followed = !Double.isNaN(kept);
            if (!followed && endMode == mode && modeBefore == mode) {
                kept = (end - endBefore) / (volts - voltsBefore);
            }
            if (pass > 0 && endMode == mode && Math.abs(end - volts) < SAME_VOLTS) {
                return settled();
            }
            double next = end;
            if (!Double.isNaN(kept)) {
                if (!(Math.abs(kept) < MOST_KEPT)) {
                    return false;
                }
                double step = (end - volts) / (1 - kept);
                // One that ran another course than the one before has no slope in common with it.
                boolean sameCourse = pass > 0 && course == courseBefore;
                boolean confirmed = sameCourse && (mode == Mode.ON || pass > 1);
                next = sameCourse ? volts + step : end;
                double change = Math.abs((kept - keptBefore) / (volts - voltsBefore));
                double bend = Math.max(BENT * Math.abs(kept), MORE_BENT * (Double.isNaN(change) ? 0 : change));
                double left = followed ? bend * step * step : Math.abs(kept * (end - volts));
                if (confirmed
                        && endMode == mode
                        && Math.abs(step) < NEAR_VOLTS
                        && left * sensitivity() < LEFT_SECONDS) {
                    if (stepper.nearEdge()) {
                        return repeatsFrom(mode, next);
                    }
                    boolean straight =
                            mode == Mode.OFF && Math.abs(firedShift) * step * step < LEFT_SECONDS * STRAIGHT_VOLTS;
                    if (straight) {
                        firedSeconds += firedShift * step;
                    }
                    return (straight || Double.isNaN(firedSeconds) || fireFrom(mode, next)) && settled();
                }
            }
            keptBefore = kept;
            courseBefore = course;
            modeBefore = mode;
            voltsBefore = volts;
            endBefore = end;
            volts = next;
            mode = endMode;
        }
        return false;
    }

    /** Near an edge the fixed point may belong to a course that the half cycle from there no longer takes: it is run whole. */
    private boolean repeatsFrom(Mode mode, double volts) {
        return run(mode, volts, false, 0)
                && stepper.mode() == mode
                && Math.abs(stepper.rampVolts() - volts) * sensitivity() < LEFT_SECONDS
                && settled();
    }

    /** How the firing instant moves with the residual, s/V; a whole time constant's worth where that is not known. */
    private double sensitivity() {
        return !Double.isNaN(firedShift) ? Math.abs(firedShift) : n.rampOhms * n.capacitorFarads;
    }

    private boolean settled() {
        fired[0] = firedSeconds;
        doubt = begun > 0 && clipUntil == Double.NEGATIVE_INFINITY;
        return !doubt;
    }

    /** Half cycle after half cycle, until they repeat, every second one repeats, or there is no patience left. */
    private boolean settlesSlowly() {
        modes[0] = Mode.OFF;
        volts[0] = 0;
        for (int half = 1; half <= MOST_HALVES; half++) {
            if (!run(modes[half - 1], volts[half - 1], false, 0)) {
                return false;
            }
            modes[half] = stepper.mode();
            volts[half] = stepper.rampVolts();
            if (repeats(half, 1)) {
                return run(modes[half], volts[half], false, 0) && settled();
            }
            if (repeats(half, 2) || half == MOST_HALVES) {
                return bothHalves && hunts(half, repeats(half, 2) ? 2 : fired.length);
            }
        }
        return false;
    }

    private boolean repeats(int half, int after) {
        return half >= after
                && modes[half] == modes[half - after]
                && Math.abs(volts[half] - volts[half - after]) < HUNTING_VOLTS;
    }

    /** Records half cycles that differ, the positive one first: those with even numbers. */
    private boolean hunts(int half, int count) {
        Mode mode = modes[half];
        double volt = volts[half];
        if (half % 2 == 1) {
            if (!run(mode, volt, false, 0)) {
                return false;
            }
            mode = stepper.mode();
            volt = stepper.rampVolts();
        }
        int begunFirst = 0;
        for (int i = 0; i < count; i++) {
            if (!run(mode, volt, false, 0) || (begun > 0 && clipUntil == Double.NEGATIVE_INFINITY)) {
                return false;
            }
            fired[i] = firedSeconds;
            begunFirst = i == 0 ? begun : begunFirst;
            mode = stepper.mode();
            volt = stepper.rampVolts();
        }
        shown = count;
        begun = begunFirst;
        return true;
    }

    /** Runs once more to the firing pulse; what the rest of the half cycle showed stays. */
    private boolean fireFrom(Mode mode, double volts) {
        int pulse = firedPulse;
        boolean stalledBefore = stalled;
        boolean latchedOnBefore = latchedOn;
        boolean endPulseBefore = endPulse;
        double clipUntilBefore = clipUntil;
        int begunBefore = begun;
        if (!run(mode, volts, false, pulse) || begun != pulse) {
            return false;
        }
        firedSeconds = pulseSeconds;
        stalled = stalledBefore;
        latchedOn = latchedOnBefore;
        endPulse = endPulseBefore;
        clipUntil = clipUntilBefore;
        begun = begunBefore;
        return true;
    }

    private boolean run(Mode mode, double volts, boolean rough, int onlyToPulse) {
        following = !rough && onlyToPulse == 0;
        watch = Watch.NONE;
        begun = 0;
        going = mode == Mode.ON;
        doubt = false;
        firstSeconds = Double.NaN;
        firedSeconds = Double.NaN;
        firedShift = Double.NaN;
        stalled = false;
        latchedOn = false;
        clipUntil = Double.NEGATIVE_INFINITY;
        course = 0;
        stepper.start(mode, volts, rough, rough || onlyToPulse > 0);
        Event event;
        int events = 0;
        do {
            event = step();
            events++;
            doubt |= events > MOST_EVENTS;
        } while (!doubt && event != Event.END && (onlyToPulse == 0 || begun < onlyToPulse));
        if (stepper.clips()) {
            clipUntil = stepper.seconds();
        }
        endPulse = (Double.isNaN(firedSeconds) ? firstSeconds : firedSeconds) > clipUntil;
        return !doubt && watch == Watch.NONE;
    }

    /** Goes through one piece and notes what it ended in. */
    private Event step() {
        boolean clippedBefore = stepper.clips();
        boolean held = stepper.mode() == Mode.STALLED;
        Event event = stepper.advance();
        // Counted from the supply's first clipping on: around the zero the order depends on the residual itself.
        course = course == 0
                ? (event == Event.ZENER ? 1 : 0)
                : 31 * course + event.name().hashCode();
        if (watch != Watch.NONE) {
            follow(event);
        }
        if (event == Event.FIRES) {
            fires(held);
        } else if (event == Event.STALLS) {
            stalled |= begun == 0;
        } else if (event == Event.VALLEY) {
            going = false;
        } else if (event != Event.END && going && stepper.mode() == Mode.ON) {
            latchedOn |= stepper.isHeldByResistor();
        }
        if (clippedBefore && !stepper.clips()) {
            clipUntil = stepper.seconds();
        }
        return event;
    }

    private void fires(boolean afterStall) {
        double now = stepper.seconds();
        if (begun == 0) {
            firstSeconds = now;
            stalled = afterStall;
        }
        begun++;
        going = true;
        if (Double.isNaN(firedSeconds)) {
            watch = following ? Watch.FRESH : Watch.NONE;
            pulseSeconds = now;
            firedShift = stepper.firingShift();
        }
    }

    /** Follows the gate current through a piece of the pulse until it falls under the trigger current. */
    private void follow(Event event) {
        double until = stepper.triggerHeldUntil();
        if (Double.isNaN(until)) {
            doubt = true;
        } else if (until == Double.POSITIVE_INFINITY) {
            watch = Watch.HELD;
            if (event == Event.VALLEY) {
                over(stepper.seconds());
            }
        } else if (until == Double.NEGATIVE_INFINITY) {
            doubt = watch == Watch.HELD;
            watch = Watch.NONE;
        } else {
            over(until);
        }
    }

    private void over(double untilSeconds) {
        watch = Watch.NONE;
        double held = untilSeconds - pulseSeconds;
        if (held > 0
                && held >= n.turnOnSeconds
                && anodeAmps(pulseSeconds) > 0
                && anodeAmps(untilSeconds) >= n.latchingAmps) {
            firedSeconds = pulseSeconds;
            firedPulse = begun;
        }
    }

    private double anodeAmps(double seconds) {
        double sine = Math.sin(omega * seconds);
        double driving = crestVolts * (bothHalves ? Math.abs(sine) : sine) - loadDropVolts;
        return driving > 0 ? driving / loadLoopOhms : 0;
    }

    // --- what the periodic state is ---------------------------------------------------------------------------------

    /** Firing angle, rad from the line's zero; NaN if the thyristor stays off. Of the positive half cycle where it hunts. */
    public double firingRad() {
        return omega * fired[0];
    }

    /** How many half cycles differ: 1, or more where it hunts. */
    public int shown() {
        return shown;
    }

    /**
     * Firing angle in one of the half cycles that differ.
     *
     * @param half 0 to {@link #shown} less 1, the positive one first
     * @return rad from that half cycle's zero; NaN if the thyristor stays off
     */
    public double firingRad(int half) {
        return omega * fired[half];
    }

    /** What it comes to, in one word, as {@link Solution#state} has it. */
    public FiringState state() {
        if (begun == 0) {
            return FiringState.SILENT;
        }
        if (shown > 1) {
            return FiringState.HUNTS;
        }
        if (stalled) {
            return FiringState.STALLS;
        }
        if (latchedOn) {
            return FiringState.LATCHED_ON;
        }
        return endPulse ? FiringState.END_PULSE : FiringState.FIRES;
    }
}
