package clipramp.firing;

import clipramp.engine.LineWave;
import java.util.ArrayList;
import java.util.List;

/**
 * Hands each pulse to the half cycle of the load that it acts in. Supply and load halves are the same unless the
 * synchronising winding lags: then a late pulse falls behind the load's zero and starts the next half cycle.
 */
final class LoadHalves {
    private LoadHalves() {}

    static List<HalfCycle> fromSupplyHalves(FiringCase firing, List<HalfCycle> halves) {
        double lag = firing.design().clip().lagRad();
        if (lag == 0 || firing.timing().isWholePeriods()) {
            return halves;
        }
        return sortedByLoad(firing.line(), halves);
    }

    private static List<HalfCycle> sortedByLoad(LineWave line, List<HalfCycle> halves) {
        int count = halves.size();
        List<List<Pulse>> early = lists(count);
        List<List<Pulse>> own = lists(count);
        List<List<Pulse>> late = lists(count);
        for (int i = 0; i < count; i++) {
            HalfCycle half = halves.get(i);
            double start = half.positive() ? line.positiveStartRad() : line.negativeStartRad() - Math.PI;
            double end = half.positive() ? line.negativeStartRad() : line.positiveStartRad() + Math.PI;
            for (Pulse pulse : half.pulses()) {
                if (pulse.startRad() >= end) {
                    early.get((i + 1) % count).add(moved(pulse, -Math.PI));
                } else if (pulse.startRad() < start) {
                    late.get((i + count - 1) % count).add(moved(pulse, Math.PI));
                } else {
                    own.get(i).add(pulse);
                }
            }
        }
        List<HalfCycle> result = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            List<Pulse> pulses = new ArrayList<>(early.get(i));
            pulses.addAll(own.get(i));
            pulses.addAll(late.get(i));
            result.add(halves.get(i).withPulses(pulses));
        }
        return result;
    }

    private static List<List<Pulse>> lists(int count) {
        List<List<Pulse>> lists = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            lists.add(new ArrayList<>());
        }
        return lists;
    }

    private static Pulse moved(Pulse pulse, double byRad) {
        return pulse.withStartRad(pulse.startRad() + byRad);
    }
}
