package clipramp.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The designs that come with the program. */
final class Examples {
    static final String FIRST = "drying-cabinet";
    static final List<String> NAMES = List.of(FIRST, "shed-heater", "tray-lamp", "cabinet-gone-wrong");

    private Examples() {}

    /** A design as it came with the program, comments included. */
    static String text(String name) {
        try (InputStream in = Examples.class.getResourceAsStream("/clipramp/examples/" + name + ".yaml")) {
            if (in == null) {
                throw new IllegalStateException("the program lacks its example " + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }
}
