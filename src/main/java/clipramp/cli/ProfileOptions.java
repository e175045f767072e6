package clipramp.cli;

import java.util.List;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;

/** Where profiles are looked for. */
final class ProfileOptions {
    @Option(
            names = "--profiles",
            paramLabel = "shipped",
            order = 9,
            description = "shipped: look only at the program's own profiles")
    @Nullable
    String profiles;

    boolean shippedOnly() {
        return profiles != null
                && Problems.word("--profiles", profiles, List.of("shipped")).equals("shipped");
    }
}
