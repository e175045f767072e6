package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Line;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;

/**
 * Power of a load with the thyristor always on, at full line voltage and without drops: what shares of power are shares
 * of.
 */
final class FullPower {
    private FullPower() {}

    /** That power, W. */
    static double watts(Design design, Condition condition) {
        double rms = condition.lineVolts() * design.line().rmsFactor();
        Load load = design.load();
        if (load instanceof Load.Filament filament) {
            return new FilamentLaw(filament).wattsAt(rms);
        }
        if (load instanceof Load.Inductive inductive) {
            return design.stage() == Stage.BRIDGE_DC
                    ? rectified(design, condition, inductive)
                    : alternating(design.line(), condition, inductive);
        }
        return rms * rms / load.resistanceOhms();
    }

    /** Sum over the line's orders k of V_k² R/(R² + (k w L)²). */
    private static double alternating(Line line, Condition condition, Load.Inductive load) {
        double reactance = condition.omega() * load.inductanceHenries();
        double watts = share(condition.lineVolts(), 1, load.resistanceOhms(), reactance);
        for (Line.Harmonic harmonic : line.harmonics()) {
            double volts = condition.lineVolts() * harmonic.share();
            watts += share(volts, harmonic.order(), load.resistanceOhms(), reactance);
        }
        return watts;
    }

    private static double share(double volts, int order, double ohms, double reactance) {
        return volts * volts * ohms / (ohms * ohms + order * order * reactance * reactance);
    }

    /** The load behind an ideal bridge: dc and even orders of |v|. */
    private static double rectified(Design design, Condition condition, Load.Inductive load) {
        LoadLoop loop = LoadLoop.of(design, condition, load).withoutDrops();
        int order = SpanTotals.highestOrder(design.line());
        Firings always = Firings.heldFrom(design, condition, 0);
        LoadPeriod period = new InductiveRun(loop, always.windows(), always.spanRad(), 0, 0, order).settle();
        double square = 0;
        for (CurrentSpan span : period.spans()) {
            square += SpanQuadrature.squareAmpRad(span, order);
        }
        return square / period.spanRad() * load.resistanceOhms();
    }
}
