package clipramp.firing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;

/** The firing circuit solved: what every other room asks. */
public final class Firing {
    private Firing() {}

    /**
     * Periodic state at one ramp resistance, nominal parts.
     *
     * @param design the design
     * @param condition line and temperature
     * @param rampOhms R_E, ohm, above zero
     */
    public static Solution solve(Design design, Condition condition, double rampOhms) {
        return PeriodicState.solve(FiringCase.of(design, condition, rampOhms), PieceSink.NONE);
    }

    /**
     * Waveforms of the periodic state, one half cycle (a period for half-wave).
     *
     * @param samples about how many instants, 2 or more; events are added to them
     */
    public static Waveforms waveforms(Design design, Condition condition, double rampOhms, int samples) {
        throw new UnsupportedOperationException();
    }

    /** What the firing circuit's parts bear in the periodic state. */
    public static Dissipation dissipation(Design design, Condition condition, double rampOhms) {
        throw new UnsupportedOperationException();
    }
}
