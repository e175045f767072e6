package clipramp.cli;

import org.jspecify.annotations.Nullable;

/** Who answers. */
final class Program {
    static final String NAME = "clipramp";

    private Program() {}

    /** Such as "clipramp 0.1.0". */
    static String nameAndVersion() {
        return NAME + " " + version();
    }

    /** Such as 0.1.0; it stands in the jar's manifest. */
    static String version() {
        @Nullable String version = Program.class.getPackage().getImplementationVersion();
        return version == null ? "unpackaged" : version;
    }
}
