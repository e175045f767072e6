package clipramp.engine;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.TemperatureCurve;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.TriggerDemand;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/** What a design fixes of gate drive and thyristor, ready to be put into a network. */
final class GateSide {
    /** Drop of a conducting SCR's own gate junction, which bleeds latching and holding current away, V. */
    private static final double BLEED_VOLTS = 0.7;

    /**
     * Slowest decay R_p/L_m of a pulse transformer, 1/s. Without any resistance a diode would reset the core along a straight
     * line, which is no sum of exponentials. The slower, the straighter, and the more figures cancel: at this, windings
     * without resistance agree with the integrator to 1e-7.
     */
    private static final double SLOWEST_RESET = 1e-5;

    private final ThyristorDevice thyristor;
    private final TriggerDemand[] demands;
    private final @Nullable TemperatureCurve latching;
    private final @Nullable PulseTransformer transformer;
    private final double clampVolts;

    GateSide(Design design) {
        thyristor = design.thyristor().device();
        demands = demands(thyristor, design.gate().polarity());
        latching = thyristor.latching().orElse(null);
        transformer = design.gate().transformer().orElse(null);
        clampVolts = design.clip().diodeDropVolts();
    }

    void fill(Network n, UnitValues unit) {
        PulseTransformer pulses = transformer;
        n.transformerCoupled = pulses != null;
        if (pulses != null) {
            n.turnsRatio = pulses.ratio();
            n.secondaries = pulses.secondaries();
            n.magnetisingHenries = pulses.magnetisingHenries();
            n.primaryOhms = Math.max(pulses.primaryOhms(), SLOWEST_RESET * pulses.magnetisingHenries());
            n.secondaryOhms = pulses.secondaryOhms();
            n.clampVolts = pulses.clampDiode() ? clampVolts : Double.POSITIVE_INFINITY;
        }
        n.gateSeriesOhms = unit.gateSeriesOhms;
        n.gateShuntSiemens = 1 / unit.gateShuntOhms;
        n.gateKneeVolts = thyristor.gate().kneeVolts();
        n.gateSlopeOhms = thyristor.gate().slopeOhms();
        n.triggerAmps = 0;
        for (TriggerDemand demand : demands) {
            n.triggerAmps = Math.max(n.triggerAmps, demand.ampsAt(unit.celsius));
        }
        n.turnOnSeconds = thyristor.gate().turnOnSeconds().orElse(0);
        TemperatureCurve curve = latching;
        n.latchingAmps = curve == null
                ? 0
                : curve.ampsAt(unit.celsius)
                        + bleedAmps(
                                thyristor.kind(),
                                n.transformerCoupled,
                                unit.gateSeriesOhms + unit.baseOneOhms,
                                n.gateShuntSiemens);
    }

    /**
     * What a conducting SCR's gate junction loses to the gate circuit: 0.7 V over R_GK parallel (R_G + R1), A. A pulse
     * transformer's inductance keeps the second path closed for the microseconds that latching takes; a triac's terminals
     * are too well joined inside to notice.
     */
    static double bleedAmps(Kind kind, boolean transformerCoupled, double pathOhms, double shuntSiemens) {
        if (kind == Kind.TRIAC) {
            return 0;
        }
        return BLEED_VOLTS * ((transformerCoupled ? 0 : 1 / pathOhms) + shuntSiemens);
    }

    /** The trigger data that a pulse's polarity meets: an SCR's own, or those of a triac's two quadrants. */
    static TriggerDemand[] demands(ThyristorDevice device, GateDrive.Polarity polarity) {
        TriggerDemand[] met = device.kind() == Kind.SCR
                ? new TriggerDemand[0]
                : ThyristorDevice.quadrantsOf(polarity).stream()
                        .map(quadrant -> device.gate().quadrants().get(quadrant))
                        .filter(Objects::nonNull)
                        .toArray(TriggerDemand[]::new);
        return met.length > 0 ? met : new TriggerDemand[] {device.gate().trigger()};
    }
}
