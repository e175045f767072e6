package clipramp.desk.model;

import clipramp.firing.FiringState;
import clipramp.firing.Pulse;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Locale;
import java.util.OptionalDouble;

/**
 * A reading as the words and figures that stand under the lanes.
 *
 * @param angle firing angle with its sign, or none
 * @param delay from the line's zero to the firing pulse, with unit
 * @param resistance whole R_E, with unit
 * @param position where the knob stands, in per cent, or why it stands nowhere
 * @param power load power, with unit
 * @param share the same in per cent of full power
 * @param state what the circuit does, in a few words
 */
public record Figures(
        String angle, String delay, String resistance, String position, String power, String share, String state) {
    private static final int DIGITS = 3;

    /** Words for a reading. */
    public static Figures of(Reading reading) {
        OptionalDouble rad = reading.firingRad();
        return new Figures(
                rad.isPresent() ? degrees(rad.getAsDouble()) : "none",
                reading.point()
                        .solution()
                        .shown()
                        .firingPulse()
                        .map(Pulse::startSeconds)
                        .map(s -> String.format(Locale.ROOT, "%.3f ms", s * 1000))
                        .orElse("no pulse turns it on"),
                QuantityText.format(reading.point().rampOhms(), Unit.OHM),
                position(reading),
                QuantityText.format(reading.point().load().watts(), Unit.WATT, DIGITS),
                percent(reading.point().load().fraction()),
                state(reading));
    }

    /** An angle with the decimal that an arrow key with Shift moves. */
    static String degrees(double rad) {
        return String.format(Locale.ROOT, "%.1f°", Math.toDegrees(rad));
    }

    /** A share with one decimal. */
    public static String percent(double share) {
        return String.format(Locale.ROOT, "%.1f %%", share * 100);
    }

    private static String position(Reading reading) {
        if (reading.point().position().isPresent()) {
            return percent(reading.point().position().getAsDouble());
        }
        return reading.request().design().ramp().pot().isPresent() ? "outside its travel" : "no knob";
    }

    private static String state(Reading reading) {
        FiringState state = reading.point().solution().state();
        return switch (state) {
            case FIRES -> reading.firingRad().isPresent() ? "fires" : "pulses, but nothing latches";
            case SILENT -> "silent: no pulse";
            case HUNTS -> "hunts: half cycles differ";
            case STALLS -> "stalls at the peak point";
            case LATCHED_ON -> "trigger stays on after its pulse";
            case END_PULSE -> "fires only as the supply collapses";
        };
    }
}
