package clipramp.firing;

import java.util.OptionalDouble;

/**
 * The closed forms that books give for a unijunction relaxation oscillator: start values for sizing, figures to quote
 * beside the solved ones, and nothing more. The solved half cycle replaces every one of them, for they leave out the
 * clipped supply's flanks, the base bar's load, the discharge and what is left on the capacitor.
 *
 * <p>Three forms of the period are in print and differ by up to a fifth; {@link #textbookPeriodSeconds},
 * {@link #freeRunningPeriodSeconds} and {@link #resetRampSeconds} each say what they assume. Voltages are to the firing
 * common, the supply is taken as constant. All are as good as their assumptions: some per cent in a free-running
 * circuit, worse at the ends of a synchronised one.
 */
public final class PublishedRelations {
    private PublishedRelations() {}

    /**
     * Peak-point voltage eta V + V_D (Mehta, Principles of Electronics, 21.8; Rashid, Power Electronics 4e, example
     * 9.5). Leaves out the resistors at the bases.
     *
     * @param standoff intrinsic standoff ratio, 0..1
     * @param supplyVolts interbase supply, V
     * @param emitterDropVolts V_D, V
     * @return V
     */
    public static double peakPointVolts(double standoff, double supplyVolts, double emitterDropVolts) {
        return standoff * supplyVolts + emitterDropVolts;
    }

    /**
     * RC ln(1/(1 - eta)): the ramp starts at 0 V, and V_D is left out (Rashid 9.5; Gupta and Singhal, Power Electronics,
     * 2.29; Mehta 21.11).
     *
     * @param rampOhms R_E, ohm
     * @param rampFarads C_E, F
     * @param standoff eta, 0..1, or a programmable device's divider ratio
     * @return s
     */
    public static double textbookPeriodSeconds(double rampOhms, double rampFarads, double standoff) {
        return rampOhms * rampFarads * Math.log(1 / (1 - standoff));
    }

    /**
     * RC ln((V - V_V)/(V - V_P)): every ramp starts where the discharge ended (Bell, Electronic Devices and Circuits,
     * 18.6, with the saturation voltage in place of the valley's).
     *
     * @param rampOhms R_E, ohm
     * @param rampFarads C_E, F
     * @param supplyVolts V, V
     * @param startVolts V_V, voltage at which the discharge ends, V
     * @param peakPointVolts V_P, V, below the supply
     * @return s
     */
    public static double freeRunningPeriodSeconds(
            double rampOhms, double rampFarads, double supplyVolts, double startVolts, double peakPointVolts) {
        return rampOhms * rampFarads * Math.log((supplyVolts - startVolts) / (supplyVolts - peakPointVolts));
    }

    /**
     * RC ln(V/(V - eta V - V_D)): the first ramp of a half cycle that starts at 0 V, V_D taken in. The synchronised ramp
     * starts nearer V_D than 0 V and waits for the clipped supply: two errors that partly cancel.
     *
     * @param rampOhms R_E, ohm
     * @param rampFarads C_E, F
     * @param supplyVolts V, V
     * @param standoff eta, 0..1
     * @param emitterDropVolts V_D, V
     * @return s
     */
    public static double resetRampSeconds(
            double rampOhms, double rampFarads, double supplyVolts, double standoff, double emitterDropVolts) {
        double peakPoint = peakPointVolts(standoff, supplyVolts, emitterDropVolts);
        return freeRunningPeriodSeconds(rampOhms, rampFarads, supplyVolts, 0, peakPoint);
    }

    /**
     * Largest R_E that still feeds the peak-point current: (V - V_P)/I_P (Rashid 9.5; Gupta and Singhal 2.29, 2.31).
     *
     * @param supplyVolts V, V
     * @param peakPointVolts V_P, V
     * @param peakCurrentAmps I_P, A
     * @return ohm
     */
    public static double largestRampOhms(double supplyVolts, double peakPointVolts, double peakCurrentAmps) {
        return (supplyVolts - peakPointVolts) / peakCurrentAmps;
    }

    /**
     * Smallest R_E that lets the device turn off at the valley: (V - V_V)/I_V (Rashid 9.5; Gupta and Singhal 2.31).
     *
     * @param supplyVolts V, V
     * @param valleyVolts V_V, V
     * @param valleyAmps I_V, A
     * @return ohm
     */
    public static double smallestRampOhms(double supplyVolts, double valleyVolts, double valleyAmps) {
        return (supplyVolts - valleyVolts) / valleyAmps;
    }

