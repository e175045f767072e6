package clipramp.units;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Walks along a text: numbers, unit words, signs. Signs and spaces are already in one spelling. */
final class Scanner {
    private static final Pattern NUMBER =
            Pattern.compile("[+-]?(?:\\d+(?:\\.\\d+)?|\\.\\d+)(?:[eE][+-]?\\d{1,3}(?!\\d))?");
    private static final int LONGEST_NUMBER = 60;

    private final String text;
    private int position;

    Scanner(String raw) {
        text = unify(raw).strip();
    }

    /** One spelling for every sign that has several: spaces, minus, ohm, micro, plus-minus. */
    static String unify(String raw) {
        return raw.replace('\u00a0', ' ')
                .replace('\u2009', ' ')
                .replace('\u202f', ' ')
                .replace('\u2212', '-')
                .replace('\u2126', 'Ω')
                .replace('\u03bc', 'µ')
                .replace("+-", "±")
                .replace("+/-", "±")
                .replace("ohm", "Ω");
    }

    String text() {
        return text;
    }

    String rest() {
        return text.substring(position);
    }

    boolean isAtEnd() {
        return position >= text.length();
    }

    void skipSpaces() {
        while (position < text.length() && text.charAt(position) == ' ') {
            position++;
        }
    }

    boolean takes(String word) {
        if (text.startsWith(word, position)) {
            position += word.length();
            return true;
        }
        return false;
    }

    char peek() {
        return position < text.length() ? text.charAt(position) : '\0';
    }

    /** The number here, as written. */
    Optional<String> number() {
        Matcher matcher = NUMBER.matcher(text).region(position, text.length());
        if (!matcher.lookingAt() || matcher.group().length() > LONGEST_NUMBER) {
            return Optional.empty();
        }
        position = matcher.end();
        return Optional.of(matcher.group());
    }

    /** The pattern here, if it fits here. */
    Optional<Matcher> match(Pattern pattern) {
        Matcher matcher = pattern.matcher(text).region(position, text.length());
        if (!matcher.lookingAt()) {
            return Optional.empty();
        }
        position = matcher.end();
        return Optional.of(matcher);
    }

    /** The unit word here, after spaces; empty where a number, a sign or nothing follows. */
    String unitWord() {
        int before = position;
        skipSpaces();
        int from = position;
        while (position < text.length() && isUnitSign(text.charAt(position), position > from)) {
            position++;
        }
        if (position == from) {
            position = before;
            return "";
        }
        return text.substring(from, position);
    }

    private static boolean isUnitSign(char sign, boolean inside) {
        return sign != ' ' && sign != '+' && sign != '-' && sign != '±' && (inside || !isNumberSign(sign));
    }

    private static boolean isNumberSign(char sign) {
        return (sign >= '0' && sign <= '9') || sign == '.' || sign == ',';
    }
}
