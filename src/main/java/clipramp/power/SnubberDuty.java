package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Snubber;
import clipramp.circuit.Stage;

/**
 * What a snubber does all day: it leaks past a thyristor that is off, it is discharged through the thyristor at every
 * firing, and it warms its resistor.
 *
 * @param leakageAmps rms current through the load with the thyristor off, A; 0 on the dc side of a bridge, which charges
 *     the capacitor once
 * @param leakageWatts what the load gets from it, W
 * @param resistorWatts loss of the resistor, fired at the crest, W
 * @param dischargeAmps V/R_s, the capacitor's current into the thyristor fired at the crest, A
 */
public record SnubberDuty(double leakageAmps, double leakageWatts, double resistorWatts, double dischargeAmps) {

    /**
     * The worst over every firing angle. Each firing at the crest turns C V²/2 into heat; with an inductive load the
     * step back at extinction costs as much again at most (DEVELOPERS.md, Commutation, snubber, inrush).
     *
     * @param design stage and load
     * @param snubber across its thyristor
     * @param condition line voltage and frequency
     */
    public static SnubberDuty worst(Design design, Snubber snubber, Condition condition) {
        double farads = snubber.capacitanceFarads();
        double crest = design.line().crestVolts(condition.lineVolts());
        boolean inductive = design.load() instanceof Load.Inductive;
        boolean dcSide = design.stage() == Stage.BRIDGE_DC || design.stage() == Stage.BRIDGE_AC;
        double leakage = dcSide ? 0 : leakageAmps(design.load(), snubber, condition);
        double firings = condition.lineHertz() * (design.stage().isFullWave() ? 2 : 1);
        double energy = farads * crest * crest / 2 * (inductive ? 2 : 1);
        return new SnubberDuty(
                leakage,
                leakage * leakage * design.load().resistanceOhms(),
                firings * energy + leakage * leakage * snubber.resistanceOhms(),
                crest / snubber.resistanceOhms());
    }

    /** V over the series impedance of load and snubber. */
    private static double leakageAmps(Load load, Snubber snubber, Condition condition) {
        double henries = load instanceof Load.Inductive inductive ? inductive.inductanceHenries() : 0;
        double omega = condition.omega();
        double reactance = omega * henries - 1 / (omega * snubber.capacitanceFarads());
        return condition.lineVolts() / Math.hypot(load.resistanceOhms() + snubber.resistanceOhms(), reactance);
    }
}
