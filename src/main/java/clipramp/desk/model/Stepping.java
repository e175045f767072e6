package clipramp.desk.model;

import clipramp.files.Key;
import clipramp.files.KeyCatalogue;
import clipramp.units.Expected;
import clipramp.units.PreferredSeries;
import clipramp.units.Quantity;
import clipramp.units.QuantityReader;
import clipramp.units.QuantityText;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** An entry stepped up or down: parts by their preferred series, other figures by one of their last digit. */
public final class Stepping {
    private static final Pattern NUMBER = Pattern.compile("([+-]?\\d+(?:\\.\\d+)?)(.*)", Pattern.DOTALL);
    private static final double SLACK = 1e-9;

    private Stepping() {}

    /**
     * An entry so many steps up or down.
     *
     * @param key design key
     * @param text the entry as it stands
     * @param steps how many, negative for down
     * @return the entry stepped, with tolerance and ratings as they were; empty where it cannot be
     */
    public static Optional<String> step(String key, String text, int steps) {
        Optional<Key> known = KeyCatalogue.standard().find(key);
        if (known.isPresent() && known.get().kind() == Key.Kind.PART) {
            return stepPart(known.get(), text, steps);
        }
        Matcher number = NUMBER.matcher(text.strip());
        return number.matches() ? Optional.of(stepNumber(number.group(1), steps) + number.group(2)) : Optional.empty();
    }

    private static String stepNumber(String number, int steps) {
        BigDecimal value = new BigDecimal(number);
        BigDecimal next = value.add(BigDecimal.valueOf(steps, Math.max(0, value.scale())));
        return (number.startsWith("+") && next.signum() > 0 ? "+" : "") + next.toPlainString();
    }

    private static Optional<String> stepPart(Key key, String text, int steps) {
        try {
            Quantity whole = QuantityReader.read(text, Expected.part(key.unit(), 0, Double.POSITIVE_INFINITY));
            if (!(whole.value() > 0)) {
                return Optional.empty();
            }
            double stepped = series(whole, key.unit()).step(whole.value(), steps);
            if (stepped < key.low() || stepped > key.high()) {
                return Optional.empty();
            }
            return Optional.of(QuantityText.exact(stepped, key.unit()) + tail(text, whole, key.unit()));
        } catch (RefusedQuantityException e) {
            return Optional.empty();
        }
    }

    /** IEC 60063 gives each series to a tolerance: E6 20 %, E12 10 %, E24 5 %, E48 2 %, E96 1 %, E192 0.5 %. */
    private static PreferredSeries series(Quantity part, Unit unit) {
        double tolerance = Math.max(part.minus(), part.plus());
        if (tolerance == 0) {
            return unit == Unit.OHM ? PreferredSeries.E24 : PreferredSeries.E6;
        }
        if (tolerance > 0.1 + SLACK) {
            return PreferredSeries.E6;
        }
        if (tolerance > 0.05 + SLACK) {
            return PreferredSeries.E12;
        }
        if (tolerance > 0.02 + SLACK) {
            return PreferredSeries.E24;
        }
        if (tolerance > 0.01 + SLACK) {
            return PreferredSeries.E48;
        }
        return tolerance > 0.005 + SLACK ? PreferredSeries.E96 : PreferredSeries.E192;
    }

    /** What stands after the value: the longest beginning that reads as a bare value is the value. */
    private static String tail(String text, Quantity whole, Unit unit) {
        Expected bare = Expected.any(unit);
        for (int end = text.length(); end > 0; end--) {
            try {
                String rest = text.substring(end).strip();
                boolean letter = !rest.isEmpty() && Character.isLetter(rest.charAt(0));
                if (!letter && QuantityReader.read(text.substring(0, end), bare).value() == whole.value()) {
                    return rest.isEmpty() ? "" : " " + rest;
                }
            } catch (RefusedQuantityException e) {
                // Too long still.
            }
        }
        return whole.hasTolerance() ? " ±" + QuantityText.format(whole.plus(), Unit.FRACTION) : "";
    }
}
