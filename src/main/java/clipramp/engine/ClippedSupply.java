package clipramp.engine;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;

/** The clipped supply at the line's crest, the ramp held at the peak point (DEVELOPERS.md, The clipped supply). */
public final class ClippedSupply {
    private ClippedSupply() {}

    /**
     * V_S at the crest, from (e - V_S)/R_D = i_Z + V_S/R_bar + (V_S - V_P)/R_E, e the crest behind winding and rectifier.
     *
     * @param design line and supply
     * @param condition line voltage
     * @param network the firing circuit there, derived; with an infinite R_E nothing flows into the ramp
     * @return V to the firing common, 0 or more
     */
    public static double crestVolts(Design design, Condition condition, Network network) {
        double source =
                design.line().crestVolts(condition.lineVolts()) * design.clip().windingRatio()
                        - design.clip().rectifierVolts();
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
