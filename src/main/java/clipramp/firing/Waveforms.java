package clipramp.firing;

/**
 * Sampled waveforms of one half cycle in the periodic state (a whole period for a half-wave supply or stage). Every
 * event is a sample; where a voltage jumps there are two samples of one instant. All arrays have one length; they are not
 * copied, and nobody writes into them.
 *
 * @param angleRad the load's line angle, rad, from the zero that begins the half cycle
 * @param seconds time since that zero, s
 * @param lineVolts line voltage, V, positive in the line's positive half
 * @param supplyVolts clipped supply V_S, V to common
 * @param rampVolts capacitor V_C, V to common
 * @param peakPointVolts V_P that the device would fire at, V to common
 * @param baseOneVolts base one V_B1, V to common
 * @param gateVolts gate to cathode or main terminal one, V
 * @param gateAmps gate junction current, A
 * @param emitterAmps emitter current, A
 * @param dropperAmps current through the dropping resistor, A
 * @param zenerAmps zener current, A
 */
@SuppressWarnings("ArrayRecordComponent") // shown, never compared
public record Waveforms(
        double[] angleRad,
        double[] seconds,
        double[] lineVolts,
        double[] supplyVolts,
        double[] rampVolts,
        double[] peakPointVolts,
        double[] baseOneVolts,
        double[] gateVolts,
        double[] gateAmps,
        double[] emitterAmps,
        double[] dropperAmps,
        double[] zenerAmps) {}
