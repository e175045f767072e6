package clipramp.cli;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;

/** In which form an analysis answers. */
final class FormOptions {
    @Option(names = "--json", order = 30, description = "the answer for machines")
    boolean json;

    @Option(names = "--csv", order = 31, description = "comma-separated values, units in the header")
    boolean csv;

    @Option(names = "--plot", paramLabel = "OUT", order = 32, description = "also draw it into OUT.svg or OUT.png")
    @Nullable
    String plot;

    boolean json() {
        return json;
    }

    boolean csv() {
        return csv;
    }

    Optional<String> plot() {
        return Optional.ofNullable(plot);
    }

    /** Refuses what contradicts itself before anything is solved. */
    void require() {
        if (json && csv) {
            throw Problems.refused("--csv", "--json and --csv cannot both go to standard output. Choose one.");
        }
        plot().ifPresent(Outputs::requirePlot);
    }
}
