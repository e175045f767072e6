package clipramp.files;

import clipramp.files.Key.Kind;
import java.util.Locale;
import java.util.regex.Pattern;

/** Writes values so that they read back as they are. */
final class YamlText {
    private static final Pattern UNSAFE_START =
            Pattern.compile("[-?:] .*|[-?:]$|[&*!|>'\"%@`#,\\[\\]{}].*", Pattern.DOTALL);
    private static final Pattern UNSAFE_INSIDE =
            Pattern.compile(".*(: | #|:$|[\\n\\r\\t\\u0085\\u2028\\u2029]).*", Pattern.DOTALL);

    private YamlText() {}

    /**
     * A value at a path; where the key takes text, everything is text, else braces and brackets are structure.
     *
     * @param insideFlow whether it stands between braces or brackets
     */
    static String value(String path, String value, boolean insideFlow) {
        boolean text = KeyCatalogue.standard()
                        .find(path)
                        .filter(k -> k.kind() == Kind.TEXT)
                        .isPresent()
                || path.startsWith("designators.");
        boolean structure = !text && (value.startsWith("{") || value.startsWith("["));
        return structure ? value : scalar(value, insideFlow);
    }

    /** A scalar, quoted where it has to be. */
    static String scalar(String value, boolean insideFlow) {
        boolean plain = !value.isEmpty()
                && value.equals(value.strip())
                && !value.equals("---")
                && !value.equals("...")
                && !UNSAFE_START.matcher(value).matches()
                && !UNSAFE_INSIDE.matcher(value).matches()
                && !(insideFlow && value.matches("(?s).*[,\\[\\]{}].*"))
                && value.codePoints().allMatch(c -> c >= ' ' && c != 0x7f);
        return plain ? value : quoted(value);
    }

    private static String quoted(String value) {
        StringBuilder out = new StringBuilder("\"");
        value.codePoints().forEach(c -> {
            switch (c) {
                case '"' -> out.append("\\\"");
                case '\\' -> out.append("\\\\");
                case '\n' -> out.append("\\n");
                case '\r' -> out.append("\\r");
                case '\t' -> out.append("\\t");
                default -> {
                    if (c < ' ' || (c >= 0x7f && c < 0xa0) || c == 0x2028 || c == 0x2029 || c == 0xfeff) {
                        out.append(String.format(Locale.ROOT, "\\u%04x", c));
                    } else {
                        out.appendCodePoint(c);
                    }
                }
            }
        });
        return out.append('"').toString();
    }
}
