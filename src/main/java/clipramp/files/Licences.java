package clipramp.files;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The licences of the program and of all that it is built on, as they come with it. */
public final class Licences {
    private static final String FOLDER = "/clipramp/licences/";
    private static final List<String> IDS =
            List.of("Apache-2.0", "LGPL-2.1", "MPL-2.0", "BSD-3-Clause", "GPL-2.0-CE", "DejaVu", "notices");

    private Licences() {}

    /** Names of the full texts, the program's own licence first; notices is what libraries ask to be passed on. */
    public static List<String> ids() {
        return IDS;
    }

    /** Who is licensed how: a few lines of Markdown. */
    public static String overview() {
        return resource("third-party.md");
    }

    /**
     * A full text.
     *
     * @param id one of {@link #ids()}
     * @throws IllegalArgumentException for any other
     */
    public static String text(String id) {
        if (!IDS.contains(id)) {
            throw new IllegalArgumentException("no licence " + id);
        }
        return resource(id + ".txt");
    }

    private static String resource(String name) {
        try (InputStream in = Licences.class.getResourceAsStream(FOLDER + name)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks " + FOLDER + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }
}
