package clipramp.power;

import clipramp.engine.InductiveCurrent;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * Runs an inductive load's current through successive spans of the line until it repeats.
 *
 * <p>A pulse does something only if the current of the half cycle before has died by the end of its gate window less the
 * turn-on time; it then fires at its start or at that extinction, whichever is later, and latches if the current at the
 * window's end has reached the latching current. If not, the current ends there (on a freewheeling path it goes on), and
 * the next pulse tries. Once latched, the current flows until it is zero, or until the freewheeling diode offers the load
 * the higher voltage and takes it over at once (the overlap is left out: line and diodes have no inductance here).
 */
final class InductiveRun {
    private static final int MOST_SPANS = 60;
    private static final int SHOWN_UNSETTLED = 4;
    private static final int MOST_STANDING = 10;

    /** Share of the crest current by which two equal states may differ. */
    private static final double SAME = 1e-12;

    private static final double ROOT_RAD = 1e-13;

    /**
     * A current is begun this much after the angle at which something begins to drive it, so that it does grow, rad. What
     * it misses grows as the square of this: 1e-12 of it.
     */
    private static final double AFTER_RAD = 1e-6;

    /** What drives a current must exceed this for it to be begun at once, V. */
    private static final double LEAST_VOLTS = 1e-3;

    /** Two paths whose offers differ by less offer the same, V. */
    private static final double EQUAL_VOLTS = 1e-9;

    private static final int TRIALS = 200;

    private final LoadLoop loop;
    private final List<GateWindow> windows;
    private final double spanRad;
    private final double latchingAmps;
    private final double turnOnRad;
    private final double stepRad;

    private enum Mode {
        OFF,
        FORWARD,
        BACKWARD,
        FREEWHEELS
    }

    private record State(Mode mode, double amps) {
        boolean isSameAs(State other, double withinAmps) {
            return mode == other.mode && Math.abs(amps - other.amps) <= withinAmps;
        }
    }

    // What the span being run has shown.
    private List<CurrentSpan> spans = new ArrayList<>();
    private Set<Integer> fired = new HashSet<>();
    private Set<Integer> blocked = new HashSet<>();
    private double firstFiredRad;
    private double firstExtinctionRad;
    private int firstFiredHalf;
    private boolean letsGo;

    // Where it is.
    private double now;
    private Mode mode = Mode.OFF;
    private double amps;
    private int next;

    /**
     * A run from rest.
     *
     * @param loop the loops that the current can flow in
     * @param windows gate windows of one span in order; one that crosses the span's end acts in the next one too
     * @param spanRad the span, a multiple of 2 pi, rad
     * @param latchingAmps I_L, A; 0 where unknown
     * @param turnOnRad t_gt as an angle, rad
     * @param highestOrder highest order of the line
     */
    InductiveRun(
            LoadLoop loop,
            List<GateWindow> windows,
            double spanRad,
            double latchingAmps,
            double turnOnRad,
            int highestOrder) {
        this.loop = loop;
        this.spanRad = spanRad;
        this.latchingAmps = latchingAmps;
        this.turnOnRad = turnOnRad;
        this.stepRad = 0.05 / highestOrder;
        this.windows = new ArrayList<>();
        int halves = (int) Math.round(spanRad / Math.PI);
        for (GateWindow window : windows) {
            if (window.toRad() > spanRad) {
                this.windows.add(window.shifted(-spanRad, -halves));
            }
        }
        this.windows.addAll(windows);
    }

    /** Runs until the current repeats, and once more to keep what it does. */
    LoadPeriod settle() {
        double within = SAME * crestAmps();
        List<State> states = new ArrayList<>();
        State state = new State(Mode.OFF, 0);
        boolean settled = false;
        for (int run = 0; run < MOST_SPANS && !settled; run++) {
            State after = run(state);
            settled = after.isSameAs(state, within);
            states.add(after);
            state = settled ? after : accelerated(states);
        }
        if (settled) {
            run(state);
            return period(spanRad, true);
        }
        List<CurrentSpan> all = new ArrayList<>();
        int missed = 0;
        for (int shown = 0; shown < SHOWN_UNSETTLED; shown++) {
            state = run(state);
            double by = shown * spanRad;
            spans.forEach(span -> all.add(shifted(span, by)));
            missed += missedHalves();
        }
        LoadPeriod last = period(spanRad, false);
        return new LoadPeriod(
                SHOWN_UNSETTLED * spanRad, all, last.firedRad(), last.extinctionRad(), missed, false, last.letsGo());
    }

    private double crestAmps() {
        double crest = 0;
        for (double rad = 0; rad < 2 * Math.PI; rad += 0.1) {
            crest = Math.max(crest, Math.abs(loop.line().voltsAt(rad)));
        }
        return crest / Math.hypot(loop.loadOhms(), loop.line().omega() * loop.henries());
    }

