package clipramp.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/** Running text broken into lines. */
final class Paragraph {
    /** Columns that every answer keeps within, tables excepted that need a little more. */
    static final int WIDTH = 92;

    /** The space between a figure and its unit, where no line may end. */
    private static final Pattern BEFORE_UNIT =
            Pattern.compile("(?<=\\d) (?=(?:%|°|[kMGmµunp]?(?:Ω|ohm|V|A|W|F|H|Hz|s|J|C|K|degC|deg)\\b))");

    private static final char GLUE = '\u00A0';

    private Paragraph() {}

    /**
     * @param text words parted by spaces; line feeds start a new line
     * @param firstIndent what stands before the first line
     * @param indent what stands before the lines after it
     * @return lines of at most {@link #WIDTH} signs; a longer word stands alone
     */
    static List<String> wrap(String text, String firstIndent, String indent) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder(firstIndent);
        int bare = firstIndent.length();
        for (String part : glued(text).split("\n", -1)) {
            for (String word : part.strip().split(" +", -1)) {
                if (line.length() > bare && line.length() + 1 + word.length() > WIDTH) {
                    lines.add(unglued(line));
                    line = new StringBuilder(indent);
                    bare = indent.length();
                }
                line.append(line.length() > bare ? " " : "").append(word);
            }
            lines.add(unglued(line));
            line = new StringBuilder(indent);
            bare = indent.length();
        }
        return lines;
    }

    private static String glued(String text) {
        return BEFORE_UNIT.matcher(text.strip()).replaceAll(String.valueOf(GLUE));
    }

    private static String unglued(StringBuilder line) {
        return line.toString().replace(GLUE, ' ').stripTrailing();
    }

    static List<String> wrap(String text, String indent) {
        return wrap(text, indent, indent);
    }
}
