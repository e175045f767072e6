package clipramp.faults;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Designators;
import clipramp.circuit.RefusedCircuit;
import clipramp.firing.Firing;
import clipramp.firing.Pulse;
import clipramp.runs.Watch;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CancellationException;

/**
 * Single faults of a design: every part open, shorted, drifted or dead in turn, and what follows, computed by the same
 * engine as the healthy circuit (DEVELOPERS.md, Single faults).
 */
public final class Faults {
    private static final double MID_KNOB = 0.5;

    private Faults() {}

    /**
     * Every single fault of a design, worked out.
     *
     * @param design a sound design
     * @param condition line and temperature that all figures hold at
     * @throws RefusedCircuit where the healthy circuit cannot be solved
     */
    public static FaultSheet of(Design design, Condition condition) {
        return of(design, condition, Watch.NONE);
    }

    /**
     * The same, watched.
     *
     * @param design a sound design
     * @param condition line and temperature that all figures hold at
     * @param watch told of faults worked out, of all that there are; may end it
     * @throws RefusedCircuit where the healthy circuit cannot be solved
     * @throws CancellationException where the watch cancelled
     */
    public static FaultSheet of(Design design, Condition condition, Watch watch) {
        FaultSolver solver = new FaultSolver(design, condition);
        FaultEffect healthy = solver.healthy();
        List<FaultEffect> effects = new ArrayList<>();
        List<FaultSheet.NotComputed> refused = new ArrayList<>();
        List<Fault> all = list(design, condition);
        for (int i = 0; i < all.size(); i++) {
            watch.step("working out the faults", i, all.size());
            Fault fault = all.get(i);
            try {
                effects.add(solver.effect(fault, healthy));
            } catch (RefusedCircuit | ArithmeticException unsolved) {
                refused.add(new FaultSheet.NotComputed(fault, String.valueOf(unsolved.getMessage())));
            }
        }
        return new FaultSheet(design, condition, healthy, effects, refused);
    }

    /** Every single fault that a design's parts can have, in the order of the signal. */
    static List<Fault> list(Design design, Condition condition) {
        double midOhms = design.ramp().rampOhms(MID_KNOB);
        Map<String, String> names = Designators.of(design);
        Optional<Pulse> pulse = Firing.solve(design, condition, midOhms).shown().shownPulse();
        List<Fault> all = new ArrayList<>(FiringFaults.of(design, names, midOhms, pulse));
        all.addAll(PowerFaults.of(design, names));
        return all;
    }
}