    /** Where a run of states is heading that approach their limit like a geometric series. */
    private static State accelerated(List<State> states) {
        int last = states.size() - 1;
        State z = states.get(last);
        if (last < 2 || last % 3 != 2) {
            return z;
        }
        State x = states.get(last - 2);
        State y = states.get(last - 1);
        double share = (z.amps - y.amps) / (y.amps - x.amps);
        if (x.mode != z.mode || y.mode != z.mode || !(Math.abs(share) < 1)) {
            return z;
        }
        double limit = z.amps + (z.amps - y.amps) * share / (1 - share);
        return limit > 0 ? new State(z.mode, limit) : z;
    }

    private static CurrentSpan shifted(CurrentSpan span, double by) {
        return new CurrentSpan(
                span.fromRad() + by,
                span.toRad() + by,
                span.direction(),
                span.memoryRad(),
                rad -> span.amps().applyAsDouble(rad - by),
                rad -> span.loadVolts().applyAsDouble(rad - by));
    }

    private LoadPeriod period(double length, boolean settled) {
        boolean any = !Double.isNaN(firstFiredRad);
        boolean ends = any && !Double.isNaN(firstExtinctionRad);
        return new LoadPeriod(
                length,
                spans,
                any ? OptionalDouble.of(firstFiredRad - firstFiredHalf * Math.PI) : OptionalDouble.empty(),
                ends ? OptionalDouble.of(firstExtinctionRad - firstFiredHalf * Math.PI) : OptionalDouble.empty(),
                missedHalves(),
                settled,
                letsGo);
    }

    private int missedHalves() {
        Set<Integer> missed = new HashSet<>(blocked);
        missed.removeAll(fired);
        return missed.size();
    }

    private State run(State start) {
        spans = new ArrayList<>();
        fired = new HashSet<>();
        blocked = new HashSet<>();
        firstFiredRad = Double.NaN;
        firstExtinctionRad = Double.NaN;
        letsGo = true;
        now = 0;
        next = 0;
        mode = start.mode;
        amps = start.amps;
        int standing = 0;
        while (now < spanRad) {
            double before = now;
            switch (mode) {
                case OFF -> waitForPulse();
                case FREEWHEELS -> freewheel();
                case FORWARD -> conduct(1);
                case BACKWARD -> conduct(-1);
            }
            // A current that rounding lets neither live nor die is helped over the angle where it cannot decide.
            standing = now > before ? 0 : standing + 1;
            if (standing > MOST_STANDING) {
                now = before + AFTER_RAD;
            }
        }
        return new State(mode, amps);
    }

    private void waitForPulse() {
        for (; next < windows.size(); next++) {
            GateWindow window = windows.get(next);
            double from = Math.max(window.fromRad(), now);
            double last = window.toRad() - turnOnRad;
            double at = begun(loop::drivingVolts, from, last);
            if (at < spanRad) {
                now = at;
                amps = 0;
                fire(window);
                return;
            }
        }
        now = spanRad;
        amps = 0;
    }

    /** The current circulates through the diode until it dies or a pulse hands it back to the thyristor. */
    private void freewheel() {
        InductiveCurrent current = loop.throughDiode(now, amps);
        double dies = current.extinctionRad(2 * spanRad);
        double end = Math.min(dies, spanRad);
        for (; next < windows.size(); next++) {
            GateWindow window = windows.get(next);
            double from = Math.max(window.fromRad(), now);
            if (from >= end) {
                break;
            }
            double last = Math.min(window.toRad() - turnOnRad, end);
            double at = begun(rad -> thyristorOffersMore(rad, current), from, last);
            if (at < end) {
                spans.add(loop.diodeSpan(now, at, current));
                amps = current.ampsAt(at);
                now = at;
                fire(window);
                return;
            }
            if (window.toRad() > end) {
                break;
            }
        }
        spans.add(loop.diodeSpan(now, end, current));
        keepFreewheeling(current, dies, end);
    }

    private double thyristorOffersMore(double rad, InductiveCurrent current) {
        double there = current.ampsAt(rad);
        return loop.thyristorLoadVolts(rad, loop.directionAt(rad), there) - loop.diodeLoadVolts(there);
    }

    /** What is left at {@code end} of a current that no pulse took over. */
    private void keepFreewheeling(InductiveCurrent current, double dies, double end) {
        // Beyond the span's end it still dies where it says, unless a pulse comes first.
        if (dies <= spanRad || dies - spanRad < windows.get(0).fromRad()) {
            noteExtinction(dies);
        }
        amps = dies <= spanRad ? 0 : current.ampsAt(spanRad);
        mode = dies <= spanRad ? Mode.OFF : Mode.FREEWHEELS;
        now = end;
    }

    /** Where a current begins: as soon as something drives it, a little later where that only begins to. */
    private double begun(DoubleUnaryOperator drive, double from, double to) {
        double at = firstAbove(drive, from, to);
        return at == Double.POSITIVE_INFINITY || drive.applyAsDouble(at) > LEAST_VOLTS ? at : at + AFTER_RAD;
    }

