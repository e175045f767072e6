package clipramp.files;

import clipramp.circuit.Characteristic;
import clipramp.circuit.Part;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** A mapping in braces under construction; everything reads back as exactly the value that was given. */
final class FlowText {
    private final List<String> entries = new ArrayList<>();

    FlowText raw(String key, String value) {
        entries.add(key + ": " + value);
        return this;
    }

    FlowText word(String key, String value) {
        return raw(key, YamlText.scalar(value, true));
    }

    FlowText quantity(String key, double value, Unit unit) {
        return raw(key, QuantityText.exact(value, unit));
    }

    FlowText optional(String key, OptionalDouble value, Unit unit) {
        return value.isPresent() ? quantity(key, value.getAsDouble(), unit) : this;
    }

    FlowText part(String key, Part part, Unit unit) {
        return raw(key, partText(part, unit));
    }

    FlowText part(String key, Optional<Part> part, Unit unit) {
        return part.isPresent() ? part(key, part.get(), unit) : raw(key, "none");
    }

    FlowText characteristic(String key, Characteristic figure, Unit unit) {
        return raw(key, characteristicText(figure, unit));
    }

    FlowText mapping(String key, FlowText below) {
        return below.entries.isEmpty() ? this : raw(key, below.text());
    }

    List<String> entries() {
        return entries;
    }

    String text() {
        return "{" + String.join(", ", entries) + "}";
    }

    static String list(List<String> items) {
        return "[" + String.join(", ", items) + "]";
    }

    static String characteristicText(Characteristic figure, Unit unit) {
        if (figure.typ().isPresent() && figure.min().isEmpty() && figure.max().isEmpty()) {
            return QuantityText.exact(figure.typ().getAsDouble(), unit);
        }
        return new FlowText()
                .optional("min", figure.min(), unit)
                .optional("typ", figure.typ(), unit)
                .optional("max", figure.max(), unit)
                .text();
    }

    /** "10 kΩ ±5 % 12 W 500 V". */
    static String partText(Part part, Unit unit) {
        StringBuilder text = new StringBuilder(QuantityText.exact(part.value(), unit));
        double minus = part.tolerance().minus();
        double plus = part.tolerance().plus();
        if (minus == plus && plus > 0) {
            text.append(" ±").append(QuantityText.exact(plus, Unit.FRACTION));
        } else {
            if (minus > 0) {
                text.append(" -").append(QuantityText.exact(minus, Unit.FRACTION));
            }
            if (plus > 0) {
                text.append(" +").append(QuantityText.exact(plus, Unit.FRACTION));
            }
        }
        part.ratedWatts().ifPresent(w -> text.append(' ').append(QuantityText.exact(w, Unit.WATT)));
        part.ratedVolts().ifPresent(v -> text.append(' ').append(QuantityText.exact(v, Unit.VOLT)));
        return text.toString();
    }
}
