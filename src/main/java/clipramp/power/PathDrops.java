package clipramp.power;

import clipramp.circuit.Design;

/** What the load's path loses in the thyristor and in the stage's bridge (model.md section 8). */
public final class PathDrops {
    private PathDrops() {}

    /** V_T0 + n_b V_F, V. */
    public static double volts(Design design) {
        return design.thyristor().device().onState().thresholdVolts()
                + design.stage().bridgeDiodes() * design.stageDiodes().dropVolts();
    }

    /** r_T + n_b slope, ohm. */
    public static double ohms(Design design) {
        return design.thyristor().device().onState().slopeOhms()
                + design.stage().bridgeDiodes() * design.stageDiodes().slopeOhms();
    }
}
