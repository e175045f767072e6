package clipramp.files;

import clipramp.units.Expected;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;

/**
 * One key of a design or profile: everything that the reader, {@code explain} and the README's table say of it.
 *
 * @param path the key with dots, such as clip.dropper, or unijunction.standoff for a device's own figures
 * @param kind what stands there
 * @param unit unit of a quantity; NUMBER where there is none
 * @param low least plausible value, SI units
 * @param high greatest plausible value, SI units
 * @param words the words that it takes, for keys that take words
 * @param need whether it must be there
 * @param standard the default as it would be written; empty for none
 * @param neededBy who needs it
 * @param meaning one sentence
 */
public record Key(
        String path,
        Kind kind,
        Unit unit,
        double low,
        double high,
        List<String> words,
        Need need,
        String standard,
        String neededBy,
        String meaning) {
    /** What stands at a key. */
    public enum Kind {
        MAPPING("more keys"),
        LIST("a list"),
        TEXT("text"),
        WORD("a word"),
        WHOLE("a whole number"),
        QUANTITY("a quantity"),
        PART("a value with tolerance and ratings"),
        CHARACTERISTIC("a quantity, or {min:, typ:, max:}"),
        CURVE("a current, or a list of {at:, current:}"),
        RATIO("a ratio, 2 or 2:1"),
        LINE_LIMIT("signed percent, or volts"),
        GOAL("%, W, V or deg, or a band, at a knob position"),
        POWER_AT_VOLTAGE("a power, or a power at a voltage"),
        PROFILE("a profile's id, or its keys");

        private final String inWords;

        Kind(String inWords) {
            this.inWords = inWords;
        }

        public String inWords() {
            return inWords;
        }
    }

    /** Whether a key must be there. */
    public enum Need {
        /** Must be there where the mapping around it is. */
        REQUIRED,
        /** A default stands in, and is listed as assumed. */
        DEFAULTED,
        /** May be left out; what needs it is then not judged or not there. */
        OPTIONAL
    }

    public Key {
        words = List.copyOf(words);
    }

    static Key quantity(String path, Unit unit, double low, double high) {
        return make(path, Kind.QUANTITY, unit, low, high);
    }

    static Key part(String path, Unit unit, double low, double high) {
        return make(path, Kind.PART, unit, low, high);
    }

    static Key characteristic(String path, Unit unit, double low, double high) {
        return make(path, Kind.CHARACTERISTIC, unit, low, high);
    }

    static Key word(String path, String... words) {
        return new Key(path, Kind.WORD, Unit.NUMBER, 0, 0, List.of(words), Need.REQUIRED, "", "", "");
    }

    static Key other(String path, Kind kind) {
        return make(path, kind, Unit.NUMBER, 0, 0);
    }

    static Key make(String path, Kind kind, Unit unit, double low, double high) {
        return new Key(path, kind, unit, low, high, List.of(), Need.REQUIRED, "", "", "");
    }

    Key orElse(String text) {
        return new Key(path, kind, unit, low, high, words, Need.DEFAULTED, text, neededBy, meaning);
    }

    Key optional() {
        return new Key(path, kind, unit, low, high, words, Need.OPTIONAL, "", neededBy, meaning);
    }

    Key by(String who) {
        return new Key(path, kind, unit, low, high, words, need, standard, who, meaning);
    }

    Key means(String sentence) {
        return new Key(path, kind, unit, low, high, words, need, standard, neededBy, sentence);
    }

    /** The last part of the path. */
    public String name() {
        return path.substring(path.lastIndexOf('.') + 1);
    }

    /** What the reader takes here, for keys that take a quantity. */
    public Expected expected() {
        return switch (kind) {
            case PART -> Expected.part(unit, low, high);
            case CHARACTERISTIC -> Expected.within(unit, low, high).withTolerance();
            default -> Expected.within(unit, low, high);
        };
    }

    /** Range in words: "100 Ω..1 MΩ", "linear | log | reverse-log | table", or what kind of thing stands here. */
    public String range() {
        return switch (kind) {
            case WORD -> String.join(" | ", words);
            case QUANTITY, PART, CHARACTERISTIC, CURVE, RATIO, WHOLE ->
                expected().inWords();
            default -> kind.inWords();
        };
    }

    /** Unit symbol, empty for keys without one. */
    public String unitSymbol() {
        return switch (kind) {
            case QUANTITY, PART, CHARACTERISTIC, CURVE -> unit.symbol();
            case LINE_LIMIT -> "%, V";
            case GOAL -> "%, W, V, °";
            case POWER_AT_VOLTAGE -> "W, V";
            default -> "";
        };
    }

    /** Default in words: the text, "required", or "none". */
    public String standardInWords() {
        return switch (need) {
            case REQUIRED -> "required";
            case DEFAULTED -> standard;
            case OPTIONAL -> "none";
        };
    }

    /** Everything about the key, line by line, for a person who asks. */
    public List<String> explained() {
        List<String> lines = new ArrayList<>();
        lines.add(path + ": " + meaning);
        lines.add("takes    " + kind.inWords());
        lines.add("range    " + range());
        if (!unitSymbol().isEmpty()) {
            lines.add("unit     " + unitSymbol());
        }
        lines.add("default  " + standardInWords());
        if (!neededBy.isEmpty()) {
            lines.add("needed   by " + neededBy);
        }
        return lines;
    }

    /** A value inside the window, to go on reading with when the one that stood there was refused. */
    double standIn() {
        if (low > 0 && high < Double.POSITIVE_INFINITY) {
            return Math.sqrt(low * high);
        }
        return low <= 0 && high >= 0 && unit != Unit.FRACTION ? Math.min(high, 1) : (low + high) / 2;
    }
}
