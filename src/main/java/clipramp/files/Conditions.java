package clipramp.files;

import clipramp.circuit.Line;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.List;

/** Reads the conditions that are given beside a design: {@code --line=207V}, {@code --temperature=0degC} and their like. */
public final class Conditions {
    private static final double MOST_WATTS = 1e9;

    private Conditions() {}

    /** Line voltage in V: volts, or a signed share of the design's nominal line. */
    public static double lineVolts(String text, Line line) {
        return read("--line", () -> {
            var q = QuantityReader.readOneOf(
                    text, List.of(Expected.within(Unit.VOLT, 1, 2000), Expected.within(Unit.FRACTION, -0.5, 0.5)));
            return q.unit() == Unit.VOLT ? q.value() : line.volts() + line.volts() * q.value();
        });
    }

    /** Ambient temperature in °C; 25 means 25 °C. */
    public static double celsius(String text) {
        return of("--temperature", text, Expected.within(Unit.CELSIUS, -60, 150).allowingBare());
    }

    /** Knob position 0..1, written as 50 % or 0.5. */
    public static double knob(String text) {
        return of("--knob", text, Expected.within(Unit.FRACTION, 0, 1));
    }

    /** A whole R_E in ohms. */
    public static double rampOhms(String text) {
        return of("--resistance", text, Expected.within(Unit.OHM, 1, 1e9));
    }

    /** A firing angle in radians; 90 means 90 degrees. */
    public static double firingRad(String text) {
        return of("--angle", text, Expected.within(Unit.ANGLE, 0, Math.PI).allowingBare());
    }

    /**
     * A load power in W: watts, which may be more than the load takes, or a share of full power.
     *
     * @param option the option's name, which a refusal carries
     * @param fullWatts full power, W
     */
    public static double watts(String option, String text, double fullWatts) {
        return read(option, () -> {
            var q = QuantityReader.readOneOf(
                    text, List.of(Expected.within(Unit.WATT, 0, MOST_WATTS), Expected.within(Unit.FRACTION, 0, 1)));
            return q.unit() == Unit.WATT ? q.value() : q.value() * fullWatts;
        });
    }

    /**
     * An option's quantity in SI units.
     *
     * @param option the option's name, which a refusal carries
     * @throws InvalidInputException where it is refused
     */
    public static double of(String option, String text, Expected expected) {
        return read(option, () -> QuantityReader.read(text, expected).value());
    }

    private static double read(String option, java.util.function.DoubleSupplier reader) {
        try {
            return reader.getAsDouble();
        } catch (RefusedQuantityException e) {
            Findings findings = new Findings();
            findings.refused(Place.of(option, 0, 0), "", e.refusal());
            throw new InvalidInputException(findings.problems());
        }
    }
}
