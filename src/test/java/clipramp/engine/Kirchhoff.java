package clipramp.engine;

import java.util.function.ToDoubleFunction;

/**
 * Kirchhoff's laws and each part's own law, branch by branch as a textbook writes them (the parts' laws are those of
 * DEVELOPERS.md, The circuit laws), for the node voltages that a piece claims. Where the laws hold, every imbalance is zero.
 */
final class Kirchhoff {
    /** Drop of a programmable device's gate-cathode junction, V (DEVELOPERS.md, The conducting device). */
    private static final double PROGRAMMABLE_DROP = 0.6;

    private final Network n;
    private final Mode mode;
    private final boolean rectifies;
    private final boolean clips;
    private final boolean junction;
    private final boolean clamps;

    final double sourceVolts;
    final double rampVolts;
    final double fluxAmps;
    final double supplyVolts;
    final double baseOneVolts;
    final double gateVolts;
    final double emitterAmps;
    final double clampAmps;
    final double primaryVolts;
    final double peakVolts;

    private Kirchhoff(Network n, Piece piece, double ramp, double flux, double source, ToDoubleFunction<Affine> value) {
        this.n = n;
        mode = piece.mode;
        rectifies = piece.rectifies;
        clips = piece.clips;
        junction = piece.gateConducts;
        clamps = piece.clamps;
        sourceVolts = source;
        fluxAmps = flux;
        supplyVolts = value.applyAsDouble(piece.supply);
        baseOneVolts = value.applyAsDouble(piece.baseOne);
        gateVolts = value.applyAsDouble(piece.gate);
        emitterAmps = value.applyAsDouble(piece.emitter);
        peakVolts = value.applyAsDouble(piece.peak);
        rampVolts = mode == Mode.STALLED ? peakVolts : ramp;
        clampAmps = n.transformerCoupled && clamps ? value.applyAsDouble(piece.clamp) : 0;
        primaryVolts = n.transformerCoupled ? value.applyAsDouble(piece.primary) : baseOneVolts;
    }

    /** At a state of its own choice; the source stands still. */
    static Kirchhoff at(Network n, Piece piece, double ramp, double flux, double source) {
        return new Kirchhoff(n, piece, ramp, flux, source, form -> form.at(ramp, flux, source));
    }

    /** Where a piece was last looked at. */
    static Kirchhoff where(Network n, Piece piece) {
        return new Kirchhoff(n, piece, piece.rampVolts(), piece.fluxAmps(), piece.sourceVolts(), piece::value);
    }

    double dropperAmps() {
        return rectifies ? (sourceVolts - supplyVolts) / n.dropperOhms : 0;
    }

    double zenerAmps() {
        return clips ? (supplyVolts - n.zenerKneeVolts) / n.zenerSlopeOhms : 0;
    }

    double rampResistorAmps() {
        return (supplyVolts - rampVolts) / n.rampOhms;
    }

    /** What leaves the supply for base bar or divider. */
    double baseTwoAmps() {
        if (n.programmable) {
            return mode == Mode.ON
                    ? (supplyVolts - baseOneVolts - PROGRAMMABLE_DROP) / n.upperOhms
                    : supplyVolts / (n.upperOhms + n.lowerOhms);
        }
        return (supplyVolts - baseOneVolts) / (n.baseTwoOhms + (mode == Mode.ON ? n.modulatedOhms : n.interbaseOhms));
    }

    /** What the device brings into base one (a programmable device's cathode). */
    double deviceAmps() {
        double emitter = mode == Mode.ON ? emitterAmps : 0;
        if (!n.programmable) {
            return emitter + baseTwoAmps();
        }
        return mode == Mode.ON ? emitter + baseTwoAmps() - (baseOneVolts + PROGRAMMABLE_DROP) / n.lowerOhms : 0;
    }

    double junctionAmps() {
        return junction ? (gateVolts - n.gateKneeVolts) / n.gateSlopeOhms : 0;
    }

    /** Through R_G into R_GK and the junction. */
    double leadAmps() {
        return gateVolts * n.gateShuntSiemens + junctionAmps();
    }

    /** What leaves base one beside R1: into the gate's lead, or into the primary winding. */
    double coupledAmps() {
        return n.transformerCoupled ? fluxAmps + n.secondaries * leadAmps() / n.turnsRatio : leadAmps();
    }

    double supplyImbalance() {
        return dropperAmps() - zenerAmps() - rampResistorAmps() - baseTwoAmps();
    }

    double baseOneImbalance() {
        return deviceAmps() + clampAmps - baseOneVolts / n.baseOneOhms - coupledAmps();
    }

    /** Volts once round the gate's loop. */
    double gateLoopVolts() {
        if (!n.transformerCoupled) {
            return baseOneVolts - n.gateSeriesOhms * leadAmps() - gateVolts;
        }
        double secondary = gateVolts + (n.gateSeriesOhms + n.secondaryOhms) * leadAmps();
        return primaryVolts - n.turnsRatio * secondary;
    }

    /** Volts round the primary's loop. */
    double primaryLoopVolts() {
        return n.transformerCoupled ? baseOneVolts - n.primaryOhms * coupledAmps() - primaryVolts : 0;
    }

    /** The emitter's own law while it conducts. */
    double emitterLineVolts() {
        double drop = n.programmable ? PROGRAMMABLE_DROP : n.emitterDropVolts + n.onIntercept * supplyVolts;
        return rampVolts - baseOneVolts - drop - n.onOhms * emitterAmps;
    }

    /** What the divider or the bar's tap stands at, and V_D above it: the peak point. */
    double tapVolts() {
        double tap = n.programmable
                ? supplyVolts * n.lowerOhms / (n.upperOhms + n.lowerOhms)
                : baseOneVolts
                        + n.standoff
                                * n.interbaseOhms
                                * (supplyVolts - baseOneVolts)
                                / (n.baseTwoOhms + n.interbaseOhms);
        return tap + n.emitterDropVolts;
    }
}
