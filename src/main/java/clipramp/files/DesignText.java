package clipramp.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * A design as its author wrote it. Changing a value makes another text in which everything else, comments included, stays
 * byte for byte.
 *
 * @param name file name as given
 * @param text the whole text
 * @param notes what could not be kept on the way here, such as comments inside a replaced block
 */
public record DesignText(String name, String text, List<String> notes) {
    /** Keeps the notes as they are. */
    public DesignText {
        notes = List.copyOf(notes);
    }

    /** The text as it stands in a file. */
    public static DesignText of(Source source) {
        return new DesignText(source.name(), source.text(), List.of());
    }

    /** A design, or what is wrong with its text. */
    public sealed interface Reading {
        /**
         * The text reads.
         *
         * @param loaded the design
         */
        record Good(LoadedDesign loaded) implements Reading {}

        /**
         * The text does not read.
         *
         * @param problems everything that is wrong with it, in the order of its lines
         */
        record Bad(List<Problem> problems) implements Reading {
            /** Keeps the problems as they are. */
            public Bad {
                problems = List.copyOf(problems);
            }
        }
    }

    /** Reads the text with overrides, path=value in their order, and the profiles of a library. */
    Reading read(List<String> overrides, ProfileLibrary library) {
        try {
            return new Reading.Good(DesignFiles.load(new Source(name, text), overrides, library));
        } catch (InvalidInputException e) {
            return new Reading.Bad(e.problems());
        }
    }

    /** Reads the text as it stands, with the profiles of a library. */
    public Reading read(ProfileLibrary library) {
        return read(List.of(), library);
    }

    /**
     * What stands at a key: a value's own text, or a mapping's source; empty where nothing does.
     *
     * @param path key with dots and list indices, such as clip.dropper or line.harmonics[0].share
     * @throws InvalidInputException where the text is no YAML of ours
     */
    public Optional<String> valueAt(String path) {
        return edit().valueAt(path);
    }

    /**
     * Sets a key, adding it and the mappings around it where they are missing. A key of a profile's device makes the
     * profile's id a {@code {like: id, key: value}}.
     *
     * @param path key with dots and list indices, such as clip.dropper or line.harmonics[0].share
     * @param value as it would be written, such as 10 kΩ ±5 %; braces and brackets are structure
     * @throws InvalidInputException where the text is no YAML of ours or the path leads nowhere
     */
    public DesignText withValue(String path, String value) {
        return changed(edit(), edit -> edit.set(path, value));
    }

    /**
     * Takes a key out; the same text where it is not there.
     *
     * @param path key with dots, such as clip.dropper
     * @throws InvalidInputException where the text is no YAML of ours, or the key is the only one of a block
     */
    public DesignText without(String path) {
        return changed(edit(), edit -> edit.remove(path));
    }

    /**
     * What {@code --with} does to a text: it sets a value, or, by none where that is no value of the key, takes the key out.
     *
     * @param path key with dots and list indices
     * @param value as it would be written
     * @throws InvalidInputException as {@link #withValue} and {@link #without}
     */
    public DesignText withOption(String path, String value) {
        return value.equals("none") && !Overrides.keepsNone(path) ? without(path) : withValue(path, value);
    }

    /** The text under another file's name. */
    public DesignText named(String newName) {
        return new DesignText(newName, text, notes);
    }

    private TextEdit edit() {
        return TextEdit.of(new Source(name, text));
    }

    private DesignText changed(TextEdit edit, Function<TextEdit, String> change) {
        String changed = change.apply(edit);
        List<String> more = new ArrayList<>(notes);
        edit.notes().stream().filter(n -> !more.contains(n)).forEach(more::add);
        return new DesignText(name, changed, more);
    }
}
