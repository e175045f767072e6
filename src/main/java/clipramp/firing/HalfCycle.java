package clipramp.firing;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One solved half cycle of the firing circuit (a whole period for a half-wave supply).
 *
 * @param positive whether it is the half cycle in which the line's fundamental is positive
 * @param seconds its length, s
 * @param startVolts residual voltage: ramp capacitor at the line zero that begins it, V to common
 * @param endVolts ramp capacitor at the line zero that ends it, V to common
 * @param clipFromRad angle, counted as {@link Pulse#startRad} is, from which the zener conducts, rad; empty if it never
 *     does
 * @param collapseRad angle, counted alike, at which the supply collapses: the zener's last stop, or the supply's crest if
 *     it never conducts, rad
 * @param stalled whether the first pulse came out of a stall (the ramp held at the peak point for want of peak-point
 *     current), or none came of one
 * @param latchedOn whether the trigger device stayed on after a pulse until the supply collapsed
 * @param pulses every pulse that began in it, in order
 * @param firingIndex index of the first pulse that turns the thyristor on and latches it; -1 for none
 */
public record HalfCycle(
        boolean positive,
        double seconds,
        double startVolts,
        double endVolts,
        OptionalDouble clipFromRad,
        double collapseRad,
        boolean stalled,
        boolean latchedOn,
        List<Pulse> pulses,
        int firingIndex) {
    /** Keeps a copy of the pulses. */
    public HalfCycle {
        pulses = List.copyOf(pulses);
    }

    /** The pulse that fires the thyristor, if one does. */
    public Optional<Pulse> firingPulse() {
        return firingIndex < 0 ? Optional.empty() : Optional.of(pulses.get(firingIndex));
    }

    /** The firing pulse; else the first pulse of all; else empty. */
    public Optional<Pulse> shownPulse() {
        return firingPulse().or(() -> pulses.stream().findFirst());
    }

    /** The shown pulse, if it comes of the supply's collapse only. */
    public Optional<Pulse> endPulse() {
        return shownPulse().filter(Pulse::endPulse);
    }

    /** Firing angle, counted as {@link Pulse#startRad} is, rad; empty when the thyristor stays off. */
    public OptionalDouble firingRad() {
        return firingPulse().stream().mapToDouble(Pulse::startRad).findFirst();
    }

    /** Index of the first pulse that turns the thyristor on and latches it; -1 for none. */
    static int firingIndexOf(List<Pulse> pulses) {
        for (int i = 0; i < pulses.size(); i++) {
            if (pulses.get(i).latches()) {
                return i;
            }
        }
        return -1;
    }

    /** The same in a half cycle of the other sign. */
    HalfCycle inOtherHalf() {
        return new HalfCycle(
                !positive,
                seconds,
                startVolts,
                endVolts,
                clipFromRad,
                collapseRad,
                stalled,
                latchedOn,
                pulses,
                firingIndex);
    }

    /** The same half cycle with other pulses. */
    HalfCycle withPulses(List<Pulse> others) {
        return new HalfCycle(
                positive,
                seconds,
                startVolts,
                endVolts,
                clipFromRad,
                collapseRad,
                stalled,
                latchedOn,
                others,
                firingIndexOf(others));
    }
}
