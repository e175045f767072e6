package clipramp.cli;

import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Opens the window through whoever started the program. */
@Command(
        name = "desk",
        sortOptions = false,
        sortSynopsis = false,
        description = "Opens the window, with a design where one is named.")
final class DeskCommand implements Callable<Integer> {
    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Parameters(paramLabel = "FILE", arity = "0..1", description = "design file")
    @Nullable
    String file;

    DeskCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        try {
            return session.launcher().orElseThrow().open(Optional.ofNullable(file));
        } catch (UnsupportedOperationException noScreen) {
            throw Problems.refused(
                    "desk", "there is no screen here to open a window on. clipramp check FILE needs none.");
        }
    }
}
