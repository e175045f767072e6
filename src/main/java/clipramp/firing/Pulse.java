package clipramp.firing;

/**
 * One discharge of the ramp capacitor through the trigger device, from firing to the valley.
 *
 * @param startRad angle of the line (the load's, from the positive-going zero of its fundamental; folded by pi to the
 *     half cycle that the pulse acts in; 0..2 pi where the supply works over whole periods) at which it fires, rad
 * @param startSeconds the same instant as time since the zero of the supply's half cycle, s
 * @param endSeconds instant of the valley, s on the same clock; beyond the half cycle's length if it goes on over the line
 *     zero
 * @param supplyVolts clipped supply at the instant before firing, V to common
 * @param peakPointVolts emitter voltage at firing, V to common
 * @param afterStall whether the ramp was held at the peak point before it fired
 * @param endPulse whether it began after the zener's last conduction of the half cycle (or, if the zener never
 *     conducted, after the supply's crest)
 * @param peakGateAmps largest gate current, A
 * @param peakGateVolts largest gate-cathode voltage, V
 * @param peakGateWatts largest product of the two, W
 * @param peakBaseOneVolts largest base-one voltage, V to common
 * @param aboveTriggerSeconds longest time without a break for which the gate current is at or above the trigger
 *     current of one temperature, s
 * @param gateCoulombs charge into the gate junction, C
 * @param gateJoules energy into the gate junction, J
 * @param capacitorJoules energy that the ramp capacitor gave up, J
 * @param turnsOn whether the gate current lasts and the anode voltage is forward
 * @param anodeAmps anode current that there would be as the gate current falls under the trigger current, A
 * @param latches whether it turns the thyristor on and the anode current has reached the latching current by then
 */
public record Pulse(
        double startRad,
        double startSeconds,
        double endSeconds,
        double supplyVolts,
        double peakPointVolts,
        boolean afterStall,
        boolean endPulse,
        double peakGateAmps,
        double peakGateVolts,
        double peakGateWatts,
        double peakBaseOneVolts,
        double aboveTriggerSeconds,
        double gateCoulombs,
        double gateJoules,
        double capacitorJoules,
        boolean turnsOn,
        double anodeAmps,
        boolean latches) {
    /** The same pulse counted from another zero of the line. */
    Pulse withStartRad(double otherStartRad) {
        return new Pulse(
                otherStartRad,
                startSeconds,
                endSeconds,
                supplyVolts,
                peakPointVolts,
                afterStall,
                endPulse,
                peakGateAmps,
                peakGateVolts,
                peakGateWatts,
                peakBaseOneVolts,
                aboveTriggerSeconds,
                gateCoulombs,
                gateJoules,
                capacitorJoules,
                turnsOn,
                anodeAmps,
                latches);
    }
}
