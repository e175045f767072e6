package clipramp.spread;

import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Ramp;
import clipramp.circuit.Wanted.Goal;
import clipramp.engine.UnitValues;
import java.util.Optional;

/**
 * How a unit's trimmers are set: at nominal line and temperature, first with the knob at the highest wanted setting, then
 * at the lowest, each to the firing angle that the nominal unit has there. A track that may be less than it says reaches as
 * far as the least one does.
 */
final class TrimmerSetting {
    /** The firing instant is nearly in proportion to R_E: as many proportional steps end within a thousandth of it. */
    private static final int STEPS = 6;

    private static final double NEAR = 1e-4;

    private final UnitSolver solver;
    private final UnitValues nominal;
    private final double highReach;
    private final double lowReach;
    private final double highShare;
    private final double lowShare;
    private final double highRad;
    private final double lowRad;
    private final UnitOutcome there = new UnitOutcome();

    TrimmerSetting(Design design, UnitSolver solver) {
        this.solver = solver;
        Ramp ramp = design.ramp();
        nominal = UnitValues.nominal(design);
        nominal.celsius = Math.min(
                design.surroundings().hottestCelsius(),
                Math.max(design.surroundings().coldestCelsius(), nominal.celsius));
        highReach = reach(ramp.trimmers().high());
        lowReach = reach(ramp.trimmers().low());
        double least = ramp.rampOhms(0) <= ramp.rampOhms(1) ? 0 : 1;
        highShare = WantedTest.share(
                ramp, design.wanted().highest().map(Goal::position).orElse(least));
        lowShare = WantedTest.share(
                ramp, design.wanted().lowest().map(Goal::position).orElse(1 - least));
        highRad = rad(nominal, highShare);
        lowRad = rad(nominal, lowShare);
    }

    private static double reach(Optional<Part> trimmer) {
        return trimmer.map(Part::lowest).orElse(0.0);
    }

    private double rad(UnitValues unit, double share) {
        solver.solve(unit, share, there);
        return there.latestRad();
    }

    void set(UnitValues unit) {
        double volts = unit.lineVolts;
        double hertz = unit.lineHertz;
        double celsius = unit.celsius;
        unit.lineVolts = nominal.lineVolts;
        unit.lineHertz = nominal.lineHertz;
        unit.celsius = nominal.celsius;
        unit.highTrimOhms = nominal.highTrimOhms;
        unit.lowTrimOhms = nominal.lowTrimOhms;
        high(unit);
        low(unit);
        unit.lineVolts = volts;
        unit.lineHertz = hertz;
        unit.celsius = celsius;
    }

    private void high(UnitValues unit) {
        if (highReach > 0) {
            double ohms = ohmsFor(unit, highRad, unit.rampOhms(highShare));
            double rest = unit.rampOhms(highShare) - unit.highTrimOhms;
            unit.highTrimOhms = Math.max(0, Math.min(highReach, ohms - rest));
        }
    }

    private void low(UnitValues unit) {
        if (lowReach > 0) {
            double ohms = ohmsFor(unit, lowRad, unit.rampOhms(lowShare)) - unit.fixedOhms - unit.highTrimOhms;
            double bare = unit.usedTrackOhms(lowShare);
            // Parallel resistances: 1/ohms = 1/bare + 1/across.
            double across = ohms <= 0 ? 0 : ohms < bare ? ohms * bare / (bare - ohms) : Double.POSITIVE_INFINITY;
            unit.lowTrimOhms = Math.max(0, Math.min(lowReach, across - unit.potShuntOhms));
        }
    }

    private double ohmsFor(UnitValues unit, double targetRad, double start) {
        double ohms = start;
        for (int step = 0; step < STEPS; step++) {
            solver.solveAt(unit, ohms, there);
            double scale = targetRad / there.latestRad();
            ohms *= scale;
            if (Math.abs(scale - 1) < NEAR) {
                break;
            }
        }
        return ohms;
    }
}
