package clipramp.power;

import clipramp.circuit.Design;
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
 * full power.
 */
public final class ActingPulses {
    private ActingPulses() {}

    /**
     * One half cycle of the load.
     *
     * @param positive whether the line's fundamental is positive in it
     * @param firingRad firing angle from the zero that begins it, rad; empty when the thyristor stays off
     * @param index which of the solution's halves it belongs to
     */
    record Slot(boolean positive, OptionalDouble firingRad, int index) {}

    /**
     * The angle at which a pulse was made, from the load's zero that goes with the supply's half cycle: its firing angle
     * but for a pulse that was folded into a neighbouring half cycle of the load, so that it grows with R_E through the
     * load's zero.
     *
     * @param design whose winding may lag
     * @param solution the firing circuit's periodic state
     * @param pulse one of its pulses
     * @return rad; pi or more for a pulse that acts in the half cycle after its own
     */
    public static double madeRad(Design design, Solution solution, Pulse pulse) {
        return pulse.startRad() + Math.PI * folds(design, solution, pulse);
    }

    /** How often a pulse was folded back by a half cycle; the rough angle of its making tells. */
    private static long folds(Design design, Solution solution, Pulse pulse) {
        double roughRad = solution.condition().omega() * pulse.startSeconds()
                + design.clip().lagRad();
        return Math.round((roughRad - pulse.startRad()) / Math.PI);
    }

    /** Whether the thyristor is fired, in some half cycle, by a pulse made in the half cycle before: full power. */
    public static boolean spillOver(Design design, Solution solution) {
        boolean periods = solution.spansPeriods();
        return solution.halves().stream()
                .flatMap(half -> half.pulses().stream())
                .filter(Pulse::latches)
                .anyMatch(pulse ->
                        folds(design, solution, pulse) > 0 || (periods && madeRad(design, solution, pulse) >= Math.PI));
    }

    /**
     * Successive half cycles of the load, an even number of them where the solution has one or two halves. Of every
     * pulse that latches the thyristor in one, the earliest counts.
     */
    static List<Slot> slots(Solution solution) {
        return solution.spansPeriods() ? ofPeriods(solution) : ofHalves(solution);
    }

    private static List<Slot> ofHalves(Solution solution) {
        List<HalfCycle> halves = solution.halves();
        List<Slot> slots = new ArrayList<>();
        for (int index = 0; index < halves.size(); index++) {
            HalfCycle half = halves.get(index);
            OptionalDouble rad = half.pulses().stream()
                    .filter(Pulse::latches)
                    .mapToDouble(Pulse::startRad)
                    .min();
            slots.add(new Slot(half.positive(), rad, index));
            if (halves.size() == 1) {
                slots.add(new Slot(!half.positive(), rad, index));
            }
        }
        return slots;
    }

    /** Pulses of a whole period stand at 0 to 2 pi from the line's positive-going zero, a lag added. */
    private static List<Slot> ofPeriods(Solution solution) {
        List<HalfCycle> periods = solution.halves();
        double[] earliest = new double[2 * periods.size()];
        Arrays.fill(earliest, Double.POSITIVE_INFINITY);
        for (int index = 0; index < periods.size(); index++) {
            for (Pulse pulse : periods.get(index).pulses()) {
                if (pulse.latches()) {
                    int later = (int) Math.floor(pulse.startRad() / Math.PI);
                    int slot = Math.floorMod(2 * index + later, earliest.length);
                    earliest[slot] = Math.min(earliest[slot], pulse.startRad() - later * Math.PI);
                }
            }
        }
        List<Slot> slots = new ArrayList<>();
        for (int slot = 0; slot < earliest.length; slot++) {
            OptionalDouble rad =
                    Double.isInfinite(earliest[slot]) ? OptionalDouble.empty() : OptionalDouble.of(earliest[slot]);
            slots.add(new Slot(slot % 2 == 0, rad, slot / 2));
        }
        return slots;
    }
}