    private void noteExtinction(double rad) {
        if (rad < Double.POSITIVE_INFINITY && Double.isNaN(firstExtinctionRad) && !Double.isNaN(firstFiredRad)) {
            firstExtinctionRad = rad;
        }
    }

    private void fire(GateWindow window) {
        int direction = loop.directionAt(now);
        InductiveCurrent current = loop.throughThyristor(now, direction, amps);
        double released = Math.min(endOf(current, direction), window.toRad());
        boolean latched = released < window.toRad() || current.ampsAt(released) >= latchingAmps;
        next++;
        if (latched || released > spanRad) {
            fired.add(window.half());
            if (Double.isNaN(firstFiredRad)) {
                firstFiredRad = now;
                firstFiredHalf = window.half();
            }
            mode = direction > 0 ? Mode.FORWARD : Mode.BACKWARD;
            if (released < window.toRad()) {
                // The window outlasts this current: it may fire again, the other way.
                next--;
            }
            return;
        }
        spans.add(loop.thyristorSpan(now, released, direction, current));
        boolean goesOn = loop.freewheel().isPresent();
        amps = goesOn ? current.ampsAt(released) : 0;
        mode = goesOn ? Mode.FREEWHEELS : Mode.OFF;
        now = released;
    }

    private void conduct(int direction) {
        InductiveCurrent current = loop.throughThyristor(now, direction, amps);
        double dies = current.extinctionRad(now + 4 * Math.PI);
        double handsOver = handOverRad(current, direction);
        double turns = loop.rectified() ? loop.nextZeroRad(now) : Double.POSITIVE_INFINITY;
        double end = Math.min(Math.min(dies, handsOver), turns);
        if (end >= spanRad) {
            spans.add(loop.thyristorSpan(now, spanRad, direction, current));
            block(end);
            if (end == dies) {
                noteExtinction(end);
            }
            amps = current.ampsAt(spanRad);
            now = spanRad;
            return;
        }
        spans.add(loop.thyristorSpan(now, end, direction, current));
        block(end);
        amps = end == dies ? 0 : current.ampsAt(end);
        now = end;
        if (end == dies) {
            noteExtinction(end);
            mode = Mode.OFF;
        } else if (end == handsOver) {
            mode = Mode.FREEWHEELS;
        } else {
            letsGo = false;
            mode = direction > 0 ? Mode.BACKWARD : Mode.FORWARD;
        }
    }

    /** Passes over the windows that are spent while the thyristor conducts. */
    private void block(double until) {
        while (next < windows.size() && windows.get(next).toRad() - turnOnRad < until) {
            int half = windows.get(next).half();
            if (loop.fullWave() || Math.floorMod(half, 2) == 0) {
                blocked.add(half);
            }
            next++;
        }
    }

    private double endOf(InductiveCurrent current, int direction) {
        return Math.min(current.extinctionRad(now + 4 * Math.PI), handOverRad(current, direction));
    }

    /** Where the freewheeling diode offers the load more than the line does; POSITIVE_INFINITY for never. */
    private double handOverRad(InductiveCurrent current, int direction) {
        if (loop.freewheel().isEmpty()) {
            return Double.POSITIVE_INFINITY;
        }
        DoubleUnaryOperator offersMore = rad -> {
            double there = Math.max(0, current.ampsAt(rad));
            return loop.diodeLoadVolts(there) - loop.thyristorLoadVolts(rad, direction, there);
        };
        double from = current.startRad();
        if (offersMore.applyAsDouble(from) > -EQUAL_VOLTS) {
            return from;
        }
        double zero = loop.nextZeroRad(from);
        double limit = loop.rectified() ? zero : from + 2 * Math.PI;
        double at = firstAbove(offersMore, from, limit);
        // Without drops both offer the same at the zero, and the diode has it from there.
        boolean atZero = at == Double.POSITIVE_INFINITY && offersMore.applyAsDouble(limit) > -EQUAL_VOLTS;
        return atZero ? limit : at;
    }

    /** First angle of a stretch at which a function is above zero, rad; POSITIVE_INFINITY for none. */
    private double firstAbove(DoubleUnaryOperator function, double from, double to) {
        if (!(to >= from)) {
            return Double.POSITIVE_INFINITY;
        }
        if (function.applyAsDouble(from) > LEAST_VOLTS) {
            return from;
        }
        double below = from;
        while (below < to) {
            double above = Math.min(to, below + stepRad);
            if (function.applyAsDouble(above) > LEAST_VOLTS) {
                if (function.applyAsDouble(below) > 0) {
                    return below;
                }
                return new BrentSolver(ROOT_RAD).solve(TRIALS, function::applyAsDouble, below, above);
            }
            below = above;
        }
        return Double.POSITIVE_INFINITY;
    }
}
