package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.Network;

/** The clipped supply at the line's crest, the ramp held at the peak point (DEVELOPERS.md, The clipped supply). */
final class ClippedSupply {
    private ClippedSupply() {}

    /**
     * V_S at the crest, V: (e - V_S)/R_D = i_Z + V_S/R_bar + (V_S - V_P)/R_E.
     *
     * @param network the design's network at the condition
     */
    static double crestVolts(Design design, Condition condition, Network network) {
        double ratio = design.clip().winding().map(w -> w.ratio()).orElse(1.0);
        double source = design.line().crestVolts(condition.lineVolts()) * ratio
                - design.clip().rectifier().diodesInPath() * design.clip().diodeDropVolts();
        double dropper = 1 / network.dropperOhms;
        double ramp = (1 - network.peakShare()) / network.rampOhms;
        double load = network.standingSiemens() + Math.max(0, ramp);
        double fed = source * dropper + network.emitterDropVolts / network.rampOhms;
        double unclipped = fed / (dropper + load);
        double zener = 1 / network.zenerSlopeOhms;
        double clipped = (fed + network.zenerKneeVolts * zener) / (dropper + load + zener);
        return Math.max(0, unclipped > network.zenerKneeVolts ? clipped : unclipped);
    }
}
