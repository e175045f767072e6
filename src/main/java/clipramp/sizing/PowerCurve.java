package clipramp.sizing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.firing.Firing;
import clipramp.power.LoadPower;

/** Power or light against R_E at nominal parts and line: solved at points an even ratio apart, straight between them. */
final class PowerCurve {
    private static final int POINTS = 160;

    private final double leastLog;
    private final double step;
    private final double[] values = new double[POINTS];

    PowerCurve(Design design, KnobShape.What what, double leastOhms, double mostOhms) {
        Condition condition = design.nominalCondition();
        double full = condition.lineVolts() * design.line().rmsFactor();
        leastLog = Math.log(leastOhms);
        step = Math.log(mostOhms / leastOhms) / (POINTS - 1);
        for (int i = 0; i < POINTS; i++) {
            double ohms = Math.exp(leastLog + i * step);
            values[i] = what.of(LoadPower.of(design, condition, Firing.solve(design, condition, ohms)), full);
        }
    }

    /** The value at an R_E in ohms; beyond the ends the end's. */
    double at(double ohms) {
        double place = (Math.log(ohms) - leastLog) / step;
        int left = (int) Math.max(0, Math.min(POINTS - 2, Math.floor(place)));
        double share = Math.max(0, Math.min(1, place - left));
        return values[left] + share * (values[left + 1] - values[left]);
    }
}
