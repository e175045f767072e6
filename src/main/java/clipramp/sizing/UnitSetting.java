package clipramp.sizing;

import clipramp.circuit.Design;
import clipramp.circuit.Wanted.Goal;
import clipramp.power.KnobMap;
import clipramp.power.OperatingPoint;
import java.util.ArrayList;
import java.util.List;

/**
 * How a trimmer is set on every unit, at nominal line voltage and about 25 °C.
 *
 * @param part which trimmer
 * @param position where the knob stands, 0..1
 * @param firingRad firing angle to set, rad
 * @param loadVolts rms voltage that the load then has, V
 * @param fraction its power as a share of full power, 0..1
 */
public record UnitSetting(OpenPart part, double position, double firingRad, double loadVolts, double fraction) {
    /** The settings of a sound design's trimmers, in the order in which they are made; empty without trimmers. */
    public static List<UnitSetting> of(Design design) {
        List<UnitSetting> all = new ArrayList<>();
        double least = design.ramp().rampOhms(0) <= design.ramp().rampOhms(1) ? 0 : 1;
        double high = design.wanted().highest().map(Goal::position).orElse(least);
        double low = design.wanted().lowest().map(Goal::position).orElse(1 - least);
        design.ramp().trimmers().high().ifPresent(t -> all.add(at(design, OpenPart.TRIM_HIGH, high)));
        design.ramp().trimmers().low().ifPresent(t -> all.add(at(design, OpenPart.TRIM_LOW, low)));
        return List.copyOf(all);
    }

    private static UnitSetting at(Design design, OpenPart part, double position) {
        OperatingPoint point = KnobMap.at(design, design.nominalCondition(), position);
        return new UnitSetting(
                part,
                position,
                point.solution().shown().firingRad().orElse(Math.PI),
                point.load().rmsVolts(),
                point.load().fraction());
    }
}
