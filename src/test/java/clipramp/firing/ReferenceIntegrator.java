package clipramp.firing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.ReferenceHalf.Event;
import clipramp.firing.ReferenceHalf.Kind;
import clipramp.firing.ReferenceHalf.Periodic;
import clipramp.firing.ReferenceHalf.Settling;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The laws of DEVELOPERS.md (The circuit laws) put before a general-purpose adaptive integrator, half cycle by half cycle, to
 * the periodic state: the independent truth for the engine (DEVELOPERS.md, The circuit laws). It knows no closed forms: node
 * equations are solved by elimination at every evaluation, events are sign changes that the integrator finds.
 *
 * <p>Between two events the set of conducting branches stands still, so that the integrator sees a smooth right-hand
 * side; every sign change of a branch's own law ends the piece.
 */
final class ReferenceIntegrator {
    enum Emitter {
        OFF,
        HELD,
        ON
    }

    private static final int HALF_CYCLES = 60;
    private static final double SETTLED_VOLTS = 1e-9;
    /** An explicit integrator follows a slow, latched discharge with some noise; late repeats may be this far apart. */
    private static final double NOISE_VOLTS = 1e-6;

    private static final double SETTLED_SIEMENS = 0.01;

    private final ReferenceParameters p;
    private final ReferenceNodes nodes;
    private final ReferenceNodes probe;

    private double zeroRad;
    private double halfSeconds;
    private boolean thyristorOn;
    private boolean trying;
    private Emitter emitter = Emitter.OFF;
    /** Not quite empty at first, so that no branch stands exactly on its edge. */
    private double volts = 1e-9;

    private double magnetisingAmps;

    private double now;
    private boolean stalled;
    private boolean held;
    private double crestVolts;
    private double crestSeconds;
    private List<Event> events = new ArrayList<>();
    private List<Pulse> pulses = new ArrayList<>();
    private ReferencePulseMeter meter;

    ReferenceIntegrator(Design design, Condition condition, double rampOhms) {
        p = new ReferenceParameters(design, condition, rampOhms);
        nodes = new ReferenceNodes(p);
        probe = new ReferenceNodes(p);
    }

    static Periodic solve(Design design, Condition condition, double rampOhms) {
        return new ReferenceIntegrator(design, condition, rampOhms).periodic();
    }

    ReferenceParameters parameters() {
        return p;
    }

    private record AtZero(double volts, double magnetisingAmps, Emitter emitter) {
        boolean repeats(AtZero other, double within) {
            return emitter == other.emitter
                    && Math.abs(volts - other.volts) <= within
                    && Math.abs(magnetisingAmps - other.magnetisingAmps) <= within * SETTLED_SIEMENS;
        }
    }

    private Periodic periodic() {
        List<ReferenceHalf> halves = new ArrayList<>();
        List<AtZero> zeros = new ArrayList<>();
        zeros.add(new AtZero(volts, magnetisingAmps, emitter));
        boolean alike = !p.bridge || p.isSymmetric() && !p.halfWaveStage;
        for (int k = 0; k < HALF_CYCLES; k++) {
            halves.add(half(!p.bridge ? !p.opposite : k % 2 == 0));
            double within = k < HALF_CYCLES / 2 ? SETTLED_VOLTS : NOISE_VOLTS;
            AtZero end = new AtZero(volts, magnetisingAmps, emitter);
            zeros.add(end);
            if (alike && end.repeats(zeros.get(k), within)) {
                return new Periodic(Settling.STEADY, List.of(halves.get(k).continuedIn(halves.get(k), p.rampFarads)));
            }
            if (k >= 2 && end.repeats(zeros.get(k - 1), within) && zeros.get(k).repeats(zeros.get(k - 2), within)) {
                ReferenceHalf one = halves.get(k - 1);
                ReferenceHalf other = halves.get(k);
                return new Periodic(
                        alike ? Settling.HUNTS : Settling.STEADY,
                        List.of(one.continuedIn(other, p.rampFarads), other.continuedIn(one, p.rampFarads)));
            }
        }
        return new Periodic(Settling.NEVER, halves);
    }

