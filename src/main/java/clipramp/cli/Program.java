package clipramp.cli;

import clipramp.files.Release;

/** Who answers. */
final class Program {
    static final String NAME = "clipramp";

    private Program() {}

    /** Such as "clipramp 0.1.0". */
    static String nameAndVersion() {
        return NAME + " " + version();
    }

    /** Such as 0.1.0. */
    static String version() {
        return Release.version();
    }
}
