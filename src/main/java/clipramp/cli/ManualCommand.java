package clipramp.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Prints the manual page. */
@Command(
        name = "manual",
        sortOptions = false,
        sortSynopsis = false,
        description = "Prints the manual page, for man: clipramp manual | man -l -")
final class ManualCommand implements Callable<Integer> {
    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    ManualCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        session.out()
                .exactly(ManualPage.of(CommandTree.of(session), session.out().spelling()));
        return ExitCode.ANSWERED;
    }
}
