package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.engine.LineWave;
import clipramp.firing.Solution;
import clipramp.gate.LatchingNeed;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;

/**
 * When the gate is driven, over whole periods of the line.
 *
 * @param slots the half cycles of the load, each with the angle at which a current that starts from nothing is fired
 * @param windows every stretch of gate drive, for a current that may still flow
 * @param halves how many of the solution's half cycles differ
 * @param latchingAmps I_L, A; 0 where it is unknown or does not matter
 * @param turnOnRad t_gt as an angle, rad
 */
record Firings(
        List<ActingPulses.Slot> slots, List<GateWindow> windows, int halves, double latchingAmps, double turnOnRad) {

    /** When the pulses of a solution drive the gate. */
    static Firings of(Design design, Condition condition, Solution solution) {
        double turnOn = design.thyristor().device().gate().turnOnSeconds().orElse(0);
        return new Firings(
                ActingPulses.slots(solution),
                GateWindow.of(solution),
                solution.halves().size(),
                LatchingNeed.latchingAmps(design, condition.celsius()).orElse(0),
                turnOn * condition.omega());
    }

    /** A gate driven in every half cycle from one angle, rad, to its end. */
    static Firings heldFrom(Design design, Condition condition, double firingRad) {
        OptionalDouble rad = OptionalDouble.of(firingRad);
        return new Firings(
                List.of(new ActingPulses.Slot(true, rad, 0), new ActingPulses.Slot(false, rad, 0)),
                GateWindow.heldFrom(
                        firingRad,
                        new LineWave(design.line(), condition),
                        design.stage().isFullWave()),
                1,
                0,
                0);
    }

    /** The same with every negative half cycle carried from its beginning to its end, whatever the gate does. */
    Firings withNegativeHalvesFree(LineWave line) {
        List<ActingPulses.Slot> freed = new ArrayList<>();
        List<GateWindow> driven = new ArrayList<>();
        windows.stream().filter(window -> window.half() % 2 == 0).forEach(driven::add);
        for (int half = 0; half < slots.size(); half++) {
            ActingPulses.Slot slot = slots.get(half);
            freed.add(slot.positive() ? slot : new ActingPulses.Slot(false, OptionalDouble.of(0), slot.index()));
            if (!slot.positive()) {
                double period = (half - 1) * Math.PI;
                driven.add(new GateWindow(
                        line.negativeStartRad() + period, line.positiveStartRad() + 2 * Math.PI + period, half));
            }
        }
        driven.sort(Comparator.comparingDouble(GateWindow::fromRad));
        return new Firings(freed, driven, halves, latchingAmps, turnOnRad);
    }

    /** Angle of whole periods that the slots cover, rad: an odd number of half cycles goes round twice. */
    double spanRad() {
        return slots.size() * Math.PI;
    }
}
