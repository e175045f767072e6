package clipramp.firing;

import clipramp.engine.Network;
import clipramp.engine.Piece;
import clipramp.engine.PieceQuadrature;

/** Measures one pulse while the circuit runs through it. */
final class PulseMeter {
    /** One exponential and the line cross a level a few times a piece; more is a current that rests on it. */
    private static final int MOST_CROSSINGS = 100;

    /** Part of a piece that is passed over after each crossing of the trigger current. */
    private static final double REST_SHARE = 1e-9;

    private final Network n;
    private final int half;
    private final double startSeconds;
    private final double startRampVolts;
    private final double supplyVolts;
    private final boolean afterStall;
    private final boolean brief;

    private double endSeconds;
    private double endRampVolts;
    private double peakGateVolts;
    private double peakGateAmps;
    private double peakBaseOneVolts;
    private double coulombs;
    private double joules;
    private double aboveSince = Double.NaN;
    private double longestAbove;
    private double longestAboveStart = Double.NaN;
    private double longestAboveEnd = Double.NaN;

    /**
     * A meter at the instant of firing.
     *
     * @param network the circuit
     * @param half running number of the half cycle that the pulse begins in
     * @param startSeconds instant of firing, s since that half cycle's line zero
     * @param startRampVolts ramp voltage at firing, V
     * @param supplyVolts supply just before firing, V
     * @param afterStall whether the ramp was held before
     * @param brief whether only what the pulse does to the thyristor is asked for, and not its peaks and its energy
     */
    PulseMeter(
            Network network,
            int half,
            double startSeconds,
            double startRampVolts,
            double supplyVolts,
            boolean afterStall,
            boolean brief) {
        n = network;
        this.half = half;
        this.startSeconds = startSeconds;
        this.startRampVolts = startRampVolts;
        this.supplyVolts = supplyVolts;
        this.afterStall = afterStall;
        this.brief = brief;
        endSeconds = startSeconds;
        endRampVolts = startRampVolts;
    }

    /** A fresh meter for the same pulse. */
    PulseMeter again() {
        return new PulseMeter(n, half, startSeconds, startRampVolts, supplyVolts, afterStall, brief);
    }

    /**
     * Takes in a conducting piece.
     *
     * @param piece the piece
     * @param from when the circuit entered it, s since its half cycle's line zero
     * @param to when the circuit left it, s since the same
     * @param offsetSeconds what to add to the piece's times to count from the pulse's own half cycle, s
     */
    void passed(Piece piece, double from, double to, double offsetSeconds) {
        endSeconds = to + offsetSeconds;
        if (!brief) {
            costs(piece, from, to);
        }
        above(piece, from, to, offsetSeconds);
    }

    private void costs(Piece piece, double from, double to) {
        peaksAt(piece, from);
        peaksAt(piece, piece.gateCrestSeconds(from, to));
        peaksAt(piece, to);
        endRampVolts = piece.rampVolts();
        PieceQuadrature.visit(piece, from, to, (p, weight) -> {
            double amps = p.gateAmps(n);
            coulombs += weight * amps;
            joules += weight * amps * p.gateVolts();
        });
    }

    private void peaksAt(Piece piece, double time) {
        piece.look(time);
        peakBaseOneVolts = Math.max(peakBaseOneVolts, piece.baseOneVolts());
        peakGateVolts = Math.max(peakGateVolts, piece.gateVolts());
        peakGateAmps = Math.max(peakGateAmps, piece.gateAmps(n));
    }

    private void above(Piece piece, double from, double to, double offset) {
        double time = from;
        double onward = from;
        piece.look(from);
        boolean above = piece.gateAmps(n) >= n.triggerAmps;
        for (int crossings = 0; crossings < MOST_CROSSINGS; crossings++) {
            if (above && Double.isNaN(aboveSince)) {
                aboveSince = time + offset;
            }
            double next =
                    onward < to ? piece.gateReaches(n, n.triggerAmps, !above, onward, to) : Double.POSITIVE_INFINITY;
            if (above) {
                span(Math.min(next, to) + offset);
            }
            if (!(next < to)) {
                return;
            }
            if (above) {
                aboveSince = Double.NaN;
            }
            above = !above;
            time = next;
            // Past the crossing just found: where rounding leaves the current, it could be found for ever.
            onward = next + REST_SHARE * (to - from);
        }
    }

    private void span(double end) {
        if (end - aboveSince > longestAbove) {
            longestAbove = end - aboveSince;
            longestAboveStart = aboveSince;
            longestAboveEnd = end;
        }
    }

    /** Running number of the half cycle that it began in. */
    int half() {
        return half;
    }

    double startSeconds() {
        return startSeconds;
    }

    /** Whether the gate current lasts for the thyristor's turn-on time, with its anode forward as it begins. */
    boolean turnsOn(FiringCase firing) {
        return longestAbove > 0 && longestAbove >= n.turnOnSeconds && firing.isForward(half, longestAboveStart);
    }

    /** Anode current as the gate current falls under the trigger current for good, A. */
    double anodeAmps(FiringCase firing) {
        return longestAbove > 0
                ? firing.anodeAmps(half, longestAboveStart, longestAboveEnd)
                : firing.anodeAmps(half, startSeconds, endSeconds);
    }

    boolean latches(FiringCase firing) {
        return turnsOn(firing) && anodeAmps(firing) >= n.latchingAmps;
    }

    /**
     * The pulse as measured.
     *
     * @param firing what was solved
     * @param startRad firing angle in the load's half cycle, rad
     * @param endPulse whether it began after the zener's last conduction
     */
    Pulse pulse(FiringCase firing, double startRad, boolean endPulse) {
        return new Pulse(
                startRad,
                startSeconds,
                endSeconds,
                supplyVolts,
                startRampVolts,
                afterStall,
                endPulse,
                peakGateAmps,
                peakGateVolts,
                peakGateAmps * peakGateVolts,
                peakBaseOneVolts,
                longestAbove,
                coulombs,
                joules,
                n.capacitorFarads / 2 * (startRampVolts * startRampVolts - endRampVolts * endRampVolts),
                turnsOn(firing),
                anodeAmps(firing),
                latches(firing));
    }
}
