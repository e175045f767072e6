package clipramp.power;

import clipramp.circuit.Design;
import clipramp.circuit.Winding;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Which pulse fires the thyristor in which half cycle of the load. Without a lagging winding a pulse acts in the half
 * cycle that it was made in; with one, a pulse made after the load's zero acts in the next half cycle, and early in it:
 * full power (model.md section 5).
 */
public final class ActingPulses {
    private ActingPulses() {}

    /**
     * One half cycle of the load.
     *
     * @param positive whether the line's fundamental is positive in it
     * @param firingRad firing angle; empty when the thyristor stays off
     * @param index which of the solution's halves it belongs to
     */
    record Slot(boolean positive, OptionalDouble firingRad, int index) {}

    /**
     * By how many half cycles of the load a pulse acts later than the supply's half cycle that made it: 0, or 1 past
     * the load's zero, or -1 where a leading winding makes it before the zero.
     */
    public static int halfCyclesLater(Design design, Solution solution, Pulse pulse) {
        double lagRad = design.clip().winding().map(Winding::lagRad).orElse(0.0);
        double madeAtRad = solution.condition().omega() * pulse.startSeconds() + lagRad;
        return (int) Math.round((madeAtRad - pulse.startRad()) / Math.PI);
    }

    /** Whether the thyristor is fired, in some half cycle, by a pulse made in the half cycle before: full power. */
    public static boolean spillOver(Design design, Solution solution) {
        return solution.halves().stream()
                .flatMap(half -> half.pulses().stream())
                .anyMatch(pulse -> pulse.latches()
                        && pulse.startRad() < Math.PI / 2
                        && halfCyclesLater(design, solution, pulse) > 0);
    }

    /** Whether one of the solution's halves spans a whole period, as a single-diode supply's does. */
    static boolean spansPeriods(Solution solution) {
        return solution.halves().get(0).seconds() > 1.5 * solution.condition().halfCycleSeconds();
    }

    /**
     * Successive half cycles of the load, an even number of them where the solution has one or two halves. Of every
     * pulse that latches the thyristor in one, the earliest counts.
     */
    static List<Slot> slots(Design design, Solution solution) {
        List<HalfCycle> halves = solution.halves();
        boolean periods = spansPeriods(solution);
        boolean doubled = periods || halves.size() == 1;
        int count = doubled ? 2 * halves.size() : halves.size();
        double[] earliest = new double[count];
        Arrays.fill(earliest, Double.POSITIVE_INFINITY);
        for (int slot = 0; slot < count; slot++) {
            boolean unfed = periods && slot % 2 == 1;
            if (!unfed) {
                collect(design, solution, halves.get(doubled ? slot / 2 : slot), slot, earliest);
            }
        }
        List<Slot> slots = new ArrayList<>();
        for (int slot = 0; slot < count; slot++) {
            HalfCycle half = halves.get(doubled ? slot / 2 : slot);
            boolean positive = half.positive() ^ (doubled && slot % 2 == 1);
            OptionalDouble rad =
                    Double.isInfinite(earliest[slot]) ? OptionalDouble.empty() : OptionalDouble.of(earliest[slot]);
            slots.add(new Slot(positive, rad, doubled ? slot / 2 : slot));
        }
        return slots;
    }

    private static void collect(Design design, Solution solution, HalfCycle made, int slot, double[] earliest) {
        for (Pulse pulse : made.pulses()) {
            if (pulse.latches()) {
                int acts = Math.floorMod(slot + halfCyclesLater(design, solution, pulse), earliest.length);
                earliest[acts] = Math.min(earliest[acts], pulse.startRad());
            }
        }
    }
}
