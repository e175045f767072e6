package clipramp.firing;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A half cycle as run, its pulses still on the supply's clock.
 *
 * @param half running number
 * @param startVolts ramp voltage at the line zero that begins it, V to common
 * @param endVolts ramp voltage at the line zero that ends it, V
 * @param clipFromSeconds time from which the zener conducts, s; POSITIVE_INFINITY for never
 * @param collapseSeconds time of the zener's last stop, or of the supply's crest if it never conducts, s
 * @param stalled whether the ramp was held
 * @param latchedOn whether the device stayed on
 * @param pulses the pulses that began in it
 */
record HalfCycleDraft(
        int half,
        double startVolts,
        double endVolts,
        double clipFromSeconds,
        double collapseSeconds,
        boolean stalled,
        boolean latchedOn,
        List<PulseMeter> pulses) {

    HalfCycle finished(FiringCase firing) {
        SupplyTiming timing = firing.timing();
        double fold = timing.isPositive(half) || timing.isWholePeriods() ? 0 : Math.PI;
        List<Pulse> done = pulses.stream()
                .map(p -> p.pulse(
                        firing, firing.lineRad(half, p.startSeconds()) - fold, p.startSeconds() > collapseSeconds))
                .toList();
        OptionalDouble clipRad = clipFromSeconds < Double.POSITIVE_INFINITY
                ? OptionalDouble.of(firing.lineRad(half, clipFromSeconds) - fold)
                : OptionalDouble.empty();
        return new HalfCycle(
                timing.isPositive(half),
                timing.wave(half).seconds(),
                startVolts,
                endVolts,
                clipRad,
                firing.lineRad(half, collapseSeconds) - fold,
                stalled,
                latchedOn,
                done,
                HalfCycle.firingIndexOf(done));
    }
}
