package clipramp.power;

import clipramp.engine.LineWave;
import clipramp.firing.HalfCycle;
import clipramp.firing.Pulse;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * A stretch of the line's angle over which the gate gets at least the trigger current.
 *
 * @param fromRad begin, rad from the positive-going zero of the first period
 * @param toRad end, rad
 * @param half running number of the load's half cycle that it acts in
 */
record GateWindow(double fromRad, double toRad, int half) {
    /** The same so many radians and half cycles later. */
    GateWindow shifted(double rad, int halves) {
        return new GateWindow(fromRad + rad, toRad + rad, half + halves);
    }

    /** Every pulse of a solution that reaches the trigger current, over the half cycles of {@link ActingPulses}. */
    static List<GateWindow> of(Solution solution) {
        List<GateWindow> windows = new ArrayList<>();
        List<HalfCycle> halves = solution.halves();
        boolean periods = solution.spansPeriods();
        for (int index = 0; index < halves.size(); index++) {
            for (Pulse pulse : halves.get(index).pulses()) {
                double start = pulse.startRad() + (periods ? 2 : 1) * index * Math.PI;
                double length =
                        pulse.aboveTriggerSeconds() * solution.condition().omega();
                if (length > 0) {
                    windows.add(new GateWindow(start, start + length, half(start, index, periods)));
                    if (!periods && halves.size() == 1) {
                        windows.add(new GateWindow(start + Math.PI, start + Math.PI + length, 1));
                    }
                }
            }
        }
        windows.sort(Comparator.comparingDouble(GateWindow::fromRad));
        return windows;
    }

    // A pulse of a whole period belongs to the half cycle that it falls in; others were handed to theirs already.
    private static int half(double startRad, int index, boolean periods) {
        return periods ? (int) Math.floor(startRad / Math.PI) : index;
    }

    /**
     * A gate driven in every half cycle of the line from one angle, rad, to that half cycle's end: what an angle is worth,
     * whatever makes it.
     *
     * @param fullWave whether both half cycles are used
     */
    static List<GateWindow> heldFrom(double firingRad, LineWave line, boolean fullWave) {
        double rises = line.positiveStartRad();
        double falls = line.negativeStartRad();
        GateWindow first = new GateWindow(Math.max(firingRad, rises), falls, 0);
        if (!fullWave) {
            return List.of(first);
        }
        return List.of(first, new GateWindow(Math.max(firingRad + Math.PI, falls), rises + 2 * Math.PI, 1));
    }
}
