package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.files.Conditions;
import clipramp.files.InvalidInputException;
import clipramp.margins.Note;
import clipramp.power.KnobSearch;
import clipramp.power.LoadPower;
import clipramp.units.Expected;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** The knob backwards: an option's angle, power, voltage or position as a whole R_E in ohms. */
final class Wants {
    private static final double LEAST_STEP_RAD = Math.toRadians(0.02);
    private static final double MOST_STEP_RAD = Math.toRadians(3);

    private Wants() {}

    /**
     * What was looked for backwards.
     *
     * @param rampOhms the ramp resistance that gives it, ohm; the nearest ones on either side of a jump
     * @param note why it is not given exactly, where it is not
     */
    record Answered(List<Double> rampOhms, Optional<Note> note) {
        static Answered exactly(double rampOhms) {
            return new Answered(List.of(rampOhms), Optional.empty());
        }
    }

    /** The angle may jump where the charge left by one half cycle changes suddenly; then the nearest are given. */
    static Answered rampOhmsForAngle(String option, String text, Design design, Condition condition) {
        double rad = Conditions.of(
                option, text, Expected.within(Unit.ANGLE, 0, Math.PI).allowingBare());
        OptionalDouble exact = KnobSearch.rampOhmsForAngle(design, condition, rad);
        if (exact.isPresent()) {
            return Answered.exactly(exact.getAsDouble());
        }
        List<Double> near = Stream.of(-1.0, 1.0)
                .flatMap(side -> nearest(design, condition, rad, side).stream().boxed())
                .toList();
        if (near.isEmpty()) {
            throw refused(option, text, "no ramp resistance makes this design fire and latch at that angle");
        }
        String said = "No ramp resistance fires at exactly " + QuantityText.format(rad, Unit.ANGLE)
                + ": the angle jumps there, or ends there. What is shown is the nearest that was found.";
        return new Answered(near, Optional.of(new Note("angle-jumps", said)));
    }

    private static OptionalDouble nearest(Design design, Condition condition, double rad, double side) {
        for (double off = LEAST_STEP_RAD; off < MOST_STEP_RAD; off *= 2) {
            double tried = rad + side * off;
            OptionalDouble ohms = tried > 0 && tried < Math.PI
                    ? KnobSearch.rampOhmsForAngle(design, condition, tried)
                    : OptionalDouble.empty();
            if (ohms.isPresent()) {
                return ohms;
            }
        }
        return OptionalDouble.empty();
    }

    /** A power in watts, or a share of full-wave full power. */
    static Answered rampOhmsForPower(String option, String text, Design design, Condition condition) {
        double fullWatts = LoadPower.fullWatts(design, condition);
        double watts = Conditions.watts(option, text, fullWatts);
        if (watts > fullWatts) {
            throw refused(
                    option,
                    text,
                    "this load's full power is " + QuantityText.format(fullWatts, Unit.WATT) + " at most");
        }
        return found(
                option,
                text,
                KnobSearch.rampOhmsForWatts(design, condition, watts),
                "no ramp resistance gives this load that power");
    }

    static Answered rampOhmsForVolts(String option, String text, Design design, Condition condition) {
        double volts = Conditions.of(option, text, Expected.within(Unit.VOLT, 0, 2 * condition.lineVolts()));
        return found(
                option,
                text,
                KnobSearch.rampOhmsForVolts(design, condition, volts),
                "no ramp resistance gives this load that voltage");
    }

    private static Answered found(String option, String text, OptionalDouble ohms, String reason) {
        return Answered.exactly(ohms.orElseThrow(() -> refused(option, text, reason)));
    }

    private static InvalidInputException refused(String option, String text, String reason) {
        return Problems.refused(
                option, "read \"" + text + "\": " + reason + ". clipramp map FILE shows what it can reach.");
    }
}
