package clipramp.files;

import clipramp.circuit.Line;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.List;
import java.util.function.DoubleSupplier;

/**
 * Reads the conditions that are given beside a design: {@code --line=207V}, {@code --temperature=0degC} and their like. What
 * is refused carries the option's name in place of a file's, and no line.
 */
public final class Conditions {
    private static final double MOST_WATTS = 1e9;

    private Conditions() {}

    /**
     * Line voltage in V, rms.
     *
     * @param text 1 V to 2000 V, or a signed share of nominal within half of it
     * @param line the design's, whose nominal voltage a share is of
     * @throws InvalidInputException where it is refused
     */
    public static double lineVolts(String text, Line line) {
        return read("--line", () -> {
            var q = QuantityReader.readOneOf(
                    text, List.of(Expected.within(Unit.VOLT, 1, 2000), Expected.within(Unit.FRACTION, -0.5, 0.5)));
            return q.unit() == Unit.VOLT ? q.value() : line.volts() + line.volts() * q.value();
        });
    }

    /**
     * Ambient temperature in °C.
     *
     * @param text -60 to 150 degC; a bare 25 means 25 °C
     * @throws InvalidInputException where it is refused
     */
    public static double celsius(String text) {
        return of("--temperature", text, Expected.within(Unit.CELSIUS, -60, 150).allowingBare());
    }

    /**
     * Knob position, 0..1.
     *
     * @param text written as 50 % or 0.5
     * @throws InvalidInputException where it is refused
     */
    public static double knob(String text) {
        return of("--knob", text, Expected.within(Unit.FRACTION, 0, 1));
    }

    /**
     * A whole R_E in ohms.
     *
     * @param text 1 ohm to 1 Gohm
     * @throws InvalidInputException where it is refused
     */
    public static double rampOhms(String text) {
        return of("--resistance", text, Expected.within(Unit.OHM, 1, 1e9));
    }

    /**
     * A load power in W: watts, which may be more than the load takes, or a share of full power.
     *
     * @param option the option's name, which a refusal carries
     * @param text 0 to 1 GW, or 0 to 100 %
     * @param fullWatts full power, W
     * @throws InvalidInputException where it is refused
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
     * @param text as written
     * @param expected unit and window
     * @throws InvalidInputException where it is refused
     */
    public static double of(String option, String text, Expected expected) {
        return read(option, () -> QuantityReader.read(text, expected).value());
    }

    private static double read(String option, DoubleSupplier reader) {
        try {
            return reader.getAsDouble();
        } catch (RefusedQuantityException e) {
            Findings findings = new Findings();
            findings.refused(Place.of(option, 0, 0), "", e.refusal());
            throw new InvalidInputException(findings.problems());
        }
    }
}
