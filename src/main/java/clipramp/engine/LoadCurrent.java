package clipramp.engine;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;

/**
 * Current that a load takes once the thyristor is on. A resistor: i = max(0, (|v| - V_T0 - n V_F)/(R + r_T + n r_F)), n
 * bridge diodes in the path (0 or 2). With an inductance it grows from nothing as {@link InductiveCurrent} says. Half-wave
 * stages conduct in the positive half only. Angles are of the line, from the positive-going zero of its fundamental;
 * currents and voltages count as positive in the direction of conduction (DEVELOPERS.md, Power; Loads with memory).
 */
public final class LoadCurrent {
    private final LineWave line;
    private final boolean fullWave;
    private final double dropVolts;
    private final double loopOhms;
    private final double henries;
    private final boolean freewheels;

    /**
     * The load's path of a design, nominal parts.
     *
     * @throws clipramp.circuit.RefusedCircuit as {@link LineWave}
     */
    public LoadCurrent(Design design, Condition condition) {
        this(design, new LineWave(design.line(), condition));
    }

    /** The same of a line that is at hand. */
    public LoadCurrent(Design design, LineWave line) {
        this.line = line;
        Stage stage = design.stage();
        fullWave = stage.isFullWave();
        henries = design.load() instanceof Load.Inductive inductive ? inductive.inductanceHenries() : 0;
        freewheels = design.load() instanceof Load.Inductive inductive
                && inductive.freewheel().isPresent();
        var onState = design.thyristor().device().onState();
        dropVolts = onState.thresholdVolts()
                + stage.bridgeDiodes() * design.stageDiodes().dropVolts();
        loopOhms = design.load().resistanceOhms()
                + onState.slopeOhms()
                + stage.bridgeDiodes() * design.stageDiodes().slopeOhms();
    }

    /** What drives current through the load at a line angle in rad, drops taken off, V; negative for nothing. */
    public double drivingVolts(double angleRad) {
        double volts = line.voltsAt(angleRad);
        return (fullWave ? Math.abs(volts) : volts) - dropVolts;
    }

    /** Current of a resistive load at a line angle in rad, the thyristor taken as on, A. */
    public double ampsAt(double angleRad) {
        return Math.max(0, drivingVolts(angleRad)) / loopOhms;
    }

    /**
     * Load current at an angle, the thyristor fired at an earlier one with no current flowing.
     *
     * @param firedRad line angle of firing, rad
     * @param atRad line angle asked about, rad, at or after it
     * @return A; 0 where nothing drives it
     */
    public double ampsSince(double firedRad, double atRad) {
        if (henries == 0 || drivingVolts(firedRad) <= 0) {
            return ampsAt(atRad);
        }
        InductiveCurrent current = begun(firedRad);
        return current.extinctionRad(atRad) < atRad ? 0 : current.ampsAt(atRad);
    }

    /**
     * Line angle at which the current ends that was fired with none flowing.
     *
     * @param firedRad line angle of firing, rad
     * @param halfEndRad the zero that ends the half cycle, rad: with a resistor the current ends there, and a freewheeling
     *     diode takes it over a fraction of a degree before
     * @return rad; a whole period after firing at most
     */
    public double extinctionRad(double firedRad, double halfEndRad) {
        if (henries == 0 || freewheels || drivingVolts(firedRad) <= 0) {
            return halfEndRad;
        }
        return Math.min(begun(firedRad).extinctionRad(firedRad + 2 * Math.PI), firedRad + 2 * Math.PI);
    }

    private InductiveCurrent begun(double firedRad) {
        InductiveCurrent current = new InductiveCurrent(line, loopOhms, henries);
        current.begin(firedRad, line.voltsAt(firedRad) > 0 ? 1 : -1, dropVolts, 0);
        return current;
    }

    /** All fixed drops in the load's path, V. */
    public double dropVolts() {
        return dropVolts;
    }

    /** Everything resistive in the load's path: R + r_T + n r_F, ohm. */
    public double loopOhms() {
        return loopOhms;
    }
}
