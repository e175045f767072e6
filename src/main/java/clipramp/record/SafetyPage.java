package clipramp.record;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The program's cautions, whole, as they stand beside it. */
final class SafetyPage {
    private static final String RESOURCE = "/clipramp/SAFETY.md";

    private SafetyPage() {}

    static void write(Paper paper) {
        paper.newPage();
        boolean titled = false;
        for (String line : text().lines().toList()) {
            String plain = line.strip().replace("`", "");
            if (plain.startsWith("# ") && !titled) {
                paper.section(plain.substring(2));
                titled = true;
            } else if (plain.startsWith("#")) {
                paper.heading(plain.replaceFirst("^#+ *", ""));
            } else if (plain.startsWith("- ") || plain.startsWith("* ")) {
                paper.list(List.of(plain.substring(2)), paper.faces().small());
            } else if (!plain.isEmpty()) {
                paper.small(plain);
            }
        }
    }

    static String text() {
        try (InputStream in = SafetyPage.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException("the program's own cautions are missing: " + RESOURCE);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
