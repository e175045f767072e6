package clipramp.desk;

import java.nio.file.Path;
import java.util.Optional;

/** Asks the user for a file. Behind an interface, because no dialog of the system opens where there is no screen. */
interface FileAsk {
    /** What kind of file is meant. */
    enum Kind {
        DESIGN("Design files", "yaml"),
        RECORD("PDF documents", "pdf"),
        SVG("SVG drawings", "svg"),
        PNG("PNG pictures", "png"),
        CSV("Comma-separated values", "csv");

        private final String words;
        private final String ending;

        Kind(String words, String ending) {
            this.words = words;
            this.ending = ending;
        }

        String words() {
            return words;
        }

        /** Ending without its dot. */
        String ending() {
            return ending;
        }
    }

    /** A file to open; empty if the user gave up. */
    Optional<Path> toOpen(Kind kind);

    /**
     * A file to write; the user has agreed to replace one that is there. Empty if the user gave up.
     *
     * @param kind kind of file
     * @param name name to begin with
     * @param beside file whose folder to begin in, if there is one
     */
    Optional<Path> toWrite(Kind kind, String name, Optional<Path> beside);
}
