package clipramp.firing;

import clipramp.circuit.Condition;
import java.util.ArrayList;
import java.util.List;

/**
 * The periodic state of the firing circuit at one ramp resistance and condition.
 *
 * @param condition line and temperature
 * @param rampOhms R_E, ohm
 * @param settling whether and how it repeats
 * @param halves every half cycle that differs, at least one: one where all are alike; two (positive half first, or the
 *     two that alternate) otherwise; more only when it hunts without settling
 */
public record Solution(Condition condition, double rampOhms, Settling settling, List<HalfCycle> halves) {
    /** How successive half cycles follow each other. */
    public enum Settling {
        /** Every line period is like the one before. */
        STEADY,
        /** Only every second half cycle repeats although supply and load treat both alike: the load gets dc. */
        HUNTS,
        /** Not even that; the halves are the last ones computed. */
        NEVER
    }

    /** @throws IllegalArgumentException without a half cycle */
    public Solution {
        halves = List.copyOf(halves);
        if (halves.isEmpty()) {
            throw new IllegalArgumentException("a solution has at least one half cycle");
        }
    }

    /** The same, with every pulse gone that came while the line was negative: what a load feels that gets one half only. */
    public Solution firingOnlyPositive() {
        List<HalfCycle> kept = new ArrayList<>();
        boolean periods = spansPeriods();
        for (HalfCycle half : halves) {
            boolean negative = !periods && !half.positive();
            kept.add(half.withPulses(
                    negative
                            ? List.of()
                            : half.pulses().stream()
                                    .filter(pulse -> !periods || pulse.startRad() < Math.PI)
                                    .toList()));
        }
        if (!periods && kept.size() == 1) {
            kept.add(halves.get(0).inOtherHalf().withPulses(List.of()));
        }
        return new Solution(condition, rampOhms, settling, kept);
    }

    /** Whether each of its halves spans a whole period of the line, as a single-diode supply's does. */
    public boolean spansPeriods() {
        return halves.get(0).seconds() > 1.5 * condition.halfCycleSeconds();
    }

    /** Whether half cycles differ that line and load treat alike, be it by turns or without end. */
    public boolean hunts() {
        return settling != Settling.STEADY;
    }

    /** The half cycle that a single row shows: the positive one. */
    public HalfCycle shown() {
        return halves.stream().filter(HalfCycle::positive).findFirst().orElse(halves.get(0));
    }

    /** What the ramp resistance comes to in one word, the positive half cycle speaking for all. */
    public FiringState state() {
        HalfCycle half = shown();
        if (half.pulses().isEmpty()) {
            return FiringState.SILENT;
        }
        if (hunts()) {
            return FiringState.HUNTS;
        }
        if (half.stalled()) {
            return FiringState.STALLS;
        }
        if (half.latchedOn()) {
            return FiringState.LATCHED_ON;
        }
        return half.endPulse().isPresent() ? FiringState.END_PULSE : FiringState.FIRES;
    }
}
