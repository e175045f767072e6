package clipramp.engine;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;

/**
 * Current that a resistive load takes with the thyristor on: i = max(0, (|v| - V_T0 - n V_F)/(R + r_T + n r_F)), n
 * bridge diodes in the path (0 or 2). Half-wave stages conduct in the positive half only.
 */
public final class LoadCurrent {
    private final LineWave line;
    private final boolean fullWave;
    private final double dropVolts;
    private final double loopOhms;

    public LoadCurrent(Design design, Condition condition) {
        this(design, new LineWave(design.line(), condition));
    }

    LoadCurrent(Design design, LineWave line) {
        this.line = line;
        Stage stage = design.stage();
        fullWave = stage.isFullWave();
        var onState = design.thyristor().device().onState();
        dropVolts = onState.thresholdVolts()
                + stage.bridgeDiodes() * design.stageDiodes().dropVolts();
        loopOhms = design.load().resistanceOhms()
                + onState.slopeOhms()
                + stage.bridgeDiodes() * design.stageDiodes().slopeOhms();
    }

    /** Load current magnitude in amperes at a line angle, rad, the thyristor taken as on. */
    public double ampsAt(double angleRad) {
        double volts = line.voltsAt(angleRad);
        double driving = (fullWave ? Math.abs(volts) : volts) - dropVolts;
        return driving > 0 ? driving / loopOhms : 0;
    }

    /** All fixed drops in the load's path, V. */
    public double dropVolts() {
        return dropVolts;
    }

    /** Load and slopes in series, ohm. */
    public double loopOhms() {
        return loopOhms;
    }
}
