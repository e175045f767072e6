package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice.OnState;
import clipramp.firing.Solution;
import java.util.ArrayList;
import java.util.List;

/** What a load gets from the firing angles of a solution (model.md section 8). */
public final class LoadPower {
    private LoadPower() {}

    /**
     * Power, currents and on-state loss over whole periods of the line.
     *
     * @param design stage, load and thyristor
     * @param condition line
     * @param solution the firing circuit's periodic state there
     * @throws UnsupportedLoadException for a load that is not a resistor
     */
    public static LoadResult of(Design design, Condition condition, Solution solution) {
        return of(design, condition, solution.halves().size(), ActingPulses.slots(solution));
    }

    /** The same with every half cycle fired at one angle, rad: what a firing angle is worth, whatever makes it. */
    public static LoadResult atFiringAngle(Design design, Condition condition, double firingRad) {
        java.util.OptionalDouble rad = java.util.OptionalDouble.of(firingRad);
        return of(
                design,
                condition,
                1,
                List.of(new ActingPulses.Slot(true, rad, 0), new ActingPulses.Slot(false, rad, 0)));
    }

    /** Power of the same load with the thyristor always on, without drops, W: what fractions are shares of. */
    public static double fullWatts(Design design, Condition condition) {
        double rms = condition.lineVolts() * design.line().rmsFactor();
        return rms * rms / design.load().resistanceOhms();
    }

    private static LoadResult of(Design design, Condition condition, int halfCount, List<ActingPulses.Slot> slots) {
        if (!(design.load() instanceof Load.Resistor resistor)) {
            throw new UnsupportedLoadException(design.load());
        }
        ResistorCurrent path = new ResistorCurrent(design, condition);
        List<HalfCycleCurrent> currents = new ArrayList<>();
        for (ActingPulses.Slot slot : slots) {
            boolean blocked = design.stage() == Stage.HALF_WAVE && !slot.positive();
            currents.add(
                    slot.firingRad().isEmpty() || blocked
                            ? HalfCycleCurrent.NONE
                            : path.firedAt(slot.positive(), slot.firingRad().getAsDouble()));
        }
        return summed(design, condition, resistor, halfCount, slots, currents);
    }

    private static LoadResult summed(
            Design design,
            Condition condition,
            Load.Resistor load,
            int halfCount,
            List<ActingPulses.Slot> slots,
            List<HalfCycleCurrent> currents) {
        double ohms = load.resistanceOhms();
        double span = slots.size() * Math.PI;
        Means forward = new Means();
        Means backward = new Means();
        double[] halfSquare = new double[halfCount];
        int[] halfSlots = new int[halfCount];
        double conduction = 0;
        int conducting = 0;
        for (int i = 0; i < slots.size(); i++) {
            ActingPulses.Slot slot = slots.get(i);
            HalfCycleCurrent current = currents.get(i);
            (slot.positive() ? forward : backward).add(current);
            halfSquare[slot.index()] += current.squareAmpRad();
            halfSlots[slot.index()]++;
            if (design.stage().isFullWave() || slot.positive()) {
                conduction += current.conductionRad();
                conducting++;
            }
        }
        double meanSquare = (forward.square + backward.square) / span;
        double rms = Math.sqrt(meanSquare);
        double mean = (forward.charge + backward.charge) / span;
        double peak = Math.max(forward.peak, backward.peak);
        List<Double> halfWatts = new ArrayList<>();
        for (int half = 0; half < halfCount; half++) {
            halfWatts.add(halfSquare[half] / (halfSlots[half] * Math.PI) * ohms);
        }
        Means one = worseThyristor(design, forward, backward);
        OnState onState = design.thyristor().device().onState();
        double oneMean = one.charge / span;
        double oneRms = Math.sqrt(one.square / span);
        double watts = meanSquare * ohms;
        double lineRms = condition.lineVolts() * design.line().rmsFactor();
        return new LoadResult(
                watts,
                watts / fullWatts(design, condition),
                rms * ohms,
                rms,
                mean,
                peak,
                (forward.charge - backward.charge) / span,
                rms > 0 ? rms / mean : Double.NaN,
                rms > 0 ? peak / rms : Double.NaN,
                rms > 0 ? watts / (lineRms * rms) : Double.NaN,
                conducting == 0 ? 0 : conduction / conducting,
                oneMean,
                oneRms,
                onState.thresholdVolts() * oneMean + onState.slopeOhms() * oneRms * oneRms,
                halfWatts);
    }

    /** The thyristor that carries more: one carries everything but where two stand in inverse parallel. */
    private static Means worseThyristor(Design design, Means forward, Means backward) {
        if (design.stage() == Stage.INVERSE_PARALLEL) {
            return forward.square >= backward.square ? forward : backward;
        }
        Means both = new Means();
        both.charge = forward.charge + backward.charge;
        both.square = forward.square + backward.square;
        both.peak = Math.max(forward.peak, backward.peak);
        return both;
    }

    /** Sums over the half cycles of one polarity. */
    private static final class Means {
        private double charge;
        private double square;
        private double peak;

        void add(HalfCycleCurrent current) {
            charge += current.chargeAmpRad();
            square += current.squareAmpRad();
            peak = Math.max(peak, current.peakAmps());
        }
    }
}