    /** One half cycle from the state at hand, which it leaves at the next zero. */
    private ReferenceHalf half(boolean positive) {
        zeroRad = p.zeroRad(positive);
        double endRad = p.bridge ? p.zeroRad(!positive) : zeroRad + 2 * Math.PI;
        if (endRad <= zeroRad) {
            endRad += 2 * Math.PI;
        }
        halfSeconds = (endRad - zeroRad) / p.omega;
        events = new ArrayList<>();
        pulses = new ArrayList<>();
        stalled = false;
        thyristorOn = false;
        crestVolts = Double.NEGATIVE_INFINITY;
        now = 0;
        meter = null;
        double start = volts;
        settleBranches();
        if (emitter != Emitter.ON) {
            overshoot();
        }
        while (now < halfSeconds) {
            piece();
        }
        closePulse();
        int firing = -1;
        for (int i = pulses.size() - 1; i >= 0; i--) {
            firing = pulses.get(i).latches() ? i : firing;
        }
        boolean first = pulses.isEmpty() ? stalled : pulses.get(0).afterStall();
        return new ReferenceHalf(positive, halfSeconds, start, volts, events, markEnds(), first, firing);
    }

    /** What stands behind the dropping resistor, V. */
    private double e(double t) {
        if (thyristorOn) {
            return Math.max(0, p.thyristorVolts);
        }
        return supply(t, p.shape(zeroRad + p.omega * t)) - p.rectifierVolts;
    }

    private double eRate(double t) {
        if (thyristorOn) {
            return 0;
        }
        double rad = zeroRad + p.omega * t;
        double rate = p.supplyCrestVolts * p.omega * p.shapeRate(rad);
        return p.bridge ? rate * Math.signum(p.shape(rad)) : p.opposite ? -rate : rate;
    }

    private double supply(double t, double shape) {
        double v = p.supplyCrestVolts * shape;
        return p.bridge ? Math.abs(v) : p.opposite ? -v : v;
    }

    /** The load's line angle of an instant, folded to the half cycle of the load's line in which it lies, rad. */
    private double loadRad(double t) {
        double rad = zeroRad + p.omega * t + p.lagRad;
        double first = p.zeroRad(true);
        double second = p.zeroRad(false);
        while (rad >= first + 2 * Math.PI) {
            rad -= 2 * Math.PI;
        }
        while (rad < first) {
            rad += 2 * Math.PI;
        }
        return rad >= second - 1e-12 ? rad - Math.PI : rad;
    }

    /** Integrates until the next event or the zero, and does what the event asks. */
    private void piece() {
        ReferencePiece piece = new ReferencePiece(p, nodes, emitter, this::e, this::eRate, halfSeconds);
        piece.watch(t -> nodes.rectifierSlack, () -> toggle(1, Kind.RECTIFIER_ON, Kind.RECTIFIER_OFF));
        piece.watch(t -> nodes.zenerSlack, () -> toggle(2, Kind.ZENER_ON, Kind.ZENER_OFF));
        if (p.hasClamp) {
            piece.watch(t -> nodes.clampSlack, () -> toggle(8, Kind.CLAMP_ON, Kind.CLAMP_OFF));
        }
        switch (emitter) {
            case OFF -> piece.watch(t -> nodes.peakVolts - piece.seenVolts(), this::reach);
            case HELD -> {
                piece.watch(t -> nodes.emitterAmps / p.peakCurrentAmps, this::release);
                piece.watch(t -> -fireSlack(t, piece.seenMagnetisingAmps()), this::fire);
            }
            case ON -> {
                piece.watch(t -> nodes.junctionSlack, () -> toggle(4, Kind.JUNCTION_ON, Kind.JUNCTION_OFF));
                piece.watch(t -> nodes.valleySlack, this::valley);
                if (meter != null && nodes.junction) {
                    piece.note(meter);
                }
            }
        }
        piece.look(this::look);
        double joules = meter == null ? 0 : meter.joules;
        double coulombs = meter == null ? 0 : meter.coulombs;
        double[] state = Arrays.copyOf(new double[] {volts, magnetisingAmps, joules, coulombs}, piece.getDimension());
        now = piece.run(now, state);
        volts = state[0];
        magnetisingAmps = state[1];
        if (emitter == Emitter.ON && meter != null) {
            meter.joules = state[2];
            meter.coulombs = state[3];
        }
        nodes.evaluate(emitter, e(now), eRate(now), volts, magnetisingAmps);
        if (emitter == Emitter.HELD) {
            volts = nodes.peakVolts;
        }
        piece.ending().run();
    }

