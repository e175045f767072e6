package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.List;

/**
 * Voltage across the load over one half cycle, or over one period for a half-wave stage: the line less the path's
 * drops, shared between load and path (model.md section 8), while current flows; 0 otherwise.
 *
 * @param rad angles of the line, rad, from 0, never falling; two samples where the voltage jumps
 * @param volts voltage across the load at those angles, V; on the dc side of a bridge always positive
 */
public record LoadWave(double[] rad, double[] volts) {
    /** Samples of one conducting half cycle: a hundredth of it is under the width of a screen's pixel. */
    private static final int SAMPLES = 180;

    /**
     * @param design stage, load and thyristor
     * @param condition line
     * @param solution the firing circuit's periodic state there
     * @throws UnsupportedLoadException for a load that is not a resistor
     */
    public static LoadWave of(Design design, Condition condition, Solution solution) {
        if (!(design.load() instanceof Load.Resistor)) {
            throw new UnsupportedLoadException(design.load());
        }
        boolean period = design.stage() == Stage.HALF_WAVE || ActingPulses.spansPeriods(solution);
        List<ActingPulses.Slot> slots = ActingPulses.slots(solution);
        ResistorCurrent path = new ResistorCurrent(design, condition);
        List<double[]> samples = new ArrayList<>();
        samples.add(new double[] {0, 0});
        for (int half = 0; half < (period ? 2 : 1); half++) {
            ActingPulses.Slot slot = period ? slots.get(half) : shown(slots);
            boolean blocked = design.stage() == Stage.HALF_WAVE && !slot.positive();
            if (slot.firingRad().isPresent() && !blocked) {
                double sign = slot.positive() || design.stage() == Stage.BRIDGE_DC ? 1 : -1;
                conducting(path, slot, half * Math.PI, sign, samples);
            }
            samples.add(new double[] {(half + 1) * Math.PI, 0});
        }
        return new LoadWave(column(samples, 0), column(samples, 1));
    }

    private static ActingPulses.Slot shown(List<ActingPulses.Slot> slots) {
        return slots.stream().filter(ActingPulses.Slot::positive).findFirst().orElse(slots.get(0));
    }

    private static void conducting(
            ResistorCurrent path, ActingPulses.Slot slot, double startRad, double sign, List<double[]> samples) {
        double from = Math.max(0, slot.firingRad().getAsDouble());
        samples.add(new double[] {startRad + from, 0});
        for (int i = 0; i <= SAMPLES; i++) {
            double rad = from + (Math.PI - from) * i / SAMPLES;
            samples.add(new double[] {startRad + rad, sign * path.loadVoltsAt(slot.positive(), rad)});
        }
    }

    private static double[] column(List<double[]> samples, int column) {
        return samples.stream().mapToDouble(sample -> sample[column]).toArray();
    }
}
