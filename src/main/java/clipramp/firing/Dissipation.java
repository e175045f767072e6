package clipramp.firing;

/**
 * What the firing circuit's parts bear in the periodic state; means are over whole periods of the line.
 *
 * @param dropperWatts mean of i_D squared times R_D, W
 * @param dropperPeakVolts largest voltage across the dropper, V
 * @param zenerWatts mean of V_S i_Z, W
 * @param zenerPeakAmps largest zener current, A
 * @param baseOneWatts R1, W
 * @param baseTwoWatts R2 (a programmable device: its upper resistor), W
 * @param lowerWatts a programmable device's lower resistor, W; 0 for a unijunction transistor
 * @param rampWatts R_E, W
 * @param deviceWatts trigger device, base bar and emitter together, W
 * @param emitterRmsAmps rms emitter current, A
 * @param emitterPeakAmps largest emitter current, A
 * @param emitterReverseVolts largest voltage of base two (a programmable device: of its gate node) above the emitter, V
 * @param interbaseVolts largest voltage of base two (or that gate node) above base one, V
 * @param capacitorVolts largest capacitor voltage, V to common
 * @param gateWatts mean power into the gate junction, W
 * @param gateSeriesWatts R_G, W
 * @param gateShuntWatts R_GK, W
 */
public record Dissipation(
        double dropperWatts,
        double dropperPeakVolts,
        double zenerWatts,
        double zenerPeakAmps,
        double baseOneWatts,
        double baseTwoWatts,
        double lowerWatts,
        double rampWatts,
        double deviceWatts,
        double emitterRmsAmps,
        double emitterPeakAmps,
        double emitterReverseVolts,
        double interbaseVolts,
        double capacitorVolts,
        double gateWatts,
        double gateSeriesWatts,
        double gateShuntWatts) {
    /**
     * The same with more on the supply's parts, as a shorted rectifier puts there.
     *
     * @param moreDropperWatts on top of the dropper's, W
     * @param otherDropperPeakVolts another peak across it, V
     * @param moreZenerWatts on top of the zener's, W
     */
    public Dissipation withMore(double moreDropperWatts, double otherDropperPeakVolts, double moreZenerWatts) {
        return new Dissipation(
                dropperWatts + moreDropperWatts,
                Math.max(dropperPeakVolts, otherDropperPeakVolts),
                zenerWatts + moreZenerWatts,
                zenerPeakAmps,
                baseOneWatts,
                baseTwoWatts,
                lowerWatts,
                rampWatts,
                deviceWatts,
                emitterRmsAmps,
                emitterPeakAmps,
                emitterReverseVolts,
                interbaseVolts,
                capacitorVolts,
                gateWatts,
                gateSeriesWatts,
                gateShuntWatts);
    }
}