    /**
     * Largest base-one resistor whose quiescent voltage stays under the gate's non-trigger voltage: R1/(R1 + R_BB + R2)
     * times V equal to V_GD. Books print the form that neglects V_GD beside V (Gupta and Singhal 2.31); this is exact
     * for a base bar without a gate network across R1.
     *
     * @param nonTriggerVolts V_GD, V, below the supply
     * @param supplyVolts V, V
     * @param interbaseOhms R_BB, ohm
     * @param baseTwoOhms R2, ohm
     * @return ohm
     */
    public static double largestBaseOneOhms(
            double nonTriggerVolts, double supplyVolts, double interbaseOhms, double baseTwoOhms) {
        return nonTriggerVolts * (interbaseOhms + baseTwoOhms) / (supplyVolts - nonTriggerVolts);
    }

    /** Which printed coefficient a rule for the base-two resistor uses; they disagree by a factor of three. */
    public enum BaseTwoRule {
        /** 10 000/(eta V), the interbase resistance taken as fixed (Rashid 9.5; Gupta and Singhal 2.31). */
        TEN_THOUSAND,
        /** 0.70 R_BB/(eta V) + (1 - eta) R1/eta: a small drift of R_BB. */
        SEVEN_TENTHS,
        /** 0.40 R_BB/(eta V) + (1 - eta) R1/eta: a large drift of R_BB. */
        FOUR_TENTHS
    }

    /**
     * Base-two resistor against temperature drift by one of the printed rules; {@link #driftFreeBaseTwoOhms} is the
     * condition that they approximate.
     *
     * @param rule which one
     * @param standoff eta, 0..1
     * @param supplyVolts V, V
     * @param interbaseOhms R_BB, ohm; not used by the first rule
     * @param baseOneOhms R1, ohm; not used by the first rule
     * @return ohm
     */
    public static double baseTwoOhms(
            BaseTwoRule rule, double standoff, double supplyVolts, double interbaseOhms, double baseOneOhms) {
        double baseOneShare = (1 - standoff) * baseOneOhms / standoff;
        return switch (rule) {
            case TEN_THOUSAND -> 10_000 / (standoff * supplyVolts);
            case SEVEN_TENTHS -> 0.70 * interbaseOhms / (standoff * supplyVolts) + baseOneShare;
            case FOUR_TENTHS -> 0.40 * interbaseOhms / (standoff * supplyVolts) + baseOneShare;
        };
    }

    /**
     * Base-two resistor for which the peak-point voltage does not move with temperature: dV_P/dT = 0 of V_P = V (R1 +
     * eta R_BB)/(R2 + R_BB + R1) + V_D (DEVELOPERS.md, Peak point), exactly, by its quadratic's smaller root.
     *
     * @param standoff eta, 0..1
     * @param supplyVolts V, V
     * @param interbaseOhms R_BB, ohm
     * @param interbaseDriftPerKelvin relative drift of R_BB, 1/K, above zero
     * @param emitterDriftVoltsPerKelvin drift of V_D, V/K, below zero
     * @param baseOneOhms R1 with the gate network across it, ohm
     * @return ohm; empty where no resistor does it (supply too low for that drift of V_D)
     */
    public static OptionalDouble driftFreeBaseTwoOhms(
            double standoff,
            double supplyVolts,
            double interbaseOhms,
            double interbaseDriftPerKelvin,
            double emitterDriftVoltsPerKelvin,
            double baseOneOhms) {
        // eta R2 - (1 - eta) R1 = a (R2 + B)^2
        double a = -emitterDriftVoltsPerKelvin / (interbaseDriftPerKelvin * interbaseOhms * supplyVolts);
        double b = interbaseOhms + baseOneOhms;
        double linear = standoff - 2 * a * b;
        double constant = a * b * b + (1 - standoff) * baseOneOhms;
        double discriminant = linear * linear - 4 * a * constant;
        if (!(a >= 0) || linear <= 0 || discriminant < 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(2 * constant / (linear + Math.sqrt(discriminant)));
    }
}
