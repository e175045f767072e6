package clipramp.desk.model;

import clipramp.files.InvalidInputException;
import java.nio.file.Path;
import java.util.Optional;

/** Reads design files and changes single values in their text. */
public interface Workshop {
    /**
     * Reads a text.
     *
     * @param name name that problems carry
     * @param file where it lies, for profiles beside it; empty for a design that was not saved yet
     * @param text the text
     * @throws InvalidInputException with everything that is wrong with it
     */
    Sheet read(String name, Optional<Path> file, String text);

    /** The text that stands at a key, such as "100 nF ±10 %" at ramp.capacitor; empty where nothing does. */
    Optional<String> value(String text, String key);

    /** The same text with another value at a key; everything else, comments too, stays as it is. */
    String with(String text, String key, String value);
}
