package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import java.util.List;
import java.util.OptionalDouble;

/** Sums up the half cycles of a resistor's current, each by its closed forms, into what load and thyristor get. */
final class ResistorTotals {
    private final Direction positive = new Direction();
    private final Direction negative = new Direction();
    private final double[] halfSquare;
    private final int[] halfCount;
    private int slots;
    private OptionalDouble firedRad = OptionalDouble.empty();
    private OptionalDouble extinctionRad = OptionalDouble.empty();

    /** Half cycles of one polarity. */
    private static final class Direction {
        private double charge;
        private double square;
        private double peak;
        private double conduction;
        private int slots;

        void add(HalfCycleCurrent current) {
            charge += current.chargeAmpRad();
            square += current.squareAmpRad();
            peak = Math.max(peak, current.peakAmps());
            conduction += current.conductionRad();
            slots++;
        }

        CurrentSums.Polarity sums() {
            return new CurrentSums.Polarity(charge, square);
        }
    }

    /** @param halves how many of the solution's half cycles differ */
    ResistorTotals(int halves) {
        halfSquare = new double[halves];
        halfCount = new int[halves];
    }

    /** Adds the half cycle that follows those added before. */
    void add(ActingPulses.Slot slot, HalfCycleCurrent current) {
        (slot.positive() ? positive : negative).add(current);
        halfSquare[slot.index()] += current.squareAmpRad();
        halfCount[slot.index()]++;
        slots++;
        if (firedRad.isEmpty() && current.flows()) {
            firedRad = OptionalDouble.of(current.fromRad());
            extinctionRad = OptionalDouble.of(current.toRad());
        }
    }

    LoadResult result(Design design, Condition condition) {
        double ohms = design.load().resistanceOhms();
        CurrentSums sums = CurrentSums.ofLine(positive.sums(), negative.sums(), Math.max(positive.peak, negative.peak));
        LoadPeriod period = new LoadPeriod(slots * Math.PI, List.of(), firedRad, extinctionRad, 0, true, true);
        double rmsVolts = Math.sqrt(sums.squareAmpRad() / period.spanRad()) * ohms;
        return sums.result(
                design,
                condition,
                period,
                rmsVolts,
                conductionRad(design.stage().isFullWave()),
                CurrentSums.halfWatts(halfSquare, halfCount, ohms));
    }

    private double conductionRad(boolean fullWave) {
        double sum = positive.conduction + (fullWave ? negative.conduction : 0);
        int count = positive.slots + (fullWave ? negative.slots : 0);
        return count == 0 ? 0 : sum / count;
    }
}
