package clipramp.record;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Takes out of a finished PDF what the library drew by lot or by the clock: the six letters before a font subset's name
 * and the file's identifier. Both keep their length, so that no offset in the file moves.
 */
final class Reproducible {
    private static final Pattern SUBSET = Pattern.compile("/([A-Z]{6})\\+DejaVu");
    private static final Pattern IDENTIFIER = Pattern.compile("/ID ?\\[<([0-9a-f]{32})><([0-9a-f]{32})>\\]");

    private Reproducible() {}

    /** The same file without chance and clock. */
    static byte[] settled(byte[] pdf) {
        // Latin 1 maps every byte to one character and back.
        String text = new String(pdf, StandardCharsets.ISO_8859_1);
        Map<String, String> names = new LinkedHashMap<>();
        Matcher subset = SUBSET.matcher(text);
        while (subset.find()) {
            names.putIfAbsent(subset.group(1), letters(names.size()));
        }
        for (Map.Entry<String, String> name : names.entrySet()) {
            text = text.replace(name.getKey() + "+DejaVu", name.getValue() + "+DejaVu");
        }
        Matcher identifier = IDENTIFIER.matcher(text);
        if (!identifier.find()) {
            throw new IllegalStateException("the PDF has no identifier where one is expected");
        }
        String without = identifier.replaceFirst("");
        String digest = md5(without.getBytes(StandardCharsets.ISO_8859_1));
        String settled = text.substring(0, identifier.start(1))
                + digest
                + text.substring(identifier.end(1), identifier.start(2))
                + digest
                + text.substring(identifier.end(2));
        return settled.getBytes(StandardCharsets.ISO_8859_1);
    }

    private static String letters(int number) {
        return "CLIPR" + (char) ('A' + number % 26);
    }

    private static String md5(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("MD5").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("this Java has no MD5", e);
        }
    }
}
