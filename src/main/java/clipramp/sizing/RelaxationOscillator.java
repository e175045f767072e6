package clipramp.sizing;

import clipramp.firing.PublishedRelations;
import clipramp.firing.PublishedRelations.BaseTwoRule;

/**
 * The textbook's own sizing of a unijunction relaxation oscillator on a steady supply: what the books ask and answer in
 * their worked examples, and the closed forms turned round for it. A synchronised firing circuit starts from these
 * figures and does not end with them.
 *
 * @param supplyVolts V, V
 * @param standoff eta, 0..1
 * @param emitterDropVolts V_D, V
 * @param valleyVolts V_V, V
 * @param valleyAmps I_V, A
 * @param peakCurrentAmps I_P, A
 */
public record RelaxationOscillator(
        double supplyVolts,
        double standoff,
        double emitterDropVolts,
        double valleyVolts,
        double valleyAmps,
        double peakCurrentAmps) {
    /** V_P = eta V + V_D, V. */
    public double peakPointVolts() {
        return PublishedRelations.peakPointVolts(standoff, supplyVolts, emitterDropVolts);
    }

    /** (V - V_P)/I_P, ohm. */
    public double largestRampOhms() {
        return PublishedRelations.largestRampOhms(supplyVolts, peakPointVolts(), peakCurrentAmps);
    }

    /** (V - V_V)/I_V, ohm. */
    public double smallestRampOhms() {
        return PublishedRelations.smallestRampOhms(supplyVolts, valleyVolts, valleyAmps);
    }

    /**
     * R_E for a period, T/(C ln(1/(1 - eta))) (Rashid 9.5; Gupta and Singhal 2.29), ohm.
     *
     * @param periodSeconds T, s
     * @param rampFarads C_E, F
     */
    public double rampOhms(double periodSeconds, double rampFarads) {
        return periodSeconds / PublishedRelations.textbookPeriodSeconds(1, rampFarads, standoff);
    }

    /** 10 000/(eta V) (Rashid 9.5), ohm. */
    public double baseTwoOhms() {
        return PublishedRelations.baseTwoOhms(BaseTwoRule.TEN_THOUSAND, standoff, supplyVolts, 0, 0);
    }

    /**
     * Largest base-one resistor by the standing gate voltage, exact (see {@link PublishedRelations#largestBaseOneOhms}).
     *
     * @param nonTriggerVolts V_GD, V
     * @param interbaseOhms R_BB, ohm
     * @param baseTwoOhms R2, ohm
     */
    public double largestBaseOneOhms(double nonTriggerVolts, double interbaseOhms, double baseTwoOhms) {
        return PublishedRelations.largestBaseOneOhms(nonTriggerVolts, supplyVolts, interbaseOhms, baseTwoOhms);
    }
}
