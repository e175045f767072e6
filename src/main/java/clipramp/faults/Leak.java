package clipramp.faults;

import clipramp.engine.Network;

/**
 * A resistance R_leak across the ramp capacitor, told to a network that has none. With x = V_C/k, k = R_leak/(R_E +
 * R_leak), the ramp's law becomes k C_E dx/dt = (V_S - x)/R_E: the same circuit with capacitor k C_E and a peak point
 * 1/k as high. Peak-point current and stall come out exactly; the pulse's energy 1/k too large, which is why only firing
 * angle and ramp are to be believed, and the load of the leak on the supply is left out (DEVELOPERS.md, Single faults).
 */
final class Leak {
    /** A programmable device's divider cannot ask for more than the supply: nearer to it than this counts as silent. */
    private static final double LEAST_UPPER_SHARE = 1e-4;

    private Leak() {}

    /** Changes a network for a leak; its share k is above 0 and under 1. */
    static void across(Network network, double share) {
        double peak = network.peakShare() / share;
        network.capacitorFarads *= share;
        network.emitterDropVolts /= share;
        if (network.programmable) {
            double divider = network.upperOhms + network.lowerOhms;
            network.lowerOhms = divider * Math.min(1 - LEAST_UPPER_SHARE, peak);
            network.upperOhms = divider - network.lowerOhms;
        } else {
            // kappa (R2 + R_BB + R1p) = R1p + eta R_BB, and R1p is quiescentShare of the same sum.
            double bar = 1 / network.standingSiemens();
            network.standoff = bar * (peak - network.quiescentShare()) / network.interbaseOhms;
        }
        network.derive();
    }
}
