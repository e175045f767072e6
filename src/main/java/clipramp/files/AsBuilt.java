package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Design;
import clipramp.circuit.Part;
import clipramp.circuit.PotLaw;
import clipramp.circuit.Tolerance;
import clipramp.fit.FitResult;
import clipramp.fit.Fitted;
import clipramp.fit.Fitted.Knowledge;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;

/**
 * Writes what a fit found into a design's text, comments kept. A value that the readings tell carries its 95 % interval as
 * tolerance; one that they only moved keeps the part's own. The whole unit fits the readings, so everything that moved is
 * written, not only what is told.
 */
public final class AsBuilt {
    private static final MathContext UPWARDS = new MathContext(2, RoundingMode.UP);

    /** A move of less than this share of what the limits allow is none. */
    private static final double LEAST_MOVE = 0.01;

    /** Between these a file's logarithmic laws have no number. */
    private static final double LOWEST_LINEAR = 0.49;

    private static final double HIGHEST_LINEAR = 0.51;

    private final Design design;
    private DesignText text;

    private AsBuilt(DesignText text, Design design) {
        this.text = text;
        this.design = design;
    }

    /**
     * A design's text as the unit was built.
     *
     * @param text the design as its author wrote it
     * @param design the same, read
     * @param result what the fit found
     * @return the text with every value that moved, and a sentence about it among the notes
     * @throws InvalidInputException where the text is no YAML of ours
     */
    public static DesignText of(DesignText text, Design design, FitResult result) {
        AsBuilt built = new AsBuilt(text, design);
        for (Fitted value : result.values()) {
            boolean moved = Math.abs(value.value() - value.nominal()) > LEAST_MOVE * (value.high() - value.low());
            if (moved || value.knowledge() == Knowledge.TOLD) {
                built.write(value);
            }
        }
        int used = result.quality().used();
        String said =
                "As built: fitted from " + used + " of " + result.readings().count() + " bench readings.";
        String notes = design.notes().isBlank() ? said : design.notes().strip() + " " + said;
        return built.text.withValue("notes", notes);
    }

    private void write(Fitted value) {
        String path = value.path();
        Optional<Part> part = DesignFigures.part(design, path);
        if (part.isPresent()) {
            set(path, FlowText.partText(asBuilt(part.get(), value), value.unit()));
        } else if (path.equals(FitResult.LAW_PATH)) {
            law(value.value());
        } else if (path.equals("trigger.device.base-one-pulse")) {
            set(path + ".typ", QuantityText.exact(DesignFigures.rounded(value.value()), Unit.VOLT));
            set(
                    path + ".min",
                    QuantityText.exact(DesignFigures.rounded(Math.min(value.from(), value.value())), Unit.VOLT));
        } else if (DesignFigures.isTable(design, path)) {
            set(path, DesignFigures.table(design, figure(value), value.unit()));
        } else if (path.startsWith("trigger.device.") || path.equals("clip.zener.voltage")) {
            set(path, FlowText.characteristicText(figure(value), value.unit()));
        }
    }

    private void set(String path, String value) {
        text = text.withValue(path, value);
    }

    private static Part asBuilt(Part part, Fitted value) {
        double reach = Math.max(value.to() / value.value() - 1, 1 - value.from() / value.value());
        double share = new BigDecimal(reach).round(UPWARDS).doubleValue();
        Tolerance tolerance =
                value.knowledge() == Knowledge.TOLD ? new Tolerance(Math.min(1, share), share) : part.tolerance();
        return new Part(DesignFigures.rounded(value.value()), tolerance, part.ratedWatts(), part.ratedVolts());
    }

    private static Characteristic figure(Fitted value) {
        boolean told = value.knowledge() == Knowledge.TOLD;
        double at = DesignFigures.rounded(value.value());
        return Characteristic.of(
                Math.min(at, DesignFigures.rounded(told ? value.from() : value.low())),
                at,
                Math.max(at, DesignFigures.rounded(told ? value.to() : value.high())));
    }

    /** A logarithmic law by its share at half rotation; next to linear, which has no such number, its points. */
    private void law(double half) {
        if (half > LOWEST_LINEAR && half < HIGHEST_LINEAR) {
            set("ramp.pot.law", "table");
            text = text.without("ramp.pot.half");
            PotLaw law = FitResult.lawOf(half);
            set(
                    "ramp.pot.points",
                    FlowText.list(DoubleStream.of(0, 0.25, 0.5, 0.75, 1)
                            .mapToObj(turned -> FlowText.list(List.of(
                                    QuantityText.exact(turned, Unit.FRACTION),
                                    QuantityText.exact(DesignFigures.rounded(law.share(turned)), Unit.FRACTION))))
                            .toList()));
        } else {
            set("ramp.pot.law", half < 0.5 ? "log" : "reverse-log");
            set("ramp.pot.half", QuantityText.exact(DesignFigures.rounded(Math.min(half, 1 - half)), Unit.FRACTION));
        }
    }
}
