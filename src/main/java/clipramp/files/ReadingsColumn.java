package clipramp.files;

import clipramp.fit.Accuracy;
import clipramp.fit.BenchLine;
import clipramp.fit.Meter;
import clipramp.fit.Setting;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * One column of a readings file, from its head: {@code firing angle (deg) ±1}.
 *
 * @param head as written
 * @param kind what stands in it
 * @param scale what a number in it is multiplied by to have SI units
 * @param accuracy how far its numbers may be off
 */
record ReadingsColumn(String head, Kind kind, double scale, Accuracy accuracy) {
    private static final Pattern HEAD =
            Pattern.compile("(?<name>[^(]+?)\\s*\\((?<unit>[^) ]+)(?<how>[^)]*)\\)\\s*(?:(?:±|\\+-)\\s*(?<off>.+))?");

    /** What may stand in a column. */
    enum Kind {
        KNOB("knob", "%", Unit.FRACTION, 0, 1, Setting.USUAL_KNOB, null),
        RAMP_OHMS("ramp resistance", "kohm", Unit.OHM, 0.01, 1e9, Meter.RAMP_OHMS.usual(), Meter.RAMP_OHMS),
        LINE("line voltage", "V", Unit.VOLT, 1, 2000, BenchLine.LineVolts.USUAL, null),
        ANGLE("firing angle", "deg", Meter.FIRING_ANGLE, Math.PI),
        DELAY("delay", "ms", Meter.DELAY, 1),
        TRUE_RMS("load voltage", "V true-rms", Meter.LOAD_TRUE_RMS, 2000),
        AVERAGE("load voltage", "V average-reading", Meter.LOAD_AVERAGE_READING, 2000),
        WATTS("load power", "W", Meter.LOAD_WATTS, 1e6),
        BASE_ONE("base-one peak", "V", Meter.BASE_ONE_PEAK, 200),
        SUPPLY("supply voltage", "V", Meter.SUPPLY, 200),
        PEAK_POINT("peak-point voltage", "V", Meter.PEAK_POINT, 200),
        NOTE("note", "", Unit.NUMBER, 0, 0, Setting.USUAL_KNOB, null);

        final String name;
        final String usualUnit;
        final Unit unit;
        final double low;
        final double high;
        final Accuracy usual;
        final Optional<Meter> meter;

        Kind(String name, String usualUnit, Meter meter, double high) {
            this(name, usualUnit, meter.unit(), 0, high, meter.usual(), meter);
        }

        Kind(String name, String usualUnit, Unit unit, double low, double high, Accuracy usual, @Nullable Meter meter) {
            this.name = name;
            this.usualUnit = usualUnit;
            this.unit = unit;
            this.low = low;
            this.high = high;
            this.usual = usual;
            this.meter = Optional.ofNullable(meter);
        }

        String head() {
            return usualUnit.isEmpty() ? name : name + " (" + usualUnit + ")";
        }
    }

    /** Heads as they are best written. */
    static List<String> known() {
        return Arrays.stream(Kind.values()).map(Kind::head).toList();
    }

    /** Reads a head; what is wrong with it is among the findings. */
    static Optional<ReadingsColumn> of(String head, Place place, Findings findings) {
        String plain = head.toLowerCase(Locale.ROOT).strip();
        if (plain.equals(Kind.NOTE.name)) {
            return Optional.of(new ReadingsColumn(head, Kind.NOTE, 1, Kind.NOTE.usual));
        }
        Matcher match = HEAD.matcher(head.strip());
        String name = (match.matches() ? match.group("name") : plain).toLowerCase(Locale.ROOT);
        List<Kind> named = new ArrayList<>();
        for (Kind kind : Kind.values()) {
            if (kind.name.equals(name.strip())) {
                named.add(kind);
            }
        }
        if (named.isEmpty()) {
            findings.unknown(place, head, head, "no such column", known());
            return Optional.empty();
        }
        if (!match.matches()) {
            findings.problem(
                    place, head, head, headsOf(named), "expected its unit in brackets: " + headsOf(named) + ".");
            return Optional.empty();
        }
        return kind(named, match.group("how").strip(), head, place, findings)
                .flatMap(kind -> scaled(kind, match, place, findings));
    }

    private static String headsOf(List<Kind> kinds) {
        return String.join(" or ", kinds.stream().map(Kind::head).toList());
    }

    /** The one kind of a name, or of the two load voltages the one whose meter is said. */
    private static Optional<Kind> kind(List<Kind> named, String how, String head, Place place, Findings findings) {
        String said = how.toLowerCase(Locale.ROOT).replace(' ', '-');
        if (named.size() == 1) {
            if (said.isEmpty() || (named.get(0) == Kind.LINE && said.matches("(true-)?rms"))) {
                return Optional.of(named.get(0));
            }
        } else if (said.matches("(true-)?rms")) {
            return Optional.of(Kind.TRUE_RMS);
        } else if (said.equals("average-reading")) {
            return Optional.of(Kind.AVERAGE);
        } else {
            findings.problem(
                    place,
                    head,
                    head,
                    headsOf(named),
                    "say which meter read it: " + headsOf(named)
                            + ". On a chopped wave the two differ by up to half of what they show.");
            return Optional.empty();
        }
        findings.problem(place, head, head, headsOf(named), "expected " + headsOf(named) + ".");
        return Optional.empty();
    }

    private static Optional<ReadingsColumn> scaled(Kind kind, Matcher match, Place place, Findings findings) {
        String head = match.group();
        try {
            double scale = QuantityReader.read("1 " + match.group("unit"), Expected.any(kind.unit))
                    .value();
            String off = match.group("off");
            return Optional.of(new ReadingsColumn(
                    head, kind, scale, off == null ? kind.usual : accuracy(kind, off.strip(), scale)));
        } catch (RefusedQuantityException refused) {
            findings.problem(
                    place,
                    head,
                    match.group("unit"),
                    kind.head(),
                    "unit and accuracy are written as in \"" + kind.head() + " ±1\" or \"±1 %\": "
                            + refused.refusal().message());
        } catch (IllegalArgumentException refused) {
            findings.problem(
                    place,
                    head,
                    head,
                    "an accuracy above zero",
                    "an instrument without error is none: give its accuracy.");
        }
        return Optional.empty();
    }

    /** A share of the reading in percent, else an amount in the column's unit; of a knob always of its whole travel. */
    private static Accuracy accuracy(Kind kind, String off, double scale) {
        if (off.endsWith("%")) {
            double share = QuantityReader.read(off, Expected.within(Unit.FRACTION, 0, 1))
                    .value();
            return kind == Kind.KNOB ? Accuracy.amount(share) : Accuracy.share(share);
        }
        if (off.matches("[0-9.eE+-]+")) {
            return Accuracy.amount(
                    scale * QuantityReader.read(off, Expected.any(Unit.NUMBER)).value());
        }
        return Accuracy.amount(QuantityReader.read(off, Expected.any(kind.unit)).value());
    }
}
