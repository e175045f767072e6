package clipramp.files;

import clipramp.units.Expected;
import clipramp.units.Unit;
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
        /** More keys under it. */
        MAPPING("more keys"),
        /** A list. */
        LIST("a list"),
        /** Free text. */
        TEXT("text"),
        /** One of the key's own words. */
        WORD("a word"),
        /** A whole number. */
        WHOLE("a whole number"),
        /** A number with its unit. */
        QUANTITY("a quantity"),
        /** The same with tolerance and ratings. */
        PART("a value with tolerance and ratings"),
        /** A data-sheet figure. */
        CHARACTERISTIC("a quantity, or {min:, typ:, max:}"),
        /** A current against temperature. */
        CURVE("a current, or a list of {at:, current:}"),
        /** A ratio of turns. */
        RATIO("a ratio, 2 or 2:1"),
        /** How far the line strays. */
        LINE_LIMIT("signed percent, or volts"),
        /** What the knob is to reach. */
        GOAL("%, W, V or deg, or a band, at a knob position"),
        /** A load's rating. */
        POWER_AT_VOLTAGE("a power, or a power at a voltage"),
        /** A device. */
        PROFILE("a profile's id, or its keys");

        private final String inWords;

        Kind(String inWords) {
            this.inWords = inWords;
        }

        /** What stands there, in words for people. */
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

    /** Keeps the words as they are. */
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
    String name() {
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

    /** Symbols of the units that it takes; empty for keys without one. */
    public String unitSymbol() {
        return switch (kind) {
            case QUANTITY, PART, CHARACTERISTIC, CURVE -> unit.symbol();
            case LINE_LIMIT -> "%, V";
            case GOAL -> "%, W, V, °";
            case POWER_AT_VOLTAGE -> "W, V";
            default -> "";
        };
    }

    /** Default in words: as it would be written, "required", or "none". */
    public String standardInWords() {
        return switch (need) {
            case REQUIRED -> "required";
            case DEFAULTED -> standard;
            case OPTIONAL -> "none";
        };
    }

    /** A value inside the window, to go on reading with when the one that stood there was refused. */
    double standIn() {
        if (low > 0 && high < Double.POSITIVE_INFINITY) {
            return Math.sqrt(low * high);
        }
        return low <= 0 && high >= 0 && unit != Unit.FRACTION ? Math.min(high, 1) : (low + high) / 2;
    }
}
