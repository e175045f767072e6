package clipramp.engine;

/** The linear forms of a shaped piece that rise to zero at its events. */
final class EventForms {
    private EventForms() {}

    /** The rectifier stops at V_S = e and starts there. */
    static void rectifier(Piece piece, Affine form) {
        form.copy(piece.supply);
        form.source -= 1;
        if (!piece.rectifies) {
            form.negate();
        }
    }

    /** The zener starts and stops at V_S = V_Z0. */
    static void zener(Network n, Piece piece, Affine form) {
        form.copy(piece.supply);
        form.below(n.zenerKneeVolts);
        if (piece.clips) {
            form.negate();
        }
    }

    /** The gate junction starts and stops at v_GK = V_G0. */
    static void gate(Network n, Piece piece, Affine form) {
        form.copy(piece.gate);
        form.below(n.gateKneeVolts);
        if (piece.gateConducts) {
            form.negate();
        }
    }

    /** V_C - V_P. */
    static void peak(Piece piece, Affine form) {
        form.copy(piece.peak);
        form.ramp -= 1;
        form.negate();
    }

    /** iota V_S - I_E. */
    static void valley(Network n, Piece piece, Affine form) {
        form.copy(piece.emitter);
        form.negate();
        form.add(n.valleySiemens, piece.supply);
    }

    /** I_E - I_P in a stall. */
    static void peakCurrent(Network n, Piece piece, Affine form) {
        form.copy(piece.emitter);
        form.constant -= n.peakCurrentAmps;
    }

    /** Gate current falls to a level, A: v_GK falls to V_G0 + level r_G. */
    static void gateFallsTo(Network n, Piece piece, double amps, Affine form) {
        form.copy(piece.gate);
        form.below(n.gateKneeVolts + amps * n.gateSlopeOhms);
        form.negate();
    }
}
