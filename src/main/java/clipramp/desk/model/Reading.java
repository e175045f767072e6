package clipramp.desk.model;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.figures.Lanes;
import clipramp.firing.Firing;
import clipramp.firing.HalfCycle;
import clipramp.firing.Waveforms;
import clipramp.power.KnobMap;
import clipramp.power.KnobSearch;
import clipramp.power.LoadWave;
import clipramp.power.OperatingPoint;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The bench read at one setting: what the lanes and the line of figures under them show.
 *
 * @param request what was asked
 * @param point the circuit and the load there
 * @param lanes its waveforms
 */
public record Reading(Request request, OperatingPoint point, Lanes lanes) {
    /** As many instants as a screen has columns for the lanes; events are added to them. */
    private static final int SAMPLES = 700;

    private static final double THERE_RAD = Math.toRadians(0.005);

    /**
     * What is asked of the bench.
     *
     * @param design the design
     * @param condition line and temperature
     * @param setting where the ramp's resistance is set
     */
    public record Request(Design design, Condition condition, Setting setting) {}

    /** An angle that no resistance fires at. */
    public static final class NoSuchAngleException extends RuntimeException {
        private static final long serialVersionUID = 1L;

        NoSuchAngleException(double rad) {
            super("No resistance of the ramp fires at " + QuantityText.format(rad, Unit.ANGLE)
                    + " here. Earlier than the supply rises or later than it collapses there is no pulse that turns the"
                    + " thyristor on; ask for an angle between.");
        }
    }

    /** Solves; milliseconds. */
    public static Reading of(Request request) {
        OperatingPoint point = solved(request);
        Waveforms waves = Firing.waveforms(request.design(), request.condition(), point.rampOhms(), SAMPLES);
        LoadWave load = LoadWave.of(request.design(), request.condition(), point.solution());
        Lanes lanes = new Lanes(
                waves,
                load.rad(),
                load.volts(),
                point.solution().shown().firingRad(),
                request.condition().lineHertz());
        return new Reading(request, point, lanes);
    }

    private static OperatingPoint solved(Request request) {
        Design design = request.design();
        Condition condition = request.condition();
        if (request.setting() instanceof Setting.AtAngle angle) {
            double ohms = KnobSearch.nearestRampOhmsForAngle(design, condition, angle.rad())
                    .orElseThrow(() -> new NoSuchAngleException(angle.rad()));
            return KnobMap.atRampOhms(design, condition, ohms);
        }
        if (request.setting() instanceof Setting.AtResistance resistance) {
            return KnobMap.atRampOhms(design, condition, resistance.ohms());
        }
        return KnobMap.at(design, condition, ((Setting.AtKnob) request.setting()).position());
    }

    /** The setting that this came to: the knob's, where it reaches the resistance. */
    public Setting setting() {
        return point.position().isPresent()
                ? new Setting.AtKnob(point.position().getAsDouble())
                : new Setting.AtResistance(point.rampOhms());
    }

    /** Why the firing line is not exactly where it was wanted, if it is not. */
    public Optional<String> remark() {
        if (!(request.setting() instanceof Setting.AtAngle asked) || firingRad().isEmpty()) {
            return Optional.empty();
        }
        boolean there = Math.abs(asked.rad() - firingRad().getAsDouble()) < THERE_RAD;
        return there
                ? Optional.empty()
                : Optional.of("No resistance fires at exactly " + Figures.degrees(asked.rad())
                        + ": the angle jumps there, because one pulse more in the half cycle before leaves another charge."
                        + " This is the nearest.");
    }

    /** Firing angle, rad; empty where the thyristor stays off. */
    public OptionalDouble firingRad() {
        return shown().firingRad();
    }

    private HalfCycle shown() {
        return point.solution().shown();
    }
}
