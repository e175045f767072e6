package clipramp.units;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** The words of every refusal of one text. */
final class Refusals {
    private static final Pattern COMMA = Pattern.compile("([+-]?\\d+),(\\d+)(.*)", Pattern.DOTALL);
    private static final Pattern NOT_A_NUMBER =
            Pattern.compile("[+-]?\\.?(nan|inf|infinity)", Pattern.CASE_INSENSITIVE);
    private static final Pattern OTHER_BASE = Pattern.compile("[+-]?0[xob][0-9a-f]+.*", Pattern.CASE_INSENSITIVE);
    private static final Pattern MEG = Pattern.compile("([+-]?[\\d.]+) ?meg.*", Pattern.CASE_INSENSITIVE);
    private static final Pattern FAHRENHEIT = Pattern.compile("([+-]?[\\d.]+) ?(degF|°F|F)", Pattern.CASE_INSENSITIVE);
    private static final int MOST_SUGGESTIONS = 4;

    private final String raw;
    private final String text;
    private final List<Expected> choices;

    Refusals(String raw, String text, List<Expected> choices) {
        this.raw = raw;
        this.text = text;
        this.choices = choices;
    }

    private String expected() {
        return choices.stream().map(Expected::inWords).collect(Collectors.joining(", or "));
    }

    private Unit unit() {
        return choices.get(0).unit();
    }

    private RefusedQuantityException refusal(String suggestion) {
        return refusal("", expected(), suggestion);
    }

    private RefusedQuantityException refusal(String meaning, String expected, String suggestion) {
        return new RefusedQuantityException(new Refusal(raw, meaning, expected, suggestion));
    }

    RefusedQuantityException because(String expected, String suggestion) {
        return refusal("", expected, suggestion);
    }

    /** Texts that look like numbers of another grammar. */
    void refuseWhatIsNoNumber() {
        if (text.isEmpty()) {
            throw refusal("An empty value: write none, or a value.");
        }
        if (NOT_A_NUMBER.matcher(text).matches()) {
            throw refusal("Only finite numbers are taken.");
        }
        if (OTHER_BASE.matcher(text).matches()) {
            throw refusal("Numbers are written in decimal digits.");
        }
        if (text.contains("_")) {
            throw refusal("Leave the underscore out: " + raw.replace("_", "") + "?");
        }
        if (text.contains("..")) {
            throw refusal("A band has no place here: write one value.");
        }
        Matcher comma = COMMA.matcher(text);
        if (comma.matches()) {
            throw comma(comma.group(1), comma.group(2), comma.group(3));
        }
        Matcher meg = MEG.matcher(text);
        if (meg.matches()) {
            throw refusal("Mega is M: " + meg.group(1) + " M" + ascii(unit()) + "?");
        }
        Matcher fahrenheit = FAHRENHEIT.matcher(text);
        if (unit() == Unit.CELSIUS && fahrenheit.matches()) {
            throw fahrenheit(fahrenheit.group(1));
        }
    }

    private RefusedQuantityException comma(String whole, String part, String rest) {
        if (part.length() == 3 && !whole.matches("[+-]?0")) {
            return refusal(askBack(whole, part));
        }
        return refusal("Decimals take a dot: " + whole + "." + part + rest + "?");
    }

    /** "1.0 or 1000?" for 1,000: it may be either. */
    static String askBack(String whole, String part) {
        String decimals = part.replaceAll("0+$", "");
        return whole + "." + (decimals.isEmpty() ? "0" : decimals) + " or " + whole + part + "?";
    }

    private RefusedQuantityException fahrenheit(String number) {
        double celsius = (Double.parseDouble(number.matches("[+-]?\\d+(\\.\\d+)?") ? number : "0") - 32) / 1.8;
        return refusal("Temperatures are in °C: " + QuantityText.number(celsius, 3) + " degC?");
    }

    RefusedQuantityException noNumber() {
        return refusal("It has to begin with a number.");
    }

    RefusedQuantityException missingUnit(String number, Unit unit) {
        String hint = unit == Unit.ANGLE ? number + " deg?" : number + " degC?";
        return refusal("", expected() + " with its unit", hint);
    }

    RefusedQuantityException marking(Matcher marking) {
        int power = marking.group(2).charAt(0) - '0';
        int exponent = power == 9 ? -1 : power == 8 ? -2 : power;
        double farads = new BigDecimal(marking.group(1))
                .scaleByPowerOfTen(exponent - 12)
                .doubleValue();
        String tolerance = ToleranceLetter.fraction(marking.group(3)).stream()
                .mapToObj(t -> " ±" + QuantityText.format(t, Unit.FRACTION))
                .collect(Collectors.joining());
        String meaning = QuantityText.format(farads, Unit.FARAD) + tolerance;
        return power == 0
                ? refusal("As a marking " + text + " is " + meaning + ": write that, or " + text + " with its unit.")
                : refusal(text + " is " + meaning + ": write that.");
    }

    RefusedQuantityException codeOutOfPlace(String number, String letter) {
        String prefix = letter.equals("R") ? "" : letter;
        return refusal("Letters as decimal points are for resistors, capacitors and inductors: " + number + " " + prefix
                + ascii(unit()) + "?");
    }

    RefusedQuantityException unknownToleranceLetter(String letter) {
        return refusal("No tolerance letter \"" + letter + "\" is known: F 1 %, G 2 %, J 5 %, K 10 %, M 20 %.");
    }

    RefusedQuantityException faradOrOnePercent(String number, Prefix prefix) {
        String value = number + " " + prefix.ascii() + "F";
        return refusal("The last F may be farad or 1 %: " + value + ", or " + value + " ±1 %?");
    }

