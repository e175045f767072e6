package clipramp.faults;

import clipramp.circuit.Design;
import clipramp.circuit.TestPoint;
import clipramp.faults.FaultSolver.Setting;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** What is left to read once a short across the line has opened its fuse. */
final class FuseGone {
    private FuseGone() {}

    /** A shorted diode of a bridge across the line. */
    static Setting byDiode(Fault fault, OptionalDouble position, double rampOhms) {
        return dark(
                position,
                rampOhms,
                List.of(Burden.unlimited(
                        fault.part(), "the next diode's surge: the line shorted every second half cycle")),
                "The line is shorted in every second half cycle until its fuse opens; the figures are those"
                        + " afterwards.");
    }

    /** A thyristor fired into a shorted load. */
    static Setting byThyristor(Design design, OptionalDouble position, double rampOhms) {
        List<Burden> burdens = new ArrayList<>();
        burdens.add(Burden.unlimited("thyristor.device", "the line's short-circuit current from the first pulse on"));
        if (design.stage().bridgeDiodes() > 0) {
            burdens.add(Burden.unlimited("stage-diodes", "the same current"));
        }
        OptionalDouble bears = design.thyristor().device().limits().ampsSquaredSeconds();
        String fuse = bears.isEmpty()
                ? "Its sheet states no I²t that a fuse could be chosen by."
                : "Its I²t is " + QuantityText.format(bears.getAsDouble(), Unit.AMPERE_SQUARED_SECOND)
                        + ": only a fuse that lets less through opens first.";
        return dark(
                position,
                rampOhms,
                burdens,
                "The first pulse that turns the thyristor on puts it across the line, until the fuse or the thyristor is"
                        + " gone; the figures are those afterwards. " + fuse);
    }

    private static Setting dark(OptionalDouble position, double rampOhms, List<Burden> burdens, String remark) {
        Map<TestPoint, Reading> readings = new EnumMap<>(TestPoint.class);
        for (TestPoint point : TestPoint.values()) {
            if (point != TestPoint.TP0) {
                readings.put(point, Reading.ZERO);
            }
        }
        LoadAt nothing = new LoadAt(position, rampOhms, OptionalDouble.empty(), 0, 0, 0, 0);
        return new Setting(nothing, burdens, readings, List.of(remark));
    }
}
