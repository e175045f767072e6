package clipramp.cli;

import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Prints what a shell needs to complete commands, options and names. */
@Command(
        name = "completion",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Prints what a shell needs to complete commands, options, examples, profiles and keys.",
            "Into .bashrc: source <(clipramp completion bash). Into .zshrc: source <(clipramp completion zsh)."
        })
final class CompletionCommand implements Callable<Integer> {
    static final List<String> SHELLS = List.of("bash", "zsh");

    private final Session session;

    @Mixin
    StandardOptions standard = new StandardOptions();

    @Parameters(paramLabel = "SHELL", description = "bash or zsh")
    String shell = "";

    CompletionCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        Problems.word("SHELL", shell, SHELLS);
        session.out().exactly(Completion.script(CommandTree.of(session), shell));
        return ExitCode.ANSWERED;
    }
}
