package clipramp.power;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Load;
import clipramp.circuit.Stage;
import clipramp.circuit.StageDiodes;
import clipramp.engine.InductiveCurrent;
import clipramp.engine.LineWave;
import clipramp.engine.LoadCurrent;
import java.util.Optional;

/**
 * The loops that an inductive load's current can flow in: through the thyristor and the line, or through a freewheeling
 * diode alone.
 *
 * @param line the line's wave
 * @param fullWave whether both half cycles can drive it
 * @param rectified whether the load stands on the dc side of a bridge
 * @param loadOhms the load's resistance, ohm
 * @param henries its inductance, H
 * @param dropVolts fixed drops of the thyristor's path, V
 * @param dropOhms slopes of the thyristor's path, ohm
 * @param freewheel the freewheeling diode, if there is one
 */
record LoadLoop(
        LineWave line,
        boolean fullWave,
        boolean rectified,
        double loadOhms,
        double henries,
        double dropVolts,
        double dropOhms,
        Optional<StageDiodes> freewheel) {

    static LoadLoop of(Design design, Condition condition, Load.Inductive load) {
        LoadCurrent path = new LoadCurrent(design, condition);
        return new LoadLoop(
                new LineWave(design.line(), condition),
                design.stage().isFullWave(),
                design.stage() == Stage.BRIDGE_DC,
                load.resistanceOhms(),
                load.inductanceHenries(),
                path.dropVolts(),
                path.loopOhms() - load.resistanceOhms(),
                load.freewheel());
    }

    /** The same without any drop. */
    LoadLoop withoutDrops() {
        return new LoadLoop(
                line, fullWave, rectified, loadOhms, henries, 0, 0, freewheel.map(d -> new StageDiodes(0, 0)));
    }

    /** What is over for the load's path at an angle, drops taken off, V. */
    double drivingVolts(double rad) {
        double volts = line.voltsAt(rad);
        return (fullWave ? Math.abs(volts) : volts) - dropVolts;
    }

    int directionAt(double rad) {
        return !fullWave || line.voltsAt(rad) >= 0 ? 1 : -1;
    }

    InductiveCurrent throughThyristor(double fromRad, int direction, double amps) {
        InductiveCurrent current = new InductiveCurrent(line, loadOhms + dropOhms, henries);
        current.begin(fromRad, direction, dropVolts, amps);
        return current;
    }

    InductiveCurrent throughDiode(double fromRad, double amps) {
        StageDiodes diode = freewheel.orElseThrow();
        InductiveCurrent current = new InductiveCurrent(line, loadOhms + diode.slopeOhms(), henries);
        current.begin(fromRad, 0, diode.dropVolts(), amps);
        return current;
    }

    /** Voltage across the load while the thyristor carries its current, V. */
    double thyristorLoadVolts(double rad, int direction, double amps) {
        return direction * line.voltsAt(rad) - dropVolts - dropOhms * amps;
    }

    /** Voltage across the load while the diode carries its current, V, negative. */
    double diodeLoadVolts(double amps) {
        StageDiodes diode = freewheel.orElseThrow();
        return -diode.dropVolts() - diode.slopeOhms() * amps;
    }

    CurrentSpan thyristorSpan(double fromRad, double toRad, int direction, InductiveCurrent current) {
        return new CurrentSpan(
                fromRad,
                toRad,
                direction,
                line.omega() * henries / (loadOhms + dropOhms),
                current::ampsAt,
                rad -> thyristorLoadVolts(rad, direction, current.ampsAt(rad)));
    }

    CurrentSpan diodeSpan(double fromRad, double toRad, InductiveCurrent current) {
        double ohms = loadOhms + freewheel.orElseThrow().slopeOhms();
        return new CurrentSpan(
                fromRad,
                toRad,
                0,
                line.omega() * henries / ohms,
                current::ampsAt,
                rad -> diodeLoadVolts(current.ampsAt(rad)));
    }

    /** The line's own zero after an angle, rad. */
    double nextZeroRad(double rad) {
        double turn = 2 * Math.PI;
        double toRising = positiveRemainder(line.positiveStartRad() - rad, turn);
        double toFalling = positiveRemainder(line.negativeStartRad() - rad, turn);
        return rad + Math.min(toRising, toFalling);
    }

    /** Remainder in (0, by]: a zero that is here already is not the next one. */
    private static double positiveRemainder(double value, double by) {
        double rest = value - by * Math.floor(value / by);
        return rest <= 1e-12 ? by : rest;
    }
}
