package clipramp.firing;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.engine.LineWave;
import clipramp.engine.LoadCurrent;
import clipramp.engine.Network;
import clipramp.engine.NetworkOfDesign;
import clipramp.engine.SourceWave;

/**
 * A design at one condition and ramp resistance, made ready to be solved.
 *
 * @param design stage, load and supply
 * @param condition line and temperature
 * @param network the firing circuit, R_E included
 * @param line the line at the condition
 * @param timing the half cycles that the supply sees
 * @param load what the load takes with the thyristor on
 * @param tapsThyristor whether the supply is across the thyristor
 * @param conductingVolts what such a supply is fed with while the thyristor conducts, V
 */
record FiringCase(
        Design design,
        Condition condition,
        Network network,
        LineWave line,
        SupplyTiming timing,
        LoadCurrent load,
        boolean tapsThyristor,
        double conductingVolts) {

    static FiringCase of(Design design, Condition condition, double rampOhms) {
        return of(design, condition, NetworkOfDesign.of(design, condition, rampOhms));
    }

    /** The design's stage, load and supply around a network whose numbers were drawn. */
    static FiringCase of(Design design, Condition condition, Network network) {
        LineWave line = new LineWave(design.line(), condition);
        return new FiringCase(
                design,
                condition,
                network,
                line,
                SupplyTiming.of(design, line),
                new LoadCurrent(design, line),
                design.clip().tap() == ClipSupply.Tap.THYRISTOR,
                conductingVolts(design));
    }

    /** What a supply across the conducting thyristor is fed with: V_T0 less the drops of a rectifier of its own, V. */
    private static double conductingVolts(Design design) {
        ClipSupply clip = design.clip();
        boolean stageBridge = clip.rectifier() == ClipSupply.Rectifier.BRIDGE
                && (design.stage() == Stage.BRIDGE_DC || design.stage() == Stage.BRIDGE_AC);
        double ownDrops = stageBridge ? 0 : clip.rectifierVolts();
        return Math.max(0, design.thyristor().device().onState().thresholdVolts() - ownDrops);
    }

    /** What feeds a supply across the conducting thyristor through a half cycle of so many seconds. */
    SourceWave conductingWave(double seconds) {
        SourceWave wave = new SourceWave();
        wave.setConstant(conductingVolts, seconds);
        return wave;
    }

    /** Line angle of the load at a time within a half cycle, not folded, rad. */
    double lineRad(int half, double seconds) {
        return timing.startRad(half) + condition.omega() * seconds;
    }

    /** Whether the anode is forward at a time within a half cycle. */
    boolean isForward(int half, double seconds) {
        return load.drivingVolts(lineRad(half, seconds)) > 0;
    }

    /** Load current, A, at a time within a half cycle, the thyristor fired at an earlier one. */
    double anodeAmps(int half, double firedSeconds, double seconds) {
        return load.ampsSince(lineRad(half, firedSeconds), lineRad(half, seconds));
    }

    /** Time, s, in the clock of the half cycle that it was fired in, at which the load current ends. */
    double extinctionSeconds(int half, double firedSeconds) {
        double end = timing.wave(half).seconds();
        double fired = lineRad(half, firedSeconds);
        double extinction = load.extinctionRad(fired, lineRad(half, end));
        return firedSeconds + (extinction - fired) / condition.omega();
    }
}
