package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.Tolerance;
import clipramp.spread.Factor;
import clipramp.spread.Factors;
import clipramp.spread.Remedy;
import clipramp.spread.Remedy.Limits;
import clipramp.units.PreferredSeries;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Optional;
import java.util.OptionalDouble;

/** Writes what a spread found to help into a design's text, comments kept: a tighter part, a selected device, or a trimmer. */
public final class Remedied {
    private static final String FIXED = "ramp.fixed";

    /** Common practice for presets. */
    private static final double TRACK_TOLERANCE = 0.2;

    private static final String PULSE = "trigger.device.base-one-pulse";

    private Remedied() {}

    /**
     * A design's text with a remedy.
     *
     * @param text the design as its author wrote it
     * @param design the same, read
     * @param remedy what is taken over
     * @return the text with it; empty where the remedy is no figure of a design
     * @throws InvalidInputException where the text is no YAML of ours
     */
    public static Optional<DesignText> of(DesignText text, Design design, Remedy remedy) {
        if (remedy.limits().isEmpty() && remedy.path().equals(FIXED)) {
            return Optional.of(trimmer(text, design.ramp().fixed()));
        }
        return remedy.limits().map(limits -> write(text, design, remedy.path(), limits));
    }

    /** Half of the fixed resistor stays, and a track of about all of it goes in series: at its middle all is as before. */
    private static DesignText trimmer(DesignText text, Part fixed) {
        double half = PreferredSeries.E24.nearest(fixed.value() / 2);
        double track = PreferredSeries.E3.nearest(2 * (fixed.value() - half));
        double rest = PreferredSeries.E24.nearest(fixed.value() - track / 2);
        Part trimmer = new Part(
                track, new Tolerance(TRACK_TOLERANCE, TRACK_TOLERANCE), OptionalDouble.empty(), OptionalDouble.empty());
        return text.withValue(FIXED, FlowText.partText(fixed.withValue(rest), Unit.OHM))
                .withValue("ramp.trim-high", FlowText.partText(trimmer, Unit.OHM));
    }

    private static DesignText write(DesignText text, Design design, String path, Limits limits) {
        Unit unit = KeyCatalogue.standard().meant(path).get(0).unit();
        Optional<Part> part = DesignFigures.part(design, path);
        if (part.isPresent()) {
            return text.withValue(path, FlowText.partText(tighter(part.get(), limits), unit));
        }
        if (path.equals(PULSE)) {
            double least = DesignFigures.rounded(limits.low());
            return text.withValue(path + ".min", QuantityText.exact(least, Unit.VOLT));
        }
        Characteristic figure = figure(limits, isTypical(design, path));
        String value = DesignFigures.isTable(design, path)
                ? DesignFigures.table(design, figure, unit)
                : FlowText.characteristicText(figure, unit);
        return text.withValue(path, value);
    }

    private static Part tighter(Part part, Limits limits) {
        Tolerance tolerance = new Tolerance(
                DesignFigures.rounded(1 - limits.low() / limits.nominal()),
                DesignFigures.rounded(limits.high() / limits.nominal() - 1));
        return new Part(part.value(), tolerance, part.ratedWatts(), part.ratedVolts());
    }

    /** A figure without a typical value stays without one: it is drawn in another way. */
    private static boolean isTypical(Design design, String path) {
        return Factors.of(design).stream()
                .anyMatch(factor -> factor.path().equals(path) && factor.law() == Factor.Law.THREE_POINT);
    }

    private static Characteristic figure(Limits limits, boolean typical) {
        return new Characteristic(
                OptionalDouble.of(DesignFigures.rounded(limits.low())),
                typical ? OptionalDouble.of(DesignFigures.rounded(limits.nominal())) : OptionalDouble.empty(),
                OptionalDouble.of(DesignFigures.rounded(limits.high())));
    }
}
