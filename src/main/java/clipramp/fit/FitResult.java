package clipramp.fit;

import clipramp.circuit.PotLaw;
import java.util.List;
import java.util.Optional;

/**
 * A unit as built.
 *
 * @param readings what it was found from
 * @param values every value that may differ from unit to unit, in the order of the signal
 * @param untouched paths of values that no reading depends on
 * @param together pairs that are told only together, strongest first
 * @param residuals every reading, then what was set, in the order of the lines
 * @param quality how well it fits
 */
public record FitResult(
        Readings readings,
        List<Fitted> values,
        List<String> untouched,
        List<Together> together,
        List<Residual> residuals,
        Quality quality) {
    /** Path of the pot's law, which is one number here. */
    public static final String LAW_PATH = "ramp.pot.law";

    /** Path of the line voltage where nobody read it: of the day, not of the unit. */
    public static final String LINE_PATH = "line.voltage";

    /** Nearer to one half than this the exponential loses its digits. */
    private static final double LINEAR = 1e-6;

    /** Keeps the lists as they are. */
    public FitResult {
        values = List.copyOf(values);
        untouched = List.copyOf(untouched);
        together = List.copyOf(together);
        residuals = List.copyOf(residuals);
    }

    /** Readings and settings that do not belong, farthest off first. */
    public List<Residual> strangers() {
        return residuals.stream()
                .filter(residual -> !residual.belongs())
                .sorted((a, b) -> Double.compare(Math.abs(b.deviations()), Math.abs(a.deviations())))
                .toList();
    }

    /** Values of which the readings leave half the uncertainty or less. */
    List<Fitted> told() {
        return values.stream()
                .filter(value -> value.knowledge() == Fitted.Knowledge.TOLD)
                .toList();
    }

    /** Whether the readings tell anything of the unit itself, the line voltage on the day not counted. */
    public boolean isTelling() {
        return told().stream().anyMatch(value -> !value.path().equals(LINE_PATH));
    }

    /**
     * The one family that holds every law but a table, by its track share at half rotation. Nearer to linear than a millionth
     * it is linear.
     *
     * @param halfShare above 0, below 1; 0.5 is linear
     */
    public static PotLaw lawOf(double halfShare) {
        if (Math.abs(halfShare - 0.5) < LINEAR) {
            return new PotLaw.Linear();
        }
        return halfShare < 0.5 ? new PotLaw.Logarithmic(halfShare) : new PotLaw.ReverseLogarithmic(1 - halfShare);
    }

    /** The value at a design key, such as ramp.capacitor; empty where it does not differ from unit to unit. */
    public Optional<Fitted> value(String path) {
        return values.stream().filter(value -> value.path().equals(path)).findFirst();
    }
}
