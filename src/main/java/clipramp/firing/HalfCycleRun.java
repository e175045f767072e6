package clipramp.firing;

import clipramp.circuit.RefusedCircuit;
import clipramp.engine.Event;
import clipramp.engine.Mode;
import clipramp.engine.Piece;
import clipramp.engine.SourceWave;
import clipramp.engine.Stepper;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Runs the firing circuit through half cycles, one after the other, and keeps what the last one showed. */
final class HalfCycleRun {
    /**
     * Events in one half cycle beyond which the ramp is no ramp any more: some two thousand pulses, tens of times what a
     * ramp that still fires anything brings. Followed further, one check would take minutes.
     */
    private static final int MOST_EVENTS = 5_000;

    private final FiringCase firing;
    private final Stepper stepper;

    private int half;
    private Mode mode = Mode.OFF;
    private double rampVolts;
    private double fluxAmps;
    /** The pulse that is going on, if one is; it may have begun in the half cycle before. */
    private @Nullable PulseMeter going;

    private List<PulseMeter> begun = new ArrayList<>();
    private double startVolts;
    private SupplyWatch supply = new SupplyWatch();
    private boolean stalled;
    private boolean latchedOn;

    private boolean conducting;
    /** Time in the next half cycle until which this one's load current flows on, s. */
    private double conductsUntilSeconds;

    private double triedFromSeconds;
    private double triedRampVolts;
    private double triedFluxAmps;
    private boolean trying;
    private boolean measures;
    /** Whether nobody asks for more of the pulses than whether they turn the thyristor on. */
    private boolean brief;

    HalfCycleRun(FiringCase firing) {
        this.firing = firing;
        stepper = new Stepper(firing.network());
    }

    /**
     * Runs through the next half cycle unseen. Its pulses are measured only where the way on depends on them: across the
     * thyristor, which takes the supply away if it turns on.
     */
    void skip() {
        brief = true;
        next(PieceSink.NONE, firing.tapsThyristor());
        brief = false;
    }

    /** Runs through the next half cycle, measures its pulses and shows its pieces. */
    void next(PieceSink sink) {
        next(sink, true);
    }

    private void next(PieceSink sink, boolean measure) {
        measures = measure;
        SourceWave wave = firing.timing().wave(half);
        double end = wave.seconds();
        begin();
        // Across the thyristor the supply returns when the load current dies, which an inductance puts off.
        double returns = conductsUntilSeconds;
        conductsUntilSeconds = 0;
        conducting = returns > 0;
        stepper.start(conducting ? firing.conductingWave(end) : wave, mode, rampVolts, fluxAmps);
        supply.zener(false, stepper.clips(), 0);
        for (int events = 0; ; events++) {
            refuseBeyondCounting(events);
            double from = stepper.seconds();
            boolean clippedBefore = stepper.clips();
            boolean returning = from < returns;
            Event event = stepper.advance(returning ? Math.min(returns, end) : end);
            passed(sink, stepper.piece(), from, stepper.seconds());
            if (event == Event.END && returning && returns < end) {
                conducting = false;
                stepper.switchSource(wave);
                supply.zener(clippedBefore, stepper.clips(), stepper.seconds());
                continue;
            }
            handle(event, wave, sink);
            supply.zener(clippedBefore, stepper.clips(), stepper.seconds());
            if (event == Event.END && !takenBack(wave, sink)) {
                break;
            }
        }
        supply.end(stepper.clips(), end);
        keepFor(end);
    }

    private void refuseBeyondCounting(int events) {
        if (events > MOST_EVENTS) {
            throw new RefusedCircuit(
                    "ramp.capacitor",
                    "the circuit switches more than " + MOST_EVENTS + " times within one half cycle (" + begun.size()
                            + " pulses so far), more than is followed. Make ramp.capacitor larger; if it is not small,"
                            + " check the valley point of trigger.device.");
        }
    }

    /** What this half cycle, which ends so late, hands on to the next one. */
    private void keepFor(double end) {
        mode = stepper.mode();
        rampVolts = stepper.rampVolts();
        fluxAmps = stepper.fluxAmps();
        if (firing.network().reverseVolts > 0) {
            rampVolts = firing.network().rampUnderReverse(rampVolts, end / 2);
        }
        half++;
    }

    private void begin() {
        begun = new ArrayList<>();
        startVolts = rampVolts;
        supply = new SupplyWatch();
        stalled = false;
        latchedOn = false;
        conducting = false;
        trying = false;
    }

