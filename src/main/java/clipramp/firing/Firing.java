package clipramp.firing;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.engine.Network;
import java.util.Optional;

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
     * Periodic state of one unit whose parts were drawn.
     *
     * @param design stage, load and supply
     * @param condition the unit's line and temperature
     * @param network the unit's network, R_E included
     */
    public static Solution solve(Design design, Condition condition, Network network) {
        return PeriodicState.solve(FiringCase.of(design, condition, network), PieceSink.NONE);
    }

    /**
     * Waveforms of the periodic state, one half cycle (a period for a half-wave supply or stage).
     *
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
        return Sampler.sample(firing, log.halves().subList(0, shown), 0, samples);
    }

    /** What the firing circuit's parts bear in the periodic state. */
    public static Dissipation dissipation(Design design, Condition condition, double rampOhms) {
        return study(design, condition, rampOhms).dissipation();
    }

    /** What the pulse transformer bears in the periodic state; empty with direct coupling. */
    public static Optional<TransformerDuty> transformerDuty(Design design, Condition condition, double rampOhms) {
        return study(design, condition, rampOhms).transformerDuty();
    }

    /** Periodic state and what it costs the parts, from one solution: a sixth more than {@link #solve} alone. */
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
                Bearing.of(firing, log.halves(), 0),
                firing.design().gate().transformer().map(t -> TransformerDuty.of(firing.network(), log.halves())));
    }
}