    /** Peaks of the pulse and the supply's crest. */
    private void look(double t) {
        if (meter != null) {
            meter.observe(nodes);
        }
        if (nodes.supplyVolts > crestVolts) {
            crestVolts = nodes.supplyVolts;
            crestSeconds = t;
        }
    }

    private void toggle(int bit, Kind on, Kind off) {
        boolean conducts = (nodes.branches() & bit) == 0;
        log(conducts ? on : off);
        nodes.set(nodes.branches() ^ bit);
        nodes.evaluate(emitter, e(now), eRate(now), volts, magnetisingAmps);
        if (emitter == Emitter.HELD) {
            hold();
        }
    }

    /** Finds which branches conduct now that the emitter's state has jumped. */
    private void settleBranches() {
        int before = nodes.branches();
        nodes.search(emitter, e(now), eRate(now), volts, magnetisingAmps);
        int changed = before ^ nodes.branches();
        if ((changed & 1) != 0) {
            log(nodes.rectifier ? Kind.RECTIFIER_ON : Kind.RECTIFIER_OFF);
        }
        if ((changed & 2) != 0) {
            log(nodes.zener ? Kind.ZENER_ON : Kind.ZENER_OFF);
        }
        if ((changed & 8) != 0) {
            log(nodes.clamp ? Kind.CLAMP_ON : Kind.CLAMP_OFF);
        }
    }

    private void log(Kind kind) {
        events.add(new Event(kind, now, volts));
    }

    /** V_C has reached V_P: fire, or be held. */
    private void reach() {
        emitter = Emitter.HELD;
        nodes.evaluate(emitter, e(now), eRate(now), volts, magnetisingAmps);
        held = fireSlack(now, magnetisingAmps) < 0;
        if (!held) {
            fire();
            return;
        }
        log(Kind.STALL);
        hold();
    }

    /** At the beginning of every piece of a hold: the emitter current jumps where a branch starts or stops. */
    private void hold() {
        if (fireSlack(now, magnetisingAmps) >= 0) {
            fire();
        } else if (nodes.emitterAmps < 0) {
            release();
        } else if (nodes.emitterAmps < p.peakCurrentAmps) {
            stalled = true;
        }
    }

    /**
     * A supply that jumps (the tap across a thyristor, as its current ends) may leave the capacitor above the new peak
     * point: its emitter is then fed without limit, and fires if the saturated line carries more than the valley current.
     */
    private void overshoot() {
        nodes.evaluate(Emitter.OFF, e(now), eRate(now), volts, magnetisingAmps);
        if (nodes.peakVolts >= volts) {
            nodes.evaluate(emitter, e(now), eRate(now), volts, magnetisingAmps);
            return;
        }
        probe.search(Emitter.ON, e(now), 0, volts, magnetisingAmps);
        if (probe.valleySlack > 0) {
            held = false;
            fire();
            return;
        }
        follow();
    }

    /** The capacitor goes to the peak point and follows it. */
    private void follow() {
        log(Kind.STALL);
        emitter = Emitter.HELD;
        settleBranches();
        volts = nodes.peakVolts;
        hold();
    }