    private void passed(PieceSink sink, Piece piece, double from, double to) {
        if (measures) {
            supply.passed(piece, from, to);
        }
        if (going != null && measures && piece.mode() == Mode.ON) {
            double offset = going.half() == half
                    ? 0
                    : firing.timing().wave(going.half()).seconds();
            going.passed(piece, from, to, offset);
        }
        sink.passed(piece, from, to);
    }

    private void handle(Event event, SourceWave wave, PieceSink sink) {
        switch (event) {
            case FIRES -> fire(wave);
            case STALLS -> stalled |= begun.isEmpty();
            case VALLEY -> endPulse(wave, sink);
            case ZENER, RECTIFIER, GATE -> noteLatchedOn();
            case CLAMP, UNSTALLS, END -> {}
        }
    }

    private void fire(SourceWave wave) {
        Piece before = stepper.piece();
        before.look(stepper.seconds());
        double supplyVolts = before.supplyVolts();
        boolean afterStall = before.mode() == Mode.STALLED;
        stalled = begun.isEmpty() ? afterStall : stalled;
        going = new PulseMeter(
                firing.network(), half, stepper.seconds(), stepper.rampVolts(), supplyVolts, afterStall, brief);
        begun.add(going);
        if (firing.tapsThyristor() && !conducting && firing.isForward(half, stepper.seconds())) {
            triedFromSeconds = stepper.seconds();
            triedRampVolts = stepper.rampVolts();
            triedFluxAmps = stepper.fluxAmps();
            trying = true;
            stepper.switchSource(firing.conductingWave(wave.seconds()));
        }
    }

    /**
     * The pulse is over. Across the thyristor it was computed with the supply taken away: that stays so if the pulse
     * latched; the supply comes back if it only turned on; and it never went if the pulse did not even do that.
     */
    private void endPulse(SourceWave wave, PieceSink sink) {
        PulseMeter pulse = going;
        going = null;
        if (!trying || pulse == null) {
            return;
        }
        trying = false;
        if (pulse.latches(firing)) {
            conducting = true;
            double end = firing.extinctionSeconds(half, triedFromSeconds);
            conductsUntilSeconds = Math.max(0, end - wave.seconds());
        } else if (pulse.turnsOn(firing)) {
            stepper.switchSource(wave);
        } else {
            takeBack(pulse, wave, sink);
        }
    }

    /** A pulse that goes on over the line zero is judged there: the thyristor is on by then, or never was. */
    private boolean takenBack(SourceWave wave, PieceSink sink) {
        PulseMeter pulse = going;
        if (!trying || pulse == null) {
            return false;
        }
        trying = false;
        if (pulse.turnsOn(firing)) {
            return false;
        }
        takeBack(pulse, wave, sink);
        return true;
    }

    private void takeBack(PulseMeter pulse, SourceWave wave, PieceSink sink) {
        sink.takeBack(triedFromSeconds);
        begun.remove(begun.size() - 1);
        stepper.switchSource(wave);
        stepper.returnToFiring(triedFromSeconds, triedRampVolts, triedFluxAmps);
        going = pulse.again();
        begun.add(going);
    }

    /**
     * The ramp resistor alone feeds more than the valley current, so the device cannot leave its valley until the supply
     * collapses. Looked at whenever something switches: a heavily latched device pulls the supply under its clip at once.
     */
    private void noteLatchedOn() {
        if (going == null || stepper.mode() != Mode.ON) {
            return;
        }
        Piece piece = stepper.piece();
        piece.look(stepper.seconds());
        double throughResistor = (piece.supplyVolts() - piece.rampVolts()) / firing.network().rampOhms;
        if (throughResistor > firing.network().valleySiemens * piece.supplyVolts()) {
            latchedOn = true;
        }
    }

    // --- what the half cycle just run showed ------------------------------------------------------------------------

    /** Running number of the half cycle just run. */
    int lastHalf() {
        return half - 1;
    }

    Mode mode() {
        return mode;
    }

    double rampVolts() {
        return rampVolts;
    }

    double fluxAmps() {
        return fluxAmps;
    }

    double conductsUntilSeconds() {
        return conductsUntilSeconds;
    }

    boolean pulseIsGoing() {
        return going != null;
    }

    /** What the half cycle just run showed; a pulse still going on is filled in by running on. */
    HalfCycleDraft draft() {
        return new HalfCycleDraft(
                lastHalf(),
                startVolts,
                rampVolts,
                supply.clipFromSeconds(),
                supply.collapseSeconds(),
                stalled,
                latchedOn,
                begun);
    }
}
