package clipramp.engine;

/**
 * The firing circuit as numbers at one condition. A mutable kitchen vessel: whoever draws a million units fills the
 * same instance again and calls {@link #derive()}; everybody else gets one from {@link NetworkOfDesign}.
 *
 * <p>SI units throughout; laws and letters are those of DEVELOPERS.md, The circuit laws. The device is described generally
 * enough for both trigger devices: off, it loads the supply with {@code standingSiemens} and fires at kappa V_S + V_D; on,
 * its emitter carries (V_C - V_B1 - onDrop - xi V_S)/r_on, and base two carries g2 (V_S - V_B1 - gateDrop), of which
 * lowerSiemens (V_B1 + gateDrop) is lost to a programmable device's lower resistor.
 */
public final class Network {
    /** Drop of a programmable device's gate-cathode junction while it conducts, V. */
    static final double PROGRAMMABLE_DROP_VOLTS = 0.6;

    /** R_D, ohm. */
    public double dropperOhms;
    /** V_Z0 = V_Z - r_z I_ZT, V. */
    public double zenerKneeVolts;
    /** r_z, ohm. */
    public double zenerSlopeOhms;
    /** R_E, ohm. */
    public double rampOhms;
    /** C_E, F. */
    public double capacitorFarads;
    /** R1, ohm. */
    public double baseOneOhms;
    /** R2, ohm. */
    public double baseTwoOhms;
    /** R_BB at the condition's temperature, ohm. */
    public double interbaseOhms;
    /** eta. */
    public double standoff;
    /** V_D at the condition's temperature, V. */
    public double emitterDropVolts;
    /** I_P, A. */
    public double peakCurrentAmps;
    /** r_on, ohm. */
    double onOhms;
    /** xi: intercept of the saturated emitter line per volt of supply. */
    double onIntercept;
    /** iota: valley current per volt of supply, A/V. */
    public double valleySiemens;
    /** R_B2on, ohm. */
    double modulatedOhms;
    /** Whether the trigger device is a programmable unijunction transistor, with a divider in place of R2 and bar. */
    public boolean programmable;
    /** R_A, upper divider resistor of a programmable device, ohm. */
    public double upperOhms;
    /** R_B, lower divider resistor of a programmable device, ohm. */
    public double lowerOhms;
    /** Whether a pulse transformer stands between base one and the gate. */
    boolean transformerCoupled;
    /** L_m at the primary, H. */
    double magnetisingHenries;
    /** Primary over secondary turns. */
    public double turnsRatio;
    /** Secondaries that carry a gate each. */
    int secondaries;
    /** Primary winding resistance, ohm. */
    double primaryOhms;
    /** Resistance of one secondary, ohm. */
    double secondaryOhms;
    /** Drop of the diode across the primary, V; POSITIVE_INFINITY for none. */
    double clampVolts = Double.POSITIVE_INFINITY;
    /** R_G, ohm. */
    public double gateSeriesOhms;
    /** 1/R_GK, S; 0 for none. */
    public double gateShuntSiemens;
    /** V_G0, V. */
    public double gateKneeVolts;
    /** r_G, ohm. */
    public double gateSlopeOhms;
    /** I_GT at the condition's temperature, A. */
    public double triggerAmps;
    /** t_gt, s. */
    public double turnOnSeconds;
    /** I_L at the condition's temperature with this gate network, A; 0 where unknown. */
    public double latchingAmps;

    /**
     * A shorted rectifier diode feeds the supply in the other half cycle too, backwards: the zener conducts forwards and
     * holds it at minus this, V; 0 for a rectifier that blocks. Only for a supply that works over whole periods.
     */
    public double reverseVolts;