    private void release() {
        log(Kind.RELEASE);
        emitter = Emitter.OFF;
        settleBranches();
    }

    /**
     * Not negative when the emitter gets its peak-point current and the saturated line would carry more than the valley
     * current; relative to those currents.
     */
    private double fireSlack(double t, double magnetising) {
        double peak = nodes.emitterAmps / p.peakCurrentAmps - 1;
        if (peak < 0) {
            return peak;
        }
        probe.search(Emitter.ON, e(t), 0, nodes.peakVolts, magnetising);
        double regenerates = probe.valleySlack / p.peakCurrentAmps;
        return regenerates <= 0 ? Math.min(regenerates, -1e-300) : Math.min(peak, regenerates);
    }

    private void fire() {
        log(Kind.FIRE);
        double supply = nodes.supplyVolts;
        double peak = Math.max(nodes.peakVolts, volts);
        if (!p.tapThyristor || thyristorOn) {
            conduct(supply, peak);
            return;
        }
        // Tried with the supply collapsed; a pulse that does not turn the thyristor on gets its supply back at once.
        double startSeconds = now;
        double startVolts = volts;
        double startMagnetising = magnetisingAmps;
        int branches = nodes.branches();
        List<Event> eventsBefore = new ArrayList<>(events);
        int count = pulses.size();
        thyristorOn = true;
        trying = true;
        conduct(supply, peak);
        while (now < halfSeconds && pulses.size() == count) {
            piece();
        }
        trying = false;
        closePulse();
        if (pulses.get(count).turnsOn()) {
            return;
        }
        pulses.remove(count);
        events = eventsBefore;
        now = startSeconds;
        volts = startVolts;
        magnetisingAmps = startMagnetising;
        thyristorOn = false;
        nodes.set(branches);
        conduct(supply, peak);
    }

    private void conduct(double supply, double peak) {
        meter = new ReferencePulseMeter(p, now, supply, peak, volts, held);
        emitter = Emitter.ON;
        settleBranches();
        meter.observe(nodes);
        if (nodes.gateAmps >= p.triggerAmps) {
            meter.rise(now);
        }
    }

    private void valley() {
        log(Kind.VALLEY);
        closePulse();
        if (trying) {
            // The supply comes back with the end of a pulse that did not latch, at the same instant.
            Pulse pulse = pulses.get(pulses.size() - 1);
            thyristorOn = pulse.latches();
            trying = false;
            if (!pulse.turnsOn()) {
                return;
            }
        }
        emitter = Emitter.OFF;
        settleBranches();
        if (nodes.peakVolts <= volts) {
            // A programmable device's saturated line ends above its peak point as the supply dies: no pulse, it
            // follows.
            follow();
        }
    }

    private void closePulse() {
        if (meter == null) {
            return;
        }
        double rad = loadRad(meter.startSeconds());
        pulses.add(meter.close(now, volts, rad, this::anodeAmps));
        meter = null;
    }

    /** Load current that there would be with the thyristor on, A. */
    private double anodeAmps(double t) {
        double rad = zeroRad + p.omega * t + p.lagRad;
        double v = p.crestVolts * p.shape(rad);
        double forward = p.halfWaveStage ? v : Math.abs(v);
        return Math.max(0, (forward - p.loadDropVolts) / p.loadOhms);
    }

    /** Marks the pulses that began after the zener's last conduction (or the supply's crest where it never did). */
    private List<Pulse> markEnds() {
        double last = -1;
        for (Event event : events) {
            if (event.kind() == Kind.ZENER_OFF) {
                last = event.seconds();
            }
        }
        boolean conducts = events.stream().anyMatch(event -> event.kind() == Kind.ZENER_ON);
        double from = conducts ? last : crestSeconds;
        boolean open = conducts && last < 0;
        return pulses.stream()
                .map(pulse -> ReferencePulseMeter.marked(pulse, !open && pulse.startSeconds() > from))
                .toList();
    }
}
