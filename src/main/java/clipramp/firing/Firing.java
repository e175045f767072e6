package clipramp.firing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.engine.Network;

/**
 * The firing circuit solved: what every other room asks. Event instants are right to 1e-6 of a half cycle or better, the
 * energies of pulses to 1e-6 of them (DEVELOPERS.md, Half cycle and periodic state). Every method throws {@link
 * clipramp.circuit.RefusedCircuit} where the line has more than two zeros a period, where the trigger device's data
 * contradict themselves, and where the circuit switches too often within a half cycle to be followed.
 */
public final class Firing {
    private Firing() {}

    /**
     * Periodic state at one ramp resistance, nominal parts.
     *
     * @param design the design
     * @param condition line and temperature
     * @param rampOhms R_E, ohm, above 0
     */
    public static Solution solve(Design design, Condition condition, double rampOhms) {
        return PeriodicState.solve(FiringCase.of(design, condition, rampOhms), PieceSink.NONE);
    }

    /**
     * Periodic state of one unit whose parts were drawn, or changed.
     *
     * @param design stage, load and supply
     * @param condition the unit's line and temperature
     * @param network the unit's network, derived, R_E included
     */
    public static Solution solve(Design design, Condition condition, Network network) {
        return PeriodicState.solve(FiringCase.of(design, condition, network), PieceSink.NONE);
    }

    /**
     * Waveforms of the periodic state, one half cycle (a period for a half-wave supply or stage), nominal parts.
     *
     * @param design the design
     * @param condition line and temperature
     * @param rampOhms R_E, ohm, above 0
     * @param samples about how many instants, 2 or more; events are added to them
     */
    public static Waveforms waveforms(Design design, Condition condition, double rampOhms, int samples) {
        return waveforms(FiringCase.of(design, condition, rampOhms), samples);
    }

    /** The same of one unit whose parts were drawn, or changed: R_E is the network's. */
    public static Waveforms waveforms(Design design, Condition condition, Network network, int samples) {
        return waveforms(FiringCase.of(design, condition, network), samples);
    }

    private static Waveforms waveforms(FiringCase firing, int samples) {
        PieceLog log = new PieceLog();
        PeriodicState.solve(firing, log);
        int shown = firing.design().stage() == Stage.HALF_WAVE
                ? Math.min(2, log.halves().size())
                : 1;
        return Sampler.sample(firing, log.halves().subList(0, shown), samples);
    }

    /** What the firing circuit's parts bear in the periodic state at one R_E in ohms, nominal parts. */
    public static Dissipation dissipation(Design design, Condition condition, double rampOhms) {
        return study(design, condition, rampOhms).dissipation();
    }

    /**
     * Periodic state and what it costs the parts, from one solution: a sixth more work than {@link #solve} alone.
     *
     * @param design the design
     * @param condition line and temperature
     * @param rampOhms R_E, ohm, above 0
     */
    public static Study study(Design design, Condition condition, double rampOhms) {
        return study(FiringCase.of(design, condition, rampOhms));
    }

    /** The same of one unit whose parts were drawn, or changed: R_E is the network's. */
    public static Study study(Design design, Condition condition, Network network) {
        return study(FiringCase.of(design, condition, network));
    }

    private static Study study(FiringCase firing) {
        PieceLog log = new PieceLog();
        Solution solution = PeriodicState.solve(firing, log);
        return new Study(
                solution,
                Bearing.of(firing, log.halves()),
                firing.design().gate().transformer().map(t -> TransformerDuty.of(firing.network(), log.halves())));
    }
}
