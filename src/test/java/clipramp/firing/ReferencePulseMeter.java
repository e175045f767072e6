package clipramp.firing;

import java.util.function.DoubleUnaryOperator;

/** What is measured while the emitter conducts: peaks, time above the trigger current, charge and energy. */
final class ReferencePulseMeter {
    private final ReferenceParameters p;
    private final double startSeconds;
    private final double supplyVolts;
    private final double peakPointVolts;
    private final double startVolts;
    private final boolean held;

    double joules;
    double coulombs;
    private double peakAmps;
    private double peakVolts;
    private double peakWatts;
    private double peakBaseOne;
    private double aboveFrom = Double.NaN;
    private double longest;
    private double lastFall = Double.NaN;

    ReferencePulseMeter(
            ReferenceParameters p,
            double startSeconds,
            double supplyVolts,
            double peakPointVolts,
            double startVolts,
            boolean held) {
        this.p = p;
        this.startSeconds = startSeconds;
        this.supplyVolts = supplyVolts;
        this.peakPointVolts = peakPointVolts;
        this.startVolts = startVolts;
        this.held = held;
    }

    double startSeconds() {
        return startSeconds;
    }

    boolean held() {
        return held;
    }

    void observe(ReferenceNodes nodes) {
        peakAmps = Math.max(peakAmps, nodes.gateAmps);
        peakVolts = Math.max(peakVolts, nodes.gateVolts);
        peakWatts = Math.max(peakWatts, nodes.gateAmps * nodes.gateVolts);
        peakBaseOne = Math.max(peakBaseOne, nodes.baseOneVolts);
    }

    void rise(double seconds) {
        aboveFrom = seconds;
    }

    void fall(double seconds) {
        if (!Double.isNaN(aboveFrom)) {
            longest = Math.max(longest, seconds - aboveFrom);
            aboveFrom = Double.NaN;
            lastFall = seconds;
        }
    }

    Pulse close(double endSeconds, double endVolts, double startRad, DoubleUnaryOperator anodeAmps) {
        fall(endSeconds);
        double anode = Double.isNaN(lastFall) ? 0 : anodeAmps.applyAsDouble(lastFall);
        boolean turnsOn = longest > 0 && longest >= p.turnOnSeconds && anode > 0;
        return new Pulse(
                startRad,
                startSeconds,
                endSeconds,
                supplyVolts,
                peakPointVolts,
                held,
                false,
                peakAmps,
                peakVolts,
                peakWatts,
                peakBaseOne,
                longest,
                coulombs,
                joules,
                0.5 * p.rampFarads * (startVolts * startVolts - endVolts * endVolts),
                turnsOn,
                anode,
                turnsOn && anode >= p.latchingAmps);
    }

    static Pulse marked(Pulse of, boolean end) {
        return copy(of, of.endSeconds(), of.capacitorJoules(), end);
    }

    static Pulse continued(Pulse of, double endSeconds, double moreCapacitorJoules) {
        return copy(of, endSeconds, of.capacitorJoules() + moreCapacitorJoules, of.endPulse());
    }

    private static Pulse copy(Pulse of, double endSeconds, double capacitorJoules, boolean end) {
        return new Pulse(
                of.startRad(),
                of.startSeconds(),
                endSeconds,
                of.supplyVolts(),
                of.peakPointVolts(),
                of.afterStall(),
                end,
                of.peakGateAmps(),
                of.peakGateVolts(),
                of.peakGateWatts(),
                of.peakBaseOneVolts(),
                of.aboveTriggerSeconds(),
                of.gateCoulombs(),
                of.gateJoules(),
                capacitorJoules,
                of.turnsOn(),
                of.anodeAmps(),
                of.latches());
    }
}
