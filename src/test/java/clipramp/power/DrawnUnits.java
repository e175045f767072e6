package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.UnitValues;
import java.util.SplittableRandom;

/** Units of a design, every figure drawn uniformly and wider than parts are; a seed always gives the same units. */
public final class DrawnUnits {
    private final SplittableRandom random;
    private final UnitValues nominal;
    private final UnitValues unit;

    public DrawnUnits(Design design, long seed) {
        random = new SplittableRandom(seed);
        nominal = UnitValues.nominal(design);
        unit = UnitValues.nominal(design);
    }

    private double near(double value, double share) {
        return value * (1 + share * (2 * random.nextDouble() - 1));
    }

    /** Draws the next unit; it is the same instance every time. */
    public UnitValues next() {
        unit.lineVolts = near(nominal.lineVolts, 0.1);
        unit.lineHertz = near(nominal.lineHertz, 0.01);
        unit.celsius = 50 * random.nextDouble();
        unit.dropperOhms = near(nominal.dropperOhms, 0.05);
        unit.zenerVolts = near(nominal.zenerVolts, 0.05);
        unit.capacitorFarads = near(nominal.capacitorFarads, 0.1);
        unit.fixedOhms = near(nominal.fixedOhms, 0.05);
        unit.trackOhms = near(nominal.trackOhms, 0.2);
        unit.baseOneOhms = near(nominal.baseOneOhms, 0.05);
        unit.baseTwoOhms = near(nominal.baseTwoOhms, 0.05);
        unit.upperOhms = near(nominal.upperOhms, 0.05);
        unit.lowerOhms = near(nominal.lowerOhms, 0.05);
        unit.gateShuntOhms = near(nominal.gateShuntOhms, 0.05);
        unit.standoff = near(nominal.standoff, 0.14);
        unit.interbaseOhms = near(nominal.interbaseOhms, 0.3);
        unit.interbaseDrift = near(nominal.interbaseDrift, 0.8);
        unit.emitterDropVolts = near(nominal.emitterDropVolts, 0.1);
        unit.emitterDrift = near(nominal.emitterDrift, 0.2);
        unit.peakCurrentAmps = near(nominal.peakCurrentAmps, 0.9);
        unit.valleyAmps = near(nominal.valleyAmps, 0.4);
        unit.valleyVolts = near(nominal.valleyVolts, 0.2);
        unit.modulatedAmps = near(nominal.modulatedAmps, 0.2);
        return unit;
    }

    /** Where the last unit stands. */
    public Condition condition() {
        return new Condition(unit.lineVolts, unit.lineHertz, unit.celsius);
    }
}
