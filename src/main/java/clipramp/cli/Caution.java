package clipramp.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** The safety cautions, and the pointer at them that opens an answer. */
final class Caution {
    static final String LINE =
            "Mains voltage kills. Cautions: clipramp explain safety. No answer says that a build is safe.";

    private static final String RESOURCE = "/clipramp/SAFETY.md";

    private Caution() {}

    /** The cautions for reading on a terminal: paragraphs and points newly broken into lines. */
    static List<String> lines() {
        return lines(text());
    }

    /** A text with headings, paragraphs and points, newly broken into lines. */
    static List<String> lines(String markdown) {
        List<String> lines = new ArrayList<>();
        StringBuilder paragraph = new StringBuilder();
        for (String line : (markdown + "\n\n").lines().toList()) {
            boolean starts = line.isBlank() || line.startsWith("#") || line.startsWith("- ");
            if (starts && paragraph.length() > 0) {
                String point = paragraph.toString().startsWith("- ") ? "  " : "";
                lines.addAll(Paragraph.wrap(paragraph.toString(), "", point));
                paragraph.setLength(0);
            }
            if (line.isBlank()) {
                lines.add("");
            } else {
                paragraph
                        .append(paragraph.length() > 0 ? " " : "")
                        .append(line.strip().replace("**", ""));
            }
        }
        return lines;
    }

    /** The cautions as they came with the program. */
    static String text() {
        try (InputStream in = Caution.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks its cautions: " + RESOURCE);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }
}
