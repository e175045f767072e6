package clipramp.cli;

import org.jspecify.annotations.Nullable;

/** Who answers. */
final class Program {
    static final String NAME = "clipramp";

    private Program() {}

    /** Such as "clipramp 0.1.0"; the version stands in the jar's manifest. */
    static String nameAndVersion() {
        @Nullable String version = Program.class.getPackage().getImplementationVersion();
        return NAME + " " + (version == null ? "unpackaged" : version);
    }
}
