package clipramp.engine;

/**
 * Kirchhoff's current law at the clipped supply and at base one with a pulse transformer.
 *
 * <p>The primary branch carries I_m and what the gates take: I_prim = I_m + y (V_prim - n v), with y = k g/n² for k
 * secondaries whose gate network shows a conductance g and an open-circuit voltage v, and V_prim = V_B1 - R_p I_prim. With
 * the device off the base bar still drives base one, so that the decaying magnetising current lowers base one and the
 * peak point with it.
 */
final class TransformerLaws {
    private TransformerLaws() {}

    static void shape(Network n, Piece piece) {
        if (piece.mode != Mode.ON) {
            piece.gateConducts = false;
        }
        double gate = piece.gateConducts ? n.gateOnSiemens : n.gateOffSiemens;
        double gateVolts = piece.gateConducts ? n.gateOnVolts : 0;
        double reflected = n.secondaries * gate / (n.turnsRatio * n.turnsRatio);
        double kept = 1 / (1 + reflected * n.primaryOhms);
        double branch = reflected * kept;
        double branchVolts = gateVolts * n.turnsRatio;
        nodes(n, piece, branch, branchVolts, kept);
        peakPoint(n, piece);
        // V_prim = V_B1 - R_p I_prim
        piece.primary.copy(piece.baseOne);
        piece.primary.add(-n.primaryOhms * branch, piece.baseOne);
        piece.primary.constant += n.primaryOhms * branch * branchVolts;
        piece.primary.flux -= n.primaryOhms * kept;
        emitter(n, piece);
        clampCurrent(n, piece, branch, branchVolts, kept);
        gate(n, piece, gate, gateVolts);
    }

    /** Whether the diode across the primary conducts at this state. */
    static boolean clamps(Network n, Piece piece, double rampVolts, double fluxAmps, double sourceVolts) {
        return piece.clamps
                ? piece.clamp.at(rampVolts, fluxAmps, sourceVolts) > 0
                : piece.baseOne.at(rampVolts, fluxAmps, sourceVolts) < -n.clampVolts;
    }

    /** V_S and V_B1 for unit ramp voltage, magnetising current, source voltage and constants, by Cramer's rule. */
    private static void nodes(Network n, Piece piece, double branch, double branchVolts, double kept) {
        boolean on = piece.mode == Mode.ON;
        boolean held = piece.mode == Mode.STALLED;
        double feed = piece.rectifies ? 1 / n.dropperOhms : 0;
        double zener = piece.clips ? 1 / n.zenerSlopeOhms : 0;
        double rampSiemens = 1 / n.rampOhms;
        double emitter = on ? 1 / n.onOhms : 0;
        double baseTwo = on ? n.baseTwoOnSiemens : n.barSiemens;
        double drop = on ? n.gateDropVolts : 0;
        double lower = on ? n.lowerSiemens : 0;

        double ss = feed + zener + baseTwo + rampSiemens + (on ? 0 : n.dividerSiemens);
        double sb = -baseTwo;
        double supplyConstant = zener * n.zenerKneeVolts + baseTwo * drop;
        double supplyRamp = rampSiemens;
        if (held) {
            // V_C = V_P = supplyShare V_S + baseShare V_B1 + V_D
            ss -= rampSiemens * peakOfSupply(n);
            sb -= rampSiemens * peakOfBaseOne(n);
            supplyConstant += rampSiemens * n.emitterDropVolts;
            supplyRamp = 0;
        }
        double bs = n.onIntercept * emitter - baseTwo;
        double bb = emitter + baseTwo + 1 / n.baseOneOhms + lower + branch;
        double baseRamp = emitter;
        double baseFlux = -kept;
        double baseConstant = -n.onDropVolts * emitter - (baseTwo + lower) * drop + branch * branchVolts;
        if (piece.clamps) {
            bs = 0;
            bb = 1;
            baseRamp = 0;
            baseFlux = 0;
            baseConstant = -n.clampVolts;
        }
        double determinant = ss * bb - sb * bs;
        piece.supply.set(
                (supplyRamp * bb - sb * baseRamp) / determinant,
                feed * bb / determinant,
                (supplyConstant * bb - sb * baseConstant) / determinant);
        piece.supply.flux = -sb * baseFlux / determinant;
        piece.baseOne.set(
                (ss * baseRamp - bs * supplyRamp) / determinant,
                -bs * feed / determinant,
                (ss * baseConstant - bs * supplyConstant) / determinant);
        piece.baseOne.flux = ss * baseFlux / determinant;
    }

    private static double peakOfSupply(Network n) {
        return n.programmable ? n.peakShare : n.standoffShare;
    }

    private static double peakOfBaseOne(Network n) {
        return n.programmable ? 0 : 1 - n.standoffShare;
    }

    private static void peakPoint(Network n, Piece piece) {
        piece.peak.zero();
        piece.peak.add(peakOfSupply(n), piece.supply);
        piece.peak.add(peakOfBaseOne(n), piece.baseOne);
        piece.peak.constant += n.emitterDropVolts;
    }

    private static void emitter(Network n, Piece piece) {
        Affine emitter = piece.emitter;
        emitter.zero();
        if (piece.mode == Mode.ON) {
            emitter.ramp = 1 / n.onOhms;
            emitter.constant = -n.onDropVolts / n.onOhms;
            emitter.add(-1 / n.onOhms, piece.baseOne);
            emitter.add(-n.onIntercept / n.onOhms, piece.supply);
        } else if (piece.mode == Mode.STALLED) {
            emitter.add(1 / n.rampOhms, piece.supply);
            emitter.add(-1 / n.rampOhms, piece.peak);
            // C_E dV_P/dt, V_P moving with the flux and with the source.
            emitter.add(-n.capacitorFarads * piece.peak.flux / n.magnetisingHenries, piece.primary);
            emitter.sourceSlope = -n.capacitorFarads * piece.peak.source;
        }
    }

    /** What the clamp diode brings into base one: what leaves the node less what else enters it. */
    private static void clampCurrent(Network n, Piece piece, double branch, double branchVolts, double kept) {
        boolean on = piece.mode == Mode.ON;
        double baseTwo = on ? n.baseTwoOnSiemens : n.barSiemens;
        double drop = on ? n.gateDropVolts : 0;
        double lower = on ? n.lowerSiemens : 0;
        Affine clamp = piece.clamp;
        clamp.zero();
        clamp.add(1 / n.baseOneOhms + branch + baseTwo + lower, piece.baseOne);
        clamp.constant += -branch * branchVolts + (baseTwo + lower) * drop;
        clamp.flux += kept;
        clamp.add(-baseTwo, piece.supply);
        if (on) {
            clamp.add(-1, piece.emitter);
        }
    }

    /** v_GK = V_sec less what series and winding resistance drop. */
    private static void gate(Network n, Piece piece, double gate, double gateVolts) {
        double lead = (n.gateSeriesOhms + n.secondaryOhms) * gate;
        piece.gate.zero();
        piece.gate.add((1 - lead) / n.turnsRatio, piece.primary);
        piece.gate.constant += lead * gateVolts;
    }
}
