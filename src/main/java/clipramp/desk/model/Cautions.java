package clipramp.desk.model;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** The safety cautions that go with the program. */
public final class Cautions {
    /**
     * One paragraph.
     *
     * @param heading whether it is a heading
     * @param text the words
     */
    public record Paragraph(boolean heading, String text) {}

    private Cautions() {}

    /** All paragraphs; the text's own first heading is left to the window's. */
    public static List<Paragraph> read() {
        return paragraphs(text());
    }

    /** The paragraphs of a text with headings and points; its first heading is left out. */
    public static List<Paragraph> paragraphs(String markdown) {
        List<Paragraph> paragraphs = new ArrayList<>();
        for (String line : markdown.lines().toList()) {
            if (line.startsWith("## ")) {
                paragraphs.add(new Paragraph(true, line.substring(3)));
            } else if (line.startsWith("- ")) {
                paragraphs.add(new Paragraph(false, "• " + line.substring(2)));
            } else if (!line.isBlank() && !line.startsWith("# ")) {
                paragraphs.add(new Paragraph(false, line));
            }
        }
        return paragraphs;
    }

    private static String text() {
        try (InputStream in = Cautions.class.getResourceAsStream("/clipramp/SAFETY.md")) {
            if (in == null) {
                throw new IllegalStateException("the program's own safety cautions are missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