    /** kappa: peak point per volt of supply. */
    double peakShare;
    /** What base bar or divider draws from the supply with the device off, S. */
    double standingSiemens;
    /** Base-one voltage per volt of supply with the device off. */
    double quiescentShare;
    /** g2, S. */
    double baseTwoOnSiemens;
    /** Drop between emitter and base one with the device on, V. */
    double onDropVolts;
    /** Drop between gate node and cathode of a programmable device with it on, V; 0 for a unijunction transistor. */
    double gateDropVolts;
    /** 1/R_B of a programmable device, S; 0 for a unijunction transistor. */
    double lowerSiemens;
    /** R2 and base bar in series with the device off, S; 0 for a programmable device. */
    double barSiemens;
    /** Standoff point's share of the voltage across R2 and base bar. */
    double standoffShare;
    /** A programmable device's divider, S; 0 for a unijunction transistor. */
    double dividerSiemens;
    /** One gate network behind its winding with the junction off, S. */
    double gateOffSiemens;
    /** The same with the junction on, S. */
    double gateOnSiemens;
    /** Open-circuit voltage of one gate network with the junction on, V. */
    double gateOnVolts;

    /** Works out all that the laws need beside these fields; to be called after the last of them was changed. */
    public void derive() {
        deriveGate();
        if (programmable) {
            deriveDivider();
        } else {
            deriveBar();
        }
    }

    private void deriveGate() {
        double leadOhms = gateSeriesOhms + secondaryOhms;
        gateOffSiemens = gateShuntSiemens == 0 ? 0 : 1 / (leadOhms + 1 / gateShuntSiemens);
        double junctionSiemens = gateShuntSiemens + 1 / gateSlopeOhms;
        gateOnVolts = gateKneeVolts / gateSlopeOhms / junctionSiemens;
        gateOnSiemens = 1 / (leadOhms + 1 / junctionSiemens);
    }

    private void deriveBar() {
        // R1p: R1 parallel to the gate network with its junction off, or to the primary winding's resistance.
        double baseOneParallel = transformerCoupled
                ? baseOneOhms * primaryOhms / (baseOneOhms + primaryOhms)
                : 1 / (1 / baseOneOhms + gateOffSiemens);
        double bar = baseTwoOhms + interbaseOhms + baseOneParallel;
        peakShare = (baseOneParallel + standoff * interbaseOhms) / bar;
        standingSiemens = 1 / bar;
        barSiemens = 1 / (baseTwoOhms + interbaseOhms);
        standoffShare = standoff * interbaseOhms * barSiemens;
        dividerSiemens = 0;
        quiescentShare = baseOneParallel / bar;
        baseTwoOnSiemens = 1 / (baseTwoOhms + modulatedOhms);
        onDropVolts = emitterDropVolts;
        gateDropVolts = 0;
        lowerSiemens = 0;
    }

    /** The divider sets the peak point; with the device on, its gate node stays one junction drop above the cathode. */
    private void deriveDivider() {
        peakShare = lowerOhms / (upperOhms + lowerOhms);
        standingSiemens = 1 / (upperOhms + lowerOhms);
        barSiemens = 0;
        standoffShare = 0;
        dividerSiemens = standingSiemens;
        quiescentShare = 0;
        baseTwoOnSiemens = 1 / upperOhms;
        onDropVolts = PROGRAMMABLE_DROP_VOLTS;
        gateDropVolts = PROGRAMMABLE_DROP_VOLTS;
        lowerSiemens = 1 / lowerOhms;
    }

    /** kappa: peak-point voltage per volt of supply. */
    public double peakShare() {
        return peakShare;
    }

    /**
     * Ramp voltage after some time of a supply that stands backwards, at minus {@link #reverseVolts}: what lies over the
     * peak point of that supply runs out through the emitter at once, the rest follows through R_E (DEVELOPERS.md, Single
     * faults).
     *
     * @param rampVolts at its beginning, V above the firing common
     * @param seconds how long it has stood so, s, 0 or more
     * @return V above the firing common
     */
    public double rampUnderReverse(double rampVolts, double seconds) {
        double from = Math.min(rampVolts, emitterDropVolts - peakShare * reverseVolts);
        return (from + reverseVolts) * Math.exp(-seconds / (rampOhms * capacitorFarads)) - reverseVolts;
    }

    /** Gate voltage per volt of supply with the device off and the gate junction blocking, with direct coupling. */
    public double standingGateShare() {
        return quiescentShare * (1 - gateSeriesOhms * gateOffSiemens);
    }

    /** What base bar or divider draws from the supply with the device off, S. */
    public double standingSiemens() {
        return standingSiemens;
    }

    /** Base-one voltage per volt of supply with the device off. */
    public double quiescentShare() {
        return quiescentShare;
    }
}
