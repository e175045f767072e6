package clipramp.files;

import java.util.List;

/**
 * One thing wrong with an input.
 *
 * @param file the file's name as given, {@code --with} for an override
 * @param line line, counted from 1; 0 where there is none
 * @param column column in code points, counted from 1; 0 where there is none
 * @param path the key, such as clip.dropper; may be empty
 * @param read what stood there; may be empty
 * @param expected what would have been taken; may be empty
 * @param nearest the nearest known word, where one was mistyped; may be empty
 * @param message the sentence for people, beginning with the key
 */
public record Problem(
        String file, int line, int column, String path, String read, String expected, String nearest, String message) {

    /** The whole line: {@code dryer.yaml:9:22 clip.dropper: read "10 mohm" (0.010 Ω); expected ...}. */
    public String text() {
        String position = line > 0 ? ":" + line + ":" + column : "";
        return file + position + " " + message;
    }

    static String texts(List<Problem> problems) {
        return String.join("\n", problems.stream().map(Problem::text).toList());
    }
}
