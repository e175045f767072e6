package clipramp.files;

import clipramp.circuit.Design;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Part;
import clipramp.circuit.Pot;
import clipramp.circuit.PotLaw;
import clipramp.circuit.PulseTransformer;
import clipramp.circuit.Trigger.ProgrammableTrigger;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.sizing.OpenPart;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** Writes chosen parts into the text of a request, which keeps everything else as its author wrote it. */
public final class SizedText {
    private SizedText() {}

    /**
     * The request's text with every open part as a design has it.
     *
     * @throws InvalidInputException where the text is no YAML of ours
     */
    public static DesignText of(PartialDesign request, Design design) {
        return of(request.text(), request.open(), design);
    }

    /**
     * A text with some parts as a design has them; parts that it does not have stay.
     *
     * @throws InvalidInputException where the text is no YAML of ours
     */
    public static DesignText of(DesignText text, Set<OpenPart> parts, Design design) {
        DesignText changed = text;
        for (OpenPart part : parts) {
            Optional<String> value = value(part, design);
            if (part == OpenPart.LAW) {
                changed = law(changed, design);
            } else if (value.isPresent()) {
                changed = changed.withValue(part.key(), value.get());
            }
        }
        return changed;
    }

    /** A law is a word, and a logarithmic one the share at half rotation beside it. */
    private static DesignText law(DesignText text, Design design) {
        Optional<PotLaw> law = design.ramp().pot().map(Pot::law);
        if (law.isEmpty() || law.get() instanceof PotLaw.Table) {
            return text;
        }
        DesignText changed =
                text.withValue(OpenPart.LAW.key(), law.get().word()).without("ramp.pot.points");
        OptionalDouble half = law.get() instanceof PotLaw.Logarithmic log
                ? OptionalDouble.of(log.half())
                : law.get() instanceof PotLaw.ReverseLogarithmic log
                        ? OptionalDouble.of(log.half())
                        : OptionalDouble.empty();
        return half.isPresent()
                ? changed.withValue("ramp.pot.half", QuantityText.exact(half.getAsDouble(), Unit.FRACTION))
                : changed.without("ramp.pot.half");
    }

    /**
     * A text with a design's whole pot, law and shunt included; the same text where it has none.
     *
     * @throws InvalidInputException where the text is no YAML of ours
     */
    public static DesignText withPot(DesignText text, Design design) {
        return design.ramp()
                .pot()
                .map(pot -> text.withValue("ramp.pot", pot(pot)))
                .orElse(text);
    }

    /** An open part's value as a design file has it; empty where the design has no such part. */
    public static Optional<String> value(OpenPart part, Design design) {
        GateDrive gate = design.gate();
        return switch (part) {
            case ZENER -> Optional.of(design.clip().zener().id());
            case DROPPER -> ohms(design.clip().dropper());
            case CAPACITOR -> Optional.of(FlowText.partText(design.ramp().capacitor(), Unit.FARAD));
            case FIXED -> ohms(design.ramp().fixed());
            case TRACK -> design.ramp().pot().flatMap(p -> ohms(p.track()));
            case LAW -> design.ramp().pot().map(p -> p.law().word());
            case ACROSS -> design.ramp().pot().flatMap(p -> p.shunt()).flatMap(SizedText::ohms);
            case TRIM_HIGH -> design.ramp().trimmers().high().flatMap(SizedText::ohms);
            case TRIM_LOW -> design.ramp().trimmers().low().flatMap(SizedText::ohms);
            case TRIGGER_DEVICE -> Optional.of(design.trigger().deviceId());
            case BASE_ONE -> ohms(design.trigger().baseOne());
            case BASE_TWO -> design.trigger() instanceof UnijunctionTrigger u ? ohms(u.baseTwo()) : Optional.empty();
            case UPPER -> design.trigger() instanceof ProgrammableTrigger p ? ohms(p.upper()) : Optional.empty();
            case LOWER -> design.trigger() instanceof ProgrammableTrigger p ? ohms(p.lower()) : Optional.empty();
            case SERIES -> ohms(gate.series());
            case SHUNT -> gate.shunt().flatMap(SizedText::ohms);
            case TRANSFORMER -> gate.transformer().map(SizedText::transformer);
            case THYRISTOR -> Optional.of(design.thyristor().device().id());
            case SINK -> {
                var sink = design.thyristor().caseToAmbientKelvinPerWatt();
                yield sink.isPresent()
                        ? Optional.of(QuantityText.exact(sink.getAsDouble(), Unit.KELVIN_PER_WATT))
                        : Optional.empty();
            }
        };
    }

    private static Optional<String> ohms(Part part) {
        return Optional.of(FlowText.partText(part, Unit.OHM));
    }

    /** A pulse transformer with all its keys, in braces. */
    static String transformer(PulseTransformer transformer) {
        return new FlowText()
                .quantity("ratio", transformer.ratio(), Unit.NUMBER)
                .raw("secondaries", String.valueOf(transformer.secondaries()))
                .quantity("magnetising", transformer.magnetisingHenries(), Unit.HENRY)
                .quantity("primary-resistance", transformer.primaryOhms(), Unit.OHM)
                .quantity("secondary-resistance", transformer.secondaryOhms(), Unit.OHM)
                .raw("clamp", transformer.clampDiode() ? "diode" : "none")
                .optional("volt-seconds", transformer.voltSeconds(), Unit.VOLT_SECOND)
                .text();
    }

    /** A pot with all its keys, in braces. */
    static String pot(Pot pot) {
        FlowText text = new FlowText()
                .part("track", pot.track(), Unit.OHM)
                .quantity("end", pot.endOhms(), Unit.OHM)
                .raw("law", pot.law().word());
        if (pot.law() instanceof PotLaw.Logarithmic log) {
            text.quantity("half", log.half(), Unit.FRACTION);
        } else if (pot.law() instanceof PotLaw.ReverseLogarithmic log) {
            text.quantity("half", log.half(), Unit.FRACTION);
        } else if (pot.law() instanceof PotLaw.Table table) {
            text.raw(
                    "points",
                    FlowText.list(table.points().stream()
                            .map(p -> "[" + QuantityText.exact(p.rotation(), Unit.FRACTION) + ", "
                                    + QuantityText.exact(p.share(), Unit.FRACTION) + "]")
                            .toList()));
        }
        return text.raw("sense", pot.sense().word())
                .part("shunt", pot.shunt(), Unit.OHM)
                .text();
    }
}
