package clipramp.cli;

import clipramp.units.Notation;

/**
 * How text is spelled for a reader: in full, or in ASCII where a terminal cannot show Ω, µ or °. Control characters
 * never pass, so that no title in a file can steer a terminal.
 */
enum Spelling {
    FULL(Notation.UNICODE),
    ASCII(Notation.ASCII);

    private final Notation notation;

    Spelling(Notation notation) {
        this.notation = notation;
    }

    /** The text as it may be shown; line feeds stay. */
    String of(String text) {
        if (isPlain(text)) {
            return text;
        }
        String spelled = notation.apply(text);
        StringBuilder shown = new StringBuilder(spelled.length());
        spelled.codePoints().forEach(point -> shown.appendCodePoint(shown(point)));
        return shown.toString();
    }

    private static boolean isPlain(String text) {
        return text.chars().allMatch(c -> c == '\n' || (c >= ' ' && c <= '~'));
    }

    private int shown(int point) {
        if (point != '\n' && steers(point)) {
            return ' ';
        }
        return this == ASCII && point > '~' ? '?' : point;
    }

    /** Control characters, and the marks that turn the direction of writing or end a line. */
    private static boolean steers(int point) {
        return Character.isISOControl(point)
                || (point >= 0x202A && point <= 0x202E)
                || (point >= 0x2066 && point <= 0x2069)
                || point == 0x2028
                || point == 0x2029;
    }
}
