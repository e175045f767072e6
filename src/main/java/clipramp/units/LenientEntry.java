package clipramp.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A value typed by hand into the window: the grammar of the files, and a decimal comma besides. A comma before exactly
 * three digits is asked back, because it may group thousands.
 *
 * @param quantity the value
 * @param text the text with a dot in the comma's place, as it is echoed and written
 */
public record LenientEntry(Quantity quantity, String text) {
    private static final Pattern COMMA = Pattern.compile("(\\d+),(\\d+)");

    /**
     * The value that was typed.
     *
     * @param typed as typed
     * @param expected what the place takes
     * @throws RefusedQuantityException as {@link QuantityReader#read}, and for a comma that may group thousands
     */
    public static LenientEntry read(String typed, Expected expected) {
        Matcher comma = COMMA.matcher(typed);
        String text = typed.strip();
        if (comma.find() && !mayGroup(comma)) {
            String before = typed.substring(0, comma.start());
            String after = typed.substring(comma.end());
            if (!before.contains(".") && !after.startsWith(".") && !after.startsWith(",")) {
                text = (before + comma.group(1) + "." + comma.group(2) + after).strip();
            }
        }
        return new LenientEntry(QuantityReader.read(text, expected), text);
    }

    private static boolean mayGroup(Matcher comma) {
        return comma.group(2).length() == 3 && !comma.group(1).equals("0");
    }
}
