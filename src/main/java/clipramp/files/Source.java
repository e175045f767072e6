package clipramp.files;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * A text with the name that its problems carry.
 *
 * @param name file name as given, "-" for standard input
 * @param text the text
 */
public record Source(String name, String text) {
    /** Largest design or profile that is read, bytes. */
    public static final int LARGEST_BYTES = 1 << 20;

    /** Takes a byte order mark off. */
    public Source {
        if (text.startsWith("\ufeff")) {
            text = text.substring(1);
        }
    }

    /**
     * Reads a file as UTF-8.
     *
     * @throws IOException where it cannot be read
     * @throws InvalidInputException where it is too large or not UTF-8
     */
    public static Source of(Path file) throws IOException {
        try (InputStream in = Files.newInputStream(file)) {
            return of(file.toString(), in);
        }
    }

    /**
     * Reads a stream to its end, such as standard input under the name "-".
     *
     * @throws IOException where it cannot be read
     * @throws InvalidInputException where it is too large or not UTF-8
     */
    public static Source of(String name, InputStream in) throws IOException {
        return decoded(name, in.readNBytes(LARGEST_BYTES + 1));
    }

    private static Source decoded(String name, byte[] bytes) {
        if (bytes.length > LARGEST_BYTES) {
            throw refused(name, 0, 0, "the file is larger than 1 MiB, which no design needs. Is it the right file?");
        }
        ByteBuffer buffer = ByteBuffer.wrap(bytes);
        try {
            return new Source(
                    name,
                    StandardCharsets.UTF_8
                            .newDecoder()
                            .onMalformedInput(CodingErrorAction.REPORT)
                            .onUnmappableCharacter(CodingErrorAction.REPORT)
                            .decode(buffer)
                            .toString());
        } catch (CharacterCodingException e) {
            String before = new String(bytes, 0, buffer.position(), StandardCharsets.UTF_8);
            int line = (int) before.chars().filter(c -> c == '\n').count() + 1;
            int column = before.codePointCount(before.lastIndexOf('\n') + 1, before.length()) + 1;
            throw refused(name, line, column, "the file is not UTF-8 from here on. Save it as UTF-8.");
        }
    }

    private static InvalidInputException refused(String name, int line, int column, String message) {
        return new InvalidInputException(List.of(new Problem(name, line, column, "", "", "", "", message)));
    }
}