    RefusedQuantityException trailing(String rest, QuantityReader.Value value) {
        if (value.match() == null && rest.matches("\\d{3}( \\d{3})*( ?\\D.*)?")) {
            return refusal("Digits are not grouped: " + text.replaceAll("(?<=\\d) (?=\\d)", "") + "?");
        }
        String more = value.expected().ratings()
                ? "After the value come a tolerance and ratings in W and V"
                : value.expected().tolerance() ? "After the value comes a tolerance" : "Nothing comes after the value";
        return refusal(more + "; \"" + rest.strip() + "\" is none.");
    }

    RefusedQuantityException wrongUnit(String number, String word) {
        if (unit() == Unit.CELSIUS && word.equals("K")) {
            return refusal("K is for differences: " + number + " degC?");
        }
        if (unit() == Unit.KELVIN && Unit.CELSIUS.match(word).isPresent()) {
            return refusal("Differences are in K: " + number + " K?");
        }
        if (word.equals("K")) {
            return refusal("K is kelvin here, kilo is k: " + number + " k" + ascii(unit()) + "?");
        }
        String alike = choices.stream()
                .flatMap(c -> alike(c.unit(), word).stream())
                .distinct()
                .limit(MOST_SUGGESTIONS)
                .map(w -> number + " " + w)
                .collect(Collectors.joining(" or "));
        if (!alike.isEmpty()) {
            return refusal(alike + "?");
        }
        Optional<Unit> other = otherUnit(word);
        String reason = other.isPresent()
                ? "\"" + word + "\" is " + other.get().noun() + "; "
                : "\"" + word + "\" is no unit known here; ";
        return refusal(reason + "such as " + choices.get(0).unit().example() + ".");
    }

    private static Optional<Unit> otherUnit(String word) {
        for (Unit unit : Unit.values()) {
            Optional<Unit.Match> match = unit.match(word);
            if (match.isPresent() && !match.get().spelling().isEmpty()) {
                return Optional.of(unit);
            }
        }
        return word.equals("rad") ? Optional.of(Unit.ANGLE) : Optional.empty();
    }

    /** Spellings that differ from a word only in case, or by a plural s. */
    private static List<String> alike(Unit unit, String word) {
        List<String> found = new ArrayList<>();
        for (Prefix prefix : Prefix.values()) {
            if (prefix != Prefix.NONE && !unit.isPrefixed()) {
                continue;
            }
            for (String spelling : unit.spellings()) {
                for (String candidate : new String[] {prefix.ascii() + spelling, prefix.symbol() + spelling}) {
                    String folded = word.toLowerCase(Locale.ROOT);
                    String other = candidate.toLowerCase(Locale.ROOT);
                    if (!spelling.contains("²") && (folded.equals(other) || folded.equals(other + "s"))) {
                        found.add(candidate.replace("Ω", "ohm"));
                    }
                }
            }
        }
        return found;
    }

    /** A value outside its window, with the readings that may have been meant. */
    RefusedQuantityException outside(QuantityReader.Value value) {
        Set<String> readings = new LinkedHashSet<>();
        Expected expected = value.expected();
        Unit.Match match = value.match();
        if (match != null && match.spelling().equals("rad")) {
            return refusal("", expected.inWords(), "");
        }
        if (match != null) {
            match.prefix().otherCase().ifPresent(other -> readings.add(reading(value, other)));
        }
        for (Prefix prefix : Prefix.values()) {
            if (expected.unit().isPrefixed() && (match == null || prefix != match.prefix())) {
                BigDecimal other = scaled(value, prefix);
                if (expected.admits(other.doubleValue()) && other.signum() != 0) {
                    readings.add(reading(value, prefix));
                }
            }
        }
        boolean bareShare = match == null && (expected.unit() == Unit.FRACTION || expected.unit() == Unit.PER_KELVIN);
        if (bareShare && expected.admits(value.decimal().scaleByPowerOfTen(-2).doubleValue())) {
            readings.add(value.number() + " " + expected.unit().symbol());
        }
        List<String> few = readings.stream().limit(MOST_SUGGESTIONS).toList();
        String suggestion = few.isEmpty() ? "" : listed(few) + "?";
        String meaning = QuantityText.meaning(value.decimal(), expected.unit());
        boolean saysNothing = meaning.replace(" ", "").equals(text.replace(" ", ""));
        return refusal(saysNothing ? "" : meaning, expected.inWords(), suggestion);
    }

    private static String listed(List<String> few) {
        int last = few.size() - 1;
        return last == 0 ? few.get(0) : String.join(", ", few.subList(0, last)) + " or " + few.get(last);
    }

    private static BigDecimal scaled(QuantityReader.Value value, Prefix prefix) {
        int written = value.match() == null ? 0 : value.match().prefix().exponent();
        return value.decimal().scaleByPowerOfTen(prefix.exponent() - written);
    }

    private String reading(QuantityReader.Value value, Prefix prefix) {
        boolean ascii = raw.chars().allMatch(c -> c < 128);
        Unit unit = value.expected().unit();
        Unit.Match match = value.match();
        String spelling = match == null || match.spelling().isEmpty() ? unit.symbol() : match.spelling();
        String written = ascii ? Notation.ASCII.apply(spelling) : spelling;
        return value.number() + " " + (ascii ? prefix.ascii() : prefix.symbol()) + written;
    }

    private static String ascii(Unit unit) {
        return Notation.ASCII.apply(unit.symbol());
    }
}
