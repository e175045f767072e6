package clipramp.cli;

import clipramp.files.DesignFiles;
import clipramp.files.LoadedDesign;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import java.io.IOException;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Reads designs and finds profiles for every command. */
final class Inputs {
    static final String STANDARD_INPUT = "-";

    private Inputs() {}

    /**
     * @param file as typed; - for standard input
     * @param overrides as typed, KEY=VALUE
     * @param library where profiles are looked for
     */
    static LoadedDesign load(Session session, String file, List<String> overrides, ProfileLibrary library) {
        return DesignFiles.load(source(session, file), overrides, library);
    }

    /** A file's text; that of standard input for -. */
    static Source source(Session session, String file) {
        return file.equals(STANDARD_INPUT) ? fromStandardInput(session) : fromFile(path(file));
    }

    /** Where the profiles of a design are looked for: beside it too, unless it comes from standard input. */
    static ProfileLibrary libraryOf(Session session, String file, boolean shippedOnly) {
        Optional<Path> place = file.equals(STANDARD_INPUT) ? Optional.empty() : Optional.of(path(file));
        return library(session, place, shippedOnly);
    }

    /** A file name as this system has them. */
    static Path path(String name) {
        try {
            return Path.of(name);
        } catch (InvalidPathException refused) {
            throw FileFailure.naming(name, refused);
        }
    }

    private static Source fromStandardInput(Session session) {
        try {
            return Source.of(STANDARD_INPUT, session.terminal().in());
        } catch (IOException failure) {
            throw FileFailure.reading("standard input", failure);
        }
    }

    private static Source fromFile(Path file) {
        try {
            return Source.of(file);
        } catch (IOException failure) {
            throw FileFailure.reading(file.toString(), failure);
        }
    }

    /** Where profiles are looked for. */
    static ProfileLibrary library(Session session, Optional<Path> design, boolean shippedOnly) {
        if (shippedOnly) {
            return ProfileLibrary.shipped();
        }
        boolean windows =
                System.getProperty("os.name", "").toLowerCase(Locale.ROOT).startsWith("windows");
        return ProfileLibrary.usual(
                design, session.terminal().environment(), Path.of(System.getProperty("user.home", "")), windows);
    }
}
