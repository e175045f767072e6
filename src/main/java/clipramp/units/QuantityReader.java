package clipramp.units;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * The one grammar of quantities: {@code [sign] NUMBER [space] [prefix UNIT | prefix | UNIT] [tolerance] [ratings]},
 * with codes of IEC 60062 such as 4k7 in the number's place.
 */
public final class QuantityReader {
    /** IEC 60062: a letter in the place of the decimal point, then perhaps a tolerance letter, all glued. */
    private static final Pattern CODE = Pattern.compile(
            "(?:(\\d+)(R)(\\d*)|()(R)(\\d+)|(\\d+)([kKMGpnuµm])(\\d+)|()([kKMGpnuµm])(\\d+))([A-Za-z]?)(?=$|[ ±+Ω-])");

    /** What stands on a small capacitor, such as 104K: two figures, a power of ten in picofarads, a tolerance letter. */
    private static final Pattern MARKING = Pattern.compile("(\\d\\d)(\\d)([FGJKM]?)");

    private final String raw;
    private final Scanner scanner;
    private final List<Expected> choices;
    private final Refusals refusals;

    private QuantityReader(String raw, List<Expected> choices) {
        this.raw = raw.strip();
        this.choices = choices;
        scanner = new Scanner(raw);
        refusals = new Refusals(this.raw, scanner.text(), choices);
    }

    /**
     * The value of a whole text.
     *
     * @param text as written
     * @param expected what the place takes
     * @throws RefusedQuantityException with what was read, what was expected and a suggestion
     */
    public static Quantity read(String text, Expected expected) {
        return new QuantityReader(text, List.of(expected)).whole();
    }

    /**
     * The value of a whole text that may be in one of several units, such as a share in % or a power in W.
     *
     * @param text as written; a number without a unit is taken in the first choice's
     * @param choices what the place takes, at least one
     * @throws RefusedQuantityException with what was read, what was expected and a suggestion
     */
    public static Quantity readOneOf(String text, List<Expected> choices) {
        return new QuantityReader(text, choices).whole();
    }

    private Quantity whole() {
        refusals.refuseWhatIsNoNumber();
        Optional<Value> code = code();
        Value value = code.isPresent() ? code.get() : plain();
        Quantity quantity = new Trailer(scanner, refusals, value).read();
        if (!value.expected().admits(quantity.value())) {
            throw refusals.outside(value);
        }
        return quantity;
    }

    /**
     * What was read so far.
     *
     * @param number number as written
     * @param decimal value in the unit, degrees for angles
     * @param expected which of the choices it is
     * @param match prefix and unit as written; null where there were none
     * @param tolerance tolerance of a code's letter, 0 for none
     */
    record Value(String number, BigDecimal decimal, Expected expected, Unit.@Nullable Match match, double tolerance) {
        double si() {
            double value = decimal.doubleValue();
            boolean degrees = expected.unit() == Unit.ANGLE
                    && (match == null || !match.spelling().equals("rad"));
            return degrees ? Math.toRadians(value) : value;
        }
    }

    private Value plain() {
        Optional<Matcher> marking = Optional.of(MARKING.matcher(scanner.text())).filter(Matcher::matches);
        if (marking.isPresent() && choices.get(0).unit() == Unit.FARAD) {
            throw refusals.marking(marking.get());
        }
        String number = scanner.number().orElseThrow(refusals::noNumber);
        BigDecimal decimal = new BigDecimal(number);
        if (Double.isInfinite(decimal.doubleValue())) {
            throw refusals.because(choices.get(0).inWords(), "That number is too large to be kept.");
        }
        String word = scanner.unitWord();
        if (word.isEmpty()) {
            Expected first = choices.get(0);
            if (first.unit().needsUnit() && !first.bare()) {
                throw refusals.missingUnit(number, first.unit());
            }
            return new Value(number, decimal, first, null, 0);
        }
        for (Expected choice : choices) {
            Optional<Unit.Match> match = choice.unit().match(word);
            if (match.isPresent()) {
                BigDecimal scaled = decimal.scaleByPowerOfTen(match.get().exponent());
                return new Value(number, scaled, choice, match.get(), 0);
            }
        }
        if (choices.get(0).unit() == Unit.ANGLE && word.equals("rad")) {
            return new Value(number, decimal, choices.get(0), new Unit.Match(Prefix.NONE, "rad", 0), 0);
        }
        throw refusals.wrongUnit(number, word);
    }

    private Optional<Value> code() {
        Unit unit = choices.get(0).unit();
        Optional<Matcher> match = scanner.match(CODE);
        if (match.isEmpty()) {
            return Optional.empty();
        }
        Code code = Code.of(match.get());
        if (unit != Unit.OHM && unit != Unit.FARAD && unit != Unit.HENRY) {
            throw refusals.codeOutOfPlace(code.number(), code.letter());
        }
        Prefix prefix = code.letter().equals("R") && unit == Unit.OHM
                ? Prefix.NONE
                : Prefix.of(code.letter(), unit)
                        .orElseThrow(() -> refusals.codeOutOfPlace(code.number(), code.letter()));
        double tolerance = 0;
        if (!code.toleranceLetter().isEmpty()) {
            if (code.toleranceLetter().equals("F") && unit == Unit.FARAD) {
                throw refusals.faradOrOnePercent(code.number(), prefix);
            }
            tolerance = ToleranceLetter.fraction(code.toleranceLetter())
                    .orElseThrow(() -> refusals.unknownToleranceLetter(code.toleranceLetter()));
        }
        String word = scanner.unitWord();
        if (!word.isEmpty() && !unit.spellings().contains(word)) {
            throw refusals.wrongUnit(code.number(), word);
        }
        BigDecimal value = new BigDecimal(code.number()).scaleByPowerOfTen(prefix.exponent());
        return Optional.of(new Value(
                code.number(), value, choices.get(0), new Unit.Match(prefix, word, prefix.exponent()), tolerance));
    }

    /**
     * A code taken apart.
     *
     * @param number the number with a dot in the letter's place
     * @param letter the letter
     * @param toleranceLetter the tolerance letter, or empty
     */
    private record Code(String number, String letter, String toleranceLetter) {
        static Code of(Matcher match) {
            for (int group = 1; group < 12; group += 3) {
                if (match.group(group + 1) != null) {
                    String whole = match.group(group).isEmpty() ? "0" : match.group(group);
                    String part = match.group(group + 2);
                    return new Code(
                            part.isEmpty() ? whole : whole + "." + part, match.group(group + 1), match.group(13));
                }
            }
            throw new IllegalStateException("a code without a letter: " + match.group());
        }
    }
}
