package clipramp.faults;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Coupling;
import clipramp.circuit.Trigger;
import clipramp.engine.Network;
import clipramp.firing.Waveforms;
import java.util.OptionalDouble;

/**
 * The gate between pulses: the base bar's current through R1 and gate network. The engine's pulses leave the junction off
 * there, which holds as long as that voltage is small; a fault can make it large enough to fire the thyristor by itself
 * (DEVELOPERS.md, Single faults).
 */
final class StandingGate {
    private final Network network;
    private final boolean present;

    StandingGate(Design design, Network network) {
        this.network = network;
        this.present =
                design.gate().coupling() == Coupling.DIRECT && design.trigger() instanceof Trigger.UnijunctionTrigger;
    }

    /** Resistance that the junction sees, ohm. */
    private double sourceOhms() {
        double bar = network.baseTwoOhms + network.interbaseOhms;
        double baseOne = 1 / (1 / network.baseOneOhms + 1 / bar);
        return 1 / (1 / (baseOne + network.gateSeriesOhms) + network.gateShuntSiemens);
    }

    /** Gate voltage between pulses with a supply of so many volts, V to the thyristor's cathode. */
    double volts(double supplyVolts) {
        if (!present) {
            return 0;
        }
        double open = network.standingGateShare() * supplyVolts;
        double knee = network.gateKneeVolts;
        return open <= knee ? open : knee + network.gateSlopeOhms * amps(supplyVolts);
    }

    /** Gate current between pulses with a supply of so many volts, A. */
    double amps(double supplyVolts) {
        return present
                ? Math.max(0, network.standingGateShare() * supplyVolts - network.gateKneeVolts)
                        / (sourceOhms() + network.gateSlopeOhms)
                : 0;
    }

    /** Angle from the half cycle's zero at which that current reaches the trigger current, rad; empty if it never does. */
    OptionalDouble firesAtRad(Waveforms waves) {
        for (int i = 0; i < waves.supplyVolts().length; i++) {
            if (amps(waves.supplyVolts()[i]) >= network.triggerAmps) {
                return OptionalDouble.of(waves.angleRad()[i] % Math.PI);
            }
        }
        return OptionalDouble.empty();
    }
}
