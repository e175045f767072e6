package clipramp.engine;

/**
 * Kirchhoff's current law at the clipped supply and at base one, for one state of rectifier, zener and gate junction;
 * direct coupling here, a pulse transformer in {@link TransformerLaws} (DEVELOPERS.md, The clipped supply and on).
 */
final class NodeLaws {
    /** More rounds than three switches have states: a network that has not settled by then never will. */
    private static final int MOST_ROUNDS = 9;

    private NodeLaws() {}

    /** Sets the piece's linear forms for its mode and switches. */
    static void shape(Network n, Piece piece) {
        if (n.transformerCoupled) {
            TransformerLaws.shape(n, piece);
            return;
        }
        switch (piece.mode) {
            case OFF -> shapeOff(n, piece);
            case ON -> shapeOn(n, piece);
            case STALLED -> shapeStalled(n, piece);
        }
    }

    /**
     * Finds the state of rectifier, zener and gate junction that agrees with itself, and shapes the piece for it.
     *
     * @param rampVolts ramp voltage, V
     * @param fluxAmps magnetising current, A; 0 without a transformer
     * @param sourceVolts source voltage, V
     */
    static void settle(Network n, Piece piece, double rampVolts, double fluxAmps, double sourceVolts) {
        for (int round = 0; round < MOST_ROUNDS; round++) {
            shape(n, piece);
            double supply = piece.supply.at(rampVolts, fluxAmps, sourceVolts);
            boolean rectifies = sourceVolts > supply;
            boolean clips = supply > n.zenerKneeVolts;
            boolean gateConducts =
                    piece.mode == Mode.ON && piece.gate.at(rampVolts, fluxAmps, sourceVolts) > n.gateKneeVolts;
            boolean clamps = n.transformerCoupled && TransformerLaws.clamps(n, piece, rampVolts, fluxAmps, sourceVolts);
            if (rectifies == piece.rectifies
                    && clips == piece.clips
                    && gateConducts == piece.gateConducts
                    && clamps == piece.clamps) {
                return;
            }
            piece.clamps = clamps;
            piece.rectifies = rectifies;
            piece.clips = clips;
            piece.gateConducts = gateConducts;
        }
        shape(n, piece);
    }

    /** (e - V_S)/R_D = (V_S - V_Z0)/r_z + V_S G + (V_S - V_C)/R_E, first and second term where they conduct. */
    private static void shapeOff(Network n, Piece piece) {
        double feed = piece.rectifies ? 1 / n.dropperOhms : 0;
        double zener = piece.clips ? 1 / n.zenerSlopeOhms : 0;
        double rampSiemens = 1 / n.rampOhms;
        double sum = feed + zener + n.standingSiemens + rampSiemens;
        piece.supply.set(rampSiemens / sum, feed / sum, zener * n.zenerKneeVolts / sum);
        piece.emitter.set(0, 0, 0);
        quiescent(n, piece);
    }

    /** As off, with V_C = kappa V_S + V_D; the emitter takes what the resistor brings and the capacitor does not. */
    private static void shapeStalled(Network n, Piece piece) {
        double feed = piece.rectifies ? 1 / n.dropperOhms : 0;
        double zener = piece.clips ? 1 / n.zenerSlopeOhms : 0;
        double rampSiemens = 1 / n.rampOhms;
        double left = (1 - n.peakShare) * rampSiemens;
        double sum = feed + zener + n.standingSiemens + left;
        piece.supply.set(0, feed / sum, (zener * n.zenerKneeVolts + n.emitterDropVolts * rampSiemens) / sum);
        piece.emitter.set(
                0, left * piece.supply.source, left * piece.supply.constant - n.emitterDropVolts * rampSiemens);
        piece.emitter.sourceSlope = -n.capacitorFarads * n.peakShare * piece.supply.source;
        quiescent(n, piece);
    }

    private static void quiescent(Network n, Piece piece) {
        piece.gateConducts = false;
        double base = n.quiescentShare;
        piece.baseOne.set(base * piece.supply.ramp, base * piece.supply.source, base * piece.supply.constant);
        peakFromSupply(n, piece);
        gateFromBaseOne(n, piece);
    }

    /** V_P = kappa V_S + V_D. */
    private static void peakFromSupply(Network n, Piece piece) {
        double share = n.peakShare;
        piece.peak.set(
                share * piece.supply.ramp,
                share * piece.supply.source,
                share * piece.supply.constant + n.emitterDropVolts);
    }

    /** Two nodes at once: V_S and V_B1, by Cramer's rule, for unit ramp voltage, unit source voltage and constants. */
    private static void shapeOn(Network n, Piece piece) {
        double feed = piece.rectifies ? 1 / n.dropperOhms : 0;
        double zener = piece.clips ? 1 / n.zenerSlopeOhms : 0;
        double rampSiemens = 1 / n.rampOhms;
        double on = 1 / n.onOhms;
        double baseTwo = n.baseTwoOnSiemens;
        double gate = piece.gateConducts ? n.gateOnSiemens : n.gateOffSiemens;
        double gateVolts = piece.gateConducts ? n.gateOnVolts : 0;

        double ss = feed + zener + baseTwo + rampSiemens;
        double sb = -baseTwo;
        double bs = n.onIntercept * on - baseTwo;
        double bb = on + baseTwo + 1 / n.baseOneOhms + n.lowerSiemens + gate;
        double determinant = ss * bb - sb * bs;

        double supplyConstant = zener * n.zenerKneeVolts + baseTwo * n.gateDropVolts;
        double baseConstant = -n.onDropVolts * on - (baseTwo + n.lowerSiemens) * n.gateDropVolts + gate * gateVolts;
        piece.supply.set(
                (rampSiemens * bb - sb * on) / determinant,
                feed * bb / determinant,
                (supplyConstant * bb - sb * baseConstant) / determinant);
        piece.baseOne.set(
                (ss * on - bs * rampSiemens) / determinant,
                -bs * feed / determinant,
                (ss * baseConstant - bs * supplyConstant) / determinant);
        piece.emitter.set(
                (1 - piece.baseOne.ramp - n.onIntercept * piece.supply.ramp) * on,
                (-piece.baseOne.source - n.onIntercept * piece.supply.source) * on,
                (-piece.baseOne.constant - n.onDropVolts - n.onIntercept * piece.supply.constant) * on);
        peakFromSupply(n, piece);
        gateFromBaseOne(n, piece);
    }

    /** v_GK behind the gate's series resistor. */
    private static void gateFromBaseOne(Network n, Piece piece) {
        Affine base = piece.baseOne;
        if (piece.gateConducts) {
            double kept = 1 - n.gateSeriesOhms * n.gateOnSiemens;
            double added = n.gateSeriesOhms * n.gateOnSiemens * n.gateOnVolts;
            piece.gate.set(kept * base.ramp, kept * base.source, kept * base.constant + added);
        } else {
            double kept = 1 - n.gateSeriesOhms * n.gateOffSiemens;
            piece.gate.set(kept * base.ramp, kept * base.source, kept * base.constant);
        }
    }
}
