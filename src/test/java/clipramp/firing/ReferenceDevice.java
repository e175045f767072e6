package clipramp.firing;

import clipramp.circuit.ProgrammableUnijunction;
import clipramp.circuit.ProgrammableUnijunction.AtGateResistance;
import clipramp.circuit.Trigger;
import clipramp.circuit.Unijunction;
import java.util.List;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.interpolation.LinearInterpolator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The trigger device's numbers as DEVELOPERS.md derives them, worked out apart from the engine: the emitter line from
 * two equations in two unknowns, its calibration on V_OB1 by a root finder on the test circuit's node equation.
 */
record ReferenceDevice(
        boolean programmable,
        double upperOhms,
        double lowerOhms,
        double standoff,
        double interbaseOhms,
        double baseTwoOhms,
        double dropVolts,
        double onVolts,
        double peakAmps,
        double slopeOhms,
        double intercept,
        double valleySiemens,
        double onBaseTwoOhms) {

    static ReferenceDevice of(Trigger trigger, double warmerKelvin) {
        if (trigger instanceof Trigger.UnijunctionTrigger unijunction) {
            return unijunction(unijunction.device(), unijunction.baseTwo().value(), warmerKelvin);
        }
        return programmable((Trigger.ProgrammableTrigger) trigger);
    }

    private static ReferenceDevice unijunction(Unijunction ujt, double baseTwoOhms, double warmer) {
        double standoff = ujt.standoff().nominal();
        double bar25 = ujt.interbaseOhms().nominal();
        double bar = bar25 * (1 + ujt.interbaseDriftPerKelvin().nominal() * warmer);
        double drop25 = ujt.emitterDropVolts().nominal();
        double drop = drop25 + ujt.emitterDriftVoltsPerKelvin().nominal() * warmer;
        double spec = ujt.valley().atVolts();
        double valleyAmps = ujt.valley().amps().nominal();
        double valleyVolts = ujt.valley().volts().nominal();
        double slope = ujt.baseOnePulse().isPresent() ? calibrated(ujt) : throughSaturation(ujt);
        return new ReferenceDevice(
                false,
                0,
                0,
                standoff,
                bar,
                baseTwoOhms,
                drop,
                drop,
                ujt.peakCurrentAmps().nominal(),
                slope,
                (valleyVolts - slope * valleyAmps - drop25) / spec,
                valleyAmps / spec,
                onBaseTwo(ujt, bar));
    }

    private static double onBaseTwo(Unijunction ujt, double bar) {
        return ujt.modulated()
                .map(m -> m.atVolts() / m.amps().nominal())
                .orElse((1 - ujt.standoff().nominal()) * bar);
    }

    /** V_D + xi u + r i = v through the valley point and through the saturation point. */
    private static double throughSaturation(Unijunction ujt) {
        double drop = ujt.emitterDropVolts().nominal();
        double spec = ujt.valley().atVolts();
        double u = ujt.saturation().atVolts();
        double i = ujt.saturation().amps();
        double v = ujt.saturation().volts().nominal() - drop;
        double determinant = spec * i - u * ujt.valley().amps().nominal();
        return (spec * v - u * (ujt.valley().volts().nominal() - drop)) / determinant;
    }

    /** The slope for which the test circuit shows V_OB1 at base one the instant it fires, everything at 25 degrees. */
    private static double calibrated(Unijunction ujt) {
        Unijunction.BaseOnePulse test = ujt.baseOnePulse().orElseThrow();
        double drop = ujt.emitterDropVolts().nominal();
        double bar = ujt.interbaseOhms().nominal();
        double onBaseTwo = onBaseTwo(ujt, bar);
        UnivariateFunction excess = slope -> {
            double xi = (ujt.valley().volts().nominal()
                            - slope * ujt.valley().amps().nominal()
                            - drop)
                    / ujt.valley().atVolts();
            double barAmps = test.supplyVolts() / (bar + test.baseOneOhms());
            double peak = barAmps * (test.baseOneOhms() + ujt.standoff().nominal() * bar) + drop;
            double v = test.nominalVolts();
            double emitter = (peak - v - drop - xi * test.supplyVolts()) / slope;
            return emitter + (test.supplyVolts() - v) / onBaseTwo - v / test.baseOneOhms();
        };
        return new BrentSolver(1e-15, 1e-13).solve(300, excess, 1e-3, 1e6);
    }

    private static ReferenceDevice programmable(Trigger.ProgrammableTrigger trigger) {
        ProgrammableUnijunction put = trigger.device();
        double upper = trigger.upper().value();
        double lower = trigger.lower().value();
        double gateOhms = 1 / (1 / upper + 1 / lower);
        double offset = at(put.offsetVolts(), gateOhms, false);
        return new ReferenceDevice(
                true,
                upper,
                lower,
                0,
                0,
                0,
                offset,
                0.6,
                at(put.peakCurrentAmps(), gateOhms, true),
                (put.forwardVolts().nominal() - 0.6) / put.forwardAmps(),
                0,
                at(put.valleyCurrentAmps(), gateOhms, true) / 10,
                0);
    }

    /** Linear over the logarithm of the gate resistance, the value's own logarithm where asked. */
    private static double at(List<AtGateResistance> table, double gateOhms, boolean logarithm) {
        double[] x = table.stream().mapToDouble(row -> Math.log(row.gateOhms())).toArray();
        double[] y = table.stream()
                .mapToDouble(row -> row.value().nominal())
                .map(value -> logarithm ? Math.log(value) : value)
                .toArray();
        if (x.length == 1) {
            return table.get(0).value().nominal();
        }
        double value = new LinearInterpolator().interpolate(x, y).value(Math.log(gateOhms));
        return logarithm ? Math.exp(value) : value;
    }
}
